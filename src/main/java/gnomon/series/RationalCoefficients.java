package gnomon.series;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.List;
import java.util.Optional;

/// Rational numbers as coefficients; long lists go through fast products.
enum RationalCoefficients implements CoefficientField<Rational> {
  /// The only instance.
  FIELD;

  /// From these lengths on the ways through many primes are shorter.
  private static final int PRODUCT = 64;

  private static final int SERIES = 24;
  private static final int COMPOSITION = 32;

  /// From this length on compositions go through common denominators.
  private static final int SHORT_COMPOSITION = 8;

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
    return Math.min(length, Math.min(a.size(), b.size())) < PRODUCT
        ? CoefficientField.super.product(a, b, length)
        : MultimodularSeries.product(a, b, length)
            .orElseGet(() -> ScaledRationals.of(a).times(ScaledRationals.of(b), length));
  }

  @Override
  public List<Rational> inverse(List<Rational> a, int length) {
    return length < SERIES
        ? CoefficientField.super.inverse(a, length)
        : MultimodularSeries.inverse(a, length).orElseGet(() -> RationalSeries.inverse(a, length));
  }

  @Override
  public List<Rational> exp(List<Rational> a, int length) {
    return length < SERIES
        ? CoefficientField.super.exp(a, length)
        : MultimodularSeries.exp(a, length).orElseGet(() -> RationalSeries.exp(a, length));
  }

  @Override
  public List<Rational> log(List<Rational> a, int length) {
    return length < SERIES
        ? CoefficientField.super.log(a, length)
        : MultimodularSeries.log(a, length)
            .orElseGet(() -> RationalSeries.log(ScaledRationals.of(a), length));
  }

  @Override
  public List<Rational> power(List<Rational> a, Rational exponent, int length) {
    return length < SERIES
        ? CoefficientField.super.power(a, exponent, length)
        : MultimodularSeries.power(a, exponent, length)
            .orElseGet(() -> RationalSeries.power(a, exponent, length));
  }

  @Override
  public List<Rational> compose(List<Rational> outer, List<Rational> inner, int length) {
    if (length < SHORT_COMPOSITION) {
      return CoefficientField.super.compose(outer, inner, length);
    }
    Optional<List<Rational>> fast =
        length < COMPOSITION ? Optional.empty() : MultimodularSeries.compose(outer, inner, length);
    return fast.orElseGet(() -> RationalSeries.compose(outer, inner, length));
  }

  @Override
  public List<Rational> reversion(List<Rational> a, int length) {
    if (length < SHORT_COMPOSITION) {
      return CoefficientField.super.reversion(a, length);
    }
    Optional<List<Rational>> fast =
        length < COMPOSITION ? Optional.empty() : MultimodularSeries.reversion(a, length);
    return fast.orElseGet(() -> RationalSeries.reversion(a, length));
  }
}
