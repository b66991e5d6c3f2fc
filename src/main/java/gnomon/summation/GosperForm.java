package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Univariate;
import gnomon.form.Variable;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Factorization;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/// A rational function of k as a(k)/b(k) · c(k+1)/c(k) with a(k) and b(k+j) coprime for every
/// natural number j.
///
/// Source: R. W. Gosper, Decision procedure for indefinite hypergeometric summation (1978); the
/// form as in M. Petkovšek, H. S. Wilf, D. Zeilberger, A = B (1996), chapter 5; both from memory.
record GosperForm(Univariate a, Univariate b, Univariate c) {

  /// The largest shift between two factors that is followed up; farther ones are refused, since the
  /// polynomial c would have as many factors.
  private static final int FARTHEST = 2_000;

  /// The form, or nothing where two factors are more than the limit apart.
  static Optional<GosperForm> of(Form ratio, Variable k) {
    Factorization top = ratio.numerator().factor();
    Factorization bottom = ratio.denominator().factor();
    List<Form> up = new ArrayList<>();
    List<Form> down = new ArrayList<>();
    Form unit = Form.of(top.unit().dividedBy(bottom.unit()));
    unit = unit.times(split(top, k, up)).dividedBy(split(bottom, k, down));
    List<Form> common = new ArrayList<>();
    for (int i = 0; i < up.size(); i++) {
      Nearest nearest = nearest(up.get(i), down, k);
      if (nearest == null) {
        continue;
      }
      if (nearest.shift() > FARTHEST) {
        return Optional.empty();
      }
      Budget.checkpoint();
      Form upper = up.get(i);
      unit =
          unit.times(
              upper.dividedBy(ShiftFactors.moved(down.get(nearest.index()), k, nearest.shift())));
      for (int j = 1; j <= nearest.shift(); j++) {
        common.add(ShiftFactors.moved(upper, k, -j));
      }
      up.set(i, Form.ONE);
      down.set(nearest.index(), Form.ONE);
    }
    Univariate a = product(up, k).times(Univariate.constant(unit));
    return Optional.of(new GosperForm(a, product(down, k), product(common, k)));
  }

  private record Nearest(int index, int shift) {}

  /// The factor below that is the given one moved by the smallest −j ≤ 0, or null.
  private static Nearest nearest(Form upper, List<Form> down, Variable k) {
    Nearest best = null;
    for (int i = 0; i < down.size(); i++) {
      Optional<Integer> shift = ShiftFactors.shift(upper, down.get(i), k);
      if (shift.isPresent() && shift.get() >= 0 && (best == null || shift.get() < best.shift())) {
        best = new Nearest(i, shift.get());
      }
    }
    return best;
  }

  /// The factors that depend on k go to the list, once for each multiplicity; the product of the
  /// others is the value.
  private static Form split(Factorization factorization, Variable k, List<Form> dependent) {
    Form rest = Form.ONE;
    for (Factor factor : factorization.factors()) {
      Form base = Form.of(factor.base());
      if (base.dependsOn(k)) {
        dependent.addAll(Collections.nCopies(factor.multiplicity(), base));
      } else {
        rest = rest.times(base.power(factor.multiplicity()));
      }
    }
    return rest;
  }

  private static Univariate product(List<Form> factors, Variable k) {
    Form product = Form.product(factors);
    return new Univariate(Structure.asPolynomial(product, k).orElseThrow());
  }

  /// b(k − 1).
  Univariate lowered(Variable k) {
    Form moved = ShiftFactors.moved(Structure.polynomial(b.coefficients(), k), k, -1);
    return new Univariate(Structure.asPolynomial(moved, k).orElseThrow());
  }
}
