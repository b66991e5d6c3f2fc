package gnomon.session;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// All pages of the language, read from the resource files beside this class when first asked for.
///
/// A page begins with a line `== word, glyph`, then one line of description, then its text; a line
/// `Examples` introduces statements with their recorded answers, in the form of a session file.
public final class HelpPages {
  private static final List<String> TOPICS =
      List.of("operators", "maps", "functions", "clauses", "statements", "writing");

  private final Map<String, HelpPage> pages;

  private HelpPages(Map<String, HelpPage> pages) {
    this.pages = pages;
  }

  /// Reads the pages that come with the program.
  public static HelpPages bundled() {
    var pages = new LinkedHashMap<String, HelpPage>();
    for (String topic : TOPICS) {
      for (HelpPage page : parse(read("/gnomon/help/" + topic + ".help"))) {
        page.spellings().forEach(spelling -> pages.putIfAbsent(spelling, page));
      }
    }
    return new HelpPages(pages);
  }

  /// The page of a word in any of its spellings.
  public Optional<HelpPage> page(String spelling) {
    return Optional.ofNullable(pages.get(spelling));
  }

  /// Every page once, in the order of the files.
  public List<HelpPage> all() {
    return pages.values().stream().distinct().toList();
  }

  static List<HelpPage> parse(List<String> lines) {
    var pages = new ArrayList<HelpPage>();
    int start = 0;
    while (start < lines.size()) {
      int end = start + 1;
      while (end < lines.size() && !lines.get(end).startsWith("== ")) {
        end++;
      }
      if (lines.get(start).startsWith("== ")) {
        pages.add(pageOf(lines.subList(start, end)));
      }
      start = end;
    }
    return pages;
  }

  private static HelpPage pageOf(List<String> lines) {
    List<String> spellings = List.of(lines.getFirst().substring(3).split(", "));
    int examples = lines.indexOf("Examples");
    int end = examples < 0 ? lines.size() : examples;
    List<String> text = trimmed(lines.subList(Math.min(2, end), end));
    List<String> shown =
        examples < 0 ? List.of() : trimmed(lines.subList(examples + 1, lines.size()));
    return new HelpPage(spellings, lines.size() > 1 ? lines.get(1) : "", text, shown);
  }

  private static List<String> trimmed(List<String> lines) {
    int from = 0;
    int to = lines.size();
    while (from < to && lines.get(from).isBlank()) {
      from++;
    }
    while (to > from && lines.get(to - 1).isBlank()) {
      to--;
    }
    return lines.subList(from, to);
  }

  private static List<String> read(String resource) {
    try (var stream = HelpPages.class.getResourceAsStream(resource)) {
      if (stream == null) {
        return List.of();
      }
      return new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))
          .lines()
          .toList();
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }
}
