package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/// Operators without closed form: defined by an equation, used like any other, compared by the
/// equation that defines them.
///
/// Source: Lagrange's inversion, Comtet, Advanced Combinatorics (1974), section 3.8, from memory;
/// the Catalan numbers of DLMF Table 26.5.1.
final class OperatorEquationsTest {
  private final Dialogue dialogue = new Dialogue();

  @ParameterizedTest
  @CsvSource(
      delimiter = '&',
      value = {
        "D exp(a W) & D + a D^2 + 3/2 a^2 D^3 + 8/3 a^3 D^4 + 125/24 a^4 D^5 + O(D^6)",
        "D (1 + W)^2 & D + 2 D^2 + 5 D^3 + 14 D^4 + 42 D^5 + O(D^6)",
        "D (1 + W)^3 & D + 3 D^2 + 12 D^3 + 55 D^4 + 273 D^5 + O(D^6)",
        "D + W^2 exp(W) & D + D^2 + 3 D^3 + 21/2 D^4 + 247/6 D^5 + O(D^6)",
        "D + D^2 W & D + D^3 + D^5 + O(D^6)",
      })
  void equationsHaveTheirSeries(String right, String series) {
    dialogue.first("let S = solve W = " + right);
    assertEquals(series.strip(), dialogue.first("S to 5"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "D exp(a W)",
        "D (1 + W)^2",
        "D (1 + W)^3",
        "D + W^2 exp(W)",
        "Delta exp(W)",
        "D + D^2 W",
        "ln(1 + D + W^2)",
        "D - W^2 sqrt(1 + W)",
        "D + D^2 W^5 + D exp(W)",
      })
  void theDefiningEquationIsProved(String right) {
    dialogue.first("let S = solve W = " + right);
    String claim = "claim S = " + right.replace("W", "S");
    assertTrue(dialogue.first(claim).startsWith("proved"), dialogue.first(claim));
    String wrong = dialogue.first(claim + " + D^15");
    assertTrue(wrong.startsWith("refuted: on x^15"), wrong);
  }

  @Test
  void whatIsDefinedByAnEquationIsUsedLikeAnyOperator() {
    dialogue.first("let W = solve W = D exp(W)");
    assertEquals("3 x^2 + 6 x + 9", dialogue.first("W(x^3)"));
    assertEquals("[[1, 0,  0,  0],", dialogue.first("matrix umbral(W) to 3"));
    assertTrue(dialogue.first("claim umbral(W) umbral(D exp(-D)) = 1").startsWith("proved"));
    assertTrue(dialogue.first("claim umbral(W) D umbral(W)^-1 = W").startsWith("proved"));
    assertTrue(dialogue.first("claim W' = exp(W)/(1 - W)").startsWith("proved"));
    assertTrue(dialogue.first("claim ln(W/D) = W").startsWith("proved"));
    assertTrue(
        dialogue.first("family W").startsWith("the inverse of the map of the Abel polynomials"));
  }

  @Test
  void twoWaysToOneOperatorAreProvedEqual() {
    dialogue.first("let V = umbral(D exp(-a D))^-1 D umbral(D exp(-a D))");
    assertTrue(dialogue.first("claim V = (solve W = D exp(a W))").startsWith("proved"));
    assertTrue(dialogue.first("claim V = (solve W = D exp(2 a W))").startsWith("refuted"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '&',
      value = {
        "D + 1 & domain-operator-equation",
        "D + W & domain-operator-equation",
        "D W & domain-operator-equation",
        "x W & domain-operator-equation",
        "D + x W & domain-not-shift-invariant",
        "D^2 exp(W) & domain-operator-equation",
        "sin(W) + D & domain-operator-equation",
        "Sigma + W & domain-not-shift-invariant",
        "umbral(Delta) W & kind-not-an-operator",
      })
  void whatDefinesNoDeltaOperatorIsRefused(String right, String code) {
    String said = dialogue.first("solve W = " + right);
    assertTrue(said.startsWith("error " + code.strip() + ":"), said);
  }

  @Test
  void functionsAreSolvedForAsBefore() {
    assertEquals("C1 e^x", dialogue.first("solve f = D f"));
    dialogue.say("arbitrary F");
    assertEquals("C1 e^x", dialogue.first("solve F = D F"));
  }
}
