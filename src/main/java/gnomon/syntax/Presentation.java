package gnomon.syntax;

/// The forms that `in` knows by a word of their own.
public enum Presentation {
  /// In falling powers of the running variable.
  FALLING("falling"),
  /// In rising powers of the running variable.
  RISING("rising"),
  /// In binomials of the running variable.
  BINOMIALS("binomials"),
  /// As a product of irreducible factors.
  FACTORS("factors"),
  /// As a sum of partial fractions.
  PARTIAL_FRACTIONS("partial fractions"),
  /// Multiplied out.
  EXPANDED("expanded"),
  /// As a formula for TeX.
  TEX("tex");

  private final String words;

  Presentation(String words) {
    this.words = words;
  }

  /// The words of the language for it.
  public String words() {
    return words;
  }
}
