package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import java.util.ArrayList;
import java.util.List;

/// Antidifferences of polynomials, as coefficient lists in ascending powers.
///
/// With Bernoulli numbers B_k, F = (1/h) ∫ (hD/(e^(hD) − 1)) p, so the coefficient of x^(m+1) in F
/// is (1/(m+1)) Σ_k B_k h^(k−1) binom(m + k, k) p_{m+k}. One product of dense polynomials when all
/// numbers are rational, quadratic otherwise.
final class PolynomialSums {

  private PolynomialSums() {}

  /// F with F(x + h) − F(x) = p(x) and F(0) = 0.
  static List<Form> antidifference(List<Form> p, Form h) {
    if (h.asRational().isPresent() && allRational(p)) {
      return rational(p.stream().map(c -> c.asRational().orElseThrow()).toList(), h);
    }
    int size = p.size();
    List<Form> result = new ArrayList<>();
    result.add(Form.ZERO);
    for (int m = 0; m < size; m++) {
      List<Form> terms = new ArrayList<>();
      for (int k = 0; m + k < size; k++) {
        Rational bernoulli = Integers.bernoulli(k);
        if (bernoulli.isZero()) {
          continue;
        }
        Rational number =
            bernoulli.times(Rational.of(Integers.binomial(m + k, k))).dividedBy(Rational.of(m + 1));
        terms.add(p.get(m + k).times(h.power(k - 1)).times(number));
      }
      Budget.checkpoint();
      result.add(Form.sum(terms));
    }
    return result;
  }

  private static List<Form> rational(List<Rational> p, Form step) {
    int size = p.size();
    Rational h = step.asRational().orElseThrow();
    List<Rational> weights = new ArrayList<>();
    List<Rational> reversed = new ArrayList<>();
    Rational power = h.inverse();
    Rational inverseFactorial = Rational.ONE;
    Rational factorial = Rational.ONE;
    for (int k = 0; k < size; k++) {
      if (k > 0) {
        inverseFactorial = inverseFactorial.dividedBy(Rational.of(k));
        factorial = factorial.times(Rational.of(k));
      }
      weights.add(Integers.bernoulli(k).times(power).times(inverseFactorial));
      reversed.addFirst(p.get(k).times(factorial));
      power = power.times(h);
    }
    DensePolynomial product = DensePolynomial.of(weights).times(DensePolynomial.of(reversed));
    List<Form> result = new ArrayList<>();
    result.add(Form.ZERO);
    Rational scale = Rational.ONE;
    for (int m = 0; m < size; m++) {
      scale = scale.dividedBy(Rational.of(m + 1));
      result.add(Form.of(product.coefficient(size - 1 - m).times(scale)));
    }
    return result;
  }

  static boolean allRational(List<Form> coefficients) {
    return coefficients.stream().allMatch(c -> c.asRational().isPresent());
  }

  /// Σ c_j x^j.
  static Form polynomial(List<Form> coefficients, Variable x) {
    List<Form> terms = new ArrayList<>();
    for (int j = 0; j < coefficients.size(); j++) {
      if (!coefficients.get(j).isZero()) {
        terms.add(coefficients.get(j).times(Form.of(x).power(j)));
      }
    }
    return Form.sum(terms);
  }
}
