package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The search for a polynomial P in harmonic numbers with Δ(t P) = t Σ_i u_i p_i, t a
/// hypergeometric term and u_i constants to be found.
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

  /// A hypergeometric term t with its ratio and the polynomials p_i in front of it.
  record Level(Form term, Form ratio, List<HarmonicPolynomial> sides) {
    Level {
      sides = List.copyOf(sides);
    }
  }

  /// A sum with the constants u_i, not all zero.
  record Solution(Form sum, List<Form> constants) {}

  /// What a search came to: the solution where there is one, and whether its absence is proved.
  record Outcome(Optional<Solution> solution, boolean absent) {
    static Outcome unknown() {
      return new Outcome(Optional.empty(), false);
    }
  }

  /// The sum so far, the constants of the right sides in it, and what its difference lacks of the
  /// right sides with these constants.
  private record State(Form value, List<Form> constants, HarmonicPolynomial rest) {
    boolean isConstant() {
      return constants.stream().allMatch(Form::isZero);
    }
  }

  /// F with ΔF = Σ_levels t Σ_i u_i p_i, the constants u_i being the same for all levels.
  Outcome solve(List<Level> levels) {
    int count = levels.getFirst().sides().size();
    List<List<Form>> open = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      List<Form> unit = new ArrayList<>(Collections.nCopies(count, Form.ZERO));
      unit.set(i, Form.ONE);
      open.add(unit);
    }
    List<State> states =
        open.stream().map(u -> new State(Form.ZERO, u, HarmonicPolynomial.ZERO)).toList();
    boolean decided = true;
    for (Level level : levels) {
      Optional<List<FirstOrderEquation.Solution>> kernel =
          new FirstOrderEquation(level.ratio(), List.of()).solutions(x);
      if (kernel.isEmpty()) {
        return Outcome.unknown();
      }
      decided &= kernel.get().isEmpty() || level.ratio().isOne();
      Optional<List<State>> next = settled(states, level, !kernel.get().isEmpty());
      if (next.isEmpty()) {
        return Outcome.unknown();
      }
      states = next.get().stream().filter(state -> !state.isConstant()).toList();
      if (states.isEmpty()) {
        return new Outcome(Optional.empty(), decided);
      }
    }
    State first = states.getFirst();
    return new Outcome(Optional.of(new Solution(first.value(), first.constants())), false);
  }

  /// The states settled for a further level, or nothing where that is out of reach.
  private Optional<List<State>> settled(List<State> states, Level level, boolean raised) {
    int degree = level.sides().stream().mapToInt(HarmonicPolynomial::degree).max().orElse(0);
    List<Monomial> monomials = monomials(raised ? degree + 1 : degree);
    if (monomials.size() > MOST_MONOMIALS) {
      return Optional.empty();
    }
    List<State> current = new ArrayList<>();
    for (State state : states) {
      HarmonicPolynomial rest = HarmonicPolynomial.ZERO;
      for (int i = 0; i < state.constants().size(); i++) {
        rest = rest.plus(level.sides().get(i).times(state.constants().get(i)));
      }
      current.add(new State(state.value(), state.constants(), rest));
    }
    for (Monomial monomial : monomials) {
      Optional<List<State>> next = settled(current, monomial, level);
      if (next.isEmpty()) {
        return Optional.empty();
      }
      current = next.get();
      if (current.stream().allMatch(State::isConstant)) {
        return Optional.of(List.of());
      }
    }
    return Optional.of(current);
  }

  /// The states whose difference has the right coefficient at the monomial too.
  private Optional<List<State>> settled(List<State> states, Monomial monomial, Level level) {
    Budget.checkpoint();
    Form ratio = level.ratio();
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
      State state = combined(states, solution, monomial, level);
      Form value = state.value();
      for (int i = 0; i < further.size(); i++) {
        Form constant = solution.constants().get(states.size() + i);
        value = value.plus(further.get(i).sum().times(constant));
      }
      next.add(new State(value, state.constants(), state.rest()));
    }
    return Optional.of(next);
  }

  private State combined(
      List<State> states, FirstOrderEquation.Solution solution, Monomial monomial, Level level) {
    Form c = solution.function();
    HarmonicPolynomial own = HarmonicPolynomial.of(monomial, c);
    HarmonicPolynomial moved =
        HarmonicPolynomial.moved(monomial, steps)
            .times(level.ratio().times(ShiftFactors.moved(c, x, 1)));
    HarmonicPolynomial rest = own.minus(moved);
    Form value = own.form().times(level.term());
    List<Form> constants = new ArrayList<>();
    for (int j = 0; j < states.size(); j++) {
      Form u = solution.constants().get(j);
      if (!u.isZero()) {
        value = value.plus(states.get(j).value().times(u));
        rest = rest.plus(states.get(j).rest().times(u));
      }
    }
    for (int i = 0; i < level.sides().size(); i++) {
      Form sum = Form.ZERO;
      for (int j = 0; j < states.size(); j++) {
        sum = sum.plus(states.get(j).constants().get(i).times(solution.constants().get(j)));
      }
      constants.add(sum);
    }
    return new State(value, constants, rest);
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
