package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.polynomial.Factor;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// What is known of the solutions of a linear equation: those of the shape particular + Σ C_i
/// basis_i, every one checked by substitution.
///
/// @param equation the equation solved
/// @param particular one solution, where one was found; 0 for the right side 0
/// @param basis independent solutions for the right side 0
/// @param nonzero forms in the parameters that must not vanish
/// @param within the class searched
/// @param exhaustive whether the class has no other solutions, which then is proved
/// @param skipped how many arguments at the beginning of a range of integers the equation does not
///   tie to the later ones
public record SolutionSpace(
    LinearEquation equation,
    Optional<Form> particular,
    List<Form> basis,
    List<Form> nonzero,
    SolutionClass within,
    boolean exhaustive,
    int skipped) {

  /// Keeps its own copies.
  public SolutionSpace {
    basis = List.copyOf(basis);
    nonzero = factors(nonzero);
  }

  /// The irreducible factors, numbers left out.
  private static List<Form> factors(List<Form> forms) {
    List<Form> factors = new ArrayList<>();
    for (Form form : forms) {
      for (Factor factor : form.numerator().factor().factors()) {
        Form base = Form.of(factor.base());
        if (!base.isConstant() && !factors.contains(base)) {
          factors.add(base);
        }
      }
    }
    return List.copyOf(factors);
  }

  /// Whether every solution is a combination of these, up to the factors that the action takes for
  /// constants.
  public boolean isGeneral() {
    return particular.isPresent() && basis.size() == equation.order() - skipped;
  }

  /// Whether nothing was found.
  public boolean isEmpty() {
    return particular.isEmpty() || basis.isEmpty() && particular.get().isZero();
  }

  /// particular + Σ constants_i basis_i.
  public Form combination(List<Variable> constants) {
    return withConstants(constants.stream().map(Form::of).toList());
  }

  /// particular + Σ values_i basis_i.
  public Form withConstants(List<Form> values) {
    List<Form> parts = new ArrayList<>();
    parts.add(particular.orElseThrow());
    for (int i = 0; i < basis.size(); i++) {
      parts.add(values.get(i).times(basis.get(i)));
    }
    return Form.sum(parts);
  }

  /// The integers from `start` on at which the equation does not determine the next value, since
  /// its leading coefficient vanishes there.
  public List<BigInteger> undetermined(BigInteger start) {
    Form leading = equation.cleared().leading();
    return IntegerRoots.of(leading, equation.variable()).tailSet(start).stream()
        .map(root -> root.add(BigInteger.valueOf(equation.order())))
        .toList();
  }
}
