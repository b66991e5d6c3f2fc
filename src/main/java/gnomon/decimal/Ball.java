package gnomon.decimal;

import gnomon.number.Rational;
import java.math.BigInteger;
import org.apfloat.Apcomplex;
import org.apfloat.ApcomplexMath;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/// A complex number known to lie within `radius` of `middle`.
///
/// Every operation adds its own rounding to the radius it hands on, with room to spare; the radius
/// itself is rounded upward by doubling.
///
/// @param middle the approximation
/// @param radius the bound for its error, at least 0
record Ball(Apcomplex middle, Apfloat radius) {

  /// Decimal digits kept of a radius.
  private static final long COARSE = 12;

  private static final Apfloat NOTHING = new Apfloat(0, COARSE);

  /// Digits at the end of a library function's result that are not relied on.
  private static final int DOUBTFUL = 5;

  static Ball of(Rational value, long precision) {
    Ball numerator = of(value.numerator(), precision);
    return value.isInteger()
        ? numerator
        : numerator.dividedBy(of(value.denominator(), precision), precision);
  }

  static Ball of(BigInteger value, long precision) {
    // the library's own conversion of a BigInteger is slower than reading its digits
    Apfloat exact =
        value.bitLength() < Long.SIZE
            ? new Apfloat(value.longValue(), precision)
            : new Apfloat(value.toString(), precision);
    return value.signum() == 0 ? new Ball(exact, NOTHING) : rounded(exact, NOTHING, precision);
  }

  /// A constant as the library computes it.
  static Ball of(Apcomplex value, long precision) {
    return rounded(value, NOTHING, precision);
  }

  static Ball imaginaryUnit(long precision) {
    return new Ball(new Apcomplex(Apfloat.ZERO, new Apfloat(1, precision)), NOTHING);
  }

  /// The ball around a freshly computed middle: the propagated radius, and the middle's own last
  /// digits.
  private static Ball rounded(Apcomplex middle, Apfloat propagated, long precision) {
    long digits = Math.min(precision, middle.precision()) - DOUBTFUL;
    return new Ball(middle, upward(propagated.add(size(middle).multiply(ten(-digits)))));
  }

  private static Apfloat upward(Apfloat radius) {
    return coarse(radius).multiply(new Apfloat(2, COARSE));
  }

  private static Apfloat coarse(Apfloat value) {
    return value.signum() == 0 ? NOTHING : value.precision(COARSE);
  }

  private static Apfloat ten(long exponent) {
    return ApfloatMath.scale(new Apfloat(1, COARSE), exponent);
  }

  /// An upper bound for the distance of `value` from 0.
  private static Apfloat size(Apcomplex value) {
    return coarse(ApfloatMath.abs(value.real())).add(coarse(ApfloatMath.abs(value.imag())));
  }

  /// A lower bound for the distance of every point of the ball from 0.
  ///
  /// @throws Undecided when it is not above the radius
  private Apfloat distance() {
    Apfloat nearest = size(middle).divide(new Apfloat(2, COARSE));
    if (nearest.compareTo(radius.multiply(new Apfloat(4, COARSE))) <= 0) {
      throw new Undecided();
    }
    return nearest;
  }

  Ball plus(Ball other, long precision) {
    Apfloat sizes = size(middle).add(size(other.middle));
    Apfloat rounding = sizes.multiply(ten(DOUBTFUL - precision));
    Apfloat error = radius.add(other.radius).add(rounding);
    return new Ball(middle.add(other.middle), upward(error));
  }

  Ball times(Ball other, long precision) {
    Apfloat mine = size(middle);
    Apfloat its = size(other.middle);
    Apfloat error =
        mine.multiply(other.radius)
            .add(its.multiply(radius))
            .add(radius.multiply(other.radius))
            .add(mine.multiply(its).multiply(ten(DOUBTFUL - precision)));
    return new Ball(middle.multiply(other.middle), upward(error));
  }

  Ball dividedBy(Ball other, long precision) {
    Apfloat nearest = other.distance();
    Apcomplex inverse = new Apfloat(1, precision).divide(other.middle);
    Apfloat error = other.radius.divide(nearest).divide(nearest).multiply(new Apfloat(2, COARSE));
    return times(rounded(inverse, error, precision), precision);
  }

  Ball negated() {
    return new Ball(middle.negate(), radius);
  }

  /// The power with an integer exponent.
  Ball power(long exponent, long precision) {
    if (exponent < 0) {
      return of(BigInteger.ONE, precision).dividedBy(power(-exponent, precision), precision);
    }
    Ball result = of(BigInteger.ONE, precision);
    Ball square = this;
    for (long rest = exponent; rest > 0; rest >>= 1) {
      if ((rest & 1) != 0) {
        result = result.times(square, precision);
      }
      square = rest > 1 ? square.times(square, precision) : square;
    }
    return result;
  }

  /// The exponential: |e^(z+d) - e^z| is at most 2|d||e^z| for |d| up to 1.
  Ball exponential(long precision) {
    if (radius.compareTo(new Apfloat(1, COARSE)) > 0) {
      throw new Undecided();
    }
    Apcomplex value = ApcomplexMath.exp(middle);
    return rounded(value, size(value).multiply(radius).multiply(new Apfloat(2, COARSE)), precision);
  }

  /// The principal logarithm away from the negative axis. Near 1 its last digits are counted from
  /// the decimal point.
  Ball logarithm(long precision) {
    Apfloat nearest = distance();
    Apcomplex value = ApcomplexMath.log(middle);
    Apfloat error = radius.divide(nearest).multiply(new Apfloat(2, COARSE));
    return new Ball(
        value,
        upward(
            error.add(
                size(value).add(new Apfloat(1, COARSE)).multiply(ten(DOUBTFUL - precision)))));
  }

  /// The result of a real function whose derivative is at most `slope` in size over the ball.
  Ball map(Apcomplex value, Apfloat slope, long precision) {
    Apfloat error = radius.multiply(coarse(slope));
    Apfloat absolute = ten(DOUBTFUL - precision);
    return rounded(value, error.add(absolute), precision);
  }

  /// The ball of the real parts.
  Ball real() {
    return new Ball(middle.real(), radius);
  }

  /// The sign of a real number, which the ball decides.
  ///
  /// @throws Undecided when it holds 0
  int sign() {
    if (ApfloatMath.abs(middle.real()).compareTo(radius) <= 0) {
      throw new Undecided();
    }
    return middle.real().signum();
  }
}
