package gnomon.basis;

import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.series.PowerSeries;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/// What the first coefficients of a Sheffer map's pair (g, f) are: f1, f2, … are the derivatives of
/// f at 0, and l1, l2, … those of ln g.
///
/// @param map the map
/// @param values the derivatives by their names
/// @param start g(0)
/// @param known the order to which f and g are known, where that is not to all orders
record Signature(ShefferMap map, Map<Generator, Form> values, Form start, OptionalInt known) {

  /// The number of derivatives.
  static final int LENGTH = 6;

  Signature {
    values = Map.copyOf(values);
  }

  /// The signature of a map, where f and g have series that can be computed.
  static Optional<Signature> of(ShefferMap map) {
    try {
      PowerSeries f = map.fSeries(LENGTH);
      PowerSeries g = map.gSeries(LENGTH);
      Form start = g.coefficient(0);
      PowerSeries logarithm = g.times(start.inverse()).log();
      Map<Generator, Form> values = new HashMap<>();
      Rational factorial = Rational.ONE;
      for (int k = 1; k <= LENGTH; k++) {
        factorial = factorial.times(Rational.of(k));
        values.put(new Variable("f" + k), f.coefficient(k).times(factorial));
        values.put(new Variable("l" + k), logarithm.coefficient(k).times(factorial));
      }
      return Optional.of(new Signature(map, values, start, OptionalInt.empty()));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// The same, of a map known to an order only.
  Signature knownTo(int order) {
    return new Signature(map, values, start, OptionalInt.of(order));
  }

  /// The derivative of f of the order at 0.
  Form slope(int order) {
    return values.get(new Variable("f" + order));
  }

  /// The derivative of ln g of the order at 0.
  Form logarithmic(int order) {
    return values.get(new Variable("l" + order));
  }

  /// The dual of the map.
  Dual dual() {
    return map.dual();
  }
}
