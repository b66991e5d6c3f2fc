package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.math.BigInteger;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Values of sums by their recurrences, against the sums added term by term.
final class RecurrentSumTest {
  private static final Variable N = new Variable("n");
  private static final Variable K = new Variable("k");
  private static final Form n = Form.of(N);
  private static final Form k = Form.of(K);
  private static final SummationEngine ENGINE = SummationEngine.standard();

  private static Form binomial(Form top, Form bottom) {
    return Combinatorial.binomial(top, bottom);
  }

  /// Sums with integer and with fractional values, with and without boundary terms.
  private static List<Form> summands() {
    Form square = binomial(n, k).power(2);
    return List.of(
        square.times(binomial(n.plus(k), k).power(2)),
        binomial(n, k).power(3),
        binomial(n, k).times(binomial(n.plus(k), k)).dividedBy(k.plus(Form.ONE)),
        Combinatorial.factorial(n).dividedBy(Combinatorial.factorial(k)),
        square.times(Elementary.power(Form.TWO, k)).dividedBy(k.plus(Form.TWO)));
  }

  @Test
  void valuesByRecurrenceAreThoseOfTheSum() {
    for (Form summand : summands()) {
      BigInteger last = BigInteger.valueOf(40);
      RecurrentSum sum = RecurrentSum.of(summand, K, Form.ZERO, n, N, last, ENGINE).orElseThrow();
      SumValues plain = new SumValues(summand, N, K, Form.ZERO, n);
      for (int point : List.of(0, 1, 2, 3, 7, 5, 24, 40)) {
        BigInteger at = BigInteger.valueOf(point);
        assertEquals(plain.at(at), sum.at(at), summand + " at " + point);
      }
    }
  }

  @Test
  void parametersLeaveNoRationalValues() {
    Form summand = binomial(n, k).power(2).times(Elementary.power(Form.variable("z"), k));
    assertTrue(RecurrentSum.of(summand, K, Form.ZERO, n, N, BigInteger.TEN, ENGINE).isEmpty());
  }

  @Test
  void sumsOfManyTermsByTheirRatioAreThoseTermByTerm() {
    Form term = binomial(k.times(Form.TWO), k).dividedBy(Elementary.power(Form.of(8), k));
    Form halved = new DefiniteSums(ENGINE).sum(term, K, Form.of(3), Form.of(900)).value();
    assertEquals(Terms.sum(term, K, Form.of(3), 898), halved);
  }
}
