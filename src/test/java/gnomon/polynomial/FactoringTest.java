package gnomon.polynomial;

import static gnomon.polynomial.PolynomialTest.x;
import static gnomon.polynomial.PolynomialTest.y;
import static gnomon.polynomial.PolynomialTest.z;
import static gnomon.polynomial.RandomPolynomials.X;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Refusal;
import gnomon.law.Seeded;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.RandomPolynomials.Exponents;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

/// Factors multiply back, are irreducible by the library's judgement too, and known factors are
/// found.
class FactoringTest {

  private static final Polynomial ONE = Polynomial.ONE;

  private static void assertFactorsOf(Polynomial polynomial, Factorization factors) {
    assertEquals(polynomial, factors.product());
    Set<Polynomial> bases = new HashSet<>();
    for (Factor factor : factors.factors()) {
      assertEquals(factor.base(), factor.base().primitivePart());
      assertTrue(bases.add(factor.base()), "twice: " + factor.base());
    }
  }

  private static List<Polynomial> bases(Polynomial polynomial) {
    return polynomial.factor().factors().stream().map(Factor::base).toList();
  }

  @Test
  void randomProductsMultiplyBackWithIrreducibleFactors() {
    for (Exponents exponents : Exponents.values()) {
      Seeded.each(
          50_000,
          60,
          r -> {
            int letters = 1 + r.nextInt(3);
            Polynomial product = ONE;
            for (int i = 0; i < 3; i++) {
              Polynomial factor = RandomPolynomials.of(r, letters, 3, 2, exponents);
              product = product.times(factor.isZero() ? x.plus(ONE) : factor);
            }
            assertFactorsOf(product, product.factor());
            assertFactorsOf(product, product.squareFree());
            for (Polynomial base : bases(product)) {
              if (!base.isMonomial() && base.isNatural()) {
                assertEquals(1, RingsBridge.irreducibleFactors(base).size(), base.toString());
              }
            }
          });
    }
  }

  @Test
  void squareFreeFactorsShareNothingAndRepeatNothing() {
    Polynomial a = x.power(2).plus(y);
    Polynomial b = x.minus(y).plus(z);
    Polynomial product = a.power(3).times(b.power(3)).times(x.plus(ONE)).times(Rational.of(-6));
    Factorization parts = product.squareFree();
    assertFactorsOf(product, parts);
    assertEquals(Rational.of(-6), parts.unit());
    for (Factor factor : parts.factors()) {
      for (Factor other : parts.factors()) {
        if (factor != other) {
          assertTrue(Polynomial.gcd(factor.base(), other.base()).isOne());
        }
      }
      assertEquals(3, factor.base().equals(x.plus(ONE)) ? 3 : factor.multiplicity());
    }
  }

  /// x^n - 1 has one irreducible factor for each divisor of n (cyclotomic polynomials, common
  /// practice).
  @Test
  void powersMinusOneHaveOneFactorForEachDivisor() {
    for (int n : new int[] {1, 2, 6, 12, 30, 36, 105, 200, 210}) {
      Polynomial polynomial = x.power(n).minus(ONE);
      int divisors = 0;
      for (int d = 1; d <= n; d++) {
        divisors += n % d == 0 ? 1 : 0;
      }
      assertFactorsOf(polynomial, polynomial.factor());
      assertEquals(divisors, bases(polynomial).size());
    }
  }

  /// x^4 + 1 is irreducible, though it splits modulo every prime (common practice).
  @Test
  void degreePatternsAloneDoNotDecideEverything() {
    assertEquals(List.of(x.power(4).plus(ONE)), bases(x.power(4).plus(ONE)));
    assertEquals(2, bases(x.power(4).plus(Polynomial.of(4))).size());
  }

  /// The cyclotomic polynomial of order 105 is the first with a coefficient beyond 1 in size
  /// (common practice).
  @Test
  void cyclotomicPolynomialsAreRecognised() {
    assertEquals(BigInteger.TWO.negate(), Cyclotomic.ofOrder(105)[7]);
    for (int order = 3; order <= 60; order++) {
      BigInteger[] cyclotomic = Cyclotomic.ofOrder(order);
      BigInteger[] other = {BigInteger.TWO, BigInteger.ONE, BigInteger.ONE, BigInteger.TEN};
      BigInteger[] product = Kronecker.times(cyclotomic, other);
      List<BigInteger[]> found = Cyclotomic.factors(product);
      assertEquals(1, found.size());
      assertArrayEquals(cyclotomic, found.getFirst());
      assertEquals(List.of(), Cyclotomic.factors(other));
    }
  }

