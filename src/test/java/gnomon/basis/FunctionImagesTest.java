package gnomon.basis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;

/// Images of functions under basis maps, kernel by kernel.
class FunctionImagesTest {

  private static final Variable X = new Variable("x");
  private static final Form x = Form.of(X);
  private static final Form a = Form.variable("a");
  private static final Form n = Form.variable("n");
  private static final Form one = Form.ONE;
  private static final Dual T = new Dual(X);
  private static final Form t = Form.of(T);

  /// Sums c/(x + d) to harmonic numbers, which is all that images of logarithms need.
  private static final Summation HARMONIC =
      (f, v, step) ->
          new Summation.Outcome.Found(
              gnomon.form.Structure.partialFractions(f, v).orElseThrow().pieces().stream()
                  .map(piece -> harmonic(piece.numerator(), piece.base(), v, step))
                  .reduce(Form.ZERO, Form::plus));

  private static Form harmonic(Form numerator, Form base, Variable v, Form step) {
    Form slope = base.derivative(v);
    Form position = base.dividedBy(slope.times(step)).minus(one);
    return numerator.dividedBy(slope.times(step)).times(Combinatorial.harmonic(position));
  }

  private static ShefferMap umbral(Form symbol) {
    return ShefferMap.umbral(symbol, T);
  }

  private static final ShefferMap FALLING = umbral(Elementary.exp(t).minus(one));
  private static final ShefferMap RISING = umbral(one.minus(Elementary.exp(t.negated())));
  private static final ShefferMap CENTRAL =
      umbral(
          Elementary.exp(t.times(Rational.HALF))
              .minus(Elementary.exp(t.times(Rational.of(-1, 2)))));
  private static final ShefferMap ABEL = umbral(t.times(Elementary.exp(a.times(t))));
  private static final ShefferMap STEP =
      umbral(Elementary.exp(t.times(Form.TWO)).minus(one).times(Form.of(3)));

  private static Form image(ShefferMap map, Form f) {
    return MappedOperator.of(map).applyTo(f, HARMONIC);
  }

  private static Map<String, Form> phiStatements() {
    Form quartic = x.power(4);
    Operator difference = Operator.forwardDifference(X, one);
    Operator backward = Operator.backwardDifference(X, one);
    Map<String, Form> values = new HashMap<>();
    values.put("phi-exp", image(FALLING, Elementary.exp(Form.TWO.times(x))));
    values.put("phi-exp-half", image(FALLING, Elementary.exp(x)));
    values.put("phi-sin", image(FALLING, Elementary.sin(x)));
    values.put("phi-sinh", image(FALLING, Elementary.sinh(x)));
    values.put("phi-ln", difference.applyTo(image(FALLING, Elementary.ln(x))));
    values.put("phi-D", difference.applyTo(image(FALLING, quartic)));
    values.put("phi-xD", x.times(backward.applyTo(image(FALLING, x.power(3)))));
    values.put("phi-binomial-theorem", image(FALLING, one.plus(x).power(4)));
    Form geometric = one.plus(x).plus(x.power(2)).plus(x.power(3)).plus(quartic);
    values.put("phi-geometric-finite", image(FALLING, geometric));
    return values;
  }

  private static Map<String, List<Form>> phiCoefficients() {
    Form bernoulli =
        x.power(3).minus(x.power(2).times(Rational.of(3, 2))).plus(x.times(Rational.HALF));
    Form quartic = x.power(4);
    Map<String, List<Form>> lists = new HashMap<>();
    lists.put(
        "phi-newton",
        Expansions.of(quartic, new Basis.FallingPowers(X), OptionalInt.empty(), HARMONIC)
            .coefficients());
    lists.put("phi-inverse-power", FALLING.inverse().member(5));
    lists.put("phi-power", FALLING.member(5));
    lists.put("phi-bernoulli", coefficients(image(FALLING, bernoulli)));
    Operator shift = Operator.shift(X, Form.TWO);
    lists.put("translation", coefficients(shift.applyTo(x.power(3))));
    Form sum = Operator.sum(X).applyTo(x.power(3));
    lists.put(
        "definite-sum", List.of(sum.substitute(X, Form.of(7)).minus(sum.substitute(X, Form.TWO))));
    return lists;
  }

  private static List<Form> coefficients(Form polynomial) {
    return gnomon.form.Structure.asPolynomial(polynomial, X).orElseThrow();
  }

