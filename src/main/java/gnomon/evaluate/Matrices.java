package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.value.FormValue;
import gnomon.value.MapValue;
import gnomon.value.TableValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;

/// The matrix of an operator or basis map on x^0 … x^N; column j holds the image of x^j.
final class Matrices {

  /// The matrix; its rows go up to the highest power that occurs, at least to x^N.
  Value matrix(Value acting, int order, Span span, Scope scope) {
    Budget.charge((order + 1L) * (order + 1L));
    List<List<Form>> columns = columns(acting, order, span, scope);
    int height = Math.max(order + 1, columns.stream().mapToInt(List::size).max().orElse(order + 1));
    List<List<Value>> rows = new ArrayList<>(height);
    for (int i = 0; i < height; i++) {
      List<Value> row = new ArrayList<>(order + 1);
      for (List<Form> column : columns) {
        row.add(FormValue.of(i < column.size() ? column.get(i) : Form.ZERO, scope.running()));
      }
      rows.add(row);
    }
    return new TableValue(List.of(), rows);
  }

  private static List<List<Form>> columns(Value acting, int order, Span span, Scope scope) {
    if (acting instanceof MapValue map) {
      return map.map().matrix(order);
    }
    if (!Sorts.acts(acting)) {
      throw Problems.of(
          "kind-matrix", Sorts.article(acting) + " has no matrix", span, "matrix Delta to 3");
    }
    MappedOperator operator = Sorts.asOperator(acting).orElseThrow();
    return operator.matrix(order, scope.running());
  }
}
