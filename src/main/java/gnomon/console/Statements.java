package gnomon.console;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/// Lines that belong together.
final class Statements {
  private Statements() {}

  /// Splits a text of several lines, as pasted or journaled, into statements; recorded answers,
  /// which begin with a bar, and blank lines between statements are left out. `wantsMore` says
  /// whether a statement goes on in the next line.
  static List<String> split(String text, Predicate<String> wantsMore) {
    List<String> statements = new ArrayList<>();
    StringBuilder open = new StringBuilder();
    for (String line : text.lines().toList()) {
      if (open.isEmpty() && (line.isBlank() || line.startsWith("|"))) {
        continue;
      }
      open.append(open.isEmpty() ? "" : "\n").append(line);
      if (!wantsMore.test(open.toString())) {
        statements.add(open.toString());
        open.setLength(0);
      }
    }
    if (!open.isEmpty()) {
      statements.add(open.toString());
    }
    return List.copyOf(statements);
  }

  /// Whether the last statement of the text is still open. A blank line ends it in any case, so
  /// that nobody is caught in an open bracket.
  static boolean isOpen(String text, Predicate<String> wantsMore) {
    if (text.isBlank() || text.lastIndexOf('\n') >= 0 && lastLine(text).isBlank()) {
      return false;
    }
    List<String> statements = split(text, wantsMore);
    return !statements.isEmpty() && wantsMore.test(statements.getLast());
  }

  private static String lastLine(String text) {
    return text.substring(text.lastIndexOf('\n') + 1);
  }
}
