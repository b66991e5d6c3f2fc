package gnomon.value;

import java.util.List;

/// A list.
public record ListValue(List<Value> items) implements Value {
  /// Copies the items.
  public ListValue {
    items = List.copyOf(items);
  }

  @Override
  public Sort sort() {
    return Sort.LIST;
  }

  @Override
  public boolean sameAs(Value other) {
    return switch (other) {
      case ListValue that -> sameItems(that);
      case TableValue that -> sameItems(that.asList());
      case FormValue _,
          OperatorValue _,
          MapValue _,
          FunctionalValue _,
          SeriesValue _,
          VerdictValue _,
          DecimalValue _,
          FormulaValue _,
          FamilyValue _,
          FunctionDefinition _,
          NoneValue _ ->
          false;
    };
  }

  private boolean sameItems(ListValue that) {
    if (items.size() != that.items.size()) {
      return false;
    }
    for (int at = 0; at < items.size(); at++) {
      if (!items.get(at).sameAs(that.items.get(at))) {
        return false;
      }
    }
    return true;
  }
}
