package gnomon.polynomial;

import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;

/// Irreducible factors of natural, primitive, square-free polynomials without monomial content.
final class Irreducibles {

  private static final int IMAGES = 3;

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
    Indeterminate main = lowest(polynomial, indeterminates);
    Polynomial content = GreatestCommonDivisor.content(polynomial, main);
    if (content.isOne()) {
      return primitive(polynomial, main);
    }
    List<Polynomial> factors = new ArrayList<>(of(content));
    factors.addAll(of(polynomial.dividedBy(content)));
    return factors;
  }

  /// The indeterminate of lowest degree.
  private static Indeterminate lowest(
      Polynomial polynomial, SortedSet<Indeterminate> indeterminates) {
    Indeterminate lowest = indeterminates.first();
    for (Indeterminate indeterminate : indeterminates) {
      if (polynomial.degree(indeterminate).compareTo(polynomial.degree(lowest)) < 0) {
        lowest = indeterminate;
      }
    }
    return lowest;
  }

  /// Without content in `main`: degree 1 is irreducible, degree 2 is decided by the discriminant,
  /// and an irreducible image of full degree proves irreducibility.
  private static List<Polynomial> primitive(Polynomial polynomial, Indeterminate main) {
    int degree = polynomial.degree(main).intValueExact();
    if (degree == 1) {
      return List.of(polynomial);
    }
    if (degree == 2) {
      return quadratic(polynomial, main);
    }
    for (int start = 2; start < 2 + IMAGES; start++) {
      if (imageIsIrreducible(polynomial, main, start)) {
        return List.of(polynomial);
      }
    }
    return RingsBridge.irreducibleFactors(polynomial);
  }

  private static List<Polynomial> quadratic(Polynomial polynomial, Indeterminate main) {
    var coefficients = polynomial.coefficients(main);
    Polynomial a = coefficients.get(Rational.TWO);
    Polynomial b = coefficients.getOrDefault(Rational.ONE, Polynomial.ZERO);
    Polynomial c = coefficients.getOrDefault(Rational.ZERO, Polynomial.ZERO);
    Polynomial discriminant = b.times(b).minus(a.times(c).times(Rational.of(4)));
    Optional<Polynomial> root = PolynomialRoot.square(discriminant);
    if (root.isEmpty()) {
      return List.of(polynomial);
    }
    Polynomial lower = a.times(Rational.TWO).times(Polynomial.of(main)).plus(b).minus(root.get());
    Polynomial content = GreatestCommonDivisor.content(lower, main);
    Polynomial factor = lower.dividedBy(content).primitivePart();
    return List.of(factor, polynomial.dividedBy(factor).primitivePart());
  }

  /// Whether the polynomial in `main` alone, got by setting all others to integers from `start`, is
  /// square-free of the same degree and irreducible.
  private static boolean imageIsIrreducible(Polynomial polynomial, Indeterminate main, int start) {
    Polynomial image = polynomial;
    int value = start;
    for (Indeterminate other : polynomial.indeterminates()) {
      if (!other.equals(main)) {
        value = value * 3 % 101 + 1;
        if (image.contains(other)) {
          image = image.substitute(other, Polynomial.of(value));
        }
      }
    }
    if (!image.degree(main).equals(polynomial.degree(main))) {
      return false;
    }
    BigInteger[] coefficients = Univariate.primitive(Univariate.toArray(image, main));
    return coefficients[0].signum() != 0
        && Univariate.gcd(coefficients, Univariate.primitive(Univariate.derivative(coefficients)))
                .length
            == 1
        && new DegreePatterns(coefficients).proveIrreducible();
  }
}
