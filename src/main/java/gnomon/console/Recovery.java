package gnomon.console;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/// Offers to take up the last session that was cut off.
record Recovery(StateFolder state, Console console) {

  /// Asks about the newest journal left behind, if there is one. A journal that is not wanted is
  /// set aside, not deleted; one that was not decided on is offered again next time.
  void offer() throws IOException {
    List<Path> left = Journal.leftBehind(state);
    if (left.isEmpty()) {
      return;
    }
    Path newest = left.getLast();
    List<String> statements = console.statements(newest);
    if (statements.isEmpty()) {
      Files.deleteIfExists(newest);
      return;
    }
    console.say("A session was cut off after " + counted(statements.size()) + ", the last one:");
    console.say("  " + statements.getLast().lines().findFirst().orElse(""));
    Optional<String> answer = console.ask("Restore it? yes or no: ");
    switch (answer.map(text -> text.strip().toLowerCase(Locale.ROOT)).orElse("")) {
      case "y", "yes" -> restore(newest, statements);
      case "n", "no" -> setAside(newest);
      default -> console.say("Left for next time.");
    }
  }

  private void restore(Path file, List<String> statements) throws IOException {
    int failed = 0;
    for (String statement : statements) {
      if (!console.restore(statement)) {
        failed++;
        console.say("Not accepted this time: " + statement);
      }
    }
    console.say("Restored " + counted(statements.size() - failed) + ".");
    if (failed == 0) {
      Files.deleteIfExists(file);
    } else {
      setAside(file);
    }
  }

  private void setAside(Path file) throws IOException {
    Path place = state.setAside().resolve(file.getFileName());
    Files.move(file, place);
    console.say("It is kept in " + place + ".");
  }

  private static String counted(int count) {
    return count == 1 ? "1 statement" : count + " statements";
  }
}
