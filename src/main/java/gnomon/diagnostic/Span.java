package gnomon.diagnostic;

/// A stretch of a source text, from `start` (included) to `end` (excluded), in UTF-16 units. An
/// empty span stands for a place between two characters.
public record Span(int start, int end) {
  /// The place before the first character, for trees that come from no text.
  public static final Span NONE = new Span(0, 0);

  /// @throws IllegalArgumentException unless 0 <= start <= end
  public Span {
    if (start < 0 || end < start) {
      throw new IllegalArgumentException("a span from " + start + " to " + end);
    }
  }

  /// The empty span at `offset`.
  public static Span at(int offset) {
    return new Span(offset, offset);
  }

  /// The smallest span that holds this one and `other`.
  public Span to(Span other) {
    return new Span(Math.min(start, other.start), Math.max(end, other.end));
  }

  /// The number of UTF-16 units in the span.
  public int length() {
    return end - start;
  }
}
