package gnomon.evaluate;

import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.summation.SummationEngine;
import gnomon.syntax.Condition;
import gnomon.syntax.Expression;
import gnomon.syntax.Identifier;
import gnomon.syntax.Statement;
import gnomon.syntax.Vocabulary;
import gnomon.value.Answer;
import gnomon.value.Derivation;
import gnomon.value.FormValue;
import gnomon.value.OperatorValue;
import gnomon.value.Status;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import java.util.List;

/// What the statements of the language do to a scope and what they answer.
///
/// Everything here may throw [gnomon.diagnostic.DiagnosedException], [LocatedRefusal] or
/// [LocatedHalt]; scopes handed in are unchanged then as ever.
public final class Interpreter {
  private final int depth;
  private final int calls;
  private final Writing writing;
  private final SummationEngine sums;
  private final Catalogue catalogue = new Catalogue();

  /// An interpreter in which calls of defined functions may be nested `depth` deep and be `calls`
  /// many in one statement.
  public Interpreter(int depth, int calls, SummationEngine sums, Writing writing) {
    this.depth = depth;
    this.calls = calls;
    this.sums = sums;
    this.writing = writing;
  }

  /// A definition made: the scope that has it, and the value, if it is not a function.
  public record Definition(Scope scope, Answer answer) {}

  /// The value of an expression.
  public Answer value(Expression expression, Scope scope) {
    Evaluation evaluation = evaluation();
    Value value = new Evaluator(evaluation).value(expression, scope);
    return answer(simplified(value, scope), evaluation, scope.running());
  }

  /// The verdict on a claim.
  public Answer claim(Statement.Claim claim, Scope scope) {
    Evaluation evaluation = evaluation();
    VerdictValue verdict = new Claims(new Evaluator(evaluation), evaluation).verdict(claim, scope);
    return new Answer(verdict, verdict.status(), Derivation.NONE);
  }

  /// How the answer to a statement in a scope is reached: it is evaluated once more, and each step
  /// is checked as it is recorded.
  public Derivation why(Statement statement, Scope scope) {
    Evaluation evaluation = new Evaluation(depth, calls, sums, writing, catalogue, true);
    Evaluator evaluator = new Evaluator(evaluation);
    switch (statement) {
      case Statement.ExpressionStatement(Expression expression, Span _) ->
          evaluation
              .grounds()
              .say("the result", evaluator.value(expression, scope), scope.running());
      case Statement.Let let -> {
        Value value = evaluator.value(let.body(), scope);
        evaluation.grounds().say("the result", value, scope.running());
      }
      case Statement.Claim claim -> {
        Value verdict = new Claims(evaluator, evaluation).verdict(claim, scope);
        evaluation.grounds().say("so the claim is", verdict, scope.running());
      }
      case Statement other -> throw new IllegalArgumentException(other.toString());
    }
    return new Derivation(evaluation.grounds().steps());
  }

  private Evaluation evaluation() {
    return new Evaluation(depth, calls, sums, writing, catalogue, false);
  }

  private static Answer answer(Value value, Evaluation evaluation, Variable running) {
    Status status = status(value, evaluation.status());
    if (status.kind() == Status.Kind.CLOSED_FORM) {
      Conditions conditions = new Conditions(evaluation.writing(), running);
      String words = conditions.words(evaluation.conditions());
      List<String> remarks = evaluation.remarks();
      String more = remarks.isEmpty() ? "" : "(" + String.join("; ", remarks) + ")";
      status = status.withDetail((words + " " + more).strip());
    }
    return new Answer(value, status, Derivation.NONE, evaluation.conditions());
  }

  /// What is known of the value: of the sums met on the way only what still holds of the value.
  private static Status status(Value value, Status met) {
    Status own = value.status();
    if (!(value instanceof FormValue)) {
      boolean law =
          switch (met.kind()) {
            case GUESSED, RECURRENCE, CARRIED -> true;
            case NONE, CLOSED_FORM, NO_CLOSED_FORM, PROVED, REFUTED, OPEN -> false;
            case LEFT_AS_SUM, LEFT_AS_PRODUCT, LEFT_AS_INTEGRAL -> false;
          };
      return law && value instanceof OperatorValue ? met : own;
    }
    boolean standing = own.isLeft();
    return switch (met.kind()) {
      case CLOSED_FORM -> standing ? own : met;
      case LEFT_AS_SUM, LEFT_AS_PRODUCT, LEFT_AS_INTEGRAL -> standing ? own : Status.NONE;
      case NO_CLOSED_FORM, RECURRENCE -> standing ? met : Status.NONE;
      case NONE -> met.detail().isEmpty() ? own : met;
      case CARRIED -> met;
      case GUESSED, PROVED, REFUTED, OPEN -> own;
    };
  }

