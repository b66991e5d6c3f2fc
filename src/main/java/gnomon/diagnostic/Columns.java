package gnomon.diagnostic;

/// How many terminal columns a character takes: 0 for combining marks and controls, 2 for East
/// Asian wide and emoji, else 1.
///
/// Left out: ambiguous-width characters (Greek and mathematical signs among them) count as 1, as
/// terminals outside East Asian locales show them.
///
/// Source: Unicode Standard Annex 11, East Asian Width (the wide blocks, from memory).
public final class Columns {
  /// First and last code points of the wide ranges, in order.
  private static final int[][] WIDE = {
    {0x1100, 0x115F},
    {0x2329, 0x232A},
    {0x2E80, 0x303E},
    {0x3041, 0x33FF},
    {0x3400, 0x4DBF},
    {0x4E00, 0x9FFF},
    {0xA000, 0xA4CF},
    {0xA960, 0xA97F},
    {0xAC00, 0xD7A3},
    {0xF900, 0xFAFF},
    {0xFE10, 0xFE19},
    {0xFE30, 0xFE6F},
    {0xFF00, 0xFF60},
    {0xFFE0, 0xFFE6},
    {0x16FE0, 0x18CFF},
    {0x1B000, 0x1B2FF},
    {0x1F300, 0x1F64F},
    {0x1F680, 0x1F6FF},
    {0x1F900, 0x1FAFF},
    {0x20000, 0x3FFFD}
  };

  private Columns() {}

  /// The columns that `codePoint` takes.
  public static int of(int codePoint) {
    return switch (Character.getType(codePoint)) {
      case Character.NON_SPACING_MARK,
          Character.ENCLOSING_MARK,
          Character.FORMAT,
          Character.CONTROL ->
          0;
      default -> isWide(codePoint) ? 2 : 1;
    };
  }

  /// The columns that `text` takes.
  public static int of(String text) {
    return text.codePoints().map(Columns::of).sum();
  }

  private static boolean isWide(int codePoint) {
    for (int[] range : WIDE) {
      if (codePoint >= range[0] && codePoint <= range[1]) {
        return true;
      }
    }
    return false;
  }
}
