package gnomon.syntax;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.antlr.v4.runtime.CommonToken;
import org.antlr.v4.runtime.CommonTokenStream;
import org.antlr.v4.runtime.ListTokenSource;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.atn.PredictionMode;

/// One try at reading a statement, without a line to try instead.
final class Attempt {
  private Attempt() {}

  static Reading at(String text) {
    if (text.length() > Limits.LENGTH) {
      return new Reading.Rejected(tooLong(text));
    }
    try {
      return attempt(text, Tokens.visible(text));
    } catch (DiagnosedException exception) {
      return new Reading.Rejected(exception.diagnostic());
    }
  }

  private static Reading attempt(String text, List<CommonToken> tokens) {
    Optional<Diagnostic> unfinished = Guard.unfinished(text, tokens);
    List<CommonToken> marked = new ArrayList<>(Marking.of(tokens));
    marked.add(end(text));
    try {
      return new Reading.Understood(build(text, marked));
    } catch (Unexpected unexpected) {
      return unfinished.isPresent() && unexpected.token().getType() == Token.EOF
          ? new Reading.Unfinished(unfinished.get())
          : new Reading.Rejected(Explanation.of(marked.getFirst(), unexpected));
    }
  }

  /// SLL prediction is exact here: all decisions but one need a single token, and what follows the
  /// comma after `at` tells that one apart in every context.
  private static GnomonParser.StatementContext parse(List<CommonToken> tokens) {
    GnomonParser parser = new GnomonParser(new CommonTokenStream(new ListTokenSource(tokens)));
    parser.removeErrorListeners();
    parser.setErrorHandler(new Unexpected.Strategy());
    parser.getInterpreter().setPredictionMode(PredictionMode.SLL);
    return parser.statement();
  }

  /// Every part of a tree has a token of its own, so that few tokens need no look at the height.
  private static Statement build(String text, List<CommonToken> tokens) {
    Statement statement = new StatementBuilder(text).statement(parse(tokens));
    if (tokens.size() > Limits.HEIGHT
        && Parts.height(Parts.of(statement), Limits.HEIGHT) > Limits.HEIGHT) {
      throw new Mistakes(text).tooDeep(statement.span());
    }
    return statement;
  }

  private static CommonToken end(String text) {
    CommonToken end = new CommonToken(Token.EOF, "");
    end.setStartIndex(text.stripTrailing().length());
    end.setStopIndex(end.getStartIndex() - 1);
    return end;
  }

  private static Diagnostic tooLong(String text) {
    return Diagnostic.of("limit-length", "this statement is too long", Span.at(0))
        .withEvidence(text.length() + " characters; the limit is " + Limits.LENGTH + ".")
        .withHint("let part = x^2 + 1");
  }
}
