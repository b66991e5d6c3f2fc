package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/// Definite sums whose summand contains the variable of the ends; each closed form is compared with
/// sums added term by term far beyond the points that its own check looks at.
class HypergeometricSumsTest {
  private static final Variable N = new Variable("n");
  private static final Variable K = new Variable("k");
  private static final Form n = Form.of(N);
  private static final Form k = Form.of(K);
  private static final Form sign = Elementary.power(Form.MINUS_ONE, k);
  private static final DefiniteSums SUMS = new DefiniteSums(SummationEngine.standard());

  private static Form binom(Form top, Form bottom) {
    return Combinatorial.binomial(top, bottom);
  }

  private static Form twice(Form form) {
    return form.times(Form.TWO);
  }

  static Stream<Arguments> closed() {
    // Identities of Graham, Knuth, Patashnik, Concrete Mathematics, chapter 5, and of Dixon 1891;
    // all from memory.
    Form a = Form.variable("a");
    Form b = Form.variable("b");
    Form power = Elementary.power(Form.TWO, n);
    return Stream.of(
        Arguments.of("row", binom(n, k), n, power, 0),
        Arguments.of("alternating row", sign.times(binom(n, k)), n, Form.ZERO, 1),
        Arguments.of(
            "weighted row", k.times(binom(n, k)), n, n.times(power).dividedBy(Form.TWO), 0),
        Arguments.of("squares", binom(n, k).power(2), n, binom(twice(n), n), 0),
        Arguments.of("even row", binom(n, twice(k)), n, power.dividedBy(Form.TWO), 1),
        Arguments.of(
            "central convolution",
            binom(twice(k), k).times(binom(twice(n).minus(twice(k)), n.minus(k))),
            n,
            power.power(2),
            0),
        Arguments.of(
            "parallel halves",
            binom(n.plus(k), k).dividedBy(Elementary.power(Form.TWO, k)),
            n,
            power,
            0),
        Arguments.of(
            "harmonic",
            sign.negated().times(binom(n, k)).dividedBy(k),
            null,
            Combinatorial.harmonic(n),
            1),
        Arguments.of(
            "Dixon",
            sign.times(binom(twice(n), k).power(3)),
            twice(n),
            Elementary.power(Form.MINUS_ONE, n)
                .times(Combinatorial.factorial(Form.of(3).times(n)))
                .dividedBy(Combinatorial.factorial(n).power(3)),
            0),
        Arguments.of("Vandermonde", binom(a, k).times(binom(b, n.minus(k))), n, null, 0));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("closed")
  void knownSumsHaveTheirClosedForms(
      String name, Form summand, Form upper, Form expected, int from) {
    Form lower = upper == null ? Form.ONE : Form.ZERO;
    Form end = upper == null ? n : upper;
    DefiniteSum sum = SUMS.sum(summand, K, lower, end);
    assertEquals(DefiniteSum.Status.CLOSED_FORM, sum.status());
    if (expected != null) {
      assertEquals(Form.ZERO, sum.value().minus(expected).takingIntegers(List.of(N)));
    }
    for (int at = from; at <= 12; at++) {
      Form direct = Form.ZERO;
      Form value = summand.substitute(N, Form.of(at));
      int last = end.substitute(N, Form.of(at)).asInt().orElseThrow();
      for (int j = lower.asInt().orElseThrow(); j <= last; j++) {
        direct = direct.plus(value.substitute(K, Form.of(j)));
      }
      assertEquals(direct, sum.value().substitute(N, Form.of(at)), name + " at " + at);
    }
  }

  @Test
  void aSumThatIsNoHypergeometricTermGetsItsRecurrence() {
    // Franel 1894: (n+1)² a(n+1) = (7n²+7n+2) a(n) + 8n² a(n−1), as given in OEIS A000172.
    DefiniteSum sum = SUMS.sum(binom(n, k).power(3), K, Form.ZERO, n);
    assertEquals(DefiniteSum.Status.RECURRENCE, sum.status());
    SumRecurrence law = sum.recurrence().orElseThrow();
    assertEquals(2, law.order());
    Form m = n.plus(Form.ONE);
    Form scale = law.coefficients().getLast().dividedBy(m.plus(Form.ONE).power(2));
    Form middle = Form.of(7).times(m.power(2)).plus(Form.of(7).times(m)).plus(Form.TWO);
    assertEquals(scale.times(middle).negated(), law.coefficients().get(1));
    assertEquals(scale.times(Form.of(-8)).times(m.power(2)), law.coefficients().getFirst());
    assertEquals(Form.ZERO, law.rightSide());
  }

  @Test
  void aPoleThatMovesWithTheRangeIsRefused() {
    Form summand = n.minus(k).inverse();
    Refusal pole = assertThrows(Refusal.class, () -> SUMS.sum(summand, K, Form.ZERO, n));
    assertEquals(Reason.POLE_IN_RANGE, pole.reason());
    DefiniteSum below = SUMS.sum(summand, K, Form.ZERO, n.minus(Form.ONE));
    assertEquals(Combinatorial.harmonic(n), below.value());
  }

  @Test
  void gosperDecidesIndefiniteSumsOfHypergeometricTerms() {
    // R. W. Gosper 1978 and Petkovšek, Wilf, Zeilberger, A = B, chapter 5; from memory.
    HypergeometricSolver solver = new HypergeometricSolver();
    Form factorial = Combinatorial.factorial(k);
    assertEquals(
        new Antidifference.Found(factorial, List.of(), FunctionClass.HYPERGEOMETRIC),
        solver.solve(k.times(factorial), K, Form.ONE));
    assertInstanceOf(Antidifference.ProvedAbsent.class, solver.solve(factorial, K, Form.ONE));
    assertInstanceOf(Antidifference.ProvedAbsent.class, solver.solve(binom(n, k), K, Form.ONE));
    Form steps = sign.times(binom(n, k));
    Antidifference.Found found =
        assertInstanceOf(Antidifference.Found.class, solver.solve(steps, K, Form.ONE));
    Form next = found.value().substitute(K, k.plus(Form.ONE));
    assertEquals(steps, next.minus(found.value()));
  }
}
