package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The images of polynomials under Sheffer maps, by the cheapest way that fits.
///
/// U = g(D)⁻¹ ∘ (umbral part). Falling-power shapes with rational numbers go through the dense
/// conversions in near-linear time, recurrences of fixed length add up the members in quadratic
/// time, everything else takes one series product for each degree.
final class PolynomialImages {

  private PolynomialImages() {}

  /// The coefficients of U p.
  static List<Form> of(ShefferMap map, List<Form> coefficients) {
    if (coefficients.isEmpty() || map.isIdentity()) {
      return coefficients;
    }
    Optional<List<Form>> fast = dense(map.umbralPart(), coefficients);
    if (fast.isPresent()) {
      return map.isUmbral()
          ? fast.get()
          : shiftInvariant(reciprocal(map, coefficients), fast.get());
    }
    Optional<Recurrence> recurrence = Recurrence.of(map);
    if (recurrence.isPresent()) {
      Form start = map.weightSeries(0).coefficient(0);
      return combined(recurrence.get().upTo(coefficients.size() - 1, start), coefficients);
    }
    return byPowers(map, coefficients);
  }

  private static PowerSeries reciprocal(ShefferMap map, List<Form> coefficients) {
    return map.gSeries(coefficients.size() - 1).inverse();
  }

  /// Powers, falling powers and their inverses, with rational numbers.
  private static Optional<List<Form>> dense(ShefferMap map, List<Form> p) {
    if (!Scalars.allRational(p)) {
      return Optional.empty();
    }
    if (map.isIdentity()) {
      return Optional.of(p);
    }
    if (DeltaShape.of(map.f(), map.dual()) instanceof DeltaShape.Difference(Form c, Form h, Form k)
        && k.isZero()
        && c.asRational().isPresent()
        && h.asRational().isPresent()) {
      Rational step = h.asRational().get();
      List<Rational> scaled = scaled(rationals(p), c.asRational().get().inverse());
      return Optional.of(
          forms(scaled(padded(DensePolynomial.fromFalling(scaled), p.size()), step.inverse())));
    }
    if (DeltaShape.of(map.inverseOfF(), map.dual())
            instanceof DeltaShape.Difference(Form c, Form h, Form k)
        && k.isZero()
        && c.asRational().isPresent()
        && h.asRational().isPresent()) {
      Rational step = h.asRational().get();
      DensePolynomial stretched = DensePolynomial.of(scaled(rationals(p), step));
      return Optional.of(forms(scaled(stretched.toFalling(), c.asRational().get())));
    }
    return Optional.empty();
  }

  private static List<Rational> rationals(List<Form> forms) {
    return forms.stream().map(form -> form.asRational().orElseThrow()).toList();
  }

  private static List<Form> forms(List<Rational> numbers) {
    return numbers.stream().map(Form::of).toList();
  }

  private static List<Rational> padded(DensePolynomial polynomial, int size) {
    List<Rational> result = new ArrayList<>(size);
    for (int k = 0; k < size; k++) {
      result.add(polynomial.coefficient(k));
    }
    return result;
  }

  /// a_k r^k.
  private static List<Rational> scaled(List<Rational> numbers, Rational ratio) {
    if (ratio.isOne()) {
      return numbers;
    }
    List<Rational> result = new ArrayList<>(numbers.size());
    Rational power = Rational.ONE;
    for (Rational number : numbers) {
      result.add(number.times(power));
      power = power.times(ratio);
    }
    return result;
  }

  /// Σ_j u_j D^j p for the series u: one product after scaling by factorials.
  static List<Form> shiftInvariant(PowerSeries symbol, List<Form> p) {
    int size = p.size();
    Budget.charge((long) size * size / 16);
    List<Form> reversed = new ArrayList<>();
    Rational factorial = Rational.ONE;
    for (int k = 0; k < size; k++) {
      factorial = k == 0 ? factorial : factorial.times(Rational.of(k));
      reversed.addFirst(p.get(k).times(factorial));
    }
    PowerSeries product = symbol.truncated(size - 1).times(PowerSeries.of(reversed, 0, size - 1));
    List<Form> result = new ArrayList<>();
    Rational scale = Rational.ONE;
    for (int m = 0; m < size; m++) {
      scale = m == 0 ? scale : scale.dividedBy(Rational.of(m));
      result.add(product.coefficient(size - 1 - m).times(scale));
    }
    return result;
  }

  /// Σ c_n s_n.
  private static List<Form> combined(List<List<Form>> members, List<Form> coefficients) {
    boolean rational =
        Scalars.allRational(coefficients) && members.stream().allMatch(Scalars::allRational);
    return rational
        ? combined(Scalars.RATIONALS, members, coefficients)
        : combined(Scalars.FORMS, members, coefficients);
  }

  private static <T> List<Form> combined(
      Scalars<T> scalars, List<List<Form>> members, List<Form> coefficients) {
    List<T> sum = new ArrayList<>();
    for (int n = 0; n < coefficients.size(); n++) {
      sum.add(scalars.zero());
      T factor = scalars.of(coefficients.get(n));
      if (scalars.isZero(factor)) {
        continue;
      }
      Budget.checkpoint();
      List<Form> member = members.get(n);
      for (int k = 0; k < member.size(); k++) {
        T term = scalars.times(scalars.of(member.get(k)), factor);
        sum.set(k, scalars.plus(sum.get(k), term));
      }
    }
    return scalars.forms(sum);
  }

  /// The coefficient of x^k in U p is Σ_n (n!/k!) c_n [t^n] w F^k.
  static List<Form> byPowers(ShefferMap map, List<Form> coefficients) {
    int degree = coefficients.size() - 1;
    Budget.charge((long) degree * degree);
    PowerSeries inverse = map.inverseSeries(Math.max(1, degree));
    PowerSeries power = map.weightSeries(degree);
    List<Form> weights = new ArrayList<>();
    Rational factorial = Rational.ONE;
    for (int n = 0; n <= degree; n++) {
      factorial = n == 0 ? factorial : factorial.times(Rational.of(n));
      weights.add(coefficients.get(n).times(factorial));
    }
    List<Form> result = new ArrayList<>();
    Rational scale = Rational.ONE;
    for (int k = 0; k <= degree; k++) {
      Budget.checkpoint();
      scale = k == 0 ? scale : scale.dividedBy(Rational.of(k));
      List<Form> terms = new ArrayList<>();
      for (int n = k; n <= degree; n++) {
        if (!weights.get(n).isZero()) {
          terms.add(weights.get(n).times(power.coefficient(n)));
        }
      }
      result.add(Form.sum(terms).times(scale));
      power = power.times(inverse).truncated(degree);
    }
    return result;
  }
}
