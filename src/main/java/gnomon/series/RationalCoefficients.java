package gnomon.series;

import gnomon.form.Form;
import gnomon.number.Rational;

/// Rational numbers as coefficients.
enum RationalCoefficients implements CoefficientField<Rational> {
  /// The only instance.
  FIELD;

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
}
