package gnomon.modular;

import gnomon.algebra.Budget;
import java.util.Arrays;

/// The powers of one series f without constant term, modulo t^n: the linear map that takes weights
/// w to all the numbers c_i = Σ_j w_j [t^j] f^i, and its transpose, which takes coefficients g to
/// Σ_i g_i f^i, the composition g(f).
///
/// With n a power of two and W(t) = Σ w_j t^(n−1−j), the numbers c_i are the coefficients of
///
///     Σ_i c_i y^i = [t^(n−1)] W(t)/(1 − y f(t)).
///
/// One step multiplies numerator P and denominator Q by Q(−t, y): the new denominator Q(t, y) Q(−t,
/// y) is even in t, and of the new numerator only the odd part counts, so that both become series
/// in t² of half the length in t, while the degree in y doubles. After log2 n steps nothing but t^0
/// is left, where Q = 1.
///
/// P and Q are kept as rows of 2n coefficients in t, one row for each power of y, so that a product
/// in two variables is one in a single variable. Q = 1 + y Q₁ is kept without its 1. All products
/// of one step have length 4N for N = n: two transforms of that length and two inverse ones of half
/// of it, since t ↦ −t exchanges neighbours in the order of the transform.
///
/// The transpose runs the same steps backward, each replaced by its transpose; that of the transform
/// F is, up to the order of the coefficients, the inverse transform.
///
/// Cost: 3 log2 n transforms of length 4n, O(n log² n). Source: Y. Kinoshita, B. Li, Power series
/// composition in near-linear time (FOCS 2024), sections 3 and 4; the step is that of A. Bostan, R.
/// Mori, A simple and fast algorithm for computing the N-th term of a linearly recurrent sequence
/// (2021); from memory.
final class PowerProjection {

  private final PrimeField field;
  private final Transform transform;

  /// The number n of coefficients, a power of two.
  private final int size;

  /// The length 4n of the transforms.
  private final int length;

  private final int[] series;
  private final int[] halvedInverseRoots;

  /// The powers of `series` modulo t^`length`.
  PowerProjection(ResidueSeries ring, int[] series, int length) {
    this.field = ring.field();
    this.transform = ring.transform();
    this.size = ResidueSeries.powerOfTwo(length);
    this.length = 4 * size;
    this.series = Arrays.copyOf(series, Math.min(series.length, length));
    this.halvedInverseRoots = transform.halvedInverseRoots();
  }

  /// The numbers c_0, …, c_(n−1) for the given weights.
  int[] project(int[] weights) {
    int[] q = denominator();
    int[] p = new int[length];
    for (int j = 0; j < weights.length; j++) {
      p[size - 1 - j] = weights[j];
    }
    int[] raised = new int[length];
    for (int n = size, rows = 1; n > 1; n /= 2, rows *= 2) {
      int[] values = q.clone();
      transform.forward(values, length);
      System.arraycopy(p, 0, raised, 0, length);
      transform.forward(raised, length);
      int[] odd = oddPart(raised, values);
      transform.inverse(odd, length / 2);
      advance(p, odd, n, rows);
      nextDenominator(q, values, n, rows);
    }
    int[] result = new int[size];
    for (int i = 0; i < size; i++) {
      result[i] = p[2 * i];
    }
    return result;
  }

  /// Σ_i outer_i f^i to `count` coefficients.
  int[] combination(int[] outer, int count) {
    int levels = Integer.numberOfTrailingZeros(size);
    int[][] values = new int[levels][];
    int[] q = denominator();
    for (int level = 0, n = size; level < levels; level++, n /= 2) {
      values[level] = q.clone();
      transform.forward(values[level], length);
      if (level + 1 < levels) {
        nextDenominator(q, values[level], n, 1 << level);
      }
    }
    int[] p = new int[length];
    for (int i = 0; i < Math.min(size, outer.length); i++) {
      p[2 * i] = outer[i];
    }
    for (int level = levels - 1, n = 2; level >= 0; level--, n *= 2) {
      p = retreat(p, values[level], n, 1 << level);
      values[level] = null;
    }
    int[] result = new int[count];
    for (int j = 0; j < Math.min(count, size); j++) {
      result[j] = p[size - 1 - j];
    }
    return result;
  }

