package gnomon.summation;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// Products ∏(k: a..b) f(k).
///
/// Linear factors α k + β with α a rational number become α^(b−a+1) (a + β/α)↑(b−a+1), factors free
/// of k powers, and kernels base^u(k) with a polynomial u the power of the sum of u. A factor of
/// any other kind leaves the whole product standing. An empty product is 1.
public final class DefiniteProducts {

  private static final long TERM_BY_TERM_LIMIT = 5000;

  private final DefiniteSums sums;

  /// Products whose exponents are summed by `sums`.
  public DefiniteProducts(DefiniteSums sums) {
    this.sums = sums;
  }

  /// ∏(k: a..b) f(k).
  ///
  /// @throws Refusal with [Reason#POLE_IN_RANGE] when the factor has a pole that the range meets,
  ///   with [Reason#NOT_AN_INTEGER] when numeric ends do not differ by an integer
  public DefiniteSum product(Form f, Variable k, Form a, Form b) {
    Form factor = f.takingIntegers(Set.of(k));
    Form span = b.minus(a);
    Optional<Rational> length = span.asRational();
    if (length.isPresent() && !length.get().isInteger()) {
      throw new Refusal(Reason.NOT_AN_INTEGER, length.get());
    }
    if (length.isPresent() && length.get().sign() < 0) {
      return DefiniteSum.termByTerm(Form.ONE);
    }
    Form standing = Accumulation.of(Accumulation.Kind.PRODUCT, k, a, b, factor);
    if (length.isPresent()) {
      BigInteger count = length.get().numerator().add(BigInteger.ONE);
      return count.compareTo(BigInteger.valueOf(TERM_BY_TERM_LIMIT)) <= 0
          ? DefiniteSum.termByTerm(Terms.product(factor, k, a, count.longValueExact()))
          : DefiniteSum.standing(standing);
    }
    List<Condition> conditions = new ArrayList<>();
    return closed(factor, k, a, b, conditions)
        .map(form -> form.takingIntegers(DefiniteSums.integersIn(span)))
        .map(form -> DefiniteSum.closed(form, conditions))
        .map(found -> found.under(GenericPoles.outside(factor, k, a, DefiniteSums.variables(a, b))))
        .orElseGet(() -> DefiniteSum.standing(standing));
  }

  private Optional<Form> closed(Form f, Variable k, Form a, Form b, List<Condition> conditions) {
    Form count = b.minus(a).plus(Form.ONE);
    var factored = Structure.factored(f);
    List<Form> result = new ArrayList<>();
    result.add(Elementary.power(Form.of(factored.unit()), count));
    for (var factor : factored.factors()) {
      Optional<Form> one = closedFactor(factor.base(), factor.multiplicity(), k, a, b, conditions);
      if (one.isEmpty()) {
        return Optional.empty();
      }
      result.add(one.get().power(factor.multiplicity()));
    }
    return Optional.of(Form.product(result));
  }

  private Optional<Form> closedFactor(
      Form base, int multiplicity, Variable k, Form a, Form b, List<Condition> conditions) {
    Form count = b.minus(a).plus(Form.ONE);
    if (!base.dependsOn(k)) {
      return Optional.of(Elementary.power(base, count));
    }
    Optional<List<Form>> linear = Structure.asPolynomial(base, k);
    if (linear.isPresent() && linear.get().size() == 2) {
      return linearFactor(linear.get(), multiplicity, a, b, conditions);
    }
    return exponentialFactor(base, k, a, b);
  }

  /// ∏ (α k + β) = α^(b−a+1) (a + β/α)↑(b−a+1).
  private static Optional<Form> linearFactor(
      List<Form> linear, int multiplicity, Form a, Form b, List<Condition> conditions) {
    Form alpha = linear.getLast();
    Form offset = linear.getFirst().dividedBy(alpha);
    Form count = b.minus(a).plus(Form.ONE);
    if (alpha.asRational().isEmpty()) {
      conditions.add(Condition.notZero(alpha));
    }
    Form first = a.plus(offset);
    Form last = b.plus(offset);
    Form power = Elementary.power(alpha, count);
    boolean startsAtOrBelowZero =
        first.asInteger().filter(start -> start.signum() <= 0).isPresent();
    boolean endsAtOrAboveZero = last.asInteger().filter(end -> end.signum() >= 0).isPresent();
    if (startsAtOrBelowZero || endsAtOrAboveZero) {
      if (multiplicity < 0) {
        throw startsAtOrBelowZero
            ? new Refusal(Reason.POLE_IN_RANGE, first.negated(), a)
            : new Refusal(Reason.POLE_IN_RANGE, last, b);
      }
      // the factor vanishes at a point of every range that reaches it
      conditions.add(
          new Condition(startsAtOrBelowZero ? last : first.negated(), Condition.Relation.NATURAL));
      return Optional.of(Form.ZERO);
    }
    return last.asInteger().isPresent()
        ? Optional.of(power.times(Combinatorial.falling(last, count)))
        : Optional.of(power.times(Combinatorial.rising(first, count)));
  }

  /// ∏ base^u(k) = base^(Σ u(k)), for one power kernel.
  private Optional<Form> exponentialFactor(Form factor, Variable k, Form a, Form b) {
    if (!factor.denominator().isOne() || factor.numerator().size() != 1) {
      return Optional.empty();
    }
    Monomial monomial = factor.numerator().terms().getFirst().monomial();
    List<Form> result = new ArrayList<>();
    for (var power : monomial.factors()) {
      if (!(power.indeterminate() instanceof Exponential kernel)
          || kernel.base().value().dependsOn(k)) {
        return Optional.empty();
      }
      DefiniteSum exponent = sums.sum(kernel.unit().times(power.exponent()), k, a, b);
      if (exponent.status() != DefiniteSum.Status.CLOSED_FORM) {
        return Optional.empty();
      }
      result.add(Elementary.power(kernel.base().value(), exponent.value()));
    }
    return Optional.of(Form.product(result));
  }
}
