package gnomon.value;

/// A formula as text for typesetting.
public record FormulaValue(String tex) implements Value {
  @Override
  public Sort sort() {
    return Sort.FORMULA;
  }
}
