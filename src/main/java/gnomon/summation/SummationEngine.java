package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.operator.Summation;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/// The list of solvers for antidifferences, tried in order, and the check that guards them.
///
/// A further method is added by putting its [AntidifferenceSolver] into the list. The first solver
/// that finds an antidifference or proves that there is none ends the search; what is found is
/// verified by differencing, and a solver whose answer fails that check is passed over. When none
/// covers the summand as a whole, its parts over different kernels are summed apart.
public final class SummationEngine implements Summation {

  private final List<AntidifferenceSolver> solvers;

  /// An engine with the given solvers, cheapest first.
  public SummationEngine(List<AntidifferenceSolver> solvers) {
    this.solvers = List.copyOf(solvers);
  }

  /// The engine for polynomials, polynomials times exponentials, rational functions, hypergeometric
  /// terms, and these times polynomials in harmonic numbers.
  public static SummationEngine standard() {
    return new SummationEngine(
        List.of(
            new ExponentialPolynomialSolver(),
            new RationalSolver(),
            new HypergeometricSolver(),
            new HarmonicTowerSolver()));
  }

  /// The outcome of [#search] as operators ask for it.
  @Override
  public Outcome antidifference(Form summand, Variable variable, Form step) {
    return switch (search(summand, variable, step)) {
      case Antidifference.Found found -> new Outcome.Found(found.value());
      case Antidifference.ProvedAbsent absent -> new Outcome.ProvedAbsent(absent.within().words());
      case Antidifference.GaveUp gaveUp ->
          new Outcome.GaveUp(
              gaveUp.tried().stream().map(FunctionClass::words).collect(Collectors.joining(", ")));
    };
  }

  /// F with F(x + h) − F(x) = f(x), verified; or the proof or admission that there is none to hand.
  public Antidifference search(Form f, Variable x, Form h) {
    Antidifference whole = tried(f, x, h);
    if (!(whole instanceof Antidifference.GaveUp gaveUp)) {
      return whole;
    }
    List<Form> parts = partsByKernel(f, x);
    if (parts.size() < 2) {
      return whole;
    }
    List<Form> sums = new ArrayList<>();
    List<Condition> conditions = new ArrayList<>();
    for (Form part : parts) {
      if (!(tried(part, x, h) instanceof Antidifference.Found found)) {
        return gaveUp;
      }
      sums.add(found.value());
      found.conditions().stream().filter(c -> !conditions.contains(c)).forEach(conditions::add);
    }
    return verified(
        new Antidifference.Found(Form.sum(sums), conditions, FunctionClass.MIXED), f, x, h);
  }

  private Antidifference tried(Form f, Variable x, Form h) {
    for (AntidifferenceSolver solver : solvers) {
      Antidifference outcome = attempt(solver, f, x, h);
      if (!(outcome instanceof Antidifference.GaveUp)) {
        return outcome;
      }
    }
    return new Antidifference.GaveUp(solvers.stream().map(AntidifferenceSolver::searches).toList());
  }

  /// The verified outcome of one solver; a refusal on its way means that it does not cover f.
  private static Antidifference attempt(AntidifferenceSolver solver, Form f, Variable x, Form h) {
    try {
      return verified(solver.solve(f, x, h), f, x, h);
    } catch (Refusal refusal) {
      return new Antidifference.GaveUp(List.of(solver.searches()));
    }
  }

  private static Antidifference verified(Antidifference outcome, Form f, Variable x, Form h) {
    return switch (outcome) {
      case Antidifference.Found found ->
          Differencing.confirms(found.value(), f, x, h)
              ? found
              : new Antidifference.GaveUp(List.of(found.within()));
      case Antidifference.ProvedAbsent absent -> absent;
      case Antidifference.GaveUp gaveUp -> gaveUp;
    };
  }

  /// The summand split by the kernels of its numerator that depend on x.
  private static List<Form> partsByKernel(Form f, Variable x) {
    Map<Monomial, List<Term>> groups = new LinkedHashMap<>();
    for (Term term : f.numerator().terms()) {
      groups.computeIfAbsent(kernelPart(term.monomial(), x), _ -> new ArrayList<>()).add(term);
    }
    return groups.values().stream()
        .map(terms -> Form.fraction(polynomial(terms), f.denominator()))
        .toList();
  }

  private static Polynomial polynomial(List<Term> terms) {
    Polynomial sum = Polynomial.ZERO;
    for (Term term : terms) {
      sum = sum.plus(Polynomial.of(term.monomial(), term.coefficient()));
    }
    return sum;
  }

  private static Monomial kernelPart(Monomial monomial, Variable x) {
    Monomial kernels = Monomial.ONE;
    for (var factor : monomial.factors()) {
      if (factor.indeterminate() instanceof Generator generator
          && !generator.equals(x)
          && Form.of(generator).dependsOn(x)) {
        kernels = kernels.times(Monomial.of(generator, factor.exponent()));
      }
    }
    return kernels;
  }
}
