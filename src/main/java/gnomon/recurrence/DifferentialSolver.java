package gnomon.recurrence;

import gnomon.form.Elementary;
import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Solves linear differential equations: constant coefficients by the characteristic roots,
/// polynomial coefficients by polynomial solutions; right sides that are exponential polynomials by
/// polynomial multiples of their exponentials.
public final class DifferentialSolver {
  private DifferentialSolver() {}

  /// What is known of the solutions.
  public static SolutionSpace solve(LinearEquation equation) {
    List<Form> basis = new ArrayList<>();
    List<Form> nonzero = new ArrayList<>();
    SolutionClass within = SolutionClass.POLYNOMIAL;
    boolean exhaustive = false;
    LinearEquation cleared = equation.hasRationalCoefficients() ? equation.cleared() : equation;
    if (cleared.hasConstantCoefficients()) {
      CharacteristicRoots roots = CharacteristicRoots.of(cleared.coefficients());
      basis = constantCoefficients(cleared, roots);
      nonzero.addAll(roots.distinct());
      nonzero.add(cleared.leading());
      within = SolutionClass.EXPONENTIAL_POLYNOMIAL;
      exhaustive = basis.size() == equation.order();
    } else if (equation.hasRationalCoefficients()) {
      basis = new ArrayList<>(PolynomialSolutions.of(cleared.homogeneous()).homogeneous());
      basis.removeIf(y -> !isSolution(equation, y));
      exhaustive = true;
    }
    Optional<Form> particular = particular(cleared);
    if (particular.isEmpty()) {
      within = SolutionClass.EXPONENTIAL_POLYNOMIAL;
      exhaustive =
          equation.hasRationalCoefficients()
              && Structure.exponentialParts(cleared.rightSide(), equation.variable()).isPresent();
    }
    return new SolutionSpace(equation, particular, basis, nonzero, within, exhaustive, 0);
  }

  private static boolean isSolution(LinearEquation equation, Form candidate) {
    return equation.homogeneous().residual(candidate).isZero();
  }

  private static List<Form> constantCoefficients(
      LinearEquation equation, CharacteristicRoots roots) {
    Form x = Form.of(equation.variable());
    List<Form> basis = new ArrayList<>();
    for (int j = 0; equation.coefficients().get(j).isZero(); j++) {
      basis.add(x.power(j));
    }
    basis.addAll(roots.inRealForm(root -> Elementary.exp(root.times(x)), x));
    basis.removeIf(y -> !isSolution(equation, y));
    return basis;
  }

  private static Optional<Form> particular(LinearEquation equation) {
    if (equation.rightSide().isZero()) {
      return Optional.of(Form.ZERO);
    }
    Optional<List<ExponentialPart>> parts =
        Structure.exponentialParts(equation.rightSide(), equation.variable());
    if (parts.isEmpty() || !equation.hasRationalCoefficients()) {
      return Optional.empty();
    }
    List<Form> sum = new ArrayList<>();
    for (ExponentialPart part : parts.get()) {
      Optional<Form> found = forPart(equation, part);
      if (found.isEmpty()) {
        return found;
      }
      sum.add(found.get());
    }
    return Optional.of(Form.sum(sum)).filter(y -> equation.residual(y).isZero());
  }

  /// A polynomial multiple of the exponential e^(βx), by Σ c_i (D + β)^i.
  private static Optional<Form> forPart(LinearEquation equation, ExponentialPart part) {
    Variable x = equation.variable();
    List<Form> coefficients = new ArrayList<>();
    for (int j = 0; j <= equation.order(); j++) {
      Form sum = Form.ZERO;
      for (int i = j; i <= equation.order(); i++) {
        Form moved = part.rate().power(i - j).times(Rational.of(Integers.binomial(i, j)));
        sum = sum.plus(equation.coefficients().get(i).times(moved));
      }
      coefficients.add(sum);
    }
    Form right = Structure.polynomial(part.coefficients(), x);
    LinearEquation forZ = new LinearEquation(equation.action(), x, coefficients, right);
    return PolynomialSolutions.of(forZ).particular().map(part.kernel()::times);
  }
}
