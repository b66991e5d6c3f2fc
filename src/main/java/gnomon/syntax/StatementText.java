package gnomon.syntax;

import gnomon.diagnostic.Span;
import java.util.List;

/// Trees to text. What is written here reads back as the same tree, places aside.
public final class StatementText {
  private StatementText() {}

  /// An expression in the spelling asked for.
  public static String of(Expression expression, Spelling spelling) {
    return new TreeText(spelling).add(expression).toString();
  }

  /// A statement in the spelling asked for.
  public static String of(Statement statement, Spelling spelling) {
    TreeText text = new TreeText(spelling);
    switch (statement) {
      case Statement.ExpressionStatement(var expression, _) -> text.add(expression);
      case Statement.Let(var name, var parameters, var body, _) -> {
        text.add("let ").word(name.text());
        if (!parameters.isEmpty()) {
          names(text.add("("), parameters).add(")");
        }
        text.add(" = ").add(body);
      }
      case Statement.Claim(var left, var right, var range, var conditions, _) -> {
        text.add("claim ").add(left).add(" = ").add(right);
        range.ifPresent(r -> text.add(" for ").range(r));
        if (!conditions.isEmpty()) {
          conditions(text.add(" for "), conditions);
        }
      }
      case Statement.Given(var conditions, _) -> conditions(text.add("given "), conditions);
      case Statement.Drop(var names, _) -> names(text.add("drop "), names);
      case Statement.DropGiven _ -> text.add("drop given");
      case Statement.Vary(var variable, _) -> text.add("vary ").word(variable.text());
      case Statement.Arbitrary(var names, _) -> names(text.add("arbitrary "), names);
      case Statement.Umbra(var letters, var series, _) ->
          names(text.add("umbra "), letters).add(" with ").add(series);
      case Statement.Why(var handle, _) -> {
        text.add("why");
        handle.ifPresent(h -> text.add(" ").add(h));
      }
      case Statement.Names _ -> text.add("names");
      case Statement.Keep(var file, _) -> text.add("keep \"" + file + "\"");
      case Statement.Replay(var file, _) -> text.add("replay \"" + file + "\"");
      case Statement.Recheck(var file, _) -> text.add("recheck \"" + file + "\"");
      case Statement.Rerecord(var file, _) -> text.add("rerecord \"" + file + "\"");
      case Statement.Help(var topic, _) -> {
        text.add("help");
        topic.ifPresent(t -> text.add(" ").word(t));
      }
      case Statement.Leave _ -> text.add("leave");
      case Statement.Empty _ -> text.add("");
    }
    return text.toString();
  }

  /// Conditions, separated by commas.
  public static String of(List<Condition> conditions, Spelling spelling) {
    TreeText text = new TreeText(spelling);
    conditions(text, conditions);
    return text.toString();
  }

  private static TreeText names(TreeText text, List<Identifier> names) {
    String gap = "";
    for (Identifier name : names) {
      text.add(gap).word(name.text());
      gap = ", ";
    }
    return text;
  }

  private static void conditions(TreeText text, List<Condition> conditions) {
    String gap = "";
    for (Condition condition : conditions) {
      text.add(gap);
      switch (condition) {
        case Condition.Comparison(var left, var relation, var right, Span _) ->
            text.add(left).add(" ").word(relation.ascii()).add(" ").add(right);
        case Condition.IsInteger(var subject, Span _) -> text.add(subject).add(" integer");
      }
      gap = ", ";
    }
  }
}
