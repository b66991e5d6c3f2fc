package gnomon.series;

import gnomon.number.Rational;
import java.math.BigInteger;

/// An upper bound of a number of at least 0: mantissa · 2^exponent, every operation rounded up.
///
/// The mantissa is 0 or has exactly [#BITS] bits, so one operation loses at most 2^(1−BITS) of the
/// value.
///
/// @param mantissa 0, or from 2^(BITS−1) to 2^BITS − 1
/// @param exponent the power of two
record UpperBound(long mantissa, int exponent) {

  private static final int BITS = 31;

  /// Logarithms are given in parts of 1/1024.
  static final int LOG_UNIT = 1024;

  static final UpperBound ZERO = new UpperBound(0, 0);
  static final UpperBound ONE = new UpperBound(1L << (BITS - 1), 1 - BITS);

  private static UpperBound normal(long mantissa, int exponent) {
    int excess = Long.SIZE - Long.numberOfLeadingZeros(mantissa) - BITS;
    if (excess <= 0) {
      return mantissa == 0 ? ZERO : new UpperBound(mantissa << -excess, exponent + excess);
    }
    long rounded = ((mantissa - 1) >> excess) + 1;
    return rounded >> BITS == 0
        ? new UpperBound(rounded, exponent + excess)
        : new UpperBound(rounded >> 1, exponent + excess + 1);
  }

  /// A bound of m · 2^exponent, m at least 0.
  static UpperBound of(long m, int exponent) {
    return normal(m, exponent);
  }

  /// A bound of |value|.
  static UpperBound of(Rational value) {
    if (value.isZero()) {
      return ZERO;
    }
    BigInteger numerator = value.numerator().abs();
    BigInteger denominator = value.denominator();
    int up = Math.max(0, numerator.bitLength() - 61);
    long top = numerator.shiftRight(up).longValue() + (up > 0 ? 1 : 0);
    int down = Math.max(0, denominator.bitLength() - BITS);
    long bottom = denominator.shiftRight(down).longValue();
    int lift = Long.numberOfLeadingZeros(top) - 2;
    return normal((top << lift) / bottom + 1, up - down - lift);
  }

  UpperBound plus(UpperBound that) {
    if (mantissa == 0) {
      return that;
    }
    if (that.mantissa == 0) {
      return this;
    }
    if (exponent < that.exponent) {
      return that.plus(this);
    }
    int distance = exponent - that.exponent;
    return distance > BITS
        ? normal(mantissa + 1, exponent)
        : normal((mantissa << distance) + that.mantissa, that.exponent);
  }

  UpperBound times(UpperBound that) {
    return normal(mantissa * that.mantissa, exponent + that.exponent);
  }

  /// At least 1024 log2 of the value, which is not 0: the 1024-th power is taken.
  long log2() {
    UpperBound power = this;
    for (int i = 1; i < LOG_UNIT; i *= 2) {
      power = power.times(power);
    }
    return (long) power.exponent + BITS;
  }

  /// At least 2^20 times the value; `Long.MAX_VALUE` when that does not fit.
  long scaled() {
    int shift = exponent + 20;
    if (shift >= Long.SIZE - BITS - 1) {
      return Long.MAX_VALUE;
    }
    return shift >= 0 ? mantissa << shift : -shift >= Long.SIZE ? 1 : (mantissa >> -shift) + 1;
  }
}
