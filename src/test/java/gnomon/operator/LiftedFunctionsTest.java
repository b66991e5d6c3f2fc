package gnomon.operator;

import static gnomon.operator.RandomOperators.X;
import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.function.UnaryOperator;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Functions of shift-invariant operators agree with the same functions of their series: the closed
/// form found is on the branch that the series has at t = 0.
class LiftedFunctionsTest {

  private static final int ORDER = 6;
  private static final Dual T = new Dual(X);
  private static final Operator ONE = Operator.identity();

  /// A random symbol that vanishes at t = 0.
  private static Form symbol(RandomGenerator random, int depth) {
    Form t = Form.of(T);
    Form c = Form.of(Rational.of(random.nextInt(1, 4), random.nextInt(1, 3)));
    if (depth == 0) {
      return random.nextBoolean() ? t.times(c) : Elementary.exp(t.times(c)).minus(Form.ONE);
    }
    Form a = symbol(random, depth - 1);
    Form b = symbol(random, depth - 1);
    return switch (random.nextInt(4)) {
      case 0 -> a.plus(b);
      case 1 -> a.times(b);
      case 2 -> a.times(b.plus(Form.ONE));
      default -> a.dividedBy(b.plus(Form.ONE));
    };
  }

  private static PowerSeries series(Operator operator) {
    return Expansion.of(operator.symbol(), T, ORDER);
  }

  private static PowerSeries one() {
    return PowerSeries.constant(Form.ONE, ORDER);
  }

  private static void each(
      long seed, UnaryOperator<Operator> lift, UnaryOperator<PowerSeries> ofSeries) {
    Seeds.each(
        seed,
        40,
        random -> {
          Operator a = Operator.ofSymbol(symbol(random, random.nextInt(3)));
          PowerSeries expected = ofSeries.apply(series(a)).truncated(ORDER);
          assertEquals(expected, series(lift.apply(a)));
        });
  }

  @Test
  void exponentialsAndHyperbolicFunctionsAreThoseOfTheSeries() {
    each(5000, a -> a.lift(Elementary::exp), PowerSeries::exp);
    each(
        5100,
        a -> a.lift(Elementary::sinh),
        s -> s.exp().minus(s.negated().exp()).times(Form.HALF));
  }

  @Test
  void logarithmsAndInverseHyperbolicFunctionsAreThoseOfTheSeries() {
    each(5200, a -> ONE.plus(a).lift(Elementary::ln), s -> s.plus(one()).log());
    each(
        5300,
        a -> a.lift(Elementary::arsinh),
        s -> s.times(s).plus(one()).power(Form.HALF).plus(s).log());
  }

  @Test
  void rootsAreThoseOfTheSeries() {
    Form exponent = Form.of(Rational.of(-3, 2));
    each(5400, a -> ONE.plus(a).lift(Elementary::sqrt), s -> s.plus(one()).power(Form.HALF));
    each(5500, a -> ONE.plus(a).power(exponent), s -> s.plus(one()).power(exponent));
  }

  @Test
  void rootsOfSquaresArePositiveAtZero() {
    Operator two = ONE.plus(ONE);
    each(
        5600,
        a -> a.minus(two).power(2).lift(Elementary::sqrt),
        s -> s.minus(one().times(Form.TWO)).power(2).power(Form.HALF));
  }

  @Test
  void expansionsInAnotherOperatorReproduceTheOperatorOnPolynomials() {
    Seeds.each(
        5700,
        40,
        random -> {
          Operator a = Operator.ofSymbol(symbol(random, random.nextInt(3))).plus(ONE);
          Operator step = Operator.forwardDifference(X, Form.of(random.nextInt(1, 3)));
          Operator q = step.compose(Operator.ofSymbol(symbol(random, 0)).plus(ONE));
          PowerSeries coefficients = OperatorExpansion.of(a, q, X, 5);
          Form f = new RandomOperators(random).polynomial(5);
          Form image = Form.ZERO;
          Form power = f;
          for (int k = 0; k <= 5; k++) {
            image = image.plus(coefficients.coefficient(k).times(power));
            power = q.applyTo(power);
          }
          assertEquals(a.applyTo(f), image);
        });
  }
}
