package gnomon.number;

import java.math.BigInteger;
import java.util.List;
import java.util.random.RandomGenerator;

/// Random rationals of every size, with the edges of machine words well represented.
public final class RandomNumbers {

  private static final List<Long> EDGES =
      List.of(
          0L,
          1L,
          -1L,
          2L,
          (1L << 31) - 1,
          1L << 31,
          -(1L << 31),
          -(1L << 31) - 1,
          1L << 32,
          (1L << 62) + 1,
          Long.MAX_VALUE,
          -Long.MAX_VALUE,
          Long.MIN_VALUE);

  private RandomNumbers() {}

  /// A random integer of up to `bits` bits, of either sign.
  public static BigInteger integer(RandomGenerator random, int bits) {
    byte[] bytes = new byte[bits / Byte.SIZE + 1];
    random.nextBytes(bytes);
    return new BigInteger(bytes).shiftRight(random.nextInt(bits + 1));
  }

  /// A random rational.
  public static Rational rational(RandomGenerator random) {
    return Rational.of(part(random), nonZero(random));
  }

  private static BigInteger nonZero(RandomGenerator random) {
    BigInteger part = random.nextBoolean() ? BigInteger.ONE : part(random);
    return part.signum() == 0 ? BigInteger.ONE : part;
  }

  private static BigInteger part(RandomGenerator random) {
    return switch (random.nextInt(4)) {
      case 0 -> BigInteger.valueOf(EDGES.get(random.nextInt(EDGES.size())));
      case 1 -> BigInteger.valueOf(random.nextInt(-20, 21));
      case 2 -> BigInteger.valueOf(random.nextLong());
      default -> integer(random, 200);
    };
  }
}
