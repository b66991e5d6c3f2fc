package gnomon.launch;

import gnomon.session.Exchange;
import gnomon.session.Reply;
import gnomon.session.ReplyText;
import gnomon.session.Request;
import gnomon.session.Run;
import gnomon.session.Session;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;

/// Answers the statements of a session file one after the other, each as soon as it has been read.
///
/// As text, the answers are printed under their statements, in the form of a session file; as JSON,
/// one object for each statement.
record Batch(Session session, PrintStream out, boolean json) {

  /// Answers everything, or everything up to `leave`. Comments and blank lines are passed on in
  /// text.
  ///
  /// @throws IOException if the input cannot be read
  ExitStatus answer(BufferedReader input) throws IOException {
    StatementFeed feed = new StatementFeed(input);
    Deadline deadline = new Deadline(session);
    ExitStatus status = ExitStatus.FINE;
    while (true) {
      switch (feed.next()) {
        case null -> {
          return status;
        }
        case StatementFeed.Stretch.Prose(String text) -> {
          if (!json) {
            out.println(text);
          }
        }
        case StatementFeed.Stretch.Statement(String text, int line) -> {
          Request request = new Request(text, line);
          Deadline.Told told = deadline.answer(request, reply -> text(request, reply));
          out.print(told.text());
          out.flush();
          Reply reply = told.reply();
          status = reply.isAccepted() ? status : ExitStatus.SOME_FAILED;
          if (reply instanceof Reply.Left) {
            return status;
          }
        }
      }
    }
  }

  private String text(Request request, Reply reply) {
    Exchange exchange = new Exchange(request.line(), request.text(), reply);
    List<String> answers = ReplyText.lines(reply, session.settings().spelling());
    if (json) {
      return new Run.Done(exchange, answers).json() + "\n";
    }
    List<String> lines = new ArrayList<>(request.text().lines().toList());
    for (String answer : answers) {
      lines.add(answer.isEmpty() ? "|" : "| " + answer);
    }
    return String.join("\n", lines) + "\n";
  }
}
