package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The natural logarithm of an argument that is neither a product nor a power nor an exponential.
public record Logarithm(Form argument) implements Generator {

  @Override
  public String key() {
    return "ln(" + argument.key() + ")";
  }

  @Override
  public int rank() {
    return 5;
  }

  @Override
  public Form derivative(Generator v) {
    Form inner = argument.derivative(v);
    return inner.isZero() ? inner : inner.dividedBy(argument);
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    return Powers.power(Logarithms.ln(argument.substitute(images)), Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
  }

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Logarithm that && argument.equals(that.argument);
  }

  @Override
  public int hashCode() {
    return 31 * argument.hashCode() + 5;
  }
}
