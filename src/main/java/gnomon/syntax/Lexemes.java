package gnomon.syntax;

import gnomon.diagnostic.Span;
import gnomon.syntax.Lexeme.Role;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.antlr.v4.runtime.Token;

/// Text to lexemes, for colours, bracket matching and completion. Never fails.
public final class Lexemes {
  private Lexemes() {}

  /// The lexemes of `text` in order, spaces left out.
  public static List<Lexeme> of(String text) {
    List<Lexeme> lexemes = new ArrayList<>();
    for (Token token : Tokens.all(text)) {
      if (token.getType() != GnomonParser.SPACE) {
        lexemes.add(new Lexeme(Tokens.span(token), role(token), token.getText()));
      }
    }
    return lexemes;
  }

  /// The bracket that belongs to the bracket at `offset`, if there is one on both sides.
  public static Optional<Span> partner(List<Lexeme> lexemes, int offset) {
    Deque<Lexeme> open = new ArrayDeque<>();
    for (Lexeme lexeme : lexemes) {
      if (lexeme.role() == Role.OPEN) {
        open.push(lexeme);
      } else if (lexeme.role() == Role.CLOSE && !open.isEmpty()) {
        Lexeme opening = open.pop();
        boolean matches = opening.text().equals("(") == lexeme.text().equals(")");
        if (matches && opening.span().start() == offset) {
          return Optional.of(lexeme.span());
        }
        if (matches && lexeme.span().start() == offset) {
          return Optional.of(opening.span());
        }
      }
    }
    return Optional.empty();
  }

  /// The lexeme that ends at `caret` or holds it, if it is a word: what completion completes.
  public static Optional<Lexeme> wordAt(String text, int caret) {
    return of(text).stream()
        .filter(lexeme -> lexeme.span().start() < caret && caret <= lexeme.span().end())
        .filter(lexeme -> Character.isLetter(lexeme.text().codePointAt(0)))
        .findFirst();
  }

  private static Role role(Token token) {
    return switch (token.getType()) {
      case GnomonParser.NUMBER -> Role.NUMBER;
      case GnomonParser.SUBSCRIPT -> Role.NAME;
      case GnomonParser.OPEN, GnomonParser.OPEN_BRACKET -> Role.OPEN;
      case GnomonParser.CLOSE, GnomonParser.CLOSE_BRACKET -> Role.CLOSE;
      case GnomonParser.HANDLE -> Role.HANDLE;
      case GnomonParser.STRING -> Role.STRING;
      case GnomonParser.COMMENT -> Role.COMMENT;
      case GnomonParser.OTHER -> Role.FOREIGN;
      case GnomonParser.NAME, GnomonParser.GLYPH -> named(token.getText(), Role.NAME);
      default -> named(token.getText(), Role.SIGN);
    };
  }

  private static Role named(String text, Role otherwise) {
    return Vocabulary.find(text).map(Word::sort).map(Lexemes::role).orElse(otherwise);
  }

  private static Role role(Word.Sort sort) {
    return switch (sort) {
      case OPERATOR -> Role.OPERATOR;
      case FUNCTION -> Role.FUNCTION;
      case CONSTANT -> Role.CONSTANT;
      case STATEMENT -> Role.STATEMENT;
      case CLAUSE -> Role.CLAUSE;
      case SIGN -> Role.SIGN;
    };
  }
}
