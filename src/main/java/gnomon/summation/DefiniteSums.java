package gnomon.summation;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Harmonic;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.recurrence.HypergeometricTotal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// Sums Σ(k: a..b) f(k) over a range with numeric or symbolic ends.
///
/// A symbolic end is taken to be an integer no less than the other end less one; an empty sum is 0.
/// With F an antidifference the sum is F(b + 1) − F(a), used only where neither f nor F has a pole
/// among the points it passes. A range with one numeric end is counted from that end, so that the
/// poles of f and F in the direction of the other one are seen.
public final class DefiniteSums {

  private static final long TERM_BY_TERM_LIMIT = 400;

  private final SummationEngine engine;

  /// Definite sums by the antidifferences of `engine`.
  public DefiniteSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// Σ(k: a..b) f(k).
  ///
  /// @throws Refusal with [Reason#POLE_IN_RANGE] when the summand has a pole that the range meets,
  ///   with [Reason#NOT_AN_INTEGER] when numeric ends do not differ by an integer
  public DefiniteSum sum(Form f, Variable k, Form a, Form b) {
    Form summand = f.takingIntegers(Set.of(k));
    DefiniteSum sum = found(summand, k, a, b);
    return sum.status() == DefiniteSum.Status.CLOSED_FORM
        ? sum.under(GenericPoles.outside(summand, k, a, variables(a, b)))
        : sum;
  }

  static Set<Variable> variables(Form a, Form b) {
    Set<Variable> ends = new HashSet<>(a.variables());
    ends.addAll(b.variables());
    return ends;
  }

  private DefiniteSum found(Form summand, Variable k, Form a, Form b) {
    Form factor = harmonicFactor(summand, k);
    if (!factor.isOne()) {
      DefiniteSum rest = found(summand.dividedBy(factor), k, a, b);
      if (rest.status() == DefiniteSum.Status.CLOSED_FORM) {
        return DefiniteSum.closed(rest.value().times(factor), rest.conditions());
      }
    }
    Form span = b.minus(a);
    Optional<Rational> length = span.asRational();
    if (length.isPresent()) {
      return counted(summand, k, a, b, length.get());
    }
    if (!summand.dependsOn(k)) {
      Form value = summand.times(span.plus(Form.ONE));
      return DefiniteSum.closed(value, List.of(), summand.times(Form.of(k)));
    }
    Optional<DefiniteSum> counted = countedFromStart(summand, k, a, b);
    if (counted.isPresent()) {
      return counted.get();
    }
    if (span.variables().stream().anyMatch(summand::dependsOn)) {
      Form reversed = summand.substitute(k, a.plus(b).minus(Form.of(k)));
      boolean free = span.variables().stream().noneMatch(reversed::dependsOn);
      return free ? found(reversed, k, a, b) : entangled(summand, k, a, b);
    }
    if (a.asRational().isPresent()) {
      Form fromZero = summand.substitute(k, Form.of(k).plus(a));
      return symbolic(fromZero, k, span, summand, a, b);
    }
    if (b.asRational().isPresent()) {
      Form fromZero = summand.substitute(k, b.minus(Form.of(k)));
      return symbolic(fromZero, k, span, summand, a, b);
    }
    return bothSymbolic(summand, k, a, b);
  }

  /// A sum whose ends occur in the summand; where nothing is found, once more counted from 0 and
  /// with one variable for the number of terms.
  private DefiniteSum entangled(Form f, Variable k, Form a, Form b) {
    DefiniteSum sum = new EntangledSums(engine).sum(f, k, a, b);
    if (sum.status() == DefiniteSum.Status.CLOSED_FORM || a.isZero()) {
      return sum;
    }
    Form counted = f.substitute(k, Form.of(k).plus(a));
    Form span = b.minus(a);
    Optional<DefiniteSum> closed =
        span.variables().size() == 1
            ? Optional.of(new EntangledSums(engine).sum(counted, k, Form.ZERO, span))
            : span.variables().stream()
                .filter(n -> !span.minus(Form.of(n)).dependsOn(n))
                .findFirst()
                .map(
                    n -> {
                      Form rest = span.minus(Form.of(n));
                      Form merged = counted.substitute(n, Form.of(n).minus(rest));
                      return new EntangledSums(engine)
                          .sum(merged, k, Form.ZERO, Form.of(n))
                          .substituted(n, span);
                    });
    return closed.filter(found -> found.status() == DefiniteSum.Status.CLOSED_FORM).orElse(sum);
  }

