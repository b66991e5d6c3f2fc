package gnomon.form;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/// Square systems of linear equations over forms, by elimination.
public final class LinearSystem {
  private LinearSystem() {}

  /// The solution of a square system; each row holds its coefficients and then its right side.
  ///
  /// @throws Refusal with [Reason#ZERO_DIVISOR] where the matrix is singular
  public static List<Form> solve(List<List<Form>> augmented) {
    int n = augmented.size();
    List<List<Form>> rows = new ArrayList<>();
    augmented.forEach(row -> rows.add(new ArrayList<>(row)));
    for (int column = 0; column < n; column++) {
      int pivot = column;
      while (pivot < n && rows.get(pivot).get(column).isZero()) {
        pivot++;
      }
      if (pivot == n) {
        throw new Refusal(Reason.ZERO_DIVISOR, Form.ZERO);
      }
      Collections.swap(rows, column, pivot);
      Form scale = rows.get(column).get(column).inverse();
      for (int j = column; j <= n; j++) {
        rows.get(column).set(j, rows.get(column).get(j).times(scale));
      }
      for (int i = 0; i < n; i++) {
        Form factor = rows.get(i).get(column);
        if (i != column && !factor.isZero()) {
          eliminate(rows.get(i), rows.get(column), factor, column);
        }
      }
    }
    return rows.stream().map(List::getLast).toList();
  }

  private static void eliminate(List<Form> row, List<Form> pivot, Form factor, int from) {
    Budget.checkpoint();
    for (int j = from; j < row.size(); j++) {
      row.set(j, row.get(j).minus(factor.times(pivot.get(j))));
    }
  }
}
