package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;

/// A polynomial in one variable over the rational numbers as its coefficients, by the plain
/// quadratic methods.
public record RationalRow(List<Rational> coefficients) {

  public RationalRow {
    int size = coefficients.size();
    while (size > 0 && coefficients.get(size - 1).isZero()) {
      size--;
    }
    coefficients = List.copyOf(coefficients.subList(0, size));
  }

  /// The polynomial with the coefficients in ascending powers.
  public static RationalRow of(List<Rational> coefficients) {
    return new RationalRow(coefficients);
  }

  /// The coefficient of a power, 0 beyond the degree.
  public Rational coefficient(int exponent) {
    return exponent < coefficients.size() ? coefficients.get(exponent) : Rational.ZERO;
  }

  /// The product.
  public RationalRow times(RationalRow other) {
    List<Rational> result = new ArrayList<>();
    for (int n = 0; n < coefficients.size() + other.coefficients.size() - 1; n++) {
      Budget.checkpoint();
      Rational sum = Rational.ZERO;
      for (int i = Math.max(0, n - other.coefficients.size() + 1); i <= n; i++) {
        Rational left = coefficient(i);
        Rational right = other.coefficient(n - i);
        if (!left.isZero() && !right.isZero()) {
          sum = sum.plus(left.times(right));
        }
      }
      result.add(sum);
    }
    return of(result);
  }

  /// The difference.
  public RationalRow minus(RationalRow other) {
    List<Rational> result = new ArrayList<>();
    for (int k = 0; k < Math.max(coefficients.size(), other.coefficients.size()); k++) {
      result.add(coefficient(k).minus(other.coefficient(k)));
    }
    return of(result);
  }

  /// p(x + h).
  public RationalRow taylorShift(Rational h) {
    List<Rational> result = new ArrayList<>(coefficients);
    for (int i = 0; i < result.size(); i++) {
      Budget.checkpoint();
      for (int j = result.size() - 2; j >= i; j--) {
        result.set(j, result.get(j).plus(h.times(result.get(j + 1))));
      }
    }
    return of(result);
  }

  /// The coordinates in falling powers, as many as there are coefficients.
  public List<Rational> toFalling() {
    List<Rational> result = new ArrayList<>(coefficients);
    for (int k = 1; k < result.size(); k++) {
      Budget.checkpoint();
      for (int j = result.size() - 2; j >= k; j--) {
        result.set(j, result.get(j).plus(result.get(j + 1).times(Rational.of(k))));
      }
    }
    return result;
  }

  /// The polynomial with the coordinates in falling powers.
  public static RationalRow fromFalling(List<Rational> falling) {
    List<Rational> result = new ArrayList<>(falling);
    for (int k = result.size() - 1; k >= 1; k--) {
      Budget.checkpoint();
      for (int j = k; j < result.size() - 1; j++) {
        result.set(j, result.get(j).minus(result.get(j + 1).times(Rational.of(k))));
      }
    }
    return of(result);
  }
}
