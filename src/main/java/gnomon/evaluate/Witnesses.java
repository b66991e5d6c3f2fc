package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.value.FormValue;
import gnomon.value.VerdictValue.Assignment;
import gnomon.value.VerdictValue.Witness;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/// The search for a point at which two forms have different values, both exact. A difference of
/// values counts only when it is certain: a rational number that is not 0, or a constant whose
/// digits are not.
final class Witnesses {
  private static final int TRIED = 400;

  private Witnesses() {}

  /// What a search found: a witness, or at how many points both sides were equal.
  record Search(Optional<Witness> witness, int agreed, int undefined) {}

  static Search search(Form left, Form right, Assumptions assumptions, Scope scope) {
    var variables = new TreeSet<>(left.variables());
    variables.addAll(right.variables());
    int agreed = 0;
    int undefined = 0;
    for (Map<Variable, Rational> point :
        (Iterable<Map<Variable, Rational>>)
            Points.of(List.copyOf(variables), assumptions).limit(TRIED)::iterator) {
      Optional<Form> a = valueAt(left, point);
      Optional<Form> b = valueAt(right, point);
      if (a.isEmpty() || b.isEmpty()) {
        undefined++;
      } else if (Digits.surelyDiffer(a.get(), b.get())) {
        return new Search(Optional.of(atPoint(point, a.get(), b.get(), scope)), agreed, undefined);
      } else if (a.get().equals(b.get())) {
        agreed++;
      } else {
        undefined++;
      }
    }
    return new Search(Optional.empty(), agreed, undefined);
  }

  private static Witness atPoint(Map<Variable, Rational> point, Form a, Form b, Scope scope) {
    List<Assignment> assignments = new ArrayList<>();
    point.forEach((variable, value) -> assignments.add(new Assignment(variable, Form.of(value))));
    return assignments.isEmpty()
        ? new Witness.Sides(value(a, scope), value(b, scope))
        : new Witness.AtPoint(assignments, value(a, scope), value(b, scope));
  }

  private static FormValue value(Form form, Scope scope) {
    return Sorts.of(form, scope);
  }

  private static Optional<Form> valueAt(Form form, Map<Variable, Rational> point) {
    Map<Generator, Form> images = new HashMap<>();
    point.forEach((variable, value) -> images.put(variable, Form.of(value)));
    try {
      return Optional.of(Substitutions.addedUp(form.substitute(images)));
    } catch (Refusal undefined) {
      return Optional.empty();
    }
  }

  /// Whether a function of which nothing is known occurs.
  static boolean hasUnknown(Form form) {
    return form.generators().stream().anyMatch(Unknown.class::isInstance);
  }
}
