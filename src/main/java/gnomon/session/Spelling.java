package gnomon.session;

/// Which of the two spellings of the language answers are shown in.
public enum Spelling {
  /// With the glyphs of the trade.
  UNICODE,
  /// With ASCII characters only.
  ASCII
}
