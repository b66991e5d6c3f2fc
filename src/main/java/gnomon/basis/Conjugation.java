package gnomon.basis;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import gnomon.series.Expansion;
import java.util.List;
import java.util.Map;

/// U A U⁻¹ for a Sheffer map U of the pair (g, f) and an operator A polynomial in x.
///
/// With A = Σ_k X^k c_k(D) and Y = U X U⁻¹ = (X − g'(D)/g(D)) f'(D)⁻¹ it is Σ_k Y^k c_k(f(D)). A
/// negative power of D is an integral from 0; R = U ∫ U⁻¹ is the right inverse of f(D) on whose
/// images the functional ε(0) U⁻¹ = ε(0) g(D) vanishes:
///
///     R = 1/f(D) with the boundary −(1/g(0)) (g/f − g(0)/(f'(0) t)).
///
/// A boundary p(x) ⊗ ε(0) v(D) goes to (U p)(x) ⊗ ε(0) v(f(D)) g(D).
final class Conjugation {

  private final ShefferMap map;
  private final Variable x;
  private final Dual dual;

  private Conjugation(ShefferMap map) {
    this.map = map;
    this.dual = map.dual();
    this.x = map.variable();
  }

  /// U A U⁻¹.
  ///
  /// @throws Refusal with [Reason#NOT_POLYNOMIAL_IN_X] when the symbol of A is not a polynomial in
  ///   x
  static Operator of(ShefferMap map, Operator a) {
    if (map.isIdentity()) {
      return a;
    }
    return new Conjugation(map).conjugate(a);
  }

  private Operator conjugate(Operator a) {
    Operator result = symbol(a.symbol());
    for (Map.Entry<Variable, Form> entry : a.boundaries().entrySet()) {
      result = result.plus(boundary(entry.getKey(), entry.getValue()));
    }
    for (Map.Entry<Variable, Integer> entry : a.kernelOrders().entrySet()) {
      result = result.plus(undetermined(entry.getKey(), entry.getValue()));
    }
    return result;
  }

  /// Zero, but for polynomials of degree below `order`.
  private static Operator undetermined(Variable variable, int order) {
    Operator inverse = Operator.derivative(variable).power(order).inverse();
    return inverse.minus(inverse);
  }

  private Operator symbol(Form symbol) {
    List<Form> coefficients =
        Structure.asPolynomial(symbol, x)
            .orElseThrow(() -> new Refusal(Reason.NOT_POLYNOMIAL_IN_X, symbol, Form.of(x)));
    Operator position = null;
    Operator result = Operator.zero();
    Operator power = Operator.identity();
    for (int k = 0; k < coefficients.size(); k++) {
      if (k > 0) {
        position = position == null ? position() : position;
        power = position.compose(power);
      }
      if (!coefficients.get(k).isZero()) {
        result = result.plus(power.compose(shiftInvariant(coefficients.get(k))));
      }
    }
    return result;
  }

  /// Y = (X − g'/g) f'⁻¹.
  private Operator position() {
    Form g = map.g();
    Form drift = g.isOne() ? Form.ZERO : g.derivative(dual).dividedBy(g);
    Form stretch = map.f().derivative(dual).inverse();
    return Operator.ofSymbol(Form.of(x).minus(drift).times(stretch));
  }

  /// U c(D) U⁻¹ with the integrals from 0 that negative powers of D are.
  private Operator shiftInvariant(Form c) {
    if (!c.dependsOn(dual)) {
      return Operator.ofSymbol(c);
    }
    List<Form> poles = Expansion.singularPart(c, dual);
    if (poles.isEmpty()) {
      return Operator.ofSymbol(put(c));
    }
    Form regular = c;
    Operator result = Operator.zero();
    Operator integral = integral();
    Operator power = Operator.identity();
    for (int j = 1; j <= poles.size(); j++) {
      power = integral.compose(power);
      regular = regular.minus(poles.get(j - 1).times(Form.of(dual).power(-j)));
      result = result.plus(power.times(poles.get(j - 1)));
    }
    return result.plus(Operator.ofSymbol(put(regular)));
  }

  /// R = U ∫ U⁻¹.
  private Operator integral() {
    Form start = map.gSeries(0).coefficient(0);
    Form slope = map.fSeries(1).coefficient(1);
    Form pole = start.dividedBy(slope.times(Form.of(dual)));
    Form boundary = map.g().dividedBy(map.f()).minus(pole).dividedBy(start).negated();
    return Operator.of(map.f().inverse(), x, boundary);
  }

  private Form put(Form symbol) {
    return symbol.dependsOn(dual)
        ? Kernels.unwrapped(symbol.substitute(dual, map.f()), dual)
        : symbol;
  }

  private Operator boundary(Variable variable, Form r) {
    if (!variable.equals(x)) {
      if (r.dependsOn(x) || r.dependsOn(dual)) {
        throw new Refusal(Reason.VARIABLES_DIFFER, Form.of(variable), Form.of(x));
      }
      return Operator.of(Form.ZERO, variable, r);
    }
    Variable held = new Variable("held dual of " + x.name());
    Form function = r.substitute(dual, Form.of(held));
    Form image = FunctionImages.of(map, function, Summation.NONE);
    return Operator.of(Form.ZERO, x, image.substitute(held, map.f()).times(map.g()));
  }
}