  /// Σ(k: m..n) f for symbols m and n where m occurs in f, with n counted from m.
  private Optional<DefiniteSum> countedFromStart(Form f, Variable k, Form a, Form b) {
    if (a.variables().size() != 1 || b.variables().size() != 1) {
      return Optional.empty();
    }
    Variable m = a.variables().first();
    Variable n = b.variables().first();
    Optional<Rational> start = a.minus(Form.of(m)).asRational();
    Optional<Rational> end = b.minus(Form.of(n)).asRational();
    if (m.equals(n) || start.isEmpty() || end.isEmpty() || !f.dependsOn(m)) {
      return Optional.empty();
    }
    Form later = Form.of(n).plus(Form.of(m));
    Form counted = f.substitute(Map.of(k, Form.of(k).plus(a), n, later));
    DefiniteSum sum = found(counted, k, Form.ZERO, b.minus(a).substitute(n, later));
    return Optional.of(sum)
        .filter(found -> found.status() == DefiniteSum.Status.CLOSED_FORM)
        .map(found -> found.substituted(n, Form.of(n).minus(Form.of(m))));
  }

  /// The harmonic numbers free of k by which a summand that depends on k is divisible.
  private static Form harmonicFactor(Form summand, Variable k) {
    Form factor = Form.ONE;
    if (summand.dependsOn(k)) {
      Monomial content = summand.numerator().monomialContent();
      for (Monomial.Power power : content.factors()) {
        if (power.indeterminate() instanceof Harmonic harmonic && !harmonic.dependsOn(k)) {
          factor = factor.times(Form.of(harmonic, power.exponent()));
        }
      }
    }
    return factor;
  }

  /// A range of a known number of points.
  private DefiniteSum counted(Form f, Variable k, Form a, Form b, Rational length) {
    if (!length.isInteger()) {
      throw new Refusal(Reason.NOT_AN_INTEGER, length);
    }
    BigInteger count = length.numerator().add(BigInteger.ONE);
    if (count.signum() <= 0) {
      return DefiniteSum.termByTerm(Form.ZERO);
    }
    if (count.compareTo(BigInteger.valueOf(TERM_BY_TERM_LIMIT)) > 0) {
      Form fromZero = f.substitute(k, Form.of(k).plus(a));
      refusePole(IntegerPoles.of(fromZero, k).between(BigInteger.ZERO, length.numerator()), a);
      if (engine.search(fromZero, k, Form.ONE) instanceof Antidifference.Found found
          && IntegerPoles.of(found.value(), k).between(BigInteger.ZERO, count).isEmpty()) {
        Form value = telescoped(found.value(), k, Form.ZERO, Form.of(count));
        return DefiniteSum.closed(value, found.conditions(), found.value());
      }
    }
    if (count.bitLength() > 40) {
      return DefiniteSum.standing(standing(f, k, a, b));
    }
    Form value =
        count.compareTo(BigInteger.valueOf(TERM_BY_TERM_LIMIT)) > 0
            ? hypergeometric(f, k, a, count.longValueExact())
                .orElseGet(() -> Terms.sum(f, k, a, count.longValueExact()))
            : Terms.sum(f, k, a, count.longValueExact());
    return DefiniteSum.termByTerm(value);
  }

