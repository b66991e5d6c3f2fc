package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/// The values of Σ(k: lower..upper) summand at numbers n, added term by term, and the comparison of
/// a proposed closed form with them.
record SumValues(Form summand, Variable n, Variable k, Form lower, Form upper) {

  /// Values compared beyond those that a proof needs.
  private static final int SPARE = 4;

  /// The sum at n = point.
  Form at(BigInteger point) {
    Form value = Form.of(point);
    Form from = lower.substitute(n, value);
    Form to = upper.substitute(n, value);
    BigInteger count = to.minus(from).asInteger().orElseThrow().add(BigInteger.ONE);
    return count.signum() <= 0
        ? Form.ZERO
        : Terms.sum(summand.substitute(n, value), k, from, count.longValueExact());
  }

  /// The least n from which on a form holds that is proved for n ≥ proved, found by trying the
  /// values below, down to the empty sum at first − 1; nothing where a spot check at and above
  /// `proved`, with numbers for the parameters, fails.
  Optional<BigInteger> validFrom(Form form, BigInteger proved, BigInteger first) {
    if (!agrees(form, proved, numbers(7)) && !agrees(form, proved, numbers(1))) {
      return Optional.empty();
    }
    BigInteger begin = proved;
    while (begin.compareTo(first) >= 0 && agrees(form, begin.subtract(BigInteger.ONE))) {
      begin = begin.subtract(BigInteger.ONE);
    }
    return Optional.of(begin);
  }

  /// Whether the form has the values of the sum from a point on, with numbers for the parameters.
  private boolean agrees(Form form, BigInteger from, Map<Generator, Form> numbers) {
    try {
      SumValues sample = new SumValues(summand.substitute(numbers), n, k, lower, upper);
      Form value = form.substitute(numbers);
      for (int i = SPARE; i >= 0; i--) {
        if (!sample.agrees(value, from.add(BigInteger.valueOf(i)))) {
          return false;
        }
      }
      return true;
    } catch (Refusal _) {
      return false;
    }
  }

  /// Whether the form has the value of the sum at a point.
  private boolean agrees(Form form, BigInteger point) {
    try {
      return form.substitute(n, Form.of(point)).equals(at(point));
    } catch (Refusal _) {
      return false;
    }
  }

  /// Numbers to put in for the parameters in a spot check. Fractions avoid special values; whole
  /// numbers are for parameters in exponents, as of −1.
  private Map<Generator, Form> numbers(int denominator) {
    Map<Generator, Form> numbers = new HashMap<>();
    int next = 11;
    for (Variable parameter : summand.variables()) {
      if (!parameter.equals(n) && !parameter.equals(k)) {
        numbers.put(parameter, Form.of(Rational.of(next * next + 1L, denominator)));
        next += 2;
      }
    }
    return numbers;
  }
}
