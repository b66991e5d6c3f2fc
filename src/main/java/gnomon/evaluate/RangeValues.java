package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.algebra.Refusal;
import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.summation.Condition;
import gnomon.syntax.Expression;
import gnomon.value.FormValue;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The values of an expression for each integer in a range. It is evaluated once with the variable
/// free where that gives a form without standing sums, else anew for each integer.
final class RangeValues {
  private final Evaluator evaluator;
  private final Evaluation evaluation;

  RangeValues(Evaluator evaluator) {
    this.evaluator = evaluator;
    this.evaluation = evaluator.evaluation();
  }

  List<Value> values(String name, BigInteger first, BigInteger last, Expression body, Scope scope) {
    Variable variable = scope.fresh(name);
    List<Condition> earlier = evaluation.conditions();
    evaluation.conditions(List.of());
    Optional<FormValue> free = free(name, variable, body, scope);
    boolean running = scope.running().name().equals(name);
    Optional<FormValue> symbolic = free.filter(value -> running || !hasStandingSums(value));
    StandingSums sums = new StandingSums(evaluation.sums());
    List<Condition> conditions = evaluation.conditions();
    evaluation.conditions(earlier);
    List<Value> values = new ArrayList<>();
    for (BigInteger k = first; k.compareTo(last) <= 0; k = k.add(BigInteger.ONE)) {
      Budget.checkpoint();
      boolean valid = !Validity.fails(conditions, Map.of(variable, Form.of(k)));
      Optional<Form> known = byRecurrence(free.filter(_ -> valid), sums, variable, k, last);
      values.add(
          known.isPresent()
              ? Sorts.of(known.get(), scope)
              : valueAt(name, variable, k, symbolic.filter(_ -> valid), body, scope));
    }
    evaluation.require(
        conditions.stream()
            .filter(c -> !Validity.concerns(c, Map.of(variable, Form.ZERO)))
            .toList());
    return values;
  }

  private Value valueAt(
      String name,
      Variable variable,
      BigInteger k,
      Optional<FormValue> symbolic,
      Expression body,
      Scope scope) {
    Form at = Form.of(k);
    if (symbolic.isPresent()) {
      try {
        Form value = symbolic.get().form().substitute(variable, at);
        return Sorts.of(Substitutions.addedUp(value), scope);
      } catch (Refusal pole) {
        if (scope.running().name().equals(name)) {
          throw pole(variable, k, body.span());
        }
      }
    }
    try {
      return evaluator.value(body, scope.with(name, new Binding.Held(Sorts.of(at, scope))));
    } catch (LocatedRefusal refused) {
      if (symbolic.isPresent()) {
        throw pole(variable, k, body.span());
      }
      throw refused;
    }
  }

  /// The value with the variable left free. Where it is the running variable there must be one, for
  /// operators act on it.
  private Optional<FormValue> free(String name, Variable variable, Expression body, Scope scope) {
    boolean running = scope.running().name().equals(name);
    try {
      return evaluator.value(body, scope.binding(name, variable)) instanceof FormValue value
          ? Optional.of(value)
          : Optional.empty();
    } catch (LocatedRefusal | DiagnosedException needsNumbers) {
      if (running) {
        throw needsNumbers;
      }
      return Optional.empty();
    }
  }

  private static boolean hasStandingSums(FormValue value) {
    return value.form().generators().stream().anyMatch(Accumulation.class::isInstance);
  }

  /// The value where a recurrence settles every standing sum in it.
  private static Optional<Form> byRecurrence(
      Optional<FormValue> value,
      StandingSums sums,
      Variable variable,
      BigInteger k,
      BigInteger last) {
    return value
        .filter(RangeValues::hasStandingSums)
        .map(form -> sums.at(form.form(), variable, k, last))
        .filter(form -> form.generators().stream().noneMatch(Accumulation.class::isInstance))
        .map(form -> form.substitute(variable, Form.of(k)));
  }

  static DiagnosedException pole(Variable variable, BigInteger k, Span span) {
    return new DiagnosedException(
        Diagnostic.of("domain-pole", "there is a pole inside the range", span)
            .withEvidence("It is undefined at " + variable.name() + " = " + k + "."));
  }
}
