package gnomon.syntax;

/// How words that have a glyph are written.
public enum Spelling {
  /// With the glyph: `Δ`, `x↓n`.
  UNICODE,
  /// In ASCII: `Delta`, `x|_n`.
  ASCII
}
