package gnomon.console;

import gnomon.session.Reply;
import gnomon.session.Session;
import gnomon.session.Settings;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jline.reader.EndOfFileException;
import org.jline.reader.UserInterruptException;
import org.jline.terminal.Terminal;
import org.jline.utils.AttributedString;
import org.jspecify.annotations.Nullable;

/// One conversation with a person at a terminal.
public final class Console {
  private final Terminal terminal;
  private final Look look;
  private final StateFolder state;
  private final Optional<Journal> journal;
  private final Session session;
  private final LineEditor editor;
  private @Nullable KnownWords words;

  private Console(Terminal terminal, Look look, StateFolder state, Path folder) throws IOException {
    this.terminal = terminal;
    this.look = look;
    this.state = state;
    this.journal = begin(state);
    Settings settings = Settings.console().withSpelling(look.spelling()).withFolder(folder);
    this.session = Session.of(settings.withJournal(this::note));
    Optional<Path> history = journal.map(_ -> state.history());
    this.editor = Editors.of(terminal, look, this::words, history, folder);
    terminal.handle(Terminal.Signal.INT, Terminal.SignalHandler.SIG_IGN);
  }

  /// Opens a console. `folder` is the one that file names are relative to.
  public static Console open(
      Terminal terminal, Map<String, String> environment, boolean ascii, Path folder)
      throws IOException {
    Look look = Look.of(terminal, environment, ascii);
    return new Console(terminal, look, StateFolder.of(environment), folder);
  }

  /// Talks until the person leaves. `greeting` is shown first.
  public void converse(String greeting) throws IOException {
    try {
      say(greeting);
      if (journal.isEmpty()) {
        say(List.of(new AttributedString("History cannot be kept in " + state.path() + ".")));
      } else {
        new Recovery(state, this).offer();
      }
      while (step()) {
        words = null;
      }
    } catch (EndOfFileException end) {
      // The input is over, which is a way to leave.
    }
    if (journal.isPresent()) {
      journal.get().close();
    }
    terminal.flush();
  }

  /// Reads and answers once; false when the person leaves.
  private boolean step() {
    String text;
    try {
      text = editor.readLine(look.prompt());
    } catch (UserInterruptException cleared) {
      return true;
    } catch (EndOfFileException end) {
      if (end.getPartialLine() != null) {
        answerAll(end.getPartialLine());
      }
      return false;
    }
    return answerAll(text);
  }

  private boolean answerAll(String text) {
    for (String statement : Statements.split(text)) {
      switch (new Evaluation(session, terminal, look).answer(statement)) {
        case Evaluation.Outcome.Answered(Reply.Left _, var _, boolean _) -> {
          return false;
        }
        case Evaluation.Outcome.Answered(Reply _, var lines, boolean stopped) -> {
          say(lines);
          if (stopped) {
            return true;
          }
        }
        case Evaluation.Outcome.GivenUp _ -> {
          say("Stopped. What had been begun runs out in the background; its result is not kept.");
          return true;
        }
        case Evaluation.Outcome.Broken(Throwable fault) ->
            say("A fault of the program itself: " + fault + ". The session goes on.");
      }
    }
    return true;
  }

  /// Asks a question that is no statement; empty when the person does not want to answer.
  Optional<String> ask(String question) {
    editor.setVariable(LineEditor.DISABLE_HISTORY, true);
    try {
      return Optional.of(editor.readLine(question));
    } catch (UserInterruptException unanswered) {
      return Optional.empty();
    } finally {
      editor.setVariable(LineEditor.DISABLE_HISTORY, false);
    }
  }

  /// Evaluates a statement again without showing the answer; whether it was accepted.
  boolean restore(String statement) {
    return new Evaluation(session, terminal, look).answer(statement)
            instanceof Evaluation.Outcome.Answered(Reply reply, var _, boolean stopped)
        && !stopped
        && reply.isAccepted();
  }

  /// The statements of a journal.
  List<String> statements(Path file) throws IOException {
    return Statements.split(Files.readString(file));
  }

  /// Shows one line of prose.
  void say(String text) {
    say(Printed.wrapped(text, Look.width(terminal)).stream().map(AttributedString::new).toList());
  }

  private void say(List<AttributedString> lines) {
    for (AttributedString line : lines) {
      terminal.writer().println(line.toAnsi(terminal));
    }
    terminal.flush();
  }

  private KnownWords words() {
    KnownWords known = words;
    if (known == null) {
      known = KnownWords.of(session.words());
      words = known;
    }
    return known;
  }

  private void note(String statement) {
    journal.ifPresent(book -> book.add(statement));
  }

  private static Optional<Journal> begin(StateFolder state) {
    try {
      state.create();
      return Optional.of(Journal.begin(state));
    } catch (IOException | UnsupportedOperationException noFolder) {
      return Optional.empty();
    }
  }
}
