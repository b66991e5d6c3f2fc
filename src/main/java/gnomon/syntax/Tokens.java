package gnomon.syntax;

import gnomon.diagnostic.Span;
import gnomon.syntax.grammar.GnomonLexer;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.antlr.v4.runtime.CommonToken;
import org.antlr.v4.runtime.Token;

/// Text to tokens.
final class Tokens {
  /// The tokens after which a line carries over to the next.
  private static final Set<Integer> CARRYING =
      Set.of(
          GnomonParser.PLUS,
          GnomonParser.MINUS,
          GnomonParser.TIMES,
          GnomonParser.DIVIDED,
          GnomonParser.OF,
          GnomonParser.RAISED,
          GnomonParser.FALLING,
          GnomonParser.RISING,
          GnomonParser.EQUALS,
          GnomonParser.UNEQUAL,
          GnomonParser.LESS,
          GnomonParser.AT_MOST,
          GnomonParser.GREATER,
          GnomonParser.AT_LEAST,
          GnomonParser.COMMA,
          GnomonParser.COLON,
          GnomonParser.DOTS);

  private Tokens() {}

  /// All tokens of `text`, hidden ones too, without the end.
  static List<CommonToken> all(String text) {
    GnomonLexer lexer = new GnomonLexer(new TextStream(text));
    lexer.removeErrorListeners();
    List<CommonToken> tokens = new ArrayList<>();
    for (Token next = lexer.nextToken(); next.getType() != Token.EOF; next = lexer.nextToken()) {
      tokens.add((CommonToken) next);
    }
    return tokens;
  }

  /// The tokens of `text` that the grammar sees, without the end.
  static List<CommonToken> visible(String text) {
    List<CommonToken> tokens = all(text);
    tokens.removeIf(token -> token.getChannel() != Token.DEFAULT_CHANNEL);
    return tokens;
  }

  /// Whether a line that ends with this token carries over to the next.
  static boolean carriesOver(Token token) {
    return CARRYING.contains(token.getType());
  }

  /// Whether the token opens a bracket.
  static boolean opens(Token token) {
    return switch (token.getType()) {
      case GnomonParser.OPEN, GnomonParser.OPEN_BRACKET, GnomonParser.STEP -> true;
      default -> false;
    };
  }

  /// Whether the token closes a bracket.
  static boolean closes(Token token) {
    return token.getType() == GnomonParser.CLOSE || token.getType() == GnomonParser.CLOSE_BRACKET;
  }

  /// The place of a token; the end of the text is an empty span.
  static Span span(Token token) {
    int start = Math.max(0, token.getStartIndex());
    return new Span(start, Math.max(start, token.getStopIndex() + 1));
  }

  /// From the first token to the last.
  static Span span(Token first, Token last) {
    return last.getStopIndex() < first.getStartIndex()
        ? Span.at(first.getStartIndex())
        : span(first).to(span(last));
  }

  /// Whether nothing stands between two tokens.
  static boolean touch(Token left, Token right) {
    return left.getStopIndex() + 1 == right.getStartIndex();
  }
}
