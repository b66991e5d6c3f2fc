package gnomon.value;

/// A value with what is known about it and how it was reached.
public record Answer(Value value, Status status, Derivation derivation) {
  /// The value with its own status and no derivation.
  public static Answer of(Value value) {
    return new Answer(value, value.status(), Derivation.NONE);
  }
}
