package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.util.ArrayList;
import java.util.List;

/// Square-free factors of natural primitive polynomials: content in one indeterminate first, then
/// the differential algorithm of Yun on the rest.
///
/// Source: D. Y. Y. Yun, On square-free decomposition algorithms, 1976 (from memory).
final class SquareFree {

  private SquareFree() {}

  /// The square-free factors with ascending multiplicities, pairwise coprime.
  static List<Factor> of(Polynomial polynomial) {
    List<Factor> factors = new ArrayList<>();
    Polynomial rest = polynomial;
    while (!rest.isConstant()) {
      Budget.checkpoint();
      Indeterminate main = rest.indeterminates().first();
      Polynomial content =
          rest.indeterminates().size() == 1
              ? Polynomial.ONE
              : GreatestCommonDivisor.content(rest, main);
      collect(content.isOne() ? rest : rest.dividedBy(content), main, factors);
      rest = content;
    }
    return factors;
  }

  /// Yun's algorithm on a polynomial each of whose factors contains `main`.
  private static void collect(Polynomial polynomial, Indeterminate main, List<Factor> factors) {
    Polynomial derivative = polynomial.derivative(main);
    Polynomial repeated = Polynomial.gcd(polynomial, derivative);
    if (repeated.isOne()) {
      factors.add(new Factor(polynomial.primitivePart(), 1));
      return;
    }
    Polynomial left = polynomial.dividedBy(repeated);
    Polynomial right = derivative.dividedBy(repeated).minus(left.derivative(main));
    for (int multiplicity = 1; !left.isConstant(); multiplicity++) {
      Budget.checkpoint();
      Polynomial factor = Polynomial.gcd(left, right);
      if (!factor.isConstant()) {
        factors.add(new Factor(factor, multiplicity));
      }
      left = left.dividedBy(factor);
      right = right.dividedBy(factor).minus(left.derivative(main));
    }
  }
}
