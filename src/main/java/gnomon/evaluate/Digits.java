package gnomon.evaluate;

import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.value.Value;

/// Decimal digits of constants.
final class Digits {

  private Digits() {}

  static Value of(Value value, int count, Span span) {
    throw Problems.of("kind-digits", "no digits yet", span);
  }

  /// Whether two constants are certain to be different.
  static boolean surelyDiffer(Form a, Form b) {
    return a.minus(b).asRational().filter(difference -> !difference.isZero()).isPresent();
  }
}
