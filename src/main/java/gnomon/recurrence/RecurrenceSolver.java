package gnomon.recurrence;

import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Summation;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Solves linear recurrences: constant coefficients by the characteristic roots, polynomial
/// coefficients by hypergeometric solutions, what is missing by reduction of the order; right sides
/// by rational multiples of the hypergeometric terms in them.
public final class RecurrenceSolver {
  private final Summation sums;
  private final Optional<BigInteger> start;
  private final boolean leavesSums;

  private RecurrenceSolver(Summation sums, Optional<BigInteger> start, boolean leavesSums) {
    this.sums = sums;
    this.start = start;
    this.leavesSums = leavesSums;
  }

  /// A solver that sums by `sums`, for values from `start` on where that is given.
  public RecurrenceSolver(Summation sums, Optional<BigInteger> start) {
    this(sums, start, false);
  }

  /// The same solver, which leaves sums and products standing that do not close.
  public RecurrenceSolver leavingSums() {
    return new RecurrenceSolver(sums, start, true);
  }

  /// What is known of the solutions.
  ///
  /// @throws Refusal where degrees or shifts are too large to search
  public SolutionSpace solve(LinearEquation equation) {
    int skipped = 0;
    while (equation.coefficients().get(skipped).isZero()) {
      skipped++;
    }
    Form back = Form.of(equation.variable()).minus(Form.of(skipped));
    List<Form> coefficients =
        equation.coefficients().subList(skipped, equation.order() + 1).stream()
            .map(c -> c.substitute(equation.variable(), back))
            .toList();
    Form right = equation.rightSide().substitute(equation.variable(), back);
    LinearEquation lowest =
        new LinearEquation(equation.action(), equation.variable(), coefficients, right);
    Basis basis = lowest.hasRationalCoefficients() ? basis(lowest.cleared()) : bare(lowest);
    Optional<Form> particular = particular(lowest, basis.functions());
    boolean absent = particular.isEmpty() && isRationalTimesTerms(lowest);
    return new SolutionSpace(
        equation,
        particular,
        basis.functions(),
        basis.nonzero(),
        particular.isEmpty() ? SolutionClass.HYPERGEOMETRIC : basis.within(),
        particular.isEmpty() ? absent : basis.exhaustive(),
        skipped);
  }

  /// Whether a solution that is a sum of hypergeometric terms would have been found: one that is
  /// similar to each part of the right side then is one for that part.
  private static boolean isRationalTimesTerms(LinearEquation equation) {
    Variable v = equation.variable();
    return equation.hasRationalCoefficients()
        && equation.coefficients().stream().allMatch(ShiftFactors::isWithoutRadicals)
        && partsByKernel(equation.rightSide(), v).stream()
            .allMatch(part -> Structure.isRationalIn(ratio(equation, kernelOf(part, v)), v));
  }

  private static Form ratio(LinearEquation equation, Form term) {
    return equation.acted(term, 1).dividedBy(term);
  }

  private record Basis(
      List<Form> functions, List<Form> nonzero, SolutionClass within, boolean exhaustive) {}

  /// Nothing is known of coefficients that are not rational, but for order one.
  private Basis bare(LinearEquation equation) {
    List<Form> functions = equation.order() == 1 ? firstOrder(equation) : List.of();
    return new Basis(functions, List.of(), SolutionClass.HYPERGEOMETRIC, false);
  }

  private Basis basis(LinearEquation equation) {
    if (equation.order() == 0) {
      return new Basis(List.of(), List.of(), SolutionClass.HYPERGEOMETRIC, true);
    }
    if (equation.hasConstantCoefficients()) {
      return constantCoefficients(equation);
    }
    List<Form> nonzero = new ArrayList<>();
    if (equation.order() == 1) {
      return new Basis(firstOrder(equation), nonzero, SolutionClass.HYPERGEOMETRIC, true);
    }
    if (TwoTermSolutions.covers(equation)) {
      List<Form> found =
          TwoTermSolutions.of(equation).stream().filter(y -> isSolution(equation, y)).toList();
      if (found.size() == equation.order()) {
        return new Basis(Conjugates.inRealForm(found), nonzero, SolutionClass.HYPERGEOMETRIC, true);
      }
    }
    HypergeometricSolutions search = HypergeometricSolutions.of(equation);
    boolean exhaustive = search.exhaustive();
    List<Form> found = new ArrayList<>();
    for (Form ratio : search.ratios()) {
      Optional<Form> term = TermOfRatio.of(ratio, equation.variable(), start);
      exhaustive &= term.isPresent();
      term.filter(t -> isSolution(equation, t)).ifPresent(found::add);
    }
    List<Form> chosen = Conjugates.inRealForm(Independence.chosen(found, equation));
    if (!chosen.isEmpty() && chosen.size() < equation.order()) {
      chosen = completed(chosen, equation);
    }
    return new Basis(chosen, nonzero, SolutionClass.HYPERGEOMETRIC, exhaustive);
  }

