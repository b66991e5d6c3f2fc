package gnomon.value;

import gnomon.form.Form;
import java.util.List;

/// A truncated series Σ coefficients\[j\] · element(first + j), with everything from element(order)
/// on left out; `exp(x) to 6` has order 7. Zero coefficients at both ends are dropped.
public record SeriesValue(Family family, int first, List<Form> coefficients, int order)
    implements Value {
  /// Drops zeros at both ends, and coefficients from the order on.
  public SeriesValue {
    int from = 0;
    int to = Math.max(0, Math.min(coefficients.size(), order - first));
    while (to > from && coefficients.get(to - 1).isZero()) {
      to--;
    }
    while (from < to && coefficients.get(from).isZero()) {
      from++;
    }
    coefficients = List.copyOf(coefficients.subList(from, to));
    first = coefficients.isEmpty() ? 0 : first + from;
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
