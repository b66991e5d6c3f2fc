package gnomon.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/// House rules that only the source text shows.
final class SourcesTest {
  private static final Path MAIN = Path.of("src/main/java/gnomon");
  private static final int CEILING = 500;

  /// Files that may be longer than the ceiling, each with the reason.
  private static final Map<String, String> LONG_FILES = Map.of();

  private static final Set<String> FLOATING_ALLOWED =
      Set.of("render", "decimal", "console", "launch");

  private static final Pattern FLOATING = Pattern.compile("\\b(float|double|Float|Double)\\b");
  private static final Pattern BANNED_TYPE =
      Pattern.compile("(class|interface|record|enum) (\\w+(Impl|Util|Utils|Helper|Manager))\\b");

  private static final Pattern BANNED_METHOD =
      Pattern.compile(
          "(?<!@Override\n)^ +(?!return|throw|yield|else|assert)[\\w<>\\[\\]?, ]+ get[A-Z]\\w*\\(",
          Pattern.MULTILINE);

  private static final Pattern NOT_CODE =
      Pattern.compile(
          "\"\"\".*?\"\"\"|\"(?:\\\\.|[^\"\\\\\n])*\"|'(?:\\\\.|[^'\\\\\n])+'|//[^\n]*|/\\*.*?\\*/",
          Pattern.DOTALL);

  @Test
  void thereAreSources() throws IOException {
    assertFalse(sources(MAIN).isEmpty());
  }

  @Test
  void filesStayUnderTheCeiling() throws IOException {
    List<String> tooLong = new ArrayList<>();
    for (Path root : List.of(MAIN, Path.of("src/test/java"), Path.of("src/build"))) {
      for (Path file : sources(root)) {
        int lines = Files.readAllLines(file).size();
        if (lines > CEILING && !LONG_FILES.containsKey(file.getFileName().toString())) {
          tooLong.add(file + ": " + lines + " lines");
        }
      }
    }
    assertEquals(List.of(), tooLong);
  }

  @Test
  void theExactRoomsHaveNoFloatingVariables() throws IOException {
    List<String> found = new ArrayList<>();
    for (Path file : sources(MAIN)) {
      if (!FLOATING_ALLOWED.contains(MAIN.relativize(file).getName(0).toString())) {
        found.addAll(matches(file, FLOATING));
      }
    }
    assertEquals(List.of(), found);
  }

  @Test
  void namesSayWhatThingsAre() throws IOException {
    List<String> found = new ArrayList<>();
    for (Path file : sources(MAIN)) {
      found.addAll(matches(file, BANNED_TYPE));
      found.addAll(matches(file, BANNED_METHOD));
    }
    assertEquals(List.of(), found);
  }

  @Test
  void everyRoomSaysWhatItPromises() throws IOException {
    List<String> silent = new ArrayList<>();
    for (Path file : sources(MAIN)) {
      Path info = file.resolveSibling("package-info.java");
      if (!Files.exists(info)
          || !Files.readString(info).contains("@NullMarked")
          || !Files.readString(info).startsWith("///")) {
        silent.add(file.getParent().toString());
      }
    }
    assertEquals(List.of(), silent.stream().distinct().toList());
  }

  private static List<String> matches(Path file, Pattern pattern) throws IOException {
    String code = NOT_CODE.matcher(Files.readString(file)).replaceAll(" ");
    return pattern
        .matcher(code)
        .results()
        .map(match -> file + ": " + match.group().strip())
        .toList();
  }

  private static List<Path> sources(Path root) throws IOException {
    if (!Files.exists(root)) {
      return List.of();
    }
    try (var files = Files.walk(root)) {
      return files.filter(file -> file.toString().endsWith(".java")).sorted().toList();
    }
  }
}
