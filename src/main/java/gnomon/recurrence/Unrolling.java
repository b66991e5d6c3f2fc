package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/// The values of a solution of a recurrence with rational coefficients, from its first values on,
/// in integers over a common denominator.
///
/// The steps of a block are multiplied together as matrices by halving the block, and then applied
/// to the values at once, so that long numbers meet long numbers only once in a block; what the
/// denominator of the block and the values have in common is taken out. A right side is carried
/// along by its own ratio.
public final class Unrolling {
  private static final int BLOCK = 4096;

  private final List<IntegerPolynomial> coefficients;
  private final Optional<List<IntegerPolynomial>> ratio;
  private final BigInteger first;
  private final List<BigInteger> start;
  private final BigInteger startDenominator;
  private BigInteger position;
  private BigInteger[] values;
  private BigInteger denominator;

  private Unrolling(
      List<IntegerPolynomial> coefficients,
      Optional<List<IntegerPolynomial>> ratio,
      BigInteger first,
      List<Rational> initial) {
    this.coefficients = coefficients;
    this.ratio = ratio;
    this.first = first;
    BigInteger common = BigInteger.ONE;
    for (Rational value : initial) {
      common = common.divide(common.gcd(value.denominator())).multiply(value.denominator());
    }
    Rational scale = Rational.of(common);
    this.start = initial.stream().map(v -> v.times(scale).numerator()).toList();
    this.startDenominator = common;
    rewind();
  }

  private void rewind() {
    position = first;
    values = start.toArray(BigInteger[]::new);
    denominator = startDenominator;
  }

  /// The values from the first J on, which stand at `first`, `first` + 1, …; nothing where the
  /// coefficients are not rational over ℚ, or the right side is not one hypergeometric term with
  /// rational values. The leading coefficient must not vanish from `first` on.
  public static Optional<Unrolling> of(
      LinearEquation equation, BigInteger first, List<Rational> initial, BigInteger last) {
    Variable v = equation.variable();
    if (!equation.hasRationalCoefficients()) {
      return Optional.empty();
    }
    LinearEquation cleared = equation.cleared();
    List<Form> forms = new ArrayList<>(cleared.coefficients());
    List<Rational> values = new ArrayList<>(initial);
    Optional<List<IntegerPolynomial>> ratio = Optional.empty();
    if (!cleared.rightSide().isZero()) {
      forms.add(Form.ONE);
      Form right = cleared.rightSide();
      Form step = right.substitute(v, Form.of(v).plus(Form.ONE)).dividedBy(right);
      Optional<Rational> value = right.substitute(v, Form.of(first)).asRational();
      ratio =
          Structure.isRationalIn(step, v)
              ? IntegerPolynomial.together(
                  List.of(Form.of(step.numerator()), Form.of(step.denominator())), v)
              : Optional.empty();
      if (value.isEmpty()
          || ratio.isEmpty()
          || ratio.get().stream().anyMatch(p -> p.vanishesBetween(first, last))) {
        return Optional.empty();
      }
      values.add(value.get());
    }
    Optional<List<IntegerPolynomial>> whole = IntegerPolynomial.together(forms, v);
    boolean defined =
        whole.filter(list -> !list.get(equation.order()).vanishesBetween(first, last)).isPresent();
    if (!defined || initial.size() != equation.order()) {
      return Optional.empty();
    }
    return Optional.of(new Unrolling(whole.get(), ratio, first, values));
  }

  /// The value at a point not before the first.
  public Rational at(BigInteger point) {
    if (point.compareTo(position) < 0) {
      rewind();
    }
    while (position.compareTo(point) < 0) {
      long steps = point.subtract(position).min(BigInteger.valueOf(BLOCK)).longValue();
      advance(steps);
    }
    return Rational.of(values[0], denominator);
  }

  private void advance(long steps) {
    Step step = product(position, 0, steps);
    BigInteger[] next = new BigInteger[values.length];
    for (int i = 0; i < next.length; i++) {
      BigInteger sum = BigInteger.ZERO;
      for (int j = 0; j < values.length; j++) {
        sum = sum.add(step.matrix()[i][j].multiply(values[j]));
      }
      next[i] = sum;
    }
    BigInteger common = step.denominator().abs();
    for (BigInteger value : next) {
      common = common.gcd(value.mod(step.denominator().abs()));
    }
    for (int i = 0; i < next.length; i++) {
      next[i] = next[i].divide(common);
    }
    values = next;
    denominator = denominator.multiply(step.denominator().divide(common));
    position = position.add(BigInteger.valueOf(steps));
  }

  /// The values after a number of steps are matrix · values / denominator.
  private record Step(BigInteger[][] matrix, BigInteger denominator) {}

  private Step product(BigInteger base, long from, long to) {
    Budget.checkpoint();
    if (to - from == 1) {
      return single(base.add(BigInteger.valueOf(from)));
    }
    long middle = (from + to) >>> 1;
    Step early = product(base, from, middle);
    Step late = product(base, middle, to);
    int size = values.length;
    BigInteger[][] matrix = new BigInteger[size][size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        BigInteger sum = BigInteger.ZERO;
        for (int k = 0; k < size; k++) {
          BigInteger left = late.matrix()[i][k];
          BigInteger right = early.matrix()[k][j];
          if (left.signum() != 0 && right.signum() != 0) {
            sum = sum.add(left.multiply(right));
          }
        }
        matrix[i][j] = sum;
      }
    }
    return new Step(matrix, late.denominator().multiply(early.denominator()));
  }

  private Step single(BigInteger point) {
    int order = start.size() - (ratio.isPresent() ? 1 : 0);
    int size = start.size();
    BigInteger leading = coefficients.get(order).at(point);
    BigInteger below = ratio.map(r -> r.getLast().at(point)).orElse(BigInteger.ONE);
    BigInteger[][] matrix = new BigInteger[size][size];
    for (BigInteger[] row : matrix) {
      Arrays.fill(row, BigInteger.ZERO);
    }
    for (int i = 0; i + 1 < order; i++) {
      matrix[i][i + 1] = leading.multiply(below);
    }
    for (int j = 0; j < order; j++) {
      matrix[order - 1][j] = coefficients.get(j).at(point).negate().multiply(below);
    }
    if (ratio.isPresent()) {
      matrix[order - 1][order] = coefficients.get(order + 1).at(point).multiply(below);
      matrix[order][order] = ratio.get().getFirst().at(point).multiply(leading);
    }
    return new Step(matrix, leading.multiply(below));
  }
}
