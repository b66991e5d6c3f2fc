package gnomon.basis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import gnomon.reference.WrittenFormula;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/// The table `sheffer.tsv`: Roman, The Umbral Calculus (1984), ch. 4, with DLMF chapters 18 and 24;
/// each row names its source.
class ShefferTableTest {

  private static final Variable X = new Variable("x");
  private static final Dual T = new Dual(X);
  private static final int DEGREE = 5;

  static Stream<Row> rows() {
    List<Row> rows = ReferenceTable.rows("sheffer.tsv");
    assertEquals(21, rows.size());
    return rows.stream();
  }

  private static Map<String, Form> names(Row row) {
    Map<String, Form> names = new HashMap<>();
    names.put("x", Form.of(X));
    names.put("t", Form.of(T));
    for (String setting : row.text("parameters").split(";")) {
      if (!setting.isBlank()) {
        String[] sides = setting.trim().split("=");
        names.put(sides[0], Form.of(Rational.parse(sides[1])));
      }
    }
    return names;
  }

  private static Form symbolF(Row row) {
    String f = row.text("f");
    String inverse = "inverse of ";
    if (!f.startsWith(inverse)) {
      return WrittenFormula.parse(f, names(row));
    }
    Form closed = WrittenFormula.parse(f.substring(inverse.length()), names(row));
    return ShefferMap.umbral(closed, T).inverseOfF();
  }

  private static ShefferMap map(Row row) {
    return ShefferMap.sheffer(symbolF(row), WrittenFormula.parse(row.text("g"), names(row)), T);
  }

  private static List<Form> trimmed(List<Form> coefficients) {
    List<Form> result = new ArrayList<>(coefficients);
    while (!result.isEmpty() && result.getLast().isZero()) {
      result.removeLast();
    }
    return result;
  }

  @ParameterizedTest
  @MethodSource("rows")
  void eachMemberAloneIsThePublishedPolynomial(Row row) {
    ShefferMap map = map(row);
    for (int n = 0; n <= DEGREE; n++) {
      assertEquals(trimmed(row.forms("p" + n)), trimmed(map.member(n)), row + ", n = " + n);
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void theMatrixHoldsThePublishedPolynomials(Row row) {
    List<List<Form>> columns = map(row).matrix(DEGREE);
    for (int n = 0; n <= DEGREE; n++) {
      assertEquals(trimmed(row.forms("p" + n)), trimmed(columns.get(n)), row + ", n = " + n);
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void theInverseMapCarriesThePublishedPolynomialsToPowers(Row row) {
    ShefferMap inverse = map(row).inverse();
    for (int n = 0; n <= DEGREE; n++) {
      List<Form> power = new ArrayList<>(java.util.Collections.nCopies(n, Form.ZERO));
      power.add(Form.ONE);
      assertEquals(power, trimmed(inverse.image(row.forms("p" + n))), row + ", n = " + n);
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void thePairingWithGTimesPowersOfFIsFactorial(Row row) {
    Form f = symbolF(row);
    Form g = WrittenFormula.parse(row.text("g"), names(row));
    for (int k = 0; k <= DEGREE; k++) {
      Operator pairing = Operator.of(Form.ZERO, X, g.times(f.power(k)));
      for (int n = 0; n <= DEGREE; n++) {
        Form polynomial = Kernels.polynomial(row.forms("p" + n), X);
        Form expected = k == n ? Form.of(Integers.factorial(n)) : Form.ZERO;
        assertEquals(expected, pairing.applyTo(polynomial), row + ", k = " + k + ", n = " + n);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void theGeneratingFunctionExpandsToTheMembers(Row row) {
    ShefferMap map = map(row);
    check(row, Expansion.of(map.generatingFunction(), T, DEGREE));
    if (!row.text("generating_function").isEmpty()) {
      Form printed = WrittenFormula.parse(row.text("generating_function"), names(row));
      check(row, Expansion.of(printed, T, DEGREE));
    }
  }

  private static void check(Row row, PowerSeries series) {
    for (int n = 0; n <= DEGREE; n++) {
      Form member = series.coefficient(n).times(Form.of(Integers.factorial(n)));
      assertEquals(Kernels.polynomial(row.forms("p" + n), X), member, row + ", n = " + n);
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void theInverseOfFIsThePublishedOne(Row row) {
    ShefferMap map = map(row);
    Form t = Form.of(T);
    PowerSeries undone = map.fSeries(8).compose(map.inverseSeries(8));
    assertEquals(PowerSeries.monomial(Form.ONE, 1, 8), undone, row.toString());
    if (!row.text("f_inverse").isEmpty()) {
      Form printed = WrittenFormula.parse(row.text("f_inverse"), names(row));
      assertEquals(Expansion.of(printed, T, 8), map.inverseSeries(8), row.toString());
      if (map.isClosed()) {
        assertEquals(t, map.f().substitute(T, map.inverseOfF()), row.toString());
      }
    } else {
      assertTrue(ShefferMap.containsInverseSeries(map.inverseOfF()), row.toString());
    }
  }
}