  private static Value simplified(Value value, Scope scope) {
    if (value instanceof FormValue form) {
      Form simple = scope.assumptions().simplified(form.form());
      return simple.equals(form.form()) ? value : FormValue.of(simple, scope.running());
    }
    return value;
  }

  /// The scope with a name for a value.
  public Definition let(Statement.Let let, Scope scope) {
    refuseWord(let.name());
    Answer answer = value(let.body(), scope);
    Binding.Named named = new Binding.Named(answer.value(), let.body(), scope, answer.conditions());
    return new Definition(scope.with(let.name().text(), named), answer);
  }

  /// The scope with a function defined by a rule.
  public Scope rule(Statement.Let let, Scope scope) {
    refuseWord(let.name());
    List<String> parameters = let.parameters().stream().map(Identifier::text).toList();
    String name = let.name().text();
    return scope.with(name, new Binding.Rule(name, parameters, let.body(), scope));
  }

  /// The scope under more assumptions.
  public Scope given(Statement.Given given, Scope scope) {
    return assuming(given.conditions(), new Evaluator(evaluation()), scope);
  }

  static Scope assuming(List<Condition> conditions, Evaluator evaluator, Scope scope) {
    Assumptions assumptions = scope.assumptions();
    for (Condition condition : conditions) {
      assumptions =
          switch (condition) {
            case Condition.IsInteger(Expression subject, Span span) ->
                assumptions.withInteger(variable(evaluator.value(subject, scope), span));
            case Condition.Comparison(
                    Expression left,
                    Condition.Relation relation,
                    Expression right,
                    Span span) -> {
              Form a = Sorts.form(evaluator.value(left, scope), span, "the left side");
              Form b = Sorts.form(evaluator.value(right, scope), span, "the right side");
              refuseFalse(a, relation, b, span);
              yield assumptions.with(new Assumptions.Comparison(a, relation, b));
            }
          };
    }
    return scope.assuming(assumptions);
  }

  private static void refuseFalse(Form a, Condition.Relation relation, Form b, Span span) {
    if (a.minus(b).asRational().isPresent()
        && !Assumptions.NONE
            .with(new Assumptions.Comparison(a, relation, b))
            .allow(java.util.Map.of())) {
      throw Problems.of("domain-false-assumption", "this is false", span);
    }
  }

  private static Variable variable(Value value, Span span) {
    if (value instanceof FormValue form
        && form.form().asGenerator().orElse(null) instanceof Variable variable) {
      return variable;
    }
    throw Problems.of("kind-assumption", "integer is said of a variable", span);
  }

  /// The scope without names.
  public Scope drop(Statement.Drop drop, Scope scope) {
    Scope rest = scope;
    for (Identifier name : drop.names()) {
      if (rest.binding(name.text()).isEmpty()) {
        throw Problems.of("name-undefined", name.text() + " is not defined", name.span());
      }
      rest = rest.without(name.text());
    }
    return rest;
  }

  /// The scope without assumptions.
  public static Scope dropGiven(Scope scope) {
    return scope.assuming(Assumptions.NONE);
  }

  /// The scope with one more result, which was evaluated in the scope `at`.
  public static Scope withResult(Scope scope, Answer answer, Expression expression, Scope at) {
    return scope.withResult(new Binding.Named(answer.value(), expression, at, answer.conditions()));
  }

  /// The scope in which operators act on another variable.
  public Scope vary(Statement.Vary vary, Scope scope) {
    Identifier name = vary.variable();
    if (Vocabulary.isReserved(name.text())) {
      throw Problems.of("name-reserved", name.text() + " is a word of the language", name.span());
    }
    if (scope.binding(name.text()).isPresent()) {
      throw Problems.of(
          "name-taken",
          name.text() + " is defined and cannot be the running variable",
          name.span(),
          "drop " + name.text());
    }
    return scope.running(new Variable(name.text()));
  }

  /// The scope with functions of which nothing is known.
  public Scope arbitrary(Statement.Arbitrary arbitrary, Scope scope) {
    Scope more = scope;
    for (Identifier name : arbitrary.names()) {
      refuseWord(name);
      more = more.with(name.text(), new Binding.Arbitrary(name.text()));
    }
    return more;
  }

  /// The scope with umbrae.
  public Scope umbra(Statement.Umbra umbra, Scope scope) {
    umbra.letters().forEach(Interpreter::refuseWord);
    return new Umbrae(evaluation()).declared(umbra, scope);
  }

  private static void refuseWord(Identifier name) {
    if (Vocabulary.isReserved(name.text())) {
      throw Problems.of(
          "name-reserved", name.text() + " is a word of the language", name.span(), "another name");
    }
  }
}
