package gnomon.session;

import gnomon.syntax.SessionFile;
import java.util.List;
import java.util.function.Consumer;

/// Runs the statements of a session file and hands on each answer as soon as it is there.
public final class Run {

  private Run() {}

  /// A statement that is done, with its answer lines.
  public record Done(Exchange exchange, List<String> lines) {
    public Done {
      lines = List.copyOf(lines);
    }

    /// One JSON object on one line: line, statement, sort, text, ascii, latex, status, error.
    public String json() {
      return Records.json(exchange).text();
    }
  }

  /// Runs all statements and says whether every one was accepted. A statement that fails does not
  /// end the run; `leave` does.
  public static boolean run(String text, Settings settings, Consumer<Done> each) {
    boolean[] accepted = {true};
    Thread thread =
        BigStack.threads().newThread(() -> accepted[0] = inThisThread(text, settings, each));
    thread.start();
    try {
      thread.join();
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      return false;
    }
    return accepted[0];
  }

  private static boolean inThisThread(String text, Settings settings, Consumer<Done> each) {
    Session session = Session.of(settings);
    boolean accepted = true;
    for (SessionFile.Exchange part : SessionFile.parse(text).exchanges()) {
      Reply reply = session.submit(new Request(part.statement(), part.line()));
      Exchange exchange = new Exchange(part.line(), part.statement(), reply);
      each.accept(new Done(exchange, ReplyText.lines(reply, settings.spelling())));
      accepted &= reply.isAccepted();
      if (reply instanceof Reply.Left) {
        break;
      }
    }
    return accepted;
  }
}
