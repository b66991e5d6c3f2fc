package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
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
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
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

  /// The value at the point. Standing sums are added up before the variables that are not in their
  /// limits get values, so that x (x + k)^(k − 1) is 1 at k = 0 also where x is 0.
  private static Optional<Form> valueAt(Form form, Map<Variable, Rational> point) {
    Set<Variable> ends = new HashSet<>();
    for (Generator g : form.generators()) {
      if (g instanceof Accumulation sum) {
        ends.addAll(sum.lower().variables());
        ends.addAll(sum.upper().variables());
      }
    }
    Map<Generator, Form> first = new HashMap<>();
    Map<Generator, Form> rest = new HashMap<>();
    point.forEach((v, value) -> (ends.contains(v) ? first : rest).put(v, Form.of(value)));
    Map<Generator, Form> all = new HashMap<>(first);
    all.putAll(rest);
    if (Validity.hasSingularSum(form, all)) {
      return Optional.empty();
    }
    try {
      Form summed = first.isEmpty() ? form : Substitutions.addedUp(form.substitute(first));
      return Optional.of(Substitutions.addedUp(summed.substitute(rest)));
    } catch (Refusal undefined) {
      return Optional.empty();
    }
  }

  /// Whether a function of which nothing is known occurs.
  static boolean hasUnknown(Form form) {
    return form.generators().stream().anyMatch(Unknown.class::isInstance);
  }
}
