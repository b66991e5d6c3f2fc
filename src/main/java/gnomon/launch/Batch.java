package gnomon.launch;

import gnomon.session.Reply;
import gnomon.session.ReplyText;
import gnomon.session.Request;
import gnomon.session.Session;
import gnomon.session.Spelling;
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
          Reply reply = deadline.answer(request);
          print(request, reply);
          status = reply.isAccepted() ? status : ExitStatus.SOME_FAILED;
          if (reply instanceof Reply.Left) {
            return status;
          }
        }
      }
    }
  }

  private void print(Request request, Reply reply) {
    List<String> lines = new ArrayList<>();
    if (json) {
      lines.add(new JsonAnswer(request, reply).line());
    } else {
      lines.addAll(request.text().lines().toList());
      for (String answer : ReplyText.lines(reply, Spelling.UNICODE)) {
        lines.add(answer.isEmpty() ? "|" : "| " + answer);
      }
    }
    out.print(String.join("\n", lines) + "\n");
    out.flush();
  }
}
