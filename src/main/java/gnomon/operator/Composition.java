package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/// The product of operators in their normal form.
///
/// For a negative power, with W the formal symbol t^(−j) ∘ b, the exact product is I^j ∘ b = W −
/// Σ_(i<j) (x^i/i!) ε(0) t^i ∘ W, since D^j ∘ W = b; the functional ε(0) of a symbol is its part
/// regular in t at x = 0.
final class Composition {

  private final Operator a;
  private final Operator b;
  private final Set<Variable> active = new TreeSet<>();
  private final TreeMap<Variable, Form> boundaries = new TreeMap<>();

  private Composition(Operator a, Operator b) {
    this.a = a;
    this.b = b;
    a.symbol().duals().forEach(t -> active.add(t.of()));
  }

  static Operator compose(Operator a, Operator b) {
    if (a.isMultiplication() && a.symbol().isOne()) {
      return b;
    }
    Optional<Operator> shorter = b.iterate().flatMap(power -> power.after(a));
    if (shorter.isPresent()) {
      return shorter.get();
    }
    return new Composition(a, b).result();
  }

  private Operator result() {
    Form symbol = symbols(a.symbol(), b.symbol());
    for (Variable x : active) {
      correct(x);
    }
    for (Map.Entry<Variable, Form> entry : b.boundaries().entrySet()) {
      symbolAfterBoundary(entry.getKey(), entry.getValue());
    }
    for (Map.Entry<Variable, Form> entry : a.boundaries().entrySet()) {
      boundaryAfter(entry.getKey(), entry.getValue());
    }
    return new Operator(symbol, boundaries, Kernels.ofComposition(a, b));
  }

  private Form symbols(Form left, Form right) {
    checkPoles(left, right);
    return Splitting.compose(left, right, variablesOf(left));
  }

  private static Set<Variable> variablesOf(Form symbol) {
    Set<Variable> result = new TreeSet<>();
    symbol.duals().forEach(t -> result.add(t.of()));
    return result;
  }

  /// Multiplication by e^(c x) on the right moves the symbol on the left by c; there must not be a
  /// pole where t = 0 has moved to.
  private static void checkPoles(Form left, Form right) {
    for (Dual t : left.duals()) {
      Splitting.parts(right, t.of(), left)
          .ifPresent(
              parts ->
                  parts.stream()
                      .filter(p -> !p.rate().isZero())
                      .filter(p -> isSingular(Splitting.shifted(left, t, p.rate()), t))
                      .findFirst()
                      .ifPresent(
                          p -> {
                            throw new Refusal(Reason.SYMBOL_POLE, left, p.rate());
                          }));
    }
  }

  private static boolean isSingular(Form symbol, Dual t) {
    return symbol.dependsOn(t) && !Expansion.singularPart(symbol, t).isEmpty();
  }

  private void add(Variable x, Form boundary) {
    if (!boundary.isZero()) {
      boundaries.merge(x, boundary, Form::plus);
    }
  }

  /// The corrections that the negative powers of t in the left symbol bring.
  private void correct(Variable x) {
    Dual t = new Dual(x);
    List<Form> poles = Expansion.singularPart(a.symbol(), t);
    if (poles.isEmpty() || !b.symbol().dependsOn(t) && !b.symbol().dependsOn(x)) {
      return;
    }
    List<Form> parts = new ArrayList<>();
    for (int j = 1; j <= poles.size(); j++) {
      if (!poles.get(j - 1).isZero()) {
        Form w = Splitting.compose(Form.of(t).power(-j), b.symbol(), Set.of(x));
        Form taylor = taylor(w, x, t, j).negated();
        requireUnmixed(poles.get(j - 1), taylor, x);
        parts.add(symbols(poles.get(j - 1), taylor));
      }
    }
    add(x, Form.sum(parts));
  }

  /// Refuses a product whose boundary would lie in two variables at once.
  private static void requireUnmixed(Form left, Form right, Variable x) {
    for (Variable y : variablesOf(left)) {
      Dual t = new Dual(y);
      boolean touches = right.dependsOn(t) || right.dependsOn(y);
      if (!y.equals(x) && touches && isSingular(left, t)) {
        throw new Refusal(Reason.MIXED_BOUNDARIES, left, right);
      }
    }
  }

  /// Σ_(i<j) (x^i/i!) · (the part regular in t of [t^i ∘ w] at x = 0).
  private static Form taylor(Form w, Variable x, Dual t, int j) {
    List<Form> terms = new ArrayList<>();
    for (int i = 0; i < j; i++) {
      Form moment = Splitting.compose(Form.of(t).power(i), w, Set.of(x)).substitute(x, Form.ZERO);
      Form weight = Form.of(x).power(i).times(Rational.of(Integers.factorial(i)).inverse());
      terms.add(weight.times(regular(moment, t)));
    }
    return Form.sum(terms);
  }

  /// The form without the negative powers of t of its expansion at 0.
  static Form regular(Form form, Dual t) {
    List<Form> poles = Expansion.singularPart(form, t);
    Form result = form;
    for (int j = 1; j <= poles.size(); j++) {
      result = result.minus(poles.get(j - 1).times(Form.of(t).power(-j)));
    }
    return result;
  }

  /// a ∘ r: the symbol on the left acts on the functions of x in the boundary part.
  private void symbolAfterBoundary(Variable x, Form r) {
    requireUnmixed(a.symbol(), r, x);
    Dual t = new Dual(x);
    Form hold = Form.of(spectator(x));
    Form function = r.substitute(t, hold);
    List<Form> parts = new ArrayList<>();
    for (Splitting.Product product : Action.split(a.symbol(), function, x)) {
      parts.add(symbols(product.left(), product.right()));
    }
    add(x, Form.sum(parts).substitute(spectator(x), Form.of(t)));
  }

  /// r ∘ B: the functional on the left meets the symbol and the boundary part on the right.
  private void boundaryAfter(Variable x, Form r) {
    requireUnmixed(r, b.symbol(), x);
    Dual t = new Dual(x);
    checkPoles(r, b.symbol());
    List<Form> parts = new ArrayList<>();
    for (Splitting.Product product : Splitting.compose(r, b.symbol(), x)) {
      parts.add(symbolsBut(x, product.left(), product.right().substitute(x, Form.ZERO)));
    }
    add(x, regular(Form.sum(parts), t));
    for (Map.Entry<Variable, Form> entry : b.boundaries().entrySet()) {
      if (!entry.getKey().equals(x)) {
        throw new Refusal(Reason.MIXED_BOUNDARIES, r, entry.getValue());
      }
      boundaryAfterBoundary(x, r, entry.getValue());
    }
  }

  private Form symbolsBut(Variable x, Form left, Form right) {
    Set<Variable> others = variablesOf(left);
    others.remove(x);
    return Splitting.compose(left, right, others);
  }

  private void boundaryAfterBoundary(Variable x, Form r, Form s) {
    Form function = s.substitute(new Dual(x), Form.of(spectator(x)));
    List<Form> parts = new ArrayList<>();
    for (Splitting.Product product : Action.split(r, function, x)) {
      Form value = product.right().substitute(x, Form.ZERO);
      parts.add(symbolsBut(x, product.left(), value));
    }
    add(x, Form.sum(parts).substitute(spectator(x), Form.of(new Dual(x))));
  }

  /// A variable that no input can name, to hold the dual of x while a symbol acts on x.
  private static Variable spectator(Variable x) {
    return new Variable("held dual of " + x.name());
  }
}
