package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;

/// The relation (−1)^(2n) = 1 of integer n, applied where the exponents are known to be integers.
final class IntegerPowers {
  private IntegerPowers() {}

  static Form reduce(Form given, Collection<Variable> integers) {
    Form form = IntegerReflection.reduce(given, integers);
    List<Exponential> signs = new ArrayList<>();
    for (Generator g : form.generators()) {
      if (g instanceof Exponential power && isSign(power, integers)) {
        signs.add(power);
      }
    }
    Form result = form;
    for (Exponential sign : signs) {
      result = reduce(result, sign);
    }
    return result;
  }

  /// Whether the kernel is −1 to a product of integer variables.
  private static boolean isSign(Exponential power, Collection<Variable> integers) {
    if (!(power.base() instanceof Base.Turn) || !power.unit().isPolynomial()) {
      return false;
    }
    for (Indeterminate g : power.unit().numerator().indeterminates()) {
      if (!(g instanceof Variable v) || !integers.contains(v)) {
        return false;
      }
    }
    return true;
  }

  private static Form reduce(Form form, Exponential sign) {
    Polynomial top = modulo(form.numerator(), sign);
    Polynomial bottom = modulo(form.denominator(), sign);
    if (bottom.isZero()) {
      throw new Refusal(Reason.ZERO_DIVISOR, new Form(form.denominator(), Polynomial.ONE));
    }
    if (bottom.contains(sign)) {
      Polynomial conjugate = conjugate(bottom, sign);
      Polynomial product = modulo(bottom.times(conjugate), sign);
      if (product.isZero()) {
        throw new Refusal(Reason.ZERO_DIVISOR, new Form(bottom, Polynomial.ONE));
      }
      top = modulo(top.times(conjugate), sign);
      bottom = product;
    }
    return Reduction.fraction(top, bottom);
  }

  /// The polynomial with each exponent of the sign brought into [0, 2).
  private static Polynomial modulo(Polynomial polynomial, Exponential sign) {
    List<Term> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Rational exponent = term.monomial().exponent(sign);
      Rational turns = Rational.of(exponent.times(Rational.HALF).floor());
      Rational rest = exponent.minus(turns.times(Rational.TWO));
      Monomial without = term.monomial().without(sign);
      Monomial monomial = rest.isZero() ? without : without.times(Monomial.of(sign, rest));
      terms.add(new Term(monomial, term.coefficient()));
    }
    return Polynomial.ofTerms(terms);
  }

  /// For a + b s with s² = 1 the conjugate a − b s; for a single term the reciprocal power.
  private static Polynomial conjugate(Polynomial polynomial, Exponential sign) {
    List<Term> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Rational exponent = term.monomial().exponent(sign);
      if (polynomial.size() == 1) {
        Rational rest = Rational.TWO.minus(exponent);
        return Polynomial.of(Monomial.of(sign, rest), Rational.ONE);
      }
      if (!exponent.isZero() && !exponent.isOne()) {
        return Polynomial.ONE;
      }
      Rational c = term.coefficient();
      terms.add(new Term(term.monomial(), exponent.isZero() ? c : c.negated()));
    }
    return Polynomial.ofTerms(terms);
  }
}
