package gnomon.number;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.law.Seeded;
import gnomon.reference.ReferenceTable;
import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import org.junit.jupiter.api.Test;

class IntegersTest {

  private static List<Rational> rationals(List<BigInteger> row) {
    return row.stream().map(Rational::of).toList();
  }

  /// Source: references/triangles-and-sequences.tsv (DLMF 26.8, 5.2) and bernoulli-euler.tsv (DLMF
  /// 24.2).
  @Test
  void trianglesAndBernoulliNumbersAgreeWithPublishedTables() {
    int checked = 0;
    for (ReferenceTable.Row row : ReferenceTable.rows("triangles-and-sequences.tsv")) {
      int n = Integer.parseInt(row.text("n").isEmpty() ? "0" : row.text("n"));
      Optional<List<BigInteger>> ours =
          switch (row.text("object")) {
            case "stirling1-signed" -> Optional.of(Integers.stirlingFirstRow(n));
            case "stirling2" -> Optional.of(Integers.stirlingSecondRow(n));
            case "lah-unsigned" -> Optional.of(Integers.lahRow(n));
            default -> Optional.empty();
          };
      if (ours.isPresent()) {
        List<Rational> published = row.numbers("values");
        int first = Integer.parseInt(row.text("first_index"));
        assertEquals(published, rationals(ours.get()).subList(first, n + 1), row.toString());
        checked++;
      }
    }
    for (ReferenceTable.Row row : ReferenceTable.rows("bernoulli-euler.tsv")) {
      if (row.text("object").equals("bernoulli-number")) {
        int n = Integer.parseInt(row.text("n"));
        assertEquals(row.numbers("values"), List.of(Integers.bernoulli(n)), row.toString());
        checked++;
      }
    }
    assertTrue(checked > 40, "rows checked: " + checked);
  }

  /// The recurrence that defines Bernoulli numbers, DLMF 24.5.3 (from memory).
  @Test
  void bernoulliNumbersSatisfyTheirRecurrence() {
    List<Rational> numbers = Integers.bernoulliNumbers(60);
    for (int n = 2; n <= 61; n++) {
      Rational sum = Rational.ZERO;
      for (int k = 0; k < n; k++) {
        sum = sum.plus(numbers.get(k).times(Rational.of(Integers.binomial(n, k))));
      }
      assertTrue(sum.isZero(), "n = " + n);
    }
    for (int n = 0; n <= 60; n++) {
      assertEquals(numbers.get(n), Integers.bernoulli(n));
    }
  }

  /// The theorem of von Staudt and Clausen (from memory).
  @Test
  void denominatorsOfBernoulliNumbersAreProductsOfPrimes() {
    for (int n : new int[] {2, 12, 60, 200, 500}) {
      BigInteger product = BigInteger.ONE;
      for (int p = 2; p <= n + 1; p++) {
        if (BigInteger.valueOf(p).isProbablePrime(40) && n % (p - 1) == 0) {
          product = product.multiply(BigInteger.valueOf(p));
        }
      }
      assertEquals(product, Integers.bernoulli(n).denominator());
    }
  }

  @Test
  void binomialsSatisfyPascalsRuleForEveryUpperIndex() {
    for (int n = -12; n <= 40; n++) {
      for (int k = -2; k <= 45; k++) {
        assertEquals(
            Integers.binomial(n + 1, k + 1),
            Integers.binomial(n, k).add(Integers.binomial(n, k + 1)),
            n + " over " + k);
      }
      assertEquals(BigInteger.ONE, Integers.binomial(n, 0));
    }
  }

  @Test
  void factorialsGrowByTheirIndex() {
    for (int n = 1; n <= 200; n++) {
      assertEquals(
          Integers.factorial(n - 1).multiply(BigInteger.valueOf(n)), Integers.factorial(n));
    }
  }

