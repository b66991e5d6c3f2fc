package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Univariate;
import gnomon.form.Variable;
import gnomon.polynomial.Polynomial;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// A creative telescoping of a summand: Σ_i coefficients_i(n) F(n+i, k) = G(n, k+1) − G(n, k) with
/// G = certificate · F.
///
/// @param coefficients c_0(n), …, c_J(n), polynomials in n without common factor, free of k
/// @param certificate the rational function R(n, k)
public record Telescoper(List<Form> coefficients, Form certificate) {

  /// Keeps its own copy.
  public Telescoper {
    coefficients = List.copyOf(coefficients);
  }

  /// The telescoper of least order up to the limit; nothing where F is not hypergeometric in both
  /// variables, or none is found.
  ///
  /// Source: D. Zeilberger, The method of creative telescoping (1991), as told in Petkovšek, Wilf,
  /// Zeilberger, A = B (1996), chapter 6, from memory.
  static Optional<Telescoper> of(Form summand, Variable n, Variable k, int maximalOrder) {
    Optional<HypergeometricTerm> inK = HypergeometricTerm.of(summand, k, Form.ONE);
    Optional<HypergeometricTerm> inN = HypergeometricTerm.of(summand, n, Form.ONE);
    if (inK.isEmpty()
        || inN.isEmpty()
        || !Structure.isRationalIn(inN.get().ratio(), k)
        || !Structure.isRationalIn(inK.get().ratio(), n)) {
      return Optional.empty();
    }
    List<Form> ratios = new ArrayList<>(List.of(Form.ONE));
    for (int order = 0; order <= maximalOrder; order++) {
      Budget.checkpoint();
      if (order > 0) {
        Form step = inN.get().ratio().substitute(n, Form.of(n).plus(Form.of(order - 1)));
        ratios.add(ratios.getLast().times(step));
      }
      Optional<Telescoper> found = ofOrder(inK.get(), ratios, k);
      if (found.isPresent() && found.get().telescopes(inK.get().ratio(), ratios, k)) {
        return found;
      }
    }
    return Optional.empty();
  }

  private static Optional<Telescoper> ofOrder(
      HypergeometricTerm term, List<Form> ratios, Variable k) {
    Form denominator = ratios.stream().reduce(Form.ONE, Telescoper::commonMultiple);
    Form quotient = denominator.dividedBy(ShiftFactors.moved(denominator, k, 1));
    Optional<GosperForm> gosper = GosperForm.of(term.ratio().times(quotient), k);
    if (gosper.isEmpty()) {
      return Optional.empty();
    }
    GosperForm form = gosper.get();
    List<Univariate> sides = new ArrayList<>();
    for (Form ratio : ratios) {
      Form numerator = ratio.times(denominator);
      sides.add(in(numerator, k).times(form.c()));
    }
    Univariate lowered = form.lowered(k);
    Optional<KeyEquation.Solution> solution = new KeyEquation(form.a(), lowered, sides).solve(k);
    return solution.map(found -> assembled(found, form, lowered, denominator, k));
  }

  private static Telescoper assembled(
      KeyEquation.Solution solution,
      GosperForm form,
      Univariate lowered,
      Form denominator,
      Variable k) {
    Form y = Structure.polynomial(solution.y(), k);
    Form below = Structure.polynomial(form.c().coefficients(), k).times(denominator);
    Form certificate = Structure.polynomial(lowered.coefficients(), k).times(y).dividedBy(below);
    Form scale = Form.ONE;
    for (Form c : solution.constants()) {
      scale = commonMultiple(scale, c);
    }
    List<Form> coefficients = new ArrayList<>();
    for (Form c : solution.constants()) {
      coefficients.add(c.times(scale));
    }
    return new Telescoper(coefficients, certificate.times(scale));
  }

  private static Univariate in(Form form, Variable k) {
    return new Univariate(Structure.asPolynomial(form, k).orElseThrow());
  }

  static Form commonMultiple(Form polynomial, Form fraction) {
    return Form.of(Polynomial.lcm(polynomial.numerator(), fraction.denominator()));
  }

  /// Whether Σ_i c_i F(n+i, k)/F(n, k) = R(n, k+1) F(n, k+1)/F(n, k) − R(n, k), as rational
  /// functions: the check that shares nothing with the search.
  private boolean telescopes(Form ratio, List<Form> ratios, Variable k) {
    Form left = Form.ZERO;
    for (int i = 0; i < coefficients.size(); i++) {
      left = left.plus(coefficients.get(i).times(ratios.get(i)));
    }
    Form next = ShiftFactors.moved(certificate, k, 1).times(ratio);
    return left.equals(next.minus(certificate));
  }
}
