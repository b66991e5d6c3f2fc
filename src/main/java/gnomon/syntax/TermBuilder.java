package gnomon.syntax;

import gnomon.diagnostic.Span;
import gnomon.syntax.Expression.Binder;
import gnomon.syntax.Expression.Binding;
import gnomon.syntax.Expression.Name;
import gnomon.syntax.Expression.Numeral;
import gnomon.syntax.Expression.OrderTerm;
import gnomon.syntax.Expression.Parenthesis;
import gnomon.syntax.Expression.Sign;
import gnomon.syntax.Expression.Suffixed;
import gnomon.syntax.Expression.Term;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.antlr.v4.runtime.Token;

/// Rows of factors: refuses doubtful writing, lets binders reach over the rest of their row, and
/// collects signs.
final class TermBuilder {
  private final ExpressionBuilder expressions;
  private final Mistakes mistakes;

  TermBuilder(ExpressionBuilder expressions, Mistakes mistakes) {
    this.expressions = expressions;
    this.mistakes = mistakes;
  }

  /// A factor as read: `head` is there for a binder, whose value comes later, else `value`.
  private record Piece(
      Connective connective,
      boolean negative,
      boolean touching,
      Optional<Head> head,
      Optional<Expression> factor,
      Span span) {
    boolean startsWithParenthesis() {
      return factor.filter(f -> atomOf(f) instanceof Parenthesis).isPresent();
    }

    boolean isPlainNumeral() {
      return factor.filter(f -> f instanceof Numeral).isPresent();
    }

    Expression value() {
      return factor.orElseThrow();
    }
  }

  private record Head(Binding binding, Range range) {}

  Expression term(GnomonParser.TermContext context) {
    List<Piece> pieces = pieces(context);
    for (int at = 0; at < pieces.size(); at++) {
      refuseRowAlone(pieces, at);
    }
    refuseDoubtful(pieces);
    return signed(fold(joinOrderTerms(pieces)), ExpressionBuilder.span(context));
  }

  private List<Piece> pieces(GnomonParser.TermContext context) {
    List<Piece> pieces = new ArrayList<>();
    pieces.add(
        piece(
            Connective.JUXTAPOSED,
            ExpressionBuilder.isNegative(context.signs()),
            false,
            context.factor()));
    Token last = context.factor().getStop();
    for (GnomonParser.JoinedContext joined : context.joined()) {
      boolean touching = Tokens.touch(last, joined.getStart());
      boolean negative = joined.signs() != null && ExpressionBuilder.isNegative(joined.signs());
      pieces.add(piece(connective(joined), negative, touching, joined.factor()));
      last = joined.getStop();
    }
    return pieces;
  }

  private static Connective connective(GnomonParser.JoinedContext joined) {
    if (joined.TIMES() != null) {
      return Connective.TIMES;
    }
    if (joined.DIVIDED() != null) {
      return Connective.DIVIDED;
    }
    return joined.OF() != null ? Connective.COMPOSED : Connective.JUXTAPOSED;
  }

  private Piece piece(
      Connective connective,
      boolean negative,
      boolean touching,
      GnomonParser.FactorContext factor) {
    Span span = ExpressionBuilder.span(factor);
    boolean beside = touching && connective == Connective.JUXTAPOSED;
    if (factor.power() != null) {
      Expression power = expressions.power(factor.power());
      return new Piece(connective, negative, beside, Optional.empty(), Optional.of(power), span);
    }
    Head head =
        new Head(
            binding(Vocabulary.ascii(factor.BINDER().getText())),
            expressions.range(factor.range()));
    return new Piece(connective, negative, beside, Optional.of(head), Optional.empty(), span);
  }

  private static Binding binding(String word) {
    return switch (word) {
      case "Sigma" -> Binding.SUM;
      case "Integral" -> Binding.INTEGRAL;
      case "Prod" -> Binding.PRODUCT;
      default -> throw new IllegalStateException("binds nothing: " + word);
    };
  }

  /// Whether the piece is an argument: a parenthesis directly against a factor that is no binder.
  private static boolean isArgument(List<Piece> pieces, int at) {
    return at > 0
        && pieces.get(at).touching()
        && pieces.get(at).startsWithParenthesis()
        && pieces.get(at - 1).head().isEmpty();
  }

  private void refuseRowAlone(List<Piece> pieces, int at) {
    Piece piece = pieces.get(at);
    if (piece.factor().isPresent()
        && atomOf(piece.value()) instanceof Parenthesis row
        && row.items().size() > 1
        && !isArgument(pieces, at)) {
      boolean afterName =
          at > 0
              && piece.connective() == Connective.JUXTAPOSED
              && pieces.get(at - 1).factor().orElse(null) instanceof Name;
      int gap = afterName ? pieces.get(at - 1).span().end() : row.span().start();
      throw mistakes.rowAlone(row.span(), new Span(gap, row.span().start()));
    }
  }

