package gnomon.polynomial;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Iterator;
import java.util.List;
import java.util.function.LongBinaryOperator;

/// A product of powers of indeterminates, with rational exponents.
///
/// The order is graded: by total degree, then by the exponent of the first indeterminate on which
/// two monomials differ, larger exponent first in descending order. It respects multiplication.
/// Exponents are kept as machine integers over one common denominator.
public final class Monomial implements Comparable<Monomial> {

  /// The empty product.
  public static final Monomial ONE = new Monomial(new Indeterminate[0], new long[0], 1);

  final Indeterminate[] indeterminates;
  final long[] exponents;
  final long denominator;
  private final long total;
  private final int hash;

  /// One power in a monomial.
  ///
  /// @param indeterminate what is raised
  /// @param exponent the exponent, not zero
  public record Power(Indeterminate indeterminate, Rational exponent) {}

  private Monomial(Indeterminate[] indeterminates, long[] exponents, long denominator) {
    this.indeterminates = indeterminates;
    this.exponents = exponents;
    this.denominator = denominator;
    long sum = 0;
    int mixed = Long.hashCode(denominator);
    for (int i = 0; i < exponents.length; i++) {
      sum = Math.addExact(sum, exponents[i]);
      mixed = 31 * mixed + (indeterminates[i].hashCode() ^ Long.hashCode(exponents[i] * 0x9E37L));
    }
    this.total = sum;
    this.hash = mixed;
  }

  /// The power `indeterminate^exponent`.
  public static Monomial of(Indeterminate indeterminate, Rational exponent) {
    return exponent.isZero()
        ? ONE
        : new Monomial(
            new Indeterminate[] {indeterminate},
            new long[] {small(exponent)},
            small(Rational.of(exponent.denominator())));
  }

  /// The numerator as a machine integer, when numerator and denominator both are.
  private static long small(Rational exponent) {
    if (exponent.bitLength() >= Long.SIZE - 1) {
      throw new Refusal(Reason.EXPONENT_TOO_LARGE, exponent);
    }
    return exponent.numerator().longValueExact();
  }

  /// The monomial with `exponents[i]/denominator` on `indeterminates[i]`, which must ascend; zero
  /// exponents are dropped. Takes ownership of neither array.
  static Monomial of(Indeterminate[] indeterminates, long[] exponents, long denominator) {
    int used = 0;
    long common = denominator;
    for (long exponent : exponents) {
      if (exponent != 0) {
        used++;
        common = common == 1 ? 1 : gcd(common, Math.abs(exponent));
      }
    }
    if (used == 0) {
      return ONE;
    }
    if (used == exponents.length && common == 1) {
      return new Monomial(indeterminates, exponents, denominator);
    }
    Indeterminate[] kept = new Indeterminate[used];
    long[] reduced = new long[used];
    int next = 0;
    for (int i = 0; i < exponents.length; i++) {
      if (exponents[i] != 0) {
        kept[next] = indeterminates[i];
        reduced[next++] = exponents[i] / common;
      }
    }
    return new Monomial(kept, reduced, denominator / common);
  }

  static long gcd(long a, long b) {
    while (b != 0) {
      long rest = a % b;
      a = b;
      b = rest;
    }
    return a;
  }

  static long lcm(long a, long b) {
    return a == b ? a : Math.multiplyExact(a / gcd(a, b), b);
  }

  /// The exponent of `indeterminate`, 0 where it does not occur.
  public Rational exponent(Indeterminate indeterminate) {
    int place = Arrays.binarySearch(indeterminates, indeterminate);
    return place < 0 ? Rational.ZERO : Rational.of(exponents[place], denominator);
  }

  /// Whether `indeterminate` occurs.
  public boolean contains(Indeterminate indeterminate) {
    return Arrays.binarySearch(indeterminates, indeterminate) >= 0;
  }

  /// The powers, by ascending indeterminate.
  public List<Power> factors() {
    List<Power> powers = new ArrayList<>(exponents.length);
    for (int i = 0; i < exponents.length; i++) {
      powers.add(new Power(indeterminates[i], Rational.of(exponents[i], denominator)));
    }
    return powers;
  }

  /// The sum of all exponents.
  public Rational totalDegree() {
    return Rational.of(total, denominator);
  }

  /// Whether this is the empty product.
  public boolean isOne() {
    return exponents.length == 0;
  }

  /// Whether every exponent is an integer at least 0.
  public boolean isNatural() {
    if (denominator != 1) {
      return false;
    }
    for (long exponent : exponents) {
      if (exponent < 0) {
        return false;
      }
    }
    return true;
  }

  /// The product: exponents add.
  ///
  /// @throws Refusal with [Reason#EXPONENT_TOO_LARGE] when an exponent leaves the range
  public Monomial times(Monomial other) {
    if (other.isOne()) {
      return this;
    }
    return isOne() ? other : combine(other, Math::addExact);
  }

  /// The quotient: exponents subtract, and may become negative.
  ///
  /// @throws Refusal with [Reason#EXPONENT_TOO_LARGE] when an exponent leaves the range
  public Monomial dividedBy(Monomial other) {
    return other.isOne() ? this : combine(other, Math::subtractExact);
  }

