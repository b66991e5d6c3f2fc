package gnomon.bench;

import gnomon.form.Form;
import gnomon.modular.PrimeField;
import gnomon.modular.ResidueSeries;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import gnomon.series.PowerSeries;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/// The work of the table of speeds: one method for each task, the size as a parameter. The results
/// are compared with those of `src/bench/yardstick.c`, which does the same work.
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 500, timeUnit = TimeUnit.MILLISECONDS)
@Fork(
    value = 1,
    jvmArgs = {"-Xmx3g", "-XX:+UseSerialGC", "--sun-misc-unsafe-memory-access=allow"})
public class SpeedOfSeries {

  private static final int PRIME = 998_244_353;

  /// Random series modulo a prime, and the arithmetic made anew for each operation.
  @State(Scope.Thread)
  public static class Modular {
    @Param({"1024", "16384", "65536"})
    int n;

    int[] outer;
    int[] inner;

    @Setup
    public void prepare() {
      Random random = new Random(n);
      outer = random.ints(n, 0, PRIME).toArray();
      inner = random.ints(n, 0, PRIME).toArray();
      inner[0] = 0;
      inner[1] = 3;
    }

    ResidueSeries ring() {
      return new ResidueSeries(new PrimeField(PRIME), n);
    }
  }

  @Benchmark
  public int[] reversionModulo(Modular state) {
    return state.ring().reversion(state.inner, state.n);
  }

  @Benchmark
  public int[] compositionModulo(Modular state) {
    return state.ring().compose(state.outer, state.inner, state.n);
  }

  /// e^t and what is made of it.
  @State(Scope.Thread)
  public static class Exponentials {
    @Param({"20", "50", "100", "200", "500", "1000", "2000"})
    int n;

    PowerSeries e;
    PowerSeries less;
    PowerSeries times;

    @Setup
    public void prepare() {
      List<Rational> terms = new ArrayList<>();
      Rational term = Rational.ONE;
      for (int k = 0; k <= n; k++) {
        terms.add(term);
        term = term.dividedBy(Rational.of(k + 1));
      }
      e = PowerSeries.ofRationals(terms, n);
      less = e.minus(PowerSeries.constant(Form.ONE, n));
      times = e.shifted(1).truncated(n);
    }
  }

  @Benchmark
  public PowerSeries reversionOfTimes(Exponentials state) {
    return state.times.reversion();
  }

  @Benchmark
  public PowerSeries reversionOfLess(Exponentials state) {
    return state.less.reversion();
  }

  @Benchmark
  public PowerSeries compositionOfExponentials(Exponentials state) {
    return state.e.compose(state.less);
  }

  /// A series with small random rational coefficients.
  @State(Scope.Thread)
  public static class SmallRationals {
    @Param({"500", "2000"})
    int n;

    PowerSeries fromZero;
    PowerSeries fromOne;

    @Setup
    public void prepare() {
      Random random = new Random(n);
      List<Rational> terms = new ArrayList<>();
      terms.add(Rational.ZERO);
      for (int k = 1; k <= n; k++) {
        terms.add(Rational.of(random.nextInt(19) - 9, 1 + random.nextInt(9)));
      }
      fromZero = PowerSeries.ofRationals(terms, n);
      fromOne = fromZero.plus(PowerSeries.constant(Form.ONE, n));
    }
  }

  @Benchmark
  public PowerSeries exponential(SmallRationals state) {
    return state.fromZero.exp();
  }

  @Benchmark
  public PowerSeries logarithm(SmallRationals state) {
    return state.fromOne.log();
  }

  /// Sizes of the number families and the changes of basis.
  @State(Scope.Thread)
  public static class Numbers {
    @Param({"1000", "5000"})
    int n;

    DensePolynomial polynomial;
    List<Rational> falling;

    @Setup
    public void prepare() {
      falling = words(new Random(n), n).coefficients();
      polynomial = DensePolynomial.of(falling);
    }
  }

  private static DensePolynomial words(Random random, int n) {
    BigInteger[] values = new BigInteger[n];
    for (int k = 0; k < n; k++) {
      values[k] = BigInteger.valueOf(random.nextLong());
    }
    return DensePolynomial.ofIntegers(values);
  }

  @Benchmark
  public List<Rational> bernoulli(Numbers state) {
    return Integers.bernoulliNumbers(state.n);
  }

  @Benchmark
  public List<BigInteger> bell(Numbers state) {
    return Integers.bellNumbers(state.n);
  }

  @Benchmark
  public List<BigInteger> stirlingFirst(Numbers state) {
    return Integers.stirlingFirstRow(state.n);
  }

  @Benchmark
  public List<BigInteger> stirlingSecond(Numbers state) {
    return Integers.stirlingSecondRow(state.n);
  }

  @Benchmark
  public List<Rational> toFalling(Numbers state) {
    return state.polynomial.toFalling();
  }

  @Benchmark
  public DensePolynomial fromFalling(Numbers state) {
    return DensePolynomial.fromFalling(state.falling);
  }

  /// Two polynomials with coefficients of 64 bits.
  @State(Scope.Thread)
  public static class Words {
    @Param({"1000", "100000"})
    int n;

    DensePolynomial a;
    DensePolynomial b;

    @Setup
    public void prepare() {
      Random random = new Random(n);
      a = words(random, n);
      b = words(random, n);
    }
  }

  @Benchmark
  public DensePolynomial product(Words state) {
    return state.a.times(state.b);
  }
}
