package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntFunction;

/// Series algorithms on rational coefficients by Newton's iteration over fast products.
///
/// The lists hold the coefficients from t^0 on; the same preconditions hold as for
/// [SeriesAlgorithms].
final class RationalSeries {

  private static final int START = 16;

  private RationalSeries() {}

  /// 1/a: b becomes b (2 − a b).
  static ScaledRationals inverse(List<Rational> a, int length) {
    ScaledRationals series = ScaledRationals.of(a);
    return newton(
        length,
        n -> SeriesAlgorithms.inverse(RationalCoefficients.FIELD, a, n),
        (b, n) -> {
          ScaledRationals defect = series.times(b, n).times(Rational.MINUS_ONE);
          return b.times(constant(Rational.TWO, n).plus(defect), n);
        });
  }

  /// e^a: b becomes b (1 + a − ln b).
  static ScaledRationals exp(List<Rational> a, int length) {
    ScaledRationals series = ScaledRationals.of(a);
    return newton(
        length,
        n -> SeriesAlgorithms.exp(RationalCoefficients.FIELD, a, n),
        (b, n) -> {
          ScaledRationals log = log(b, n).times(Rational.MINUS_ONE);
          return b.times(constant(Rational.ONE, n).plus(series).plus(log), n);
        });
  }

  /// ln a for a_0 = 1.
  static ScaledRationals log(ScaledRationals a, int length) {
    ScaledRationals padded = a.resized(length);
    ScaledRationals slope = padded.derivative();
    return slope.times(inverse(padded, length - 1), length - 1).integral();
  }

  /// a^e for a_0 = 1, as e^(e ln a).
  static ScaledRationals power(List<Rational> a, Rational exponent, int length) {
    return exp(log(ScaledRationals.of(a), length).times(exponent), length);
  }

  /// outer(inner), as [SeriesAlgorithms#compose].
  static ScaledRationals compose(List<Rational> outer, List<Rational> inner, int length) {
    int step = SeriesAlgorithms.squareRoot(length);
    List<ScaledRationals> powers = powers(ScaledRationals.of(inner), step, length);
    ScaledRationals giant = powers.removeLast();
    ScaledRationals weights = ScaledRationals.of(outer);
    ScaledRationals result = constant(Rational.ZERO, length);
    for (int block = Math.ceilDiv(Math.min(outer.size(), length), step) - 1; block >= 0; block--) {
      Budget.checkpoint();
      ScaledRationals low = ScaledRationals.combination(weights, block * step, powers, length);
      result = result.times(giant, length).plus(low);
    }
    return result;
  }

  /// The compositional inverse, as [SeriesAlgorithms#reversion].
  static List<Rational> reversion(List<Rational> a, int length) {
    ScaledRationals ratio = inverse(a.subList(1, a.size()), length - 1);
    int step = SeriesAlgorithms.squareRoot(length);
    List<ScaledRationals> small = powers(ratio, step, length - 1);
    ScaledRationals giant = constant(Rational.ONE, length - 1);
    List<Rational> result = new ArrayList<>(length);
    result.add(Rational.ZERO);
    for (int k = 1; k < length; k++) {
      Budget.checkpoint();
      if (k % step == 0) {
        giant = giant.times(small.get(step), length - 1);
      }
      Rational top = giant.convolution(small.get(k % step), k - 1);
      result.add(top.times(Rational.of(1, k)));
    }
    return result;
  }

  private static List<ScaledRationals> powers(ScaledRationals a, int count, int length) {
    List<ScaledRationals> result = new ArrayList<>();
    result.add(constant(Rational.ONE, length));
    for (int k = 1; k <= count; k++) {
      Budget.checkpoint();
      result.add(result.get(k - 1).times(a, length));
    }
    return result;
  }

  private static ScaledRationals constant(Rational value, int length) {
    return ScaledRationals.of(List.of(value)).resized(length);
  }

  /// One doubling step: from a result valid to about half the length to one of the length.
  private interface Step {
    ScaledRationals refine(ScaledRationals known, int length);
  }

  private static ScaledRationals newton(int length, IntFunction<List<Rational>> start, Step step) {
    if (length <= START) {
      return ScaledRationals.of(start.apply(length));
    }
    ScaledRationals half = newton((length + 1) / 2, start, step);
    Budget.checkpoint();
    return step.refine(half.resized(length), length);
  }
}
