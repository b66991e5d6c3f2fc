package gnomon.polynomial;

import static gnomon.polynomial.RandomPolynomials.X;
import static gnomon.polynomial.RandomPolynomials.Y;
import static gnomon.polynomial.RandomPolynomials.Z;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Budget;
import gnomon.algebra.Halt;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.law.RingLaws;
import gnomon.law.Seeded;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.RandomPolynomials.Exponents;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Ring laws with exponents of every kind, derivatives, coefficients, powers and exact division.
class PolynomialTest extends RingLaws<Polynomial> {

  static final Polynomial x = Polynomial.of(X);
  static final Polynomial y = Polynomial.of(Y);
  static final Polynomial z = Polynomial.of(Z);

  @Override
  protected Polynomial random(RandomGenerator random) {
    Exponents exponents = random.nextBoolean() ? Exponents.NATURAL : Exponents.ANY;
    return RandomPolynomials.of(random, 1 + random.nextInt(3), 6, 4, exponents);
  }

  @Override
  protected Polynomial zero() {
    return Polynomial.ZERO;
  }

  @Override
  protected Polynomial one() {
    return Polynomial.ONE;
  }

  private interface Pair {
    void check(Polynomial a, Polynomial b);
  }

  private void each(Pair law) {
    Seeded.each(9_000, 300, r -> law.check(random(r), random(r)));
  }

  @Test
  void termsDescendAndAreNotZero() {
    each(
        (a, b) -> {
          List<Term> terms = a.times(b).terms();
          for (int i = 0; i < terms.size(); i++) {
            assertTrue(!terms.get(i).coefficient().isZero());
            assertTrue(
                i == 0 || terms.get(i - 1).monomial().compareTo(terms.get(i).monomial()) > 0);
          }
        });
  }

  @Test
  void theOrderOfMonomialsRespectsProducts() {
    each(
        (a, b) -> {
          if (!a.isZero() && !b.isZero()) {
            Monomial left = a.leadingTerm().monomial();
            Monomial right = b.leadingTerm().monomial();
            assertEquals(left.times(right), a.times(b).leadingTerm().monomial());
            assertEquals(left, left.times(right).dividedBy(right));
            assertEquals(left.times(right), left.gcd(right).times(left.lcm(right)));
          }
        });
  }

  @Test
  void derivativesFollowTheProductRule() {
    each(
        (a, b) ->
            assertEquals(
                a.times(b).derivative(X), a.derivative(X).times(b).plus(a.times(b.derivative(X)))));
  }

  @Test
  void coefficientsPutTogetherGiveThePolynomial() {
    each(
        (a, _) -> {
          Map<Rational, Polynomial> coefficients = a.coefficients(Y);
          assertEquals(a, Polynomial.ofCoefficients(Y, coefficients));
          assertTrue(coefficients.values().stream().noneMatch(c -> c.isZero() || c.contains(Y)));
        });
  }

  @Test
  void aProductIsDividedByEitherFactor() {
    each(
        (a, b) -> {
          if (!b.isZero() && b.monomialContent().isOne()) {
            Polynomial product = a.times(b);
            assertEquals(Optional.of(a), product.tryDividedBy(b));
            if (!b.isMonomial()) {
              assertEquals(Optional.empty(), product.plus(Polynomial.ONE).tryDividedBy(b));
            }
          }
        });
  }

  @Test
  void divisionAddsNoNegativeExponents() {
    assertEquals(Optional.empty(), x.tryDividedBy(x.power(2)));
    Polynomial inverse = Polynomial.of(Monomial.of(X, Rational.MINUS_ONE));
    assertEquals(
        Optional.of(inverse), Polynomial.ONE.plus(inverse).tryDividedBy(x.plus(Polynomial.ONE)));
    assertEquals(Optional.of(x), Polynomial.ONE.tryDividedBy(inverse));
  }

  @Test
  void divisionByZeroIsRefused() {
    Refusal refusal = assertThrows(Refusal.class, () -> x.tryDividedBy(Polynomial.ZERO));
    assertEquals(Reason.DIVISION_BY_ZERO, refusal.reason());
  }

  @Test
  void highPowersOfABinomialHaveBinomialCoefficients() {
    Polynomial power = x.plus(y).power(200);
    assertEquals(201, power.size());
    for (Term term : power.terms()) {
      int k = term.monomial().exponent(X).intValueExact();
      assertEquals(Rational.of(Integers.binomial(200, k)), term.coefficient());
    }
  }

  @Test
  void sparsePowersAgreeWithRepeatedProducts() {
    Polynomial base = x.power(90).plus(y.power(77)).minus(z.power(50).times(Rational.HALF));
    Polynomial product = Polynomial.ONE;
    for (int i = 0; i < 6; i++) {
      product = product.times(base);
    }
    assertEquals(product, base.power(6));
  }

  @Test
  void explosivePowersAreRefusedAtOnce() {
    Polynomial base = x.plus(y).plus(z).plus(Polynomial.ONE);
    Budget budget = Budget.of(Duration.ofMinutes(5), 1 << 22);
    Halt halt = assertThrows(Halt.class, () -> budget.run(() -> base.power(1_000_000)));
    assertEquals(Halt.Cause.SIZE, halt.cause());
  }

  @Test
  void substitutionIsEvaluation() {
    each(
        (a, _) -> {
          if (a.isNatural()) {
            Polynomial value = y.plus(Polynomial.of(Rational.HALF));
            Polynomial direct = Polynomial.ZERO;
            for (Map.Entry<Rational, Polynomial> part : a.coefficients(X).entrySet()) {
              int exponent = part.getKey().intValueExact();
              direct = direct.plus(part.getValue().times(value.power(exponent)));
            }
            assertEquals(direct, a.substitute(X, value));
          }
        });
  }

  @Test
  void contentTimesPrimitivePartIsThePolynomial() {
    each(
        (a, _) -> {
          assertEquals(a, a.primitivePart().times(a.content()));
          if (!a.isZero()) {
            assertTrue(a.primitivePart().content().isOne());
          }
        });
  }

  @Test
  void exponentsBeyondTheRangeAreRefused() {
    Monomial large = Monomial.of(X, Rational.of(Long.MAX_VALUE / 2));
    Refusal refusal =
        assertThrows(Refusal.class, () -> large.times(large).times(large).times(large));
    assertEquals(Reason.EXPONENT_TOO_LARGE, refusal.reason());
  }
}
