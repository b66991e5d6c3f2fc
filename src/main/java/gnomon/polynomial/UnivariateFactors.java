package gnomon.polynomial;

import java.math.BigInteger;
import java.util.List;

/// Irreducible factors of primitive square-free integer polynomials in one unknown.
final class UnivariateFactors {

  private UnivariateFactors() {}

  static List<BigInteger[]> of(BigInteger[] polynomial) {
    return polynomial.length <= 2
        ? List.<BigInteger[]>of(polynomial)
        : RingsBridge.irreducibleFactors(polynomial);
  }
}
