package gnomon.series;

import gnomon.modular.Primes;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// Quotients x/D_n in lowest terms, for the smooth denominators of a [DenominatorScale].
///
/// All primes that can be common are known: they divide D_n. One remainder of x by their product
/// tells which ones do, and only for those the common power is found. For numbers of many words
/// that is much shorter than a greatest common divisor.
final class LowestTerms {

  /// Shorter denominators go the plain way.
  private static final int SHORT = 256;

  private static final int GROUP_BITS = 500;

  private final BigInteger[] denominators;
  private final List<Group> groups = new ArrayList<>();
  private final BigInteger radical;
  private final boolean known;

  /// Some primes and their product.
  private record Group(List<BigInteger> primes, BigInteger product) {}

  LowestTerms(DenominatorScale scale, int length, BigInteger[] denominators) {
    this.denominators = denominators;
    List<BigInteger> primes = new ArrayList<>();
    boolean prime = true;
    for (BigInteger base : scale.bases()) {
      boolean small = base.bitLength() < 31 && Primes.isPrime(base.longValue());
      prime = prime && small;
      if (base.testBit(0) && base.compareTo(BigInteger.valueOf(length)) >= 0) {
        primes.add(base);
      }
    }
    for (int p = 3; p < length; p += 2) {
      if (Primes.isPrime(p)) {
        primes.add(BigInteger.valueOf(p));
      }
    }
    this.known = prime;
    BigInteger all = BigInteger.ONE;
    List<BigInteger> members = new ArrayList<>();
    BigInteger product = BigInteger.ONE;
    for (BigInteger p : primes) {
      members.add(p);
      product = product.multiply(p);
      if (product.bitLength() > GROUP_BITS) {
        groups.add(new Group(List.copyOf(members), product));
        all = all.multiply(product);
        members.clear();
        product = BigInteger.ONE;
      }
    }
    groups.add(new Group(List.copyOf(members), product));
    this.radical = all.multiply(product);
  }

  /// numerator/D_n.
  Rational quotient(BigInteger numerator, int n) {
    BigInteger denominator = denominators[n];
    if (!known || denominator.bitLength() < SHORT || numerator.bitLength() < SHORT) {
      return Rational.of(numerator, denominator);
    }
    BigInteger size = numerator.abs();
    if (size.compareTo(denominator) <= 0) {
      BigInteger[] whole = denominator.divideAndRemainder(size);
      if (whole[1].signum() == 0) {
        BigInteger sign = BigInteger.valueOf(numerator.signum());
        return Rational.ofCoprime(sign, whole[0]);
      }
    } else {
      BigInteger[] whole = numerator.divideAndRemainder(denominator);
      if (whole[1].signum() == 0) {
        return Rational.of(whole[0]);
      }
    }
    BigInteger common = common(size, denominator);
    return Rational.ofCoprime(numerator.divide(common), denominator.divide(common));
  }

  private BigInteger common(BigInteger numerator, BigInteger denominator) {
    int twos = Math.min(numerator.getLowestSetBit(), denominator.getLowestSetBit());
    BigInteger common = BigInteger.ONE;
    BigInteger rest = numerator.mod(radical);
    for (Group group : groups) {
      BigInteger part = rest.mod(group.product());
      for (BigInteger p : group.primes()) {
        if (part.mod(p).signum() == 0) {
          common = common.multiply(commonPower(numerator, denominator, p));
        }
      }
    }
    return common.shiftLeft(twos);
  }

  /// The highest power of p that divides both, which mostly shows in the remainders by the highest
  /// power of p that fits a word.
  private static BigInteger commonPower(BigInteger a, BigInteger b, BigInteger p) {
    long prime = p.longValue();
    long chunk = prime;
    int size = 1;
    for (; chunk * prime < 1L << 31; size++) {
      chunk *= prime;
    }
    BigInteger divisor = BigInteger.valueOf(chunk);
    BigInteger left = a;
    BigInteger right = b;
    int power = 0;
    while (true) {
      int most =
          Math.min(
              valuation(left.mod(divisor).longValue(), prime, size),
              valuation(right.mod(divisor).longValue(), prime, size));
      power += most;
      if (most < size) {
        return p.pow(power);
      }
      left = left.divide(divisor);
      right = right.divide(divisor);
    }
  }

  /// How often p divides the number, at most `limit` times, which is the answer for 0.
  private static int valuation(long number, long prime, int limit) {
    int power = 0;
    for (long rest = number; power < limit && rest % prime == 0; rest /= prime) {
      power++;
    }
    return power;
  }
}
