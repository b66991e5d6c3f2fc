package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.recurrence.LinearEquation;
import gnomon.recurrence.Unrolling;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The values of a definite sum at numbers n, by its recurrence from a few sums added term by term.
public final class RecurrentSum {
  private final SumValues values;
  private final BigInteger from;
  private final Unrolling unrolling;

  private RecurrentSum(SumValues values, BigInteger from, Unrolling unrolling) {
    this.values = values;
    this.from = from;
    this.unrolling = unrolling;
  }

  /// Σ(k: lower..upper) summand for n up to `last`, where it has a recurrence that gives rational
  /// numbers.
  public static Optional<RecurrentSum> of(
      Form summand,
      Variable k,
      Form lower,
      Form upper,
      Variable n,
      BigInteger last,
      SummationEngine engine) {
    Optional<SumRecurrence> found =
        new DefiniteSums(engine)
            .sum(summand, k, lower, upper)
            .recurrence()
            .filter(recurrence -> recurrence.variable().equals(n) && recurrence.order() > 0);
    if (found.isEmpty()) {
      return Optional.empty();
    }
    SumRecurrence recurrence = found.get();
    SumValues values = new SumValues(summand, n, k, lower, upper);
    List<Rational> initial = new ArrayList<>();
    for (int i = 0; i < recurrence.order(); i++) {
      Optional<Rational> value =
          values.at(recurrence.from().add(BigInteger.valueOf(i))).asRational();
      if (value.isEmpty()) {
        return Optional.empty();
      }
      initial.add(value.get());
    }
    LinearEquation equation = recurrence.equation();
    return Unrolling.of(equation, recurrence.from(), initial, last)
        .map(unrolling -> new RecurrentSum(values, recurrence.from(), unrolling));
  }

  /// The value at an integer.
  public Form at(BigInteger point) {
    return point.compareTo(from) < 0 ? values.at(point) : Form.of(unrolling.at(point));
  }
}
