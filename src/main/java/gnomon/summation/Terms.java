package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.function.BinaryOperator;

/// Sums and products over finitely many points, by halving the range.
final class Terms {

  private static final long CELLS_PER_TERM = 4;

  private Terms() {}

  /// f(a) + f(a+1) + … + f(a+count−1).
  static Form sum(Form f, Variable k, Form a, long count) {
    return combined(f, k, a, count, Form.ZERO, Form::plus);
  }

  /// f(a) f(a+1) … f(a+count−1).
  static Form product(Form f, Variable k, Form a, long count) {
    return combined(f, k, a, count, Form.ONE, Form::times);
  }

  private static Form combined(
      Form f, Variable k, Form a, long count, Form neutral, BinaryOperator<Form> both) {
    if (count == 0) {
      return neutral;
    }
    Budget.charge(Math.multiplyExact(count, CELLS_PER_TERM));
    return range(f, k, a, 0, count, both);
  }

  private static Form term(Form f, Variable k, Form a, long distance) {
    try {
      return f.substitute(k, a.plus(Form.of(distance)));
    } catch (Refusal refused) {
      if (refused.reason() == Reason.POLE) {
        throw new Refusal(Reason.POLE_IN_RANGE, distance, a);
      }
      throw refused;
    }
  }

  private static Form range(
      Form f, Variable k, Form a, long from, long to, BinaryOperator<Form> both) {
    Budget.checkpoint();
    if (to - from == 1) {
      return term(f, k, a, from);
    }
    long middle = (from + to) >>> 1;
    return both.apply(range(f, k, a, from, middle, both), range(f, k, a, middle, to, both));
  }
}
