package gnomon.basis;

import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.InverseSeries;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.Optional;

/// Proofs that two forms are the same power series in t, where their normal forms differ.
///
/// - Forms with equal derivatives that begin alike are equal; so are forms with equal logarithmic
///   derivatives whose first coefficients are equal. Derivatives of logarithms, arcs and powers
///   with symbolic exponents lie in the field where equality is decided.
/// - A form with the inverse series W of f at t vanishes exactly when it does after t ↦ f(t), which
///   makes W(f(t)) = t: so the defining equation of W decides.
///
/// Every answer of `true` is a proof; `false` says nothing.
final class SeriesIdentity {

  /// The order to which first coefficients are looked for.
  private static final int FIRST = 6;

  private SeriesIdentity() {}

  /// Whether a and b are proved to be the same series in t.
  static boolean same(Form a, Form b, Dual t) {
    return a.equals(b) || wayOf(a, b, t).isPresent();
  }

  /// How a and b, whose normal forms differ, are proved to be the same series in t.
  static Optional<Comparison.Way> wayOf(Form a, Form b, Dual t) {
    try {
      Form gap = a.minus(b);
      if (isConstantZero(gap, t)) {
        return Optional.of(Comparison.Way.DERIVATIVE);
      }
      if (vanishesStraight(gap, t)) {
        return Optional.of(Comparison.Way.DEFINING_EQUATION);
      }
      return proportional(a, b, t) ? Optional.of(Comparison.Way.QUOTIENT) : Optional.empty();
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// Whether the derivative is 0 and the value at 0 too.
  private static boolean isConstantZero(Form h, Dual t) {
    return h.isZero() || h.derivative(t).isZero() && Expansion.of(h, t, 0).isZero();
  }

  /// Whether h vanishes after t ↦ f(t), for an inverse series W of f at t in it.
  private static boolean vanishesStraight(Form h, Dual t) {
    Optional<InverseSeries> standing = standing(h, t);
    if (standing.isEmpty()) {
      return false;
    }
    Form f = standing.get().of().substitute(standing.get().in(), Form.of(t));
    Form straight = Kernels.unwrapped(h.substitute(t, f), t);
    return standing(straight, t).isEmpty() && isConstantZero(straight, t)
        || vanishesStraight(straight, t);
  }

  /// Whether a′ b = b′ a and the first coefficients agree.
  private static boolean proportional(Form a, Form b, Dual t) {
    if (b.isZero() || standing(a, t).isPresent() || standing(b, t).isPresent()) {
      return false;
    }
    Form slopes = a.derivative(t).dividedBy(a).minus(b.derivative(t).dividedBy(b));
    return slopes.isZero() && beginAlike(a, b, t);
  }

  private static boolean beginAlike(Form a, Form b, Dual t) {
    PowerSeries left = Expansion.of(a, t, FIRST);
    PowerSeries right = Expansion.of(b, t, FIRST);
    return !right.isZero()
        && left.valuation() == right.valuation()
        && left.coefficient(left.valuation()).equals(right.coefficient(right.valuation()));
  }

  /// An inverse series at t itself that occurs in the form.
  private static Optional<InverseSeries> standing(Form form, Dual t) {
    for (Generator generator : form.generators()) {
      if (generator instanceof InverseSeries series && series.argument().equals(Form.of(t))) {
        return Optional.of(series);
      }
      for (Form inner : Kernels.arguments(generator)) {
        Optional<InverseSeries> found = standing(inner, t);
        if (found.isPresent()) {
          return found;
        }
      }
    }
    return Optional.empty();
  }
}
