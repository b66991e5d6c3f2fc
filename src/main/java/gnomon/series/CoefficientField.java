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
}
