package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.LinearSystem;
import java.util.ArrayList;
import java.util.List;

/// Linear independence of solutions over the constants, by their Casorati or Wronski matrix.
final class Independence {
  private Independence() {}

  /// The solutions that are independent of those before them.
  static List<Form> chosen(List<Form> solutions, LinearEquation equation) {
    List<Form> chosen = new ArrayList<>();
    for (Form solution : solutions) {
      chosen.add(solution);
      if (!areIndependent(chosen, equation)) {
        chosen.removeLast();
      }
    }
    return chosen;
  }

  private static boolean areIndependent(List<Form> solutions, LinearEquation equation) {
    int size = solutions.size();
    if (size > equation.order()) {
      return false;
    }
    List<List<Form>> matrix = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      List<Form> row = new ArrayList<>();
      for (Form solution : solutions) {
        row.add(equation.acted(solution, i).dividedBy(solution));
      }
      matrix.add(row);
    }
    return LinearSystem.kernel(matrix, size).isEmpty();
  }
}
