package gnomon.session;

import java.time.Duration;
import java.util.Optional;

/// How much one statement may use.
///
/// `time` is wall-clock time, absent in a console where a person can interrupt; `cells` bounds the
/// estimated size of one result (terms of a polynomial times their words, entries of a matrix);
/// `depth` bounds the nesting of brackets and of calls; `steps` bounds the calls of defined
/// functions in one statement.
public record Limits(Optional<Duration> time, long cells, int depth, int steps) {

  public Limits {
    if (cells <= 0 || depth <= 0 || steps <= 0) {
      throw new IllegalArgumentException("limits are positive");
    }
  }

  /// The limits of a console: size and nesting only.
  public static Limits console() {
    return new Limits(Optional.empty(), 20_000_000L, 400, 100_000);
  }

  /// The limits of run and recheck: those of the console and a minute for each statement.
  public static Limits batch() {
    return console().withTime(Duration.ofSeconds(60));
  }

  /// The same limits with another limit of time.
  public Limits withTime(Duration duration) {
    return new Limits(Optional.of(duration), cells, depth, steps);
  }
}
