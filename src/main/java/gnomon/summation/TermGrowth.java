package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.List;
import java.util.Optional;

/// How a term grows whose ratio is t(k+1)/t(k) = z (k^p + A k^(p−1) + …)/(k^q + B k^(q−1) + …).
///
/// For p < q the term falls off faster than any power of any number; for p = q it is asymptotically
/// a constant times z^k k^(A−B) (ratio test of Gauss).
///
/// Source: K. Knopp, Theorie und Anwendung der unendlichen Reihen (1964), §§ 37 and 38, from
/// memory.
///
/// @param z the quotient of the leading coefficients
/// @param excess p − q
/// @param exponent A − B
record TermGrowth(Form z, int excess, Form exponent) {

  /// Whether a series converges.
  sealed interface Convergence {
    /// It does, under the conditions.
    record Converges(List<Condition> conditions) implements Convergence {}

    /// It does not, whatever the parameters.
    record Diverges() implements Convergence {}

    /// Neither is shown.
    record Undecided() implements Convergence {}
  }

  /// The growth of a term with this ratio, which is rational in k.
  static TermGrowth of(Form ratio, Variable k) {
    List<Form> above = Structure.asPolynomial(Form.of(ratio.numerator()), k).orElseThrow();
    List<Form> below = Structure.asPolynomial(Form.of(ratio.denominator()), k).orElseThrow();
    Form z = above.getLast().dividedBy(below.getLast());
    return new TermGrowth(z, above.size() - below.size(), second(above).minus(second(below)));
  }

  private static Form second(List<Form> coefficients) {
    int size = coefficients.size();
    return size < 2 ? Form.ZERO : coefficients.get(size - 2).dividedBy(coefficients.getLast());
  }

  /// Whether Σ t(k) converges, for a term that is not zero from some point on.
  Convergence convergence() {
    if (excess != 0) {
      return excess < 0 ? new Convergence.Converges(List.of()) : new Convergence.Diverges();
    }
    Optional<Rational> base = z.asRational();
    if (base.isEmpty()) {
      return z.isConstant()
          ? new Convergence.Undecided()
          : new Convergence.Converges(List.of(insideUnit()));
    }
    int size = base.get().abs().compareTo(Rational.ONE);
    if (size != 0) {
      return size < 0 ? new Convergence.Converges(List.of()) : new Convergence.Diverges();
    }
    boolean alternating = base.get().sign() < 0;
    return positive(alternating ? exponent.negated() : exponent.negated().minus(Form.ONE));
  }

  private Condition insideUnit() {
    boolean negative = z.numerator().terms().getFirst().coefficient().sign() < 0;
    return new Condition(negative ? z.negated() : z, Condition.Relation.INSIDE_UNIT);
  }

  private static Convergence positive(Form margin) {
    Optional<Rational> value = margin.asRational();
    if (value.isPresent()) {
      return value.get().sign() > 0
          ? new Convergence.Converges(List.of())
          : new Convergence.Diverges();
    }
    return margin.isConstant()
        ? new Convergence.Undecided()
        : new Convergence.Converges(List.of(new Condition(margin, Condition.Relation.POSITIVE)));
  }
}
