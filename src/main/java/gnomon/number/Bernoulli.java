package gnomon.number;

import gnomon.algebra.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// Bernoulli numbers from the tangent numbers T_1, T_2, ..., which are integers: B_2m = (-1)^(m-1)
/// 2m T_m / (4^m (4^m - 1)).
///
/// The tangent numbers up to T_m come from one triangle of m^2/2 products by small integers,
/// without any division.
final class Bernoulli {

  private static final int ODD_ONE = 1;

  private Bernoulli() {}

  static Rational number(int n) {
    if (n > ODD_ONE && n % 2 == 1) {
      return Rational.ZERO;
    }
    return n <= ODD_ONE ? numbers(n).getLast() : fromTangent(n / 2, tangentNumbers(n / 2)[n / 2]);
  }

  static List<Rational> numbers(int n) {
    List<Rational> numbers = new ArrayList<>(n + 1);
    numbers.add(Rational.ONE);
    if (n >= ODD_ONE) {
      numbers.add(Rational.of(-1, 2));
    }
    BigInteger[] tangents = tangentNumbers(n / 2);
    for (int index = 2; index <= n; index++) {
      numbers.add(index % 2 == 1 ? Rational.ZERO : fromTangent(index / 2, tangents[index / 2]));
    }
    return List.copyOf(numbers);
  }

  private static Rational fromTangent(int m, BigInteger tangent) {
    BigInteger fourPower = BigInteger.ONE.shiftLeft(2 * m);
    Rational size =
        Rational.of(
            tangent.multiply(BigInteger.valueOf(2L * m)),
            fourPower.multiply(fourPower.subtract(BigInteger.ONE)));
    return m % 2 == 1 ? size : size.negated();
  }

  /// The tangent numbers at indices 1 to `count`; index 0 is unused.
  private static BigInteger[] tangentNumbers(int count) {
    Budget.charge((long) count * count / Long.SIZE * 16 + 1);
    BigInteger[] row = new BigInteger[count + 1];
    row[0] = BigInteger.ZERO;
    BigInteger start = BigInteger.ONE;
    for (int k = 1; k <= count; k++) {
      row[k] = start;
      start = start.multiply(BigInteger.valueOf(k));
    }
    for (int k = 2; k <= count; k++) {
      Budget.checkpoint();
      for (int j = k; j <= count; j++) {
        row[j] =
            row[j - 1]
                .multiply(BigInteger.valueOf(j - (long) k))
                .add(row[j].multiply(BigInteger.valueOf(j - (long) k + 2)));
      }
    }
    return row;
  }
}
