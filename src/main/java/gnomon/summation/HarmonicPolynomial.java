package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.UnaryOperator;

/// A polynomial in harmonic numbers with coefficients free of them: monomials in the harmonic
/// numbers with their coefficients, none of which is zero.
record HarmonicPolynomial(Map<Monomial, Form> coefficients) {
  static final HarmonicPolynomial ZERO = new HarmonicPolynomial(Map.of());

  HarmonicPolynomial {
    Map<Monomial, Form> kept = new TreeMap<>(coefficients);
    kept.values().removeIf(Form::isZero);
    coefficients = kept;
  }

  static HarmonicPolynomial of(Monomial monomial, Form coefficient) {
    return new HarmonicPolynomial(Map.of(monomial, coefficient));
  }

  Form coefficient(Monomial monomial) {
    return coefficients.getOrDefault(monomial, Form.ZERO);
  }

  HarmonicPolynomial plus(HarmonicPolynomial that) {
    Map<Monomial, Form> sum = new TreeMap<>(coefficients);
    that.coefficients.forEach((monomial, c) -> sum.merge(monomial, c, Form::plus));
    return new HarmonicPolynomial(sum);
  }

  HarmonicPolynomial minus(HarmonicPolynomial that) {
    return plus(that.mapped(Form::negated));
  }

  HarmonicPolynomial times(Form factor) {
    return factor.isZero() ? ZERO : mapped(c -> c.times(factor));
  }

  HarmonicPolynomial times(HarmonicPolynomial that) {
    HarmonicPolynomial product = ZERO;
    for (var left : coefficients.entrySet()) {
      Map<Monomial, Form> row = new TreeMap<>();
      that.coefficients.forEach(
          (monomial, c) -> row.put(left.getKey().times(monomial), left.getValue().times(c)));
      product = product.plus(new HarmonicPolynomial(row));
    }
    return product;
  }

  private HarmonicPolynomial mapped(UnaryOperator<Form> change) {
    Map<Monomial, Form> result = new TreeMap<>();
    coefficients.forEach((monomial, c) -> result.put(monomial, change.apply(c)));
    return new HarmonicPolynomial(result);
  }

  /// The monomial with each harmonic number h replaced by h plus its step.
  static HarmonicPolynomial moved(Monomial monomial, Map<Generator, Form> steps) {
    HarmonicPolynomial product = of(Monomial.ONE, Form.ONE);
    for (Monomial.Power power : monomial.factors()) {
      Generator h = (Generator) power.indeterminate();
      HarmonicPolynomial next =
          of(Monomial.of(h, Rational.ONE), Form.ONE).plus(of(Monomial.ONE, steps.get(h)));
      for (int i = power.exponent().intValueExact(); i > 0; i--) {
        product = product.times(next);
      }
    }
    return product;
  }

  /// The largest total degree of a monomial; 0 for zero.
  int degree() {
    return coefficients.keySet().stream()
        .mapToInt(monomial -> monomial.totalDegree().intValueExact())
        .max()
        .orElse(0);
  }

  /// The polynomial as a form.
  Form form() {
    List<Form> terms = new ArrayList<>();
    coefficients.forEach(
        (monomial, c) -> terms.add(c.times(Form.of(Polynomial.of(monomial, Rational.ONE)))));
    return Form.sum(terms);
  }
}
