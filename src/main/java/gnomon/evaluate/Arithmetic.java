package gnomon.evaluate;

import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.operator.Functional;
import gnomon.operator.Operator;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.MapValue;
import gnomon.value.OperatorValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BinaryOperator;

/// Sums, signs, quotients and powers of values, by their sorts.
final class Arithmetic {
  private final Evaluation evaluation;

  Arithmetic(Evaluation evaluation) {
    this.evaluation = evaluation;
  }

  Value plus(Value a, Value b, Span span, Scope scope) {
    if (a instanceof FormValue left && b instanceof FormValue right) {
      return Sorts.of(left.form().plus(right.form()), scope);
    }
    if (a instanceof SeriesValue || b instanceof SeriesValue) {
      return new SeriesArithmetic(scope).plus(a, b, span);
    }
    if (a instanceof ListValue left && b instanceof ListValue right) {
      return itemwise(left, right, span, (u, v) -> plus(u, v, span, scope));
    }
    if (a instanceof FunctionalValue left && b instanceof FunctionalValue right) {
      return new FunctionalValue(left.functional().plus(right.functional()));
    }
    if (Sorts.acts(a) || Sorts.acts(b)) {
      return Sorts.of(summand(a, b, span, scope).plus(summand(b, a, span, scope)));
    }
    throw Problems.of(
        "kind-sum", Sorts.article(a) + " and " + Sorts.article(b) + " cannot be added", span);
  }

  /// The value as an operator that is added to `other`; a scalar is a multiple of the identity.
  private MappedOperator summand(Value value, Value other, Span span, Scope scope) {
    if (value instanceof FormValue form
        && !Sorts.isScalarFor(form.form(), other, scope.running())) {
      throw Problems.pointingToX("an operator and a function cannot be added", span, scope);
    }
    return Sorts.asOperator(value)
        .orElseThrow(
            () ->
                Problems.of(
                    "kind-sum",
                    Sorts.article(value) + " cannot be added to " + Sorts.article(other),
                    span));
  }

  Value negated(Value value, Span span, Scope scope) {
    return switch (value) {
      case FormValue form -> Sorts.of(form.form().negated(), scope);
      case FunctionalValue functional ->
          new FunctionalValue(functional.functional().times(Form.MINUS_ONE));
      case OperatorValue operator -> Sorts.of(operator.operator().negated());
      case MapValue map -> Sorts.of(MappedOperator.of(map.map()).negated());
      case SeriesValue series -> new SeriesArithmetic(scope).scaled(series, Form.MINUS_ONE);
      case ListValue list ->
          new ListValue(list.items().stream().map(item -> negated(item, span, scope)).toList());
      case Value other ->
          throw Problems.of("kind-sign", Sorts.article(other) + " has no negative", span);
    };
  }

  /// a b: the functions multiply, operators compose, an operator applies to a function.
  Value times(Value a, Value b, Span span, Scope scope) {
    if (a instanceof FormValue left) {
      return scaled(left, b, span, scope);
    }
    if (Sorts.acts(a)) {
      return new Application(evaluation).apply(a, b, span, scope);
    }
    if (a instanceof SeriesValue series && (b instanceof FormValue || b instanceof SeriesValue)) {
      return new SeriesArithmetic(scope).times(series, b, span);
    }
    if (a instanceof ListValue && b instanceof FormValue) {
      return times(b, a, span, scope);
    }
    throw product(a, b, span);
  }

  private Value scaled(FormValue left, Value b, Span span, Scope scope) {
    Form factor = left.form();
    return switch (b) {
      case FormValue right -> Sorts.of(factor.times(right.form()), scope);
      case FunctionalValue right when !factor.dependsOn(scope.running()) ->
          new FunctionalValue(right.functional().times(factor));
      case FunctionalValue right ->
          Sorts.of(MappedOperator.of(right.functional().toOperator()).times(factor));
      case OperatorValue right -> Sorts.of(right.operator().times(factor));
      case MapValue right -> Sorts.of(MappedOperator.of(right.map()).times(factor));
      case SeriesValue right -> new SeriesArithmetic(scope).times(right, left, span);
      case ListValue right ->
          new ListValue(
              right.items().stream().map(item -> times(left, item, span, scope)).toList());
      case Value other -> throw product(left, other, span);
    };
  }

