package gnomon.modular;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.util.Arrays;

/// Truncated power series over the integers modulo p.
///
/// A series is the list of its first coefficients; missing ones are zero. Every operation takes the
/// `length` n of the result, at most the one given when this was made, and at most p (the
/// operations divide by 1, …, n − 1). All cost a small multiple of one product of length n, and a
/// product three transforms of the next power of two above 2n.
///
/// Source: Newton's iteration for inverses and roots; the exponential and its inverse together as
/// in G. Hanrot, P. Zimmermann, Newton iteration revisited (2004); R. P. Brent, Multiple-precision
/// zero-finding methods and the complexity of elementary function evaluation (1975); from memory.
public final class ResidueSeries {

  /// A step of a transform costs about as much as so many products in a row.
  private static final int TRANSFORM_COST = 5;

  /// Up to this length inverses take products, from there on transforms of their own.
  private static final int SHORT_INVERSE = 256;

  /// Up to this length compositions go in baby steps and giant steps.
  private static final int SHORT_COMPOSITION = 192;

  /// Up to this length series are formed coefficient by coefficient.
  private static final int SHORT_SERIES = 32;

  private final PrimeField field;
  private final Transform transform;
  private final int maxLength;
  private final int[] inverses;

  /// The arithmetic of series modulo the prime of `field`, of at most `maxLength` coefficients.
  ///
  /// @throws IllegalArgumentException when p is below `maxLength`, or has no root of unity of order
  ///   4 times its next power of two
  public ResidueSeries(PrimeField field, int maxLength) {
    this.field = field;
    this.maxLength = Math.max(1, maxLength);
    this.transform = new Transform(field, 4 * powerOfTwo(this.maxLength));
    this.inverses = field.inverses(this.maxLength + 1);
  }

  /// The least power of two that is at least n.
  static int powerOfTwo(int n) {
    return n <= 1 ? 1 : Integer.highestOneBit(n - 1) << 1;
  }

  /// The binary logarithm of the transform that series of this length need.
  public static int logLength(int maxLength) {
    return Integer.numberOfTrailingZeros(powerOfTwo(Math.max(1, maxLength))) + 2;
  }

  /// The field of the coefficients.
  public PrimeField field() {
    return field;
  }

  Transform transform() {
    return transform;
  }

  int[] inverses() {
    return inverses;
  }

  private void requireLength(int length) {
    if (length > maxLength) {
      throw new IllegalArgumentException("length " + length + " above " + maxLength);
    }
  }

  /// a b.
  public int[] product(int[] a, int[] b, int length) {
    requireLength(length);
    int[] left = cut(a, length);
    int[] right = a == b ? left : cut(b, length);
    if (left.length == 0 || right.length == 0) {
      return new int[length];
    }
    int size = powerOfTwo(left.length + right.length - 1);
    long work = (long) left.length * right.length;
    if (left.length + right.length > length) {
      long beyond = left.length + right.length - length;
      work -= beyond * beyond / 2;
    }
    if (work <= (long) TRANSFORM_COST * size * (Integer.numberOfTrailingZeros(size) + 1)) {
      return new LazyRow(field, length).addProduct(left, right).residues();
    }
    int[] values = Arrays.copyOf(left, size);
    transform.forward(values, size);
    int[] others = values;
    if (left != right) {
      others = Arrays.copyOf(right, size);
      transform.forward(others, size);
    }
    field.times(values, others, values, size);
    transform.inverse(values, size);
    return Arrays.copyOf(values, length);
  }

  private static int[] cut(int[] a, int length) {
    int end = Math.min(a.length, length);
    while (end > 0 && a[end - 1] == 0) {
      end--;
    }
    return end == a.length ? a : Arrays.copyOf(a, end);
  }

  /// Σ_(i<count) a_(from+i) b_(top−i): four products of 60 bits fit a word.
  int convolution(int[] a, int from, int[] b, int top, int count) {
    long p = field.prime();
    long sum = 0;
    int i = 0;
    for (; i + 4 <= count; i += 4) {
      long part = (long) a[from + i] * b[top - i] + (long) a[from + i + 1] * b[top - i - 1];
      part += (long) a[from + i + 2] * b[top - i - 2] + (long) a[from + i + 3] * b[top - i - 3];
      sum = (sum + part) % p;
    }
    for (; i < count; i++) {
      sum += (long) a[from + i] * b[top - i];
    }
    return (int) (sum % p);
  }

  /// The first `count` coefficients, followed by zeros.
  private static int[] padded(int[] a, int count, int size) {
    int[] result = new int[size];
    System.arraycopy(a, 0, result, 0, Math.min(a.length, count));
    return result;
  }

