package gnomon.series;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// Expansions of forms: known series (from memory) and laws on random forms.
class ExpansionTest {

  private static final Variable X = new Variable("x");
  private static final Form FX = Form.of(X);

  private static List<Form> rationals(String text) {
    return List.of(text.split(" ")).stream().map(Rational::parse).map(Form::of).toList();
  }

  private static List<Form> expanded(Form f, int order) {
    return Expansion.of(f, X, order).coefficients();
  }

  @Test
  void theSeriesOfTheTextbooksComeOut() {
    assertEquals(rationals("0 1 0 -1/6 0 1/120"), expanded(Elementary.sin(FX), 5));
    assertEquals(rationals("0 1 0 1/3 0 2/15"), expanded(Elementary.tan(FX), 5));
    assertEquals(rationals("0 1 -1/2 1/3 -1/4"), expanded(Elementary.ln(FX.plus(Form.ONE)), 4));
    assertEquals(rationals("1 1/2 -1/8 1/16"), expanded(Elementary.sqrt(FX.plus(Form.ONE)), 3));
    assertEquals(rationals("0 1 0 -1/3 0 1/5"), expanded(Elementary.arctan(FX), 5));
    assertEquals(rationals("0 1 0 1/6 0 3/40"), expanded(Elementary.arcsin(FX), 5));
    assertEquals(rationals("0 1 0 -1/6 0 3/40"), expanded(Elementary.arsinh(FX), 5));
    assertEquals(
        rationals("1 1 1 5/6 5/8 13/30"),
        expanded(Elementary.exp(Elementary.exp(FX).minus(Form.ONE)), 5));
  }

  @Test
  void theBernoulliNumbersStandInTheSeriesOfTOverExpTMinusOne() {
    PowerSeries series = Expansion.of(FX.dividedBy(Elementary.exp(FX).minus(Form.ONE)), X, 60);
    for (int n = 0; n <= 60; n++) {
      Rational expected = Integers.bernoulli(n).dividedBy(Rational.of(Integers.factorial(n)));
      assertEquals(Form.of(expected), series.coefficient(n), "n = " + n);
    }
  }

  @Test
  void negativePowersAreKeptAndCancellingOnesAreResolved() {
    PowerSeries series = Expansion.of(Elementary.sin(FX).power(-2), X, 2);
    assertEquals(-2, series.valuation());
    assertEquals(Form.of(Rational.of(1, 3)), series.coefficient(0));
    Form removable = Elementary.exp(FX).minus(Form.ONE).minus(FX).dividedBy(FX.power(2));
    assertEquals(rationals("1/2 1/6 1/24"), expanded(removable, 2));
    assertTrue(Expansion.singularPart(removable, X).isEmpty());
  }

  @Test
  void fractionalPowersThatCombineToIntegersAreExpanded() {
    Form ratio = Elementary.exp(FX).minus(Form.ONE).dividedBy(FX);
    Form root = Elementary.power(ratio, Form.HALF);
    PowerSeries series = Expansion.of(root, X, 3);
    assertEquals(Expansion.of(ratio, X, 3), series.times(series));
    Form n = Form.variable("n");
    PowerSeries symbolic = Expansion.of(Elementary.power(FX.plus(Form.ONE), n), X, 2);
    assertEquals(n.times(n.minus(Form.ONE)).times(Form.HALF), symbolic.coefficient(2));
  }

  @Test
  void inverseSeriesAreReverted() {
    Dual t = new Dual(X);
    Form symbol = Form.of(t);
    Form f = symbol.times(Elementary.exp(symbol.negated()));
    PowerSeries series = Expansion.of(InverseSeries.of(f, t, FX), X, 5);
    assertEquals(rationals("0 1 1 3/2 8/3 125/24"), series.coefficients());
  }

  @Test
  void inverseSeriesAreDifferentiatedByTheirParameters() {
    Dual t = new Dual(X);
    Variable a = new Variable("a");
    Form f = Form.of(t).times(Elementary.exp(Form.of(t).times(Form.of(a)).negated()));
    Form inverse = InverseSeries.of(f, t, FX);
    PowerSeries slope = Expansion.of(inverse.derivative(a), X, 5);
    assertEquals(
        Expansion.of(inverse, X, 5).coefficients().stream().map(c -> c.derivative(a)).toList(),
        slope.coefficients());
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
  void expansionIsAHomomorphism(long seed) {
    RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(seed);
    Form f = form(random, 2);
    Form g = form(random, 2);
    int order = 4;
    PowerSeries product = Expansion.of(f.times(g), X, order);
    PowerSeries factors = Expansion.of(f, X, 9).times(Expansion.of(g, X, 9));
    assertEquals(factors.truncated(order), product, "seed " + seed);
    PowerSeries sum = Expansion.of(f.plus(g), X, order);
    assertEquals(Expansion.of(f, X, order).plus(Expansion.of(g, X, order)), sum, "seed " + seed);
    PowerSeries slope = Expansion.of(f.derivative(X), X, order);
    assertEquals(Expansion.of(f, X, order + 1).derivative(), slope, "seed " + seed);
  }

  private static Form form(RandomGenerator random, int depth) {
    Form c = Form.of(Rational.of(random.nextInt(1, 4), random.nextInt(1, 3)));
    if (depth == 0) {
      return random.nextBoolean() ? FX.times(c) : FX.plus(c);
    }
    Form inner = form(random, depth - 1);
    Form positive = FX.times(form(random, depth - 1)).plus(Form.ONE);
    return switch (random.nextInt(6)) {
      case 0 -> Elementary.exp(FX.times(c)).plus(inner);
      case 1 -> Elementary.ln(positive).times(inner);
      case 2 -> Elementary.sqrt(positive).plus(inner);
      case 3 -> inner.dividedBy(FX.power(random.nextInt(3)));
      case 4 -> Elementary.sin(FX.times(c)).times(inner);
      default -> inner.dividedBy(positive);
    };
  }

  @Test
  void whatHasNoLaurentSeriesIsRefused() {
    List<Form> without =
        List.of(
            Elementary.ln(FX),
            Elementary.sqrt(FX),
            Elementary.exp(FX.inverse()),
            Elementary.power(FX, Form.variable("n")),
            Combinatorial.factorial(FX),
            Form.of(new Unknown("f", 0, FX)));
    for (Form f : without) {
      Refusal refusal = assertThrows(Refusal.class, () -> Expansion.of(f, X, 3), f.toString());
      assertEquals(Reason.NO_SERIES, refusal.reason());
    }
  }

  @Test
  void aLazySeriesGrowsAndKeepsItsCoefficients() {
    LazySeries lazy = LazySeries.of(Elementary.exp(FX), X);
    assertEquals(Form.HALF, lazy.coefficient(2));
    assertEquals(Form.of(Rational.of(1, 720)), lazy.coefficient(6));
    assertEquals(3, lazy.to(3).order());
  }
}
