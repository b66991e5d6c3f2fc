package gnomon.series;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Form;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/// The triangle of powers against powers formed one after the other, and against number triangles.
final class PowerTriangleTest {

  private static final long SEED = 31_337;

  @Test
  void theTriangleHoldsTheCoefficientsOfThePowers() {
    Random random = new Random(SEED);
    for (int last : new int[] {24, 30}) {
      PowerSeries w = random(random, last, Rational.ONE);
      PowerSeries f = random(random, last, Rational.ZERO, Rational.of(-3, 2));
      List<List<Rational>> rows = PowerTriangle.of(w, f, last).orElseThrow();
      PowerSeries power = w;
      for (int k = 0; k <= last; k++) {
        for (int n = k; n <= last; n++) {
          Rational quotient = Rational.of(Integers.factorial(n), Integers.factorial(k));
          assertEquals(
              power.coefficient(n).times(quotient).asRational().orElseThrow(),
              rows.get(n).get(k),
              n + ", " + k + ", seed " + SEED);
        }
        power = power.times(f).truncated(last);
      }
    }
  }

  private static PowerSeries random(Random random, int last, Rational... first) {
    List<Rational> terms = new ArrayList<>(List.of(first));
    while (terms.size() <= last) {
      terms.add(Rational.of(random.nextInt(19) - 9, 1 + random.nextInt(5)));
    }
    return PowerSeries.ofRationals(terms, last);
  }

  @Test
  void thePowersOfTheExponentialLessOneAreTheStirlingNumbers() {
    int last = 60;
    PowerSeries f =
        PowerSeries.exponential(Form.ONE, last).minus(PowerSeries.constant(Form.ONE, last));
    List<List<Rational>> rows =
        PowerTriangle.of(PowerSeries.constant(Form.ONE, last), f, last).orElseThrow();
    for (int n = 0; n <= last; n++) {
      assertEquals(Integers.stirlingSecondRow(n).stream().map(Rational::of).toList(), rows.get(n));
    }
  }

  @Test
  void smallTrianglesAndSeriesWithParametersAreLeftToOthers() {
    PowerSeries one = PowerSeries.constant(Form.ONE, 40);
    PowerSeries t = PowerSeries.monomial(Form.ONE, 1, 40);
    assertTrue(PowerTriangle.of(one, t, 3).isEmpty());
    assertTrue(PowerTriangle.of(one, t, 40).isPresent());
    assertTrue(PowerTriangle.of(one.times(Form.of(2)), t, 40).isEmpty());
  }
}
