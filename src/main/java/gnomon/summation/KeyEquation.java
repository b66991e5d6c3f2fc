package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.LinearSystem;
import gnomon.form.Structure;
import gnomon.form.Univariate;
import gnomon.form.Variable;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The equation a(k) y(k+1) − b(k) y(k) = Σ_i u_i p_i(k) for a polynomial y and constants u_i.
///
/// @param a not zero
/// @param b not zero
/// @param sides the p_i
record KeyEquation(Univariate a, Univariate b, List<Univariate> sides) {

  /// A polynomial y and the constants u_i, not all zero.
  record Solution(List<Form> y, List<Form> constants) {}

  /// A solution with u not zero, or nothing: then there is none, by the degree bound.
  ///
  /// Source of the bound: Petkovšek, Wilf, Zeilberger, A = B (1996), section 5.3, from memory.
  Optional<Solution> solve(Variable k) {
    return solutions(k).stream()
        .filter(solution -> solution.constants().stream().anyMatch(u -> !u.isZero()))
        .findFirst();
  }

  /// A basis of all solutions (y, u); those with u = 0 solve the homogeneous equation.
  List<Solution> solutions(Variable k) {
    int degree = bound();
    int unknowns = degree + 1 + sides.size();
    List<Univariate> columns = new ArrayList<>();
    Form power = Form.ONE;
    Form next = Form.ONE;
    for (int j = 0; j <= degree; j++) {
      columns.add(a.times(in(next, k)).minus(b.times(in(power, k))));
      power = power.times(Form.of(k));
      next = next.times(Form.of(k).plus(Form.ONE));
    }
    sides.forEach(side -> columns.add(Univariate.ZERO.minus(side)));
    int height = columns.stream().mapToInt(column -> column.coefficients().size()).max().orElse(0);
    List<List<Form>> rows = new ArrayList<>();
    for (int i = 0; i < height; i++) {
      List<Form> row = new ArrayList<>();
      for (Univariate column : columns) {
        row.add(column.coefficient(i));
      }
      rows.add(row);
    }
    return LinearSystem.kernel(rows, unknowns).stream()
        .map(
            vector ->
                new Solution(vector.subList(0, degree + 1), vector.subList(degree + 1, unknowns)))
        .toList();
  }

  private static Univariate in(Form form, Variable k) {
    return new Univariate(Structure.asPolynomial(form, k).orElseThrow());
  }

  /// The largest degree that y can have; −1 where only y = 0 is possible.
  private int bound() {
    int right = sides.stream().mapToInt(Univariate::degree).max().orElse(-1);
    int top = Math.max(a.degree(), b.degree());
    if (a.degree() != b.degree() || !a.leading().equals(b.leading())) {
      return Math.max(-1, right - top);
    }
    int bound = right - top + 1;
    if (top > 0) {
      Form second = b.coefficient(top - 1).minus(a.coefficient(top - 1));
      Optional<BigInteger> special = second.dividedBy(a.leading()).asInteger();
      if (special.isPresent() && special.get().signum() >= 0) {
        bound = Math.max(bound, special.get().min(BigInteger.valueOf(10_000)).intValueExact());
      }
    }
    return Math.max(-1, bound);
  }
}
