package gnomon.polynomial;

import static gnomon.polynomial.RandomPolynomials.X;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.law.RingLaws;
import gnomon.law.Seeded;
import gnomon.number.Integers;
import gnomon.number.RandomNumbers;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Ring laws, and every fast way against the plain one.
class DensePolynomialTest extends RingLaws<DensePolynomial> {

  @Override
  protected DensePolynomial random(RandomGenerator random) {
    return RandomPolynomials.dense(random, 25);
  }

  @Override
  protected DensePolynomial zero() {
    return DensePolynomial.ZERO;
  }

  @Override
  protected DensePolynomial one() {
    return DensePolynomial.ONE;
  }

  private static DensePolynomial large(RandomGenerator random, int degree, int bits) {
    return DensePolynomial.ofIntegers(RandomPolynomials.integers(random, degree + 1, bits));
  }

  /// The product sum by sum.
  private static BigInteger[] plainProduct(BigInteger[] a, BigInteger[] b) {
    BigInteger[] product = new BigInteger[a.length + b.length - 1];
    java.util.Arrays.fill(product, BigInteger.ZERO);
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j < b.length; j++) {
        product[i + j] = product[i + j].add(a[i].multiply(b[j]));
      }
    }
    return product;
  }

  @Test
  void longProductsAgreeWithTheSumOfAllProducts() {
    Seeded.each(
        60_000,
        60,
        r -> {
          BigInteger[] a = RandomPolynomials.integers(r, 1 + r.nextInt(60), 1 + r.nextInt(200));
          BigInteger[] b = RandomPolynomials.integers(r, 1 + r.nextInt(60), 1 + r.nextInt(90));
          assertArrayEquals(plainProduct(a, b), Kronecker.times(a, b));
          assertArrayEquals(plainProduct(a, a), Kronecker.times(a, a));
          assertArrayEquals(plainProduct(a, plainProduct(a, a)), Kronecker.power(a, 3));
        });
  }

  @Test
  void quotientTimesDivisorPlusRemainderIsTheDividend() {
    Seeded.each(
        61_000,
        60,
        r -> {
          DensePolynomial a = random(r).times(large(r, r.nextInt(150), 40));
          DensePolynomial b = random(r);
          DensePolynomial monic =
              large(r, r.nextInt(100), 40).plus(DensePolynomial.UNKNOWN.power(101));
          for (DensePolynomial divisor : List.of(b, monic)) {
            if (!divisor.isZero()) {
              DensePolynomial.Division parts = a.divideAndRemainder(divisor);
              assertEquals(a, parts.quotient().times(divisor).plus(parts.remainder()));
              assertTrue(
                  parts.remainder().isZero() || parts.remainder().degree() < divisor.degree());
            }
          }
        });
  }

  @Test
  void valuesAreThoseOfHornersScheme() {
    Seeded.each(
        62_000,
        80,
        r -> {
          DensePolynomial p = random(r);
          int count = r.nextInt(60);
          List<Rational> values = p.values(count);
          assertEquals(count, values.size());
          for (int i = 0; i < count; i++) {
            Rational value = Rational.ZERO;
            for (int k = p.degree(); k >= 0; k--) {
              value = value.times(Rational.of(i)).plus(p.coefficient(k));
            }
            assertEquals(value, values.get(i));
            assertEquals(value, p.evaluate(Rational.of(i)));
          }
        });
  }

  @Test
  void shiftedPolynomialsHaveShiftedValues() {
    Seeded.each(
        63_000,
        60,
        r -> {
          DensePolynomial p = large(r, r.nextInt(200), 64);
          Rational shift = Rational.of(r.nextInt(-9, 10), 1 + r.nextInt(4));
          Rational point = Rational.of(r.nextInt(-9, 10), 1 + r.nextInt(4));
          DensePolynomial shifted = p.taylorShift(shift);
          assertEquals(p.evaluate(point.plus(shift)), shifted.evaluate(point));
          assertEquals(p, shifted.taylorShift(shift.negated()));
        });
  }

  @Test
  void fallingPowersHaveTheSameValuesAndLeadBack() {
    Seeded.each(
        64_000,
        60,
        r -> {
          DensePolynomial p = random(r);
          List<Rational> falling = p.toFalling();
          for (int point = -3; point <= 30; point += 3) {
            Rational sum = Rational.ZERO;
            Rational power = Rational.ONE;
            for (int k = 0; k < falling.size(); k++) {
              sum = sum.plus(falling.get(k).times(power));
              power = power.times(Rational.of(point - (long) k));
            }
            assertEquals(p.evaluate(Rational.of(point)), sum);
          }
          assertEquals(p, DensePolynomial.fromFalling(falling));
        });
  }

  @Test
  void powersHaveStirlingNumbersInFallingPowers() {
    for (int n = 0; n <= 30; n++) {
      List<Rational> expected = Integers.stirlingSecondRow(n).stream().map(Rational::of).toList();
      assertEquals(expected, DensePolynomial.UNKNOWN.power(n).toFalling());
      List<Rational> unit = new ArrayList<>(Collections.nCopies(n, Rational.ZERO));
      unit.add(Rational.ONE);
      assertEquals(
          Integers.stirlingFirstRow(n).stream().map(Rational::of).toList(),
          DensePolynomial.fromFalling(unit).coefficients());
    }
  }

  @Test
  void polynomialsOfDegreeOneThousandGoToFallingPowersAndBack() {
    Seeded.each(
        65_000,
        2,
        r -> {
          DensePolynomial p = large(r, 1000, 64);
          assertEquals(p, DensePolynomial.fromFalling(p.toFalling()));
        });
  }

  @Test
  void rowsOfIntegersMultiplyAndAddInPlace() {
    Seeded.each(
        66_000,
        300,
        r -> {
          BigInteger[] values = RandomPolynomials.integers(r, 4, 200);
          IntegerRow row = new IntegerRow(values);
          for (int step = 0; step < 20; step++) {
            int place = r.nextInt(4);
            int scaled = r.nextBoolean() ? place : r.nextInt(4);
            int added = scaled == place ? r.nextInt(4) : place;
            int factor = r.nextInt(Integer.MAX_VALUE) >> r.nextInt(31);
            row.combine(place, scaled, factor, added);
            values[place] = values[scaled].multiply(BigInteger.valueOf(factor)).add(values[added]);
            assertArrayEquals(values, row.values());
          }
        });
  }

  @Test
  void sparseAndDenseFormsConvertIntoEachOther() {
    Seeded.each(
        67_000,
        80,
        r -> {
          DensePolynomial p = random(r);
          assertEquals(p, DensePolynomial.of(p.toPolynomial(X), X));
          assertEquals(p.derivative().toPolynomial(X), p.toPolynomial(X).derivative(X));
        });
    Polynomial negative = Polynomial.of(Monomial.of(X, Rational.MINUS_ONE)).plus(Polynomial.of(X));
    Refusal refusal = assertThrows(Refusal.class, () -> DensePolynomial.of(negative, X));
    assertEquals(Reason.NOT_NATURAL, refusal.reason());
  }

  @Test
  void scalingIsExact() {
    Seeded.each(
        68_000,
        80,
        r -> {
          DensePolynomial p = random(r);
          Rational factor = RandomNumbers.rational(r);
          for (int k = 0; k <= p.degree(); k++) {
            assertEquals(p.coefficient(k).times(factor), p.times(factor).coefficient(k));
          }
        });
  }
}
