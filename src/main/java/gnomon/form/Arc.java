package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// An inverse circular function of an argument at which no exact value is known.
public record Arc(Kind kind, Form argument) implements Generator {

  /// Which inverse function.
  public enum Kind {
    ARCTAN,
    ARCSIN
  }

  @Override
  public String key() {
    return kind + "(" + argument.key() + ")";
  }

  @Override
  public int rank() {
    return 6;
  }

  @Override
  public Form derivative(Generator v) {
    Form inner = argument.derivative(v);
    if (inner.isZero()) {
      return inner;
    }
    Form square = argument.times(argument);
    return switch (kind) {
      case ARCTAN -> inner.dividedBy(Form.ONE.plus(square));
      case ARCSIN -> inner.dividedBy(Elementary.sqrt(Form.ONE.minus(square)));
    };
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Form image = argument.substitute(images);
    Form value =
        switch (kind) {
          case ARCTAN -> Elementary.arctan(image);
          case ARCSIN -> Elementary.arcsin(image);
        };
    return Powers.power(value, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
  }
}
