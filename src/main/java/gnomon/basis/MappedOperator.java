package gnomon.basis;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/// The general operator: a finite sum of A ∘ U with operators A and umbral maps U.
///
/// Maps are pushed to the right by U ∘ A = (U A U⁻¹) ∘ U, the invertible S of a Sheffer map goes
/// into A (s_n = S⁻¹ q_n), and the boundary part of A takes up the map on its right: ε(0) v(D) ∘ U
/// = ε(0) v(f̄(D)). Terms with the same f are joined. Two such sums of closed forms with A
/// polynomial in x are equal exactly when they have the same terms, because the functions e^(x
/// f̄(t)) for different f are independent over the polynomials in x.
public final class MappedOperator {

  private final Map<ShefferMap, Operator> terms;

  private MappedOperator(Map<ShefferMap, Operator> terms) {
    this.terms = terms;
  }

  /// The operator itself.
  public static MappedOperator of(Operator operator) {
    Builder builder = new Builder();
    builder.plain = operator;
    return builder.build();
  }

  /// The map as an operator.
  public static MappedOperator of(ShefferMap map) {
    return term(Operator.identity(), map);
  }

  /// A ∘ U.
  public static MappedOperator term(Operator a, ShefferMap map) {
    Builder builder = new Builder();
    builder.add(a, map);
    return builder.build();
  }

  /// Collects terms in the normal form.
  private static final class Builder {
    private Operator plain = Operator.zero();
    private final Map<ShefferMap, Operator> mapped = new LinkedHashMap<>();

    void add(Operator a, ShefferMap map) {
      Operator left = map.isUmbral() ? a : a.compose(Operator.ofSymbol(map.g().inverse()));
      ShefferMap umbral = map.umbralPart();
      if (umbral.isIdentity()) {
        plain = plain.plus(left);
        return;
      }
      Variable x = map.variable();
      Form boundary = left.boundary(x);
      Operator rest = left;
      if (!boundary.isZero()) {
        Operator finiteRank = Operator.of(Form.ZERO, x, boundary);
        rest = left.minus(finiteRank);
        Form absorbed = boundary.substitute(map.dual(), umbral.inverseOfF());
        plain = plain.plus(Operator.of(Form.ZERO, x, absorbed));
      }
      mapped.merge(umbral, rest, Operator::plus);
    }

    MappedOperator build() {
      Map<ShefferMap, Operator> terms = new LinkedHashMap<>();
      mapped.forEach(
          (map, operator) -> {
            if (!operator.isZero()) {
              terms.put(map, operator);
            }
          });
      if (!plain.isZero() || terms.isEmpty()) {
        Dual dual = terms.isEmpty() ? new Dual(new Variable("x")) : anyDual(terms);
        terms.put(ShefferMap.identity(dual), plain);
      }
      return new MappedOperator(terms);
    }

    private static Dual anyDual(Map<ShefferMap, Operator> terms) {
      return terms.keySet().iterator().next().dual();
    }
  }

  /// One term A ∘ U.
  public record Term(Operator operator, ShefferMap map) {}

  /// The terms A ∘ U with umbral maps U, at most one for each U.
  public List<Term> terms() {
    return terms.entrySet().stream().map(e -> new Term(e.getValue(), e.getKey())).toList();
  }

  /// The operator without maps, where this is one.
  public Optional<Operator> asOperator() {
    return terms.size() == 1 && terms.keySet().iterator().next().isIdentity()
        ? Optional.of(terms.values().iterator().next())
        : Optional.empty();
  }

  /// The Sheffer map, where this is one that is not the identity: s(D)⁻¹ ∘ U with s invertible.
  public Optional<ShefferMap> asShefferMap() {
    if (terms.size() != 1) {
      return Optional.empty();
    }
    Term only = terms().getFirst();
    Variable x = only.map().variable();
    Form symbol = only.operator().symbol();
    boolean shiftInvariant =
        only.operator().isPlain()
            && only.operator().isShiftInvariant(x)
            && symbol.variables().stream().noneMatch(x::equals)
            && symbol.duals().stream().allMatch(only.map().dual()::equals);
    if (!shiftInvariant || only.map().isIdentity() || symbol.isZero()) {
      return Optional.empty();
    }
    if (symbol.isOne()) {
      return Optional.of(only.map());
    }
    try {
      return Optional.of(ShefferMap.sheffer(only.map().f(), symbol.inverse(), only.map().dual()));
    } catch (Refusal refusal) {
      return Optional.empty();
    }
  }

  /// Whether the operator is zero.
  public boolean isZero() {
    return asOperator().filter(Operator::isZero).isPresent();
  }

  /// The sum.
  public MappedOperator plus(MappedOperator that) {
    Builder builder = new Builder();
    terms.forEach((map, a) -> builder.add(a, map));
    that.terms.forEach((map, a) -> builder.add(a, map));
    return builder.build();
  }

  /// The difference.
  public MappedOperator minus(MappedOperator that) {
    return plus(that.times(Form.MINUS_ONE));
  }

  /// The additive inverse.
  public MappedOperator negated() {
    return times(Form.MINUS_ONE);
  }

