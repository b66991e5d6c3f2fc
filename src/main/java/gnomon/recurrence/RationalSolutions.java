package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// All rational solutions of a recurrence with polynomial coefficients and a rational right side.
///
/// A polynomial u is found that every denominator divides, from the shifts between factors of the
/// leading coefficient and of the trailing one; y = z/u makes z a polynomial solution of another
/// recurrence.
///
/// Source: S. A. Abramov, Rational solutions of linear difference and q-difference equations with
/// polynomial coefficients (1995), the universal denominator, from memory.
///
/// @param particular one solution, where there is any
/// @param homogeneous a basis of the solutions for the right side 0
record RationalSolutions(Optional<Form> particular, List<Form> homogeneous) {

  private static final int FARTHEST = 500;

  /// The solutions of a recurrence whose trailing coefficient is not zero.
  ///
  /// @throws Refusal with [Reason#OUT_OF_RANGE] where shifts or degrees are too large
  static RationalSolutions of(LinearEquation equation) {
    LinearEquation cleared = equation.cleared();
    LinearEquation whole = cleared.scaled(Form.of(cleared.rightSide().denominator()));
    Form u = universalDenominator(whole);
    PolynomialSolutions polynomials = PolynomialSolutions.of(divided(whole, u));
    return new RationalSolutions(
        polynomials.particular().map(z -> z.dividedBy(u)),
        polynomials.homogeneous().stream().map(z -> z.dividedBy(u)).toList());
  }

  /// The equation for z = u y, its coefficients and right side polynomials.
  private static LinearEquation divided(LinearEquation equation, Form u) {
    Variable v = equation.variable();
    List<Form> coefficients = new ArrayList<>();
    Polynomial denominator = Polynomial.ONE;
    for (int i = 0; i <= equation.order(); i++) {
      Form c = equation.coefficients().get(i).dividedBy(ShiftFactors.moved(u, v, i));
      coefficients.add(c);
      denominator = Polynomial.lcm(denominator, c.denominator());
    }
    return new LinearEquation(equation.action(), v, coefficients, equation.rightSide())
        .scaled(Form.of(denominator));
  }

  private static Form universalDenominator(LinearEquation equation) {
    Variable v = equation.variable();
    Form last = ShiftFactors.moved(equation.leading(), v, -equation.order());
    List<Form> a = new ArrayList<>(ShiftFactors.of(last, v).factors());
    List<Form> b =
        new ArrayList<>(ShiftFactors.of(equation.coefficients().getFirst(), v).factors());
    Form u = Form.ONE;
    for (Optional<Pair> pair = farthest(a, b, v); pair.isPresent(); pair = farthest(a, b, v)) {
      Form factor = a.remove(pair.get().upper());
      b.remove(pair.get().lower());
      if (pair.get().shift() > FARTHEST) {
        throw new Refusal(Reason.OUT_OF_RANGE, Form.of(pair.get().shift()));
      }
      for (int i = 0; i <= pair.get().shift(); i++) {
        Budget.checkpoint();
        u = u.times(ShiftFactors.moved(factor, v, -i));
      }
    }
    return u;
  }

  private record Pair(int upper, int lower, int shift) {}

  /// The factors A_i(v) = const · B_j(v + h) with the largest h ≥ 0.
  private static Optional<Pair> farthest(List<Form> a, List<Form> b, Variable v) {
    Optional<Pair> best = Optional.empty();
    for (int i = 0; i < a.size(); i++) {
      for (int j = 0; j < b.size(); j++) {
        Optional<Integer> shift = ShiftFactors.shift(a.get(i), b.get(j), v);
        if (shift.isPresent()
            && shift.get() >= 0
            && (best.isEmpty() || shift.get() > best.get().shift())) {
          best = Optional.of(new Pair(i, j, shift.get()));
        }
      }
    }
    return best;
  }
}
