package gnomon.polynomial;

import static gnomon.polynomial.PolynomialTest.x;
import static gnomon.polynomial.PolynomialTest.y;
import static gnomon.polynomial.PolynomialTest.z;
import static gnomon.polynomial.RandomPolynomials.X;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.law.Seeded;
import gnomon.number.Rational;
import gnomon.polynomial.RandomPolynomials.Exponents;
import java.math.BigInteger;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Greatest common divisors by their defining property, and against the library Rings.
class CommonDivisorTest {

  private static final Polynomial ONE = Polynomial.ONE;

  private static Polynomial random(RandomGenerator random, Exponents exponents) {
    Polynomial found = RandomPolynomials.of(random, 1 + random.nextInt(3), 5, 3, exponents);
    return found.isZero() ? x.plus(y) : found;
  }

  @Test
  void theDivisorDividesBothAndLeavesCoprimeCofactors() {
    for (Exponents exponents : Exponents.values()) {
      Seeded.each(
          40_000,
          250,
          r -> {
            Polynomial common = random(r, exponents);
            Polynomial a = random(r, exponents).times(common);
            Polynomial b = random(r, exponents).times(common);
            Polynomial gcd = Polynomial.gcd(a, b);
            assertEquals(gcd, gcd.primitivePart());
            Monomial content = common.monomialContent();
            Polynomial plain = common.times(Monomial.ONE.dividedBy(content));
            assertTrue(gcd.tryDividedBy(plain).isPresent(), "too small: " + gcd);
            Polynomial left = a.dividedBy(gcd);
            Polynomial right = b.dividedBy(gcd);
            assertTrue(Polynomial.gcd(left, right).isOne(), "too small: " + gcd);
          });
    }
  }

  @Test
  void divisorsAgreeWithTheLibrary() {
    Seeded.each(
        41_000,
        60,
        r -> {
          Polynomial common = random(r, Exponents.NATURAL);
          Polynomial a = random(r, Exponents.NATURAL).times(common).primitivePart();
          Polynomial b = random(r, Exponents.NATURAL).times(common).primitivePart();
          if (!a.isConstant() && !b.isConstant()) {
            assertEquals(RingsBridge.gcd(a, b), Polynomial.gcd(a, b));
          }
        });
  }

  @Test
  void longUnivariateDivisorsAreFoundFromImages() {
    Seeded.each(
        42_000,
        10,
        r -> {
          BigInteger[] common = Univariate.trim(RandomPolynomials.integers(r, 30, 300));
          BigInteger[] a = RandomPolynomials.integers(r, 25, 200);
          BigInteger[] b = RandomPolynomials.integers(r, 20, 100);
          Polynomial shared = Univariate.toPolynomial(common, X);
          Polynomial left = Univariate.toPolynomial(Univariate.trim(a), X);
          Polynomial right = Univariate.toPolynomial(Univariate.trim(b), X);
          Polynomial cofactors = Polynomial.gcd(left, right);
          assertEquals(
              shared.times(cofactors).primitivePart(),
              Polynomial.gcd(left.times(shared), right.times(shared)));
        });
  }

  @Test
  void divisorsWithZeroAndConstantsAreSettled() {
    assertTrue(Polynomial.gcd(Polynomial.ZERO, Polynomial.ZERO).isZero());
    Polynomial form = x.times(Rational.of(-4)).plus(Polynomial.of(6));
    assertEquals(form.primitivePart(), Polynomial.gcd(form, Polynomial.ZERO));
    assertTrue(Polynomial.gcd(form, Polynomial.of(Rational.of(3, 7))).isOne());
    assertTrue(Polynomial.gcd(form, y.plus(ONE)).isOne());
  }

  @Test
  void monomialsTakeTheSmallerExponent() {
    Polynomial a = Polynomial.of(Monomial.of(X, Rational.HALF)).times(y.power(3));
    Polynomial b = Polynomial.of(Monomial.of(X, Rational.of(-1, 3))).times(y);
    assertEquals(b, Polynomial.gcd(a, b));
  }

  @Test
  void denseDivisorsInThreeLettersAreFound() {
    Polynomial base = x.plus(y).plus(z).plus(ONE).power(4);
    Polynomial gcd = Polynomial.gcd(base.times(base.plus(ONE)), base.times(base.minus(x.times(y))));
    assertEquals(base, gcd);
  }

  @Test
  void leastCommonMultiplesAreDividedByBoth() {
    Seeded.each(
        43_000,
        80,
        r -> {
          Polynomial a = random(r, Exponents.NATURAL);
          Polynomial b = random(r, Exponents.NATURAL);
          Polynomial lcm = Polynomial.lcm(a, b);
          assertEquals(a.times(b).primitivePart(), lcm.times(Polynomial.gcd(a, b)).primitivePart());
        });
  }

  /// The resultant vanishes exactly with a common root, and is multiplicative.
  @Test
  void resultantsTellCommonFactorsAndMultiply() {
    Seeded.each(
        44_000,
        80,
        r -> {
          Polynomial a = random(r, Exponents.NATURAL);
          Polynomial b = random(r, Exponents.NATURAL);
          Polynomial c = random(r, Exponents.NATURAL);
          Polynomial left = Polynomial.resultant(a.times(b), c, X);
          Polynomial right = Polynomial.resultant(a, c, X).times(Polynomial.resultant(b, c, X));
          assertEquals(left, right);
          boolean shared = Polynomial.gcd(a, c).contains(X);
          assertEquals(shared, Polynomial.resultant(a, c, X).isZero());
        });
  }

  /// The discriminant of a quadratic polynomial, common practice.
  @Test
  void theResultantWithTheDerivativeIsTheDiscriminant() {
    Polynomial quadratic = x.power(2).plus(x.times(y)).plus(z);
    Polynomial expected = z.times(Rational.of(4)).minus(y.power(2));
    assertEquals(expected, Polynomial.resultant(quadratic, quadratic.derivative(X), X));
  }
}
