package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.form.Base;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// The expansion of sums Σ c t^j e^(q t) with rational c and q, by t^n ↦ c q^(n−j)/(n−j)!, the
/// powers q^n taken for all the terms over one common denominator.
final class ExponentialSums {

  private final int order;
  private final List<Rational> coefficients;

  private ExponentialSums(int order) {
    this.order = order;
    this.coefficients = new ArrayList<>(Collections.nCopies(order + 1, Rational.ZERO));
  }

  /// The expansion, or nothing when the polynomial has another shape.
  static Optional<PowerSeries> expand(Polynomial polynomial, Generator t, int order) {
    Exponential kernel = new Exponential(Base.NATURAL, Form.of(t));
    if (!isExponentialSum(polynomial, t, kernel)) {
      return Optional.empty();
    }
    ExponentialSums sums = new ExponentialSums(order);
    Map<Rational, List<Term>> groups = new TreeMap<>();
    for (Term term : polynomial.terms()) {
      groups.computeIfAbsent(term.monomial().exponent(t), _ -> new ArrayList<>()).add(term);
    }
    groups.forEach(
        (power, group) -> {
          if (power.compareTo(Rational.of(order)) <= 0) {
            sums.add(group, kernel, power.intValueExact());
          }
        });
    return Optional.of(PowerSeries.ofRationals(sums.coefficients, order));
  }

  private static boolean isExponentialSum(Polynomial p, Generator t, Exponential kernel) {
    return p.indeterminates().stream().allMatch(g -> g.equals(t) || g.equals(kernel))
        && p.terms().stream().allMatch(term -> isNatural(term.monomial().exponent(t)));
  }

  private static boolean isNatural(Rational exponent) {
    return exponent.isInteger() && exponent.sign() >= 0;
  }

  private void add(List<Term> group, Exponential kernel, int power) {
    BigInteger weights = BigInteger.ONE;
    BigInteger rates = BigInteger.ONE;
    for (Term term : group) {
      weights = lcm(weights, term.coefficient().denominator());
      rates = lcm(rates, term.monomial().exponent(kernel).denominator());
    }
    List<BigInteger> values = new ArrayList<>();
    List<BigInteger> factors = new ArrayList<>();
    for (Term term : group) {
      values.add(scaled(term.coefficient(), weights));
      factors.add(scaled(term.monomial().exponent(kernel), rates));
    }
    BigInteger divisor = weights;
    for (int n = power; n <= order; n++) {
      Budget.checkpoint();
      BigInteger sum = values.stream().reduce(BigInteger.ZERO, BigInteger::add);
      coefficients.set(n, coefficients.get(n).plus(Rational.of(sum, divisor)));
      for (int i = 0; i < factors.size(); i++) {
        values.set(i, values.get(i).multiply(factors.get(i)));
      }
      divisor = divisor.multiply(rates).multiply(BigInteger.valueOf(n - power + 1L));
    }
  }

  private static BigInteger scaled(Rational value, BigInteger common) {
    return value.numerator().multiply(common.divide(value.denominator()));
  }

  private static BigInteger lcm(BigInteger a, BigInteger b) {
    return a.divide(a.gcd(b)).multiply(b);
  }
}
