package gnomon.basis;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.InverseSeries;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.series.LazySeries;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The Sheffer map U of a pair (g, f): the linear map that carries x^n to s_n(x), where Σ s_n(x)
/// t^n/n! = w(t) e^(x F(t)) with F = f̄, the compositional inverse of f, and w = 1/g(f̄).
///
/// f is the symbol of a delta operator Q and g that of an invertible shift-invariant operator S;
/// then s_n = S⁻¹ q_n with the basic sequence q_n of Q. All four of g, f, w, F are kept as exact
/// forms in t, F as an inverse series where it has no closed form, so that the maps are a group:
///
/// - the inverse is the map with f and F exchanged, and g and w;
/// - U₁ U₂ has f = f₂(f₁), g = g₁ · g₂(f₁), F = F₁(F₂), w = w₂ · w₁(F₂).
///
/// Source: S. Roman, The Umbral Calculus (1984), ch. 2 and 3, from memory.
public final class ShefferMap {

  private final Dual dual;
  private final Form g;
  private final Form f;
  private final Form w;
  private final Form inverse;
  private final List<ShefferMap> factors;
  private final LazySeries gSeries;
  private final LazySeries fSeries;
  private final LazySeries wSeries;
  private final LazySeries inverseSeries;

  /// The factors, left to right, none of them a product itself; empty for a map that is one.
  private ShefferMap(Dual dual, Form g, Form f, Form w, Form inverse, List<ShefferMap> factors) {
    this.factors = factors;
    this.dual = dual;
    this.g = g;
    this.f = f;
    this.w = w;
    this.inverse = inverse;
    this.gSeries = LazySeries.of(g, dual);
    this.fSeries = LazySeries.of(f, dual);
    this.wSeries = LazySeries.of(w, dual);
    this.inverseSeries = LazySeries.of(inverse, dual);
  }

  /// The identity on functions of the variable of `dual`.
  public static ShefferMap identity(Dual dual) {
    Form t = Form.of(dual);
    return new ShefferMap(dual, Form.ONE, t, Form.ONE, t, List.of());
  }

  /// The map x^n ↦ q_n onto the basic sequence of the delta operator with symbol `q`.
  ///
  /// @throws Refusal with [Reason#NOT_A_DELTA_OPERATOR] unless q has a power series c t + …, c ≠ 0
  public static ShefferMap umbral(Form q, Dual dual) {
    return sheffer(q, Form.ONE, dual);
  }

  /// The map x^n ↦ S⁻¹ q_n for the symbols `q` of Q and `s` of S.
  ///
  /// @throws Refusal with [Reason#NOT_A_DELTA_OPERATOR] unless q has a power series c t + …, c ≠ 0;
  ///   with [Reason#NO_INVERSE] unless s has a power series c + …, c ≠ 0
  public static ShefferMap sheffer(Form q, Form s, Dual dual) {
    requireSymbol(q, dual, 1, Reason.NOT_A_DELTA_OPERATOR);
    requireSymbol(s, dual, 0, Reason.NO_INVERSE);
    Form t = Form.of(dual);
    Form inverse =
        q.equals(t)
            ? t
            : Structure.compositionalInverse(q, dual).orElseGet(() -> InverseSeries.of(q, dual, t));
    Form w = s.isOne() ? Form.ONE : s.substitute(dual, inverse).inverse();
    return new ShefferMap(dual, s, q, w, inverse, List.of());
  }

  private static void requireSymbol(Form symbol, Dual dual, int valuation, Reason reason) {
    for (Generator atom : symbol.duals()) {
      if (!atom.equals(dual)) {
        throw new Refusal(reason, symbol);
      }
    }
    if (symbol.dependsOn(dual.of())) {
      throw new Refusal(Reason.NOT_SHIFT_INVARIANT, symbol);
    }
    PowerSeries series = LazySeries.of(symbol, dual).to(1);
    if (series.valuation() != valuation) {
      throw new Refusal(reason, symbol);
    }
  }

  /// The symbol variable t.
  public Dual dual() {
    return dual;
  }

  /// The variable x on whose functions the map acts.
  public Variable variable() {
    return dual.of();
  }

  /// The symbol g of S.
  public Form g() {
    return g;
  }

  /// The symbol f of Q.
  public Form f() {
    return f;
  }

  /// F = f̄, the compositional inverse of f; an [InverseSeries] where it has no closed form.
  public Form inverseOfF() {
    return inverse;
  }

  /// w = 1/g(f̄).
  public Form weight() {
    return w;
  }

