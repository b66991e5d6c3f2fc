package gnomon.polynomial;

import gnomon.number.Rational;
import java.util.Map;
import java.util.TreeMap;

/// Turns fractional exponents into integers: every indeterminate is replaced by its smallest step
/// that occurs in the given polynomials.
final class Rescaling {

  private final Map<Indeterminate, Rational> steps = new TreeMap<>();

  private Rescaling(Polynomial... polynomials) {
    for (Polynomial polynomial : polynomials) {
      for (Term term : polynomial.terms()) {
        if (term.monomial().denominator != 1) {
          for (Monomial.Power power : term.monomial().factors()) {
            Rational step = Rational.of(power.exponent().denominator());
            steps.merge(power.indeterminate(), step, Rescaling::lcm);
          }
        }
      }
    }
    steps.values().removeIf(Rational::isOne);
  }

  static Rescaling of(Polynomial... polynomials) {
    return new Rescaling(polynomials);
  }

  /// Whether a fractional exponent occurs.
  static boolean isNeededFor(Polynomial polynomial) {
    return polynomial.terms().stream().anyMatch(term -> term.monomial().denominator != 1);
  }

  private static Rational lcm(Rational a, Rational b) {
    return Rational.of(Monomial.lcm(a.longValueExact(), b.longValueExact()));
  }

  /// The polynomial with integer exponents.
  Polynomial scale(Polynomial polynomial) {
    return steps.isEmpty() ? polynomial : polynomial.mapMonomials(m -> stretch(m, false));
  }

  /// The original of a scaled polynomial.
  Polynomial restore(Polynomial polynomial) {
    return steps.isEmpty() ? polynomial : polynomial.mapMonomials(m -> stretch(m, true));
  }

  private Monomial stretch(Monomial monomial, boolean back) {
    Monomial result = monomial;
    for (Map.Entry<Indeterminate, Rational> entry : steps.entrySet()) {
      Rational exponent = monomial.exponent(entry.getKey());
      if (!exponent.isZero()) {
        Rational factor = back ? entry.getValue().inverse() : entry.getValue();
        Rational change = exponent.times(factor).minus(exponent);
        result = result.times(Monomial.of(entry.getKey(), change));
      }
    }
    return result;
  }
}
