package gnomon.polynomial;

import cc.redberry.rings.Rings;
import cc.redberry.rings.bigint.BigInteger;
import cc.redberry.rings.poly.PolynomialFactorDecomposition;
import cc.redberry.rings.poly.multivar.DegreeVector;
import cc.redberry.rings.poly.multivar.MonomialOrder;
import cc.redberry.rings.poly.multivar.MultivariateFactorization;
import cc.redberry.rings.poly.multivar.MultivariateGCD;
import cc.redberry.rings.poly.multivar.MultivariatePolynomial;
import cc.redberry.rings.poly.univar.UnivariateFactorization;
import cc.redberry.rings.poly.univar.UnivariatePolynomial;
import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SortedSet;

/// The only place that sees the library Rings: greatest common divisors and factors of natural
/// integer polynomials that the cheaper ways did not settle.
///
/// Rings never looks at a cancellation, so the size of the problem is charged before it is entered.
final class RingsBridge {

  private final Indeterminate[] indeterminates;

  private RingsBridge(SortedSet<Indeterminate> indeterminates) {
    this.indeterminates = indeterminates.toArray(Indeterminate[]::new);
  }

  /// The primitive greatest common divisor of two primitive natural polynomials.
  static Polynomial gcd(Polynomial a, Polynomial b) {
    charge(a);
    charge(b);
    SortedSet<Indeterminate> all = a.indeterminates();
    all.addAll(b.indeterminates());
    RingsBridge bridge = new RingsBridge(all);
    return bridge
        .fromRings(MultivariateGCD.PolynomialGCD(bridge.toRings(a), bridge.toRings(b)))
        .primitivePart();
  }

  /// The irreducible factors of a primitive square-free natural polynomial, each primitive.
  static List<Polynomial> irreducibleFactors(Polynomial polynomial) {
    charge(polynomial);
    RingsBridge bridge = new RingsBridge(polynomial.indeterminates());
    PolynomialFactorDecomposition<MultivariatePolynomial<BigInteger>> factors =
        MultivariateFactorization.FactorInZ(bridge.toRings(polynomial));
    List<Polynomial> found = new ArrayList<>();
    for (MultivariatePolynomial<BigInteger> factor : factors.factors) {
      found.add(bridge.fromRings(factor).primitivePart());
    }
    return found;
  }

  /// The irreducible factors of a primitive square-free polynomial in one unknown.
  static List<java.math.BigInteger[]> irreducibleFactors(java.math.BigInteger[] coefficients) {
    Budget.charge((long) coefficients.length * (Kronecker.bits(coefficients) / Long.SIZE + 1L));
    BigInteger[] values =
        Arrays.stream(coefficients).map(RingsBridge::toRings).toArray(BigInteger[]::new);
    PolynomialFactorDecomposition<UnivariatePolynomial<BigInteger>> factors =
        UnivariateFactorization.FactorInZ(UnivariatePolynomial.create(Rings.Z, values));
    List<java.math.BigInteger[]> found = new ArrayList<>();
    for (UnivariatePolynomial<BigInteger> factor : factors.factors) {
      java.math.BigInteger[] its = new java.math.BigInteger[factor.degree() + 1];
      for (int i = 0; i < its.length; i++) {
        its[i] = fromRings(factor.get(i));
      }
      found.add(Univariate.primitive(its));
    }
    return found;
  }

  /// An estimate of the work: terms by degree by words of a coefficient.
  private static void charge(Polynomial polynomial) {
    long degree = polynomial.leadingTerm().monomial().totalDegree().floor().longValue();
    long words = Product.IntegerTerms.of(polynomial).bits() / Long.SIZE + 1;
    Budget.charge(polynomial.size() * (degree + 1) * words);
  }

  private MultivariatePolynomial<BigInteger> toRings(Polynomial polynomial) {
    List<cc.redberry.rings.poly.multivar.Monomial<BigInteger>> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      int[] exponents = new int[indeterminates.length];
      for (Monomial.Power power : term.monomial().factors()) {
        int place = Arrays.binarySearch(indeterminates, power.indeterminate());
        exponents[place] = power.exponent().intValueExact();
      }
      terms.add(
          new cc.redberry.rings.poly.multivar.Monomial<>(
              new DegreeVector(exponents), toRings(term.coefficient().numerator())));
    }
    return MultivariatePolynomial.create(
        indeterminates.length, Rings.Z, MonomialOrder.GREVLEX, terms);
  }

  private Polynomial fromRings(MultivariatePolynomial<BigInteger> polynomial) {
    List<Term> terms = new ArrayList<>();
    for (cc.redberry.rings.poly.multivar.Monomial<BigInteger> term : polynomial) {
      long[] exponents = Arrays.stream(term.exponents).asLongStream().toArray();
      terms.add(
          new Term(
              Monomial.of(indeterminates, exponents, 1), Rational.of(fromRings(term.coefficient))));
    }
    return Polynomial.ofDistinct(terms);
  }

  private static BigInteger toRings(java.math.BigInteger value) {
    return value.bitLength() < Long.SIZE
        ? BigInteger.valueOf(value.longValue())
        : new BigInteger(value.toByteArray());
  }

  private static java.math.BigInteger fromRings(BigInteger value) {
    return new java.math.BigInteger(value.toByteArray());
  }
}
