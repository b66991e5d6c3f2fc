package gnomon.polynomial;

import gnomon.number.Rational;

/// One term of a polynomial.
///
/// @param monomial the product of powers
/// @param coefficient its coefficient, not zero inside a polynomial
public record Term(Monomial monomial, Rational coefficient) {

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Term that
        && coefficient.equals(that.coefficient)
        && monomial.equals(that.monomial);
  }

  @Override
  public int hashCode() {
    return 31 * monomial.hashCode() + coefficient.hashCode();
  }
}
