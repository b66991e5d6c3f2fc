package gnomon.operator;

import static gnomon.operator.RandomOperators.FX;
import static gnomon.operator.RandomOperators.X;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/// Identities of the operators of the trade (common practice) and what is refused.
class AlgebraTest {

  private static final Operator ONE = Operator.identity();
  private static final Operator D = Operator.derivative(X);
  private static final Operator MULTIPLY = Operator.multiplication(FX);
  private static final Operator SHIFT = Operator.shift(X, Form.ONE);
  private static final Operator DELTA = Operator.forwardDifference(X, Form.ONE);
  private static final Operator NABLA = Operator.backwardDifference(X, Form.ONE);
  private static final Operator CENTRAL = Operator.centralDifference(X, Form.ONE);
  private static final Operator MEAN = Operator.centralMean(X, Form.ONE);
  private static final Operator QUARTER =
      ONE.plus(CENTRAL.power(2).times(Form.of(Rational.of(1, 4))));

  private static Reason reasonOf(Runnable attempt) {
    return assertThrows(Refusal.class, attempt::run).reason();
  }

  @Test
  void theIdentitiesOfTheTradeHold() {
    assertEquals(SHIFT, DELTA.commutator(MULTIPLY));
    assertEquals(D, ONE.plus(DELTA).lift(Elementary::ln));
    assertEquals(QUARTER, MEAN.power(2));
    assertEquals(MEAN, QUARTER.lift(Elementary::sqrt));
    assertEquals(D, CENTRAL.times(Form.HALF).lift(Elementary::arsinh).times(Form.TWO));
    assertEquals(CENTRAL, D.times(Form.HALF).lift(Elementary::sinh).times(Form.TWO));
    assertEquals(SHIFT, D.lift(Elementary::exp));
    assertEquals(DELTA.power(5), SHIFT.minus(ONE).power(5));
    assertEquals(DELTA.compose(NABLA), CENTRAL.power(2));
    assertEquals(NABLA, DELTA.dividedBy(SHIFT));
    assertEquals(ONE.minus(NABLA), SHIFT.inverse());
  }

  @Test
  void theSameWithOneSignOrFactorWrongFail() {
    assertNotEquals(SHIFT.negated(), DELTA.commutator(MULTIPLY));
    assertNotEquals(D, ONE.minus(DELTA).lift(Elementary::ln));
    assertNotEquals(ONE.minus(CENTRAL.power(2).times(Form.HALF)), MEAN.power(2));
    assertNotEquals(D, CENTRAL.times(Form.HALF).lift(Elementary::arsinh));
    assertNotEquals(DELTA.power(5), SHIFT.plus(ONE).power(5));
  }

  @Test
  void highPowersOfADifferenceAreThoseOfShiftLessOne() {
    assertEquals(DELTA.power(200), SHIFT.minus(ONE).power(200));
    assertEquals(Form.ZERO, DELTA.power(200).applyTo(FX.power(199)));
  }

  @Test
  void powersOfXTimesDHaveStirlingNumbersAsCoefficients() {
    Form t = Form.of(new Dual(X));
    Form expected =
        FX.power(4)
            .times(t.power(4))
            .plus(FX.power(3).times(t.power(3)).times(Form.of(6)))
            .plus(FX.power(2).times(t.power(2)).times(Form.of(7)))
            .plus(FX.times(t));
    assertEquals(expected, MULTIPLY.compose(D).power(4).symbol());
    Operator high = MULTIPLY.compose(D).power(60);
    assertEquals(FX.power(3).times(Form.of(3).power(60)), high.applyTo(FX.power(3)));
  }

  @Test
  void symbolicShiftsAddTheirLengths() {
    Form n = Form.variable("n");
    Form h = Form.variable("h");
    assertEquals(Operator.shift(X, n.plus(h)), SHIFT.power(n).compose(SHIFT.power(h)));
    assertEquals(Operator.shift(X, Form.HALF), SHIFT.power(Form.HALF));
    assertEquals(Operator.shift(X, n), ONE.plus(DELTA).power(n));
    assertEquals(Reason.SHIFT_BY_VARIABLE, reasonOf(() -> SHIFT.power(FX)));
  }

  @Test
  void inversesRecordTheirKernel() {
    assertEquals(1, DELTA.inverse().kernelOrder(X));
    assertEquals(2, D.power(-2).kernelOrder(X));
    assertEquals(0, SHIFT.inverse().kernelOrder(X));
    assertEquals(DELTA, DELTA.inverse().inverse());
    assertEquals(ONE, DELTA.compose(DELTA.inverse()));
    Operator left = DELTA.inverse().compose(DELTA);
    assertNotEquals(ONE, left);
    assertEquals(ONE.symbol(), left.symbol());
    assertEquals(1, left.kernelOrder(X));
    assertEquals(DELTA.inverse(), DELTA.compose(DELTA.power(-2)));
  }

  @Test
  void quotientsOfEqualValuationAreProper() {
    Operator quotient = D.dividedBy(DELTA);
    assertTrue(quotient.isPlain());
    assertEquals(D, quotient.compose(DELTA));
    assertEquals(1, D.dividedBy(DELTA.power(2)).kernelOrder(X));
    assertEquals(Reason.NOT_COMMUTING, reasonOf(() -> MULTIPLY.dividedBy(D)));
    assertEquals(Reason.NOT_COMMUTING, reasonOf(() -> D.dividedBy(MULTIPLY)));
  }

