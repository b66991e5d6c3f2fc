package gnomon.series;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// Laws of truncated series, and two independent algorithms for each operation on rational ones.
class PowerSeriesTest {

  private static RandomGenerator random(long seed) {
    return RandomGeneratorFactory.of("L64X128MixRandom").create(seed);
  }

  private static List<Rational> rationals(RandomGenerator random, int length, Rational... start) {
    List<Rational> result = new ArrayList<>(List.of(start));
    while (result.size() < length) {
      result.add(Rational.of(random.nextInt(-9, 10), random.nextInt(1, 7)));
    }
    return result;
  }

  private static PowerSeries series(RandomGenerator random, int order, Form... start) {
    List<Form> result = new ArrayList<>(List.of(start));
    while (result.size() <= order) {
      Form c = Form.of(Rational.of(random.nextInt(-3, 4), random.nextInt(1, 3)));
      result.add(random.nextInt(4) == 0 ? c.plus(Form.variable("a")) : c);
    }
    return PowerSeries.of(result, 0, order);
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4})
  void fastRationalAlgorithmsAgreeWithThePlainOnes(long seed) {
    RandomGenerator random = random(seed);
    RationalCoefficients field = RationalCoefficients.FIELD;
    int length = 33 + random.nextInt(20);
    List<Rational> any = rationals(random, length);
    List<Rational> unit = rationals(random, length, Rational.ONE);
    List<Rational> small = rationals(random, length, Rational.ZERO, Rational.of(2));
    Rational exponent = Rational.of(2, 3);
    List<Rational> product = new ArrayList<>();
    for (int n = 0; n < length; n++) {
      product.add(field.convolution(any, unit, n));
    }
    assertEquals(product, ScaledRationals.of(any).times(ScaledRationals.of(unit), length));
    assertEquals(
        SeriesAlgorithms.inverse(field, unit, length), RationalSeries.inverse(unit, length));
    assertEquals(SeriesAlgorithms.exp(field, small, length), RationalSeries.exp(small, length));
    assertEquals(
        SeriesAlgorithms.power(field, unit, exponent, length),
        RationalSeries.power(unit, exponent, length));
    assertEquals(
        SeriesAlgorithms.compose(field, any, small, length),
        RationalSeries.compose(any, small, length));
    assertEquals(
        SeriesAlgorithms.reversion(field, small, length), RationalSeries.reversion(small, length));
  }

  @ParameterizedTest
  @ValueSource(ints = {3, 8, 40})
  void aSeriesComposedWithItsReversionIsTheVariable(int order) {
    PowerSeries f = series(random(order), Math.min(order, 8), Form.ZERO, Form.of(3));
    PowerSeries t = PowerSeries.monomial(Form.ONE, 1, f.order());
    assertEquals(t, f.compose(f.reversion()));
    assertEquals(t, f.reversion().compose(f));
    PowerSeries g =
        PowerSeries.ofRationals(
            rationals(random(order + 1L), order + 1, Rational.ZERO, Rational.HALF), order);
    assertEquals(PowerSeries.monomial(Form.ONE, 1, order), g.compose(g.reversion()));
  }

  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14, 15})
  void exponentialAndLogarithmUndoEachOther(long seed) {
    PowerSeries f = series(random(seed), 6, Form.ONE);
    assertEquals(f, f.log().exp());
    PowerSeries g = series(random(seed + 100), 6, Form.ZERO);
    assertEquals(g, g.exp().log());
    PowerSeries h = series(random(seed + 200), 6, Form.ZERO);
    assertEquals(g.exp().times(h.exp()), g.plus(h).exp());
  }

  @ParameterizedTest
  @ValueSource(longs = {21, 22, 23})
  void rationalAndSymbolicPowersMultiply(long seed) {
    PowerSeries f = series(random(seed), 5, Form.ONE);
    Form third = Form.of(Rational.of(1, 3));
    assertEquals(f, f.power(third).power(3));
    Form n = Form.variable("n");
    assertEquals(f.power(n.plus(Form.TWO)), f.power(n).times(f.power(2)));
  }

  @ParameterizedTest
  @ValueSource(longs = {31, 32, 33})
  void compositionIsSubstitutionInEachOfItsParts(long seed) {
    PowerSeries f = series(random(seed), 5);
    PowerSeries g = series(random(seed + 1), 5);
    PowerSeries inner = series(random(seed + 2), 5, Form.ZERO);
    assertEquals(f.compose(inner).times(g.compose(inner)), f.times(g).compose(inner));
    assertEquals(f.compose(inner).plus(g.compose(inner)), f.plus(g).compose(inner));
  }

  @Test
  void theOrderOfAResultIsWhatIsKnown() {
    PowerSeries f = PowerSeries.of(List.of(Form.ONE, Form.TWO), -2, 3);
    PowerSeries g = PowerSeries.of(List.of(Form.ONE), 1, 4);
    assertEquals(2, f.times(g).order());
    assertEquals(7, f.inverse().order());
    assertEquals(2, f.inverse().valuation());
    assertEquals(3, f.plus(g).order());
    assertEquals(2, f.derivative().order());
  }

  @Test
  void whatHasNoSeriesIsRefused() {
    PowerSeries t = PowerSeries.monomial(Form.ONE, 1, 4);
    assertEquals(Reason.NO_SERIES, assertThrows(Refusal.class, t::log).reason());
    assertEquals(Reason.NO_SERIES, assertThrows(Refusal.class, () -> t.power(Form.HALF)).reason());
    assertEquals(Reason.NO_SERIES, assertThrows(Refusal.class, () -> t.inverse().exp()).reason());
    assertEquals(
        Reason.NO_SERIES, assertThrows(Refusal.class, () -> t.inverse().integral()).reason());
    assertEquals(
        Reason.NO_SERIES, assertThrows(Refusal.class, () -> t.power(2).reversion()).reason());
    assertEquals(
        Reason.DIVISION_BY_ZERO,
        assertThrows(Refusal.class, () -> PowerSeries.zero(3).inverse()).reason());
    assertThrows(IllegalArgumentException.class, () -> t.coefficient(5));
  }

  @Test
  void constantTermsEnterThroughTheirExactFunctions() {
    Form a = Form.variable("a");
    PowerSeries f = PowerSeries.of(List.of(a, Form.ONE), 0, 2);
    assertEquals(Elementary.exp(a).times(Form.HALF), f.exp().coefficient(2));
    assertEquals(Elementary.ln(a), f.log().coefficient(0));
  }
}
