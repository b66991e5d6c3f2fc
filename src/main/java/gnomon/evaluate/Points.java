package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/// The points at which claims about functions are tried: small numbers first, integers before
/// fractions, only such as the assumptions allow.
final class Points {
  private static final List<Rational> VALUES =
      List.of(
          Rational.of(0),
          Rational.of(1),
          Rational.of(2),
          Rational.of(3),
          Rational.of(5),
          Rational.of(-1),
          Rational.of(1, 2),
          Rational.of(-2),
          Rational.of(7),
          Rational.of(1, 3),
          Rational.of(-5, 2),
          Rational.of(12));

  private Points() {}

  /// The allowed points for the variables, in order of how far down the list of values they reach.
  static Stream<Map<Variable, Rational>> of(List<Variable> variables, Assumptions assumptions) {
    if (variables.isEmpty()) {
      return Stream.of(Map.of());
    }
    return Stream.iterate(0, reach -> reach < VALUES.size(), reach -> reach + 1)
        .flatMap(reach -> reaching(variables, reach).stream())
        .peek(_ -> Budget.checkpoint())
        .filter(assumptions::allow);
  }

  /// The points whose furthest value is the one at `reach`; with many variables only those in which
  /// the others follow in steps.
  private static List<Map<Variable, Rational>> reaching(List<Variable> variables, int reach) {
    var points = new ArrayList<Map<Variable, Rational>>();
    if (variables.size() > 3) {
      for (int shift = 0; shift < variables.size(); shift++) {
        var point = new LinkedHashMap<Variable, Rational>();
        for (int i = 0; i < variables.size(); i++) {
          point.put(variables.get(i), VALUES.get((reach + i * shift) % VALUES.size()));
        }
        points.add(point);
      }
      return points;
    }
    fill(variables, reach, 0, false, new LinkedHashMap<>(), points);
    return points;
  }

  private static void fill(
      List<Variable> variables,
      int reach,
      int at,
      boolean reached,
      Map<Variable, Rational> point,
      List<Map<Variable, Rational>> points) {
    if (at == variables.size()) {
      if (reached) {
        points.add(new LinkedHashMap<>(point));
      }
      return;
    }
    for (int i = 0; i <= reach; i++) {
      point.put(variables.get(at), VALUES.get(i));
      fill(variables, reach, at + 1, reached || i == reach, point, points);
    }
  }
}
