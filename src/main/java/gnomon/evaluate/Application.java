package gnomon.evaluate;

import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.operator.Functional;
import gnomon.operator.Operator;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.MapValue;
import gnomon.value.OperatorValue;
import gnomon.value.SeriesValue;
import gnomon.value.Status;
import gnomon.value.Value;

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
    if (a instanceof FunctionalValue value) {
      Functional functional = value.functional();
      Form image = functional.applyTo(f, evaluation.sums());
      evaluation.step("the functional applied", a, Sorts.of(image, scope), "");
      return Sorts.of(image, scope);
    }
    MappedOperator operator = Sorts.asOperator(a).orElseThrow();
    Form image = operator.applyTo(f, evaluation.sums());
    if (operator.asOperator().filter(Application::sums).isPresent()) {
      evaluation.status(Status.of(Status.Kind.CLOSED_FORM));
      checkSum(operator.asOperator().orElseThrow(), image, f, scope);
    } else {
      evaluation.step("the operator applied", Sorts.of(f, scope), Sorts.of(image, scope), "");
    }
    return Sorts.of(image, scope);
  }

  /// Whether shifts are inverted: the image then is a sum.
  private static boolean sums(Operator operator) {
    return !operator.boundaries().isEmpty() || !operator.kernelOrders().isEmpty();
  }

  /// Records for an inverse of Q that Q brings the image back to f, if it does.
  private void checkSum(Operator operator, Form image, Form f, Scope scope) {
    Operator difference = Operator.forwardDifference(scope.running(), Form.ONE);
    if (operator.equals(Operator.sum(scope.running())) || isInverseOf(operator, difference)) {
      Form back = difference.applyTo(image);
      if (back.equals(f)) {
        evaluation.antidifference(image, back, f, scope.running(), false);
      }
    }
  }

  private static boolean isInverseOf(Operator operator, Operator difference) {
    return operator.symbol().times(difference.symbol()).isOne();
  }
}
