package gnomon.summation;

import gnomon.form.Elementary;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Writes quotients of factorials of negative integers by factorials of natural numbers.
///
/// For negative integers A and B the quotient A!/B!, in the limit, is (−1)^(A−B) (−B−1)!/(−A−1)!,
/// by the reflection formula of the gamma function. So the rising power of −n with exponent k is
/// (−1)^k n!/(n−k)!.
final class Reflection {
  private Reflection() {}

  /// The term with its factorials of negative arguments reflected, where over the whole range of k
  /// for large n they are negative integers and as many stand above as below; otherwise the term.
  static Form applied(Form term, Variable n, Variable k, Form lower, Form upper) {
    Map<Generator, Form> reflected = new HashMap<>();
    Rational balance = Rational.ZERO;
    for (Generator g : term.generators()) {
      if (g instanceof Factorial factorial
          && isNegative(factorial.argument(), n, k, lower, upper)) {
        Form argument = factorial.argument();
        Form mirrored = Form.of(new Factorial(argument.negated())).dividedBy(argument.negated());
        Form sign = Elementary.power(Form.MINUS_ONE, argument);
        reflected.put(g, sign.dividedBy(mirrored));
        balance = balance.plus(term.numerator().degree(g)).minus(term.denominator().degree(g));
      }
    }
    if (reflected.isEmpty() || !balance.isZero()) {
      return term;
    }
    return term.mapGenerators(g -> reflected.getOrDefault(g, Form.of(g)))
        .takingIntegers(List.of(n, k));
  }

  private static boolean isNegative(Form argument, Variable n, Variable k, Form lower, Form upper) {
    for (Form end : List.of(lower, upper)) {
      Optional<Line> line = Line.of(argument.substitute(k, end), n);
      boolean integral =
          line.isPresent() && line.get().slope().isInteger() && line.get().start().isInteger();
      if (!integral || line.get().signAtInfinity() >= 0) {
        return false;
      }
    }
    return true;
  }
}
