package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Factorization;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;

/// A form as a rational number times integer powers of irreducible polynomials.
///
/// @param unit the number in front
/// @param factors the bases, pairwise coprime, with positive or negative multiplicities
public record Factored(Rational unit, List<Factor> factors) {

  /// A base and its multiplicity, not zero.
  public record Factor(Form base, int multiplicity) {}

  /// Keeps its own copy.
  public Factored {
    factors = List.copyOf(factors);
  }

  /// The form in factors irreducible over the rational numbers.
  public static Factored of(Form form) {
    Factorization top = form.numerator().factor();
    Factorization bottom = form.denominator().factor();
    List<Factor> factors = new ArrayList<>();
    top.factors()
        .forEach(f -> factors.add(new Factor(new Form(f.base(), one()), f.multiplicity())));
    bottom
        .factors()
        .forEach(f -> factors.add(new Factor(new Form(f.base(), one()), -f.multiplicity())));
    return new Factored(top.unit().dividedBy(bottom.unit()), factors);
  }

  private static Polynomial one() {
    return Polynomial.ONE;
  }

  /// The form again, multiplied out.
  public Form product() {
    Form product = Form.of(unit);
    for (Factor factor : factors) {
      product = product.times(factor.base().power(factor.multiplicity()));
    }
    return product;
  }
}
