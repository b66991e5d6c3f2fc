package gnomon.value;

import java.util.List;

/// A function defined by a rule.
public record FunctionDefinition(String name, List<String> parameters, Definition body)
    implements Value {

  /// The rule, kept by the room that evaluates.
  public interface Definition {
    /// The rule as text in the language.
    String text();
  }

  /// Copies the parameters.
  public FunctionDefinition {
    parameters = List.copyOf(parameters);
  }

  @Override
  public Sort sort() {
    return Sort.NONE;
  }
}
