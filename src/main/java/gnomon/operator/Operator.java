package gnomon.operator;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import gnomon.series.LazySeries;
import gnomon.series.PowerSeries;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import java.util.function.UnaryOperator;

/// A linear operator f ↦ a(x, D) f + [r(x, D_y) f(y)] at y = 0.
///
/// The symbol a is a form in variables (on the left) and their duals t (on the right). Expanded in
/// t at 0 it is Σ_k a_k(x) t^k, and t^k means D^k for k ≥ 0 and the |k|-fold integral from 0 for k
/// < 0. So t^(−m) u(t) is the m-fold integral followed by u(D), symbols add, and multiplying a
/// symbol by t on the left of everything is D after it. The boundary part r, one form for each
/// variable, is of finite rank; it is a power series in t without negative powers. Σ, for one, has
/// the symbol 1/(e^t − 1) and the boundary 1/t − 1/(e^t − 1).
///
/// A kernel order k > 0 in a variable says that the image is only defined modulo polynomials of
/// degree below k in it, as for Δ⁻¹ and D⁻² (where shifts are inverted the coefficients of those
/// polynomials stand for periodic functions).
///
/// Two operators are equal exactly when symbol, boundary and kernel orders are.
public final class Operator {

  private static final Variable X = new Variable("x");
  private static final int SMALL = 4;
  private static final int WORKED_OUT = 4;

  private final Optional<Iterate> iterate;
  private final Supplier<NormalForm> normal;
  private final Map<Variable, LazySeries> expansions = new ConcurrentHashMap<>();

  Operator(
      Form symbol,
      SortedMap<Variable, Form> boundaries,
      SortedMap<Variable, Integer> kernelOrders) {
    NormalForm form = new NormalForm(symbol, boundaries, kernelOrders);
    this.iterate = Optional.empty();
    this.normal = () -> form;
  }

  private Operator(Iterate iterate) {
    this.iterate = Optional.of(iterate);
    this.normal = iterate::normal;
  }

  // ---------------------------------------------------------------- operators of the trade

  /// The operator with the symbol, without boundary part and without kernel.
  public static Operator ofSymbol(Form symbol) {
    return new Operator(symbol, new TreeMap<>(), new TreeMap<>());
  }

  /// The operator with the symbol and, in one variable, a boundary part.
  public static Operator of(Form symbol, Variable x, Form boundary) {
    TreeMap<Variable, Form> boundaries = new TreeMap<>();
    boundaries.put(x, boundary);
    return new Operator(symbol, boundaries, new TreeMap<>());
  }

  /// The identity.
  public static Operator identity() {
    return ofSymbol(Form.ONE);
  }

  /// The zero operator.
  public static Operator zero() {
    return ofSymbol(Form.ZERO);
  }

  /// Multiplication by a function.
  public static Operator multiplication(Form function) {
    if (!function.duals().isEmpty()) {
      throw new IllegalArgumentException("a function has no duals");
    }
    return ofSymbol(function);
  }

  /// The derivation by x.
  public static Operator derivative(Variable x) {
    return ofSymbol(t(x));
  }

  /// f(x) ↦ f(x + h), with the symbol e^(h t).
  ///
  /// @throws Refusal with [Reason#SHIFT_BY_VARIABLE] when h depends on x
  public static Operator shift(Variable x, Form h) {
    return ofSymbol(shiftSymbol(x, h));
  }

  /// f(x + h) − f(x).
  public static Operator forwardDifference(Variable x, Form h) {
    return ofSymbol(shiftSymbol(x, h).minus(Form.ONE));
  }

  /// f(x) − f(x − h).
  public static Operator backwardDifference(Variable x, Form h) {
    return ofSymbol(Form.ONE.minus(shiftSymbol(x, h.negated())));
  }

  /// f(x + h/2) − f(x − h/2).
  public static Operator centralDifference(Variable x, Form h) {
    Form half = h.times(Rational.HALF);
    return ofSymbol(shiftSymbol(x, half).minus(shiftSymbol(x, half.negated())));
  }

