package gnomon.value;

/// Something the language can hold.
public sealed interface Value
    permits FormValue,
        OperatorValue,
        MapValue,
        FunctionalValue,
        SeriesValue,
        ListValue,
        TableValue,
        VerdictValue,
        DecimalValue,
        FormulaValue,
        FamilyValue,
        FunctionDefinition,
        NoneValue {

  /// The sort the value belongs to.
  Sort sort();

  /// What the value itself says about how it is known.
  default Status status() {
    return Status.NONE;
  }

  /// Whether the other value means the same; shapes and spellings do not matter.
  default boolean sameAs(Value other) {
    return equals(other);
  }
}
