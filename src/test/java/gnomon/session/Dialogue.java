package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

/// A session that a test talks to, with its answers in ASCII.
final class Dialogue {
  private final Session session = Session.of(Settings.batch());

  /// Says statements whose answers do not matter.
  Dialogue say(String... statements) {
    for (String statement : statements) {
      session.submit(statement);
    }
    return this;
  }

  /// The lines of the answer.
  List<String> lines(String statement) {
    return ReplyText.lines(session.submit(statement), Spelling.ASCII);
  }

  /// The first line of the answer.
  String first(String statement) {
    return lines(statement).getFirst();
  }

  /// The whole answer.
  String text(String statement) {
    return String.join("\n", lines(statement));
  }

  /// The verdict on a claim in a word, or the refusal.
  String verdict(String claim) {
    Reply reply = session.submit("claim " + claim);
    return reply instanceof Reply.Answer answer
        ? answer.status()
        : ReplyText.lines(reply, Spelling.ASCII).toString();
  }

  /// Fails unless the claim is proved.
  void proves(String claim) {
    List<String> lines = lines("claim " + claim);
    assertTrue(lines.getFirst().startsWith("proved"), () -> claim + " -> " + lines);
  }
}
