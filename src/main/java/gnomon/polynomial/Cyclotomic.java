package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/// The cyclotomic factors of integer polynomials: the irreducible polynomials of the roots of unity
/// of each order.
///
/// A root of unity z has one of -z, z^2, -z^2 among its conjugates, by its order modulo 4. So a
/// polynomial without common factor with its images under these three maps, tested modulo a prime,
/// has none of them. Otherwise each order is tried at a root of unity modulo a prime, and confirmed
/// by division.
///
/// Source: F. Beukers, C. J. Smyth, Cyclotomic points on curves, 2002 (from memory).
final class Cyclotomic {

  private static final long PRIME = 2147483629L;
  private static final long SMALLEST_MODULUS = 1 << 16;

  private Cyclotomic() {}

  /// The cyclotomic factors of order 3 and more of a square-free polynomial.
  static List<BigInteger[]> factors(BigInteger[] polynomial) {
    if (polynomial.length <= 2 || !mayHaveSome(polynomial)) {
      return List.of();
    }
    List<BigInteger[]> found = new ArrayList<>();
    BigInteger[] rest = polynomial;
    int limit = largestOrder(polynomial.length - 1);
    for (int order = 3; order <= limit && rest.length > 2; order++) {
      Budget.checkpoint();
      if (totient(order) < rest.length && vanishes(rest, order)) {
        BigInteger[] candidate = ofOrder(order);
        var quotient = Univariate.tryDivide(rest, candidate);
        if (quotient.isPresent()) {
          found.add(candidate);
          rest = quotient.get();
        }
      }
    }
    return found;
  }

  private static boolean mayHaveSome(BigInteger[] polynomial) {
    long[] image = Residues.reduce(polynomial, PRIME);
    if (image.length < polynomial.length) {
      return true;
    }
    long[] mirrored = mirror(image);
    long[] product = Residues.times(image, mirrored, PRIME);
    long[] squared = new long[image.length];
    for (int i = 0; i < squared.length; i++) {
      squared[i] = product[2 * i];
    }
    return sharesFactor(image, mirrored)
        || sharesFactor(image, squared)
        || sharesFactor(image, mirror(squared));
  }

  private static boolean sharesFactor(long[] a, long[] b) {
    return Residues.gcd(a, b, PRIME).length != 1;
  }

  private static long[] mirror(long[] image) {
    long[] mirrored = image.clone();
    for (int i = 1; i < mirrored.length; i += 2) {
      mirrored[i] = mirrored[i] == 0 ? 0 : PRIME - mirrored[i];
    }
    return mirrored;
  }

  /// A bound for the orders whose totient is at most `degree`: order/totient is at most the product
  /// of p/(p-1) over as many primes as have a product up to 2 degree^2.
  private static int largestOrder(int degree) {
    long bound = degree;
    long primorial = 1;
    for (long p = 2; primorial * p <= 2L * degree * degree; p = DegreePatterns.primeAbove(p)) {
      primorial *= p;
      bound = bound * p / (p - 1) + 1;
    }
    return Math.toIntExact(2 * bound);
  }

  private static int totient(int order) {
    int totient = order;
    for (int p : primeDivisors(order)) {
      totient -= totient / p;
    }
    return totient;
  }

  private static List<Integer> primeDivisors(int number) {
    List<Integer> primes = new ArrayList<>();
    int rest = number;
    for (int p = 2; p * p <= rest; p++) {
      if (rest % p == 0) {
        primes.add(p);
        while (rest % p == 0) {
          rest /= p;
        }
      }
    }
    if (rest > 1) {
      primes.add(rest);
    }
    return primes;
  }

  /// Whether the polynomial vanishes at a root of unity of this order modulo a prime.
  private static boolean vanishes(BigInteger[] polynomial, int order) {
    long prime = (SMALLEST_MODULUS / order + 1) * order + 1;
    while (!BigInteger.valueOf(prime).isProbablePrime(40)) {
      prime += order;
    }
    long root = rootOfUnity(order, prime);
    return Residues.evaluate(Residues.reduce(polynomial, prime), root, prime) == 0;
  }

  private static long rootOfUnity(int order, long prime) {
    for (long base = 2; ; base++) {
      long root = Residues.power(base, (prime - 1) / order, prime);
      boolean primitive = true;
      for (int p : primeDivisors(order)) {
        primitive &= Residues.power(root, order / p, prime) != 1;
      }
      if (primitive) {
        return root;
      }
    }
  }

  /// The product of (x^(n/d) - 1)^mu(d) over the square-free divisors d of the order n.
  static BigInteger[] ofOrder(int order) {
    List<Integer> primes = primeDivisors(order);
    BigInteger[] numerator = {BigInteger.ONE};
    BigInteger[] denominator = {BigInteger.ONE};
    for (int subset = 0; subset < 1 << primes.size(); subset++) {
      int divisor = 1;
      for (int i = 0; i < primes.size(); i++) {
        divisor *= (subset >> i & 1) != 0 ? primes.get(i) : 1;
      }
      BigInteger[] factor = new BigInteger[order / divisor + 1];
      Arrays.fill(factor, BigInteger.ZERO);
      factor[0] = BigInteger.ONE.negate();
      factor[factor.length - 1] = BigInteger.ONE;
      if (Integer.bitCount(subset) % 2 == 0) {
        numerator = Kronecker.times(numerator, factor);
      } else {
        denominator = Kronecker.times(denominator, factor);
      }
    }
    return Univariate.tryDivide(numerator, denominator).orElseThrow();
  }
}
