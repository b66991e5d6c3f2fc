package gnomon.evaluate;

import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.syntax.Condition.Relation;
import gnomon.syntax.Expression;
import gnomon.syntax.Range;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/// Sums, integrals and products over a range: reads the limits and hands on to the class for each.
final class Binders {
  private final Evaluator evaluator;
  private final Evaluation evaluation;
  private final RangeSums sums;
  private final DefiniteIntegrals integrals;

  Binders(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.sums = new RangeSums(evaluator, evaluation);
    this.integrals = new DefiniteIntegrals(evaluation);
    this.evaluation = evaluation;
  }

  /// A range with its limits evaluated; without upper limit it is infinite.
  record Limits(String name, Variable variable, Form lower, Optional<Form> upper, Span span) {

    /// The scope in which what is summed stands.
    Scope inside(Scope scope) {
      return scope.binding(name, variable);
    }

    Optional<BigInteger> first() {
      return lower.asInteger();
    }

    Optional<BigInteger> last() {
      return upper.flatMap(Form::asInteger);
    }

    List<Form> all() {
      return upper.map(last -> List.of(lower, last)).orElse(List.of(lower));
    }

    boolean isNumeric() {
      return first().isPresent() && last().isPresent();
    }
  }

  Value value(Expression.Binder binder, Scope scope) {
    Limits limits = limits(binder.range(), scope);
    return switch (binder.binding()) {
      case SUM -> {
        requireIntegers(limits);
        yield sums.value(limits, binder.body(), true, scope);
      }
      case PRODUCT -> {
        requireIntegers(limits);
        yield sums.value(limits, binder.body(), false, scope);
      }
      case INTEGRAL -> {
        Value body = evaluator.value(binder.body(), limits.inside(scope));
        Form form = Sorts.form(body, binder.body().span(), "what is integrated");
        yield Places.at(binder.span(), () -> Sorts.of(integrals.value(limits, form, scope), scope));
      }
    };
  }

  private Limits limits(Range range, Scope scope) {
    Form lower = limit(range.lower(), scope);
    Optional<Form> upper =
        isInfinity(range.upper(), scope)
            ? Optional.empty()
            : Optional.of(limit(range.upper(), scope));
    String name = range.variable().text();
    Variable variable = scope.fresh(name);
    if (lower.dependsOn(variable) || upper.filter(u -> u.dependsOn(variable)).isPresent()) {
      throw Problems.of(
          "kind-range", "a limit contains the bound variable " + variable.name(), range.span());
    }
    return new Limits(name, variable, lower, upper, range.span());
  }

  static boolean isInfinity(Expression expression, Scope scope) {
    return expression instanceof Expression.Name name
        && name.text().equals("inf")
        && scope.binding("inf").isEmpty();
  }

  private Form limit(Expression expression, Scope scope) {
    if (isInfinity(expression, scope)
        || expression instanceof Expression.Sign(Expression operand, Span _)
            && isInfinity(operand, scope)) {
      throw Problems.of(
          "kind-infinity", "only an upper limit may be infinite here", expression.span());
    }
    Value value = evaluator.value(expression, scope);
    return Sorts.form(value, expression.span(), "a limit");
  }

  /// Limits of sums that are numbers must be integers; symbolic ones are taken to be.
  private void requireIntegers(Limits limits) {
    for (Form limit : limits.all()) {
      if (limit.isConstant() && limit.asInteger().isEmpty()) {
        throw Problems.of("domain-range", "the limits of a range are integers", limits.span());
      }
    }
    limits.upper().ifPresent(upper -> imply(limits.lower(), upper));
  }

  private void imply(Form lower, Form upper) {
    Assumptions implied = Assumptions.NONE;
    for (Form limit : List.of(lower, upper)) {
      for (Variable variable : limit.variables()) {
        implied = implied.withInteger(variable);
      }
    }
    if (!upper.isConstant() || !lower.isConstant()) {
      implied =
          implied.with(new Assumptions.Comparison(upper, Relation.AT_LEAST, lower.minus(Form.ONE)));
    }
    evaluation.implies(implied);
  }
}
