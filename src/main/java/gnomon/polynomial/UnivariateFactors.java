package gnomon.polynomial;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// Irreducible factors of primitive square-free integer polynomials in one unknown with a constant
/// term: linear factors by lifted roots, irreducibility by the degree or by degree patterns modulo
/// small primes, and only what is left by the library Rings.
final class UnivariateFactors {

  private UnivariateFactors() {}

  static List<BigInteger[]> of(BigInteger[] polynomial) {
    if (polynomial.length <= 2) {
      return List.<BigInteger[]>of(polynomial);
    }
    List<BigInteger[]> factors = new ArrayList<>();
    BigInteger[] rest = polynomial;
    for (BigInteger[] linear : RationalRoots.linearFactors(polynomial)) {
      factors.add(linear);
      rest = Univariate.tryDivide(rest, linear).orElseThrow();
    }
    if (rest.length > 1) {
      factors.addAll(withoutRoots(rest));
    }
    return factors;
  }

  private static List<BigInteger[]> withoutRoots(BigInteger[] polynomial) {
    return polynomial.length <= 4 || new DegreePatterns(polynomial).proveIrreducible()
        ? List.<BigInteger[]>of(polynomial)
        : RingsBridge.irreducibleFactors(polynomial);
  }
}
