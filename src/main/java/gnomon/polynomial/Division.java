package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// Exact division. Monomials and contents are split off first; then both sides are primitive over
/// the integers, so by the lemma of Gauss an exact quotient has integer coefficients, and the first
/// leading coefficient that does not divide ends the attempt.
final class Division {

  private Division() {}

  static Optional<Polynomial> exact(Polynomial a, Polynomial b) {
    if (b.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO);
    }
    if (a.isZero()) {
      return Optional.of(a);
    }
    if (b.isConstant()) {
      return Optional.of(a.dividedBy(b.constantValue()));
    }
    Monomial mine = a.monomialContent();
    Monomial its = b.monomialContent();
    Monomial shift = mine.dividedBy(its);
    if (addsNegative(shift, mine)) {
      return Optional.empty();
    }
    if (b.isMonomial()) {
      return Optional.of(a.times(its.power(Rational.MINUS_ONE)).dividedBy(b.leadingCoefficient()));
    }
    if (b.size() == a.size() && a.equals(b)) {
      return Optional.of(Polynomial.ONE);
    }
    Rational scale = a.content().dividedBy(b.content());
    return natural(strip(a, mine), strip(b, its))
        .map(quotient -> quotient.times(shift).times(scale));
  }

  private static Polynomial strip(Polynomial polynomial, Monomial content) {
    return polynomial.times(content.power(Rational.MINUS_ONE)).primitivePart();
  }

  /// Whether the quotient's monomial content has a negative exponent beyond the dividend's.
  private static boolean addsNegative(Monomial shift, Monomial mine) {
    for (Monomial.Power power : shift.factors()) {
      if (power.exponent().sign() < 0
          && power.exponent().compareTo(mine.exponent(power.indeterminate())) < 0) {
        return true;
      }
    }
    return false;
  }

  /// Both primitive over the integers, without monomial content, the divisor with several terms.
  private static Optional<Polynomial> natural(Polynomial a, Polynomial b) {
    if (!a.indeterminates().containsAll(b.indeterminates())) {
      return Optional.empty();
    }
    if (Rescaling.isNeededFor(b)) {
      Rescaling rescaling = Rescaling.of(a, b);
      return natural(rescaling.scale(a), rescaling.scale(b)).map(rescaling::restore);
    }
    Packing packing;
    try {
      packing = Packing.of(a, 1, Polynomial.ZERO, 0);
    } catch (ArithmeticException tooWide) {
      return termwise(a, b);
    }
    long[] divisorKeys;
    long[] bounds;
    try {
      bounds = packing.quotientBounds(b);
      divisorKeys = packing.keysFromZero(b);
    } catch (ArithmeticException indivisible) {
      return Optional.empty();
    }
    Attempt attempt = new Attempt(packing, bounds, divisorKeys, b);
    return attempt.run(packing.firstKeys(a), Product.IntegerTerms.of(a).numerators());
  }

  /// Long division on monomials that are too wide to pack.
  private static Optional<Polynomial> termwise(Polynomial a, Polynomial b) {
    Polynomial rest = a;
    List<Term> quotient = new ArrayList<>();
    Term lead = b.leadingTerm();
    while (!rest.isZero()) {
      Budget.checkpoint();
      Term top = rest.leadingTerm();
      Monomial monomial = top.monomial().dividedBy(lead.monomial());
      Rational factor = top.coefficient().dividedBy(lead.coefficient());
      if (addsNegative(monomial, Monomial.ONE) || !factor.isInteger()) {
        return Optional.empty();
      }
      quotient.add(new Term(monomial, factor));
      rest = rest.minus(b.times(monomial).times(factor));
    }
    return Optional.of(Polynomial.ofDistinct(quotient));
  }

  /// The state of one long division on packed monomials.
  private static final class Attempt {
    private final Packing packing;
    private final long[] bounds;
    private final long[] divisorKeys;
    private final BigInteger[] divisor;
    private final int lead;
    private final List<Term> quotient = new ArrayList<>();

    Attempt(Packing packing, long[] bounds, long[] divisorKeys, Polynomial b) {
      this.packing = packing;
      this.bounds = bounds;
      this.divisorKeys = divisorKeys;
      this.divisor = Product.IntegerTerms.of(b).numerators();
      int largest = 0;
      for (int i = 1; i < divisorKeys.length; i++) {
        largest = divisorKeys[i] > divisorKeys[largest] ? i : largest;
      }
      this.lead = largest;
    }

    Optional<Polynomial> run(long[] keys, BigInteger[] values) {
      boolean done =
          packing.size() <= 16L * keys.length + 64 ? dense(keys, values) : sparse(keys, values);
      return done ? Optional.of(Polynomial.ofDistinct(quotient)) : Optional.empty();
    }

    /// The next quotient coefficient, or nothing when the division cannot be exact.
    private Optional<BigInteger> next(long key, BigInteger value) {
      long shift = key - divisorKeys[lead];
      if (shift < 0 || !packing.within(shift, bounds)) {
        return Optional.empty();
      }
      BigInteger[] parts = value.divideAndRemainder(divisor[lead]);
      if (parts[1].signum() != 0) {
        return Optional.empty();
      }
      quotient.add(packing.termFromZero(shift, Rational.of(parts[0])));
      return Optional.of(parts[0]);
    }

    private boolean dense(long[] keys, BigInteger[] values) {
      BigInteger[] rest = new BigInteger[(int) packing.size()];
      Arrays.fill(rest, BigInteger.ZERO);
      for (int i = 0; i < keys.length; i++) {
        rest[(int) keys[i]] = values[i];
      }
      for (int key = rest.length - 1; key >= 0; key--) {
        if (rest[key].signum() != 0) {
          Budget.checkpoint();
          Optional<BigInteger> factor = next(key, rest[key]);
          if (factor.isEmpty()) {
            return false;
          }
          int shift = (int) (key - divisorKeys[lead]);
          for (int i = 0; i < divisorKeys.length; i++) {
            int at = (int) divisorKeys[i] + shift;
            rest[at] = rest[at].subtract(factor.get().multiply(divisor[i]));
          }
        }
      }
      return true;
    }

    private boolean sparse(long[] keys, BigInteger[] values) {
      TreeMap<Long, BigInteger> rest = new TreeMap<>();
      for (int i = 0; i < keys.length; i++) {
        rest.put(keys[i], values[i]);
      }
      while (!rest.isEmpty()) {
        Budget.checkpoint();
        Map.Entry<Long, BigInteger> top = rest.lastEntry();
        Optional<BigInteger> factor = next(top.getKey(), top.getValue());
        if (factor.isEmpty()) {
          return false;
        }
        BigInteger negative = factor.get().negate();
        long shift = top.getKey() - divisorKeys[lead];
        for (int i = 0; i < divisorKeys.length; i++) {
          BigInteger product = negative.multiply(divisor[i]);
          rest.merge(divisorKeys[i] + shift, product, Attempt::addOrDrop);
        }
      }
      return true;
    }

    private static BigInteger addOrDrop(BigInteger a, BigInteger b) {
      BigInteger sum = a.add(b);
      return sum.signum() == 0 ? null : sum;
    }
  }
}
