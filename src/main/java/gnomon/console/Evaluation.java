package gnomon.console;

import gnomon.session.Reply;
import gnomon.session.Session;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import org.jline.terminal.Attributes;
import org.jline.terminal.Terminal;
import org.jline.utils.AttributedString;
import org.jspecify.annotations.Nullable;

/// Has the session answer a statement in a thread of its own, so that the person can stop it.
///
/// The first Ctrl-C asks the computation to stop. If it has not stopped after a short while, or at
/// a second Ctrl-C, it is given up: the session throws its result away, and the thread runs out
/// with the lowest priority.
final class Evaluation {
  private static final Duration QUIET = Duration.ofMillis(500);
  private static final Duration PULSE = Duration.ofMillis(100);
  private static final Duration PATIENCE = Duration.ofMillis(700);
  private static final long STACK = 512L << 20;

  private final Session session;
  private final Terminal terminal;
  private final Look look;
  private final Printed printed;

  Evaluation(Session session, Terminal terminal, Look look) {
    this.session = session;
    this.terminal = terminal;
    this.look = look;
    this.printed = new Printed(look, Look.width(terminal));
  }

  /// How a statement ended.
  sealed interface Outcome {
    /// The session replied, and these lines show it; `stopped` says that the person had asked it to
    /// stop.
    record Answered(Reply reply, List<AttributedString> lines, boolean stopped)
        implements Outcome {}

    /// The person stopped a computation that did not heed it in time.
    record GivenUp() implements Outcome {}

    /// The computation died of a fault that the session did not catch.
    record Broken(Throwable fault) implements Outcome {}
  }

  /// What the waiting thread hears.
  private sealed interface Event {
    record Ended(Outcome outcome) implements Event {}

    record StopWanted() implements Event {}
  }

  /// Waits for the answer to a statement.
  Outcome answer(String statement) {
    BlockingQueue<Event> events = new LinkedBlockingQueue<>();
    var before = terminal.handle(Terminal.Signal.INT, _ -> events.add(new Event.StopWanted()));
    Progress progress = new Progress(terminal, look, statement);
    Optional<Attributes> echoing = silence();
    Thread thread =
        Thread.ofPlatform()
            .daemon()
            .name("evaluation")
            .stackSize(STACK)
            .start(() -> events.add(new Event.Ended(reply(statement))));
    try {
      return await(thread, events, progress);
    } finally {
      progress.clear();
      echoing.ifPresent(terminal::setAttributes);
      terminal.handle(Terminal.Signal.INT, before);
    }
  }

  /// What is typed ahead shall not be shown in the middle of the progress line; the line editor
  /// shows it at the next prompt. Answers with the attributes to go back to.
  private Optional<Attributes> silence() {
    if (look.plain()) {
      return Optional.empty();
    }
    Attributes echoing = terminal.getAttributes();
    Attributes silent = new Attributes(echoing);
    silent.setLocalFlag(Attributes.LocalFlag.ECHO, false);
    terminal.setAttributes(silent);
    return Optional.of(echoing);
  }

  private Outcome reply(String statement) {
    try {
      Reply reply = session.submit(statement);
      return new Outcome.Answered(reply, printed.lines(reply), false);
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError fault) {
      return new Outcome.Broken(fault);
    }
  }

  private Outcome await(Thread thread, BlockingQueue<Event> events, Progress progress) {
    long start = System.nanoTime();
    long stopWanted = 0;
    boolean stopping = false;
    while (true) {
      Duration elapsed = Duration.ofNanos(System.nanoTime() - start);
      switch (next(events, elapsed.compareTo(QUIET) < 0 ? QUIET.minus(elapsed) : PULSE)) {
        case Event.Ended(Outcome.Answered(Reply reply, var lines, boolean _)) -> {
          return new Outcome.Answered(reply, lines, stopping);
        }
        case Event.Ended(Outcome other) -> {
          return other;
        }
        case Event.StopWanted _ -> {
          if (stopping) {
            return giveUp(thread);
          }
          stopping = true;
          stopWanted = System.nanoTime();
          session.cancel();
        }
        case null -> progress.show(Duration.ofNanos(System.nanoTime() - start));
      }
      if (stopping && System.nanoTime() - stopWanted > PATIENCE.toNanos()) {
        return giveUp(thread);
      }
    }
  }

  private static @Nullable Event next(BlockingQueue<Event> events, Duration patience) {
    try {
      return events.poll(Math.max(1, patience.toMillis()), TimeUnit.MILLISECONDS);
    } catch (InterruptedException stop) {
      return new Event.StopWanted();
    }
  }

  private Outcome giveUp(Thread thread) {
    session.abandon();
    thread.setPriority(Thread.MIN_PRIORITY);
    return new Outcome.GivenUp();
  }
}
