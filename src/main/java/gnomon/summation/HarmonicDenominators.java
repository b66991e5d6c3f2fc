package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Term;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.List;

/// Summands with harmonic numbers in the denominator, as 1/(x H(x)).
///
/// Of the factors of the denominator of F that contain a harmonic number take, in one class modulo
/// shifts, the first and the last: the denominator of ΔF contains the first one and the last one
/// moved by one step. So a summand with exactly one such factor is no difference.
///
/// Source: the argument of S. A. Abramov (1971) for rational functions; M. Karr, Summation in
/// finite terms (1981), for towers; from memory.
final class HarmonicDenominators {
  private HarmonicDenominators() {}

  /// Whether that argument applies to f: one hypergeometric term in front, no algebraic number, and
  /// independent harmonic numbers with rational steps.
  static boolean proveAbsence(Form f, Variable x) {
    Form term = Form.ONE;
    List<Form> steps = new ArrayList<>();
    Term first = f.numerator().terms().getFirst();
    for (Generator g : f.generators()) {
      if (g.isAlgebraic()) {
        return false;
      }
      if (g.equals(x) || !g.dependsOn(x)) {
        continue;
      }
      if (g instanceof Harmonic) {
        Form step = ShiftFactors.moved(Form.of(g), x, 1).minus(Form.of(g));
        if (!Structure.isRationalIn(step, x)) {
          return false;
        }
        steps.add(step);
      } else if (HarmonicSummand.isPower(g) && isOneFactor(f, g)) {
        term = term.times(Form.of(g, first.monomial().exponent(g)));
        Monomial below = f.denominator().monomialContent();
        term = term.dividedBy(Form.of(g, below.exponent(g)));
      } else {
        return false;
      }
    }
    Form ratio = ShiftFactors.moved(term, x, 1).dividedBy(term);
    return Structure.isRationalIn(ratio, x)
        && ratio.generators().stream().noneMatch(Generator::isAlgebraic)
        && factorsWithHarmonicNumbers(f, x) == 1
        && HarmonicSteps.areIndependent(steps, x);
  }

  /// Whether f is a power of the generator times a form free of it.
  private static boolean isOneFactor(Form f, Generator g) {
    Form free = f.dividedBy(Form.of(g, f.numerator().terms().getFirst().monomial().exponent(g)));
    Form whole = free.times(Form.of(g, f.denominator().monomialContent().exponent(g)));
    return !whole.generators().contains(g);
  }

  private static int factorsWithHarmonicNumbers(Form f, Variable x) {
    int count = 0;
    for (Factor factor : f.denominator().factor().factors()) {
      for (Indeterminate inside : factor.base().indeterminates()) {
        if (inside instanceof Harmonic harmonic && harmonic.dependsOn(x)) {
          count++;
          break;
        }
      }
    }
    return count;
  }
}
