package gnomon.value;

import gnomon.operator.Functional;

/// A linear functional from functions to scalars.
public record FunctionalValue(Functional functional) implements Value {
  @Override
  public Sort sort() {
    return Sort.FUNCTIONAL;
  }
}
