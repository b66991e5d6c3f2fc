package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;

/// The equation Σ_i coefficients_i(v) A^i y = rightSide(v), where A is the shift E of v by 1 or the
/// derivative by v.
///
/// @param action what A does
/// @param variable the v
/// @param coefficients c_0, …, c_J, the last one not zero
/// @param rightSide free of the unknown function
public record LinearEquation(
    Action action, Variable variable, List<Form> coefficients, Form rightSide) {

  /// What is done to the unknown function.
  public enum Action {
    /// y(v) becomes y(v + 1).
    SHIFT,
    /// y becomes its derivative by v.
    DERIVATIVE
  }

  /// Keeps its own copy, without leading zeros.
  public LinearEquation {
    int size = coefficients.size();
    while (size > 0 && coefficients.get(size - 1).isZero()) {
      size--;
    }
    if (size == 0) {
      throw new IllegalArgumentException("no unknown function");
    }
    coefficients = List.copyOf(coefficients.subList(0, size));
  }

  /// The order J.
  public int order() {
    return coefficients.size() - 1;
  }

  /// The coefficient c_J.
  public Form leading() {
    return coefficients.getLast();
  }

  /// The same left side, with the right side 0.
  public LinearEquation homogeneous() {
    return new LinearEquation(action, variable, coefficients, Form.ZERO);
  }

  /// The same left side with another right side.
  public LinearEquation withRightSide(Form other) {
    return new LinearEquation(action, variable, coefficients, other);
  }

  /// Whether every coefficient is free of the variable.
  public boolean hasConstantCoefficients() {
    return coefficients.stream().noneMatch(c -> c.dependsOn(variable));
  }

  /// Whether every coefficient is a rational function of the variable.
  public boolean hasRationalCoefficients() {
    return coefficients.stream().allMatch(c -> Structure.isRationalIn(c, variable));
  }

  /// g(n) − Σ_(i<J) c_i(n) y(n + i) of a recurrence at an integer n, where the values are known.
  Optional<Form> known(SortedMap<BigInteger, Form> values, BigInteger n) {
    Form at = Form.of(n);
    Form rest = rightSide.substitute(variable, at);
    for (int i = 0; i < order(); i++) {
      Form c = coefficients.get(i).substitute(variable, at);
      Form value = values.get(n.add(BigInteger.valueOf(i)));
      if (!c.isZero() && value == null) {
        return Optional.empty();
      }
      rest = c.isZero() ? rest : rest.minus(c.times(value));
    }
    return Optional.of(rest);
  }

  /// A^i y.
  public Form acted(Form y, int i) {
    return switch (action) {
      case SHIFT ->
          Lowered.of(
              i == 0 ? y : y.substitute(variable, Form.of(variable).plus(Form.of(i))), variable);
      case DERIVATIVE -> {
        Form image = y;
        for (int j = 0; j < i; j++) {
          image = image.derivative(variable);
        }
        yield image;
      }
    };
  }

  /// Left side less right side with y put in.
  public Form residual(Form y) {
    List<Form> parts = new ArrayList<>();
    for (int i = 0; i <= order(); i++) {
      if (!coefficients.get(i).isZero()) {
        parts.add(coefficients.get(i).times(acted(y, i)));
      }
    }
    parts.add(rightSide.negated());
    return Form.sum(parts);
  }

  /// The equation with denominators cleared from the coefficients and their common polynomial
  /// factor taken out. Coefficients must be rational in the variable.
  public LinearEquation cleared() {
    Polynomial denominator = Polynomial.ONE;
    for (Form c : coefficients) {
      denominator = Polynomial.lcm(denominator, c.denominator());
    }
    Form scale = Form.of(denominator);
    Polynomial common = Polynomial.ZERO;
    for (Form c : coefficients) {
      if (!c.isZero()) {
        Polynomial numerator = c.times(scale).numerator();
        common = common.isZero() ? numerator : Polynomial.gcd(common, numerator);
      }
    }
    Form factor = scale.dividedBy(Form.of(common));
    return scaled(factor);
  }

  /// Both sides multiplied by a factor.
  LinearEquation scaled(Form factor) {
    List<Form> all = coefficients.stream().map(c -> c.times(factor)).toList();
    return new LinearEquation(action, variable, all, rightSide.times(factor));
  }
}
