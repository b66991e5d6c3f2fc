package gnomon.recurrence;

import gnomon.algebra.Refusal;
import gnomon.form.Elementary;
import gnomon.form.Exponential;
import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Antiderivative;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Solves linear differential equations: constant coefficients by the characteristic roots,
/// rational coefficients by rational multiples of exponentials e^(βx), what is missing by reduction
/// of the order; right sides by rational multiples of the exponentials in them.
public final class DifferentialSolver {
  private DifferentialSolver() {}

  /// What is known of the solutions.
  ///
  /// @throws Refusal where degrees are too large to search
  public static SolutionSpace solve(LinearEquation equation) {
    if (!equation.hasRationalCoefficients()) {
      List<Form> basis = equation.order() == 1 ? firstOrder(equation) : List.of();
      return new SolutionSpace(
          equation,
          particular(equation, basis),
          basis,
          List.of(),
          SolutionClass.EXPONENTIAL_RATIONAL,
          false,
          0);
    }
    LinearEquation cleared = equation.cleared();
    Basis basis =
        cleared.hasConstantCoefficients()
            ? constantCoefficients(cleared)
            : basis(cleared.homogeneous());
    Optional<Form> particular = particular(cleared, basis.functions());
    boolean absent =
        particular.isEmpty()
            && exponentialParts(cleared)
                .filter(parts -> parts.stream().allMatch(p -> forPart(cleared, p).exhaustive()))
                .isPresent();
    return new SolutionSpace(
        equation,
        particular,
        basis.functions(),
        basis.nonzero(),
        particular.isEmpty() ? SolutionClass.EXPONENTIAL_RATIONAL : basis.within(),
        particular.isEmpty() ? absent : basis.exhaustive(),
        0);
  }

  private record Basis(
      List<Form> functions, List<Form> nonzero, SolutionClass within, boolean exhaustive) {}

  private static boolean isSolution(LinearEquation equation, Form candidate) {
    return equation.homogeneous().residual(candidate).isZero();
  }

  // ---------------------------------------------------------------- right side 0

  private static Basis constantCoefficients(LinearEquation equation) {
    CharacteristicRoots roots = CharacteristicRoots.of(equation.coefficients());
    Form x = Form.of(equation.variable());
    List<Form> functions = new ArrayList<>();
    for (int j = 0; equation.coefficients().get(j).isZero(); j++) {
      functions.add(x.power(j));
    }
    functions.addAll(roots.inRealForm(root -> Elementary.exp(root.times(x)), x));
    functions.removeIf(y -> !isSolution(equation, y));
    List<Form> nonzero = new ArrayList<>(roots.distinct());
    nonzero.add(equation.leading());
    boolean exhaustive = functions.size() == equation.order();
    return new Basis(functions, nonzero, SolutionClass.EXPONENTIAL_POLYNOMIAL, exhaustive);
  }

  private static Basis basis(LinearEquation equation) {
    List<Form> nonzero = List.of();
    if (equation.order() == 1) {
      List<Form> found = firstOrder(equation);
      return new Basis(found, nonzero, SolutionClass.EXPONENTIAL_RATIONAL, !found.isEmpty());
    }
    Variable x = equation.variable();
    int degree =
        equation.coefficients().stream()
            .mapToInt(c -> Structure.degree(c, x).orElse(-1))
            .max()
            .orElse(-1);
    List<Form> top = new ArrayList<>();
    for (Form c : equation.coefficients()) {
      List<Form> list = Structure.asPolynomial(c, x).orElseThrow();
      top.add(list.size() == degree + 1 ? list.getLast() : Form.ZERO);
    }
    CharacteristicRoots rates = CharacteristicRoots.of(top);
    boolean exhaustive = rates.complete();
    List<Form> found = new ArrayList<>();
    List<Form> all = new ArrayList<>(List.of(Form.ZERO));
    rates.roots().forEach(root -> all.add(root.value()));
    for (Form rate : all) {
      Form exponential = Elementary.exp(rate.times(Form.of(x)));
      RationalDifferential rational = RationalDifferential.of(forMultiples(equation, exponential));
      exhaustive &= rational.exhaustive();
      rational.homogeneous().stream()
          .map(exponential::times)
          .filter(y -> isSolution(equation, y))
          .forEach(found::add);
    }
    List<Form> chosen = Conjugates.inRealForm(Independence.chosen(found, equation));
    if (!chosen.isEmpty() && chosen.size() < equation.order()) {
      chosen = completed(chosen, equation);
    }
    return new Basis(chosen, nonzero, SolutionClass.EXPONENTIAL_RATIONAL, exhaustive);
  }

