package gnomon.number;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.law.RingLaws;
import gnomon.law.Seeded;
import java.math.BigInteger;
import java.util.Optional;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Ring and field laws, and every operation against plain fractions of big integers.
class RationalTest extends RingLaws<Rational> {

  @Override
  protected Rational random(RandomGenerator random) {
    return RandomNumbers.rational(random);
  }

  @Override
  protected Rational zero() {
    return Rational.ZERO;
  }

  @Override
  protected Rational one() {
    return Rational.ONE;
  }

  private interface Pair {
    void check(Rational a, Rational b);
  }

  private void each(Pair law) {
    Seeded.each(5_000, 500, r -> law.check(random(r), random(r)));
  }

  @Test
  void theRepresentationIsInLowestTermsWithPositiveDenominator() {
    each(
        (a, _) -> {
          assertTrue(a.denominator().signum() > 0);
          assertEquals(BigInteger.ONE, a.numerator().gcd(a.denominator()));
          assertEquals(a, Rational.of(a.numerator(), a.denominator()));
        });
  }

  @Test
  void sumsAndProductsAgreeWithCrossMultiplication() {
    each(
        (a, b) -> {
          BigInteger p = a.numerator().multiply(b.denominator());
          BigInteger q = b.numerator().multiply(a.denominator());
          BigInteger common = a.denominator().multiply(b.denominator());
          assertEquals(Rational.of(p.add(q), common), a.plus(b));
          assertEquals(Rational.of(p.subtract(q), common), a.minus(b));
          BigInteger product = a.numerator().multiply(b.numerator());
          assertEquals(Rational.of(product, common), a.times(b));
          assertEquals(p.compareTo(q), a.compareTo(b));
        });
  }

  @Test
  void divisionUndoesMultiplication() {
    each(
        (a, b) -> {
          if (!b.isZero()) {
            assertEquals(a, a.times(b).dividedBy(b));
            assertTrue(b.times(b.inverse()).isOne());
          }
        });
  }

  @Test
  void negativePowersAreInverses() {
    each(
        (a, _) -> {
          if (!a.isZero()) {
            assertEquals(a.power(3).inverse(), a.power(-3));
          }
        });
  }

  @Test
  void theFloorIsTheLargestIntegerBelow() {
    each(
        (a, _) -> {
          Rational floor = Rational.of(a.floor());
          assertTrue(floor.compareTo(a) <= 0);
          assertTrue(a.compareTo(floor.plus(Rational.ONE)) < 0);
          assertEquals(a, floor.plus(a.fractionalPart()));
        });
  }

  @Test
  void textReadsBackAsTheSameNumber() {
    each((a, _) -> assertEquals(a, Rational.parse(a.toString())));
  }

  @Test
  void decimalsAreReadExactly() {
    assertEquals(Rational.of(1, 10), Rational.parse("0.1"));
    assertEquals(Rational.of(-5, 4), Rational.parse("-1.25"));
    assertEquals(Rational.of(1, 2), Rational.parse(".5"));
  }

  @Test
  void otherTextIsRefused() {
    for (String text : new String[] {"", "x", "1/0", "1.", "--1", "1/2/3", "1e5", " 1"}) {
      assertEquals(Optional.empty(), Rational.tryParse(text), text);
      Refusal refusal = assertThrows(Refusal.class, () -> Rational.parse(text));
      assertEquals(Reason.UNREADABLE_NUMBER, refusal.reason());
    }
  }

  @Test
  void nothingIsDividedByZero() {
    for (Runnable question :
        new Runnable[] {
          () -> Rational.of(1, 0),
          () -> Rational.of(BigInteger.ONE, BigInteger.ZERO),
          () -> Rational.ONE.dividedBy(Rational.ZERO),
          () -> Rational.ZERO.power(-1)
        }) {
      assertEquals(Reason.DIVISION_BY_ZERO, assertThrows(Refusal.class, question::run).reason());
    }
    assertTrue(Rational.ZERO.power(0).isOne());
  }

  @Test
  void numbersThatAreNoIndexAreRefusedWithTheReason() {
    assertEquals(7, Rational.of(7).intValueExact());
    assertEquals(
        Reason.NOT_AN_INTEGER, assertThrows(Refusal.class, Rational.HALF::intValueExact).reason());
    assertEquals(
        Reason.OUT_OF_RANGE,
        assertThrows(Refusal.class, Rational.of(1L << 40)::intValueExact).reason());
  }
}
