package gnomon.form;

import gnomon.number.Rational;
import java.util.List;
import java.util.function.Function;
import java.util.random.RandomGenerator;

/// Seeded random forms, given as functions of a point so that one recipe can be evaluated two ways:
/// built symbolically and then substituted into, or built from the numbers at once.
final class RandomForms {
  private final RandomGenerator random;
  private final Form algebraic;

  RandomForms(RandomGenerator random) {
    this.random = random;
    List<Form> choices =
        List.of(
            Form.I,
            Elementary.sqrt(Form.TWO),
            Elementary.sqrt(Form.ONE.plus(Form.variable("x"))),
            Elementary.power(Form.of(3), Form.of(Rational.of(1, 3))));
    algebraic = choices.get(random.nextInt(choices.size()));
  }

  /// What a recipe makes of a value of x.
  interface Recipe extends Function<Form, Form> {}

  Rational rational() {
    return Rational.of(random.nextInt(-6, 7), random.nextInt(1, 5));
  }

  /// A recipe without division by anything that depends on x but with every kernel of the room.
  Recipe recipe(int depth) {
    if (depth == 0) {
      return leaf();
    }
    Recipe a = recipe(depth - 1);
    Recipe b = recipe(depth - 1);
    return switch (random.nextInt(5)) {
      case 0 -> x -> a.apply(x).plus(b.apply(x));
      case 1 -> x -> a.apply(x).minus(b.apply(x));
      case 2, 3 -> x -> a.apply(x).times(b.apply(x));
      default -> {
        Form shift = Form.of(random.nextInt(1, 4));
        yield x -> a.apply(x.plus(shift));
      }
    };
  }

  private Recipe leaf() {
    Form c = Form.of(rational());
    int p = random.nextInt(1, 4);
    return switch (random.nextInt(12)) {
      case 0 -> x -> c;
      case 1, 2 -> x -> x;
      case 3 -> x -> Elementary.power(Form.of(p + 1), x);
      case 4 -> x -> Elementary.power(Form.of(-p), x);
      case 5 -> x -> Elementary.sin(Form.PI.times(x).times(Rational.of(1, p + 1)));
      case 6 -> x -> Elementary.power(Form.of(p).plus(Form.I), x);
      case 7 -> x -> Combinatorial.factorial(x.plus(Form.of(p)));
      case 8 -> x -> Combinatorial.binomial(x.plus(Form.of(p)), Form.of(p));
      case 9 -> x -> Combinatorial.harmonic(x.plus(Form.of(p)), p % 2 + 1);
      case 10 -> x -> Combinatorial.falling(x, Form.of(p - 2));
      default -> x -> Elementary.sqrt(Form.of(p + 1)).times(x).plus(c);
    };
  }

  /// A rational function of x, a parameter, 2^x and one algebraic kernel chosen for good.
  Form quotient() {
    Form top = polynomial();
    Form bottom = polynomial();
    return bottom.isZero() ? top : top.dividedBy(bottom);
  }

  private Form polynomial() {
    List<Form> atoms =
        List.of(
            Form.variable("x"),
            Form.variable("a"),
            Elementary.power(Form.TWO, Form.variable("x")),
            algebraic);
    Form sum = Form.of(rational());
    for (int i = 0; i < 2; i++) {
      Form term = Form.of(rational());
      for (int j = random.nextInt(1, 3); j > 0; j--) {
        term = term.times(atoms.get(random.nextInt(atoms.size())));
      }
      sum = sum.plus(term);
    }
    return sum;
  }
}
