package gnomon.basis;

import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/// Random Sheffer maps, operators polynomial in x, and polynomials.
record RandomMaps(Variable variable, RandomGenerator random) {

  private Form t() {
    return Form.of(new Dual(variable));
  }

  private Form any(List<Form> choices) {
    return choices.get(random.nextInt(choices.size()));
  }

  Form number() {
    int value = random.nextInt(1, 5);
    return Form.of(Rational.of(random.nextBoolean() ? value : -value, random.nextInt(1, 4)));
  }

  private Form exp(Form rate) {
    return Elementary.exp(rate.times(t()));
  }

  /// The symbol of a delta operator, one in three without closed inverse.
  Form delta() {
    Form t = t();
    Form one = Form.ONE;
    Form symbol =
        any(
            List.of(
                t,
                exp(one).minus(one),
                one.minus(exp(Form.MINUS_ONE)),
                exp(Form.HALF).minus(exp(Form.HALF.negated())),
                t.dividedBy(one.minus(t)),
                t.dividedBy(t.minus(one)),
                t.times(exp(one)),
                t.times(exp(Form.variable("a"))),
                exp(Form.TWO).minus(exp(one)),
                t.plus(t.power(2)),
                t.dividedBy(one.plus(t.power(2))),
                Elementary.ln(one.plus(t))));
    return symbol.times(any(List.of(one, one, number())));
  }

  /// The symbol of an invertible shift-invariant operator.
  Form invertible() {
    Form t = t();
    Form one = Form.ONE;
    return any(
        List.of(
            one,
            one,
            one.minus(t),
            exp(number()),
            exp(one).plus(one),
            exp(one).minus(one).dividedBy(t),
            one.minus(t).power(-2)));
  }

  ShefferMap map() {
    return ShefferMap.sheffer(delta(), invertible(), new Dual(variable));
  }

  ShefferMap closedMap() {
    while (true) {
      ShefferMap map = map();
      if (map.isClosed()) {
        return map;
      }
    }
  }

  /// A closed map whose inverse needs no roots.
  ShefferMap mapWithoutRoots() {
    while (true) {
      ShefferMap map = closedMap();
      if (!Kernels.anyMatch(map.inverseOfF(), kernel -> kernel.isAlgebraic())) {
        return map;
      }
    }
  }

  List<Form> coefficients(int size) {
    List<Form> result = new ArrayList<>();
    for (int k = 0; k < size; k++) {
      result.add(random.nextInt(4) == 0 ? Form.ZERO : number());
    }
    return result;
  }

  Form polynomial(int size) {
    return Kernels.polynomial(coefficients(size), variable);
  }

  /// An operator polynomial in x.
  Operator operator() {
    Form x = Form.of(variable);
    List<Form> parts = new ArrayList<>();
    for (int k = random.nextInt(1, 3); k > 0; k--) {
      Form symbol = any(List.of(t(), t().power(2), exp(Form.ONE), exp(number()), Form.ONE));
      parts.add(number().times(x.power(random.nextInt(3))).times(symbol));
    }
    return Operator.ofSymbol(Form.sum(parts));
  }

  /// An operator polynomial in x with a boundary part or integrals.
  Operator operatorWithBoundary() {
    return switch (random.nextInt(4)) {
      case 0 -> operator().plus(Operator.evaluation(variable, number()));
      case 1 -> Operator.integral(variable).compose(operator());
      case 2 -> operator().compose(Operator.sum(variable));
      default -> operator();
    };
  }
}
