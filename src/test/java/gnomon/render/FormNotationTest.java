package gnomon.render;

import static gnomon.render.Spelt.a;
import static gnomon.render.Spelt.factored;
import static gnomon.render.Spelt.k;
import static gnomon.render.Spelt.n;
import static gnomon.render.Spelt.number;
import static gnomon.render.Spelt.one;
import static gnomon.render.Spelt.shown;
import static gnomon.render.Spelt.x;
import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.form.Accumulation;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import org.junit.jupiter.api.Test;

/// How forms are written; the expected lines are common practice on paper, in the spelling of the
/// language.
class FormNotationTest {
  private static Form f(int derivatives, Form argument) {
    return Form.of(new Unknown("f", derivatives, argument));
  }

  @Test
  void polynomialsDescendWithTheirFractionsInFront() {
    assertEquals(
        "1/2 x^2 - 1/2 x + a",
        shown(x.power(2).times(Form.HALF).minus(x.times(Form.HALF)).plus(a)));
    assertEquals("1 - x^2", shown(one.minus(x.power(2))));
    assertEquals(
        "x^2 + C2 x + C1",
        shown(x.power(2).plus(Form.variable("C1")).plus(Form.variable("C2").times(x))));
    assertEquals("0", shown(Form.ZERO));
    assertEquals("-3/4", shown(number(-3, 4)));
  }

  @Test
  void factoredPolynomialsPullOutContentAndSigns() {
    Form squares = x.times(x.minus(one)).times(x.times(Form.TWO).minus(one)).times(number(1, 6));
    assertEquals("1/6 x (x - 1) (2 x - 1)", factored(squares));
    assertEquals("-1/6 x (x - 1) (2 x - 1)", factored(squares.negated()));
    assertEquals("1/4 x^2 (x + 1)^2", factored(x.power(2).plus(x).power(2).times(number(1, 4))));
    assertEquals(
        "(x - 1) (x + 1) 2^x",
        factored(Elementary.power(Form.TWO, x).times(x.power(2).minus(one))));
  }

  @Test
  void fractionsHaveFactoredDenominators() {
    assertEquals(
        "2 (x + 1)/(3 x (x - 1))",
        shown(x.plus(one).times(Form.TWO).dividedBy(x.power(2).minus(x).times(Form.of(3)))));
    assertEquals("1/((x + 1) (x + 2) (x + 3))", shown(Combinatorial.falling(x, Form.of(-3))));
    assertEquals("1/(n - k)", shown(one.dividedBy(n.minus(k))));
    assertEquals("-1/x", shown(x.inverse().negated()));
    assertEquals("1/(1 - x)", shown(one.dividedBy(one.minus(x))));
  }

  @Test
  void powersOfTheSameKindAreJoined() {
    assertEquals("4^x", shown(Elementary.power(Form.of(4), x)));
    assertEquals("(3/2)^x", shown(Elementary.power(number(3, 2), x)));
    assertEquals("2^(-x)", shown(Elementary.power(Form.TWO, x.negated())));
    assertEquals("6^(x/2)", shown(Elementary.power(Form.of(6), x.times(Form.HALF))));
    assertEquals("e^(2 x + 1)", shown(Elementary.exp(x.times(Form.TWO).plus(one))));
    assertEquals("x^(n - 1)", shown(Elementary.power(x, n.minus(one))));
    assertEquals("sqrt(6) x", shown(Elementary.sqrt(Form.of(6)).times(x)));
    assertEquals("2 * 3^x", shown(Elementary.power(Form.of(3), x).times(Form.TWO)));
  }

  @Test
  void conjugateExponentialsAreSinesAndCosines() {
    assertEquals("sin(x)", shown(Elementary.sin(x)));
    assertEquals("1/3 cos(2 x)", shown(Elementary.cos(x.times(Form.TWO)).times(number(1, 3))));
    assertEquals("tan(x)", shown(Elementary.tan(x)));
    assertEquals("-sin(x)", shown(Elementary.sin(x.negated())));
    assertEquals("1/2 - 1/2 cos(2 x)", shown(Elementary.sin(x).power(2)));
    Form turned = Elementary.power(one.plus(Form.I), x);
    Form back = Elementary.power(one.minus(Form.I), x);
    assertEquals("2^(x/2) sin(π x/4)", shown(turned.minus(back).dividedBy(Form.I.times(Form.TWO))));
    assertEquals(
        "(-1)^(x/2) (2 + i)^(-x) 5^x",
        shown(Elementary.power(one.plus(Form.I.times(Form.TWO)), x)));
    assertEquals("e^(i x)", shown(Elementary.exp(x.times(Form.I))));
    assertEquals("i sin(x)", shown(Elementary.sin(x).times(Form.I)));
  }

