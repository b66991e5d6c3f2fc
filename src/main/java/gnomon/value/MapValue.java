package gnomon.value;

import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;

/// A basis map; it is an operator too.
public record MapValue(ShefferMap map) implements Value {
  @Override
  public Sort sort() {
    return Sort.MAP;
  }

  @Override
  public boolean sameAs(Value other) {
    return new OperatorValue(MappedOperator.of(map)).sameAs(other);
  }
}
