package gnomon.syntax;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.syntax.grammar.GnomonParser;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.antlr.v4.runtime.CommonToken;

/// Finds a line to try instead of a mistaken one: small changes at the mistake, of which the first
/// that reads is offered; the page of the statement's word if none does.
final class Repairs {
  private static final int LONGEST = 200;

  /// Characters of other alphabets and habits, and what they are here.
  private static final Map<String, List<String>> FOREIGN =
      Map.ofEntries(
          Map.entry("{", List.of("(", "[")),
          Map.entry("}", List.of(")", "]")),
          Map.entry("²", List.of("^2")),
          Map.entry("³", List.of("^3")),
          Map.entry("÷", List.of("/")),
          Map.entry("–", List.of("-")),
          Map.entry("—", List.of("-")),
          Map.entry("“", List.of("\"")),
          Map.entry("”", List.of("\"")),
          Map.entry("√", List.of("sqrt ", "sqrt")),
          Map.entry("\\", List.of("", "/")),
          Map.entry(".", List.of("..", "*", ".0", "")),
          Map.entry("_", List.of("")));

  private Repairs() {}

  /// The same diagnostic with a line to try.
  static Diagnostic hinted(String text, Diagnostic diagnostic) {
    if (diagnostic.hint().filter(Repairs::reads).isPresent()) {
      return diagnostic;
    }
    List<CommonToken> tokens = text.length() > LONGEST ? List.of() : Tokens.visible(text);
    return Stream.concat(candidates(text, diagnostic, tokens), Stream.of(page(text)))
        .map(line -> line.replaceAll("\\s*[\\r\\n]+\\s*| {2,}", " ").strip())
        .filter(line -> !line.contains("#") && reads(line))
        .findFirst()
        .map(diagnostic::withHint)
        .orElse(diagnostic);
  }

  private static Stream<String> candidates(
      String text, Diagnostic diagnostic, List<CommonToken> tokens) {
    if (tokens.isEmpty()) {
      return Stream.empty();
    }
    Span span = diagnostic.span();
    String at = text.substring(span.start(), span.end());
    String head = text.substring(0, span.start());
    String tail = text.substring(span.end());
    Stream<String> general =
        Stream.concat(
            Stream.of(" = ", ": ", "..", ", ", " fractions ", " to ")
                .map(word -> head.stripTrailing() + word + at + tail),
            Stream.of(head + tail));
    Stream<String> special =
        switch (diagnostic.code()) {
          case "syntax-equation" -> Stream.of("let " + text, "claim " + text);
          case "syntax-character" ->
              Stream.concat(
                  Stream.of(translated(text)),
                  FOREIGN.getOrDefault(at, List.of("", "*")).stream()
                      .map(sign -> head + sign + tail));
          case "syntax-bracket" ->
              Stream.of(
                  text.stripTrailing() + ")", text.stripTrailing() + "]", head + other(at) + tail);
          case "syntax-quotation" -> Stream.of(text + "\"");
          case "syntax-line" -> Stream.of(head);
          case "syntax-comparison" -> Stream.of("given " + text);
          case "syntax-binder" -> Stream.of(head + at + " " + minusInBrackets(tail));
          case "syntax-clause" -> Stream.of(bracketedSide(text));
          default -> at.equals("-") ? Stream.of(head + "(" + at + tail + ")") : Stream.empty();
        };
    Stream<String> spelt =
        Explanation.nearStatement(tokens.getFirst()).stream()
            .map(word -> word + text.strip().substring(tokens.getFirst().getText().length()));
    return Stream.of(spelt, special, general).flatMap(stream -> stream);
  }

  private static String minusInBrackets(String tail) {
    String body = tail.strip();
    return body.startsWith("*") ? body.substring(1) : "(" + body + ")";
  }

  /// The text with every foreign character put into the language.
  private static String translated(String text) {
    StringBuilder translated = new StringBuilder();
    text.codePoints()
        .mapToObj(Character::toString)
        .map(c -> c.equals(".") ? c : FOREIGN.getOrDefault(c, List.of(c)).getFirst())
        .forEach(translated::append);
    return translated.toString();
  }

  /// A claim with everything after the equals sign in brackets.
  private static String bracketedSide(String text) {
    int side = text.indexOf('=') + 1;
    return text.substring(0, side) + " (" + text.substring(side).strip() + ")";
  }

  private static String other(String bracket) {
    return switch (bracket) {
      case ")" -> "]";
      case "]" -> ")";
      default -> "";
    };
  }

  private static String page(String text) {
    List<CommonToken> tokens = text.length() > LONGEST ? List.of() : Tokens.visible(text);
    return tokens.stream()
        .findFirst()
        .filter(first -> first.getType() <= GnomonParser.PRESENTATION)
        .filter(first -> Vocabulary.find(first.getText()).isPresent())
        .map(first -> "help " + first.getText())
        .orElse("help");
  }

  private static boolean reads(String line) {
    return Attempt.at(line) instanceof Reading.Understood(var statement)
        && !(statement instanceof Statement.Empty);
  }
}
