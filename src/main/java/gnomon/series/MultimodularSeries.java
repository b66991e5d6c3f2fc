package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.modular.ChineseRemainder;
import gnomon.modular.PrimeField;
import gnomon.modular.Primes;
import gnomon.modular.ResidueSeries;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/// Series with rational coefficients by way of many primes.
///
/// For the result x of an operation integers D_n x_n are known to exist ([DenominatorScale]), and
/// how large they can be at most ([Majorant]). The operation is carried out modulo as many primes
/// of one word as determine integers of that size, and the integers are put together by Chinese
/// remaindering; nothing is left to chance. Every method answers nothing where no common
/// denominators of useful size are found, so that another way must be taken.
///
/// Cost: for N coefficients of at most b bits, b/30 times the cost modulo a prime, and N b²/800
/// short operations.
///
/// Source: for the method, J. von zur Gathen, J. Gerhard, Modern Computer Algebra (2013), chapter
/// 5, from memory.
final class MultimodularSeries {

  private final DenominatorScale scale;
  private final int length;
  private final BigInteger[] denominators;
  private final BigInteger[] steps;

  /// The result will have the denominators D_(n−lag) of the scale, where W_n keeps its index.
  private MultimodularSeries(DenominatorScale scale, int lag, int length) {
    this.scale = scale;
    this.length = length;
    this.steps = scale.steps(length, lag);
    this.denominators = new BigInteger[length];
    BigInteger value = BigInteger.ONE;
    for (int n = 0; n < length; n++) {
      Budget.checkpoint();
      value = value.multiply(steps[n]);
      denominators[n] = value;
    }
  }

  /// An operation on residues.
  private interface Operation {
    int[] apply(ResidueSeries ring, List<int[]> inputs);
  }

  /// The result of the operation, whose coefficients are at most those of the shape.
  private List<Rational> run(Majorant.Shape shape, Operation operation, List<ScaledInput> inputs) {
    long[] bits = Majorant.bits(shape, length, denominators[length - 1].bitLength());
    long most = 1;
    for (int n = 0; n < length; n++) {
      most = Math.max(most, bits[n] + denominators[n].bitLength() + 2);
    }
    Budget.charge(most / Long.SIZE * length);
    List<PrimeField> primes =
        Primes.forProduct(
            ResidueSeries.logLength(length), most, denominators[length - 1].multiply(last(inputs)));
    ChineseRemainder remainders = new ChineseRemainder(primes);
    List<int[][]> rows = inputs.stream().map(input -> input.residues(remainders)).toList();
    int[][] results = new int[primes.size()][];
    for (int i = 0; i < results.length; i++) {
      PrimeField field = primes.get(i);
      List<int[]> residues = new ArrayList<>();
      for (int j = 0; j < rows.size(); j++) {
        residues.add(inputs.get(j).unscaled(rows.get(j)[i], field));
      }
      int[] result = operation.apply(new ResidueSeries(field, length), residues);
      int[] scaled = DenominatorScale.residues(steps, field);
      field.times(result, scaled, result, length);
      results[i] = result;
    }
    BigInteger[] integers = remainders.integers(results, length);
    LowestTerms lowest = new LowestTerms(scale, length, denominators);
    List<Rational> list = new ArrayList<>(length);
    for (int n = 0; n < length; n++) {
      Budget.checkpoint();
      list.add(lowest.quotient(integers[n], n));
    }
    return list;
  }

  private static BigInteger last(List<ScaledInput> inputs) {
    BigInteger product = BigInteger.ONE;
    for (ScaledInput input : inputs) {
      for (BigInteger step : input.steps()) {
        product = step.bitLength() > 29 ? product.multiply(step) : product;
      }
    }
    return product;
  }

  private static ScaledInput input(List<Rational> a, DenominatorScale scale, int lag, int length) {
    return ScaledInput.of(a, scale.steps(length, lag), length);
  }

