package gnomon.session.hunt;

import java.math.BigInteger;

/// A fraction of the tests' own, so that values do not come from the arithmetic under test.
record Fraction(BigInteger above, BigInteger below) {
  static final Fraction ZERO = of(0);
  static final Fraction ONE = of(1);

  Fraction {
    if (below.signum() == 0) {
      throw new Pole();
    }
    BigInteger common = above.gcd(below);
    if (below.signum() < 0) {
      common = common.negate();
    }
    above = above.divide(common);
    below = below.divide(common);
  }

  static Fraction of(long value) {
    return new Fraction(BigInteger.valueOf(value), BigInteger.ONE);
  }

  static Fraction of(long above, long below) {
    return new Fraction(BigInteger.valueOf(above), BigInteger.valueOf(below));
  }

  Fraction plus(Fraction other) {
    return new Fraction(
        above.multiply(other.below).add(other.above.multiply(below)), below.multiply(other.below));
  }

  Fraction negated() {
    return new Fraction(above.negate(), below);
  }

  Fraction minus(Fraction other) {
    return plus(other.negated());
  }

  Fraction times(Fraction other) {
    return new Fraction(above.multiply(other.above), below.multiply(other.below));
  }

  Fraction over(Fraction other) {
    return new Fraction(above.multiply(other.below), below.multiply(other.above));
  }

  /// A whole power; 0^0 is 1.
  Fraction power(int exponent) {
    if (exponent < 0) {
      return ONE.over(power(-exponent));
    }
    return new Fraction(above.pow(exponent), below.pow(exponent));
  }

  boolean isZero() {
    return above.signum() == 0;
  }

  /// The value as an int.
  int whole() {
    if (!below.equals(BigInteger.ONE)) {
      throw new Doubtful();
    }
    return above.intValueExact();
  }

  @Override
  public String toString() {
    return below.equals(BigInteger.ONE) ? above.toString() : above + "/" + below;
  }

  /// There is no value here.
  static final class Pole extends ArithmeticException {
    private static final long serialVersionUID = 1L;
  }

  /// A pole meets a zero, or the value is none of ours: nothing is compared.
  static final class Doubtful extends ArithmeticException {
    private static final long serialVersionUID = 1L;
  }
}
