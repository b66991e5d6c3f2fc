package gnomon.series;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.List;

/// Rational numbers as coefficients; long lists go through fast products.
enum RationalCoefficients implements CoefficientField<Rational> {
  /// The only instance.
  FIELD;

  private static final int LONG = 32;

  @Override
  public Rational plus(Rational a, Rational b) {
    return a.plus(b);
  }

  @Override
  public Rational times(Rational a, Rational b) {
    return a.times(b);
  }

  @Override
  public Rational negated(Rational a) {
    return a.negated();
  }

  @Override
  public Rational inverse(Rational a) {
    return a.inverse();
  }

  @Override
  public Rational of(Rational value) {
    return value;
  }

  @Override
  public boolean isZero(Rational a) {
    return a.isZero();
  }

  @Override
  public Form toForm(Rational a) {
    return Form.of(a);
  }

  @Override
  public List<Rational> product(List<Rational> a, List<Rational> b, int length) {
    return Math.min(length, Math.min(a.size(), b.size())) < LONG
        ? CoefficientField.super.product(a, b, length)
        : ScaledRationals.of(a).times(ScaledRationals.of(b), length);
  }

  @Override
  public List<Rational> inverse(List<Rational> a, int length) {
    return length < LONG
        ? CoefficientField.super.inverse(a, length)
        : RationalSeries.inverse(a, length);
  }

  @Override
  public List<Rational> exp(List<Rational> a, int length) {
    return length < LONG ? CoefficientField.super.exp(a, length) : RationalSeries.exp(a, length);
  }

  @Override
  public List<Rational> power(List<Rational> a, Rational exponent, int length) {
    return length < LONG
        ? CoefficientField.super.power(a, exponent, length)
        : RationalSeries.power(a, exponent, length);
  }

  @Override
  public List<Rational> compose(List<Rational> outer, List<Rational> inner, int length) {
    return length < LONG
        ? CoefficientField.super.compose(outer, inner, length)
        : RationalSeries.compose(outer, inner, length);
  }

  @Override
  public List<Rational> reversion(List<Rational> a, int length) {
    return length < LONG
        ? CoefficientField.super.reversion(a, length)
        : RationalSeries.reversion(a, length);
  }
}
