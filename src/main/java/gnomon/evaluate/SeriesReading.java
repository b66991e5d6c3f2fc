package gnomon.evaluate;

import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.operator.Operator;
import gnomon.syntax.Expression;
import gnomon.syntax.Suffix;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.MapValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.List;

/// Reads what a series leaves out, such as O(x^7), O(x|_5), O(Delta^9) or O(umbral(Q) x^5), as the
/// series that is zero up to there.
final class SeriesReading {
  private final Evaluator evaluator;

  SeriesReading(Evaluator evaluator) {
    this.evaluator = evaluator;
  }

  Value orderTerm(Expression.OrderTerm term, Scope scope) {
    return switch (term.bound()) {
      case Expression.Suffixed(Expression atom, List<Suffix> suffixes, Span span)
          when suffixes.size() == 1 ->
          suffixed(atom, suffixes.getFirst(), span, scope);
      case Expression.Term image when image.factors().size() == 2 -> image(image, scope);
      case Expression other -> ofElement(evaluator.value(other, scope), 1, other.span());
    };
  }

  private Value suffixed(Expression atom, Suffix suffix, Span span, Scope scope) {
    return switch (suffix) {
      case Suffix.Falling(Expression index, Span _) ->
          zero(new Family.FallingPowers(base(atom, scope)), order(index, scope));
      case Suffix.Rising(Expression index, Span _) ->
          zero(new Family.RisingPowers(base(atom, scope)), order(index, scope));
      case Suffix.Raised(Expression exponent, Span _) ->
          ofElement(evaluator.value(atom, scope), order(exponent, scope), span);
      case Suffix.Prime _, Suffix.Factorial _ -> throw unreadable(span);
    };
  }

  /// O(U x^n) for a map U.
  private Value image(Expression.Term term, Scope scope) {
    Value map = evaluator.value(term.factors().getFirst().value(), scope);
    Value power = evaluator.value(term.factors().getLast().value(), scope);
    if (map instanceof MapValue(ShefferMap basis) && power instanceof FormValue value) {
      return zero(
          Expansions.family(Expansions.basis(basis)), exponent(value.form(), basis, term.span()));
    }
    throw unreadable(term.span());
  }

  private static int exponent(Form power, ShefferMap basis, Span span) {
    int n = Structure.degree(power, basis.variable()).orElseThrow(() -> unreadable(span));
    if (!power.equals(Form.of(basis.variable()).power(n))) {
      throw unreadable(span);
    }
    return n;
  }

  private Value ofElement(Value base, int order, Span span) {
    if (base instanceof FormValue form && form.form().isOne()) {
      throw unreadable(span);
    }
    if (base instanceof FormValue form) {
      return zero(new Family.Powers(form.form()), order);
    }
    Operator operator = Arithmetic.plain(base, span);
    return zero(new Family.OperatorPowers(operator), order);
  }

  private Form base(Expression atom, Scope scope) {
    return Sorts.form(evaluator.value(atom, scope), atom.span(), "the base");
  }

  private int order(Expression index, Scope scope) {
    return Sorts.form(evaluator.value(index, scope), index.span(), "the order")
        .asInt()
        .orElseThrow(() -> unreadable(index.span()));
  }

  private static Value zero(Family family, int order) {
    return new SeriesValue(family, 0, List.of(), order);
  }

  private static RuntimeException unreadable(Span span) {
    return Problems.of(
        "kind-order-term", "O( ) takes an element of a basis", span, "1 + x + O(x^7)");
  }
}