  /// a b.
  static Optional<List<Rational>> product(List<Rational> a, List<Rational> b, int length) {
    if (a.isEmpty() || b.isEmpty()) {
      return Optional.empty();
    }
    Rational left = Rational.of(a.getFirst().denominator());
    Rational right = Rational.of(b.getFirst().denominator());
    List<Rational> first = times(a, left);
    List<Rational> second = times(b, right);
    Optional<DenominatorScale> of = DenominatorScale.best(List.of(first, second), length);
    if (of.isEmpty()) {
      return Optional.empty();
    }
    DenominatorScale scale = DenominatorScale.common(first, second, of.get().kind(), length);
    Majorant firstSizes = Majorant.ofAll(first, length);
    Majorant secondSizes = Majorant.ofAll(second, length);
    Majorant.Growth growth = r -> log(firstSizes.at(r).times(secondSizes.at(r)));
    Majorant.Shape shape = new Majorant.Shape(growth, 1, 0, 0);
    List<Rational> result =
        new MultimodularSeries(scale, 0, length)
            .run(
                shape,
                (ring, inputs) -> ring.product(inputs.get(0), inputs.get(1), length),
                List.of(input(first, scale, 0, length), input(second, scale, 0, length)));
    return Optional.of(times(result, left.times(right).inverse()));
  }

  private static OptionalLong log(UpperBound value) {
    return OptionalLong.of(value.mantissa() == 0 ? 0 : value.log2());
  }

  /// 1/a for a_0 ≠ 0.
  static Optional<List<Rational>> inverse(List<Rational> a, int length) {
    Rational first = a.getFirst().inverse();
    List<Rational> unit = times(a, first);
    Optional<DenominatorScale> scale = DenominatorScale.best(unit, 0, length);
    if (scale.isEmpty()) {
      return Optional.empty();
    }
    Majorant sizes = Majorant.of(unit, 0, length);
    Majorant.Shape shape = new Majorant.Shape(sizes::geometric, 1, 0, 0);
    MultimodularSeries work = new MultimodularSeries(scale.get(), 0, length);
    List<Rational> result =
        work.run(
            shape,
            (ring, inputs) -> ring.inverse(inputs.getFirst(), length),
            List.of(input(unit, scale.get(), 0, length)));
    return Optional.of(times(result, first));
  }

  /// e^a for a_0 = 0.
  static Optional<List<Rational>> exp(List<Rational> a, int length) {
    Optional<DenominatorScale> scale =
        DenominatorScale.of(a, DenominatorScale.Kind.EXPONENTIAL, 0, length);
    if (scale.isEmpty()) {
      return Optional.empty();
    }
    Majorant sizes = Majorant.of(a, 0, length);
    Majorant.Shape shape = new Majorant.Shape(sizes::exponential, 1, 0, 0);
    MultimodularSeries work = new MultimodularSeries(scale.get(), 0, length);
    return Optional.of(
        work.run(
            shape,
            (ring, inputs) -> ring.exp(inputs.getFirst(), length),
            List.of(input(a, scale.get(), 0, length))));
  }

  /// ln a for a_0 = 1: −ln(1 − û) is at most û/(1 − û), so its coefficients are below those of 1/(1
  /// − û).
  static Optional<List<Rational>> log(List<Rational> a, int length) {
    Optional<DenominatorScale> found = DenominatorScale.best(a, 0, length);
    if (found.isEmpty()) {
      return Optional.empty();
    }
    DenominatorScale scale = found.get();
    DenominatorScale target =
        scale.kind() == DenominatorScale.Kind.ORDINARY
            ? scale.as(DenominatorScale.Kind.LOGARITHMIC)
            : scale;
    Majorant sizes = Majorant.of(a, 0, length);
    Majorant.Shape shape = new Majorant.Shape(sizes::geometric, 1, 0, 0);
    MultimodularSeries work = new MultimodularSeries(target, 0, length);
    return Optional.of(
        work.run(
            shape,
            (ring, inputs) -> ring.log(inputs.getFirst(), length),
            List.of(input(a, scale, 0, length))));
  }

