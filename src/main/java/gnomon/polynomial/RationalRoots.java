package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// The linear factors over the rationals: roots modulo a small prime are lifted by Newton's
/// iteration until a rational root would be recognised, and each candidate is tried by division.
final class RationalRoots {

  private static final int PRIMES_COMPARED = 5;

  private RationalRoots() {}

  /// The primitive linear factors of a primitive square-free polynomial with a constant term.
  static List<BigInteger[]> linearFactors(BigInteger[] polynomial) {
    long best = 0;
    List<Long> fewest = List.of();
    long prime = 100;
    for (int compared = 0; compared < PRIMES_COMPARED; ) {
      prime = DegreePatterns.primeAbove(prime);
      long[] image = Residues.reduce(polynomial, prime);
      long[] derivative = Residues.derivative(image, prime);
      if (image.length < polynomial.length || Residues.gcd(image, derivative, prime).length != 1) {
        continue;
      }
      List<Long> roots = roots(image, prime);
      if (roots.isEmpty()) {
        return List.of();
      }
      if (best == 0 || roots.size() < fewest.size()) {
        best = prime;
        fewest = roots;
      }
      compared++;
    }
    List<BigInteger[]> factors = new ArrayList<>();
    for (long root : fewest) {
      BigInteger[] candidate = lift(polynomial, root, best);
      if (Univariate.tryDivide(polynomial, candidate).isPresent()) {
        factors.add(candidate);
      }
    }
    return factors;
  }

  private static List<Long> roots(long[] image, long prime) {
    List<Long> roots = new ArrayList<>();
    for (long point = 0; point < prime; point++) {
      if (Residues.evaluate(image, point, prime) == 0) {
        roots.add(point);
      }
    }
    return roots;
  }

  /// The linear polynomial of the only rational number that can reduce to `root`: a root u/v has u
  /// dividing the first and v the last coefficient.
  private static BigInteger[] lift(BigInteger[] polynomial, long root, long prime) {
    BigInteger lead = polynomial[polynomial.length - 1];
    BigInteger bound = lead.multiply(polynomial[0]).abs().shiftLeft(2);
    BigInteger modulus = BigInteger.valueOf(prime);
    BigInteger value = BigInteger.valueOf(root);
    BigInteger[] derivative = Univariate.derivative(polynomial);
    BigInteger inverse = evaluate(derivative, value, modulus).modInverse(modulus);
    while (modulus.compareTo(bound) <= 0) {
      modulus = modulus.multiply(modulus);
      BigInteger error = evaluate(polynomial, value, modulus);
      value = value.subtract(error.multiply(inverse)).mod(modulus);
      BigInteger slope = evaluate(derivative, value, modulus);
      inverse = inverse.multiply(BigInteger.TWO.subtract(slope.multiply(inverse))).mod(modulus);
    }
    BigInteger numerator = value.multiply(lead).mod(modulus);
    if (numerator.compareTo(modulus.shiftRight(1)) > 0) {
      numerator = numerator.subtract(modulus);
    }
    return Univariate.primitive(new BigInteger[] {numerator.negate(), lead});
  }

  private static BigInteger evaluate(
      BigInteger[] polynomial, BigInteger point, BigInteger modulus) {
    Budget.checkpoint();
    BigInteger value = BigInteger.ZERO;
    for (int i = polynomial.length - 1; i >= 0; i--) {
      value = value.multiply(point).add(polynomial[i]).mod(modulus);
    }
    return value;
  }
}
