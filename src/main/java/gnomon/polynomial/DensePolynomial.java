package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.algebra.Ring;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/// A polynomial in one unnamed unknown over the rationals, as the list of all its coefficients:
/// integers over one common denominator.
///
/// Made for high degrees: products are quasi-linear (Kronecker substitution), shifts and the change
/// between powers and falling powers go by divide and conquer.
public final class DensePolynomial implements Ring<DensePolynomial> {

  /// The polynomial 0.
  public static final DensePolynomial ZERO = new DensePolynomial(new BigInteger[0], BigInteger.ONE);

  /// The polynomial 1.
  public static final DensePolynomial ONE = ofIntegers(BigInteger.ONE);

  /// The unknown itself.
  public static final DensePolynomial UNKNOWN = ofIntegers(BigInteger.ZERO, BigInteger.ONE);

  private final BigInteger[] numerators;
  private final BigInteger denominator;

  /// A quotient with its remainder.
  ///
  /// @param quotient the quotient
  /// @param remainder what is left, of lower degree than the divisor
  public record Division(DensePolynomial quotient, DensePolynomial remainder) {}

  private DensePolynomial(BigInteger[] numerators, BigInteger denominator) {
    this.numerators = numerators;
    this.denominator = denominator;
  }

  /// The polynomial with these coefficients, ascending.
  public static DensePolynomial of(List<Rational> coefficients) {
    BigInteger common = BigInteger.ONE;
    for (Rational coefficient : coefficients) {
      BigInteger its = coefficient.denominator();
      if (!its.equals(BigInteger.ONE)) {
        common = common.divide(common.gcd(its)).multiply(its);
      }
    }
    BigInteger[] numerators = new BigInteger[coefficients.size()];
    for (int i = 0; i < numerators.length; i++) {
      Rational coefficient = coefficients.get(i);
      numerators[i] = coefficient.numerator().multiply(common.divide(coefficient.denominator()));
    }
    return lowest(numerators, common);
  }

  /// The polynomial with these integer coefficients, ascending.
  public static DensePolynomial ofIntegers(BigInteger... coefficients) {
    return new DensePolynomial(Univariate.trim(coefficients.clone()), BigInteger.ONE);
  }

  /// A polynomial in which only `indeterminate` occurs, with natural exponents.
  ///
  /// @throws Refusal with [Reason#NOT_AN_INTEGER], [Reason#NOT_NATURAL] or [Reason#OUT_OF_RANGE]
  ///   for another exponent
  /// @throws IllegalArgumentException when another indeterminate occurs
  public static DensePolynomial of(Polynomial polynomial, Indeterminate indeterminate) {
    int degree = polynomial.degree(indeterminate).intValueExact();
    Budget.charge(degree);
    Rational[] coefficients = new Rational[Math.max(0, degree) + 1];
    Arrays.fill(coefficients, Rational.ZERO);
    for (Term term : polynomial.terms()) {
      Rational exponent = term.monomial().exponent(indeterminate);
      if (!term.monomial().without(indeterminate).isOne()) {
        throw new IllegalArgumentException(polynomial + " is not in " + indeterminate + " alone");
      }
      if (exponent.sign() < 0) {
        throw new Refusal(Reason.NOT_NATURAL, exponent);
      }
      coefficients[exponent.intValueExact()] = term.coefficient();
    }
    return of(Arrays.asList(coefficients));
  }

  /// Divides numerators and denominator by their greatest common divisor.
  private static DensePolynomial lowest(BigInteger[] numerators, BigInteger denominator) {
    BigInteger[] kept = Univariate.trim(numerators);
    BigInteger common = denominator;
    for (int i = 0; i < kept.length && !common.equals(BigInteger.ONE); i++) {
      common = common.gcd(kept[i]);
    }
    if (kept.length == 0) {
      return ZERO;
    }
    if (common.equals(BigInteger.ONE)) {
      return new DensePolynomial(kept, denominator);
    }
    BigInteger divisor = common;
    return new DensePolynomial(
        Arrays.stream(kept).map(value -> value.divide(divisor)).toArray(BigInteger[]::new),
        denominator.divide(divisor));
  }

