package gnomon.evaluate;

import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.MapValue;
import gnomon.value.OperatorValue;
import gnomon.value.Value;
import java.util.Optional;

/// Questions about the sorts of values, and the ways from one sort to a wider one.
final class Sorts {

  private Sorts() {}

  /// Whether the value acts on functions: an operator, a basis map or a functional.
  static boolean acts(Value value) {
    return value instanceof OperatorValue
        || value instanceof MapValue
        || value instanceof FunctionalValue;
  }

  /// The value as an operator in the normal form of all operators; functions multiply.
  static Optional<MappedOperator> asOperator(Value value) {
    return switch (value) {
      case OperatorValue operator -> Optional.of(operator.operator());
      case MapValue map -> Optional.of(MappedOperator.of(map.map()));
      case FunctionalValue functional ->
          Optional.of(MappedOperator.of(functional.functional().toOperator()));
      case FormValue form -> Optional.of(MappedOperator.of(Operator.multiplication(form.form())));
      case Value _ -> Optional.empty();
    };
  }

  /// The operator without basis maps, if the value is one.
  static Optional<Operator> asPlainOperator(Value value) {
    return asOperator(value).flatMap(MappedOperator::asOperator);
  }

  /// The narrowest value that is this operator.
  static Value of(MappedOperator operator) {
    return operator
        .asShefferMap()
        .<Value>map(MapValue::new)
        .orElseGet(() -> new OperatorValue(operator));
  }

  static Value of(Operator operator) {
    return new OperatorValue(MappedOperator.of(operator));
  }

  static FormValue of(Form form, Scope scope) {
    return FormValue.of(form, scope.running());
  }

  /// Whether the form is a scalar for the operator: free of every variable it acts on.
  static boolean isScalarFor(Form form, Value operator, Variable running) {
    return !form.dependsOn(running)
        && asOperator(operator).stream()
            .flatMap(mapped -> mapped.terms().stream())
            .noneMatch(term -> touches(term, form));
  }

  private static boolean touches(MappedOperator.Term term, Form form) {
    boolean throughMap = !term.map().isIdentity() && form.dependsOn(term.map().variable());
    return throughMap || term.operator().variables().stream().anyMatch(form::dependsOn);
  }

  /// Whether both commute for reasons of their sorts alone.
  static boolean commute(Value a, Value b, Variable running) {
    if (a instanceof FormValue left && acts(b)) {
      return isScalarFor(left.form(), b, running);
    }
    if (b instanceof FormValue right && acts(a)) {
      return isScalarFor(right.form(), a, running);
    }
    if (acts(a) && acts(b)) {
      Optional<Operator> left = asPlainOperator(a);
      Optional<Operator> right = asPlainOperator(b);
      return left.isPresent()
          && right.isPresent()
          && (bothShiftInvariant(left.get(), right.get())
              || (left.get().isMultiplication() && right.get().isMultiplication()));
    }
    return !acts(a) && !acts(b);
  }

  private static boolean bothShiftInvariant(Operator a, Operator b) {
    return a.isShiftInvariant() && b.isShiftInvariant();
  }

  /// The form of a value that must be one.
  static Form form(Value value, Span span, String what) {
    if (value instanceof FormValue form) {
      return form.form();
    }
    throw Problems.of(
        "kind-not-a-function", what + " is " + article(value) + ", not a function", span);
  }

  /// The sort with its article, for messages.
  static String article(Value value) {
    String word = value.sort().word();
    return ("aeiou".indexOf(word.charAt(0)) >= 0 ? "an " : "a ") + word;
  }
}
