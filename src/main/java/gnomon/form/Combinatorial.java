package gnomon.form;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Factorials, binomial coefficients, falling and rising powers and harmonic numbers.
///
/// Normalised so that (u+1)! = (u+1) u! and H(u+1) = H(u) + 1/(u+1) hold by equality, and so that
/// the factorials of u, u + 1/m, …, u + (m−1)/m are written through m − 1 of them and (mu+m−1)!.
public final class Combinatorial {
  private Combinatorial() {}

  /// The largest number of factors that an integer shift may unfold into.
  private static final int FACTORS = 20_000;

  /// u! = Γ(u+1).
  ///
  /// @throws Refusal with [Reason#POLE] for a negative integer
  public static Form factorial(Form u) {
    Optional<Rational> value = u.asRational();
    if (value.isPresent() && value.get().isInteger()) {
      if (value.get().sign() < 0) {
        throw new Refusal(Reason.POLE, u);
      }
      return Form.of(Integers.factorial(count(value.get())));
    }
    Split split = Split.of(u);
    Form reduced = u.minus(Form.of(split.whole()));
    int parts = lastPart(split.fraction());
    Form kernel = parts > 0 ? multiplied(reduced, parts) : kernel(reduced);
    return kernel.times(steps(reduced, split.whole()));
  }

  private static Form kernel(Form reduced) {
    return Form.of(new Factorial(reduced));
  }

  /// The m for a fraction (m−1)/m with 2 ≤ m ≤ 12, otherwise 0.
  private static int lastPart(Rational fraction) {
    Rational rest = Rational.ONE.minus(fraction);
    boolean last = !fraction.isZero() && rest.numerator().equals(BigInteger.ONE);
    return last && rest.denominator().bitLength() < 4 ? rest.denominator().intValue() : 0;
  }

  /// (L + (m−1)/m)! by Gauss's multiplication formula, L! (L+1/m)! … (L+(m−1)/m)! = (2π)^((m−1)/2)
  /// m^(1/2−m(L+1)) (mL+m−1)!, which is Legendre's duplication formula for m = 2.
  ///
  /// Source: DLMF (5.5.6), from memory.
  private static Form multiplied(Form reduced, int m) {
    Form l = reduced.minus(Form.of(Rational.of(m - 1, m)));
    Form times = Form.of(m).times(l.plus(Form.ONE));
    Form top = factorial(times.minus(Form.ONE));
    Form circle = Elementary.power(Form.PI.times(Form.TWO), Form.of(Rational.of(m - 1, 2)));
    Form scale = Elementary.power(Form.of(m), Form.HALF.minus(times));
    Form bottom = Form.ONE;
    for (int j = 0; j < m - 1; j++) {
      bottom = bottom.times(factorial(l.plus(Form.of(Rational.of(j, m)))));
    }
    return top.times(circle).times(scale).dividedBy(bottom);
  }

  /// (reduced + whole)!/reduced!, a product of linear factors or its reciprocal.
  private static Form steps(Form reduced, int whole) {
    List<Form> factors = new ArrayList<>();
    for (int i = 1; i <= Math.abs(whole); i++) {
      Budget.checkpoint();
      factors.add(reduced.plus(Form.of(whole > 0 ? i : 1 - i)));
    }
    Form product = balanced(factors);
    return whole < 0 ? product.inverse() : product;
  }

  static Form balanced(List<Form> factors) {
    List<Form> rest = factors;
    while (rest.size() > 1) {
      List<Form> next = new ArrayList<>();
      for (int i = 0; i < rest.size(); i += 2) {
        next.add(i + 1 < rest.size() ? rest.get(i).times(rest.get(i + 1)) : rest.get(i));
      }
      rest = next;
    }
    return rest.isEmpty() ? Form.ONE : rest.getFirst();
  }

  private static int count(Rational value) {
    if (value.numerator().bitLength() > 24) {
      throw new Refusal(Reason.OUT_OF_RANGE, Form.of(value));
    }
    return value.intValueExact();
  }

  /// The constant part of an argument as an integer and a fraction in [0, 1).
  private record Split(int whole, Rational fraction) {
    static Split of(Form u) {
      Rational constant = constantTerm(u);
      if (constant.abs().compareTo(Rational.of(FACTORS)) > 0) {
        throw new Refusal(Reason.OUT_OF_RANGE, Form.of(constant));
      }
      return new Split(constant.floor().intValueExact(), constant.fractionalPart());
    }
  }

  /// The number c for which u − c lacks the leading monomial of its denominator in the numerator:
  /// the constant term of a polynomial, and additive on fractions too.
  private static Rational constantTerm(Form u) {
    Term leading = u.denominator().terms().getFirst();
    for (Term term : u.numerator().terms()) {
      if (term.monomial().equals(leading.monomial())) {
        return term.coefficient().dividedBy(leading.coefficient());
      }
    }
    return Rational.ZERO;
  }

  /// The binomial coefficient n!/(k! (n−k)!): for an integer k the polynomial in n of degree k, and
  /// 0 for negative k.
  public static Form binomial(Form n, Form k) {
    Optional<Integer> lower = k.asInteger().map(value -> count(Rational.of(value)));
    if (lower.isPresent()) {
      return lower.get() < 0 ? Form.ZERO : quotient(n, lower.get());
    }
    Optional<Rational> rest = n.minus(k).asRational().filter(Rational::isInteger);
    if (rest.isPresent() && !n.isConstant()) {
      return rest.get().sign() < 0 ? Form.ZERO : quotient(n, count(rest.get()));
    }
    if (isNegativeInteger(n)) {
      Form sign = Elementary.power(Form.MINUS_ONE, k);
      return sign.times(binomial(k.minus(n).minus(Form.ONE), k));
    }
    return factorial(n).dividedBy(factorial(k).times(factorial(n.minus(k))));
  }