  /// (f(x + h/2) + f(x − h/2))/2.
  public static Operator centralMean(Variable x, Form h) {
    Form half = h.times(Rational.HALF);
    return ofSymbol(shiftSymbol(x, half).plus(shiftSymbol(x, half.negated())).times(Rational.HALF));
  }

  /// The integral from 0 to x.
  public static Operator integral(Variable x) {
    return ofSymbol(t(x).inverse());
  }

  /// The right inverse of Δ that vanishes at 0: f(0) + … + f(x − 1).
  public static Operator sum(Variable x) {
    return sum(x, Form.ONE);
  }

  /// The right inverse of Δ with step h that vanishes at 0.
  public static Operator sum(Variable x, Form h) {
    Form symbol = shiftSymbol(x, h).minus(Form.ONE).inverse();
    return of(symbol, x, h.times(t(x)).inverse().minus(symbol));
  }

  /// f ↦ f(a), a constant function of x.
  public static Operator evaluation(Variable x, Form a) {
    return of(Form.ZERO, x, shiftSymbol(x, a));
  }

  private static Form t(Variable x) {
    return Form.of(new Dual(x));
  }

  private static Form shiftSymbol(Variable x, Form h) {
    if (h.dependsOn(x)) {
      throw new Refusal(Reason.SHIFT_BY_VARIABLE, h, Form.of(x));
    }
    return Elementary.exp(h.times(t(x)));
  }

  // ---------------------------------------------------------------- the parts

  /// The full symbol a.
  public Form symbol() {
    return iterate.isPresent() ? iterate.get().symbol() : normal.get().symbol();
  }

  /// The operator of which this is a high power that has not been worked out, and the exponent.
  public Optional<Iterate> iterate() {
    return iterate;
  }

  /// The boundary part in the variable; zero where there is none.
  public Form boundary(Variable x) {
    return boundaries().getOrDefault(x, Form.ZERO);
  }

  /// The boundary parts that are not zero.
  public SortedMap<Variable, Form> boundaries() {
    return normal.get().boundaries();
  }

  /// The expansion of the symbol in powers of the dual of x, to the order; kept for later calls.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] where there is none
  public PowerSeries series(Variable x, int order) {
    return expansions.computeIfAbsent(x, v -> LazySeries.of(symbol(), new Dual(v))).to(order);
  }

  /// How many of 1, x, x², … the image leaves undetermined.
  public int kernelOrder(Variable x) {
    return kernelOrders().getOrDefault(x, 0);
  }

  /// The kernel orders that are not zero.
  public SortedMap<Variable, Integer> kernelOrders() {
    return iterate.isPresent() ? new TreeMap<>() : normal.get().kernelOrders();
  }

  /// The variables the operator acts on: those whose dual, boundary or kernel occurs in it.
  public SortedSet<Variable> variables() {
    TreeSet<Variable> result = new TreeSet<>(boundaries().keySet());
    result.addAll(kernelOrders().keySet());
    symbol().duals().forEach(dual -> result.add(dual.of()));
    return result;
  }

  /// Whether symbol and boundary are zero and nothing is undetermined.
  public boolean isZero() {
    return iterate.isEmpty() && symbol().isZero() && isPlain();
  }

  /// Whether there is neither a boundary part nor an undetermined kernel.
  public boolean isPlain() {
    return boundaries().isEmpty() && kernelOrders().isEmpty();
  }

  /// Whether the operator multiplies by a function.
  public boolean isMultiplication() {
    return isPlain() && symbol().duals().isEmpty();
  }

  /// Whether the operator multiplies by a scalar: a function that does not depend on x.
  public boolean isScalar(Variable x) {
    return isMultiplication() && !symbol().dependsOn(x);
  }

  /// Whether the operator commutes with all shifts of x: no boundary, no x in the symbol().
  public boolean isShiftInvariant(Variable x) {
    return boundary(x).isZero() && !symbol().dependsOn(x);
  }

  /// Whether the operator is shift-invariant in each of the variables it acts on; one that acts on
  /// none must be a constant.
  public boolean isShiftInvariant() {
    SortedSet<Variable> acting = variables();
    return acting.isEmpty()
        ? symbol().variables().isEmpty()
        : acting.stream().allMatch(this::isShiftInvariant);
  }

