package gnomon.modular;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;

/// Integers from their residues modulo many primes, and residues from integers, both for whole lists
/// at once.
///
/// With M = p_1 … p_k, M_i = M/p_i and s_i = x/M_i modulo p_i, an integer x with |x| < M/4 is
///
///     x = Σ_i s_i M_i − q M,   q the integer nearest to Σ_i s_i/p_i,
///
/// and the estimate of q in 32 binary places cannot miss, since x/M is less than 1/4. The sums run
/// over digits of 28 bits in vectors of machine words: a product of matrices, (numbers × primes) by
/// (primes × digits). In the other direction Σ_j d_j (2^(28 j) modulo p_i) is the product of
/// (numbers × digits) by (digits × primes).
///
/// Cost: numbers × k² short products, k the number of primes; no division of long numbers. Source:
/// the explicit Chinese remainder theorem in the form of P. L. Montgomery, R. D. Silverman, An FFT
/// extension to the P − 1 factoring algorithm, Math. Comp. 54 (1990), and D. J. Bernstein, Modular
/// exponentiation via the explicit Chinese remainder theorem (2007), from memory.
public final class ChineseRemainder {

  private static final int DIGIT = 28;
  private static final int MASK = (1 << DIGIT) - 1;

  /// So many products of a residue and a digit, below 2^58 each, fit one word beside a carry.
  private static final int FOLD = 16;

  private final PrimeField[] fields;
  private final BigInteger modulus;

  /// 1/M_i modulo p_i.
  private final int[] weights;

  /// ⌊2^32 weight/p_i⌋, for products by a known factor, and ⌊2^62/p_i⌋.
  private final long[] weightQuotients;

  private final long[] reciprocals;

  /// The digits of M_1, …, M_k, and of M.
  private final int[][] cofactors;

  private final int[] whole;

  /// The residues for the given primes, all different.
  public ChineseRemainder(List<PrimeField> primes) {
    fields = primes.toArray(PrimeField[]::new);
    Budget.charge((long) fields.length * fields.length);
    modulus = product(0, fields.length);
    int length = modulus.bitLength() / DIGIT + 3;
    weights = new int[fields.length];
    weightQuotients = new long[fields.length];
    reciprocals = new long[fields.length];
    cofactors = new int[fields.length][];
    whole = digits(modulus, length);
    for (int i = 0; i < fields.length; i++) {
      Budget.checkpoint();
      cofactors[i] = quotient(whole, fields[i].prime());
      weights[i] = fields[i].inverse(residue(cofactors[i], fields[i]));
      weightQuotients[i] = ((long) weights[i] << Integer.SIZE) / fields[i].prime();
      reciprocals[i] = (1L << 62) / fields[i].prime();
    }
  }

  private BigInteger product(int from, int to) {
    if (to - from <= 1) {
      return to == from ? BigInteger.ONE : BigInteger.valueOf(fields[from].prime());
    }
    int middle = (from + to) >>> 1;
    return product(from, middle).multiply(product(middle, to));
  }

  private static int[] quotient(int[] digits, long divisor) {
    int[] result = new int[digits.length];
    long rest = 0;
    for (int j = digits.length - 1; j >= 0; j--) {
      long value = rest << DIGIT | digits[j];
      result[j] = (int) (value / divisor);
      rest = value % divisor;
    }
    return result;
  }

  private static int residue(int[] digits, PrimeField field) {
    long rest = 0;
    for (int j = digits.length - 1; j >= 0; j--) {
      rest = (rest << DIGIT | digits[j]) % field.prime();
    }
    return (int) rest;
  }

  /// The digits of a number of at least 0, lowest first.
  private static int[] digits(BigInteger value, int length) {
    int[] digits = new int[length];
    byte[] bytes = value.toByteArray();
    long buffer = 0;
    int held = 0;
    int j = 0;
    for (int i = bytes.length - 1; i >= 0; i--) {
      buffer |= (bytes[i] & 0xFFL) << held;
      held += Byte.SIZE;
      if (held >= DIGIT) {
        digits[j++] = (int) (buffer & MASK);
        buffer >>>= DIGIT;
        held -= DIGIT;
      }
    }
    if (buffer != 0) {
      digits[j] = (int) buffer;
    }
    return digits;
  }

  /// The product of the primes.
  public BigInteger modulus() {
    return modulus;
  }

  /// The integers x_0, …, x_(count−1) with |x| < M/4 whose residues modulo the i-th prime are
  /// `residues[i]`.
  public BigInteger[] integers(int[][] residues, int count) {
    BigInteger[] result = new BigInteger[count];
    long[] sums = new long[whole.length];
    for (int n = 0; n < count; n++) {
      Budget.checkpoint();
      result[n] = integer(residues, n, sums);
    }
    return result;
  }

