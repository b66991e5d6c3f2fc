package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import java.math.BigInteger;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/// Single values of the solution of a recurrence, step by step from given values, where there is no
/// formula for it.
public final class StepByStep {
  private static final BigInteger FARTHEST = BigInteger.valueOf(20_000);

  private StepByStep() {}

  /// The value at a point.
  ///
  /// @throws Refusal with [Reason#CONDITIONS_CONTRADICT] where the equation forbids the given
  ///   values, with [Reason#NOT_DETERMINED] where it does not tie the point to them, with
  ///   [Reason#OUT_OF_RANGE] where the point is too far out
  public static Form at(
      LinearEquation equation, SortedMap<BigInteger, Form> given, BigInteger point) {
    if (given.containsKey(point)) {
      return given.get(point);
    }
    if (given.isEmpty() || point.compareTo(given.firstKey()) < 0) {
      throw new Refusal(Reason.NOT_DETERMINED, Form.of(point));
    }
    if (point.subtract(given.firstKey()).compareTo(FARTHEST) > 0) {
      throw new Refusal(Reason.OUT_OF_RANGE, Form.of(point));
    }
    SortedMap<BigInteger, Form> values = new TreeMap<>(given);
    BigInteger order = BigInteger.valueOf(equation.order());
    BigInteger last = point.subtract(order);
    for (BigInteger n = given.firstKey(); n.compareTo(last) <= 0; n = n.add(BigInteger.ONE)) {
      Budget.checkpoint();
      step(equation, values, n);
    }
    Form value = values.get(point);
    if (value == null) {
      throw new Refusal(Reason.NOT_DETERMINED, Form.of(point));
    }
    return value;
  }

  /// Puts y(n + J) down, or compares it where it is given.
  private static void step(
      LinearEquation equation, SortedMap<BigInteger, Form> values, BigInteger n) {
    Form at = Form.of(n);
    Optional<Form> found = equation.known(values, n);
    if (found.isEmpty()) {
      return;
    }
    Form rest = found.get();
    Form leading = equation.leading().substitute(equation.variable(), at);
    BigInteger next = n.add(BigInteger.valueOf(equation.order()));
    Form known = values.get(next);
    Form gap = known == null ? rest : rest.minus(leading.times(known));
    if (known == null && !leading.isZero()) {
      values.put(next, rest.dividedBy(leading));
    } else if (!gap.isZero()) {
      throw new Refusal(Reason.CONDITIONS_CONTRADICT, at);
    }
  }
}
