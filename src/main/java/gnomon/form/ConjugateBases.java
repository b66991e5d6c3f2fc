package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.List;
import java.util.Optional;

/// Powers of conjugate quadratic numbers written by one of the two, so that products of them meet:
/// with b = p − r for a radical r > 0 and its norm N = p² − r², b^u = N^u (p + r)^(−u).
///
/// That is exact in principal values unless p − r and p + r are both negative; such bases are left
/// as they are.
final class ConjugateBases {
  private ConjugateBases() {}

  static Form united(Form form) {
    return form.mapGenerators(ConjugateBases::united);
  }

  private static Form united(Generator g) {
    if (!(g instanceof Exponential power) || !(power.base() instanceof Base.Of(Form base))) {
      return Form.of(g);
    }
    return conjugate(base)
        .map(
            other -> {
              Form norm = Powers.power(base.times(other), power.unit());
              return norm.times(Powers.power(other, power.unit().negated()));
            })
        .orElse(Form.of(g));
  }

  /// p + r for the base p − r.
  private static Optional<Form> conjugate(Form base) {
    List<Term> terms = base.numerator().terms();
    Rational p = base.numerator().coefficient(Monomial.ONE);
    if (terms.size() != 2 || p.isZero() || !base.denominator().isConstant()) {
      return Optional.empty();
    }
    Rational rational = p.dividedBy(base.denominator().constantValue());
    Form radical = base.minus(Form.of(rational));
    Optional<Rational> square = radical.times(radical).asRational();
    boolean real = square.filter(s -> s.sign() > 0).isPresent() && radical.isConstant();
    if (!real || sign(radical) > 0) {
      return Optional.empty();
    }
    boolean bothNegative =
        rational.sign() < 0 && rational.times(rational).compareTo(square.get()) > 0;
    return bothNegative ? Optional.empty() : Optional.of(Form.of(rational).minus(radical));
  }

  /// The sign of a number times a product of positive radicals.
  private static int sign(Form radical) {
    Polynomial numerator = radical.numerator();
    return numerator.leadingTerm().coefficient().sign()
        * radical.denominator().constantValue().sign();
  }
}
