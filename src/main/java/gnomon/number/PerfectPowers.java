package gnomon.number;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.Optional;

/// Exact roots of integers, by Newton's iteration from above.
final class PerfectPowers {

  private PerfectPowers() {}

  static Optional<BigInteger> root(BigInteger number, int degree) {
    if (number.signum() < 0) {
      return degree % 2 == 0
          ? Optional.empty()
          : root(number.negate(), degree).map(BigInteger::negate);
    }
    BigInteger floor = floorRoot(number, degree);
    return floor.pow(degree).equals(number) ? Optional.of(floor) : Optional.empty();
  }

  /// The largest integer whose `degree`-th power is at most `number`, for `number` at least 0.
  static BigInteger floorRoot(BigInteger number, int degree) {
    if (number.signum() == 0 || degree == 1) {
      return number;
    }
    if (degree == 2) {
      return number.sqrt();
    }
    if (degree >= number.bitLength()) {
      return BigInteger.ONE;
    }
    BigInteger order = BigInteger.valueOf(degree);
    BigInteger below = BigInteger.valueOf(degree - 1L);
    BigInteger root = BigInteger.ONE.shiftLeft((number.bitLength() + degree - 1) / degree);
    while (true) {
      Budget.checkpoint();
      BigInteger next = root.multiply(below).add(number.divide(root.pow(degree - 1))).divide(order);
      if (next.compareTo(root) >= 0) {
        return root;
      }
      root = next;
    }
  }

  static Integers.PerfectPower of(BigInteger number) {
    if (number.bitLength() <= 1) {
      return new Integers.PerfectPower(number, 1);
    }
    BigInteger base = number;
    int exponent = 1;
    for (int degree = 2; degree <= base.bitLength(); ) {
      Optional<BigInteger> root = root(base, degree);
      if (root.isPresent()) {
        base = root.get();
        exponent *= degree;
      } else {
        degree = BigInteger.valueOf(degree).nextProbablePrime().intValueExact();
      }
    }
    return new Integers.PerfectPower(base, exponent);
  }
}