  /// The degree; -1 for 0.
  public int degree() {
    return numerators.length - 1;
  }

  /// The coefficient of the `exponent`-th power; 0 beyond the degree.
  public Rational coefficient(int exponent) {
    return exponent < 0 || exponent > degree()
        ? Rational.ZERO
        : Rational.of(numerators[exponent], denominator);
  }

  /// All coefficients, ascending; empty for 0.
  public List<Rational> coefficients() {
    return rationals(numerators, denominator);
  }

  private static List<Rational> rationals(BigInteger[] numerators, BigInteger denominator) {
    List<Rational> values = new ArrayList<>(numerators.length);
    for (BigInteger numerator : numerators) {
      values.add(Rational.of(numerator, denominator));
    }
    return values;
  }

  /// This polynomial in the given indeterminate.
  public Polynomial toPolynomial(Indeterminate indeterminate) {
    List<Term> terms = new ArrayList<>();
    for (int i = degree(); i >= 0; i--) {
      if (numerators[i].signum() != 0) {
        terms.add(new Term(Monomial.of(indeterminate, Rational.of(i)), coefficient(i)));
      }
    }
    return Polynomial.ofDescending(terms);
  }

  @Override
  public boolean isZero() {
    return numerators.length == 0;
  }

  @Override
  public boolean isOne() {
    return equals(ONE);
  }

  @Override
  public DensePolynomial plus(DensePolynomial other) {
    BigInteger[] sums = new BigInteger[Math.max(numerators.length, other.numerators.length)];
    boolean same = denominator.equals(other.denominator);
    for (int i = 0; i < sums.length; i++) {
      BigInteger mine = i < numerators.length ? numerators[i] : BigInteger.ZERO;
      BigInteger its = i < other.numerators.length ? other.numerators[i] : BigInteger.ZERO;
      sums[i] =
          same ? mine.add(its) : mine.multiply(other.denominator).add(its.multiply(denominator));
    }
    return lowest(sums, same ? denominator : denominator.multiply(other.denominator));
  }

  @Override
  public DensePolynomial negated() {
    return new DensePolynomial(
        Arrays.stream(numerators).map(BigInteger::negate).toArray(BigInteger[]::new), denominator);
  }

  @Override
  public DensePolynomial times(DensePolynomial other) {
    return lowest(
        Kronecker.times(numerators, other.numerators), denominator.multiply(other.denominator));
  }

  /// Every coefficient multiplied by `factor`.
  public DensePolynomial times(Rational factor) {
    BigInteger numerator = factor.numerator();
    return lowest(
        Arrays.stream(numerators).map(numerator::multiply).toArray(BigInteger[]::new),
        denominator.multiply(factor.denominator()));
  }

  /// The power with a natural exponent.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative exponent
  @Override
  public DensePolynomial power(int exponent) {
    if (exponent < 0) {
      throw new Refusal(Reason.NOT_NATURAL, Rational.of(exponent));
    }
    if (exponent == 0) {
      return ONE;
    }
    return exponent == 1 || isZero()
        ? this
        : lowest(
            Kronecker.power(numerators, exponent),
            Rational.of(denominator).power(exponent).numerator());
  }

  /// The derivative.
  public DensePolynomial derivative() {
    return lowest(Univariate.derivative(numerators), denominator);
  }

