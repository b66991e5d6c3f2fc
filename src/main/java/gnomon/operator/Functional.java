package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;

/// A linear functional in the variable x, given by its indicator v(t): f ↦ [v(D) f](0).
///
/// The indicator is what the functional makes of e^(t x). Evaluation at a has the indicator e^(a
/// t), the integral from a to b has (e^(b t) − e^(a t))/t.
public record Functional(Variable variable, Form indicator) {

  /// A functional with the indicator.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when the indicator has no power series at t = 0
  public Functional {
    if (Kernels.valuation(indicator, new Dual(variable)) < 0) {
      throw new Refusal(Reason.NO_SERIES, indicator);
    }
  }

  /// ε(a): f ↦ f(a).
  public static Functional evaluation(Variable x, Form a) {
    return new Functional(x, Elementary.exp(a.times(Form.of(new Dual(x)))));
  }

  /// f ↦ the integral of f from a to b.
  public static Functional integral(Variable x, Form a, Form b) {
    Form t = Form.of(new Dual(x));
    Form difference = Elementary.exp(b.times(t)).minus(Elementary.exp(a.times(t)));
    return new Functional(x, difference.dividedBy(t));
  }

  /// The operator f ↦ the value, as a constant function.
  public Operator toOperator() {
    return Operator.of(Form.ZERO, variable, indicator);
  }

  /// The sum of two functionals in the same variable.
  public Functional plus(Functional that) {
    requireSameVariable(that);
    return new Functional(variable, indicator.plus(that.indicator));
  }

  /// The difference of two functionals in the same variable.
  public Functional minus(Functional that) {
    requireSameVariable(that);
    return new Functional(variable, indicator.minus(that.indicator));
  }

  /// The functional multiplied by a scalar.
  public Functional times(Form scalar) {
    return new Functional(variable, indicator.times(scalar));
  }

  private void requireSameVariable(Functional that) {
    if (!variable.equals(that.variable)) {
      throw new Refusal(Reason.MIXED_BOUNDARIES, indicator, that.indicator);
    }
  }

  /// The functional after an operator: f ↦ this(A f).
  ///
  /// @throws Refusal with [Reason#INFINITE_COMPOSITION] or [Reason#KERNEL_LOST] as
  ///   [Operator#compose], or with [Reason#MIXED_BOUNDARIES] when the operator acts on other
  ///   variables too
  public Functional compose(Operator operator) {
    for (Variable x : operator.variables()) {
      if (!x.equals(variable)) {
        throw new Refusal(Reason.MIXED_BOUNDARIES, indicator, operator.symbol());
      }
    }
    return new Functional(variable, toOperator().compose(operator).boundary(variable));
  }

  /// The value at a form.
  ///
  /// @throws Refusal as [Operator#applyTo(Form, Summation)]
  public Form applyTo(Form f, Summation engine) {
    return toOperator().applyTo(f, engine);
  }

  /// The value at a form, without the help of a summation engine.
  public Form applyTo(Form f) {
    return applyTo(f, Summation.NONE);
  }
}
