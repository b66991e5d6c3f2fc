package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The search for a polynomial P in harmonic numbers with Δ(t P) = t p, t a hypergeometric term.
///
/// For a harmonic number h with step s, Δ(t c h^m) = t ((r c(x+1) − c) h^m + lower powers): taken
/// from the highest degree down, the coefficient c of each monomial solves an equation of first
/// order whose right side contains the constants that higher monomials left open. P has at most the
/// degree of p, one more where that equation without right side has a solution. The last
/// coefficient is free of harmonic numbers; where t is 1 further harmonic numbers may be needed
/// there, with constant factors.
///
/// Source: M. Karr, Summation in finite terms, J. ACM 28 (1981) and Theory of summation in finite
/// terms (1985); C. Schneider, Symbolic summation in difference fields (2001), for the theorem that
/// sums adjoined to a tower enter an antidifference of one of its elements only linearly, with
/// constant factors; from memory.
final class HarmonicTower {

  private static final int MOST_MONOMIALS = 400;

  private final Variable x;
  private final Map<Generator, Form> steps;

  HarmonicTower(Variable x, Map<Generator, Form> steps) {
    this.x = x;
    this.steps = steps;
  }

  /// What a search came to: the sum where there is one, and whether its absence would be proved.
  record Outcome(Optional<Form> sum, boolean decided) {}

  /// P so far, the factor of the summand in it, and what Δ(t P) lacks of t times that multiple.
  private record State(Form value, Form factor, HarmonicPolynomial rest) {}

  /// Antidifference of the part, divided by nothing: the sum is t P.
  Outcome sum(HarmonicSummand.Part part) {
    Optional<List<FirstOrderEquation.Solution>> kernel =
        new FirstOrderEquation(part.ratio(), List.of()).solutions(x);
    if (kernel.isEmpty()) {
      return new Outcome(Optional.empty(), false);
    }
    List<State> states = List.of(new State(Form.ZERO, Form.ONE, part.polynomial()));
    int degree = part.polynomial().degree() + (kernel.get().isEmpty() ? 0 : 1);
    List<Monomial> monomials = monomials(degree);
    if (monomials.size() > MOST_MONOMIALS) {
      return new Outcome(Optional.empty(), false);
    }
    for (Monomial monomial : monomials) {
      Optional<List<State>> next = settled(states, monomial, part.ratio());
      if (next.isEmpty()) {
        return new Outcome(Optional.empty(), false);
      }
      states = next.get();
      if (states.stream().allMatch(state -> state.factor().isZero())) {
        return new Outcome(Optional.empty(), kernel.get().isEmpty() || part.ratio().isOne());
      }
    }
    return new Outcome(
        states.stream()
            .filter(state -> !state.factor().isZero())
            .findFirst()
            .map(state -> state.value().dividedBy(state.factor()).times(part.term())),
        kernel.get().isEmpty() || part.ratio().isOne());
  }

  /// The states whose difference has the right coefficient at the monomial too.
  private Optional<List<State>> settled(List<State> states, Monomial monomial, Form ratio) {
    Budget.checkpoint();
    List<Form> sides = new ArrayList<>();
    states.forEach(state -> sides.add(state.rest().coefficient(monomial)));
    List<HarmonicSteps.Step> further =
        monomial.isOne() && ratio.isOne()
            ? new HarmonicSteps(x, steps.values()).neededBy(sides)
            : List.of();
    further.forEach(step -> sides.add(step.difference().negated()));
    Optional<List<FirstOrderEquation.Solution>> solutions =
        new FirstOrderEquation(ratio, sides).solutions(x);
    if (solutions.isEmpty()) {
      return Optional.empty();
    }
    List<State> next = new ArrayList<>();
    for (FirstOrderEquation.Solution solution : solutions.get()) {
      State state = combined(states, solution, monomial, ratio);
      Form value = state.value();
      for (int i = 0; i < further.size(); i++) {
        Form constant = solution.constants().get(states.size() + i);
        value = value.plus(further.get(i).sum().times(constant));
      }
      next.add(new State(value, state.factor(), state.rest()));
    }
    return Optional.of(next);
  }

  private State combined(
      List<State> states, FirstOrderEquation.Solution solution, Monomial monomial, Form ratio) {
    Form c = solution.function();
    HarmonicPolynomial own = HarmonicPolynomial.of(monomial, c);
    HarmonicPolynomial moved =
        HarmonicPolynomial.moved(monomial, steps).times(ratio.times(GosperForm.moved(c, x, 1)));
    HarmonicPolynomial rest = own.minus(moved);
    Form value = own.form();
    Form factor = Form.ZERO;
    for (int j = 0; j < states.size(); j++) {
      Form u = solution.constants().get(j);
      if (!u.isZero()) {
        value = value.plus(states.get(j).value().times(u));
        factor = factor.plus(states.get(j).factor().times(u));
        rest = rest.plus(states.get(j).rest().times(u));
      }
    }
    return new State(value, factor, rest);
  }

  /// The monomials in the harmonic numbers up to a total degree, the higher degrees first.
  private List<Monomial> monomials(int degree) {
    List<Monomial> all = new ArrayList<>(List.of(Monomial.ONE));
    for (Generator h : steps.keySet()) {
      List<Monomial> more = new ArrayList<>();
      for (Monomial monomial : all) {
        int room = degree - monomial.totalDegree().intValueExact();
        for (int i = 0; i <= room; i++) {
          more.add(i == 0 ? monomial : monomial.times(Monomial.of(h, Rational.of(i))));
        }
      }
      if (more.size() > MOST_MONOMIALS) {
        return more;
      }
      all = more;
    }
    all.sort(Comparator.comparing(Monomial::totalDegree).reversed());
    return all;
  }
}