  /// The generating function w(t) e^(x F(t)) = Σ s_n(x) t^n/n!.
  public Form generatingFunction() {
    Form exponent = Form.of(variable()).times(inverse);
    return w.times(Elementary.exp(exponent));
  }

  /// Whether f, g and their inverses are all closed forms.
  public boolean isClosed() {
    return List.of(g, f, w, inverse).stream().noneMatch(ShefferMap::containsInverseSeries);
  }

  /// Whether an inverse series without closed form occurs at the top level of the form.
  static boolean containsInverseSeries(Form form) {
    return Kernels.anyMatch(form, InverseSeries.class::isInstance);
  }

  /// The series of g to the order.
  public PowerSeries gSeries(int order) {
    return expanded(gSeries, order).orElseGet(() -> composed(wSeries, fSeries, order));
  }

  /// The series of f to the order.
  public PowerSeries fSeries(int order) {
    return expanded(fSeries, order).orElseGet(() -> reversed(inverseSeries, order));
  }

  /// The series of w to the order.
  public PowerSeries weightSeries(int order) {
    return expanded(wSeries, order).orElseGet(() -> composed(gSeries, inverseSeries, order));
  }

  /// The series of f̄ to the order.
  public PowerSeries inverseSeries(int order) {
    return expanded(inverseSeries, order).orElseGet(() -> reversed(fSeries, order));
  }

  /// The expansion of the form itself, which may fail where singular parts cancel only in the
  /// whole.
  private static Optional<PowerSeries> expanded(LazySeries series, int order) {
    try {
      return Optional.of(series.to(order));
    } catch (Refusal refusal) {
      return Optional.empty();
    }
  }

  /// 1/outer(inner).
  private static PowerSeries composed(LazySeries outer, LazySeries inner, int order) {
    return outer.to(order).compose(inner.to(Math.max(1, order))).truncated(order).inverse();
  }

  private static PowerSeries reversed(LazySeries series, int order) {
    return series.to(Math.max(1, order)).reversion().truncated(order);
  }

  /// Whether this is the identity, decided where f and g are closed forms.
  public boolean isIdentity() {
    return f.equals(Form.of(dual)) && g.isOne();
  }

  /// Whether S = 1, so that the members form the basic sequence of Q.
  public boolean isUmbral() {
    return g.isOne();
  }

  /// The map x^n ↦ q_n with the same Q.
  public ShefferMap umbralPart() {
    return isUmbral() ? this : new ShefferMap(dual, Form.ONE, f, Form.ONE, inverse, List.of());
  }

  /// The inverse map.
  public ShefferMap inverse() {
    List<ShefferMap> reversed = factors.reversed().stream().map(ShefferMap::inverse).toList();
    return new ShefferMap(dual, w, inverse, g, f, reversed);
  }

  /// The map `this` after `first`.
  ///
  /// @throws Refusal with [Reason#VARIABLES_DIFFER] when the two act on different variables
  public ShefferMap compose(ShefferMap first) {
    if (!dual.equals(first.dual)) {
      throw new Refusal(Reason.VARIABLES_DIFFER, Form.of(variable()), Form.of(first.variable()));
    }
    if (isIdentity()) {
      return first;
    }
    if (first.isIdentity()) {
      return this;
    }
    if (isInverseOf(first)) {
      return identity(dual);
    }
    if (isClosed() && first.isClosed()) {
      return product(first, List.of());
    }
    return shortened(first);
  }

  /// The product with neighbouring factors cancelled that are inverse to each other, so that
  /// inverse series without closed form are undone.
  private ShefferMap shortened(ShefferMap first) {
    List<ShefferMap> word = new ArrayList<>(factorsOrSelf());
    int length = word.size() + first.factorsOrSelf().size();
    for (ShefferMap next : first.factorsOrSelf()) {
      if (!word.isEmpty() && word.getLast().isInverseOf(next)) {
        word.removeLast();
      } else {
        word.add(next);
      }
    }
    if (word.size() == length) {
      return product(first, word);
    }
    ShefferMap result = identity(dual);
    for (ShefferMap factor : word) {
      result = result.compose(factor);
    }
    return result;
  }

  private List<ShefferMap> factorsOrSelf() {
    return factors.isEmpty() ? List.of(this) : factors;
  }

