package gnomon.console;

import gnomon.session.Word;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import org.jline.reader.Highlighter;
import org.jline.reader.LineReader;
import org.jline.utils.AttributedString;
import org.jline.utils.AttributedStringBuilder;
import org.jline.utils.AttributedStyle;

/// Marks the line that is being typed: words by their sort, the bracket pair at the cursor, closing
/// brackets that close nothing.
record Marking(Look look, Supplier<Vocabulary> vocabulary) implements Highlighter {

  @Override
  public AttributedString highlight(LineReader reader, String line) {
    List<Piece> pieces = Piece.of(line);
    Brackets brackets = Brackets.of(pieces);
    Set<Integer> pair = brackets.pairAt(reader.getBuffer().cursor());
    AttributedStringBuilder marked = new AttributedStringBuilder();
    for (Piece piece : pieces) {
      marked.styled(style(piece, pair, brackets.stray()), piece.text());
    }
    return marked.toAttributedString();
  }

  private AttributedStyle style(Piece piece, Set<Integer> pair, Set<Integer> stray) {
    return switch (piece.sort()) {
      case WORD, SIGN -> word(piece.text());
      case COMMENT -> look.small();
      case OPEN, CLOSE -> {
        if (stray.contains(piece.start())) {
          yield look.stray();
        }
        yield pair.contains(piece.start()) ? look.pair() : AttributedStyle.DEFAULT;
      }
      case NUMBER, TEXT, SPACE -> AttributedStyle.DEFAULT;
    };
  }

  private AttributedStyle word(String text) {
    Optional<Word> known = vocabulary.get().word(text);
    return known.map(word -> look.word(word.kind())).orElse(AttributedStyle.DEFAULT);
  }
}
