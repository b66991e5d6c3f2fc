package gnomon.launch;

import gnomon.console.Console;
import gnomon.session.JunitReport;
import gnomon.session.Recheck;
import gnomon.session.RecheckReport;
import gnomon.session.Session;
import gnomon.session.Settings;
import java.io.BufferedOutputStream;
import java.io.BufferedReader;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.PrintStream;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jline.terminal.Size;
import org.jline.terminal.Terminal;
import org.jline.terminal.TerminalBuilder;
import org.jline.utils.InfoCmp;
import org.jspecify.annotations.Nullable;

/// Where the program starts.
public final class Main {
  /// The version of the program.
  static final String VERSION = "0.1.0";

  private static final String USAGE =
      """
      gnomon [--ascii]                        open the console
      gnomon run FILE [--json]                answer the statements of a session file, - for the input
      gnomon recheck FILE... [--report FILE]  compare session files with what they recorded
      gnomon --help                           show this
      gnomon --version                        show the version

      exit status: 0 all fine, 1 a statement failed or an answer differs, 2 usage,
      3 a file cannot be read or written, 70 a fault of the program itself
      """;

  /// The size to work with where a terminal does not know its own.
  private static final Size USUAL_SIZE = new Size(80, 24);

  private Main() {}

  static void main(String[] arguments) {
    ExitStatus status = obey(Command.parse(List.of(arguments)));
    System.out.flush();
    // Computations that were given up may still be running out.
    System.exit(status.code());
  }

  private static ExitStatus obey(Command command) {
    try {
      return switch (command) {
        case Command.OpenConsole(boolean ascii) -> converse(ascii);
        case Command.Run(String file, boolean json) -> run(file, json);
        case Command.Recheck(List<String> files, Optional<String> report) -> recheck(files, report);
        case Command.ShowUsage _ -> print(USAGE);
        case Command.ShowVersion _ -> print("gnomon " + VERSION + "\n");
        case Command.Misused(String reason) -> {
          complain(reason + "\n" + USAGE);
          yield ExitStatus.USAGE;
        }
      };
    } catch (IOException failure) {
      complain(wording(failure) + "\n");
      return ExitStatus.FILE;
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError fault) {
      complain("a fault of the program itself: " + fault + "\n");
      return ExitStatus.INTERNAL;
    }
  }

  private static ExitStatus converse(boolean ascii) throws IOException {
    boolean narrow = ascii || !"UTF-8".equals(System.getProperty("native.encoding"));
    knowTerminal(System.getenv("TERM"));
    try (Terminal terminal =
        TerminalBuilder.builder()
            .name("gnomon")
            .system(true)
            .provider("jni")
            .dumb(true)
            .nativeSignals(true)
            .encoding(StandardCharsets.UTF_8)
            .build()) {
      if (terminal.getWidth() <= 0 || terminal.getHeight() <= 0) {
        terminal.setSize(USUAL_SIZE);
      }
      String greeting = "gnomon " + VERSION + ". help explains every word, Ctrl-D leaves.";
      Console.open(terminal, System.getenv(), narrow, Path.of("")).converse(greeting);
    }
    return ExitStatus.FINE;
  }

  /// Uses the description of the terminal that JLine carries, where it has one: asking the system
  /// for it starts another program, the slowest part of opening the console.
  private static void knowTerminal(@Nullable String type) {
    String description = type == null ? null : InfoCmp.getDefaultInfoCmp(type);
    if (description != null) {
      InfoCmp.setLoadedInfoCmp(type, description);
    }
  }

  private static ExitStatus run(String file, boolean json) throws IOException {
    boolean standard = file.equals("-");
    Path folder = standard ? Path.of("") : Path.of(file).toAbsolutePath().getParent();
    try (BufferedReader input =
            standard ? standardInput() : Files.newBufferedReader(Path.of(file));
        PrintStream out = stream(FileDescriptor.out)) {
      Session session = Session.of(Settings.batch().withFolder(folder));
      return new Batch(session, out, json).answer(input);
    }
  }

  private static ExitStatus recheck(List<String> files, Optional<String> report)
      throws IOException {
    ExitStatus status = ExitStatus.FINE;
    List<Recheck.Input> inputs = new ArrayList<>();
    for (String file : files) {
      try {
        inputs.add(new Recheck.Input(Path.of(file), Files.readString(Path.of(file))));
      } catch (IOException unreadable) {
        complain(wording(unreadable) + "\n");
        status = ExitStatus.FILE;
      }
    }
    int workers = Runtime.getRuntime().availableProcessors();
    List<RecheckReport> reports = Recheck.checkAll(inputs, Settings.batch(), workers);
    for (RecheckReport each : reports) {
      each.lines().forEach(line -> print(line + "\n"));
      status = status.worse(each.isGood() ? ExitStatus.FINE : ExitStatus.SOME_FAILED);
    }
    print(RecheckReport.summary(reports) + "\n");
    if (report.isPresent()) {
      Files.writeString(Path.of(report.get()), JunitReport.xml(reports));
    }
    return status;
  }

  private static BufferedReader standardInput() {
    return new BufferedReader(
        new InputStreamReader(
            new FileInputStream(FileDescriptor.in), StandardCharsets.UTF_8.newDecoder()));
  }

  private static ExitStatus print(String text) {
    write(FileDescriptor.out, text);
    return ExitStatus.FINE;
  }

  private static void complain(String text) {
    write(FileDescriptor.err, text);
  }

  private static void write(FileDescriptor descriptor, String text) {
    PrintStream stream = stream(descriptor);
    stream.print(text);
    stream.flush();
  }

  private static PrintStream stream(FileDescriptor descriptor) {
    var bytes = new BufferedOutputStream(new FileOutputStream(descriptor));
    return new PrintStream(bytes, false, StandardCharsets.UTF_8);
  }

  private static String wording(IOException failure) {
    return switch (failure) {
      case NoSuchFileException missing -> missing.getFile() + ": there is no such file";
      case AccessDeniedException denied -> denied.getFile() + ": access is denied";
      case CharacterCodingException _ -> "the file is not UTF-8 text";
      case FileSystemException other -> other.getFile() + ": " + other.getReason();
      default -> String.valueOf(failure.getMessage());
    };
  }
}
