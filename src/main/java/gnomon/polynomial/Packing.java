package gnomon.polynomial;

import gnomon.number.Rational;
import java.util.Arrays;
import java.util.List;
import java.util.SortedSet;

/// Monomials as machine integers: exponents, counted from the lowest that occurs, become the digits
/// of a mixed radix wide enough for the product, so that multiplying monomials adds the integers.
///
/// Wide enough for a^m b^n, where `a` and `b` are given polynomials.
final class Packing {

  private final Indeterminate[] indeterminates;
  private final long[] steps;
  private final long[] strides;
  private final long size;
  private final Range first;
  private final Range second;
  private final long[] low;

  /// The exponents of one polynomial: lowest and highest of each indeterminate, in steps.
  private record Range(long[] low, long[] high) {}

  private Packing(Polynomial a, long m, Polynomial b, long n) {
    SortedSet<Indeterminate> all = a.indeterminates();
    all.addAll(b.indeterminates());
    indeterminates = all.toArray(Indeterminate[]::new);
    steps = new long[indeterminates.length];
    Arrays.fill(steps, 1);
    refineSteps(a);
    refineSteps(b);
    first = range(a);
    second = range(b);
    low = new long[steps.length];
    strides = new long[steps.length];
    long stride = 1;
    for (int i = steps.length - 1; i >= 0; i--) {
      low[i] =
          Math.addExact(Math.multiplyExact(first.low[i], m), Math.multiplyExact(second.low[i], n));
      strides[i] = stride;
      long width =
          Math.addExact(
              Math.multiplyExact(first.high[i] - first.low[i], m),
              Math.multiplyExact(second.high[i] - second.low[i], n));
      stride = Math.multiplyExact(stride, Math.addExact(width, 1));
    }
    size = stride;
  }

  /// The packing for `a^m b^n`.
  ///
  /// @throws ArithmeticException when the exponents do not fit one machine integer
  static Packing of(Polynomial a, long m, Polynomial b, long n) {
    return new Packing(a, m, b, n);
  }

  private void refineSteps(Polynomial polynomial) {
    for (Term term : polynomial.terms()) {
      Monomial monomial = term.monomial();
      if (monomial.denominator != 1) {
        for (int j = 0; j < monomial.exponents.length; j++) {
          int i = Arrays.binarySearch(indeterminates, monomial.indeterminates[j]);
          long common = Monomial.gcd(Math.abs(monomial.exponents[j]), monomial.denominator);
          steps[i] = Monomial.lcm(steps[i], monomial.denominator / common);
        }
      }
    }
  }

  private Range range(Polynomial polynomial) {
    long[] lowest = new long[steps.length];
    long[] highest = new long[steps.length];
    int[] seen = new int[steps.length];
    Places places = new Places();
    for (Term term : polynomial.terms()) {
      Monomial monomial = term.monomial();
      int[] at = places.of(monomial);
      for (int j = 0; j < at.length; j++) {
        int i = at[j];
        long exponent = inSteps(monomial, j, i);
        lowest[i] = seen[i] == 0 ? exponent : Math.min(lowest[i], exponent);
        highest[i] = seen[i] == 0 ? exponent : Math.max(highest[i], exponent);
        seen[i]++;
      }
    }
    for (int i = 0; i < seen.length; i++) {
      if (seen[i] < polynomial.size()) {
        lowest[i] = Math.min(lowest[i], 0);
        highest[i] = Math.max(highest[i], 0);
      }
    }
    return new Range(lowest, highest);
  }

  private long inSteps(Monomial monomial, int j, int i) {
    return monomial.denominator == 1
        ? Math.multiplyExact(monomial.exponents[j], steps[i])
        : Math.multiplyExact(monomial.exponents[j], steps[i]) / monomial.denominator;
  }

  /// Where the indeterminates of consecutive monomials stand; they mostly share them.
  private final class Places {
    private Indeterminate[] last = Monomial.ONE.indeterminates;
    private int[] places = new int[0];