  private static RuntimeException product(Value a, Value b, Span span) {
    return Problems.of(
        "kind-product", Sorts.article(a) + " and " + Sorts.article(b) + " have no product", span);
  }

  /// a/b for values that commute.
  Value dividedBy(Value a, Value b, Span span, Scope scope) {
    if (b instanceof FormValue divisor) {
      Value inverse = Sorts.of(divisor.form().inverse(), scope);
      return a instanceof FormValue left
          ? Sorts.of(left.form().dividedBy(divisor.form()), scope)
          : times(inverse, a, span, scope);
    }
    if (b instanceof SeriesValue series && (a instanceof FormValue || a instanceof SeriesValue)) {
      SeriesArithmetic arithmetic = new SeriesArithmetic(scope);
      return arithmetic.times(arithmetic.inverse(series, span), a, span);
    }
    Optional<Operator> left = Sorts.asPlainOperator(a);
    Optional<Operator> right = Sorts.asPlainOperator(b);
    if (left.isPresent() && right.isPresent()) {
      return Sorts.of(left.get().dividedBy(right.get()));
    }
    if (a instanceof FormValue && Sorts.acts(b)) {
      return times(a, power(b, Sorts.of(Form.MINUS_ONE, scope), span, scope), span, scope);
    }
    throw Problems.of(
        "kind-quotient", Sorts.article(a) + " cannot be divided by " + Sorts.article(b), span);
  }

  Value power(Value base, Value exponent, Span span, Scope scope) {
    if (base instanceof FormValue left && exponent instanceof FormValue right) {
      return Sorts.of(Elementary.power(left.form(), right.form()), scope);
    }
    if (base instanceof FormValue left && Sorts.acts(exponent)) {
      if (left.form().isZero()) {
        throw Problems.of("domain-power", "0 has no power with an operator in it", span, "2^D");
      }
      Operator rate = plain(exponent, span);
      return Sorts.of(rate.lift(symbol -> Elementary.power(left.form(), symbol)));
    }
    if (exponent instanceof FormValue right) {
      return powerOf(base, right.form(), span, scope);
    }
    throw Problems.of("kind-power", "an exponent cannot be " + Sorts.article(exponent), span);
  }

  private Value powerOf(Value base, Form exponent, Span span, Scope scope) {
    if (base instanceof SeriesValue series) {
      return new SeriesArithmetic(scope).power(series, wholeExponent(exponent, span), span);
    }
    if (!Sorts.acts(base) || base instanceof FunctionalValue) {
      throw Problems.of("kind-power", Sorts.article(base) + " has no powers", span);
    }
    if (base instanceof MapValue map) {
      return Sorts.of(MappedOperator.of(map.map().power(wholeExponent(exponent, span))));
    }
    Optional<Operator> plain = Sorts.asPlainOperator(base);
    if (plain.isPresent()) {
      return Sorts.of(plain.get().power(exponent));
    }
    MappedOperator operator = Sorts.asOperator(base).orElseThrow();
    return Sorts.of(operator.power(wholeExponent(exponent, span)));
  }

  private static int wholeExponent(Form exponent, Span span) {
    return exponent
        .asInt()
        .orElseThrow(() -> Problems.of("kind-power", "this exponent must be an integer", span));
  }

  static Operator plain(Value value, Span span) {
    return Sorts.asPlainOperator(value)
        .orElseThrow(
            () ->
                Problems.of(
                    "kind-not-an-operator", "an operator without basis maps is needed here", span));
  }

  private static Value itemwise(
      ListValue left, ListValue right, Span span, BinaryOperator<Value> join) {
    if (left.items().size() != right.items().size()) {
      throw Problems.of(
          "kind-sum",
          "lists of " + left.items().size() + " and " + right.items().size() + " items",
          span);
    }
    List<Value> items = new ArrayList<>();
    for (int i = 0; i < left.items().size(); i++) {
      items.add(join.apply(left.items().get(i), right.items().get(i)));
    }
    return new ListValue(items);
  }

  static Functional functional(Value value) {
    return ((FunctionalValue) value).functional();
  }
}