  /// The operator followed by multiplication by a function or scalar.
  public MappedOperator times(Form factor) {
    Builder builder = new Builder();
    terms.forEach((map, a) -> builder.add(a.times(factor), map));
    return builder.build();
  }

  /// The operator `this` after `first`.
  ///
  /// @throws Refusal when a term cannot be pushed through a map, or a product is not finite
  public MappedOperator compose(MappedOperator first) {
    Builder builder = new Builder();
    terms.forEach(
        (u, a) ->
            first.terms.forEach(
                (v, b) -> {
                  Operator pushed = a.compose(Conjugation.of(u, b));
                  builder.add(pushed, joined(u, v));
                }));
    return builder.build();
  }

  private static ShefferMap joined(ShefferMap u, ShefferMap v) {
    if (u.isIdentity()) {
      return v;
    }
    return v.isIdentity() ? u : u.compose(v);
  }

  /// The inverse of a single term A ∘ U with invertible A: (U⁻¹ A⁻¹ U) ∘ U⁻¹.
  ///
  /// @throws Refusal with [Reason#NO_INVERSE] for sums of several terms
  public MappedOperator inverse() {
    if (terms.size() != 1) {
      throw new Refusal(Reason.NO_INVERSE, terms().getFirst().operator().symbol());
    }
    Term only = terms().getFirst();
    if (only.map().isIdentity()) {
      return of(only.operator().inverse());
    }
    ShefferMap back = only.map().inverse();
    Operator inverse =
        only.operator().equals(Operator.identity())
            ? Operator.identity()
            : Conjugation.of(back, only.operator().inverse());
    return term(inverse, back);
  }

  /// The power with an integer exponent.
  public MappedOperator power(int exponent) {
    Optional<Operator> plain = asOperator();
    if (plain.isPresent()) {
      return of(plain.get().power(exponent));
    }
    MappedOperator base = exponent < 0 ? inverse() : this;
    MappedOperator result = of(Operator.identity());
    for (int bit = 31 - Integer.numberOfLeadingZeros(Math.absExact(exponent)); bit >= 0; bit--) {
      result = result.compose(result);
      if ((Math.absExact(exponent) >> bit & 1) == 1) {
        result = result.compose(base);
      }
    }
    return result;
  }

  /// The commutator this∘that − that∘this.
  public MappedOperator commutator(MappedOperator that) {
    Optional<Operator> left = asOperator();
    Optional<Operator> right = that.asOperator();
    if (left.isPresent() && right.isPresent()) {
      return of(left.get().commutator(right.get()));
    }
    return compose(that).minus(that.compose(this));
  }

  /// The Pincherle derivative A X − X A.
  public MappedOperator pincherle(Variable x) {
    Optional<Operator> plain = asOperator();
    return plain.isPresent()
        ? of(plain.get().pincherle(x))
        : commutator(of(Operator.multiplication(Form.of(x))));
  }

  /// The image of a form.
  ///
  /// @throws Refusal when an image is not a closed form
  public Form applyTo(Form form, Summation engine) {
    List<Form> parts = new ArrayList<>();
    terms.forEach(
        (map, a) ->
            parts.add(
                a.applyTo(map.isIdentity() ? form : FunctionImages.of(map, form, engine), engine)));
    return Form.sum(parts);
  }

  /// The columns 0, …, n of the matrix on x^0, …, x^n: column j lists the coefficients of the image
  /// of x^j.
  public List<List<Form>> matrix(int n, Variable x) {
    return OperatorMatrix.of(this, n, x);
  }

  /// Decides equality in the normal form, looks for the first power of x on which both differ up to
  /// the order, and says how far it looked where neither settles it.
  public Comparison comparedWith(MappedOperator that, Variable x, int order, Summation engine) {
    if (equals(that)) {
      return new Comparison.Equal();
    }
    Optional<Comparison.Way> way = SymbolIdentity.of(this, that);
    if (way.isPresent()) {
      return new Comparison.Identical(way.get());
    }
    for (int k = 0; k <= order; k++) {
      Form power = Form.of(x).power(k);
      Form left = applyTo(power, engine);
      Form right = that.applyTo(power, engine);
      if (!left.equals(right)) {
        return new Comparison.Different(k, left, right);
      }
    }
    OptionalInt later = SymbolIdentity.firstDifference(this, that, x, order + 1);
    if (later.isPresent()) {
      Form power = Form.of(x).power(later.getAsInt());
      return new Comparison.Different(
          later.getAsInt(), applyTo(power, engine), that.applyTo(power, engine));
    }
    return new Comparison.Open(order);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof MappedOperator that
        && (isZero() && that.isZero() || terms.equals(that.terms) || sameOperators(that));
  }

  private boolean sameOperators(MappedOperator that) {
    Optional<Operator> left = asOperator();
    return left.isPresent() && left.equals(that.asOperator());
  }

  @Override
  public int hashCode() {
    Optional<Operator> plain = asOperator();
    return plain.isPresent() ? plain.get().hashCode() : terms.hashCode();
  }

  @Override
  public String toString() {
    return terms().toString();
  }
}
