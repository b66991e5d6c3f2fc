package gnomon.session;

import java.nio.file.Path;
import java.util.function.Consumer;

/// How a session works: its limits, the spelling of what it writes to files, the folder that file
/// names are relative to, and who is told each accepted statement as soon as it is done.
public record Settings(Limits limits, Spelling spelling, Path folder, Consumer<String> journal) {

  /// For a console: no limit of time.
  public static Settings console() {
    return new Settings(Limits.console(), Spelling.UNICODE, Path.of(""), statement -> {});
  }

  /// For run and recheck: with a limit of time.
  public static Settings batch() {
    return console().withLimits(Limits.batch());
  }

  /// The same with other limits.
  public Settings withLimits(Limits other) {
    return new Settings(other, spelling, folder, journal);
  }

  /// The same with another spelling.
  public Settings withSpelling(Spelling other) {
    return new Settings(limits, other, folder, journal);
  }

  /// The same relative to another folder.
  public Settings withFolder(Path other) {
    return new Settings(limits, spelling, other, journal);
  }

  /// The same with another listener for accepted statements.
  public Settings withJournal(Consumer<String> other) {
    return new Settings(limits, spelling, folder, other);
  }
}
