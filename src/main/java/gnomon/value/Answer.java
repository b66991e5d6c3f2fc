package gnomon.value;

import gnomon.summation.Condition;
import java.util.List;

/// A value with what is known about it, how it was reached, and the side conditions under which
/// closed forms in it hold.
public record Answer(
    Value value, Status status, Derivation derivation, List<Condition> conditions) {
  /// Copies the conditions.
  public Answer {
    conditions = List.copyOf(conditions);
  }

  /// An answer without side conditions.
  public Answer(Value value, Status status, Derivation derivation) {
    this(value, status, derivation, List.of());
  }

  /// The value with its own status and no derivation.
  public static Answer of(Value value) {
    return new Answer(value, value.status(), Derivation.NONE);
  }
}
