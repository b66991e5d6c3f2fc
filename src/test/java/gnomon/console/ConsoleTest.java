package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class ConsoleTest {
  /// Work that takes far longer than anybody waits.
  private static final String LONG_WORK = "(X + D)^190";

  private static final Pattern COLOUR = Pattern.compile("\u001b\\[[0-9;]*(3[0-7]|38;5|9[0-7])[;m]");

  @TempDir Path state;

  @Test
  void answersAndLeavesWhenTheInputEnds() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("good morning").await("∟ ").line("Delta x^3");
      mason.await("3 x^2 + 3 x + 1").await("@1").await("∟ ");
      mason.leave();
    }
  }

  @Test
  void leaveEndsTheConversation() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("∟ ").line("leave").leave();
    }
  }

  @Test
  void anOpenBracketAsksForAnotherLine() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("∟ ").line("Delta(x^2").line("+ x)");
      mason.await("· ").await("2 x + 2").await("∟ ").leave();
    }
  }

  @Test
  void asciiHasItsOwnPromptsAndAnswers() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, true)) {
      mason.await("_| ").line("Δ(").line("D^0)").await(". ").await("_| ");
      mason.line("E - 1").await("Delta").await("@");
      String shown = mason.leave();
      assertTrue(shown.lines().noneMatch(line -> line.startsWith("∟")), shown);
    }
  }

  @Test
  void anErrorLeavesTheDefinitionsAsTheyWere() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("∟ ").line("let course = x^2").await("@1").await("∟ ");
      mason.line("let course = (2").line("").await("line 1, column").await("∟ ");
      mason.line("course at x = 5").await("25").await("@2").await("∟ ").leave();
    }
  }

  @Test
  void aComputationCanBeStoppedAndTheDefinitionsStay() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("∟ ").line("let course = x^2").await("@1").await("∟ ");
      mason.line(LONG_WORK).await("evaluating").interrupt().await("∟ ");
      mason.line("course at x = 5").await("25").await("@2").await("∟ ").leave();
    }
  }

  @Test
  void aSessionThatEndedInOrderIsNotOfferedAgain() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("∟ ").line("let course = x^2").await("@1").await("∟ ").leave();
    }
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      assertFalse(mason.await("∟ ").leave().contains("Restore"));
    }
  }

  @Test
  void aSessionThatWasCutOffIsRestored() throws Exception {
    Path journal = cutOff("let course = x^2\nlet wall(n,\n  k) = n k\nx + 1\n");
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("after 3 statements").await("x + 1").await("yes or no").line("yes");
      mason.await("Restored 3 statements").await("∟ ");
      mason.line("wall(course, 2)").await("2 x^2").await("@3").await("∟ ").leave();
    }
    assertFalse(Files.exists(journal));
  }

  @Test
  void aSessionThatIsNotWantedIsSetAside() throws Exception {
    Path journal = cutOff("let course = x^2\n");
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("yes or no").line("no").await("kept in").await("∟ ").leave();
    }
    Path kept = state.resolve("gnomon/set-aside").resolve(journal.getFileName());
    assertEquals("let course = x^2\n", Files.readString(kept));
    assertFalse(Files.exists(journal));
  }

  @Test
  void everyAcceptedStatementIsJournaledAtOnce() throws Exception {
    try (Typing mason = Typing.atDumbTerminal(state, false)) {
      mason.await("∟ ").line("let course = x^2").await("@1").await("∟ ");
      mason.line("nonsense nonsense").await("line 1").await("∟ ");
      try (var files = Files.list(state.resolve("gnomon/running"))) {
        List<Path> journals = files.toList();
        assertEquals(1, journals.size());
        assertEquals("let course = x^2\n", Files.readString(journals.getFirst()));
      }
      mason.leave();
    }
  }

  @Test
  void pastedSessionFilesAreAnsweredStatementByStatement() throws Exception {
    try (Typing mason = Typing.atTerminal(state, Map.of("NO_COLOR", "1"))) {
      mason.await("∟ ");
      mason.type("\u001b[200~let course = x^2\n| x^2\n| @1\n\ncourse at x = 7\n\u001b[201~\r");
      mason.await("@1").await("49").await("@2").leave();
    }
  }

  @Test
  void withoutColourTheSortsStillShow() throws Exception {
    try (Typing mason = Typing.atTerminal(state, Map.of("NO_COLOR", "1"))) {
      mason.await("∟ ").type("Delta x^2\r").await("2 x + 1").await("∟ ");
      String shown = mason.leave();
      assertFalse(COLOUR.matcher(shown).find(), shown);
      assertTrue(shown.contains("\u001b[1m"), shown);
    }
  }

  @Test
  void theWordAtTheCursorIsExplained() throws Exception {
    try (Typing mason = Typing.atTerminal(state, Map.of())) {
      mason.await("∟ ").type("Delta").await("forward difference").type("\r").await("@1").leave();
    }
  }

  @Test
  void tabMakesTheGlyphOfASpelling() throws Exception {
    try (Typing mason = Typing.atTerminal(state, Map.of())) {
      mason.await("∟ ").type("Del\t x^2\r").await("Δ").await("2 x + 1").await("@1").leave();
    }
  }

  private Path cutOff(String statements) throws IOException {
    Path running = Files.createDirectories(state.resolve("gnomon/running"));
    return Files.writeString(running.resolve("20260401-080000-4711.gnomon"), statements);
  }
}
