package gnomon.summation;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// Hypergeometric series whose values are theorems.
///
/// Source: Olver et al., NIST Digital Library of Mathematical Functions, sections 15.4 and 16.4,
/// from memory.
///
/// @param value the value of the series
/// @param theorems on what ground
record KnownSeries(Form value, Set<Theorem> theorems) {

  KnownSeries {
    theorems = Set.copyOf(theorems);
  }

  /// The value of a convergent series, or nothing where no theorem at hand gives it.
  static Optional<KnownSeries> of(HypergeometricSeries series, Variable k) {
    return plain(series, k)
        .map(
            known ->
                new KnownSeries(
                    known.value().times(series.scale()).minus(series.excess()), known.theorems()));
  }

  private static Optional<KnownSeries> plain(HypergeometricSeries series, Variable k) {
    List<Form> above = series.above();
    List<Form> below = series.below();
    int shape = 10 * above.size() + below.size();
    boolean unweighted = series.weight().isOne();
    return switch (shape) {
      case 0 -> known(exponential(series, k), Theorem.EXPONENTIAL_SERIES);
      case 10 -> known(binomial(series, k), Theorem.BINOMIAL_SERIES);
      case 1 -> unweighted ? circular(below.getFirst(), series.z()) : Optional.empty();
      case 21 -> unweighted ? gauss(above, below.getFirst(), series.z()) : Optional.empty();
      case 32 -> unweighted && series.z().isOne() ? dixon(above, below) : Optional.empty();
      default -> Optional.empty();
    };
  }

  private static Optional<KnownSeries> known(Form value, Theorem theorem) {
    return Optional.of(new KnownSeries(value, Set.of(theorem)));
  }

  /// Σ k↓j z^k/k! = z^j e^z.
  private static Form exponential(HypergeometricSeries series, Variable k) {
    Form sum = Form.ZERO;
    Form power = Form.ONE;
    for (Form coefficient : series.weightInFallingPowers(k)) {
      sum = sum.plus(coefficient.times(power));
      power = power.times(series.z());
    }
    return sum.times(Elementary.exp(series.z()));
  }

  /// Σ k↓j a↑k z^k/k! = a↑j z^j (1 − z)^(−a−j), which is 0 for z = 1 where it converges.
  private static Form binomial(HypergeometricSeries series, Variable k) {
    Form a = series.above().getFirst();
    Form rest = Form.ONE.minus(series.z());
    if (rest.isZero()) {
      return Form.ZERO;
    }
    Form sum = Form.ZERO;
    Form power = Form.ONE;
    Form at = a;
    for (Form coefficient : series.weightInFallingPowers(k)) {
      sum = sum.plus(coefficient.times(power));
      power = power.times(at).times(series.z()).dividedBy(rest);
      at = at.plus(Form.ONE);
    }
    return sum.times(Elementary.power(rest, a.negated()));
  }

  /// 0F1(; 1/2; w²/4) = cosh w and 0F1(; 3/2; w²/4) = sinh(w)/w.
  private static Optional<KnownSeries> circular(Form below, Form z) {
    Optional<Form> root = root(z.times(Form.of(4)));
    if (root.isEmpty()) {
      return Optional.empty();
    }
    Form w = root.get();
    if (below.equals(Form.HALF)) {
      return known(Elementary.cosh(w), Theorem.CIRCULAR_SERIES);
    }
    return below.equals(Form.of(Rational.of(3, 2)))
        ? known(Elementary.sinh(w).dividedBy(w), Theorem.CIRCULAR_SERIES)
        : Optional.empty();
  }

  /// A square root of a rational number times the square of a form.
  private static Optional<Form> root(Form square) {
    var factored = Structure.factored(square);
    Form root = Elementary.sqrt(Form.of(factored.unit()));
    for (var factor : factored.factors()) {
      if (factor.multiplicity() % 2 != 0) {
        return Optional.empty();
      }
      root = root.times(factor.base().power(factor.multiplicity() / 2));
    }
    return Optional.of(root);
  }

  private static Optional<KnownSeries> gauss(List<Form> above, Form c, Form z) {
    Form a = above.getFirst();
    Form b = above.getLast();
    if (z.isOne()) {
      return gammas(List.of(c, c.minus(a).minus(b)), List.of(c.minus(a), c.minus(b)), Form.ONE)
          .flatMap(value -> known(value, Theorem.GAUSS));
    }
    if (!z.equals(Form.MINUS_ONE)) {
      return Optional.empty();
    }
    if (c.equals(Form.ONE.plus(a).minus(b))) {
      return kummer(a, b);
    }
    return c.equals(Form.ONE.plus(b).minus(a)) ? kummer(b, a) : Optional.empty();
  }

  private static Optional<KnownSeries> kummer(Form a, Form b) {
    Form half = Form.ONE.plus(a.times(Form.HALF));
    Form full = Form.ONE.plus(a);
    return gammas(List.of(full.minus(b), half), List.of(full, half.minus(b)), Form.ONE)
        .flatMap(value -> known(value, Theorem.KUMMER));
  }

  /// 3F2(a, b, c; 1+a−b, 1+a−c; 1), with a any of the three.
  private static Optional<KnownSeries> dixon(List<Form> above, List<Form> below) {
    for (Form a : above) {
      List<Form> others = new ArrayList<>(above);
      others.remove(a);
      Form b = others.getFirst();
      Form c = others.getLast();
      Form full = Form.ONE.plus(a);
      List<Form> poised = List.of(full.minus(b), full.minus(c));
      if (below.equals(poised) || below.equals(poised.reversed())) {
        Form half = Form.ONE.plus(a.times(Form.HALF));
        return gammas(
                List.of(half, half.minus(b).minus(c), full.minus(b), full.minus(c)),
                List.of(full, full.minus(b).minus(c), half.minus(b), half.minus(c)),
                Form.ONE)
            .flatMap(value -> known(value, Theorem.DIXON));
      }
    }
    return Optional.empty();
  }

  /// Π Γ(above)/Π Γ(below): nothing where a Γ above is at a pole, 0 where only one below is.
  private static Optional<Form> gammas(List<Form> above, List<Form> below, Form scale) {
    if (above.stream().anyMatch(KnownSeries::isPole)) {
      return Optional.empty();
    }
    if (below.stream().anyMatch(KnownSeries::isPole)) {
      return Optional.of(Form.ZERO);
    }
    Form product = scale;
    for (Form u : above) {
      product = product.times(Combinatorial.factorial(u.minus(Form.ONE)));
    }
    for (Form u : below) {
      product = product.dividedBy(Combinatorial.factorial(u.minus(Form.ONE)));
    }
    return Optional.of(product);
  }

  private static boolean isPole(Form u) {
    return u.asInteger().filter(n -> n.signum() <= 0).isPresent();
  }
}
