package gnomon.render;

import gnomon.number.Rational;
import gnomon.syntax.Connective;
import gnomon.syntax.Expression;
import gnomon.syntax.Factor;
import gnomon.syntax.Suffix;

/// Reads trees of numbers only, by the rules of the language and without its evaluator: in a term
/// of numbers `/b` divides all that stands before it.
final class Arithmetic {
  private Arithmetic() {}

  static Rational value(Expression expression) {
    return switch (expression) {
      case Expression.Numeral number -> Rational.of(number.numerator(), number.denominator());
      case Expression.Parenthesis parenthesis -> value(parenthesis.single().orElseThrow());
      case Expression.Sign(Expression operand, _) -> value(operand).negated();
      case Expression.Sum sum -> {
        Rational total = Rational.ZERO;
        for (Expression.Summand summand : sum.summands()) {
          Rational value = value(summand.value());
          total = summand.subtracted() ? total.minus(value) : total.plus(value);
        }
        yield total;
      }
      case Expression.Term term -> {
        Rational product = Rational.ONE;
        for (Factor factor : term.factors()) {
          Rational value = value(factor.value());
          boolean divided = factor.connective() == Connective.DIVIDED;
          product = divided ? product.dividedBy(value) : product.times(value);
        }
        yield product;
      }
      case Expression.Suffixed suffixed -> {
        Rational value = value(suffixed.atom());
        for (Suffix suffix : suffixed.suffixes()) {
          value =
              switch (suffix) {
                case Suffix.Raised(Expression exponent, _) ->
                    value.power(value(exponent).intValueExact());
                case Suffix.Factorial _ -> factorial(value);
                case Suffix.Falling(Expression index, _) ->
                    falling(value, value(index).intValueExact());
                default -> throw new AssertionError(suffix);
              };
        }
        yield value;
      }
      default -> throw new AssertionError(expression);
    };
  }

  static Rational factorial(Rational value) {
    return falling(value, value.intValueExact());
  }

  static Rational falling(Rational value, int index) {
    Rational product = Rational.ONE;
    for (int j = 0; j < index; j++) {
      product = product.times(value.minus(Rational.of(j)));
    }
    return product;
  }
}
