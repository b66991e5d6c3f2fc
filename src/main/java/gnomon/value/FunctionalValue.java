package gnomon.value;

import gnomon.basis.MappedOperator;
import gnomon.operator.Functional;

/// A linear functional from functions to scalars.
public record FunctionalValue(Functional functional) implements Value {
  @Override
  public Sort sort() {
    return Sort.FUNCTIONAL;
  }

  /// Also the same as the operator to constant functions that it is.
  @Override
  public boolean sameAs(Value other) {
    return equals(other)
        || other instanceof OperatorValue(MappedOperator operator)
            && operator.equals(MappedOperator.of(functional.toOperator()));
  }
}
