package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.util.Arrays;
import java.util.Map;

/// Resultants by the subresultant sequence, whose divisions are all exact.
final class Resultant {

  private Resultant() {}

  static Polynomial of(Polynomial a, Polynomial b, Indeterminate indeterminate) {
    if (a.isZero() || b.isZero()) {
      return Polynomial.ZERO;
    }
    Polynomial[] left = toArray(a, indeterminate);
    Polynomial[] right = toArray(b, indeterminate);
    if (left.length < right.length) {
      Polynomial swapped = of(right, left);
      return left.length % 2 == 0 && right.length % 2 == 0 ? swapped.negated() : swapped;
    }
    return of(left, right);
  }

  /// The degree of `a` is at least that of `b`.
  private static Polynomial of(Polynomial[] a, Polynomial[] b) {
    Polynomial[] upper = a;
    Polynomial[] lower = b;
    Polynomial g = Polynomial.ONE;
    Polynomial h = Polynomial.ONE;
    boolean negative = false;
    while (lower.length > 1) {
      Budget.checkpoint();
      int gap = upper.length - lower.length;
      negative ^= upper.length % 2 == 0 && lower.length % 2 == 0;
      Polynomial[] rest = pseudoRemainder(upper, lower);
      if (rest.length == 0) {
        return Polynomial.ZERO;
      }
      Polynomial divisor = g.times(h.power(gap));
      Polynomial lead = lower[lower.length - 1];
      upper = lower;
      lower = Arrays.stream(rest).map(c -> c.dividedBy(divisor)).toArray(Polynomial[]::new);
      g = lead;
      h = next(g, h, gap);
    }
    if (lower.length == 0) {
      return Polynomial.ZERO;
    }
    Polynomial result = next(lower[0], h, upper.length - 1);
    return negative ? result.negated() : result;
  }

  /// g^gap / h^(gap-1), which is exact.
  private static Polynomial next(Polynomial g, Polynomial h, int gap) {
    if (gap == 0) {
      return h;
    }
    return gap == 1 ? g : g.power(gap).dividedBy(h.power(gap - 1));
  }

  /// The remainder of lead(b)^(deg a - deg b + 1) a by b.
  private static Polynomial[] pseudoRemainder(Polynomial[] a, Polynomial[] b) {
    Polynomial[] rest = a.clone();
    Polynomial lead = b[b.length - 1];
    for (int i = a.length - 1; i >= b.length - 1; i--) {
      Polynomial factor = rest[i];
      for (int j = 0; j < i; j++) {
        rest[j] = rest[j].times(lead);
        int other = j - (i - b.length + 1);
        if (other >= 0) {
          rest[j] = rest[j].minus(factor.times(b[other]));
        }
      }
    }
    int length = b.length - 1;
    while (length > 0 && rest[length - 1].isZero()) {
      length--;
    }
    return Arrays.copyOf(rest, length);
  }

  private static Polynomial[] toArray(Polynomial polynomial, Indeterminate indeterminate) {
    int degree = polynomial.degree(indeterminate).intValueExact();
    Polynomial[] coefficients = new Polynomial[Math.max(0, degree) + 1];
    Arrays.fill(coefficients, Polynomial.ZERO);
    for (Map.Entry<Rational, Polynomial> entry :
        polynomial.coefficients(indeterminate).entrySet()) {
      if (entry.getKey().sign() < 0) {
        throw new Refusal(Reason.NOT_NATURAL, entry.getKey());
      }
      coefficients[entry.getKey().intValueExact()] = entry.getValue();
    }
    return coefficients;
  }
}
