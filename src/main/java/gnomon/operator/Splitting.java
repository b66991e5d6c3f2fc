package gnomon.operator;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// What one variable x and its dual t contribute to a composition or an application, as a finite
/// sum of products left·right: the left factors come from the operator on the left, the right
/// factors carry what it acted on.
///
/// With p polynomial in t, (p(t) e^(h t)) ∘ b = Σ_k (1/k!) p^(k)(t) e^(h t) · ∂_x^k b(x + h). With
/// q polynomial in x, a ∘ (e^(c x) q(x)) = Σ_k (1/k!) ∂_t^k a(t + c) · e^(c x) q^(k)(x).
final class Splitting {

  /// One summand, to be multiplied once all variables have been treated.
  record Product(Form left, Form right) {
    Form value() {
      return left.times(right);
    }
  }

  private Splitting() {}

  /// The symbol of a ∘ b over all the variables whose duals occur in a.
  static Form compose(Form a, Form b, Set<Variable> active) {
    List<Product> products = List.of(new Product(a, b));
    for (Variable x : active) {
      List<Product> next = new ArrayList<>();
      for (Product product : products) {
        next.addAll(compose(product.left(), product.right(), x));
      }
      products = next;
    }
    return Form.sum(products.stream().map(Product::value).toList());
  }

  /// The summands of a ∘ b as far as x and its dual are concerned.
  ///
  /// @throws Refusal with [Reason#INFINITE_COMPOSITION] when they are not finitely many
  static List<Product> compose(Form a, Form b, Variable x) {
    Dual t = new Dual(x);
    if (!a.dependsOn(t) || !b.dependsOn(x)) {
      return List.of(new Product(a, b));
    }
    Optional<List<ExponentialPart>> left = parts(a, t, a);
    Optional<List<ExponentialPart>> right = parts(b, x, a);
    if (left.isEmpty() && right.isEmpty()) {
      throw new Refusal(Reason.INFINITE_COMPOSITION, a, b);
    }
    if (right.isEmpty() || left.isPresent() && cost(left.get()) <= cost(right.get())) {
      return byShifts(left.get(), b, x, t);
    }
    return byRates(a, right.get(), x, t);
  }

  /// The exponential parts in the generator, when their rates are scalars for every variable on
  /// which the left operator acts.
  static Optional<List<ExponentialPart>> parts(Form form, Generator v, Form left) {
    Budget.charge(form.numerator().degree(v).abs().floor().longValueExact());
    Optional<List<ExponentialPart>> parts = Structure.exponentialParts(form, v);
    return parts.filter(list -> list.stream().allMatch(p -> isScalarRate(p.rate(), v, left)));
  }

  private static boolean isScalarRate(Form rate, Generator v, Form left) {
    if (!rate.duals().isEmpty()) {
      return false;
    }
    Variable own = v instanceof Dual dual ? dual.of() : (Variable) v;
    return !rate.dependsOn(own) && left.duals().stream().noneMatch(d -> rate.dependsOn(d.of()));
  }

  private static int cost(List<ExponentialPart> parts) {
    return parts.stream().mapToInt(p -> p.coefficients().size()).sum();
  }

  private static List<Product> byShifts(List<ExponentialPart> parts, Form b, Variable x, Dual t) {
    List<Product> result = new ArrayList<>();
    for (ExponentialPart part : parts) {
      Form polynomial = polynomial(part.coefficients(), Form.of(t));
      Form slope = shifted(b, x, part.rate());
      for (int k = 0; !polynomial.isZero() && !slope.isZero(); k++) {
        Budget.checkpoint();
        result.add(new Product(part.kernel().times(polynomial), slope));
        polynomial = polynomial.derivative(t).times(Rational.of(1, k + 1));
        slope = polynomial.isZero() ? slope : slope.derivative(x);
      }
    }
    return result;
  }

  private static List<Product> byRates(Form a, List<ExponentialPart> parts, Variable x, Dual t) {
    List<Product> result = new ArrayList<>();
    for (ExponentialPart part : parts) {
      Form polynomial = polynomial(part.coefficients(), Form.of(x));
      Form slope = shifted(a, t, part.rate());
      for (int k = 0; !polynomial.isZero() && !slope.isZero(); k++) {
        Budget.checkpoint();
        result.add(new Product(slope, part.kernel().times(polynomial)));
        polynomial = polynomial.derivative(x).times(Rational.of(1, k + 1));
        slope = polynomial.isZero() ? slope : slope.derivative(t);
      }
    }
    return result;
  }

  /// f(v + h).
  static Form shifted(Form f, Generator v, Form h) {
    return h.isZero() ? f : f.substitute(v, Form.of(v).plus(h));
  }

  /// Σ c_j v^j.
  static Form polynomial(List<Form> coefficients, Form v) {
    List<Form> terms = new ArrayList<>();
    for (int j = 0; j < coefficients.size(); j++) {
      terms.add(coefficients.get(j).times(v.power(j)));
    }
    return Form.sum(terms);
  }
}
