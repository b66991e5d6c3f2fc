package gnomon.console;

import gnomon.session.Word;
import gnomon.syntax.Lexeme;
import gnomon.syntax.Lexemes;
import java.util.List;
import java.util.Set;
import java.util.function.Supplier;
import org.jline.reader.Highlighter;
import org.jline.reader.LineReader;
import org.jline.utils.AttributedString;
import org.jline.utils.AttributedStringBuilder;
import org.jline.utils.AttributedStyle;

/// Marks the line that is being typed: words by their sort, the bracket pair at the cursor, closing
/// brackets that close nothing.
record Marking(Look look, Supplier<KnownWords> words) implements Highlighter {

  @Override
  public AttributedString highlight(LineReader reader, String line) {
    if (line.isEmpty()) {
      return AttributedString.EMPTY;
    }
    return marked(line, reader.getBuffer().cursor());
  }

  AttributedString marked(String line, int cursor) {
    List<Lexeme> lexemes = Lexemes.of(line);
    Brackets brackets = Brackets.of(lexemes);
    Set<Integer> pair = brackets.pairAt(cursor);
    AttributedStringBuilder marked = new AttributedStringBuilder();
    int done = 0;
    for (Lexeme lexeme : lexemes) {
      int start = lexeme.span().start();
      int end = lexeme.span().end();
      marked.append(line.substring(done, start));
      marked.styled(style(lexeme, pair, brackets.stray()), line.substring(start, end));
      done = end;
    }
    return marked.append(line.substring(done)).toAttributedString();
  }

  private AttributedStyle style(Lexeme lexeme, Set<Integer> pair, Set<Integer> stray) {
    return switch (lexeme.role()) {
      case OPERATOR -> look.word(Word.Kind.OPERATOR);
      case FUNCTION -> look.word(Word.Kind.FUNCTION);
      case CONSTANT -> look.word(Word.Kind.CONSTANT);
      case STATEMENT -> look.word(Word.Kind.STATEMENT);
      case CLAUSE -> look.word(Word.Kind.CLAUSE);
      case NAME ->
          words
              .get()
              .word(lexeme.text())
              .map(word -> look.word(word.kind()))
              .orElse(AttributedStyle.DEFAULT);
      case COMMENT -> look.small();
      case OPEN, CLOSE -> bracket(lexeme.span().start(), pair, stray);
      case NUMBER, SIGN, HANDLE, STRING, FOREIGN -> AttributedStyle.DEFAULT;
    };
  }

  private AttributedStyle bracket(int at, Set<Integer> pair, Set<Integer> stray) {
    if (stray.contains(at)) {
      return look.stray();
    }
    return pair.contains(at) ? look.pair() : AttributedStyle.DEFAULT;
  }
}
