package gnomon.render;

import static gnomon.render.Spelt.X;
import static gnomon.render.Spelt.number;
import static gnomon.render.Spelt.one;
import static gnomon.render.Spelt.t;
import static gnomon.render.Spelt.x;
import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.operator.Functional;
import gnomon.operator.Operator;
import gnomon.value.DecimalValue;
import gnomon.value.Derivation;
import gnomon.value.Element;
import gnomon.value.Equation;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.MapValue;
import gnomon.value.OperatorValue;
import gnomon.value.SeriesValue;
import gnomon.value.Shape;
import gnomon.value.Status;
import gnomon.value.Step;
import gnomon.value.TableValue;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class RenderingTest {
  private static final Rendering UNICODE = Rendering.unicode(60);
  private static final Dual DUAL = new Dual(X);

  private static Value form(Form form) {
    return FormValue.of(form);
  }

  private static Value form(long number) {
    return FormValue.of(Form.of(number));
  }

  @Test
  void mapsAreWrittenByTheirOperators() {
    Form delta = Elementary.exp(t).minus(one);
    assertEquals("umbral(Δ)", UNICODE.text(new MapValue(ShefferMap.umbral(delta, DUAL))));
    assertEquals(
        "sheffer(D, D + 1)", UNICODE.text(new MapValue(ShefferMap.sheffer(t, t.plus(one), DUAL))));
    MappedOperator product =
        MappedOperator.term(Operator.ofSymbol(x), ShefferMap.umbral(delta, DUAL));
    assertEquals("X umbral(Δ)", UNICODE.text(new OperatorValue(product)));
  }

  @Test
  void functionalsAreEvaluations() {
    assertEquals("ε(2)", UNICODE.text(new FunctionalValue(Functional.evaluation(X, Form.TWO))));
    assertEquals(
        "3 ε(0)",
        UNICODE.text(new FunctionalValue(Functional.evaluation(X, Form.ZERO).times(Form.of(3)))));
    assertEquals(
        "ε(1) ∫", UNICODE.text(new FunctionalValue(Functional.integral(X, Form.ZERO, Form.ONE))));
  }

  @Test
  void seriesEndInTheirOrderTerm() {
    SeriesValue series =
        new SeriesValue(new Family.Powers(x), 0, List.of(one, one, Form.HALF, Form.ZERO), 4);
    assertEquals("1 + x + 1/2 x^2 + O(x^4)", UNICODE.text(series));
    SeriesValue operators =
        new SeriesValue(
            new Family.OperatorPowers(Operator.forwardDifference(X, one)),
            1,
            List.of(one, Form.HALF.negated(), number(1, 3)),
            4);
    assertEquals("Δ - 1/2 Δ^2 + 1/3 Δ^3 + O(Δ^4)", UNICODE.text(operators));
    assertEquals(
        "Delta - 1/2 Delta^2 + 1/3 Delta^3 + O(Delta^4)", Rendering.ascii().text(operators));
  }

  @Test
  void expansionsKeepTheirBasis() {
    Value value =
        FormValue.of(x.power(2))
            .withShape(
                new Shape.Expansion(
                    List.of(
                        new Shape.Term(one, new Element.FallingPower(x, 2)),
                        new Shape.Term(one, new Element.FallingPower(x, 1)))));
    assertEquals("x↓2 + x", UNICODE.text(value));
    assertEquals("x|_2 + x", Rendering.ascii().text(value));
  }

  @Test
  void partialFractionsAreASum() {
    Form fraction = x.power(3).plus(one).dividedBy(x.times(x.plus(Form.of(2))));
    Value value = FormValue.of(fraction).withShape(new Shape.PartialFractions(X));
    assertEquals("x - 2 + 1/(2 x) + 7/(2 (x + 2))", UNICODE.text(value));
  }

  @Test
  void tablesAreListsOfAlignedRowsWithTheHeaderInAComment() {
    TableValue table =
        new TableValue(
            List.of(form(Form.variable("n")), form(x)),
            List.of(List.of(form(9), form(81)), List.of(form(10), form(100))));
    assertEquals("[ # n, x\n [ 9,  81],\n [10, 100]]", UNICODE.text(table));
    assertEquals("[[9, 81], [10, 100]]", UNICODE.line(table));
    TableValue matrix =
        new TableValue(List.of(), List.of(List.of(form(1), form(0)), List.of(form(-1), form(1))));
    assertEquals("[[ 1, 0],\n [-1, 1]]", UNICODE.text(matrix));
    assertEquals("\\begin{matrix} 1 & 0 \\\\ -1 & 1 \\end{matrix}", Rendering.latex().text(matrix));
  }

  @Test
  void verdictsNameTheirGroundOrWitness() {
    assertEquals(
        "proved: both sides have the normal form x^2",
        UNICODE.text(
            new VerdictValue.Proved(new VerdictValue.Ground.NormalForm(form(x.power(2))))));
    assertEquals(
        "refuted: at x = 2 the left side is 4, the right side is 5",
        UNICODE.text(
            new VerdictValue.Refuted(
                new VerdictValue.Witness.AtPoint(
                    List.of(new VerdictValue.Assignment(X, Form.TWO)), form(4), form(5)))));
    assertEquals(
        "open: x^0, ..., x^12 agree; the products do not end",
        UNICODE.text(new VerdictValue.Open("x^0, ..., x^12 agree", "the products do not end")));
    assertEquals(
        "proved: the sides agree",
        UNICODE.text(
            new VerdictValue.Proved(
                new VerdictValue.Ground.Words("the sides agree", Optional.empty()))));
  }

  @Test
  void decimalsWithManyZerosUseAPowerOfTen() {
    assertEquals("3.14159", UNICODE.text(DecimalValue.of(new BigDecimal("3.14159"))));
    assertEquals("-0.0012", UNICODE.text(DecimalValue.of(new BigDecimal("-0.0012"))));
    assertEquals("1.25 * 10^80", UNICODE.text(DecimalValue.of(new BigDecimal("1.25e80"))));
  }

  @Test
  void listsAndStatusLinesAreWrittenOut() {
    assertEquals("[1, x]", UNICODE.text(new ListValue(List.of(form(1), form(x)))));
    assertEquals(
        "@3 closed form for n >= 1",
        UNICODE.statusLine("@3", Status.of(Status.Kind.CLOSED_FORM).withDetail("for n >= 1")));
    assertEquals("@4", UNICODE.statusLine("@4", Status.NONE));
  }

  @Test
  void derivationsAreNumberedSteps() {
    Derivation derivation =
        new Derivation(
            List.of(
                new Step(
                    "differencing",
                    List.of(new Equation(form(x), form(x))),
                    true,
                    "Delta of the answer is the summand")));
    assertEquals(
        "1. differencing: Delta of the answer is the summand\n   x = x", UNICODE.why(derivation));
  }
}
