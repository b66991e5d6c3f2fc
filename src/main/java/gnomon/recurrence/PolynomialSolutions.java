package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.LinearSystem;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// All polynomial solutions of a linear equation with polynomial coefficients and a polynomial
/// right side.
///
/// With Δ = E − 1 the equation is Σ_j b_j Δ^j y = g; Δ lowers degrees by one as D does, so that
/// with b = max (deg b_j − j) the degree of y is at most deg g − b, below −b, or a root of Σ
/// lc(b_j) d↓j over the j that attain b. The coefficients then solve a linear system.
///
/// Source: M. Petkovšek, Hypergeometric solutions of linear recurrences with polynomial
/// coefficients (1992), section 4, from memory.
///
/// @param particular one solution, where there is any
/// @param homogeneous a basis of the solutions for the right side 0
record PolynomialSolutions(Optional<Form> particular, List<Form> homogeneous) {

  private static final int HIGHEST_DEGREE = 2_000;
  private static final Variable D = new Variable("d'");

  /// @throws Refusal with [Reason#OUT_OF_RANGE] where the degree bound is too large to work with
  static PolynomialSolutions of(LinearEquation equation) {
    int degree = bound(equation);
    Variable v = equation.variable();
    List<List<Form>> columns = new ArrayList<>();
    Form power = Form.ONE;
    for (int j = 0; j <= degree; j++) {
      Budget.checkpoint();
      columns.add(coefficients(equation.homogeneous().residual(power), v));
      power = power.times(Form.of(v));
    }
    columns.add(coefficients(equation.rightSide().negated(), v));
    List<List<Form>> kernel = LinearSystem.kernel(rows(columns), columns.size());
    Optional<Form> particular = Optional.empty();
    List<Form> homogeneous = new ArrayList<>();
    for (List<Form> vector : kernel) {
      Form value = Structure.polynomial(vector.subList(0, degree + 1), v);
      if (vector.getLast().isZero()) {
        homogeneous.add(value);
      } else {
        particular = Optional.of(value.dividedBy(vector.getLast()));
      }
    }
    if (equation.rightSide().isZero()) {
      particular = Optional.of(Form.ZERO);
    }
    return new PolynomialSolutions(particular, homogeneous);
  }

  private static List<Form> coefficients(Form form, Variable v) {
    return Structure.asPolynomial(form, v).orElseThrow();
  }

  private static List<List<Form>> rows(List<List<Form>> columns) {
    int height = columns.stream().mapToInt(List::size).max().orElse(0);
    List<List<Form>> rows = new ArrayList<>();
    for (int i = 0; i < height; i++) {
      List<Form> row = new ArrayList<>();
      for (List<Form> column : columns) {
        row.add(i < column.size() ? column.get(i) : Form.ZERO);
      }
      rows.add(row);
    }
    return rows;
  }

  /// The largest degree a solution can have, −1 where only 0 is left.
  private static int bound(LinearEquation equation) {
    Variable v = equation.variable();
    List<Form> differences = inDifferences(equation);
    int width = Integer.MIN_VALUE;
    for (int j = 0; j < differences.size(); j++) {
      int degree = degree(differences.get(j), v);
      width = degree < 0 ? width : Math.max(width, degree - j);
    }
    Form indicial = Form.ZERO;
    Form falling = Form.ONE;
    for (int j = 0; j < differences.size(); j++) {
      List<Form> list = coefficients(differences.get(j), v);
      if (!list.isEmpty() && list.size() - 1 - j == width) {
        indicial = indicial.plus(list.getLast().times(falling));
      }
      falling = falling.times(Form.of(D).minus(Form.of(j)));
    }
    int right = degree(equation.rightSide(), v);
    int bound = Math.max(right < 0 ? -1 : right - width, -width - 1);
    for (BigInteger root : IntegerRoots.of(indicial, D)) {
      if (root.bitLength() > 20) {
        throw new Refusal(Reason.OUT_OF_RANGE, Form.of(root));
      }
      bound = Math.max(bound, root.intValueExact());
    }
    if (bound > HIGHEST_DEGREE) {
      throw new Refusal(Reason.OUT_OF_RANGE, Form.of(bound));
    }
    return Math.max(bound, -1);
  }

  private static int degree(Form form, Variable v) {
    return coefficients(form, v).size() - 1;
  }

  /// The coefficients b_j of Δ^j, or those of D^j as they are.
  private static List<Form> inDifferences(LinearEquation equation) {
    if (equation.action() == LinearEquation.Action.DERIVATIVE) {
      return equation.coefficients();
    }
    List<Form> all = new ArrayList<>();
    for (int j = 0; j <= equation.order(); j++) {
      Form sum = Form.ZERO;
      for (int i = j; i <= equation.order(); i++) {
        Rational binomial = Rational.of(Integers.binomial(i, j));
        sum = sum.plus(equation.coefficients().get(i).times(binomial));
      }
      all.add(sum);
    }
    return all;
  }
}
