package gnomon.polynomial;

import java.math.BigInteger;
import java.util.SortedSet;
import java.util.TreeMap;

/// Images of polynomials in several indeterminates as polynomials in one, modulo a prime: the other
/// indeterminates are set to fixed scattered residues.
final class Images {

  private static final long PRIME = 2147483629L;
  private static final long SPREAD = 1103515245L;

  private Images() {}

  /// Whether an image proves that no common divisor of two natural integer polynomials contains
  /// `indeterminate`: an image keeps the degree of every divisor when it keeps the degree of the
  /// polynomial.
  static boolean provesFree(Polynomial a, Polynomial b, Indeterminate indeterminate) {
    SortedSet<Indeterminate> all = a.indeterminates();
    all.addAll(b.indeterminates());
    TreeMap<Indeterminate, Long> points = new TreeMap<>();
    long point = 12345;
    for (Indeterminate other : all) {
      point = (point * SPREAD + 54321) % PRIME;
      points.put(other, point);
    }
    points.put(indeterminate, 0L);
    long[] left = of(a, indeterminate, points);
    long[] right = of(b, indeterminate, points);
    if (left.length - 1 != a.degree(indeterminate).intValueExact() || right.length == 0) {
      return false;
    }
    return Residues.gcd(left, right, PRIME).length == 1;
  }

  private static long[] of(
      Polynomial polynomial, Indeterminate indeterminate, TreeMap<Indeterminate, Long> points) {
    BigInteger modulus = BigInteger.valueOf(PRIME);
    long[] image = new long[polynomial.degree(indeterminate).intValueExact() + 1];
    for (Term term : polynomial.terms()) {
      long value = term.coefficient().numerator().mod(modulus).longValue();
      int place = 0;
      Monomial monomial = term.monomial();
      for (int i = 0; i < monomial.exponents.length; i++) {
        if (monomial.indeterminates[i].equals(indeterminate)) {
          place = (int) monomial.exponents[i];
        } else {
          long base = points.get(monomial.indeterminates[i]);
          value = value * Residues.power(base, monomial.exponents[i], PRIME) % PRIME;
        }
      }
      image[place] = (image[place] + value) % PRIME;
    }
    return Residues.trim(image);
  }
}
