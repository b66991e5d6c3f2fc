package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.UnaryOperator;

/// Factors of polynomials: rational content, monomials, square-free parts, then irreducible ones.
final class Factoring {

  private static final Comparator<Factor> CANONICAL =
      Comparator.comparing(Factor::base, Factoring::compareBases)
          .thenComparing(Factor::multiplicity);

  private Factoring() {}

  static Factorization squareFree(Polynomial polynomial) {
    return split(polynomial, SquareFree::of);
  }

  static Factorization irreducible(Polynomial polynomial) {
    return split(polynomial, Factoring::irreducibleFactors);
  }

  private static List<Factor> irreducibleFactors(Polynomial polynomial) {
    List<Factor> factors = new ArrayList<>();
    for (Factor factor : SquareFree.of(polynomial)) {
      Budget.checkpoint();
      for (Polynomial base : Irreducibles.of(factor.base())) {
        factors.add(new Factor(base, factor.multiplicity()));
      }
    }
    return factors;
  }

  /// What is left after content and monomials is natural, primitive and goes to `method`.
  private static Factorization split(Polynomial polynomial, Method method) {
    if (polynomial.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO);
    }
    Rescaling scaling = Rescaling.of(polynomial);
    Polynomial scaled = scaling.scale(polynomial);
    Monomial monomial = scaled.monomialContent();
    List<Factor> factors = new ArrayList<>();
    UnaryOperator<Polynomial> restore = base -> scaling.restore(base).primitivePart();
    for (Monomial.Power power : monomial.factors()) {
      Polynomial base = scaling.restore(Polynomial.of(power.indeterminate()));
      factors.add(new Factor(base, power.exponent().intValueExact()));
    }
    Polynomial rest = scaled.times(Monomial.ONE.dividedBy(monomial)).primitivePart();
    if (!rest.isConstant()) {
      for (Factor factor : method.factors(rest)) {
        factors.add(new Factor(restore.apply(factor.base()), factor.multiplicity()));
      }
    }
    factors.sort(CANONICAL);
    confirm(polynomial, factors);
    return new Factorization(unit(polynomial, factors), factors);
  }

  /// Leading monomials multiply: a lost or foreign factor shows.
  private static void confirm(Polynomial polynomial, List<Factor> factors) {
    Monomial product = Monomial.ONE;
    for (Factor factor : factors) {
      Monomial lead = factor.base().leadingTerm().monomial();
      product = product.times(lead.power(Rational.of(factor.multiplicity())));
    }
    if (!product.equals(polynomial.leadingTerm().monomial())) {
      throw new IllegalStateException("these are not all factors of " + polynomial);
    }
  }

  private interface Method {
    List<Factor> factors(Polynomial polynomial);
  }

  /// The quotient of the leading coefficients, since leading coefficients multiply.
  private static Rational unit(Polynomial polynomial, List<Factor> factors) {
    Rational unit = polynomial.leadingCoefficient();
    for (Factor factor : factors) {
      unit = unit.dividedBy(factor.base().leadingCoefficient().power(factor.multiplicity()));
    }
    return unit;
  }

  /// Few terms before many, low degree before high, then by the terms themselves.
  private static int compareBases(Polynomial a, Polynomial b) {
    int degrees = a.leadingTerm().monomial().compareTo(b.leadingTerm().monomial());
    if (degrees != 0) {
      return degrees;
    }
    if (a.size() != b.size()) {
      return Integer.compare(a.size(), b.size());
    }
    for (int i = 0; i < a.size(); i++) {
      Term mine = a.terms().get(i);
      Term its = b.terms().get(i);
      int order = mine.monomial().compareTo(its.monomial());
      if (order == 0) {
        order = mine.coefficient().compareTo(its.coefficient());
      }
      if (order != 0) {
        return order;
      }
    }
    return 0;
  }
}
