package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.function.UnaryOperator;

/// Inverses and quotients.
final class Inversion {
  private Inversion() {}

  static Operator inverse(Operator operator) {
    Form symbol = operator.symbol();
    if (!operator.boundaries().isEmpty()) {
      throw new Refusal(Reason.NO_INVERSE, symbol);
    }
    if (symbol.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, symbol);
    }
    if (symbol.duals().isEmpty() && operator.kernelOrders().isEmpty()) {
      return Operator.multiplication(symbol.inverse());
    }
    if (operator.isShiftInvariant()) {
      return ofShiftInvariant(operator);
    }
    return ofProduct(operator).orElseThrow(() -> new Refusal(Reason.NO_INVERSE, symbol));
  }

  /// 1/s, modulo the kernel of s; an operator that was such an inverse gives back the original.
  private static Operator ofShiftInvariant(Operator operator) {
    Form symbol = operator.symbol();
    TreeMap<Variable, Integer> kernels = new TreeMap<>();
    SortedSet<Variable> acting = operator.variables();
    if (acting.size() > 1) {
      requireConstantTerm(operator);
      return Operator.ofSymbol(symbol.inverse());
    }
    Variable x = acting.first();
    int valuation = Kernels.valuation(symbol, new Dual(x));
    if (operator.kernelOrder(x) != Math.max(0, -valuation)) {
      throw new Refusal(Reason.NO_INVERSE, symbol);
    }
    if (valuation > 0) {
      kernels.put(x, valuation);
    }
    return new Operator(symbol.inverse(), new TreeMap<>(), kernels);
  }

  private static void requireConstantTerm(Operator operator) {
    Form value = operator.symbol();
    if (!operator.kernelOrders().isEmpty()) {
      throw new Refusal(Reason.NO_INVERSE, value);
    }
    for (Dual t : operator.symbol().duals()) {
      value = value.substitute(t, Form.ZERO);
    }
    if (value.isZero()) {
      throw new Refusal(Reason.NO_INVERSE, operator.symbol());
    }
  }

  /// (c(x) ∘ S)⁻¹ = S⁻¹ ∘ (1/c) for a symbol that is a product c(x) s(t).
  private static Optional<Operator> ofProduct(Operator operator) {
    if (!operator.kernelOrders().isEmpty()) {
      return Optional.empty();
    }
    Factored factored = Structure.factored(operator.symbol());
    Form function = Form.of(factored.unit());
    Form symbol = Form.ONE;
    for (Factored.Factor factor : factored.factors()) {
      Form power = factor.base().power(factor.multiplicity());
      if (factor.base().duals().isEmpty()) {
        function = function.times(power);
      } else {
        symbol = symbol.times(power);
      }
    }
    Operator right = Operator.ofSymbol(symbol);
    if (!function.duals().isEmpty() || !right.isShiftInvariant()) {
      return Optional.empty();
    }
    return Optional.of(right.inverse().compose(Operator.multiplication(function.inverse())));
  }

  static Operator quotient(Operator a, Operator b) {
    if (b.symbol().isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, a.symbol());
    }
    if (!a.isPlain() || !b.isPlain() || !commute(a.symbol(), b.symbol())) {
      throw new Refusal(Reason.NOT_COMMUTING, a.symbol(), b.symbol());
    }
    if (b.isMultiplication()) {
      return Operator.ofSymbol(a.symbol().dividedBy(b.symbol()));
    }
    if (!b.isShiftInvariant()) {
      throw new Refusal(Reason.NO_INVERSE, b.symbol());
    }
    Form symbol = a.symbol().dividedBy(b.symbol());
    SortedSet<Variable> acting = b.variables();
    if (acting.size() > 1) {
      requireConstantTerm(b);
      return Operator.ofSymbol(symbol);
    }
    Variable x = acting.first();
    TreeMap<Variable, Integer> kernels = new TreeMap<>();
    int before = Kernels.valuation(a.symbol(), new Dual(x));
    int missing = Kernels.valuation(b.symbol(), new Dual(x)) - before;
    if (before < 0 && missing < 0 || missing > 0 && before < 0) {
      throw new Refusal(Reason.NO_INVERSE, b.symbol());
    }
    if (missing > 0) {
      kernels.put(x, missing);
    }
    return new Operator(symbol, new TreeMap<>(), kernels);
  }

  /// Whether no dual of either meets its variable in the other.
  private static boolean commute(Form a, Form b) {
    return a.duals().stream().noneMatch(t -> b.dependsOn(t.of()))
        && b.duals().stream().noneMatch(t -> a.dependsOn(t.of()));
  }

  /// Refuses when the value of the image at t = 0 is not the function of the value of the symbol:
  /// the simplified image would then be another branch.
  static void requireSameBranch(
      UnaryOperator<Form> function, Form symbol, Form image, Generator t) {
    Form expected;
    Form actual;
    try {
      expected = function.apply(symbol.substitute(t, Form.ZERO));
      actual = image.substitute(t, Form.ZERO);
    } catch (Refusal refusal) {
      return;
    }
    if (!expected.equals(actual)) {
      throw new Refusal(Reason.NO_SERIES, image);
    }
  }
}
