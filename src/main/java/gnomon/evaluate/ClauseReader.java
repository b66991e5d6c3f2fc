package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.basis.Basis;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.series.Expansion;
import gnomon.summation.Condition;
import gnomon.syntax.Clause;
import gnomon.syntax.Expression;
import gnomon.syntax.Presentation;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.FormulaValue;
import gnomon.value.ListValue;
import gnomon.value.SeriesValue;
import gnomon.value.Shape;
import gnomon.value.Status;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// What the clauses after an expression make of its value, from left to right. `in Q` followed by
/// `to N` is one expansion to an order.
final class ClauseReader {
  private final Evaluator evaluator;
  private final Evaluation evaluation;
  private final Tables tables;
  private final Substitutions substitutions;

  ClauseReader(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
    this.tables = new Tables(evaluator);
    this.substitutions = new Substitutions(evaluator);
  }

  Value value(Expression.Clauses clausal, Scope scope) {
    List<Clause> clauses = clausal.clauses();
    if (clauses.getLast() instanceof Clause.For table) {
      return tables.value(before(clausal), table, scope);
    }
    List<Condition> earlier = evaluation.conditions();
    Scope inside = substitutions.free(clauses, scope);
    Value value;
    int at = 0;
    try {
      value = evaluator.value(clausal.subject(), inside);
    } catch (LocatedRefusal refused) {
      Optional<Value> point = atPoint(refused, clausal, scope);
      if (point.isPresent() && clauses.size() == 1) {
        return point.get();
      }
      if (refused.refusal().reason() != Reason.INFINITE_SERIES
          || !(clauses.getFirst() instanceof Clause.To(Expression order, Span _))) {
        throw refused;
      }
      value =
          evaluation.truncating(
              evaluator.whole(order, scope), () -> evaluator.value(clausal.subject(), inside));
      at = 1;
    }
    while (at < clauses.size()) {
      Clause clause = clauses.get(at);
      if (clause instanceof Clause.At values
          && (Validity.fails(evaluation.conditions(), substitutions.images(values, scope))
              || Validity.isSingular(value, substitutions.images(values, scope)))) {
        evaluation.conditions(earlier);
        value = anew(upTo(clausal, at), values, scope);
        at++;
        continue;
      }
      if (clause instanceof Clause.At values && values.substitutions().size() > 1) {
        value = putIn(value, values, upTo(clausal, at), clausal.subject().span(), scope);
        settle(earlier, values, scope);
        at++;
        continue;
      }
      Value before = value;
      Optional<Clause.To> order =
          at + 1 < clauses.size() && clauses.get(at + 1) instanceof Clause.To to
              ? Optional.of(to)
              : Optional.empty();
      boolean joined = order.isPresent() && expands(clause);
      Span span = clausal.subject().span().to(clause.span());
      value =
          Places.at(
              span,
              () ->
                  joined
                      ? expandedTo(before, clause, order.get(), scope)
                      : applied(before, clause, scope));
      if (clause instanceof Clause.At values) {
        settle(earlier, values, scope);
      }
      at += joined ? 2 : 1;
    }
    return value;
  }

  /// The value where all but the running variable, on which operators act, are held first, and it
  /// gets its own value where the conditions that are left allow that.
  private Optional<Value> runningLast(Expression subject, Clause.At clause, Scope scope) {
    String running = scope.running().name();
    List<Clause.Substitution> last =
        clause.substitutions().stream().filter(s -> s.variable().text().equals(running)).toList();
    if (last.isEmpty() || last.size() == clause.substitutions().size()) {
      return Optional.empty();
    }
    List<Clause.Substitution> first = new ArrayList<>(clause.substitutions());
    first.removeAll(last);
    Clause.At then = new Clause.At(last, clause.span());
    List<Condition> earlier = evaluation.conditions();
    Scope inside = substitutions.holding(new Clause.At(first, clause.span()), scope);
    Value value = evaluator.value(subject, inside);
    Map<Generator, Form> images = substitutions.images(then, scope);
    if (Validity.fails(evaluation.conditions(), images) || Validity.isSingular(value, images)) {
      evaluation.conditions(earlier);
      return Optional.empty();
    }
    Value put = Places.at(clause.span(), () -> applied(value, then, scope));
    settle(earlier, then, scope);
    return Optional.of(put);
  }

