package gnomon.console;

import gnomon.syntax.Continuation;
import java.util.ArrayList;
import java.util.List;

/// Lines that belong together. A statement goes on as long as it asks for more, but never over a
/// blank line or a line with a recorded answer, so that nobody is caught in an open bracket.
final class Statements {
  private Statements() {}

  /// Splits a text of several lines, as pasted or journaled, into statements; recorded answers,
  /// which begin with a bar, and blank lines are left out.
  static List<String> split(String text) {
    List<String> statements = new ArrayList<>();
    List<String> open = new ArrayList<>();
    Continuation continuation = new Continuation();
    for (String line : text.lines().toList()) {
      if (!endsStatement(line)) {
        open.add(line);
        continuation.add(line);
      }
      if (!open.isEmpty() && (endsStatement(line) || !continuation.isOpen())) {
        statements.add(String.join("\n", open));
        open.clear();
        continuation = new Continuation();
      }
    }
    if (!open.isEmpty()) {
      statements.add(String.join("\n", open));
    }
    return List.copyOf(statements);
  }

  /// Whether the last statement of the text asks for another line.
  static boolean isOpen(String text) {
    Continuation continuation = new Continuation();
    for (String line : text.split("\n", -1)) {
      if (endsStatement(line)) {
        continuation = new Continuation();
      } else {
        if (!continuation.isOpen()) {
          continuation = new Continuation();
        }
        continuation.add(line);
      }
    }
    return continuation.isOpen();
  }

  private static boolean endsStatement(String line) {
    return line.isBlank() || line.startsWith("|");
  }
}
