package gnomon.number;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/// Prime factors by trial division, then by Pollard's rho walk with a bounded number of steps.
///
/// A factor counts as prime when it passes the strong probable-prime tests of the class library
/// with an error bound of 2^-100; below 2^64 trial division up to 2^16 has removed every small
/// factor first.
final class PrimeFactors {

  private static final int TRIAL_LIMIT = 1 << 16;
  private static final int WALK_LIMIT = 1 << 18;
  private static final int WALKS = 4;
  private static final int CERTAINTY = 100;
  private static final int BATCH = 128;

  private final SortedMap<BigInteger, Integer> factors = new TreeMap<>();

  private PrimeFactors() {}

  static SortedMap<BigInteger, Integer> of(BigInteger number) {
    if (number.signum() <= 0) {
      throw new Refusal(Reason.OUT_OF_RANGE, Rational.of(number));
    }
    PrimeFactors search = new PrimeFactors();
    search.split(search.removeSmall(number));
    return search.factors;
  }

  private BigInteger removeSmall(BigInteger number) {
    int twos = number.getLowestSetBit();
    if (twos > 0) {
      factors.merge(BigInteger.TWO, twos, Integer::sum);
    }
    BigInteger rest = number.shiftRight(twos);
    for (int candidate = 3; candidate < TRIAL_LIMIT; candidate += 2) {
      Budget.checkpoint();
      BigInteger divisor = BigInteger.valueOf(candidate);
      if (rest.bitLength() <= Integer.SIZE && (long) candidate * candidate > rest.longValue()) {
        break;
      }
      BigInteger[] parts = rest.divideAndRemainder(divisor);
      while (parts[1].signum() == 0) {
        factors.merge(divisor, 1, Integer::sum);
        rest = parts[0];
        parts = rest.divideAndRemainder(divisor);
      }
    }
    return rest;
  }

  private void split(BigInteger number) {
    if (number.equals(BigInteger.ONE)) {
      return;
    }
    if (number.isProbablePrime(CERTAINTY)) {
      factors.merge(number, 1, Integer::sum);
      return;
    }
    Integers.PerfectPower power = PerfectPowers.of(number);
    if (power.exponent() > 1) {
      for (int i = 0; i < power.exponent(); i++) {
        split(power.base());
      }
      return;
    }
    BigInteger divisor =
        properDivisor(number)
            .orElseThrow(() -> new Refusal(Reason.FACTORING_LIMIT, Rational.of(number)));
    split(divisor);
    split(number.divide(divisor));
  }

  private static Optional<BigInteger> properDivisor(BigInteger number) {
    for (int offset = 1; offset <= WALKS; offset++) {
      BigInteger divisor = walk(number, BigInteger.valueOf(offset));
      if (!divisor.equals(BigInteger.ONE) && !divisor.equals(number)) {
        return Optional.of(divisor);
      }
    }
    return Optional.empty();
  }

  /// One walk x -> x^2 + offset; differences are multiplied up and tested in batches.
  private static BigInteger walk(BigInteger number, BigInteger offset) {
    BigInteger slow = BigInteger.TWO;
    BigInteger fast = BigInteger.TWO;
    for (int steps = 0; steps < WALK_LIMIT; steps += BATCH) {
      Budget.checkpoint();
      BigInteger slowStart = slow;
      BigInteger fastStart = fast;
      BigInteger product = BigInteger.ONE;
      for (int i = 0; i < BATCH; i++) {
        slow = step(slow, offset, number);
        fast = step(step(fast, offset, number), offset, number);
        product = product.multiply(slow.subtract(fast)).mod(number);
      }
      BigInteger common = product.gcd(number);
      if (!common.equals(BigInteger.ONE)) {
        return common.equals(number) ? singly(slowStart, fastStart, offset, number) : common;
      }
    }
    return BigInteger.ONE;
  }

  private static BigInteger singly(
      BigInteger slow, BigInteger fast, BigInteger offset, BigInteger number) {
    for (int i = 0; i < BATCH; i++) {
      slow = step(slow, offset, number);
      fast = step(step(fast, offset, number), offset, number);
      BigInteger common = slow.subtract(fast).gcd(number);
      if (!common.equals(BigInteger.ONE)) {
        return common;
      }
    }
    return number;
  }

  private static BigInteger step(BigInteger value, BigInteger offset, BigInteger number) {
    return value.multiply(value).add(offset).mod(number);
  }
}
