package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// Operators given by the coefficients of their series in another operator.
///
/// Source: DLMF (4.2.19), (4.6.1), (4.6.7) for the closed ones; common practice for the others.
final class OperatorSeriesTest {
  private final Dialogue dialogue = new Dialogue();

  @ParameterizedTest
  @CsvSource(
      delimiter = '&',
      value = {
        "Sigma(k: 1..inf) (-1)^(k-1)/k Delta^k & D",
        "Sigma(k: 0..inf) D^k/k! & E",
        "Sigma(k: 0..inf) h^k D^k/k! & E^h",
        "Sigma(k: 0..inf) Nabla^k & E",
        "Sigma(k: 0..inf) binom(2k, k) (D/4)^k & 1/sqrt(1 - D)",
      })
  void seriesWithAClosedSumAreThatOperator(String series, String closed) {
    assertTrue(dialogue.first("claim (" + series + ") = " + closed).startsWith("proved"), series);
  }

  @Test
  void otherSeriesAreExactToAnyOrderAndUsedLikeAnyOperator() {
    dialogue.first("let F = Sigma(k: 0..inf) k! D^k");
    assertEquals("1 + D + 2 D^2 + 6 D^3 + 24 D^4 + O(D^5)", dialogue.first("F to 4"));
    assertEquals("x^4 + 4 x^3 + 24 x^2 + 144 x + 576", dialogue.first("F(x^4)"));
    assertEquals("1 - D - D^2 - 3 D^3 - 13 D^4 + O(D^5)", dialogue.first("F^-1 to 4"));
    assertEquals("x^3 - 6 x^2", dialogue.first("umbral(D F)(x^3)"));
    assertTrue(dialogue.first("claim [F, X] = F'").startsWith("proved"));
    assertTrue(dialogue.first("claim F F^-1 = 1").startsWith("proved"));
    assertTrue(dialogue.first("claim umbral(D F) D umbral(D F)^-1 = D F").startsWith("proved"));
    assertTrue(dialogue.first("claim D (D F)' = D F + D^2 F'").startsWith("proved"));
  }

  @Test
  void twoSeriesAreEqualByTheirFormulasOrOpenOrRefuted() {
    dialogue.first("let F = Sigma(k: 0..inf) k! D^k");
    assertTrue(
        dialogue.first("claim F = Sigma(j: 0..inf) (j + 1)!/(j + 1) D^j").startsWith("proved"));
    assertTrue(
        dialogue.first("claim F = Sigma(j: 0..inf) (j + 1)! D^j").startsWith("refuted: on x "));
    assertTrue(dialogue.first("claim F = F + D^30").startsWith("refuted: on x^30"));
    dialogue.first("let W = Sigma(k: 1..inf) k^(k-1)/k! D^k");
    String tree = dialogue.first("claim W = (solve V = D exp(V))");
    assertEquals(
        "open: x^0, ..., x^12; the normal form does not decide operators of this kind", tree);
  }

  @Test
  void whatIsShownReadsBackAsTheSame() {
    for (String series :
        new String[] {
          "Sigma(k: 0..inf) k! Delta^(2k+1)",
          "2 D (Sigma(k: 0..inf) k! D^k) + 1",
          "(Sigma(k: 0..inf) k! D^k)^2 + Delta",
          "Sigma(k: 1..inf) a^k k^k Nabla^k",
        }) {
      String shown = dialogue.first(series);
      String said = dialogue.first("claim (" + shown + ") = (" + series + ")");
      assertTrue(said.startsWith("proved"), shown + ": " + said);
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '&',
      value = {
        "Sigma(k: 0..inf) E^k & domain-series-of-operators",
        "Sigma(k: 0..inf) x D^k & domain-series-of-operators",
        "Sigma(k: 0..inf) D^(k - 1) & domain-series-of-operators",
        "Sigma(k: 0..inf) 1/k D^k & domain-pole",
        "Sigma(k: 0..inf) 1/(k - 30) D^k & domain-pole",
        "Sigma(k: 0..inf) X^k & kind-not-a-function",
        "Sigma(k: 0..n) D^k & domain-no-series",
      })
  void whatIsNoSuchSeriesIsRefused(String statement, String code) {
    String said = dialogue.first(statement);
    assertTrue(said.startsWith("error " + code.strip() + ":"), said);
  }
}
