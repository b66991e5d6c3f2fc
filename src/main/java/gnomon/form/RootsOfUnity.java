package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.math.BigInteger;

/// The roots of unity that lie in ℚ(i, √2, √3): those of order dividing 24.
final class RootsOfUnity {
  private RootsOfUnity() {}

  /// (−1)^q = e^(iπq).
  ///
  /// @throws Refusal with [Reason#ROOT_OUT_OF_FIELD] where 12 q is not an integer
  static Form power(Rational q) {
    Rational twelfths = q.times(Rational.of(12));
    if (!twelfths.isInteger()) {
      throw new Refusal(Reason.ROOT_OUT_OF_FIELD, Form.MINUS_ONE, Form.of(q));
    }
    int k = twelfths.numerator().mod(BigInteger.valueOf(24)).intValue();
    return cosine(k).plus(Form.I.times(cosine(Math.floorMod(k - 6, 24))));
  }

  /// cos(kπ/12) for k in 0..23.
  private static Form cosine(int k) {
    int folded = k > 12 ? 24 - k : k;
    return folded > 6 ? firstQuarter(12 - folded).negated() : firstQuarter(folded);
  }

  private static Form firstQuarter(int k) {
    return switch (k) {
      case 0 -> Form.ONE;
      case 1 -> root(6).plus(root(2)).times(Rational.of(1, 4));
      case 2 -> root(3).times(Rational.HALF);
      case 3 -> root(2).times(Rational.HALF);
      case 4 -> Form.HALF;
      case 5 -> root(6).minus(root(2)).times(Rational.of(1, 4));
      default -> Form.ZERO;
    };
  }

  private static Form root(int radicand) {
    return Powers.power(Form.of(radicand), Form.HALF);
  }
}
