package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/// The shift x -> x + a of integer coefficient lists by divide and conquer: the upper half is
/// shifted by itself and multiplied by a power of x + a.
final class TaylorShift {

  private static final int HORNER = 48;

  private final BigInteger shift;

  /// The powers (x + a)^(HORNER 2^i).
  private final List<BigInteger[]> powers = new ArrayList<>();

  private TaylorShift(BigInteger shift) {
    this.shift = shift;
  }

  static BigInteger[] of(BigInteger[] coefficients, BigInteger shift) {
    return new TaylorShift(shift).shifted(coefficients);
  }

  private BigInteger[] shifted(BigInteger[] coefficients) {
    Budget.checkpoint();
    if (coefficients.length <= HORNER) {
      return horner(coefficients);
    }
    int level = 0;
    int middle = HORNER;
    while (2 * middle < coefficients.length) {
      middle *= 2;
      level++;
    }
    BigInteger[] lower = shifted(Arrays.copyOf(coefficients, middle));
    BigInteger[] upper = shifted(Arrays.copyOfRange(coefficients, middle, coefficients.length));
    BigInteger[] product = Kronecker.times(upper, power(level));
    for (int i = 0; i < middle; i++) {
      product[i] = product[i].add(lower[i]);
    }
    return product;
  }

  private BigInteger[] power(int level) {
    while (powers.size() <= level) {
      BigInteger[] last = powers.isEmpty() ? null : powers.getLast();
      powers.add(
          last == null
              ? Kronecker.power(new BigInteger[] {shift, BigInteger.ONE}, HORNER)
              : Kronecker.times(last, last));
    }
    return powers.get(level);
  }

  private BigInteger[] horner(BigInteger[] coefficients) {
    BigInteger[] rest = coefficients.clone();
    for (int k = 0; k < rest.length; k++) {
      for (int i = rest.length - 2; i >= k; i--) {
        rest[i] = rest[i].add(rest[i + 1].multiply(shift));
      }
    }
    return rest;
  }
}
