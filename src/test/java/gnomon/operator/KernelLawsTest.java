package gnomon.operator;

import static gnomon.operator.RandomOperators.FX;
import static gnomon.operator.RandomOperators.X;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Budget;
import gnomon.algebra.Halt;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.time.Duration;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Inverses modulo a kernel, operators in two variables, and the limits of size.
class KernelLawsTest {

  private static final Variable Y = new Variable("y");
  private static final Form FY = Form.of(Y);

  private static Operator deltaOperator(RandomGenerator random) {
    return switch (random.nextInt(4)) {
      case 0 -> Operator.derivative(X);
      case 1 -> Operator.forwardDifference(X, Form.ONE);
      case 2 -> Operator.centralDifference(X, Form.ONE);
      default -> Operator.forwardDifference(X, Form.ONE).compose(Operator.derivative(X));
    };
  }

  @Test
  void anInverseModuloItsKernelIsUndoneByTheOperator() {
    Seeds.each(
        4000,
        80,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator inverse = deltaOperator(random).power(-1 - random.nextInt(2));
          Form f = of.exponentialPolynomial();
          assertEquals(f, inverse.inverse().applyTo(inverse.applyTo(f)));
        });
  }

  @Test
  void anInverseModuloItsKernelComposesOnTheLeftOfAnything() {
    Seeds.each(
        4200,
        80,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator inverse = deltaOperator(random).power(-1 - random.nextInt(2));
          Operator b = of.operator(random.nextInt(2));
          Form f = of.exponentialPolynomial();
          assertEquals(inverse.applyTo(b.applyTo(f)), inverse.compose(b).applyTo(f));
        });
  }

  @Test
  void shiftInvariantOperatorsTakeTheKernelOverWithItsOrderLowered() {
    Seeds.each(
        4400,
        80,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator inverse = deltaOperator(random).power(-1 - random.nextInt(2));
          Operator left = deltaOperator(random).plus(Operator.shift(X, Form.of(of.rational())));
          Form f = of.exponentialPolynomial();
          Operator product = left.compose(inverse);
          Form difference = product.applyTo(f).minus(left.applyTo(inverse.applyTo(f)));
          Operator kernel = Operator.derivative(X).power(product.kernelOrder(X));
          assertEquals(Form.ZERO, kernel.applyTo(difference));
        });
  }

  private static Operator inTwoVariables(RandomGenerator random, int depth) {
    RandomOperators of = new RandomOperators(random);
    if (depth > 0) {
      Operator left = inTwoVariables(random, depth - 1);
      Operator right = inTwoVariables(random, random.nextInt(depth));
      return random.nextInt(3) == 0 ? left.plus(right) : left.compose(right);
    }
    return switch (random.nextInt(11)) {
      case 0 -> Operator.derivative(Y);
      case 1 -> Operator.shift(Y, Form.of(random.nextInt(1, 3)));
      case 2 -> Operator.forwardDifference(Y, Form.ONE);
      case 3 -> Operator.multiplication(FY.times(FX));
      case 4 -> Operator.evaluation(X, FY);
      case 5 -> Operator.shift(X, Form.variable("h"));
      default -> of.simple();
    };
  }

  @Test
  void productsInTwoVariablesActAsOneFactorAfterTheOther() {
    Seeds.each(
        4600,
        120,
        random -> {
          Operator a = inTwoVariables(random, random.nextInt(3));
          Operator b = inTwoVariables(random, random.nextInt(3));
          Form f = new RandomOperators(random).exponentialPolynomial().substitute(X, FX.plus(FY));
          Form g = f.plus(FY.power(3).times(FX));
          assertEquals(a.applyTo(b.applyTo(g)), a.compose(b).applyTo(g));
        });
  }

  @Test
  void hugePowersAnswerAtOnceOrAreTooLarge() {
    int huge = 1_000_000_000;
    Operator d = Operator.derivative(X);
    assertEquals(Operator.shift(X, Form.of(huge)), Operator.shift(X, Form.ONE).power(huge));
    assertEquals(Form.ZERO, d.power(huge).applyTo(FX.power(3)));
    Operator euler = Operator.multiplication(FX).compose(d);
    Budget budget = Budget.of(Duration.ofMinutes(5), 10_000_000);
    Halt halt = assertThrows(Halt.class, () -> budget.run(() -> euler.power(huge)));
    assertEquals(Halt.Cause.SIZE, halt.cause());
    Halt sum =
        assertThrows(
            Halt.class, () -> budget.run(() -> Operator.sum(X).applyTo(FX.power(100_000))));
    assertEquals(Halt.Cause.SIZE, sum.cause());
  }
}
