package gnomon.operator;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/// The rows of a table of published values, by column name; each row names its source.
final class PublishedRows {
  private PublishedRows() {}

  static List<Map<String, String>> of(String table) {
    String text = read("/references/" + table);
    List<Map<String, String>> rows = new ArrayList<>();
    List<String> names = List.of();
    for (String line : text.lines().toList()) {
      List<String> cells = List.of(line.split("\t", -1));
      if (names.isEmpty()) {
        names = cells;
        continue;
      }
      Map<String, String> row = new LinkedHashMap<>();
      for (int i = 0; i < names.size(); i++) {
        row.put(names.get(i), cells.get(i));
      }
      rows.add(row);
    }
    return rows;
  }

  private static String read(String path) {
    try (InputStream in = PublishedRows.class.getResourceAsStream(path)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException problem) {
      throw new UncheckedIOException(problem);
    }
  }

  static List<Form> numbers(String cell) {
    return Stream.of(cell.split(" ")).map(Rational::parse).map(Form::of).toList();
  }
}
