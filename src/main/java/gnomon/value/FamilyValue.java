package gnomon.value;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/// What is known of a sequence of polynomials: the family of the catalogue to which it belongs,
/// where there is one, and its portrait line by line.
public record FamilyValue(Optional<Kin> kin, List<Line> lines) implements Value {

  /// A member of a family, s_n(x) = front · p_n(argument), with the name of the family and the way
  /// its members are written.
  ///
  /// @param inverse whether not the map itself but its inverse belongs to the family
  /// @param letter the letter of p_n; empty where only the formula is written
  /// @param index the variable n
  /// @param raised the parameters written above the letter
  /// @param listed the parameters written after the argument
  /// @param formula s_n(x) in closed form, where there is one
  /// @param agreedTo empty when this is proved; otherwise the last coefficient found to agree
  public record Kin(
      String name,
      boolean inverse,
      String letter,
      Variable index,
      List<Form> raised,
      List<Form> listed,
      Form front,
      Form argument,
      Optional<Form> formula,
      OptionalInt agreedTo) {
    /// Copies the parameters.
    public Kin {
      raised = List.copyOf(raised);
      listed = List.copyOf(listed);
    }
  }

  /// One thing that is known, under its label.
  public record Line(String label, Value value) {}

  /// Copies the lines.
  public FamilyValue {
    lines = List.copyOf(lines);
  }

  @Override
  public Sort sort() {
    return Sort.FAMILY;
  }

  @Override
  public Status status() {
    if (kin.isEmpty()) {
      return Status.NONE;
    }
    OptionalInt agreed = kin.get().agreedTo();
    return agreed.isEmpty()
        ? Status.of(Status.Kind.PROVED)
        : Status.of(Status.Kind.OPEN)
            .withDetail("(the coefficients agree up to D^" + agreed.getAsInt() + ")");
  }
}
