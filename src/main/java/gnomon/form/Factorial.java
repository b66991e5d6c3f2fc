package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The factorial u! = Γ(u+1) of an argument u = L + r, where L has no constant term and 0 ≤ r < 1.
public record Factorial(Form argument) implements Generator {

  @Override
  public String key() {
    return "(" + argument.key() + ")!";
  }

  @Override
  public int rank() {
    return 4;
  }

  /// Zero where the argument does not depend on v.
  ///
  /// @throws Refusal with [Reason#DERIVATIVE_UNKNOWN] otherwise: the derivative needs the digamma
  ///   function, which is no kernel of this room
  @Override
  public Form derivative(Generator v) {
    if (argument.dependsOn(v)) {
      throw new Refusal(Reason.DERIVATIVE_UNKNOWN, Form.of(this), Form.of(v));
    }
    return Form.ZERO;
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Form value = Combinatorial.factorial(argument.substitute(images));
    return Powers.power(value, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
  }

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Factorial that && argument.equals(that.argument);
  }

  @Override
  public int hashCode() {
    return 31 * argument.hashCode() + 4;
  }
}
