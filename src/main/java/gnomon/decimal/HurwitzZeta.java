package gnomon.decimal;

import gnomon.algebra.Budget;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/// The sum of 1/(a+k)^s over all k at least 0, for an integer s at least 2 and a real a that is no
/// pole, by the Euler-Maclaurin formula: the first n terms as they are, and with b = a + n
///
///     b^(1-s)/(s-1) + b^(-s)/2 + sum over j of B_2j/(2j)! s(s+1)...(s+2j-2) b^(1-s-2j).
///
/// For b above 0 the error of the sum over j is less than its first neglected term.
final class HurwitzZeta {

  private HurwitzZeta() {}

  static Ball of(int s, Ball a, long precision) {
    Apfloat below = a.middle().real().floor();
    long start = Math.min(0, below.longValue());
    long count = precision - start + s;
    Budget.charge(count);
    Ball sum = Ball.of(BigInteger.ZERO, precision);
    for (long k = 0; k < count; k++) {
      Budget.checkpoint();
      sum = sum.plus(shifted(a, k, precision).power(-s, precision), precision);
    }
    Ball b = shifted(a, count, precision);
    Ball power = b.power(1L - s, precision);
    sum = sum.plus(power.times(Ball.of(Rational.of(1, s - 1L), precision), precision), precision);
    power = power.dividedBy(b, precision);
    sum = sum.plus(power.times(Ball.of(Rational.HALF, precision), precision), precision);
    return sum.plus(corrections(s, b, power, precision), precision);
  }

  private static Ball shifted(Ball a, long k, long precision) {
    return a.plus(Ball.of(BigInteger.valueOf(k), precision), precision);
  }

  /// The sum over j, from `power` = b^(-s); the last term is kept as the error instead.
  private static Ball corrections(int s, Ball b, Ball power, long precision) {
    int terms = (int) precision / 2 + 2;
    List<Rational> bernoulli = Integers.bernoulliNumbers(2 * terms);
    Ball sum = Ball.of(BigInteger.ZERO, precision);
    Ball weight =
        power.times(Ball.of(Rational.of(s), precision), precision).dividedBy(b, precision);
    for (int j = 1; ; j++) {
      Budget.checkpoint();
      Rational coefficient = bernoulli.get(2 * j).dividedBy(Rational.of(Integers.factorial(2 * j)));
      Ball term = weight.times(Ball.of(coefficient, precision), precision);
      if (j == terms) {
        Apfloat size = ApfloatMath.abs(term.middle().real()).add(term.radius());
        return new Ball(sum.middle(), sum.radius().add(size));
      }
      sum = sum.plus(term, precision);
      Rational next = Rational.of(s + 2L * j - 1).times(Rational.of(s + 2L * j));
      weight =
          weight
              .times(Ball.of(next, precision), precision)
              .dividedBy(b, precision)
              .dividedBy(b, precision);
    }
  }
}
