package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// Laws carried over by basis maps, the value claimed to solve the law that the status line shows.
///
/// Sources: the images of functions under the map of the falling powers as in Roman, The Umbral
/// Calculus (1984), section 4.1; the pairs of equations are conjugate by its definition.
final class CarryTest {
  private final Dialogue dialogue = new Dialogue();

  /// The carried operator is written down by hand, and the carried function is claimed to solve it.
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          carry D^2 f + f = 0 by umbral(Delta); Delta^2 + 1; 0
          carry D^2 f + f = x with f(0) = 0, f'(0) = 2 by umbral(Delta); Delta^2 + 1; x
          carry D f = a f by umbral(Delta); Delta - a; 0
          carry D^2 f - x D f + 4 f = 0 by umbral(Delta); Delta^2 - X Nabla + 4; 0
          carry x D^2 f + (1 - x) D f + 3 f = 0 by umbral(Delta); X E^-1 Delta^2 + (1 - X E^-1) Delta + 3; 0
          carry x D f = 1 by umbral(Delta); X Nabla; 1
          carry x D f = n f by umbral(Delta); X Nabla - n; 0
          carry D f = 1/x by umbral(Delta); Delta; 1/(x + 1)
          carry D^2 f + w^2 f = 0 by umbral(Delta[h]); Delta[h]^2 + w^2; 0
          carry D f = -f by umbral(Nabla); Nabla + 1; 0
          carry f(x + 2) = f(x + 1) + f(x) by umbral(Delta)^-1; D^2 + D - 1; 0
          carry f(x - 1) = 2 f(x) + x by umbral(Delta)^-1; (1 + D)^-1 - 2; x
          carry (Delta^2 - X Nabla + 4) f = 0 by umbral(Delta)^-1; D^2 - X D + 4; 0
          carry D^2 f = f by sheffer(D, exp(D)); D^2 - 1; 0
          """)
  void theCarriedFunctionSolvesTheCarriedLaw(String statement, String operator, String right) {
    List<String> carried = dialogue.lines(statement);
    assertTrue(carried.getLast().contains("carried to a solution of"), carried.toString());
    String handle = carried.getLast().split(" ")[0];
    String verdict =
        dialogue.lines("claim (" + operator + ") " + handle + " = " + right).getFirst();
    assertTrue(verdict.startsWith("proved"), statement + ": " + carried + " " + verdict);
  }

  @Test
  void whereNoSolutionIsCarriedTheLawIs() {
    List<String> carried = dialogue.lines("carry D^2 f - x D f + n f = 0 by umbral(Delta)");
    assertTrue(carried.getLast().contains("without a solution"), carried.toString());
    assertTrue(dialogue.lines("claim @1 = Delta^2 - X Nabla + n").getFirst().startsWith("proved"));
    dialogue.lines("carry D^2 f + f = 0 by umbral(D E)");
    assertTrue(dialogue.lines("claim @3 = D^2 E^2 + 1").getFirst().startsWith("proved"));
  }

  @Test
  void whatIsNoMapCarriesNothing() {
    for (String map : List.of("3", "D", "Delta", "x", "eps(0)")) {
      String answer = dialogue.lines("carry D f = f by " + map).getFirst();
      assertTrue(answer.startsWith("error"), map + ": " + answer);
    }
    assertEquals(
        "error kind-carry: the map does not act on n, as the equation does",
        dialogue.lines("carry g(n + 1) = 2 g(n) by umbral(Delta)^-1").getFirst());
  }
}
