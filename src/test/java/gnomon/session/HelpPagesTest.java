package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.syntax.Vocabulary;
import gnomon.syntax.Word;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// The help pages: one for every word and sign, each with examples that answer as recorded.
final class HelpPagesTest {
  private final HelpPages pages = HelpPages.bundled();

  @Test
  void everyWordOfTheLanguageHasAPage() {
    List<String> missing =
        Vocabulary.words().stream()
            .map(Word::ascii)
            .filter(word -> pages.page(word).isEmpty())
            .toList();
    assertEquals(List.of(), missing);
  }

  @Test
  void glyphsLeadToTheSamePages() {
    for (Word word : Vocabulary.words()) {
      word.glyph().ifPresent(glyph -> assertEquals(pages.page(word.ascii()), pages.page(glyph)));
    }
  }

  @Test
  void everyPageHasExamplesThatAnswerAsRecorded(@TempDir Path folder) {
    List<String> different = new ArrayList<>();
    for (HelpPage page : pages.all()) {
      assertTrue(!page.examples().isEmpty(), page.word() + " has an example");
      String text = String.join("\n", page.examples());
      RecheckReport report =
          Recheck.check(Path.of(page.word()), text, Settings.batch().withFolder(folder));
      if (report.count(RecheckReport.Outcome.SAME) != report.items().size()) {
        different.addAll(report.lines());
      }
    }
    assertEquals(List.of(), different);
  }

  @Test
  void helpShowsThePageOfAWordInEitherSpelling() {
    Session session = Session.of(Settings.batch());
    assertEquals(session.submit("help Delta"), session.submit("help Δ"));
    assertTrue(session.submit("help Delta") instanceof Reply.Page);
    assertTrue(session.submit("help nonsense") instanceof Reply.Failure);
  }
}
