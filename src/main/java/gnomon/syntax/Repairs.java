package gnomon.syntax;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
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
    return Stream.concat(
            candidates(text, diagnostic, tokens), Stream.of(page(tokens, diagnostic.span())))
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
    String open = text.replaceAll("[,\\s]+$", "");
    Stream<String> general =
        Stream.concat(
            Stream.of(" = ", ": ", "..", ", ", " fractions ", " to ")
                .map(word -> head.stripTrailing() + word + at + tail),
            Stream.of(without(head, tail)));
    Stream<String> special =
        switch (diagnostic.code()) {
          case "syntax-equation" -> Stream.of("let " + text, "claim " + text);
          case "syntax-character" ->
              Stream.concat(
                  Stream.of(translated(text)),
                  FOREIGN.getOrDefault(at, List.of("", "*")).stream()
                      .map(sign -> head + sign + tail));
          case "syntax-bracket" -> Stream.of(open + ")", open + "]", head + other(at) + tail);
          case "syntax-quotation" -> Stream.of(text + "\"");
          case "syntax-line" -> Stream.of(head);
          case "syntax-comparison" -> Stream.of("given " + text);
          case "syntax-binder" -> Stream.of(head + at + " " + summand(at, tail));
          case "syntax-clause" -> Stream.of(bracketedSide(text));
          default ->
              switch (at) {
                case "-" -> Stream.of(head + "(" + at + tail + ")");
                case ":" -> Stream.of(inOurWords(text));
                case "integer" -> Stream.of(text.replaceAll("\\binteger +(\\w+)", "$1 integer"));
                case ".." -> Stream.of("n for n: " + text.strip());
                default -> Stream.empty();
              };
        };
    Stream<String> spelt =
        Explanation.nearStatement(tokens.getFirst()).stream()
            .map(word -> word + text.strip().substring(tokens.getFirst().getText().length()));
    return Stream.of(spelt, special, general).flatMap(stream -> stream);
  }

  /// The text with words of the trade replaced by those of the language.
  private static String inOurWords(String text) {
    return Pattern.compile("[a-zA-Z]+")
        .matcher(text)
        .replaceAll(word -> Vocabulary.meant(word.group()).orElse(word.group()));
  }

  /// What may stand after the head of a binder instead of `tail`.
  private static String summand(String head, String tail) {
    String body = tail.strip();
    if (body.isEmpty()) {
      return head.substring(head.indexOf('(') + 1, head.indexOf(':'));
    }
    return body.startsWith("*") || body.startsWith("+") ? body.substring(1) : "(" + body + ")";
  }

  /// Two parts of a line with what stood between them left out, kept apart if they would run
  /// together.
  private static String without(String head, String tail) {
    boolean together =
        !head.isEmpty()
            && !tail.isEmpty()
            && Character.isLetterOrDigit(head.charAt(head.length() - 1))
            && Character.isLetterOrDigit(tail.charAt(0));
    return head + (together ? " " : "") + tail;
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

  /// The page of the last word of a statement or clause up to the mistake.
  private static String page(List<CommonToken> tokens, Span place) {
    return tokens.reversed().stream()
        .filter(token -> token.getStartIndex() <= place.start())
        .filter(token -> Vocabulary.find(token.getText()).filter(Repairs::hasPage).isPresent())
        .findFirst()
        .map(token -> "help " + token.getText())
        .orElse("help");
  }

  private static boolean hasPage(Word word) {
    return word.sort() == Word.Sort.STATEMENT || word.sort() == Word.Sort.CLAUSE;
  }

  private static boolean reads(String line) {
    return Attempt.at(line) instanceof Reading.Understood(var statement)
        && !(statement instanceof Statement.Empty);
  }
}
