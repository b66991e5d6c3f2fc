package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import gnomon.syntax.Vocabulary;
import gnomon.syntax.Word;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/// Random statements: whatever is typed, the session replies and stays usable.
///
/// `-Dfuzz.seconds=600` makes the run long; the seed is printed with a failure, `-Dfuzz.seed=…`
/// sets it.
final class FuzzTest {
  private static final List<String> PIECES = pieces();

  private final long seed = Long.getLong("fuzz.seed", 20_261L);
  private final Random random = new Random(seed);
  private final Limits limits = Limits.batch().withTime(Duration.ofMillis(400));
  private Session session = Session.of(Settings.batch().withLimits(limits));

  private static List<String> pieces() {
    List<String> pieces = new ArrayList<>();
    for (Word word : Vocabulary.words()) {
      boolean leaves = List.of("keep", "rerecord", "replay", "recheck").contains(word.ascii());
      if (!leaves) {
        pieces.add(word.ascii());
        word.glyph().ifPresent(pieces::add);
      }
    }
    pieces.addAll(
        List.of(
            "x",
            "n",
            "k",
            "a",
            "f",
            "0",
            "1",
            "2",
            "3",
            "7",
            "0.5",
            "(",
            ")",
            "[",
            "]",
            ",",
            ":",
            "(x)",
            "(x + 1)",
            "^2",
            "^-1",
            "^n",
            "|_3",
            "|^2",
            "!",
            " ",
            "  ",
            "x^2",
            "1/x",
            "2^x",
            "(k: 0..n)",
            "(t: 0..1)",
            "Delta[h]",
            "E_n",
            "umbral(Delta)",
            "f(x)",
            "\"",
            "²",
            "√",
            "\n",
            "@1",
            "to 5",
            "in falling",
            "in tex",
            "at x = 2",
            "for n: 0..3"));
    return List.copyOf(pieces);
  }

  @Test
  void randomStatementsAreAnsweredOrRefused() {
    long end = System.nanoTime() + Long.getLong("fuzz.seconds", 5) * 1_000_000_000L;
    int statements = 0;
    while (statements < 400 || System.nanoTime() < end) {
      answer(random.nextInt(4) == 0 ? noise() : random.nextInt(3) == 0 ? tokens() : tree(4));
      statements++;
      if (statements % 300 == 0) {
        session = Session.of(Settings.batch().withLimits(limits));
      }
    }
    assertEquals("42", ReplyText.lines(session.submit("6 * 7"), Spelling.ASCII).getFirst());
  }

  /// Time may end anywhere, also while words for a refusal are being found.
  @Test
  void statementsWithoutTimeAreAnsweredOrRefused() {
    Limits none = limits.withTime(Duration.ofNanos(1));
    for (int i = 0; i < 3000; i++) {
      session = Session.of(Settings.batch().withLimits(none));
      answer(random.nextInt(3) == 0 ? tokens() : tree(5));
    }
  }

  private void answer(String statement) {
    try {
      check(statement);
    } catch (RuntimeException | Error fault) {
      throw new AssertionError("seed " + seed + ": " + statement, fault);
    }
  }

  private void check(String statement) {
    Reply reply = session.submit(statement);
    String text = String.join("\n", ReplyText.lines(reply, Spelling.UNICODE));
    String shown = "seed " + seed + ": " + statement + "\n" + text;
    assertFalse(text.contains("internal-"), shown);
    assertFalse(text.contains("\tat "), shown);
    new Run.Done(new Exchange(1, statement, reply), List.of()).json();
  }

  private String tokens() {
    StringBuilder text = new StringBuilder();
    for (int i = random.nextInt(14); i >= 0; i--) {
      text.append(pick(PIECES)).append(random.nextBoolean() ? " " : "");
    }
    return text.toString();
  }

  private String noise() {
    StringBuilder text = new StringBuilder();
    for (int i = random.nextInt(30); i >= 0; i--) {
      int kind = random.nextInt(3);
      if (kind == 0) {
        text.append((char) (32 + random.nextInt(95)));
      } else if (kind == 1) {
        text.appendCodePoint(random.nextInt(0x11000));
      } else {
        text.append(pick(PIECES));
      }
    }
    return text.toString();
  }

  /// A random tree of the language, most of which have a meaning.
  private String tree(int depth) {
    if (depth == 0) {
      return pick(List.of("x", "n", "a", "1", "2", "3", "D", "X", "E", "Delta", "Nabla", "delta"));
    }
    return switch (random.nextInt(16)) {
      case 0 -> tree(depth - 1) + " + " + tree(depth - 1);
      case 1 -> tree(depth - 1) + " - " + tree(depth - 1);
      case 2, 3 -> tree(depth - 1) + " " + tree(depth - 1);
      case 4 -> "(" + tree(depth - 1) + ")(" + tree(depth - 1) + ")";
      case 5 -> "(" + tree(depth - 1) + ")^" + random.nextInt(4);
      case 6 -> "(" + tree(depth - 1) + ")/(" + tree(depth - 1) + ")";
      case 7 ->
          pick(List.of("exp", "ln", "sqrt", "sin", "H", "arsinh")) + "(" + tree(depth - 1) + ")";
      case 8 -> "[" + tree(depth - 1) + ", " + tree(depth - 1) + "]";
      case 9 -> "Sigma(k: 0..n) (" + tree(depth - 1) + ")";
      case 10 -> "umbral(" + tree(depth - 1) + ")";
      case 11 -> "claim " + tree(depth - 1) + " = " + tree(depth - 1);
      case 12 -> "(" + tree(depth - 1) + ")^-1";
      case 13 -> "(" + tree(depth - 1) + " in Delta to 3)";
      case 14 -> "(" + tree(depth - 1) + " at x = " + random.nextInt(3) + ")";
      default -> "(" + tree(depth - 1) + ")'";
    };
  }

  private String pick(List<String> from) {
    return from.get(random.nextInt(from.size()));
  }
}
