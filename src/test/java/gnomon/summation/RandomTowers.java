package gnomon.summation;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/// Random functions of x of the classes that are summed in towers: hypergeometric terms and
/// polynomials in harmonic numbers.
record RandomTowers(Form x, RandomGenerator random) {

  private Form any(List<Form> choices) {
    return choices.get(random.nextInt(choices.size()));
  }

  private Form number() {
    int top = random.nextInt(1, 10);
    return Form.of(Rational.of(random.nextBoolean() ? top : -top, random.nextInt(1, 5)));
  }

  /// A rational function with denominators that do not vanish at positive integers.
  Form rational() {
    List<Form> terms = new ArrayList<>();
    for (int k = random.nextInt(3); k >= 0; k--) {
      terms.add(number().times(x.power(k)));
    }
    Form below =
        any(
            List.of(
                Form.ONE,
                Form.ONE,
                x,
                x.plus(Form.of(2)),
                x.times(Form.TWO).plus(Form.ONE),
                x.times(Form.of(3)).plus(Form.of(2)).power(2),
                x.power(2).plus(Form.ONE)));
    return Form.sum(terms).dividedBy(below);
  }

  /// A hypergeometric term.
  Form term() {
    Form y = x.plus(Form.of(random.nextInt(3)));
    return any(
        List.of(
            Elementary.power(Form.TWO, x),
            Elementary.power(Form.MINUS_ONE, x),
            Elementary.power(Form.of(Rational.of(-2, 3)), x),
            Elementary.power(Form.variable("b"), x),
            Combinatorial.factorial(y),
            Combinatorial.factorial(y).inverse(),
            Combinatorial.binomial(y, Form.variable("m")),
            Combinatorial.binomial(y.times(Form.TWO), y)
                .dividedBy(Elementary.power(Form.of(4), x))));
  }

  private Form harmonic() {
    return any(
        List.of(
            Combinatorial.harmonic(x),
            Combinatorial.harmonic(x),
            Combinatorial.harmonic(x.plus(Form.of(3))),
            Combinatorial.harmonic(x, 2),
            Combinatorial.harmonic(x.times(Form.TWO)),
            Combinatorial.harmonic(x.plus(Form.of(Rational.of(1, 3)))),
            Combinatorial.harmonic(x.plus(Form.variable("a")))));
  }

  /// A polynomial in at most two harmonic numbers.
  private Form tower() {
    Form first = harmonic();
    Form second = random.nextInt(3) == 0 ? harmonic() : Form.ONE;
    Form sum = rational().times(first.power(random.nextInt(1, 3))).times(second);
    return sum.plus(rational().times(first));
  }

  /// A random F; its difference is to be summed.
  Form antidifference() {
    return switch (random.nextInt(5)) {
      case 0 -> rational().plus(rational()).plus(rational());
      case 1 -> term().times(rational()).plus(rational());
      case 2 -> tower().plus(rational());
      case 3 -> term().times(tower());
      default -> term().times(tower()).plus(term().times(rational())).plus(tower());
    };
  }
}
