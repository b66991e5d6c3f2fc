package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/// Integer polynomials in one unknown as ascending coefficient arrays without trailing zeros: the
/// working form of division, greatest common divisors and factors.
final class Univariate {

  private static final long LARGEST_PRIME = 2147483647L;

  private Univariate() {}

  /// The coefficients of a natural integer polynomial in which only `indeterminate` occurs.
  static BigInteger[] toArray(Polynomial polynomial, Indeterminate indeterminate) {
    int degree = polynomial.degree(indeterminate).intValueExact();
    BigInteger[] coefficients = new BigInteger[degree + 1];
    Arrays.fill(coefficients, BigInteger.ZERO);
    for (Term term : polynomial.terms()) {
      int exponent = term.monomial().exponent(indeterminate).intValueExact();
      coefficients[exponent] = term.coefficient().numerator();
    }
    return trim(coefficients);
  }

  static Polynomial toPolynomial(BigInteger[] coefficients, Indeterminate indeterminate) {
    List<Term> terms = new ArrayList<>();
    for (int i = coefficients.length - 1; i >= 0; i--) {
      if (coefficients[i].signum() != 0) {
        Monomial monomial = Monomial.of(indeterminate, Rational.of(i));
        terms.add(new Term(monomial, Rational.of(coefficients[i])));
      }
    }
    return Polynomial.ofDescending(terms);
  }

  static BigInteger[] trim(BigInteger[] coefficients) {
    int length = coefficients.length;
    while (length > 0 && coefficients[length - 1].signum() == 0) {
      length--;
    }
    return length == coefficients.length ? coefficients : Arrays.copyOf(coefficients, length);
  }

  /// The coefficients divided by their greatest common divisor, leading one positive.
  static BigInteger[] primitive(BigInteger[] coefficients) {
    BigInteger content = BigInteger.ZERO;
    for (BigInteger coefficient : coefficients) {
      content = content.gcd(coefficient);
      if (content.equals(BigInteger.ONE)) {
        break;
      }
    }
    if (coefficients.length > 0 && coefficients[coefficients.length - 1].signum() < 0) {
      content = content.negate();
    }
    return content.equals(BigInteger.ONE) ? coefficients : divideAll(coefficients, content);
  }

  private static BigInteger[] divideAll(BigInteger[] coefficients, BigInteger divisor) {
    return Arrays.stream(coefficients).map(c -> c.divide(divisor)).toArray(BigInteger[]::new);
  }

  static BigInteger[] derivative(BigInteger[] a) {
    BigInteger[] derived = new BigInteger[Math.max(0, a.length - 1)];
    for (int i = 1; i < a.length; i++) {
      derived[i - 1] = a[i].multiply(BigInteger.valueOf(i));
    }
    return derived;
  }

  static BigInteger[] minus(BigInteger[] a, BigInteger[] b) {
    BigInteger[] difference = Arrays.copyOf(a, Math.max(a.length, b.length));
    for (int i = 0; i < difference.length; i++) {
      BigInteger mine = i < a.length ? a[i] : BigInteger.ZERO;
      difference[i] = i < b.length ? mine.subtract(b[i]) : mine;
    }
    return trim(difference);
  }

  /// The quotient over the integers, when the division is exact there.
  static Optional<BigInteger[]> tryDivide(BigInteger[] a, BigInteger[] b) {
    if (a.length < b.length) {
      return a.length == 0 ? Optional.of(a) : Optional.empty();
    }
    int degree = b.length - 1;
    BigInteger[] rest = a.clone();
    BigInteger[] quotient = new BigInteger[a.length - degree];
    for (int i = a.length - 1; i >= degree; i--) {
      Budget.checkpoint();
      BigInteger[] parts = rest[i].divideAndRemainder(b[degree]);
      if (parts[1].signum() != 0) {
        return Optional.empty();
      }
      quotient[i - degree] = parts[0];
      if (parts[0].signum() != 0) {
        for (int j = 0; j < degree; j++) {
          rest[i - degree + j] = rest[i - degree + j].subtract(parts[0].multiply(b[j]));
        }
      }
    }
    for (int i = 0; i < degree; i++) {
      if (rest[i].signum() != 0) {
        return Optional.empty();
      }
    }
    return Optional.of(quotient);
  }

  /// The primes below 2^31 downward, each asked for by the one before.
  static long primeBelow(long bound) {
    long candidate = bound - 1;
    while (!BigInteger.valueOf(candidate).isProbablePrime(50)) {
      candidate--;
    }
    return candidate;
  }

  /// The primitive greatest common divisor of two primitive polynomials, from images modulo primes
  /// below 2^31, confirmed by division.
  static BigInteger[] gcd(BigInteger[] a, BigInteger[] b) {
    if (a.length == 0 || b.length == 0) {
      return a.length == 0 ? b : a;
    }
    BigInteger lead = a[a.length - 1].gcd(b[b.length - 1]);
    Images images = new Images();
    for (long prime = LARGEST_PRIME; ; prime = primeBelow(prime)) {
      Budget.checkpoint();
      long[] left = Residues.reduce(a, prime);
      long[] right = Residues.reduce(b, prime);
      if (left.length < a.length || right.length < b.length) {
        continue;
      }
      long[] image = Residues.gcd(left, right, prime);
      if (image.length == 1) {
        return new BigInteger[] {BigInteger.ONE};
      }
      long scale = lead.mod(BigInteger.valueOf(prime)).longValue();
      if (images.add(Residues.scale(image, scale, prime), prime)) {
        BigInteger[] candidate = primitive(images.symmetric());
        if (tryDivide(a, candidate).isPresent() && tryDivide(b, candidate).isPresent()) {
          return candidate;
        }
      }
    }
  }

  /// Images modulo several primes, combined by the Chinese remainder theorem.
  static final class Images {
    private BigInteger modulus = BigInteger.ONE;
    private BigInteger[] values = new BigInteger[0];

    /// Takes one more image; true when it changed nothing, so that the values are probably final.
    /// An image of lower degree than before shows that the earlier primes were unlucky.
    boolean add(long[] image, long prime) {
      BigInteger its = BigInteger.valueOf(prime);
      if (values.length == 0 || image.length < values.length) {
        modulus = its;
        values = Arrays.stream(image).mapToObj(BigInteger::valueOf).toArray(BigInteger[]::new);
        return Kronecker.bits(symmetric()) < Integer.SIZE / 2;
      }
      if (image.length > values.length) {
        return false;
      }
      boolean stable = true;
      long inverse = Residues.inverse(modulus.mod(its).longValue(), prime);
      BigInteger[] before = symmetric();
      for (int i = 0; i < image.length; i++) {
        long known = before[i].mod(its).longValue();
        stable &= known == image[i];
        long digit = Math.floorMod(image[i] - values[i].mod(its).longValue(), prime);
        values[i] = values[i].add(modulus.multiply(BigInteger.valueOf(digit * inverse % prime)));
      }
      modulus = modulus.multiply(its);
      return stable;
    }

    /// The values of least absolute size.
    BigInteger[] symmetric() {
      BigInteger half = modulus.shiftRight(1);
      return Arrays.stream(values)
          .map(value -> value.compareTo(half) > 0 ? value.subtract(modulus) : value)
          .toArray(BigInteger[]::new);
    }
  }
}
