package gnomon.console;

import gnomon.syntax.Lexemes;
import java.util.List;
import org.jline.reader.CompletingParsedLine;
import org.jline.reader.EOFError;
import org.jline.reader.ParsedLine;
import org.jline.reader.Parser;

/// Tells the line editor whether a statement goes on, and which word is to be completed.
final class LineParser implements Parser {

  @Override
  public ParsedLine parse(String line, int cursor, ParseContext context) {
    boolean accepting = context == ParseContext.ACCEPT_LINE || context == ParseContext.UNSPECIFIED;
    if (accepting && Statements.isOpen(line)) {
      throw new EOFError(-1, -1, "the statement goes on");
    }
    return typed(line, cursor);
  }

  /// Names need no escapes in this language.
  @Override
  public boolean isEscapeChar(char sign) {
    return false;
  }

  static Typed typed(String line, int cursor) {
    var file = FileNames.start(line.substring(0, Math.min(cursor, line.length())));
    if (file.isPresent()) {
      return new Typed(line, cursor, cursor - file.get().length(), cursor, true);
    }
    return Lexemes.wordAt(line, cursor)
        .map(word -> new Typed(line, cursor, word.span().start(), word.span().end(), false))
        .orElse(new Typed(line, cursor, cursor, cursor, false));
  }

  /// A line with the place of the word that the cursor is in, which may be empty; that word is its
  /// only one. `isFile` says that a file name is expected there.
  record Typed(String line, int cursor, int start, int end, boolean isFile)
      implements CompletingParsedLine {
    /// What stands before the cursor of the word.
    String beginning() {
      return line.substring(start, cursor);
    }

    @Override
    public String word() {
      return line.substring(start, end);
    }

    @Override
    public int wordCursor() {
      return cursor - start;
    }

    @Override
    public int wordIndex() {
      return 0;
    }

    @Override
    public List<String> words() {
      return List.of(word());
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
      return end - start;
    }
  }
}
