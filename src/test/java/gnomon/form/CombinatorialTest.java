package gnomon.form;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import org.junit.jupiter.api.Test;

class CombinatorialTest {
  private static final Variable N = new Variable("n");
  private static final Variable K = new Variable("k");
  private static final Form n = Form.of(N);
  private static final Form k = Form.of(K);

  /// binom(n, k) = n(n−1)…(n−k+1)/k! for natural k, by the definition.
  private static Rational binomial(int top, int lower) {
    Rational product = Rational.ONE;
    for (int i = 0; i < lower; i++) {
      product = product.times(Rational.of(top - i, i + 1));
    }
    return lower < 0 ? Rational.ZERO : product;
  }

  @Test
  void integersInsideFractionalArgumentsAreTakenOut() {
    Form h = Form.variable("h");
    Form ratio = n.dividedBy(h);
    for (int m = -3; m <= 3; m++) {
      Form shifted = n.plus(h.times(Form.of(m))).dividedBy(h);
      Form factor = Combinatorial.rising(ratio.plus(Form.ONE), Form.of(Math.max(m, 0)));
      Form divisor = Combinatorial.falling(ratio, Form.of(Math.max(-m, 0)));
      Form expected = Combinatorial.factorial(ratio).times(factor).dividedBy(divisor);
      assertEquals(expected, Combinatorial.factorial(shifted), "m = " + m);
    }
    Form next = Combinatorial.harmonic(ratio.plus(Form.ONE));
    assertEquals(h.dividedBy(n.plus(h)), next.minus(Combinatorial.harmonic(ratio)));
  }

  @Test
  void binomialsHaveTheirValuesAlsoForNegativeTopAndBelowTheDiagonal() {
    Form symbol = Combinatorial.binomial(n, k);
    for (int top = -6; top <= 6; top++) {
      for (int lower = -3; lower <= 9; lower++) {
        Form expected = Form.of(binomial(top, lower));
        Form direct = Combinatorial.binomial(Form.of(top), Form.of(lower));
        assertEquals(expected, direct, top + " over " + lower);
        Form lowerFirst = symbol.substitute(K, Form.of(lower)).substitute(N, Form.of(top));
        assertEquals(expected, lowerFirst, top + " over " + lower);
        if (top >= 0) {
          Form topFirst = symbol.substitute(N, Form.of(top)).substitute(K, Form.of(lower));
          assertEquals(expected, topFirst, top + " over " + lower);
        }
      }
    }
  }

  @Test
  void pascalsRuleIsAnEquality() {
    Form left = Combinatorial.binomial(n, k);
    Form above = Combinatorial.binomial(n.minus(Form.ONE), k);
    Form beside = Combinatorial.binomial(n.minus(Form.ONE), k.minus(Form.ONE));
    assertEquals(left, above.plus(beside));
  }

  @Test
  void fallingPowersWithNegativeExponentsAreReciprocals() {
    Form x = Form.variable("x");
    Form power = Combinatorial.falling(x, n);
    Form expected = x.plus(Form.ONE).times(x.plus(Form.TWO)).inverse();
    assertEquals(expected, power.substitute(N, Form.of(-2)));
    assertEquals(expected, Combinatorial.falling(x, Form.of(-2)));
    Form cube = Combinatorial.falling(x, Form.of(3));
    assertEquals(Form.of(-24), cube.substitute(new Variable("x"), Form.of(-2)));
    assertEquals(Form.of(-24), Combinatorial.falling(Form.of(-2), n).substitute(N, Form.of(3)));
  }

  @Test
  void risingPowersAgreeWithFactorialsAndFallingPowers() {
    Form x = Form.variable("x");
    Form rising = Combinatorial.rising(x, n);
    assertEquals(rising, Combinatorial.falling(x.plus(n).minus(Form.ONE), n));
    assertEquals(Combinatorial.factorial(n), Combinatorial.rising(Form.ONE, n));
    assertEquals(Form.of(120), Combinatorial.rising(Form.of(2), Form.of(4)));
  }

  @Test
  void halfIntegersAreWrittenByTheDuplicationFormula() {
    Form root = Elementary.sqrt(Form.PI);
    assertEquals(root.times(Rational.HALF), Combinatorial.factorial(Form.HALF));
    assertEquals(root, Combinatorial.factorial(Form.HALF.negated()));
    Form double2 = Combinatorial.factorial(n.times(Form.TWO));
    Form parts =
        Combinatorial.factorial(n)
            .times(Combinatorial.factorial(n.minus(Form.HALF)))
            .times(Elementary.power(Form.of(4), n))
            .dividedBy(root);
    assertEquals(double2, parts);
    Form harmonic = Combinatorial.harmonic(Form.HALF);
    assertEquals(Form.TWO.minus(Form.TWO.times(Elementary.ln(Form.TWO))), harmonic);
  }

  @Test
  void harmonicNumbersStepByReciprocals() {
    Form step = Combinatorial.harmonic(n, 2).minus(Combinatorial.harmonic(n.minus(Form.ONE), 2));
    assertEquals(n.power(-2), step);
    assertEquals(Form.of(Rational.of(7381, 2520)), Combinatorial.harmonic(Form.of(10)));
  }

  @Test
  void polesOfFactorialsAndHarmonicNumbersAreRefusedUnlessTheyCancel() {
    Form factorial = Combinatorial.factorial(n);
    Refusal pole = assertThrows(Refusal.class, () -> factorial.substitute(N, Form.of(-3)));
    assertEquals(Reason.POLE, pole.reason());
    assertEquals(Form.ZERO, factorial.inverse().substitute(N, Form.of(-3)));
    Form two = Combinatorial.factorial(n.times(Form.TWO)).dividedBy(factorial);
    // (2n)!/n! near n = −1: (−2+2ε)!/(−1+ε)! tends to −1/2.
    assertEquals(Form.HALF.negated(), two.substitute(N, Form.of(-1)));
    Form harmonic = Combinatorial.harmonic(n).plus(n.plus(Form.ONE).inverse());
    assertEquals(Form.ZERO, harmonic.substitute(N, Form.of(-1)));
    Refusal h =
        assertThrows(Refusal.class, () -> Combinatorial.harmonic(n).substitute(N, Form.of(-2)));
    assertEquals(Reason.POLE, h.reason());
  }
}