  private static boolean isSolution(LinearEquation equation, Form candidate) {
    return equation.homogeneous().residual(candidate).isZero();
  }

  private Basis constantCoefficients(LinearEquation equation) {
    CharacteristicRoots roots = CharacteristicRoots.of(equation.coefficients());
    Form v = Form.of(equation.variable());
    List<Form> functions =
        new ArrayList<>(roots.inRealForm(root -> CharacteristicRoots.power(root, v), v));
    functions.removeIf(y -> !isSolution(equation, y));
    List<Form> nonzero = new ArrayList<>(roots.distinct());
    nonzero.add(equation.leading());
    nonzero.add(equation.coefficients().getFirst());
    boolean exhaustive = roots.complete() && functions.size() == equation.order();
    return new Basis(functions, nonzero, SolutionClass.EXPONENTIAL_POLYNOMIAL, exhaustive);
  }

  /// y with y(v+1) = −c_0/c_1 y(v), in closed form or as the product it is.
  private List<Form> firstOrder(LinearEquation equation) {
    Variable v = equation.variable();
    Form ratio = equation.coefficients().getFirst().dividedBy(equation.leading()).negated();
    Optional<Form> closed =
        Structure.isRationalIn(ratio, v) ? TermOfRatio.of(ratio, v, start) : Optional.empty();
    if (closed.isPresent()) {
      return closed.filter(y -> isSolution(equation, y)).stream().toList();
    }
    if (!leavesSums || !Structure.isRationalIn(ratio, v) || hasIntegerZeroOrPole(ratio, v)) {
      return List.of();
    }
    Variable k = new Variable(v.name() + "'");
    Form product =
        Accumulation.of(
            Accumulation.Kind.PRODUCT,
            k,
            Form.of(start.orElse(BigInteger.ZERO)),
            Form.of(v).minus(Form.ONE),
            ratio.substitute(v, Form.of(k)));
    return List.of(product);
  }

  private static boolean hasIntegerZeroOrPole(Form ratio, Variable v) {
    return !IntegerRoots.of(Form.of(ratio.numerator()), v).isEmpty()
        || !IntegerRoots.of(Form.of(ratio.denominator()), v).isEmpty();
  }

  // ---------------------------------------------------------------- reduction of the order

  /// The solutions y = h Σ u besides h, where u solves an equation of lower order.
  private List<Form> completed(List<Form> known, LinearEquation equation) {
    Form h = known.getFirst();
    LinearEquation reduced = reduced(equation, h);
    if (!reduced.hasRationalCoefficients()) {
      return known;
    }
    List<Form> all = new ArrayList<>(known);
    for (Form u : basis(reduced.cleared()).functions()) {
      antidifference(u, equation.variable())
          .map(h::times)
          .filter(y -> isSolution(equation, y))
          .ifPresent(all::add);
    }
    return Independence.chosen(all, equation);
  }

  /// The equation for u with y = h v, u = Δ v.
  private static LinearEquation reduced(LinearEquation equation, Form h) {
    List<Form> terms = new ArrayList<>();
    for (int i = 0; i <= equation.order(); i++) {
      Form ratio = equation.acted(h, i).dividedBy(h);
      terms.add(equation.coefficients().get(i).times(ratio));
    }
    List<Form> coefficients = new ArrayList<>();
    for (int k = 0; k < equation.order(); k++) {
      coefficients.add(Form.sum(terms.subList(k + 1, terms.size())));
    }
    return new LinearEquation(
        equation.action(), equation.variable(), coefficients, equation.rightSide().dividedBy(h));
  }

  private Optional<Form> antidifference(Form u, Variable v) {
    try {
      if (sums.antidifference(u, v, Form.ONE) instanceof Summation.Outcome.Found found) {
        return Optional.of(found.antidifference());
      }
    } catch (Refusal _) {
      return Optional.empty();
    }
    BigInteger lower = start.orElse(BigInteger.ZERO);
    if (!leavesSums || !isFiniteFrom(u, v, lower)) {
      return Optional.empty();
    }
    Variable k = new Variable(v.name() + "'");
    Form upper = Form.of(v).minus(Form.ONE);
    Form body = u.substitute(v, Form.of(k));
    return Optional.of(Accumulation.of(Accumulation.Kind.SUM, k, Form.of(lower), upper, body));
  }

