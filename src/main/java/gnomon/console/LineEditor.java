package gnomon.console;

import gnomon.diagnostic.Columns;
import gnomon.session.Word;
import gnomon.syntax.Lexemes;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jline.reader.impl.LineReaderImpl;
import org.jline.terminal.Terminal;
import org.jline.utils.AttributedString;
import org.jline.utils.AttributedStringBuilder;

/// The line editor, which shows below the line what the word at the cursor means.
final class LineEditor extends LineReaderImpl {
  private static final int MARGIN = 2;
  private static final Pattern SEARCH =
      Pattern.compile("(failing )?(?:bck|fwd)-i-search: (.*)_", Pattern.DOTALL);

  private final Look look;
  private final Supplier<KnownWords> words;

  LineEditor(Terminal terminal, Look look, Supplier<KnownWords> words) throws IOException {
    super(terminal, "gnomon", null);
    this.look = look;
    this.words = words;
  }

  @Override
  public AttributedString getDisplayedBufferWithPrompts(List<AttributedString> secondaryPrompts) {
    boolean wanted = doAutosuggestion && post == null && !look.plain();
    nameTheSearch();
    AttributedString line = super.getDisplayedBufferWithPrompts(secondaryPrompts);
    Optional<String> hint = wanted ? hint(buf.toString(), buf.cursor()) : Optional.empty();
    if (hint.isEmpty()) {
      return line;
    }
    AttributedStringBuilder all = new AttributedStringBuilder();
    all.append(line).append("\n");
    all.styled(look.small(), cut("  " + hint.get(), Look.width(terminal) - MARGIN));
    return all.toAttributedString();
  }

  /// Says in words that the history is being searched, where the library has an abbreviation.
  private void nameTheSearch() {
    if (post != null) {
      String below = post.get().toString();
      Matcher search = SEARCH.matcher(below);
      if (search.matches()) {
        String found = search.group(1) == null ? "in the history: " : "not in the history: ";
        AttributedString text = new AttributedString("  " + found + search.group(2), look.small());
        post = () -> text;
      }
    }
  }

  /// What the word at the cursor means, in one line; both spellings where there are two.
  Optional<String> hint(String text, int cursor) {
    return Lexemes.of(text).stream()
        .filter(lexeme -> lexeme.span().start() < cursor && cursor <= lexeme.span().end())
        .findFirst()
        .flatMap(lexeme -> words.get().word(lexeme.text()))
        .map(this::explain);
  }

  private String explain(Word word) {
    boolean twoSpellings = !look.isAscii() && !word.spelling().equals(word.ascii());
    String name = twoSpellings ? word.spelling() + " " + word.ascii() : word.ascii();
    return name + ": " + word.description();
  }

  private String cut(String text, int width) {
    if (Columns.of(text) <= width) {
      return text;
    }
    String end = look.isAscii() ? "..." : "…";
    int length = text.length();
    while (length > 0 && Columns.of(text.substring(0, length)) + Columns.of(end) > width) {
      length = text.offsetByCodePoints(length, -1);
    }
    return text.substring(0, length) + end;
  }
}
