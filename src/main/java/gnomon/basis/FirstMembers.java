package gnomon.basis;

import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// What the first members s_0, …, s_N say of a Sheffer sequence: its pair to the order N.
///
/// From Σ_n s_n(x) t^n/n! = w(t) e^(x F(t)) the constant terms give w, the coefficients of x give w
/// F, and those of higher powers must be w F^k/k!.
///
/// @param f the series of the delta operator
/// @param g that of the invertible operator
public record FirstMembers(PowerSeries f, PowerSeries g) {

  /// The pair, where the polynomials in x are the first members of a Sheffer sequence.
  public static Optional<FirstMembers> of(List<Form> members, Variable x) {
    int order = members.size() - 1;
    List<List<Form>> rows = new ArrayList<>();
    for (Form member : members) {
      Optional<List<Form>> row = Structure.asPolynomial(member, x);
      if (row.isEmpty() || row.get().size() != rows.size() + 1) {
        return Optional.empty();
      }
      rows.add(row.get());
    }
    PowerSeries w = column(rows, 0, order);
    if (order < 1 || w.valuation() != 0) {
      return Optional.empty();
    }
    PowerSeries inverse = column(rows, 1, order).times(w.inverse()).truncated(order);
    if (inverse.valuation() != 1) {
      return Optional.empty();
    }
    PowerSeries power = w;
    for (int k = 1; k <= order; k++) {
      power = power.times(inverse).truncated(order);
      Form factorial = Form.of(Rational.of(Integers.factorial(k)).inverse());
      if (!power.times(factorial).equals(column(rows, k, order))) {
        return Optional.empty();
      }
    }
    PowerSeries f = inverse.reversion();
    return Optional.of(new FirstMembers(f, w.compose(f).truncated(order).inverse()));
  }

  /// Σ_n [x^k] s_n t^n/n!.
  private static PowerSeries column(List<List<Form>> rows, int k, int order) {
    List<Form> coefficients = new ArrayList<>();
    for (int n = 0; n <= order; n++) {
      Form entry = k < rows.get(n).size() ? rows.get(n).get(k) : Form.ZERO;
      coefficients.add(entry.times(Rational.of(Integers.factorial(n)).inverse()));
    }
    return PowerSeries.of(coefficients, 0, order);
  }

  /// The order N to which the pair is known.
  public int order() {
    return f.order();
  }

  /// The map with the pair cut off after the order.
  public ShefferMap map(Variable x) {
    Dual t = new Dual(x);
    return ShefferMap.sheffer(f.toForm(Form.of(t)), g.toForm(Form.of(t)), t);
  }
}
