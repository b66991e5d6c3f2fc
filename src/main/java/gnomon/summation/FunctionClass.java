package gnomon.summation;

/// The classes of functions that solvers of the summation room decide or search.
public enum FunctionClass {
  /// Polynomials in the variable of summation.
  POLYNOMIAL,
  /// Finite sums of b^x times a polynomial, where b is free of the variable of summation.
  EXPONENTIAL_POLYNOMIAL,
  /// Rational functions of the variable of summation.
  RATIONAL,
  /// Rational functions together with harmonic numbers H(x + c, r) with constant coefficients.
  RATIONAL_WITH_HARMONIC_NUMBERS,
  /// Terms whose ratio t(x+1)/t(x) is a rational function of x.
  HYPERGEOMETRIC,
  /// Sums of functions of the classes above, each summed on its own.
  MIXED
}
