package gnomon.render;

import gnomon.form.Form;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// Spells a quotient of sums of shifts, each of them symmetric or antisymmetric, in central
/// differences δ = z − 1/z and means μ = (z + 1/z)/2, z the shift by half a step.
///
/// z^(2j) + z^(−2j) is a polynomial in δ² = z² − 2 + z^(−2), and in μ² = δ²/4 + 1.
record CentralSpelling(TreeMap<Rational, Polynomial> over, TreeMap<Rational, Polynomial> under) {

  /// The letters for one step.
  record Letters(Form delta, Form mu) {}

  /// One way of spelling: with this step, and by powers of μ or of δ.
  record Spelling(CentralSpelling of, Rational step, boolean byMeans) {
    /// The form in the letters, where both parts are symmetric about their middle.
    Optional<Form> form(Letters letters) {
      Optional<Form> above = of.part(of.over, this, letters);
      Optional<Form> below = of.part(of.under, this, letters);
      Rational shift = middle(of.over).minus(middle(of.under));
      if (above.isEmpty() || below.isEmpty() || !shift.isZero()) {
        return Optional.empty();
      }
      return Optional.of(above.get().dividedBy(below.get()));
    }
  }

  /// The spellings to try when all shifts are multiples of the grid.
  List<Spelling> spellings(Rational grid, boolean numeric) {
    List<Spelling> all = new ArrayList<>();
    List<Rational> steps = new ArrayList<>(List.of(grid, grid.times(Rational.TWO)));
    if (numeric && !steps.contains(Rational.ONE)) {
      steps.add(Rational.ONE);
    }
    for (Rational step : steps) {
      all.add(new Spelling(this, step, false));
      all.add(new Spelling(this, step, true));
    }
    return all;
  }

  private static Rational middle(TreeMap<Rational, Polynomial> parts) {
    return parts.firstKey().plus(parts.lastKey()).times(Rational.HALF);
  }

  private Optional<Form> part(
      TreeMap<Rational, Polynomial> parts, Spelling spelling, Letters letters) {
    Rational half = spelling.step().times(Rational.HALF);
    Rational middle = middle(parts);
    TreeMap<Integer, Polynomial> powers = new TreeMap<>();
    for (Map.Entry<Rational, Polynomial> entry : parts.entrySet()) {
      Rational power = entry.getKey().minus(middle).dividedBy(half);
      if (!power.isInteger() || !power.fitsInt()) {
        return Optional.empty();
      }
      powers.put(power.intValueExact(), entry.getValue());
    }
    boolean even = powers.keySet().stream().allMatch(k -> k % 2 == 0);
    boolean odd = powers.keySet().stream().allMatch(k -> k % 2 != 0);
    if (!even && !odd) {
      return Optional.empty();
    }
    for (int sign : new int[] {1, -1}) {
      boolean symmetric =
          powers.entrySet().stream()
              .allMatch(e -> e.getValue().times(Rational.of(sign)).equals(powers.get(-e.getKey())));
      if (symmetric) {
        return Optional.of(written(powers, sign, spelling.byMeans(), letters));
      }
    }
    return Optional.empty();
  }

  /// Σ c_k z^k with c_(−k) = sign·c_k, by the recurrence w_(k+2) = (z² + z^(−2)) w_k − w_(k−2) for
  /// w_k = z^k + sign·z^(−k).
  private static Form written(
      TreeMap<Integer, Polynomial> powers, int sign, boolean byMeans, Letters letters) {
    Form mu = letters.mu();
    Form delta = letters.delta();
    Form two = Form.TWO;
    Form double2 = byMeans ? mu.power(2).times(Form.of(4)).minus(two) : delta.power(2).plus(two);
    int first = powers.lastKey() % 2 == 0 ? 0 : 1;
    Form start = first == 1 ? (sign == 1 ? mu.times(two) : delta) : Form.of(1 + sign);
    Form before =
        first == 1 ? start.times(Rational.of(sign)) : waveMinusTwo(sign, double2, mu, delta);
    List<Form> terms = new ArrayList<>();
    Form wave = start;
    for (int k = first; k <= powers.lastKey(); k += 2) {
      Polynomial coefficient = powers.get(k);
      if (coefficient != null) {
        terms.add(k == 0 ? Form.of(coefficient) : Form.of(coefficient).times(wave));
      }
      Form next = double2.times(wave).minus(before);
      before = wave;
      wave = next;
    }
    return Form.sum(terms);
  }

  /// w_(−2) = z^(−2) + sign·z²: the symmetric one is δ² + 2, the antisymmetric one −2 μ δ.
  private static Form waveMinusTwo(int sign, Form double2, Form mu, Form delta) {
    return sign == 1 ? double2 : mu.times(delta).times(Form.of(-2));
  }
}
