package gnomon.basis;

import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;

/// Proofs that two operators are equal whose normal forms differ: coefficient by coefficient in x,
/// the symbols are the same power series in t by [SeriesIdentity].
final class SymbolIdentity {

  /// The order to which a first difference is looked for.
  private static final int LOOKED = 40;

  private SymbolIdentity() {}

  /// How A and B are proved to be equal, where both are A ∘ U with one and the same map U.
  static Optional<Comparison.Way> of(MappedOperator a, MappedOperator b) {
    if (a.terms().size() != 1 || b.terms().size() != 1) {
      return Optional.empty();
    }
    MappedOperator.Term left = a.terms().getFirst();
    MappedOperator.Term right = b.terms().getFirst();
    boolean sameMap =
        left.map().isIdentity() && right.map().isIdentity()
            || left.map().dual().equals(right.map().dual())
                && SeriesIdentity.same(left.map().f(), right.map().f(), left.map().dual());
    if (!sameMap) {
      return Optional.empty();
    }
    return left.operator().equals(right.operator())
        ? SeriesIdentity.wayOf(left.map().f(), right.map().f(), left.map().dual())
        : of(left.operator(), right.operator());
  }

  /// The first power of x, from x^first on, on which two shift-invariant operators in closed form
  /// or as inverse series differ: the first power of t in which their symbols do, looked for up to
  /// a limit.
  static OptionalInt firstDifference(MappedOperator a, MappedOperator b, Variable x, int first) {
    Optional<Operator> left = a.asOperator();
    Optional<Operator> right = b.asOperator();
    if (left.isEmpty() || right.isEmpty() || !left.get().isPlain() || !right.get().isPlain()) {
      return OptionalInt.empty();
    }
    Dual t = new Dual(x);
    Form gap = left.get().symbol().minus(right.get().symbol());
    if (gap.dependsOn(x) || !gap.duals().equals(Set.of(t))) {
      return OptionalInt.empty();
    }
    try {
      PowerSeries series = Expansion.of(gap, t, LOOKED);
      int at = series.valuation();
      return at >= first && at <= LOOKED ? OptionalInt.of(at) : OptionalInt.empty();
    } catch (Refusal _) {
      return OptionalInt.empty();
    }
  }

  private static Optional<Comparison.Way> of(Operator a, Operator b) {
    try {
      return a.isPlain() && b.isPlain() ? ofSymbols(a.symbol(), b.symbol()) : Optional.empty();
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  private static Optional<Comparison.Way> ofSymbols(Form a, Form b) {
    List<Dual> duals = List.copyOf(a.minus(b).duals());
    if (duals.size() != 1) {
      return Optional.empty();
    }
    Dual t = duals.getFirst();
    Variable x = t.of();
    Optional<List<Form>> left = Structure.asPolynomial(a, x);
    Optional<List<Form>> right = Structure.asPolynomial(b, x);
    if (left.isEmpty() || right.isEmpty()) {
      return Optional.empty();
    }
    Optional<Comparison.Way> way = Optional.empty();
    for (int j = 0; j < Math.max(left.get().size(), right.get().size()); j++) {
      Form one = j < left.get().size() ? left.get().get(j) : Form.ZERO;
      Form other = j < right.get().size() ? right.get().get(j) : Form.ZERO;
      if (!one.equals(other)) {
        way = SeriesIdentity.wayOf(one, other, t);
        if (way.isEmpty()) {
          return way;
        }
      }
    }
    return way;
  }
}
