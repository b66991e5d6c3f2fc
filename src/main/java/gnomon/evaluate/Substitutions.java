package gnomon.evaluate;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Moment;
import gnomon.form.Variable;
import gnomon.operator.Moments;
import gnomon.operator.Operator;
import gnomon.syntax.Clause;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.ListValue;
import gnomon.value.SeriesValue;
import gnomon.value.TableValue;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/// `… at x = a`: values put in for variables, all at once. Standing sums whose limits become
/// numbers are added up.
final class Substitutions {
  private static final int ADDED_UP = 10_000;

  private final Evaluator evaluator;

  Substitutions(Evaluator evaluator) {
    this.evaluator = evaluator;
  }

  Value value(Value subject, Clause.At clause, Scope scope) {
    return put(subject, images(clause, scope), clause.span(), scope);
  }

  /// The scope in which the variables have their values.
  Scope holding(Clause.At clause, Scope scope) {
    Scope inside = scope;
    for (Map.Entry<Generator, Form> image : images(clause, scope).entrySet()) {
      Binding held = new Binding.Held(Sorts.of(image.getValue(), scope));
      inside = inside.with(image.getKey().key(), held);
    }
    return inside;
  }

  /// The scope for what stands before the clauses, in which the variables that get values there are
  /// free, whatever they stand for outside.
  Scope free(List<Clause> clauses, Scope scope) {
    Scope inside = scope;
    for (Clause clause : clauses) {
      if (clause instanceof Clause.At values) {
        for (Clause.Substitution substitution : values.substitutions()) {
          String name = substitution.variable().text();
          if (inside.binding(name).orElse(null) instanceof Binding.Held) {
            inside = inside.without(name);
          }
        }
      }
    }
    return inside;
  }

  /// What is put in for which variable.
  Map<Generator, Form> images(Clause.At clause, Scope scope) {
    Map<Generator, Form> images = new HashMap<>();
    for (Clause.Substitution substitution : clause.substitutions()) {
      Variable variable = new Variable(substitution.variable().text());
      Value image = evaluator.value(substitution.value(), scope);
      images.put(variable, Sorts.form(image, substitution.value().span(), "what is put in"));
    }
    return images;
  }

  private StandingSums sums() {
    return new StandingSums(evaluator.evaluation().sums());
  }

  private Value put(Value subject, Map<Generator, Form> images, Span span, Scope scope) {
    return switch (subject) {
      case FormValue form -> Sorts.of(addedUp(sums().at(form.form(), images)), scope);
      case ListValue list ->
          new ListValue(list.items().stream().map(item -> put(item, images, span, scope)).toList());
      case TableValue table ->
          new TableValue(
              List.of(),
              table.rows().stream()
                  .map(row -> row.stream().map(v -> put(v, images, span, scope)).toList())
                  .toList());
      case SeriesValue series -> series(series, images, span);
      case Value other -> operator(other, images, span);
    };
  }

  /// Parameters in the coefficients, but not the variable in which the series proceeds.
  private static Value series(SeriesValue series, Map<Generator, Form> images, Span span) {
    Set<Variable> proceeding = variables(series.family());
    boolean put = proceeding.stream().anyMatch(images::containsKey);
    if (put
        || images.values().stream()
            .anyMatch(image -> !Collections.disjoint(image.variables(), proceeding))) {
      throw Problems.of(
          "kind-at",
          "a series has no value at a point, only before it is cut off",
          span,
          "exp(a x) at a = 2 to 6");
    }
    return new SeriesValue(
        series.family(),
        series.first(),
        series.coefficients().stream().map(c -> c.substitute(images)).toList(),
        series.order());
  }

  private static Set<Variable> variables(Family family) {
    return switch (family) {
      case Family.Powers(Form base) -> base.variables();
      case Family.FallingPowers(Form base) -> base.variables();
      case Family.RisingPowers(Form base) -> base.variables();
      case Family.Images(ShefferMap map) -> Set.of(map.variable());
      case Family.OperatorPowers(Operator of) -> of.variables();
    };
  }

  /// Parameters of an operator, such as a step, but not the variable it acts on.
  private static Value operator(Value subject, Map<Generator, Form> images, Span span) {
    Operator operator =
        Sorts.asOperator(subject)
            .flatMap(MappedOperator::asOperator)
            .filter(Operator::isPlain)
            .filter(plain -> plain.variables().stream().noneMatch(images::containsKey))
            .orElseThrow(
                () ->
                    Problems.of(
                        "kind-at",
                        "nothing can be put into " + Sorts.article(subject) + " here",
                        span));
    return Sorts.of(Operator.ofSymbol(operator.symbol().substitute(images)));
  }

  /// The form with its sums and products between numbers worked out.
  static Form addedUp(Form form) {
    boolean standing =
        form.generators().stream().anyMatch(g -> g instanceof Accumulation || g instanceof Moment);
    return standing ? form.mapGenerators(Substitutions::addedUp) : form;
  }

  private static Form addedUp(Generator generator) {
    if (generator instanceof Moment moment) {
      return Moments.value(moment.body(), moment.letters());
    }
    if (generator instanceof Accumulation standing
        && standing.kind() != Accumulation.Kind.INTEGRAL
        && standing.lower().asInteger().isPresent()
        && standing.upper().asInteger().isPresent()) {
      BigInteger first = standing.lower().asInteger().get();
      BigInteger last = standing.upper().asInteger().get();
      if (last.compareTo(first.subtract(BigInteger.ONE)) < 0) {
        throw new Refusal(Reason.RANGE_REVERSED, Form.of(first), Form.of(last));
      }
      if (last.subtract(first).compareTo(BigInteger.valueOf(ADDED_UP)) <= 0) {
        return addedUp(standing, first, last);
      }
    }
    return Form.of(generator);
  }

  private static Form addedUp(Accumulation standing, BigInteger first, BigInteger last) {
    boolean adding = standing.kind() == Accumulation.Kind.SUM;
    Form total = adding ? Form.ZERO : Form.ONE;
    for (BigInteger k = first; k.compareTo(last) <= 0; k = k.add(BigInteger.ONE)) {
      Form term = addedUp(standing.body().substitute(standing.bound(), Form.of(k)));
      total = adding ? total.plus(term) : total.times(term);
    }
    return total;
  }
}
