package gnomon.polynomial;

import gnomon.number.RandomNumbers;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/// Random polynomials in the letters x, y, z.
final class RandomPolynomials {

  static final Indeterminate X = new Letter("x");
  static final Indeterminate Y = new Letter("y");
  static final Indeterminate Z = new Letter("z");
  private static final List<Indeterminate> LETTERS = List.of(X, Y, Z);

  /// An indeterminate that is nothing but a name.
  record Letter(String name) implements Indeterminate {
    @Override
    public int compareTo(Indeterminate other) {
      return name.compareTo(((Letter) other).name);
    }

    @Override
    public String toString() {
      return name;
    }
  }

  private RandomPolynomials() {}

  /// How random exponents look.
  enum Exponents {
    NATURAL,
    ANY
  }

  static Polynomial of(
      RandomGenerator random, int letters, int terms, int degree, Exponents exponents) {
    List<Term> parts = new ArrayList<>();
    int count = random.nextInt(terms + 1);
    for (int i = 0; i < count; i++) {
      Monomial monomial = Monomial.ONE;
      for (Indeterminate letter : LETTERS.subList(0, letters)) {
        if (random.nextInt(3) > 0) {
          monomial = monomial.times(Monomial.of(letter, exponent(random, degree, exponents)));
        }
      }
      parts.add(new Term(monomial, coefficient(random)));
    }
    return Polynomial.ofTerms(parts);
  }

  private static Rational exponent(RandomGenerator random, int degree, Exponents exponents) {
    return switch (exponents) {
      case NATURAL -> Rational.of(random.nextInt(degree + 1));
      case ANY -> Rational.of(random.nextInt(-degree, degree + 1), 1 + random.nextInt(3));
    };
  }

  private static Rational coefficient(RandomGenerator random) {
    return switch (random.nextInt(8)) {
      case 0 -> RandomNumbers.rational(random);
      case 1 -> Rational.of(random.nextLong());
      case 2 -> Rational.of(random.nextInt(-9, 10), 1 + random.nextInt(6));
      default -> Rational.of(random.nextInt(-9, 10));
    };
  }

  static DensePolynomial dense(RandomGenerator random, int length) {
    List<Rational> coefficients = new ArrayList<>();
    int count = random.nextInt(length + 1);
    for (int i = 0; i < count; i++) {
      coefficients.add(coefficient(random));
    }
    return DensePolynomial.of(coefficients);
  }

  static BigInteger[] integers(RandomGenerator random, int length, int bits) {
    BigInteger[] values = new BigInteger[length];
    for (int i = 0; i < length; i++) {
      values[i] = RandomNumbers.integer(random, bits);
    }
    return values;
  }
}
