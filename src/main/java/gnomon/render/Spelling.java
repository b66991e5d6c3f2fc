package gnomon.render;

/// The three ways in which the same notation is spelled.
public enum Spelling {
  /// With the glyphs of the trade, such as `Δ` and `x↓3`.
  UNICODE,
  /// With ASCII characters only, such as `Delta` and `x|_3`.
  ASCII,
  /// For typesetting, with the commands of LaTeX and amsmath.
  LATEX
}
