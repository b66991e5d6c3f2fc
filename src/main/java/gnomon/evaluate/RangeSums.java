package gnomon.evaluate;

import gnomon.algebra.Halt;
import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.evaluate.Binders.Limits;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.summation.Condition;
import gnomon.summation.DefiniteProducts;
import gnomon.summation.DefiniteSum;
import gnomon.summation.DefiniteSums;
import gnomon.summation.InfiniteSums;
import gnomon.summation.SummationEngine;
import gnomon.syntax.Expression;
import gnomon.value.FormValue;
import gnomon.value.Status;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Sums and products over a range of integers. Functions go to the summation engine; a body that
/// has a meaning only for each integer, such as a power of an operator, is evaluated for each.
final class RangeSums {
  private static final int MOST_TERMS = 10_000;

  private final Evaluator evaluator;
  private final Evaluation evaluation;

  RangeSums(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
  }

  Value value(Limits limits, Expression body, boolean adding, Scope scope) {
    Span span = limits.span().to(body.span());
    Optional<Value> series =
        adding
            ? Places.at(span, () -> new OperatorSeries(evaluator).value(limits, body, scope))
            : Optional.empty();
    if (series.isPresent()) {
      return series.get();
    }
    Optional<Form> form = symbolic(limits, body, scope);
    return form.isPresent()
        ? Places.at(span, () -> ofForm(limits, form.get(), adding, scope))
        : oneByOne(limits, body, adding, scope);
  }

  /// The body as a function of the bound variable; between numbers it need not be one.
  private Optional<Form> symbolic(Limits limits, Expression body, Scope scope) {
    List<Condition> earlier = evaluation.conditions();
    try {
      evaluation.conditions(List.of());
      Value value = evaluator.value(body, limits.inside(scope));
      List<Condition> met = evaluation.conditions();
      evaluation.conditions(earlier);
      for (Condition condition : met) {
        if (!Validity.concerns(condition, Map.of(limits.variable(), Form.ZERO))) {
          evaluation.require(List.of(condition));
        } else if (!holdsInRange(condition, limits)) {
          return withoutClosedForm(limits, condition, body);
        }
      }
      if (value instanceof FormValue form) {
        return Optional.of(form.form());
      }
      if (!limits.isNumeric()) {
        throw Problems.of(
            "kind-not-a-function",
            "what is summed is " + Sorts.article(value) + ", not a function",
            body.span());
      }
      return Optional.empty();
    } catch (LocatedRefusal | DiagnosedException needsNumbers) {
      evaluation.conditions(earlier);
      if (limits.isNumeric() && !scope.running().name().equals(limits.name())) {
        return Optional.empty();
      }
      throw needsNumbers;
    }
  }

  /// Whether a condition on the bound variable holds on the whole range. One that holds at both
  /// ends of it and so between them is looked at there, and required at a symbolic end. That a
  /// subject is not zero is looked at at the lower end only: elsewhere the limit of the closed form
  /// is the sum.
  private boolean holdsInRange(Condition condition, Limits limits) {
    Form subject = condition.subject();
    Variable k = limits.variable();
    Optional<Form> slope = slope(subject, k);
    return switch (condition.relation()) {
      case NATURAL, POSITIVE, FINITE_FACTORIAL, RANGE_LENGTH ->
          slope.isPresent()
              && (limits.upper().isPresent() || isPositive(slope.get()))
              && requiredAtEnds(condition, limits);
      case INSIDE_UNIT ->
          slope.isPresent()
              ? limits.upper().isPresent() && requiredAtEnds(condition, limits)
              : slope(subject.inverse(), k).filter(RangeSums::isPositive).isPresent()
                  && subject
                      .substitute(k, limits.lower())
                      .asRational()
                      .filter(RangeSums::isInUnit)
                      .isPresent();
      case NOT_ZERO -> !Validity.fails(List.of(condition), Map.of(k, limits.lower()));
      case INTEGER ->
          slope.flatMap(Form::asInteger).isPresent()
              && !Validity.fails(List.of(condition), Map.of(k, limits.lower()));
      case NOT_IN_RANGE -> false;
    };
  }

