package gnomon.syntax;

import java.util.List;
import java.util.stream.Collectors;

/// Trees as bracketed text that shows every grouping, for the golden parses. Each node that is more
/// than an atom stands in braces. In a term `·` is juxtaposition and `←` an argument.
final class Outline {
  private Outline() {}

  static String of(Statement statement) {
    return switch (statement) {
      case Statement.ExpressionStatement(var expression, _) -> of(expression);
      case Statement.Let(var name, var parameters, var body, _) ->
          "let " + name.text() + names(parameters) + " := " + of(body);
      case Statement.Claim(var left, var right, var range, var conditions, _) ->
          "claim "
              + of(left)
              + " == "
              + of(right)
              + range.map(r -> " over " + of(r)).orElse("")
              + (conditions.isEmpty() ? "" : " under ")
              + conditions.stream().map(Outline::of).collect(Collectors.joining(" and "));
      case Statement.Given(var conditions, _) ->
          "given " + conditions.stream().map(Outline::of).collect(Collectors.joining(" and "));
      case Statement.Drop(var names, _) -> "drop " + names(names);
      case Statement.DropGiven _ -> "drop the assumptions";
      case Statement.Vary(var variable, _) -> "vary " + variable.text();
      case Statement.Arbitrary(var names, _) -> "arbitrary " + names(names);
      case Statement.Umbra(var letters, var series, _) ->
          "umbra " + names(letters) + " with " + of(series);
      case Statement.Why(var handle, _) -> "why " + handle.map(Outline::of).orElse("the latest");
      case Statement.Names _ -> "names";
      case Statement.Keep(var file, _) -> "keep <" + file + ">";
      case Statement.Replay(var file, _) -> "replay <" + file + ">";
      case Statement.Recheck(var file, _) -> "recheck <" + file + ">";
      case Statement.Rerecord(var file, _) -> "rerecord <" + file + ">";
      case Statement.Help(var topic, _) -> "help " + topic.orElse("in general");
      case Statement.Leave _ -> "leave";
      case Statement.Empty _ -> "nothing";
    };
  }

  static String of(Expression expression) {
    return switch (expression) {
      case Expression.Numeral(var numerator, var denominator, _) ->
          numerator + (denominator.bitLength() == 1 ? "" : "/" + denominator);
      case Expression.Name(var text, var subscript, var step, _) ->
          text
              + subscript.map(s -> "_" + s).orElse("")
              + step.map(s -> "[" + of(s) + "]").orElse("");
      case Expression.Handle(var number, _) -> "@" + (number.isEmpty() ? "" : number.getAsInt());
      case Expression.Parenthesis(var items, _) -> "(" + all(items) + ")";
      case Expression.Bracket(var items, _) -> "[" + all(items) + "]";
      case Expression.OrderTerm(var bound, _) -> "{order " + of(bound) + "}";
      case Expression.Suffixed(var atom, var suffixes, _) ->
          "{"
              + of(atom)
              + suffixes.stream().map(s -> " " + of(s)).collect(Collectors.joining())
              + "}";
      case Expression.Sign(var operand, _) -> "{minus " + of(operand) + "}";
      case Expression.Term(var factors, _) ->
          "{"
              + factors.stream().map(Outline::of).collect(Collectors.joining(" ")).substring(2)
              + "}";
      case Expression.Sum(var summands, _) ->
          "{"
              + summands.stream()
                  .map(s -> (s.subtracted() ? "- " : "+ ") + of(s.value()))
                  .collect(Collectors.joining(" "))
                  .substring(2)
              + "}";
      case Expression.Binder(var binding, var range, var body, _) ->
          "{" + binding + " over " + of(range) + " of " + of(body) + "}";
      case Expression.Matrix(var operator, var order, _) ->
          "{matrix " + of(operator) + " to " + of(order) + "}";
      case Expression.Family(var subject, _) -> "{family " + of(subject) + "}";
      case Expression.Solve(var equation, var conditions, _) ->
          "{solve "
              + of(equation)
              + conditions.stream().map(c -> "; " + of(c)).collect(Collectors.joining())
              + "}";
      case Expression.Carry(var law, var map, _) -> "{carry " + of(law) + " by " + of(map) + "}";
      case Expression.Recurrence(var subject, var exponential, _) ->
          "{recurrence " + (exponential ? "exponential " : "") + of(subject) + "}";
      case Expression.Clauses(var subject, var clauses, _) ->
          "{"
              + of(subject)
              + clauses.stream().map(c -> "; " + of(c)).collect(Collectors.joining())
              + "}";
    };
  }

  private static String of(Expression.Equation equation) {
    return of(equation.left()) + " = " + of(equation.right());
  }

  private static String of(Factor factor) {
    String joint =
        switch (factor.connective()) {
          case JUXTAPOSED -> factor.isArgument() ? "←" : "·";
          case TIMES -> "*";
          case DIVIDED -> "/";
          case COMPOSED -> "∘";
        };
    return joint + " " + of(factor.value());
  }

  private static String of(Suffix suffix) {
    return switch (suffix) {
      case Suffix.Prime _ -> "prime";
      case Suffix.Factorial _ -> "factorial";
      case Suffix.Falling(var index, _) -> "falling " + of(index);
      case Suffix.Rising(var index, _) -> "rising " + of(index);
      case Suffix.Raised(var exponent, _) -> "power " + of(exponent);
    };
  }

  private static String of(Clause clause) {
    return switch (clause) {
      case Clause.InPresentation(var presentation, _) -> "shown " + presentation;
      case Clause.InBasis(var basis, _) -> "in " + of(basis);
      case Clause.To(var order, _) -> "to order " + of(order);
      case Clause.Digits(var count, _) -> "to digits " + of(count);
      case Clause.For(var range, _) -> "for " + of(range);
      case Clause.At(var substitutions, _) ->
          substitutions.stream()
              .map(s -> s.variable().text() + " := " + of(s.value()))
              .collect(Collectors.joining(" and ", "at ", ""));
    };
  }

  private static String of(Condition condition) {
    return switch (condition) {
      case Condition.Comparison(var left, var relation, var right, _) ->
          "{" + of(left) + " " + relation + " " + of(right) + "}";
      case Condition.IsInteger(var subject, _) -> "{" + of(subject) + " is integer}";
    };
  }

  private static String of(Range range) {
    return range.variable().text() + " from " + of(range.lower()) + " to " + of(range.upper());
  }

  private static String all(List<Expression> expressions) {
    return expressions.stream().map(Outline::of).collect(Collectors.joining(", "));
  }

  private static String names(List<Identifier> names) {
    return names.isEmpty()
        ? ""
        : names.stream().map(Identifier::text).collect(Collectors.joining(", ", "(", ")"));
  }
}
