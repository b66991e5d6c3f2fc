package gnomon.decimal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;

/// Digits against published expansions. The OEIS entries named were written down from memory.
class DigitsTest {

  private static final Form SQRT_TWO = Elementary.sqrt(Form.TWO);

  private static void check(String published, Form constant) {
    BigDecimal all = new BigDecimal(published);
    for (int count : new int[] {1, 2, 7, 19, 30, 47}) {
      BigDecimal expected = all.round(new MathContext(count, RoundingMode.HALF_EVEN));
      Digits digits = Digits.of(constant, count);
      assertEquals(0, expected.compareTo(digits.real()), constant + " to " + count);
      assertTrue(digits.isReal());
    }
  }

  @Test
  void digitsOfPiAgreeWithA000796() {
    check("3.14159265358979323846264338327950288419716939937510582097494459", Form.PI);
  }

  @Test
  void digitsOfEAgreeWithA001113() {
    check("2.71828182845904523536028747135266249775724709369995957496696763", Form.E);
  }

  @Test
  void digitsOfTheLogarithmOfTwoAgreeWithA002162() {
    check(
        "0.693147180559945309417232121458176568075500134360255254120680009",
        Elementary.ln(Form.TWO));
  }

  @Test
  void digitsOfTheRootOfTwoAgreeWithA002193() {
    check("1.41421356237309504880168872420969807856967187537694807317667974", SQRT_TWO);
  }

  @Test
  void digitsOfTheSineOfOneAgreeWithA049469() {
    check("0.84147098480789650665250232163029899962256306079837", Elementary.sin(Form.ONE));
  }

  @Test
  void digitsOfEToThePiAgreeWithA039661() {
    check("23.1406926327792690057290863679485473802661062426002", Elementary.exp(Form.PI));
  }

  @Test
  void digitsOfThePowerOfIByIAgreeWithA049006() {
    check("0.20787957635076190854695561983497877003387784163177", Elementary.power(Form.I, Form.I));
  }

  @Test
  void digitsOfAGammaValueAgreeWithA073005() {
    check(
        "2.67893853470774763365569294097467764412868937795730",
        Combinatorial.factorial(Form.of(Rational.of(-2, 3))));
  }

  @Test
  void harmonicNumbersAtOneHalfHaveTheirClosedForms() {
    Form first = Form.TWO.minus(Elementary.ln(Form.TWO).times(Form.TWO));
    Form second = Form.of(4).minus(Form.PI.times(Form.PI).times(Rational.of(1, 3)));
    assertEquals(Digits.of(first, 40), Digits.of(Combinatorial.harmonic(Form.HALF, 1), 40));
    assertEquals(Digits.of(second, 40), Digits.of(Combinatorial.harmonic(Form.HALF, 2), 40));
  }

  @Test
  void nearIntegersShowTheirDifference() {
    Form near = Elementary.exp(Form.PI.times(Elementary.sqrt(Form.of(163))));
    Form difference = near.minus(Form.of(new BigInteger("262537412640768744")));
    assertEquals(new BigDecimal("-7.4992740280181431112E-13"), Digits.of(difference, 20).real());
  }

  @Test
  void rationalPartsAreRoundedExactly() {
    Form eighth = Form.of(Rational.of(1, 8));
    assertEquals(new BigDecimal("0.12"), Digits.of(eighth, 2).real());
    assertEquals(new BigDecimal("0.38"), Digits.of(eighth.times(Form.of(3)), 2).real());
    Digits mixed = Digits.of(eighth.plus(Form.I.times(Form.PI)), 2);
    assertEquals(new BigDecimal("0.12"), mixed.real());
    assertEquals(new BigDecimal("3.1"), mixed.imaginary());
  }

  @Test
  void aRootOfANegativeConstantIsPurelyImaginary() {
    Digits digits = Digits.of(Elementary.sqrt(Form.ONE.minus(SQRT_TWO)), 20);
    assertEquals(0, digits.real().signum());
    assertEquals(new BigDecimal("0.64359425290558262474"), digits.imaginary());
  }

  @Test
  void fewDigitsAreTheRoundingOfMany() {
    long seed = 20_250_101L;
    RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(seed);
    List<Form> kernels =
        List.of(Form.PI, Form.E, SQRT_TWO, Elementary.ln(Form.of(3)), Elementary.cos(Form.TWO));
    for (int round = 0; round < 30; round++) {
      Form a = kernels.get(random.nextInt(kernels.size()));
      Form b = kernels.get(random.nextInt(kernels.size()));
      Form mixed = a.times(b).minus(Form.of(Rational.of(random.nextInt(90), 7))).dividedBy(b);
      int count = 1 + random.nextInt(25);
      BigDecimal many = Digits.of(mixed, count + 30).real();
      BigDecimal few = Digits.of(mixed, count).real();
      BigDecimal rounded = many.round(new MathContext(count, RoundingMode.HALF_EVEN));
      assertEquals(0, rounded.compareTo(few), "seed " + seed + ": " + mixed);
    }
  }

  @Test
  void aZeroThatTheFormsDoNotRecogniseIsRefused() {
    Form root = Elementary.sqrt(Form.of(3).plus(SQRT_TWO.times(Form.TWO)));
    Form hidden = root.minus(Form.ONE).minus(SQRT_TWO);
    if (hidden.isZero()) {
      assertEquals(0, Digits.of(hidden, 5).real().signum());
    } else {
      Refusal refusal = assertThrows(Refusal.class, () -> Digits.of(hidden, 5));
      assertEquals(Reason.DIGITS_UNDECIDED, refusal.reason());
      assertFalse(Digits.proveNonzero(hidden));
    }
  }

  @Test
  void variablesHaveNoDigits() {
    Refusal refusal =
        assertThrows(Refusal.class, () -> Digits.of(Form.variable("x").plus(Form.PI), 5));
    assertEquals(Reason.NOT_CONSTANT, refusal.reason());
  }

  @Test
  void logarithmsOfNegativeConstantsAreRefused() {
    Form negative = Form.PI.minus(Form.of(4));
    Refusal refusal = assertThrows(Refusal.class, () -> Digits.of(Elementary.ln(negative), 5));
    assertEquals(Reason.LOGARITHM_DOMAIN, refusal.reason());
  }

  @Test
  void theCountOfDigitsIsLimited() {
    for (int count : new int[] {0, -1, Digits.MOST + 1}) {
      Refusal refusal = assertThrows(Refusal.class, () -> Digits.of(Form.PI, count));
      assertEquals(Reason.OUT_OF_RANGE, refusal.reason());
    }
  }

  @Test
  void digitsProveThatConstantsDiffer() {
    assertTrue(Digits.proveNonzero(Form.PI.minus(Form.of(Rational.of(355, 113)))));
    assertFalse(Digits.proveNonzero(Form.ZERO));
  }
}
