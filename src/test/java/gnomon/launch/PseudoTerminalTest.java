package gnomon.launch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// The whole program at a real pseudo-terminal, which the command `script` makes.
final class PseudoTerminalTest {
  private static final Path SCRIPT = Path.of("/usr/bin/script");
  private static final long PATIENCE = TimeUnit.SECONDS.toNanos(120);
  private static final String LONG_WORK = "(X + D)^190";

  @TempDir Path scratch;
  private final StringBuilder shown = new StringBuilder();
  private int seen;

  @Test
  void aPersonCanWorkStopAComputationAndLeave() throws Exception {
    assumeTrue(Files.isExecutable(SCRIPT), "no command to make a pseudo-terminal");
    Process program = start();
    try {
      await("∟ ");
      type(program, "let course = x^3\r");
      await("@1");
      type(program, "Delta course\r");
      await("3 x^2 + 3 x + 1");
      type(program, LONG_WORK + "\r");
      await("Ctrl-C stops it");
      type(program, "\u0003");
      await("topped");
      await("∟ ");
      type(program, "course at x = 5\r");
      await("125");
      await("∟ ");
      type(program, "an unfinished thought\u0003");
      await("∟ ");
      type(program, "\u0004");
      assertTrue(program.waitFor(PATIENCE, TimeUnit.NANOSECONDS), this::everything);
      assertEquals(0, program.exitValue(), this::everything);
    } finally {
      program.destroyForcibly();
    }
  }

  private Process start() throws IOException {
    String classes =
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    String command =
        "stty rows 24 cols 80; exec '%s' -Xss4m --enable-native-access=ALL-UNNAMED -cp '%s' %s"
            .formatted(java, classes, Main.class.getName());
    ProcessBuilder builder =
        new ProcessBuilder(SCRIPT.toString(), "-qec", command, "/dev/null")
            .redirectErrorStream(true);
    builder.environment().put("XDG_STATE_HOME", scratch.toString());
    builder.environment().put("TERM", "xterm-256color");
    builder.environment().put("LC_ALL", "C.UTF-8");
    Process program = builder.start();
    Thread.ofPlatform().daemon().start(() -> watch(program.inputReader(StandardCharsets.UTF_8)));
    return program;
  }

  private static void type(Process program, String keys) throws IOException {
    program.getOutputStream().write(keys.getBytes(StandardCharsets.UTF_8));
    program.getOutputStream().flush();
  }

  private void watch(Reader output) {
    char[] some = new char[4096];
    try {
      for (int count = output.read(some); count >= 0; count = output.read(some)) {
        show(new String(some, 0, count));
      }
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }

  private synchronized void show(String text) {
    shown.append(text);
    notifyAll();
  }

  private synchronized void await(String text) throws InterruptedException {
    long end = System.nanoTime() + PATIENCE;
    while (shown.indexOf(text, seen) < 0) {
      assertTrue(System.nanoTime() < end, () -> "not shown: " + text + "\n" + everything());
      wait(50);
    }
    seen = shown.indexOf(text, seen) + text.length();
  }

  private synchronized String everything() {
    return shown.toString();
  }
}
