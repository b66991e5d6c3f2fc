package gnomon.console;

import java.time.Duration;
import org.jline.terminal.Terminal;
import org.jline.utils.AttributedString;
import org.jline.utils.InfoCmp.Capability;

/// One quiet line about work that takes a while: what it is and how long it has taken. It vanishes
/// when the work is done. A terminal that cannot erase gets the line once.
final class Progress {
  private final Terminal terminal;
  private final Look look;
  private final String activity;
  private boolean shown;

  Progress(Terminal terminal, Look look, String statement) {
    this.terminal = terminal;
    this.look = look;
    this.activity = activity(statement);
  }

  /// What a statement makes the program do, in words.
  static String activity(String statement) {
    String first = statement.strip().split("[^A-Za-z]", 2)[0];
    return switch (first) {
      case "claim" -> "deciding the claim";
      case "matrix" -> "filling in the matrix";
      case "recurrence" -> "looking for the law";
      case "solve" -> "solving the equation";
      case "family" -> "searching the catalogue";
      case "why" -> "checking the steps";
      case "replay" -> "replaying the file";
      case "recheck" -> "rechecking the file";
      case "rerecord" -> "writing the answers anew";
      case "let" -> "working out the definition";
      case "Sigma", "Prod" -> "summing";
      default -> statement.strip().startsWith("Σ") ? "summing" : "evaluating";
    };
  }

  /// Shows how long the work has taken.
  void show(Duration elapsed) {
    if (look.plain()) {
      if (!shown) {
        terminal.writer().println(activity + " ...");
      }
    } else {
      String text = activity + " " + look.dot() + " " + clock(elapsed) + " " + look.dot();
      terminal.writer().print("\r");
      terminal.writer().print(styled(text + " Ctrl-C stops it"));
      terminal.puts(Capability.clr_eol);
    }
    shown = true;
    terminal.flush();
  }

  /// Takes the line away.
  void clear() {
    if (shown && !look.plain()) {
      terminal.writer().print("\r");
      terminal.puts(Capability.clr_eol);
      terminal.flush();
    }
  }

  private String styled(String text) {
    return new AttributedString(text, look.small()).toAnsi(terminal);
  }

  static String clock(Duration elapsed) {
    long seconds = elapsed.toSeconds();
    return seconds < 60 ? seconds + " s" : seconds / 60 + " min " + seconds % 60 + " s";
  }
}
