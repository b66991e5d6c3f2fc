package gnomon.session;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/// What a recheck of one file found, statement by statement.
public record RecheckReport(Path file, List<Item> items, long nanos) {

  public RecheckReport {
    items = List.copyOf(items);
  }

  /// How an answer compares with the recorded one.
  public enum Outcome {
    SAME("same"),
    WRITTEN_DIFFERENTLY("same value, written differently"),
    DIFFERS("differs"),
    FAILED("failed");

    private final String words;

    Outcome(String words) {
      this.words = words;
    }

    /// The outcome in words.
    public String words() {
      return words;
    }

    /// Whether the value is the recorded one.
    public boolean isGood() {
      return this == SAME || this == WRITTEN_DIFFERENTLY;
    }
  }

  /// One statement: the answers recorded and given now, and whether its handle has another number.
  public record Item(
      int line,
      String statement,
      Outcome outcome,
      List<String> recorded,
      List<String> answered,
      boolean movedHandle,
      long nanos) {
    public Item {
      recorded = List.copyOf(recorded);
      answered = List.copyOf(answered);
    }
  }

  /// Whether nothing differs or fails.
  public boolean isGood() {
    return items.stream().allMatch(item -> item.outcome().isGood());
  }

  /// The number of statements with an outcome.
  public long count(Outcome outcome) {
    return items.stream().filter(item -> item.outcome() == outcome).count();
  }

  /// The report as lines: one for each statement that is not simply the same, both answers where
  /// they differ, and a last line that counts.
  public List<String> lines() {
    var lines = new ArrayList<String>();
    for (Item item : items) {
      if (item.outcome() != Outcome.SAME) {
        lines.add(
            file + ":" + item.line() + ": " + item.outcome().words() + ": " + item.statement());
        item.recorded().forEach(text -> lines.add("    recorded | " + text));
        item.answered().forEach(text -> lines.add("    now      | " + text));
      }
    }
    long moved = items.stream().filter(Item::movedHandle).count();
    if (moved > 0) {
      lines.add(file + ": " + counted(moved, "handle") + " moved (not counted as differences)");
    }
    lines.add(file + ": " + tally(List.of(this)));
    return lines;
  }

  /// One line over several files.
  public static String summary(List<RecheckReport> reports) {
    return counted(reports.size(), "file") + ": " + tally(reports);
  }

  private static String tally(List<RecheckReport> reports) {
    var parts = new ArrayList<String>();
    long statements = reports.stream().mapToLong(report -> report.items().size()).sum();
    for (Outcome outcome : Outcome.values()) {
      long count = reports.stream().mapToLong(report -> report.count(outcome)).sum();
      if (count > 0) {
        parts.add(count + " " + outcome.words());
      }
    }
    return counted(statements, "statement")
        + (parts.isEmpty() ? "" : ": " + String.join(", ", parts));
  }

  private static String counted(long count, String noun) {
    return count + " " + noun + (count == 1 ? "" : "s");
  }
}
