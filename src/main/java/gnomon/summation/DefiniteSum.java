package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// A definite sum or product and what is known about it.
///
/// @param value the closed form, or the sum or product left as it stands
/// @param status which of these it is
/// @param conditions under which the closed form holds
/// @param antidifference the verified antidifference in the variable of summation behind a closed
///   form, where one was used
/// @param absentWithin the class in which a closed form is proved not to exist, where it is
/// @param theorems the theorems behind the value of an infinite sum
/// @param recurrence a recurrence of the sum in a variable of its ends, where one was found
public record DefiniteSum(
    Form value,
    Status status,
    List<Condition> conditions,
    Optional<Form> antidifference,
    Optional<FunctionClass> absentWithin,
    Set<Theorem> theorems,
    Optional<SumRecurrence> recurrence) {

  /// How the value is known.
  public enum Status {
    /// Every term was evaluated and all were added or multiplied.
    TERM_BY_TERM,
    /// A closed form with symbolic ends, or one that spares the single terms.
    CLOSED_FORM,
    /// No closed form was found, but a recurrence; the value is the sum as it stands.
    RECURRENCE,
    /// No antidifference exists in a stated class; the value is the sum as it stands.
    NO_CLOSED_FORM,
    /// No closed form was found; the value is the sum or product as it stands.
    LEFT_STANDING
  }

  public DefiniteSum {
    conditions = List.copyOf(conditions);
    theorems = Set.copyOf(theorems);
  }

  /// The same under further conditions.
  DefiniteSum under(List<Condition> further) {
    List<Condition> all = new ArrayList<>(conditions);
    all.addAll(further);
    return new DefiniteSum(value, status, all, antidifference, absentWithin, theorems, recurrence);
  }

  /// The closed form with another value of a variable; a recurrence in it is left out.
  DefiniteSum substituted(Variable n, Form image) {
    return new DefiniteSum(
        value.substitute(n, image),
        status,
        conditions.stream()
            .map(c -> new Condition(c.subject().substitute(n, image), c.relation()))
            .toList(),
        antidifference.map(form -> form.substitute(n, image)),
        absentWithin,
        theorems,
        Optional.empty());
  }

  static DefiniteSum termByTerm(Form value) {
    return new DefiniteSum(
        value,
        Status.TERM_BY_TERM,
        List.of(),
        Optional.empty(),
        Optional.empty(),
        Set.of(),
        Optional.empty());
  }

  static DefiniteSum closed(Form value, List<Condition> conditions, Form antidifference) {
    return new DefiniteSum(
        value,
        Status.CLOSED_FORM,
        conditions,
        Optional.of(antidifference),
        Optional.empty(),
        Set.of(),
        Optional.empty());
  }

  static DefiniteSum closed(Form value, List<Condition> conditions) {
    return new DefiniteSum(
        value,
        Status.CLOSED_FORM,
        conditions,
        Optional.empty(),
        Optional.empty(),
        Set.of(),
        Optional.empty());
  }

  static DefiniteSum known(Form value, List<Condition> conditions, Set<Theorem> theorems) {
    return new DefiniteSum(
        value,
        Status.CLOSED_FORM,
        conditions,
        Optional.empty(),
        Optional.empty(),
        theorems,
        Optional.empty());
  }

  static DefiniteSum standing(Form value) {
    return new DefiniteSum(
        value,
        Status.LEFT_STANDING,
        List.of(),
        Optional.empty(),
        Optional.empty(),
        Set.of(),
        Optional.empty());
  }

  static DefiniteSum absent(Form value, FunctionClass within) {
    return new DefiniteSum(
        value,
        Status.NO_CLOSED_FORM,
        List.of(),
        Optional.empty(),
        Optional.of(within),
        Set.of(),
        Optional.empty());
  }

  static DefiniteSum recurrent(Form value, SumRecurrence recurrence) {
    return new DefiniteSum(
        value,
        Status.RECURRENCE,
        List.of(),
        Optional.empty(),
        Optional.empty(),
        Set.of(),
        Optional.of(recurrence));
  }

  static DefiniteSum telescoped(Form value, List<Condition> conditions, SumRecurrence recurrence) {
    return new DefiniteSum(
        value,
        Status.CLOSED_FORM,
        conditions,
        Optional.empty(),
        Optional.empty(),
        Set.of(),
        Optional.of(recurrence));
  }
}
