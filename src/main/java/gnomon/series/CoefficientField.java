package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;

/// The arithmetic of the coefficients of a series: rational numbers, or exact forms.
sealed interface CoefficientField<T> permits RationalCoefficients, FormCoefficients {

  /// The sum a + b.
  T plus(T a, T b);

  /// The product a·b.
  T times(T a, T b);

  /// The additive inverse.
  T negated(T a);

  /// The multiplicative inverse.
  T inverse(T a);

  /// The rational number as a coefficient.
  T of(Rational value);

  /// Whether a is zero.
  boolean isZero(T a);

  /// The coefficient as a form.
  Form toForm(T a);

  /// Zero.
  default T zero() {
    return of(Rational.ZERO);
  }

  /// One.
  default T one() {
    return of(Rational.ONE);
  }

  /// The sum of many elements.
  default T sum(List<T> parts) {
    T total = zero();
    for (T part : parts) {
      total = plus(total, part);
    }
    return total;
  }

  /// The first `length` coefficients of the product of two coefficient lists.
  default List<T> product(List<T> a, List<T> b, int length) {
    List<T> result = new ArrayList<>(length);
    for (int n = 0; n < length; n++) {
      Budget.checkpoint();
      result.add(convolution(a, b, n));
    }
    return result;
  }

  /// Σ a_i b_(n-i), the coefficient n of the product.
  default T convolution(List<T> a, List<T> b, int n) {
    List<T> parts = new ArrayList<>();
    for (int i = Math.max(0, n - b.size() + 1); i <= n && i < a.size(); i++) {
      T left = a.get(i);
      T right = b.get(n - i);
      if (!isZero(left) && !isZero(right)) {
        parts.add(times(left, right));
      }
    }
    return sum(parts);
  }

  /// 1/a, for a_0 invertible.
  default List<T> inverse(List<T> a, int length) {
    return SeriesAlgorithms.inverse(this, a, length);
  }

  /// e^a, for a_0 = 0.
  default List<T> exp(List<T> a, int length) {
    return SeriesAlgorithms.exp(this, a, length);
  }

  /// ln a, for a_0 = 1.
  default List<T> log(List<T> a, int length) {
    return SeriesAlgorithms.log(this, a, length);
  }

  /// a^e, for a_0 = 1.
  default List<T> power(List<T> a, T exponent, int length) {
    return SeriesAlgorithms.power(this, a, exponent, length);
  }

  /// outer(inner), for inner_0 = 0.
  default List<T> compose(List<T> outer, List<T> inner, int length) {
    return SeriesAlgorithms.compose(this, outer, inner, length);
  }

  /// The compositional inverse, for a_0 = 0 and a_1 invertible.
  default List<T> reversion(List<T> a, int length) {
    return SeriesAlgorithms.reversion(this, a, length);
  }
}