  /// Q₁ for Q = 1 − y f.
  private int[] denominator() {
    int[] q = new int[length];
    for (int i = 1; i < series.length; i++) {
      q[i] = field.negated(series[i]);
    }
    return q;
  }

  /// The values of the odd part of P Q₁(−t) divided by t, as a polynomial in t².
  private int[] oddPart(int[] p, int[] q) {
    Budget.checkpoint();
    int half = length / 2;
    int[] left = new int[half];
    int[] right = new int[half];
    int[] first = new int[half];
    int[] second = new int[half];
    split(p, left, right);
    split(q, first, second);
    field.times(left, second, left, half);
    field.times(right, first, right, half);
    int prime = field.prime();
    for (int i = 0; i < half; i++) {
      int difference = left[i] - right[i];
      left[i] = difference < 0 ? difference + prime : difference;
    }
    field.times(left, halvedInverseRoots, left, half);
    return left;
  }

  private static void split(int[] values, int[] even, int[] odd) {
    for (int i = 0; i < even.length; i++) {
      even[i] = values[2 * i];
      odd[i] = values[2 * i + 1];
    }
  }

  /// P ← the odd part of P + y P Q₁(−t), with n/2 coefficients in each of 2 `rows` rows.
  private void advance(int[] p, int[] product, int n, int rows) {
    int half = n / 2;
    int[] next = new int[length];
    for (int y = 0; y < rows; y++) {
      for (int i = 0; i < half; i++) {
        next[n * y + i] = p[2 * n * y + 2 * i + 1];
      }
    }
    for (int y = 0; y + 1 < 2 * rows; y++) {
      for (int i = 0; i < half; i++) {
        int at = n * (y + 1) + i;
        next[at] = field.plus(next[at], product[n * y + i]);
      }
    }
    System.arraycopy(next, 0, p, 0, length);
  }

  /// Q₁ ← Q₁(t) + Q₁(−t) + y Q₁(t) Q₁(−t), as a series in t²; `values` are those of Q₁.
  private void nextDenominator(int[] q, int[] values, int n, int rows) {
    int half = length / 2;
    int[] left = new int[half];
    int[] right = new int[half];
    split(values, left, right);
    field.times(left, right, left, half);
    transform.inverse(left, half);
    int[] next = new int[length];
    for (int y = 0; y < rows; y++) {
      for (int i = 0; i < n / 2; i++) {
        int even = q[2 * n * y + 2 * i];
        next[n * y + i] = field.plus(even, even);
      }
    }
    for (int y = 0; y + 1 < 2 * rows; y++) {
      for (int i = 0; i < n / 2; i++) {
        int at = n * (y + 1) + i;
        next[at] = field.plus(next[at], left[n * y + i]);
      }
    }
    System.arraycopy(next, 0, q, 0, length);
  }

  /// The transpose of one step of [#project]: from n/2 coefficients in 2 `rows` rows to n in
  /// `rows`.
  private int[] retreat(int[] p, int[] q, int n, int rows) {
    Budget.checkpoint();
    int half = length / 2;
    int[] product = new int[half];
    for (int y = 0; y + 1 < 2 * rows; y++) {
      System.arraycopy(p, n * (y + 1), product, n * y, n / 2);
    }
    reverse(product);
    transform.forward(product, half);
    field.times(product, halvedInverseRoots, product, half);
    int[] first = new int[half];
    int[] second = new int[half];
    split(q, first, second);
    field.times(product, second, second, half);
    field.times(product, first, first, half);
    int[] raised = new int[length];
    for (int i = 0; i < half; i++) {
      raised[2 * i] = second[i];
      raised[2 * i + 1] = field.negated(first[i]);
    }
    transform.inverse(raised, length);
    reverse(raised);
    int[] next = new int[length];
    for (int y = 0; y < rows; y++) {
      for (int i = 0; i < n; i++) {
        int value = raised[2 * n * y + i];
        next[2 * n * y + i] = field.plus(value, value);
      }
      for (int i = 0; i < n / 2; i++) {
        int at = 2 * n * y + 2 * i + 1;
        next[at] = field.plus(next[at], p[n * y + i]);
      }
    }
    return next;
  }

  /// The coefficient of index j to index −j modulo the length.
  private static void reverse(int[] values) {
    for (int i = 1, j = values.length - 1; i < j; i++, j--) {
      int value = values[i];
      values[i] = values[j];
      values[j] = value;
    }
  }
}
