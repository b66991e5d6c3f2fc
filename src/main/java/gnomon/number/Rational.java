package gnomon.number;

import gnomon.algebra.Budget;
import gnomon.algebra.Field;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.math.BigInteger;
import java.util.Optional;

/// A rational number p/q in lowest terms with q positive.
///
/// Values whose p and q fit a machine word are computed in machine words, with exact fall back to
/// arbitrary length; the two representations never overlap, so equality is structural.
public final class Rational implements Field<Rational>, Comparable<Rational> {

  private static final int CACHED = 256;
  private static final Rational[] SMALL = smallIntegers();

  /// The number 0.
  public static final Rational ZERO = of(0);

  /// The number 1.
  public static final Rational ONE = of(1);

  /// The number -1.
  public static final Rational MINUS_ONE = of(-1);

  /// The number 2.
  public static final Rational TWO = of(2);

  /// The number 1/2.
  public static final Rational HALF = of(1, 2);

  private final long numerator;
  private final long denominator;
  private final BigPair big;

  /// The parts of a value that does not fit machine words.
  private record BigPair(BigInteger numerator, BigInteger denominator) {}

  private Rational(long numerator, long denominator) {
    this.numerator = numerator;
    this.denominator = denominator;
    this.big = null;
  }

  private Rational(BigPair big) {
    this.numerator = 0;
    this.denominator = 0;
    this.big = big;
  }

  private static Rational[] smallIntegers() {
    Rational[] table = new Rational[2 * CACHED + 1];
    for (int i = 0; i < table.length; i++) {
      table[i] = new Rational(i - CACHED, 1);
    }
    return table;
  }

  /// The integer `value`.
  public static Rational of(long value) {
    if (value >= -CACHED && value <= CACHED) {
      return SMALL[(int) value + CACHED];
    }
    return value == Long.MIN_VALUE
        ? new Rational(new BigPair(BigInteger.valueOf(value), BigInteger.ONE))
        : new Rational(value, 1);
  }

