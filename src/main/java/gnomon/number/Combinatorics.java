package gnomon.number;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/// Factorials, binomials and the rows of the classical triangles.
final class Combinatorics {

  private Combinatorics() {}

  static BigInteger factorial(int n) {
    Budget.chargeInteger((long) n * bits(n) / Long.SIZE + 1);
    return product(1, n);
  }

  /// The product of the integers from `low` to `high`, halving the range; 1 when it is empty.
  static BigInteger product(long low, long high) {
    if (high - low < 16) {
      BigInteger result = BigInteger.ONE;
      for (long i = low; i <= high; i++) {
        result = result.multiply(BigInteger.valueOf(i));
      }
      return result;
    }
    Budget.checkpoint();
    long middle = (low + high) >>> 1;
    return product(low, middle).multiply(product(middle + 1, high));
  }

  static BigInteger binomial(int n, int k) {
    if (k < 0) {
      return BigInteger.ZERO;
    }
    if (n < 0) {
      BigInteger mirrored = natural(k - 1L - n, k);
      return k % 2 == 0 ? mirrored : mirrored.negate();
    }
    return k > n ? BigInteger.ZERO : natural(n, Math.min(k, n - k));
  }

  private static BigInteger natural(long n, int k) {
    Budget.chargeInteger((long) k * bits(n) / Long.SIZE + 1);
    return product(n - k + 1, n).divide(product(1, k));
  }

  private static long bits(long n) {
    return Long.SIZE - Long.numberOfLeadingZeros(n);
  }

  static List<BigInteger> stirlingFirstRow(int n) {
    chargeRow(n);
    BigInteger[] row = firstRow(n);
    for (int k = 1 - (n & 1); k <= n; k += 2) {
      row[k] = row[k].negate();
    }
    return List.of(row);
  }

  private static BigInteger[] firstRow(int n) {
    BigInteger[] row = zeros(n + 1);
    row[0] = BigInteger.ONE;
    for (int m = 0; m < n; m++) {
      Budget.checkpoint();
      BigInteger shift = BigInteger.valueOf(m);
      for (int k = m + 1; k > 0; k--) {
        row[k] = row[k - 1].add(row[k].multiply(shift));
      }
      row[0] = row[0].multiply(shift);
    }
    return row;
  }

  static List<BigInteger> stirlingSecondRow(int n) {
    chargeRow(n);
    BigInteger[] row = zeros(n + 1);
    row[0] = BigInteger.ONE;
    for (int m = 1; m <= n; m++) {
      Budget.checkpoint();
      for (int k = m; k > 0; k--) {
        row[k] = row[k - 1].add(row[k].multiply(BigInteger.valueOf(k)));
      }
      row[0] = BigInteger.ZERO;
    }
    return List.of(row);
  }

  static List<BigInteger> lahRow(int n) {
    if (n == 0) {
      return List.of(BigInteger.ONE);
    }
    chargeRow(n);
    List<BigInteger> row = new ArrayList<>(List.of(BigInteger.ZERO));
    BigInteger value = factorial(n);
    for (int k = 1; k <= n; k++) {
      row.add(value);
      value =
          value.multiply(BigInteger.valueOf(n - (long) k)).divide(BigInteger.valueOf(k * (k + 1L)));
    }
    return List.copyOf(row);
  }

  private static void chargeRow(int n) {
    Budget.charge((long) n * n / Long.SIZE * bits(n) + 1);
  }

  private static BigInteger[] zeros(int length) {
    BigInteger[] row = new BigInteger[length];
    Arrays.fill(row, BigInteger.ZERO);
    return row;
  }
}
