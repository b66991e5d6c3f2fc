package gnomon.evaluate;

import gnomon.basis.Basis;
import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.series.PowerSeries;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.MapValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.List;

/// Operators and maps on truncated series. A map carries the basis along and keeps the
/// coefficients; an operator that is a polynomial in D acts on the known part and loses as many
/// terms as its order.
final class SeriesAction {
  private final Evaluation evaluation;
  private final Scope scope;

  SeriesAction(Evaluation evaluation, Scope scope) {
    this.evaluation = evaluation;
    this.scope = scope;
  }

  Value apply(Value acting, SeriesValue series, Span span) {
    ShefferMap basis = basisOf(series.family(), span);
    if (acting instanceof MapValue(ShefferMap map)) {
      Family family = Expansions.family(Expansions.basis(map.compose(basis)));
      return new SeriesValue(family, series.first(), series.coefficients(), series.order());
    }
    MappedOperator map = MappedOperator.of(basis);
    Operator inside =
        Sorts.asOperator(acting)
            .map(operator -> map.inverse().compose(operator).compose(map))
            .flatMap(MappedOperator::asOperator)
            .orElseThrow(() -> infinite(span));
    return image(inside, series, basis.variable(), span);
  }

  private static ShefferMap basisOf(Family family, Span span) {
    return switch (family) {
      case Family.Powers(Form base)
          when base.asGenerator().orElse(null) instanceof Variable variable ->
          ShefferMap.identity(new Dual(variable));
      case Family.FallingPowers(Form base)
          when base.asGenerator().orElse(null) instanceof Variable variable ->
          new Basis.FallingPowers(variable).toMap();
      case Family.RisingPowers(Form base)
          when base.asGenerator().orElse(null) instanceof Variable variable ->
          new Basis.RisingPowers(variable).toMap();
      case Family.Images(ShefferMap map) -> map;
      case Family.Powers _, Family.FallingPowers _, Family.RisingPowers _ ->
          throw Problems.of("kind-series", "this series is not in powers of a variable", span);
      case Family.OperatorPowers _ ->
          throw Problems.of("kind-series", "a series of operators is not a function", span);
    };
  }

  /// The image of Σ c_n x^n + O(x^order) under an operator that is a polynomial in D and Integral.
  private Value image(Operator operator, SeriesValue series, Variable x, Span span) {
    Dual t = new Dual(x);
    Form symbol = operator.symbol();
    if (!operator.isPlain() || !Structure.isRationalIn(symbol, t)) {
      throw infinite(span);
    }
    int lowest = 0;
    while (lowest < 64 && Structure.asPolynomial(symbol, t).isEmpty()) {
      symbol = symbol.times(Form.of(t));
      lowest--;
    }
    List<Form> derivatives = Structure.asPolynomial(symbol, t).orElseThrow(() -> infinite(span));
    int lost = derivatives.size() - 1 + lowest;
    if (derivatives.stream().anyMatch(c -> Structure.asPolynomial(c, x).isEmpty())) {
      throw infinite(span);
    }
    PowerSeries known = SeriesArithmetic.asPowerSeries(series);
    Form image = operator.applyTo(known.toForm(Form.of(x)), evaluation.sums());
    return new SeriesArithmetic(scope)
        .plus(
            new SeriesValue(series.family(), 0, List.of(), series.order() - lost),
            FormValue.of(expanded(image, series.family(), x)),
            span);
  }

  /// The image read in the family of the series: the coefficients are those of the powers.
  private static Form expanded(Form image, Family family, Variable x) {
    return switch (family) {
      case Family.Powers _ -> image;
      case Family.FallingPowers _, Family.RisingPowers _, Family.Images _ ->
          Structure.polynomial(
              basisOf(family, Span.NONE)
                  .image(Structure.asPolynomial(image, x).orElse(List.of(Form.ZERO))),
              x);
      case Family.OperatorPowers _ -> image;
    };
  }

  private static RuntimeException infinite(Span span) {
    return Problems.of(
        "domain-series-action",
        "this operator mixes known terms with those left out",
        span,
        "Delta exp(x) to 6");
  }
}
