package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;

/// Greatest common divisors: monomials first, then every cheap reason that settles the question,
/// the library Rings last.
final class GreatestCommonDivisor {

  private GreatestCommonDivisor() {}

  static Polynomial of(Polynomial a, Polynomial b) {
    if (a.isZero() || b.isZero()) {
      return (a.isZero() ? b : a).primitivePart();
    }
    Monomial mine = a.monomialContent();
    Monomial its = b.monomialContent();
    Monomial common = mine.gcd(its);
    if (a.isMonomial() || b.isMonomial()) {
      return Polynomial.of(common);
    }
    Polynomial left = a.times(Monomial.ONE.dividedBy(mine)).primitivePart();
    Polynomial right = b.times(Monomial.ONE.dividedBy(its)).primitivePart();
    if (left.equals(right)) {
      return left.times(common);
    }
    Rescaling scaling = Rescaling.of(left, right);
    Polynomial found = natural(scaling.scale(left), scaling.scale(right));
    return scaling.restore(found).times(common).primitivePart();
  }

  /// The greatest common divisor of all of `polynomials`; 0 for none.
  static Polynomial ofAll(Collection<Polynomial> polynomials) {
    List<Polynomial> bySize =
        polynomials.stream().sorted(Comparator.comparingInt(Polynomial::size)).toList();
    Polynomial common = Polynomial.ZERO;
    for (Polynomial polynomial : bySize) {
      Budget.checkpoint();
      common = of(common, polynomial);
      if (common.isOne()) {
        break;
      }
    }
    return common;
  }

  /// The content of a polynomial in `indeterminate`: the greatest common divisor of its
  /// coefficients.
  static Polynomial content(Polynomial polynomial, Indeterminate indeterminate) {
    return ofAll(polynomial.coefficients(indeterminate).values());
  }

  /// Both primitive, natural, without monomial content, and with several terms.
  private static Polynomial natural(Polynomial a, Polynomial b) {
    SortedSet<Indeterminate> mine = a.indeterminates();
    SortedSet<Indeterminate> its = b.indeterminates();
    for (Indeterminate indeterminate : mine) {
      if (!its.contains(indeterminate)) {
        return withContent(b, a, indeterminate);
      }
    }
    for (Indeterminate indeterminate : its) {
      if (!mine.contains(indeterminate)) {
        return withContent(a, b, indeterminate);
      }
    }
    if (mine.size() == 1) {
      Indeterminate only = mine.first();
      return Univariate.toPolynomial(
          Univariate.gcd(Univariate.toArray(a, only), Univariate.toArray(b, only)), only);
    }
    return several(a, b, mine);
  }

  /// The common divisor of `a` and the coefficients of `b` in an indeterminate that `a` lacks.
  private static Polynomial withContent(Polynomial a, Polynomial b, Indeterminate indeterminate) {
    Polynomial common = a;
    for (Polynomial coefficient : b.coefficients(indeterminate).values()) {
      common = of(common, coefficient);
      if (common.isConstant()) {
        return Polynomial.ONE;
      }
    }
    return common;
  }

  private static Polynomial several(
      Polynomial a, Polynomial b, SortedSet<Indeterminate> indeterminates) {
    Polynomial small = a.size() <= b.size() ? a : b;
    Polynomial large = small == a ? b : a;
    if (large.tryDividedBy(small).isPresent()) {
      return small;
    }
    for (Indeterminate indeterminate : indeterminates) {
      if (Images.provesFree(a, b, indeterminate)) {
        Polynomial rest = content(small, indeterminate);
        return rest.isOne() ? rest : withContent(rest, large, indeterminate);
      }
    }
    Optional<Polynomial> guessed = HeuristicGcd.of(a, b);
    return guessed.orElseGet(() -> RingsBridge.gcd(a, b));
  }
}
