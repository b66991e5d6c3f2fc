package gnomon.evaluate;

import gnomon.form.Form;
import gnomon.summation.Condition;
import gnomon.summation.FunctionClass;
import java.util.List;
import java.util.Locale;
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
      case NOT_ZERO -> subject + " != 0";
      case INTEGER -> "integer " + subject;
      case NATURAL -> subject + " >= 0";
      case NOT_IN_RANGE -> subject + " outside the range";
    };
  }

  static String words(FunctionClass kind) {
    return kind.name().toLowerCase(Locale.ROOT).replace('_', ' ') + " functions";
  }

  private static String text(Form form) {
    return form.key();
  }
}
