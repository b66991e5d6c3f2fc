package gnomon.evaluate;

import gnomon.form.Base;
import gnomon.form.Constant;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.summation.Condition;
import gnomon.value.FormValue;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The side conditions of an answer in the words of the status line.
final class Conditions {

  private final Writing writing;
  private final Variable running;

  Conditions(Writing writing, Variable running) {
    this.writing = writing;
    this.running = running;
  }

  String words(List<Condition> conditions) {
    return words("", conditions);
  }

  /// The conditions after those that were assumed, in the words given.
  String words(String assumed, List<Condition> conditions) {
    List<String> said = new ArrayList<>();
    if (!assumed.isEmpty()) {
      said.add(assumed);
    }
    List<String> outside = new ArrayList<>();
    for (Condition condition : withoutConjugates(conditions)) {
      switch (condition.relation()) {
        case NOT_ZERO, INTEGER, POSITIVE, INSIDE_UNIT -> said.add(words(condition));
        case NATURAL -> {
          if (!isImplied(condition, conditions) && isStrongest(condition, conditions)) {
            said.add(words(condition));
          }
        }
        case NOT_IN_RANGE -> outside.add(text(condition.subject()));
        case RANGE_LENGTH, FINITE_FACTORIAL -> {}
      }
    }
    if (!outside.isEmpty()) {
      said.add(String.join(" and ", outside) + " outside the range");
    }
    return said.isEmpty() ? "" : "for " + String.join(", ", said);
  }

  /// Whether the condition says no more than that a range of the sum has no negative length.
  private static boolean isImplied(Condition condition, List<Condition> conditions) {
    return conditions.stream()
        .filter(other -> other.relation() == Condition.Relation.RANGE_LENGTH)
        .map(length -> condition.subject().minus(length.subject()).asRational())
        .anyMatch(excess -> excess.filter(e -> e.sign() >= 0).isPresent());
  }

  /// Whether no other subject, also to be a natural number, is smaller by a constant.
  private static boolean isStrongest(Condition condition, List<Condition> conditions) {
    return conditions.stream()
        .filter(other -> other.relation() == Condition.Relation.NATURAL)
        .map(other -> condition.subject().minus(other.subject()).asRational())
        .noneMatch(excess -> excess.filter(e -> e.sign() > 0).isPresent());
  }

  /// The conditions with complex subjects that must not be zero put together into one, which is
  /// real where they are conjugate.
  private static List<Condition> withoutConjugates(List<Condition> conditions) {
    List<Condition> rest = new ArrayList<>();
    Form product = Form.ONE;
    for (Condition condition : conditions) {
      boolean complex = condition.subject().generators().stream().anyMatch(Conditions::isComplex);
      if (complex && condition.relation() == Condition.Relation.NOT_ZERO) {
        product = product.times(condition.subject());
      } else {
        rest.add(condition);
      }
    }
    if (!product.isOne()) {
      rest.add(new Condition(product, Condition.Relation.NOT_ZERO));
    }
    return rest;
  }

  private static boolean isComplex(Generator generator) {
    return generator.equals(Constant.I)
        || generator instanceof Exponential power
            && (power.base() instanceof Base.Turn
                || power.base() instanceof Base.GaussianAngle
                || power.unit().generators().contains(Constant.I));
  }

  /// One condition, without the word before it.
  String words(Condition condition) {
    String subject = text(condition.subject());
    return switch (condition.relation()) {
      case NOT_ZERO -> compared(condition.subject(), " != ");
      case INTEGER -> "integer " + subject;
      case NATURAL, RANGE_LENGTH -> compared(condition.subject(), " >= ");
      case POSITIVE -> compared(condition.subject(), " > ");
      case INSIDE_UNIT -> "|" + subject + "| < 1";
      case NOT_IN_RANGE -> subject + " outside the range";
      case FINITE_FACTORIAL -> subject + " no negative integer";
    };
  }

  /// The subject compared with zero; of the shape v + c the variable v with −c.
  private String compared(Form subject, String relation) {
    if (subject.variables().size() == 1) {
      Form variable = Form.of(subject.variables().first());
      Optional<Rational> constant = variable.minus(subject).asRational();
      if (constant.isPresent()) {
        return text(variable) + relation + constant.get();
      }
    }
    return text(subject) + relation + "0";
  }

  private String text(Form form) {
    return writing.line(FormValue.of(form, running), running);
  }
}
