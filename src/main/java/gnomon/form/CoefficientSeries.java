package gnomon.form;

import gnomon.number.Rational;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;

/// The power series Σ_{k ≥ 0} c(k) u^k at an argument u, given by a formula for its coefficients.
///
/// It means a formal power series: u must be one without constant term where it is expanded. The
/// index is renamed on construction by [#of], so that its name does not matter.
public record CoefficientSeries(Form coefficient, Variable index, Form argument)
    implements Generator {
  private static final String NAMES = "kjlmpqrstuvwyz";

  /// The series at the argument; c(0) at 0, and 0 where every coefficient is.
  public static Form of(Form coefficient, Variable index, Form argument) {
    if (coefficient.isZero()) {
      return Form.ZERO;
    }
    if (argument.isZero()) {
      return coefficient.substitute(index, Form.ZERO);
    }
    Set<Variable> taken = new TreeSet<>(coefficient.variables());
    taken.remove(index);
    taken.addAll(argument.variables());
    argument.duals().forEach(dual -> taken.add(dual.of()));
    for (int at = 0; at < NAMES.length(); at++) {
      Variable name = new Variable(NAMES.substring(at, at + 1));
      if (!taken.contains(name)) {
        Form renamed =
            name.equals(index) ? coefficient : coefficient.substitute(index, Form.of(name));
        return Form.of(new CoefficientSeries(renamed, name, argument));
      }
    }
    return Form.of(new CoefficientSeries(coefficient, index, argument));
  }

  @Override
  public String key() {
    return "series(" + index.name() + ";" + coefficient.key() + ";" + argument.key() + ")";
  }

  @Override
  public int rank() {
    return 8;
  }

  /// u′ Σ (k + 1) c(k + 1) u^k.
  @Override
  public Form derivative(Generator v) {
    Form inner = argument.derivative(v);
    if (coefficient.dependsOn(v)) {
      Form slopes = coefficient.derivative(v);
      return of(slopes, index, argument).plus(inner.isZero() ? inner : inner.times(slope()));
    }
    return inner.isZero() ? inner : inner.times(slope());
  }

  private Form slope() {
    Form next = Form.of(index).plus(Form.ONE);
    return of(coefficient.substitute(index, next).times(next), index, argument);
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Map<Generator, Form> outer = new HashMap<>(images);
    outer.remove(index);
    Variable fresh = index;
    Form inside = coefficient;
    if (outer.values().stream().anyMatch(image -> image.dependsOn(index))) {
      fresh = new Variable(index.name() + "'");
      inside = coefficient.substitute(index, Form.of(fresh));
    }
    Form value = of(inside.substitute(outer), fresh, argument.substitute(images));
    return Powers.power(value, Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    argument.atoms(consumer);
    coefficient.atoms(
        a -> {
          if (!a.equals(index)) {
            consumer.accept(a);
          }
        });
  }
}
