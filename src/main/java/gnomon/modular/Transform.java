package gnomon.modular;

import gnomon.algebra.Budget;

/// The number-theoretic transform: the discrete Fourier transform over the integers modulo p.
///
/// The forward transform of length n = 2^m takes the coefficients of a polynomial to its values at
/// the n-th roots of unity, in an order fixed by the algorithm (the exponents of the root run in
/// bit-reversed order); the inverse transform takes such values back. So the product of values is
/// the product of polynomials modulo x^n − 1.
///
/// One step reduces modulo x^(2h) − w² = (x^h − w)(x^h + w): with the lower half u and the upper
/// half v of a block, the halves become u + w v and u − w v. In this order all the elements of a
/// block share one w, and the w of all steps are prefixes of one table: w_0 = 1 and w_(2^k + j) =
/// w_j ω with ω of order 2^(k+2).
///
/// A product by a known w uses its quotient w' = ⌊2^32 w/p⌋: for any v below 2^32 the number w v −
/// ⌊w' v/2^32⌋ p lies between 0 and 2p and is congruent to w v. Sums stay below 4p < 2^32 and are
/// reduced only where the next step needs it.
///
/// The steps over long blocks are written as loops over one statement that read `int` arrays and
/// write `long` arrays, or the other way round; just-in-time compilers make vector instructions of
/// those. The last steps, over short blocks, go two at a time through ordinary variables.
///
/// Cost: n/2 log2(n) products. Source: J. M. Pollard, The fast Fourier transform in a finite field,
/// Math. Comp. 25 (1971); the product by a known factor: V. Shoup, as described with the lazy
/// reductions in D. Harvey, Faster arithmetic for number-theoretic transforms, J. Symb. Comp. 60
/// (2014), algorithms 2 to 4; the order of the roots: D. J. Bernstein, Multidigit multiplication
/// for mathematicians (2001), section 5; from memory.
public final class Transform {

  private static final long WORD = 0xFFFFFFFFL;

  /// Blocks from this half length on go through the long loops.
  private static final int LONG_LOOP = 64;

  /// Rows of this length stay in the nearest cache.
  private static final int ROW = 1024;

  private final PrimeField field;
  private final int maxLength;
  private final int[] roots;
  private final int[] rootQuotients;
  private final int[] inverseRoots;
  private final int[] inverseRootQuotients;

  /// The transforms modulo the prime of `field` of lengths up to `maxLength`, a power of two.
  ///
  /// @throws IllegalArgumentException when the field has no root of unity of that order
  public Transform(PrimeField field, int maxLength) {
    if (Integer.bitCount(maxLength) != 1) {
      throw new IllegalArgumentException(maxLength + " is not a power of two");
    }
    this.field = field;
    this.maxLength = maxLength;
    int log = Integer.numberOfTrailingZeros(maxLength);
    int generator = field.rootOfUnity(log);
    roots = table(field, generator, log);
    rootQuotients = quotients(field, roots);
    inverseRoots = table(field, field.inverse(generator), log);
    inverseRootQuotients = quotients(field, inverseRoots);
  }

  private static int[] table(PrimeField field, int generator, int log) {
    int size = Math.max(1, 1 << Math.max(0, log - 1));
    int[] table = new int[size];
    table[0] = 1;
    for (int k = 0; 1 << k < size; k++) {
      int step = field.power(generator, 1L << (log - k - 2));
      for (int j = 0; j < 1 << k; j++) {
        table[(1 << k) + j] = field.times(table[j], step);
      }
    }
    return table;
  }

  private static int[] quotients(PrimeField field, int[] table) {
    int[] quotients = new int[table.length];
    for (int i = 0; i < table.length; i++) {
      quotients[i] = (int) (((long) table[i] << Integer.SIZE) / field.prime());
    }
    return quotients;
  }

  /// The field.
  public PrimeField field() {
    return field;
  }

  /// The greatest length.
  public int maxLength() {
    return maxLength;
  }

  /// The numbers 1/(2 w_i): the values at the roots come in pairs at w_i and −w_i, and the odd part
  /// of a polynomial, divided by the unknown, has at w_i² the value (a(w_i) − a(−w_i))/(2 w_i).
  int[] halvedInverseRoots() {
    int half = field.inverse(2);
    int[] halved = new int[inverseRoots.length];
    for (int i = 0; i < halved.length; i++) {
      halved[i] = field.times(inverseRoots[i], half);
    }
    return halved;
  }

  private void requireLength(int length) {
    if (length > maxLength || Integer.bitCount(length) != 1) {
      throw new IllegalArgumentException("length " + length + " of at most " + maxLength);
    }
  }

