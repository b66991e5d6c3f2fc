package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.law.Seeded;
import gnomon.number.Rational;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class HarmonicTowerTest {
  private static final Variable X = new Variable("x");
  private static final Form x = Form.of(X);
  private static final Form H = Combinatorial.harmonic(x);
  private static final SummationEngine ENGINE = SummationEngine.standard();

  private static Antidifference search(Form f) {
    return ENGINE.search(f, X, Form.ONE);
  }

  private static Form found(Form f) {
    return assertInstanceOf(Antidifference.Found.class, search(f), () -> "no sum of " + f).value();
  }

  private static Form difference(Form sum) {
    return sum.substitute(X, x.plus(Form.ONE)).minus(sum);
  }

  /// A sum found by another way may differ by a function of period 1, which at integers is a
  /// constant; both are compared at numbers too.
  @Test
  void sumsOfRandomDifferencesComeBackUpToAConstant() {
    Map<Generator, Form> numbers =
        Map.of(
            new Variable("a"), Form.of(Rational.of(5, 7)),
            new Variable("b"), Form.of(Rational.of(3, 2)),
            new Variable("m"), Form.TWO);
    Seeded.each(
        7000,
        60,
        random -> {
          Form sum = new RandomTowers(x, random).antidifference();
          Form f = difference(sum);
          if (f.isZero()) {
            return;
          }
          Antidifference outcome = search(f);
          String where = "F = " + sum + " gave " + outcome;
          Form value = assertInstanceOf(Antidifference.Found.class, outcome, where).value();
          Form rest = value.minus(sum);
          assertEquals(rest, rest.substitute(X, x.plus(Form.ONE)), where);
          Form left = value.substitute(numbers);
          Form right = f.substitute(numbers);
          for (int point = 3; point < 6; point++) {
            Form change = at(left, point + 1).minus(at(left, point));
            assertEquals(at(right, point), change, where);
          }
        });
  }

  private static Form at(Form form, int point) {
    return form.substitute(X, Form.of(point));
  }

  /// M. Karr, Summation in finite terms (1981), for the method; the sums from memory.
  @Test
  void powersOfHarmonicNumbersAreSummedWithFurtherHarmonicNumbersWhereNeeded() {
    Form h2 = Combinatorial.harmonic(x, 2);
    assertEquals(x.times(H).minus(x), found(H));
    Form odd = x.times(Form.TWO).plus(Form.ONE);
    Form square = x.times(H.power(2)).minus(odd.times(H)).plus(x.times(Form.TWO));
    assertEquals(square, found(H.power(2)));
    Form next = x.plus(Form.ONE);
    assertEquals(H.power(2).minus(h2).times(Rational.HALF), found(H.dividedBy(next)));
    assertTrue(found(H.power(3)).generators().containsAll(h2.generators()));
  }

  @Test
  void whatHasNoSumInItsTowerIsProvedToHaveNone() {
    Antidifference absent =
        new Antidifference.ProvedAbsent(FunctionClass.HYPERGEOMETRIC_WITH_HARMONIC_NUMBERS);
    Form two = Elementary.power(Form.TWO, x);
    Form sign = Elementary.power(Form.MINUS_ONE, x);
    for (Form f :
        List.of(
            two.times(H),
            sign.times(H),
            H.power(2).dividedBy(x),
            H.power(4),
            H.dividedBy(x.power(2)),
            Combinatorial.harmonic(x, 2).dividedBy(x),
            Combinatorial.factorial(x).times(H),
            two.dividedBy(x).plus(Combinatorial.factorial(x)))) {
      assertEquals(absent, search(f), () -> "sum of " + f);
      Form sum = two.times(H).plus(H.power(2));
      assertEquals(absent, search(f.plus(difference(sum))), () -> "sum of " + f + " and more");
    }
  }

  @Test
  void absenceIsNotClaimedOutsideOfTowers() {
    Form half = Combinatorial.harmonic(x.plus(Form.HALF), 2);
    Form dependent =
        half.plus(H)
            .times(Combinatorial.harmonic(x, 2))
            .times(Combinatorial.harmonic(x.times(Form.TWO), 2));
    for (Form f :
        List.of(
            Elementary.power(Form.I, x).times(H),
            Elementary.power(Form.TWO, x.times(Form.HALF)).times(H),
            dependent,
            Combinatorial.harmonic(x.power(2)),
            Elementary.power(x, Form.variable("m")).times(H))) {
      assertFalse(search(f) instanceof Antidifference.ProvedAbsent, () -> "sum of " + f);
    }
  }

  /// Of b^x (x + 1) H(x) with its companion the sum has (b − 1) below.
  @Test
  void aBaseThatMustNotBeOneIsACondition() {
    Form b = Form.variable("b");
    Form power = Elementary.power(b, x);
    Form f =
        power
            .times(H)
            .plus(power.times(b).dividedBy(b.minus(Form.ONE)).dividedBy(x.plus(Form.ONE)));
    var outcome = assertInstanceOf(Antidifference.Found.class, search(f.times(b.minus(Form.ONE))));
    assertEquals(power.times(H), outcome.value());
    Form g =
        power
            .times(b.minus(Form.ONE))
            .times(x)
            .times(H)
            .plus(power.times(b).times(x).dividedBy(x.plus(Form.ONE)));
    var other = assertInstanceOf(Antidifference.Found.class, search(g.plus(power.times(H))));
    assertFalse(other.value().isZero());
    Form plain = power.times(x.plus(Form.ONE));
    var third = assertInstanceOf(Antidifference.Found.class, search(plain.plus(x.inverse())));
    assertEquals(List.of(Condition.notZero(b.minus(Form.ONE))), third.conditions());
  }

  @Test
  void stepsOtherThanOneAreSummed() {
    Form f = Combinatorial.harmonic(x.times(Form.HALF));
    var outcome = assertInstanceOf(Antidifference.Found.class, ENGINE.search(f, X, Form.TWO));
    Form back = outcome.value().substitute(X, x.plus(Form.TWO)).minus(outcome.value());
    assertEquals(f, back);
  }

  /// A radical or i splits factors that are irreducible over ℚ; that must not become a proof.
  @Test
  void radicalsBringNoFalseProofOfAbsence() {
    Form root = Elementary.sqrt(Form.TWO);
    for (Form sum :
        List.of(
            Combinatorial.factorial(x).dividedBy(x.plus(Form.I)),
            Elementary.power(Form.TWO, x).dividedBy(x.plus(root)),
            Elementary.power(Form.TWO, x.times(Form.HALF)).dividedBy(x.plus(Form.of(3))),
            H.dividedBy(x.plus(root)))) {
      assertEquals(sum, found(difference(sum)));
      Antidifference spoilt = search(difference(sum).plus(sum.dividedBy(x)));
      assertFalse(spoilt instanceof Antidifference.Found, () -> "sum of " + sum);
    }
  }

  @Test
  void oneFactorWithHarmonicNumbersInADenominatorProvesThatThereIsNoSum() {
    Antidifference absent =
        new Antidifference.ProvedAbsent(FunctionClass.HYPERGEOMETRIC_WITH_HARMONIC_NUMBERS);
    assertEquals(absent, search(H.times(x).inverse()));
    assertEquals(absent, search(H.power(-2)));
    assertEquals(absent, search(Elementary.power(Form.TWO, x).dividedBy(H.plus(x))));
    assertInstanceOf(Antidifference.GaveUp.class, search(difference(H.inverse())));
  }
}
