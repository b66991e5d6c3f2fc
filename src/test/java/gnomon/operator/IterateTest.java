package gnomon.operator;

import static gnomon.operator.RandomOperators.FX;
import static gnomon.operator.RandomOperators.X;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// High powers of operators with boundary parts against the product of the factors one by one.
class IterateTest {
  private static final Operator SUM = Operator.sum(X);
  private static final Operator DELTA = Operator.forwardDifference(X, Form.ONE);
  private static final Operator STEPPED = Operator.sum(X, Form.variable("h"));
  private static final Operator WEIGHTED = Operator.multiplication(FX).compose(SUM);

  private static Operator oneByOne(Operator factor, int exponent) {
    Operator result = Operator.identity();
    for (int i = 0; i < exponent; i++) {
      result = factor.compose(result);
    }
    return result;
  }

  @ParameterizedTest
  @ValueSource(ints = {5, 6, 7, 9})
  void theNormalFormKnownInAdvanceIsTheProduct(int exponent) {
    for (Operator factor : List.of(SUM, SUM.times(Form.of(2)))) {
      Operator power = factor.power(exponent);
      assertTrue(power.iterate().isPresent());
      Operator product = oneByOne(factor, exponent);
      assertEquals(product.symbol(), power.symbol());
      assertEquals(product.boundaries(), power.boundaries());
    }
    assertEquals(oneByOne(STEPPED, 5), STEPPED.power(5));
  }

  @Test
  void powersAreAppliedLikeTheirFactors() {
    Form polynomial = FX.power(3).plus(FX.times(Form.variable("a")));
    List<Form> functions =
        List.of(polynomial, FX.power(9), Elementary.exp(FX.times(Form.variable("a"))));
    for (Operator factor : List.of(SUM, STEPPED, WEIGHTED)) {
      for (Form f : functions.subList(0, factor == WEIGHTED ? 2 : 3)) {
        Form image = f;
        for (int i = 0; i < 6; i++) {
          image = factor.applyTo(image);
        }
        assertEquals(image, factor.power(6).applyTo(f));
      }
    }
  }

  /// Σ^n 1 is the binomial coefficient (common practice).
  @Test
  void twoHundredSumsOfOneAreABinomialCoefficient() {
    Form image = SUM.power(200).applyTo(Form.ONE);
    assertEquals(
        Combinatorial.binomial(Form.of(205), Form.of(200)), image.substitute(X, Form.of(205)));
  }

  @Test
  void differencesUndoSums() {
    Operator power = SUM.power(200);
    assertEquals(Operator.identity(), DELTA.power(200).compose(power));
    assertEquals(DELTA.power(3), DELTA.power(203).compose(power));
    assertEquals(SUM.power(8), DELTA.power(192).compose(power));
    assertEquals(Operator.zero(), power.minus(SUM.power(200)));
  }

  @Test
  void powersThatCollapseAreWorkedOut() {
    Operator remainder = Operator.identity().minus(Operator.evaluation(X, Form.ZERO));
    assertEquals(remainder, remainder.power(9));
    assertFalse(remainder.power(9).isZero());
    assertTrue(Operator.evaluation(X, Form.ZERO).times(FX).power(9).isZero());
  }
}