  /// Quotient and remainder. Quasi-linear for a divisor with integer coefficients and leading
  /// coefficient 1, quadratic otherwise.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a zero divisor
  public Division divideAndRemainder(DensePolynomial divisor) {
    if (divisor.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO);
    }
    if (degree() < divisor.degree()) {
      return new Division(ZERO, this);
    }
    BigInteger lead = divisor.numerators[divisor.degree()];
    if (divisor.denominator.equals(BigInteger.ONE) && lead.equals(BigInteger.ONE)) {
      MonicDivision.Parts parts = MonicDivision.of(numerators, divisor.numerators);
      return new Division(
          lowest(parts.quotient(), denominator), lowest(parts.remainder(), denominator));
    }
    int steps = degree() - divisor.degree() + 1;
    BigInteger scale = Rational.of(lead).power(steps).numerator();
    BigInteger[] rest = Arrays.stream(numerators).map(scale::multiply).toArray(BigInteger[]::new);
    MonicDivision.Parts parts = MonicDivision.schoolbook(rest, divisor.numerators);
    Rational factor = Rational.of(BigInteger.ONE, denominator.multiply(scale));
    return new Division(
        ofIntegers(parts.quotient()).times(factor.times(Rational.of(divisor.denominator))),
        ofIntegers(parts.remainder()).times(factor));
  }

  /// The value at `point`.
  public Rational evaluate(Rational point) {
    if (isZero()) {
      return Rational.ZERO;
    }
    BigInteger p = point.numerator();
    BigInteger q = point.denominator();
    BigInteger scale = BigInteger.ONE;
    BigInteger value = BigInteger.ZERO;
    for (int i = degree(); i >= 0; i--) {
      Budget.checkpoint();
      value = value.multiply(p).add(numerators[i].multiply(scale));
      scale = i > 0 ? scale.multiply(q) : scale;
    }
    return Rational.of(value, denominator.multiply(scale));
  }

  /// The values at 0, 1, ..., `count` - 1, by repeated addition of differences beyond the degree.
  public List<Rational> values(int count) {
    Budget.charge((long) count * (Kronecker.bits(numerators) / Long.SIZE + 1));
    BigInteger[] values = new BigInteger[Math.max(0, count)];
    if (isZero()) {
      Arrays.fill(values, BigInteger.ZERO);
    } else if (count <= degree() / 4) {
      for (int i = 0; i < values.length; i++) {
        values[i] = evaluate(Rational.of(i)).times(Rational.of(denominator)).numerator();
      }
    } else {
      IntegerRow differences = new IntegerRow(FallingPowers.differences(numerators, count));
      for (int i = 0; i < values.length; i++) {
        Budget.checkpoint();
        values[i] = differences.value(0);
        for (int k = 0; k + 1 < differences.length(); k++) {
          differences.add(k, k + 1);
        }
      }
    }
    return rationals(values, denominator);
  }

  /// The polynomial in x whose value is this one's at x + `shift`.
  public DensePolynomial taylorShift(Rational shift) {
    if (shift.isZero() || isZero()) {
      return this;
    }
    BigInteger q = shift.denominator();
    if (q.equals(BigInteger.ONE)) {
      return new DensePolynomial(TaylorShift.of(numerators, shift.numerator()), denominator);
    }
    BigInteger[] powers = new BigInteger[numerators.length];
    powers[0] = BigInteger.ONE;
    for (int i = 1; i < powers.length; i++) {
      powers[i] = powers[i - 1].multiply(q);
    }
    BigInteger[] scaled = new BigInteger[numerators.length];
    for (int i = 0; i < scaled.length; i++) {
      scaled[i] = numerators[i].multiply(powers[degree() - i]);
    }
    BigInteger[] shifted = TaylorShift.of(scaled, shift.numerator());
    for (int i = 0; i < shifted.length; i++) {
      shifted[i] = shifted[i].multiply(powers[i]);
    }
    return lowest(shifted, denominator.multiply(powers[degree()]));
  }

  /// The coefficients c of this polynomial in falling powers: the sum of c_k x(x-1)...(x-k+1).
  public List<Rational> toFalling() {
    return rationals(FallingPowers.fromPowers(numerators), denominator);
  }

  /// The polynomial with coefficients `falling` in falling powers x(x-1)...(x-k+1).
  public static DensePolynomial fromFalling(List<Rational> falling) {
    DensePolynomial asPowers = of(falling);
    return lowest(FallingPowers.toPowers(asPowers.numerators), asPowers.denominator);
  }

  @Override
  public boolean equals(Object object) {
    return this == object
        || object instanceof DensePolynomial other
            && denominator.equals(other.denominator)
            && Arrays.equals(numerators, other.numerators);
  }

  @Override
  public int hashCode() {
    return 31 * Arrays.hashCode(numerators) + denominator.hashCode();
  }

  /// The coefficients, ascending, for diagnosis only.
  @Override
  public String toString() {
    return coefficients().toString();
  }
}
