package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;

class DefiniteSumTest {

  private static final Variable K = new Variable("k");
  private static final Variable N = new Variable("n");
  private static final Form k = Form.of(K);
  private static final Form n = Form.of(N);
  private static final Form one = Form.ONE;
  private static final SummationEngine ENGINE = SummationEngine.standard();
  private static final DefiniteSums SUMS = new DefiniteSums(ENGINE);
  private static final DefiniteProducts PRODUCTS = new DefiniteProducts(SUMS);
  private static final InfiniteSums INFINITE = new InfiniteSums(ENGINE);

  private static Form two(Form exponent) {
    return Elementary.power(Form.TWO, exponent);
  }

  private static final List<Form> SUMMANDS =
      List.of(
          one,
          k,
          k.power(3).minus(k),
          two(k).times(k),
          Elementary.power(Form.MINUS_ONE, k).times(k.plus(one)),
          k.plus(one).times(k.plus(Form.of(3))).inverse(),
          k.plus(one).inverse(),
          k.plus(Form.HALF).power(-2),
          Elementary.sin(Form.PI.times(k).times(Rational.of(1, 3))),
          k.power(2).plus(two(k)).plus(k.plus(Form.TWO).inverse()));

  @Test
  void closedFormsAgreeWithAddingTermByTerm() {
    for (Form f : SUMMANDS) {
      for (int start = 0; start <= 3; start++) {
        DefiniteSum sum = SUMS.sum(f, K, Form.of(start), n);
        assertEquals(DefiniteSum.Status.CLOSED_FORM, sum.status(), f.toString());
        Form added = Form.ZERO;
        for (int end = start - 1; end <= start + 6; end++) {
          added = end < start ? added : added.plus(f.substitute(K, Form.of(end)));
          String where = f + " from " + start + " to " + end;
          assertEquals(added, sum.value().substitute(N, Form.of(end)), where);
        }
      }
    }
  }

  @Test
  void sumsWithASymbolicStartAgreeToo() {
    for (Form f : SUMMANDS) {
      Form reflected = f.substitute(K, k.negated());
      DefiniteSum sum = SUMS.sum(reflected, K, n, Form.ZERO);
      assertEquals(DefiniteSum.Status.CLOSED_FORM, sum.status(), f.toString());
      Form added = Form.ZERO;
      for (int start = 1; start >= -5; start--) {
        added = start > 0 ? added : added.plus(reflected.substitute(K, Form.of(start)));
        assertEquals(added, sum.value().substitute(N, Form.of(start)), f + " from " + start);
      }
    }
  }

  @Test
  void sumsOfReciprocalsBelowZeroAreCountedFromTheirNumericEnd() {
    Form sum = SUMS.sum(k.inverse(), K, n, Form.MINUS_ONE).value();
    assertEquals(Combinatorial.harmonic(n.negated()).negated(), sum);
  }

  @Test
  void aPoleInsideTheRangeIsRefused() {
    Form f = k.minus(Form.of(3)).inverse();
    EnumSet<Reason> poles = EnumSet.of(Reason.POLE_IN_RANGE, Reason.POLE, Reason.DIVISION_BY_ZERO);
    for (Form end : List.of(n, Form.of(5), Form.of(3), Form.of(5000))) {
      Refusal refusal = assertThrows(Refusal.class, () -> SUMS.sum(f, K, Form.ZERO, end));
      assertEquals(true, poles.contains(refusal.reason()), refusal.toString());
    }
    assertEquals(Form.of(Rational.of(-11, 6)), SUMS.sum(f, K, Form.ZERO, Form.TWO).value());
  }

  @Test
  void aPoleOfTheAntidifferenceAloneDoesNotSpoilTheSum() {
    Form f = k.times(k.plus(Form.TWO)).inverse();
    assertEquals(Form.MINUS_ONE, SUMS.sum(f, K, Form.MINUS_ONE, Form.MINUS_ONE).value());
    Form wide = k.plus(Form.HALF).times(k.plus(Form.of(Rational.of(5, 2)))).inverse();
    Form expected = Terms.sum(wide, K, Form.of(-600), 1001);
    assertEquals(expected, SUMS.sum(wide, K, Form.of(-600), Form.of(400)).value());
  }