  @Test
  void quotientsOfFactorialsAreBinomialsAndFactorialPowers() {
    assertEquals("binom(n, k)", shown(Combinatorial.binomial(n, k)));
    assertEquals("binom(2 n, n)", shown(Combinatorial.binomial(n.times(Form.TWO), n)));
    assertEquals("binom(n + 1, k)", shown(Combinatorial.binomial(n.plus(one), k)));
    assertEquals("x↓n", shown(Combinatorial.falling(x, n)));
    assertEquals("x↑n", shown(Combinatorial.rising(x, n)));
    assertEquals("n!/k!", shown(Combinatorial.factorial(n).dividedBy(Combinatorial.factorial(k))));
  }

  @Test
  void kernelsComeAfterTheirCoefficients() {
    assertEquals(
        "(x^2 + 1) 2^x + x",
        shown(Elementary.power(Form.TWO, x).times(x.power(2).plus(one)).plus(x)));
    assertEquals("H(x + 1)", shown(Combinatorial.harmonic(x.plus(one))));
    assertEquals("H(x - 4)", shown(Combinatorial.harmonic(x.minus(Form.of(4)))));
    assertEquals("H(x) + 1/x", shown(Combinatorial.harmonic(x).plus(x.inverse())));
    assertEquals("x H(x, 2)", shown(Combinatorial.harmonic(x, 2).times(x)));
    assertEquals(
        "f'(x) + f(x + 1) - 2 f(x) + f(x - 1)",
        shown(
            f(0, x.plus(one))
                .minus(f(0, x).times(Form.TWO))
                .plus(f(0, x.minus(one)))
                .plus(f(1, x))));
    assertEquals("1/(2^x + 1)", shown(Elementary.power(Form.TWO, x).plus(one).inverse()));
  }

  @Test
  void factorsBesideAFactorialAreTakenIn() {
    Form factorial = Combinatorial.factorial(n);
    assertEquals("(n + 1)!", shown(factorial.times(n.plus(Form.ONE))));
    assertEquals("(n - 1)!", shown(factorial.dividedBy(n)));
    assertEquals("1/(n + 1)!", shown(factorial.times(n.plus(Form.ONE)).inverse()));
    assertEquals("(n + 3) n!", shown(factorial.times(n.plus(Form.of(3)))));
    Form next = n.plus(Form.ONE);
    Form after = k.plus(Form.ONE);
    assertEquals("binom(n + 1, k + 1)", shown(Combinatorial.binomial(next, after)));
    assertEquals("n binom(n, k)/k", shown(Combinatorial.binomial(n, k).times(n).dividedBy(k)));
    Form mirrored = Combinatorial.factorial(Form.of(3).minus(k));
    assertEquals("1/6 binom(3, k)", shown(mirrored.times(Combinatorial.factorial(k)).inverse()));
  }

  @Test
  void standingSumsReachOverTheirTerm() {
    Form sum =
        Accumulation.of(
            Accumulation.Kind.SUM,
            new Variable("k"),
            Form.ZERO,
            n,
            Combinatorial.binomial(n, k).power(2));
    assertEquals("2 Σ(k: 0..n) binom(n, k)^2 + 1", shown(sum.times(Form.TWO).plus(one)));
    assertEquals("n (Σ(k: 0..n) binom(n, k)^2)^2", shown(sum.power(2).times(n)));
  }

  @Test
  void theThreeSpellingsSayTheSame() {
    Notation notation =
        FormNotation.in(Spelt.X)
            .of(Combinatorial.falling(x, n).times(Form.PI).dividedBy(n.plus(one)));
    assertEquals("π x↓n/(n + 1)", Spelt.unicode(notation));
    assertEquals("pi x|_n/(n + 1)", Spelt.ascii(notation));
    assertEquals("\\frac{\\pi x^{\\underline{n}}}{n + 1}", Spelt.latex(notation));
  }

  @Test
  void latexSetsSumsPowersAndBinomials() {
    Form sum =
        Accumulation.of(
            Accumulation.Kind.SUM,
            new Variable("k"),
            Form.ZERO,
            n,
            Combinatorial.binomial(n, k).times(k.plus(one)));
    assertEquals(
        "\\sum_{k=0}^{n} \\left(k + 1\\right) \\binom{n}{k}",
        Spelt.latex(FormNotation.in(Spelt.X).of(sum)));
    assertEquals(
        "\\left(H_{x}^{(2)}\\right)^{2}",
        Spelt.latex(FormNotation.in(Spelt.X).of(Combinatorial.harmonic(x, 2).power(2))));
  }
}
