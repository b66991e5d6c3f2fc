package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Matrices of operators on x^0, …, x^n, by the series of their symbols.
///
/// For A = Σ_k X^k c_k(D) the coefficient a_m of c_k gives x^j ↦ j!/(j−m)! a_m x^(j−m+k), where a
/// negative m is an integral; a boundary x^k ⊗ ε(0) v(D) adds j! v_j to the coefficient of x^k.
final class OperatorMatrix {

  private final Variable x;
  private final Dual dual;
  private final int n;

  private OperatorMatrix(Variable x, int n) {
    this.x = x;
    this.dual = new Dual(x);
    this.n = n;
  }

  /// The columns 0, …, n; column j lists the coefficients of the image of x^j.
  ///
  /// @throws Refusal with [Reason#NOT_POLYNOMIAL_IN_X] when images of polynomials are no
  ///   polynomials, with [Reason#KERNEL_LOST] when they are only defined modulo a kernel
  static List<List<Form>> of(MappedOperator operator, int n, Variable x) {
    if (n < 0) {
      throw new Refusal(Reason.NOT_NATURAL, Form.of(n));
    }
    Budget.charge((long) (n + 1) * (n + 1) / 2);
    OperatorMatrix matrix = new OperatorMatrix(x, n);
    Optional<ShefferMap> map = operator.asShefferMap();
    if (map.isPresent() && map.get().variable().equals(x)) {
      return map.get().matrix(n);
    }
    List<List<Form>> columns = null;
    for (MappedOperator.Term term : operator.terms()) {
      List<List<Form>> one = matrix.columns(term);
      columns = columns == null ? one : sum(columns, one);
    }
    return columns == null ? List.of() : columns;
  }

  private List<List<Form>> columns(MappedOperator.Term term) {
    if (term.operator().kernelOrder(x) > 0) {
      throw new Refusal(
          Reason.KERNEL_LOST, term.operator().symbol(), Form.of(x), term.operator().kernelOrder(x));
    }
    List<List<Form>> left = columns(term.operator());
    if (term.map().isIdentity()) {
      return left;
    }
    Budget.charge((long) n * n * n / 16);
    List<List<Form>> product = new ArrayList<>();
    for (List<Form> column : term.map().matrix(n)) {
      List<List<Form>> scaled = new ArrayList<>();
      for (int k = 0; k < column.size(); k++) {
        Budget.checkpoint();
        Form factor = column.get(k);
        if (!factor.isZero()) {
          scaled.add(left.get(k).stream().map(c -> c.times(factor)).toList());
        }
      }
      product.add(sum(scaled));
    }
    return product;
  }

  private List<List<Form>> columns(Operator operator) {
    List<List<Form>> result = new ArrayList<>();
    List<PowerSeries> symbol = series(operator.symbol());
    List<PowerSeries> boundary = series(operator.boundary(x));
    for (int j = 0; j <= n; j++) {
      Budget.checkpoint();
      List<Form> column = new ArrayList<>();
      for (int k = 0; k < symbol.size(); k++) {
        addImage(column, symbol.get(k), j, k);
      }
      Rational factorial = factorialQuotient(j, 0);
      for (int k = 0; k < boundary.size(); k++) {
        add(column, k, boundary.get(k).coefficient(j).times(factorial));
      }
      result.add(column);
    }
    return result;
  }

  /// x^k c(D) x^j.
  private void addImage(List<Form> column, PowerSeries c, int j, int k) {
    Rational falling = factorialQuotient(j, j - Math.min(0, c.valuation()));
    for (int m = Math.min(0, c.valuation()); m <= j; m++) {
      if (!c.coefficient(m).isZero()) {
        add(column, j - m + k, c.coefficient(m).times(falling));
      }
      falling = falling.times(Rational.of(j - m));
    }
  }

  /// a!/b!.
  private static Rational factorialQuotient(int a, int b) {
    Rational result = Rational.ONE;
    for (int i = b + 1; i <= a; i++) {
      result = result.times(Rational.of(i));
    }
    for (int i = a + 1; i <= b; i++) {
      result = result.dividedBy(Rational.of(i));
    }
    return result;
  }

  private static void add(List<Form> column, int index, Form value) {
    if (value.isZero()) {
      return;
    }
    while (column.size() <= index) {
      column.add(Form.ZERO);
    }
    column.set(index, column.get(index).plus(value));
  }

  /// The series of the coefficients of x^0, x^1, … of a symbol.
  private List<PowerSeries> series(Form symbol) {
    List<Form> coefficients =
        Structure.asPolynomial(symbol, x)
            .orElseThrow(() -> new Refusal(Reason.NOT_POLYNOMIAL_IN_X, symbol, Form.of(x)));
    return coefficients.stream().map(c -> Expansion.of(c, dual, n)).toList();
  }

  private static List<List<Form>> sum(List<List<Form>> left, List<List<Form>> right) {
    List<List<Form>> result = new ArrayList<>();
    for (int j = 0; j < left.size(); j++) {
      result.add(sum(List.of(left.get(j), right.get(j))));
    }
    return result;
  }

  private static List<Form> sum(List<List<Form>> columns) {
    int size = columns.stream().mapToInt(List::size).max().orElse(0);
    List<Form> result = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      int row = i;
      result.add(
          Form.sum(columns.stream().filter(c -> c.size() > row).map(c -> c.get(row)).toList()));
    }
    return result;
  }
}
