package gnomon.evaluate;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.recurrence.GeneratingFunction;
import gnomon.recurrence.GuessedLaw;
import gnomon.recurrence.LinearEquation;
import gnomon.recurrence.SolutionClass;
import gnomon.summation.Condition;
import gnomon.syntax.Expression;
import gnomon.value.ListValue;
import gnomon.value.Status;
import gnomon.value.TableValue;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// `recurrence`: the operator that takes a sequence to 0, guessed from numbers or proved from a
/// generating function; `coefficient`: the closed form of the sequence of a generating function.
final class Laws {
  private final Evaluator evaluator;
  private final Evaluation evaluation;

  Laws(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
  }

  Value value(Expression.Recurrence recurrence, Scope scope) {
    Span span = recurrence.subject().span();
    Value subject = evaluator.value(recurrence.subject(), scope);
    return switch (subject) {
      case ListValue list when !recurrence.exponential() ->
          guessed(list.items(), BigInteger.ZERO, span, scope);
      case TableValue table when !recurrence.exponential() -> ofTable(table, span, scope);
      case Value other -> {
        Form function = Sorts.form(other, span, "what has a recurrence");
        yield Places.at(recurrence.span(), () -> proved(function, recurrence.exponential(), scope));
      }
    };
  }

  private Value ofTable(TableValue table, Span span, Scope scope) {
    List<Value> items = new ArrayList<>();
    Optional<BigInteger> first = Optional.empty();
    for (List<Value> row : table.rows()) {
      Optional<BigInteger> at = Sorts.form(row.getFirst(), span, "an argument").asInteger();
      boolean follows =
          at.isPresent()
              && row.size() == 2
              && (first.isEmpty()
                  || at.get().equals(first.get().add(BigInteger.valueOf(items.size()))));
      if (!follows) {
        throw Problems.of(
            "kind-law",
            "a law is guessed from a table of values at integers",
            span,
            "recurrence (2^n for n: 0..5)");
      }
      first = first.isEmpty() ? at : first;
      items.add(row.getLast());
    }
    return guessed(items, first.orElse(BigInteger.ZERO), span, scope);
  }

  private Value guessed(List<Value> items, BigInteger first, Span span, Scope scope) {
    List<Rational> numbers = new ArrayList<>();
    for (Value item : items) {
      numbers.add(
          Sorts.form(item, span, "a term")
              .asRational()
              .orElseThrow(
                  () -> Problems.of("kind-law", "a law is guessed from rational numbers", span)));
    }
    GuessedLaw law =
        Places.at(
            span,
            () ->
                GuessedLaw.of(numbers, first, scope.running())
                    .orElseThrow(() -> new Refusal(Reason.NO_LAW, Form.of(numbers.size()))));
    evaluation.status(
        Status.of(Status.Kind.GUESSED)
            .withDetail("from " + numbers.size() + " terms, " + law.spare() + " of them to spare"));
    return operator(law.law(), scope);
  }

  private Value proved(Form function, boolean exponential, Scope scope) {
    Variable x = scope.running();
    GeneratingFunction generating = new GeneratingFunction(function, x);
    LinearEquation differential = generating.differentialEquation();
    GeneratingFunction.Law law = exponential ? generating.exponential(x) : generating.ordinary(x);
    explain(differential, x);
    String what = exponential ? "n! times the coefficients" : "the coefficients";
    String range = law.from().signum() > 0 ? " for " + x.name() + " >= " + law.from() : "";
    evaluation.status(Status.of(Status.Kind.RECURRENCE).withDetail("of " + what + range));
    return operator(law.recurrence(), scope);
  }

  private void explain(LinearEquation differential, Variable x) {
    Form left = Form.ZERO;
    for (int j = 0; j <= differential.order(); j++) {
      Form derivative = Form.of(new Unknown("f", j, Form.of(x)));
      left = left.plus(differential.coefficients().get(j).times(derivative));
    }
    evaluation
        .grounds()
        .found(
            "the function solves", left, Form.ZERO, x, "checked by differentiating the function");
  }

  /// Σ_t c_t E^t in the running variable.
  private static Value operator(LinearEquation law, Scope scope) {
    Operator sum = Operator.zero();
    boolean negative = law.leading().numerator().leadingCoefficient().sign() < 0;
    for (int t = 0; t <= law.order(); t++) {
      Operator shift = Operator.shift(law.variable(), Form.of(t));
      Form c = law.coefficients().get(t);
      sum = sum.plus(shift.times(negative ? c.negated() : c));
    }
    return Sorts.of(sum);
  }

  /// coefficient(f, n): a number for a number n, else the closed form in n.
  Value coefficient(Value function, Value index, Span span, Scope scope) {
    Variable x = scope.running();
    Form f = Sorts.form(function, span, "the function");
    Form at = Sorts.form(index, span, "the index");
    GeneratingFunction generating = new GeneratingFunction(f, x);
    if (at.asRational().isPresent()) {
      int n =
          at.asInt()
              .filter(value -> value >= 0 && value < 100_000)
              .orElseThrow(() -> new Refusal(Reason.NOT_NATURAL, at));
      return Sorts.of(generating.coefficients(n + 1, false).get(n), scope);
    }
    if (at.dependsOn(x)) {
      throw Problems.of(
          "kind-index",
          "the index depends on " + x.name() + ", in whose powers the function is expanded",
          span,
          "coefficient(exp(x), n)");
    }
    Variable n = scope.fresh("n'");
    GeneratingFunction.ClosedForm closed =
        generating
            .closedForm(n, evaluation.sums())
            .orElseThrow(
                () -> new Refusal(Reason.SOLUTION_NOT_FOUND, SolutionClass.HYPERGEOMETRIC.words()));
    evaluation.met(Status.of(Status.Kind.CLOSED_FORM));
    at.asGenerator()
        .filter(Variable.class::isInstance)
        .map(Variable.class::cast)
        .ifPresent(whole -> evaluation.implies(Assumptions.NONE.withInteger(whole)));
    evaluation.require(
        List.of(new Condition(at.minus(Form.of(closed.from())), Condition.Relation.NATURAL)));
    return Sorts.of(closed.value().substitute(n, at), scope);
  }
}
