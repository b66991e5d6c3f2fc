package gnomon.operator;

import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/// Seeded random functions and operators in the variable x.
final class RandomOperators {

  static final Variable X = new Variable("x");
  static final Form FX = Form.of(X);

  private final RandomGenerator random;

  RandomOperators(RandomGenerator random) {
    this.random = random;
  }

  Rational rational() {
    return Rational.of(random.nextInt(-4, 5), random.nextInt(1, 4));
  }

  private Rational nonzero() {
    Rational value = rational();
    return value.isZero() ? Rational.HALF : value;
  }

  Form polynomial(int degree) {
    List<Form> terms = new ArrayList<>();
    for (int j = 0; j <= degree; j++) {
      terms.add(FX.power(j).times(rational()));
    }
    return Form.sum(terms);
  }

  /// Polynomial, or with one more exponential part.
  Form exponentialPolynomial() {
    Form f = polynomial(random.nextInt(4));
    return switch (random.nextInt(5)) {
      case 0 -> f.plus(Elementary.power(Form.TWO, FX).times(polynomial(random.nextInt(3))));
      case 1 -> f.times(Elementary.exp(FX.times(nonzero())));
      case 2 -> f.plus(Elementary.exp(FX.times(Form.variable("a"))));
      case 3 -> f.plus(Elementary.cos(FX).times(polynomial(random.nextInt(2))));
      default -> f;
    };
  }

  private Operator scalarOrFunction() {
    return switch (random.nextInt(4)) {
      case 0 -> Operator.multiplication(Form.of(nonzero()));
      case 1 -> Operator.multiplication(FX);
      case 2 -> Operator.multiplication(polynomial(2));
      default -> Operator.multiplication(Elementary.exp(FX.times(Form.of(random.nextInt(1, 3)))));
    };
  }

  Operator simple() {
    return switch (random.nextInt(11)) {
      case 0, 1 -> Operator.derivative(X);
      case 2 -> Operator.shift(X, Form.of(nonzero()));
      case 3 -> Operator.forwardDifference(X, Form.ONE);
      case 4 -> Operator.centralMean(X, Form.ONE);
      case 5 -> Operator.integral(X);
      case 6 -> Operator.sum(X);
      case 7 -> Operator.evaluation(X, Form.of(random.nextInt(0, 3)));
      case 8 -> Operator.derivative(X).dividedBy(Operator.forwardDifference(X, Form.ONE));
      default -> scalarOrFunction();
    };
  }

  /// A sum or product of operators of the trade.
  Operator operator(int depth) {
    if (depth == 0) {
      return simple();
    }
    Operator left = operator(depth - 1);
    Operator right = operator(random.nextInt(depth));
    return random.nextInt(3) == 0 ? left.plus(right) : left.compose(right);
  }
}
