package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.polynomial.Polynomial;
import gnomon.recurrence.LinearEquation;
import gnomon.syntax.Expression;
import gnomon.value.FormValue;
import gnomon.value.Status;
import gnomon.value.Value;
import java.util.Optional;

/// `carry L f = g by U`: the equation (U L U⁻¹) h = U g, which h = U f solves whenever f solves L f
/// = g, with the solution carried along. The carried operator comes from the conjugation of
/// symbols, the carried solution from the images of its kernels; the two meet only in the check.
final class Carrying {
  private final Evaluator evaluator;
  private final Evaluation evaluation;

  Carrying(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
  }

  /// The carried solution, with the carried law in the status line; the carried operator where
  /// there is no solution to carry.
  Value value(Expression.Carry carry, Scope scope) {
    Solving solving = new Solving(evaluator, evaluation);
    Solving.Law law = solving.law(carry.law(), scope);
    MappedOperator map = map(carry.map(), law.equation().variable(), scope);
    return Places.at(
        carry.span(),
        () -> carried(carry, law, map, new UnknownName(scope).of(carry.law()), scope));
  }

  private MappedOperator map(Expression expression, Variable x, Scope scope) {
    Value value = evaluator.value(expression, scope);
    Span span = expression.span();
    MappedOperator map =
        Sorts.asOperator(value)
            .orElseThrow(
                () ->
                    Problems.of(
                        "kind-carry",
                        "an equation is carried by a basis map, not by " + Sorts.article(value),
                        span,
                        "carry D^2 f + f = 0 by umbral(Delta)"));
    boolean exact =
        !(value instanceof FormValue)
            && map.terms().stream().allMatch(term -> term.operator().kernelOrders().isEmpty())
            && map.inverse().terms().stream()
                .allMatch(term -> term.operator().kernelOrders().isEmpty());
    if (!exact) {
      throw Problems.of(
          "kind-carry",
          "an equation is carried by a map with a proper inverse",
          span,
          "carry D^2 f + f = 0 by umbral(Delta)");
    }
    boolean elsewhere =
        map.terms().stream()
            .anyMatch(term -> !term.map().isIdentity() && !term.map().variable().equals(x));
    if (elsewhere) {
      throw Problems.of(
          "kind-carry", "the map does not act on " + x.name() + ", as the equation does", span);
    }
    return map;
  }

  private Value carried(
      Expression.Carry carry, Solving.Law read, MappedOperator map, String name, Scope scope) {
    LinearEquation law = read.equation();
    Form moved = Form.of(law.variable()).plus(Form.of(read.lowest()));
    Polynomial common = Polynomial.ONE;
    for (Form coefficient : law.coefficients()) {
      common = Polynomial.lcm(common, coefficient.denominator());
    }
    Operator back = Operator.shift(law.variable(), Form.of(read.lowest()));
    Operator left = back.compose(operator(law, Form.of(common)));
    Form right = law.rightSide().times(Form.of(common)).substitute(law.variable(), moved);
    MappedOperator image = map.compose(MappedOperator.of(left)).compose(map.inverse());
    Value imageValue = Sorts.of(image);
    Form imageRight = map.applyTo(right, evaluation.sums());
    String said = said(imageValue, name, imageRight, law.variable());
    Optional<Form> solution = solution(carry, map, image, imageRight, scope);
    if (solution.isEmpty()) {
      String none = ", without a solution: none is known in closed form that can be carried";
      evaluation.status(Status.of(Status.Kind.CARRIED).withDetail("to " + said + none));
      return imageValue;
    }
    String met =
        new Conditions(evaluation.writing(), scope.running()).words(evaluation.conditions());
    evaluation.status(
        Status.of(Status.Kind.CARRIED)
            .withDetail(("to a solution of " + said + " " + met).strip()));
    return Sorts.of(solution.get(), scope);
  }

  private static Operator operator(LinearEquation law, Form factor) {
    Variable x = law.variable();
    Operator step =
        switch (law.action()) {
          case SHIFT -> Operator.shift(x, Form.ONE);
          case DERIVATIVE -> Operator.derivative(x);
        };
    Operator sum = Operator.zero();
    for (int i = 0; i <= law.order(); i++) {
      Form coefficient = law.coefficients().get(i).times(factor);
      sum = sum.plus(step.power(i).times(coefficient));
    }
    return sum;
  }

  private String said(Value operator, String name, Form right, Variable x) {
    String line = evaluation.writing().line(operator, x);
    boolean single = line.chars().noneMatch(c -> c == ' ' || c == '-');
    return (single ? line : "(" + line + ")")
        + " "
        + name
        + " = "
        + evaluation.writing().line(FormValue.of(right, x), x);
  }

  /// The carried solution, where there is one in closed form that solves the carried equation.
  private Optional<Form> solution(
      Expression.Carry carry, MappedOperator map, MappedOperator image, Form right, Scope scope) {
    Variable x = scope.running();
    try {
      Form solution = new Solving(evaluator, evaluation).solution(carry.law(), scope);
      Form moved = map.applyTo(solution, evaluation.sums());
      Form residual = image.applyTo(moved, evaluation.sums()).minus(right);
      if (!residual.isZero()) {
        return Optional.empty();
      }
      evaluation.grounds().say("the law carried", Sorts.of(image), x);
      evaluation.grounds().say("a solution of the law as it was", Sorts.of(solution, scope), x);
      evaluation.grounds().say("its image", Sorts.of(moved, scope), x);
      evaluation
          .grounds()
          .equal("put into the carried law, left side less right side", residual, Form.ZERO, x);
      return Optional.of(moved);
    } catch (LocatedRefusal | Refusal none) {
      return Optional.empty();
    }
  }
}
