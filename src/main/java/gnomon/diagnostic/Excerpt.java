package gnomon.diagnostic;

/// A source line, cut to a width, and the carets under the part that a span marks. Controls and
/// tabs are shown as one space each so that both lines keep step.
record Excerpt(String line, String carets) {
  private static final String CUT = "…";

  /// The first line that `span` touches, on at most `width` columns.
  static Excerpt of(Span span, Source source, int width) {
    int start = source.lineStart(span.start());
    int end = source.lineEnd(span.start());
    String whole = printable(source.text().substring(start, end));
    int from = Math.clamp(span.start() - start, 0, whole.length());
    int to = Math.clamp(span.end() - start, from, whole.length());
    if (Columns.of(whole) <= width) {
      return marked(whole, from, to);
    }
    return window(whole, from, to, width);
  }

  private static Excerpt marked(String line, int from, int to) {
    int carets = Math.max(1, Columns.of(line.substring(from, to)));
    return new Excerpt(line, " ".repeat(Columns.of(line.substring(0, from))) + "^".repeat(carets));
  }

  private static Excerpt window(String whole, int from, int to, int width) {
    int room = width - 2;
    int left = from;
    int before = room / 2;
    while (left > 0 && before - Columns.of(whole.codePointBefore(left)) >= 0) {
      int codePoint = whole.codePointBefore(left);
      before -= Columns.of(codePoint);
      left -= Character.charCount(codePoint);
    }
    int right = left;
    int used = 0;
    while (right < whole.length() && used + Columns.of(whole.codePointAt(right)) <= room) {
      int codePoint = whole.codePointAt(right);
      used += Columns.of(codePoint);
      right += Character.charCount(codePoint);
    }
    String head = left > 0 ? CUT : "";
    String tail = right < whole.length() ? CUT : "";
    int shift = head.length() - left;
    int last = Math.max(from, Math.min(to, right));
    return marked(head + whole.substring(left, right) + tail, from + shift, last + shift);
  }

  private static String printable(String line) {
    StringBuilder clean = new StringBuilder(line.length());
    for (int at = 0; at < line.length(); at++) {
      char c = line.charAt(at);
      boolean lone =
          Character.isSurrogate(c)
              && !(Character.isHighSurrogate(c)
                  && at + 1 < line.length()
                  && Character.isLowSurrogate(line.charAt(at + 1)))
              && !(Character.isLowSurrogate(c)
                  && at > 0
                  && Character.isHighSurrogate(line.charAt(at - 1)));
      clean.append(Character.isISOControl(c) || lone ? ' ' : c);
    }
    return clean.toString();
  }
}
