package gnomon.basis;

import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import java.util.List;

/// The shapes of delta operators whose basic sequences have a closed form in n.
public sealed interface DeltaShape {

  /// Q = c D E^k, of Abel's kind: q_n = c^(−n) x (x − k n)^(n−1); powers for k = 0.
  record Derivative(Form c, Form k) implements DeltaShape {}

  /// Q = c E^k (E^h − 1), of Gould's kind: q_n = c^(−n) x/(x − k n) · ((x − k n)/h)↓n; falling
  /// powers for k = 0, central factorials for k = −h/2.
  record Difference(Form c, Form h, Form k) implements DeltaShape {}

  /// Any other delta operator.
  record Other() implements DeltaShape {}

  /// The shape of the delta operator with the symbol f.
  static DeltaShape of(Form f, Dual t) {
    var found = Structure.exponentialParts(f, t);
    if (found.isEmpty()) {
      return new Other();
    }
    var parts = found.get();
    if (parts.size() == 1) {
      List<Form> coefficients = parts.getFirst().coefficients();
      return coefficients.size() == 2 && coefficients.getFirst().isZero()
          ? new Derivative(coefficients.getLast(), parts.getFirst().rate())
          : new Other();
    }
    if (parts.size() != 2 || parts.stream().anyMatch(part -> part.coefficients().size() != 1)) {
      return new Other();
    }
    var first = parts.getFirst();
    var second = parts.getLast();
    if (!first.coefficients().getFirst().plus(second.coefficients().getFirst()).isZero()) {
      return new Other();
    }
    boolean ordered =
        second.rate().isZero()
            || !first.rate().isZero() && positiveFirst(first.rate(), second.rate());
    var upper = ordered ? first : second;
    var lower = ordered ? second : first;
    return new Difference(
        upper.coefficients().getFirst(), upper.rate().minus(lower.rate()), lower.rate());
  }

  private static boolean positiveFirst(Form first, Form second) {
    Form gap = first.minus(second);
    return gap.asRational()
        .map(value -> value.sign() > 0)
        .orElse(gap.numerator().content().sign() > 0);
  }
}
