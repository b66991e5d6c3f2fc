package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The named constants: the imaginary unit, with i² = −1, and π, taken as transcendental.
public record Constant(Name name) implements Generator {

  /// Which constant.
  public enum Name {
    I,
    PI
  }

  public static final Constant I = new Constant(Name.I);
  public static final Constant PI = new Constant(Name.PI);

  @Override
  public String key() {
    return name.toString();
  }

  @Override
  public int rank() {
    return isAlgebraic() ? 11 : 9;
  }

  @Override
  public boolean isAlgebraic() {
    return name == Name.I;
  }

  @Override
  public Form derivative(Generator v) {
    return Form.ZERO;
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    return Form.of(this, exponent);
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    // a constant is made of no variable
  }

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Constant that && name == that.name;
  }

  @Override
  public int hashCode() {
    return name.ordinal() + 17;
  }
}
