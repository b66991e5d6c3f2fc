package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.number.Integers;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/// Irreducible factors of primitive square-free integer polynomials in one unknown with a constant
/// term.
///
/// Cyclotomic factors are found first. A polynomial in x^k is factored in smaller degree and then
/// led back prime by prime: for irreducible h with a root a, h(x^p) is irreducible unless a is a
/// p-th power in the field of a, and then the norm of a is a p-th power too (theorem of Capelli).
/// What is left loses its linear factors by lifted roots, is proved irreducible by degree patterns
/// modulo small primes, or goes to the library Rings.
final class UnivariateFactors {

  private UnivariateFactors() {}

  static List<BigInteger[]> of(BigInteger[] polynomial) {
    List<BigInteger[]> factors = new ArrayList<>(Cyclotomic.factors(polynomial));
    BigInteger[] rest = polynomial;
    for (BigInteger[] factor : factors) {
      rest = Univariate.tryDivide(rest, factor).orElseThrow();
    }
    if (rest.length > 1) {
      int step = step(rest);
      factors.addAll(step == 1 ? plain(rest) : inflated(deflate(rest, step), step));
    }
    return factors;
  }

  /// The greatest common divisor of the exponents.
  private static int step(BigInteger[] polynomial) {
    int step = 0;
    for (int i = 1; i < polynomial.length; i++) {
      if (polynomial[i].signum() != 0) {
        step = (int) Monomial.gcd(step, i);
      }
    }
    return step;
  }

  private static BigInteger[] deflate(BigInteger[] polynomial, int step) {
    BigInteger[] deflated = new BigInteger[(polynomial.length - 1) / step + 1];
    for (int i = 0; i < deflated.length; i++) {
      deflated[i] = polynomial[step * i];
    }
    return deflated;
  }

  private static BigInteger[] inflate(BigInteger[] polynomial, int step) {
    BigInteger[] inflated = new BigInteger[(polynomial.length - 1) * step + 1];
    Arrays.fill(inflated, BigInteger.ZERO);
    for (int i = 0; i < polynomial.length; i++) {
      inflated[step * i] = polynomial[i];
    }
    return inflated;
  }

  /// The factors of g(x^step).
  private static List<BigInteger[]> inflated(BigInteger[] polynomial, int step) {
    List<BigInteger[]> factors = of(polynomial);
    int rest = step;
    for (int p = 2; rest > 1; p++) {
      while (rest % p == 0) {
        Budget.checkpoint();
        List<BigInteger[]> next = new ArrayList<>();
        for (BigInteger[] factor : factors) {
          BigInteger[] larger = inflate(factor, p);
          if (rootMayBePower(factor, p)) {
            next.addAll(plain(larger));
          } else {
            next.add(larger);
          }
        }
        factors = next;
        rest /= p;
      }
    }
    return factors;
  }

  /// Whether the norm of a root, the quotient of the outer coefficients up to sign, is a p-th
  /// power.
  private static boolean rootMayBePower(BigInteger[] polynomial, int p) {
    int degree = polynomial.length - 1;
    BigInteger lead = polynomial[degree];
    BigInteger last = degree % 2 == 0 ? polynomial[0] : polynomial[0].negate();
    BigInteger common = lead.gcd(last);
    return isPower(last.divide(common), p) && isPower(lead.divide(common), p);
  }

  private static boolean isPower(BigInteger number, int p) {
    return number.equals(BigInteger.ONE) || Integers.root(number, p).isPresent();
  }

  private static List<BigInteger[]> plain(BigInteger[] polynomial) {
    List<BigInteger[]> factors = new ArrayList<>();
    BigInteger[] rest = polynomial;
    if (polynomial.length > 2) {
      for (BigInteger[] linear : RationalRoots.linearFactors(polynomial)) {
        Optional<BigInteger[]> quotient = Univariate.tryDivide(rest, linear);
        factors.add(linear);
        rest = quotient.orElseThrow();
      }
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
