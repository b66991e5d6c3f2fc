package gnomon.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.diagnostic.Source;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/// `grammar/LANGUAGE.md` says what the grammar reads.
final class LanguagePageTest {
  private static final Path PAGE = Path.of("grammar/LANGUAGE.md");
  private static final Pattern BLOCK = Pattern.compile("(?ms)^```gnomon\\n(.*?)^```$");
  private static final Pattern CODE = Pattern.compile("`([^`\\n]+)`");

  /// Code on the page that is no statement: words and signs alone, prompts, and what is answered.
  private static final Set<String> FRAGMENTS =
      Set.of(
          "let",
          "/b",
          "<",
          ">",
          "=",
          "≥",
          "≤",
          "≠",
          "vary",
          "arbitrary",
          "umbra",
          "umbra B with …",
          "eval(…)",
          "given",
          "rerecord",
          "in",
          "to",
          "at",
          "for",
          "^",
          "*",
          "/",
          ">=",
          "<=",
          "!=",
          "|",
          "∟ ",
          "_| ",
          "· ",
          ". ",
          "gnomon",
          "Gnomon.g4",
          "*.gnomon",
          "same",
          "same value, written differently",
          "differs",
          "failed",
          "closed form",
          "recurrence",
          "no closed form",
          "left as a sum",
          "n!!");

  @Test
  void everyLineOfTheTourIsRead() throws IOException {
    List<String> statements =
        BLOCK
            .matcher(Files.readString(PAGE))
            .results()
            .flatMap(block -> SessionFile.parse(block.group(1)).exchanges().stream())
            .map(SessionFile.Exchange::statement)
            .toList();
    assertTrue(statements.size() > 30, statements.size() + " statements");
    statements.forEach(LanguagePageTest::assertRead);
  }

  @Test
  void everyCodeSpanIsReadSaveTheFragments() throws IOException {
    Set<String> unread = new TreeSet<>();
    for (String code : spans()) {
      String statement = code.startsWith("… ") ? "f" + code.substring(1) : code;
      if (!(StatementReader.read(new Source("page", statement)) instanceof Reading.Understood)) {
        unread.add(code);
      }
    }
    Set<String> known = new TreeSet<>(FRAGMENTS);
    unread.removeAll(FRAGMENTS);
    assertEquals(Set.of(), unread);
    known.removeAll(spans());
    assertEquals(Set.of(), known, "listed as fragments but not on the page");
  }

  @Test
  void everyWordOfTheLanguageIsOnThePage() throws IOException {
    String page = Files.readString(PAGE);
    Set<String> words =
        Pattern.compile("\\p{L}[\\p{L}\\p{N}]*")
            .matcher(page)
            .results()
            .map(word -> word.group())
            .collect(Collectors.toSet());
    for (Word word : Vocabulary.words()) {
      boolean sign = !Character.isLetter(word.ascii().charAt(0));
      assertTrue(sign ? page.contains(word.ascii()) : words.contains(word.ascii()), word.ascii());
      assertTrue(page.contains(word.glyph().orElse("")), word.ascii());
    }
  }

  @Test
  void everyWordInTheGrammarIsInTheVocabulary() throws IOException {
    String grammar = Files.readString(Path.of("grammar/Gnomon.g4")).replaceAll("//.*", "");
    List<String> literals =
        Pattern.compile("'([a-z]+)'").matcher(grammar).results().map(m -> m.group(1)).toList();
    assertTrue(literals.size() > 25, literals.toString());
    for (String literal : literals) {
      assertTrue(Vocabulary.isReserved(literal), literal);
    }
  }

  private static List<String> spans() throws IOException {
    String page = BLOCK.matcher(Files.readString(PAGE)).replaceAll("");
    List<String> spans = new ArrayList<>();
    for (String line : page.lines().toList()) {
      if (!line.startsWith("    ")) {
        CODE.matcher(line).results().map(m -> m.group(1)).forEach(spans::add);
      }
    }
    assertTrue(spans.size() > 120, spans.size() + " spans");
    return spans;
  }

  private static void assertRead(String statement) {
    assertInstanceOf(
        Reading.Understood.class, StatementReader.read(new Source("page", statement)), statement);
  }
}
