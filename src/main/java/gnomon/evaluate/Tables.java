package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.algebra.Halt;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.syntax.Clause;
import gnomon.syntax.Expression;
import gnomon.value.FormValue;
import gnomon.value.TableValue;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// Tables of values over a range of integers.
final class Tables {
  private static final int MOST_ROWS = 100_000;

  private final Evaluator evaluator;

  Tables(Evaluator evaluator) {
    this.evaluator = evaluator;
  }

  Value value(Expression subject, Clause.For clause, Scope scope) {
    Variable variable = new Variable(clause.range().variable().text());
    BigInteger first = limit(clause.range().lower(), scope);
    BigInteger last = limit(clause.range().upper(), scope);
    Span span = clause.range().span();
    if (last.subtract(first).compareTo(BigInteger.valueOf(MOST_ROWS)) > 0) {
      long rows = last.subtract(first).min(BigInteger.TWO.pow(62)).longValue();
      throw new LocatedHalt(new Halt(Halt.Cause.SIZE, rows), span);
    }
    Budget.charge(last.subtract(first).longValue());
    List<Value> values =
        new RangeValues(evaluator).values(variable.name(), first, last, subject, scope);
    List<List<Value>> rows = new ArrayList<>();
    BigInteger at = first;
    for (Value value : values) {
      rows.add(List.of(Sorts.of(Form.of(at), scope), value));
      at = at.add(BigInteger.ONE);
    }
    return new TableValue(header(variable, subject, scope), rows);
  }

  /// The variable and what is tabulated, where that has a value with the variable left free.
  private List<Value> header(Variable variable, Expression subject, Scope scope) {
    try {
      Value shown = evaluator.value(subject, scope.binding(variable.name(), variable));
      return shown instanceof FormValue
          ? List.of(FormValue.of(Form.of(variable), scope.running()), shown)
          : List.of();
    } catch (LocatedRefusal | gnomon.diagnostic.DiagnosedException needsNumbers) {
      return List.of();
    }
  }

  private BigInteger limit(Expression expression, Scope scope) {
    Value value = evaluator.value(expression, scope);
    return Sorts.form(value, expression.span(), "a limit")
        .asInteger()
        .orElseThrow(
            () ->
                Problems.of(
                    "domain-range", "the limits of a table are integers", expression.span()));
  }
}
