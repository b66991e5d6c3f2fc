package gnomon.render;

import gnomon.value.TableValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/// Tables as lists of rows, a row to a line, with aligned columns and the header as a comment, so
/// that a table can be read by a person and by the language.
final class TableText {
  private final Rendering rendering;

  TableText(Rendering rendering) {
    this.rendering = rendering;
  }

  /// The lines of the table.
  String of(TableValue table) {
    List<List<String>> rows = table.rows().stream().map(this::cells).toList();
    if (rows.isEmpty()) {
      return "[]";
    }
    List<String> header = cells(table.header());
    int[] widths = new int[rows.getFirst().size()];
    for (List<String> row : rows) {
      for (int column = 0; column < row.size(); column++) {
        widths[column] = Math.max(widths[column], row.get(column).length());
      }
    }
    List<String> lines = new ArrayList<>();
    if (!header.isEmpty()) {
      lines.add("[ # " + String.join(", ", header));
    }
    for (int at = 0; at < rows.size(); at++) {
      String open = at == 0 && header.isEmpty() ? "[" : " ";
      String close = at == rows.size() - 1 ? "]" : ",";
      lines.addAll(row(open, rows.get(at), widths, close));
    }
    return String.join("\n", lines);
  }

  private List<String> cells(List<Value> row) {
    return row.stream().map(rendering::line).toList();
  }

  private List<String> row(String open, List<String> cells, int[] widths, String close) {
    List<String> padded = new ArrayList<>();
    for (int column = 0; column < cells.size(); column++) {
      String cell = cells.get(column);
      padded.add(" ".repeat(widths[column] - cell.length()) + cell);
    }
    String line = open + brackets(padded) + close;
    if (line.length() <= rendering.width()) {
      return List.of(line);
    }
    String narrow = brackets(cells) + close;
    List<String> lines = new ArrayList<>();
    for (String part : Wrapping.lines(narrow, rendering.width() - 2)) {
      lines.add((lines.isEmpty() ? open : " ") + part);
    }
    return lines;
  }

  private static String brackets(List<String> cells) {
    return cells.stream().collect(Collectors.joining(", ", "[", "]"));
  }
}
