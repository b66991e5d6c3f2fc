package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/// The algorithms on plain coefficient lists a_0, a_1, …; every list stands for a series known to
/// its length.
final class SeriesAlgorithms {
  private SeriesAlgorithms() {}

  /// 1/a, for a_0 invertible; quadratic: b_n = −(Σ_(k≥1) a_k b_(n−k))/a_0.
  static <T> List<T> inverse(CoefficientField<T> field, List<T> a, int length) {
    List<T> result = new ArrayList<>(length);
    if (length == 0) {
      return result;
    }
    T first = field.inverse(a.getFirst());
    T scale = field.negated(first);
    result.add(first);
    for (int n = 1; n < length; n++) {
      Budget.checkpoint();
      List<T> parts = new ArrayList<>();
      for (int k = 1; k <= n && k < a.size(); k++) {
        addProduct(field, parts, a.get(k), result.get(n - k));
      }
      result.add(field.times(scale, field.sum(parts)));
    }
    return result;
  }

  /// e^a for a_0 = 0: n b_n = Σ_(k≥1) k a_k b_(n−k).
  static <T> List<T> exp(CoefficientField<T> field, List<T> a, int length) {
    List<T> result = new ArrayList<>(length);
    List<T> slopes = weighted(field, a);
    for (int n = 0; n < length; n++) {
      Budget.checkpoint();
      if (n == 0) {
        result.add(field.one());
        continue;
      }
      List<T> parts = new ArrayList<>();
      for (int k = 1; k <= n && k < slopes.size(); k++) {
        addProduct(field, parts, slopes.get(k), result.get(n - k));
      }
      result.add(field.times(field.of(Rational.of(1, n)), field.sum(parts)));
    }
    return result;
  }

  /// ln a for a_0 = 1: n b_n = n a_n − Σ_(0<k<n) k b_k a_(n−k).
  static <T> List<T> log(CoefficientField<T> field, List<T> a, int length) {
    List<T> result = new ArrayList<>(length);
    List<T> slopes = new ArrayList<>(length);
    for (int n = 0; n < length; n++) {
      Budget.checkpoint();
      List<T> parts = new ArrayList<>();
      for (int k = Math.max(1, n - a.size() + 1); k < n; k++) {
        addProduct(field, parts, slopes.get(k), a.get(n - k));
      }
      T sum = field.negated(field.sum(parts));
      if (n > 0 && n < a.size()) {
        sum = field.plus(sum, field.times(field.of(Rational.of(n)), a.get(n)));
      }
      slopes.add(sum);
      result.add(n == 0 ? field.zero() : field.times(field.of(Rational.of(1, n)), sum));
    }
    return result;
  }

  /// a^e for a_0 = 1: n b_n = Σ_(k≥1) (k e − (n − k)) a_k b_(n−k).
  static <T> List<T> power(CoefficientField<T> field, List<T> a, T exponent, int length) {
    List<T> result = new ArrayList<>(length);
    for (int n = 0; n < length; n++) {
      Budget.checkpoint();
      if (n == 0) {
        result.add(field.one());
        continue;
      }
      List<T> parts = new ArrayList<>();
      for (int k = 1; k <= n && k < a.size(); k++) {
        if (field.isZero(a.get(k))) {
          continue;
        }
        T weight = field.times(field.of(Rational.of(k)), exponent);
        weight = field.plus(weight, field.of(Rational.of(k - n)));
        addProduct(field, parts, field.times(weight, a.get(k)), result.get(n - k));
      }
      result.add(field.times(field.of(Rational.of(1, n)), field.sum(parts)));
    }
    return result;
  }

  /// outer(inner) for inner_0 = 0, by baby steps and giant steps: about 2√n products.
  static <T> List<T> compose(CoefficientField<T> field, List<T> outer, List<T> inner, int length) {
    int step = squareRoot(length);
    List<List<T>> powers = powers(field, inner, step, length);
    List<T> giant = powers.get(step);
    List<T> result = zeros(field, length);
    int blocks = Math.ceilDiv(Math.min(outer.size(), length), step);
    for (int block = blocks - 1; block >= 0; block--) {
      result = new ArrayList<>(field.product(result, giant, length));
      for (int n = 0; n < length; n++) {
        Budget.checkpoint();
        List<T> parts = new ArrayList<>();
        parts.add(result.get(n));
        for (int j = 0; j < step && block * step + j < outer.size(); j++) {
          addProduct(field, parts, outer.get(block * step + j), powers.get(j).get(n));
        }
        result.set(n, field.sum(parts));
      }
    }
    return result;
  }

  /// The compositional inverse of a with a_0 = 0 and a_1 invertible, by Lagrange's formula [t^k] g
  /// = (1/k) [t^(k−1)] (t/a)^k, the powers taken in baby steps and giant steps.
  static <T> List<T> reversion(CoefficientField<T> field, List<T> a, int length) {
    List<T> result = zeros(field, length);
    if (length < 2) {
      return result;
    }
    List<T> ratio = inverse(field, a.subList(1, a.size()), length - 1);
    int step = squareRoot(length);
    List<List<T>> small = powers(field, ratio, step, length - 1);
    List<T> giant = constant(field, length - 1);
    for (int k = 1; k < length; k++) {
      Budget.checkpoint();
      if (k % step == 0) {
        giant = field.product(giant, small.get(step), length - 1);
      }
      T top = field.convolution(giant, small.get(k % step), k - 1);
      result.set(k, field.times(field.of(Rational.of(1, k)), top));
    }
    return result;
  }

  private static <T> void addProduct(CoefficientField<T> field, List<T> parts, T a, T b) {
    if (!field.isZero(a) && !field.isZero(b)) {
      parts.add(field.times(a, b));
    }
  }

  /// k a_k for each k.
  private static <T> List<T> weighted(CoefficientField<T> field, List<T> a) {
    List<T> result = new ArrayList<>(a.size());
    for (int k = 0; k < a.size(); k++) {
      result.add(field.times(field.of(Rational.of(k)), a.get(k)));
    }
    return result;
  }

  /// a^0, …, a^count.
  private static <T> List<List<T>> powers(
      CoefficientField<T> field, List<T> a, int count, int length) {
    List<List<T>> result = new ArrayList<>();
    result.add(constant(field, length));
    for (int k = 1; k <= count; k++) {
      result.add(field.product(result.get(k - 1), a, length));
    }
    return result;
  }

  private static <T> List<T> constant(CoefficientField<T> field, int length) {
    List<T> result = zeros(field, length);
    if (length > 0) {
      result.set(0, field.one());
    }
    return result;
  }

  private static <T> List<T> zeros(CoefficientField<T> field, int length) {
    return new ArrayList<>(Collections.nCopies(length, field.zero()));
  }

  /// The least positive integer whose square is at least n.
  static int squareRoot(int n) {
    int root = 1;
    while (root * root < n) {
      root++;
    }
    return root;
  }
}
