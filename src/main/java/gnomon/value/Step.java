package gnomon.value;

import java.util.List;

/// One step of a derivation: the rule in a few words, what it says here, whether the engine checked
/// it, and a remark that may be empty.
public record Step(String rule, List<Equation> equations, boolean checked, String note) {
  /// Copies the equations.
  public Step {
    equations = List.copyOf(equations);
  }
}
