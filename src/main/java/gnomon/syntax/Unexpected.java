package gnomon.syntax;

import org.antlr.v4.runtime.DefaultErrorStrategy;
import org.antlr.v4.runtime.Parser;
import org.antlr.v4.runtime.ParserRuleContext;
import org.antlr.v4.runtime.RecognitionException;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.misc.IntervalSet;

/// Stops at the first token that the grammar cannot go on with, and tells what it could.
final class Unexpected extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Token token;
  private final transient IntervalSet expected;

  private Unexpected(Token token, IntervalSet expected) {
    super(token.getText(), null, false, false);
    this.token = token;
    this.expected = expected;
  }

  /// The token.
  Token token() {
    return token;
  }

  /// The types of the tokens that could stand in its place.
  IntervalSet expected() {
    return expected;
  }

  /// The strategy that throws this. It remembers where the parser first stood at the token that
  /// turns out wrong: by the time that shows, the rules that could have gone on are often left.
  static final class Strategy extends DefaultErrorStrategy {
    private int seen = -1;
    private int state;
    private ParserRuleContext context = new ParserRuleContext();

    @Override
    public void sync(Parser parser) {
      int index = parser.getInputStream().index();
      if (index != seen) {
        seen = index;
        state = parser.getState();
        context = parser.getContext();
      }
    }

    @Override
    public void reportError(Parser parser, RecognitionException exception) {
      throw unexpected(parser, exception.getOffendingToken());
    }

    @Override
    public void recover(Parser parser, RecognitionException exception) {
      throw unexpected(parser, exception.getOffendingToken());
    }

    @Override
    public Token recoverInline(Parser parser) {
      throw unexpected(parser, parser.getCurrentToken());
    }

    private Unexpected unexpected(Parser parser, Token token) {
      IntervalSet expected = new IntervalSet(parser.getExpectedTokens());
      if (seen == token.getTokenIndex()) {
        expected.addAll(parser.getATN().getExpectedTokens(state, context));
      }
      return new Unexpected(token, expected);
    }
  }
}
