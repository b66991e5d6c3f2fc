package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.value.VerdictValue.Assignment;
import gnomon.value.VerdictValue.Witness;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/// Refutes claims about functions of which nothing is known by a choice of the functions for which
/// the sides differ.
final class UnknownFunctions {
  private static final Variable X = new Variable("x");

  private UnknownFunctions() {}

  /// Functions for which the sides differ, and both sides for that choice.
  static Optional<Witness> witness(Form left, Form right, Assumptions assumptions, Scope scope) {
    SortedSet<String> names = names(left);
    names.addAll(names(right));
    if (names.isEmpty()) {
      return Optional.empty();
    }
    for (int shift = 0; shift < 3; shift++) {
      Map<String, Form> choice = choice(names, shift);
      try {
        Form a = chosen(left, choice);
        Form b = chosen(right, choice);
        if (Witnesses.search(a, b, assumptions, scope).witness().isPresent()) {
          return Optional.of(
              new Witness.AtPoint(shown(choice), Sorts.of(a, scope), Sorts.of(b, scope)));
        }
      } catch (Refusal undefined) {
        continue;
      }
    }
    return Optional.empty();
  }

  private static SortedSet<String> names(Form form) {
    SortedSet<String> names = new TreeSet<>();
    form.generators()
        .forEach(
            generator -> {
              if (generator instanceof Unknown unknown) {
                names.add(unknown.name());
              }
            });
    return names;
  }

  /// Different powers of x for the functions, and sums of them.
  private static Map<String, Form> choice(SortedSet<String> names, int shift) {
    Map<String, Form> choice = new TreeMap<>();
    int power = shift + 1;
    for (String name : names) {
      Form x = Form.of(X);
      choice.put(name, shift < 2 ? x.power(power) : x.power(power).plus(x).plus(Form.ONE));
      power++;
    }
    return choice;
  }

  private static Form chosen(Form form, Map<String, Form> choice) {
    return form.mapGenerators(
        generator -> {
          if (!(generator instanceof Unknown unknown)) {
            return Form.of(generator);
          }
          Form function = choice.get(unknown.name());
          for (int i = 0; i < unknown.derivatives(); i++) {
            function = function.derivative(X);
          }
          return function.substitute(X, unknown.argument());
        });
  }

  private static List<Assignment> shown(Map<String, Form> choice) {
    List<Assignment> assignments = new ArrayList<>();
    choice.forEach(
        (name, function) -> assignments.add(new Assignment(new Variable(name), function)));
    return assignments;
  }
}
