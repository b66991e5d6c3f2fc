package gnomon.series;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/// The ways through many primes against the plain recurrences, for coefficients of every kind, at
/// lengths on both sides of the changes of method.
final class MultimodularLawsTest {

  private static final long SEED = 500_123;
  private static final int[] LENGTHS = {2, 3, 5, 23, 24, 25, 63, 64};
  private static final RationalCoefficients FIELD = RationalCoefficients.FIELD;

  private final Random random = new Random(SEED);

  /// Random coefficients, one method for each sort of denominators.
  private enum Sort {
    INTEGER,
    SMALL_DENOMINATOR,
    EXPONENTIAL,
    SHIFTED_EXPONENTIAL,
    RECIPROCAL,
    HUGE,
    SPARSE
  }

  private List<Rational> series(Sort sort, int length, Rational... first) {
    List<Rational> result = new ArrayList<>(List.of(first));
    BigInteger factorial = BigInteger.ONE;
    for (int n = 0; n < length; n++) {
      factorial = factorial.multiply(BigInteger.valueOf(Math.max(1, n)));
      if (n < first.length) {
        continue;
      }
      long small = random.nextInt(19) - 9;
      result.add(
          switch (sort) {
            case INTEGER -> Rational.of(small);
            case SMALL_DENOMINATOR -> Rational.of(small, 1 + random.nextInt(9));
            case EXPONENTIAL -> Rational.of(BigInteger.valueOf(small), factorial);
            case SHIFTED_EXPONENTIAL ->
                Rational.of(
                    BigInteger.valueOf(small), factorial.multiply(BigInteger.valueOf(n + 1)));
            case RECIPROCAL -> Rational.of(small, Math.max(1, n));
            case HUGE -> Rational.of(new BigInteger(200, random), BigInteger.valueOf(3));
            case SPARSE -> n % 5 == 0 ? Rational.of(small, 7) : Rational.ZERO;
          });
    }
    return result.subList(0, length);
  }

  private static String message(Sort sort, int length) {
    return sort + ", length " + length + ", seed " + SEED;
  }

  @Test
  void inversesAgreeWithTheRecurrence() {
    for (Sort sort : Sort.values()) {
      for (int length : LENGTHS) {
        List<Rational> a = series(sort, length, Rational.of(-3, 2));
        List<Rational> plain = SeriesAlgorithms.inverse(FIELD, a, length);
        assertEquals(plain, FIELD.inverse(a, length), message(sort, length));
        MultimodularSeries.inverse(a, length)
            .ifPresent(fast -> assertEquals(plain, fast, message(sort, length)));
      }
    }
  }

  @Test
  void exponentialsAndLogarithmsAgreeWithTheRecurrences() {
    for (Sort sort : Sort.values()) {
      for (int length : LENGTHS) {
        List<Rational> a = series(sort, length, Rational.ZERO);
        List<Rational> plain = SeriesAlgorithms.exp(FIELD, a, length);
        assertEquals(plain, FIELD.exp(a, length), message(sort, length));
        MultimodularSeries.exp(a, length)
            .ifPresent(fast -> assertEquals(plain, fast, message(sort, length)));
        List<Rational> b = series(sort, length, Rational.ONE);
        List<Rational> log = SeriesAlgorithms.log(FIELD, b, length);
        assertEquals(log, FIELD.log(b, length), message(sort, length));
        MultimodularSeries.log(b, length)
            .ifPresent(fast -> assertEquals(log, fast, message(sort, length)));
      }
    }
  }

  @Test
  void powersAgreeWithTheRecurrence() {
    for (Sort sort : Sort.values()) {
      for (int length : LENGTHS) {
        List<Rational> a = series(sort, length, Rational.ONE);
        for (Rational e : List.of(Rational.of(1, 2), Rational.of(-5, 6), Rational.of(7))) {
          List<Rational> plain = SeriesAlgorithms.power(FIELD, a, e, length);
          assertEquals(plain, FIELD.power(a, e, length), message(sort, length) + ", " + e);
          MultimodularSeries.power(a, e, length)
              .ifPresent(fast -> assertEquals(plain, fast, message(sort, length) + ", " + e));
        }
      }
    }
  }

  @Test
  void productsAgreeWithTheConvolution() {
    for (Sort sort : Sort.values()) {
      for (int length : LENGTHS) {
        List<Rational> a = series(sort, length);
        List<Rational> b = series(Sort.EXPONENTIAL, length, Rational.of(2, 7));
        List<Rational> plain = new ArrayList<>();
        for (int n = 0; n < length; n++) {
          plain.add(FIELD.convolution(a, b, n));
        }
        assertEquals(plain, FIELD.product(a, b, length), message(sort, length));
        MultimodularSeries.product(a, b, length)
            .ifPresent(fast -> assertEquals(plain, fast, message(sort, length)));
      }
    }
  }

  @Test
  void compositionsAndReversionsAgreeWithBabyStepsAndGiantSteps() {
    for (Sort sort : Sort.values()) {
      for (int length : new int[] {2, 3, 7, 8, 31, 32}) {
        List<Rational> inner = series(sort, length, Rational.ZERO, Rational.of(-2, 3));
        List<Rational> outer = series(sort, length, Rational.of(1, 5));
        List<Rational> plain = SeriesAlgorithms.compose(FIELD, outer, inner, length);
        assertEquals(plain, FIELD.compose(outer, inner, length), message(sort, length));
        MultimodularSeries.compose(outer, inner, length)
            .ifPresent(fast -> assertEquals(plain, fast, message(sort, length)));
        List<Rational> back = SeriesAlgorithms.reversion(FIELD, inner, length);
        assertEquals(back, FIELD.reversion(inner, length), message(sort, length));
        MultimodularSeries.reversion(inner, length)
            .ifPresent(fast -> assertEquals(back, fast, message(sort, length)));
      }
    }
  }

  @Test
  void theReversionOfTheReversionIsTheSeries() {
    for (Sort sort : Sort.values()) {
      int length = 40;
      List<Rational> f = series(sort, length, Rational.ZERO, Rational.ONE);
      assertEquals(f, FIELD.reversion(FIELD.reversion(f, length), length), message(sort, length));
    }
  }

  @Test
  void compositionIsAssociative() {
    int length = 36;
    List<Rational> f = series(Sort.RECIPROCAL, length, Rational.of(1, 2));
    List<Rational> g = series(Sort.EXPONENTIAL, length, Rational.ZERO);
    List<Rational> h = series(Sort.SMALL_DENOMINATOR, length, Rational.ZERO);
    assertEquals(
        FIELD.compose(FIELD.compose(f, g, length), h, length),
        FIELD.compose(f, FIELD.compose(g, h, length), length));
  }

  @Test
  void exponentialSeriesTakeTheFastWay() {
    int length = 40;
    for (Sort sort : List.of(Sort.INTEGER, Sort.EXPONENTIAL, Sort.SMALL_DENOMINATOR)) {
      List<Rational> f = series(sort, length, Rational.ZERO, Rational.ONE);
      assertTrue(MultimodularSeries.reversion(f, length).isPresent(), sort.toString());
      assertTrue(MultimodularSeries.compose(f, f, length).isPresent(), sort.toString());
      assertTrue(MultimodularSeries.exp(f, length).isPresent(), sort.toString());
    }
  }
}