  /// Replaces the coefficients x_0, …, x_(length−1) by the values; `length` is a power of two.
  public void forward(int[] x, int length) {
    requireLength(length);
    Budget.checkpoint();
    int half = length / 2;
    int rest = Integer.numberOfTrailingZeros(length);
    Rows rows = new Rows(Math.min(ROW, half));
    int p = field.prime();
    for (; half >= LONG_LOOP || rest % 2 == 1; half /= 2, rest--) {
      for (int block = 0, s = 0; s < length; block++, s += 2 * half) {
        if (half >= LONG_LOOP) {
          rows.forward(x, s, half, roots[block], rootQuotients[block] & WORD, p);
        } else {
          single(x, s, half, roots[block], rootQuotients[block] & WORD, p);
        }
      }
    }
    for (; rest > 0; half /= 4, rest -= 2) {
      double2(x, length, half / 2, p);
    }
    canonical(x, length, p);
  }

  /// One step over a short block.
  private static void single(int[] x, int s, int half, long w, long q, long p) {
    for (int i = s; i < s + half; i++) {
      long u = below2(x[i] & WORD, 2 * p);
      long v = times(x[i + half] & WORD, w, q, p);
      x[i] = (int) (u + v);
      x[i + half] = (int) (u - v + 2 * p);
    }
  }

  /// Two steps at once over blocks of 4 `quarter`.
  private void double2(int[] x, int length, int quarter, long p) {
    for (int block = 0, s = 0; s < length; block++, s += 4 * quarter) {
      long w = roots[block];
      long wq = rootQuotients[block] & WORD;
      long left = roots[2 * block];
      long leftQ = rootQuotients[2 * block] & WORD;
      long right = roots[2 * block + 1];
      long rightQ = rootQuotients[2 * block + 1] & WORD;
      for (int i = s; i < s + quarter; i++) {
        long a = below2(x[i] & WORD, 2 * p);
        long b = below2(x[i + quarter] & WORD, 2 * p);
        long c = times(x[i + 2 * quarter] & WORD, w, wq, p);
        long d = times(x[i + 3 * quarter] & WORD, w, wq, p);
        long low = below2(a + c, 2 * p);
        long high = times(b + d, left, leftQ, p);
        x[i] = (int) (low + high);
        x[i + quarter] = (int) (low - high + 2 * p);
        low = below2(a - c + 2 * p, 2 * p);
        high = times(b - d + 2 * p, right, rightQ, p);
        x[i + 2 * quarter] = (int) (low + high);
        x[i + 3 * quarter] = (int) (low - high + 2 * p);
      }
    }
  }

  /// Replaces the values by the coefficients; undoes [#forward].
  public void inverse(int[] x, int length) {
    requireLength(length);
    Budget.checkpoint();
    int half = 1;
    Rows rows = new Rows(Math.min(ROW, Math.max(1, length / 2)));
    int p = field.prime();
    for (; 4 * half <= Math.min(length, 2 * LONG_LOOP); half *= 4) {
      inverseDouble(x, length, half, p);
    }
    for (; half < length; half *= 2) {
      for (int block = 0, s = 0; s < length; block++, s += 2 * half) {
        if (half >= LONG_LOOP) {
          rows.inverse(x, s, half, inverseRoots[block], inverseRootQuotients[block] & WORD, p);
        } else {
          inverseSingle(x, s, half, inverseRoots[block], inverseRootQuotients[block] & WORD, p);
        }
      }
    }
    scale(x, length, field.inverse(field.of(length)));
  }

  private static void inverseSingle(int[] x, int s, int half, long w, long q, long p) {
    for (int i = s; i < s + half; i++) {
      long u = x[i] & WORD;
      long v = x[i + half] & WORD;
      x[i] = (int) below2(u + v, 2 * p);
      x[i + half] = (int) times(u - v + 2 * p, w, q, p);
    }
  }

