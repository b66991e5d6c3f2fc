package gnomon.summation;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import gnomon.summation.TermGrowth.Convergence;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// Sums Σ(k: a..∞) f(k) of terms whose ratio f(k+1)/f(k) is rational in k.
///
/// Convergence is decided first, by the growth of the term; where a parameter decides it, its
/// condition is stated. The value is that of a theorem, see [Theorem], or the limit of an
/// antidifference. Divergent sums are refused as such, everything else outside the reach of these
/// methods as undecided.
public final class InfiniteSums {
  private static final BigInteger MOST_TERMS = BigInteger.valueOf(100_000);
  private static final BigInteger FARTHEST_POLE = BigInteger.valueOf(10_000);

  private final SummationEngine engine;

  /// Infinite sums by the antidifferences of `engine`.
  public InfiniteSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// Σ(k: a..∞) f(k).
  ///
  /// @throws Refusal with [Reason#DIVERGENT], [Reason#POLE_IN_RANGE], or
  ///   [Reason#INFINITE_SUM_UNDECIDED] when the sum is outside the reach of this class
  public DefiniteSum sum(Form f, Variable k, Form a) {
    if (f.isZero()) {
      return DefiniteSum.termByTerm(Form.ZERO);
    }
    Form summand = f.takingIntegers(Set.of(k));
    Form fromZero = summand.substitute(k, Form.of(k).plus(a));
    List<Form> parts = parts(fromZero, k);
    DefiniteSum total = DefiniteSum.termByTerm(Form.ZERO);
    for (Form part : parts) {
      try {
        total = added(total, part(part, k, f, a));
      } catch (Refusal refused) {
        boolean apart =
            refused.reason() == Reason.DIVERGENT || refused.reason() == Reason.POLE_IN_RANGE;
        // parts that diverge, or have a pole, may not do so together
        throw parts.size() > 1 && apart ? undecided(f) : refused;
      }
    }
    return total.status() == DefiniteSum.Status.CLOSED_FORM
        ? total.under(GenericPoles.outside(summand, k, a, a.variables()))
        : total;
  }

  private static DefiniteSum added(DefiniteSum left, DefiniteSum right) {
    if (left.value().isZero()) {
      return right;
    }
    List<Condition> conditions = new ArrayList<>(left.conditions());
    conditions.addAll(right.conditions());
    Set<Theorem> theorems = new LinkedHashSet<>(left.theorems());
    theorems.addAll(right.theorems());
    return DefiniteSum.known(left.value().plus(right.value()), conditions, theorems);
  }

  /// The form as a sum of terms with one product of kernels each.
  private static List<Form> parts(Form f, Variable k) {
    Map<Monomial, Polynomial> groups = new LinkedHashMap<>();
    for (Term term : f.numerator().terms()) {
      Monomial kernels = Monomial.ONE;
      for (Monomial.Power power : term.monomial().factors()) {
        Generator generator = (Generator) power.indeterminate();
        if (!(generator instanceof Variable) && generator.dependsOn(k)) {
          kernels = kernels.times(Monomial.of(generator, power.exponent()));
        }
      }
      Polynomial single = Polynomial.of(term.monomial(), term.coefficient());
      groups.merge(kernels, single, Polynomial::plus);
    }
    return groups.values().stream()
        .map(numerator -> Form.fraction(numerator, f.denominator()))
        .toList();
  }

  /// Σ(k: 0..∞) t(k). Where t(k) is finite and its ratio has no pole, t(k+1) is finite too; terms
  /// up to the last pole of the ratio are added one by one.
  private DefiniteSum part(Form t, Variable k, Form f, Form a) {
    HypergeometricTerm term = HypergeometricTerm.of(t, k, Form.ONE).orElseThrow(() -> undecided(f));
    BigInteger start =
        Optional.ofNullable(IntegerPoles.of(term.ratio(), k).points().floor(FARTHEST_POLE))
            .filter(last -> last.signum() >= 0)
            .map(last -> last.add(BigInteger.ONE))
            .orElse(BigInteger.ZERO);
    if (IntegerPoles.of(term.ratio(), k).atOrAbove(start).isPresent()) {
      throw undecided(f);
    }
    Form moved = Form.of(k).plus(Form.of(start));
    try {
      Form head = Terms.sum(t, k, Form.ZERO, start.longValueExact());
      Form first = t.substitute(k, Form.of(start));
      DefiniteSum tail =
          first.isZero()
              ? DefiniteSum.termByTerm(Form.ZERO)
              : tail(t.substitute(k, moved), term.ratio().substitute(k, moved), first, k, f);
      return head.isZero() ? tail : added(DefiniteSum.termByTerm(head), tail);
    } catch (Refusal refused) {
      throw switch (refused.reason()) {
        case POLE_IN_RANGE -> new Refusal(Reason.POLE_IN_RANGE, refused.data().getFirst(), a);
        case POLE -> new Refusal(Reason.POLE_IN_RANGE, start, a);
        default -> refused;
      };
    }
  }

