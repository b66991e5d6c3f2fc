package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;

/// The integers at which a form in one variable is seen to have a pole: roots of linear factors of
/// its denominator, and the negative integers of factorials and harmonic numbers.
///
/// Poles that depend on a parameter are generic, not integers, and are not listed.
///
/// @param points the isolated poles
/// @param upTo every integer up to this one is a pole
/// @param from every integer from this one on is a pole
record IntegerPoles(
    TreeSet<BigInteger> points, Optional<BigInteger> upTo, Optional<BigInteger> from) {

  static IntegerPoles of(Form f, Variable k) {
    TreeSet<BigInteger> points = new TreeSet<>();
    Form denominator = Form.of(f.denominator());
    if (denominator.dependsOn(k)) {
      for (var factor : Structure.factored(denominator).factors()) {
        root(factor.base(), k).filter(point -> !isFinite(f, k, point)).ifPresent(points::add);
      }
    }
    IntegerPoles poles = new IntegerPoles(points, Optional.empty(), Optional.empty());
    for (Generator generator : f.generators()) {
      poles = poles.with(generator, f, k);
    }
    return poles;
  }

  /// Whether a root of the denominator is no pole, because a kernel makes the numerator vanish
  /// there, as a reciprocal factorial does, or 1 − k^n at k = 1.
  private static boolean isFinite(Form f, Variable k, BigInteger point) {
    if (f.generators().stream().allMatch(g -> g.equals(k) || !g.dependsOn(k))) {
      return false;
    }
    try {
      f.substitute(k, Form.of(point));
      return true;
    } catch (Refusal _) {
      return false;
    }
  }

  /// The first pole at or above `bound`.
  Optional<BigInteger> atOrAbove(BigInteger bound) {
    if (upTo.isPresent() && upTo.get().compareTo(bound) >= 0) {
      return Optional.of(bound);
    }
    Optional<BigInteger> point = Optional.ofNullable(points.ceiling(bound));
    Optional<BigInteger> later = from.map(bound::max);
    return point.isPresent() && (later.isEmpty() || point.get().compareTo(later.get()) <= 0)
        ? point
        : later;
  }

  /// The first pole from `low` to `high`.
  Optional<BigInteger> between(BigInteger low, BigInteger high) {
    return atOrAbove(low).filter(pole -> pole.compareTo(high) <= 0);
  }

  private static Optional<BigInteger> root(Form base, Variable k) {
    Optional<List<Form>> coefficients = Structure.asPolynomial(base, k);
    if (coefficients.isEmpty() || coefficients.get().size() != 2) {
      return Optional.empty();
    }
    return coefficients
        .get()
        .getFirst()
        .negated()
        .dividedBy(coefficients.get().getLast())
        .asInteger();
  }

  private IntegerPoles with(Generator generator, Form f, Variable k) {
    if (generator instanceof Harmonic harmonic) {
      return withPolesOfArgument(harmonic.argument(), k);
    }
    return generator instanceof Factorial factorial && f.numerator().contains(factorial)
        ? withPolesOfArgument(factorial.argument(), k)
        : this;
  }

  /// The poles where argument = α k + β is a negative integer, α rational.
  private IntegerPoles withPolesOfArgument(Form argument, Variable k) {
    Optional<List<Form>> linear = Structure.asPolynomial(argument, k);
    if (linear.isEmpty() || linear.get().size() != 2) {
      return this;
    }
    Optional<Rational> slope = linear.get().getLast().asRational();
    Optional<Rational> start = linear.get().getFirst().asRational();
    if (slope.isEmpty() || start.isEmpty()) {
      return this;
    }
    Rational edge = Rational.MINUS_ONE.minus(start.get()).dividedBy(slope.get());
    if (slope.get().sign() > 0) {
      BigInteger last = edge.floor();
      return new IntegerPoles(points, Optional.of(upTo.map(last::max).orElse(last)), from);
    }
    BigInteger first = edge.negated().floor().negate();
    return new IntegerPoles(points, upTo, Optional.of(from.map(first::min).orElse(first)));
  }
}
