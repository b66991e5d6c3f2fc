package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/// Greatest common divisors by evaluation at a large integer: the divisor of the values, written in
/// the base of that integer with symmetric digits, is the divisor of the polynomials when it
/// divides both, which is checked. Gives up, without an answer, when the integers grow long.
///
/// Source: B. W. Char, K. O. Geddes, G. H. Gonnet, the heuristic polynomial GCD algorithm, 1989
/// (from memory).
final class HeuristicGcd {

  private static final int ATTEMPTS = 4;
  private static final long MAX_BITS = 1 << 15;

  private HeuristicGcd() {}

  /// For primitive natural integer polynomials.
  static Optional<Polynomial> of(Polynomial a, Polynomial b) {
    return estimatedBits(a, b) > MAX_BITS
        ? Optional.empty()
        : integral(a, b).map(Polynomial::primitivePart);
  }

  /// The length of the integers after all indeterminates have been replaced.
  private static long estimatedBits(Polynomial a, Polynomial b) {
    long bits = height(a).min(height(b)).bitLength() + 2L;
    for (Indeterminate indeterminate : a.indeterminates()) {
      long degree =
          Math.max(
              a.degree(indeterminate).intValueExact(), b.degree(indeterminate).intValueExact());
      bits = Math.min(bits * (degree + 1), Integer.MAX_VALUE);
    }
    return bits;
  }

  /// The divisor over the integers, with its integer content.
  private static Optional<Polynomial> integral(Polynomial a, Polynomial b) {
    Rational mine = a.content().abs();
    Rational its = b.content().abs();
    Rational content = Rational.of(mine.numerator().gcd(its.numerator()));
    if (a.isConstant() || b.isConstant()) {
      return Optional.of(Polynomial.of(content));
    }
    return primitive(a.dividedBy(mine), b.dividedBy(its)).map(gcd -> gcd.times(content));
  }

  private static Optional<Polynomial> primitive(Polynomial a, Polynomial b) {
    Indeterminate main = a.indeterminates().first();
    if (!b.contains(main)) {
      main = b.indeterminates().first();
    }
    BigInteger point = height(a).min(height(b)).shiftLeft(1).add(BigInteger.valueOf(29));
    int degree = Math.max(a.degree(main).intValueExact(), b.degree(main).intValueExact());
    for (int attempt = 0; attempt < ATTEMPTS; attempt++) {
      Budget.checkpoint();
      if ((long) degree * point.bitLength() > MAX_BITS) {
        return Optional.empty();
      }
      Polynomial value = Polynomial.of(Rational.of(point));
      Optional<Polynomial> common =
          integral(substitute(a, main, value), substitute(b, main, value));
      if (common.isEmpty()) {
        return Optional.empty();
      }
      Polynomial candidate = digits(common.get(), point, main).primitivePart();
      if (a.tryDividedBy(candidate).isPresent() && b.tryDividedBy(candidate).isPresent()) {
        return Optional.of(candidate);
      }
      point = point.multiply(BigInteger.valueOf(73794)).divide(BigInteger.valueOf(27011));
    }
    return Optional.empty();
  }

  private static Polynomial substitute(Polynomial a, Indeterminate main, Polynomial value) {
    return a.contains(main) ? a.substitute(main, value) : a;
  }

  private static BigInteger height(Polynomial polynomial) {
    return polynomial.terms().stream()
        .map(term -> term.coefficient().numerator().abs())
        .reduce(BigInteger.ZERO, BigInteger::max);
  }

  /// The polynomial in `main` whose value at `point` is `value`, with digits of least size.
  private static Polynomial digits(Polynomial value, BigInteger point, Indeterminate main) {
    BigInteger half = point.shiftRight(1);
    SortedMap<Rational, List<Term>> digits = new TreeMap<>();
    for (Term term : value.terms()) {
      BigInteger rest = term.coefficient().numerator();
      for (int place = 0; rest.signum() != 0; place++) {
        BigInteger digit = rest.mod(point);
        if (digit.compareTo(half) > 0) {
          digit = digit.subtract(point);
        }
        if (digit.signum() != 0) {
          digits
              .computeIfAbsent(Rational.of(place), _ -> new ArrayList<>())
              .add(new Term(term.monomial(), Rational.of(digit)));
        }
        rest = rest.subtract(digit).divide(point);
      }
    }
    Map<Rational, Polynomial> coefficients = new TreeMap<>();
    digits.forEach((place, terms) -> coefficients.put(place, Polynomial.ofDistinct(terms)));
    return Polynomial.ofCoefficients(main, coefficients);
  }
}
