package gnomon.render;

/// A word of the language with its spellings; `latex` is a command or text of math mode.
public record Glyph(String unicode, String ascii, String latex) {
  /// The forward difference.
  public static final Glyph DELTA_FORWARD = new Glyph("Δ", "Delta", "\\Delta");

  /// The backward difference.
  public static final Glyph NABLA = new Glyph("∇", "Nabla", "\\nabla");

  /// The central difference.
  public static final Glyph DELTA_CENTRAL = new Glyph("δ", "delta", "\\delta");

  /// The central mean.
  public static final Glyph MU = new Glyph("μ", "mu", "\\mu");

  /// The integral from 0.
  public static final Glyph INTEGRAL = new Glyph("∫", "Integral", "\\textstyle\\int");

  /// The sum from 0, or with limits.
  public static final Glyph SIGMA = new Glyph("Σ", "Sigma", "\\Sigma");

  /// The product with limits.
  public static final Glyph PRODUCT = new Glyph("∏", "Prod", "\\prod");

  /// Evaluation at a point.
  public static final Glyph EPSILON = new Glyph("ε", "eps", "\\varepsilon");

  /// The circle constant.
  public static final Glyph PI = new Glyph("π", "pi", "\\pi");

  /// The upper limit that is never reached.
  public static final Glyph INFINITY = new Glyph("∞", "inf", "\\infty");

  /// The glyph for a word that has only one spelling.
  public static Glyph plain(String word) {
    return new Glyph(word, word, typeset(word));
  }

  /// The glyph for a word that LaTeX sets upright.
  public static Glyph upright(String word) {
    return new Glyph(word, word, "\\operatorname{" + word + "}");
  }

  /// The glyph for a function that LaTeX has a command for.
  public static Glyph command(String word) {
    return new Glyph(word, word, "\\" + word);
  }

  private static String typeset(String word) {
    int digits = word.length();
    while (digits > 1 && Character.isDigit(word.charAt(digits - 1))) {
      digits--;
    }
    String letters = word.substring(0, digits);
    String head = letters.length() == 1 ? letters : "\\mathit{" + letters + "}";
    return digits == word.length() ? head : head + "_{" + word.substring(digits) + "}";
  }
}
