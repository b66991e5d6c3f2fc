package gnomon.value;

import gnomon.form.Form;
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
}