  /// x^n - a is irreducible when a is no power that divides n, and not -4 times a fourth power for
  /// n a multiple of 4 (theorem of Capelli, common practice).
  @Test
  void powersMinusConstantsFollowTheTheoremOfCapelli() {
    assertEquals(1, bases(x.power(200).minus(Polynomial.of(2))).size());
    assertEquals(1, bases(x.power(60).plus(Polynomial.of(3))).size());
    assertEquals(2, bases(x.power(12).plus(Polynomial.of(4))).size());
    assertEquals(2, bases(x.power(15).minus(Polynomial.of(8))).size());
    assertEquals(1, bases(x.power(14).minus(Polynomial.of(8))).size());
    assertFactorsOf(
        x.power(24).minus(Polynomial.of(4096)), x.power(24).minus(Polynomial.of(4096)).factor());
  }

  @Test
  void polynomialsInAPowerAgreeWithTheLibrary() {
    Seeded.each(
        52_000,
        40,
        r -> {
          BigInteger[] small = RandomPolynomials.integers(r, 2 + r.nextInt(3), 3);
          small[0] = BigInteger.valueOf(1L << r.nextInt(6));
          small[small.length - 1] = BigInteger.valueOf(1 + r.nextInt(4));
          int step = 2 + r.nextInt(5);
          Polynomial polynomial =
              Univariate.toPolynomial(small, X).substitute(X, x.power(step)).primitivePart();
          assertFactorsOf(polynomial, polynomial.factor());
          for (Polynomial base : bases(polynomial)) {
            assertEquals(1, RingsBridge.irreducibleFactors(base).size(), base.toString());
          }
        });
  }

  @Test
  void rationalRootsAreFound() {
    Polynomial product = ONE;
    for (int i = 1; i <= 12; i++) {
      product = product.times(x.times(Rational.of(i)).minus(Polynomial.of(7 * i - 3)));
    }
    Polynomial rest = x.power(6).plus(x).plus(ONE);
    assertFactorsOf(product.times(rest), product.times(rest).factor());
    long linear =
        bases(product.times(rest)).stream().filter(base -> base.degree(X).isOne()).count();
    assertEquals(12, linear);
  }

  @Test
  void quadraticFormsSplitExactlyWhenTheirDiscriminantIsASquare() {
    Polynomial a = x.plus(y.times(Rational.of(2))).minus(z);
    Polynomial b = x.times(Rational.of(3)).minus(y).plus(ONE);
    assertEquals(Set.of(a, b), Set.copyOf(bases(a.times(b))));
    assertEquals(1, bases(a.times(b).plus(ONE)).size());
    assertEquals(1, bases(x.power(2).minus(y.times(z))).size());
  }

  /// The sum of k^200 for k from 1 to n - 1 as a polynomial in n vanishes at 0, 1 and 1/2 (DLMF
  /// 24.4, from memory), and has one more factor.
  @Test
  void longPowerSumsAreFactored() {
    int power = 200;
    List<Rational> bernoulli = Integers.bernoulliNumbers(power);
    List<Term> terms = new ArrayList<>();
    for (int k = 0; k <= power; k++) {
      Rational coefficient = bernoulli.get(k).times(Rational.of(Integers.binomial(power + 1, k)));
      terms.add(new Term(Monomial.of(X, Rational.of(power + 1L - k)), coefficient));
    }
    Polynomial sum = Polynomial.ofTerms(terms);
    assertFactorsOf(sum, sum.factor());
    assertEquals(4, bases(sum).size());
    assertTrue(bases(sum).containsAll(List.of(x, x.minus(ONE))));
  }

  @Test
  void fractionalExponentsAreFactoredInTheirSmallestStep() {
    Polynomial half = Polynomial.of(Monomial.of(X, Rational.HALF));
    Polynomial third = Polynomial.of(Monomial.of(X, Rational.of(-1, 3)));
    Polynomial polynomial = half.minus(Polynomial.of(2)).times(third.plus(ONE));
    assertFactorsOf(polynomial, polynomial.factor());
  }

  @Test
  void zeroHasNoFactors() {
    assertThrows(Refusal.class, Polynomial.ZERO::factor);
  }

  @Test
  void irreducibilityIsNeverClaimedForAProduct() {
    Seeded.each(
        51_000,
        60,
        r -> {
          BigInteger[] a = RandomPolynomials.integers(r, 3 + r.nextInt(5), 12);
          BigInteger[] b = RandomPolynomials.integers(r, 3 + r.nextInt(5), 12);
          a[a.length - 1] = BigInteger.ONE;
          b[b.length - 1] = BigInteger.TWO;
          BigInteger[] product = Univariate.primitive(Kronecker.times(a, b));
          assertTrue(!new DegreePatterns(product).proveIrreducible());
        });
  }
}