  // ---------------------------------------------------------------- algebra

  /// The sum.
  public Operator plus(Operator that) {
    TreeMap<Variable, Form> sum = new TreeMap<>(boundaries());
    that.boundaries().forEach((x, r) -> sum.merge(x, r, Form::plus));
    TreeMap<Variable, Integer> kernels = new TreeMap<>(kernelOrders());
    that.kernelOrders().forEach((x, k) -> kernels.merge(x, k, Math::max));
    return new Operator(symbol().plus(that.symbol()), sum, kernels);
  }

  /// The difference. Undetermined kernels do not cancel: Δ⁻¹ − Δ⁻¹ is 0 modulo constants.
  public Operator minus(Operator that) {
    return iterate.isPresent() && iterate.equals(that.iterate) ? zero() : plus(that.negated());
  }

  /// The additive inverse.
  public Operator negated() {
    return times(Form.MINUS_ONE);
  }

  /// The operator followed by multiplication by a function.
  ///
  /// @throws Refusal with [Reason#KERNEL_LOST] when the image is undetermined modulo a kernel and
  ///   the function is not a scalar
  public Operator times(Form function) {
    return multiplication(function).compose(this);
  }

  /// This operator after the other: (A ∘ B) f = A(B f).
  ///
  /// @throws Refusal with [Reason#INFINITE_COMPOSITION] when the symbol would be an infinite series
  public Operator compose(Operator that) {
    return Composition.compose(this, that);
  }

  /// An integer power.
  ///
  /// @throws Refusal as [#inverse] for negative exponents
  public Operator power(int exponent) {
    if (exponent < 0) {
      return inverse().power(Math.negateExact(exponent));
    }
    if (isPlain() && (symbol().duals().isEmpty() || isShiftInvariant() && !isSingular())) {
      return ofSymbol(symbol().power(exponent));
    }
    // the symbols have no divisors of zero, so that a power of one that is not zero is not zero
    boolean plain = boundaries().isEmpty() || !kernelOrders().isEmpty() || symbol().isZero();
    if (plain || exponent <= WORKED_OUT) {
      return workedOut(exponent);
    }
    return new Operator(Iterate.of(this, exponent));
  }

  /// The power in its normal form.
  Operator workedOut(int exponent) {
    long square = (long) exponent * exponent;
    long capped = Math.min(square, Integer.MAX_VALUE);
    Budget.charge(boundaries().isEmpty() ? square : Math.multiplyExact(capped, capped));
    Operator result = identity();
    if (isSmallPolynomial()) {
      // a factor of low order on the left has few derivatives: cheaper than squaring long symbols
      for (int i = 0; i < exponent; i++) {
        Budget.checkpoint();
        result = compose(result);
      }
      return result;
    }
    for (int bit = 31 - Integer.numberOfLeadingZeros(exponent | 1); bit >= 0; bit--) {
      result = result.compose(result);
      if ((exponent >> bit & 1) == 1) {
        result = result.compose(this);
      }
    }
    return result;
  }

  private boolean isSmallPolynomial() {
    return isPlain()
        && symbol().isPolynomial()
        && symbol().numerator().size() <= SMALL
        && symbol().duals().stream()
            .allMatch(t -> Structure.degree(symbol(), t).orElse(SMALL + 1) <= SMALL);
  }

  /// A power with any exponent: of a multiplication, or of a shift-invariant operator whose power
  /// has a power series.
  public Operator power(Form exponent) {
    Optional<Rational> rational = exponent.asRational();
    if (rational.isPresent() && rational.get().isInteger()) {
      return power(rational.get().intValueExact());
    }
    for (Variable x : variables()) {
      if (exponent.dependsOn(x)) {
        throw new Refusal(Reason.SHIFT_BY_VARIABLE, exponent, Form.of(x));
      }
    }
    return lift(s -> Elementary.power(s, exponent));
  }

