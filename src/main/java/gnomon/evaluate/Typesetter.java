package gnomon.evaluate;

import gnomon.form.Variable;
import gnomon.value.Value;

/// Writes a value for typesetting; handed in by the room above, because this one shows nothing.
@FunctionalInterface
public interface Typesetter {
  /// The text of the value, with operators acting on the running variable.
  String tex(Value value, Variable running);
}
