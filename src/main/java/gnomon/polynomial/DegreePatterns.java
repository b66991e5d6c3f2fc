package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.BitSet;

/// Which degrees a factor over the rationals can have, learnt from the degrees of the irreducible
/// factors modulo small primes: a factor's degree is a sum of some of them, for every prime.
///
/// When only 0 and the full degree remain, the polynomial is proved irreducible.
final class DegreePatterns {

  private static final int MAX_PRIMES = 24;
  private static final int MAX_IDLE = 8;
  private static final int MAX_TRIED = 80;

  private final BigInteger[] polynomial;
  private final int degree;
  private final BitSet possible;

  /// The pattern search for a primitive square-free polynomial of degree at least 1.
  DegreePatterns(BigInteger[] polynomial) {
    this.polynomial = polynomial;
    this.degree = polynomial.length - 1;
    this.possible = new BitSet(degree + 1);
    this.possible.set(0, degree + 1);
    int idle = 0;
    int used = 0;
    long prime = 7;
    for (int tried = 0; tried < MAX_TRIED && used < MAX_PRIMES && idle < MAX_IDLE; tried++) {
      int before = possible.cardinality();
      if (before == 2) {
        break;
      }
      prime = primeAbove(prime);
      if (restrict(prime)) {
        used++;
        idle = possible.cardinality() == before ? idle + 1 : 0;
      }
    }
  }

  /// Whether only the trivial degrees remain.
  boolean proveIrreducible() {
    return possible.cardinality() == 2;
  }

  static long primeAbove(long bound) {
    return BigInteger.valueOf(bound).nextProbablePrime().longValueExact();
  }

  /// Learns from one prime; false when the prime divides the leading coefficient or the
  /// discriminant.
  private boolean restrict(long prime) {
    long[] image = Residues.monic(Residues.reduce(polynomial, prime), prime);
    if (image.length <= degree
        || Residues.gcd(image, Residues.derivative(image, prime), prime).length != 1) {
      return false;
    }
    possible.and(sums(image, prime));
    return true;
  }

  /// All sums of degrees of irreducible factors of a monic square-free image, by distinct-degree
  /// factorization.
  private static BitSet sums(long[] image, long prime) {
    BitSet sums = new BitSet(image.length);
    sums.set(0);
    Frobenius frobenius = new Frobenius(image, prime);
    long[] unknown = {0, 1};
    long[] iterate = unknown;
    long[] rest = image;
    for (int d = 1; 2 * d < rest.length; d++) {
      Budget.checkpoint();
      iterate = frobenius.apply(iterate);
      long[] difference = Residues.minus(iterate, unknown, prime);
      long[] product = Residues.gcd(rest, Residues.remainder(difference, rest, prime), prime);
      for (int count = (product.length - 1) / d; count > 0; count--) {
        sums.or(shifted(sums, d));
      }
      if (product.length > 1) {
        rest = Residues.quotient(rest, product, prime);
      }
    }
    if (rest.length > 1) {
      sums.or(shifted(sums, rest.length - 1));
    }
    return sums;
  }

  private static BitSet shifted(BitSet sums, int by) {
    BitSet shifted = new BitSet();
    sums.stream().forEach(sum -> shifted.set(sum + by));
    return shifted;
  }

  /// The linear map h -> h^p modulo a monic image, by the table of the powers x^(p i).
  private static final class Frobenius {
    private final long[][] powers;
    private final long prime;

    Frobenius(long[] image, long prime) {
      this.prime = prime;
      int degree = image.length - 1;
      powers = new long[degree][];
      long[] power = new long[degree];
      power[0] = 1;
      for (int i = 0; i < degree; i++) {
        Budget.checkpoint();
        powers[i] = power.clone();
        for (long step = 0; i + 1 < degree && step < prime; step++) {
          timesUnknown(power, image);
        }
      }
    }

    private void timesUnknown(long[] power, long[] image) {
      int degree = power.length;
      long negative = prime - power[degree - 1];
      for (int j = degree - 1; j > 0; j--) {
        power[j] = (power[j - 1] + negative * image[j]) % prime;
      }
      power[0] = negative * image[0] % prime;
    }

    /// Sums of fewer than 2^20 products of residues below 2^20 need no reduction on the way.
    long[] apply(long[] element) {
      long[] sum = new long[powers.length];
      for (int i = 0; i < element.length; i++) {
        long factor = element[i];
        if (factor != 0) {
          long[] power = powers[i];
          for (int j = 0; j < sum.length; j++) {
            sum[j] += factor * power[j];
          }
        }
      }
      for (int j = 0; j < sum.length; j++) {
        sum[j] %= prime;
      }
      return Residues.trim(sum);
    }
  }
}
