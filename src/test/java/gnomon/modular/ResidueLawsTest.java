package gnomon.modular;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Budget;
import gnomon.algebra.Halt;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;

/// Laws of series modulo a prime, and the fast ways against the plain ones, at lengths on both
/// sides of every change of method.
final class ResidueLawsTest {

  private static final long SEED = 20260411;
  private static final int[] LENGTHS = {
    1, 2, 3, 5, 16, 31, 32, 33, 63, 65, 100, 191, 192, 193, 257, 600
  };
  private static final List<PrimeField> FIELDS =
      List.of(
          new PrimeField(998_244_353), new PrimeField(12_289), Primes.forProduct(13, 1).getFirst());

  private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(SEED);

  private int[] series(PrimeField field, int length, int... first) {
    int[] result = new int[length];
    for (int i = 0; i < length; i++) {
      result[i] = i < first.length ? first[i] : random.nextInt(field.prime());
    }
    return result;
  }

  private static int[] identity(int length) {
    int[] result = new int[length];
    if (length > 1) {
      result[1] = 1;
    }
    return result;
  }

  private static int[] schoolbook(PrimeField field, int[] a, int[] b, int length) {
    int[] result = new int[length];
    for (int i = 0; i < Math.min(length, a.length); i++) {
      for (int j = 0; j < b.length && i + j < length; j++) {
        result[i + j] = field.plus(result[i + j], field.times(a[i], b[j]));
      }
    }
    return result;
  }

  /// Horner's scheme.
  private static int[] plainComposition(PrimeField field, int[] outer, int[] inner, int length) {
    int[] result = new int[length];
    for (int k = Math.min(length, outer.length) - 1; k >= 0; k--) {
      result = schoolbook(field, result, inner, length);
      result[0] = field.plus(result[0], outer[k]);
    }
    return result;
  }

  private static String message(PrimeField field, int length) {
    return field + ", length " + length + ", seed " + SEED;
  }

  @Test
  void transformsTakeEveryLengthThereAndBack() {
    for (PrimeField field : FIELDS) {
      Transform transform = new Transform(field, 4096);
      for (int length = 1; length <= 4096; length *= 2) {
        int[] x = series(field, length);
        int[] y = x.clone();
        transform.forward(y, length);
        assertTrue(Arrays.stream(y).allMatch(v -> 0 <= v && v < field.prime()));
        transform.inverse(y, length);
        assertArrayEquals(x, y, message(field, length));
      }
    }
  }

  @Test
  void transformsOfLargestResiduesDoNotOverflow() {
    PrimeField near = Primes.forProduct(13, 1).getFirst();
    Transform transform = new Transform(near, 4096);
    int[] x = new int[4096];
    Arrays.fill(x, near.prime() - 1);
    int[] y = x.clone();
    transform.forward(y, 4096);
    assertEquals(near.times(near.prime() - 1, 4096), y[0]);
    assertTrue(Arrays.stream(y).skip(1).allMatch(v -> v == 0));
    transform.inverse(y, 4096);
    assertArrayEquals(x, y);
  }