  private void inverseDouble(int[] x, int length, int quarter, long p) {
    for (int block = 0, s = 0; s < length; block++, s += 4 * quarter) {
      long w = inverseRoots[block];
      long wq = inverseRootQuotients[block] & WORD;
      long left = inverseRoots[2 * block];
      long leftQ = inverseRootQuotients[2 * block] & WORD;
      long right = inverseRoots[2 * block + 1];
      long rightQ = inverseRootQuotients[2 * block + 1] & WORD;
      for (int i = s; i < s + quarter; i++) {
        long a = x[i] & WORD;
        long b = x[i + quarter] & WORD;
        long c = x[i + 2 * quarter] & WORD;
        long d = x[i + 3 * quarter] & WORD;
        long low = below2(a + b, 2 * p);
        long high = below2(c + d, 2 * p);
        a = times(a - b + 2 * p, left, leftQ, p);
        c = times(c - d + 2 * p, right, rightQ, p);
        x[i] = (int) below2(low + high, 2 * p);
        x[i + 2 * quarter] = (int) times(low - high + 2 * p, w, wq, p);
        x[i + quarter] = (int) below2(a + c, 2 * p);
        x[i + 3 * quarter] = (int) times(a - c + 2 * p, w, wq, p);
      }
    }
  }

  /// w v modulo p, between 0 and 2p.
  private static long times(long v, long w, long quotient, long p) {
    return v * w - (v * quotient >>> Integer.SIZE) * p;
  }

  private static long below2(long value, long twice) {
    long rest = value - twice;
    return rest + ((rest >> 63) & twice);
  }

  private static void canonical(int[] x, int length, long p) {
    for (int i = 0; i < length; i++) {
      x[i] = (int) below2(below2(x[i] & WORD, 2 * p), p);
    }
  }

  /// Multiplies by a factor and reduces to below p.
  private void scale(int[] x, int length, int factor) {
    long p = field.prime();
    long quotient = ((long) factor << Integer.SIZE) / p;
    for (int i = 0; i < length; i++) {
      x[i] = (int) below2(times(x[i] & WORD, factor, quotient, p), p);
    }
  }

  /// The steps over long blocks, row by row. Each loop writes one array, of another type than those
  /// it reads at other places.
  private static final class Rows {
    private final int size;
    private final long[] upper;
    private final long[] lower;

    Rows(int size) {
      this.size = Math.max(1, size);
      this.upper = new long[this.size];
      this.lower = new long[this.size];
    }

    void forward(int[] x, int s, int half, long w, long quotient, long p) {
      int count = Math.min(size, half);
      for (int i = s; i < s + half; i += count) {
        product(x, i + half, upper, count, w, quotient, p);
        reduced(x, i, lower, count, 2 * p);
        sum(lower, upper, x, i, count);
        difference(lower, upper, x, i + half, count, 2 * p);
      }
    }

    void inverse(int[] x, int s, int half, long w, long quotient, long p) {
      int count = Math.min(size, half);
      for (int i = s; i < s + half; i += count) {
        sums(x, i, half, lower, count);
        differences(x, i, half, upper, count, 2 * p);
        store(lower, x, i, count, 2 * p);
        storeProduct(upper, x, i + half, count, w, quotient, p);
      }
    }

    private static void product(
        int[] x, int from, long[] result, int n, long w, long quotient, long p) {
      for (int i = 0; i < n; i++) {
        long v = x[from + i] & WORD;
        result[i] = v * w - (v * quotient >>> Integer.SIZE) * p;
      }
    }

    private static void reduced(int[] x, int from, long[] result, int n, long twice) {
      for (int i = 0; i < n; i++) {
        long rest = (x[from + i] & WORD) - twice;
        result[i] = rest + ((rest >> 63) & twice);
      }
    }

    private static void sum(long[] u, long[] v, int[] x, int to, int n) {
      for (int i = 0; i < n; i++) {
        x[to + i] = (int) (u[i] + v[i]);
      }
    }

    private static void difference(long[] u, long[] v, int[] x, int to, int n, long twice) {
      for (int i = 0; i < n; i++) {
        x[to + i] = (int) (u[i] - v[i] + twice);
      }
    }

    private static void sums(int[] x, int from, int half, long[] result, int n) {
      for (int i = 0; i < n; i++) {
        result[i] = (x[from + i] & WORD) + (x[from + half + i] & WORD);
      }
    }

    private static void differences(int[] x, int from, int half, long[] result, int n, long twice) {
      for (int i = 0; i < n; i++) {
        result[i] = (x[from + i] & WORD) - (x[from + half + i] & WORD) + twice;
      }
    }

    private static void store(long[] values, int[] x, int to, int n, long twice) {
      for (int i = 0; i < n; i++) {
        long rest = values[i] - twice;
        x[to + i] = (int) (rest + ((rest >> 63) & twice));
      }
    }

    private static void storeProduct(
        long[] values, int[] x, int to, int n, long w, long quotient, long p) {
      for (int i = 0; i < n; i++) {
        long v = values[i];
        x[to + i] = (int) (v * w - (v * quotient >>> Integer.SIZE) * p);
      }
    }
  }
}
