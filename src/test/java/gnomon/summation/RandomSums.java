package gnomon.summation;

import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/// Random functions of the classes that are summed, in the variable x.
record RandomSums(Form x, RandomGenerator random) {

  Form step() {
    return any(List.of(Form.ONE, Form.MINUS_ONE, Form.TWO, Form.HALF, Form.variable("h")));
  }

  private Form any(List<Form> choices) {
    return choices.get(random.nextInt(choices.size()));
  }

  private Form number() {
    return Form.of(Rational.of(random.nextInt(-9, 10), random.nextInt(1, 6)));
  }

  private Form polynomial() {
    List<Form> terms = new ArrayList<>();
    for (int k = random.nextInt(5); k >= 0; k--) {
      terms.add(number().times(x.power(k)));
    }
    return Form.sum(terms);
  }

  private Form exponential() {
    return any(
        List.of(
            Elementary.power(Form.TWO, x),
            Elementary.power(Form.of(Rational.of(3, 2)), x),
            Elementary.sin(x),
            Elementary.cos(x.times(Form.of(3))),
            Elementary.exp(x.times(Form.variable("a"))),
            Elementary.power(Form.variable("b"), x)));
  }

  private Form fraction() {
    Form base =
        any(
            List.of(
                x,
                x.plus(Form.ONE),
                x.minus(Form.of(4)),
                x.times(Form.TWO).plus(Form.ONE),
                x.power(2).plus(Form.ONE),
                x.power(2).plus(x).plus(Form.of(3)),
                x.plus(Form.variable("a"))));
    return number().times(x).plus(number()).dividedBy(base.power(random.nextInt(1, 3)));
  }

  /// A random F; its difference is to be summed.
  Form antidifference() {
    return switch (random.nextInt(4)) {
      case 0 -> polynomial();
      case 1 -> exponential().times(polynomial()).plus(polynomial());
      case 2 -> fraction().plus(fraction()).plus(polynomial());
      default -> fraction().plus(exponential().times(polynomial())).plus(polynomial());
    };
  }
}
