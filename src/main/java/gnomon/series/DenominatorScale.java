package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.modular.PrimeField;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// Positive integers D_0 = 1, D_1, D_2, … such that D_n clears the denominator of the coefficient of
/// t^n of a series, and of all that is computed from it:
///
///     D_n = W_n Π_p p^⌊n s_p⌋,   W_n = 1, lcm(1, …, n) or n!.
///
/// With W_n = 1 the series whose coefficients D_n clears are a ring that is closed under products,
/// inverses (constant term 1), composition, and under integer powers, since D_i D_j divides D_(i+j).
/// With W_n = n! they are the exponential generating functions of integers (Hurwitz series), which
/// also have exponentials, logarithms and compositions with each other. The exponents s_p are the
/// least that serve a given series: the greatest v_p/n of the denominators that are left.
///
/// Source: A. Hurwitz, Über die Entwickelungskoeffizienten der lemniskatischen Funktionen, Math.
/// Ann. 51 (1899), for the integrality; from memory.
final class DenominatorScale {

  /// What is multiplied to the prime powers.
  enum Kind {
    /// 1: ordinary generating functions.
    ORDINARY,
    /// lcm(1, …, n): logarithms of those.
    LOGARITHMIC,
    /// n!: exponential generating functions.
    EXPONENTIAL
  }

  /// Scales with more bits for each power of t than this are not used.
  private static final long MAX_BITS = 48;

  private static final int LARGEST_PRIME = 4096;

  private final Kind kind;

  /// For each prime p its exponent s_p.
  private final Map<BigInteger, Rational> exponents;

  private DenominatorScale(Kind kind, Map<BigInteger, Rational> exponents) {
    this.kind = kind;
    this.exponents = exponents;
  }

  /// The scale of the kind for which W_n Π p^⌊(n−lag) s_p⌋ clears the coefficient of t^n, n > lag,
  /// of the first `length`. Nothing when it would be too large to be of use.
  static Optional<DenominatorScale> of(
      List<Rational> coefficients, Kind kind, int lag, int length) {
    Map<BigInteger, Rational> exponents = new TreeMap<>();
    BigInteger factorial = BigInteger.ONE;
    for (int n = 1; n < Math.min(length, coefficients.size()); n++) {
      Budget.checkpoint();
      factorial = kind == Kind.EXPONENTIAL ? factorial.multiply(BigInteger.valueOf(n)) : factorial;
      BigInteger left = remaining(coefficients.get(n).denominator(), factorial);
      if (!left.equals(BigInteger.ONE)) {
        add(exponents, left, n - lag);
        if (bits(exponents) > MAX_BITS) {
          return Optional.empty();
        }
      }
    }
    return Optional.of(new DenominatorScale(kind, exponents));
  }

  /// The smaller one of the ordinary and the exponential scale.
  static Optional<DenominatorScale> best(List<Rational> coefficients, int lag, int length) {
    return smaller(
        of(coefficients, Kind.ORDINARY, lag, length),
        of(coefficients, Kind.EXPONENTIAL, lag, length),
        length);
  }

  /// The smaller one of the products of the ordinary and of the exponential scales.
  static Optional<DenominatorScale> best(List<List<Rational>> lists, int length) {
    return smaller(
        product(lists, Kind.ORDINARY, length), product(lists, Kind.EXPONENTIAL, length), length);
  }

  /// The scale of the kind that clears both lists.
  static DenominatorScale common(List<Rational> a, List<Rational> b, Kind kind, int length) {
    Map<BigInteger, Rational> exponents =
        new TreeMap<>(of(a, kind, 0, length).orElseThrow().exponents);
    of(b, kind, 0, length)
        .orElseThrow()
        .exponents
        .forEach((p, s) -> exponents.merge(p, s, (x, y) -> x.compareTo(y) >= 0 ? x : y));
    return new DenominatorScale(kind, exponents);
  }

  private static Optional<DenominatorScale> product(
      List<List<Rational>> lists, Kind kind, int length) {
    DenominatorScale product = new DenominatorScale(kind, Map.of());
    for (List<Rational> list : lists) {
      Optional<DenominatorScale> scale = of(list, kind, 0, length);
      if (scale.isEmpty()) {
        return scale;
      }
      product = product.times(scale.get());
    }
    return Optional.of(product);
  }

  private static Optional<DenominatorScale> smaller(
      Optional<DenominatorScale> ordinary, Optional<DenominatorScale> exponential, int length) {
    if (ordinary.isEmpty() || exponential.isEmpty()) {
      return ordinary.or(() -> exponential);
    }
    int log = Integer.SIZE - Integer.numberOfLeadingZeros(length);
    return bits(ordinary.get().exponents) <= bits(exponential.get().exponents) + log - 2
        ? ordinary
        : exponential;
  }

  /// The denominator without what divides the factorial.
  private static BigInteger remaining(BigInteger denominator, BigInteger factorial) {
    if (denominator.equals(BigInteger.ONE) || factorial.equals(BigInteger.ONE)) {
      return denominator;
    }
    BigInteger rest = factorial.mod(denominator);
    return rest.signum() == 0 ? BigInteger.ONE : denominator.divide(denominator.gcd(rest));
  }

