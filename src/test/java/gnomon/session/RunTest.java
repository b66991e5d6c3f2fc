package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Running a file: each statement is handed on when it is done, failures do not end the run.
final class RunTest {

  private static List<Run.Done> run(String text) {
    List<Run.Done> done = new ArrayList<>();
    Run.run(text, Settings.batch(), done::add);
    return done;
  }

  @Test
  void everyStatementIsAnsweredAndFailuresDoNotEndTheRun() {
    List<Run.Done> done = run("1 + 1\nxD\n\n# two\n2 +\n  3\n");
    assertEquals(List.of(1, 2, 5), done.stream().map(one -> one.exchange().line()).toList());
    assertEquals(List.of("2", "@1"), done.getFirst().lines());
    assertEquals(List.of("5", "@2"), done.getLast().lines());
  }

  @Test
  void theRunSaysWhetherAllWasAccepted() {
    assertTrue(Run.run("1\nclaim 1 = 2\n", Settings.batch(), _ -> {}));
    assertFalse(Run.run("1\n1/0\n2\n", Settings.batch(), _ -> {}));
  }

  @Test
  void leavingEndsTheRun() {
    assertEquals(2, run("1\nleave\n2\n").size());
  }

  @Test
  void recordsHaveTheirFieldsInOrder() {
    assertEquals(
        "{\"line\":1,\"statement\":\"Sigma x\",\"sort\":\"function\","
            + "\"text\":\"1/2 x^2 - 1/2 x\",\"ascii\":\"1/2 x^2 - 1/2 x\","
            + "\"latex\":\"\\\\frac{1}{2} x^{2} - \\\\frac{1}{2} x\","
            + "\"status\":\"closed form\",\"error\":null}",
        run("Sigma x").getFirst().json());
  }

  @Test
  void recordsOfErrorsSayWhere() {
    String json = run("\n\n1 + xD").getFirst().json();
    assertTrue(json.contains("\"sort\":\"none\""), json);
    assertTrue(
        json.endsWith(
            "\"error\":{\"code\":\"name-unknown\",\"message\":\"xD has no meaning\","
                + "\"line\":3,\"column\":5,\"hint\":\"1 + x D\"}}"),
        json);
  }

  @Test
  void recordsNameEverySort() {
    List<String> sorts =
        run(
                """
            1
            x
            D
            umbral(Delta)
            eps(0)
            exp(x) to 2
            [1, 2]
            x for x: 0..1
            claim 1 = 1
            x in tex
            vary n
            """)
            .stream()
            .map(done -> done.json().replaceAll(".*\"sort\":\"([a-z]*)\".*", "$1"))
            .toList();
    assertEquals(
        List.of(
            "scalar",
            "function",
            "operator",
            "map",
            "functional",
            "series",
            "list",
            "table",
            "verdict",
            "formula",
            "none"),
        sorts);
  }

  @Test
  void oddCharactersAreEscaped() {
    String json = run("\"a\\\u0007\uD83D").getFirst().json();
    assertTrue(json.contains("\\\"a\\\\\\u0007\\ud83d"), json);
  }
}
