package gnomon.operator;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedSet;

/// The image of a form cut off after a derivative of stated order.
final class TruncatedApplication {
  private TruncatedApplication() {}

  /// Σ_(k ≤ order) a_k D^k f plus the same of the boundary part; negative k are integrals from 0,
  /// or antiderivatives where the operator leaves their constants undetermined.
  static Form apply(Operator operator, Form f, int order, Summation engine) {
    SortedSet<Variable> acting = operator.variables();
    if (acting.isEmpty()) {
      return operator.applyTo(f, engine);
    }
    if (acting.size() > 1) {
      throw new Refusal(Reason.INFINITE_SERIES, operator.symbol(), f);
    }
    Variable x = acting.first();
    Dual t = new Dual(x);
    PowerSeries series = operator.series(x, order);
    PowerSeries boundary = Expansion.of(operator.boundary(x), t, order);
    List<Form> parts = new ArrayList<>();
    Form slope = f;
    for (int k = 0; k <= order; k++) {
      Budget.checkpoint();
      parts.add(series.coefficient(k).times(slope));
      if (!boundary.coefficient(k).isZero()) {
        parts.add(boundary.coefficient(k).times(slope.substitute(x, Form.ZERO)));
      }
      slope = slope.derivative(x);
    }
    Form integral = f;
    boolean free = operator.kernelOrder(x) >= -series.valuation();
    for (int k = -1; k >= series.valuation(); k--) {
      integral = Antidifferences.antiderivative(integral, x);
      integral = free ? integral : integral.minus(integral.substitute(x, Form.ZERO));
      parts.add(series.coefficient(k).times(integral));
    }
    return Kernels.withConstants(Form.sum(parts), f, operator.kernelOrders());
  }
}
