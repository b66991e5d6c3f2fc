package gnomon.series;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.AngleConstant;
import gnomon.form.Arc;
import gnomon.form.Base;
import gnomon.form.CoefficientSeries;
import gnomon.form.Constant;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Exponential;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.InverseSeries;
import gnomon.form.Logarithm;
import gnomon.form.Moment;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// One expansion of a form in powers of t at a fixed working order.
///
/// A product of powers b^e with b(t) = c t^v (1 + …) is expanded as c^e t^(v e) (1 + …)^e; the
/// exponents of t of the whole product must add up to an integer. Logarithms and arc functions are
/// the integral of their derivative, exponentials the solution of y' = y·(their logarithmic
/// derivative).
final class FormExpansion {

  private final Generator t;
  private final int work;
  private final Map<Generator, PowerSeries> known = new HashMap<>();

  FormExpansion(Generator t, int work) {
    this.t = t;
    this.work = work;
  }

  /// Signals that a divisor is zero as far as the working order reaches.
  static final class TooShort extends RuntimeException {
    private static final long serialVersionUID = 1L;

    TooShort() {
      super("a divisor is zero to the working order", null, false, false);
    }
  }

  PowerSeries series(Form form) {
    if (!form.dependsOn(t)) {
      return PowerSeries.constant(form, work);
    }
    Monomial below = form.denominator().monomialContent();
    Part top = polynomial(form.numerator(), below);
    Polynomial rest = form.denominator().times(below.power(Rational.MINUS_ONE));
    Part bottom = rest.isOne() ? Part.of(PowerSeries.constant(Form.ONE, work)) : polynomial(rest);
    if (!top.singular().equals(bottom.singular())) {
      throw new Refusal(Reason.NO_SERIES, form);
    }
    return rest.isOne() ? top.series() : top.series().times(inverse(bottom.series()));
  }

  /// A series times the powers b^s of fixed bases b with exponents s singular at t = 0, given by
  /// their coefficients of t^(−1), t^(−2), …. In a quotient they may cancel.
  private record Part(PowerSeries series, Map<Base, List<Form>> singular) {
    static Part of(PowerSeries series) {
      return new Part(series, Map.of());
    }
  }

  private static PowerSeries inverse(PowerSeries series) {
    if (series.isZero()) {
      throw new TooShort();
    }
    return series.inverse();
  }

  /// The polynomial divided by a monomial, so that exponents that cancel are not expanded apart.
  private Part polynomial(Polynomial polynomial, Monomial below) {
    Rational ofT = below.exponent(t);
    Monomial others = below.without(t);
    if (ofT.isInteger()) {
      Polynomial quotient = polynomial.times(others.power(Rational.MINUS_ONE));
      Optional<PowerSeries> fast = ExponentialSums.expand(quotient, t, work);
      if (fast.isPresent()) {
        return Part.of(fast.get().shifted(-ofT.intValueExact()));
      }
    }
    return termByTerm(polynomial, below);
  }

  private Part polynomial(Polynomial polynomial) {
    return polynomial(polynomial, Monomial.ONE);
  }

  private Part termByTerm(Polynomial polynomial, Monomial below) {
    Part sum = null;
    for (var term : polynomial.terms()) {
      Budget.checkpoint();
      Part part = monomial(term.monomial().dividedBy(below));
      PowerSeries series = part.series().times(Form.of(term.coefficient()));
      if (sum != null && !sum.singular().equals(part.singular())) {
        throw new Refusal(Reason.NO_SERIES, Form.of(polynomial));
      }
      sum = new Part(sum == null ? series : sum.series().plus(series), part.singular());
    }
    return sum == null ? Part.of(PowerSeries.zero(work)) : sum;
  }

  /// The running product of the factors of a monomial.
  private static final class Product {
    PowerSeries series;
    Form free = Form.ONE;
    Form exponent = Form.ZERO;
    final Map<Base, PowerSeries> powers = new HashMap<>();
    final Map<Base, List<Form>> singular = new HashMap<>();

    Product(int work) {
      series = PowerSeries.constant(Form.ONE, work);
    }
  }

  private Part monomial(Monomial monomial) {
    Product product = new Product(work);
    for (var factor : monomial.factors()) {
      multiply(product, factor.indeterminate(), factor.exponent());
    }
    product.powers.forEach((base, u) -> multiplyFixedBase(product, base, u));
    int shift =
        product
            .exponent
            .asInteger()
            .map(java.math.BigInteger::intValueExact)
            .orElseThrow(() -> new Refusal(Reason.NO_SERIES, "t", product.exponent));
    return new Part(product.series.times(product.free).shifted(shift), product.singular);
  }

  private void multiply(Product product, Indeterminate indeterminate, Rational exponent) {
    Generator g = (Generator) indeterminate;
    if (!g.dependsOn(t)) {
      product.free = product.free.times(Form.of(g, exponent));
    } else if (g.equals(t)) {
      product.exponent = product.exponent.plus(Form.of(exponent));
    } else if (g instanceof Exponential power) {
      multiplyPower(product, power, exponent);
    } else {
      multiplyBase(product, kernel(g), Form.of(exponent));
    }
  }

