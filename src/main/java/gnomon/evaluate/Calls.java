package gnomon.evaluate;

import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Combinatorial;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.operator.Functional;
import gnomon.operator.Operator;
import gnomon.summation.Condition;
import gnomon.syntax.Expression;
import gnomon.syntax.Spelling;
import gnomon.syntax.StatementText;
import gnomon.syntax.Suffix;
import gnomon.syntax.Vocabulary;
import gnomon.syntax.Word;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.MapValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// Names with arguments: the functions of the language, defined functions, functions of which
/// nothing is known, and the words that make maps and functionals.
final class Calls {
  private static final Set<String> MAKERS = Set.of("eps", "umbral", "sheffer");

  private final Evaluator evaluator;
  private final Evaluation evaluation;

  Calls(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
  }

  /// Whether a parenthesis written against the expression holds its arguments.
  boolean isCallable(Expression head, Scope scope) {
    return switch (head) {
      case Expression.Name name -> isCallable(name, scope);
      case Expression.Suffixed(Expression.Name name, List<Suffix> suffixes, Span span) -> {
        if (!isCallable(name, scope)) {
          yield false;
        }
        if (isArbitrary(name, scope)
            && suffixes.stream().allMatch(Suffix.Prime.class::isInstance)) {
          yield true;
        }
        throw Problems.of(
            "kind-call",
            name.text() + " takes its argument first",
            span,
            name.text()
                + "(x)"
                + StatementText.of(head, Spelling.ASCII).substring(name.text().length()));
      }
      case Expression _ -> false;
    };
  }

  private static boolean isCallable(Expression.Name name, Scope scope) {
    Optional<Binding> binding = scope.binding(name.text());
    if (binding.isPresent()) {
      return switch (binding.get()) {
        case Binding.Rule _, Binding.Arbitrary _ -> true;
        case Binding.Named _, Binding.Held _, Binding.Bound _, Binding.Umbra _ -> false;
      };
    }
    return isFunctionWord(name.text()) || MAKERS.contains(name.text());
  }

  static boolean isFunctionWord(String name) {
    return Vocabulary.find(name).filter(word -> word.sort() == Word.Sort.FUNCTION).isPresent();
  }

  static boolean needsArguments(String name) {
    return isFunctionWord(name) || MAKERS.contains(name);
  }

  private static boolean isArbitrary(Expression.Name name, Scope scope) {
    return scope.binding(name.text()).filter(Binding.Arbitrary.class::isInstance).isPresent();
  }

  Value call(Expression head, List<Expression> arguments, Span span, Scope scope) {
    int primes = head instanceof Expression.Suffixed suffixed ? suffixed.suffixes().size() : 0;
    Expression.Name name =
        (Expression.Name) (head instanceof Expression.Suffixed suffixed ? suffixed.atom() : head);
    Optional<Binding> binding = scope.binding(name.text());
    if (binding.isPresent()) {
      return switch (binding.get()) {
        case Binding.Rule rule -> defined(rule, arguments, span, scope);
        case Binding.Arbitrary(String unknown) ->
            arbitrary(unknown, primes, arguments, span, scope);
        case Binding.Named _, Binding.Held _, Binding.Bound _, Binding.Umbra _ ->
            throw new IllegalArgumentException(name.text());
      };
    }
    if (name.step().isPresent() || (name.subscript().isPresent() && isFunctionWord(name.text()))) {
      throw Problems.of("kind-subscript", name.text() + " takes no subscript or step", span);
    }
    List<Value> values = arguments.stream().map(part -> evaluator.value(part, scope)).toList();
    Scope acting = name.subscript().map(index -> scope.running(new Variable(index))).orElse(scope);
    return Places.at(span, () -> word(name.text(), values, span, acting));
  }

  private Value defined(Binding.Rule rule, List<Expression> arguments, Span span, Scope scope) {
    expect(rule.name(), rule.parameters().size(), arguments.size(), span);
    Scope inside =
        rule.scope().with(rule.name(), rule).running(scope.running()).assuming(scope.assumptions());
    Optional<Value> point = Optional.empty();
    for (int i = 0; i < arguments.size(); i++) {
      String parameter = rule.parameters().get(i);
      Value value = evaluator.value(arguments.get(i), scope);
      inside = inside.with(parameter, new Binding.Held(value));
      if (parameter.equals(scope.running().name()) && value instanceof FormValue) {
        point = Optional.of(value);
      }
    }
    Scope body = inside;
    Optional<Form> at = point.map(value -> ((FormValue) value).form());
    return evaluation.calling(
        rule.name(),
        span,
        () ->
            Places.calledFrom(
                span,
                () ->
                    at.isPresent()
                        ? atPoint(rule, at.get(), body)
                        : evaluator.value(rule.body(), body)));
  }

  /// A rule whose parameter is the running variable: operators in it act on that variable, so the
  /// argument is put in after they have been applied. Where that is outside the validity of a
  /// closed form, or the result is no function, the argument stands for the parameter from the
  /// start.
  private Value atPoint(Binding.Rule rule, Form point, Scope body) {
    String name = body.running().name();
    Variable variable = body.fresh(name + "'");
    List<Condition> earlier = evaluation.conditions();
    evaluation.conditions(List.of());
    Value value = evaluator.value(rule.body(), body.binding(name, variable));
    List<Condition> met = evaluation.conditions();
    evaluation.conditions(earlier);
    if (value instanceof FormValue form && !Validity.fails(met, Map.of(variable, point))) {
      met.forEach(condition -> require(condition, variable, point));
      return Sorts.of(Substitutions.addedUp(form.form().substitute(variable, point)), body);
    }
    return evaluator.value(rule.body(), body);
  }

