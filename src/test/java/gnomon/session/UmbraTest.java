package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/// Umbral identities for symbolic n, against numbers for n up to 30 and against wrong variants.
///
/// Sources: Rota and Taylor, The classical umbral calculus, SIAM J. Math. Anal. 25 (1994); Roman,
/// The Umbral Calculus (1984), chapter 4; DLMF chapters 24 and 26.8; numbers of sections from
/// memory.
final class UmbraTest {
  private static final List<String> LETTERS =
      List.of(
          "umbra B, B2 with t/(exp(t) - 1)", // Bernoulli
          "umbra T with 2/(exp(t) + 1)", // Euler polynomials at 0
          "umbra S with 1/cosh(t)", // Euler numbers
          "umbra U with exp(exp(t) - 1)", // Bell
          "umbra A with 1/(1 - t)", // factorials
          "umbra G with exp(t^2/2)", // moments of the normal law
          "umbra K with exp(a (exp(t) - 1))", // moments of the Poisson law
          "umbra P with exp(t)"); // the number 1

  private final Dialogue dialogue = new Dialogue();

  UmbraTest() {
    LETTERS.forEach(dialogue::say);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          eval((B + 1)^n - B^n) = 0; 2
          eval((B + x + 1)^n - (B + x)^n) = n x^(n - 1); 1
          eval((B + 1 - x)^n) = (-1)^n eval((B + x)^n); 0
          eval((-B)^n) = eval((B + 1)^n); 0
          2^n eval((B + x/2)^n + (B + x/2 + 1/2)^n) = 2 eval((B + x)^n); 0
          eval((T + x + 1)^n + (T + x)^n) = 2 x^n; 0
          eval((T + 1)^n + T^n) = 0; 1
          eval((T + 1 - x)^n) = (-1)^n eval((T + x)^n); 0
          eval((S + 1)^n + (S - 1)^n) = 0; 1
          eval(B^(2 n + 1)) = 0; 1
          eval(S^(2 n + 1)) = 0; 0
          eval(T^(2 n)) = 0; 1
          eval((B + 1/2)^n) = (2^(1 - n) - 1) eval(B^n); 0
          eval((B + 1/2)^(2 n)) = (2^(1 - 2 n) - 1) eval(B^(2 n)); 0
          eval(G^(2 n + 2)) = (2 n + 1) eval(G^(2 n)); 0
          eval((B + 1)^n A^n) = eval((B + 1)^n) eval(A^n); 0
          2^n eval((T + 1/2)^n) = eval(S^n); 0
          eval(U^(n + 1)) = eval((U + 1)^n); 0
          eval(A^n) = n!; 0
          eval(A^(n + 1)) = (n + 1) eval(A^n); 0
          eval((A - 1)^n) = n eval((A - 1)^(n - 1)) + (-1)^n; 1
          eval(G^(n + 2)) = (n + 1) eval(G^n); 0
          eval((G + x)^(n + 1)) = x eval((G + x)^n) + n eval((G + x)^(n - 1)); 1
          eval(K^(n + 1)) = a eval((K + 1)^n); 0
          eval((P + x)^n) = (x + 1)^n; 0
          Sigma(k: 0..n) binom(n,k) eval(U^k) = eval(U^(n + 1)); 0
          Sigma(k: 0..n) binom(n,k) eval(B^k) x^(n - k) = eval((B + x)^n); 0
          Sigma(k: 0..n) binom(n,k) eval(B^k) eval(T^(n - k)) = eval((B + T)^n); 0
          Sigma(k: 0..4) k^n = eval((B + 5)^(n + 1) - B^(n + 1))/(n + 1); 0
          Sigma(k: 0..m - 1) k^n = eval((B + m)^(n + 1) - B^(n + 1))/(n + 1); 0
          eval(B (B + x)^n) = eval((B + x)^(n + 1)) - x eval((B + x)^n); 0
          """)
  void identitiesHoldForSymbolicAndForNumericExponents(String claim, int from) {
    assertEquals("proved", dialogue.verdict(claim + " for n >= " + from), claim);
    assertEquals("proved", dialogue.verdict(claim + " for n: " + from + "..30"), claim);
  }

  /// The first exponent at which the claim fails is the witness.
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          eval((B + 1)^n - B^n) = 0; n = 1
          eval((B + 1)^n + B^n) = 0 for n >= 2; n = 2
          eval((B + x + 1)^n - (B + x)^n) = n x^n; n = 1
          eval((B + 1 - x)^n) = eval((B + x)^n); n = 1
          eval((T + 1)^n + T^n) = 0; n = 0
          eval((S + 1)^n + (S - 1)^n) = 0; n = 0
          eval(B^(2 n + 1)) = 0; n = 0
          eval(S^(2 n)) = 0 for n >= 1; n = 1
          eval(T^(2 n)) = 0; n = 0
          eval(G^(2 n + 2)) = (2 n + 2) eval(G^(2 n)); n = 0
          eval(U^(n + 1)) = eval((U + 2)^n); n = 1
          eval(U^n) = eval((U + 1)^n); n = 1
          eval(A^n) = (n + 1)!; n = 1
          eval((A - 1)^n) = n eval((A - 1)^(n - 1)) - (-1)^n; n = 1
          eval(G^(n + 2)) = (n + 2) eval(G^n); n = 0
          eval(B^n) = eval(B2^n) + eval(T^n); n = 0
          Sigma(k: 0..m - 1) k^n = eval((B + m)^(n + 1) + B^(n + 1))/(n + 1); n = 0
          """)
  void wrongVariantsAreRefuted(String claim, String witness) {
    String answer = dialogue.text("claim " + claim);
    assertTrue(answer.contains("refuted: at") && answer.contains(witness), claim + "\n" + answer);
  }

