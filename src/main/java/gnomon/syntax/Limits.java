package gnomon.syntax;

/// How large a statement may be.
public final class Limits {
  /// The characters of a statement.
  public static final int LENGTH = 200_000;

  /// How deep brackets may stand in brackets.
  public static final int NESTING = 200;

  /// How deep parts may stand in parts of any sort, so that no walk over a tree overflows the
  /// stack.
  public static final int HEIGHT = 1_200;

  /// The digits of one number.
  public static final int DIGITS = 50_000;

  private Limits() {}
}
