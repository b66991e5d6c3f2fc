package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Univariate;
import gnomon.form.Variable;
import gnomon.polynomial.Polynomial;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The equation r(x) c(x+1) − c(x) = Σ_j u_j g_j(x) for a rational function c and constants u_j,
/// with rational functions r ≠ 0 and g_j.
///
/// With a term t of ratio r it is Δ(t c) = t Σ_j u_j g_j, so c is found by Gosper's method from the
/// term t/d, d a common denominator of the g_j, with the key equation for all right sides at once.
///
/// Source: R. W. Gosper (1978), and M. Karr, Summation in finite terms (1981), for the constants
/// that are left open in the right side; both from memory.
record FirstOrderEquation(Form ratio, List<Form> sides) {

  /// A solution: the function c and the constants u_j.
  record Solution(Form function, List<Form> constants) {}

  /// Keeps its own copy.
  FirstOrderEquation {
    sides = List.copyOf(sides);
  }

  /// A basis of all solutions (c, u), or nothing where the factors of r are too far apart.
  Optional<List<Solution>> solutions(Variable x) {
    Form denominator = Form.ONE;
    for (Form side : sides) {
      denominator = Form.of(Polynomial.lcm(denominator.numerator(), side.denominator()));
    }
    Form quotient = denominator.dividedBy(ShiftFactors.moved(denominator, x, 1));
    Optional<GosperForm> gosper = GosperForm.of(ratio.times(quotient), x);
    if (gosper.isEmpty()) {
      return Optional.empty();
    }
    GosperForm form = gosper.get();
    List<Univariate> right = new ArrayList<>();
    for (Form side : sides) {
      right.add(in(side.times(denominator), x).times(form.c()));
    }
    Univariate lowered = form.lowered(x);
    Form factor = polynomial(lowered, x).dividedBy(polynomial(form.c(), x).times(denominator));
    return Optional.of(
        new KeyEquation(form.a(), lowered, right)
            .solutions(x).stream()
                .map(
                    found ->
                        new Solution(
                            factor.times(Structure.polynomial(found.y(), x)), found.constants()))
                .toList());
  }

  private static Univariate in(Form form, Variable x) {
    return new Univariate(Structure.asPolynomial(form, x).orElseThrow());
  }

  private static Form polynomial(Univariate p, Variable x) {
    return Structure.polynomial(p.coefficients(), x);
  }
}
