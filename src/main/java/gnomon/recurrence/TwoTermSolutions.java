package gnomon.recurrence;

import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The solutions of y(v + J) = r(v) y(v), J ≥ 2, with a rational function r of linear factors: with
/// v − α among them they have J^(v/J) ((v − α)/J − 1)!, and the J-th roots of unity to the power v
/// are the constants of this equation.
final class TwoTermSolutions {
  private TwoTermSolutions() {}

  /// Whether only the first and the last coefficient are there.
  static boolean covers(LinearEquation equation) {
    return equation.order() >= 2
        && !equation.coefficients().getFirst().isZero()
        && equation.coefficients().subList(1, equation.order()).stream().allMatch(Form::isZero);
  }

  /// J solutions, or none where r has other factors or the roots of unity are out of reach.
  static List<Form> of(LinearEquation equation) {
    Form ratio = equation.coefficients().getFirst().dividedBy(equation.leading()).negated();
    try {
      return one(ratio, equation.variable(), equation.order())
          .map(y -> turned(y, equation))
          .orElse(List.of());
    } catch (Refusal _) {
      return List.of();
    }
  }

  /// One solution, but for the sign of r to the power v/J.
  private record Term(Form positive, boolean negative) {}

  private static Optional<Term> one(Form ratio, Variable v, int order) {
    Factored factored = Structure.factored(ratio);
    Form unit = Form.of(factored.unit());
    Form part = Form.of(v).times(Rational.of(1, order));
    List<Form> factors = new ArrayList<>();
    for (Factored.Factor factor : factored.factors()) {
      Optional<List<Form>> list = Structure.asPolynomial(factor.base(), v);
      if (list.isEmpty() || list.get().size() > 2) {
        return Optional.empty();
      }
      Form leading = list.get().getLast();
      if (list.get().size() == 1) {
        unit = unit.times(leading.power(factor.multiplicity()));
        continue;
      }
      Form scale = leading.times(Rational.of(order));
      unit = unit.times(scale.power(factor.multiplicity()));
      Form argument = factor.base().dividedBy(scale).minus(Form.ONE);
      factors.add(Combinatorial.factorial(argument).power(factor.multiplicity()));
    }
    boolean negative = unit.asRational().filter(u -> u.sign() < 0).isPresent();
    factors.add(Elementary.power(negative ? unit.negated() : unit, part));
    return Optional.of(new Term(Form.product(factors), negative));
  }

  /// y e^(πi (2k + s) v/J) for J values of k, with s = 1 where the sign of r was left out of y; the
  /// angles are taken between −π and π.
  private static List<Form> turned(Term y, LinearEquation equation) {
    int order = equation.order();
    List<Form> all = new ArrayList<>();
    for (int k = 0; k < order; k++) {
      int turn = 2 * k + (y.negative() ? 1 : 0);
      int small = turn > order ? turn - 2 * order : turn;
      Form angle = Form.of(equation.variable()).times(Rational.of(small, order));
      all.add(y.positive().times(Elementary.power(Form.MINUS_ONE, angle)));
    }
    return all;
  }
}