  /// Whether no pole at an integer v ≥ lower is seen: no zero of the denominator, no factorial of a
  /// negative integer.
  private static boolean isFiniteFrom(Form u, Variable v, BigInteger lower) {
    for (Factor factor : u.denominator().factor().factors()) {
      Form base = Form.of(factor.base());
      if (base.dependsOn(v)
          && Structure.isRationalIn(base, v)
          && !IntegerRoots.of(base, v).tailSet(lower).isEmpty()) {
        return false;
      }
    }
    for (Generator g : u.generators()) {
      if (g instanceof Factorial factorial
          && u.numerator().contains(g)
          && factorial.argument().dependsOn(v)) {
        Form slope = factorial.argument().derivative(v);
        Form first = factorial.argument().substitute(v, Form.of(lower));
        boolean rising = slope.asRational().filter(s -> s.sign() > 0).isPresent();
        boolean natural = first.asRational().filter(r -> r.sign() < 0).isEmpty();
        if (!rising || !natural) {
          return false;
        }
      }
    }
    return true;
  }

  // ---------------------------------------------------------------- right sides

  private Optional<Form> particular(LinearEquation equation, List<Form> basis) {
    if (equation.rightSide().isZero()) {
      return Optional.of(Form.ZERO);
    }
    if (equation.order() == 0) {
      return Optional.of(equation.rightSide().dividedBy(equation.leading()));
    }
    List<Form> parts = new ArrayList<>();
    for (Form part : partsByKernel(equation.rightSide(), equation.variable())) {
      Optional<Form> found = forTerm(equation.withRightSide(part));
      if (found.isEmpty()) {
        found = bySum(equation.withRightSide(part), basis);
      }
      if (found.isEmpty()) {
        return found;
      }
      parts.add(found.get());
    }
    Form sum = Form.sum(parts);
    return Optional.of(sum).filter(y -> equation.residual(y).isZero());
  }

  /// A solution that is a rational multiple of the right side, which is one term.
  private static Optional<Form> forTerm(LinearEquation equation) {
    Variable v = equation.variable();
    Form kernel = kernelOf(equation.rightSide(), v);
    Form ratio = ratio(equation, kernel);
    if (!Structure.isRationalIn(ratio, v) || !equation.hasRationalCoefficients()) {
      return Optional.empty();
    }
    List<Form> coefficients = new ArrayList<>();
    Form product = Form.ONE;
    for (int i = 0; i <= equation.order(); i++) {
      coefficients.add(equation.coefficients().get(i).times(product));
      product = product.times(ShiftFactors.moved(ratio, v, i));
    }
    Form right = equation.rightSide().dividedBy(kernel);
    LinearEquation rational = new LinearEquation(equation.action(), v, coefficients, right);
    return RationalSolutions.of(rational)
        .particular()
        .map(kernel::times)
        .filter(y -> equation.residual(y).isZero());
  }

  /// A solution h Σ g/(c_1 h(v+1)) for order one.
  private Optional<Form> bySum(LinearEquation equation, List<Form> basis) {
    if (equation.order() != 1 || basis.isEmpty()) {
      return Optional.empty();
    }
    Form h = basis.getFirst();
    Form next = equation.acted(h, 1).times(equation.leading());
    return antidifference(equation.rightSide().dividedBy(next), equation.variable())
        .map(h::times)
        .filter(y -> equation.residual(y).isZero());
  }

  /// The right side split by the kernels in its numerator that depend on v.
  private static List<Form> partsByKernel(Form f, Variable v) {
    Map<Monomial, Polynomial> groups = new LinkedHashMap<>();
    for (Term term : f.numerator().terms()) {
      groups.merge(
          kernelPart(term.monomial(), v),
          Polynomial.of(term.monomial(), term.coefficient()),
          Polynomial::plus);
    }
    return groups.values().stream().map(p -> Form.fraction(p, f.denominator())).toList();
  }

  /// The kernels of one term: those of the numerator over those of the denominator.
  private static Form kernelOf(Form term, Variable v) {
    Monomial above = kernelPart(term.numerator().terms().getFirst().monomial(), v);
    Monomial below = kernelPart(term.denominator().terms().getFirst().monomial(), v);
    return Form.of(Polynomial.of(above)).dividedBy(Form.of(Polynomial.of(below)));
  }

  private static Monomial kernelPart(Monomial monomial, Variable v) {
    Monomial kernels = Monomial.ONE;
    for (Monomial.Power power : monomial.factors()) {
      if (power.indeterminate() instanceof Generator g && !g.equals(v) && g.dependsOn(v)) {
        kernels = kernels.times(Monomial.of(g, power.exponent()));
      }
    }
    return kernels;
  }
}
