package gnomon.syntax;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.antlr.v4.runtime.CommonToken;
import org.antlr.v4.runtime.Token;

/// What is checked on the tokens before any grammar: foreign characters, brackets that match and
/// are not too deep, one statement only. The parser then never sees a bracket astray, and its
/// recursion is bounded.
final class Guard {
  private final String text;
  private final Deque<Token> open = new ArrayDeque<>();

  private Guard(String text) {
    this.text = text;
  }

  /// What to say when no line follows, if the tokens ask for one.
  ///
  /// @throws DiagnosedException if no line that follows can make them a statement
  static Optional<Diagnostic> unfinished(String text, List<CommonToken> tokens) {
    Guard guard = new Guard(text);
    Token before = null;
    boolean help = !tokens.isEmpty() && tokens.getFirst().getType() == GnomonParser.HELP;
    for (Token token : tokens) {
      guard.checkLine(before, token);
      if (!help) {
        guard.check(token);
      }
      before = token;
    }
    if (!guard.open.isEmpty()) {
      Span place = Tokens.span(guard.open.peek());
      return Optional.of(Diagnostic.of("syntax-bracket", "this bracket is not closed", place));
    }
    return help ? Optional.empty() : Optional.ofNullable(before).flatMap(Guard::trailing);
  }

  private static Optional<Diagnostic> trailing(Token last) {
    return Tokens.carriesOver(last)
        ? Optional.of(
            Diagnostic.of(
                "syntax-unfinished", "nothing follows `" + last.getText() + "`", Tokens.span(last)))
        : Optional.empty();
  }

  private void checkLine(
      org.antlr.v4.runtime.@org.jspecify.annotations.Nullable Token before, Token token) {
    if (before != null
        && open.isEmpty()
        && token.getLine() > before.getLine()
        && !Tokens.carriesOver(before)) {
      throw new DiagnosedException(
          Diagnostic.of(
                  "syntax-line",
                  "a second line begins here, but the first is whole",
                  Tokens.span(token))
              .withEvidence("An open bracket or a trailing operator carries a statement over."));
    }
  }

  private void check(Token token) {
    if (token.getType() == GnomonParser.OTHER) {
      throw foreign(token);
    }
    if (Tokens.opens(token)) {
      open.push(token);
      if (open.size() > Limits.NESTING) {
        throw new DiagnosedException(
            Diagnostic.of("limit-nesting", "brackets are nested too deeply", Tokens.span(token))
                .withEvidence("The limit is " + Limits.NESTING + " brackets inside one another.")
                .withHint("let part = x^2 + 1"));
      }
    } else if (Tokens.closes(token)) {
      close(token);
    }
  }

  private void close(Token token) {
    if (open.isEmpty()) {
      throw new DiagnosedException(
          Diagnostic.of(
              "syntax-bracket",
              "`" + token.getText() + "` closes a bracket that is not open",
              Tokens.span(token)));
    }
    Token opening = open.pop();
    boolean round = opening.getType() == GnomonParser.OPEN;
    if (round != (token.getType() == GnomonParser.CLOSE)) {
      throw new DiagnosedException(
          Diagnostic.of(
              "syntax-bracket",
              "`" + opening.getText() + "` is closed by `" + token.getText() + "`",
              Tokens.span(token)));
    }
  }

  private DiagnosedException foreign(Token token) {
    Span span = Tokens.span(token);
    int codePoint = text.codePointAt(span.start());
    Span whole = new Span(span.start(), span.start() + Character.charCount(codePoint));
    if (codePoint == '"') {
      return new DiagnosedException(
          Diagnostic.of("syntax-quotation", "this quotation has no end on its line", whole));
    }
    if (codePoint == '.') {
      return new DiagnosedException(
          Diagnostic.of("syntax-character", "a lone point means nothing", whole)
              .withEvidence("A decimal point has digits on both sides; a range has two points."));
    }
    String name =
        Character.isSurrogate((char) codePoint)
                || Character.isISOControl(codePoint)
                || !Character.isDefined(codePoint)
            ? String.format("U+%04X", codePoint)
            : "`" + Character.toString(codePoint) + "`";
    return new DiagnosedException(
        Diagnostic.of("syntax-character", "the character " + name + " means nothing here", whole));
  }
}
