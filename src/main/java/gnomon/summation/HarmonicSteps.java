package gnomon.summation;

import gnomon.form.Combinatorial;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;

/// Harmonic numbers H(x + c, r) that the antidifference of a rational function may need beside
/// those at hand: one for each class of linear denominators modulo integer shifts and each power.
///
/// @param x the variable of summation
/// @param known the differences of the harmonic numbers at hand
record HarmonicSteps(Variable x, Collection<Form> known) {

  /// A harmonic number with its difference, (x + 1 + c)^(−r).
  record Step(Form sum, Form difference) {}

  /// Those that the functions may need; none of them is a combination of the others and of those at
  /// hand, up to rational functions.
  List<Step> neededBy(List<Form> functions) {
    List<Step> steps = new ArrayList<>();
    for (Form function : functions) {
      if (function.denominator().isOne()) {
        continue;
      }
      for (Factored.Factor factor : Structure.factored(function).factors()) {
        if (factor.multiplicity() < 0) {
          offset(factor.base()).ifPresent(c -> add(c, -factor.multiplicity(), steps));
        }
      }
    }
    return steps;
  }

  private void add(Form c, int highest, List<Step> steps) {
    for (int power = 1; power <= highest; power++) {
      Form sum = Combinatorial.harmonic(Form.of(x).plus(c), power);
      Form difference = ShiftFactors.moved(sum, x, 1).minus(sum);
      List<Form> all = new ArrayList<>(known);
      steps.forEach(step -> all.add(step.difference()));
      all.add(difference);
      if (areIndependent(all, x)) {
        steps.add(new Step(sum, difference));
      }
    }
  }

  /// The c of a denominator that is a multiple of x + c.
  private Optional<Form> offset(Form base) {
    return Structure.asPolynomial(base, x)
        .filter(coefficients -> coefficients.size() == 2)
        .map(linear -> linear.getFirst().dividedBy(linear.getLast()));
  }

  /// Whether no combination of the functions with constants not all zero is the difference of a
  /// rational function: then sums with these differences are algebraically independent.
  static boolean areIndependent(List<Form> differences, Variable x) {
    return new FirstOrderEquation(Form.ONE, differences)
        .solutions(x)
        .filter(
            solutions ->
                solutions.stream()
                    .allMatch(found -> found.constants().stream().allMatch(Form::isZero)))
        .isPresent();
  }
}
