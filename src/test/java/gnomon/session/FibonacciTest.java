package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// Identities of Fibonacci and Lucas numbers, defined by their equation, with conjugate powers in
/// them (Graham, Knuth and Patashnik, Concrete Mathematics, 6.6; Vajda 1989; from memory), and the
/// same with a sign or an index wrong.
final class FibonacciTest {
  private final Dialogue dialogue = new Dialogue();

  FibonacciTest() {
    dialogue.say("let F(n) = solve f(n+2) = f(n+1) + f(n) with f(0) = 0, f(1) = 1");
    dialogue.say("let L(n) = solve f(n+2) = f(n+1) + f(n) with f(0) = 2, f(1) = 1");
    dialogue.say("given n integer, m integer");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "F(n + 1) F(n - 1) - F(n)^2 = (-1)^n",
        "F(n + m) = F(n) F(m + 1) + F(n - 1) F(m)",
        "F(2 n) = F(n) L(n)",
        "F(2 n + 1) = F(n + 1)^2 + F(n)^2",
        "L(n)^2 - 5 F(n)^2 = 4 (-1)^n",
        "L(n) = F(n + 1) + F(n - 1)",
        "Sigma(k: 1..n) F(k)^2 = F(n) F(n + 1)",
        "Sigma(k: 0..n) F(k) = F(n + 2) - 1",
        "Sigma(k: 0..n) binom(n - k, k) = F(n + 1)",
        "(1 - sqrt(2))^x (1 + sqrt(2))^x = (-1)^x"
      })
  void identitiesAreProved(String claim) {
    assertEquals("proved", dialogue.verdict(claim), claim);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "F(n + 1) F(n - 1) - F(n)^2 = -(-1)^n",
        "F(n + m) = F(n) F(m + 1) + F(n + 1) F(m)",
        "F(2 n) = F(n) L(n + 1)",
        "L(n)^2 - 5 F(n)^2 = 4",
        "Sigma(k: 0..n) F(k) = F(n + 2)",
        "Sigma(k: 0..n) binom(n - k, k) = F(n)",
        "(-3 - sqrt(2))^x (-3 + sqrt(2))^x = 7^x"
      })
  void wrongVariantsAreRefuted(String claim) {
    assertEquals("refuted", dialogue.verdict(claim), claim);
  }
}
