package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The symbol variable t that stands for the derivation by a variable, on the right of a
/// normal-ordered symbol.
public record Dual(Variable of) implements Generator {

  @Override
  public String key() {
    return "d/d" + of.name();
  }

  @Override
  public int rank() {
    return 1;
  }

  @Override
  public Form derivative(Generator v) {
    return equals(v) ? Form.ONE : Form.ZERO;
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Form image = images.get(this);
    return image == null ? Form.of(this, exponent) : Powers.power(image, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    consumer.accept(this);
  }

  @Override
  public boolean dependsOn(Generator v) {
    return equals(v);
  }

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Dual that && of.equals(that.of);
  }

  @Override
  public int hashCode() {
    return 31 * of.hashCode() + 1;
  }
}
