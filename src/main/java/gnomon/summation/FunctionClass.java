package gnomon.summation;

/// The classes of functions that solvers of the summation room decide or search.
public enum FunctionClass {
  /// Polynomials in the variable of summation.
  POLYNOMIAL("polynomials"),
  /// Finite sums of b^x times a polynomial, where b is free of the variable of summation.
  EXPONENTIAL_POLYNOMIAL("exponential polynomials"),
  /// Rational functions of the variable of summation.
  RATIONAL("rational functions"),
  /// Rational functions together with harmonic numbers H(x + c, r) with constant coefficients.
  RATIONAL_WITH_HARMONIC_NUMBERS("rational functions with harmonic numbers"),
  /// Terms whose ratio t(x+1)/t(x) is a rational function of x.
  HYPERGEOMETRIC("hypergeometric terms"),
  /// Sums of products of a hypergeometric term with a rational function of x and of harmonic
  /// numbers: those of the summand, and any further harmonic numbers H(x + c, r).
  HYPERGEOMETRIC_WITH_HARMONIC_NUMBERS("hypergeometric terms with harmonic numbers"),
  /// Sums of functions of the classes above, each summed on its own.
  MIXED("sums of functions of several classes");

  private final String words;

  FunctionClass(String words) {
    this.words = words;
  }

  /// The class in words.
  public String words() {
    return words;
  }
}
