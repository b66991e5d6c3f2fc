package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.Optional;

/// Exact square roots of natural polynomials, term by term from the leading one.
final class PolynomialRoot {

  private PolynomialRoot() {}

  /// The square root with positive leading coefficient, when there is one.
  static Optional<Polynomial> square(Polynomial polynomial) {
    if (polynomial.isZero()) {
      return Optional.of(polynomial);
    }
    Term lead = polynomial.leadingTerm();
    Optional<Rational> first = square(lead.coefficient());
    Monomial monomial = lead.monomial().power(Rational.HALF);
    if (first.isEmpty() || !monomial.isNatural()) {
      return Optional.empty();
    }
    Polynomial root = Polynomial.of(monomial, first.get());
    Polynomial rest = polynomial.minus(root.times(root));
    Rational twice = first.get().times(Rational.TWO);
    while (!rest.isZero()) {
      Budget.checkpoint();
      Term top = rest.leadingTerm();
      Monomial quotient = top.monomial().dividedBy(monomial);
      if (!quotient.isNatural() || quotient.compareTo(monomial) >= 0) {
        return Optional.empty();
      }
      Polynomial next = Polynomial.of(quotient, top.coefficient().dividedBy(twice));
      rest = rest.minus(root.times(Rational.TWO).plus(next).times(next));
      root = root.plus(next);
    }
    return Optional.of(root);
  }

  private static Optional<Rational> square(Rational value) {
    Optional<BigInteger> numerator = Integers.root(value.numerator(), 2);
    Optional<BigInteger> denominator = Integers.root(value.denominator(), 2);
    return numerator.isPresent() && denominator.isPresent()
        ? Optional.of(Rational.of(numerator.get(), denominator.get()))
        : Optional.empty();
  }
}
