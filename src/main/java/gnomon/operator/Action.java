package gnomon.operator;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;

/// The action of a symbol on a form without antidifferences: exactly on exponential polynomials,
/// and on anything when the symbol is a finite sum of t^j e^(h t).
final class Action {

  private Action() {}

  /// The image of the form under the symbol.
  ///
  /// @throws Refusal with [Reason#INFINITE_SERIES] when it is not a finite sum
  static Form apply(Form symbol, Form f) {
    Set<Variable> active = new TreeSet<>();
    symbol.duals().forEach(t -> active.add(t.of()));
    return apply(List.of(new Splitting.Product(symbol, f)), active);
  }

  /// The image when the functional in x is applied: the symbol acts, then x = 0 in what it acted
  /// on.
  static Form applyAtZero(Form symbol, Form f, Variable x) {
    List<Splitting.Product> values = new ArrayList<>();
    for (Splitting.Product product : split(symbol, f, x)) {
      values.add(new Splitting.Product(product.left(), product.right().substitute(x, Form.ZERO)));
    }
    Set<Variable> others = new TreeSet<>();
    symbol.duals().forEach(t -> others.add(t.of()));
    others.remove(x);
    return apply(values, others);
  }

  private static Form apply(List<Splitting.Product> start, Set<Variable> active) {
    List<Splitting.Product> products = start;
    for (Variable x : active) {
      List<Splitting.Product> next = new ArrayList<>();
      for (Splitting.Product product : products) {
        next.addAll(split(product.left(), product.right(), x));
      }
      products = next;
    }
    return Form.sum(products.stream().map(Splitting.Product::value).toList());
  }

  /// What x and its dual contribute: products whose left factors are free of the dual.
  static List<Splitting.Product> split(Form symbol, Form f, Variable x) {
    Dual t = new Dual(x);
    if (!symbol.dependsOn(t)) {
      return List.of(new Splitting.Product(symbol, f));
    }
    Optional<List<ExponentialPart>> rates = Splitting.parts(f, x, symbol);
    Optional<List<ExponentialPart>> shifts =
        rates.isPresent() && exceeds(symbol, t, cost(rates.get()))
            ? Optional.empty()
            : Splitting.parts(symbol, t, symbol);
    if (shifts.isEmpty() && rates.isEmpty()) {
      throw new Refusal(Reason.INFINITE_SERIES, symbol, f);
    }
    if (rates.isEmpty() || shifts.isPresent() && cost(shifts.get()) <= cost(rates.get())) {
      return byShifts(shifts.get(), f, x);
    }
    List<Splitting.Product> result = new ArrayList<>();
    for (ExponentialPart part : rates.get()) {
      Form polynomial = Splitting.polynomial(part.coefficients(), Form.of(x));
      int degree = part.coefficients().size() - 1;
      if (part.rate().isZero()) {
        onPolynomial(result, symbol, polynomial, degree, x, t);
      } else {
        onExponential(result, symbol, part, polynomial, x, t);
      }
    }
    return result;
  }

  /// Whether a power of t above the limit occurs in the symbol.
  private static boolean exceeds(Form symbol, Dual t, int limit) {
    return symbol.numerator().degree(t).compareTo(Rational.of(limit)) > 0;
  }

  private static int cost(List<ExponentialPart> parts) {
    return parts.stream().mapToInt(p -> p.coefficients().size()).sum();
  }

  private static List<Splitting.Product> byShifts(List<ExponentialPart> parts, Form f, Variable x) {
    List<Splitting.Product> result = new ArrayList<>();
    for (ExponentialPart part : parts) {
      Form image = Splitting.shifted(f, x, part.rate());
      for (int k = 0; k < part.coefficients().size(); k++) {
        Budget.checkpoint();
        image = k == 0 ? image : image.derivative(x);
        addUnlessZero(result, part.coefficients().get(k), image);
      }
    }
    return result;
  }

