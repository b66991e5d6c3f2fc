package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.Arrays;

/// Division of integer coefficient lists by a divisor with leading coefficient 1: the reversed
/// divisor is inverted as a power series by Newton's iteration, so division costs a few products.
final class MonicDivision {

  private static final int SCHOOLBOOK = 32;

  private MonicDivision() {}

  /// Quotient and remainder as coefficient lists.
  record Parts(BigInteger[] quotient, BigInteger[] remainder) {}

  /// Divides `a` by `monic`; both may be short or empty, `monic` not.
  static Parts of(BigInteger[] a, BigInteger[] monic) {
    int length = a.length - monic.length + 1;
    if (length <= 0) {
      return new Parts(new BigInteger[0], a);
    }
    if (length <= SCHOOLBOOK || monic.length <= SCHOOLBOOK) {
      return schoolbook(a, monic);
    }
    BigInteger[] reversed = Arrays.copyOf(reverse(a), length);
    BigInteger[] inverse = inverse(reverse(monic), length);
    BigInteger[] product = Kronecker.times(reversed, inverse);
    BigInteger[] quotient = reverse(Arrays.copyOf(product, length));
    BigInteger[] back = Kronecker.times(quotient, monic);
    BigInteger[] remainder = new BigInteger[monic.length - 1];
    for (int i = 0; i < remainder.length; i++) {
      remainder[i] = a[i].subtract(back[i]);
    }
    return new Parts(quotient, Univariate.trim(remainder));
  }

  /// Long division; every quotient coefficient must come out integral.
  static Parts schoolbook(BigInteger[] a, BigInteger[] divisor) {
    int degree = divisor.length - 1;
    boolean monic = divisor[degree].equals(BigInteger.ONE);
    BigInteger[] rest = a.clone();
    BigInteger[] quotient = new BigInteger[a.length - degree];
    for (int i = a.length - 1; i >= degree; i--) {
      Budget.checkpoint();
      BigInteger factor = monic ? rest[i] : rest[i].divide(divisor[degree]);
      quotient[i - degree] = factor;
      for (int j = 0; j < degree; j++) {
        rest[i - degree + j] = rest[i - degree + j].subtract(factor.multiply(divisor[j]));
      }
    }
    return new Parts(quotient, Univariate.trim(Arrays.copyOf(rest, degree)));
  }

  /// The reciprocal power series to `length` terms of a list that starts with 1.
  static BigInteger[] inverse(BigInteger[] series, int length) {
    BigInteger[] inverse = {BigInteger.ONE};
    while (inverse.length < length) {
      Budget.checkpoint();
      int next = Math.min(length, 2 * inverse.length);
      BigInteger[] start = Arrays.copyOf(series, Math.min(series.length, next));
      BigInteger[] error = truncated(Kronecker.times(start, inverse), next);
      BigInteger[] tail = new BigInteger[next - inverse.length];
      for (int i = 0; i < tail.length; i++) {
        tail[i] = error[inverse.length + i].negate();
      }
      BigInteger[] correction = truncated(Kronecker.times(tail, inverse), tail.length);
      BigInteger[] longer = Arrays.copyOf(inverse, next);
      System.arraycopy(correction, 0, longer, inverse.length, tail.length);
      inverse = longer;
    }
    return inverse;
  }

  private static BigInteger[] truncated(BigInteger[] values, int length) {
    BigInteger[] kept = Arrays.copyOf(values, length);
    for (int i = values.length; i < length; i++) {
      kept[i] = BigInteger.ZERO;
    }
    return kept;
  }

  private static BigInteger[] reverse(BigInteger[] values) {
    BigInteger[] reversed = new BigInteger[values.length];
    for (int i = 0; i < values.length; i++) {
      reversed[i] = values[values.length - 1 - i];
    }
    return reversed;
  }
}
