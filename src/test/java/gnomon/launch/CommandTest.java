package gnomon.launch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class CommandTest {
  @Test
  void nothingOpensTheConsole() {
    assertEquals(new Command.OpenConsole(false), Command.parse(List.of()));
    assertEquals(new Command.OpenConsole(true), parse("--ascii"));
  }

  @Test
  void runTakesAFileAndPerhapsJson() {
    assertEquals(new Command.Run("a.gnomon", false), parse("run a.gnomon"));
    assertEquals(new Command.Run("-", true), parse("run --json -"));
  }

  @Test
  void recheckTakesFilesAndPerhapsAReport() {
    assertEquals(new Command.Recheck(List.of("a", "b"), Optional.empty()), parse("recheck a b"));
    assertEquals(
        new Command.Recheck(List.of("a", "b"), Optional.of("r.xml")),
        parse("recheck a --report r.xml b"));
  }

  @Test
  void helpAndVersionStandAlone() {
    assertEquals(new Command.ShowUsage(), parse("--help"));
    assertEquals(new Command.ShowVersion(), parse("--version"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "run",
        "run a b",
        "run --fast a",
        "recheck",
        "recheck --report",
        "recheck --report r.xml",
        "recheck -q a",
        "walk a",
        "--loud",
        "--version now"
      })
  void anythingElseIsMisused(String line) {
    assertInstanceOf(Command.Misused.class, parse(line));
  }

  private static Command parse(String line) {
    return Command.parse(List.of(line.split(" ")));
  }
}