  @Test
  void productsAgreeWithTheSchoolbook() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] a = series(field, length);
        int[] b = series(field, Math.max(1, length - 3));
        assertArrayEquals(
            schoolbook(field, a, b, length), ring.product(a, b, length), message(field, length));
        assertArrayEquals(schoolbook(field, a, a, length), ring.product(a, a, length));
      }
    }
  }

  @Test
  void inversesUndoProducts() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] a = series(field, length, 1 + random.nextInt(field.prime() - 1));
        int[] one = new int[length];
        one[0] = 1;
        assertArrayEquals(
            one, schoolbook(field, a, ring.inverse(a, length), length), message(field, length));
      }
    }
  }

  @Test
  void logarithmsUndoExponentialsAndSumsBecomeProducts() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] a = series(field, length, 0);
        int[] b = series(field, length, 0);
        int[] e = ring.exp(a, length);
        assertArrayEquals(a, ring.log(e, length), message(field, length));
        int[] sum = new int[length];
        for (int i = 0; i < length; i++) {
          sum[i] = field.plus(a[i], b[i]);
        }
        assertArrayEquals(ring.exp(sum, length), schoolbook(field, e, ring.exp(b, length), length));
      }
    }
  }

  @Test
  void rootsAndPowersUndoEachOther() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] a = series(field, length, 1);
        int[] root = ring.squareRoot(a, length);
        assertArrayEquals(a, schoolbook(field, root, root, length), message(field, length));
        assertArrayEquals(root, ring.power(a, field.inverse(2), length));
        assertArrayEquals(ring.inverse(a, length), ring.power(a, field.of(-1), length));
      }
    }
  }

  @Test
  void compositionsAgreeWithHornersScheme() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] outer = series(field, length);
        int[] inner = series(field, length, 0);
        assertArrayEquals(
            plainComposition(field, outer, inner, length),
            ring.compose(outer, inner, length),
            message(field, length));
      }
    }
  }

  @Test
  void projectionIsTheTransposeOfComposition() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] inner = series(field, length, 0);
        int[] outer = series(field, length);
        int[] weights = series(field, length);
        PowerProjection powers = new PowerProjection(ring, inner, length);
        assertEquals(
            dot(field, powers.project(weights), outer),
            dot(field, powers.combination(outer, length), weights),
            message(field, length));
      }
    }
  }

  private static int dot(PrimeField field, int[] a, int[] b) {
    int sum = 0;
    for (int i = 0; i < Math.min(a.length, b.length); i++) {
      sum = field.plus(sum, field.times(a[i], b[i]));
    }
    return sum;
  }

  @Test
  void compositionIsAssociative() {
    PrimeField field = FIELDS.getFirst();
    for (int length : new int[] {2, 40, 333, 2048}) {
      ResidueSeries ring = new ResidueSeries(field, length);
      int[] f = series(field, length);
      int[] g = series(field, length, 0);
      int[] h = series(field, length, 0);
      assertArrayEquals(
          ring.compose(ring.compose(f, g, length), h, length),
          ring.compose(f, ring.compose(g, h, length), length),
          message(field, length));
    }
  }

  @Test
  void reversionsAreInversesOnBothSides() {
    for (PrimeField field : FIELDS) {
      for (int length : LENGTHS) {
        ResidueSeries ring = new ResidueSeries(field, length);
        int[] f = series(field, length, 0, 1 + random.nextInt(field.prime() - 1));
        int[] g = ring.reversion(f, length);
        assertArrayEquals(
            identity(length), plainComposition(field, f, g, length), message(field, length));
        assertArrayEquals(identity(length), ring.compose(g, f, length));
        assertArrayEquals(f, ring.reversion(g, length));
      }
    }
  }

  @Test
  void primesArePrimeAndTheirProductIsLargeEnough() {
    BigInteger product = BigInteger.ONE;
    for (PrimeField field : Primes.forProduct(14, 1000)) {
      assertTrue(BigInteger.valueOf(field.prime()).isProbablePrime(40));
      assertTrue(field.twoAdicOrder() >= 14);
      product = product.multiply(BigInteger.valueOf(field.prime()));
    }
    assertTrue(product.bitLength() > 1000);
    for (int n = 0; n < 20_000; n++) {
      assertEquals(BigInteger.valueOf(n).isProbablePrime(40), Primes.isPrime(n), "" + n);
    }
  }

  @Test
  void modulesThatAreNoOddPrimesBelowTheBoundAreRefused() {
    for (int modulus : new int[] {0, 1, 2, 9, 1 << 30, Integer.MAX_VALUE, -7}) {
      assertThrows(IllegalArgumentException.class, () -> new PrimeField(modulus), "" + modulus);
    }
  }

  @Test
  void longWorkStopsWhenCancelled() {
    PrimeField field = FIELDS.getFirst();
    ResidueSeries ring = new ResidueSeries(field, 1 << 12);
    int[] f = series(field, 1 << 12, 0, 1);
    Budget budget = Budget.unlimited();
    budget.cancel();
    assertThrows(Halt.class, () -> budget.run(() -> ring.reversion(f, 1 << 12)));
  }
}
