package gnomon.syntax;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayList;
import java.util.List;
import org.antlr.v4.runtime.Token;

/// An unexpected token in words.
final class Explanation {
  private static final int LONGEST_TOKEN = 24;

  private Explanation() {}

  /// The diagnostic for a token at which the grammar stopped, in a statement that begins with
  /// `first`.
  static Diagnostic of(Token first, Unexpected unexpected) {
    Token token = unexpected.token();
    Span span = Tokens.span(token);
    Diagnostic plain =
        token.getType() == Token.EOF
            ? Diagnostic.of("syntax-unfinished", "the statement ends too early", span)
            : byToken(first, token, span);
    List<String> evidence = new ArrayList<>(plain.evidence());
    String expected = Expectation.line(unexpected.expected());
    if (evidence.isEmpty() && !expected.isEmpty()) {
      evidence.add(expected);
    }
    nearStatement(first).stream()
        .findFirst()
        .ifPresent(word -> evidence.add("`" + first.getText() + "` is close to `" + word + "`."));
    return plain.withEvidence(evidence.toArray(String[]::new));
  }

  /// The statement words near to a first word that is none.
  static List<String> nearStatement(Token first) {
    return first.getType() == GnomonParser.NAME && !Vocabulary.isReserved(first.getText())
        ? Vocabulary.nearest(first.getText(), WordTable.STATEMENTS.stream().map(Word::ascii))
        : List.of();
  }

  private static Diagnostic byToken(Token first, Token token, Span span) {
    String shown = "`" + shown(token.getText()) + "`";
    return switch (token.getType()) {
      case GnomonParser.EQUALS -> equation(first, span);
      case GnomonParser.UNEQUAL,
          GnomonParser.LESS,
          GnomonParser.AT_MOST,
          GnomonParser.GREATER,
          GnomonParser.AT_LEAST ->
          Diagnostic.of(
                  "syntax-comparison",
                  shown + " stands only after given, or after the for of a claim",
                  span)
              .withEvidence("Comparisons are assumed; equations are claimed.");
      case GnomonParser.LET,
          GnomonParser.CLAIM,
          GnomonParser.GIVEN,
          GnomonParser.DROP,
          GnomonParser.VARY,
          GnomonParser.ARBITRARY,
          GnomonParser.UMBRA,
          GnomonParser.WHY,
          GnomonParser.NAMES,
          GnomonParser.KEEP,
          GnomonParser.REPLAY,
          GnomonParser.RECHECK,
          GnomonParser.RERECORD,
          GnomonParser.HELP,
          GnomonParser.LEAVE ->
          Diagnostic.of("syntax-unexpected", shown + " only begins a statement", span)
              .withEvidence("Each statement has a line of its own.");
      case GnomonParser.PRESENTATION, GnomonParser.PARTIAL, GnomonParser.FRACTIONS ->
          Diagnostic.of("syntax-unexpected", shown + " stands only after in", span);
      case GnomonParser.IN, GnomonParser.TO, GnomonParser.AT, GnomonParser.FOR ->
          Diagnostic.of("syntax-clause", "a clause cannot stand here", span)
              .withEvidence("Clauses stand at the end of a statement or of a parenthesis.");
      default -> Diagnostic.of("syntax-unexpected", shown + " cannot stand here", span);
    };
  }

  private static Diagnostic equation(Token first, Span span) {
    return switch (first.getType()) {
      case GnomonParser.LET, GnomonParser.CLAIM ->
          Diagnostic.of("syntax-unexpected", "`=` cannot stand here", span);
      default ->
          Diagnostic.of("syntax-equation", "an equation is not an expression", span)
              .withEvidence("An equation stands after claim, let, solve, with, at or given.");
    };
  }

  private static String shown(String token) {
    return token.length() > LONGEST_TOKEN ? token.substring(0, LONGEST_TOKEN - 1) + "…" : token;
  }
}
