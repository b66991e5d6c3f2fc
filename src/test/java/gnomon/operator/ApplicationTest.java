package gnomon.operator;

import static gnomon.operator.RandomOperators.FX;
import static gnomon.operator.RandomOperators.X;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.number.Rational;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/// What operators make of functions; the values without a source are from memory and checked by the
/// equation they solve.
class ApplicationTest {

  private static final Form ONE = Form.ONE;
  private static final Operator D = Operator.derivative(X);
  private static final Operator DELTA = Operator.forwardDifference(X, ONE);
  private static final Operator SHIFT = Operator.shift(X, ONE);
  private static final Operator SUM = Operator.sum(X);
  private static final Operator INTEGRAL = Operator.integral(X);

  /// An engine that knows a few antidifferences and recognises them by differencing.
  private static Summation knowing(Form... known) {
    return (f, x, step) -> {
      for (Form candidate : known) {
        Form moved = candidate.substitute(x, Form.of(x).plus(step));
        if (moved.minus(candidate).equals(f)) {
          return new Summation.Outcome.Found(candidate);
        }
      }
      return new Summation.Outcome.GaveUp("not among the known");
    };
  }

  /// An engine for exponential polynomials by way of the symbol of the sum.
  private static final Summation BY_SYMBOL =
      (f, x, step) -> new Summation.Outcome.Found(Operator.sum(x, step).applyTo(f));

  private static Reason reasonOf(Runnable attempt) {
    return assertThrows(Refusal.class, attempt::run).reason();
  }

  private static Form power(long base) {
    return Elementary.power(Form.of(base), FX);
  }

  @Test
  void polynomialsAreSummedByTheSymbol() {
    Form n = FX.minus(ONE);
    Form expected = FX.times(n).times(FX.plus(n)).times(Rational.of(1, 6));
    assertEquals(expected, SUM.applyTo(FX.power(2)));
  }

  @Test
  void exponentialPolynomialsAreSummedByTheSymbol() {
    assertEquals(power(2).minus(ONE), SUM.applyTo(power(2)));
    Form f = FX.power(2).times(power(3)).plus(Elementary.sin(FX));
    Form sum = SUM.applyTo(f);
    assertEquals(f, DELTA.applyTo(sum));
    assertEquals(Form.ZERO, sum.substitute(X, Form.ZERO));
  }

  @Test
  void inversesModuloAKernelAnswerWithConstants() {
    Form first = Form.variable("C1");
    Form second = Form.variable("C2");
    assertEquals(power(2).plus(first), DELTA.inverse().applyTo(power(2)));
    assertEquals(
        FX.power(3).times(Rational.of(1, 6)).plus(first).plus(second.times(FX)),
        D.power(-2).applyTo(FX));
    Form again = DELTA.inverse().applyTo(first.times(power(2)));
    assertEquals(first.times(power(2)).plus(second), again);
  }

  @Test
  void derivativesAndShiftsActOnUnknownFunctions() {
    Form f = Form.of(new Unknown("f", 0, FX));
    Form h = Form.variable("h");
    Form moved = Form.of(new Unknown("f", 1, FX.plus(h)));
    assertEquals(moved, D.compose(Operator.shift(X, h)).applyTo(f));
    assertEquals(f.minus(f.substitute(X, Form.ZERO)), INTEGRAL.compose(D).applyTo(f));
    Form slope = D.applyTo(f);
    assertEquals(f.minus(f.substitute(X, Form.ZERO)), INTEGRAL.applyTo(slope));
  }

  @Test
  void productsActOnUnknownFunctionsOneFactorAfterTheOther() {
    Form f = Form.of(new Unknown("f", 0, FX));
    Operator a = Operator.multiplication(FX.power(2)).compose(D).plus(SHIFT);
    Operator b = Operator.multiplication(FX.inverse()).compose(D.power(2)).plus(DELTA);
    assertEquals(a.applyTo(b.applyTo(f)), a.compose(b).applyTo(f));
  }

  @Test
  void integralsOfSimpleRationalFunctionsHaveLogarithms() {
    Form f = FX.plus(ONE).inverse();
    assertEquals(Elementary.ln(FX.plus(ONE)), INTEGRAL.applyTo(f));
    Form g = FX.plus(Form.of(2)).power(-2);
    Form expected = Form.HALF.minus(FX.plus(Form.of(2)).inverse());
    assertEquals(expected, INTEGRAL.applyTo(g));
    assertEquals(Elementary.ln(FX).plus(Form.variable("C1")), D.inverse().applyTo(FX.inverse()));
  }

  @Test
  void theIntegralFromAPoleIsRefused() {
    assertThrows(Refusal.class, () -> INTEGRAL.applyTo(FX.inverse()));
  }

