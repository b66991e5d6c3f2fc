package gnomon.polynomial;

import gnomon.number.Rational;
import java.util.List;

/// A polynomial as `unit` times the product of `base^multiplicity` over its factors.
///
/// @param unit the rational in front
/// @param factors the factors in canonical order, pairwise coprime; empty for a constant
public record Factorization(Rational unit, List<Factor> factors) {

  /// Keeps its own copy of the list.
  public Factorization {
    factors = List.copyOf(factors);
  }

  /// The polynomial again, multiplied out.
  public Polynomial product() {
    Polynomial product = Polynomial.of(unit);
    for (Factor factor : factors) {
      product = product.times(factor.base().power(factor.multiplicity()));
    }
    return product;
  }
}