  /// Refuses `1/2x`, `2 3` and `e^sin(x)`. A divisor goes on through its arguments.
  private void refuseDoubtful(List<Piece> pieces) {
    int divisor = -1;
    for (int at = 1; at < pieces.size(); at++) {
      Piece before = pieces.get(at - 1);
      Piece piece = pieces.get(at);
      boolean argument = isArgument(pieces, at);
      if (divisor > 0 && piece.touching() && (!argument || before.isPlainNumeral())) {
        Span over = pieces.get(divisor).span().to(before.span());
        Span numerator = pieces.getFirst().span().to(pieces.get(divisor - 1).span());
        throw mistakes.doubtfulQuotient(numerator, over, touchingRun(pieces, at));
      }
      if (piece.connective() == Connective.DIVIDED) {
        divisor = at;
      } else if (!argument) {
        divisor = -1;
      }
      if (before.isPlainNumeral()
          && piece.connective() == Connective.JUXTAPOSED
          && piece.factor().filter(f -> atomOf(f) instanceof Numeral).isPresent()) {
        throw mistakes.numbersSideBySide(before.span(), piece.span());
      }
      if (piece.startsWithParenthesis()
          && piece.connective() == Connective.JUXTAPOSED
          && before.factor().isPresent()) {
        refuseFunctionAsExponent(before.value(), piece.span());
      }
    }
  }

  private static Span touchingRun(List<Piece> pieces, int from) {
    int last = from;
    while (last + 1 < pieces.size() && pieces.get(last + 1).touching()) {
      last++;
    }
    return pieces.get(from).span().to(pieces.get(last).span());
  }

  private void refuseFunctionAsExponent(Expression before, Span argument) {
    if (before instanceof Suffixed
        && rightmost(before) instanceof Name name
        && Vocabulary.find(name.text()).filter(TermBuilder::needsArgument).isPresent()) {
      throw mistakes.functionAsExponent(name.span(), argument);
    }
  }

  /// What stands at the right end of a factor: the innermost exponent or index, if it ends so.
  private static Expression rightmost(Expression factor) {
    Expression last = factor;
    while (true) {
      if (last instanceof Sign(Expression operand, _)) {
        last = operand;
      } else if (last instanceof Suffixed suffixed) {
        switch (suffixed.suffixes().getLast()) {
          case Suffix.Raised(var exponent, _) -> last = exponent;
          case Suffix.Falling(var index, _) -> last = index;
          case Suffix.Rising(var index, _) -> last = index;
          case Suffix.Prime _, Suffix.Factorial _ -> {
            return last;
          }
        }
      } else {
        return last;
      }
    }
  }

  private static boolean needsArgument(Word word) {
    return word.sort() == Word.Sort.FUNCTION;
  }

  /// Makes one factor of `O` and the parenthesis against it.
  private static List<Piece> joinOrderTerms(List<Piece> pieces) {
    List<Piece> joined = new ArrayList<>();
    for (int at = 0; at < pieces.size(); at++) {
      Piece piece = pieces.get(at);
      if (isArgument(pieces, at)
          && pieces.get(at - 1).value() instanceof Name name
          && name.isPlain()
          && name.text().equals("O")
          && atomOf(piece.value()) instanceof Parenthesis(List<Expression> items, Span inside)
          && items.size() == 1) {
        Piece before = joined.removeLast();
        OrderTerm order = new OrderTerm(items.getFirst(), name.span().to(inside));
        Expression value =
            piece.value() instanceof Suffixed(_, List<Suffix> suffixes, Span end)
                ? new Suffixed(order, suffixes, name.span().to(end))
                : order;
        joined.add(
            new Piece(
                before.connective(),
                before.negative(),
                before.touching(),
                Optional.empty(),
                Optional.of(value),
                value.span()));
      } else {
        joined.add(piece);
      }
    }
    return joined;
  }

  /// The row from the right: what stands after a binder becomes its body.
  private Folded fold(List<Piece> pieces) {
    Deque<Factor> row = new ArrayDeque<>();
    boolean negative = false;
    for (int at = pieces.size() - 1; at >= 0; at--) {
      Piece piece = pieces.get(at);
      Expression value =
          piece.head().isPresent()
              ? binder(piece, new Folded(List.copyOf(row), negative))
              : piece.value();
      if (piece.head().isPresent()) {
        row = new ArrayDeque<>();
        negative = false;
      }
      Connective connective = at == 0 ? Connective.JUXTAPOSED : piece.connective();
      row.addFirst(new Factor(connective, isArgument(pieces, at), value));
      negative ^= piece.negative();
    }
    return new Folded(List.copyOf(row), negative);
  }

  private record Folded(List<Factor> row, boolean negative) {}

  private Binder binder(Piece piece, Folded rest) {
    Head head = piece.head().orElseThrow();
    List<Factor> row = rest.row();
    if (row.isEmpty() || row.getFirst().connective() != Connective.JUXTAPOSED) {
      throw mistakes.binderWithoutBody(piece.span());
    }
    Span inside = row.getFirst().value().span().to(row.getLast().value().span());
    Expression body = signed(rest, inside);
    Expression whole = body instanceof Sign ? new Parenthesis(List.of(body), inside) : body;
    return new Binder(head.binding(), head.range(), whole, piece.span().to(inside));
  }

  private static Expression signed(Folded folded, Span span) {
    List<Factor> row = folded.row();
    Span inside = row.getFirst().value().span().to(row.getLast().value().span());
    Expression term = row.size() == 1 ? row.getFirst().value() : new Term(row, inside);
    return folded.negative() ? new Sign(term, span) : term;
  }

  private static Expression atomOf(Expression value) {
    return value instanceof Suffixed suffixed ? suffixed.atom() : value;
  }
}
