package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.modular.ChineseRemainder;
import gnomon.modular.PrimeField;
import gnomon.modular.Primes;
import gnomon.modular.ResidueSeries;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;

/// The triangle of the numbers (n!/k!) [t^n] w F^k for k ≤ n ≤ N: the coefficients of the
/// polynomials with generating function w(t) e^(x F(t)).
///
/// For Hurwitz series w and F, F^k/k! is one too, so that D_n clears the denominators of a whole
/// row; the powers of F/t are formed modulo as many primes as each of them needs by its own bound.
///
/// Cost: N products of length N for each prime, N²/2 remainderings. Source: for the integrality, as
/// [DenominatorScale].
public final class PowerTriangle {

  /// Shorter triangles are not worth the preparations.
  private static final int LEAST = 24;

  /// Numbers of primes are rounded up to a multiple of this, so that they share their tables.
  private static final int GRAIN = 8;

  private final int last;
  private final DenominatorScale scale;
  private final List<Rational> weight;
  private final List<Rational> series;
  private final BigInteger[] steps;
  private final BigInteger[] denominators;

  private PowerTriangle(
      List<Rational> weight, List<Rational> series, DenominatorScale scale, int last) {
    this.weight = weight;
    this.series = series;
    this.scale = scale;
    this.last = last;
    this.steps = scale.as(DenominatorScale.Kind.ORDINARY).steps(last + 1, 0);
    this.denominators = steps.clone();
    for (int n = 1; n <= last; n++) {
      denominators[n] = denominators[n].multiply(denominators[n - 1]);
    }
  }

  /// The rows n = 0, …, `last`, each from k = 0 to n; nothing when some coefficient is no rational
  /// number, when the triangle is small, or when there are no common denominators of useful size.
  /// The series F starts with t^1.
  public static Optional<List<List<Rational>>> of(PowerSeries w, PowerSeries f, int last) {
    if (last < LEAST || w.valuation() < 0 || f.valuation() != 1) {
      return Optional.empty();
    }
    Optional<List<Rational>> weight = w.rationalCoefficients();
    Optional<List<Rational>> series = f.rationalCoefficients();
    if (weight.isEmpty() || series.isEmpty() || !weight.get().getFirst().isOne()) {
      return Optional.empty();
    }
    DenominatorScale.Kind kind = DenominatorScale.Kind.EXPONENTIAL;
    Optional<DenominatorScale> left = DenominatorScale.of(weight.get(), kind, 0, last + 1);
    Optional<DenominatorScale> right = DenominatorScale.of(series.get(), kind, 0, last + 1);
    return left.isEmpty() || right.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new PowerTriangle(weight.get(), series.get(), left.get().times(right.get()), last)
                .rows());
  }

  private List<List<Rational>> rows() {
    long[] bits = bits();
    long most = 1;
    for (long each : bits) {
      most = Math.max(most, each);
    }
    Budget.charge(most / Long.SIZE * last * last / 4);
    BigInteger top = denominators[last];
    List<PrimeField> primes =
        Primes.forProduct(ResidueSeries.logLength(last + 1), most + 30L * GRAIN, top);
    int[] needs = new int[last + 1];
    for (int k = 0; k <= last; k++) {
      needs[k] = (int) Math.min(primes.size(), (bits[k] / 29 / GRAIN + 1) * GRAIN);
    }
    int[][][] residues = residues(primes, needs);
    List<List<Rational>> rows = new ArrayList<>();
    for (int n = 0; n <= last; n++) {
      rows.add(new ArrayList<>(n + 1));
    }
    Map<Integer, ChineseRemainder> remainders = new HashMap<>();
    for (int k = 0; k <= last; k++) {
      ChineseRemainder remainder =
          remainders.computeIfAbsent(
              needs[k], need -> new ChineseRemainder(primes.subList(0, need)));
      BigInteger[] column = remainder.integers(residues[k], last - k + 1);
      residues[k] = new int[0][];
      for (int n = k; n <= last; n++) {
        rows.get(n).add(Rational.of(column[n - k], denominators[n]));
      }
    }
    return rows;
  }

  /// At least log2 of D_n (n!/k!) [t^n] w F^k, and 3 more, for each k and all n.
  private long[] bits() {
    Majorant weights = Majorant.ofAll(weight, last + 1);
    Majorant sizes = Majorant.of(series, 1, last);
    UpperBound first = UpperBound.of(series.get(1));
    BigInteger factorial = BigInteger.ONE;
    int[] factorials = new int[last + 1];
    for (int n = 1; n <= last; n++) {
      factorial = factorial.multiply(BigInteger.valueOf(n));
      factorials[n] = factorial.bitLength();
    }
    long[] bits = new long[last + 1];
    for (int k = 0; k <= last; k++) {
      int power = k;
      Majorant.Growth growth =
          r -> {
            UpperBound base = sizes.at(r).plus(first);
            return OptionalLong.of(weights.at(r).log2() + power * base.log2());
          };
      int count = last - k + 1;
      long weight = denominators[last].bitLength() + factorials[last];
      long[] bounds = Majorant.bits(new Majorant.Shape(growth, 1, 0, 0), count, weight);
      for (int n = k; n <= last; n++) {
        long size = bounds[n - k] + denominators[n].bitLength() + factorials[n] - factorials[k] + 4;
        bits[k] = Math.max(bits[k], size);
      }
    }
    return bits;
  }

  /// The residues of D_n (n!/k!) times the coefficient of t^n of w F^k, by k, prime and n − k.
  private int[][][] residues(List<PrimeField> primes, int[] needs) {
    int[][][] residues = new int[last + 1][][];
    for (int k = 0; k <= last; k++) {
      residues[k] = new int[needs[k]][];
    }
    ChineseRemainder remainders = new ChineseRemainder(primes);
    BigInteger[] inputSteps = scale.steps(last + 1, 0);
    ScaledInput weights = ScaledInput.of(weight, inputSteps, last + 1);
    ScaledInput inputs = ScaledInput.of(series, inputSteps, last + 1);
    int[][] weightRows = weights.residues(remainders);
    int[][] rows = inputs.residues(remainders);
    for (int i = 0; i < primes.size(); i++) {
      PrimeField field = primes.get(i);
      ResidueSeries ring = new ResidueSeries(field, last + 1);
      int[] f = inputs.unscaled(rows[i], field);
      int[] shape = new int[last];
      System.arraycopy(f, 1, shape, 0, last);
      int[] power = weights.unscaled(weightRows[i], field);
      int[] factorials = DenominatorScale.residues(inputSteps, field);
      int until = last;
      while (until >= 0 && needs[until] <= i) {
        until--;
      }
      int inverse = 1;
      int[] inverses = field.inverses(last + 2);
      for (int k = 0; k <= until; k++) {
        int count = last - k + 1;
        power = k == 0 ? power : ring.product(power, shape, count);
        if (i < needs[k]) {
          int[] column = new int[count];
          for (int n = k; n <= last; n++) {
            column[n - k] = field.times(field.times(power[n - k], factorials[n]), inverse);
          }
          residues[k][i] = column;
        }
        inverse = field.times(inverse, inverses[k + 1]);
      }
    }
    return residues;
  }
}
