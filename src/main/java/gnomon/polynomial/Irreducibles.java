package gnomon.polynomial;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedSet;

/// Irreducible factors of natural, primitive, square-free polynomials without monomial content.
final class Irreducibles {

  private Irreducibles() {}

  static List<Polynomial> of(Polynomial polynomial) {
    SortedSet<Indeterminate> indeterminates = polynomial.indeterminates();
    if (indeterminates.size() == 1) {
      Indeterminate only = indeterminates.first();
      List<Polynomial> factors = new ArrayList<>();
      UnivariateFactors.of(Univariate.toArray(polynomial, only))
          .forEach(factor -> factors.add(Univariate.toPolynomial(factor, only)));
      return factors;
    }
    for (Indeterminate indeterminate : indeterminates) {
      if (polynomial.degree(indeterminate).isOne()) {
        return linear(polynomial, indeterminate);
      }
    }
    return RingsBridge.irreducibleFactors(polynomial);
  }

  /// A polynomial of degree 1 in an indeterminate is irreducible up to its content there.
  private static List<Polynomial> linear(Polynomial polynomial, Indeterminate indeterminate) {
    Polynomial content = GreatestCommonDivisor.content(polynomial, indeterminate);
    if (content.isOne()) {
      return List.of(polynomial);
    }
    List<Polynomial> factors = new ArrayList<>(of(content));
    factors.add(polynomial.dividedBy(content));
    return factors;
  }
}
