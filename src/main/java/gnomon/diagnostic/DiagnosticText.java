package gnomon.diagnostic;

/// The plain-text layout of a diagnostic:
///
/// ```text
/// line 2, column 10: Delta has a kernel
///   2 | claim ln(Delta) = D
///     |          ^^^^^
///   Delta sends constants to 0.
///   Try: ln(1 + Delta)
/// ```
///
/// A source line wider than the page is shown around its carets, with an ellipsis where it is cut.
public final class DiagnosticText {
  /// The page width that files and tests use.
  public static final int PAGE = 80;

  private static final int MARGIN = 8;

  private DiagnosticText() {}

  /// The lines for `diagnostic` in `source` on a page of [#PAGE] columns, without a final break.
  public static String of(Diagnostic diagnostic, Source source) {
    return of(diagnostic, source, PAGE);
  }

  /// The lines for `diagnostic` in `source` on a page of `width` columns, without a final break.
  public static String of(Diagnostic diagnostic, Source source, int width) {
    int start = diagnostic.span().start();
    int line = source.lineAt(start);
    StringBuilder text = new StringBuilder();
    text.append("line ").append(line).append(", column ").append(source.columnAt(start));
    text.append(": ").append(diagnostic.message());
    String number = Integer.toString(line);
    Excerpt excerpt = Excerpt.of(diagnostic.span(), source, Math.max(width, 40) - MARGIN);
    text.append("\n  ").append(number).append(" | ").append(excerpt.line());
    text.append("\n  ").append(" ".repeat(number.length())).append(" | ").append(excerpt.carets());
    for (String evidence : diagnostic.evidence()) {
      text.append("\n  ").append(evidence);
    }
    diagnostic.hint().ifPresent(hint -> text.append("\n  Try: ").append(hint));
    return text.toString();
  }
}
