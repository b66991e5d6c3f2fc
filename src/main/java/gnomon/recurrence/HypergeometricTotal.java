package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/// 1 + r(a) + r(a) r(a+1) + … with a rational function r, summed by halving the range over
/// integers: the parts of a range are the products of numerators and of denominators, and the sum
/// over them.
public final class HypergeometricTotal {
  private final IntegerPolynomial above;
  private final IntegerPolynomial below;

  private HypergeometricTotal(IntegerPolynomial above, IntegerPolynomial below) {
    this.above = above;
    this.below = below;
  }

  /// Σ(i: 0..count−1) ∏(j: 0..i−1) ratio(a + j); nothing where the ratio has coefficients other
  /// than rational numbers, or a zero or pole that is passed.
  public static Optional<Rational> of(Form ratio, Variable v, BigInteger a, long count) {
    Optional<List<IntegerPolynomial>> both =
        IntegerPolynomial.together(
            List.of(Form.of(ratio.numerator()), Form.of(ratio.denominator())), v);
    BigInteger last = a.add(BigInteger.valueOf(count));
    if (both.isEmpty()
        || both.get().getFirst().vanishesBetween(a, last)
        || both.get().getLast().vanishesBetween(a, last)) {
      return Optional.empty();
    }
    HypergeometricTotal total =
        new HypergeometricTotal(both.get().getFirst(), both.get().getLast());
    Part whole = total.part(a, 0, count);
    BigInteger[] exact = whole.sum().divideAndRemainder(whole.below());
    return Optional.of(
        exact[1].signum() == 0 ? Rational.of(exact[0]) : Rational.of(whole.sum(), whole.below()));
  }

  /// ∏ numerators, ∏ denominators, and the sum times the latter, over a range of steps.
  private record Part(BigInteger above, BigInteger below, BigInteger sum) {}

  private Part part(BigInteger a, long from, long to) {
    Budget.checkpoint();
    if (to - from == 1) {
      BigInteger point = a.add(BigInteger.valueOf(from));
      BigInteger down = below.at(point);
      return new Part(above.at(point), down, down);
    }
    long middle = (from + to) >>> 1;
    Part left = part(a, from, middle);
    Part right = part(a, middle, to);
    return new Part(
        left.above().multiply(right.above()),
        left.below().multiply(right.below()),
        left.sum().multiply(right.below()).add(left.above().multiply(right.sum())));
  }
}
