package gnomon.recurrence;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// A function t with t(v + 1) = ratio(v) t(v) for a rational function, as powers and factorials.
///
/// The factor v − r gives (v − r − 1)!, or where r is an integer that the values of interest pass,
/// (−1)^v/(r − v)!, which goes on being finite below; below a fraction line it gives 1/(v − r −
/// 1)!.
public final class TermOfRatio {
  private TermOfRatio() {}

  /// The function, for values from `start` on where that is given; nothing where a factor is not
  /// linear in v. Common factors of the shape c(v+1)/c(v) are taken as the polynomial c.
  public static Optional<Form> of(Form ratio, Variable v, Optional<BigInteger> start) {
    Factored factored = Structure.factored(ratio);
    Form unit = Form.of(factored.unit());
    List<Form> up = new ArrayList<>();
    List<Form> down = new ArrayList<>();
    for (Factored.Factor factor : factored.factors()) {
      Form base = factor.base();
      Optional<List<Form>> list = Structure.asPolynomial(base, v);
      if (list.isEmpty()) {
        return Optional.empty();
      }
      Form leading = list.get().getLast();
      unit = unit.times(leading.power(factor.multiplicity()));
      if (list.get().size() > 1) {
        for (int i = 0; i < Math.abs(factor.multiplicity()); i++) {
          (factor.multiplicity() > 0 ? up : down).add(base.dividedBy(leading));
        }
      }
    }
    Form rational = cancelled(up, down, v);
    List<Form> parts = new ArrayList<>(List.of(rational));
    for (int i = 0; i < up.size() + down.size(); i++) {
      boolean above = i < up.size();
      Optional<Form> root = root(above ? up.get(i) : down.get(i - up.size()), v);
      if (root.isEmpty()) {
        return Optional.empty();
      }
      boolean reflected = isAbove(root.get()) || above && isPassed(root.get(), start);
      Form argument =
          reflected ? root.get().minus(Form.of(v)) : Form.of(v).minus(root.get()).minus(Form.ONE);
      unit = reflected ? unit.negated() : unit;
      parts.add(Combinatorial.factorial(argument).power(above == reflected ? -1 : 1));
    }
    parts.add(Elementary.power(unit, Form.of(v)));
    return Optional.of(Form.product(parts));
  }

  private static Optional<Form> root(Form monic, Variable v) {
    Form root = Form.of(v).minus(monic);
    return root.dependsOn(v) ? Optional.empty() : Optional.of(root);
  }

  private static boolean isPassed(Form root, Optional<BigInteger> start) {
    Optional<BigInteger> whole = root.asInteger();
    return whole.isPresent() && start.isPresent() && start.get().compareTo(whole.get()) <= 0;
  }

  /// Whether the root is a parameter, as in a − v, rather than the negative of one, as in v + a.
  private static boolean isAbove(Form root) {
    return !root.isConstant() && root.numerator().leadingCoefficient().sign() > 0;
  }

  /// Takes pairs p(v + j) above p(v), or the other way round, out as rational functions.
  private static Form cancelled(List<Form> up, List<Form> down, Variable v) {
    Form rational = Form.ONE;
    for (int i = up.size() - 1; i >= 0; i--) {
      for (int k = 0; k < down.size(); k++) {
        Optional<Integer> shift = ShiftFactors.shift(up.get(i), down.get(k), v);
        if (shift.isPresent()) {
          rational = rational.times(telescoped(up.get(i), down.get(k), shift.get(), v));
          up.remove(i);
          down.remove(k);
          break;
        }
      }
    }
    return rational;
  }

  /// The rational t with t(v+1)/t(v) = upper/lower, where upper(v) = lower(v + j).
  private static Form telescoped(Form upper, Form lower, int j, Variable v) {
    Form product = Form.ONE;
    for (int i = 0; i < j; i++) {
      product = product.times(ShiftFactors.moved(lower, v, i));
    }
    for (int i = 0; i < -j; i++) {
      product = product.dividedBy(ShiftFactors.moved(upper, v, i));
    }
    return product;
  }
}
