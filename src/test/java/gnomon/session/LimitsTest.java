package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Statements that ask for too much are refused with a limit, and the session stays usable.
final class LimitsTest {
  private final Session session = Session.of(Settings.batch());

  private void refuses(String statement, String code) {
    session.submit("let kept = 41");
    Reply reply = session.submit(statement);
    assertTrue(
        reply instanceof Reply.Failure failure && failure.diagnostic().code().equals(code),
        () -> ReplyText.lines(reply, Spelling.ASCII).toString());
    Reply after = session.submit("kept + 1");
    assertEquals("42", ReplyText.lines(after, Spelling.ASCII).getFirst());
  }

  @Test
  void aHugePowerIsRefused() {
    refuses("2^(10^9)", "limit-size");
    refuses("(x + 1)^(10^8)", "limit-size");
  }

  @Test
  void deepNestingIsRefused() {
    refuses("(".repeat(50_000) + "x" + ")".repeat(50_000), "limit-nesting");
    refuses("(".repeat(100_000) + "x" + ")".repeat(100_000), "limit-length");
  }

  @Test
  void aHugeMatrixIsRefused() {
    refuses("matrix Delta to 10000000", "limit-size");
    refuses("matrix umbral(Delta) to 10000000", "limit-size");
  }

  @Test
  void endlessRecursionIsRefused() {
    session.submit("let again(n) = again(n + 1)");
    refuses("again(1)", "limit-depth");
    session.submit("let twice(n) = twice(n - 1) + twice(n - 2)");
    refuses("twice(5)", "limit-depth");
  }

  @Test
  void aHugeTableOrRangeIsRefused() {
    refuses("x for x: 0..10^9", "limit-size");
    refuses("claim n = n for n: 0..10^9", "limit-range");
    refuses("exp(x) to 10^9", "limit-size");
    refuses("pi to 10^9 digits", "limit-out-of-range");
  }

  @Test
  void timeIsLimited() {
    Limits limits = Limits.batch().withTime(Duration.ofMillis(1));
    Session hurried = Session.of(Settings.batch().withLimits(limits));
    Reply reply = hurried.submit("matrix umbral(D E) to 200");
    assertTrue(
        reply instanceof Reply.Failure failure && failure.diagnostic().code().equals("limit-time"),
        () -> ReplyText.lines(reply, Spelling.ASCII).toString());
  }

  @Test
  void aStatementCanBeCancelledAndLeavesTheDefinitions() throws InterruptedException {
    session.submit("let kept = 41");
    Thread worker =
        Thread.ofPlatform().start(() -> session.submit("let kept = Sigma x^2000 in factors"));
    while (worker.isAlive()) {
      session.cancel();
      worker.join(1);
    }
    assertTrue(
        List.of("41", "42").contains(first("kept")) || first("kept").contains("x"), first("kept"));
  }

  @Test
  void anAbandonedStatementChangesNothing() {
    session.submit("let kept = 41");
    Session other = session;
    other.abandon();
    assertEquals("41", first("kept"));
  }

  private String first(String statement) {
    return ReplyText.lines(session.submit(statement), Spelling.ASCII).getFirst();
  }
}
