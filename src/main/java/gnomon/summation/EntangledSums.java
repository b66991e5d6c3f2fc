package gnomon.summation;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// Sums Σ(k: a..b) f(k) whose summand contains a variable n of the ends, as binom(n, k) for k up to
/// n: then n is no generic parameter, and poles can move with the range.
///
/// An antidifference is used where it is finite on the whole range; otherwise creative telescoping
/// is tried. A closed form holds from the n on that the check of the range allows, and below where
/// the values agree.
final class EntangledSums {
  private final SummationEngine engine;

  EntangledSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// The sum.
  ///
  /// @throws Refusal with [Reason#POLE_IN_RANGE] where a pole of the summand lies in the range
  DefiniteSum sum(Form f, Variable k, Form a, Form b) {
    Set<Variable> ends = b.minus(a).variables();
    if (ends.size() != 1) {
      return DefiniteSum.standing(DefiniteSums.standing(f, k, a, b));
    }
    Variable n = ends.iterator().next();
    Optional<Line> length = Line.of(b.minus(a), n).filter(line -> line.slope().sign() > 0);
    Optional<RangeCheck> range =
        length.flatMap(line -> RangeCheck.of(n, k, a, b, line.firstNatural()));
    if (range.isEmpty()) {
      return DefiniteSum.standing(DefiniteSums.standing(f, k, a, b));
    }
    Form term = Reflection.applied(f, n, k, a, b);
    boolean finite = range.get().isFinite(term);
    if (!finite && range.get().pole().isPresent()) {
      throw new Refusal(Reason.POLE_IN_RANGE, range.get().pole().get().minus(a), a);
    }
    BigInteger first = length.get().firstNatural();
    SumValues values = new SumValues(f, n, k, a, b);
    Optional<DefiniteSum> closed =
        finite ? telescoped(term, k, range.get(), values, first) : Optional.empty();
    return closed.orElseGet(() -> byRecurrence(f, k, a, b, first));
  }

  private Optional<DefiniteSum> telescoped(
      Form f, Variable k, RangeCheck range, SumValues values, BigInteger first) {
    if (!(engine.search(f, k, Form.ONE) instanceof Antidifference.Found found)
        || !range.isFinite(found.value())) {
      return Optional.empty();
    }
    try {
      Form past = values.upper().plus(Form.ONE);
      Form value =
          DefiniteSums.telescoped(found.value(), k, values.lower(), past)
              .takingIntegers(Set.of(values.n()));
      range.settle(value);
      return values
          .validFrom(value, range.from(), first)
          .map(
              begin ->
                  DefiniteSum.closed(
                      value,
                      from(beside(found.conditions(), values.n()), values.n(), begin, first),
                      found.value()));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  private DefiniteSum byRecurrence(Form f, Variable k, Form a, Form b, BigInteger first) {
    Form standing = DefiniteSums.standing(f, k, a, b);
    return switch (new HypergeometricSums(engine).sum(f, k, a, b)) {
      case HypergeometricSums.Outcome.Closed closed ->
          DefiniteSum.telescoped(
              closed.value(),
              from(List.of(), closed.n(), closed.from(), first),
              closed.recurrence());
      case HypergeometricSums.Outcome.Recurrence recurrence ->
          DefiniteSum.recurrent(standing, recurrence.recurrence());
      case HypergeometricSums.Outcome.Nothing _ -> DefiniteSum.standing(standing);
    };
  }

  /// The conditions but those on n alone: [RangeCheck] has raised n above the poles of the
  /// antidifference, and the values below are tried.
  private static List<Condition> beside(List<Condition> conditions, Variable n) {
    return conditions.stream().filter(c -> !Set.of(n).equals(c.subject().variables())).toList();
  }

  /// The conditions with n ≥ begin, unless the form holds down to the empty sum.
  private static List<Condition> from(
      List<Condition> conditions, Variable n, BigInteger begin, BigInteger first) {
    List<Condition> all = new ArrayList<>(conditions);
    if (begin.compareTo(first) >= 0) {
      all.add(new Condition(Form.of(n).minus(Form.of(begin)), Condition.Relation.NATURAL));
    }
    return all;
  }
}
