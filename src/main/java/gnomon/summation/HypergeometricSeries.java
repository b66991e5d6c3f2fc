package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Univariate;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// A series Σ(k: 0..∞) c p(k) z^k ∏ (α)↑k / (∏ (β)↑k k!) less a number, with a polynomial p: every
/// series with a rational ratio of terms whose roots are known is of this kind.
///
/// @param scale c
/// @param weight p, in the variable of summation
/// @param above the α
/// @param below the β
/// @param z what the terms are powers of
/// @param excess the terms in front of the given series that were added to reach a factor k!
record HypergeometricSeries(
    Form scale, Form weight, List<Form> above, List<Form> below, Form z, Form excess) {

  private static final int MOST_STEPS = 60;

  HypergeometricSeries {
    above = List.copyOf(above);
    below = List.copyOf(below);
  }

  /// The series Σ(k: 0..∞) t(k) with the ratio of its terms, or nothing where the roots of the
  /// ratio are not all seen.
  static Optional<HypergeometricSeries> of(Form first, Form ratio, Variable k) {
    Optional<List<Form>> above = shifts(Form.of(ratio.numerator()), k);
    Optional<List<Form>> below = shifts(Form.of(ratio.denominator()), k);
    if (above.isEmpty() || below.isEmpty()) {
      return Optional.empty();
    }
    List<Form> alphas = new ArrayList<>(above.get());
    List<Form> betas = new ArrayList<>(below.get());
    int back = stepsBack(alphas, betas);
    Form scale = first;
    Form excess = Form.ZERO;
    for (int j = 1; j <= back; j++) {
      scale = scale.dividedBy(ratio.substitute(k, Form.of(-j)));
      excess = excess.plus(scale);
    }
    Form shift = Form.of(back);
    alphas.replaceAll(alpha -> alpha.minus(shift));
    betas.replaceAll(beta -> beta.minus(shift));
    if (!betas.remove(Form.ONE)) {
      alphas.add(Form.ONE);
    }
    Form z = TermGrowth.of(ratio, k).z();
    Form weight = weight(alphas, betas, k);
    return Optional.of(new HypergeometricSeries(scale, weight, alphas, betas, z, excess));
  }

  /// The s of the linear factors k + s, or nothing where there are others.
  private static Optional<List<Form>> shifts(Form polynomial, Variable k) {
    List<Form> shifts = new ArrayList<>();
    for (var factor : Structure.factored(polynomial).factors()) {
      if (factor.base().dependsOn(k)) {
        Optional<List<Form>> linear =
            Structure.asPolynomial(factor.base(), k).filter(c -> c.size() == 2);
        if (linear.isEmpty()) {
          return Optional.empty();
        }
        for (int i = 0; i < factor.multiplicity(); i++) {
          shifts.add(linear.get().getFirst().dividedBy(linear.get().getLast()));
        }
      }
    }
    return Optional.of(shifts);
  }

  /// How many steps before the first term the factor k + 1 appears below: one less than the least
  /// natural β, unless a factor above vanishes on the way.
  private static int stepsBack(List<Form> above, List<Form> below) {
    int least =
        below.stream()
            .map(Form::asInteger)
            .flatMap(Optional::stream)
            .filter(b -> b.signum() > 0 && b.compareTo(BigInteger.valueOf(MOST_STEPS)) <= 0)
            .mapToInt(BigInteger::intValueExact)
            .min()
            .orElse(1);
    Rational last = Rational.of(least - 1);
    boolean blocked =
        above.stream()
            .map(Form::asRational)
            .flatMap(Optional::stream)
            .anyMatch(a -> a.isInteger() && a.sign() > 0 && a.compareTo(last) <= 0);
    return blocked ? 0 : least - 1;
  }

  /// Takes pairs with α = β + m out of the lists: (β + m)↑k/β↑k = (β + k)↑m/β↑m.
  private static Form weight(List<Form> above, List<Form> below, Variable k) {
    Form weight = Form.ONE;
    for (Form beta : List.copyOf(below)) {
      Optional<Form> partner =
          above.stream()
              .filter(
                  alpha ->
                      alpha
                          .minus(beta)
                          .asInteger()
                          .filter(m -> m.signum() > 0 && m.bitLength() < 7)
                          .isPresent())
              .findFirst();
      if (partner.isPresent()) {
        int m = partner.get().minus(beta).asInteger().orElseThrow().intValueExact();
        for (int i = 0; i < m; i++) {
          Form at = beta.plus(Form.of(i));
          weight = weight.times(at.plus(Form.of(k))).dividedBy(at);
        }
        above.remove(partner.get());
        below.remove(beta);
      }
    }
    return weight;
  }

  /// The coefficients of the weight in falling powers of k, k↓0 first.
  List<Form> weightInFallingPowers(Variable k) {
    Univariate rest = new Univariate(Structure.asPolynomial(weight, k).orElseThrow());
    List<Form> coefficients = new ArrayList<>();
    for (int j = 0; rest.degree() >= 0; j++) {
      Univariate factor = new Univariate(List.of(Form.of(-j), Form.ONE));
      Univariate.Division division = rest.dividedBy(factor);
      List<Form> remainder = division.remainder().coefficients();
      coefficients.add(remainder.isEmpty() ? Form.ZERO : remainder.getFirst());
      rest = division.quotient();
    }
    return coefficients;
  }
}
