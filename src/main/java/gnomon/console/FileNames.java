package gnomon.console;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jline.reader.Candidate;

/// Names of files and folders for the statements that take one.
record FileNames(Path folder) {
  private static final Pattern STATEMENT =
      Pattern.compile("\\s*(?:keep|replay|recheck|rerecord)\\s+((?:\"[^\"]*)?)");

  /// What has been typed of a file name, with its opening quote, if one is expected at the end of
  /// this text.
  static Optional<String> start(String text) {
    Matcher matcher = STATEMENT.matcher(text);
    return matcher.matches() ? Optional.of(matcher.group(1)) : Optional.empty();
  }

  /// Files and folders whose name begins so, each with its opening quote; a file's name is closed
  /// with another.
  List<Candidate> beginningWith(String typed) {
    String start = typed.startsWith("\"") ? typed.substring(1) : typed;
    int slash = start.lastIndexOf('/') + 1;
    List<Candidate> found = new ArrayList<>();
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(place(start, slash))) {
      for (Path entry : entries) {
        String name = entry.getFileName().toString();
        if (name.startsWith(start.substring(slash)) && !name.startsWith(".")) {
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
