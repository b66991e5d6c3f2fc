package gnomon.operator;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/// Every row of the tables that an operator or a functional identity can check. The sources stand
/// in the rows.
class PublishedOperatorTablesTest {

  private static final Variable X = new Variable("x");
  private static final Dual T = new Dual(X);
  private static final Operator ONE = Operator.identity();
  private static final Operator D = Operator.derivative(X);
  private static final Operator E = Operator.shift(X, Form.ONE);
  private static final Operator DELTA = Operator.forwardDifference(X, Form.ONE);
  private static final Operator NABLA = Operator.backwardDifference(X, Form.ONE);
  private static final Operator CENTRAL = Operator.centralDifference(X, Form.ONE);
  private static final Operator MEAN = Operator.centralMean(X, Form.ONE);

  private static Operator named(String name) {
    return switch (name) {
      case "D" -> D;
      case "E" -> E;
      case "Delta" -> DELTA;
      case "Nabla" -> NABLA;
      case "delta" -> CENTRAL;
      case "mu" -> MEAN;
      case "2/(1+E)" -> ONE.plus(ONE).dividedBy(ONE.plus(E));
      default -> composed(name);
    };
  }

  private static Operator composed(String name) {
    int slash = name.indexOf('/');
    if (slash > 0) {
      return named(name.substring(0, slash)).dividedBy(named(name.substring(slash + 1)));
    }
    int hat = name.indexOf('^');
    if (hat < 0) {
      throw new IllegalArgumentException("unknown operator " + name);
    }
    return named(name.substring(0, hat)).power(Integer.parseInt(name.substring(hat + 1)));
  }

  @TestFactory
  Stream<DynamicTest> operatorsExpandInPowersOfOthersAsPublished() {
    return PublishedRows.of("operator-series.tsv").stream()
        .map(row -> DynamicTest.dynamicTest(row.get("id"), () -> checkSeries(row)));
  }

  private static void checkSeries(Map<String, String> row) {
    List<Form> expected = PublishedRows.numbers(row.get("coefficients"));
    PowerSeries found =
        OperatorExpansion.of(
            named(row.get("operator")), named(row.get("in_powers_of")), X, expected.size() - 1);
    assertEquals(expected, found.coefficients());
  }

  @TestFactory
  Stream<DynamicTest> differenceWeightsHaveTheirOrderAndError() {
    return PublishedRows.of("difference-weights.tsv").stream()
        .map(row -> DynamicTest.dynamicTest(row.get("id"), () -> checkWeights(row)));
  }

  private static void checkWeights(Map<String, String> row) {
    int derivative = Integer.parseInt(row.get("derivative"));
    int order = Integer.parseInt(row.get("order"));
    List<Form> offsets = PublishedRows.numbers(row.get("offsets"));
    List<Form> weights = PublishedRows.numbers(row.get("weights"));
    Operator formula = Operator.zero();
    for (int i = 0; i < offsets.size(); i++) {
      formula = formula.plus(Operator.shift(X, offsets.get(i)).times(weights.get(i)));
    }
    Operator error = formula.minus(D.power(derivative));
    PowerSeries series = Expansion.of(error.symbol(), T, derivative + order);
    assertEquals(derivative + order, series.valuation());
    assertEquals(Form.of(Rational.parse(row.get("error"))), series.coefficient(derivative + order));
    Form image = formula.applyTo(Form.of(X).power(derivative));
    assertEquals(D.power(derivative).applyTo(Form.of(X).power(derivative)), image);
  }

  @TestFactory
  Stream<DynamicTest> newtonCotesRulesHaveTheirError() {
    return PublishedRows.of("newton-cotes.tsv").stream()
        .filter(row -> !row.get("error").isEmpty())
        .map(row -> DynamicTest.dynamicTest(row.get("id"), () -> checkRule(row)));
  }

  private static void checkRule(Map<String, String> row) {
    Form end = Form.of(Integer.parseInt(row.get("intervals")));
    List<Form> nodes = PublishedRows.numbers(row.get("nodes"));
    List<Form> weights = PublishedRows.numbers(row.get("weights"));
    Functional error = Functional.integral(X, Form.ZERO, end);
    for (int i = 0; i < nodes.size(); i++) {
      error = error.minus(Functional.evaluation(X, nodes.get(i)).times(weights.get(i)));
    }
    int power = Integer.parseInt(row.get("error_power"));
    PowerSeries series = Expansion.of(error.indicator(), T, power - 1);
    assertEquals(power - 1, series.valuation());
    assertEquals(Form.of(Rational.parse(row.get("error"))), series.coefficient(power - 1));
    for (int k = 0; k < power - 1; k++) {
      assertTrue(error.applyTo(Form.of(X).power(k)).isZero(), "exact on x^" + k);
    }
  }
}
