package gnomon.session;

import gnomon.diagnostic.Diagnostic;
import java.util.ArrayList;
import java.util.List;

/// Replies as the answer lines of session files, without the bar that leads them there.
public final class ReplyText {

  private ReplyText() {}

  /// The answer lines of a reply.
  public static List<String> lines(Reply reply, Spelling spelling) {
    return switch (reply) {
      case Reply.Answer answer -> {
        var lines = new ArrayList<>(answer.shown().lines(spelling));
        lines.add(answer.statusLine());
        yield lines;
      }
      case Reply.Note(List<String> lines) -> lines;
      case Reply.Page(HelpPage page) -> page.lines();
      case Reply.Failure failure -> failureLines(failure.diagnostic());
      case Reply.Replayed(List<Exchange> exchanges) ->
          exchanges.stream()
              .flatMap(exchange -> lines(exchange.reply(), spelling).stream())
              .toList();
      case Reply.Rechecked(RecheckReport report) -> report.lines();
      case Reply.Nothing _, Reply.Left _ -> List.of();
    };
  }

  /// An error as session files record it: its code and message, the evidence, and what to try.
  private static List<String> failureLines(Diagnostic diagnostic) {
    var lines = new ArrayList<String>();
    lines.add("error " + diagnostic.code() + ": " + diagnostic.message());
    lines.addAll(diagnostic.evidence());
    diagnostic.hint().ifPresent(hint -> lines.add("Try: " + hint));
    return lines;
  }
}