  /// a^e for a_0 = 1. The coefficients are at most those of (1 − û)^−|e|.
  static Optional<List<Rational>> power(List<Rational> a, Rational exponent, int length) {
    Rational size = exponent.abs();
    if (size.bitLength() > 24) {
      return Optional.empty();
    }
    Optional<DenominatorScale> found =
        DenominatorScale.best(a, 0, length).map(scale -> scale.forPower(exponent.denominator()));
    if (found.isEmpty()) {
      return Optional.empty();
    }
    Majorant sizes = Majorant.of(a, 0, length);
    long numerator = size.numerator().longValue();
    long denominator = size.denominator().longValue();
    Majorant.Growth growth =
        r -> {
          OptionalLong log = sizes.geometric(r);
          return log.isEmpty()
              ? log
              : OptionalLong.of(Math.ceilDiv(log.getAsLong() * numerator, denominator));
        };
    Majorant.Shape shape = new Majorant.Shape(growth, 1, 0, 0);
    MultimodularSeries work = new MultimodularSeries(found.get(), 0, length);
    Operation operation =
        (ring, inputs) -> {
          PrimeField field = ring.field();
          int e =
              field.times(
                  field.of(exponent.numerator()), field.inverse(field.of(exponent.denominator())));
          return ring.power(inputs.getFirst(), e, length);
        };
    return Optional.of(work.run(shape, operation, List.of(input(a, found.get(), 0, length))));
  }

  /// outer(inner) for inner_0 = 0.
  static Optional<List<Rational>> compose(List<Rational> outer, List<Rational> inner, int length) {
    List<Rational> rest = new ArrayList<>(outer.subList(0, Math.min(length, outer.size())));
    Rational constant = rest.set(0, Rational.ZERO);
    Optional<DenominatorScale> of = DenominatorScale.best(List.of(rest, inner), length);
    if (of.isEmpty()) {
      return Optional.empty();
    }
    DenominatorScale.Kind kind = of.get().kind();
    DenominatorScale outerScale = DenominatorScale.of(rest, kind, 0, length).orElseThrow();
    DenominatorScale innerScale = DenominatorScale.of(inner, kind, 0, length).orElseThrow();
    Majorant outerSizes = Majorant.of(rest, 0, length);
    Majorant innerSizes = Majorant.of(inner, 0, length);
    Majorant.Growth growth = r -> log(outerSizes.at(innerSizes.at(r)));
    Majorant.Shape shape = new Majorant.Shape(growth, 1, 0, 0);
    DenominatorScale scale = outerScale.times(innerScale);
    MultimodularSeries work = new MultimodularSeries(scale, 0, length);
    List<Rational> result =
        work.run(
            shape,
            (ring, inputs) -> ring.compose(inputs.get(0), inputs.get(1), length),
            List.of(input(rest, outerScale, 0, length), input(inner, innerScale, 0, length)));
    result.set(0, constant);
    return Optional.of(result);
  }

  /// The compositional inverse of a with a_0 = 0 and a_1 ≠ 0. With a = a_1 t (1 + u) the
  /// coefficients of the inverse of t (1 + u) are at most (1/n) [t^(n−1)] (1 − û)^−n.
  static Optional<List<Rational>> reversion(List<Rational> a, int length) {
    Rational first = a.get(1).inverse();
    List<Rational> unit = times(a, first);
    Optional<DenominatorScale> scale = DenominatorScale.best(unit, 1, length);
    if (scale.isEmpty()) {
      return Optional.empty();
    }
    Majorant sizes = Majorant.of(unit, 1, length - 1);
    Majorant.Shape shape = new Majorant.Shape(sizes::geometric, 0, 1, 1);
    MultimodularSeries work = new MultimodularSeries(scale.get(), 1, length);
    List<Rational> result =
        work.run(
            shape,
            (ring, inputs) -> ring.reversion(inputs.getFirst(), length),
            List.of(input(unit, scale.get(), 1, length)));
    if (first.isOne()) {
      return Optional.of(result);
    }
    List<Rational> stretched = new ArrayList<>(length);
    Rational power = Rational.ONE;
    for (Rational x : result) {
      stretched.add(x.times(power));
      power = power.times(first);
    }
    return Optional.of(stretched);
  }

  private static List<Rational> times(List<Rational> a, Rational factor) {
    return factor.isOne() ? a : a.stream().map(x -> x.times(factor)).toList();
  }
}
