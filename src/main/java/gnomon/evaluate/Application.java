package gnomon.evaluate;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Functional;
import gnomon.operator.Operator;
import gnomon.recurrence.Lowered;
import gnomon.summation.Condition;
import gnomon.summation.DefiniteSum;
import gnomon.summation.DefiniteSums;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.MapValue;
import gnomon.value.OperatorValue;
import gnomon.value.SeriesValue;
import gnomon.value.Status;
import gnomon.value.Value;
import java.util.List;
import java.util.Optional;

/// An operator, basis map or functional in front of what it acts on: applied to functions, composed
/// with operators.
final class Application {
  private final Evaluation evaluation;

  Application(Evaluation evaluation) {
    this.evaluation = evaluation;
  }

  Value apply(Value a, Value b, Span span, Scope scope) {
    return switch (b) {
      case FormValue form -> toForm(a, form.form(), span, scope);
      case ListValue list ->
          new ListValue(list.items().stream().map(item -> apply(a, item, span, scope)).toList());
      case SeriesValue series -> new SeriesAction(evaluation, scope).apply(a, series, span);
      case OperatorValue _, MapValue _, FunctionalValue _ -> compose(a, b, span);
      case Value other ->
          throw Problems.of(
              "kind-application", "an operator cannot act on " + Sorts.article(other), span);
    };
  }

  Value compose(Value a, Value b, Span span) {
    if (a instanceof MapValue outer && b instanceof MapValue inner) {
      return Sorts.of(MappedOperator.of(outer.map().compose(inner.map())));
    }
    if (a instanceof FunctionalValue functional) {
      Operator operator = Arithmetic.plain(b, span);
      return new FunctionalValue(functional.functional().compose(operator));
    }
    MappedOperator outer = Sorts.asOperator(a).orElseThrow();
    MappedOperator inner = Sorts.asOperator(b).orElseThrow();
    return Sorts.of(outer.compose(inner));
  }

  private Value toForm(Value a, Form f, Span span, Scope scope) {
    Variable x = scope.running();
    refuseHeld(a, span, scope);
    if (a instanceof FunctionalValue value) {
      Form image = value.functional().applyTo(f, evaluation.sums());
      evaluation.grounds().applied(Sorts.of(value.functional().toOperator()), f, image, x);
      return Sorts.of(image, scope);
    }
    Optional<Operator> plain = Sorts.asPlainOperator(a);
    if (plain.filter(operator -> isSum(operator, x)).isPresent()) {
      return sum(f, scope);
    }
    MappedOperator operator = Sorts.asOperator(a).orElseThrow();
    if (evaluation.truncation().isPresent() && plain.isPresent()) {
      return Sorts.of(truncated(plain.get(), f), scope);
    }
    Form image = Lowered.of(operator.applyTo(f, evaluation.sums()), x);
    if (plain.filter(Application::sums).isPresent()) {
      evaluation.status(Status.of(Status.Kind.CLOSED_FORM));
    }
    evaluation.grounds().applied(a, f, image, x);
    return Sorts.of(image, scope);
  }

  /// An operator that acts on the running variable has nothing to act on where that has a value.
  private static void refuseHeld(Value a, Span span, Scope scope) {
    Variable x = scope.running();
    boolean held =
        scope.binding(x.name()).orElse(null) instanceof Binding.Held(FormValue(Form form, _, _))
            && !form.equals(Form.of(x));
    if (held && actsOn(a, x)) {
      throw Problems.of(
          "domain-held", "an operator acts on " + x.name() + ", which has a value here", span);
    }
  }

  private static boolean actsOn(Value a, Variable x) {
    if (a instanceof FunctionalValue(Functional functional)) {
      return functional.variable().equals(x);
    }
    return Sorts.asOperator(a).stream()
        .flatMap(operator -> operator.terms().stream())
        .anyMatch(
            term ->
                !term.map().isIdentity() && term.map().variable().equals(x)
                    || term.operator().variables().contains(x));
  }

  /// The image, cut off where it would be an infinite series.
  private Form truncated(Operator operator, Form f) {
    try {
      return operator.applyTo(f, evaluation.sums());
    } catch (Refusal refused) {
      if (refused.reason() != Reason.INFINITE_SERIES) {
        throw refused;
      }
      int order = evaluation.truncation().orElseThrow();
      Form image = operator.applyTo(f, order, evaluation.sums());
      evaluation.status(Status.NONE.withDetail("cut off after D^" + order));
      return image;
    }
  }

  /// Σ f: in closed form, or else the sum over 0..x-1 as it stands.
  private Value sum(Form f, Scope scope) {
    Variable x = scope.running();
    try {
      Form image = Operator.sum(x).applyTo(f, evaluation.sums());
      evaluation.status(Status.of(Status.Kind.CLOSED_FORM));
      evaluation.grounds().antidifference(image, f, x);
      return Sorts.of(image, scope);
    } catch (Refusal notFound) {
      Variable k = new Variable(x.name() + "'");
      Form summand = f.substitute(x, Form.of(k));
      DefiniteSum sum =
          new DefiniteSums(evaluation.sums())
              .sum(summand, k, Form.ZERO, Form.of(x).minus(Form.ONE));
      evaluation.met(RangeSums.status(sum, evaluation.writing(), x));
      evaluation.require(sum.conditions());
      if (sum.value().generators().stream().anyMatch(Accumulation.class::isInstance)) {
        // written with the upper end x - 1 it is the inverse of the difference from 0 on
        evaluation.require(List.of(new Condition(Form.of(x), Condition.Relation.NATURAL)));
      }
      return Sorts.of(sum.value(), scope);
    }
  }

  private static boolean isSum(Operator operator, Variable x) {
    return operator.iterate().isEmpty() && operator.equals(Operator.sum(x));
  }

  /// Whether shifts are inverted: the image then is a sum.
  private static boolean sums(Operator operator) {
    if (operator.kernelOrders().isEmpty()) {
      return false;
    }
    return operator.symbol().duals().stream()
        .anyMatch(t -> !Structure.isRationalIn(operator.symbol(), t));
  }
}
