package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.Arrays;

/// The product of two sparse integer polynomials with packed monomials, in an open hash table.
///
/// Sums are kept in machine words where their final size provably fits, and in rationals (which
/// grow as needed) otherwise.
final class SparseProduct {

  private static final long EMPTY = -1;

  private final boolean narrow;
  private long[] keys;
  private long[] narrowSums;
  private Rational[] wideSums;
  private int used;

  /// Receives the terms of the product.
  interface Receiver {
    void accept(long key, Rational value);
  }

  SparseProduct(Product.IntegerTerms a, long[] aKeys, Product.IntegerTerms b, long[] bKeys) {
    int shorter = Math.min(aKeys.length, bKeys.length);
    narrow = a.bits() + b.bits() + Integer.SIZE - Integer.numberOfLeadingZeros(shorter) < 63;
    allocate(Integer.highestOneBit(4 * Math.max(aKeys.length, bKeys.length) + 4));
    if (narrow) {
      long[] aValues = longs(a.numerators());
      long[] bValues = longs(b.numerators());
      for (int i = 0; i < aKeys.length; i++) {
        Budget.checkpoint();
        for (int j = 0; j < bKeys.length; j++) {
          int place = place(aKeys[i] + bKeys[j]);
          narrowSums[place] += aValues[i] * bValues[j];
        }
      }
    } else {
      multiplyWide(rationals(a.numerators()), aKeys, rationals(b.numerators()), bKeys);
    }
  }

  private void multiplyWide(Rational[] a, long[] aKeys, Rational[] b, long[] bKeys) {
    for (int i = 0; i < aKeys.length; i++) {
      Budget.checkpoint();
      for (int j = 0; j < bKeys.length; j++) {
        int place = place(aKeys[i] + bKeys[j]);
        Rational product = a[i].times(b[j]);
        wideSums[place] = wideSums[place] == null ? product : wideSums[place].plus(product);
      }
    }
  }

  private static long[] longs(BigInteger[] values) {
    return Arrays.stream(values).mapToLong(BigInteger::longValueExact).toArray();
  }

  private static Rational[] rationals(BigInteger[] values) {
    return Arrays.stream(values).map(Rational::of).toArray(Rational[]::new);
  }

  private void allocate(int capacity) {
    keys = new long[capacity];
    Arrays.fill(keys, EMPTY);
    narrowSums = new long[narrow ? capacity : 0];
    wideSums = new Rational[narrow ? 0 : capacity];
    used = 0;
  }

  /// The place of `key`, claimed when it is new.
  private int place(long key) {
    if (2 * used >= keys.length) {
      grow();
    }
    int mask = keys.length - 1;
    int place = (int) ((key * 0x9E3779B97F4A7C15L) >>> 33) & mask;
    while (keys[place] != key) {
      if (keys[place] == EMPTY) {
        keys[place] = key;
        used++;
        return place;
      }
      place = (place + 1) & mask;
    }
    return place;
  }

  private void grow() {
    long[] oldKeys = keys;
    long[] oldNarrow = narrowSums;
    Rational[] oldWide = wideSums;
    Budget.charge(oldKeys.length);
    allocate(Math.multiplyExact(oldKeys.length, 2));
    for (int i = 0; i < oldKeys.length; i++) {
      if (oldKeys[i] != EMPTY) {
        int place = place(oldKeys[i]);
        if (narrow) {
          narrowSums[place] = oldNarrow[i];
        } else {
          wideSums[place] = oldWide[i];
        }
      }
    }
  }

  /// Hands every claimed key with its sum, which may be 0, to `receiver`.
  void forEach(Receiver receiver) {
    for (int i = 0; i < keys.length; i++) {
      if (keys[i] != EMPTY) {
        receiver.accept(keys[i], narrow ? Rational.of(narrowSums[i]) : wideSums[i]);
      }
    }
  }
}
