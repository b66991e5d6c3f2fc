package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/// The tour of the README is one session: each of its lines answers what the README says.
class ReadmeTest {
  private static final Pattern FENCE = Pattern.compile("```gnomon\n(.*?)```", Pattern.DOTALL);

  @Test
  void everyLineOfTheTourAnswersWhatTheReadmeSays() throws IOException {
    Matcher fences = FENCE.matcher(Files.readString(Path.of("README.md")));
    StringBuilder tour = new StringBuilder();
    while (fences.find()) {
      tour.append(fences.group(1));
    }
    assertTrue(tour.toString().lines().count() > 40, "the tour was found");
    String again = Recheck.rerecorded(tour.toString(), Settings.batch());
    assertEquals(tour.toString(), again);
  }

  @Test
  void theReadmeNamesTheTwoCommands() throws IOException {
    String text = Files.readString(Path.of("README.md"));
    assertTrue(text.contains("mvn verify"));
    String first =
        text.lines().filter(line -> line.contains("gnomon run session")).findFirst().orElseThrow();
    Path example = Path.of(first.substring(first.indexOf("session-examples")).strip());
    assertTrue(Files.isReadable(example), example.toString());
  }
}
