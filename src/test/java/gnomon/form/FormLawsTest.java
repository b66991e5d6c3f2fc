package gnomon.form;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import gnomon.algebra.Refusal;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// Laws of the field of forms and of its derivation, on seeded random forms; the seed is the
/// parameter of each test.
class FormLawsTest {
  private static final Variable X = new Variable("x");

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
  void sumsProductsAndQuotientsObeyTheFieldLaws(long seed) {
    RandomForms forms = new RandomForms(new Random(seed));
    for (int round = 0; round < 12; round++) {
      Form a = forms.quotient();
      Form b = forms.quotient();
      Form c = forms.quotient();
      assertEquals(a.plus(b), b.plus(a));
      assertEquals(a.times(b), b.times(a));
      assertEquals(a.plus(b).minus(b), a);
      assertEquals(a.plus(b).plus(c), a.plus(b.plus(c)));
      assertEquals(a.times(b).times(c), a.times(b.times(c)));
      assertEquals(a.times(b.plus(c)), a.times(b).plus(a.times(c)));
      if (!b.isZero()) {
        assertEquals(a.times(b).dividedBy(b), a);
        assertEquals(b.times(b.inverse()), Form.ONE);
        assertEquals(a.dividedBy(b).hashCode(), a.times(b.inverse()).hashCode());
      }
      assertNotEquals(a, a.plus(Form.ONE));
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {21, 22, 23, 24, 25, 26})
  void theDerivativeObeysSumProductAndChainRules(long seed) {
    RandomForms forms = new RandomForms(new Random(seed));
    Form inner = Form.variable("x").times(Form.TWO).plus(Form.variable("a"));
    for (int round = 0; round < 8; round++) {
      Form a = forms.quotient();
      Form b = forms.quotient();
      Form left = a.times(b).derivative(X);
      assertEquals(left, a.derivative(X).times(b).plus(a.times(b.derivative(X))));
      assertEquals(a.plus(b).derivative(X), a.derivative(X).plus(b.derivative(X)));
      Form chain = a.substitute(X, inner).derivative(X);
      assertEquals(chain, a.derivative(X).substitute(X, inner).times(Form.TWO));
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {31, 32, 33, 34, 35, 36, 37, 38, 39, 40, 41, 42, 43, 44, 45, 46})
  void aFormHasTheValueThatItsRecipeGivesAtNumbers(long seed) {
    RandomForms forms = new RandomForms(new Random(seed));
    for (int round = 0; round < 10; round++) {
      RandomForms.Recipe recipe = forms.recipe(3);
      Form symbolic = recipe.apply(Form.variable("x"));
      for (int at = 0; at <= 6; at++) {
        assertEquals(recipe.apply(Form.of(at)), symbolic.substitute(X, Form.of(at)));
      }
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {51, 52, 53, 54, 55, 56, 57, 58})
  void shiftingBackAndForthChangesNothing(long seed) {
    RandomForms forms = new RandomForms(new Random(seed));
    for (int round = 0; round < 8; round++) {
      Form form = forms.recipe(3).apply(Form.variable("x"));
      Form there = form.substitute(X, Form.variable("x").plus(Form.of(3)));
      Form back = there.substitute(X, Form.variable("x").minus(Form.of(3)));
      assertEquals(form, back);
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {61, 62, 63, 64})
  void reducingForIntegersKeepsEveryIntegerValue(long seed) {
    RandomForms forms = new RandomForms(new Random(seed));
    for (int round = 0; round < 8; round++) {
      Form form = forms.recipe(3).apply(Form.variable("x"));
      Form reduced = form.takingIntegers(java.util.Set.of(X));
      for (int at = 0; at <= 5; at++) {
        assertEquals(valueOrNull(form, at), valueOrNull(reduced, at));
      }
    }
  }

  private static Form valueOrNull(Form form, int at) {
    try {
      return form.substitute(X, Form.of(at));
    } catch (Refusal _) {
      return null;
    }
  }
}
