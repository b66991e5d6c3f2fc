package gnomon.form;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.List;
import org.junit.jupiter.api.Test;

class PowersTest {
  private static final Variable X = new Variable("x");
  private static final Form x = Form.of(X);

  private static Form gaussian(int re, int im) {
    return Form.of(re).plus(Form.I.times(Form.of(im)));
  }

  private static Form fraction(long p, long q) {
    return Form.of(Rational.of(p, q));
  }

  @Test
  void symbolicPowersOfGaussianNumbersHaveTheRightValueAtEveryInteger() {
    for (int re = -8; re <= 8; re++) {
      for (int im = -8; im <= 8; im++) {
        Form base = gaussian(re, im);
        if (base.isZero()) {
          continue;
        }
        Form power = Elementary.power(base, x);
        for (int n = -4; n <= 4; n++) {
          assertEquals(base.power(n), power.substitute(X, Form.of(n)), base + " to " + n);
        }
      }
    }
  }

  @Test
  void squareRootsOfGaussianSquaresArePrincipal() {
    for (int re = -6; re <= 6; re++) {
      for (int im = -6; im <= 6; im++) {
        Form root = gaussian(re, im);
        boolean principal = re > 0 || re == 0 && im >= 0;
        Form square = root.power(2);
        assertEquals(principal ? root : root.negated(), Elementary.sqrt(square), root.toString());
      }
    }
  }

  @Test
  void aProductOfConjugatePowersIsThePowerOfTheNorm() {
    Form up = Elementary.power(gaussian(2, 1), x);
    Form down = Elementary.power(gaussian(2, -1), x);
    assertEquals(Elementary.power(Form.of(5), x), up.times(down));
  }

  @Test
  void radicalsMultiplyAndInvert() {
    Form two = Elementary.sqrt(Form.TWO);
    Form three = Elementary.sqrt(Form.of(3));
    assertEquals(Elementary.sqrt(Form.of(6)), two.times(three));
    assertEquals(two.minus(Form.ONE), Form.ONE.plus(two).inverse());
    Form mixed = Form.ONE.plus(two).plus(three).plus(Form.I);
    assertEquals(Form.ONE, mixed.times(mixed.inverse()));
    Form cube = Elementary.power(Form.TWO, fraction(1, 3));
    assertEquals(Form.ONE, Form.ONE.plus(cube).times(Form.ONE.plus(cube).inverse()));
    assertEquals(Form.of(-8), gaussian(1, 1).power(6).times(Form.I.negated()));
  }

  @Test
  void rootsOfFunctionsAreNotSplitBecauseTheSignWouldBeLost() {
    Form together = Elementary.sqrt(x.times(x.plus(Form.ONE)));
    Form apart = Elementary.sqrt(x).times(Elementary.sqrt(x.plus(Form.ONE)));
    assertNotEquals(together, apart);
    Form at = Form.of(-2);
    assertEquals(Elementary.sqrt(Form.TWO), together.substitute(X, at));
    assertEquals(Elementary.sqrt(Form.TWO).negated(), apart.substitute(X, at));
    assertEquals(x.times(x.plus(Form.ONE)), together.power(2));
  }

  @Test
  void powersOfMinusOneAreSquaresOfOneOnlyForIntegers() {
    Form sign = Elementary.power(Form.MINUS_ONE, x);
    assertNotEquals(Form.ONE, sign.times(sign));
    assertEquals(Form.ONE, sign.times(sign).takingIntegers(List.of(X)));
    assertEquals(Form.I, sign.substitute(X, Form.HALF));
    assertEquals(Form.MINUS_ONE, sign.times(sign).substitute(X, Form.HALF));
  }

  @Test
  void anglesOfRationalPointsAddUp() {
    // Euler 1764 and Machin 1706, from memory.
    Form euler = Elementary.arctan(fraction(1, 2)).plus(Elementary.arctan(fraction(1, 3)));
    assertEquals(Form.PI.times(Rational.of(1, 4)), euler);
    Form machin =
        Elementary.arctan(fraction(1, 5))
            .times(Form.of(4))
            .minus(Elementary.arctan(fraction(1, 239)));
    assertEquals(Form.PI.times(Rational.of(1, 4)), machin);
  }

  @Test
  void exponentialsAndLogarithmsUndoEachOther() {
    Form n = Form.variable("n");
    assertEquals(Elementary.power(x, n), Elementary.exp(n.times(Elementary.ln(x))));
    assertEquals(Form.ONE, Elementary.exp(x).times(Elementary.exp(x.negated())));
    Form power = Elementary.power(x, n).derivative(X);
    assertEquals(n.times(Elementary.power(x, n.minus(Form.ONE))), power);
  }

  @Test
  void whatHasNoExactValueIsRefused() {
    Form fifth = Form.PI.times(Rational.of(1, 5));
    Refusal root = assertThrows(Refusal.class, () -> Elementary.cos(fifth));
    assertEquals(Reason.ROOT_OUT_OF_FIELD, root.reason());
    Refusal log = assertThrows(Refusal.class, () -> Elementary.ln(Form.of(-2)));
    assertEquals(Reason.LOGARITHM_DOMAIN, log.reason());
    Refusal zero = assertThrows(Refusal.class, () -> Form.ZERO.power(-1));
    assertEquals(Reason.DIVISION_BY_ZERO, zero.reason());
  }

  @Test
  void powersOfZeroAreOneAtZeroOnly() {
    Form zero = Elementary.power(Form.ZERO, x);
    assertEquals(Form.ONE, zero.substitute(X, Form.ZERO));
    assertEquals(Form.ZERO, zero.substitute(X, Form.of(3)));
    assertEquals(zero, zero.times(zero));
    assertEquals(zero.times(Form.TWO), zero.times(x.plus(Form.TWO)));
    Form mixed = x.inverse().plus(zero.times(x.plus(Form.of(5))));
    assertEquals(mixed, mixed.plus(zero).minus(zero));
  }

  @Test
  void powersOfLogarithmsAreOneNumberHoweverTheyAreWritten() {
    Form two = Elementary.ln(Form.TWO);
    Form three = Elementary.ln(Form.of(3));
    assertEquals(Elementary.exp(two.times(two)), Elementary.power(Form.TWO, two));
    assertEquals(Elementary.power(Form.of(3), two), Elementary.power(Form.TWO, three));
    Form mixed = Elementary.power(x, Elementary.ln(x.plus(Form.ONE)));
    assertEquals(mixed, Elementary.power(x.plus(Form.ONE), Elementary.ln(x)));
    assertEquals(x.power(2), Elementary.exp(Elementary.ln(x).times(Form.TWO)));
  }
}
