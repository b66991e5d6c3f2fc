package gnomon.evaluate;

import gnomon.form.Variable;
import gnomon.value.Value;

/// Values as text; handed in by the room above, because this one shows nothing itself.
public interface Writing {
  /// The value on one line, with operators acting on the running variable.
  String line(Value value, Variable running);

  /// The value for typesetting, with operators acting on the running variable.
  String tex(Value value, Variable running);
}
