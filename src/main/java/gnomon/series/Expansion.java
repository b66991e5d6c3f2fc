package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The Laurent expansion of an exact form about 0 in one variable or dual.
///
/// Rational functions, exponentials and powers, logarithms, arc functions, radicals and inverse
/// series are expanded; the coefficients are exact forms. Where a kernel has a branch, the
/// principal value at 0 is taken.
public final class Expansion {

  private static final int EXTRA = 400;
  private static final int PROBE = 6;

  private Expansion() {}

  /// The expansion of the form in powers of t, with every coefficient up to t^order.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when there is no Laurent series with finitely many
  ///   negative powers, or none is known, for a kernel of the form; data: the form
  public static PowerSeries of(Form form, Generator t, int order) {
    int limit = Math.addExact(Math.max(order, 0), EXTRA);
    int work = Math.max(order, 0);
    Budget.charge((long) work * work / 4);
    if (work > PROBE) {
      int lost = attempt(form, t, PROBE).map(s -> PROBE - s.order()).orElse(0);
      work += Math.max(0, lost);
    }
    while (true) {
      Optional<PowerSeries> found = attempt(form, t, work);
      if (found.isPresent() && found.get().order() >= order) {
        return found.get().truncated(order);
      }
      if (work > limit) {
        throw new Refusal(Reason.NO_SERIES, form);
      }
      int lacking = found.map(s -> order - s.order()).orElse(work + 4);
      work += lacking;
    }
  }

  /// The expansion, where there is one.
  public static Optional<PowerSeries> tryOf(Form form, Generator t, int order) {
    try {
      return Optional.of(of(form, t, order));
    } catch (Refusal refusal) {
      return Optional.empty();
    }
  }

  /// The expansion worked out to `work` terms inside; empty when a divisor is zero that far.
  private static Optional<PowerSeries> attempt(Form form, Generator t, int work) {
    try {
      return Optional.of(new FormExpansion(t, work).series(form));
    } catch (FormExpansion.TooShort tooShort) {
      return Optional.empty();
    }
  }

  /// The singular part Σ_(j≥1) c_j t^(−j) of the form at t = 0, as the list of c_1, c_2, ….
  ///
  /// @throws Refusal with [Reason#NO_SERIES] as [#of]
  public static List<Form> singularPart(Form form, Generator t) {
    if (!mayBeSingular(form, t)) {
      return List.of();
    }
    PowerSeries series = of(form, t, -1);
    List<Form> result = new ArrayList<>();
    for (int j = 1; j <= -series.valuation(); j++) {
      result.add(series.coefficient(-j));
    }
    return result;
  }

  /// False only where the form surely has no pole at t = 0: its denominator is free of t, and so
  /// are all kernels but exponentials e^(h t).
  private static boolean mayBeSingular(Form form, Generator t) {
    if (!form.dependsOn(t)) {
      return false;
    }
    if (Form.of(form.denominator()).dependsOn(t)) {
      return true;
    }
    for (Generator g : form.generators()) {
      boolean tame = !g.dependsOn(t) || g.equals(t) || isEntirePower(g, t);
      if (!tame) {
        return true;
      }
    }
    return form.numerator().monomialContent().exponent(t).sign() < 0;
  }

  private static boolean isEntirePower(Generator g, Generator t) {
    return g instanceof Exponential power
        && power.unit().derivative(t).times(Form.of(t)).equals(power.unit())
        && !(power.base().value().dependsOn(t));
  }
}