  /// The product with a constant.
  public int[] times(int[] a, int factor, int length) {
    int[] result = new int[length];
    for (int i = 0; i < Math.min(length, a.length); i++) {
      result[i] = field.times(a[i], factor);
    }
    return result;
  }

  private int[] minus(int[] a, int[] b, int length) {
    int[] result = new int[length];
    for (int i = 0; i < length; i++) {
      int left = i < a.length ? a[i] : 0;
      result[i] = i < b.length ? field.minus(left, b[i]) : left;
    }
    return result;
  }

  /// The derivative.
  public int[] derivative(int[] a, int length) {
    int[] result = new int[length];
    for (int i = 0; i < length && i + 1 < a.length; i++) {
      result[i] = field.times(a[i + 1], field.of(i + 1L));
    }
    return result;
  }

  /// The integral that vanishes at 0.
  public int[] integral(int[] a, int length) {
    int[] result = new int[length];
    for (int i = 1; i < length && i <= a.length; i++) {
      result[i] = field.times(a[i - 1], inverses[i]);
    }
    return result;
  }

  /// 1/a, by b ← b − b (a b − 1).
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] when a_0 is 0
  public int[] inverse(int[] a, int length) {
    requireLength(length);
    if (a.length == 0 || a[0] == 0) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, 1);
    }
    int known = Math.min(length, SHORT_SERIES);
    int[] result = Arrays.copyOf(shortInverse(a, known), length);
    while (known < length) {
      int next = Math.min(length, 2 * known);
      refineInverse(a, result, known, next);
      known = next;
    }
    return result;
  }

  private int[] shortInverse(int[] a, int length) {
    int[] result = new int[length];
    int first = field.inverse(a[0]);
    int scale = field.negated(first);
    for (int n = 0; n < length; n++) {
      int count = Math.min(n, a.length - 1);
      result[n] = n == 0 ? first : field.times(scale, convolution(a, 1, result, n - 1, count));
    }
    return result;
  }

  /// From 1/a to `known` terms to `next` ≤ 2 `known`. In the cyclic product of length 2 `known` the
  /// terms that wrap around fall on those that are known to be zero.
  private void refineInverse(int[] a, int[] result, int known, int next) {
    if (next <= SHORT_INVERSE) {
      int[] start = Arrays.copyOf(result, known);
      int[] defect = Arrays.copyOfRange(product(a, start, next), known, next);
      int[] change = product(start, defect, next - known);
      for (int i = known; i < next; i++) {
        result[i] = field.negated(change[i - known]);
      }
      return;
    }
    int size = powerOfTwo(2 * known);
    int[] error = padded(a, next, size);
    int[] values = padded(result, known, size);
    transform.forward(error, size);
    transform.forward(values, size);
    field.times(error, values, error, size);
    transform.inverse(error, size);
    Arrays.fill(error, 0, known, 0);
    Arrays.fill(error, next, size, 0);
    transform.forward(error, size);
    field.times(error, values, error, size);
    transform.inverse(error, size);
    for (int i = known; i < next; i++) {
      result[i] = field.negated(error[i]);
    }
  }

  /// b/a.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] when a_0 is 0
  public int[] quotient(int[] b, int[] a, int length) {
    return product(b, inverse(a, length), length);
  }

  /// ln a for a_0 = 1, the integral of a'/a.
  ///
  /// @throws IllegalArgumentException when a_0 is not 1
  public int[] log(int[] a, int length) {
    requireFirst(a, 1);
    if (length <= 1) {
      return new int[length];
    }
    return integral(quotient(derivative(a, length - 1), a, length - 1), length);
  }

  private static void requireFirst(int[] a, int value) {
    int first = a.length == 0 ? 0 : a[0];
    if (first != value) {
      throw new IllegalArgumentException("constant term " + first + ", not " + value);
    }
  }

  /// e^a for a_0 = 0.
  ///
  /// With g = e^a to m terms and h = 1/g to m terms, w = a' + h (g' − g a') gives to 2m terms the
  /// derivative of ln g, and g + g (a − ∫w) is e^a to 2m terms.
  ///
  /// @throws IllegalArgumentException when a_0 is not 0
  public int[] exp(int[] a, int length) {
    requireLength(length);
    requireFirst(a, 0);
    int known = Math.min(length, SHORT_SERIES);
    int[] g = shortExp(a, known);
    if (known == length) {
      return g;
    }
    int[] h = shortInverse(g, (known + 1) / 2);
    while (known < length) {
      Budget.checkpoint();
      int next = Math.min(length, 2 * known);
      h = Arrays.copyOf(h, known);
      refineInverse(g, h, (known + 1) / 2, known);
      int[] slope = derivative(cut(a, next), next);
      int[] q = Arrays.copyOf(slope, known - 1);
      int[] error = minus(derivative(g, next), product(g, q, next), next);
      int[] w = product(h, error, next);
      for (int i = 0; i < known - 1; i++) {
        w[i] = field.plus(w[i], q[i]);
      }
      int[] correction = minus(cut(a, next), integral(w, next), next);
      int[] change = product(g, correction, next);
      g = Arrays.copyOf(g, next);
      for (int i = known; i < next; i++) {
        g[i] = change[i];
      }
      known = next;
    }
    return g;
  }

  /// n b_n = Σ_(k≥1) k a_k b_(n−k).
  private int[] shortExp(int[] a, int length) {
    int[] slopes = new int[Math.min(a.length, length)];
    for (int k = 1; k < slopes.length; k++) {
      slopes[k] = field.times(a[k], k);
    }
    int[] result = new int[length];
    for (int n = 0; n < length; n++) {
      int count = Math.min(n, slopes.length - 1);
      result[n] =
          n == 0 ? 1 : field.times(inverses[n], convolution(slopes, 1, result, n - 1, count));
    }
    return result;
  }

  /// a^exponent = e^(exponent ln a) for a_0 = 1 and a residue as exponent.
  ///
  /// @throws IllegalArgumentException when a_0 is not 1
  public int[] power(int[] a, int exponent, int length) {
    return exp(times(log(a, length), exponent, length), length);
  }

  /// The square root with constant term 1 of a series with constant term 1, by Newton's iteration b
  /// ← (b + a/b)/2.
  ///
  /// @throws IllegalArgumentException when a_0 is not 1
  public int[] squareRoot(int[] a, int length) {
    requireFirst(a, 1);
    int half = field.inverse(2);
    int[] result = {1};
    while (result.length < length) {
      int next = Math.min(length, 2 * result.length);
      int[] quotient = quotient(a, result, next);
      result = Arrays.copyOf(result, next);
      for (int i = 0; i < next; i++) {
        result[i] = field.times(field.plus(result[i], quotient[i]), half);
      }
    }
    return Arrays.copyOf(result, length);
  }

  /// outer(inner) for inner_0 = 0, in near-linear time.
  ///
  /// @throws IllegalArgumentException when inner_0 is not 0
  public int[] compose(int[] outer, int[] inner, int length) {
    requireLength(length);
    requireFirst(inner, 0);
    return length <= SHORT_COMPOSITION
        ? new ShortComposition(this, length).compose(outer, inner)
        : new PowerProjection(this, inner, length).combination(outer, length);
  }

  /// The compositional inverse of a series with a_0 = 0 and a_1 ≠ 0, in near-linear time.
  ///
  /// With g the inverse, n [t^n] a^k = k [t^(n−k)] (g/t)^(−n) (Lagrange): one power projection
  /// gives all [t^n] a^k, and a power with exponent −1/n the series g/t.
  ///
  /// @throws IllegalArgumentException when a_0 is not 0
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] when a_1 is 0
  public int[] reversion(int[] a, int length) {
    requireLength(length);
    requireFirst(a, 0);
    if (length <= 1) {
      return new int[length];
    }
    int scale = field.inverse(a.length > 1 ? a[1] : 0);
    int n = length - 1;
    int[] weights = new int[length];
    weights[n] = 1;
    int[] unit = times(a, scale, length);
    if (length <= SHORT_COMPOSITION) {
      int[] ratio = inverse(Arrays.copyOfRange(unit, 1, length), n);
      return stretched(new ShortComposition(this, n).reversion(ratio), scale);
    }
    int[] tops = new PowerProjection(this, unit, length).project(weights);
    int[] ratio = new int[n];
    for (int k = 1; k <= n; k++) {
      ratio[n - k] = field.times(field.times(tops[k], n), inverses[k]);
    }
    int[] shape = power(ratio, field.negated(inverses[n]), n);
    int[] result = new int[length];
    System.arraycopy(shape, 0, result, 1, n);
    return stretched(result, scale);
  }

  /// a_k factor^k.
  private int[] stretched(int[] a, int factor) {
    int power = 1;
    for (int k = 0; k < a.length; k++) {
      a[k] = field.times(a[k], power);
      power = field.times(power, factor);
    }
    return a;
  }
}
