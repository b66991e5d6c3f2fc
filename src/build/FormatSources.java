import com.google.googlejavaformat.java.Formatter;
import com.google.googlejavaformat.java.FormatterException;
import com.google.googlejavaformat.java.ImportOrderer;
import com.google.googlejavaformat.java.JavaFormatterOptions;
import com.google.googlejavaformat.java.RemoveUnusedImports;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/// Checks or rewrites the layout of every Java source below a folder.
///
/// Run by the build on the selected JDK as `FormatSources.java check|write FOLDER`. In `check` mode
/// the exit status is 1 when a file would change, and each such file is named.
public final class FormatSources {
  private FormatSources() {}

  static void main(String[] arguments) throws IOException {
    boolean write = arguments[0].equals("write");
    Path root = Path.of(arguments[1]);
    List<Path> changed = new ArrayList<>();
    boolean broken = false;
    for (Path file : sources(root)) {
      String before = Files.readString(file);
      try {
        String after = formatted(before);
        if (!after.equals(before)) {
          changed.add(file);
          if (write) {
            Files.writeString(file, after);
          }
        }
      } catch (FormatterException problem) {
        broken = true;
        System.err.println(file + " cannot be read as Java: " + problem.getMessage());
      }
    }
    if (!write) {
      changed.forEach(file -> System.err.println("not in the house format: " + file));
    }
    if (!changed.isEmpty() && !write) {
      System.err.println("Try: mvn -q -Pformat process-sources");
    }
    System.exit(broken || (!write && !changed.isEmpty()) ? 1 : 0);
  }

  private static List<Path> sources(Path root) throws IOException {
    try (var files = Files.walk(root)) {
      return files.filter(file -> file.toString().endsWith(".java")).sorted().toList();
    }
  }

  private static String formatted(String source) throws FormatterException {
    String ordered = ImportOrderer.reorderImports(source, JavaFormatterOptions.Style.GOOGLE);
    return new Formatter().formatSource(RemoveUnusedImports.removeUnusedImports(ordered));
  }
}
