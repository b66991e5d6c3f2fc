package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// Creative telescoping of hypergeometric terms times polynomials in harmonic numbers: constants
/// c_i(n) for which Σ_i c_i F(n+i, k) has an antidifference in the tower of the summand.
///
/// Source: C. Schneider, Symbolic summation in difference fields (2001), and P. Paule, C.
/// Schneider, Computer proofs of a new family of harmonic number identities (2003), for creative
/// telescoping as parametrised telescoping in a tower; from memory.
final class HarmonicTelescoper {
  private HarmonicTelescoper() {}

  /// The telescoper of least order up to the limit, or nothing where none is found. It has been
  /// checked by dividing by the summand.
  static Optional<Telescoper> of(Form summand, Variable n, Variable k, int maximalOrder) {
    if (!summand.dependsOn(n)) {
      return Optional.empty();
    }
    List<Form> moved = new ArrayList<>();
    for (int order = 0; order <= maximalOrder; order++) {
      Budget.checkpoint();
      moved.add(summand.substitute(n, Form.of(n).plus(Form.of(order))));
      Optional<Telescoper> found = ofSummands(moved, k);
      if (found.isPresent()) {
        return found.filter(telescoper -> confirms(telescoper, summand, moved, k));
      }
    }
    return Optional.empty();
  }

  private static Optional<Telescoper> ofSummands(List<Form> moved, Variable k) {
    Map<Generator, Form> steps = new TreeMap<>();
    Map<Form, HarmonicSummand.Part> parts = new LinkedHashMap<>();
    Map<Form, List<HarmonicPolynomial>> sides = new LinkedHashMap<>();
    for (int i = 0; i < moved.size(); i++) {
      Optional<HarmonicSummand> read = HarmonicSummand.of(moved.get(i), k);
      if (read.isEmpty()) {
        return Optional.empty();
      }
      steps.putAll(read.get().steps());
      for (HarmonicSummand.Part part : read.get().parts()) {
        parts.putIfAbsent(part.term(), part);
        sides
            .computeIfAbsent(
                part.term(),
                _ -> new ArrayList<>(Collections.nCopies(moved.size(), HarmonicPolynomial.ZERO)))
            .set(i, part.polynomial());
      }
    }
    List<HarmonicTower.Level> levels = new ArrayList<>();
    parts.forEach(
        (term, part) -> levels.add(new HarmonicTower.Level(term, part.ratio(), sides.get(term))));
    return new HarmonicTower(k, steps)
        .solve(levels)
        .solution()
        .map(solution -> cleared(solution, moved.getFirst()));
  }

  /// The telescoper with coefficients that are polynomials.
  private static Telescoper cleared(HarmonicTower.Solution solution, Form summand) {
    Form scale = Form.ONE;
    for (Form c : solution.constants()) {
      scale = Telescoper.commonMultiple(scale, c);
    }
    List<Form> coefficients = new ArrayList<>();
    for (Form c : solution.constants()) {
      coefficients.add(c.times(scale));
    }
    return new Telescoper(coefficients, solution.sum().times(scale).dividedBy(summand));
  }

  /// Whether Σ_i c_i F(n+i, k) = G(n, k+1) − G(n, k), divided by F(n, k), in the normal form.
  private static boolean confirms(
      Telescoper telescoper, Form summand, List<Form> moved, Variable k) {
    Form left = Form.ZERO;
    for (int i = 0; i < moved.size(); i++) {
      left = left.plus(telescoper.coefficients().get(i).times(moved.get(i)));
    }
    Form certificate = telescoper.certificate();
    Form ratio = ShiftFactors.moved(summand, k, 1).dividedBy(summand);
    Form next = ShiftFactors.moved(certificate, k, 1).times(ratio);
    return left.dividedBy(summand).equals(next.minus(certificate))
        && !telescoper.coefficients().getLast().isZero();
  }
}