  /// The equation for z with y = e z, divided by the exponential e.
  private static LinearEquation forMultiples(LinearEquation equation, Form exponential) {
    LinearEquation product = RationalDifferential.multiplied(equation, exponential);
    return product.scaled(exponential.inverse());
  }

  /// exp ∫ −c_0/c_1.
  private static List<Form> firstOrder(LinearEquation equation) {
    Form rate = equation.coefficients().getFirst().dividedBy(equation.leading()).negated();
    try {
      return Antiderivative.tryOf(rate, equation.variable())
          .map(Elementary::exp)
          .filter(y -> isSolution(equation, y))
          .stream()
          .toList();
    } catch (Refusal _) {
      return List.of();
    }
  }

  /// The solutions y = h ∫ v besides h, where v solves an equation of lower order.
  private static List<Form> completed(List<Form> known, LinearEquation equation) {
    Form h = known.getFirst();
    LinearEquation product = RationalDifferential.multiplied(equation.homogeneous(), h);
    LinearEquation lower =
        new LinearEquation(
                equation.action(),
                equation.variable(),
                product.coefficients().subList(1, product.coefficients().size()),
                Form.ZERO)
            .scaled(h.inverse());
    if (!lower.hasRationalCoefficients()) {
      return known;
    }
    List<Form> all = new ArrayList<>(known);
    for (Form v : basis(lower.cleared()).functions()) {
      antiderivative(v, equation.variable())
          .map(h::times)
          .filter(y -> isSolution(equation, y))
          .ifPresent(all::add);
    }
    return Independence.chosen(all, equation);
  }

  private static Optional<Form> antiderivative(Form f, Variable x) {
    try {
      return Antiderivative.tryOf(f, x);
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  // ---------------------------------------------------------------- right sides

  private static Optional<List<ExponentialPart>> exponentialParts(LinearEquation equation) {
    Form right = equation.rightSide();
    Polynomial below = right.denominator();
    Monomial kernels = Monomial.ONE;
    for (Monomial.Power power : below.monomialContent().factors()) {
      if (power.indeterminate() instanceof Exponential) {
        kernels = kernels.times(Monomial.of(power.indeterminate(), power.exponent()));
      }
    }
    Form plain = Form.of(below.times(kernels.power(Rational.MINUS_ONE)));
    Form rational = Structure.isRationalIn(plain, equation.variable()) ? plain : Form.ONE;
    return Structure.exponentialParts(right.times(rational), equation.variable())
        .map(
            parts ->
                parts.stream()
                    .map(
                        p ->
                            new ExponentialPart(
                                p.kernel(),
                                p.rate(),
                                List.of(
                                    Structure.polynomial(p.coefficients(), equation.variable())
                                        .dividedBy(rational))))
                    .toList());
  }

  private static Optional<Form> particular(LinearEquation equation, List<Form> basis) {
    if (equation.rightSide().isZero()) {
      return Optional.of(Form.ZERO);
    }
    Optional<Form> found = byParts(equation);
    if (found.isEmpty() && equation.order() == 1 && !basis.isEmpty()) {
      Form h = basis.getFirst();
      Form inside = equation.rightSide().dividedBy(equation.leading().times(h));
      found = antiderivative(inside, equation.variable()).map(h::times);
    }
    return found.filter(y -> equation.residual(y).isZero());
  }

  private static Optional<Form> byParts(LinearEquation equation) {
    Optional<List<ExponentialPart>> parts = exponentialParts(equation);
    if (parts.isEmpty() || !equation.hasRationalCoefficients()) {
      return Optional.empty();
    }
    List<Form> sum = new ArrayList<>();
    for (ExponentialPart part : parts.get()) {
      Optional<Form> found = forPart(equation, part).particular().map(part.kernel()::times);
      if (found.isEmpty()) {
        return found;
      }
      sum.add(found.get());
    }
    return Optional.of(Form.sum(sum));
  }

  /// The rational multiples of the exponential of one part.
  private static RationalDifferential forPart(LinearEquation equation, ExponentialPart part) {
    LinearEquation whole =
        equation.withRightSide(part.kernel().times(part.coefficients().getFirst()));
    return RationalDifferential.of(forMultiples(whole, part.kernel()));
  }
}
