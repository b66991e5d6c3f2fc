package gnomon.form;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/// Brings a quotient of polynomials in generators to the normal form of [Form].
///
/// Over the field ℚ(X) of the independent generators, the algebraic constants span a vector space
/// with the monomials in i and the radicals as a basis (for radicals of primes this is a theorem of
/// Besicovitch, 1940); with the denominator free of them, numerator components and denominator
/// without common factor are unique.
final class Reduction {
  private Reduction() {}

  /// Whether i, a radical or a power of zero occurs, so that a relation may apply.
  static boolean hasRelations(Polynomial polynomial) {
    for (Indeterminate g : polynomial.indeterminates()) {
      if (((Generator) g).isAlgebraic() || isZeroPower(g)) {
        return true;
      }
    }
    return false;
  }

  static boolean isZeroPower(Indeterminate g) {
    return g instanceof Exponential power && power.base() instanceof Base.Zero;
  }

  static Form fraction(Polynomial numerator, Polynomial denominator) {
    Budget.checkpoint();
    if (denominator.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, new Form(numerator, Polynomial.ONE));
    }
    if (numerator.isZero()) {
      return Form.ZERO;
    }
    if (!hasRelations(numerator) && !hasRelations(denominator)) {
      return cancel(numerator, denominator);
    }
    return withRelations(numerator, denominator);
  }

  private static Form withRelations(Polynomial numerator, Polynomial denominator) {
    if (denominator.indeterminates().stream().anyMatch(Reduction::isZeroPower)) {
      throw new Refusal(Reason.ZERO_DIVISOR, new Form(denominator, Polynomial.ONE));
    }
    Relations.Quotient top = Relations.reduce(numerator);
    Relations.Quotient bottom = Relations.reduce(denominator);
    Polynomial n = bottom.over().isOne() ? top.up() : top.up().times(bottom.over());
    Polynomial d = top.over().isOne() ? bottom.up() : bottom.up().times(top.over());
    if (d.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, new Form(numerator, Polynomial.ONE));
    }
    if (n.isZero()) {
      return Form.ZERO;
    }
    Generator algebraic = algebraicIn(d);
    if (algebraic != null) {
      return Rationalisation.without(algebraic, n, d);
    }
    if (n.indeterminates().stream().anyMatch(Reduction::isZeroPower)) {
      return ZeroPowers.normal(n, d);
    }
    return Relations.applies(n) ? fraction(n, d) : cancel(n, d);
  }

  static Generator algebraicIn(Polynomial polynomial) {
    Generator found = null;
    for (Indeterminate g : polynomial.indeterminates()) {
      if (((Generator) g).isAlgebraic()) {
        found = (Generator) g;
      }
    }
    return found;
  }

  /// Cancels the common factor of a reduced numerator and a denominator free of algebraic
  /// generators, and fixes monomial exponents, content and sign.
  static Form cancel(Polynomial numerator, Polynomial denominator) {
    if (numerator.isZero()) {
      return Form.ZERO;
    }
    if (denominator.isConstant() && !hasNegativeExponents(numerator)) {
      Rational scale = denominator.constantValue();
      return new Form(scale.isOne() ? numerator : numerator.times(scale.inverse()), Polynomial.ONE);
    }
    Monomial top = transcendental(numerator.monomialContent());
    Monomial bottom = denominator.monomialContent();
    Polynomial n = top.isOne() ? numerator : numerator.times(top.power(Rational.MINUS_ONE));
    Polynomial d =
        bottom.isOne() ? denominator : denominator.times(bottom.power(Rational.MINUS_ONE));
    if (!d.isConstant()) {
      Polynomial common = d;
      for (Polynomial component : components(n)) {
        common = Polynomial.gcd(common, component);
        if (common.isConstant()) {
          break;
        }
      }
      if (!common.isConstant()) {
        n = n.dividedBy(common);
        d = d.dividedBy(common);
      }
    }
    Monomial shift = top.dividedBy(bottom);
    Monomial up = Monomial.ONE;
    Monomial down = Monomial.ONE;
    for (Monomial.Power factor : shift.factors()) {
      Monomial power = Monomial.of(factor.indeterminate(), factor.exponent().abs());
      if (factor.exponent().sign() > 0) {
        up = up.times(power);
      } else {
        down = down.times(power);
      }
    }
    Rational content = d.content();
    if (!content.isOne()) {
      n = n.times(content.inverse());
      d = d.times(content.inverse());
    }
    return new Form(up.isOne() ? n : n.times(up), down.isOne() ? d : d.times(down));
  }

  private static boolean hasNegativeExponents(Polynomial polynomial) {
    for (Monomial.Power factor : polynomial.monomialContent().factors()) {
      if (factor.exponent().sign() < 0) {
        return true;
      }
    }
    return false;
  }

  private static Monomial transcendental(Monomial monomial) {
    Monomial kept = monomial;
    for (Monomial.Power factor : monomial.factors()) {
      if (((Generator) factor.indeterminate()).isAlgebraic()) {
        kept = kept.without(factor.indeterminate());
      }
    }
    return kept;
  }

  /// The coefficients of the polynomial over the basis of algebraic monomials.
  static Iterable<Polynomial> components(Polynomial polynomial) {
    if (!hasRelations(polynomial)) {
      return List.of(polynomial);
    }
    Map<Monomial, List<Term>> parts = new LinkedHashMap<>();
    for (Term term : polynomial.terms()) {
      Monomial kept = transcendental(term.monomial());
      Monomial algebraic = term.monomial().dividedBy(kept);
      parts
          .computeIfAbsent(algebraic, _ -> new ArrayList<>())
          .add(new Term(kept, term.coefficient()));
    }
    return parts.values().stream().map(Polynomial::ofTerms).toList();
  }
}
