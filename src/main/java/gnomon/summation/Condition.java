package gnomon.summation;

import gnomon.form.Form;
import java.util.Objects;

/// A side condition under which an answer holds: `subject` stands in the `relation`.
///
/// Only conditions that the answer needs beyond the meaning of its own kernels are recorded.
public record Condition(Form subject, Relation relation) {

  /// What is asked of the subject.
  public enum Relation {
    /// The subject is not zero.
    NOT_ZERO,
    /// The subject is an integer.
    INTEGER,
    /// The subject is an integer and at least zero.
    NATURAL,
    /// The subject is greater than zero.
    POSITIVE,
    /// The modulus of the subject is less than one.
    INSIDE_UNIT,
    /// The subject, an argument of a factorial, is no negative integer; that is taken for granted
    /// of symbols.
    FINITE_FACTORIAL,
    /// The subject, a pole, is none of the points summed over.
    NOT_IN_RANGE,
    /// The subject is the number of terms of a sum, an integer and at least zero; that is taken for
    /// granted of symbolic ends.
    RANGE_LENGTH
  }

  public Condition {
    Objects.requireNonNull(subject);
    Objects.requireNonNull(relation);
  }

  /// That the subject is not zero, said of its numerator alone.
  static Condition notZero(Form subject) {
    Form numerator = Form.of(subject.numerator().primitivePart());
    return new Condition(numerator, Relation.NOT_ZERO);
  }
}