  private ShefferMap product(ShefferMap first, List<ShefferMap> word) {
    boolean nestedInverse = hasRadical(inverse) && hasRadical(first.inverse);
    boolean nestedF = hasRadical(f) && hasRadical(first.f);
    if (nestedInverse && nestedF) {
      throw new Refusal(Reason.NO_CLOSED_FORM, f);
    }
    if (nestedF) {
      return first.inverse().product(inverse(), List.of()).inverse().withFactors(word);
    }
    Form symbolF = put(first.f, f);
    Form symbolG = g.times(put(first.g, f));
    if (!nestedInverse) {
      Form weight = first.w.times(put(w, first.inverse));
      return new ShefferMap(dual, symbolG, symbolF, weight, put(inverse, first.inverse), word);
    }
    Form series = InverseSeries.of(symbolF, dual, Form.of(dual));
    Form weight = symbolG.isOne() ? symbolG : symbolG.substitute(dual, series).inverse();
    List<ShefferMap> factored = word.isEmpty() ? joinedFactors(first) : word;
    return new ShefferMap(dual, symbolG, symbolF, weight, series, factored);
  }

  private List<ShefferMap> joinedFactors(ShefferMap first) {
    List<ShefferMap> all = new ArrayList<>(factorsOrSelf());
    all.addAll(first.factorsOrSelf());
    return all;
  }

  private ShefferMap withFactors(List<ShefferMap> word) {
    return word.isEmpty() ? this : new ShefferMap(dual, g, f, w, inverse, word);
  }

  /// Whether a root of something that depends on t occurs; roots of roots are not formed.
  private boolean hasRadical(Form form) {
    return Kernels.anyMatch(form, kernel -> kernel.isAlgebraic() && kernel.dependsOn(dual));
  }

  private boolean isInverseOf(ShefferMap other) {
    return f.equals(other.inverse) && g.equals(other.w)
        || inverse.equals(other.f) && w.equals(other.g);
  }

  /// outer(inner(t)), with outer's inverse series of inner undone.
  private Form put(Form outer, Form inner) {
    return outer.isOne() ? outer : Kernels.unwrapped(outer.substitute(dual, inner), dual);
  }

  /// The power with any integer exponent; exponent 0 gives the identity.
  public ShefferMap power(int exponent) {
    ShefferMap base = exponent < 0 ? inverse() : this;
    int rest = Math.absExact(exponent);
    ShefferMap result = identity(dual);
    while (rest > 0) {
      if ((rest & 1) == 1) {
        result = result.compose(base);
      }
      rest >>= 1;
      if (rest > 0) {
        base = base.compose(base);
      }
    }
    return result;
  }

  /// The coefficients of s_n in ascending powers of x.
  public List<Form> member(int n) {
    return Members.coefficients(this, n);
  }

  /// s_n(x).
  public Form memberAt(int n) {
    return Kernels.polynomial(member(n), variable());
  }

  /// The columns 0, …, n of the matrix of the map: column j lists the coefficients of s_j.
  public List<List<Form>> matrix(int n) {
    return Members.upTo(this, n);
  }

  /// The coefficients of U p for the polynomial p with the given coefficients.
  public List<Form> image(List<Form> coefficients) {
    return PolynomialImages.of(this, coefficients);
  }

  /// Whether both maps have the same f and g as forms; see [#comparedWith] for the decision.
  @Override
  public boolean equals(Object other) {
    return other instanceof ShefferMap that
        && dual.equals(that.dual)
        && f.equals(that.f)
        && g.equals(that.g);
  }

  @Override
  public int hashCode() {
    return 31 * (31 * dual.hashCode() + f.hashCode()) + g.hashCode();
  }

  @Override
  public String toString() {
    return "sheffer(" + f + ", " + g + ")";
  }

  /// Decides whether both maps are equal: by the closed forms of (g, f), or of the inverse maps;
  /// where neither is closed, by series to the order.
  public Comparison comparedWith(ShefferMap that, int order) {
    if (!dual.equals(that.dual)) {
      throw new Refusal(Reason.VARIABLES_DIFFER, Form.of(variable()), Form.of(that.variable()));
    }
    if (equals(that) || inverse.equals(that.inverse) && w.equals(that.w)) {
      return new Comparison.Equal();
    }
    Optional<Comparison.Way> way =
        SymbolIdentity.of(MappedOperator.of(this), MappedOperator.of(that));
    if (way.isPresent()) {
      return new Comparison.Identical(way.get());
    }
    for (int n = 0; n <= order; n++) {
      Form left = memberAt(n);
      Form right = that.memberAt(n);
      if (!left.equals(right)) {
        return new Comparison.Different(n, left, right);
      }
    }
    return new Comparison.Open(order);
  }
}
