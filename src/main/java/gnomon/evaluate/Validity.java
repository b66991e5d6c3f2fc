package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.summation.Condition;
import gnomon.summation.SingularTerms;
import gnomon.value.FormValue;
import gnomon.value.Value;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;

/// Whether the side conditions of closed forms hold where values are put in.
final class Validity {
  private Validity() {}

  /// Whether a condition that is about one of the variables is not known to hold at the values.
  static boolean fails(List<Condition> conditions, Map<? extends Generator, Form> images) {
    return conditions.stream()
        .filter(condition -> concerns(condition, images))
        .anyMatch(condition -> !holds(condition, images));
  }

  /// Whether values for some variables lead to factorials of negative integers while others stay
  /// symbols. The limit is then right for symbols that are no integers, but (m + n + 1)!/((m + 1)!
  /// n!) at m = −3 is 1 for n = 0 and not its limit 0 for other n.
  static boolean isSingular(Value value, Map<? extends Generator, Form> images) {
    if (!(value instanceof FormValue formValue)) {
      return false;
    }
    Form form = formValue.form();
    return hasSingularSum(form, images)
        || form.variables().stream().anyMatch(v -> !images.containsKey(v))
            && form.generators().stream()
                .filter(Factorial.class::isInstance)
                .map(factorial -> ((Factorial) factorial).argument())
                .filter(argument -> images.keySet().stream().anyMatch(argument::dependsOn))
                .anyMatch(argument -> SingularTerms.isNegativeInteger(argument, images));
  }

  /// Whether a standing sum in the form has terms that are to be formed anew at the values.
  static boolean hasSingularSum(Form form, Map<? extends Generator, Form> images) {
    return form.generators().stream()
        .anyMatch(g -> g instanceof Accumulation sum && SingularTerms.occur(sum, images));
  }

  static boolean concerns(Condition condition, Map<? extends Generator, Form> images) {
    boolean always =
        condition.relation() == Condition.Relation.NOT_IN_RANGE && condition.subject().isConstant();
    return always || images.keySet().stream().anyMatch(condition.subject()::dependsOn);
  }

  private static boolean holds(Condition condition, Map<? extends Generator, Form> images) {
    Form value;
    try {
      value = condition.subject().substitute(Map.copyOf(images));
    } catch (Refusal undefined) {
      return false;
    }
    Predicate<Form> test =
        switch (condition.relation()) {
          case NOT_ZERO -> form -> !form.isZero();
          case INTEGER -> form -> form.asInteger().isPresent();
          case NATURAL, RANGE_LENGTH ->
              form -> form.asInteger().filter(n -> n.signum() >= 0).isPresent();
          case POSITIVE -> form -> form.asRational().filter(v -> v.sign() > 0).isPresent();
          case INSIDE_UNIT ->
              form ->
                  form.asRational().filter(v -> v.abs().compareTo(Rational.ONE) < 0).isPresent();
          case FINITE_FACTORIAL -> form -> form.asInteger().filter(n -> n.signum() < 0).isEmpty();
          case NOT_IN_RANGE -> _ -> false;
        };
    return Optional.of(value).filter(test).isPresent();
  }
}
