package gnomon.modular;

import gnomon.algebra.Budget;
import java.util.Arrays;

/// Composition and reversion of short series by about 2√n products: the powers of the series are
/// taken in baby steps and giant steps.
///
/// Source: R. P. Brent, H. T. Kung, Fast algorithms for manipulating formal power series (1978),
/// algorithm 2.1; for the reversion F. Johansson, A fast algorithm for reversion of power series
/// (2015); from memory.
final class ShortComposition {

  private final ResidueSeries ring;
  private final PrimeField field;
  private final int length;
  private final int step;

  ShortComposition(ResidueSeries ring, int length) {
    this.ring = ring;
    this.field = ring.field();
    this.length = length;
    int root = 1;
    while (root * root < length) {
      root++;
    }
    this.step = root;
  }

  /// a^0, …, a^step.
  private int[][] powers(int[] a) {
    int[][] powers = new int[step + 1][];
    powers[0] = new int[length];
    powers[0][0] = 1;
    for (int k = 1; k <= step; k++) {
      powers[k] = k == 1 ? Arrays.copyOf(a, length) : ring.product(powers[k - 1], a, length);
    }
    return powers;
  }

  /// outer(inner): blocks of the outer series, combined by Horner's scheme in inner^step.
  int[] compose(int[] outer, int[] inner) {
    int[][] powers = powers(inner);
    int[] result = new int[length];
    for (int block = Math.ceilDiv(Math.min(outer.length, length), step) - 1; block >= 0; block--) {
      Budget.checkpoint();
      LazyRow row = new LazyRow(field, length).addProduct(result, powers[step]);
      for (int j = 0; j < step && block * step + j < outer.length; j++) {
        row.add(powers[j], length, 0, outer[block * step + j]);
      }
      result = row.residues();
    }
    return result;
  }

  /// Coefficient k of the inverse of a t + …: (1/k) [t^(k−1)] (t/a)^k (Lagrange), to one more than
  /// the length; `ratio` is t/a.
  int[] reversion(int[] ratio) {
    int[][] small = powers(ratio);
    int[] giant = small[0];
    int[] inverses = ring.inverses();
    int[] result = new int[length + 1];
    for (int k = 1; k <= length; k++) {
      if (k % step == 0) {
        Budget.checkpoint();
        giant = ring.product(giant, small[step], length);
      }
      int top = ring.convolution(giant, 0, small[k % step], k - 1, k);
      result[k] = field.times(top, inverses[k]);
    }
    return result;
  }
}
