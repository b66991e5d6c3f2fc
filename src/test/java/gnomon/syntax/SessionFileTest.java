package gnomon.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.syntax.SessionFile.Exchange;
import gnomon.syntax.SessionFile.Prose;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/// The session-file format of section 5 of `grammar/LANGUAGE.md`.
final class SessionFileTest {
  private static final String FILE =
      """
      # stone courses of the east terrace
      Sigma(x^2) in factors
      | 1/6 x (x - 1) (2 x - 1)
      | @1 closed form

        # levels
      let f(n,
        k) = n +   # goes on

      names
      |
      | @2
      """;

  @Test
  void statementsKeepTheirLinesAndAnswers() {
    List<Exchange> exchanges = SessionFile.parse(FILE).exchanges();
    assertEquals(
        List.of(
            new Exchange(
                "Sigma(x^2) in factors", 2, List.of("1/6 x (x - 1) (2 x - 1)", "@1 closed form")),
            new Exchange("let f(n,\n  k) = n +   # goes on", 7, List.of()),
            new Exchange("names", 10, List.of("", "@2"))),
        exchanges);
  }

  @Test
  void commentsAndBlankLinesStayWhereTheyWere() {
    SessionFile file = SessionFile.parse(FILE);
    assertEquals(
        new Prose(List.of("# stone courses of the east terrace")), file.blocks().getFirst());
    assertEquals(new Prose(List.of("", "  # levels")), file.blocks().get(2));
    assertEquals(FILE, file.text());
  }

  @Test
  void everyTextIsGivenBack() {
    List<String> lines =
        List.of(
            "", "# comment", "x + 1", "f(x,", "2 *", "| answer", "|", "[1)", "help (", "  ", ")");
    Random random = new Random(1_893);
    for (int count = 0; count < 2_000; count++) {
      StringBuilder text = new StringBuilder();
      for (int length = random.nextInt(12); length > 0; length--) {
        text.append(lines.get(random.nextInt(lines.size()))).append('\n');
      }
      assertEquals(text.toString(), SessionFile.parse(text.toString()).text(), "seed 1893");
    }
  }

  @Test
  void lineBreaksOfOtherSystemsAndAByteOrderMarkAreTaken() {
    SessionFile file = SessionFile.parse("\uFEFFx\r\n|y\r\n");
    assertEquals(List.of(new Exchange("x", 1, List.of("y"))), file.exchanges());
    assertEquals("x\n| y\n", file.text());
  }

  @Test
  void anAnswerIsReplacedAndNothingElse() {
    SessionFile file = SessionFile.parse("x\n| old\n");
    Exchange exchange = file.exchanges().getFirst().withAnswer(List.of("new", ""));
    assertEquals("x\n| new\n|\n", new SessionFile(List.of(exchange)).text());
  }

  @Test
  void anOpenBracketOrATrailingOperatorCarriesOver() {
    assertTrue(open("f(x,"));
    assertTrue(open("f(x", "# comment"));
    assertTrue(open("x +"));
    assertTrue(open("x + # comment"));
    assertTrue(open("claim A ="));
    assertFalse(open("f(x", ")"));
    assertFalse(open("x!"));
    assertFalse(open("x'"));
    assertFalse(open("Delta"));
    assertFalse(open("help +"));
    assertFalse(open("x) + ("));
    assertFalse(open("# ("));
    assertFalse(open(""));
  }

  private static boolean open(String... lines) {
    Continuation continuation = new Continuation();
    for (String line : lines) {
      continuation.add(line);
    }
    return continuation.isOpen();
  }
}
