package gnomon.form;

import gnomon.number.Rational;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;

/// The value at the argument of the compositional inverse g of a series f without closed form for
/// g: f(g(argument)) = argument and g(0) = 0. The form f is written in the dual `in`.
public record InverseSeries(Form of, Dual in, Form argument) implements Generator {

  @Override
  public String key() {
    return "inverse(" + of.key() + ";" + argument.key() + ")";
  }

  @Override
  public int rank() {
    return 8;
  }

  /// From f(g) = argument: f′(g) dg/dv + (∂f/∂v)(g) is the derivative of the argument, where f may
  /// have v for a parameter.
  @Override
  public Form derivative(Generator v) {
    Map<Generator, Form> here = Map.of(in, Form.of(this));
    Form direct = v.equals(in) ? Form.ZERO : of.derivative(v).substitute(here);
    Form inner = argument.derivative(v).minus(direct);
    return inner.isZero() ? inner : inner.dividedBy(of.derivative(in).substitute(here));
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Map<Generator, Form> outer = new HashMap<>(images);
    outer.remove(in);
    Form value = of(of.substitute(outer), in, argument.substitute(images));
    return Powers.power(value, Form.of(exponent));
  }

  /// The value of the inverse series of f at an argument: 0 at 0, v at f(v) for a variable or dual
  /// v, otherwise the kernel.
  public static Form of(Form f, Dual in, Form argument) {
    if (argument.isZero()) {
      return Form.ZERO;
    }
    Set<Generator> atoms = new LinkedHashSet<>();
    argument.atoms(atoms::add);
    for (Generator v : atoms) {
      if (f.substitute(in, Form.of(v)).equals(argument)) {
        return Form.of(v);
      }
    }
    return Form.of(new InverseSeries(f, in, argument));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
    of.atoms(
        a -> {
          if (!a.equals(in)) {
            consumer.accept(a);
          }
        });
  }
}
