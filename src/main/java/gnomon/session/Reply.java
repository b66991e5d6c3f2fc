package gnomon.session;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;
import java.util.List;

/// What the session says to a statement.
public sealed interface Reply {
  /// A value with its handle. `status` is one of proved, refuted, open, closed form, recurrence, no
  /// closed form, left as a sum, or empty; `remark` is what the status line says after the handle.
  record Answer(int handle, Shown shown, String status, String remark) implements Reply {
    /// The status line, which begins with the handle.
    public String statusLine() {
      return remark.isEmpty() ? "@" + handle : "@" + handle + " " + remark;
    }
  }

  /// Plain lines: what a definition, an assumption, `why` or `names` has to say.
  record Note(List<String> lines) implements Reply {
    public Note {
      lines = List.copyOf(lines);
    }
  }

  /// A page of the language.
  record Page(HelpPage page) implements Reply {}

  /// What is wrong and where; the definitions are as they were.
  record Failure(Diagnostic diagnostic, Source source) implements Reply {}

  /// The statements of a session file that was run here, each with its reply.
  record Replayed(List<Exchange> exchanges) implements Reply {
    public Replayed {
      exchanges = List.copyOf(exchanges);
    }
  }

  /// A session file that was run apart and compared with what it recorded.
  record Rechecked(RecheckReport report) implements Reply {}

  /// Nothing was said: a blank line or a comment.
  record Nothing() implements Reply {}

  /// The conversation is over.
  record Left() implements Reply {}

  /// Whether the statement did what it was asked.
  default boolean isAccepted() {
    return switch (this) {
      case Failure _ -> false;
      case Replayed(List<Exchange> exchanges) ->
          exchanges.stream().allMatch(exchange -> exchange.reply().isAccepted());
      case Rechecked(RecheckReport report) -> report.isGood();
      case Answer _, Note _, Page _, Nothing _, Left _ -> true;
    };
  }
}
