package gnomon.basis;

import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.InverseSeries;
import gnomon.form.Structure;
import gnomon.series.Expansion;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The delta operator W that solves an equation h(D, W) = 0 between shift-invariant operators.
///
/// By the theorem on implicit functions there is one series W(t) with W(0) = 0 when h(0, 0) = 0 and
/// ∂h/∂s(0, 0) ≠ 0. The equation is solved for t = φ(W), so that W is the inverse series of φ: in
/// closed form where it has one, otherwise as a series that is exact to any order asked for. For W
/// = D u(W), Lagrange's case, φ(s) = s/u(s).
///
/// Refuses nothing: what is not of this kind gives no answer.
public final class ImplicitOperator {
  private final Form h;
  private final Dual s;
  private final Dual t;

  private ImplicitOperator(Form h, Dual s, Dual t) {
    this.h = h;
    this.s = s;
    this.t = t;
  }

  /// The symbol W(t) with h(t, W(t)) = 0 and W(0) = 0, which is proved of it; `s` stands for W.
  public static Optional<Form> of(Form h, Dual s, Dual t) {
    try {
      return new ImplicitOperator(h, s, t).solution();
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  private Optional<Form> solution() {
    if (h.dependsOn(t.of()) || !atOrigin(h).isZero() || atOrigin(h.derivative(s)).isZero()) {
      return Optional.empty();
    }
    Optional<Form> straight = linearIn(s).filter(this::solves);
    return straight.isPresent()
        ? straight
        : inverseOfD().flatMap(this::reversed).filter(this::solves);
  }

  private Form atOrigin(Form form) {
    return form.substitute(Map.<Generator, Form>of(s, Form.ZERO, t, Form.ZERO));
  }

  /// φ with t = φ(s) on the curve h = 0.
  private Optional<Form> inverseOfD() {
    Optional<Form> linear = linearIn(t);
    return linear.isPresent() ? linear : unpeeled();
  }

  private Optional<Form> linearIn(Dual unknown) {
    Optional<List<Form>> top = Structure.asPolynomial(Form.of(h.numerator()), unknown);
    boolean linear =
        top.isPresent()
            && top.get().size() == 2
            && !Form.of(h.denominator()).dependsOn(unknown)
            && !top.get().getLast().isZero();
    return linear
        ? Optional.of(top.get().getFirst().dividedBy(top.get().getLast()).negated())
        : Optional.empty();
  }

  /// With k(t) = h(t, s) − h(0, s), s taken as a parameter, φ(s) = k̄(−h(0, s)).
  private Optional<Form> unpeeled() {
    Form start = h.substitute(t, Form.ZERO);
    return Structure.compositionalInverse(h.minus(start), t)
        .map(back -> back.substitute(t, start.negated()));
  }

  private Optional<Form> reversed(Form phi) {
    Form inT = phi.substitute(s, Form.of(t));
    if (Expansion.of(inT, t, 1).valuation() != 1) {
      return Optional.empty();
    }
    return Optional.of(
        Structure.compositionalInverse(inT, t)
            .orElseGet(() -> InverseSeries.of(inT, t, Form.of(t))));
  }

  /// h(t, W(t)) = 0, in the normal form or by [SeriesIdentity].
  private boolean solves(Form w) {
    Form value = h.substitute(s, w);
    return Expansion.of(w, t, 1).valuation() == 1
        && (value.isZero() || SeriesIdentity.same(value, Form.ZERO, t));
  }
}
