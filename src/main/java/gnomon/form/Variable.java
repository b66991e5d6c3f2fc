package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// A variable or a free parameter, known by its name.
public record Variable(String name) implements Generator {

  @Override
  public String key() {
    return name;
  }

  @Override
  public int rank() {
    return 0;
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
    return other instanceof Variable that && name.equals(that.name);
  }

  @Override
  public int hashCode() {
    return name.hashCode();
  }
}
