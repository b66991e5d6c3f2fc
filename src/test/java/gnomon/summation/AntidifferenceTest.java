package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import gnomon.reference.WrittenFormula;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class AntidifferenceTest {

  private static final Variable X = new Variable("x");
  private static final Form x = Form.of(X);
  private static final SummationEngine ENGINE = SummationEngine.standard();

  /// Rows of `antidifferences.tsv` whose formula the reader of tables has no function for.
  private static final List<String> NO_SUCH_FUNCTION = List.of("fibonacci");

  static Stream<Row> rowsInReach() {
    List<Row> rows = ReferenceTable.rows("antidifferences.tsv");
    assertEquals(22, rows.size());
    return rows.stream().filter(row -> !NO_SUCH_FUNCTION.contains(row.text("id")));
  }

  private static Form found(Form f) {
    Antidifference outcome = ENGINE.search(f, X, Form.ONE);
    return assertInstanceOf(Antidifference.Found.class, outcome, () -> "no sum of " + f).value();
  }

  /// Graham, Knuth, Patashnik, Concrete Mathematics (1994), Table 55 and chapters 2, 5, 6, and
  /// Knuth, TAOCP vol. 1; each row names its place.
  @ParameterizedTest
  @MethodSource("rowsInReach")
  void publishedAntidifferencesAreFoundUpToAConstant(Row row) {
    Form f = WrittenFormula.parse(row.text("summand_g"), Map.of("x", x));
    Form published = WrittenFormula.parse(row.text("antidifference_f"), Map.of("x", x));
    Form difference = found(f).minus(published);
    assertFalse(difference.dependsOn(X), () -> row + " differs by " + difference);
    DefiniteSums sums = new DefiniteSums(ENGINE);
    List<Rational> partial = row.numbers("check_partial_sums");
    for (int m = 1; m <= partial.size(); m++) {
      Form sum = sums.sum(f, X, Form.ONE, Form.of(m)).value();
      assertEquals(Form.of(partial.get(m - 1)), sum, row + ", m = " + m);
      Form from = published.substitute(X, Form.ONE);
      assertEquals(published.substitute(X, Form.of(m + 1)).minus(from), sum, row + ", m = " + m);
    }
  }

  @Test
  void sumsOfDifferencesComeBackUpToAConstant() {
    for (long seed = 0; seed < 40; seed++) {
      RandomSums random = new RandomSums(x, new SplittableRandom(seed));
      Form step = random.step();
      Form sum = random.antidifference();
      Form f = sum.substitute(X, x.plus(step)).minus(sum);
      String where = "seed " + seed + ", step " + step + ": F = " + sum;
      Antidifference outcome = ENGINE.search(f, X, step);
      Form found = assertInstanceOf(Antidifference.Found.class, outcome, where).value();
      Form rest = found.minus(sum);
      assertEquals(rest, rest.substitute(X, x.plus(step)), where);
    }
  }

  @Test
  void rationalFunctionsWithLinearDenominatorsSumToHarmonicNumbers() {
    assertEquals(Combinatorial.harmonic(x.minus(Form.ONE)), found(x.inverse()));
    assertEquals(Combinatorial.harmonic(x.minus(Form.ONE), 3), found(x.power(-3)));
    Form odd = x.times(Form.TWO).plus(Form.ONE).inverse();
    Form expected = Combinatorial.harmonic(x.minus(Form.HALF)).times(Rational.HALF);
    assertEquals(expected, found(odd));
  }

  @Test
  void aSymbolicStepScalesTheHarmonicNumbers() {
    Form h = Form.variable("h");
    Antidifference outcome = ENGINE.search(x.inverse(), X, h);
    Form sum = assertInstanceOf(Antidifference.Found.class, outcome).value();
    Form expected = Combinatorial.harmonic(x.dividedBy(h).minus(Form.ONE)).dividedBy(h);
    assertEquals(expected, sum);
  }

  @Test
  void aSummandThatASolverStumblesOverIsGivenUp() {
    Antidifference outcome = ENGINE.search(Elementary.power(Form.ZERO, x), X, Form.ONE);
    assertInstanceOf(Antidifference.GaveUp.class, outcome);
  }

  @Test
  void aRationalSummandIsProvedToHaveNoRationalSum() {
    Form f = x.power(2).plus(Form.ONE).inverse();
    Antidifference absent = new Antidifference.ProvedAbsent(FunctionClass.RATIONAL);
    assertEquals(absent, ENGINE.search(f, X, Form.ONE));
    Form telescoping = f.substitute(X, x.plus(Form.of(5))).minus(f);
    assertInstanceOf(Antidifference.Found.class, ENGINE.search(telescoping, X, Form.ONE));
    Form spoilt = telescoping.plus(f.times(Rational.of(1, 1000)));
    assertEquals(absent, ENGINE.search(spoilt, X, Form.ONE));
  }

  @Test
  void aParametricBaseIsSummedUnderTheConditionThatItIsNotOne() {
    Form a = Form.variable("a");
    Antidifference outcome = ENGINE.search(Elementary.power(a, x), X, Form.ONE);
    var found = assertInstanceOf(Antidifference.Found.class, outcome);
    assertEquals(List.of(Condition.notZero(a.minus(Form.ONE))), found.conditions());
    assertEquals(Elementary.power(a, x).dividedBy(a.minus(Form.ONE)), found.value());
  }

  @Test
  void aSummandOutsideEveryClassIsGivenUp() {
    Antidifference outcome = ENGINE.search(Elementary.ln(x), X, Form.ONE);
    assertInstanceOf(Antidifference.GaveUp.class, outcome);
  }

  @Test
  void aWrongSolverIsPassedOver() {
    AntidifferenceSolver wrong =
        new AntidifferenceSolver() {
          @Override
          public FunctionClass searches() {
            return FunctionClass.POLYNOMIAL;
          }

          @Override
          public Antidifference solve(Form f, Variable variable, Form h) {
            return new Antidifference.Found(f, List.of(), FunctionClass.POLYNOMIAL);
          }
        };
    SummationEngine engine = new SummationEngine(List.of(wrong, new ExponentialPolynomialSolver()));
    Form expected = x.power(2).minus(x).times(Rational.HALF);
    assertEquals(
        new Antidifference.Found(expected, List.of(), FunctionClass.EXPONENTIAL_POLYNOMIAL),
        engine.search(x, X, Form.ONE));
  }

  @Test
  void longPolynomialsAreCheckedAsStrictlyAsShortOnes() {
    Form kernel = Elementary.power(Form.TWO, x);
    Form f = x.power(60).times(kernel);
    Form sum = found(f);
    assertTrue(Differencing.confirms(sum, f, X, Form.ONE));
    assertFalse(Differencing.confirms(sum.plus(x.power(3)), f, X, Form.ONE));
    assertFalse(Differencing.confirms(sum, f.plus(Form.ONE), X, Form.ONE));
    assertFalse(Differencing.confirms(sum.times(kernel), f, X, Form.ONE));
  }
}
