package gnomon.series;

import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import java.math.BigInteger;
import java.util.AbstractList;
import java.util.Arrays;
import java.util.List;
import java.util.RandomAccess;

/// Rational coefficients as integers over one common denominator, so that long sums of products
/// need a single reduction.
final class ScaledRationals extends AbstractList<Rational> implements RandomAccess {

  private final BigInteger[] numerators;
  private final BigInteger denominator;

  private ScaledRationals(BigInteger[] numerators, BigInteger denominator) {
    this.numerators = numerators;
    this.denominator = denominator;
  }

  static ScaledRationals of(List<Rational> values) {
    if (values instanceof ScaledRationals scaled) {
      return scaled;
    }
    BigInteger common = BigInteger.ONE;
    for (Rational value : values) {
      BigInteger its = value.denominator();
      if (!its.equals(BigInteger.ONE)) {
        common = common.divide(common.gcd(its)).multiply(its);
      }
    }
    BigInteger[] numerators = new BigInteger[values.size()];
    for (int i = 0; i < numerators.length; i++) {
      Rational value = values.get(i);
      numerators[i] = value.numerator().multiply(common.divide(value.denominator()));
    }
    return new ScaledRationals(numerators, common);
  }

  /// The same values over the least common denominator.
  private static ScaledRationals lowest(BigInteger[] numerators, BigInteger denominator) {
    BigInteger common = denominator;
    for (int i = 0; i < numerators.length && !common.equals(BigInteger.ONE); i++) {
      common = common.gcd(numerators[i]);
    }
    if (common.equals(BigInteger.ONE)) {
      return new ScaledRationals(numerators, denominator);
    }
    BigInteger[] reduced = new BigInteger[numerators.length];
    for (int i = 0; i < reduced.length; i++) {
      reduced[i] = numerators[i].divide(common);
    }
    return new ScaledRationals(reduced, denominator.divide(common));
  }

  @Override
  public Rational get(int index) {
    return Rational.of(numerators[index], denominator);
  }

  @Override
  public int size() {
    return numerators.length;
  }

  /// The first `length` values, zeros where there are no more.
  ScaledRationals resized(int length) {
    BigInteger[] resized = Arrays.copyOf(numerators, length);
    for (int i = numerators.length; i < length; i++) {
      resized[i] = BigInteger.ZERO;
    }
    return new ScaledRationals(resized, denominator);
  }

  /// The first `length` coefficients of the product.
  ScaledRationals times(ScaledRationals that, int length) {
    DensePolynomial left = DensePolynomial.ofIntegers(cut(numerators, length));
    DensePolynomial right = DensePolynomial.ofIntegers(cut(that.numerators, length));
    DensePolynomial product = left.times(right);
    BigInteger[] result = new BigInteger[length];
    for (int i = 0; i < length; i++) {
      result[i] = product.coefficient(i).numerator();
    }
    return lowest(result, denominator.multiply(that.denominator));
  }

  private static BigInteger[] cut(BigInteger[] values, int length) {
    return values.length <= length ? values : Arrays.copyOf(values, length);
  }

  /// The sum, to the length of this list.
  ScaledRationals plus(ScaledRationals that) {
    BigInteger gcd = denominator.gcd(that.denominator);
    BigInteger mine = that.denominator.divide(gcd);
    BigInteger its = denominator.divide(gcd);
    BigInteger[] result = new BigInteger[numerators.length];
    for (int i = 0; i < result.length; i++) {
      result[i] = numerators[i].multiply(mine);
      if (i < that.numerators.length) {
        result[i] = result[i].add(that.numerators[i].multiply(its));
      }
    }
    return lowest(result, denominator.multiply(mine));
  }

  /// Every value multiplied by the factor.
  ScaledRationals times(Rational factor) {
    BigInteger[] result = new BigInteger[numerators.length];
    for (int i = 0; i < result.length; i++) {
      result[i] = numerators[i].multiply(factor.numerator());
    }
    return lowest(result, denominator.multiply(factor.denominator()));
  }

  /// The coefficients of the derivative.
  ScaledRationals derivative() {
    BigInteger[] result = new BigInteger[Math.max(0, numerators.length - 1)];
    for (int i = 0; i < result.length; i++) {
      result[i] = numerators[i + 1].multiply(BigInteger.valueOf(i + 1L));
    }
    return lowest(result, denominator);
  }

  /// The coefficients of the integral that vanishes at 0.
  ScaledRationals integral() {
    BigInteger common = BigInteger.ONE;
    for (int i = 2; i <= numerators.length; i++) {
      BigInteger step = BigInteger.valueOf(i);
      common = common.divide(common.gcd(step)).multiply(step);
    }
    BigInteger[] result = new BigInteger[numerators.length + 1];
    result[0] = BigInteger.ZERO;
    for (int i = 1; i < result.length; i++) {
      result[i] = numerators[i - 1].multiply(common.divide(BigInteger.valueOf(i)));
    }
    return lowest(result, denominator.multiply(common));
  }

  /// Σ a_i b_(n−i).
  Rational convolution(ScaledRationals that, int n) {
    BigInteger sum = BigInteger.ZERO;
    for (int i = Math.max(0, n - that.size() + 1); i <= n && i < size(); i++) {
      sum = sum.add(numerators[i].multiply(that.numerators[n - i]));
    }
    return Rational.of(sum, denominator.multiply(that.denominator));
  }

  /// Σ_j weights_(from+j)·lists_j over all the lists for which there is a weight.
  static ScaledRationals combination(
      ScaledRationals weights, int from, List<ScaledRationals> lists, int length) {
    BigInteger common = BigInteger.ONE;
    for (ScaledRationals list : lists) {
      common = common.divide(common.gcd(list.denominator)).multiply(list.denominator);
    }
    BigInteger[] sums = new BigInteger[length];
    Arrays.fill(sums, BigInteger.ZERO);
    for (int j = 0; j < lists.size() && from + j < weights.size(); j++) {
      ScaledRationals list = lists.get(j);
      BigInteger weight = weights.numerators[from + j].multiply(common.divide(list.denominator));
      for (int i = 0; i < length && weight.signum() != 0; i++) {
        sums[i] = sums[i].add(list.numerators[i].multiply(weight));
      }
    }
    return lowest(sums, common.multiply(weights.denominator));
  }
}
