package gnomon.form;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/// Systems of linear equations over forms, by elimination.
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

  /// A basis of the vectors v with Σ_j row_j v_j = 0 for each row, each row and vector of the given
  /// length; each has a last entry 1 among the free unknowns.
  public static List<List<Form>> kernel(List<List<Form>> matrix, int columns) {
    List<List<Form>> rows = new ArrayList<>();
    matrix.forEach(row -> rows.add(new ArrayList<>(row)));
    List<Integer> pivots = new ArrayList<>();
    for (int column = 0; column < columns && pivots.size() < rows.size(); column++) {
      int pivot = simplest(rows, pivots.size(), column);
      if (pivot < 0) {
        continue;
      }
      int at = pivots.size();
      Collections.swap(rows, at, pivot);
      Form scale = rows.get(at).get(column).inverse();
      rows.get(at).replaceAll(entry -> entry.times(scale));
      for (int i = 0; i < rows.size(); i++) {
        Form factor = rows.get(i).get(column);
        if (i != at && !factor.isZero()) {
          eliminate(rows.get(i), rows.get(at), factor, column);
        }
      }
      pivots.add(column);
    }
    return freeVectors(rows, pivots, columns);
  }

  /// The row from `from` on with the shortest nonzero entry in the column, or −1.
  private static int simplest(List<List<Form>> rows, int from, int column) {
    int best = -1;
    int size = Integer.MAX_VALUE;
    for (int i = from; i < rows.size(); i++) {
      Form entry = rows.get(i).get(column);
      int terms = entry.numerator().size() + entry.denominator().size();
      if (!entry.isZero() && terms < size) {
        best = i;
        size = terms;
      }
    }
    return best;
  }

  private static List<List<Form>> freeVectors(
      List<List<Form>> rows, List<Integer> pivots, int columns) {
    List<List<Form>> basis = new ArrayList<>();
    for (int free = 0; free < columns; free++) {
      if (pivots.contains(free)) {
        continue;
      }
      List<Form> vector = new ArrayList<>(Collections.nCopies(columns, Form.ZERO));
      vector.set(free, Form.ONE);
      for (int i = 0; i < pivots.size(); i++) {
        vector.set(pivots.get(i), rows.get(i).get(free).negated());
      }
      basis.add(vector);
    }
    return basis;
  }

  private static void eliminate(List<Form> row, List<Form> pivot, Form factor, int from) {
    Budget.checkpoint();
    for (int j = from; j < row.size(); j++) {
      row.set(j, row.get(j).minus(factor.times(pivot.get(j))));
    }
  }
}
