package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.LinkedHashMap;
import java.util.Map;

/// The relations of the algebraic generators, applied to polynomials.
final class Relations {
  private Relations() {}

  /// A quotient on its way to the normal form.
  record Quotient(Polynomial up, Polynomial over) {}

  static boolean applies(Polynomial polynomial) {
    for (Term term : polynomial.terms()) {
      for (Monomial.Power factor : term.monomial().factors()) {
        if (isOutside(factor)) {
          return true;
        }
      }
    }
    return false;
  }

  private static boolean isOutside(Monomial.Power factor) {
    Generator g = (Generator) factor.indeterminate();
    if (Reduction.isZeroPower(g)) {
      return !factor.exponent().isOne();
    }
    if (!g.isAlgebraic()) {
      return false;
    }
    boolean belowOne = factor.exponent().compareTo(Rational.ONE) < 0;
    boolean unitI = g.equals(Constant.I) && factor.exponent().isOne();
    return factor.exponent().sign() < 0 || !belowOne && !unitI;
  }

  /// The polynomial with every exponent of an algebraic generator brought into [0, 1), of i into
  /// {0, 1}; rational radicands leave a denominator.
  static Quotient reduce(Polynomial polynomial) {
    if (!applies(polynomial)) {
      return new Quotient(polynomial, Polynomial.ONE);
    }
    Map<Exponential, int[]> ranges = radicandRanges(polynomial);
    Polynomial over = Polynomial.ONE;
    for (Map.Entry<Exponential, int[]> range : ranges.entrySet()) {
      Form radicand = range.getKey().base().value();
      over = over.times(radicand.denominator().power(range.getValue()[1]));
      over = over.times(radicand.numerator().power(range.getValue()[0]));
    }
    Polynomial sum = Polynomial.ZERO;
    for (Term term : polynomial.terms()) {
      sum = sum.plus(reduced(term, ranges));
    }
    return applies(sum) || applies(over) ? again(sum, over) : new Quotient(sum, over);
  }

  private static Quotient again(Polynomial up, Polynomial over) {
    Quotient a = reduce(up);
    Quotient b = reduce(over);
    return new Quotient(a.up().times(b.over()), b.up().times(a.over()));
  }

  /// For each radical of a form, how many whole radicands occur at most below and above.
  private static Map<Exponential, int[]> radicandRanges(Polynomial polynomial) {
    Map<Exponential, int[]> ranges = new LinkedHashMap<>();
    for (Term term : polynomial.terms()) {
      for (Monomial.Power factor : term.monomial().factors()) {
        if (factor.indeterminate() instanceof Exponential power
            && power.isAlgebraic()
            && power.base() instanceof Base.Of) {
          int whole = factor.exponent().floor().intValueExact();
          int[] range = ranges.computeIfAbsent(power, _ -> new int[2]);
          range[0] = Math.max(range[0], -whole);
          range[1] = Math.max(range[1], whole);
        }
      }
    }
    return ranges;
  }

  private static Polynomial reduced(Term term, Map<Exponential, int[]> ranges) {
    Rational coefficient = term.coefficient();
    Monomial monomial = term.monomial();
    Polynomial extra = Polynomial.ONE;
    for (Monomial.Power factor : term.monomial().factors()) {
      Generator g = (Generator) factor.indeterminate();
      if (Reduction.isZeroPower(g)) {
        monomial = monomial.without(g).times(Monomial.of(g, Rational.ONE));
      } else if (g.equals(Constant.I)) {
        int turns = factor.exponent().numerator().mod(BigInteger.valueOf(4)).intValue();
        monomial = monomial.without(g);
        if (turns % 2 == 1) {
          monomial = monomial.times(Monomial.of(g, Rational.ONE));
        }
        coefficient = turns >= 2 ? coefficient.negated() : coefficient;
      } else if (g instanceof Exponential power
          && power.isAlgebraic()
          && power.base() instanceof Base.Prime(BigInteger prime)) {
        int whole = factor.exponent().floor().intValueExact();
        monomial = fractional(monomial, factor);
        coefficient = coefficient.times(Rational.of(prime).power(whole));
      }
    }
    for (Map.Entry<Exponential, int[]> range : ranges.entrySet()) {
      Rational exponent = term.monomial().exponent(range.getKey());
      int whole = exponent.floor().intValueExact();
      Form radicand = range.getKey().base().value();
      monomial = fractional(monomial, new Monomial.Power(range.getKey(), exponent));
      extra = extra.times(radicand.numerator().power(whole + range.getValue()[0]));
      extra = extra.times(radicand.denominator().power(range.getValue()[1] - whole));
    }
    return extra.times(Polynomial.of(monomial, coefficient));
  }

  private static Monomial fractional(Monomial monomial, Monomial.Power factor) {
    Rational rest = factor.exponent().fractionalPart();
    Monomial without = monomial.without(factor.indeterminate());
    return rest.isZero() ? without : without.times(Monomial.of(factor.indeterminate(), rest));
  }
}
