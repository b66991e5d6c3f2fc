package gnomon.session.tables;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.session.Reply;
import gnomon.session.ReplyText;
import gnomon.session.Session;
import gnomon.session.Settings;
import gnomon.session.Spelling;
import java.util.ArrayList;
import java.util.List;

/// A session that is asked to confirm published values, claim by claim. What it does not prove is
/// collected and shown at the end.
final class Talk {
  private final Session session = Session.of(Settings.batch());
  private final List<String> failures = new ArrayList<>();
  private int claims;

  /// Says a statement that must be accepted.
  Talk say(String statement) {
    Reply reply = session.submit(statement);
    if (!reply.isAccepted()) {
      failures.add(statement + " -> " + ReplyText.lines(reply, Spelling.ASCII));
    }
    return this;
  }

  /// Claims that both sides are equal; anything but `proved` is a failure.
  Talk claim(String id, String left, String right) {
    claims++;
    String statement = "claim " + left + " = " + right;
    Reply reply = session.submit(statement);
    if (!(reply instanceof Reply.Answer answer) || !answer.status().equals("proved")) {
      failures.add(id + ": " + statement + " -> " + ReplyText.lines(reply, Spelling.ASCII));
    }
    return this;
  }

  /// Says a statement whose answer must have a status line that starts with the words, or, where it
  /// is refused, that refusal's code.
  Talk answers(String id, String statement, String words) {
    claims++;
    Reply reply = session.submit(statement);
    String lines = String.join("\n", ReplyText.lines(reply, Spelling.ASCII));
    boolean met =
        reply instanceof Reply.Answer answer
            ? answer.status().startsWith(words)
            : lines.contains(words);
    if (!met) {
      failures.add(id + ": " + statement + " -> " + lines);
    }
    return this;
  }

  /// Fails unless everything was accepted and proved, and at least `least` claims were made.
  void allProved(int least) {
    assertEquals(List.of(), failures);
    assertTrue(claims >= least, () -> claims + " claims, expected at least " + least);
  }

  /// Σ c_k base^k from an ascending list, `0` for an empty one.
  static String polynomial(String coefficients, String base) {
    StringBuilder text = new StringBuilder();
    int power = 0;
    for (String c : coefficients.strip().split(" +")) {
      text.append(text.isEmpty() ? "" : " + ").append("(").append(c).append(")");
      if (power > 0) {
        text.append(" ").append(base).append("^").append(power);
      }
      power++;
    }
    return text.toString();
  }

  /// The notation of the tables in the spelling of the language.
  static String translated(String formula) {
    return formula
        .replace("fall(", "falling(")
        .replace("rise(", "rising(")
        .replaceAll("fact\\((\\w+)\\)", "$1!")
        .replace("asinh(", "arsinh(");
  }
}
