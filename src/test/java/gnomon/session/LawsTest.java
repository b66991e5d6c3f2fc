package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// `recurrence` and `coefficient` as a user meets them.
final class LawsTest {
  private final Dialogue dialogue = new Dialogue();

  /// Numbers and laws from memory, the law checked against the definition of each sequence.
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          [0, 1, 1, 2, 3, 5, 8, 13]                  | E^2 - E - 1
          [1, 1, 2, 6, 24, 120, 720, 5040]           | E - (X + 1)
          [1, 1, 2, 5, 14, 42, 132]                  | (X + 2) E - (4 X + 2)
          [1, 1, 2, 4, 10, 26, 76, 232, 764, 2620]   | E^2 - E - (X + 1)
          [1, 1/2, 1/3, 1/4, 1/5, 1/6]               | (X + 2) E - (X + 1)
          """)
  void lawsAreGuessedFromNumbers(String numbers, String law) {
    List<String> lines = dialogue.lines("let r = recurrence " + numbers);
    assertTrue(lines.getLast().contains("guessed from"), lines.toString());
    dialogue.proves("r = " + law);
  }

  @Test
  void fewNumbersAndNumbersWithoutALawAreRefused() {
    assertTrue(dialogue.lines("recurrence [1, 2, 4]").getFirst().startsWith("error domain-no-law"));
    assertTrue(
        dialogue
            .lines("recurrence [1, 1, 2, 5, 14, 43]")
            .getFirst()
            .startsWith("error domain-no-law"));
    assertTrue(
        dialogue
            .lines("recurrence [2, 3, 5, 7, 11, 13, 17, 19, 23, 29]")
            .getFirst()
            .startsWith("error domain-no-law"));
    assertTrue(dialogue.lines("recurrence [1, x, x^2]").getFirst().startsWith("error kind-law"));
  }

  @Test
  void tablesBringTheirArguments() {
    dialogue.lines("let r = recurrence (1/n for n: 1..8)");
    dialogue.proves("r = (X + 1) E - X");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          1/(1 - x - x^2)           | E^2 - E - 1
          (1 - sqrt(1 - 4x))/(2x)   | (X + 2) E - (4 X + 2)
          1/sqrt(1 - 4x)            | (X + 1) E - (4 X + 2)
          exp(x)                    | (X + 1) E - 1
          exponential 1/(1 - x)     | E - (X + 1)
          exponential exp(x + x^2/2)| E^2 - E - (X + 1)
          1/sqrt(1 - 2x - 3x^2)     | (X + 2) E^2 - (2 X + 3) E - (3 X + 3)
          """)
  void lawsOfCoefficientsAreProved(String function, String law) {
    List<String> lines = dialogue.lines("let r = recurrence " + function);
    assertTrue(lines.getLast().contains("recurrence of"), lines.toString());
    dialogue.proves("r = " + law);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          exp(a x)                   | a^n/n!
          (1 + x)^a                  | binom(a, n)
          1/(1 - x)^3                | (n + 1)(n + 2)/2
          1/(1 - x)/(1 - 2x)^2       | 2n * 2^n + 1
          (1 - sqrt(1 - 4x))/(2x)    | binom(2n, n)/(n + 1)
          1/sqrt(1 - 4x)             | binom(2n, n)
          -ln(1 - x)/(1 - x)         | H(n)
          """)
  void coefficientsHaveClosedForms(String function, String closed) {
    dialogue.proves("coefficient(" + function + ", n) = " + closed);
  }

  @Test
  void closedFormsOfCoefficientsHaveTheirRange() {
    List<String> lines = dialogue.lines("let c = coefficient(x/(1 - x)^2 + x^5, n)");
    assertEquals("@1 closed form for n >= 6", lines.getLast());
    assertEquals("6", dialogue.lines("c at n = 5").getFirst());
    assertEquals("7", dialogue.lines("c at n = 7").getFirst());
  }

  @Test
  void functionsWithoutADifferentialEquationAreRefused() {
    for (String function : List.of("exp(exp(x))", "x/(exp(x) - 1)", "1/cos(x)")) {
      String first = dialogue.lines("recurrence " + function).getFirst();
      assertTrue(first.startsWith("error domain-no-differential-equation"), first);
    }
    assertTrue(dialogue.lines("recurrence 1/x").getFirst().startsWith("error domain-no-series"));
  }
}