  /// The expression with the variables held at their values. A name in it may have kept one of
  /// them, and then there is no value.
  private Value anew(Expression subject, Clause.At clause, Scope scope) {
    Optional<Value> running = runningLast(subject, clause, scope);
    if (running.isPresent()) {
      return running.get();
    }
    Value value = evaluator.value(subject, substitutions.holding(clause, scope));
    Map<Generator, Form> images = substitutions.images(clause, scope);
    boolean kept =
        value instanceof FormValue form
            && form.form().variables().stream()
                .filter(images::containsKey)
                .anyMatch(v -> images.values().stream().noneMatch(image -> image.dependsOn(v)));
    if (kept) {
      throw Problems.of(
          "kind-at",
          "the value of a name here has no limit at these values",
          clause.span(),
          "the expression itself in place of its name");
    }
    return value;
  }

  /// Puts the values also into the side conditions met since; those that become numbers hold.
  private void settle(List<Condition> earlier, Clause.At values, Scope scope) {
    Map<Generator, Form> images = substitutions.images(values, scope);
    List<Condition> since =
        evaluation.conditions().stream()
            .filter(condition -> !earlier.contains(condition))
            .map(met -> new Condition(met.subject().substitute(images), met.relation()))
            .filter(met -> !met.subject().isConstant())
            .toList();
    evaluation.conditions(earlier);
    evaluation.require(since);
  }

  /// The value of an equation without a formula for its solution, where its variable is a number.
  private Optional<Value> atPoint(LocatedRefusal refused, Expression.Clauses clausal, Scope scope) {
    return Solving.isWithoutFormula(refused)
            && clausal.clauses().getFirst() instanceof Clause.At values
        ? Optional.of(evaluator.value(clausal.subject(), substitutions.holding(values, scope)))
        : Optional.empty();
  }

  /// Several values put in at once. Where the form has no limit there, as binom(n, k) at n = −2, k
  /// = 3, the expression may still have its meaning for numbers, in which it is evaluated anew.
  private Value putIn(Value value, Clause.At clause, Expression subject, Span start, Scope scope) {
    try {
      return Places.at(start.to(clause.span()), () -> applied(value, clause, scope));
    } catch (LocatedRefusal refused) {
      if (refused.refusal().reason() != Reason.LIMIT_UNDECIDED) {
        throw refused;
      }
      try {
        return anew(subject, clause, scope);
      } catch (LocatedRefusal _) {
        throw refused;
      }
    }
  }

  /// The expression without its last clause.
  private static Expression before(Expression.Clauses clausal) {
    return upTo(clausal, clausal.clauses().size() - 1);
  }

  /// The expression with its first clauses only.
  private static Expression upTo(Expression.Clauses clausal, int count) {
    List<Clause> rest = clausal.clauses().subList(0, count);
    return rest.isEmpty()
        ? clausal.subject()
        : new Expression.Clauses(
            clausal.subject(), rest, clausal.subject().span().to(rest.getLast().span()));
  }

  private static boolean expands(Clause clause) {
    return clause instanceof Clause.InBasis
        || clause instanceof Clause.InPresentation(Presentation presentation, Span _)
            && (presentation == Presentation.FALLING || presentation == Presentation.RISING);
  }

  private Value applied(Value value, Clause clause, Scope scope) {
    return switch (clause) {
      case Clause.InPresentation(Presentation presentation, Span span) ->
          presented(value, presentation, span, scope);
      case Clause.InBasis(Expression basis, Span span) ->
          inBasis(value, evaluator.value(basis, scope), span, scope);
      case Clause.To(Expression order, Span span) ->
          series(value, evaluator.whole(order, scope), span, scope);
      case Clause.Digits(Expression count, Span span) ->
          Digits.of(value, evaluator.whole(count, scope), span);
      case Clause.At at -> {
        evaluation.status(Status.NONE);
        yield substitutions.value(value, at, scope);
      }
      case Clause.For table -> throw Problems.of("kind-table", "for stands last", table.span());
    };
  }

  // ---------------------------------------------------------------- presentations