  /// Moments, cumulants, dot products and composition (Rota and Taylor 1994, sections 3 to 5).
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          eval((B + x)^4); x^4 - 2 x^3 + x^2 - 1/30
          eval(B^2 T); -1/12
          eval(B B2); 1/4
          eval(B^20); -174611/330
          eval(falling(K, 5)); a^5
          eval(exp(2 U)); e^(e^2 - 1)
          ln(eval(exp(x K)) to 4); a x + 1/2 a x^2 + 1/6 a x^3 + 1/24 a x^4 + O(x^5)
          eval(E^B); D/Delta
          eval(eps(B)) x^4; -1/30
          eval(eps(B + 1) Delta) x^4; 4
          """)
  void valuesAreThoseOfTheLiterature(String expression, String value) {
    assertEquals(value, dialogue.text(expression).lines().findFirst().orElseThrow(), expression);
  }

  @Test
  void generatingFunctionsArePutTogether() {
    dialogue.text("umbra N with eval(exp(t B))^3");
    assertEquals("2", dialogue.text("eval(N^2)").lines().findFirst().orElseThrow());
    dialogue.text("umbra V with eval(exp(K ln(eval(exp(t P)))))");
    assertEquals("proved", dialogue.verdict("eval(V^n) = eval(K^n)"));
    dialogue.text("umbra M with eval(exp(t B))^-1");
    assertEquals("proved", dialogue.verdict("eval((M + B + x)^n) = x^n"));
    assertNotEquals("proved", dialogue.verdict("eval((M + B2 + x)^n) = (x + 1)^n"));
  }

  /// Sums of moments with random shifts and factors: the claim that two are equal is decided as the
  /// numbers say.
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void verdictsAgreeWithNumbers(long seed) {
    RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(seed);
    for (int i = 0; i < 12; i++) {
      String claim = side(random) + " = " + side(random);
      String symbolic = dialogue.verdict(claim + " for n >= 2");
      String numeric = dialogue.verdict(claim + " for n: 2..12");
      assertEquals(numeric, symbolic, "seed " + seed + ": " + claim);
    }
  }

  private static String side(RandomGenerator random) {
    String letter = List.of("B", "T", "U", "G", "A").get(random.nextInt(5));
    int shift = random.nextInt(-1, 2);
    String power = "(" + letter + " + " + shift + ")^(n + " + random.nextInt(2) + ")";
    return random.nextInt(1, 3) + " eval(" + power + ") + " + random.nextInt(2) + " n";
  }

  @Test
  void whatEvalCannotTakeIsRefused() {
    assertTrue(dialogue.text("eval(1/B)").contains("domain-no-moment"));
    assertTrue(dialogue.text("eval(sin(B)/B)").contains("domain-no-moment"));
    assertTrue(dialogue.text("eval((B + x)^n) at x = B").contains("domain-umbra-captured"));
    assertTrue(dialogue.text("eval(B^n) at n = 1/2").contains("domain-no-moment"));
    assertTrue(dialogue.text("umbra Z with t").contains("domain-umbra"));
    assertTrue(dialogue.text("umbra Z with 1/t").contains("domain-umbra"));
    assertTrue(dialogue.text("umbra x with exp(t)").contains("name-taken"));
    dialogue.text("drop " + String.join(", ", "A", "B", "B2", "G", "K", "P", "S", "T", "U"));
    assertTrue(dialogue.text("eval(B)").contains("name-no-umbra"));
  }
}
