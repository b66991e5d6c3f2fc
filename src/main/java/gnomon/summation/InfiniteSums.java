package gnomon.summation;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/// Sums Σ(k: a..∞) f(k) = lim F − F(a).
///
/// Handled: rational functions whose antidifference is rational, by the degrees of numerator and
/// denominator, and sums of b^k times a polynomial with rational |b| < 1, whose antidifference
/// tends to 0. A rational summand that does not fall off like 1/k^2 and a term b^k with |b| ≥ 1 are
/// refused as divergent. Everything else is refused as undecided, not guessed.
public final class InfiniteSums {

  private final SummationEngine engine;

  /// Infinite sums by the antidifferences of `engine`.
  public InfiniteSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// Σ(k: a..∞) f(k).
  ///
  /// @throws Refusal with [Reason#DIVERGENT], [Reason#POLE_IN_RANGE], or
  ///   [Reason#INFINITE_SUM_UNDECIDED] when the limit is outside the reach of this class
  public DefiniteSum sum(Form f, Variable k, Form a) {
    if (f.isZero()) {
      return DefiniteSum.termByTerm(Form.ZERO);
    }
    Form fromZero = f.substitute(k, Form.of(k).plus(a));
    Optional<BigInteger> pole = IntegerPoles.of(fromZero, k).atOrAbove(BigInteger.ZERO);
    if (pole.isPresent()) {
      throw new Refusal(Reason.POLE_IN_RANGE, pole.get(), a);
    }
    boolean rational = Structure.isRationalIn(fromZero, k);
    if (rational && degree(fromZero, k) > -2) {
      throw new Refusal(Reason.DIVERGENT, f);
    }
    if (!rational) {
      requireDecay(fromZero, f, k);
    }
    if (engine.search(fromZero, k, Form.ONE) instanceof Antidifference.Found found
        && (!rational || Structure.isRationalIn(found.value(), k))) {
      Form limit = rational ? limit(found.value(), k) : Form.ZERO;
      Form value = limit.minus(found.value().substitute(k, Form.ZERO));
      return DefiniteSum.closed(value, found.conditions(), found.value());
    }
    throw new Refusal(Reason.INFINITE_SUM_UNDECIDED, f);
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

  /// Every part must be b^k times a polynomial with rational b, |b| < 1.
  private static void requireDecay(Form shifted, Form f, Variable k) {
    var parts = Structure.exponentialParts(shifted, k);
    if (parts.isEmpty()) {
      throw new Refusal(Reason.INFINITE_SUM_UNDECIDED, f);
    }
    for (var part : parts.get()) {
      Form factor = part.kernel().substitute(k, Form.of(k).plus(Form.ONE)).dividedBy(part.kernel());
      Optional<Rational> base = factor.asRational();
      if (base.isEmpty()) {
        throw new Refusal(Reason.INFINITE_SUM_UNDECIDED, f);
      }
      if (base.get().abs().compareTo(Rational.ONE) >= 0) {
        throw new Refusal(Reason.DIVERGENT, f);
      }
    }
  }
}
