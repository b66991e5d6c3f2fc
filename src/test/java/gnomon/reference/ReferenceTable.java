package gnomon.reference;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/// One table of published values, read from the test resources; its README names the sources.
public final class ReferenceTable {

  private ReferenceTable() {}

  /// One row by column names.
  public record Row(Map<String, String> cells) {

    /// The text of a column, empty where the cell is.
    public String text(String column) {
      String cell = cells.get(column);
      if (cell == null) {
        throw new IllegalArgumentException("no column " + column + " in " + cells.keySet());
      }
      return cell;
    }

    /// A column of rational numbers separated by spaces.
    public List<Rational> numbers(String column) {
      return Arrays.stream(text(column).trim().split(" +")).map(Rational::parse).toList();
    }

    /// A column of rational numbers as forms.
    public List<Form> forms(String column) {
      return numbers(column).stream().map(Form::of).toList();
    }

    @Override
    public String toString() {
      return cells.values().iterator().next() + " (" + cells.get("source") + ")";
    }
  }

  /// All rows of the table with the file name.
  public static List<Row> rows(String file) {
    try (var stream = ReferenceTable.class.getResourceAsStream("/references/" + file);
        var reader = new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
      List<String> lines = reader.lines().toList();
      String[] names = lines.getFirst().split("\t", -1);
      List<Row> rows = new ArrayList<>();
      for (String line : lines.subList(1, lines.size())) {
        String[] cells = line.split("\t", -1);
        Map<String, String> row = new LinkedHashMap<>();
        for (int i = 0; i < names.length; i++) {
          row.put(names[i], i < cells.length ? cells[i] : "");
        }
        rows.add(new Row(row));
      }
      return rows;
    } catch (IOException problem) {
      throw new UncheckedIOException(problem);
    }
  }
}
