package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.syntax.SessionFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/// Transcripts under `src/test/resources/gnomon/session`: every answer is as recorded, letter by
/// letter, and a third of the answers at least are errors.
final class GoldenTranscriptsTest {
  private static final Path FOLDER = Path.of("src/test/resources/gnomon/session");

  private static List<Path> transcripts() throws IOException {
    try (Stream<Path> files = Files.list(FOLDER)) {
      return files.filter(file -> file.toString().endsWith(".gnomon")).sorted().toList();
    }
  }

  @Test
  void everyAnswerIsAsRecorded() throws IOException {
    List<String> different = new ArrayList<>();
    for (Path file : transcripts()) {
      RecheckReport report = Recheck.check(file, Files.readString(file), Settings.batch());
      if (report.count(RecheckReport.Outcome.SAME) != report.items().size()) {
        different.addAll(report.lines());
      }
    }
    assertEquals(List.of(), different);
  }

  @Test
  void aThirdOfTheAnswersAreErrors() throws IOException {
    int answers = 0;
    int errors = 0;
    for (Path file : transcripts()) {
      for (SessionFile.Exchange exchange : SessionFile.parse(Files.readString(file)).exchanges()) {
        answers++;
        if (!exchange.answer().isEmpty() && exchange.answer().getFirst().startsWith("error ")) {
          errors++;
        }
      }
    }
    assertTrue(answers > 150, answers + " answers");
    assertTrue(3 * errors >= answers, errors + " errors of " + answers);
  }

  /// What is shown reads back as the same value, in both spellings.
  @Test
  void whatIsShownReadsBack() throws IOException {
    List<String> different = new ArrayList<>();
    for (Path file : transcripts()) {
      for (Spelling spelling : Spelling.values()) {
        Session session = Session.of(Settings.batch());
        for (SessionFile.Exchange exchange :
            SessionFile.parse(Files.readString(file)).exchanges()) {
          State before = session.state();
          if (session.submit(exchange.statement()) instanceof Reply.Answer answer
              && readsBack(answer.shown().sort())) {
            ShownValue shown = (ShownValue) answer.shown();
            String text = String.join("\n", shown.lines(spelling));
            if (session.reading(before, text).filter(shown.value()::sameAs).isEmpty()) {
              different.add(exchange.statement() + " shown as " + text);
            }
          }
        }
      }
    }
    assertEquals(List.of(), different);
  }

  private static boolean readsBack(String sort) {
    return !sort.equals("verdict") && !sort.equals("formula");
  }
}
