package gnomon.summation;

import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/// Poles of a summand whose place depends on a parameter, as k = −a of 1/(k + a).
///
/// For a generic parameter they are no integers. A sum or product holds for those parameters for
/// which none of them is a point of the range.
final class GenericPoles {
  private GenericPoles() {}

  /// The conditions that no such pole of f lies in the range, which begins at `start`. Poles that
  /// move with the `ends` alone are not among them: whether the range meets these is decided, not
  /// assumed.
  static List<Condition> outside(Form f, Variable k, Form start, Set<Variable> ends) {
    List<Condition> conditions = new ArrayList<>();
    Form denominator = Form.of(f.denominator());
    if (denominator.dependsOn(k)) {
      for (var factor : Structure.factored(denominator).factors()) {
        Structure.asPolynomial(factor.base(), k)
            .filter(coefficients -> coefficients.size() == 2)
            .map(linear -> linear.getFirst().negated().dividedBy(linear.getLast()))
            .filter(root -> !ends.containsAll(root.variables()))
            .map(root -> new Condition(root, Condition.Relation.NOT_IN_RANGE))
            .ifPresent(conditions::add);
      }
    }
    for (Generator g : f.generators()) {
      if (g instanceof Factorial(Form argument)
          && f.numerator().contains(g)
          && argument.variables().stream().anyMatch(v -> !v.equals(k) && !ends.contains(v))) {
        Form first = argument.substitute(k, start);
        conditions.add(new Condition(first, Condition.Relation.FINITE_FACTORIAL));
      }
    }
    return conditions;
  }
}
