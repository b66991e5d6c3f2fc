package gnomon.console;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Map;

/// Where the console keeps what outlives it: the history and the journals of running sessions.
///
/// Source: XDG Base Directory Specification 0.8, `$XDG_STATE_HOME` (from memory): the default is
/// `~/.local/state`, and a path that is not absolute is ignored.
public record StateFolder(Path path) {

  /// The folder for an environment.
  public static StateFolder of(Map<String, String> environment) {
    String stated = environment.getOrDefault("XDG_STATE_HOME", "");
    if (!stated.isEmpty() && Path.of(stated).isAbsolute()) {
      return new StateFolder(Path.of(stated, "gnomon"));
    }
    String home = environment.getOrDefault("HOME", System.getProperty("user.home", "."));
    return new StateFolder(Path.of(home, ".local", "state", "gnomon"));
  }

  /// The file of lines typed.
  Path history() {
    return path.resolve("history");
  }

  /// The folder of the journals of sessions that have not ended.
  Path journals() {
    return path.resolve("running");
  }

  /// The folder of the journals that were not wanted again.
  Path setAside() {
    return path.resolve("set-aside");
  }

  /// Makes sure that the folders are there, for the user alone.
  void create() throws IOException {
    var mine = PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------"));
    for (Path folder : new Path[] {path, journals(), setAside()}) {
      if (!Files.isDirectory(folder)) {
        Files.createDirectories(folder, mine);
      }
    }
  }
}
