package gnomon.value;

import gnomon.basis.MappedOperator;
import gnomon.form.Form;
import gnomon.operator.Operator;
import java.util.List;

/// A truncated series Σ coefficients\[j\] · element(first + j), with everything from element(order)
/// on left out; `exp(x) to 6` has order 7, and a finite sum has the order [#EXACT]. Zero
/// coefficients at both ends are dropped.
public record SeriesValue(Family family, int first, List<Form> coefficients, int order)
    implements Value {
  /// The order of a series that leaves nothing out.
  public static final int EXACT = Integer.MAX_VALUE;

  /// Drops zeros at both ends, and coefficients from the order on.
  public SeriesValue {
    int from = 0;
    int to = (int) Math.max(0L, Math.min(coefficients.size(), (long) order - first));
    while (to > from && coefficients.get(to - 1).isZero()) {
      to--;
    }
    while (from < to && coefficients.get(from).isZero()) {
      from++;
    }
    coefficients = List.copyOf(coefficients.subList(from, to));
    first = coefficients.isEmpty() ? 0 : first + from;
  }

  /// Whether nothing is left out: the series is a finite sum.
  public boolean isExact() {
    return order == EXACT;
  }

  /// The coefficient of the element with the index, zero where there is none.
  public Form coefficient(int index) {
    int at = index - first;
    return at < 0 || at >= coefficients.size() ? Form.ZERO : coefficients.get(at);
  }

  @Override
  public Sort sort() {
    return Sort.SERIES;
  }

  /// A finite sum of powers of an operator is also the same as that operator.
  @Override
  public boolean sameAs(Value other) {
    if (equals(other)) {
      return true;
    }
    return isExact()
        && family instanceof Family.OperatorPowers(Operator of)
        && other instanceof OperatorValue(MappedOperator operator)
        && operator.equals(MappedOperator.of(total(of)));
  }

  private Operator total(Operator of) {
    Operator sum = Operator.zero();
    for (int at = 0; at < coefficients.size(); at++) {
      sum = sum.plus(of.power(first + at).times(coefficients.get(at)));
    }
    return sum;
  }
}
