package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Closed forms that hold from some n on are not used below it: the alternating row sum of the
/// binomial coefficients is 0 for n ≥ 1 and 1 for n = 0.
class ValidityTest {
  private static final String ROW = "Sigma(k: 0..n) (-1)^k binom(n,k)";

  private static List<String> answers(String... statements) {
    List<String> lines = new ArrayList<>();
    Run.run(
        String.join("\n", statements) + "\n",
        Settings.batch(),
        done -> lines.add(String.join(" ", done.lines())));
    return lines;
  }

  @Test
  void aValueBelowTheRangeOfAClosedFormIsAddedUp() {
    List<String> lines = answers(ROW, "@ at n = 0", ROW + " at n = 0", "@1 at n = 4");
    assertEquals("0 @1 closed form for n >= 1", lines.getFirst());
    assertTrue(lines.get(1).startsWith("1 @2"), lines.get(1));
    assertTrue(lines.get(2).startsWith("1 @3"), lines.get(2));
    assertTrue(lines.get(3).startsWith("0 @4"), lines.get(3));
  }

  @Test
  void namesAndFunctionsKeepTheRangeOfTheirClosedForms() {
    List<String> lines =
        answers("let s = " + ROW, "s at n = 0", "let f(n) = " + ROW, "f(0)", "Sigma(n: 0..5) s");
    assertTrue(lines.get(1).startsWith("1 @"), lines.get(1));
    assertTrue(lines.get(3).startsWith("1 @"), lines.get(3));
    assertTrue(lines.get(4).startsWith("1 @"), lines.get(4));
  }

  /// By hand: 1 − 2 + 3, −1 − 1, and no value of (n − 2)!/((−2)! n!).
  @Test
  void allValuesPutIntoANamedSumReachIt() {
    List<String> lines =
        answers(
            "let s = Sigma(k: 0..n) binom(a, k)",
            "s at n = 2, a = -2",
            "let t = Sigma(k: 0..n) (a - k - 1) (-1)^k binom(n, k)",
            "t at n = 0, a = -1",
            "let f = (m + n + 1)!/((m + 1)! n!)",
            "f at m = -3");
    assertTrue(lines.get(1).startsWith("2 @"), lines.get(1));
    assertTrue(lines.get(3).startsWith("-2 @"), lines.get(3));
    assertTrue(lines.get(5).startsWith("error kind-at"), lines.get(5));
  }

  @Test
  void aProofNamesTheRangeOfItsClosedForms() {
    List<String> lines =
        answers(
            "claim " + ROW + " = 0",
            "claim " + ROW + " = 0 for n: 0..3",
            "claim Sigma(k: 0..n) r^k = (r^(n+1) - 1)/(r - 1)",
            "Sigma(k: 0..n) r^k",
            "@ at r = 1");
    assertTrue(lines.getFirst().startsWith("proved for n >= 1:"), lines.getFirst());
    assertTrue(lines.get(1).startsWith("refuted: at n = 0"), lines.get(1));
    assertTrue(lines.get(2).startsWith("proved for r != 1:"), lines.get(2));
    assertTrue(lines.get(4).startsWith("n + 1 @"), lines.get(4));
  }

  @Test
  void ofSeveralSumsTheLeastKnownGivesTheStatus() {
    List<String> lines = answers("Sigma(k: 0..n) k^a + Sigma(k: 0..n) k");
    assertTrue(lines.getFirst().endsWith("left as a sum"), lines.getFirst());
  }

  @Test
  void anInfiniteImageIsCutOffWhereAskedAndSaysSo() {
    List<String> lines =
        answers("exp(D^2/2)(1/x)", "exp(D^2/2)(1/x) to 4", "claim @1 = 1/x + 1/x^3 + 3/x^5");
    assertTrue(lines.getFirst().startsWith("error domain-infinite-series"), lines.getFirst());
    assertTrue(lines.get(1).endsWith("@1 cut off after D^4"), lines.get(1));
    assertTrue(lines.get(2).startsWith("proved"), lines.get(2));
  }
}
