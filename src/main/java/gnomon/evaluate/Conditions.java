package gnomon.evaluate;

import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.summation.Condition;
import gnomon.summation.FunctionClass;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/// The side conditions of an answer in the words of the status line. Forms in them are simple
/// enough to be written by their keys.
final class Conditions {

  private Conditions() {}

  static String words(List<Condition> conditions) {
    return conditions.isEmpty()
        ? ""
        : "for " + conditions.stream().map(Conditions::words).collect(Collectors.joining(", "));
  }

  private static String words(Condition condition) {
    String subject = text(condition.subject());
    return switch (condition.relation()) {
      case NOT_ZERO -> compared(condition.subject(), " != ");
      case INTEGER -> "integer " + subject;
      case NATURAL -> compared(condition.subject(), " >= ");
      case NOT_IN_RANGE -> subject + " outside the range";
    };
  }

  /// The subject compared with zero; of the shape v + c the variable v with −c.
  private static String compared(Form subject, String relation) {
    if (subject.variables().size() == 1) {
      Form variable = Form.of(subject.variables().first());
      Optional<Rational> constant = variable.minus(subject).asRational();
      if (constant.isPresent()) {
        return text(variable) + relation + constant.get();
      }
    }
    return text(subject) + relation + "0";
  }

  static String words(FunctionClass kind) {
    return kind.name().toLowerCase(Locale.ROOT).replace('_', ' ') + " functions";
  }

  private static String text(Form form) {
    return form.asGenerator().map(Generator::key).orElseGet(form::key);
  }
}
