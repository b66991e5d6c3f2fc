package gnomon.console;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.regex.Pattern;
import org.jline.reader.Candidate;

/// Names of files and folders for the statements that take one.
record FileNames(Path folder) {
  private static final Pattern WANTED =
      Pattern.compile("\\s*(keep|replay|recheck|rerecord)\\s+", Pattern.DOTALL);

  /// Whether a file name is expected after this text.
  static boolean areWanted(String text) {
    return WANTED.matcher(text).matches();
  }

  /// Session files and folders whose name begins so, each with its opening quote; a file's name is
  /// closed with another.
  List<Candidate> beginningWith(String start) {
    int slash = start.lastIndexOf('/') + 1;
    List<Candidate> found = new ArrayList<>();
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(place(start, slash))) {
      for (Path entry : entries) {
        String name = entry.getFileName().toString();
        boolean hidden = name.startsWith(".");
        if (name.startsWith(start.substring(slash)) && !hidden) {
          found.add(candidate(start.substring(0, slash) + name, Files.isDirectory(entry)));
        }
      }
    } catch (IOException | InvalidPathException nothingThere) {
      return List.of();
    }
    found.sort(Comparator.comparing(Candidate::value));
    return found;
  }

  private Path place(String start, int slash) {
    return folder.toAbsolutePath().resolve(start.substring(0, slash));
  }

  private static Candidate candidate(String name, boolean isFolder) {
    String value = isFolder ? "\"" + name + "/" : "\"" + name + "\"";
    String description =
        isFolder ? "a folder" : name.endsWith(".gnomon") ? "a session file" : "a file";
    return new Candidate(value, name, null, description, null, null, false);
  }
}
