package gnomon.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.DiagnosticText;
import gnomon.diagnostic.Kind;
import gnomon.diagnostic.Source;
import java.util.List;
import java.util.Random;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// Any text is a tree or a diagnostic.
final class FuzzTest {
  private static final long SEED = 60_221_407;

  private static final List<String> PIECES =
      List.of(
          "let",
          "claim",
          "given",
          "drop",
          "vary",
          "arbitrary",
          "why",
          "names",
          "keep",
          "help",
          "leave",
          "matrix",
          "solve",
          "family",
          "with",
          "recurrence",
          "in",
          "to",
          "at",
          "for",
          "of",
          "digits",
          "integer",
          "partial",
          "fractions",
          "factors",
          "tex",
          "falling",
          "x",
          "n",
          "k",
          "phi",
          "Delta",
          "Δ",
          "E",
          "_n",
          "Σ(k: 0..n)",
          "∫",
          "Prod",
          "O(",
          "binom(",
          "sin",
          "(",
          ")",
          "[",
          "]",
          ",",
          ":",
          "..",
          "=",
          "!=",
          ">=",
          "<",
          "+",
          "-",
          "*",
          "/",
          "^",
          "'",
          "!",
          "|_",
          "↑",
          "∘",
          "@",
          "@7",
          "0",
          "12",
          "3.5",
          "\"file\"",
          "\"",
          "#",
          ".",
          "\n",
          " ",
          "\t",
          "µ",
          "é",
          "漢",
          "\uD83D\uDE00",
          "{");

  @Test
  void randomPiecesAreATreeOrADiagnostic() {
    Random random = new Random(SEED);
    for (int count = 0; count < 6_000; count++) {
      StringBuilder text = new StringBuilder();
      for (int length = random.nextInt(25); length > 0; length--) {
        text.append(PIECES.get(random.nextInt(PIECES.size())));
        text.append(random.nextBoolean() ? " " : "");
      }
      check(text.toString());
    }
  }

  @Test
  void randomCharactersAreATreeOrADiagnostic() {
    Random random = new Random(SEED + 1);
    for (int count = 0; count < 3_000; count++) {
      StringBuilder text = new StringBuilder();
      for (int length = random.nextInt(40); length > 0; length--) {
        text.append(character(random));
      }
      check(text.toString());
    }
  }

  @Test
  void slipsInRightTextAreATreeOrADiagnostic() {
    Random random = new Random(SEED + 2);
    RandomTrees trees = new RandomTrees(random);
    for (int count = 0; count < 3_000; count++) {
      StringBuilder text = new StringBuilder(StatementText.of(trees.statement(), Spelling.UNICODE));
      for (int slips = 1 + random.nextInt(3); slips > 0 && !text.isEmpty(); slips--) {
        int at = random.nextInt(text.length());
        switch (random.nextInt(3)) {
          case 0 -> text.deleteCharAt(at);
          case 1 -> text.insert(at, PIECES.get(random.nextInt(PIECES.size())));
          default -> text.setCharAt(at, text.charAt(random.nextInt(text.length())));
        }
      }
      check(text.toString());
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "(",
        "[",
        "f(",
        "Δ[",
        "(-",
        "x^",
        "x^-",
        "x|_",
        "-",
        "x'",
        "x!",
        "'",
        "2*",
        "Σ(k: 0..n) ",
        "∏(k: 1..n)",
        "(x at x = ",
        "[x, ",
        "x in ",
        "@",
        "9",
        "x",
        "x ",
        "x + ",
        "\"",
        "#",
        "\n",
        "(\n",
        "^",
        "é\u0301",
        "漢",
        "(x)(",
        "1/2x",
        "E^(E^",
        "O(",
        "|_ "
      })
  void repetitionIsATreeOrADiagnostic(String piece) {
    for (int times : new int[] {50, 1_000, 10_000}) {
      check(piece.repeat(times));
      check("claim " + piece.repeat(times) + " = 1");
    }
  }

  @Test
  void deepNestingIsALimitWhetherClosedOrNot() {
    for (String text :
        List.of("(".repeat(100_000), "(".repeat(90_000) + "x" + ")".repeat(90_000))) {
      Diagnostic diagnostic =
          assertInstanceOf(Reading.Rejected.class, StatementReader.read(new Source("deep", text)))
              .diagnostic();
      assertEquals("limit-nesting", diagnostic.code());
    }
  }

  @Test
  void chainsAndLengthHaveLimitsToo() {
    assertEquals("limit-nesting", code("x^".repeat(5_000) + "x"));
    assertEquals("limit-nesting", code("Σ(k: 0..n) ".repeat(5_000) + "x"));
    assertEquals("limit-length", code("x ".repeat(Limits.LENGTH)));
    assertEquals("limit-digits", code("9".repeat(Limits.DIGITS + 1)));
  }

  @Test
  void longRowsAreRead() {
    String row = "x y ".repeat(10_000) + "+ " + "2 x^2 + ".repeat(8_000) + "1";
    assertInstanceOf(Reading.Understood.class, StatementReader.read(new Source("row", row)));
  }

  private static String code(String text) {
    return assertInstanceOf(Reading.Rejected.class, StatementReader.read(new Source("long", text)))
        .diagnostic()
        .code();
  }

  private static void check(String text) {
    Source source = new Source("fuzz", text);
    switch (StatementReader.read(source)) {
      case Reading.Understood(var statement) -> {
        assertTrue(statement.span().end() <= text.length());
        Parts.of(statement);
      }
      case Reading.Unfinished(var diagnostic) -> check(diagnostic, source);
      case Reading.Rejected(var diagnostic) -> check(diagnostic, source);
    }
    Lexemes.partner(Lexemes.of(text), 0);
    SessionFile.parse(text).text();
  }

  private static void check(Diagnostic diagnostic, Source source) {
    String text = source.text();
    String shown = text.length() > 300 ? text.substring(0, 300) : text;
    assertTrue(diagnostic.span().end() <= text.length(), shown);
    assertTrue(diagnostic.problem().kind() != Kind.INTERNAL, shown);
    assertTrue(diagnostic.message().length() <= Diagnostic.MESSAGE_LIMIT, shown);
    DiagnosticText.of(diagnostic, source)
        .lines()
        .forEach(line -> assertTrue(line.length() <= 400, line));
    String hint = diagnostic.hint().orElseThrow(() -> new AssertionError("no hint: " + shown));
    assertInstanceOf(
        Reading.Understood.class,
        StatementReader.read(new Source("hint", hint)),
        "the hint does not read: " + hint + "\nfor: " + shown);
  }

  private static String character(RandomGenerator random) {
    return switch (random.nextInt(4)) {
      case 0 -> Character.toString(random.nextInt(32, 127));
      case 1 -> Character.toString(random.nextInt(0x370, 0x400));
      case 2 -> Character.toString(random.nextInt(Character.MAX_CODE_POINT + 1));
      default -> String.valueOf((char) random.nextInt(0x10000));
    };
  }
}
