package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/// Clears an algebraic generator from a denominator.
///
/// With z the generator's smallest fractional power in sight, z^m = β: for even m the conjugate z →
/// −z leaves only even powers; for odd m the inverse is found by linear algebra over 1, z, …,
/// z^(m−1).
final class Rationalisation {
  private Rationalisation() {}

  static Form without(Generator g, Polynomial numerator, Polynomial denominator) {
    int m = period(g, denominator);
    Rational step = g.equals(Constant.I) ? Rational.ONE : Rational.of(1, m);
    List<Polynomial> parts = split(g, step, m, denominator);
    if (m % 2 == 0) {
      Polynomial conjugate = Polynomial.ZERO;
      for (int j = 0; j < m; j++) {
        Polynomial part = power(g, step, j).times(parts.get(j));
        conjugate = j % 2 == 0 ? conjugate.plus(part) : conjugate.minus(part);
      }
      Polynomial product = denominator.times(conjugate);
      if (Form.of(product).isZero()) {
        throw new Refusal(Reason.ZERO_DIVISOR, new Form(denominator, Polynomial.ONE));
      }
      return Reduction.fraction(numerator.times(conjugate), product);
    }
    return Form.of(numerator).times(inverse(g, step, parts));
  }

  private static Polynomial power(Generator g, Rational step, int j) {
    Rational exponent = step.times(Rational.of(j));
    return exponent.isZero()
        ? Polynomial.ONE
        : Polynomial.of(Monomial.of(g, exponent), Rational.ONE);
  }

  /// The m with z^m a form free of the generator: 2 for i, else the common denominator.
  private static int period(Generator g, Polynomial denominator) {
    if (g.equals(Constant.I)) {
      return 2;
    }
    BigInteger common = BigInteger.ONE;
    for (Rational exponent : denominator.coefficients(g).keySet()) {
      BigInteger d = exponent.denominator();
      common = common.divide(common.gcd(d)).multiply(d);
    }
    return common.intValueExact();
  }

  private static List<Polynomial> split(Generator g, Rational step, int m, Polynomial p) {
    Map<Rational, Polynomial> coefficients = p.coefficients(g);
    List<Polynomial> parts = new ArrayList<>();
    for (int j = 0; j < m; j++) {
      parts.add(coefficients.getOrDefault(step.times(Rational.of(j)), Polynomial.ZERO));
    }
    return parts;
  }

  /// The c = Σ c_j z^j with c·Σ d_j z^j = 1, by elimination.
  private static Form inverse(Generator g, Rational step, List<Polynomial> parts) {
    int m = parts.size();
    Form beta = ((Exponential) g).base().value();
    List<List<Form>> rows = new ArrayList<>();
    for (int i = 0; i < m; i++) {
      List<Form> row = new ArrayList<>();
      for (int j = 0; j < m; j++) {
        Form entry = Form.of(parts.get(Math.floorMod(i - j, m)));
        row.add(i >= j ? entry : entry.times(beta));
      }
      row.add(i == 0 ? Form.ONE : Form.ZERO);
      rows.add(row);
    }
    List<Form> solution = LinearSystem.solve(rows);
    Form sum = Form.ZERO;
    for (int j = 0; j < m; j++) {
      sum = sum.plus(solution.get(j).times(Form.of(power(g, step, j))));
    }
    return sum;
  }
}
