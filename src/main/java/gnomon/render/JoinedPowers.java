package gnomon.render;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.BiConsumer;

/// Powers of prime numbers in one term, joined where they share an exponent: (2^x)² is 4^x, and
/// √2·√3 is √6.
final class JoinedPowers {
  private static final BigInteger LARGEST_JOINED_BASE = BigInteger.valueOf(1_000_000);

  private record PrimePower(BigInteger prime, Form unit) {}

  private final Map<PrimePower, Rational> exponents = new LinkedHashMap<>();

  /// Multiplies by prime^(exponent · unit).
  void add(BigInteger prime, Form unit, Rational exponent) {
    exponents.merge(new PrimePower(prime, unit), exponent, Rational::plus);
  }

  /// Calls the consumer with each joined base, 1 < base, and its exponent.
  void forEach(BiConsumer<Rational, Form> consumer) {
    Map<Form, Rational> joined = new LinkedHashMap<>();
    exponents.forEach((power, exponent) -> join(power, exponent, joined));
    joined.forEach(
        (exponent, base) -> {
          boolean inverted = base.numerator().equals(BigInteger.ONE);
          consumer.accept(
              inverted ? base.inverse() : base, inverted ? exponent.negated() : exponent);
        });
  }

  private static void join(PrimePower power, Rational exponent, Map<Form, Rational> joined) {
    if (exponent.isZero()) {
      return;
    }
    Rational base = Rational.of(power.prime());
    Form shared = power.unit().times(exponent);
    if (exponent.isInteger() && exponent.fitsInt() && !power.unit().isOne()) {
      int whole = exponent.intValueExact();
      if (Math.abs(whole) * (long) power.prime().bitLength() < LARGEST_JOINED_BASE.bitLength()) {
        base = base.power(whole);
        shared = power.unit();
      }
    }
    joined.merge(shared, base, Rational::times);
  }
}
