package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/// The table `power-sums.tsv`: DLMF (24.4.7)–(24.4.9), Graham–Knuth–Patashnik sec. 6.5 and Knuth,
/// Johann Faulhaber and sums of powers (1993); each row names its source.
class PowerSumsTableTest {

  private static final Variable K = new Variable("k");
  private static final Form k = Form.of(K);
  private static final Form n = Form.variable("n");
  private static final DefiniteSums SUMS = new DefiniteSums(SummationEngine.standard());

  static Stream<Row> rows() {
    List<Row> rows = ReferenceTable.rows("power-sums.tsv");
    assertEquals(35, rows.size());
    return rows.stream().filter(row -> !row.text("form").equals("single-value"));
  }

  static Stream<Row> singleValues() {
    return ReferenceTable.rows("power-sums.tsv").stream()
        .filter(row -> row.text("form").equals("single-value"));
  }

  private static Form polynomial(List<Rational> coefficients, Form at) {
    List<Form> terms = new ArrayList<>();
    for (int j = 0; j < coefficients.size(); j++) {
      terms.add(Form.of(coefficients.get(j)).times(at.power(j)));
    }
    return Form.sum(terms);
  }

  private static List<Rational> numbers(String text) {
    return Stream.of(text.trim().split(" +")).map(Rational::parse).toList();
  }

  private record Case(DefiniteSum sum, Form published) {}

  private static Case read(Row row) {
    int p = Integer.parseInt(row.text("p"));
    Form one = Form.ONE;
    Form triangle = n.times(n.plus(one)).times(Rational.HALF);
    Form power = k.power(p);
    return switch (row.text("form")) {
      case "below-n" ->
          new Case(
              SUMS.sum(power, K, Form.ZERO, n.minus(one)), polynomial(row.numbers("value"), n));
      case "upto-n" -> new Case(SUMS.sum(power, K, one, n), polynomial(row.numbers("value"), n));
      case "faulhaber-odd" ->
          new Case(
              SUMS.sum(power, K, one, n),
              triangle.times(polynomial(row.numbers("value"), triangle)));
      case "faulhaber-even" -> {
        Form front = n.times(Form.TWO).plus(one).times(triangle);
        yield new Case(
            SUMS.sum(power, K, one, n), front.times(polynomial(row.numbers("value"), triangle)));
      }
      case "alternating-upto-m" -> alternating(row, power);
      case "progression" -> progression(row, p);
      default -> throw new IllegalArgumentException(row.text("form"));
    };
  }

  private static Case alternating(Row row, Form power) {
    Form sign = Elementary.power(Form.MINUS_ONE, n.minus(k));
    String[] parts = row.text("value").split(";");
    Form last = Elementary.power(Form.MINUS_ONE, n).times(Form.of(Rational.parse(parts[1].trim())));
    return new Case(
        SUMS.sum(sign.times(power), K, Form.ONE, n), polynomial(numbers(parts[0]), n).plus(last));
  }

  private static Case progression(Row row, int p) {
    String[] parts = row.text("id").split(":")[1].split("\\+");
    Form first = Form.of(Rational.parse(parts[0]));
    Form step = Form.of(Rational.parse(parts[1].replace("k", "")));
    return new Case(
        SUMS.sum(first.plus(step.times(k)).power(p), K, Form.ZERO, n.minus(Form.ONE)),
        polynomial(row.numbers("value"), n));
  }

  @ParameterizedTest
  @MethodSource("rows")
  void sumsOfPowersAreThePublishedPolynomials(Row row) {
    Case read = read(row);
    assertEquals(read.published(), read.sum().value(), row.toString());
    List<Rational> check = row.numbers("check");
    for (int m = 1; m <= check.size(); m++) {
      Form value = read.sum().value().substitute(new Variable("n"), Form.of(m));
      assertEquals(Form.of(check.get(m - 1)), value, row + ", n = " + m);
    }
  }

  @ParameterizedTest
  @MethodSource("singleValues")
  void longSumsOfNumbersAreThePublishedValues(Row row) {
    Form last = Form.of(Rational.parse(row.text("id").split(":")[1]));
    Form power = k.power(Integer.parseInt(row.text("p")));
    Form published = Form.of(row.numbers("value").getFirst());
    assertEquals(published, SUMS.sum(power, K, Form.ONE, last).value(), row.toString());
  }
}