  private static void add(Map<BigInteger, Rational> exponents, BigInteger denominator, int n) {
    BigInteger rest = denominator;
    for (int p = 2; p < LARGEST_PRIME && !rest.equals(BigInteger.ONE); p += p == 2 ? 1 : 2) {
      if (rest.bitLength() < Long.SIZE && (long) p * p > rest.longValue()) {
        break;
      }
      BigInteger prime = BigInteger.valueOf(p);
      int power = 0;
      BigInteger[] parts = rest.divideAndRemainder(prime);
      while (parts[1].signum() == 0) {
        power++;
        rest = parts[0];
        parts = rest.divideAndRemainder(prime);
      }
      raise(exponents, prime, power, n);
    }
    if (!rest.equals(BigInteger.ONE)) {
      raise(exponents, rest, 1, n);
    }
  }

  private static void raise(Map<BigInteger, Rational> exponents, BigInteger p, int power, int n) {
    if (power > 0) {
      exponents.merge(p, Rational.of(power, n), (a, b) -> a.compareTo(b) >= 0 ? a : b);
    }
  }

  /// At least the number of bits of Π p^s_p.
  private static long bits(Map<BigInteger, Rational> exponents) {
    long bits = 0;
    for (var entry : exponents.entrySet()) {
      Rational share = entry.getValue().times(Rational.of(entry.getKey().bitLength()));
      bits += share.floor().longValue() + 1;
    }
    return bits;
  }

  /// This scale with W_n = lcm(1, …, n) or n! in place of what it has.
  DenominatorScale as(Kind other) {
    return new DenominatorScale(other, exponents);
  }

  /// The scale that clears what either clears, W_n taken from this one.
  DenominatorScale times(DenominatorScale that) {
    Map<BigInteger, Rational> sum = new TreeMap<>(exponents);
    that.exponents.forEach((p, s) -> sum.merge(p, s, Rational::plus));
    return new DenominatorScale(kind, sum);
  }

  /// The scale that also serves powers with an exponent of denominator b: the binomial coefficient
  /// of e over k has for each prime p that divides b at most v_p(b) k + v_p(k!) factors p in its
  /// denominator, and v_p(k!) ≤ k/(p − 1); with n! the first part is enough.
  DenominatorScale forPower(BigInteger b) {
    Map<BigInteger, Rational> plain = new TreeMap<>();
    add(plain, b, 1);
    Map<BigInteger, Rational> sum = new TreeMap<>(exponents);
    plain.forEach(
        (p, s) -> {
          Rational more =
              kind == Kind.EXPONENTIAL
                  ? Rational.ZERO
                  : Rational.of(BigInteger.ONE, p.subtract(BigInteger.ONE));
          sum.merge(p, s.plus(more), Rational::plus);
        });
    return new DenominatorScale(kind, sum);
  }

  /// The kind.
  Kind kind() {
    return kind;
  }

  /// The quotients of consecutive W_n Π p^⌊(n−lag) s_p⌋, n = 0, …, `length` − 1; those up to `lag`
  /// are 1.
  BigInteger[] steps(int length, int lag) {
    BigInteger[] steps = new BigInteger[length];
    int[] primes = kind == Kind.LOGARITHMIC ? primePowers(length) : new int[0];
    for (int n = 0; n < length; n++) {
      BigInteger step =
          switch (kind) {
            case ORDINARY -> BigInteger.ONE;
            case LOGARITHMIC -> BigInteger.valueOf(primes[n]);
            case EXPONENTIAL -> BigInteger.valueOf(Math.max(1, n));
          };
      for (var entry : exponents.entrySet()) {
        int power = n <= lag ? 0 : power(entry.getValue(), n - lag);
        step = power == 0 ? step : step.multiply(entry.getKey().pow(power));
      }
      steps[n] = step;
    }
    return steps;
  }

  private static int power(Rational share, int n) {
    return floor(share, n) - floor(share, n - 1);
  }

  private static int floor(Rational share, int n) {
    return share.times(Rational.of(n)).floor().intValueExact();
  }

  /// p where n is a power of the prime p, otherwise 1.
  private static int[] primePowers(int length) {
    int[] result = new int[length];
    Arrays.fill(result, 1);
    boolean[] composite = new boolean[length];
    for (int p = 2; p < length; p++) {
      if (!composite[p]) {
        for (long power = p; power < length; power *= p) {
          result[(int) power] = p;
        }
        for (long multiple = (long) p * p; multiple < length; multiple += p) {
          composite[(int) multiple] = true;
        }
      }
    }
    return result;
  }

  /// The residues of D_0, …, D_(length−1) from the steps.
  static int[] residues(BigInteger[] steps, PrimeField field) {
    int[] result = new int[steps.length];
    int value = 1;
    for (int n = 0; n < steps.length; n++) {
      value = field.times(value, field.of(steps[n]));
      result[n] = value;
    }
    return result;
  }

  /// The numbers p of the prime powers.
  List<BigInteger> bases() {
    return new ArrayList<>(exponents.keySet());
  }
}
