package gnomon.basis;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.Optional;

/// Members of basic sequences with a symbolic index, from the shape of the delta operator.
final class SymbolicMembers {

  private SymbolicMembers() {}

  /// q_n(x), where the shape of Q gives it in closed form.
  static Optional<Form> of(ShefferMap umbral, Form n) {
    Form x = Form.of(umbral.variable());
    return switch (DeltaShape.of(umbral.f(), umbral.dual())) {
      case DeltaShape.Derivative(Form c, Form k) -> Optional.of(derivative(x, n, c, k));
      case DeltaShape.Difference(Form c, Form h, Form k) -> Optional.of(difference(x, n, c, h, k));
      case DeltaShape.Other _ -> Optional.empty();
    };
  }

  /// c^(−n) x (x − k n)^(n−1).
  private static Form derivative(Form x, Form n, Form c, Form k) {
    Form scale = Elementary.power(c, n.negated());
    if (k.isZero()) {
      return scale.times(Elementary.power(x, n));
    }
    Form shifted = x.minus(k.times(n));
    return scale.times(x).times(Elementary.power(shifted, n.minus(Form.ONE)));
  }

  /// c^(−n) x/(x − k n) ((x − k n)/h)↓n, with rising powers for a negative step.
  private static Form difference(Form x, Form n, Form c, Form h, Form k) {
    Form shifted = x.minus(k.times(n));
    Form front = k.isZero() ? Form.ONE : x.dividedBy(shifted);
    boolean negative = h.asRational().map(Rational::sign).filter(sign -> sign < 0).isPresent();
    if (negative) {
      Form scale = Elementary.power(c.negated(), n.negated());
      return front.times(scale).times(Combinatorial.rising(shifted.dividedBy(h.negated()), n));
    }
    Form scale = Elementary.power(c, n.negated());
    return front.times(scale).times(Combinatorial.falling(shifted.dividedBy(h), n));
  }
}
