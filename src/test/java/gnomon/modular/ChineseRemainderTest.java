package gnomon.modular;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/// Residues of integers and back, and products through residues, against plain arithmetic.
final class ChineseRemainderTest {

  private static final long SEED = 77003;

  private final Random random = new Random(SEED);

  private BigInteger integer(int bits) {
    BigInteger size = new BigInteger(bits, random);
    return random.nextBoolean() ? size : size.negate();
  }

  private BigInteger[] integers(int count, int bits) {
    BigInteger[] result = new BigInteger[count];
    for (int i = 0; i < count; i++) {
      result[i] = integer(random.nextInt(bits + 1));
    }
    return result;
  }

  private static BigInteger[] schoolbook(BigInteger[] a, BigInteger[] b) {
    BigInteger[] product = new BigInteger[a.length + b.length - 1];
    Arrays.fill(product, BigInteger.ZERO);
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j < b.length; j++) {
        product[i + j] = product[i + j].add(a[i].multiply(b[j]));
      }
    }
    return product;
  }

  @Test
  void integersOfEverySizeComeBackFromTheirResidues() {
    for (int bits : new int[] {1, 5, 27, 28, 29, 55, 56, 57, 62, 63, 64, 100, 448, 1000, 5000}) {
      List<PrimeField> primes = Primes.forProduct(13, bits + 2);
      ChineseRemainder remainders = new ChineseRemainder(primes);
      BigInteger bound = BigInteger.ONE.shiftLeft(bits);
      BigInteger[] values = integers(20, bits);
      values[0] = bound;
      values[1] = bound.negate();
      values[2] = BigInteger.ZERO;
      values[3] = BigInteger.ONE.negate();
      int[][] residues = remainders.residues(values);
      for (int i = 0; i < primes.size(); i++) {
        for (int n = 0; n < values.length; n++) {
          BigInteger prime = BigInteger.valueOf(primes.get(i).prime());
          assertEquals(values[n].mod(prime).intValue(), residues[i][n], bits + ", seed " + SEED);
        }
      }
      assertArrayEquals(values, remainders.integers(residues, values.length), "bits " + bits);
    }
  }

  @Test
  void productsOfPolynomialsAgreeWithTheSchoolbook() {
    for (int length : new int[] {1, 2, 17, 64, 129}) {
      for (int bits : new int[] {1, 20, 64, 300}) {
        BigInteger[] a = integers(length, bits);
        BigInteger[] b = integers(length / 2 + 1, 2 * bits);
        assertArrayEquals(
            schoolbook(a, b), IntegerProduct.of(a, b), length + ", " + bits + ", seed " + SEED);
        assertArrayEquals(schoolbook(a, a), IntegerProduct.of(a, a), length + ", " + bits);
      }
    }
  }

  @Test
  void largestCoefficientsOfOneSignDoNotOverflow() {
    BigInteger[] a = new BigInteger[200];
    Arrays.fill(a, BigInteger.ONE.shiftLeft(64).subtract(BigInteger.ONE));
    BigInteger[] b = new BigInteger[200];
    Arrays.fill(b, BigInteger.ONE.shiftLeft(64).subtract(BigInteger.ONE).negate());
    assertArrayEquals(schoolbook(a, b), IntegerProduct.of(a, b));
  }
}