  /// Σ(k: 0..∞) t(k) with t(0) ≠ 0 and a ratio without poles at natural numbers.
  private DefiniteSum tail(Form t, Form ratio, Form first, Variable k, Form f) {
    Optional<BigInteger> last = lastNonzero(ratio, k);
    if (last.isPresent()) {
      if (last.get().compareTo(MOST_TERMS) > 0) {
        throw undecided(f);
      }
      return DefiniteSum.termByTerm(Terms.sum(t, k, Form.ZERO, last.get().longValueExact() + 1));
    }
    TermGrowth growth = TermGrowth.of(ratio, k);
    List<Condition> conditions =
        switch (growth.convergence()) {
          case Convergence.Converges(List<Condition> under) -> under;
          case Convergence.Diverges _ ->
              throw mayEnd(ratio, k) ? undecided(f) : new Refusal(Reason.DIVERGENT, f);
          case Convergence.Undecided _ -> throw undecided(f);
        };
    return byTheorem(t, ratio, first, k, growth, conditions)
        .or(() -> byAntidifference(t, k, growth, conditions))
        .orElseThrow(() -> undecided(f));
  }

  private static Refusal undecided(Form f) {
    return new Refusal(Reason.INFINITE_SUM_UNDECIDED, f);
  }

  /// The last k ≥ 0 at which a term is not zero, where the terms end.
  private static Optional<BigInteger> lastNonzero(Form ratio, Variable k) {
    return IntegerPoles.of(ratio.inverse(), k).atOrAbove(BigInteger.ZERO);
  }

  /// Whether the terms end for some values of the parameters.
  private static boolean mayEnd(Form ratio, Variable k) {
    return Form.of(ratio.numerator()).variables().stream().anyMatch(v -> !v.equals(k));
  }

  /// −F(0) for an antidifference F = R t that tends to 0.
  private Optional<DefiniteSum> byAntidifference(
      Form t, Variable k, TermGrowth growth, List<Condition> conditions) {
    if (!(engine.search(t, k, Form.ONE) instanceof Antidifference.Found found)) {
      return Optional.empty();
    }
    Form factor = found.value().dividedBy(t);
    if (!Structure.isRationalIn(factor, k)
        || IntegerPoles.of(found.value(), k).atOrAbove(BigInteger.ZERO).isPresent()) {
      return Optional.empty();
    }
    boolean rational = Structure.isRationalIn(found.value(), k);
    if (!rational && !fallsOff(factor, k, growth)) {
      return Optional.empty();
    }
    Form limit = rational ? limit(found.value(), k) : Form.ZERO;
    List<Condition> all = new ArrayList<>(conditions);
    all.addAll(found.conditions());
    Form value = limit.minus(found.value().substitute(k, Form.ZERO));
    return Optional.of(DefiniteSum.closed(value, all, found.value()));
  }

  /// Whether R(k) z^k k^s tends to 0.
  private static boolean fallsOff(Form factor, Variable k, TermGrowth growth) {
    Optional<Rational> z = growth.z().asRational();
    if (growth.excess() < 0 || z.isEmpty() || z.get().abs().compareTo(Rational.ONE) < 0) {
      return true;
    }
    Optional<Rational> exponent = growth.exponent().asRational();
    return exponent.isPresent() && exponent.get().plus(Rational.of(degree(factor, k))).sign() < 0;
  }

  /// The degree of the numerator less that of the denominator.
  private static int degree(Form f, Variable k) {
    return Structure.degree(Form.of(f.numerator()), k).orElseThrow()
        - Structure.degree(Form.of(f.denominator()), k).orElseThrow();
  }

  private static Form limit(Form rational, Variable k) {
    List<Form> above = Structure.asPolynomial(Form.of(rational.numerator()), k).orElseThrow();
    List<Form> below = Structure.asPolynomial(Form.of(rational.denominator()), k).orElseThrow();
    return above.size() < below.size() ? Form.ZERO : above.getLast().dividedBy(below.getLast());
  }

  private Optional<DefiniteSum> byTheorem(
      Form t, Form ratio, Form first, Variable k, TermGrowth growth, List<Condition> conditions) {
    Optional<KnownSeries> known =
        HypergeometricSeries.of(first, ratio, k).flatMap(series -> KnownSeries.of(series, k));
    if (known.isEmpty() && growth.excess() == 0) {
      Form z = growth.z();
      Form fraction = t.dividedBy(Elementary.power(z, Form.of(k)));
      known = FractionSeries.of(z, fraction, k);
    }
    return known.map(found -> DefiniteSum.known(found.value(), conditions, found.theorems()));
  }
}