  private void require(Condition condition, Variable variable, Form point) {
    Form subject = condition.subject().substitute(variable, point);
    if (!subject.isConstant()) {
      evaluation.require(List.of(new Condition(subject, condition.relation())));
    }
  }

  private Value arbitrary(
      String name, int primes, List<Expression> arguments, Span span, Scope scope) {
    expect(name, 1, arguments.size(), span);
    Value argument = evaluator.value(arguments.getFirst(), scope);
    Form inner = Sorts.form(argument, arguments.getFirst().span(), "the argument");
    return Sorts.of(Form.of(new Unknown(name, primes, inner)), scope);
  }

  private static void expect(String name, int wanted, int found, Span span) {
    if (wanted != found) {
      throw Problems.of(
          "kind-arguments",
          name + " takes " + wanted + (wanted == 1 ? " argument" : " arguments") + ", not " + found,
          span);
    }
  }

  private Value word(String name, List<Value> arguments, Span span, Scope scope) {
    return switch (name) {
      case "eps" -> {
        expect(name, 1, arguments.size(), span);
        Form point = Sorts.form(arguments.getFirst(), span, "the point");
        yield new FunctionalValue(Functional.evaluation(scope.running(), point));
      }
      case "umbral" -> {
        expect(name, 1, arguments.size(), span);
        yield new MapValue(
            ShefferMap.umbral(
                symbol(arguments.getFirst(), span), dual(arguments.getFirst(), span, scope)));
      }
      case "sheffer" -> {
        expect(name, 2, arguments.size(), span);
        yield new MapValue(
            ShefferMap.sheffer(
                symbol(arguments.getFirst(), span),
                symbol(arguments.getLast(), span),
                dual(arguments.getFirst(), span, scope)));
      }
      case "H" -> harmonic(arguments, span, scope);
      case "eval" -> {
        expect(name, 1, arguments.size(), span);
        yield new Umbrae(evaluation).value(arguments.getFirst(), span, scope);
      }
      case "coefficient" -> {
        expect(name, 2, arguments.size(), span);
        yield new Laws(evaluator, evaluation)
            .coefficient(arguments.getFirst(), arguments.getLast(), span, scope);
      }
      case "binom", "falling", "rising" -> {
        expect(name, 2, arguments.size(), span);
        Form first = Sorts.form(arguments.getFirst(), span, "the first argument");
        Form second = Sorts.form(arguments.getLast(), span, "the second argument");
        if (name.equals("binom")) {
          requireNatural(first, second);
        }
        yield Sorts.of(combinatorial(name, first, second), scope);
      }
      case String function -> {
        expect(function, 1, arguments.size(), span);
        yield elementary(function, arguments.getFirst(), span, scope);
      }
    };
  }

  /// binom(n, n − j) with an integer j is written as a polynomial, its value for natural n: for a
  /// negative integer n it is 0 or another number.
  private void requireNatural(Form n, Form k) {
    boolean tied = n.minus(k).asInteger().isPresent();
    if (tied && !n.isConstant()) {
      evaluation.require(List.of(new Condition(n, Condition.Relation.NATURAL)));
    }
  }

  private static Form combinatorial(String name, Form first, Form second) {
    return switch (name) {
      case "binom" -> Combinatorial.binomial(first, second);
      case "falling" -> Combinatorial.falling(first, second);
      default -> Combinatorial.rising(first, second);
    };
  }

  private static Value harmonic(List<Value> arguments, Span span, Scope scope) {
    if (arguments.isEmpty() || arguments.size() > 2) {
      throw Problems.of("kind-arguments", "H takes 1 or 2 arguments", span);
    }
    Form index = Sorts.form(arguments.getFirst(), span, "the argument of H");
    if (arguments.size() == 1) {
      return Sorts.of(Combinatorial.harmonic(index), scope);
    }
    int order =
        Sorts.form(arguments.getLast(), span, "the order of H")
            .asInt()
            .filter(value -> value > 0)
            .orElseThrow(
                () ->
                    Problems.of("domain-order", "the order of H must be a positive integer", span));
    return Sorts.of(Combinatorial.harmonic(index, order), scope);
  }

  private Value elementary(String function, Value argument, Span span, Scope scope) {
    if (argument instanceof FormValue form) {
      return Sorts.of(apply(function, form.form(), span), scope);
    }
    if (argument instanceof SeriesValue series) {
      return new SeriesArithmetic(scope).apply(function, series, span);
    }
    if (Sorts.acts(argument)) {
      Operator operator = Arithmetic.plain(argument, span);
      return Sorts.of(operator.lift(symbol -> apply(function, symbol, span)));
    }
    throw Problems.of(
        "kind-arguments", function + " of " + Sorts.article(argument) + " means nothing", span);
  }

  private static Form apply(String function, Form argument, Span span) {
    return Elementary.apply(function, argument)
        .orElseThrow(
            () -> Problems.of("kind-arguments", function + " cannot be applied here", span));
  }

  /// The symbol variable of the operator, which may act on another variable than the running one.
  private static Dual dual(Value value, Span span, Scope scope) {
    return Arithmetic.plain(value, span).variables().stream()
        .findFirst()
        .map(Dual::new)
        .orElse(new Dual(scope.running()));
  }

  /// The symbol of a shift-invariant operator from which a map is made.
  private static Form symbol(Value value, Span span) {
    if (value instanceof FormValue form && form.form().isConstant()) {
      return form.form();
    }
    Operator operator = Arithmetic.plain(value, span);
    if (!operator.isShiftInvariant() || !operator.isPlain()) {
      throw Problems.of(
          "domain-not-shift-invariant", "a map is made from shift-invariant operators", span);
    }
    return operator.symbol();
  }
}
