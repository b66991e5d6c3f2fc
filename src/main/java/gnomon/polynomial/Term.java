package gnomon.polynomial;

import gnomon.number.Rational;

/// One term of a polynomial.
///
/// @param monomial the product of powers
/// @param coefficient its coefficient, not zero inside a polynomial
public record Term(Monomial monomial, Rational coefficient) {}
