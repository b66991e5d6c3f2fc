package gnomon.diagnostic;

import java.util.Arrays;
import java.util.Locale;
import java.util.regex.Pattern;

/// A kind of mistake with its stable code, such as `syntax-unexpected` or `name-unknown`. The part
/// of the code before the first hyphen is the kind. Codes are never renamed: session files record
/// them.
public record Problem(String code) {
  private static final Pattern SHAPE = Pattern.compile("[a-z]+(-[a-z0-9]+)+");

  /// @throws IllegalArgumentException unless the code is words joined by hyphens, the first a kind
  public Problem {
    if (!SHAPE.matcher(code).matches() || Arrays.stream(Kind.values()).noneMatch(begins(code))) {
      throw new IllegalArgumentException("not a problem code: " + code);
    }
  }

  /// The kind that the first word of the code names.
  public Kind kind() {
    return Kind.valueOf(code.substring(0, code.indexOf('-')).toUpperCase(Locale.ROOT));
  }

  private static java.util.function.Predicate<Kind> begins(String code) {
    return kind -> code.startsWith(kind.name().toLowerCase(Locale.ROOT) + "-");
  }

  @Override
  public String toString() {
    return code;
  }
}
