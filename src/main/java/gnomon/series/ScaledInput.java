package gnomon.series;

import gnomon.modular.ChineseRemainder;
import gnomon.modular.PrimeField;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;

/// A series with rational coefficients, made ready for reduction modulo primes: the integers D_n
/// a_n.
///
/// @param integers D_(n−lag) a_n, with lag 0 or 1
/// @param steps the quotients of the denominators D_(n−lag)
record ScaledInput(BigInteger[] integers, BigInteger[] steps) {

  /// The first `length` coefficients times the denominators.
  static ScaledInput of(List<Rational> coefficients, BigInteger[] steps, int length) {
    BigInteger[] integers = new BigInteger[Math.min(length, coefficients.size())];
    BigInteger denominator = BigInteger.ONE;
    for (int n = 0; n < integers.length; n++) {
      denominator = denominator.multiply(steps[n]);
      Rational a = coefficients.get(n);
      integers[n] =
          a.isInteger() && denominator.equals(BigInteger.ONE)
              ? a.numerator()
              : a.numerator().multiply(denominator.divide(a.denominator()));
    }
    return new ScaledInput(integers, steps);
  }

  /// The residues of D_n a_n, row i modulo the i-th prime.
  int[][] residues(ChineseRemainder remainders) {
    return remainders.residues(integers);
  }

  /// The residues of a_n from those of D_n a_n.
  int[] unscaled(int[] residues, PrimeField field) {
    int[] scale = DenominatorScale.residues(steps, field);
    int n = residues.length;
    if (n == 0) {
      return residues;
    }
    int[] result = new int[n];
    int inverse = field.inverse(scale[n - 1]);
    for (int k = n - 1; k >= 0; k--) {
      result[k] = field.times(residues[k], inverse);
      inverse = field.times(inverse, field.of(steps[k]));
    }
    return result;
  }
}
