package gnomon.polynomial;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.Arrays;

/// Polynomials in one unknown over the integers modulo a prime below 2^31, as ascending coefficient
/// arrays without trailing zeros.
final class Residues {

  private Residues() {}

  static long[] reduce(BigInteger[] coefficients, long prime) {
    BigInteger modulus = BigInteger.valueOf(prime);
    long[] residues = new long[coefficients.length];
    for (int i = 0; i < residues.length; i++) {
      residues[i] =
          coefficients[i].bitLength() < Long.SIZE
              ? Math.floorMod(coefficients[i].longValue(), prime)
              : coefficients[i].mod(modulus).longValue();
    }
    return trim(residues);
  }

  static long[] trim(long[] coefficients) {
    int length = coefficients.length;
    while (length > 0 && coefficients[length - 1] == 0) {
      length--;
    }
    return length == coefficients.length ? coefficients : Arrays.copyOf(coefficients, length);
  }

  static long power(long base, long exponent, long prime) {
    long result = 1;
    long square = base % prime;
    for (long rest = exponent; rest > 0; rest >>= 1) {
      if ((rest & 1) != 0) {
        result = result * square % prime;
      }
      square = square * square % prime;
    }
    return result;
  }

  static long inverse(long value, long prime) {
    return power(value, prime - 2, prime);
  }

  static long[] monic(long[] a, long prime) {
    return a.length == 0 ? a : scale(a, inverse(a[a.length - 1], prime), prime);
  }

  static long[] scale(long[] a, long factor, long prime) {
    long[] scaled = new long[a.length];
    for (int i = 0; i < a.length; i++) {
      scaled[i] = a[i] * factor % prime;
    }
    return trim(scaled);
  }

  static long[] derivative(long[] a, long prime) {
    if (a.length == 0) {
      return a;
    }
    long[] derived = new long[a.length - 1];
    for (int i = 1; i < a.length; i++) {
      derived[i - 1] = a[i] * (i % prime) % prime;
    }
    return trim(derived);
  }

  static long[] minus(long[] a, long[] b, long prime) {
    long[] difference = Arrays.copyOf(a, Math.max(a.length, b.length));
    for (int i = 0; i < b.length; i++) {
      long value = difference[i] - b[i];
      difference[i] = value < 0 ? value + prime : value;
    }
    return trim(difference);
  }

  static long[] times(long[] a, long[] b, long prime) {
    if (a.length == 0 || b.length == 0) {
      return new long[0];
    }
    Budget.checkpoint();
    long[] product = new long[a.length + b.length - 1];
    for (int i = 0; i < a.length; i++) {
      if (a[i] != 0) {
        for (int j = 0; j < b.length; j++) {
          product[i + j] = (product[i + j] + a[i] * b[j]) % prime;
        }
      }
    }
    return trim(product);
  }

  /// The remainder by a monic divisor.
  static long[] remainder(long[] a, long[] monic, long prime) {
    if (a.length < monic.length) {
      return a;
    }
    Budget.checkpoint();
    long[] rest = a.clone();
    int degree = monic.length - 1;
    for (int i = rest.length - 1; i >= degree; i--) {
      long factor = rest[i];
      if (factor != 0) {
        long negative = prime - factor;
        for (int j = 0; j < degree; j++) {
          rest[i - degree + j] = (rest[i - degree + j] + negative * monic[j]) % prime;
        }
      }
    }
    return trim(Arrays.copyOf(rest, degree));
  }

  /// The quotient by a monic divisor.
  static long[] quotient(long[] a, long[] monic, long prime) {
    if (a.length < monic.length) {
      return new long[0];
    }
    long[] rest = a.clone();
    int degree = monic.length - 1;
    long[] quotient = new long[a.length - degree];
    for (int i = rest.length - 1; i >= degree; i--) {
      long factor = rest[i];
      quotient[i - degree] = factor;
      if (factor != 0) {
        long negative = prime - factor;
        for (int j = 0; j < degree; j++) {
          rest[i - degree + j] = (rest[i - degree + j] + negative * monic[j]) % prime;
        }
      }
    }
    return quotient;
  }

  /// The monic greatest common divisor.
  static long[] gcd(long[] a, long[] b, long prime) {
    long[] left = monic(a, prime);
    long[] right = monic(b, prime);
    while (right.length > 0) {
      long[] rest = remainder(left, right, prime);
      left = right;
      right = monic(rest, prime);
    }
    return left;
  }

  static long evaluate(long[] a, long point, long prime) {
    long value = 0;
    for (int i = a.length - 1; i >= 0; i--) {
      value = (value * point + a[i]) % prime;
    }
    return value;
  }
}
