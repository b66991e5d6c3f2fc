package gnomon.session.tables;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.session.Reply;
import gnomon.session.ReplyText;
import gnomon.session.Session;
import gnomon.session.Settings;
import gnomon.session.Spelling;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Suites of sums: closed forms from the literature, closed forms of indefinite sums checked by
/// differencing, and sums that must not be given a closed form.
final class SumSuitesTest {
  private static List<String> lines(String name) {
    try (var stream = SumSuitesTest.class.getResourceAsStream("/suites/" + name)) {
      String text = new String(stream.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines().filter(line -> !line.startsWith("#")).toList();
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }

  private static List<String> shown(Session session, String statement) {
    return ReplyText.lines(session.submit(statement), Spelling.ASCII);
  }

  @Test
  void definiteSumsHaveTheirPublishedClosedForms() {
    Talk talk = new Talk();
    for (String line : lines("definite-sums.tsv")) {
      String[] row = line.split("\t");
      talk.claim(line, "Sigma(k: " + row[0] + ") (" + row[1] + ")", row[2]);
    }
    talk.allProved(150);
  }

  /// The numbers are put in for n before the terms are formed, so that no closed form is used.
  @Test
  void definiteSumsHaveTheValuesOfTheirTerms() {
    List<String> failures = new ArrayList<>();
    for (String line : lines("definite-sums.tsv")) {
      String first =
          line.startsWith("m..") ? line.replaceAll("(?<![a-zA-Z])m(?![a-z])", "(1)") : line;
      String[] row = first.split("\t");
      String sum = "Sigma(k: " + row[0] + ") (" + row[1] + ")";
      Session session = Session.of(Settings.batch());
      session.submit("let closed(n) = " + row[2]);
      for (int n = 2; n <= 6; n += 2) {
        String name = "direct" + n;
        String numbers = sum.replaceAll("(?<![a-zA-Z])n(?![a-zA-Z])", "(" + n + ")");
        session.submit("let " + name + " = " + numbers);
        String value = shown(session, name + " - closed(" + n + ")").getFirst();
        if (!value.equals("0")) {
          failures.add(line + " at n = " + n + ": " + value);
        }
      }
    }
    assertEquals(List.of(), failures);
  }

  @Test
  void indefiniteSumsCloseAndHaveTheSummandAsDifference() {
    List<String> failures = new ArrayList<>();
    List<String> summands = lines("indefinite-sums.txt");
    for (String f : summands) {
      Session session = Session.of(Settings.batch());
      Reply sum = session.submit("let S = Sigma (" + f + ")");
      boolean closed = sum instanceof Reply.Answer answer && answer.status().equals("closed form");
      Reply claim = session.submit("claim E S - S = " + f);
      boolean right = claim instanceof Reply.Answer answer && answer.status().equals("proved");
      if (!closed || !right) {
        failures.add(f + " -> " + ReplyText.lines(sum, Spelling.ASCII) + ", " + right);
      }
    }
    assertEquals(List.of(), failures);
    assertTrue(summands.size() >= 100, () -> summands.size() + " summands");
  }

  @Test
  void whatIsNotSummableIsNotGivenAClosedForm() {
    List<String> failures = new ArrayList<>();
    List<String> statements = lines("unsummable.txt");
    Session session = Session.of(Settings.batch());
    session.submit("arbitrary f");
    for (String statement : statements) {
      Reply reply = session.submit(statement);
      if (reply instanceof Reply.Answer answer && answer.status().equals("closed form")) {
        failures.add(statement + " -> " + ReplyText.lines(reply, Spelling.ASCII));
      }
    }
    assertEquals(List.of(), failures);
    assertTrue(statements.size() >= 100, () -> statements.size() + " statements");
  }
}
