package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.LinearSystem;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/// A recurrence with polynomial coefficients that fits given numbers, with more of them than it has
/// freedom. It is a guess: nothing is known of the numbers that follow.
///
/// The shapes (order r, degree d) are tried with the fewest coefficients first; a shape counts
/// where the N − r equations leave coefficients other than 0, and at least [#LEAST_SPARE] of the
/// equations hold beyond those that determine them. Shapes that do not fit are passed over modulo a
/// prime.
///
/// @param law the recurrence, its coefficients polynomials with integer coefficients
/// @param spare how many equations hold beyond those that determine the law
public record GuessedLaw(LinearEquation law, int spare) {
  /// The least number of spare equations.
  public static final int LEAST_SPARE = 2;

  private static final long PRIME = 2_147_483_647L;

  private record Shape(int order, int degree) {
    int unknowns() {
      return (order + 1) * (degree + 1);
    }
  }

  /// A law for numbers that stand at first, first + 1, …; nothing where none fits.
  public static Optional<GuessedLaw> of(List<Rational> numbers, BigInteger first, Variable v) {
    for (Shape shape : shapes(numbers.size())) {
      Budget.checkpoint();
      if (fitsModuloPrime(numbers, first, shape)) {
        Optional<GuessedLaw> law = exact(numbers, first, shape, v);
        if (law.isPresent()) {
          return law;
        }
      }
    }
    return Optional.empty();
  }

  private static List<Shape> shapes(int count) {
    List<Shape> shapes = new ArrayList<>();
    for (int order = 0; order < count; order++) {
      for (int degree = 0; ; degree++) {
        Shape shape = new Shape(order, degree);
        if (count - order < shape.unknowns() - 1 + LEAST_SPARE) {
          break;
        }
        shapes.add(shape);
      }
    }
    shapes.sort(Comparator.comparingInt(Shape::unknowns).thenComparingInt(Shape::order));
    return shapes;
  }

  private static Optional<GuessedLaw> exact(
      List<Rational> numbers, BigInteger first, Shape shape, Variable v) {
    List<List<Form>> rows = new ArrayList<>();
    for (int n = 0; n + shape.order() < numbers.size(); n++) {
      List<Form> row = new ArrayList<>();
      Rational at = Rational.of(first.add(BigInteger.valueOf(n)));
      for (int i = 0; i <= shape.order(); i++) {
        for (int d = 0; d <= shape.degree(); d++) {
          row.add(Form.of(numbers.get(n + i).times(at.power(d))));
        }
      }
      rows.add(row);
    }
    List<List<Form>> kernel = LinearSystem.kernel(rows, shape.unknowns());
    if (kernel.isEmpty()) {
      return Optional.empty();
    }
    int spare = rows.size() - (shape.unknowns() - kernel.size());
    List<Form> coefficients = new ArrayList<>();
    for (int i = 0; i <= shape.order(); i++) {
      int from = i * (shape.degree() + 1);
      coefficients.add(
          Structure.polynomial(kernel.getFirst().subList(from, from + shape.degree() + 1), v));
    }
    LinearEquation law =
        new LinearEquation(LinearEquation.Action.SHIFT, v, coefficients, Form.ZERO).cleared();
    return Optional.of(new GuessedLaw(law, spare)).filter(found -> found.fits(numbers, first));
  }

  /// Whether the law holds of the numbers, by putting them in.
  private boolean fits(List<Rational> numbers, BigInteger first) {
    for (int n = 0; n + law.order() < numbers.size(); n++) {
      Form at = Form.of(first.add(BigInteger.valueOf(n)));
      Form sum = Form.ZERO;
      for (int i = 0; i <= law.order(); i++) {
        Form c = law.coefficients().get(i).substitute(law.variable(), at);
        sum = sum.plus(c.times(numbers.get(n + i)));
      }
      if (!sum.isZero()) {
        return false;
      }
    }
    return true;
  }

  /// Whether the equations leave a coefficient other than 0 modulo the prime; also where a number
  /// has the prime in its denominator.
  private static boolean fitsModuloPrime(List<Rational> numbers, BigInteger first, Shape shape) {
    BigInteger p = BigInteger.valueOf(PRIME);
    long[] residues = new long[numbers.size()];
    for (int n = 0; n < residues.length; n++) {
      Rational number = numbers.get(n);
      if (number.denominator().mod(p).signum() == 0) {
        return true;
      }
      BigInteger inverse = number.denominator().modInverse(p);
      residues[n] = number.numerator().mod(p).multiply(inverse).mod(p).longValue();
    }
    long start = first.mod(p).longValue();
    List<long[]> rows = new ArrayList<>();
    for (int n = 0; n + shape.order() < residues.length; n++) {
      long[] row = new long[shape.unknowns()];
      int at = 0;
      for (int i = 0; i <= shape.order(); i++) {
        long value = residues[n + i];
        for (int d = 0; d <= shape.degree(); d++) {
          row[at++] = value;
          value = value * ((start + n) % PRIME) % PRIME;
        }
      }
      rows.add(row);
    }
    return rank(rows, shape.unknowns()) < shape.unknowns();
  }

  private static int rank(List<long[]> rows, int columns) {
    int rank = 0;
    for (int column = 0; column < columns && rank < rows.size(); column++) {
      int pivot = rank;
      while (pivot < rows.size() && rows.get(pivot)[column] == 0) {
        pivot++;
      }
      if (pivot == rows.size()) {
        continue;
      }
      long[] row = rows.get(pivot);
      rows.set(pivot, rows.get(rank));
      rows.set(rank, row);
      long inverse =
          BigInteger.valueOf(row[column]).modInverse(BigInteger.valueOf(PRIME)).longValue();
      for (int i = rank + 1; i < rows.size(); i++) {
        long factor = rows.get(i)[column] * inverse % PRIME;
        for (int j = column; j < columns && factor != 0; j++) {
          rows.get(i)[j] = Math.floorMod(rows.get(i)[j] - factor * row[j] % PRIME, PRIME);
        }
      }
      rank++;
    }
    return rank;
  }
}
