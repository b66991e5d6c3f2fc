package gnomon.form;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class StructureTest {
  private static final Variable X = new Variable("x");
  private static final Dual T = new Dual(X);
  private static final Form x = Form.of(X);
  private static final Form t = Form.of(T);

  private static Form inverse(Form form) {
    Form found = Structure.compositionalInverse(form, T).orElseThrow();
    assertEquals(t, form.substitute(T, found));
    return found;
  }

  @Test
  void compositionalInversesOfTheDeltaSeriesOfRomansFourthChapterAreFound() {
    // Roman 1984, chapter 4 (from memory): the pairs f, f-bar.
    Form e = Elementary.exp(t);
    Form h = Elementary.exp(t.times(Rational.HALF));
    assertEquals(Elementary.ln(Form.ONE.plus(t)), inverse(e.minus(Form.ONE)));
    assertEquals(Elementary.ln(Form.ONE.minus(t)).negated(), inverse(Form.ONE.minus(e.inverse())));
    assertEquals(
        Elementary.arsinh(t.times(Rational.HALF)).times(Form.TWO), inverse(h.minus(h.inverse())));
    assertEquals(e.minus(Form.ONE), inverse(Elementary.ln(Form.ONE.plus(t))));
    assertEquals(
        Elementary.ln(Form.ONE.plus(t).dividedBy(Form.ONE.minus(t))),
        inverse(e.minus(Form.ONE).dividedBy(e.plus(Form.ONE))));
    Form laguerre = t.dividedBy(t.minus(Form.ONE));
    assertEquals(laguerre, inverse(laguerre));
    Form mott = t.times(Form.of(-2)).dividedBy(Form.ONE.plus(t.times(t)));
    Form root = Elementary.sqrt(Form.ONE.minus(t.times(t)));
    assertEquals(root.minus(Form.ONE).dividedBy(t), inverse(mott));
  }

  @Test
  void anInverseWithoutClosedFormIsNotInvented() {
    assertTrue(Structure.compositionalInverse(t.times(Elementary.exp(t)), T).isEmpty());
    assertTrue(Structure.compositionalInverse(t.plus(t.power(5)), T).isEmpty());
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void partialFractionsSumToTheFunction(long seed) {
    Random random = new Random(seed);
    for (int round = 0; round < 6; round++) {
      Form top = Form.ONE;
      Form bottom = Form.ONE;
      for (int i = 0; i < 3; i++) {
        top = top.times(x).plus(Form.of(random.nextInt(-5, 6)));
        Form factor = x.times(Form.of(random.nextInt(1, 3))).plus(Form.of(random.nextInt(-3, 4)));
        bottom = bottom.times(factor.power(random.nextInt(1, 3)));
      }
      bottom = bottom.times(x.times(x).plus(Form.variable("a")));
      Form form = top.dividedBy(bottom);
      PartialFractions parts = Structure.partialFractions(form, X).orElseThrow();
      assertEquals(form, parts.sum(X));
      for (PartialFractions.Piece piece : parts.pieces()) {
        int base = Structure.degree(piece.base(), X).orElseThrow();
        assertTrue(Structure.degree(piece.numerator(), X).orElse(-1) < base);
      }
    }
  }

  @Test
  void exponentialPartsSumToTheFunction() {
    Form form =
        x.power(2)
            .times(Elementary.power(Form.TWO, x))
            .plus(Elementary.sin(x).times(Form.variable("a")).times(x))
            .plus(Elementary.exp(x.negated()))
            .plus(x.power(3));
    List<Form> parts = new ArrayList<>();
    for (ExponentialPart part : Structure.exponentialParts(form, X).orElseThrow()) {
      parts.add(part.kernel().times(Structure.polynomial(part.coefficients(), X)));
      assertEquals(part.kernel().times(part.rate()), part.kernel().derivative(X));
    }
    assertEquals(form, Form.sum(parts));
    assertTrue(Structure.exponentialParts(x.inverse(), X).isEmpty());
    assertTrue(Structure.exponentialParts(Elementary.exp(x.times(x)), X).isEmpty());
  }

  @Test
  void operatorIdentitiesOfTheTradeAreEqualitiesOfSymbols() {
    Form e = Elementary.exp(t);
    Form h = Elementary.exp(t.times(Rational.HALF));
    Form central = h.minus(h.inverse());
    Form mean = h.plus(h.inverse()).times(Rational.HALF);
    assertEquals(t, Elementary.ln(Form.ONE.plus(e.minus(Form.ONE))));
    Form quarter = central.power(2).times(Rational.of(1, 4));
    assertEquals(mean.power(2), Form.ONE.plus(quarter));
    assertEquals(mean, Elementary.sqrt(Form.ONE.plus(quarter)));
    assertEquals(t, Elementary.arsinh(central.times(Rational.HALF)).times(Form.TWO));
  }
}
