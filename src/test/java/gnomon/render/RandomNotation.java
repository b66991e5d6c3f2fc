package gnomon.render;

import gnomon.number.Rational;
import java.util.List;
import java.util.random.RandomGenerator;

/// Random notation of numbers, with what it is worth.
record RandomNotation(Notation notation, Rational value) {

  static RandomNotation of(RandomGenerator random, int depth) {
    if (depth == 0) {
      int number = random.nextInt(1, 5);
      return new RandomNotation(Notation.of(number), Rational.of(number));
    }
    RandomNotation first = of(random, random.nextInt(depth));
    RandomNotation second = of(random, random.nextInt(depth));
    return switch (random.nextInt(8)) {
      case 0 ->
          new RandomNotation(
              new Notation.Sum(List.of(first.notation, second.notation)),
              first.value.plus(second.value));
      case 1 ->
          new RandomNotation(
              new Notation.Sum(List.of(first.notation, new Notation.Minus(second.notation))),
              first.value.minus(second.value));
      case 2 ->
          new RandomNotation(
              new Notation.Row(List.of(first.notation, second.notation)),
              first.value.times(second.value));
      case 3 ->
          second.value.isZero()
              ? first
              : new RandomNotation(
                  new Notation.Quotient(first.notation, second.notation),
                  first.value.dividedBy(second.value));
      case 4 -> new RandomNotation(new Notation.Minus(first.notation), first.value.negated());
      case 5 -> power(random, first);
      case 6 ->
          new RandomNotation(
              new Notation.FactorialPower(first.notation, Notation.of(2), true),
              Arithmetic.falling(first.value, 2));
      default ->
          first.value.isInteger()
                  && first.value.sign() >= 0
                  && first.value.compareTo(Rational.of(6)) < 0
              ? new RandomNotation(
                  new Notation.Factorial(first.notation), Arithmetic.factorial(first.value))
              : first;
    };
  }

  private static RandomNotation power(RandomGenerator random, RandomNotation base) {
    int exponent = random.nextInt(base.value.isZero() ? 0 : -2, 3);
    return new RandomNotation(
        new Notation.Power(base.notation, Notation.of(exponent)), base.value.power(exponent));
  }
}
