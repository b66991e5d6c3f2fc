package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/// Infinite sums: their values against long partial sums and against published values, and refusals
/// where they diverge or are not known.
final class InfiniteSumsTest {
  private final Dialogue dialogue = new Dialogue();

  /// The sum to 15 digits, and its first 240 terms to 15 digits, which do not use the theorem.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "k^3/3^k",
        "(-1)^k (k^2 + 1)/2^k",
        "1/((k+1) 2^k)",
        "(-2/3)^k/(k+3)",
        "(k-3)/2^k",
        "(2k+1)/(2^k (k+1)(k+2))",
        "k^2/k!",
        "2^k/(k+2)!",
        "(k+5)/((k+1) k!)",
        "(-1)^k/(2k)!",
        "3^k/(2k+1)!",
        "(-1)^k 2^k/(2k+1)!",
        "binom(2k,k)/9^k",
        "k binom(2k,k)/8^k",
        "binom(-1/2,k)/3^k",
        "binom(1/3,k) (-1/2)^k",
        "(1/2^k + (-1)^k/3^k)",
        "binom(7,k) 2^k",
      })
  void valuesAgreeWithLongPartialSums(String term) {
    String whole =
        dialogue.text("Sigma(k: 0..inf) " + term + " to 15 digits").lines().findFirst().get();
    String partial =
        dialogue.text("Sigma(k: 0..240) " + term + " to 15 digits").lines().findFirst().get();
    assertTrue(whole.matches("-?[0-9.]+"), whole);
    assertEquals(0, new BigDecimal(partial).compareTo(new BigDecimal(whole)), term);
  }

  /// Source: NIST Digital Library of Mathematical Functions 25.6.1, 25.2.3, 4.24.3, 15.4.20,
  /// 15.4.26, 16.4.4, 24.4; Graham, Knuth, Patashnik, Concrete Mathematics (1994), (5.57), (5.60);
  /// from memory.
  @ParameterizedTest
  @CsvSource(
      delimiter = '=',
      value = {
        "1/k^2 = pi^2/6",
        "1/k^4 = pi^4/90",
        "1/k^6 = pi^6/945",
        "(-1)^(k-1)/k^2 = pi^2/12",
        "(-1)^(k-1)/k^4 = 7 pi^4/720",
        "(-1)^(k-1)/k = ln(2)",
        "(-1)^(k-1)/(2k-1) = pi/4",
        "1/(k (k+1)) = 1",
        "1/(k (k+2)) = 3/4",
        "1/(k (2k+1)) = 2 - 2 ln(2)",
        "1/(4 k^2 - 1) = 1/2",
        "1/(2k-1)^2 = pi^2/8",
        "1/(k^2 (k+1)^2) = pi^2/3 - 3",
        "binom(2k,k)/((2k-1) 4^k) = 1",
        "1/((k+a)(k+b)) = (H(a) - H(b))/(a - b)",
      })
  void seriesHaveTheirPublishedValues(String term, String value) {
    assertTrue(
        dialogue.text("claim Sigma(k: 1..inf) " + term + " = " + value).startsWith("proved"), term);
  }

  /// Source: NIST Digital Library of Mathematical Functions 15.4.20, 15.4.26, 16.4.4, from memory.
  /// Numbers are put in on both sides; the left side is then added up by its own theorem or terms.
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "rising(1/2,k) rising(1/3,k)/(rising(2,k) k!); (1!) (1/6)!/((1/2)! (2/3)!)",
        "rising(-4,k) rising(1/3,k)/(rising(2,k) k!); rising(5/3,4)/rising(2,4)",
        "(-1)^k rising(1/2,k) rising(1/3,k)/(rising(7/6,k) k!);"
            + " (1/6)! (1/4)!/((1/2)! (-1/12)!)",
        "rising(1/2,k) rising(1/4,k) rising(1/5,k)/(rising(5/4,k) rising(13/10,k) k!);"
            + " (1/4)! (-1/5)! (1/4)! (3/10)!/((1/2)! (1/20)! 0! (1/20)!)",
      })
  void hypergeometricSeriesHaveTheirPublishedValues(String term, String value) {
    String sum =
        dialogue.text("Sigma(k: 0..inf) " + term + " to 12 digits").lines().findFirst().get();
    String published = dialogue.text("(" + value + ") to 12 digits").lines().findFirst().get();
    assertTrue(sum.matches("-?[0-9.]+"), sum);
    assertEquals(published, sum, term);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "x^k; |x| < 1",
        "k^2 x^k; |x| < 1",
        "binom(2k,k) x^k; |4 x| < 1",
        "binom(n,k); n > -1",
        "rising(a,k) rising(b,k)/(rising(c,k) k!); -a - b + c > 0",
      })
  void convergenceThatDependsOnParametersIsStated(String term, String condition) {
    String answer = dialogue.text("Sigma(k: 0..inf) " + term);
    assertTrue(answer.contains("closed form for ") && answer.contains(condition), answer);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "1/k; domain-divergent",
        "(-1)^k; domain-divergent",
        "2^k; domain-divergent",
        "k!/2^k; domain-divergent",
        "binom(-1/2,k)^2; domain-divergent",
        "binom(2k,k)/4^k; domain-divergent",
        "(k+1)/(k^2+1); domain-divergent",
        "1/(k-3); domain-pole-in-range",
        "1/k^3; domain-infinite-sum-undecided",
        "1/(k^2+1); domain-infinite-sum-undecided",
        "H(k)/2^k; domain-infinite-sum-undecided",
        "(1/k - 1/(k+1) + 2^k - 2^k); closed form",
        "x^k at x = 2; domain-divergent",
        "binom(n,k) 2^k; domain-infinite-sum-undecided",
      })
  void divergenceAndIgnoranceAreToldApart(String term, String told) {
    String answer = dialogue.text("Sigma(k: 1..inf) " + term);
    assertTrue(answer.contains(told), answer);
  }
}
