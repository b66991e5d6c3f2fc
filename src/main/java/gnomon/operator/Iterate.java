package gnomon.operator;

import gnomon.algebra.Budget;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/// A power A^n of an operator with a boundary part. It is applied by applying A again and again;
/// its normal form, which grows with the cube of the exponent, is worked out when it is asked for.
///
/// The normal form of a power of Σ, and of every A = S − ε(0) S with a shift-invariant symbol s of
/// pole order 1, is known in advance. With Q the operator with the symbol 1/s, A is the right
/// inverse of Q whose image vanishes at 0, so that p_k = A^k 1 is the basic sequence of Q divided
/// by k!, and A^n f is the solution g of Q^n g = f with Q^k g = 0 at 0 for k < n: the symbol is s^n
/// and the boundary part −Σ_(k<n) p_k(x) times the part of s^(n−k) regular in t.
public final class Iterate {

  private final Operator base;
  private final int exponent;
  private final Optional<Variable> vanishing;
  private volatile NormalForm normal;

  private Iterate(Operator base, int exponent, Optional<Variable> vanishing) {
    this.base = base;
    this.exponent = exponent;
    this.vanishing = vanishing;
  }

  /// The power, of an operator that can be composed with itself.
  static Iterate of(Operator base, int exponent) {
    Optional<Variable> vanishing = vanishing(base);
    if (vanishing.isEmpty()) {
      base.compose(base);
    }
    return new Iterate(base, exponent, vanishing);
  }

  /// The operator A.
  public Operator base() {
    return base;
  }

  /// The exponent n.
  public int exponent() {
    return exponent;
  }

  /// The variable in which the operator is S − ε(0) S for a symbol S with a simple pole.
  private static Optional<Variable> vanishing(Operator base) {
    if (base.boundaries().size() != 1 || base.symbol().duals().size() != 1) {
      return Optional.empty();
    }
    Variable x = base.boundaries().firstKey();
    Dual t = new Dual(x);
    boolean simple =
        base.symbol().dependsOn(t)
            && !base.symbol().dependsOn(x)
            && Expansion.singularPart(base.symbol(), t).size() == 1;
    return simple && base.boundary(x).equals(Composition.regular(base.symbol(), t).negated())
        ? Optional.of(x)
        : Optional.empty();
  }

  Form symbol() {
    return vanishing.isPresent() ? base.symbol().power(exponent) : normal().symbol();
  }

  NormalForm normal() {
    NormalForm known = normal;
    if (known == null) {
      known = vanishing.map(this::ofRightInverse).orElseGet(() -> worked(base.workedOut(exponent)));
      normal = known;
    }
    return known;
  }

  private static NormalForm worked(Operator power) {
    return new NormalForm(power.symbol(), power.boundaries(), power.kernelOrders());
  }

  private NormalForm ofRightInverse(Variable x) {
    Budget.charge((long) exponent * exponent * exponent * exponent);
    Dual t = new Dual(x);
    List<Form> parts = new ArrayList<>();
    for (int k = 0; k < exponent; k++) {
      Budget.checkpoint();
      parts.add(basic(k, x).times(Composition.regular(base.symbol().power(exponent - k), t)));
    }
    SortedMap<Variable, Form> boundaries = new TreeMap<>();
    boundaries.put(x, Form.sum(parts).negated());
    return new NormalForm(base.symbol().power(exponent), boundaries, new TreeMap<>());
  }

  /// A^k 1 = (x/k) (t s)^k x^(k−1)/(k−1)!, by the transfer formula.
  private Form basic(int k, Variable x) {
    if (k == 0) {
      return Form.ONE;
    }
    Dual t = new Dual(x);
    PowerSeries series = Expansion.of(base.symbol().times(Form.of(t)), t, k - 1).power(k);
    List<Form> terms = new ArrayList<>();
    for (int i = 0; i < k; i++) {
      Rational weight = Rational.of(Integers.factorial(k - 1 - i)).times(Rational.of(k)).inverse();
      terms.add(series.coefficient(i).times(weight).times(Form.of(x).power(k - i)));
    }
    return Form.sum(terms);
  }

  /// L A^n for a shift-invariant L, where L s^n has a pole of an order m below n: since Q A = 1, it
  /// is the operator with the symbol L s^(n−m) after A^m.
  Optional<Operator> after(Operator left) {
    if (vanishing.isEmpty() || !left.isPlain() || !left.isShiftInvariant(vanishing.get())) {
      return Optional.empty();
    }
    Dual t = new Dual(vanishing.get());
    int pole = Expansion.singularPart(left.symbol().times(symbol()), t).size();
    if (pole >= exponent || Expansion.singularPart(left.symbol(), t).size() > 0) {
      return Optional.empty();
    }
    Form first = left.symbol().times(base.symbol().power(exponent - pole));
    return Optional.of(Operator.ofSymbol(first).compose(base.power(pole)));
  }

  Form applyTo(Form f, Summation engine) {
    Optional<List<Form>> polynomial = vanishing.flatMap(x -> Structure.asPolynomial(f, x));
    if (polynomial.isPresent() && polynomial.get().size() <= exponent) {
      return onPolynomial(polynomial.get(), vanishing.get());
    }
    Form image = f;
    for (int i = 0; i < exponent; i++) {
      Budget.checkpoint();
      image = base.applyTo(image, engine);
    }
    return image;
  }

  /// Of the polynomial Σ_k c_k p_k, with c_k the value of Q^k f at 0, the image Σ_k c_k p_(k+n).
  private Form onPolynomial(List<Form> coefficients, Variable x) {
    Dual t = new Dual(x);
    int degree = coefficients.size() - 1;
    PowerSeries q = Expansion.of(base.symbol().inverse(), t, degree);
    PowerSeries power = PowerSeries.constant(Form.ONE, degree);
    List<Form> terms = new ArrayList<>();
    for (int k = 0; k <= degree; k++) {
      Budget.checkpoint();
      List<Form> value = new ArrayList<>();
      for (int j = k; j <= degree; j++) {
        Rational factorial = Rational.of(Integers.factorial(j));
        value.add(power.coefficient(j).times(coefficients.get(j)).times(factorial));
      }
      Form c = Form.sum(value);
      if (!c.isZero()) {
        terms.add(c.times(basic(k + exponent, x)));
      }
      power = power.times(q).truncated(degree);
    }
    return Form.sum(terms);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Iterate that && exponent == that.exponent && base.equals(that.base);
  }

  @Override
  public int hashCode() {
    return Objects.hash(base, exponent);
  }
}
