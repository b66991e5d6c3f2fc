package gnomon.summation;

import gnomon.form.Combinatorial;
import gnomon.form.Constant;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.PartialFractions;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// Convergent series Σ(k: 0..∞) z^k R(k) with a proper rational function R whose poles are seen, by
/// its partial fractions c/(k + b)^j.
///
/// For z = 1: Σ (c_1/(k+b_1) + c_2/(k+b_2) + …) = −Σ c_i H(b_i − 1), as the c_i add up to 0, and Σ
/// 1/(k+b)^j = ζ(j) − H(b−1, j), with Euler's value of ζ(j) for an even j. For z = −1 the
/// alternating sums of even powers and of 1/(k + 1/2). For other z, and an integer b, Σ z^k/(k+b) =
/// z^(−b) (−ln(1−z) − Σ_{i<b} z^i/i).
///
/// Source: DLMF 25.6.2, 5.7.6 and 4.6.4, from memory.
final class FractionSeries {
  private static final int FARTHEST = 1000;

  private final Form z;
  private Form sum = Form.ZERO;
  private final Map<Integer, Form> zetas = new HashMap<>();
  private final Set<Theorem> used = EnumSet.noneOf(Theorem.class);

  private FractionSeries(Form z) {
    this.z = z;
  }

  /// The value, or nothing where a part of it is not known.
  static Optional<KnownSeries> of(Form z, Form fraction, Variable k) {
    Optional<PartialFractions> parts = Structure.partialFractions(fraction, k);
    if (parts.isEmpty() || !parts.get().polynomialPart().stream().allMatch(Form::isZero)) {
      return Optional.empty();
    }
    FractionSeries series = new FractionSeries(z);
    for (PartialFractions.Piece piece : parts.get().pieces()) {
      Optional<List<Form>> linear =
          Structure.asPolynomial(piece.base(), k).filter(c -> c.size() == 2);
      if (linear.isEmpty()) {
        return Optional.empty();
      }
      Form slope = linear.get().getLast();
      Form b = linear.get().getFirst().dividedBy(slope);
      Form c = piece.numerator().dividedBy(slope.power(piece.power()));
      if (!series.add(c, b, piece.power())) {
        return Optional.empty();
      }
    }
    return series.value();
  }

  private boolean add(Form c, Form b, int power) {
    if (z.isOne()) {
      used.add(Theorem.RECIPROCAL_POWERS);
      zetas.merge(power, c, Form::plus);
      sum = sum.minus(c.times(Combinatorial.harmonic(b.minus(Form.ONE), power)));
      return true;
    }
    Optional<Integer> whole = b.asInt().filter(value -> value > 0 && value < FARTHEST);
    if (z.equals(Form.MINUS_ONE) && whole.isPresent() && power % 2 == 0) {
      alternating(c, whole.get(), power);
      return true;
    }
    if (z.equals(Form.MINUS_ONE) && power == 1 && whole.isEmpty()) {
      return alternatingHalf(c, b);
    }
    if (whole.isEmpty() || power != 1) {
      return false;
    }
    used.add(Theorem.LOGARITHMIC_SERIES);
    Form rest = Elementary.ln(Form.ONE.minus(z)).negated();
    for (int i = 1; i < whole.get(); i++) {
      rest = rest.minus(z.power(i).dividedBy(Form.of(i)));
    }
    sum = sum.plus(c.times(rest).dividedBy(z.power(whole.get())));
    return true;
  }

  /// Σ (−1)^k/(k+b)^j = (−1)^(b−1) ((1 − 2^(1−j)) ζ(j) − Σ_{0<i<b} (−1)^(i−1)/i^j).
  private void alternating(Form c, int b, int power) {
    used.add(Theorem.ALTERNATING_POWERS);
    Rational eta = Rational.ONE.minus(Rational.TWO.power(1 - power));
    Form rest = zeta(power).times(eta);
    for (int i = 1; i < b; i++) {
      Form term = Form.of(Rational.of(i).power(-power));
      rest = i % 2 == 1 ? rest.minus(term) : rest.plus(term);
    }
    sum = b % 2 == 1 ? sum.plus(c.times(rest)) : sum.minus(c.times(rest));
  }

  /// Σ (−1)^k/(k + 1/2) = π/2, from there by whole steps.
  private boolean alternatingHalf(Form c, Form b) {
    Optional<Integer> steps = b.minus(Form.HALF).asInt().filter(s -> Math.abs(s) < FARTHEST);
    if (steps.isEmpty()) {
      return false;
    }
    used.add(Theorem.ALTERNATING_POWERS);
    Form value = Form.of(Constant.PI).times(Form.HALF);
    // S(b + 1) = 1/b − S(b)
    for (int i = 0; i < steps.get(); i++) {
      value = Form.of(Rational.of(2 * i + 1, 2)).inverse().minus(value);
    }
    for (int i = 0; i > steps.get(); i--) {
      value = Form.of(Rational.of(2 * i - 1, 2)).inverse().minus(value);
    }
    sum = sum.plus(c.times(value));
    return true;
  }

  /// ζ(j) = (−1)^(j/2+1) B_j (2π)^j/(2 j!) for an even j.
  private static Form zeta(int j) {
    Rational factor =
        Integers.bernoulli(j)
            .times(Rational.TWO.power(j - 1))
            .dividedBy(Rational.of(Integers.factorial(j)));
    return Form.of(Constant.PI).power(j).times(factor.abs());
  }

  private Optional<KnownSeries> value() {
    Form value = sum;
    for (var part : zetas.entrySet()) {
      int power = part.getKey();
      if (!part.getValue().isZero()) {
        if (power % 2 != 0) {
          return Optional.empty();
        }
        value = value.plus(part.getValue().times(zeta(power)));
      }
    }
    return Optional.of(new KnownSeries(value, used));
  }
}