  private BigInteger integer(int[][] residues, int n, long[] sums) {
    Arrays.fill(sums, 0);
    long fraction = 0;
    for (int i = 0; i < fields.length; i++) {
      long residue = residues[i][n];
      long p = fields[i].prime();
      long weight = residue * weights[i] - (residue * weightQuotients[i] >>> Integer.SIZE) * p;
      weight = weight >= p ? weight - p : weight;
      if (weight != 0) {
        fraction += weight * reciprocals[i] >> PrimeField.BITS;
        addProduct(sums, cofactors[i], weight);
      }
      if (i % FOLD == FOLD - 1) {
        carry(sums);
      }
    }
    long quotient = (fraction + (1L << (Integer.SIZE - 1))) >> Integer.SIZE;
    carry(sums);
    addProduct(sums, whole, -quotient);
    carry(sums);
    return signed(sums);
  }

  private static void addProduct(long[] sums, int[] digits, long factor) {
    for (int j = 0; j < sums.length; j++) {
      sums[j] += digits[j] * factor;
    }
  }

  /// Leaves digits from 0 to 2^28 − 1, but for the highest, which keeps the sign.
  private static void carry(long[] sums) {
    long carry = 0;
    int last = sums.length - 1;
    for (int j = 0; j < last; j++) {
      long value = sums[j] + carry;
      sums[j] = value & MASK;
      carry = value >> DIGIT;
    }
    sums[last] += carry;
  }

  private static BigInteger signed(long[] digits) {
    int top = digits.length - 1;
    boolean negative = digits[top] < 0;
    if (negative) {
      for (int j = 0; j <= top; j++) {
        digits[j] = -digits[j];
      }
      carry(digits);
    }
    while (top >= 0 && digits[top] == 0) {
      top--;
    }
    if (top < 2) {
      long value = top < 0 ? 0 : top == 0 ? digits[0] : digits[1] << DIGIT | digits[0];
      return BigInteger.valueOf(negative ? -value : value);
    }
    byte[] bytes = new byte[(top + 1) * DIGIT / Byte.SIZE + 2];
    int at = bytes.length - 1;
    long buffer = 0;
    int held = 0;
    for (int j = 0; j <= top; j++) {
      buffer |= digits[j] << held;
      held += DIGIT;
      while (held >= Byte.SIZE) {
        bytes[at--] = (byte) buffer;
        buffer >>>= Byte.SIZE;
        held -= Byte.SIZE;
      }
    }
    bytes[at] = (byte) buffer;
    return new BigInteger(negative ? -1 : 1, bytes);
  }

  /// The residues of the values: row i modulo the i-th prime.
  public int[][] residues(BigInteger[] values) {
    int[][] result = new int[fields.length][values.length];
    int bits = 0;
    for (BigInteger value : values) {
      bits = Math.max(bits, value.bitLength());
    }
    if (bits < Long.SIZE) {
      ofWords(values, result);
    } else {
      ofDigits(values, bits / DIGIT + 1, result);
    }
    return result;
  }

  private void ofWords(BigInteger[] values, int[][] result) {
    for (int n = 0; n < values.length; n++) {
      long value = values[n].longValue();
      for (int i = 0; i < fields.length; i++) {
        result[i][n] = fields[i].of(value);
      }
    }
  }

  private void ofDigits(BigInteger[] values, int length, int[][] result) {
    Budget.charge((long) length * fields.length / 2);
    int[][] powers = new int[length + 1][fields.length];
    int[] fold = new int[fields.length];
    for (int i = 0; i < fields.length; i++) {
      int power = 1;
      int base = fields[i].of(1L << DIGIT);
      fold[i] = fields[i].of(1L << Integer.SIZE);
      for (int j = 0; j <= length; j++) {
        powers[j][i] = power;
        power = fields[i].times(power, base);
      }
    }
    long[] sums = new long[fields.length];
    for (int n = 0; n < values.length; n++) {
      Budget.checkpoint();
      Arrays.fill(sums, 0);
      int[] digits = digits(values[n].abs(), length + 1);
      int used = values[n].bitLength() / DIGIT + 1;
      for (int j = 0; j < used; j++) {
        addProduct(sums, powers[j], digits[j]);
        if (j % FOLD == FOLD - 1) {
          fold(sums, fold);
        }
      }
      boolean negative = values[n].signum() < 0;
      for (int i = 0; i < fields.length; i++) {
        int residue = (int) (sums[i] % fields[i].prime());
        result[i][n] = negative ? fields[i].negated(residue) : residue;
      }
    }
  }

  /// s ← (s mod 2^32) + ⌊s/2^32⌋ (2^32 mod p), below 2^61.
  private static void fold(long[] sums, int[] word) {
    for (int i = 0; i < sums.length; i++) {
      long sum = sums[i];
      sums[i] = (sum & 0xFFFFFFFFL) + (sum >>> Integer.SIZE) * word[i];
    }
  }
}