  @Test
  void bothKindsOfStirlingNumbersAreInverse() {
    int size = 12;
    for (int n = 0; n <= size; n++) {
      List<BigInteger> row = Integers.stirlingSecondRow(n);
      for (int m = 0; m <= n; m++) {
        BigInteger sum = BigInteger.ZERO;
        for (int k = m; k <= n; k++) {
          sum = sum.add(row.get(k).multiply(Integers.stirlingFirstRow(k).get(m)));
        }
        assertEquals(n == m ? BigInteger.ONE : BigInteger.ZERO, sum);
      }
    }
  }

  @Test
  void primeFactorsMultiplyBackAndArePrime() {
    Seeded.each(
        300,
        60,
        random -> {
          BigInteger number =
              RandomNumbers.integer(random, 40)
                  .abs()
                  .add(BigInteger.ONE)
                  .multiply(RandomNumbers.integer(random, 40).abs().add(BigInteger.ONE));
          SortedMap<BigInteger, Integer> factors = Integers.primeFactors(number);
          BigInteger product = BigInteger.ONE;
          for (Map.Entry<BigInteger, Integer> factor : factors.entrySet()) {
            assertTrue(factor.getKey().isProbablePrime(60));
            product = product.multiply(factor.getKey().pow(factor.getValue()));
          }
          assertEquals(number, product);
        });
  }

  @Test
  void squaresOfLargePrimesAreFactored() {
    BigInteger prime = BigInteger.TEN.pow(30).nextProbablePrime();
    assertEquals(Map.of(prime, 2), Integers.primeFactors(prime.pow(2)));
  }

  @Test
  void aNumberThatResistsTheSearchIsRefusedWithTheUnfactoredPart() {
    BigInteger hard =
        BigInteger.TEN
            .pow(30)
            .nextProbablePrime()
            .multiply(BigInteger.TEN.pow(31).nextProbablePrime());
    Refusal refusal = assertThrows(Refusal.class, () -> Integers.primeFactors(hard.shiftLeft(3)));
    assertEquals(Reason.FACTORING_LIMIT, refusal.reason());
    assertEquals(List.of(Rational.of(hard)), refusal.data());
  }

  @Test
  void rootsOfPowersAreExact() {
    Seeded.each(
        700,
        200,
        random -> {
          BigInteger base = RandomNumbers.integer(random, 90);
          int degree = 1 + random.nextInt(7);
          BigInteger power = base.pow(degree);
          BigInteger expected = degree % 2 == 0 ? base.abs() : base;
          assertEquals(Optional.of(expected), Integers.root(power, degree));
          if (degree > 1 && power.abs().bitLength() > 2) {
            assertEquals(Optional.empty(), Integers.root(power.add(BigInteger.ONE), degree));
          }
        });
    assertFalse(Integers.isPerfectSquare(BigInteger.valueOf(-4)));
  }

  @Test
  void perfectPowersHaveTheLargestExponent() {
    assertEquals(
        new Integers.PerfectPower(BigInteger.valueOf(6), 12),
        Integers.perfectPower(BigInteger.valueOf(6).pow(12)));
    assertEquals(
        new Integers.PerfectPower(BigInteger.valueOf(-2), 9),
        Integers.perfectPower(BigInteger.valueOf(-512)));
    for (int plain : new int[] {-1, 0, 1, 2, 12, 72}) {
      BigInteger number = BigInteger.valueOf(plain);
      assertEquals(new Integers.PerfectPower(number, 1), Integers.perfectPower(number));
    }
  }

  @Test
  void negativeIndicesAreRefused() {
    assertEquals(
        Reason.NOT_NATURAL, assertThrows(Refusal.class, () -> Integers.factorial(-1)).reason());
    assertEquals(
        Reason.OUT_OF_RANGE,
        assertThrows(Refusal.class, () -> Integers.primeFactors(BigInteger.ZERO)).reason());
  }

  @Test
  void bellNumbersThroughPrimesAreThoseOfTheTriangle() {
    for (int n : new int[] {20, 149, 150, 151, 230}) {
      List<BigInteger> triangle = Bell.triangle(n);
      assertEquals(triangle, Bell.throughPrimes(n), "n = " + n);
      assertEquals(triangle, Integers.bellNumbers(n));
      assertTrue(triangle.getLast().bitLength() <= Bell.bits(n) + 1);
    }
  }
}
