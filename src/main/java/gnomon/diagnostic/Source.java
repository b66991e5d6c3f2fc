package gnomon.diagnostic;

/// A text and where it came from. `firstLine` is the number of its first line, so that a statement
/// cut out of a file still knows its place there.
public record Source(String name, String text, int firstLine) {
  /// @throws IllegalArgumentException if `firstLine` is not positive
  public Source {
    if (firstLine < 1) {
      throw new IllegalArgumentException("lines count from 1, not from " + firstLine);
    }
  }

  /// A text whose first line is line 1.
  public Source(String name, String text) {
    this(name, text, 1);
  }

  /// The number of the line that holds `offset`.
  public int lineAt(int offset) {
    int line = firstLine;
    for (int at = 0; at < clamp(offset); at++) {
      if (text.charAt(at) == '\n') {
        line++;
      }
    }
    return line;
  }

  /// The column of `offset`, in code points from 1.
  public int columnAt(int offset) {
    return text.codePointCount(lineStart(offset), clamp(offset)) + 1;
  }

  /// The offset at which the line that holds `offset` begins.
  public int lineStart(int offset) {
    return text.lastIndexOf('\n', clamp(offset) - 1) + 1;
  }

  /// The offset at which the line that holds `offset` ends, before its line break.
  public int lineEnd(int offset) {
    int end = text.indexOf('\n', clamp(offset));
    int stop = end < 0 ? text.length() : end;
    return stop > lineStart(offset) && text.charAt(stop - 1) == '\r' ? stop - 1 : stop;
  }

  /// The part of the text in `span`, cut to what is there.
  public String slice(Span span) {
    return text.substring(clamp(span.start()), clamp(span.end()));
  }

  private int clamp(int offset) {
    return Math.clamp(offset, 0, text.length());
  }
}
