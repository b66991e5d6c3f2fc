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
/// is (1/(m+1)) Σ_k B_k h^(k−1) binom(m + k, k) p_{m+k}. When all numbers are rational the falling
/// powers are the faster way, through the dense conversions.
final class PolynomialSums {

  private PolynomialSums() {}

  /// F with F(x + h) − F(x) = p(x) and F(0) = 0.
  static List<Form> antidifference(List<Form> p, Form h) {
    if (h.asRational().isPresent() && allRational(p)) {
      return rational(
          p.stream().map(c -> c.asRational().orElseThrow()).toList(), h.asRational().get());
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

  /// With x = h y: the coordinates a_k of p in the falling powers y↓k give Σ a_k y↓(k+1)/(k+1).
  private static List<Form> rational(List<Rational> p, Rational h) {
    List<Rational> falling = DensePolynomial.of(scaled(p, h)).toFalling();
    List<Rational> raised = new ArrayList<>();
    raised.add(Rational.ZERO);
    for (int k = 0; k < falling.size(); k++) {
      raised.add(falling.get(k).times(Rational.of(1, k + 1)));
    }
    List<Rational> sum = DensePolynomial.fromFalling(raised).coefficients();
    return scaled(sum, h.inverse()).stream().map(Form::of).toList();
  }

  /// c_k r^k.
  static List<Rational> scaled(List<Rational> coefficients, Rational r) {
    if (r.isOne()) {
      return coefficients;
    }
    List<Rational> result = new ArrayList<>();
    Rational power = Rational.ONE;
    for (Rational coefficient : coefficients) {
      result.add(coefficient.times(power));
      power = power.times(r);
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