  @Test
  void sumsOfOtherFunctionsComeFromTheEngine() {
    Form harmonic = Combinatorial.harmonic(FX);
    Form factorial = Combinatorial.factorial(FX);
    Summation engine = knowing(harmonic, factorial);
    Form term = FX.plus(ONE).inverse();
    assertEquals(harmonic, SUM.applyTo(term, engine));
    assertEquals(factorial.minus(ONE), SUM.applyTo(FX.times(factorial), engine));
    assertEquals(
        factorial.plus(Form.variable("C1")), DELTA.inverse().applyTo(FX.times(factorial), engine));
    assertEquals(Combinatorial.harmonic(FX.plus(ONE)), SHIFT.compose(SUM).applyTo(term, engine));
    assertEquals(
        Combinatorial.harmonic(Form.of(5)),
        Functional.evaluation(X, Form.of(5)).compose(SUM).applyTo(term, engine));
  }

  @Test
  void sumAfterShiftDropsTheFirstTermOfShiftAfterSum() {
    Form factorial = Combinatorial.factorial(FX);
    Summation engine = knowing(factorial);
    Form f = FX.times(factorial);
    Form shifted = SHIFT.compose(SUM).applyTo(f, engine);
    Form summed = SUM.compose(SHIFT).applyTo(f, engine);
    assertEquals(f.substitute(X, Form.ZERO), shifted.minus(summed));
    Operator once = Operator.multiplication(FX).compose(SHIFT.power(2)).compose(SUM);
    assertEquals(
        FX.times(Combinatorial.factorial(FX.plus(Form.of(2))).minus(ONE)), once.applyTo(f, engine));
  }

  @Test
  void theRouteThroughAntidifferencesAgreesWithTheSymbol() {
    Seeds.each(
        3100,
        150,
        random -> {
          RandomOperators of = new RandomOperators(random);
          Operator a = of.operator(random.nextInt(3));
          Form f = of.exponentialPolynomial();
          Optional<Form> through = Optional.empty();
          try {
            through = Antidifferences.tryApply(a, X, f, BY_SYMBOL);
          } catch (Refusal refusal) {
            assertEquals(Reason.INFINITE_SERIES, refusal.reason());
          }
          through.ifPresent(image -> assertEquals(a.applyTo(f), image));
        });
  }

  @Test
  void anImageThatIsAnInfiniteSeriesIsRefusedWithOperatorAndFunction() {
    Operator bernoulli = D.dividedBy(DELTA);
    Refusal refusal = assertThrows(Refusal.class, () -> bernoulli.applyTo(FX.inverse()));
    assertEquals(Reason.INFINITE_SERIES, refusal.reason());
    assertEquals(List.of(bernoulli.symbol(), FX.inverse()), refusal.data());
  }

  @Test
  void aSymbolWithAPoleAtTheRateIsRefused() {
    Operator resolvent = D.minus(Operator.identity()).inverse();
    assertEquals(Reason.SYMBOL_POLE, reasonOf(() -> resolvent.applyTo(Elementary.exp(FX))));
    assertEquals(FX.negated().minus(ONE), resolvent.applyTo(FX));
    assertEquals(
        Elementary.exp(FX.times(Form.TWO)), resolvent.applyTo(Elementary.exp(FX.times(Form.TWO))));
  }

  @Test
  void anUnknownAntidifferenceIsRefusedAsSuch() {
    Form f = FX.plus(ONE).inverse();
    assertEquals(Reason.ANTIDIFFERENCE_NOT_FOUND, reasonOf(() -> SUM.applyTo(f)));
    Summation absent = (_, _, _) -> new Summation.Outcome.ProvedAbsent("rational");
    assertEquals(Reason.NO_ANTIDIFFERENCE, reasonOf(() -> SUM.applyTo(f, absent)));
  }

  @Test
  void aWrongAntidifferenceIsNotBelieved() {
    Summation wrong = (f, _, _) -> new Summation.Outcome.Found(f);
    assertThrows(IllegalStateException.class, () -> SUM.applyTo(FX.plus(ONE).inverse(), wrong));
  }

  @Test
  void theTruncatedSumIsTheEulerMaclaurinFormula() {
    Form f = FX.plus(ONE).inverse();
    Form slope = f.derivative(X);
    Form atZero = f.substitute(X, Form.ZERO);
    Form slopeAtZero = slope.substitute(X, Form.ZERO);
    Form expected =
        Elementary.ln(FX.plus(ONE))
            .minus(f.minus(atZero).times(Rational.HALF))
            .plus(slope.minus(slopeAtZero).times(Rational.of(1, 12)));
    assertEquals(expected, SUM.applyTo(f, 1, Summation.NONE));
  }

  @Test
  void aPolynomialOfHighDegreeIsSummed() {
    Form sum = SUM.applyTo(FX.power(120));
    assertEquals(FX.power(120), DELTA.applyTo(sum));
  }
}
