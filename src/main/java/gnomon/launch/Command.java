package gnomon.launch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// What the command line asks for.
public sealed interface Command {

  /// Opens the console, perhaps with answers in ASCII.
  record OpenConsole(boolean ascii) implements Command {}

  /// Evaluates the statements of one session file, `-` for standard input.
  record Run(String file, boolean json) implements Command {}

  /// Compares session files with what they recorded; may write an XML report.
  record Recheck(List<String> files, Optional<String> report) implements Command {
    public Recheck {
      files = List.copyOf(files);
    }
  }

  /// Shows the forms of the command line.
  record ShowUsage() implements Command {}

  /// Shows the version.
  record ShowVersion() implements Command {}

  /// A command line that means nothing, with the reason.
  record Misused(String reason) implements Command {}

  /// Reads a command line.
  static Command parse(List<String> arguments) {
    if (arguments.isEmpty()) {
      return new OpenConsole(false);
    }
    List<String> rest = arguments.subList(1, arguments.size());
    return switch (arguments.getFirst()) {
      case "--ascii" -> alone(rest, new OpenConsole(true));
      case "run" -> run(rest);
      case "recheck" -> recheck(rest);
      case "help", "--help", "-h" -> alone(rest, new ShowUsage());
      case "version", "--version" -> alone(rest, new ShowVersion());
      default -> unknown(arguments.getFirst());
    };
  }

  private static Command unknown(String word) {
    return new Misused((word.startsWith("-") ? "unknown option: " : "unknown command: ") + word);
  }

  private static Command alone(List<String> rest, Command command) {
    return rest.isEmpty() ? command : new Misused("one argument too many: " + rest.getFirst());
  }

  private static Command run(List<String> rest) {
    boolean json = false;
    List<String> files = new ArrayList<>();
    for (String argument : rest) {
      if (argument.equals("--json")) {
        json = true;
      } else if (argument.startsWith("-") && !argument.equals("-")) {
        return new Misused("unknown option of run: " + argument);
      } else {
        files.add(argument);
      }
    }
    if (files.size() != 1) {
      return new Misused("run takes one file, or - for standard input");
    }
    return new Run(files.getFirst(), json);
  }

  private static Command recheck(List<String> rest) {
    List<String> files = new ArrayList<>();
    Optional<String> report = Optional.empty();
    for (int i = 0; i < rest.size(); i++) {
      String argument = rest.get(i);
      if (argument.equals("--report")) {
        if (i + 1 == rest.size()) {
          return new Misused("--report takes the name of the file to write");
        }
        i++;
        report = Optional.of(rest.get(i));
      } else if (argument.startsWith("-")) {
        return new Misused("unknown option of recheck: " + argument);
      } else {
        files.add(argument);
      }
    }
    if (files.isEmpty()) {
      return new Misused("recheck takes at least one file");
    }
    return new Recheck(files, report);
  }
}
