package gnomon.polynomial;

import java.math.BigInteger;
import java.util.Arrays;

/// A row of integers that are changed in place: the working form of Horner schemes and difference
/// tables, where every step multiplies by a small number and adds.
///
/// Each integer is kept in two's complement, low word first, in as many words as its value needs;
/// sums therefore need no case distinction by sign.
final class IntegerRow {

  private static final long WORD = 0xFFFFFFFFL;

  private final int[][] words;
  private final int[] lengths;

  IntegerRow(BigInteger[] values) {
    words = new int[values.length][];
    lengths = new int[values.length];
    for (int i = 0; i < values.length; i++) {
      put(i, values[i]);
    }
  }

  int length() {
    return lengths.length;
  }

  void put(int place, BigInteger value) {
    byte[] bytes = value.toByteArray();
    int count = (bytes.length + Integer.BYTES - 1) / Integer.BYTES;
    int[] its = new int[count + 2];
    Arrays.fill(its, value.signum() < 0 ? -1 : 0);
    for (int i = 0; i < bytes.length; i++) {
      int fromLow = bytes.length - 1 - i;
      int shift = Byte.SIZE * (fromLow % Integer.BYTES);
      int word = fromLow / Integer.BYTES;
      its[word] = its[word] & ~(0xFF << shift) | (bytes[i] & 0xFF) << shift;
    }
    words[place] = its;
    lengths[place] = count;
  }

  BigInteger value(int place) {
    int count = lengths[place];
    byte[] bytes = new byte[Integer.BYTES * count];
    for (int i = 0; i < bytes.length; i++) {
      int fromLow = bytes.length - 1 - i;
      bytes[i] =
          (byte) (words[place][fromLow / Integer.BYTES] >> Byte.SIZE * (fromLow % Integer.BYTES));
    }
    return new BigInteger(bytes);
  }

  BigInteger[] values() {
    BigInteger[] values = new BigInteger[lengths.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = value(i);
    }
    return values;
  }

  /// Puts `factor` times the integer at `scaled` plus the integer at `added` to `place`, which may
  /// be one of both; `factor` is at least 0.
  void combine(int place, int scaled, int factor, int added) {
    int[] a = words[scaled];
    int[] b = words[added];
    int aLength = lengths[scaled];
    int bLength = lengths[added];
    int length = Math.max(aLength + 1, bLength) + 1;
    int[] sum = words[place];
    if (sum.length < length) {
      sum = new int[length + length / 4];
    }
    int common = Math.min(aLength, bLength);
    int aSign = a[aLength - 1] >> 31;
    int bSign = b[bLength - 1] >> 31;
    long carry = 0;
    int i = 0;
    for (; i < common; i++) {
      carry += (a[i] & WORD) * factor + (b[i] & WORD);
      sum[i] = (int) carry;
      carry >>>= Integer.SIZE;
    }
    for (; i < length; i++) {
      long left = (i < aLength ? a[i] : aSign) & WORD;
      long right = (i < bLength ? b[i] : bSign) & WORD;
      carry += left * factor + right;
      sum[i] = (int) carry;
      carry >>>= Integer.SIZE;
    }
    words[place] = sum;
    lengths[place] = trimmed(sum, length);
  }

  /// Adds a small multiple; see [#combine(int, int, int, int)].
  void add(int place, int added) {
    combine(place, added, 1, place);
  }

  private static int trimmed(int[] value, int length) {
    int count = length;
    while (count > 1 && value[count - 1] == value[count - 2] >> 31) {
      count--;
    }
    return count;
  }
}
