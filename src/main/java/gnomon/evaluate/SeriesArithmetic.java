package gnomon.evaluate;

import gnomon.basis.Basis;
import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Sums and products in which a truncated series takes part. What is not a series is expanded in
/// the family of the one that is; a sum is known to the smaller order.
final class SeriesArithmetic {
  private final Scope scope;

  SeriesArithmetic(Scope scope) {
    this.scope = scope;
  }

  Value plus(Value a, Value b, Span span) {
    SeriesValue pattern = a instanceof SeriesValue series ? series : (SeriesValue) b;
    SeriesValue left = inFamily(a, pattern, span);
    SeriesValue right = inFamily(b, pattern, span);
    if (!left.family().equals(right.family())) {
      throw Problems.of("kind-series", "these series proceed in different families", span);
    }
    int order = Math.min(left.order(), right.order());
    int first = Math.min(left.first(), right.first());
    List<Form> coefficients = new ArrayList<>();
    for (int k = first; k < order; k++) {
      coefficients.add(left.coefficient(k).plus(right.coefficient(k)));
    }
    return new SeriesValue(left.family(), first, coefficients, order);
  }

  Value scaled(SeriesValue series, Form factor) {
    return new SeriesValue(
        series.family(),
        series.first(),
        series.coefficients().stream().map(c -> c.times(factor)).toList(),
        series.order());
  }

  Value times(SeriesValue a, Value b, Span span) {
    if (b instanceof FormValue form && isScalar(a.family(), form.form())) {
      return scaled(a, form.form());
    }
    if (!isPowers(a.family())) {
      throw Problems.of("kind-series", "series in this family have no product", span);
    }
    PowerSeries left = asPowerSeries(a);
    PowerSeries right =
        b instanceof FormValue form
            ? Expansion.of(form.form(), generator(a.family(), span), a.order() + 1)
            : asPowerSeries(inFamily(b, a, span));
    return ofPowerSeries(a.family(), left.times(right));
  }

  SeriesValue inverse(SeriesValue series, Span span) {
    requirePowers(series, span);
    return ofPowerSeries(series.family(), asPowerSeries(series).inverse());
  }

  Value power(SeriesValue series, int exponent, Span span) {
    requirePowers(series, span);
    return ofPowerSeries(series.family(), asPowerSeries(series).power(exponent));
  }

  /// A function of the language applied to a series in powers: the function is expanded about the
  /// constant term and the rest composed into it.
  Value apply(String function, SeriesValue series, Span span) {
    requirePowers(series, span);
    Variable inner = new Variable("t");
    Form constant = series.first() < 0 ? Form.ZERO : series.coefficient(0);
    Form shifted =
        Elementary.apply(function, constant.plus(Form.of(inner)))
            .orElseThrow(() -> Problems.of("kind-series", "no series of this function", span));
    PowerSeries rest =
        asPowerSeries(series).minus(PowerSeries.constant(constant, series.order() - 1));
    PowerSeries outer = Expansion.of(shifted, inner, series.order() - 1);
    return ofPowerSeries(series.family(), outer.compose(rest).truncated(series.order() - 1));
  }

  private static void requirePowers(SeriesValue series, Span span) {
    if (!isPowers(series.family())) {
      throw Problems.of("kind-series", "only series in powers can be divided and composed", span);
    }
  }

  private static boolean isPowers(Family family) {
    return family instanceof Family.Powers || family instanceof Family.OperatorPowers;
  }

  private static boolean isScalar(Family family, Form form) {
    return switch (family) {
      case Family.Powers(Form base) -> base.variables().stream().noneMatch(form::dependsOn);
      case Family.FallingPowers(Form base) -> base.variables().stream().noneMatch(form::dependsOn);
      case Family.RisingPowers(Form base) -> base.variables().stream().noneMatch(form::dependsOn);
      case Family.Images(ShefferMap map) -> !form.dependsOn(map.variable());
      case Family.OperatorPowers(Operator of) -> of.variables().stream().noneMatch(form::dependsOn);
    };
  }

  static PowerSeries asPowerSeries(SeriesValue series) {
    return PowerSeries.of(series.coefficients(), series.first(), series.order() - 1);
  }

  static SeriesValue ofPowerSeries(Family family, PowerSeries series) {
    List<Form> coefficients = new ArrayList<>();
    for (int k = series.valuation(); k <= series.order(); k++) {
      coefficients.add(series.coefficient(k));
    }
    return new SeriesValue(family, series.valuation(), coefficients, series.order() + 1);
  }

  private static Generator generator(Family family, Span span) {
    if (family instanceof Family.Powers(Form base) && base.asGenerator().isPresent()) {
      return base.asGenerator().get();
    }
    throw Problems.of("kind-series", "this series is not in powers of a variable", span);
  }

  /// The value as a series in the family of the pattern, known as far as the pattern is.
  private SeriesValue inFamily(Value value, SeriesValue pattern, Span span) {
    if (value instanceof SeriesValue series) {
      return series;
    }
    Family family = pattern.family();
    int last = pattern.order() - 1;
    if (value instanceof FormValue form) {
      return ofForm(form.form(), family, last, span);
    }
    Optional<Operator> operator = Sorts.asPlainOperator(value);
    if (operator.isPresent() && family instanceof Family.OperatorPowers(Operator of)) {
      return Expansions.ofOperator(operator.get(), of, variableOf(of), Math.max(0, last));
    }
    throw Problems.of(
        "kind-series", Sorts.article(value) + " cannot be added to this series", span);
  }

  private Variable variableOf(Operator operator) {
    return operator.variables().stream().findFirst().orElse(scope.running());
  }

  private SeriesValue ofForm(Form form, Family family, int last, Span span) {
    return switch (family) {
      case Family.Powers _ ->
          ofPowerSeries(family, Expansion.of(form, generator(family, span), last));
      case Family.OperatorPowers(Operator of) ->
          Expansions.ofOperator(Operator.multiplication(form), of, variableOf(of), last);
      case Family.FallingPowers(Form base) ->
          inBasis(form, new Basis.FallingPowers(variable(base, span)), last);
      case Family.RisingPowers(Form base) ->
          inBasis(form, new Basis.RisingPowers(variable(base, span)), last);
      case Family.Images(ShefferMap map) -> inBasis(form, new Basis.Sequence(map), last);
    };
  }

  private static SeriesValue inBasis(Form form, Basis basis, int last) {
    return Expansions.series(form, basis, last, Summation.NONE);
  }

  private static Variable variable(Form base, Span span) {
    if (base.asGenerator().orElse(null) instanceof Variable variable) {
      return variable;
    }
    throw Problems.of("kind-series", "this series is not in powers of a variable", span);
  }
}
