package gnomon.number;

import gnomon.algebra.Budget;
import gnomon.modular.ChineseRemainder;
import gnomon.modular.PrimeField;
import gnomon.modular.Primes;
import gnomon.modular.ResidueSeries;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// Bell numbers, n! times the coefficients of e^(e^t − 1).
///
/// Lists by the triangle of partial sums; very long ones modulo many primes, each time by one
/// exponential of a series, and Chinese remaindering. How many primes are needed follows from B_n ≤
/// n! e^(e^r − 1)/r^n, true for every r > 0, with the best integer r.
final class Bell {

  /// Additions are so cheap that the triangle is the shorter way for a long time.
  private static final int TRIANGLE = 6000;

  private Bell() {}

  static List<BigInteger> numbers(int n) {
    return n <= TRIANGLE ? triangle(n) : throughPrimes(n);
  }

  /// Each row begins with the last entry of the one before; each entry is the sum of its left
  /// neighbour and the one above that.
  static List<BigInteger> triangle(int n) {
    Budget.charge((long) n * n / Long.SIZE + 1);
    List<BigInteger> numbers = new ArrayList<>(List.of(BigInteger.ONE));
    BigInteger[] row = {BigInteger.ONE};
    for (int k = 1; k <= n; k++) {
      Budget.checkpoint();
      BigInteger[] next = new BigInteger[k + 1];
      next[0] = row[k - 1];
      for (int j = 1; j <= k; j++) {
        next[j] = next[j - 1].add(row[j - 1]);
      }
      numbers.add(next[0]);
      row = next;
    }
    return List.copyOf(numbers);
  }

  /// At least log2 B_n.
  static int bits(int n) {
    int factorial = Combinatorics.factorial(n).bitLength();
    int best = Integer.MAX_VALUE;
    for (int r = 1; r < Integer.SIZE - Integer.numberOfLeadingZeros(n); r++) {
      // 2.7183 is above e, 1.4427 above log2 e
      BigInteger growth = BigInteger.valueOf(27_183).pow(r).multiply(BigInteger.valueOf(14_427));
      BigInteger unit = BigInteger.valueOf(10_000).pow(r + 1);
      int exponential = growth.divide(unit).intValueExact() + 1;
      int power = BigInteger.valueOf(r).pow(n).bitLength() - 1;
      best = Math.min(best, factorial + exponential - power);
    }
    return best;
  }

  static List<BigInteger> throughPrimes(int n) {
    int length = n + 1;
    int bits = bits(n) + 2;
    Budget.charge((long) bits / Long.SIZE * length);
    List<PrimeField> primes = Primes.forProduct(ResidueSeries.logLength(length), bits);
    int[][] rows = new int[primes.size()][];
    for (int i = 0; i < rows.length; i++) {
      PrimeField field = primes.get(i);
      ResidueSeries ring = new ResidueSeries(field, length);
      int[] inverses = field.inverses(length + 1);
      int[] exponential = new int[length];
      int[] factorials = new int[length];
      int term = 1;
      factorials[0] = 1;
      for (int k = 1; k < length; k++) {
        term = field.times(term, inverses[k]);
        exponential[k] = term;
        factorials[k] = field.times(factorials[k - 1], k);
      }
      rows[i] = ring.exp(exponential, length);
      field.times(rows[i], factorials, rows[i], length);
    }
    return List.of(new ChineseRemainder(primes).integers(rows, length));
  }
}
