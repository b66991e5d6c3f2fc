package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.util.List;
import java.util.OptionalLong;

/// The polynomial û(r) = Σ_(n≥1) |u_n| r^n, and bounds for the coefficients of series made from u.
///
/// A series whose coefficients are at most those of B(û(t)), B with coefficients of at least 0, has
/// |x_n| ≤ B(û(r))/r^n for every r > 0; truncated series are polynomials, so every r may be tried.
/// The logarithm of the bound is convex in log r; the search goes down to a quarter of an octave.
/// Everything is rounded upward, so the bounds are proofs.
///
/// Source: Cauchy's inequality; P. Flajolet, R. Sedgewick, Analytic Combinatorics (2009),
/// proposition IV.1 (saddle-point bounds), from memory.
final class Majorant {

  /// 1024 log2 of 4, 5, 6 and 7, rounded down.
  private static final int[] LOGS = {2048, 2377, 2646, 2874};

  private static final int FIRST_STEP = 16;
  private static final int FARTHEST = 4 * 4000;

  private final UpperBound[] sizes;

  private Majorant(UpperBound[] sizes) {
    this.sizes = sizes;
  }

  /// The majorant of the coefficients of t^1, …, those from `shift` + 1 on taken as u_1, ….
  static Majorant of(List<Rational> coefficients, int shift, int length) {
    UpperBound[] sizes = new UpperBound[Math.max(1, length)];
    sizes[0] = UpperBound.ZERO;
    for (int n = 1; n < sizes.length; n++) {
      int at = n + shift;
      sizes[n] = at < coefficients.size() ? UpperBound.of(coefficients.get(at)) : UpperBound.ZERO;
    }
    return new Majorant(sizes);
  }

  /// The majorant of all coefficients, the constant term included.
  static Majorant ofAll(List<Rational> coefficients, int length) {
    Majorant majorant = of(coefficients, 0, length);
    majorant.sizes[0] = UpperBound.of(coefficients.getFirst());
    return majorant;
  }

  /// û(r).
  UpperBound at(UpperBound r) {
    UpperBound sum = UpperBound.ZERO;
    for (int n = sizes.length - 1; n >= 0; n--) {
      sum = sum.times(r).plus(sizes[n]);
    }
    return sum;
  }

  /// A function of r: at least 1024 log2 of some B(û(r)), nothing where that diverges.
  interface Growth {
    OptionalLong at(UpperBound r);
  }

  /// 1/(1 − û).
  OptionalLong geometric(UpperBound r) {
    long v = at(r).scaled();
    long one = 1L << 20;
    return v >= one
        ? OptionalLong.empty()
        : OptionalLong.of(UpperBound.of((one << 20) / (one - v) + 1, -20).log2());
  }

  /// e^û: 1.4427 is above log2 e.
  OptionalLong exponential(UpperBound r) {
    long v = at(r).scaled();
    return v >= Long.MAX_VALUE / 20_000
        ? OptionalLong.empty()
        : OptionalLong.of(v * 14_427 / 10_000 / UpperBound.LOG_UNIT + 1);
  }

  /// How the bound of the n-th coefficient is made: B^(base + each n)/r^(n−lag).
  ///
  /// @param growth at least 1024 log2 B as a function of r
  /// @param base the fixed exponent
  /// @param each the exponent for each n
  /// @param lag what is taken off n
  record Shape(Growth growth, int base, int each, int lag) {

    /// At least 1024 log2 of the bound for the q-th radius.
    private long total(long value, int q, int n) {
      return value * (base + (long) each * n) + inverseLog(q) * (n - lag);
    }
  }

  /// The best bounds for numbers D_n x_n, where D_last has `weight` bits and log D_n is convex:
  /// `bits[n]` is at least log2 |x_n| for n < length, and the greatest of the sums is as small as
  /// can be found.
  static long[] bits(Shape shape, int length, long weight) {
    int last = length - 1;
    int q = 0;
    long best = greatest(shape, q, last, weight);
    while (best == Long.MAX_VALUE && q > -FARTHEST) {
      q -= FIRST_STEP;
      best = greatest(shape, q, last, weight);
    }
    for (int step = FIRST_STEP; step > 0 && Math.abs(q) < FARTHEST; ) {
      Budget.checkpoint();
      long up = greatest(shape, q + step, last, weight);
      long down = up < best ? Long.MAX_VALUE : greatest(shape, q - step, last, weight);
      if (up < best) {
        q += step;
        best = up;
      } else if (down < best) {
        q -= step;
        best = down;
      } else {
        step /= 2;
      }
    }
    long value = shape.growth.at(radius(q)).orElseThrow();
    long[] bits = new long[length];
    for (int n = 0; n < length; n++) {
      bits[n] = Math.ceilDiv(shape.total(value, q, n), UpperBound.LOG_UNIT) + 1;
    }
    return bits;
  }

  /// The greater one of the sums at both ends.
  private static long greatest(Shape shape, int q, int last, long weight) {
    OptionalLong value = shape.growth.at(radius(q));
    return value.isEmpty()
        ? Long.MAX_VALUE
        : Math.max(
            shape.total(value.getAsLong(), q, Math.min(last, shape.lag)),
            shape.total(value.getAsLong(), q, last) + weight * UpperBound.LOG_UNIT);
  }

  /// r = (4 + q mod 4) 2^(⌊q/4⌋ − 2).
  private static UpperBound radius(int q) {
    return UpperBound.of(4 + Math.floorMod(q, 4), Math.floorDiv(q, 4) - 2);
  }

  /// At least 1024 log2 (1/r).
  private static long inverseLog(int q) {
    return (2L - Math.floorDiv(q, 4)) * UpperBound.LOG_UNIT - LOGS[Math.floorMod(q, 4)];
  }
}
