package gnomon.value;

import java.util.List;

/// A table or matrix: rows of equal length under a header, which may be empty. It means the list of
/// its rows.
public record TableValue(List<Value> header, List<List<Value>> rows) implements Value {
  /// Copies header and rows.
  public TableValue {
    header = List.copyOf(header);
    rows = rows.stream().map(List::copyOf).toList();
  }

  /// The list of the rows.
  public ListValue asList() {
    return new ListValue(rows.stream().<Value>map(ListValue::new).toList());
  }

  @Override
  public Sort sort() {
    return Sort.TABLE;
  }

  @Override
  public boolean sameAs(Value other) {
    return asList().sameAs(other);
  }
}
