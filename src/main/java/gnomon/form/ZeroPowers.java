package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.List;

/// The power 0^x, which is 1 at x = 0 and 0 at every other x where it is defined: it is its own
/// square, and whatever multiplies it may be taken at x = 0.
final class ZeroPowers {
  private ZeroPowers() {}

  static Form normal(Polynomial numerator, Polynomial denominator) {
    Exponential zero = null;
    for (Indeterminate g : numerator.indeterminates()) {
      if (Reduction.isZeroPower(g)) {
        zero = (Exponential) g;
      }
    }
    List<Term> with = new ArrayList<>();
    List<Term> without = new ArrayList<>();
    for (Term term : numerator.terms()) {
      if (term.monomial().exponent(zero).isZero()) {
        without.add(term);
      } else {
        with.add(new Term(term.monomial().without(zero), term.coefficient()));
      }
    }
    Generator x =
        zero.unit()
            .asGenerator()
            .filter(Variable.class::isInstance)
            .orElseThrow(() -> new Refusal(Reason.ZERO_DIVISOR, Form.ZERO));
    Form rest = Reduction.fraction(Polynomial.ofTerms(without), denominator);
    Form factor =
        Reduction.fraction(Polynomial.ofTerms(with), denominator).substitute(x, Form.ZERO);
    return combined(rest, factor, zero);
  }

  private static Form combined(Form rest, Form factor, Exponential zero) {
    if (factor.isZero()) {
      return rest;
    }
    Polynomial kernel = Polynomial.of(Monomial.of(zero, Rational.ONE), Rational.ONE);
    Polynomial left = rest.numerator().times(factor.denominator());
    Polynomial right = factor.numerator().times(rest.denominator()).times(kernel);
    return Reduction.cancel(left.plus(right), rest.denominator().times(factor.denominator()));
  }
}
