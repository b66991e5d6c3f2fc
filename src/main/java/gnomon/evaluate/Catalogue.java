package gnomon.evaluate;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/// The families of sequences that are known by name, read from the resource file that holds them
/// when first asked for. The head of that file says how it is written.
final class Catalogue {
  private static final String RESOURCE = "/gnomon/catalogue/families.catalogue";

  private volatile @Nullable List<CatalogueEntry> entries;

  /// Every family, in the order of the file.
  List<CatalogueEntry> entries() {
    List<CatalogueEntry> known = entries;
    if (known == null) {
      known = parse(read());
      entries = known;
    }
    return known;
  }

  static List<CatalogueEntry> parse(List<String> lines) {
    List<CatalogueEntry> entries = new ArrayList<>();
    Map<String, List<String>> block = new LinkedHashMap<>();
    String key = "";
    for (String line : lines) {
      String text = line.replaceFirst("#.*", "").stripTrailing();
      if (text.isEmpty()) {
        close(block, entries);
        continue;
      }
      if (text.startsWith(" ")) {
        List<String> said = block.get(key);
        said.set(said.size() - 1, said.getLast() + " " + text.strip());
        continue;
      }
      String[] parts = text.split("\\s+", 2);
      key = parts[0];
      block.computeIfAbsent(key, _ -> new ArrayList<>()).add(parts[1]);
    }
    close(block, entries);
    return List.copyOf(entries);
  }

  private static void close(Map<String, List<String>> block, List<CatalogueEntry> entries) {
    if (!block.isEmpty()) {
      entries.add(new CatalogueEntry(block));
      block.clear();
    }
  }

  private static List<String> read() {
    try (var stream = Catalogue.class.getResourceAsStream(RESOURCE)) {
      if (stream == null) {
        throw new IllegalStateException("the catalogue is missing");
      }
      return new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))
          .lines()
          .toList();
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }
}
