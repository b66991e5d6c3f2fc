package gnomon.evaluate;

import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Combinatorial;
import gnomon.form.Form;
import gnomon.number.Rational;
import gnomon.syntax.Expression;
import gnomon.syntax.Suffix;
import gnomon.value.FormValue;
import gnomon.value.ListValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;

/// The value of an expression in a scope: one walk over the tree, by the sort of each part.
final class Evaluator {
  private final Arithmetic arithmetic;
  private final Names names;
  private final Terms terms;
  private final Binders binders;
  private final ClauseReader clauses;
  private final Matrices matrices = new Matrices();
  private final Evaluation evaluation;

  Evaluator(Evaluation evaluation) {
    this.evaluation = evaluation;
    this.arithmetic = new Arithmetic(evaluation);
    this.names = new Names(this);
    this.terms = new Terms(this, new Calls(this, evaluation), arithmetic);
    this.binders = new Binders(this, evaluation);
    this.clauses = new ClauseReader(this, evaluation);
  }

  /// What is gathered while this evaluator works.
  Evaluation evaluation() {
    return evaluation;
  }

  /// The value of the expression; what goes wrong carries its place.
  Value value(Expression expression, Scope scope) {
    return Places.at(expression.span(), () -> read(expression, scope));
  }

  private Value read(Expression expression, Scope scope) {
    return switch (expression) {
      case Expression.Numeral number -> {
        Rational value = Rational.of(number.numerator(), number.denominator());
        yield Sorts.of(Form.of(value), scope);
      }
      case Expression.Name name -> names.value(name, scope);
      case Expression.Handle handle -> names.result(handle, scope);
      case Expression.Parenthesis parenthesis -> single(parenthesis, scope);
      case Expression.Bracket bracket -> bracket(bracket, scope);
      case Expression.OrderTerm order -> new SeriesReading(this).orderTerm(order, scope);
      case Expression.Suffixed(Expression atom, List<Suffix> suffixes, Span span) ->
          names
              .derivative(atom, suffixes, scope)
              .orElseGet(() -> suffixed(value(atom, scope), suffixes, span, scope));
      case Expression.Sign(Expression operand, Span span) ->
          arithmetic.negated(value(operand, scope), span, scope);
      case Expression.Term term -> terms.value(term, scope);
      case Expression.Sum sum -> sum(sum, scope);
      case Expression.Binder binder -> binders.value(binder, scope);
      case Expression.Matrix matrix ->
          matrices.matrix(
              value(matrix.operator(), scope), whole(matrix.order(), scope), matrix.span(), scope);
      case Expression.Carry carry -> new Carrying(this, evaluation).value(carry, scope);
      case Expression.Solve solve -> new Solving(this, evaluation).value(solve, scope);
      case Expression.Recurrence law -> new Laws(this, evaluation).value(law, scope);
      case Expression.Family(Expression subject, Span span) -> {
        Value asked = value(subject, scope);
        yield Places.at(
            span,
            () -> new Families(this, evaluation.catalogue()).value(asked, subject.span(), scope));
      }
      case Expression.Clauses clausal -> clauses.value(clausal, scope);
    };
  }

  private Value single(Expression.Parenthesis parenthesis, Scope scope) {
    Expression item =
        parenthesis
            .single()
            .orElseThrow(
                () ->
                    Problems.of(
                        "kind-arguments",
                        "arguments without a function before them",
                        parenthesis.span()));
    return Expansions.settled(value(item, scope));
  }

  private Value sum(Expression.Sum sum, Scope scope) {
    List<Value> values =
        sum.summands().stream().map(summand -> value(summand.value(), scope)).toList();
    if (values.stream().allMatch(FormValue.class::isInstance)) {
      return sumOfForms(sum, values, scope);
    }
    Span start = sum.summands().getFirst().value().span();
    Value total = values.getFirst();
    for (int i = 1; i < values.size(); i++) {
      Expression.Summand summand = sum.summands().get(i);
      Span span = start.to(summand.value().span());
      Value next =
          summand.subtracted() ? arithmetic.negated(values.get(i), span, scope) : values.get(i);
      Value before = total;
      total = Places.at(span, () -> arithmetic.plus(before, next, span, scope));
    }
    return total;
  }

  private static Value sumOfForms(Expression.Sum sum, List<Value> values, Scope scope) {
    List<Form> forms = new ArrayList<>();
    for (int i = 0; i < values.size(); i++) {
      Form form = ((FormValue) values.get(i)).form();
      forms.add(sum.summands().get(i).subtracted() ? form.negated() : form);
    }
    return Sorts.of(Form.sum(forms), scope);
  }

  private Value bracket(Expression.Bracket bracket, Scope scope) {
    List<Value> items = bracket.items().stream().map(item -> value(item, scope)).toList();
    long acting = items.stream().filter(Sorts::acts).count();
    if (acting == 0 || (acting == items.size() && items.size() != 2)) {
      return new ListValue(items);
    }
    if (acting < items.size()) {
      throw Problems.of(
          "kind-mixed-bracket",
          "a bracket with operators and other things is neither list nor commutator",
          bracket.span(),
          "[D, X]");
    }
    MappedOperator a = Sorts.asOperator(items.getFirst()).orElseThrow();
    MappedOperator b = Sorts.asOperator(items.getLast()).orElseThrow();
    return Sorts.of(a.commutator(b));
  }

  /// The value with what is written behind it.
  Value suffixed(Value atom, List<Suffix> suffixes, Span span, Scope scope) {
    Value value = atom;
    for (Suffix suffix : suffixes) {
      Value before = value;
      value = Places.at(span, () -> suffixed(before, suffix, scope));
    }
    return value;
  }

  private Value suffixed(Value value, Suffix suffix, Scope scope) {
    return switch (suffix) {
      case Suffix.Prime(Span span) -> pincherle(value, span, scope);
      case Suffix.Factorial(Span span) ->
          Sorts.of(Combinatorial.factorial(Sorts.form(value, span, "what stands before !")), scope);
      case Suffix.Falling(Expression index, Span span) -> {
        Form base = Sorts.form(value, span, "the base");
        Form count = Sorts.form(value(index, scope), index.span(), "the index");
        yield Sorts.of(Combinatorial.falling(base, count), scope);
      }
      case Suffix.Rising(Expression index, Span span) -> {
        Form base = Sorts.form(value, span, "the base");
        Form count = Sorts.form(value(index, scope), index.span(), "the index");
        yield Sorts.of(Combinatorial.rising(base, count), scope);
      }
      case Suffix.Raised(Expression exponent, Span span) ->
          arithmetic.power(value, value(exponent, scope), span, scope);
    };
  }

  private static Value pincherle(Value value, Span span, Scope scope) {
    if (!Sorts.acts(value)) {
      throw Problems.of(
          "kind-prime",
          "' is the Pincherle derivative of an operator, and this is none",
          span,
          "D x^2");
    }
    return Sorts.of(Sorts.asOperator(value).orElseThrow().pincherle(scope.running()));
  }

  Value plus(Value a, Value b, Span span, Scope scope) {
    return arithmetic.plus(a, b, span, scope);
  }

  Value times(Value a, Value b, Span span, Scope scope) {
    return arithmetic.times(a, b, span, scope);
  }

  /// A natural number of moderate size, as orders and counts are.
  int whole(Expression expression, Scope scope) {
    Value value = value(expression, scope);
    return Sorts.form(value, expression.span(), "this")
        .asInt()
        .filter(number -> number >= 0)
        .orElseThrow(
            () ->
                Problems.of(
                    "domain-count", "a whole number at least 0 is needed here", expression.span()));
  }
}