  @Test
  void emptyAndReversedRangesGiveZeroAndOne() {
    for (int end = -1; end >= -4; end--) {
      assertEquals(Form.ZERO, SUMS.sum(k.plus(Form.TWO), K, Form.ZERO, Form.of(end)).value());
      assertEquals(one, PRODUCTS.product(k, K, Form.ZERO, Form.of(end)).value());
    }
    assertThrows(Refusal.class, () -> SUMS.sum(k, K, Form.ZERO, Form.HALF));
  }

  @Test
  void aSumWithoutClosedFormIsLeftAsItStands() {
    Form logarithms = Elementary.ln(k);
    DefiniteSum sum = SUMS.sum(logarithms, K, one, n);
    assertEquals(DefiniteSum.Status.LEFT_STANDING, sum.status());
    assertEquals(Accumulation.of(Accumulation.Kind.SUM, K, one, n, logarithms), sum.value());
    Form factorials = Combinatorial.factorial(k);
    Form f = k.power(2).plus(one).inverse();
    assertEquals(DefiniteSum.Status.NO_CLOSED_FORM, SUMS.sum(f, K, Form.ZERO, n).status());
    assertEquals(Form.of(874), SUMS.sum(factorials, K, Form.ZERO, Form.of(6)).value());
  }

  @Test
  void productsAgreeWithMultiplyingFactorByFactor() {
    Form a = Form.variable("a");
    List<Form> factors =
        List.of(
            k.plus(one),
            k.times(Form.of(3)).plus(Form.TWO).dividedBy(k.plus(Form.TWO)),
            two(k),
            a.times(k.plus(Form.HALF)),
            k.plus(a).dividedBy(k.plus(one).power(2)),
            k.negated().minus(one));
    for (Form f : factors) {
      DefiniteSum product = PRODUCTS.product(f, K, one, n);
      assertEquals(DefiniteSum.Status.CLOSED_FORM, product.status(), f.toString());
      Form multiplied = one;
      for (int end = 0; end <= 6; end++) {
        multiplied = end == 0 ? multiplied : multiplied.times(f.substitute(K, Form.of(end)));
        assertEquals(multiplied, product.value().substitute(N, Form.of(end)), f + " to " + end);
      }
    }
    Form quadratic = k.power(2).plus(one);
    assertEquals(DefiniteSum.Status.LEFT_STANDING, PRODUCTS.product(quadratic, K, one, n).status());
    Form pole = k.minus(Form.TWO).inverse();
    assertThrows(Refusal.class, () -> PRODUCTS.product(pole, K, one, n));
  }

  /// Common practice: geometric series and telescoping series.
  @Test
  void infiniteSumsConvergeOrAreRefused() {
    assertEquals(Form.TWO, INFINITE.sum(two(k.negated()), K, Form.ZERO).value());
    Form telescoping = k.times(k.plus(one)).inverse();
    assertEquals(one, INFINITE.sum(telescoping, K, one).value());
    assertEquals(Form.TWO, INFINITE.sum(k.times(two(k.negated())), K, Form.ZERO).value());
    assertEquals(Reason.DIVERGENT, reason(k.inverse(), one));
    assertEquals(Reason.DIVERGENT, reason(two(k), one));
    assertEquals(Reason.DIVERGENT, reason(Elementary.power(Form.MINUS_ONE, k), one));
    assertEquals(Reason.INFINITE_SUM_UNDECIDED, reason(k.power(-3), one));
    assertEquals(Reason.POLE_IN_RANGE, reason(telescoping, Form.of(-5)));
  }

  private static Reason reason(Form f, Form start) {
    return assertThrows(Refusal.class, () -> INFINITE.sum(f, K, start)).reason();
  }
}
