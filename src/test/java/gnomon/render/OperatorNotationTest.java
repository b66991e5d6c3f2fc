package gnomon.render;

import static gnomon.render.Spelt.X;
import static gnomon.render.Spelt.one;
import static gnomon.render.Spelt.operator;
import static gnomon.render.Spelt.t;
import static gnomon.render.Spelt.unicode;
import static gnomon.render.Spelt.x;
import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.form.Combinatorial;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.operator.Operator;
import org.junit.jupiter.api.Test;

/// How operators are written: in the letters that make the shortest line. The identities behind the
/// choices, such as δ = E^(1/2) − E^(−1/2), are common practice.
class OperatorNotationTest {
  private static final Form SHIFT = Elementary.exp(t);
  private static final Form HALF_SHIFT = Elementary.exp(t.times(Form.HALF));
  private static final Operator D = Operator.derivative(X);
  private static final Operator SUM = Operator.sum(X);
  private static final Operator INTEGRAL = Operator.integral(X);
  private static final Operator DELTA = Operator.forwardDifference(X, one);

  private static String shown(Operator operator) {
    return unicode(new OperatorNotation(X).of(operator));
  }

  @Test
  void theOperatorsOfTheTradeAreWrittenAsThemselves() {
    assertEquals("D", operator(t));
    assertEquals("E", operator(SHIFT));
    assertEquals("E^h", operator(Elementary.exp(t.times(Form.variable("h")))));
    assertEquals("Δ", operator(SHIFT.minus(one)));
    assertEquals("∇", operator(one.minus(SHIFT.inverse())));
    assertEquals("δ", operator(HALF_SHIFT.minus(HALF_SHIFT.inverse())));
    assertEquals("μ", operator(HALF_SHIFT.plus(HALF_SHIFT.inverse()).times(Form.HALF)));
    assertEquals("X", operator(x));
    assertEquals("1", operator(one));
    assertEquals("∫", shown(INTEGRAL));
    assertEquals("Σ", shown(SUM));
  }

  @Test
  void powersOfDifferencesAreRecognised() {
    assertEquals("Δ^5", operator(SHIFT.minus(one).power(5)));
    assertEquals("δ^2", operator(SHIFT.minus(Form.TWO).plus(SHIFT.inverse())));
    assertEquals(
        "Δ[h]/h",
        operator(
            Elementary.exp(t.times(Form.variable("h"))).minus(one).dividedBy(Form.variable("h"))));
    assertEquals("E^2 - 5 E + 6", operator(SHIFT.minus(Form.TWO).times(SHIFT.minus(Form.of(3)))));
    assertEquals("D/Δ", operator(t.dividedBy(SHIFT.minus(one))));
    assertEquals("n D", operator(t.times(Spelt.n)));
    assertEquals("X/a^2", operator(x.dividedBy(Spelt.a.power(2))));
  }

  @Test
  void functionsOfOperatorsKeepTheirNames() {
    assertEquals("exp(D^2/2)", operator(Elementary.exp(t.power(2).times(Form.HALF))));
    assertEquals("ln(D + 1)", operator(Elementary.ln(t.plus(one))));
    assertEquals("exp(Δ)", operator(Elementary.exp(SHIFT.minus(one))));
    assertEquals("sin(D)", operator(Elementary.sin(t)));
    assertEquals("sqrt(D + 1)", operator(Elementary.sqrt(t.plus(one))));
  }

  @Test
  void multiplicationsStandOnTheLeft() {
    assertEquals("X E^-1", operator(x.times(SHIFT.inverse())));
    assertEquals("X^2 D^2 + X D", operator(x.power(2).times(t.power(2)).plus(x.times(t))));
    assertEquals("H(x) D", operator(Combinatorial.harmonic(x).times(t)));
    assertEquals("H(x) E^0", operator(Combinatorial.harmonic(x)));
    assertEquals(
        "X_k Δ_k", operator(Form.variable("k").times(Elementary.exp(Form.dual("k")).minus(one))));
  }

  @Test
  void whatIsReadOffAtZeroComesLast() {
    assertEquals("1 - ε(0)", shown(INTEGRAL.compose(D)));
    assertEquals("1 - ε(0)", shown(SUM.compose(DELTA)));
    assertEquals("Σ^2", shown(SUM.power(2)));
    assertEquals("X Σ", shown(Operator.multiplication(x).compose(SUM)));
    assertEquals("ε(3)", shown(Operator.evaluation(X, Form.of(3))));
    assertEquals("D/Δ", shown(D.compose(SUM)));
  }

  @Test
  void inversesModuloAKernelKeepTheirPower() {
    assertEquals("D^-1", shown(D.inverse()));
    assertEquals("D^-2", shown(D.power(2).inverse()));
    assertEquals("Δ^-1", shown(DELTA.inverse()));
    assertEquals("1/3 Δ^-3", shown(DELTA.power(3).inverse().times(Spelt.number(1, 3))));
  }

  @Test
  void inverseSeriesAreWrittenThroughTheirMap() {
    Form inverse = InverseSeries.of(t.times(SHIFT), new Dual(X), t);
    assertEquals("umbral(D E)^-1 D umbral(D E)", operator(inverse));
    Form value = InverseSeries.of(t.times(SHIFT), new Dual(X), Spelt.a);
    assertEquals("ε(0) umbral(D E)^-1 D umbral(D E) exp(a x)", Spelt.shown(value));
    Form running = InverseSeries.of(t.times(SHIFT), new Dual(X), x);
    assertEquals("(ε(0) umbral(D E)^-1 D umbral(D E) exp(a x) at a = x)", Spelt.shown(running));
  }
}