  /// Σ a_k D^k over all k from the pole order to the degree, with integrals from 0 for k < 0.
  private static void onPolynomial(
      List<Splitting.Product> result, Form symbol, Form p, int degree, Variable x, Dual t) {
    PowerSeries series = Expansion.of(symbol, t, degree);
    Optional<List<Form>> coefficients = Structure.asPolynomial(p, x);
    if (coefficients.isPresent() && hasConstants(series)) {
      addUnlessZero(result, Form.ONE, onCoefficients(series, coefficients.get(), x));
      return;
    }
    Form image = p;
    for (int k = 0; k <= degree; k++) {
      Budget.checkpoint();
      addUnlessZero(result, series.coefficient(k), image);
      image = image.derivative(x);
    }
    image = p;
    for (int k = -1; k >= series.valuation(); k--) {
      image = Antiderivative.ofPolynomial(image, x);
      addUnlessZero(result, series.coefficient(k), image);
    }
  }

  private static boolean hasConstants(PowerSeries series) {
    return IntStream.rangeClosed(series.valuation(), series.order())
        .allMatch(k -> series.coefficient(k).isConstant());
  }

  /// The image of Σ c_k x^k under Σ a_j D^j with constants a_j: since D and the integral from 0
  /// take x^k/k! to its neighbours, a product of series with the coefficients k! c_k in falling
  /// order.
  private static Form onCoefficients(PowerSeries series, List<Form> coefficients, Variable x) {
    int degree = coefficients.size() - 1;
    List<Form> falling = new ArrayList<>();
    for (int k = degree; k >= 0; k--) {
      falling.add(coefficients.get(k).times(Rational.of(Integers.factorial(k))));
    }
    int order = degree + Math.max(0, -series.valuation());
    PowerSeries product = series.times(PowerSeries.of(falling, 0, order));
    List<Form> terms = new ArrayList<>();
    for (int i = product.valuation(); i <= degree; i++) {
      Budget.checkpoint();
      Rational weight = Rational.of(Integers.factorial(degree - i)).inverse();
      terms.add(product.coefficient(i).times(weight).times(Form.of(x).power(degree - i)));
    }
    return Form.sum(terms);
  }

  private static void addUnlessZero(List<Splitting.Product> result, Form left, Form right) {
    if (!left.isZero() && !right.isZero()) {
      result.add(new Splitting.Product(left, right));
    }
  }

  /// a(t + c) on the polynomial, less the Taylor polynomials that integrals from 0 take away.
  private static void onExponential(
      List<Splitting.Product> result,
      Form symbol,
      ExponentialPart part,
      Form polynomial,
      Variable x,
      Dual t) {
    int degree = part.coefficients().size() - 1;
    Form slope = polynomial;
    List<Form> values = coefficientsAt(symbol, t, part.rate(), degree);
    for (int k = 0; k <= degree; k++) {
      addUnlessZero(result, values.get(k), part.kernel().times(slope));
      slope = slope.derivative(x);
    }
    List<Form> poles = Expansion.singularPart(symbol, t);
    for (int j = 1; j <= poles.size(); j++) {
      Form w = integrated(part, polynomial, j, x);
      for (int i = 0; i < j && !poles.get(j - 1).isZero(); i++) {
        Rational weight = Rational.of(Integers.factorial(i)).inverse().negated();
        Form left = poles.get(j - 1).times(Form.of(x).power(i)).times(weight);
        addUnlessZero(result, left, w.substitute(x, Form.ZERO));
        w = w.derivative(x);
      }
    }
  }

  /// The formal j-fold integral e^(c x) Σ_k binom(−j, k) c^(−j−k) p^(k)(x).
  private static Form integrated(ExponentialPart part, Form polynomial, int j, Variable x) {
    List<Form> terms = new ArrayList<>();
    Form slope = polynomial;
    Rational binomial = Rational.ONE;
    for (int k = 0; !slope.isZero(); k++) {
      terms.add(slope.times(part.rate().power(-j - k)).times(binomial));
      binomial = binomial.times(Rational.of(-j - k, k + 1));
      slope = slope.derivative(x);
    }
    return part.kernel().times(Form.sum(terms));
  }

  /// The Taylor coefficients of the symbol at t = c.
  ///
  /// @throws Refusal with [Reason#SYMBOL_POLE] when the symbol has a pole there
  private static List<Form> coefficientsAt(Form symbol, Dual t, Form c, int degree) {
    Form moved = Splitting.shifted(symbol, t, c);
    PowerSeries series = Expansion.of(moved, t, degree);
    if (series.valuation() < 0) {
      throw new Refusal(Reason.SYMBOL_POLE, symbol, c);
    }
    return series.coefficients();
  }
}
