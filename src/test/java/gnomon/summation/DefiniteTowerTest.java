package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.law.Seeded;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Random definite sums with harmonic numbers against the terms added one by one: a closed form at
/// every point of its range, a recurrence at the first points for which it is said to hold.
class DefiniteTowerTest {
  private static final Variable N = new Variable("n");
  private static final Variable K = new Variable("k");
  private static final Form n = Form.of(N);
  private static final Form k = Form.of(K);
  private static final SummationEngine ENGINE = SummationEngine.standard();

  private static Form any(RandomGenerator random, List<Form> choices) {
    return choices.get(random.nextInt(choices.size()));
  }

  private static Form term(RandomGenerator random) {
    Form sign = Elementary.power(Form.MINUS_ONE, k);
    Form row = Combinatorial.binomial(n, k);
    return any(
        random, List.of(Form.ONE, Form.ONE, row, sign.times(row), row.power(2), sign, Form.of(3)));
  }

  private static Form harmonic(RandomGenerator random) {
    Form h = Combinatorial.harmonic(k);
    return any(
        random,
        List.of(
            h,
            h.power(2),
            Combinatorial.harmonic(n.minus(k)),
            Combinatorial.harmonic(k.plus(Form.of(3))),
            Combinatorial.harmonic(k, 2),
            Combinatorial.harmonic(n.plus(k)),
            Combinatorial.harmonic(k.times(Form.TWO)),
            h.times(Combinatorial.harmonic(n.minus(k)))));
  }

  private static Form factor(RandomGenerator random) {
    Form next = k.plus(Form.ONE);
    return any(random, List.of(Form.ONE, Form.ONE, k, next.inverse(), n.minus(k.times(Form.TWO))));
  }

  @Test
  void randomSumsHaveTheValuesOfTheirTerms() {
    int[] closed = {0};
    int[] recurrences = {0};
    Seeded.each(
        300,
        40,
        random -> {
          Form summand = term(random).times(harmonic(random)).times(factor(random));
          Form lower = Form.of(random.nextInt(2));
          Form upper = any(random, List.of(n, n, n.minus(Form.ONE), n.plus(Form.TWO)));
          if (!summand.dependsOn(N) && random.nextInt(3) == 0) {
            upper = n.times(Form.TWO);
          }
          if (upper.equals(n.plus(Form.TWO)) && summand.dependsOn(N)) {
            upper = n;
          }
          SumValues values = new SumValues(summand, N, K, lower, upper);
          DefiniteSum sum = new DefiniteSums(ENGINE).sum(summand, K, lower, upper);
          String where = lower + ".." + upper + " of " + summand + " gave " + sum;
          if (sum.status() == DefiniteSum.Status.CLOSED_FORM) {
            closed[0]++;
            holds(sum, values, where);
          }
          sum.recurrence().ifPresent(found -> satisfied(found, values, where));
          recurrences[0] += sum.recurrence().isPresent() ? 1 : 0;
        });
    assertTrue(closed[0] >= 15, () -> closed[0] + " closed forms");
    assertTrue(recurrences[0] >= 5, () -> recurrences[0] + " recurrences");
  }

  private static void holds(DefiniteSum sum, SumValues values, String where) {
    for (int point = 0; point < 9; point++) {
      BigInteger at = BigInteger.valueOf(point);
      Form span = values.upper().minus(values.lower()).substitute(N, Form.of(at));
      if (span.asRational().orElseThrow().compareTo(Rational.MINUS_ONE) < 0) {
        // no range at all: a symbolic end is no less than the other one less one
        continue;
      }
      if (sum.conditions().stream().allMatch(condition -> isMet(condition, at))) {
        assertEquals(values.at(at), value(sum, at), where + " at " + at);
      }
    }
  }

  private static Form value(DefiniteSum sum, BigInteger at) {
    try {
      return sum.value().substitute(N, Form.of(at));
    } catch (Refusal refusal) {
      return Form.variable(refusal.reason().name());
    }
  }

  private static boolean isMet(Condition condition, BigInteger at) {
    Rational value =
        condition.subject().substitute(N, Form.of(at)).asRational().orElse(Rational.ONE);
    return switch (condition.relation()) {
      case NATURAL, RANGE_LENGTH -> value.sign() >= 0;
      case POSITIVE -> value.sign() > 0;
      case NOT_ZERO -> !value.isZero();
      case INTEGER -> value.isInteger();
      case FINITE_FACTORIAL -> !value.isInteger() || value.sign() >= 0;
      case INSIDE_UNIT, NOT_IN_RANGE -> true;
    };
  }

  private static void satisfied(SumRecurrence recurrence, SumValues values, String where) {
    for (int i = 0; i < 4; i++) {
      BigInteger at = recurrence.from().add(BigInteger.valueOf(i));
      Form left = Form.ZERO;
      for (int j = 0; j <= recurrence.order(); j++) {
        Form value = values.at(at.add(BigInteger.valueOf(j)));
        left = left.plus(recurrence.coefficients().get(j).substitute(N, Form.of(at)).times(value));
      }
      assertEquals(recurrence.rightSide().substitute(N, Form.of(at)), left, where + " at " + at);
    }
  }
}
