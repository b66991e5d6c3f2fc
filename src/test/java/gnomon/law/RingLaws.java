package gnomon.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Ring;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// The laws of a commutative ring on seeded random elements.
///
/// @param <E> the element type
public abstract class RingLaws<E extends Ring<E>> {

  private static final int ROUNDS = 200;

  /// A random element; zero, one and large elements must be among them.
  protected abstract E random(RandomGenerator random);

  protected abstract E zero();

  protected abstract E one();

  /// A law on three random elements.
  private interface Law<E> {
    void check(E a, E b, E c);
  }

  private void each(Law<E> law) {
    Seeded.each(1_000, ROUNDS, r -> law.check(random(r), random(r), random(r)));
  }

  private static <E> void assertSame(E left, E right) {
    assertEquals(left, right);
    assertEquals(left.hashCode(), right.hashCode());
  }

  @Test
  void additionIsAssociativeAndCommutative() {
    each(
        (a, b, c) -> {
          assertSame(a.plus(b).plus(c), a.plus(b.plus(c)));
          assertSame(a.plus(b), b.plus(a));
        });
  }

  @Test
  void multiplicationIsAssociativeAndCommutative() {
    each(
        (a, b, c) -> {
          assertSame(a.times(b).times(c), a.times(b.times(c)));
          assertSame(a.times(b), b.times(a));
        });
  }

  @Test
  void multiplicationDistributesOverAddition() {
    each((a, b, c) -> assertSame(a.plus(b).times(c), a.times(c).plus(b.times(c))));
  }

  @Test
  void zeroAndOneAreNeutral() {
    each(
        (a, b, _) -> {
          assertSame(a, a.plus(zero()));
          assertSame(a, a.times(one()));
          assertSame(zero(), a.times(zero()));
          assertEquals(a.equals(zero()), a.isZero());
          assertEquals(b.equals(one()), b.isOne());
        });
    assertNotEquals(zero(), one());
  }

  @Test
  void subtractionUndoesAddition() {
    each(
        (a, b, _) -> {
          assertSame(a, a.plus(b).minus(b));
          assertTrue(a.minus(a).isZero());
          assertSame(a.minus(b), b.minus(a).negated());
        });
  }

  @Test
  void powersAreRepeatedProducts() {
    each(
        (a, _, _) -> {
          E product = one();
          for (int exponent = 0; exponent <= 5; exponent++) {
            assertSame(product, a.power(exponent));
            product = product.times(a);
          }
        });
  }

  @Test
  void productsOfNonZeroElementsAreNotZero() {
    each((a, b, _) -> assertEquals(a.isZero() || b.isZero(), a.times(b).isZero()));
  }
}