    int[] of(Monomial monomial) {
      if (monomial.indeterminates != last) {
        last = monomial.indeterminates;
        places = new int[last.length];
        for (int j = 0; j < last.length; j++) {
          places[j] = Arrays.binarySearch(indeterminates, last[j]);
        }
      }
      return places;
    }
  }

  /// One more than the largest key that the product can have.
  long size() {
    return size;
  }

  /// The keys of the terms of `a`, the first polynomial.
  long[] firstKeys(Polynomial a) {
    return keys(a, first.low);
  }

  /// The keys of the terms of `b`, the second polynomial.
  long[] secondKeys(Polynomial b) {
    return keys(b, second.low);
  }

  private long[] keys(Polynomial polynomial, long[] origin) {
    List<Term> terms = polynomial.terms();
    long[] keys = new long[terms.size()];
    long base = 0;
    for (int i = 0; i < strides.length; i++) {
      base -= origin[i] * strides[i];
    }
    Places places = new Places();
    for (int t = 0; t < keys.length; t++) {
      Monomial monomial = terms.get(t).monomial();
      int[] at = places.of(monomial);
      long key = base;
      for (int j = 0; j < at.length; j++) {
        key += inSteps(monomial, j, at[j]) * strides[at[j]];
      }
      keys[t] = key;
    }
    return keys;
  }

  /// The monomial of the product that has this key.
  Monomial monomial(long key) {
    return monomial(key, low);
  }

  private Monomial monomial(long key, long[] origin) {
    long denominator = 1;
    long[] exponents = new long[strides.length];
    long rest = key;
    for (int i = 0; i < strides.length; i++) {
      exponents[i] = origin[i] + rest / strides[i];
      rest %= strides[i];
      denominator = Monomial.lcm(denominator, steps[i]);
    }
    if (denominator != 1) {
      for (int i = 0; i < strides.length; i++) {
        exponents[i] = Math.multiplyExact(exponents[i], denominator / steps[i]);
      }
    }
    return Monomial.of(indeterminates, exponents, denominator);
  }

  /// By how many steps the quotient of the first polynomial by `divisor` can reach in each
  /// indeterminate; both have lowest exponents 0.
  ///
  /// @throws ArithmeticException when the divisor does not fit into the first polynomial
  long[] quotientBounds(Polynomial divisor) {
    Packing its = new Packing(divisor, 1, Polynomial.ZERO, 0);
    long[] bounds = new long[strides.length];
    int next = 0;
    for (int i = 0; i < strides.length; i++) {
      bounds[i] = first.high[i];
      if (next < its.strides.length && its.indeterminates[next].equals(indeterminates[i])) {
        if (steps[i] % its.steps[next] != 0) {
          throw new ArithmeticException("finer steps");
        }
        bounds[i] -= its.first.high[next] * (steps[i] / its.steps[next]);
        next++;
      }
      if (bounds[i] < 0) {
        throw new ArithmeticException("higher degree");
      }
    }
    return bounds;
  }

  /// The keys of a polynomial with lowest exponents 0.
  long[] keysFromZero(Polynomial polynomial) {
    return keys(polynomial, new long[strides.length]);
  }

  /// Whether every exponent that `key` stands for, counted from 0, is at most its bound.
  boolean within(long key, long[] bounds) {
    long rest = key;
    for (int i = 0; i < strides.length; i++) {
      if (rest / strides[i] > bounds[i]) {
        return false;
      }
      rest %= strides[i];
    }
    return true;
  }

  /// The term whose exponents are counted from 0.
  Term termFromZero(long key, Rational coefficient) {
    return new Term(monomial(key, new long[strides.length]), coefficient);
  }

  /// The term of the product with this key.
  Term term(long key, Rational coefficient) {
    return new Term(monomial(key), coefficient);
  }
}
