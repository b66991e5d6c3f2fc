package gnomon.operator;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.Optional;

/// The first power of x on which two operators differ, with both images.
public record Difference(Variable variable, int exponent, Form left, Form right) {

  /// The first witness among x^0, …, x^limit that the operators differ, if there is one.
  public static Optional<Difference> first(
      Operator a, Operator b, Variable x, int limit, Summation engine) {
    for (int k = 0; k <= limit; k++) {
      Form power = Form.of(x).power(k);
      Form left = a.applyTo(power, engine);
      Form right = b.applyTo(power, engine);
      if (!left.equals(right)) {
        return Optional.of(new Difference(x, k, left, right));
      }
    }
    return Optional.empty();
  }
}
