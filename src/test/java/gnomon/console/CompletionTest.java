package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.session.Session;
import gnomon.session.Settings;
import gnomon.session.Spelling;
import gnomon.session.Word;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jline.reader.Candidate;
import org.jline.utils.AttributedStyle;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class CompletionTest {
  private static final Look GLYPHS = new Look(Spelling.UNICODE, false, false);
  private static final Look LETTERS = new Look(Spelling.ASCII, false, false);

  @TempDir Path folder;
  private final Session session = Session.of(Settings.console());

  @Test
  void aSpellingBecomesItsGlyph() {
    assertEquals(List.of("Δ"), values(GLYPHS, "3 Del"));
    assertEquals(List.of("Delta"), values(LETTERS, "3 Del"));
  }

  @Test
  void namesThatAreDefinedAreOffered() {
    session.submit("let terrace = x^2");
    assertEquals(List.of("terrace"), values(GLYPHS, "1 + terr"));
  }

  @Test
  void everyCandidateHasADescription() {
    for (Candidate candidate : candidates(GLYPHS, "")) {
      assertFalse(candidate.descr().isBlank(), candidate.value());
      assertEquals(1, candidate.descr().lines().count(), candidate.value());
    }
  }

  @Test
  void completionStartsInTheMiddleOfALine() {
    LineParser.Typed typed = LineParser.typed("Del x", 3);
    assertEquals("Del", typed.word());
    assertEquals(0, typed.start());
  }

  @Test
  void filesAreOfferedWhereAStatementTakesOne() throws IOException {
    Files.createFile(folder.resolve("east.gnomon"));
    Files.createDirectory(folder.resolve("eaves"));
    assertEquals(List.of("\"east.gnomon\"", "\"eaves/"), values(GLYPHS, "recheck \"ea"));
    assertEquals(List.of("\"east.gnomon\""), values(GLYPHS, "keep \"east"));
    assertTrue(values(GLYPHS, "Delta \"ea").isEmpty());
  }

  @Test
  void eachSortOfWordHasAStyleWithoutColour() {
    Set<AttributedStyle> styles = new HashSet<>();
    for (Word.Kind kind :
        List.of(
            Word.Kind.OPERATOR,
            Word.Kind.FUNCTION,
            Word.Kind.CONSTANT,
            Word.Kind.STATEMENT,
            Word.Kind.NAME)) {
      styles.add(GLYPHS.word(kind));
    }
    assertEquals(5, styles.size());
  }

  @Test
  void bracketsOfAPairAreMarkedAtTheCursor() {
    Marking marking = new Marking(GLYPHS, this::words);
    var line = marking.marked("D(x]", 2);
    assertEquals(GLYPHS.stray(), line.styleAt(3));
    var pair = marking.marked("D(x)", 4);
    assertEquals(GLYPHS.pair(), pair.styleAt(1));
    assertEquals(GLYPHS.pair(), pair.styleAt(3));
    assertEquals(GLYPHS.word(Word.Kind.OPERATOR), pair.styleAt(0));
  }

  private List<String> values(Look look, String line) {
    return candidates(look, line).stream().map(Candidate::value).toList();
  }

  private List<Candidate> candidates(Look look, String line) {
    return new Completion(look, this::words, folder)
        .candidates(LineParser.typed(line, line.length()));
  }

  private KnownWords words() {
    return KnownWords.of(session.words());
  }
}
