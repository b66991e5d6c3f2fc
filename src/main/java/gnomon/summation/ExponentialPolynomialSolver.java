package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.Arrays;
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

  private static List<Form> rationalGeometric(List<Form> p, Rational b, Rational h) {
    int size = p.size();
    Rational[] result = new Rational[size];
    Rational scale = b.minus(Rational.ONE).inverse();
    for (int m = size - 1; m >= 0; m--) {
      Rational later = Rational.ZERO;
      Rational factor = h;
      for (int j = m + 1; j < size; j++) {
        factor = j == m + 1 ? h.times(Rational.of(j)) : factor.times(ratio(j, m, h));
        later = later.plus(result[j].times(factor));
      }
      Budget.checkpoint();
      result[m] = p.get(m).asRational().orElseThrow().minus(b.times(later)).times(scale);
    }
    return Arrays.stream(result).map(Form::of).toList();
  }

  /// binom(j, m) h^(j−m) divided by binom(j − 1, m) h^(j−1−m).
  private static Rational ratio(int j, int m, Rational h) {
    return h.times(Rational.of(j, j - m));
  }
}
