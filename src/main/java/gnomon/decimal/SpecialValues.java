package gnomon.decimal;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/// Factorials and harmonic numbers of real arguments away from their poles.
final class SpecialValues {

  private SpecialValues() {}

  /// x! = Γ(x+1). Its slope is Γ(x+1) ψ(x+1).
  static Ball factorial(Ball x, long precision) {
    charge(precision);
    Ball shifted = x.plus(Ball.of(BigInteger.ONE, precision), precision);
    Apfloat point = shifted.middle().real();
    Apfloat value = ApfloatMath.gamma(point);
    Apfloat slope = value.multiply(steepness(shifted));
    return shifted.map(value, ApfloatMath.abs(slope), precision);
  }

  /// H(x, 1) = ψ(x+1) + γ, and H(x, r) = ζ(r, 1) - ζ(r, x+1) for larger r.
  static Ball harmonic(Ball x, int order, long precision) {
    Ball one = Ball.of(BigInteger.ONE, precision);
    Ball shifted = x.plus(one, precision);
    if (order > 1) {
      return HurwitzZeta.of(order, one, precision)
          .plus(HurwitzZeta.of(order, shifted, precision).negated(), precision);
    }
    charge(precision);
    Apfloat point = shifted.middle().real();
    Apfloat value = ApfloatMath.digamma(point).add(ApfloatMath.euler(precision));
    Apfloat steep = steepness(shifted);
    return shifted.map(value, steep.multiply(steep), precision);
  }

  /// The library computes these in about quadratic time, without looking at a cancellation.
  private static void charge(long precision) {
    Budget.charge(10 * precision * precision);
  }

  /// More than the size of the digamma function and of 1/(distance to the nearest pole), the poles
  /// being 0, -1, -2, ...
  ///
  /// @throws Undecided when the ball may hold a pole
  private static Apfloat steepness(Ball shifted) {
    Apfloat point = shifted.middle().real();
    Apfloat above = point.subtract(point.floor());
    Apfloat below = point.ceil().subtract(point);
    Apfloat nearest = above.compareTo(below) < 0 ? above : below;
    Apfloat room = point.signum() > 0 ? point : nearest;
    if (room.compareTo(shifted.radius().multiply(new Apfloat(4, 12))) <= 0) {
      throw new Undecided();
    }
    Apfloat one = new Apfloat(1, 12);
    return one.divide(room.precision(12))
        .add(ApfloatMath.abs(point).precision(12))
        .add(new Apfloat(4, 12));
  }
}
