package gnomon.polynomial;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.number.Rational;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class FractionalDivisionTest {

  private record Letter(String name) implements Indeterminate {
    @Override
    public int compareTo(Indeterminate other) {
      return name.compareTo(((Letter) other).name);
    }
  }

  private static Polynomial power(long numerator, long denominator) {
    return Polynomial.of(Monomial.of(new Letter("w"), Rational.of(numerator, denominator)));
  }

  /// w − 1 = (w^(1/2) − 1)(w^(1/2) + 1), from memory.
  @Test
  void aDivisorWithFinerExponentsThanTheDividendIsDivided() {
    Polynomial one = Polynomial.ONE;
    Polynomial dividend = power(1, 1).minus(one);
    assertEquals(Optional.of(power(1, 2).minus(one)), dividend.tryDividedBy(power(1, 2).plus(one)));
    assertEquals(List.of(), dividend.tryDividedBy(power(1, 3).plus(one)).stream().toList());
  }
}