  /// The quotient of two machine integers.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] when `denominator` is 0
  public static Rational of(long numerator, long denominator) {
    if (numerator == Long.MIN_VALUE || denominator == Long.MIN_VALUE) {
      return of(BigInteger.valueOf(numerator), BigInteger.valueOf(denominator));
    }
    if (denominator == 1) {
      return of(numerator);
    }
    if (denominator == 0) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, of(numerator));
    }
    long common = gcd(Math.abs(numerator), Math.abs(denominator));
    long sign = denominator < 0 ? -common : common;
    return lowest(numerator / sign, denominator / sign);
  }

  /// The integer `value`.
  public static Rational of(BigInteger value) {
    return value.bitLength() < Long.SIZE
        ? of(value.longValue())
        : new Rational(new BigPair(value, BigInteger.ONE));
  }

  /// The quotient of two integers.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] when `denominator` is 0
  public static Rational of(BigInteger numerator, BigInteger denominator) {
    if (denominator.signum() == 0) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, of(numerator));
    }
    if (denominator.equals(BigInteger.ONE)) {
      return of(numerator);
    }
    BigInteger common = numerator.gcd(denominator);
    if (denominator.signum() < 0) {
      common = common.negate();
    }
    boolean lowest = common.equals(BigInteger.ONE);
    return lowest(
        lowest ? numerator : numerator.divide(common),
        lowest ? denominator : denominator.divide(common));
  }

  /// The quotient of two integers known to be coprime, the denominator positive: neither is
  /// checked.
  public static Rational ofCoprime(BigInteger numerator, BigInteger denominator) {
    return denominator.equals(BigInteger.ONE) ? of(numerator) : lowest(numerator, denominator);
  }

  /// Reads `p`, `p/q` or a decimal such as `-0.125`, all exact.
  ///
  /// @throws Refusal with [Reason#UNREADABLE_NUMBER] when `text` is none of these
  public static Rational parse(String text) {
    return tryParse(text).orElseThrow(() -> new Refusal(Reason.UNREADABLE_NUMBER, text));
  }

  /// Reads like [#parse(String)]; empty when `text` is not a number.
  public static Optional<Rational> tryParse(String text) {
    if (text.matches("[+-]?[0-9]+")) {
      return Optional.of(of(new BigInteger(text)));
    }
    if (text.matches("[+-]?[0-9]+/[0-9]*[1-9][0-9]*")) {
      int slash = text.indexOf('/');
      return Optional.of(
          of(new BigInteger(text.substring(0, slash)), new BigInteger(text.substring(slash + 1))));
    }
    if (text.matches("[+-]?[0-9]*\\.[0-9]+")) {
      int point = text.indexOf('.');
      String digits = text.substring(0, point) + text.substring(point + 1);
      return Optional.of(of(new BigInteger(digits), BigInteger.TEN.pow(text.length() - point - 1)));
    }
    return Optional.empty();
  }

  /// Both parts already free of common factors, `denominator` positive.
  private static Rational lowest(long numerator, long denominator) {
    return denominator == 1 ? of(numerator) : new Rational(numerator, denominator);
  }

  private static Rational lowest(BigInteger numerator, BigInteger denominator) {
    if (numerator.bitLength() < Long.SIZE && denominator.bitLength() < Long.SIZE) {
      long small = numerator.longValue();
      if (small != Long.MIN_VALUE) {
        return lowest(small, denominator.longValue());
      }
    }
    return new Rational(new BigPair(numerator, denominator));
  }

  private static long gcd(long a, long b) {
    while (b != 0) {
      long rest = a % b;
      a = b;
      b = rest;
    }
    return a;
  }

  @Override
  public Rational plus(Rational other) {
    if (big == null && other.big == null) {
      if (denominator == other.denominator) {
        long sum = numerator + other.numerator;
        boolean overflow = ((numerator ^ sum) & (other.numerator ^ sum)) < 0;
        if (!overflow) {
          return of(sum, denominator);
        }
      } else if (isShort() && other.isShort()) {
        return of(
            numerator * other.denominator + other.numerator * denominator,
            denominator * other.denominator);
      }
    }
    return bigPlus(other);
  }

  private Rational bigPlus(Rational other) {
    BigInteger p = numerator();
    BigInteger q = denominator();
    BigInteger r = other.numerator();
    BigInteger s = other.denominator();
    if (q.equals(s)) {
      return of(p.add(r), q);
    }
    return of(p.multiply(s).add(r.multiply(q)), q.multiply(s));
  }

  private boolean isShort() {
    return (int) numerator == numerator && (int) denominator == denominator;
  }

  @Override
  public Rational minus(Rational other) {
    return plus(other.negated());
  }

  @Override
  public Rational times(Rational other) {
    if (big == null && other.big == null) {
      if (isShort() && other.isShort()) {
        return of(numerator * other.numerator, denominator * other.denominator);
      }
      if (denominator == 1 && other.denominator == 1) {
        long high = Math.multiplyHigh(numerator, other.numerator);
        long low = numerator * other.numerator;
        if (high == low >> 63) {
          return of(low);
        }
      }
    }
    return bigTimes(other);
  }

  private Rational bigTimes(Rational other) {
    if (isZero() || other.isZero()) {
      return ZERO;
    }
    BigInteger p = numerator();
    BigInteger q = denominator();
    BigInteger r = other.numerator();
    BigInteger s = other.denominator();
    if (!s.equals(BigInteger.ONE)) {
      BigInteger common = p.gcd(s);
      p = p.divide(common);
      s = s.divide(common);
    }
    if (!q.equals(BigInteger.ONE)) {
      BigInteger common = r.gcd(q);
      r = r.divide(common);
      q = q.divide(common);
    }
    return lowest(p.multiply(r), q.multiply(s));
  }

  @Override
  public Rational dividedBy(Rational other) {
    if (other.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, this);
    }
    return times(other.inverse());
  }

  @Override
  public Rational negated() {
    return big == null
        ? lowest(-numerator, denominator)
        : lowest(big.numerator.negate(), big.denominator);
  }

  @Override
  public Rational inverse() {
    if (isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, ONE);
    }
    if (big == null) {
      return numerator > 0 ? lowest(denominator, numerator) : lowest(-denominator, -numerator);
    }
    return big.numerator.signum() > 0
        ? lowest(big.denominator, big.numerator)
        : lowest(big.denominator.negate(), big.numerator.negate());
  }

  /// The distance from 0.
  public Rational abs() {
    return sign() < 0 ? negated() : this;
  }

  /// The power with an integer exponent; a negative one inverts. The size of the result is charged
  /// to the budget before it is computed.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a negative power of 0
  @Override
  public Rational power(int exponent) {
    if (exponent < 0) {
      if (isZero()) {
        throw new Refusal(Reason.DIVISION_BY_ZERO, ONE);
      }
      return exponent == Integer.MIN_VALUE
          ? inverse().power(Integer.MAX_VALUE).dividedBy(this)
          : inverse().power(-exponent);
    }
    if (exponent == 0 || isOne()) {
      return ONE;
    }
    if (exponent == 1 || isZero()) {
      return this;
    }
    if (equals(MINUS_ONE)) {
      return exponent % 2 == 0 ? ONE : this;
    }
    Budget.chargeInteger(bitLength() * exponent / Long.SIZE + 1);
    return lowest(numerator().pow(exponent), denominator().pow(exponent));
  }

  /// -1, 0 or 1.
  public int sign() {
    return big == null ? Long.signum(numerator) : big.numerator.signum();
  }

  @Override
  public boolean isZero() {
    return big == null && numerator == 0;
  }

  @Override
  public boolean isOne() {
    return big == null && numerator == 1 && denominator == 1;
  }

  /// Whether the denominator is 1.
  public boolean isInteger() {
    return big == null ? denominator == 1 : big.denominator.equals(BigInteger.ONE);
  }

  /// The numerator in lowest terms, with the sign.
  public BigInteger numerator() {
    return big == null ? BigInteger.valueOf(numerator) : big.numerator;
  }

  /// The denominator in lowest terms, positive.
  public BigInteger denominator() {
    return big == null ? BigInteger.valueOf(denominator) : big.denominator;
  }

  /// The number of bits of the longer of numerator and denominator.
  public long bitLength() {
    return big == null
        ? Long.SIZE - Long.numberOfLeadingZeros(Math.max(Math.abs(numerator), denominator))
        : Math.max(big.numerator.bitLength(), big.denominator.bitLength());
  }

  /// The largest integer at most this number.
  public BigInteger floor() {
    if (big == null) {
      return BigInteger.valueOf(Math.floorDiv(numerator, denominator));
    }
    BigInteger[] parts = big.numerator.divideAndRemainder(big.denominator);
    return parts[1].signum() < 0 ? parts[0].subtract(BigInteger.ONE) : parts[0];
  }

  /// This number minus its floor, at least 0 and below 1.
  public Rational fractionalPart() {
    return isInteger() ? ZERO : minus(of(floor()));
  }

  /// Whether this is an integer of the `int` range.
  public boolean fitsInt() {
    return big == null && denominator == 1 && (int) numerator == numerator;
  }

  /// Whether this is an integer of the `long` range, except its least element.
  public boolean fitsLong() {
    return big == null && denominator == 1;
  }

  /// The value as an `int`.
  ///
  /// @throws Refusal with [Reason#NOT_AN_INTEGER] or [Reason#OUT_OF_RANGE] when it is not one
  public int intValueExact() {
    if (!fitsInt()) {
      throw new Refusal(isInteger() ? Reason.OUT_OF_RANGE : Reason.NOT_AN_INTEGER, this);
    }
    return (int) numerator;
  }

  /// The value as a `long`.
  ///
  /// @throws Refusal with [Reason#NOT_AN_INTEGER] or [Reason#OUT_OF_RANGE] when it is not one
  public long longValueExact() {
    if (!fitsLong()) {
      throw new Refusal(isInteger() ? Reason.OUT_OF_RANGE : Reason.NOT_AN_INTEGER, this);
    }
    return numerator;
  }

  @Override
  public int compareTo(Rational other) {
    if (big == null && other.big == null) {
      if (denominator == other.denominator) {
        return Long.compare(numerator, other.numerator);
      }
      int high =
          Long.compare(
              Math.multiplyHigh(numerator, other.denominator),
              Math.multiplyHigh(other.numerator, denominator));
      return high != 0
          ? high
          : Long.compareUnsigned(numerator * other.denominator, other.numerator * denominator);
    }
    if (sign() != other.sign()) {
      return Integer.compare(sign(), other.sign());
    }
    return numerator()
        .multiply(other.denominator())
        .compareTo(other.numerator().multiply(denominator()));
  }

  @Override
  public boolean equals(Object object) {
    return this == object
        || object instanceof Rational other
            && numerator == other.numerator
            && denominator == other.denominator
            && (big == null ? other.big == null : big.equals(other.big));
  }

  @Override
  public int hashCode() {
    return big == null ? Long.hashCode(numerator * 31 + denominator) : big.hashCode();
  }

  /// The number as `p` or `p/q`.
  @Override
  public String toString() {
    if (big == null) {
      return denominator == 1 ? Long.toString(numerator) : numerator + "/" + denominator;
    }
    return isInteger() ? big.numerator.toString() : big.numerator + "/" + big.denominator;
  }
}