  /// The table `practice.tsv`: facts of the trade about φ, the map x^n ↦ x↓n.
  @Test
  void theFactsOfTheTradeHold() {
    Map<String, Form> functions = phiStatements();
    Map<String, List<Form>> lists = phiCoefficients();
    List<Row> rows = ReferenceTable.rows("practice.tsv");
    assertEquals(functions.size() + lists.size(), rows.size());
    for (Row row : rows) {
      String id = row.text("id");
      List<Form> expected = row.forms("values");
      if (lists.containsKey(id)) {
        assertEquals(expected, lists.get(id), id);
        continue;
      }
      for (int m = 0; m < expected.size(); m++) {
        assertEquals(expected.get(m), functions.get(id).substitute(X, Form.of(m)), id + " at " + m);
      }
    }
  }

  @Test
  void imagesHaveTheClosedFormsOfTheTrade() {
    assertEquals(Elementary.power(one.plus(a), x), image(FALLING, Elementary.exp(a.times(x))));
    Form half = x.times(Rational.HALF);
    Form quarter = Form.PI.times(x).times(Rational.of(1, 4));
    assertEquals(
        Elementary.power(Form.TWO, half).times(Elementary.sin(quarter)),
        image(FALLING, Elementary.sin(x)));
    assertEquals(Combinatorial.harmonic(x), image(FALLING, Elementary.ln(x)));
    for (int m = 1; m <= 4; m++) {
      assertEquals(Combinatorial.falling(x, Form.of(-m)), image(FALLING, x.power(-m)), "x^-" + m);
      Form shifted = x.plus(a.times(Form.of(m)));
      assertEquals(x.dividedBy(shifted.power(m + 1)), image(ABEL, x.power(-m)), "x^-" + m);
    }
    Form power = Elementary.power(x, n);
    assertEquals(Combinatorial.falling(x, n), image(FALLING, power));
    assertEquals(Combinatorial.rising(x, n), image(RISING, power));
    Form abel = Elementary.power(x.minus(a.times(n)), n.minus(one)).times(x);
    assertEquals(abel, image(ABEL, power));
  }

  @Test
  void symbolicMembersTakeTheValuesOfTheMembers() {
    for (ShefferMap map : List.of(FALLING, RISING, CENTRAL, ABEL, STEP)) {
      Form symbolic = image(map, Elementary.power(x, n));
      for (int m = 1; m <= 4; m++) {
        Form at = symbolic.substitute(new Variable("n"), Form.of(m));
        assertEquals(map.memberAt(m), at, map + ", n = " + m);
      }
    }
  }

  /// Q U = U D and U X = Y U, Y = (X − g'/g) f'⁻¹, on functions that are no polynomials.
  @Test
  void mapsIntertwineOnFunctionsToo() {
    List<Form> functions =
        List.of(
            Elementary.exp(a.times(x)),
            Elementary.sin(x),
            x.times(Elementary.cosh(x.times(Rational.HALF))),
            x.power(2).times(Elementary.power(Form.of(3), x)),
            x.power(-2),
            x.power(-1).plus(x),
            Elementary.ln(x),
            Elementary.power(x, n));
    for (ShefferMap map : List.of(FALLING, RISING, CENTRAL, ABEL, STEP)) {
      Operator q = Operator.ofSymbol(map.f());
      Operator position = Operator.ofSymbol(x.times(map.f().derivative(T).inverse()));
      for (Form f : functions) {
        boolean exponential =
            f.dependsOn(X) && gnomon.form.Structure.exponentialParts(f, X).isPresent();
        if (map == ABEL && exponential) {
          continue;
        }
        String where = map + " on " + f;
        Form derived = f.derivative(X);
        assertEquals(image(map, derived), q.applyTo(image(map, f)), where);
        if (map.f().derivative(T).numerator().size() == 1) {
          assertEquals(image(map, x.times(f)), position.applyTo(image(map, f)), where);
        }
      }
    }
  }

