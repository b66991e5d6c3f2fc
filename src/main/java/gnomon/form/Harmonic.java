package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The harmonic number H(u, r) = Σ_{j≥1} (1/j^r − 1/(j+u)^r), normalised like the argument of a
/// factorial; for a natural number u it is 1 + 1/2^r + … + 1/u^r.
public record Harmonic(Form argument, int order) implements Generator {

  @Override
  public String key() {
    return "H(" + argument.key() + "," + order + ")";
  }

  @Override
  public int rank() {
    return 7;
  }

  /// Zero where the argument does not depend on v.
  ///
  /// @throws Refusal with [Reason#DERIVATIVE_UNKNOWN] otherwise: the derivative needs values of the
  ///   zeta function, which are no kernels of this room
  @Override
  public Form derivative(Generator v) {
    if (argument.dependsOn(v)) {
      throw new Refusal(Reason.DERIVATIVE_UNKNOWN, Form.of(this), Form.of(v));
    }
    return Form.ZERO;
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Form value = Combinatorial.harmonic(argument.substitute(images), order);
    return Powers.power(value, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
  }

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Harmonic that && order == that.order && argument.equals(that.argument);
  }

  @Override
  public int hashCode() {
    return 31 * argument.hashCode() + order;
  }
}
