package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.HashMap;
import java.util.Map;
import java.util.function.Consumer;

/// A sum, product or integral without closed form in this room, kept as it stands. The bound
/// variable is renamed on construction by [#of], so that the name does not matter.
public record Accumulation(Kind kind, Variable bound, Form lower, Form upper, Form body)
    implements Generator {

  /// What is accumulated.
  public enum Kind {
    SUM,
    PRODUCT,
    INTEGRAL
  }

  private static final String NAMES = "kjlmpqrstuvwyz";

  /// The kernel with its bound variable renamed to the first letter free in it; a numeric sum or
  /// product is not evaluated here.
  public static Form of(Kind kind, Variable bound, Form lower, Form upper, Form body) {
    for (int at = 0; at < NAMES.length(); at++) {
      Variable name = new Variable(NAMES.substring(at, at + 1));
      boolean taken =
          !name.equals(bound)
              && (body.dependsOn(name) || lower.dependsOn(name) || upper.dependsOn(name));
      boolean outside = lower.dependsOn(name) || upper.dependsOn(name);
      if (!taken && !outside) {
        Form renamed = name.equals(bound) ? body : body.substitute(bound, Form.of(name));
        return Form.of(new Accumulation(kind, name, lower, upper, renamed));
      }
    }
    return Form.of(new Accumulation(kind, bound, lower, upper, body));
  }

  @Override
  public String key() {
    return kind
        + "("
        + bound.name()
        + ":"
        + lower.key()
        + ".."
        + upper.key()
        + ";"
        + body.key()
        + ")";
  }

  @Override
  public int rank() {
    return 8;
  }

  @Override
  public Form derivative(Generator v) {
    if (!dependsOn(v)) {
      return Form.ZERO;
    }
    if (kind == Kind.INTEGRAL) {
      return throughTheIntegral(v);
    }
    throw new Refusal(Reason.DERIVATIVE_UNKNOWN, Form.of(this), Form.of(v));
  }

  private Form throughTheIntegral(Generator v) {
    Form atUpper = body.substitute(bound, upper).times(upper.derivative(v));
    Form atLower = body.substitute(bound, lower).times(lower.derivative(v));
    Form inside = body.derivative(v);
    Form rest = inside.isZero() ? Form.ZERO : of(kind, bound, lower, upper, inside);
    return rest.plus(atUpper).minus(atLower);
  }

  /// Puts the images in for the free variables; the bound variable is renamed out of their way.
  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Map<Generator, Form> outer = new HashMap<>(images);
    outer.remove(bound);
    Variable fresh = bound;
    Form inside = body;
    boolean captured = outer.values().stream().anyMatch(image -> image.dependsOn(bound));
    if (captured) {
      fresh = new Variable(bound.name() + "'");
      inside = body.substitute(bound, Form.of(fresh));
    }
    Form value =
        of(
            kind,
            fresh,
            lower.substitute(images),
            upper.substitute(images),
            inside.substitute(outer));
    return Powers.power(value, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    lower.atoms(consumer);
    upper.atoms(consumer);
    body.atoms(
        a -> {
          if (!a.equals(bound)) {
            consumer.accept(a);
          }
        });
  }
}