  @Test
  void imagesThatWouldBeInfiniteSeriesAreRefused() {
    List<Form> functions =
        List.of(
            x.plus(one).inverse(),
            Elementary.tan(x),
            Elementary.ln(x).power(2),
            Elementary.exp(x).dividedBy(x),
            Form.of(new Unknown("f", 0, x)),
            x.times(Elementary.exp(x.negated())),
            Combinatorial.harmonic(x));
    for (Form f : functions) {
      Refusal refusal = assertThrows(Refusal.class, () -> image(FALLING, f), f.toString());
      assertEquals(Reason.INFINITE_SERIES, refusal.reason(), f.toString());
    }
    Refusal refusal = assertThrows(Refusal.class, () -> image(ABEL, Elementary.exp(x)));
    assertEquals(Reason.NO_CLOSED_FORM, refusal.reason());
    assertThrows(Refusal.class, () -> image(umbral(t.dividedBy(one.minus(t))), x.inverse()));
  }

  @Test
  void newtonSeriesReproduceTheFunctionAtTheIntegers() {
    List<Form> functions =
        List.of(
            Elementary.exp(x),
            Elementary.power(Form.TWO, x),
            x.plus(one).inverse(),
            Elementary.sin(x),
            Combinatorial.factorial(x));
    for (Form f : functions) {
      for (Basis basis : List.of(new Basis.FallingPowers(X), new Basis.Binomials(X))) {
        BasisExpansion series = BasisExpansion.of(f, basis, OptionalInt.of(5), HARMONIC);
        assertEquals(OptionalInt.of(5), series.order());
        for (int m = 0; m <= 5; m++) {
          Form value = series.toForm().substitute(X, Form.of(m));
          assertEquals(f.substitute(X, Form.of(m)), value, f + " at " + m);
        }
      }
    }
  }

  @Test
  void polynomialsComeBackFromEveryBasis() {
    Form p = x.power(6).minus(x.power(3).times(Rational.of(2, 3))).plus(a.times(x)).plus(one);
    List<Basis> bases =
        List.of(
            new Basis.Powers(X),
            new Basis.FallingPowers(X),
            new Basis.RisingPowers(X),
            new Basis.Binomials(X),
            new Basis.Sequence(ABEL),
            new Basis.Sequence(CENTRAL),
            new Basis.Sequence(
                ShefferMap.sheffer(t.dividedBy(t.minus(one)), one.minus(t).inverse(), T)));
    for (Basis basis : bases) {
      BasisExpansion expansion = BasisExpansion.of(p, basis, OptionalInt.empty(), HARMONIC);
      assertEquals(p, expansion.toForm(), basis.toString());
      Form sum = Form.ZERO;
      for (int k = 0; k < expansion.coefficients().size(); k++) {
        sum = sum.plus(expansion.coefficients().get(k).times(basis.element(k)));
      }
      assertEquals(p, sum, basis.toString());
      Form mapped = expansion.mappedBy(FALLING).toForm();
      assertEquals(image(FALLING, p), mapped, basis.toString());
    }
    assertFalse(
        BasisExpansion.of(p, new Basis.Powers(X), OptionalInt.of(4), HARMONIC).order().isEmpty());
    assertThrows(
        Refusal.class,
        () ->
            BasisExpansion.of(
                Elementary.exp(x), new Basis.FallingPowers(X), OptionalInt.empty(), HARMONIC));
  }

  /// The table `triangles-and-sequences.tsv`: DLMF Tables 26.8.1, 26.8.2, 26.7.1 and, for the Lah
  /// numbers, the formula in DLMF 5.2(iii).
  @Test
  void matricesOfMapsAreThePublishedTriangles() {
    int size = 21;
    Map<String, List<List<Form>>> triangles =
        Map.of(
            "stirling1-signed", FALLING.matrix(size),
            "stirling2", FALLING.inverse().matrix(size),
            "lah-unsigned", FALLING.inverse().compose(RISING).matrix(size));
    int seen = 0;
    for (Row row : ReferenceTable.rows("triangles-and-sequences.tsv")) {
      List<List<Form>> triangle = triangles.get(row.text("object"));
      int index = Integer.parseInt(row.text("n"));
      if (triangle != null) {
        int first = Integer.parseInt(row.text("first_index"));
        assertEquals(
            row.forms("values"), triangle.get(index).subList(first, index + 1), row.toString());
        seen++;
      } else if (row.text("object").equals("bell")) {
        Form sum = Form.sum(FALLING.inverse().member(index));
        assertEquals(row.forms("values").getFirst(), sum, row.toString());
        seen++;
      }
    }
    assertEquals(8 + 8 + 6 + 15, seen);
  }
}