  /// The operator B with A B = 1, unique up to the kernel of A, which is recorded.
  ///
  /// @throws Refusal with [Reason#NO_INVERSE] where there is none or none is known
  public Operator inverse() {
    return Inversion.inverse(this);
  }

  /// A B⁻¹ for commuting A and B.
  ///
  /// @throws Refusal with [Reason#NOT_COMMUTING] when A and B do not commute
  public Operator dividedBy(Operator that) {
    return Inversion.quotient(this, that);
  }

  /// A B − B A.
  public Operator commutator(Operator that) {
    if (that.isMultiplication()) {
      Optional<Variable> x = that.symbol().asGenerator().map(g -> g instanceof Variable v ? v : X);
      if (x.isPresent() && that.symbol().equals(Form.of(x.get()))) {
        return pincherle(x.get());
      }
    }
    return compose(that).minus(that.compose(this));
  }

  /// The Pincherle derivative A X − X A, with the symbol ∂a/∂t and the boundary ∂r/∂t − x r.
  public Operator pincherle(Variable x) {
    Dual t = new Dual(x);
    TreeMap<Variable, Form> changed = new TreeMap<>();
    boundaries()
        .forEach(
            (v, r) -> {
              Form slope = r.derivative(t);
              changed.put(v, v.equals(x) ? slope.minus(r.times(Form.of(x))) : slope);
            });
    TreeMap<Variable, Integer> kernels = new TreeMap<>(kernelOrders());
    kernels.computeIfPresent(x, (_, k) -> k + 1);
    return new Operator(symbol().derivative(t), changed, kernels);
  }

  /// The function applied to the operator through its symbol: for shift-invariant operators whose
  /// image has a power series at t = 0, and for multiplications.
  ///
  /// @throws Refusal with [Reason#NOT_SHIFT_INVARIANT] or [Reason#NO_SERIES]
  public Operator lift(UnaryOperator<Form> function) {
    if (isMultiplication()) {
      return multiplication(function.apply(symbol()));
    }
    if (!isPlain() || !isShiftInvariant()) {
      throw new Refusal(Reason.NOT_SHIFT_INVARIANT, symbol());
    }
    Form image = function.apply(symbol());
    for (Dual t : symbol().duals()) {
      if (Expansion.tryOf(image, t, 0).filter(series -> series.valuation() >= 0).isEmpty()) {
        throw new Refusal(Reason.NO_SERIES, image);
      }
      Inversion.requireSameBranch(function, symbol(), image, t);
    }
    return ofSymbol(image);
  }

  /// Whether the symbol has a pole at t = 0 in one of its duals.
  boolean isSingular() {
    return symbol().duals().stream().anyMatch(t -> !Expansion.singularPart(symbol(), t).isEmpty());
  }

  // ---------------------------------------------------------------- application

  /// The image of a form; antidifferences that are needed come from the engine. Undetermined
  /// constants are C1, C2, …, numbered past those that occur in the form.
  ///
  /// @throws Refusal with [Reason#INFINITE_SERIES] when the image would be an infinite series
  public Form applyTo(Form f, Summation engine) {
    if (iterate.isPresent()) {
      return iterate.get().applyTo(f, engine);
    }
    return Application.apply(this, f, engine);
  }

  /// The image of a form, without the help of a summation engine.
  public Form applyTo(Form f) {
    return applyTo(f, Summation.NONE);
  }

  /// Σ_(k ≤ order) a_k D^k f, the image cut off after the derivative of the order given.
  public Form applyTo(Form f, int order, Summation engine) {
    return TruncatedApplication.apply(this, f, order, engine);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Operator that
        && (iterate.isPresent() && iterate.equals(that.iterate) || isSame(that));
  }

  private boolean isSame(Operator that) {
    return symbol().equals(that.symbol())
        && boundaries().equals(that.boundaries())
        && kernelOrders().equals(that.kernelOrders());
  }

  @Override
  public int hashCode() {
    return Objects.hash(symbol(), boundaries(), kernelOrders());
  }

  @Override
  public String toString() {
    return "operator(" + List.of(symbol(), boundaries(), kernelOrders()) + ")";
  }
}
