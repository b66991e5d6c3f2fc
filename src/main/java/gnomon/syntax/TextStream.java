package gnomon.syntax;

import org.antlr.v4.runtime.CharStream;
import org.antlr.v4.runtime.IntStream;
import org.antlr.v4.runtime.misc.Interval;

/// A text as ANTLR reads it, indexed by UTF-16 units so that token places are source offsets.
final class TextStream implements CharStream {
  private final String text;
  private int position;

  TextStream(String text) {
    this.text = text;
  }

  @Override
  public String getText(Interval interval) {
    return text.substring(
        Math.min(interval.a, text.length()), Math.min(interval.b + 1, text.length()));
  }

  @Override
  public void consume() {
    if (position >= text.length()) {
      throw new IllegalStateException("cannot consume EOF");
    }
    position++;
  }

  @Override
  public int LA(int offset) {
    int index = position + (offset > 0 ? offset - 1 : offset);
    return offset == 0 || index < 0 || index >= text.length() ? IntStream.EOF : text.charAt(index);
  }

  @Override
  public int mark() {
    return -1;
  }

  @Override
  public void release(int marker) {}

  @Override
  public int index() {
    return position;
  }

  @Override
  public void seek(int index) {
    position = index;
  }

  @Override
  public int size() {
    return text.length();
  }

  @Override
  public String getSourceName() {
    return UNKNOWN_SOURCE_NAME;
  }
}