  private static Optional<Form> slope(Form form, Variable k) {
    return Structure.asPolynomial(form, k).filter(c -> c.size() == 2).map(List::getLast);
  }

  private static boolean isPositive(Form slope) {
    return slope.asRational().filter(value -> value.sign() > 0).isPresent();
  }

  /// Whether the value is in (0, 1), where the reciprocal of a rising function stays.
  private static boolean isInUnit(Rational value) {
    return value.sign() > 0 && value.compareTo(Rational.ONE) < 0;
  }

  private boolean requiredAtEnds(Condition condition, Limits limits) {
    for (Form end : limits.all()) {
      Form there = condition.subject().substitute(limits.variable(), end);
      if (!there.isConstant()) {
        boolean length = condition.relation() == Condition.Relation.RANGE_LENGTH;
        evaluation.require(
            List.of(
                new Condition(there, length ? Condition.Relation.NATURAL : condition.relation())));
      } else if (Validity.fails(List.of(condition), Map.of(limits.variable(), end))) {
        return false;
      }
    }
    return true;
  }

  /// A body whose closed form does not hold on the whole range: between numbers it is evaluated for
  /// each, otherwise refused.
  private Optional<Form> withoutClosedForm(Limits limits, Condition condition, Expression body) {
    if (limits.isNumeric()) {
      return Optional.empty();
    }
    String words = new Conditions(evaluation.writing(), limits.variable()).words(condition);
    throw new DiagnosedException(
        Diagnostic.of(
                "domain-validity",
                "the closed form of the summand does not hold on the range",
                body.span())
            .withEvidence("It holds for " + words + "."));
  }

  private Value ofForm(Limits limits, Form body, boolean adding, Scope scope) {
    Variable k = limits.variable();
    SummationEngine engine = evaluation.sums();
    Optional<Form> umbral =
        adding ? new UmbralSums(evaluation).sum(body, limits) : Optional.empty();
    if (umbral.isPresent()) {
      notEmpty(limits).ifPresent(taken -> evaluation.require(List.of(taken)));
      return Sorts.of(umbral.get(), scope);
    }
    DefiniteSums sums = new DefiniteSums(engine);
    DefiniteSum sum;
    if (!adding) {
      Form upper =
          limits
              .upper()
              .orElseThrow(
                  () ->
                      Problems.of(
                          "domain-infinite-product",
                          "a product needs an upper limit",
                          limits.span()));
      sum = new DefiniteProducts(sums).product(body, k, limits.lower(), upper);
    } else if (limits.upper().isPresent()) {
      sum = sums.sum(body, k, limits.lower(), limits.upper().get());
    } else {
      sum = new InfiniteSums(engine).sum(body, k, limits.lower());
    }
    evaluation.met(status(sum, evaluation.writing(), scope.running()));
    evaluation.require(sum.conditions());
    requireFactorials(body, limits);
    notEmpty(limits).ifPresent(taken -> evaluation.require(List.of(taken)));
    sum.antidifference().ifPresent(found -> record(found, body, sum.value(), limits));
    sum.theorems().forEach(theorem -> Theorems.cite(theorem, evaluation.grounds()));
    sum.recurrence().ifPresent(found -> new RecurrenceSteps(evaluation, k).record(found));
    return Sorts.of(sum.value(), scope);
  }