  /// The greatest common divisor: the smaller of both exponents, 0 where one does not occur.
  public Monomial gcd(Monomial other) {
    return equals(other) ? this : combine(other, Math::min);
  }

  /// The least common multiple: the larger of both exponents, 0 where one does not occur.
  public Monomial lcm(Monomial other) {
    return equals(other) ? this : combine(other, Math::max);
  }

  private Monomial combine(Monomial other, LongBinaryOperator operation) {
    try {
      long common = lcm(denominator, other.denominator);
      long left = common / denominator;
      long right = common / other.denominator;
      if (Arrays.equals(indeterminates, other.indeterminates)) {
        long[] sums = new long[exponents.length];
        for (int i = 0; i < sums.length; i++) {
          sums[i] =
              operation.applyAsLong(
                  Math.multiplyExact(exponents[i], left),
                  Math.multiplyExact(other.exponents[i], right));
        }
        return of(indeterminates, sums, common);
      }
      return merge(other, operation, left, right, common);
    } catch (ArithmeticException overflow) {
      throw new Refusal(Reason.EXPONENT_TOO_LARGE);
    }
  }

  private Monomial merge(
      Monomial other, LongBinaryOperator operation, long left, long right, long common) {
    Indeterminate[] names = new Indeterminate[exponents.length + other.exponents.length];
    long[] values = new long[names.length];
    int i = 0;
    int j = 0;
    int next = 0;
    while (i < exponents.length || j < other.exponents.length) {
      int side = side(other, i, j);
      names[next] = side <= 0 ? indeterminates[i] : other.indeterminates[j];
      long mine = side <= 0 ? Math.multiplyExact(exponents[i++], left) : 0;
      long its = side >= 0 ? Math.multiplyExact(other.exponents[j++], right) : 0;
      values[next++] = operation.applyAsLong(mine, its);
    }
    return of(Arrays.copyOf(names, next), Arrays.copyOf(values, next), common);
  }

  /// Negative when the next indeterminate is ours alone, positive when it is only the other's.
  private int side(Monomial other, int i, int j) {
    if (i == exponents.length) {
      return 1;
    }
    return j == other.exponents.length ? -1 : indeterminates[i].compareTo(other.indeterminates[j]);
  }

  /// Every exponent multiplied by `exponent`.
  ///
  /// @throws Refusal with [Reason#EXPONENT_TOO_LARGE] when an exponent leaves the range
  public Monomial power(Rational exponent) {
    if (exponent.isOne() || isOne()) {
      return this;
    }
    if (exponent.isZero()) {
      return ONE;
    }
    long numerator = small(exponent);
    try {
      long[] products = new long[exponents.length];
      for (int i = 0; i < products.length; i++) {
        products[i] = Math.multiplyExact(exponents[i], numerator);
      }
      long scale = exponent.denominator().longValueExact();
      return of(indeterminates, products, Math.multiplyExact(denominator, scale));
    } catch (ArithmeticException overflow) {
      throw new Refusal(Reason.EXPONENT_TOO_LARGE);
    }
  }

  /// The product of the powers of all other indeterminates.
  public Monomial without(Indeterminate indeterminate) {
    int place = Arrays.binarySearch(indeterminates, indeterminate);
    if (place < 0) {
      return this;
    }
    long[] kept = exponents.clone();
    kept[place] = 0;
    return of(indeterminates, kept, denominator);
  }

  /// Negative when this comes after `other` in a descending list of terms.
  @Override
  public int compareTo(Monomial other) {
    if (denominator == other.denominator) {
      return total != other.total ? Long.compare(total, other.total) : compareExponents(other);
    }
    int degrees = totalDegree().compareTo(other.totalDegree());
    return degrees != 0 ? degrees : compareExponents(other);
  }

  private int compareExponents(Monomial other) {
    int i = 0;
    int j = 0;
    while (i < exponents.length || j < other.exponents.length) {
      int side = side(other, i, j);
      long mine = side <= 0 ? exponents[i++] : 0;
      long its = side >= 0 ? other.exponents[j++] : 0;
      int order =
          denominator == other.denominator
              ? Long.compare(mine, its)
              : Rational.of(mine, denominator).compareTo(Rational.of(its, other.denominator));
      if (order != 0) {
        return order;
      }
    }
    return 0;
  }

  @Override
  public boolean equals(Object object) {
    return this == object
        || object instanceof Monomial other
            && hash == other.hash
            && denominator == other.denominator
            && Arrays.equals(exponents, other.exponents)
            && Arrays.equals(indeterminates, other.indeterminates);
  }

  @Override
  public int hashCode() {
    return hash;
  }

  /// The powers joined by `*`, for diagnosis only.
  @Override
  public String toString() {
    StringBuilder text = new StringBuilder();
    for (Iterator<Power> powers = factors().iterator(); powers.hasNext(); ) {
      Power power = powers.next();
      text.append(power.indeterminate());
      if (!power.exponent().isOne()) {
        text.append('^').append(power.exponent().isInteger() ? "" : "(");
        text.append(power.exponent()).append(power.exponent().isInteger() ? "" : ")");
      }
      text.append(powers.hasNext() ? "*" : "");
    }
    return isOne() ? "1" : text.toString();
  }
}
