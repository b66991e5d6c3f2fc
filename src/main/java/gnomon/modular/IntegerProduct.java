package gnomon.modular;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;

/// Products of polynomials with integer coefficients by transforms modulo as many primes as hold
/// the coefficients of the product.
///
/// A coefficient of the product of a and b is at most min(length a, length b) max|a_i| max|b_j|.
/// Cost: quasi-linear in the degree, and for coefficients of k words about k² short operations
/// each.
///
/// Source: J. M. Pollard, The fast Fourier transform in a finite field, Math. Comp. 25 (1971),
/// section 5, from memory.
public final class IntegerProduct {

  private IntegerProduct() {}

  /// The coefficients of the product; both lists are not empty.
  public static BigInteger[] of(BigInteger[] a, BigInteger[] b) {
    int length = Math.addExact(a.length, b.length) - 1;
    int size = ResidueSeries.powerOfTwo(length);
    int shorter = Math.min(a.length, b.length);
    long bits = bits(a) + (long) bits(b) + Integer.SIZE - Integer.numberOfLeadingZeros(shorter) + 2;
    Budget.charge((bits / PrimeField.BITS + 1) * length);
    int log = Integer.numberOfTrailingZeros(size);
    List<PrimeField> primes = Primes.forProduct(log, bits);
    ChineseRemainder remainders = new ChineseRemainder(primes);
    int[][] left = remainders.residues(a);
    int[][] right = a == b ? left : remainders.residues(b);
    for (int i = 0; i < left.length; i++) {
      left[i] = product(new Transform(primes.get(i), size), left[i], right[i], size);
      right[i] = left[i];
    }
    return remainders.integers(left, length);
  }

  private static int[] product(Transform transform, int[] a, int[] b, int size) {
    int[] values = Arrays.copyOf(a, size);
    transform.forward(values, size);
    int[] others = values;
    if (a != b) {
      others = Arrays.copyOf(b, size);
      transform.forward(others, size);
    }
    transform.field().times(values, others, values, size);
    transform.inverse(values, size);
    return values;
  }

  private static int bits(BigInteger[] values) {
    int bits = 0;
    for (BigInteger value : values) {
      bits = Math.max(bits, value.bitLength());
    }
    return bits;
  }
}
