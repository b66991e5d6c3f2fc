package gnomon.evaluate;

import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.value.DecimalValue;
import gnomon.value.ListValue;
import gnomon.value.TableValue;
import gnomon.value.Value;

/// Decimal digits of constants.
final class Digits {
  private Digits() {}

  /// `… to N digits`, item by item for lists and tables.
  static Value of(Value value, int count, Span span) {
    if (count < 1) {
      throw Problems.of("domain-count", "at least 1 digit is asked for", span);
    }
    return switch (value) {
      case ListValue list ->
          new ListValue(list.items().stream().map(item -> of(item, count, span)).toList());
      case TableValue table ->
          new TableValue(
              table.header(),
              table.rows().stream()
                  .map(row -> row.stream().map(item -> of(item, count, span)).toList())
                  .toList());
      case Value other -> digits(Sorts.form(other, span, "this"), count);
    };
  }

  private static DecimalValue digits(Form constant, int count) {
    var digits = gnomon.decimal.Digits.of(constant, count);
    return new DecimalValue(digits.real(), digits.imaginary());
  }

  /// Whether two constants are certain to be different: by a rational difference, or by the digits
  /// of their difference.
  static boolean surelyDiffer(Form a, Form b) {
    Form difference = a.minus(b);
    if (difference.isZero()) {
      return false;
    }
    return difference.asRational().isPresent() || gnomon.decimal.Digits.proveNonzero(difference);
  }
}
