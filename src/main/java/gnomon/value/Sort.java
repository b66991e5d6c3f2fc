package gnomon.value;

import java.util.Locale;

/// The sorts of value, with the words the language has for them.
public enum Sort {
  SCALAR,
  FUNCTION,
  OPERATOR,
  MAP,
  FUNCTIONAL,
  SERIES,
  LIST,
  TABLE,
  VERDICT,
  FORMULA,
  FAMILY,
  NONE;

  /// The word, such as `function`.
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
