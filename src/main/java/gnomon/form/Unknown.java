package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The value of a derivative of an arbitrary function, of which nothing is known but its name:
/// f''(x+1) has two derivatives and the argument x + 1.
public record Unknown(String name, int derivatives, Form argument) implements Generator {

  @Override
  public String key() {
    return name + "'".repeat(derivatives) + "(" + argument.key() + ")";
  }

  @Override
  public int rank() {
    return 2;
  }

  @Override
  public Form derivative(Generator v) {
    Form inner = argument.derivative(v);
    if (inner.isZero()) {
      return inner;
    }
    return Form.of(new Unknown(name, derivatives + 1, argument)).times(inner);
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Form value = Form.of(new Unknown(name, derivatives, argument.substitute(images)));
    return Powers.power(value, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
  }
}
