package gnomon.form;

import java.util.List;

/// One part kernel·Σ_j coefficients_j v^j of an exponential polynomial in v.
///
/// @param kernel e^(rate·v) as a form; 1 for the polynomial part
/// @param rate the logarithmic derivative of the kernel, free of v
/// @param coefficients the polynomial, ascending, its coefficients free of v
public record ExponentialPart(Form kernel, Form rate, List<Form> coefficients) {

  /// Keeps its own copy.
  public ExponentialPart {
    coefficients = List.copyOf(coefficients);
  }
}
