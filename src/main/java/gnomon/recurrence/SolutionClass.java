package gnomon.recurrence;

/// The classes of functions in which solutions are looked for.
public enum SolutionClass {
  /// Polynomials.
  POLYNOMIAL("polynomials"),
  /// Rational functions.
  RATIONAL("rational functions"),
  /// Sums of polynomials times exponentials.
  EXPONENTIAL_POLYNOMIAL("exponential polynomials"),
  /// Sums of rational functions times exponentials e^(bx).
  EXPONENTIAL_RATIONAL("rational functions times exponentials"),
  /// Sums of terms whose ratio t(n+1)/t(n) is a rational function of n.
  HYPERGEOMETRIC("sums of hypergeometric terms");

  private final String words;

  SolutionClass(String words) {
    this.words = words;
  }

  /// The class in words.
  public String words() {
    return words;
  }
}