  /// The factor base^e, e free of t, for a base that depends on t.
  private void multiplyBase(Product product, PowerSeries base, Form exponent) {
    if (base.isZero()) {
      throw new TooShort();
    }
    product.exponent = product.exponent.plus(exponent.times(Form.of(base.valuation())));
    Form lead = base.coefficient(base.valuation());
    product.free = product.free.times(Elementary.power(lead, exponent));
    product.series = product.series.times(base.unitPower(exponent));
  }

  private void multiplyPower(Product product, Exponential power, Rational exponent) {
    if (power.base() instanceof Base.Of(Form base)
        && base.dependsOn(t)
        && !power.unit().dependsOn(t)) {
      multiplyBase(product, series(base), power.unit().times(exponent));
      return;
    }
    boolean fixedBase = !(power.base() instanceof Base.Of(Form base) && base.dependsOn(t));
    if (fixedBase && !(power.base() instanceof Base.Zero)) {
      product.powers.merge(power.base(), series(power.unit().times(exponent)), PowerSeries::plus);
      return;
    }
    PowerSeries rate = series(power.logarithmicDerivative(t).times(exponent));
    if (rate.valuation() < 0) {
      throw new Refusal(Reason.NO_SERIES, Form.of(power));
    }
    product.free = product.free.times(Form.of(power, exponent).substitute(t, Form.ZERO));
    product.series = product.series.times(rate.integral().truncated(work).exp());
  }

  /// The factor base^u for a base free of t and a series u.
  private static void multiplyFixedBase(Product product, Base base, PowerSeries u) {
    if (u.order() < 0) {
      throw new TooShort();
    }
    if (u.valuation() < 0) {
      List<Form> poles = new ArrayList<>();
      for (int k = -1; k >= u.valuation(); k--) {
        poles.add(u.coefficient(k));
      }
      product.singular.put(base, poles);
    }
    Form start = u.coefficient(0);
    PowerSeries rest = PowerSeries.of(u.coefficients(), 0, u.order());
    rest = rest.minus(PowerSeries.constant(start, u.order()));
    product.free = product.free.times(Elementary.power(base.value(), start));
    product.series = product.series.times(rest.times(base.logarithm()).exp());
  }

  private PowerSeries kernel(Generator g) {
    PowerSeries found = known.get(g);
    if (found == null) {
      found = expand(g);
      known.put(g, found);
    }
    return found;
  }

  private PowerSeries expand(Generator g) {
    return switch (g) {
      case Logarithm(Form argument) -> logarithm(argument, g);
      case Arc _ -> fromDerivative(g);
      case InverseSeries inverse -> inverseSeries(inverse);
      case CoefficientSeries series -> coefficientSeries(series);
      case Variable _, Dual _, Constant _, AngleConstant _, Exponential _ ->
          throw new IllegalStateException("expanded elsewhere: " + g.key());
      case Factorial _, Harmonic _, Unknown _, Accumulation _, Moment _ ->
          throw new Refusal(Reason.NO_SERIES, Form.of(g));
    };
  }

  private PowerSeries logarithm(Form argument, Generator g) {
    PowerSeries inner = series(argument);
    if (inner.isZero()) {
      throw new TooShort();
    }
    if (inner.valuation() != 0) {
      throw new Refusal(Reason.NO_SERIES, Form.of(g));
    }
    return inner.log();
  }

  private PowerSeries fromDerivative(Generator g) {
    PowerSeries slope = series(g.derivative(t));
    if (slope.valuation() < 0) {
      throw new Refusal(Reason.NO_SERIES, Form.of(g));
    }
    Form start = Form.of(g).substitute(t, Form.ZERO);
    PowerSeries rest = slope.integral();
    return rest.plus(PowerSeries.constant(start, rest.order())).truncated(work);
  }

  private PowerSeries coefficientSeries(CoefficientSeries given) {
    PowerSeries argument = series(given.argument());
    if (argument.valuation() < 1 || given.coefficient().dependsOn(t)) {
      throw new Refusal(Reason.NO_SERIES, Form.of(given));
    }
    List<Form> coefficients = new ArrayList<>();
    for (int k = 0; k <= work; k++) {
      coefficients.add(given.coefficient().substitute(given.index(), Form.of(k)));
    }
    return PowerSeries.of(coefficients, 0, work).compose(argument);
  }

  private PowerSeries inverseSeries(InverseSeries inverse) {
    PowerSeries argument = series(inverse.argument());
    if (argument.valuation() < 1 || inverse.of().dependsOn(t) && !inverse.in().equals(t)) {
      throw new Refusal(Reason.NO_SERIES, Form.of(inverse));
    }
    PowerSeries f = Expansion.of(inverse.of(), inverse.in(), Math.max(work, 1));
    return f.reversion().compose(argument);
  }
}
