package gnomon.value;

import java.util.List;

/// How an answer was reached.
public record Derivation(List<Step> steps) {
  /// Nothing to tell.
  public static final Derivation NONE = new Derivation(List.of());

  /// Copies the steps.
  public Derivation {
    steps = List.copyOf(steps);
  }

  /// Whether every step was checked.
  public boolean isChecked() {
    return steps.stream().allMatch(Step::checked);
  }
}
