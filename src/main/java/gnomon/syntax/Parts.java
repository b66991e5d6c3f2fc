package gnomon.syntax;

import gnomon.syntax.Expression.Binder;
import gnomon.syntax.Expression.Bracket;
import gnomon.syntax.Expression.Carry;
import gnomon.syntax.Expression.Clauses;
import gnomon.syntax.Expression.Family;
import gnomon.syntax.Expression.Handle;
import gnomon.syntax.Expression.Matrix;
import gnomon.syntax.Expression.Name;
import gnomon.syntax.Expression.Numeral;
import gnomon.syntax.Expression.OrderTerm;
import gnomon.syntax.Expression.Parenthesis;
import gnomon.syntax.Expression.Recurrence;
import gnomon.syntax.Expression.Sign;
import gnomon.syntax.Expression.Solve;
import gnomon.syntax.Expression.Suffixed;
import gnomon.syntax.Expression.Sum;
import gnomon.syntax.Expression.Term;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.stream.Stream;

/// The parts of a tree, without recursion.
public final class Parts {
  private Parts() {}

  /// The expressions that stand directly in `expression`, in the order of the text.
  public static List<Expression> of(Expression expression) {
    return switch (expression) {
      case Numeral _, Handle _ -> List.of();
      case Name name -> name.step().stream().toList();
      case Parenthesis(var items, _) -> items;
      case Bracket(var items, _) -> items;
      case OrderTerm(var bound, _) -> List.of(bound);
      case Suffixed(var atom, var suffixes, _) ->
          Stream.concat(Stream.of(atom), suffixes.stream().flatMap(Parts::ofSuffix)).toList();
      case Sign(var operand, _) -> List.of(operand);
      case Term(var factors, _) -> factors.stream().map(Factor::value).toList();
      case Sum(var summands, _) -> summands.stream().map(Expression.Summand::value).toList();
      case Binder(_, var range, var body, _) -> List.of(range.lower(), range.upper(), body);
      case Matrix(var operator, var order, _) -> List.of(operator, order);
      case Family(var subject, _) -> List.of(subject);
      case Carry(var law, var map, _) -> {
        List<Expression> parts = new ArrayList<>(of(law));
        parts.add(map);
        yield parts;
      }
      case Solve(var equation, var conditions, _) ->
          Stream.concat(Stream.of(equation), conditions.stream())
              .flatMap(each -> Stream.of(each.left(), each.right()))
              .toList();
      case Recurrence(var subject, _, _) -> List.of(subject);
      case Clauses(var subject, var clauses, _) ->
          Stream.concat(Stream.of(subject), clauses.stream().flatMap(Parts::ofClause)).toList();
    };
  }

  /// The expressions that stand directly in `statement`.
  public static List<Expression> of(Statement statement) {
    return switch (statement) {
      case Statement.ExpressionStatement(var expression, _) -> List.of(expression);
      case Statement.Let(_, _, var body, _) -> List.of(body);
      case Statement.Claim(var left, var right, var range, var conditions, _) -> {
        List<Expression> parts = new ArrayList<>(List.of(left, right));
        range.ifPresent(r -> parts.addAll(List.of(r.lower(), r.upper())));
        conditions.stream().flatMap(Parts::ofCondition).forEach(parts::add);
        yield parts;
      }
      case Statement.Given(var conditions, _) ->
          conditions.stream().flatMap(Parts::ofCondition).toList();
      case Statement.Umbra(_, var series, _) -> List.of(series);
      case Statement.Why(var handle, _) -> handle.<Expression>map(h -> h).stream().toList();
      case Statement.Drop _,
          Statement.DropGiven _,
          Statement.Vary _,
          Statement.Arbitrary _,
          Statement.Names _,
          Statement.Keep _,
          Statement.Replay _,
          Statement.Recheck _,
          Statement.Rerecord _,
          Statement.Help _,
          Statement.Leave _,
          Statement.Empty _ ->
          List.of();
    };
  }

  /// The number of parts on the longest way from the whole of `expressions` to an atom in it, or
  /// `limit` + 1 if it is more than `limit`.
  static int height(List<Expression> expressions, int limit) {
    record Part(Expression expression, int depth) {}
    Deque<Part> open = new ArrayDeque<>();
    expressions.forEach(expression -> open.push(new Part(expression, 1)));
    int height = 0;
    while (!open.isEmpty() && height <= limit) {
      Part part = open.pop();
      height = Math.max(height, part.depth());
      of(part.expression()).forEach(inner -> open.push(new Part(inner, part.depth() + 1)));
    }
    return height;
  }

  private static Stream<Expression> ofSuffix(Suffix suffix) {
    return switch (suffix) {
      case Suffix.Prime _, Suffix.Factorial _ -> Stream.empty();
      case Suffix.Falling(var index, _) -> Stream.of(index);
      case Suffix.Rising(var index, _) -> Stream.of(index);
      case Suffix.Raised(var exponent, _) -> Stream.of(exponent);
    };
  }

  private static Stream<Expression> ofClause(Clause clause) {
    return switch (clause) {
      case Clause.InPresentation _ -> Stream.empty();
      case Clause.InBasis(var basis, _) -> Stream.of(basis);
      case Clause.To(var order, _) -> Stream.of(order);
      case Clause.Digits(var count, _) -> Stream.of(count);
      case Clause.At(var substitutions, _) ->
          substitutions.stream().map(Clause.Substitution::value);
      case Clause.For(var range, _) -> Stream.of(range.lower(), range.upper());
    };
  }

  private static Stream<Expression> ofCondition(Condition condition) {
    return switch (condition) {
      case Condition.Comparison(var left, _, var right, _) -> Stream.of(left, right);
      case Condition.IsInteger(var subject, _) -> Stream.of(subject);
    };
  }
}
