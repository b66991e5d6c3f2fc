package gnomon.form;

import gnomon.number.Rational;
import java.util.Map;
import java.util.function.Consumer;

/// The power kernel base^unit, where the unit is a monomial with coefficient 1 over a common
/// denominator; rational multiples of the unit are exponents of the kernel in a monomial, so
/// e^(3x/2) is the 3/2-th power of the kernel with base e and unit x.
///
/// With unit 1 it is the number e, or a radical: an exponent in [0, 1) of a prime or of a form.
public record Exponential(Base base, Form unit) implements Generator {

  @Override
  public String key() {
    return "pow(" + base.key() + ";" + unit.key() + ")";
  }

  /// The order of power kernels: by unit, then by base.
  static int compare(Exponential a, Exponential b) {
    int byUnit = a.unit.compareTo(b.unit);
    return byUnit != 0 ? byUnit : Base.compare(a.base, b.base);
  }

  @Override
  public int rank() {
    return isAlgebraic() ? 12 : 3;
  }

  @Override
  public boolean isAlgebraic() {
    return unit.isOne() && !(base instanceof Base.Natural);
  }

  /// u'·ln b + u·b'/b, the derivative divided by the kernel itself.
  public Form logarithmicDerivative(Generator v) {
    Form sum = Form.ZERO;
    Form change = unit.derivative(v);
    if (!change.isZero()) {
      sum = change.times(base.logarithm());
    }
    if (base instanceof Base.Of(Form form)) {
      Form inner = form.derivative(v);
      if (!inner.isZero()) {
        sum = sum.plus(unit.times(inner).dividedBy(form));
      }
    }
    return sum;
  }

  @Override
  public Form derivative(Generator v) {
    return Form.of(this).times(logarithmicDerivative(v));
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Form power = unit.substitute(images).times(exponent);
    if (base instanceof Base.Of(Form form)) {
      return Powers.power(form.substitute(images), power);
    }
    return Powers.raise(base, power);
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    unit.atoms(consumer);
    if (base instanceof Base.Of(Form form)) {
      form.atoms(consumer);
    }
  }

  // Written out: the generated methods cost tens of milliseconds when they are first called.

  @Override
  public boolean equals(Object other) {
    return other instanceof Exponential that
        && unit.equals(that.unit)
        && Base.compare(base, that.base) == 0;
  }

  @Override
  public int hashCode() {
    return 31 * unit.hashCode() + base.key().hashCode();
  }
}
