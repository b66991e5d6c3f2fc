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

  /// `left as a sum` where the form contains a sum, product or integral as it stands.
  @Override
  public Status status() {
    boolean standing = form.generators().stream().anyMatch(g -> g instanceof Accumulation);
    return standing ? Status.of(Status.Kind.LEFT_AS_SUM) : Status.NONE;
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
          FunctionDefinition _,
          NoneValue _ ->
          false;
    };
  }
}
