package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.LinearSystem;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The constants of a general solution from conditions that are linear in them.
public final class ConstantsFromConditions {
  private ConstantsFromConditions() {}

  /// Values for the constants with which every condition vanishes; constants that stay open keep
  /// themselves. Nothing where the conditions contradict one another.
  public static Optional<List<Form>> of(List<Form> conditions, List<Variable> constants) {
    List<List<Form>> rows = new ArrayList<>();
    for (Form condition : conditions) {
      List<Form> row = new ArrayList<>();
      Form rest = condition;
      for (Variable c : constants) {
        row.add(condition.derivative(c));
        rest = rest.substitute(c, Form.ZERO);
      }
      row.add(rest);
      rows.add(row);
    }
    List<Form> values = null;
    List<List<Form>> open = new ArrayList<>();
    for (List<Form> vector : LinearSystem.kernel(rows, constants.size() + 1)) {
      if (vector.getLast().isZero()) {
        open.add(vector);
      } else {
        values =
            vector.subList(0, constants.size()).stream()
                .map(c -> c.dividedBy(vector.getLast()))
                .toList();
      }
    }
    return Optional.ofNullable(values).map(found -> combined(found, open, constants));
  }

  private static List<Form> combined(
      List<Form> values, List<List<Form>> open, List<Variable> constants) {
    List<Form> all = new ArrayList<>(values);
    for (int i = 0; i < open.size(); i++) {
      Form name = Form.of(constants.get(i));
      for (int j = 0; j < all.size(); j++) {
        all.set(j, all.get(j).plus(open.get(i).get(j).times(name)));
      }
    }
    return all;
  }
}
