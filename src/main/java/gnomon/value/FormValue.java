package gnomon.value;

import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Variable;

/// A scalar or a function: an exact form with the shape it is shown in.
public record FormValue(Form form, Shape shape, boolean function) implements Value {

  private static final Variable X = new Variable("x");

  /// The form in its normal shape; a function where it depends on x.
  public static FormValue of(Form form) {
    return of(form, X);
  }

  /// The form in its normal shape; a function where it depends on the running variable.
  public static FormValue of(Form form, Variable running) {
    return new FormValue(form, Shape.NORMAL, form.dependsOn(running));
  }

  /// The same form in another shape.
  public FormValue withShape(Shape other) {
    return new FormValue(form, other, function);
  }

  @Override
  public Sort sort() {
    return function ? Sort.FUNCTION : Sort.SCALAR;
  }

  /// `left as a sum`, a product or an integral where the form contains one as it stands.
  @Override
  public Status status() {
    return form.generators().stream()
        .filter(Accumulation.class::isInstance)
        .map(Accumulation.class::cast)
        .map(standing -> Status.of(kind(standing.kind())))
        .findFirst()
        .orElse(Status.NONE);
  }

  private static Status.Kind kind(Accumulation.Kind kind) {
    return switch (kind) {
      case SUM -> Status.Kind.LEFT_AS_SUM;
      case PRODUCT -> Status.Kind.LEFT_AS_PRODUCT;
      case INTEGRAL -> Status.Kind.LEFT_AS_INTEGRAL;
    };
  }

  @Override
  public boolean sameAs(Value other) {
    return switch (other) {
      case FormValue that -> form.equals(that.form);
      case DecimalValue that -> that.sameAs(this);
      case OperatorValue _,
          MapValue _,
          FunctionalValue _,
          SeriesValue _,
          ListValue _,
          TableValue _,
          VerdictValue _,
          FormulaValue _,
          FamilyValue _,
          FunctionDefinition _,
          NoneValue _ ->
          false;
    };
  }
}
