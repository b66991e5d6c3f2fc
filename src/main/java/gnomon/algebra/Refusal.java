package gnomon.algebra;

import java.util.List;

/// A mathematical refusal: the question has no answer of the kind asked for, for a stated reason.
///
/// It carries a code and exact data (forms, numbers, names) and no words and no place; rooms above
/// add the place and the words. It is an expected outcome, so it records no stack trace.
public final class Refusal extends RuntimeException {

  private static final long serialVersionUID = 1L;

  private final Reason reason;
  private final transient List<Object> data;

  /// A refusal for `reason` with the exact values that a message may quote.
  public Refusal(Reason reason, Object... data) {
    super(reason.name(), null, false, false);
    this.reason = reason;
    this.data = List.of(data);
  }

  /// The stable code.
  public Reason reason() {
    return reason;
  }

  /// The exact values that belong to the code, in the order the code documents.
  public List<Object> data() {
    return data == null ? List.of() : data;
  }

  @Override
  public String getMessage() {
    return data().isEmpty() ? reason.name() : reason.name() + " " + data();
  }
}
