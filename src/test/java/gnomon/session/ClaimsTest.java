package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/// Claims of the finite operator calculus and the same with one sign or factor wrong.
///
/// Source: common practice of the calculus.
final class ClaimsTest {
  private final Dialogue dialogue = new Dialogue().say("arbitrary f, g");

  @ParameterizedTest
  @ValueSource(
      strings = {
        "umbral(Delta) D umbral(Delta)^-1 = Delta",
        "umbral(Delta) X umbral(Delta)^-1 = X E^-1",
        "[Delta, X] = E",
        "ln(1 + Delta) = D",
        "mu^2 = 1 + delta^2/4",
        "2 arsinh(delta/2) = D",
        "Delta^5 = (E-1)^5",
        "Delta Sigma = 1",
        "Sigma Delta = 1 - eps(0)",
        "D Integral = 1",
        "Integral D = 1 - eps(0)",
        "exp(h D) = E^h",
        "-ln(1 - Nabla) = D",
        "[D, X^3] = 3 X^2",
        "(X D)^2 = X^2 D^2 + X D",
        "E X = (X + 1) E",
        "umbral(D E) D umbral(D E)^-1 = D E",
        "umbral(Nabla)^-1 umbral(Nabla) = 1",
        "Delta(f g) = f Delta g + (E g) Delta f",
        "D(f g) = f D g + g D f",
        "sin(2x) = 2 sin(x) cos(x)",
        "binom(n, k) = binom(n - 1, k) + binom(n - 1, k - 1)",
        "x|_n (x - n) = x|_(n + 1)",
        "H(x + 1) = H(x) + 1/(x + 1)",
        "(matrix Delta to 2) = [[0, 1, 1], [0, 0, 2], [0, 0, 0]]",
        "eps(3) Sigma = eps(2) + eps(1) + eps(0)"
      })
  void trueIdentitiesAreProved(String claim) {
    assertEquals("proved", dialogue.verdict(claim), claim);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "umbral(Delta) D umbral(Delta)^-1 = Nabla",
        "umbral(Delta) X umbral(Delta)^-1 = X E",
        "[Delta, X] = -E",
        "ln(1 - Delta) = D",
        "mu^2 = 1 - delta^2/4",
        "arsinh(delta/2) = D",
        "Delta^5 = (E+1)^5",
        "Sigma Delta = 1 + eps(0)",
        "Integral D = 1",
        "exp(-h D) = E^h",
        "[D, X^3] = 2 X^2",
        "(X D)^2 = X^2 D^2",
        "E X = (X - 1) E",
        "Delta(f g) = f Delta g + g Delta f",
        "sin(2x) = sin(x) cos(x)",
        "binom(n, k) = binom(n - 1, k) + binom(n - 1, k + 1)",
        "x|_n (x + n) = x|_(n + 1)",
        "H(x + 1) = H(x) + 1/x",
        "pi = 22/7",
        "(matrix Delta to 2) = [[0, 1, 1], [0, 0, 3], [0, 0, 0]]"
      })
  void falseOnesAreRefutedWithAWitness(String claim) {
    assertEquals("refuted", dialogue.verdict(claim), claim);
  }

  @ParameterizedTest
  @ValueSource(strings = {"Delta^-1 Delta = 1", "sqrt(x^2) = x"})
  void whatIsNotDecidedIsNotShownAsProved(String claim) {
    dialogue.say("given x > 0");
    assertEquals("open", dialogue.verdict(claim), claim);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "D = x | error kind-operator-plus-function: an operator is not compared with a function",
        "Delta = [1] | error kind-claim: an operator is not compared with a list",
        "ln(Delta) = D | error domain-no-series: there is no power series at 0"
      })
  void claimsWithoutMeaningAreErrors(String claim, String error) {
    assertEquals(error, dialogue.first("claim " + claim));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "claim Sigma(k: 0..n) k = n (n + 1)/2 for n: 0..20",
        "claim umbral(Delta) x^n = x|_n for n: 0..6"
      })
  void claimsOverARangeSayWhatWasChecked(String claim) {
    String answer = dialogue.first(claim);
    assertEquals(true, answer.startsWith("proved"), answer);
    assertEquals(true, answer.contains("by checking each point"), answer);
  }

  /// Both sides are equal, but ln(1 + √2) + ln(√2 − 1) is not seen to be 0 by the normal form.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "E^(ln(1+sqrt(2))) E^(ln(sqrt(2)-1)) = 1",
        "eps(ln(1+sqrt(2)) + ln(sqrt(2)-1)) = eps(0)",
        "(ln(1+sqrt(2)) + ln(sqrt(2)-1)) x + O(x^3) = O(x^3)",
      })
  void aTrueClaimIsNotRefutedBecauseItsSidesLookDifferent(String claim) {
    assertEquals("open", dialogue.verdict(claim));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "E^(ln(1+sqrt(2))) = 1",
        "eps(ln(2)) = eps(0)",
        "ln(2) x + O(x^3) = O(x^3)",
        "a D = D",
        "E^a = E",
      })
  void operatorsAndSeriesThatCertainlyDifferAreRefuted(String claim) {
    assertEquals("refuted", dialogue.verdict(claim));
  }
}
