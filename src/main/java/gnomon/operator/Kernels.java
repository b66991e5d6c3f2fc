package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.series.Expansion;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/// The rules for images that are only defined modulo polynomials of low degree.
final class Kernels {
  private Kernels() {}

  /// The boundaries without zeros, each reduced modulo the kernel of its variable.
  static SortedMap<Variable, Form> reduce(
      Map<Variable, Form> boundaries, Map<Variable, Integer> orders) {
    TreeMap<Variable, Form> result = new TreeMap<>();
    boundaries.forEach(
        (x, r) -> {
          Form reduced = reduce(r, x, orders.getOrDefault(x, 0));
          if (!reduced.isZero()) {
            result.put(x, reduced);
          }
        });
    return result;
  }

  /// The form without its terms of degree below `order` in x, where it is an exponential polynomial
  /// in x; otherwise the form itself.
  static Form reduce(Form form, Variable x, int order) {
    if (order == 0 || form.isZero()) {
      return form;
    }
    Optional<List<ExponentialPart>> parts = Structure.exponentialParts(form, x);
    if (parts.isEmpty()) {
      return form;
    }
    List<Form> kept = new ArrayList<>();
    for (ExponentialPart part : parts.get()) {
      int from = part.rate().isZero() ? order : 0;
      for (int j = from; j < part.coefficients().size(); j++) {
        kept.add(part.kernel().times(part.coefficients().get(j)).times(Form.of(x).power(j)));
      }
    }
    return Form.sum(kept);
  }

  /// The kernel orders of A ∘ B.
  static SortedMap<Variable, Integer> ofComposition(Operator a, Operator b) {
    TreeMap<Variable, Integer> result = new TreeMap<>(a.kernelOrders());
    b.kernelOrders()
        .forEach(
            (x, k) -> {
              int carried = carried(a, x, k);
              if (carried > 0) {
                result.merge(x, carried, Math::max);
              }
            });
    return result;
  }

  /// The order k' such that A takes the polynomials of degree below k onto those below k', modulo
  /// the kernel that A itself leaves undetermined.
  private static int carried(Operator a, Variable x, int k) {
    Dual t = new Dual(x);
    if (valuation(a.boundary(x), t) < k) {
      throw new Refusal(Reason.KERNEL_LOST, a.symbol(), Form.of(x), k);
    }
    int valuation = valuation(a.symbol(), t);
    if (valuation >= k) {
      return 0;
    }
    if (a.symbol().dependsOn(x) || valuation < 0 && a.kernelOrder(x) < -valuation) {
      throw new Refusal(Reason.KERNEL_LOST, a.symbol(), Form.of(x), k);
    }
    return Math.max(0, k - valuation);
  }

  /// The exponent of the lowest power of t; a large number for zero.
  static int valuation(Form form, Dual t) {
    if (form.isZero()) {
      return Integer.MAX_VALUE;
    }
    if (!form.dependsOn(t)) {
      return 0;
    }
    for (int order = 1; ; order *= 4) {
      int valuation = Expansion.of(form, t, order).valuation();
      if (valuation <= order) {
        return valuation;
      }
      if (order > 1000) {
        throw new Refusal(Reason.NO_SERIES, form);
      }
    }
  }

  /// The form plus the undetermined polynomials C1, C1 + C2 x, … of each kernel.
  static Form withConstants(Form image, Form argument, SortedMap<Variable, Integer> orders) {
    List<Form> parts = new ArrayList<>();
    Form reduced = image;
    int next = firstUnused(argument.plus(image));
    for (Map.Entry<Variable, Integer> entry : orders.entrySet()) {
      reduced = reduce(reduced, entry.getKey(), entry.getValue());
      for (int j = 0; j < entry.getValue(); j++) {
        parts.add(Form.variable("C" + next++).times(Form.of(entry.getKey()).power(j)));
      }
    }
    parts.add(reduced);
    return Form.sum(parts);
  }

  private static int firstUnused(Form form) {
    int next = 1;
    while (form.dependsOn(new Variable("C" + next))) {
      next++;
    }
    return next;
  }
}