  /// Where a range begins below 0, factorials in the terms must not be those of negative integers
  /// there: binom(n + k, k) is 0 at k = −2, but its form (n + k)!/(n! k!) is 1 there for n = 0. For
  /// such n the terms are formed anew.
  private void requireFactorials(Form body, Limits limits) {
    if (limits.lower().asInteger().filter(a -> a.signum() < 0).isEmpty()) {
      return;
    }
    for (Generator g : body.generators()) {
      if (g instanceof Factorial factorial
          && body.numerator().contains(g)
          && factorial.argument().dependsOn(limits.variable())) {
        Form least = factorial.argument().substitute(limits.variable(), limits.lower());
        boolean plain =
            least.variables().size() == 1
                && least.minus(Form.of(least.variables().first())).asInteger().isPresent();
        if (!least.isConstant()) {
          evaluation.require(
              List.of(
                  new Condition(
                      least,
                      plain ? Condition.Relation.NATURAL : Condition.Relation.FINITE_FACTORIAL)));
        }
      }
    }
  }

  /// What is taken for granted of a symbolic range: that it is at the shortest empty.
  private static Optional<Condition> notEmpty(Limits limits) {
    return limits
        .upper()
        .map(upper -> upper.minus(limits.lower()).plus(Form.ONE))
        .filter(count -> !count.isConstant())
        .map(count -> new Condition(count, Condition.Relation.RANGE_LENGTH));
  }

  static Status status(DefiniteSum sum, Writing writing, Variable running) {
    return switch (sum.status()) {
      case TERM_BY_TERM -> Status.of(Status.Kind.CLOSED_FORM);
      case CLOSED_FORM ->
          Status.of(Status.Kind.CLOSED_FORM)
              .withDetail(new Conditions(writing, running).words(sum.conditions()));
      case NO_CLOSED_FORM ->
          Status.of(Status.Kind.NO_CLOSED_FORM)
              .withDetail(sum.absentWithin().map(kind -> "among " + kind.words()).orElse(""));
      case RECURRENCE ->
          Status.of(Status.Kind.RECURRENCE)
              .withDetail("of order " + sum.recurrence().orElseThrow().order() + ", see why");
      case LEFT_STANDING -> Status.of(Status.Kind.LEFT_AS_SUM);
    };
  }

  /// Records the antidifference, whose difference is formed anew, and the sum as a difference of
  /// its values. The engine may count from the lower limit.
  private void record(Form found, Form summand, Form sum, Limits limits) {
    Variable k = limits.variable();
    Form next = Form.of(k).plus(Form.ONE);
    Form moved = summand.substitute(k, Form.of(k).plus(limits.lower()));
    boolean fromZero = found.substitute(k, next).minus(found).equals(moved);
    evaluation.grounds().antidifference(found, fromZero ? moved : summand, k);
    Form lower = fromZero ? Form.ZERO : limits.lower();
    Form shift = fromZero ? limits.lower() : Form.ZERO;
    limits
        .upper()
        .map(upper -> upper.plus(Form.ONE).minus(shift))
        .ifPresent(past -> evaluation.grounds().telescoped(found, past, lower, sum, k));
  }

  private Value oneByOne(Limits limits, Expression body, boolean adding, Scope scope) {
    BigInteger first = limits.first().orElseThrow();
    BigInteger last = limits.last().orElseThrow();
    BigInteger count = last.subtract(first).add(BigInteger.ONE);
    if (count.compareTo(BigInteger.valueOf(MOST_TERMS)) > 0) {
      Halt halt = new Halt(Halt.Cause.SIZE, count.min(BigInteger.TWO.pow(62)).longValue());
      throw new LocatedHalt(halt, limits.span());
    }
    List<Value> values = new RangeValues(evaluator).values(limits.name(), first, last, body, scope);
    if (values.isEmpty()) {
      return Sorts.of(adding ? Form.ZERO : Form.ONE, scope);
    }
    List<Value> rest = new ArrayList<>(values);
    Value total = rest.removeFirst();
    for (Value value : rest) {
      total =
          adding
              ? evaluator.plus(total, value, body.span(), scope)
              : evaluator.times(total, value, body.span(), scope);
    }
    return total;
  }
}
