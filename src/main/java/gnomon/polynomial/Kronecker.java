package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.modular.IntegerProduct;
import java.math.BigInteger;
import java.util.Arrays;

/// Products of integer coefficient lists by Kronecker substitution: the coefficients are written
/// side by side into one long integer, slots wide enough for every coefficient of the product, and
/// the long integers are multiplied. Long lists go through transforms modulo primes instead.
final class Kronecker {

  private static final int SCHOOLBOOK = 6;

  /// From this length of the shorter list on, transforms modulo primes are faster.
  private static final int TRANSFORMS = 64;

  private Kronecker() {}

  /// The coefficient list of the product; either list may be empty.
  static BigInteger[] times(BigInteger[] a, BigInteger[] b) {
    if (a.length == 0 || b.length == 0) {
      return new BigInteger[0];
    }
    int shorter = Math.min(a.length, b.length);
    if (shorter <= SCHOOLBOOK) {
      return schoolbook(a, b);
    }
    if (shorter >= TRANSFORMS) {
      return IntegerProduct.of(a, b);
    }
    long bits = bits(a) + (long) bits(b) + Integer.SIZE - Integer.numberOfLeadingZeros(shorter) + 2;
    int slot = slot(bits, a.length + (long) b.length);
    BigInteger left = pack(a, slot);
    BigInteger right = a == b ? left : pack(b, slot);
    Budget.checkpoint();
    return unpack(left.multiply(right), slot, a.length + b.length - 1);
  }

  /// The coefficient list of the power; `exponent` at least 1.
  static BigInteger[] power(BigInteger[] a, int exponent) {
    BigInteger norm = BigInteger.ZERO;
    for (BigInteger coefficient : a) {
      norm = norm.add(coefficient.abs());
    }
    long length = (a.length - 1L) * exponent + 1;
    int slot = slot((long) norm.bitLength() * exponent + 2, length);
    return unpack(pack(a, slot).pow(exponent), slot, (int) length);
  }

  private static int slot(long bits, long length) {
    Budget.chargeInteger((bits / Long.SIZE + 1) * length / 4);
    return Math.toIntExact((bits + Byte.SIZE - 1) / Byte.SIZE);
  }

  static int bits(BigInteger[] coefficients) {
    int bits = 0;
    for (BigInteger coefficient : coefficients) {
      bits = Math.max(bits, coefficient.bitLength());
    }
    return bits;
  }

  private static BigInteger[] schoolbook(BigInteger[] a, BigInteger[] b) {
    BigInteger[] product = new BigInteger[a.length + b.length - 1];
    Arrays.fill(product, BigInteger.ZERO);
    for (int i = 0; i < a.length; i++) {
      if (a[i].signum() != 0) {
        Budget.checkpoint();
        for (int j = 0; j < b.length; j++) {
          if (b[j].signum() != 0) {
            product[i + j] = product[i + j].add(a[i].multiply(b[j]));
          }
        }
      }
    }
    return product;
  }

  /// The value at 2^(8 slot), in two's complement so that negative coefficients borrow by
  /// themselves.
  private static BigInteger pack(BigInteger[] coefficients, int slot) {
    byte[] bytes = new byte[Math.addExact(Math.multiplyExact(coefficients.length, slot), 1)];
    int end = bytes.length;
    boolean borrow = false;
    for (BigInteger coefficient : coefficients) {
      BigInteger digit = borrow ? coefficient.subtract(BigInteger.ONE) : coefficient;
      byte[] digits = digit.toByteArray();
      borrow = digit.signum() < 0;
      System.arraycopy(digits, 0, bytes, end - digits.length, digits.length);
      if (borrow) {
        Arrays.fill(bytes, end - slot, end - digits.length, (byte) -1);
      }
      end -= slot;
    }
    bytes[0] = (byte) (borrow ? -1 : 0);
    return new BigInteger(bytes);
  }

  private static BigInteger[] unpack(BigInteger packed, int slot, int length) {
    byte[] bytes = packed.toByteArray();
    BigInteger[] coefficients = new BigInteger[length];
    int end = bytes.length;
    boolean borrow = false;
    for (int i = 0; i < length; i++) {
      BigInteger digit;
      if (end <= 0) {
        digit = packed.signum() < 0 ? BigInteger.ONE.negate() : BigInteger.ZERO;
      } else {
        int start = Math.max(0, end - slot);
        digit = new BigInteger(bytes, start, end - start);
      }
      boolean negative = digit.signum() < 0;
      coefficients[i] = borrow ? digit.add(BigInteger.ONE) : digit;
      borrow = negative;
      end -= slot;
    }
    return coefficients;
  }
}
