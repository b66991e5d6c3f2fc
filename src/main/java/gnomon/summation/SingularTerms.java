package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/// Standing sums whose terms lose their meaning at values of their parameters: rising(−n, k) as (k
/// − n − 1)!/(−n − 1)! is 0 at n = 1 for every k but 0, and binom(n + k, k) is 0 at k = −2 while
/// its form (n + k)!/(n! k!) is 1 there for n = 0.
public final class SingularTerms {
  private SingularTerms() {}

  /// Whether, at the values, a factorial free of the bound variable becomes that of a negative
  /// integer, or one above the fraction line does so at an end of the range.
  public static boolean occur(Accumulation sum, Map<? extends Generator, Form> values) {
    return sum.body().generators().stream()
        .filter(Factorial.class::isInstance)
        .filter(g -> values.keySet().stream().anyMatch(g::dependsOn))
        .anyMatch(g -> isSingular((Factorial) g, sum, values));
  }

  private static boolean isSingular(
      Factorial factorial, Accumulation sum, Map<? extends Generator, Form> values) {
    Form argument = factorial.argument();
    if (!argument.dependsOn(sum.bound())) {
      return isNegativeInteger(argument, values);
    }
    return sum.body().numerator().contains(factorial)
        && Stream.of(sum.lower(), sum.upper())
            .map(end -> argument.substitute(sum.bound(), end))
            .anyMatch(there -> isNegativeInteger(there, values));
  }

  /// Whether the argument of a factorial is a negative integer at the values, or has no value.
  public static boolean isNegativeInteger(Form argument, Map<? extends Generator, Form> values) {
    try {
      Optional<BigInteger> value = argument.substitute(Map.copyOf(values)).asInteger();
      return value.filter(n -> n.signum() < 0).isPresent();
    } catch (Refusal undefined) {
      return true;
    }
  }
}
