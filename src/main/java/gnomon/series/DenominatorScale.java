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

  /// Denominators with more bits are taken for those of exponential generating functions.
  private static final int LONG_DENOMINATOR = 64;

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
      if (left.bitLength() > MAX_BITS * (n - lag) + 1) {
        return Optional.empty();
      }
      if (!left.equals(BigInteger.ONE)) {
        boolean more = add(exponents, left, n - lag);
        if (more && bits(exponents) > MAX_BITS) {
          return Optional.empty();
        }
      }
    }
    return Optional.of(new DenominatorScale(kind, exponents));
  }

  /// The smaller one of the ordinary and the exponential scale.
  static Optional<DenominatorScale> best(List<Rational> coefficients, int lag, int length) {
    Optional<DenominatorScale> exponential = of(coefficients, Kind.EXPONENTIAL, lag, length);
    return isPlain(exponential, coefficients, length)
        ? exponential
        : smaller(of(coefficients, Kind.ORDINARY, lag, length), exponential, length);
  }

  /// The smaller one of the products of the ordinary and of the exponential scales.
  static Optional<DenominatorScale> best(List<List<Rational>> lists, int length) {
    Optional<DenominatorScale> exponential = product(lists, Kind.EXPONENTIAL, length);
    boolean plain = lists.stream().anyMatch(list -> isPlain(exponential, list, length));
    return plain
        ? exponential
        : smaller(product(lists, Kind.ORDINARY, length), exponential, length);
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

  /// Whether n! alone is enough, and not much too large.
  private static boolean isPlain(
      Optional<DenominatorScale> scale, List<Rational> coefficients, int length) {
    int last = Math.min(length, coefficients.size()) - 1;
    return scale.isPresent()
        && scale.get().exponents.isEmpty()
        && last > 0
        && coefficients.get(last).denominator().bitLength() > LONG_DENOMINATOR;
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

  /// Takes in a denominator of t^n; whether an exponent has changed.
  private static boolean add(Map<BigInteger, Rational> exponents, BigInteger denominator, int n) {
    boolean more = false;
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
      more |= raise(exponents, prime, power, n);
    }
    if (!rest.equals(BigInteger.ONE)) {
      more |= raise(exponents, rest, 1, n);
    }
    return more;
  }

  private static boolean raise(
      Map<BigInteger, Rational> exponents, BigInteger p, int power, int n) {
    if (power == 0) {
      return false;
    }
    Rational share = Rational.of(power, n);
    Rational before = exponents.get(p);
    if (before != null && before.compareTo(share) >= 0) {
      return false;
    }
    exponents.put(p, share);
    return true;
  }

  /// The number of bits of Π p^s_p, rounded up.
  private static long bits(Map<BigInteger, Rational> exponents) {
    long parts = 0;
    for (var entry : exponents.entrySet()) {
      // p^16 < 2^bits, so bits/16 is above log2 p
      long bits = entry.getKey().pow(16).bitLength();
      Rational share = entry.getValue();
      parts += bits * 64 * share.numerator().longValue() / share.denominator().longValue() + 1;
    }
    return parts / 1024 + 1;
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
      steps[n] = step;
    }
    exponents.forEach((p, share) -> multiplyPowers(steps, p, share, lag));
    return steps;
  }

  /// Multiplies p at the places where ⌊(n−lag) share⌋ rises.
  private static void multiplyPowers(BigInteger[] steps, BigInteger p, Rational share, int lag) {
    long top = share.numerator().longValue();
    long bottom = share.denominator().longValue();
    long before = 0;
    for (int n = lag + 1; n < steps.length; n++) {
      long power = (n - lag) * top / bottom;
      if (power > before) {
        steps[n] = steps[n].multiply(p.pow((int) (power - before)));
        before = power;
      }
    }
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
