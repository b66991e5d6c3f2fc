package gnomon.session;

import gnomon.syntax.SessionFile;
import gnomon.value.FormulaValue;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/// Runs session files in fresh sessions and compares each answer with the recorded one, by value.
/// Nothing is written.
public final class Recheck {

  private Recheck() {}

  /// A file whose text could be read, with its text.
  public record Input(Path file, String text) {}

  /// Rechecks several files, at most `workers` at a time, and reports in the order given.
  public static List<RecheckReport> checkAll(List<Input> inputs, Settings settings, int workers) {
    List<Callable<RecheckReport>> tasks = new ArrayList<>();
    for (Input input : inputs) {
      Path folder = input.file().getParent() == null ? Path.of("") : input.file().getParent();
      tasks.add(() -> checkHere(input.file(), input.text(), settings.withFolder(folder)));
    }
    try (var pool = Executors.newFixedThreadPool(Math.max(1, workers), BigStack.threads())) {
      List<RecheckReport> reports = new ArrayList<>();
      for (Future<RecheckReport> report : pool.invokeAll(tasks)) {
        reports.add(report.get());
      }
      return reports;
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      return List.of();
    } catch (ExecutionException fault) {
      throw new IllegalStateException(fault.getCause());
    }
  }

  /// Rechecks the text of one file.
  public static RecheckReport check(Path file, String text, Settings settings) {
    return BigStack.call(() -> checkHere(file, text, settings));
  }

  /// As [#check], in the thread of the caller.
  static RecheckReport checkHere(Path file, String text, Settings settings) {
    long start = System.nanoTime();
    Session session = Session.of(settings);
    List<RecheckReport.Item> items = new ArrayList<>();
    for (SessionFile.Exchange exchange : SessionFile.parse(text).exchanges()) {
      items.add(item(exchange, session));
    }
    return new RecheckReport(file, items, System.nanoTime() - start);
  }

  /// The file with the answers that a fresh session gives.
  static SessionFile renewed(SessionFile file, Settings settings) {
    Session session = Session.of(settings);
    List<SessionFile.Block> blocks = new ArrayList<>();
    for (SessionFile.Block block : file.blocks()) {
      blocks.add(
          switch (block) {
            case SessionFile.Exchange exchange -> {
              Reply reply = session.submit(new Request(exchange.statement(), exchange.line()));
              yield exchange.withAnswer(ReplyText.lines(reply, settings.spelling()));
            }
            case SessionFile.Prose prose -> prose;
          });
    }
    return new SessionFile(blocks);
  }

  /// The text of a session file with the answers that a fresh session gives.
  public static String rerecorded(String text, Settings settings) {
    return BigStack.call(() -> renewed(SessionFile.parse(text), settings).text());
  }

  private static RecheckReport.Item item(SessionFile.Exchange exchange, Session session) {
    long start = System.nanoTime();
    State before = session.state();
    Reply reply = session.submit(new Request(exchange.statement(), exchange.line()));
    List<String> recorded = exchange.answer();
    List<String> answered = ReplyText.lines(reply, session.settings().spelling());
    return new RecheckReport.Item(
        exchange.line(),
        exchange.statement(),
        outcome(recorded, reply, before, session),
        recorded,
        answered,
        moved(recorded, answered),
        System.nanoTime() - start);
  }

  private static boolean moved(List<String> recorded, List<String> answered) {
    return !recorded.isEmpty()
        && !answered.isEmpty()
        && isStatusLine(recorded.getLast())
        && isStatusLine(answered.getLast())
        && !handle(recorded.getLast()).equals(handle(answered.getLast()));
  }

  private static RecheckReport.Outcome outcome(
      List<String> recorded, Reply reply, State before, Session session) {
    for (Spelling spelling : Spelling.values()) {
      if (withoutHandle(recorded).equals(withoutHandle(ReplyText.lines(reply, spelling)))) {
        return RecheckReport.Outcome.SAME;
      }
    }
    return switch (reply) {
      case Reply.Failure failure -> failed(recorded, failure);
      case Reply.Answer answer -> compared(recorded, answer, before, session);
      case Reply.Note _,
          Reply.Page _,
          Reply.Replayed _,
          Reply.Rechecked _,
          Reply.Nothing _,
          Reply.Left _ ->
          RecheckReport.Outcome.DIFFERS;
    };
  }

  /// An error compares by its code.
  private static RecheckReport.Outcome failed(List<String> recorded, Reply.Failure failure) {
    String beginning = "error " + failure.diagnostic().code() + ":";
    if (!recorded.isEmpty() && recorded.getFirst().startsWith(beginning)) {
      return RecheckReport.Outcome.WRITTEN_DIFFERENTLY;
    }
    return RecheckReport.Outcome.FAILED;
  }

  private static RecheckReport.Outcome compared(
      List<String> recorded, Reply.Answer answer, State before, Session session) {
    List<String> lines =
        !recorded.isEmpty() && isStatusLine(recorded.getLast())
            ? recorded.subList(0, recorded.size() - 1)
            : recorded;
    Value value = ((ShownValue) answer.shown()).value();
    boolean same =
        switch (value) {
          case VerdictValue verdict ->
              !lines.isEmpty() && lines.getFirst().startsWith(verdict.status().word());
          case FormulaValue formula -> String.join("\n", lines).equals(formula.tex());
          case Value other -> {
            Optional<Value> meant = session.reading(before, String.join("\n", lines));
            yield meant.filter(that -> that.sameAs(other) || other.sameAs(that)).isPresent();
          }
        };
    return same ? RecheckReport.Outcome.WRITTEN_DIFFERENTLY : RecheckReport.Outcome.DIFFERS;
  }

  private static boolean isStatusLine(String line) {
    return line.matches("@\\d+( .*)?");
  }

  private static String handle(String line) {
    int end = line.indexOf(' ');
    return end < 0 ? line : line.substring(0, end);
  }

  private static List<String> withoutHandle(List<String> lines) {
    if (lines.isEmpty() || !isStatusLine(lines.getLast())) {
      return lines;
    }
    List<String> rest = new ArrayList<>(lines.subList(0, lines.size() - 1));
    rest.add("@" + lines.getLast().substring(handle(lines.getLast()).length()));
    return rest;
  }
}
