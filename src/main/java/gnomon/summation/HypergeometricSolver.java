package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Univariate;
import gnomon.form.Variable;
import java.util.List;
import java.util.Optional;

/// Decides whether a hypergeometric term has a hypergeometric antidifference, and finds it.
///
/// With t(k+1)/t(k) = a(k)/b(k)·c(k+1)/c(k) in Gosper's form, T(k) = b(k−1) y(k)/c(k)·t(k) is an
/// antidifference exactly for the polynomial solutions y of a(k) y(k+1) − b(k−1) y(k) = c(k); where
/// there is none, no hypergeometric term is an antidifference; that is claimed where no i and no
/// radical stands in the term.
///
/// Source: R. W. Gosper (1978), as told in Petkovšek, Wilf, Zeilberger, A = B (1996), chapter 5,
/// from memory.
final class HypergeometricSolver implements AntidifferenceSolver {

  @Override
  public FunctionClass searches() {
    return FunctionClass.HYPERGEOMETRIC;
  }

  @Override
  public Antidifference solve(Form f, Variable x, Form h) {
    Antidifference.GaveUp none = new Antidifference.GaveUp(List.of(searches()));
    Form rescaled = h.isOne() ? f : f.substitute(x, Form.of(x).times(h));
    Optional<HypergeometricTerm> term = HypergeometricTerm.of(rescaled, x, Form.ONE);
    if (term.isEmpty()) {
      return none;
    }
    Optional<GosperForm> gosper = GosperForm.of(term.get().ratio(), x);
    if (gosper.isEmpty()) {
      return none;
    }
    GosperForm form = gosper.get();
    Univariate lowered = form.lowered(x);
    Optional<KeyEquation.Solution> solution =
        new KeyEquation(form.a(), lowered, List.of(form.c())).solve(x);
    if (solution.isEmpty()) {
      return isWithoutRadicals(term.get()) ? new Antidifference.ProvedAbsent(searches()) : none;
    }
    Form y = Structure.polynomial(solution.get().y(), x);
    Form factor = Structure.polynomial(lowered.coefficients(), x).times(y);
    Form scale =
        Structure.polynomial(form.c().coefficients(), x)
            .times(solution.get().constants().getFirst());
    Form sum = factor.dividedBy(scale).times(rescaled);
    Form value = h.isOne() ? sum : sum.substitute(x, Form.of(x).dividedBy(h));
    return new Antidifference.Found(value, List.of(), searches());
  }

  /// Whether factors over ℚ decide which factors are shifts of one another: beside i or a radical
  /// they may split further.
  private static boolean isWithoutRadicals(HypergeometricTerm term) {
    return term.term().generators().stream().noneMatch(Generator::isAlgebraic)
        && term.ratio().generators().stream().noneMatch(Generator::isAlgebraic);
  }
}