  private static boolean isNegativeInteger(Form u) {
    return u.asInteger().filter(value -> value.signum() < 0).isPresent();
  }

  private static Form quotient(Form n, int k) {
    Optional<Integer> top = n.asInt().filter(value -> value >= 0);
    if (top.isPresent()) {
      return k > top.get() ? Form.ZERO : Form.of(Integers.binomial(top.get(), k));
    }
    return falling(n, Form.of(k)).times(Rational.of(Integers.factorial(k)).inverse());
  }

  /// x(x−1)…(x−n+1) = x!/(x−n)!; for negative n it is 1/((x+1)…(x−n)).
  ///
  /// @throws Refusal with [Reason#POLE] where a factor of the denominator is zero
  public static Form falling(Form x, Form n) {
    Optional<Integer> count = n.asInteger().map(value -> count(Rational.of(value)));
    if (count.isPresent()) {
      List<Form> factors = new ArrayList<>();
      for (int i = 0; i < Math.abs(count.get()); i++) {
        Budget.checkpoint();
        Form factor = count.get() > 0 ? x.minus(Form.of(i)) : x.plus(Form.of(i + 1));
        if (count.get() < 0 && factor.isZero()) {
          throw new Refusal(Reason.POLE, x);
        }
        factors.add(factor);
      }
      Form product = balanced(factors);
      return count.get() < 0 ? product.inverse() : product;
    }
    if (isNegativeInteger(x)) {
      return Elementary.power(Form.MINUS_ONE, n).times(rising(x.negated(), n));
    }
    if (x.equals(n)) {
      return factorial(x);
    }
    Optional<Rational> rest = x.minus(n).asRational().filter(Rational::isInteger);
    if (rest.isPresent() && rest.get().sign() < 0) {
      return Form.ZERO;
    }
    return factorial(x).dividedBy(factorial(x.minus(n)));
  }

  /// x(x+1)…(x+n−1) = (x+n−1)!/(x−1)!.
  ///
  /// @throws Refusal with [Reason#POLE] where a factor of the denominator is zero
  public static Form rising(Form x, Form n) {
    if (n.asInteger().isPresent()) {
      return falling(x.plus(n).minus(Form.ONE), n);
    }
    if (x.isZero()) {
      return Elementary.power(x, n);
    }
    if (isNegativeInteger(x)) {
      return Elementary.power(Form.MINUS_ONE, n).times(falling(x.negated(), n));
    }
    return factorial(x.plus(n).minus(Form.ONE)).dividedBy(factorial(x.minus(Form.ONE)));
  }

  /// The harmonic number H(u) = 1 + 1/2 + … + 1/u.
  public static Form harmonic(Form u) {
    return harmonic(u, 1);
  }

  /// The harmonic number H(u, r) = 1 + 1/2^r + … + 1/u^r of order r.
  ///
  /// @throws Refusal with [Reason#POLE] for a negative integer u
  public static Form harmonic(Form u, int order) {
    if (order <= 0) {
      throw new Refusal(Reason.OUT_OF_RANGE, Form.of(order));
    }
    Optional<Rational> value = u.asRational().filter(Rational::isInteger);
    if (value.isPresent()) {
      if (value.get().sign() < 0) {
        throw new Refusal(Reason.POLE, u);
      }
      return Form.of(harmonicNumber(1, count(value.get()) + 1, order));
    }
    Split split = Split.of(u);
    Form reduced = u.minus(Form.of(split.whole()));
    List<Form> parts = new ArrayList<>();
    boolean half = order == 1 && split.fraction().equals(Rational.HALF);
    parts.add(half ? halfHarmonic(reduced) : Form.of(new Harmonic(reduced, order)));
    for (int i = 1; i <= Math.abs(split.whole()); i++) {
      Budget.checkpoint();
      Form at = reduced.plus(Form.of(split.whole() > 0 ? i : 1 - i));
      Form step = at.power(-order);
      parts.add(split.whole() > 0 ? step : step.negated());
    }
    return Form.sum(parts);
  }

  /// H(L + 1/2) = 2 H(2L+1) − H(L) − 2 ln 2, the duplication formula of the digamma function.
  private static Form halfHarmonic(Form reduced) {
    Form l = reduced.minus(Form.HALF);
    Form odd = l.times(Form.TWO).plus(Form.ONE);
    Form twice = harmonic(odd, 1).minus(Elementary.ln(Form.TWO)).times(Form.TWO);
    return twice.minus(harmonic(l, 1));
  }

  private static Rational harmonicNumber(int from, int to, int order) {
    if (to - from <= 8) {
      Rational sum = Rational.ZERO;
      for (int i = from; i < to; i++) {
        sum = sum.plus(Rational.of(i).power(-order));
      }
      return sum;
    }
    Budget.checkpoint();
    int middle = (from + to) >>> 1;
    return harmonicNumber(from, middle, order).plus(harmonicNumber(middle, to, order));
  }
}
