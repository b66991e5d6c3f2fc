package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/// The session examples, rechecked as a person would recheck them.
final class SessionExamplesTest {

  @Test
  void everyExampleGivesTheAnswersItRecorded() throws IOException {
    List<Recheck.Input> inputs = new ArrayList<>();
    try (Stream<Path> files = Files.list(Path.of("session-examples"))) {
      for (Path file : files.sorted().toList()) {
        inputs.add(new Recheck.Input(file, Files.readString(file)));
      }
    }
    List<RecheckReport> reports = Recheck.checkAll(inputs, Settings.batch(), 2);
    assertTrue(reports.size() >= 8, "eight examples at least");
    List<String> different = new ArrayList<>();
    for (RecheckReport report : reports) {
      if (report.count(RecheckReport.Outcome.SAME) != report.items().size()) {
        different.addAll(report.lines());
      }
    }
    assertEquals(List.of(), different);
  }

  @Test
  void theFirstExampleHasTheFormulaOfTheTerrace() throws IOException {
    String text = Files.readString(Path.of("session-examples/01-east-terrace-stones.gnomon"));
    assertTrue(text.contains("| 1/6 x (x - 1) (2 x - 1)\n| @2 closed form"));
  }
}
