package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import java.util.ArrayList;
import java.util.List;

/// Sums Σ_j b_j^x p_j(x) with polynomials p_j: also sines, cosines, (−1)^x and parametric bases.
///
/// For b = b_j^h ≠ 1 the polynomial P with b P(x + h) − P(x) = p(x) has the degree of p and is
/// found from its leading coefficient down; where b is 1 the sum of a polynomial is taken. A base
/// that is not a constant gives the condition b ≠ 1.
final class ExponentialPolynomialSolver implements AntidifferenceSolver {

  @Override
  public FunctionClass searches() {
    return FunctionClass.EXPONENTIAL_POLYNOMIAL;
  }

  @Override
  public Antidifference solve(Form f, Variable x, Form h) {
    var parts = Structure.exponentialParts(f, x);
    if (parts.isEmpty()) {
      return new Antidifference.GaveUp(List.of(searches()));
    }
    List<Form> summands = new ArrayList<>();
    List<Condition> conditions = new ArrayList<>();
    for (var part : parts.get()) {
      Form factor = factorOfOneStep(part.kernel(), x, h);
      if (factor.dependsOn(x)) {
        return new Antidifference.GaveUp(List.of(searches()));
      }
      Form excess = factor.minus(Form.ONE);
      if (!excess.isConstant()) {
        conditions.add(Condition.notZero(excess));
      }
      List<Form> sum =
          excess.isZero()
              ? PolynomialSums.antidifference(part.coefficients(), h)
              : geometric(part.coefficients(), factor, h);
      summands.add(part.kernel().times(PolynomialSums.polynomial(sum, x)));
    }
    return new Antidifference.Found(Form.sum(summands), conditions, searches());
  }

  private static Form factorOfOneStep(Form kernel, Variable x, Form h) {
    if (kernel.isOne()) {
      return Form.ONE;
    }
    return kernel.substitute(x, Form.of(x).plus(h)).dividedBy(kernel);
  }

  /// P with b P(x + h) − P(x) = p(x), b ≠ 1: (b − 1) P_m = p_m − b Σ_{j>m} P_j binom(j, m) h^(j−m).
  private static List<Form> geometric(List<Form> p, Form b, Form h) {
    if (b.asRational().isPresent() && h.asRational().isPresent() && PolynomialSums.allRational(p)) {
      return rationalGeometric(p, b.asRational().get(), h.asRational().get());
    }
    int size = p.size();
    Form[] result = new Form[size];
    Form scale = b.minus(Form.ONE).inverse();
    for (int m = size - 1; m >= 0; m--) {
      List<Form> later = new ArrayList<>();
      Form power = h;
      for (int j = m + 1; j < size; j++) {
        later.add(result[j].times(power).times(Rational.of(Integers.binomial(j, m))));
        power = power.times(h);
      }
      Budget.checkpoint();
      result[m] = p.get(m).minus(b.times(Form.sum(later))).times(scale);
    }
    return List.of(result);
  }

  /// With x = h y and bE − 1 = (b − 1) + bΔ: in the falling powers y↓k the coordinates a_k of p
  /// give (b − 1) P_k = a_k − b (k + 1) P_{k+1}.
  private static List<Form> rationalGeometric(List<Form> p, Rational b, Rational h) {
    List<Rational> numbers = p.stream().map(c -> c.asRational().orElseThrow()).toList();
    List<Rational> falling =
        new ArrayList<>(DensePolynomial.of(PolynomialSums.scaled(numbers, h)).toFalling());
    Rational scale = b.minus(Rational.ONE).inverse();
    Rational above = Rational.ZERO;
    for (int k = falling.size() - 1; k >= 0; k--) {
      above = falling.get(k).minus(b.times(Rational.of(k + 1)).times(above)).times(scale);
      falling.set(k, above);
    }
    List<Rational> sum = DensePolynomial.fromFalling(falling).coefficients();
    return PolynomialSums.scaled(sum, h.inverse()).stream().map(Form::of).toList();
  }
}
