package gnomon.console;

import java.util.List;
import java.util.function.Predicate;
import org.jline.reader.CompletingParsedLine;
import org.jline.reader.EOFError;
import org.jline.reader.ParsedLine;
import org.jline.reader.Parser;

/// Tells the line editor whether a statement goes on, and which word is to be completed.
record LineParser(Predicate<String> wantsMore) implements Parser {

  @Override
  public ParsedLine parse(String line, int cursor, ParseContext context) {
    boolean accepting = context == ParseContext.ACCEPT_LINE || context == ParseContext.UNSPECIFIED;
    if (accepting && Statements.isOpen(line, wantsMore)) {
      throw new EOFError(-1, -1, "the statement goes on");
    }
    return new Typed(line, cursor, pieceAt(line, cursor));
  }

  /// Names need no escapes in this language.
  @Override
  public boolean isEscapeChar(char sign) {
    return false;
  }

  private static Piece pieceAt(String line, int cursor) {
    for (Piece piece : Piece.of(line)) {
      boolean completes =
          piece.sort() == Piece.Sort.WORD
              || piece.sort() == Piece.Sort.TEXT
              || piece.sort() == Piece.Sort.COMMENT;
      if (piece.touches(cursor) && completes) {
        return piece;
      }
    }
    return new Piece(Piece.Sort.SPACE, "", cursor, cursor);
  }

  /// A line with the piece that the cursor is in; the piece is its only word.
  record Typed(String line, int cursor, Piece piece) implements CompletingParsedLine {
    @Override
    public String word() {
      return piece.text();
    }

    @Override
    public int wordCursor() {
      return cursor - piece.start();
    }

    @Override
    public int wordIndex() {
      return 0;
    }

    @Override
    public List<String> words() {
      return List.of(piece.text());
    }

    @Override
    public CharSequence escape(CharSequence candidate, boolean complete) {
      return candidate;
    }

    @Override
    public int rawWordCursor() {
      return wordCursor();
    }

    @Override
    public int rawWordLength() {
      return piece.text().length();
    }
  }
}
