package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.Arrays;

/// The change between powers and falling powers of integer coefficient lists, by Horner's scheme on
/// integers changed in place.
///
/// Every step multiplies by a single word, so degree n costs n^2/2 short products. Splitting in
/// halves instead makes all products long ones: with the products of the class library it was
/// measured ten to twenty times slower at degree 2000, so it is left out.
final class FallingPowers {

  private FallingPowers() {}

  /// The coefficients in falling powers: the remainders of repeated division by x, x-1, x-2, ...
  static BigInteger[] fromPowers(BigInteger[] powers) {
    charge(powers);
    IntegerRow rest = new IntegerRow(powers);
    for (int k = 1; k < rest.length(); k++) {
      Budget.checkpoint();
      for (int i = rest.length() - 2; i >= k; i--) {
        rest.combine(i, i + 1, k, i);
      }
    }
    return rest.values();
  }

  /// The differences at 0 of the orders below `count`: k! times the coefficient of the k-th falling
  /// power.
  static BigInteger[] differences(BigInteger[] powers, int count) {
    BigInteger[] falling = fromPowers(powers);
    BigInteger[] differences = Arrays.copyOf(falling, Math.min(count, falling.length));
    BigInteger factorial = BigInteger.ONE;
    for (int k = 1; k < differences.length; k++) {
      factorial = factorial.multiply(BigInteger.valueOf(k));
      differences[k] = differences[k].multiply(factorial);
    }
    return differences;
  }

  /// The coefficients in powers, by s <- s (x - k) + c_k from the last term downward. With the sign
  /// of every second coefficient turned, at every second step, all products are sums.
  static BigInteger[] toPowers(BigInteger[] falling) {
    charge(falling);
    BigInteger[] zeros = new BigInteger[falling.length];
    Arrays.fill(zeros, BigInteger.ZERO);
    IntegerRow sum = new IntegerRow(zeros);
    for (int k = falling.length - 1; k >= 0; k--) {
      Budget.checkpoint();
      int steps = falling.length - 1 - k;
      for (int i = steps; i > 0; i--) {
        sum.combine(i, i, k, i - 1);
      }
      BigInteger first = sum.value(0).multiply(BigInteger.valueOf(k));
      sum.put(0, steps % 2 == 0 ? first.add(falling[k]) : first.subtract(falling[k]));
    }
    BigInteger[] powers = sum.values();
    for (int i = 0; i < powers.length; i++) {
      powers[i] = (i + powers.length - 1) % 2 == 0 ? powers[i] : powers[i].negate();
    }
    return powers;
  }

  /// The result has about n coefficients of n log2(n) bits beside those given.
  private static void charge(BigInteger[] coefficients) {
    long n = coefficients.length;
    long bits = n * (Long.SIZE - Long.numberOfLeadingZeros(n)) / 2 + Kronecker.bits(coefficients);
    Budget.charge(n * (bits / Long.SIZE + 1));
  }
}
