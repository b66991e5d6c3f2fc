package gnomon.summation;

import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Sums of hypergeometric terms times polynomials in harmonic numbers: x H(x), H(x)^2, binom(x, m)
/// H(x), H(x)/(x+1) and their sums.
///
/// The parts in front of different hypergeometric terms are summed apart: no term is a rational
/// multiple of another one, so the difference of a sum of such parts is the sum of their
/// differences, each in front of its own term. That no antidifference exists is claimed only where
/// the harmonic numbers of the summand are shown to be algebraically independent and no algebraic
/// number stands in it.
final class HarmonicTowerSolver implements AntidifferenceSolver {

  @Override
  public FunctionClass searches() {
    return FunctionClass.HYPERGEOMETRIC_WITH_HARMONIC_NUMBERS;
  }

  @Override
  public Antidifference solve(Form f, Variable x, Form h) {
    Antidifference.GaveUp none = new Antidifference.GaveUp(List.of(searches()));
    Form rescaled = h.isOne() ? f : f.substitute(x, Form.of(x).times(h));
    Optional<HarmonicSummand> summand = HarmonicSummand.of(rescaled, x);
    if (summand.isEmpty()) {
      return HarmonicDenominators.proveAbsence(rescaled, x)
          ? new Antidifference.ProvedAbsent(searches())
          : none;
    }
    HarmonicTower tower = new HarmonicTower(x, summand.get().steps());
    HarmonicTower.Outcome outcome = tower.solve(levels(summand.get()));
    if (outcome.solution().isEmpty()) {
      return outcome.absent() && isTower(summand.get(), rescaled, x)
          ? new Antidifference.ProvedAbsent(searches())
          : none;
    }
    HarmonicTower.Solution solution = outcome.solution().get();
    Form sum = solution.sum().dividedBy(solution.constants().getFirst());
    Form value = h.isOne() ? sum : sum.substitute(x, Form.of(x).dividedBy(h));
    return new Antidifference.Found(value, conditions(sum, rescaled, x), searches());
  }

  private static List<HarmonicTower.Level> levels(HarmonicSummand summand) {
    return summand.parts().stream()
        .map(part -> new HarmonicTower.Level(part.term(), part.ratio(), List.of(part.polynomial())))
        .toList();
  }

  /// Whether the summand is one of a tower in which absence is proved: terms of which none is a
  /// rational multiple of another, and independent harmonic numbers.
  private static boolean isTower(HarmonicSummand summand, Form f, Variable x) {
    List<HarmonicSummand.Part> parts = summand.parts();
    for (Generator g : f.generators()) {
      if (g.isAlgebraic()) {
        return false;
      }
    }
    for (int i = 0; i < parts.size(); i++) {
      if (parts.get(i).ratio().generators().stream().anyMatch(Generator::isAlgebraic)) {
        return false;
      }
      for (int j = 0; j < i; j++) {
        Form ratio = parts.get(i).ratio().dividedBy(parts.get(j).ratio());
        Optional<List<FirstOrderEquation.Solution>> similar =
            new FirstOrderEquation(ratio, List.of()).solutions(x);
        if (similar.isEmpty() || !similar.get().isEmpty()) {
          return false;
        }
      }
    }
    return HarmonicSteps.areIndependent(List.copyOf(summand.steps().values()), x);
  }

  /// Factors of the denominator that are free of x and no factors of that of the summand must not
  /// be zero.
  private static List<Condition> conditions(Form sum, Form f, Variable x) {
    List<Condition> conditions = new ArrayList<>();
    for (Factored.Factor factor : Structure.factored(Form.of(sum.denominator())).factors()) {
      Form base = factor.base();
      if (!base.dependsOn(x)
          && !base.isConstant()
          && base.asGenerator().filter(g -> !(g instanceof Variable)).isEmpty()
          && f.denominator().tryDividedBy(base.numerator()).isEmpty()) {
        conditions.add(Condition.notZero(base));
      }
    }
    return conditions;
  }
}
