package gnomon.operator;

import static gnomon.operator.RandomOperators.FX;
import static gnomon.operator.RandomOperators.X;
import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import org.junit.jupiter.api.Test;

/// The laws of the algebra of operators and of its action, on seeded random operators.
class OperatorLawsTest {

  private static final Operator ONE = Operator.identity();
  private static final Operator D = Operator.derivative(X);
  private static final Operator DELTA = Operator.forwardDifference(X, Form.ONE);
  private static final Operator SUM = Operator.sum(X);
  private static final Operator INTEGRAL = Operator.integral(X);
  private static final Operator AT_ZERO = Operator.evaluation(X, Form.ZERO);

  @Test
  void aProductActsAsOneFactorAfterTheOther() {
    Seeds.each(
        100,
        150,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(3));
          Operator b = of.operator(random.nextInt(3));
          Form f = of.exponentialPolynomial();
          assertEquals(a.applyTo(b.applyTo(f)), a.compose(b).applyTo(f));
        });
  }

  @Test
  void compositionIsAssociative() {
    Seeds.each(
        400,
        100,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(2));
          Operator b = of.operator(random.nextInt(2));
          Operator c = of.operator(random.nextInt(2));
          assertEquals(a.compose(b).compose(c), a.compose(b.compose(c)));
        });
  }

  @Test
  void compositionDistributesOverSumsOnBothSides() {
    Seeds.each(
        700,
        100,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(2));
          Operator b = of.operator(random.nextInt(2));
          Operator c = of.operator(random.nextInt(2));
          assertEquals(a.compose(b).plus(a.compose(c)), a.compose(b.plus(c)));
          assertEquals(a.compose(c).plus(b.compose(c)), a.plus(b).compose(c));
        });
  }

  @Test
  void operatorsActLinearly() {
    Seeds.each(
        1000,
        100,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(2));
          Operator b = of.operator(random.nextInt(2));
          Form f = of.exponentialPolynomial();
          Form g = of.exponentialPolynomial();
          Form c = Form.of(of.rational());
          assertEquals(a.applyTo(f).plus(c.times(a.applyTo(g))), a.applyTo(f.plus(c.times(g))));
          assertEquals(a.applyTo(f).plus(b.applyTo(f)), a.plus(b).applyTo(f));
        });
  }

  @Test
  void thePincherleDerivativeIsTheCommutatorWithX() {
    Operator x = Operator.multiplication(FX);
    Seeds.each(
        1300,
        100,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(3));
          assertEquals(a.compose(x).minus(x.compose(a)), a.pincherle(X));
        });
  }

  @Test
  void thePincherleDerivativeObeysTheProductRule() {
    Seeds.each(
        1600,
        60,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(2));
          Operator b = of.operator(random.nextInt(2));
          assertEquals(
              a.pincherle(X).compose(b).plus(a.compose(b.pincherle(X))), a.compose(b).pincherle(X));
        });
  }

  @Test
  void commutatorsObeyTheJacobiIdentity() {
    Seeds.each(
        1900,
        30,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.simple();
          Operator b = of.simple();
          Operator c = of.simple();
          Operator sum =
              a.commutator(b.commutator(c))
                  .plus(b.commutator(c.commutator(a)))
                  .plus(c.commutator(a.commutator(b)));
          assertEquals(Operator.zero(), sum);
        });
  }

  @Test
  void powersMultiply() {
    Seeds.each(
        2200,
        40,
        random -> {
          Operator a = new RandomOperators(random).operator(random.nextInt(2));
          int m = random.nextInt(3);
          int n = random.nextInt(3);
          assertEquals(a.power(m).compose(a.power(n)), a.power(m + n));
        });
  }

  @Test
  void sumsAndIntegralsAreRightInversesThatVanishAtZero() {
    assertEquals(ONE, DELTA.compose(SUM));
    assertEquals(ONE.minus(AT_ZERO), SUM.compose(DELTA));
    assertEquals(ONE, D.compose(INTEGRAL));
    assertEquals(ONE.minus(AT_ZERO), INTEGRAL.compose(D));
    assertEquals(Operator.zero(), AT_ZERO.compose(SUM));
    assertEquals(Operator.zero(), AT_ZERO.compose(INTEGRAL));
    assertEquals(AT_ZERO, AT_ZERO.compose(AT_ZERO));
  }

  @Test
  void sumAndIntegralDoNotCommuteAndDifferByABoundary() {
    Operator left = SUM.compose(INTEGRAL);
    Operator right = INTEGRAL.compose(SUM);
    assertEquals(Form.ZERO, left.minus(right).symbol());
    for (int k = 0; k <= 6; k++) {
      Form power = FX.power(k);
      assertEquals(SUM.applyTo(INTEGRAL.applyTo(power)), left.applyTo(power));
      assertEquals(INTEGRAL.applyTo(SUM.applyTo(power)), right.applyTo(power));
    }
    Difference first = Difference.first(left, right, X, 6, Summation.NONE).orElseThrow();
    assertEquals(0, first.exponent());
    assertEquals(FX.times(FX.minus(Form.ONE)).times(Form.HALF), first.left());
    assertEquals(FX.power(2).times(Form.HALF), first.right());
  }

  @Test
  void derivationAndDifferenceHaveTheirProductRules() {
    Form f = Form.of(new Unknown("f", 0, FX));
    Form g = Form.of(new Unknown("g", 0, FX));
    assertEquals(f.times(D.applyTo(g)).plus(D.applyTo(f).times(g)), D.applyTo(f.times(g)));
    Operator shift = Operator.shift(X, Form.ONE);
    assertEquals(
        f.times(DELTA.applyTo(g)).plus(shift.applyTo(g).times(DELTA.applyTo(f))),
        DELTA.applyTo(f.times(g)));
  }

  @Test
  void operatorsInDifferentVariablesCommute() {
    Variable n = new Variable("n");
    Operator inN =
        Operator.multiplication(Form.of(n)).compose(Operator.forwardDifference(n, Form.ONE));
    Operator inX = Operator.multiplication(FX).compose(SUM);
    assertEquals(inN.compose(inX), inX.compose(inN));
    Form f = FX.plus(Form.of(n)).power(3);
    assertEquals(inN.applyTo(inX.applyTo(f)), inX.compose(inN).applyTo(f));
  }

  @Test
  void functionalsAfterOperatorsAreFunctionals() {
    Seeds.each(
        2500,
        80,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(3));
          Functional functional =
              Functional.integral(X, Form.of(of.rational()), Form.of(of.rational()))
                  .plus(Functional.evaluation(X, Form.of(of.rational())));
          Form f = of.exponentialPolynomial();
          assertEquals(functional.applyTo(a.applyTo(f)), functional.compose(a).applyTo(f));
        });
  }

  @Test
  void theTruncatedImageOfAPolynomialIsTheImage() {
    Seeds.each(
        2800,
        60,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(2));
          Form f = of.polynomial(4);
          assertEquals(a.applyTo(f), a.applyTo(f, 4, Summation.NONE));
        });
  }
}
