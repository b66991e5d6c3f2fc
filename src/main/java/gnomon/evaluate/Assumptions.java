package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.summation.Condition;
import gnomon.syntax.Condition.Relation;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/// What is assumed of variables: which are integers, and comparisons between forms.
///
/// Integer variables let (-1)^(2n) be 1. Comparisons bound the search for witnesses and are shown;
/// no proof uses them.
public record Assumptions(Set<Variable> integers, List<Comparison> comparisons) {
  /// Nothing is assumed.
  public static final Assumptions NONE = new Assumptions(Set.of(), List.of());

  public Assumptions {
    integers = Set.copyOf(integers);
    comparisons = List.copyOf(comparisons);
  }

  /// `left relation right`.
  public record Comparison(Form left, Relation relation, Form right) {}

  Assumptions withInteger(Variable variable) {
    var all = new TreeSet<>(integers);
    all.add(variable);
    return new Assumptions(all, comparisons);
  }

  Assumptions with(Comparison comparison) {
    if (comparisons.contains(comparison)) {
      return this;
    }
    var all = new ArrayList<>(comparisons);
    all.add(comparison);
    return new Assumptions(integers, all);
  }

  Assumptions and(Assumptions that) {
    var variables = new TreeSet<>(integers);
    variables.addAll(that.integers);
    Assumptions both = new Assumptions(variables, comparisons);
    for (Comparison comparison : that.comparisons) {
      both = both.with(comparison);
    }
    return both;
  }

  /// The form with what is known of integers put to use.
  Form simplified(Form form) {
    return integers.isEmpty() ? form : form.takingIntegers(integers);
  }

  /// Whether the point is known to satisfy everything that is assumed of the variables it has
  /// values for.
  boolean allow(Map<Variable, Rational> point) {
    for (Map.Entry<Variable, Rational> entry : point.entrySet()) {
      if (integers.contains(entry.getKey()) && !entry.getValue().isInteger()) {
        return false;
      }
    }
    var images = new HashMap<Generator, Form>();
    point.forEach((variable, value) -> images.put(variable, Form.of(value)));
    return comparisons.stream()
        .filter(comparison -> images.keySet().containsAll(variables(comparison)))
        .allMatch(comparison -> holds(comparison, images));
  }

  /// Whether the condition that a subject is a natural number follows from one of the comparisons;
  /// that it is an integer is taken for granted.
  boolean imply(Condition condition) {
    return condition.relation() == Condition.Relation.NATURAL
        && comparisons.stream()
            .filter(c -> c.relation() == Relation.AT_LEAST || c.relation() == Relation.GREATER)
            .map(c -> condition.subject().minus(c.left().minus(c.right())).asRational())
            .anyMatch(excess -> excess.filter(e -> e.sign() >= 0).isPresent());
  }

  /// Whether a value of one variable is not excluded by what is assumed of that variable alone.
  boolean mayAllow(Variable variable, Rational value) {
    List<Comparison> alone =
        comparisons.stream().filter(comparison -> isAbout(comparison, variable)).toList();
    return new Assumptions(integers, alone).allow(Map.of(variable, value));
  }

  private static boolean isAbout(Comparison comparison, Variable variable) {
    return variables(comparison).equals(Set.of(variable));
  }

  private static Set<Variable> variables(Comparison comparison) {
    Set<Variable> variables = new TreeSet<>(comparison.left().variables());
    variables.addAll(comparison.right().variables());
    return variables;
  }

  private static boolean holds(Comparison comparison, Map<Generator, Form> images) {
    try {
      Form difference = comparison.left().minus(comparison.right()).substitute(images);
      Optional<Rational> value = difference.asRational();
      return value.isPresent() && holds(comparison.relation(), value.get().sign());
    } catch (Refusal undefined) {
      return false;
    }
  }

  private static boolean holds(Relation relation, int sign) {
    return switch (relation) {
      case EQUAL -> sign == 0;
      case UNEQUAL -> sign != 0;
      case LESS -> sign < 0;
      case AT_MOST -> sign <= 0;
      case GREATER -> sign > 0;
      case AT_LEAST -> sign >= 0;
    };
  }
}
