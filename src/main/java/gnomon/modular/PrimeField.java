package gnomon.modular;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.math.BigInteger;

/// The field of the integers modulo an odd prime p below 2^30.
///
/// Elements are `int` values from 0 to p − 1. The bound leaves room for residues up to 4p in an
/// unsigned 32-bit word, which is what the transform's lazy reductions need.
///
/// Whole rows are multiplied by Barrett's reduction: for x < 2^(2k), k the number of bits of p, and
/// μ = ⌊2^(2k)/p⌋, the number ⌊⌊x/2^(k−2)⌋ μ/2^(k+2)⌋ is ⌊x/p⌋ or at most two less.
///
/// Source: P. Barrett, Implementing the RSA public key encryption algorithm on a standard DSP
/// (CRYPTO '86); the error bound after A. Menezes, P. van Oorschot, S. Vanstone, Handbook of
/// Applied Cryptography, 14.3.3, from memory.
///
/// @param prime p
public record PrimeField(int prime) {

  /// The primes have at most this many bits.
  static final int BITS = 30;

  private static final int BLOCK = 1024;

  /// @throws IllegalArgumentException unless `prime` is an odd prime below 2^30
  public PrimeField {
    if (prime < 3 || prime >= 1 << BITS || !Primes.isPrime(prime)) {
      throw new IllegalArgumentException(prime + " is not an odd prime below 2^30");
    }
  }

  /// The residue of any integer of the `long` range.
  public int of(long value) {
    long residue = value % prime;
    return (int) (residue < 0 ? residue + prime : residue);
  }

  /// The residue of an integer.
  public int of(BigInteger value) {
    return value.bitLength() < Long.SIZE
        ? of(value.longValue())
        : value.mod(BigInteger.valueOf(prime)).intValue();
  }

  /// a + b.
  public int plus(int a, int b) {
    int sum = a + b - prime;
    return sum < 0 ? sum + prime : sum;
  }

  /// a − b.
  public int minus(int a, int b) {
    int difference = a - b;
    return difference < 0 ? difference + prime : difference;
  }

  /// −a.
  public int negated(int a) {
    return a == 0 ? 0 : prime - a;
  }

  /// a b.
  public int times(int a, int b) {
    return (int) ((long) a * b % prime);
  }

  /// a^exponent for an exponent of at least 0.
  public int power(int a, long exponent) {
    return (int) power(a, exponent, prime);
  }

  static long power(long base, long exponent, long modulus) {
    long result = 1 % modulus;
    long square = base % modulus;
    for (long rest = exponent; rest > 0; rest >>= 1) {
      if ((rest & 1) == 1) {
        result = result * square % modulus;
      }
      square = square * square % modulus;
    }
    return result;
  }

  /// 1/a, by the extended Euclidean algorithm.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for 0
  public int inverse(int a) {
    if (a == 0) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, 1);
    }
    long high = prime;
    long low = a;
    long before = 0;
    long factor = 1;
    while (low != 0) {
      long quotient = high / low;
      long rest = high - quotient * low;
      high = low;
      low = rest;
      long next = before - quotient * factor;
      before = factor;
      factor = next;
    }
    return of(before);
  }

  /// The list 0, 1/1, 1/2, …, 1/(n−1), from 1/i = −⌊p/i⌋/(p mod i).
  ///
  /// @throws IllegalArgumentException when n is above p
  public int[] inverses(int n) {
    if (n > prime) {
      throw new IllegalArgumentException("no inverse of p modulo p");
    }
    int[] inverses = new int[n];
    if (n > 1) {
      inverses[1] = 1;
    }
    for (int i = 2; i < n; i++) {
      inverses[i] = negated(times(prime / i, inverses[prime % i]));
    }
    return inverses;
  }

  /// The largest s for which 2^s divides p − 1: the field has roots of unity of order 2^s.
  public int twoAdicOrder() {
    return Integer.numberOfTrailingZeros(prime - 1);
  }

  /// A primitive root of unity of order 2^log.
  ///
  /// @throws IllegalArgumentException when log is above [#twoAdicOrder()]
  public int rootOfUnity(int log) {
    if (log > twoAdicOrder()) {
      throw new IllegalArgumentException("no root of unity of order 2^" + log);
    }
    int candidate = 2;
    while (power(candidate, (prime - 1) / 2) == 1) {
      candidate++;
    }
    return power(candidate, (prime - 1) >> log);
  }

  /// Puts a_i b_i to `product`, which may be one of the factors, for the first `length` places.
  public void times(int[] a, int[] b, int[] product, int length) {
    int bits = Integer.SIZE - Integer.numberOfLeadingZeros(prime);
    long reciprocal = (1L << 2 * bits) / prime;
    long[] row = new long[Math.min(BLOCK, length)];
    for (int from = 0; from < length; from += BLOCK) {
      int count = Math.min(BLOCK, length - from);
      multiply(a, b, from, row, count);
      reduce(row, count, bits, reciprocal, prime);
      narrow(row, product, from, count, prime);
    }
  }

  /// The products without reduction.
  private static void multiply(int[] a, int[] b, int from, long[] row, int count) {
    for (int i = 0; i < count; i++) {
      row[i] = (long) a[from + i] * (long) b[from + i];
    }
  }

  /// Barrett's reduction to below 3p.
  private static void reduce(long[] row, int count, int bits, long reciprocal, long p) {
    int first = bits - 2;
    int second = bits + 2;
    for (int i = 0; i < count; i++) {
      long x = row[i];
      row[i] = x - ((x >>> first) * reciprocal >>> second) * p;
    }
  }

  /// From below 3p to below p.
  private static void narrow(long[] row, int[] product, int from, int count, long p) {
    for (int i = 0; i < count; i++) {
      long x = row[i] - p;
      row[i] = x + ((x >> 63) & p);
    }
    for (int i = 0; i < count; i++) {
      long x = row[i] - p;
      product[from + i] = (int) (x + ((x >> 63) & p));
    }
  }

  @Override
  public String toString() {
    return "integers modulo " + prime;
  }
}