  /// The sum of many terms by their ratio, where that is a rational function over ℚ.
  private static Optional<Form> hypergeometric(Form f, Variable k, Form a, long count) {
    if (a.asInteger().isEmpty()) {
      return Optional.empty();
    }
    try {
      Form first = f.substitute(k, a);
      return HypergeometricTerm.of(f, k, Form.ONE)
          .filter(_ -> !first.isZero())
          .flatMap(
              term -> HypergeometricTotal.of(term.ratio(), k, a.asInteger().orElseThrow(), count))
          .map(total -> first.times(total));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// Σ(j: 0..span) g(j) with a symbolic span.
  private DefiniteSum symbolic(Form g, Variable k, Form span, Form f, Form a, Form b) {
    refusePole(
        IntegerPoles.of(g, k).atOrAbove(BigInteger.ZERO), a.asRational().isPresent() ? a : b);
    Antidifference outcome = engine.search(g, k, Form.ONE);
    if (!(outcome instanceof Antidifference.Found)) {
      Optional<DefiniteSum> strided = new StridedSums(engine).sum(g, k, span);
      if (strided.isPresent()) {
        return strided.get();
      }
    }
    return switch (outcome) {
      case Antidifference.Found found
          when IntegerPoles.of(found.value(), k).atOrAbove(BigInteger.ZERO).isEmpty() -> {
        Form value = telescoped(found.value(), k, Form.ZERO, span.plus(Form.ONE));
        yield DefiniteSum.closed(
            value.takingIntegers(integersIn(span)), found.conditions(), found.value());
      }
      case Antidifference.Found _, Antidifference.GaveUp _ ->
          DefiniteSum.standing(standing(f, k, a, b));
      case Antidifference.ProvedAbsent absent ->
          DefiniteSum.absent(standing(f, k, a, b), absent.within());
    };
  }

  private DefiniteSum bothSymbolic(Form f, Variable k, Form a, Form b) {
    return switch (engine.search(f, k, Form.ONE)) {
      case Antidifference.Found found -> {
        List<Condition> conditions = new ArrayList<>(found.conditions());
        IntegerPoles poles = IntegerPoles.of(found.value(), k);
        for (BigInteger point : IntegerPoles.of(f, k).points()) {
          conditions.add(new Condition(Form.of(point), Condition.Relation.NOT_IN_RANGE));
        }
        poles
            .upTo()
            .ifPresent(
                last ->
                    conditions.add(
                        new Condition(
                            a.minus(Form.of(last)).minus(Form.ONE), Condition.Relation.NATURAL)));
        Form value = telescoped(found.value(), k, a, b.plus(Form.ONE));
        yield poles.from().isPresent()
            ? DefiniteSum.standing(standing(f, k, a, b))
            : DefiniteSum.closed(
                value.takingIntegers(integersIn(b.minus(a))), conditions, found.value());
      }
      case Antidifference.GaveUp _ -> DefiniteSum.standing(standing(f, k, a, b));
      case Antidifference.ProvedAbsent absent ->
          DefiniteSum.absent(standing(f, k, a, b), absent.within());
    };
  }

  static Form telescoped(Form antidifference, Variable k, Form from, Form to) {
    return antidifference.substitute(k, to).minus(antidifference.substitute(k, from));
  }

  static Form standing(Form f, Variable k, Form a, Form b) {
    return Accumulation.of(Accumulation.Kind.SUM, k, a, b, f);
  }

  private static void refusePole(Optional<BigInteger> offset, Form end) {
    if (offset.isPresent()) {
      throw new Refusal(Reason.POLE_IN_RANGE, offset.get(), end);
    }
  }

  /// The variable that is an integer because `span` is: span = ±v + integer.
  static Set<Variable> integersIn(Form span) {
    if (span.variables().size() != 1) {
      return Set.of();
    }
    Variable only = span.variables().first();
    Form rest = span.minus(Form.of(only));
    Form sum = span.plus(Form.of(only));
    return rest.asInteger().isPresent() || sum.asInteger().isPresent() ? Set.of(only) : Set.of();
  }
}