  @Test
  void productsOfFunctionAndShiftInvariantOperatorAreInverted() {
    Operator a = MULTIPLY.compose(SHIFT);
    assertEquals(ONE, a.compose(a.inverse()));
    assertEquals(ONE, a.inverse().compose(a));
    Operator b = Operator.multiplication(Elementary.exp(FX)).compose(DELTA);
    assertEquals(ONE, b.compose(b.inverse()));
    assertEquals(1, b.inverse().kernelOrder(X));
    Operator c = DELTA.compose(Operator.multiplication(Elementary.exp(FX)));
    assertEquals(Reason.SYMBOL_POLE, reasonOf(c::inverse));
  }

  @Test
  void operatorsWithoutInverseAreRefused() {
    assertEquals(Reason.NO_INVERSE, reasonOf(() -> Operator.sum(X).inverse()));
    assertEquals(Reason.NO_INVERSE, reasonOf(() -> Operator.integral(X).inverse()));
    assertEquals(Reason.NO_INVERSE, reasonOf(() -> Operator.evaluation(X, Form.ONE).inverse()));
    assertEquals(Reason.NO_INVERSE, reasonOf(() -> ONE.plus(MULTIPLY.compose(D)).inverse()));
    assertEquals(Reason.DIVISION_BY_ZERO, reasonOf(() -> Operator.zero().inverse()));
  }

  @Test
  void functionsWithoutAPowerSeriesAreNotLifted() {
    assertEquals(Reason.NO_SERIES, reasonOf(() -> D.lift(Elementary::ln)));
    assertEquals(Reason.NO_SERIES, reasonOf(() -> D.lift(Elementary::sqrt)));
    assertEquals(
        Reason.NOT_SHIFT_INVARIANT, reasonOf(() -> MULTIPLY.compose(D).lift(Elementary::exp)));
    assertEquals(Reason.NOT_SHIFT_INVARIANT, reasonOf(() -> Operator.sum(X).lift(Elementary::exp)));
  }

  @Test
  void undeterminedConstantsDoNotPassThroughMultiplication() {
    assertEquals(Reason.KERNEL_LOST, reasonOf(() -> MULTIPLY.compose(DELTA.inverse())));
    assertEquals(Reason.KERNEL_LOST, reasonOf(() -> Operator.sum(X).compose(DELTA.inverse())));
    assertEquals(
        Reason.KERNEL_LOST,
        reasonOf(() -> Functional.evaluation(X, Form.ONE).compose(DELTA.inverse())));
    Functional integral = Functional.integral(X, Form.ZERO, Form.ONE);
    Functional slope = integral.compose(D);
    assertEquals(integral, slope.compose(D.inverse()));
  }

  @Test
  void infiniteProductsAreRefused() {
    Operator reciprocal = Operator.multiplication(FX.plus(Form.ONE).inverse());
    assertEquals(Reason.INFINITE_COMPOSITION, reasonOf(() -> Operator.sum(X).compose(reciprocal)));
    assertEquals(
        Reason.INFINITE_COMPOSITION, reasonOf(() -> D.dividedBy(DELTA).compose(reciprocal)));
    Operator turning = Operator.multiplication(Elementary.exp(FX));
    Operator resolvent = D.minus(ONE).inverse();
    assertEquals(Reason.SYMBOL_POLE, reasonOf(() -> resolvent.compose(turning)));
  }

  @Test
  void boundariesInTwoVariablesAtOnceAreRefused() {
    Variable y = new Variable("y");
    Operator both = Operator.sum(X).compose(Operator.integral(y));
    Operator slopes = DELTA.compose(Operator.derivative(y));
    assertEquals(Reason.MIXED_BOUNDARIES, reasonOf(() -> both.compose(slopes)));
    assertEquals(ONE, slopes.compose(both));
  }

  @Test
  void theFirstPowerOnWhichOperatorsDifferIsAWitness() {
    Optional<Difference> found = Difference.first(SHIFT, ONE.plus(D), X, 10, Summation.NONE);
    Difference witness = found.orElseThrow();
    assertEquals(2, witness.exponent());
    assertEquals(FX.plus(Form.ONE).power(2), witness.left());
    assertEquals(FX.power(2).plus(FX.times(Form.TWO)), witness.right());
    assertFalse(Difference.first(D, D, X, 10, Summation.NONE).isPresent());
  }

  @Test
  void anInverseSeriesWithoutClosedFormIsAnOperator() {
    Dual t = new Dual(X);
    Form f = Form.of(t).times(Elementary.exp(Form.of(t))).plus(Form.of(t).power(2));
    Operator inverse = Operator.ofSymbol(InverseSeries.of(f, t, f));
    for (int k = 0; k <= 5; k++) {
      assertEquals(D.applyTo(FX.power(k)), inverse.applyTo(FX.power(k)));
    }
  }

  @Test
  void theSortsOfOperatorsAreTold() {
    assertTrue(DELTA.isShiftInvariant());
    assertTrue(D.times(Form.variable("a")).isShiftInvariant());
    assertFalse(MULTIPLY.compose(D).isShiftInvariant());
    assertFalse(Operator.sum(X).isShiftInvariant());
    assertFalse(MULTIPLY.isShiftInvariant());
    assertTrue(MULTIPLY.isMultiplication());
    assertFalse(MULTIPLY.isScalar(X));
    assertTrue(Operator.multiplication(Form.variable("a")).isScalar(X));
  }
}
