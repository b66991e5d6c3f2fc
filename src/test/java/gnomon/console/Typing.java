package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PipedInputStream;
import java.io.PipedOutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.util.HashMap;
import java.util.Map;
import org.jline.terminal.Size;
import org.jline.terminal.Terminal;
import org.jline.terminal.impl.DumbTerminal;
import org.jline.terminal.impl.ExternalTerminal;

/// A person at a console, for tests: types keys and waits for what is shown.
final class Typing implements AutoCloseable {
  private static final Duration PATIENCE = Duration.ofSeconds(90);
  private static final int PIPE = 1 << 16;

  private final Screen screen = new Screen();
  private final PipedOutputStream keys = new PipedOutputStream();
  private final Terminal terminal;
  private final Thread conversation;

  private Typing(String type, Path state, Map<String, String> more, boolean ascii)
      throws IOException {
    InputStream input = new PipedInputStream(keys, PIPE);
    this.terminal =
        type.equals("dumb")
            ? new DumbTerminal("test", type, input, screen, StandardCharsets.UTF_8)
            : new ExternalTerminal("test", type, input, screen, StandardCharsets.UTF_8);
    terminal.setSize(new Size(60, 24));
    Map<String, String> environment = new HashMap<>(more);
    environment.put("XDG_STATE_HOME", state.toString());
    Console console = Console.open(terminal, environment, ascii, state);
    this.conversation = Thread.ofPlatform().daemon().start(() -> converse(console));
  }

  /// Sits down at a terminal that cannot move its cursor.
  static Typing atDumbTerminal(Path state, boolean ascii) throws IOException {
    return new Typing("dumb", state, Map.of(), ascii);
  }

  /// Sits down at a terminal that can.
  static Typing atTerminal(Path state, Map<String, String> environment) throws IOException {
    return new Typing("xterm-256color", state, environment, false);
  }

  private static void converse(Console console) {
    try {
      console.converse("good morning");
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }

  /// Types keys as they are.
  Typing type(String text) throws IOException {
    keys.write(text.getBytes(StandardCharsets.UTF_8));
    keys.flush();
    return this;
  }

  /// Types a line and ends it.
  Typing line(String text) throws IOException {
    return type(text + "\n");
  }

  /// Waits until a text is shown after everything that was waited for before.
  Typing await(String text) throws InterruptedException {
    assertTrue(screen.await(text), "not shown: " + text + "\nbut:\n" + screen.all());
    return this;
  }

  /// Presses Ctrl-C.
  Typing interrupt() {
    terminal.raise(Terminal.Signal.INT);
    return this;
  }

  /// Ends the input, waits for the console to end, and answers with all that was shown.
  String leave() throws IOException, InterruptedException {
    keys.close();
    assertTrue(conversation.join(PATIENCE), "the console does not end:\n" + screen.all());
    return screen.all();
  }

  @Override
  public void close() throws IOException {
    terminal.close();
  }

  private static final class Screen extends OutputStream {
    private final ByteArrayOutputStream shown = new ByteArrayOutputStream();
    private int seen;

    @Override
    public synchronized void write(int octet) {
      shown.write(octet);
      notifyAll();
    }

    @Override
    public synchronized void write(byte[] octets, int start, int length) {
      shown.write(octets, start, length);
      notifyAll();
    }

    synchronized boolean await(String text) throws InterruptedException {
      long end = System.nanoTime() + PATIENCE.toNanos();
      while (System.nanoTime() < end) {
        int found = all().indexOf(text, seen);
        if (found >= 0) {
          seen = found + text.length();
          return true;
        }
        wait(50);
      }
      return false;
    }

    synchronized String all() {
      return shown.toString(StandardCharsets.UTF_8);
    }
  }
}
