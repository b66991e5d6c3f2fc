package gnomon.launch;

import gnomon.syntax.Continuation;
import java.io.BufferedReader;
import java.io.IOException;
import org.jspecify.annotations.Nullable;

/// Takes a session file apart while it is being read, so that a statement that comes through a pipe
/// is answered before the next one is there.
///
/// Recorded answers, which begin with a bar, are passed over; they and blank lines also end a
/// statement that was left open, as in [gnomon.syntax.SessionFile].
final class StatementFeed {
  private final BufferedReader lines;
  private @Nullable String ahead;
  private int number;

  StatementFeed(BufferedReader lines) {
    this.lines = lines;
  }

  /// A stretch of the file; `line` is the number of its first line.
  sealed interface Stretch {
    /// A comment or a blank line.
    record Prose(String text) implements Stretch {}

    /// A statement, on one line or several.
    record Statement(String text, int line) implements Stretch {}
  }

  /// The next stretch, or null at the end.
  ///
  /// @throws IOException if the input cannot be read or is not UTF-8
  @Nullable Stretch next() throws IOException {
    String line = take();
    while (line != null && line.startsWith("|")) {
      line = take();
    }
    if (line == null) {
      return null;
    }
    if (line.isBlank() || line.stripLeading().startsWith("#")) {
      return new Stretch.Prose(line);
    }
    int first = number;
    StringBuilder statement = new StringBuilder(line);
    Continuation continuation = new Continuation();
    continuation.add(line);
    while (continuation.isOpen()) {
      String more = take();
      if (more == null || more.isBlank() || more.startsWith("|")) {
        ahead = more;
        number--;
        break;
      }
      continuation.add(more);
      statement.append('\n').append(more);
    }
    return new Stretch.Statement(statement.toString(), first);
  }

  private @Nullable String take() throws IOException {
    String line = ahead;
    if (line != null) {
      ahead = null;
      number++;
      return line;
    }
    line = lines.readLine();
    number++;
    boolean marked = number == 1 && line != null && line.startsWith("\uFEFF");
    return marked && line != null ? line.substring(1) : line;
  }
}
