package gnomon.value;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.List;
import java.util.Optional;

/// The outcome of a claim.
public sealed interface VerdictValue extends Value {

  /// The claim holds, on the stated ground and under the condition in words, such as `for n >= 1`;
  /// empty where there is none.
  record Proved(Ground ground, String condition) implements VerdictValue {
    /// Without a condition.
    public Proved(Ground ground) {
      this(ground, "");
    }

    @Override
    public Status status() {
      return Status.of(Status.Kind.PROVED);
    }
  }

  /// The claim does not hold; the witness shows it.
  record Refuted(Witness witness) implements VerdictValue {
    @Override
    public Status status() {
      return Status.of(Status.Kind.REFUTED);
    }
  }

  /// The claim was not decided: how far it was checked, in words such as `x^0, ..., x^12`, and why
  /// not further.
  record Open(String checked, String reason) implements VerdictValue {
    @Override
    public Status status() {
      return Status.of(Status.Kind.OPEN);
    }
  }

  /// Why a claim holds.
  sealed interface Ground {
    /// Both sides are brought to this value.
    record NormalForm(Value common) implements Ground {}

    /// Both sides agree at each point of a range, one by one.
    record EachPoint(Variable variable, Form from, Form to) implements Ground {}

    /// Another ground, in words, and the value that shows it where there is one.
    record Words(String words, Optional<Value> evidence) implements Ground {}
  }

  /// What shows that a claim does not hold.
  sealed interface Witness {
    /// The sides differ at a point.
    record AtPoint(List<Assignment> point, Value left, Value right) implements Witness {
      /// Copies the point.
      public AtPoint {
        point = List.copyOf(point);
      }
    }

    /// The operators differ on a function, for instance on x^2.
    record OnFunction(Value function, Value left, Value right) implements Witness {}

    /// The sides differ as they stand, for instance two lists or two numbers.
    record Sides(Value left, Value right) implements Witness {}
  }

  /// A value given to a variable.
  record Assignment(Variable variable, Form value) {}

  @Override
  default Sort sort() {
    return Sort.VERDICT;
  }

  /// Whether the other is the same verdict; grounds, witnesses and extents may differ.
  @Override
  default boolean sameAs(Value other) {
    return other instanceof VerdictValue && status().kind() == other.status().kind();
  }
}
