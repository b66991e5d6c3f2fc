package gnomon.syntax;

import gnomon.diagnostic.Span;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.antlr.v4.runtime.Token;

/// Parse trees of statements to our own.
final class StatementBuilder {
  private final String text;
  private final Mistakes mistakes;
  private final ExpressionBuilder expressions;

  StatementBuilder(String text) {
    this.text = text;
    this.mistakes = new Mistakes(text);
    this.expressions = new ExpressionBuilder(mistakes);
  }

  /// @throws gnomon.diagnostic.DiagnosedException for what the grammar lets through but the
  ///   language does not
  Statement statement(GnomonParser.StatementContext context) {
    if (context.getStart().getType() == Token.EOF) {
      return new Statement.Empty(Tokens.span(context.getStart()));
    }
    Span span = Tokens.span(context.getStart(), lastOf(context));
    if (context.value() != null) {
      return new Statement.ExpressionStatement(expressions.value(context.value()), span);
    }
    if (context.let() != null) {
      return let(context.let(), span);
    }
    if (context.claim() != null) {
      return claim(context.claim(), span);
    }
    if (context.given() != null) {
      return given(context.given(), span);
    }
    if (context.why() != null) {
      return new Statement.Why(
          Optional.ofNullable(context.why().HANDLE())
              .map(node -> expressions.handle(node.getSymbol())),
          span);
    }
    return context.file() != null ? file(context.file(), span) : plain(context, span);
  }

  private static Token lastOf(GnomonParser.StatementContext context) {
    return ((org.antlr.v4.runtime.ParserRuleContext) context.getChild(0)).getStop();
  }

  private Statement plain(GnomonParser.StatementContext context, Span span) {
    if (context.drop() != null) {
      return context.drop().GIVEN() != null
          ? new Statement.DropGiven(span)
          : new Statement.Drop(distinct(identifiers(context.drop().identifier())), span);
    }
    if (context.vary() != null) {
      return new Statement.Vary(free(expressions.identifier(context.vary().identifier())), span);
    }
    if (context.arbitrary() != null) {
      List<Identifier> names = distinct(identifiers(context.arbitrary().identifier()));
      names.forEach(this::free);
      return new Statement.Arbitrary(names, span);
    }
    if (context.umbra() != null) {
      List<Identifier> letters = distinct(identifiers(context.umbra().identifier()));
      letters.forEach(this::free);
      return new Statement.Umbra(letters, expressions.sum(context.umbra().sum()), span);
    }
    if (context.names() != null) {
      return new Statement.Names(span);
    }
    return context.help() != null
        ? new Statement.Help(topic(context.help(), span), span)
        : new Statement.Leave(span);
  }

  private Optional<String> topic(GnomonParser.HelpContext help, Span span) {
    int from = Tokens.span(help.HELP().getSymbol()).end();
    String topic = text.substring(from, span.end()).strip();
    return topic.isEmpty() ? Optional.empty() : Optional.of(Vocabulary.ascii(topic));
  }

  private Statement let(GnomonParser.LetContext context, Span span) {
    List<Identifier> names = identifiers(context.identifier());
    Identifier name = free(names.getFirst());
    List<Identifier> parameters = distinct(names.subList(1, names.size()));
    return new Statement.Let(name, parameters, expressions.value(context.value()), span);
  }

  private Statement claim(GnomonParser.ClaimContext context, Span span) {
    return new Statement.Claim(
        expressions.sum(context.sum(0)),
        expressions.sum(context.sum(1)),
        Optional.ofNullable(context.range()).map(expressions::range),
        conditions(context.condition()),
        span);
  }

  private Statement given(GnomonParser.GivenContext context, Span span) {
    return new Statement.Given(conditions(context.condition()), span);
  }

  private List<Condition> conditions(List<GnomonParser.ConditionContext> contexts) {
    List<Condition> conditions = new ArrayList<>();
    for (GnomonParser.ConditionContext condition : contexts) {
      List<Expression> sides = new ArrayList<>();
      condition.sum().forEach(sum -> sides.add(expressions.sum(sum)));
      if (condition.INTEGER() != null) {
        conditions.add(
            new Condition.IsInteger(sides.getFirst(), ExpressionBuilder.span(condition)));
      }
      for (int at = 0; at < condition.relation().size(); at++) {
        Expression left = sides.get(at);
        Expression right = sides.get(at + 1);
        Condition.Relation relation = relation(condition.relation(at));
        conditions.add(
            new Condition.Comparison(left, relation, right, left.span().to(right.span())));
      }
    }
    return conditions;
  }

  private static Condition.Relation relation(GnomonParser.RelationContext context) {
    for (Condition.Relation relation : Condition.Relation.values()) {
      if (relation.ascii().equals(Vocabulary.ascii(context.getText()))) {
        return relation;
      }
    }
    throw new IllegalStateException("a relation of no sort: " + context.getText());
  }

  private static Statement file(GnomonParser.FileContext context, Span span) {
    String quoted = context.STRING().getText();
    String file = quoted.substring(1, quoted.length() - 1);
    return switch (context.getStart().getType()) {
      case GnomonParser.KEEP -> new Statement.Keep(file, span);
      case GnomonParser.REPLAY -> new Statement.Replay(file, span);
      case GnomonParser.RECHECK -> new Statement.Recheck(file, span);
      case GnomonParser.RERECORD -> new Statement.Rerecord(file, span);
      default -> throw new IllegalStateException("a file statement: " + context.getText());
    };
  }

  private List<Identifier> identifiers(List<GnomonParser.IdentifierContext> contexts) {
    List<Identifier> identifiers = new ArrayList<>();
    contexts.forEach(context -> identifiers.add(expressions.identifier(context)));
    return identifiers;
  }

  private Identifier free(Identifier name) {
    if (Vocabulary.isReserved(name.text())) {
      throw mistakes.reserved(name);
    }
    return name;
  }

  private List<Identifier> distinct(List<Identifier> names) {
    Set<String> seen = new HashSet<>();
    for (Identifier name : names) {
      if (!seen.add(name.text())) {
        throw mistakes.repeated(name);
      }
    }
    return names;
  }
}
