package gnomon.modular;

import gnomon.algebra.Budget;
import gnomon.algebra.Halt;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// Primes for transforms: p = k 2^s + 1 below 2^30, found from the top downward.
///
/// Primality is decided, not guessed: the strong test to the bases 2, 3, 5 and 7 has no exception
/// below 3 215 031 751.
///
/// Source: C. Pomerance, J. L. Selfridge, S. S. Wagstaff, The pseudoprimes to 25·10^9, Math. Comp.
/// 35 (1980), from memory.
public final class Primes {

  private static final int[] BASES = {2, 3, 5, 7};
  private static final int[] SMALL = {3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37, 41, 43, 47};

  /// The largest exponent s for which enough primes are left for the work of this program.
  public static final int MAX_LOG_LENGTH = 23;

  /// Primes are taken from short progressions only as far as needed, so that they stay large.
  private static final int MIN_LOG_LENGTH = 13;

  private Primes() {}

  /// The largest primes p below 2^30 with p ≡ 1 modulo 2^`logLength`, descending, as many as are
  /// needed for their product to have more than `bits` bits.
  ///
  /// @throws gnomon.algebra.Halt with the size, when there are not as many
  public static List<PrimeField> forProduct(int logLength, long bits) {
    return forProduct(logLength, bits, BigInteger.ONE);
  }

  /// As [#forProduct(int, long)], leaving out the primes that divide `avoided`.
  public static List<PrimeField> forProduct(int logLength, long bits, BigInteger avoided) {
    int log = Math.max(logLength, MIN_LOG_LENGTH);
    Budget.charge(bits / PrimeField.BITS);
    List<PrimeField> found = new ArrayList<>();
    BigInteger product = BigInteger.ONE;
    BigInteger pending = BigInteger.ONE;
    long step = 1L << log;
    long candidate = ((1L << PrimeField.BITS) - 1) / step * step + 1;
    if (candidate >= 1L << PrimeField.BITS) {
      candidate -= step;
    }
    while (product.bitLength() <= bits + 1) {
      candidate -= step;
      if (candidate <= 1L << (PrimeField.BITS - 3)) {
        throw new Halt(Halt.Cause.SIZE, bits);
      }
      if (isPrime(candidate) && !divides(candidate, avoided)) {
        Budget.checkpoint();
        found.add(new PrimeField((int) candidate));
        pending = pending.multiply(BigInteger.valueOf(candidate));
        if (found.size() % 16 == 0 || pending.bitLength() + product.bitLength() > bits) {
          product = product.multiply(pending);
          pending = BigInteger.ONE;
        }
      }
    }
    return List.copyOf(found);
  }

  private static boolean divides(long prime, BigInteger number) {
    return !number.equals(BigInteger.ONE) && number.mod(BigInteger.valueOf(prime)).signum() == 0;
  }

  /// Whether n is prime, for n below 2^31.
  public static boolean isPrime(long n) {
    if (n < 2) {
      return false;
    }
    if (n % 2 == 0) {
      return n == 2;
    }
    for (int small : SMALL) {
      if (n % small == 0) {
        return n == small;
      }
    }
    for (int base : BASES) {
      if (!isStrongProbablePrime(n, base)) {
        return false;
      }
    }
    return true;
  }

  private static boolean isStrongProbablePrime(long n, int base) {
    int twos = Long.numberOfTrailingZeros(n - 1);
    long value = PrimeField.power(base, (n - 1) >> twos, n);
    if (value == 1 || value == n - 1) {
      return true;
    }
    for (int i = 1; i < twos; i++) {
      value = value * value % n;
      if (value == n - 1) {
        return true;
      }
    }
    return false;
  }
}