  private Value presented(Value value, Presentation presentation, Span span, Scope scope) {
    if (presentation == Presentation.TEX) {
      return new FormulaValue(evaluation.writing().tex(value, scope.running()));
    }
    if (value instanceof ListValue list) {
      return new ListValue(
          list.items().stream().map(item -> presented(item, presentation, span, scope)).toList());
    }
    Form form = Sorts.form(value, span, "this");
    Variable x = scope.running();
    FormValue plain = Sorts.of(form, scope);
    return switch (presentation) {
      case FALLING -> expansion(form, new Basis.FallingPowers(x), scope);
      case RISING -> expansion(form, new Basis.RisingPowers(x), scope);
      case BINOMIALS -> expansion(form, new Basis.Binomials(x), scope);
      case FACTORS -> plain.withShape(new Shape.Factored());
      case EXPANDED -> plain.withShape(new Shape.Expanded());
      case PARTIAL_FRACTIONS -> {
        if (!Structure.isRationalIn(form, x)) {
          throw Problems.of(
              "domain-not-rational", "this is not a rational function of " + x.name(), span);
        }
        yield plain.withShape(new Shape.PartialFractions(x));
      }
      case TEX -> value;
    };
  }

  private FormValue expansion(Form form, Basis basis, Scope scope) {
    FormValue value = Expansions.polynomial(form, basis, evaluation.sums(), scope);
    evaluation.grounds().expansion(value, basis);
    return value;
  }

  // ---------------------------------------------------------------- expansions

  private Value inBasis(Value value, Value basis, Span span, Scope scope) {
    if (value instanceof FormValue form) {
      return expansion(form.form(), Expansions.basis(basis, span, scope), scope);
    }
    Operator a = Arithmetic.plain(value, span);
    Operator q = Arithmetic.plain(basis, span);
    return finite(a, q, variableOf(q, scope), span);
  }

  /// A in powers of Q where that is a polynomial: found to an order and checked by composing back.
  private static Value finite(Operator a, Operator q, Variable x, Span span) {
    int order = 8;
    while (order <= 64) {
      SeriesValue series = Expansions.ofOperator(a, q, x, order);
      Operator sum = Operator.zero();
      for (int k = Math.min(0, series.first()); k < series.order(); k++) {
        Form c = series.coefficient(k);
        if (!c.isZero()) {
          sum = sum.plus(q.power(k).times(c));
        }
      }
      if (sum.equals(a)) {
        return new SeriesValue(
            series.family(), series.first(), series.coefficients(), SeriesValue.EXACT);
      }
      order *= 4;
    }
    throw Problems.of(
        "domain-infinite-expansion",
        "this expansion is an infinite series",
        span,
        "D in Delta to 6");
  }

  private Value expandedTo(Value value, Clause clause, Clause.To to, Scope scope) {
    int order = evaluator.whole(to.order(), scope);
    Variable x = scope.running();
    return switch (clause) {
      case Clause.InBasis(Expression expression, Span span) -> {
        Value basis = evaluator.value(expression, scope);
        if (value instanceof FormValue form) {
          yield Expansions.series(
              form.form(), Expansions.basis(basis, span, scope), order, evaluation.sums());
        }
        Operator q = Arithmetic.plain(basis, span);
        yield Expansions.ofOperator(Arithmetic.plain(value, span), q, variableOf(q, scope), order);
      }
      case Clause.InPresentation(Presentation presentation, Span span) -> {
        Basis basis =
            presentation == Presentation.FALLING
                ? new Basis.FallingPowers(x)
                : new Basis.RisingPowers(x);
        yield Expansions.series(Sorts.form(value, span, "this"), basis, order, evaluation.sums());
      }
      case Clause other -> throw new IllegalArgumentException(other.toString());
    };
  }

  private static Variable variableOf(Operator operator, Scope scope) {
    return operator.variables().stream().findFirst().orElse(scope.running());
  }

  /// `… to N`: a function in powers of the running variable, an operator in powers of D.
  private Value series(Value value, int order, Span span, Scope scope) {
    Variable x = scope.running();
    Budget.charge(order);
    return switch (value) {
      case FormValue form ->
          SeriesArithmetic.ofPowerSeries(
              new Family.Powers(Form.of(x)), Expansion.of(form.form(), x, order));
      case SeriesValue series ->
          new SeriesValue(
              series.family(),
              series.first(),
              series.coefficients(),
              Math.min(series.order(), order + 1));
      case ListValue list ->
          new ListValue(
              list.items().stream().map(item -> series(item, order, span, scope)).toList());
      case Value other -> {
        Operator operator =
            Sorts.asOperator(other)
                .flatMap(MappedOperator::asOperator)
                .orElseThrow(
                    () ->
                        Problems.of("kind-series", Sorts.article(other) + " has no series", span));
        Variable acting = variableOf(operator, scope);
        yield Expansions.ofOperator(operator, Operator.derivative(acting), acting, order);
      }
    };
  }
}
