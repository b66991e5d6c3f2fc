package gnomon.value;

import gnomon.basis.MappedOperator;
import gnomon.operator.Operator;

/// An operator. A scalar means the multiplication by it where an operator is meant.
public record OperatorValue(MappedOperator operator) implements Value {
  @Override
  public Sort sort() {
    return Sort.OPERATOR;
  }

  @Override
  public boolean sameAs(Value other) {
    return switch (other) {
      case OperatorValue that -> operator.equals(that.operator);
      case MapValue that -> operator.equals(MappedOperator.of(that.map()));
      case FormValue that ->
          !that.function()
              && operator.equals(MappedOperator.of(Operator.identity().times(that.form())));
      case FunctionalValue that -> that.sameAs(this);
      case SeriesValue that -> that.isExact() && that.sameAs(this);
      case ListValue _,
          TableValue _,
          VerdictValue _,
          DecimalValue _,
          FormulaValue _,
          FamilyValue _,
          FunctionDefinition _,
          NoneValue _ ->
          false;
    };
  }
}
