package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Powers with any exponent, brought to power kernels.
final class Powers {
  private Powers() {}

  /// base^exponent.
  ///
  /// @throws Refusal with [Reason#ROOT_OUT_OF_FIELD] for a root of unity outside ℚ(i, √2, √3), with
  ///   [Reason#DIVISION_BY_ZERO] for a negative power of zero
  static Form power(Form base, Form exponent) {
    Optional<Rational> constant = exponent.asRational();
    if (constant.isPresent()) {
      Rational q = constant.get();
      if (q.isInteger()) {
        return base.power(intExponent(base, q));
      }
      return base.isZero() || base.isOne() ? zeroOrOne(base, q) : rationalPower(base, q);
    }
    if (base.isOne()) {
      return base;
    }
    if (base.isZero()) {
      return raise(new Base.Zero(), exponent);
    }
    List<Form> factors = new ArrayList<>();
    for (Decomposition.Part part : Decomposition.of(base).parts()) {
      factors.add(raise(part.base(), part.exponent().times(exponent)));
    }
    return Form.product(factors);
  }

  private static int intExponent(Form base, Rational q) {
    if (q.fitsInt() && Math.abs((long) q.intValueExact()) < Integer.MAX_VALUE) {
      return q.intValueExact();
    }
    if (base.isZero() || base.isOne()) {
      return q.sign();
    }
    if (base.equals(Form.MINUS_ONE)) {
      return q.numerator().testBit(0) ? 1 : 2;
    }
    throw new Refusal(Reason.EXPONENT_TOO_LARGE, Form.of(q));
  }

  private static Form zeroOrOne(Form base, Rational q) {
    if (base.isZero() && q.sign() < 0) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, Form.ONE);
    }
    return base;
  }

  /// A root: constants and series split into bases, a function of variables stays under one radical
  /// but for a positive rational factor, since √(ab) need not be √a √b.
  private static Form rationalPower(Form base, Rational q) {
    if (base.isConstant() || base.variables().isEmpty() || isPositivePower(base)) {
      List<Form> factors = new ArrayList<>();
      for (Decomposition.Part part : Decomposition.of(base).parts()) {
        factors.add(raise(part.base(), part.exponent().times(q)));
      }
      return Form.product(factors);
    }
    Rational content = base.numerator().content().abs();
    Form radicand = base.times(content.inverse());
    Form root = content.isOne() ? Form.ONE : rationalPower(Form.of(content), q);
    return root.times(Form.of(new Exponential(new Base.Of(radicand), Form.ONE), q));
  }

  /// Whether the form is a positive number times real powers of positive numbers, as 3·2^x.
  private static boolean isPositivePower(Form base) {
    for (Polynomial side : List.of(base.numerator(), base.denominator())) {
      if (side.size() != 1 || side.content().sign() < 0) {
        return false;
      }
      for (Indeterminate g : side.indeterminates()) {
        boolean positive =
            g instanceof Exponential power
                && (power.base() instanceof Base.Prime || power.base() instanceof Base.Natural)
                && !power.unit().generators().contains(Constant.I);
        if (!positive) {
          return false;
        }
      }
    }
    return true;
  }

  /// base^exponent for a base of a power kernel.
  static Form raise(Base base, Form exponent) {
    if (exponent.isZero()) {
      return Form.ONE;
    }
    Form result = Form.ONE;
    for (Scaled part : units(exponent)) {
      result = result.times(raise(base, part));
    }
    return result;
  }

  /// A rational multiple of a unit.
  record Scaled(Rational factor, Form unit) {}

  /// The exponent as a sum of rational multiples of units: its monomials over its denominator.
  static List<Scaled> units(Form exponent) {
    List<Scaled> units = new ArrayList<>();
    Polynomial numerator = exponent.numerator();
    if (!exponent.denominator().isConstant()) {
      Form whole = Structure.polynomialPart(exponent);
      if (!whole.isZero()) {
        units.addAll(units(whole));
        numerator = exponent.minus(whole).numerator();
        Form rest = exponent.minus(whole);
        return appended(units, rest.numerator(), rest.denominator());
      }
    }
    return appended(units, numerator, exponent.denominator());
  }

  private static List<Scaled> appended(
      List<Scaled> units, Polynomial numerator, Polynomial denominator) {
    for (Term term : numerator.terms()) {
      Polynomial monomial = Polynomial.of(term.monomial(), Rational.ONE);
      units.add(new Scaled(term.coefficient(), Form.fraction(monomial, denominator)));
    }
    return units;
  }

  private static Form raise(Base base, Scaled exponent) {
    if (exponent.unit().isOne()) {
      return constant(base, exponent.factor());
    }
    return switch (base) {
      case Base.Natural _ -> natural(exponent);
      case Base.Turn _ -> turn(exponent);
      case Base.GaussianAngle(BigInteger re, BigInteger im) -> {
        boolean imaginary = exponent.unit().generators().contains(Constant.I);
        Form angle = Form.I.times(Form.of(new AngleConstant(re, im)));
        yield imaginary
            ? raise(Base.NATURAL, angle.times(exponent.unit()).times(exponent.factor()))
            : kernel(base, exponent);
      }
      case Base.Zero _ -> zero(exponent);
      case Base.Prime _, Base.Of _ ->
          hasLogarithm(exponent.unit())
              ? raise(
                  Base.NATURAL, base.logarithm().times(exponent.unit()).times(exponent.factor()))
              : kernel(base, exponent);
    };
  }

  /// Whether a logarithm stands among the factors, so that b^u and c^v may be the same power.
  private static boolean hasLogarithm(Form unit) {
    return unit.generators().stream().anyMatch(Logarithm.class::isInstance);
  }

  private static Form kernel(Base base, Scaled exponent) {
    return Form.of(new Exponential(base, exponent.unit()), exponent.factor());
  }

  private static Form turn(Scaled exponent) {
    if (!exponent.unit().generators().contains(Constant.I)) {
      return kernel(Base.TURN, exponent);
    }
    Form real = exponent.unit().times(Form.I).times(Form.PI);
    return raise(Base.NATURAL, real.times(exponent.factor()));
  }

  private static Form zero(Scaled exponent) {
    if (exponent.factor().sign() < 0 || exponent.unit().asGenerator().isEmpty()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, Form.ONE);
    }
    return Form.of(new Exponential(new Base.Zero(), exponent.unit()));
  }

  /// e to the exponent: i π turns into powers of −1, a factor ln b into powers of b.
  private static Form natural(Scaled exponent) {
    Form unit = exponent.unit();
    if (unit.numerator().size() == 1) {
      Monomial monomial = unit.numerator().terms().getFirst().monomial();
      if (monomial.exponent(Constant.I).isOne() && monomial.exponent(Constant.PI).isOne()) {
        Form rest = unit.dividedBy(Form.I.times(Form.PI));
        return raise(Base.TURN, rest.times(exponent.factor()));
      }
      if (monomial.exponent(Constant.I).isOne()) {
        return imaginary(exponent, monomial);
      }
      for (Monomial.Power power : monomial.factors()) {
        if (power.indeterminate() instanceof Logarithm log && power.exponent().isOne()) {
          Form rest = unit.dividedBy(Form.of(log));
          if (!hasLogarithm(rest)) {
            return power(log.argument(), rest.times(exponent.factor()));
          }
        }
      }
    }
    return kernel(Base.NATURAL, exponent);
  }

  /// e to an imaginary exponent; the angle arctan u, whole times, is on the ray of 1 + iu.
  private static Form imaginary(Scaled exponent, Monomial monomial) {
    for (Monomial.Power power : monomial.factors()) {
      if (power.indeterminate() instanceof AngleConstant angle && power.exponent().isOne()) {
        Form rest = exponent.unit().dividedBy(Form.I.times(Form.of(angle)));
        Base ray = new Base.GaussianAngle(angle.re(), angle.im());
        return raise(ray, rest.times(exponent.factor()));
      }
      if (power.indeterminate() instanceof Arc(Arc.Kind kind, Form tangent)
          && kind == Arc.Kind.ARCTAN
          && exponent.factor().isInteger()
          && exponent.unit().equals(Form.I.times(Form.of((Generator) power.indeterminate())))) {
        Form point = Form.ONE.plus(Form.I.times(tangent));
        Form length = Elementary.sqrt(Form.ONE.plus(tangent.times(tangent)));
        return power(point.dividedBy(length), Form.of(exponent.factor()));
      }
    }
    return kernel(Base.NATURAL, exponent);
  }

  /// base^q for a rational number q.
  private static Form constant(Base base, Rational q) {
    return switch (base) {
      case Base.Natural _ -> Form.of(new Exponential(base, Form.ONE), q);
      case Base.Turn _ -> RootsOfUnity.power(q);
      case Base.Prime _ -> q.isInteger() ? base.value().power(q.intValueExact()) : radical(base, q);
      case Base.GaussianAngle _ -> {
        if (!q.isInteger()) {
          throw new Refusal(Reason.ROOT_OUT_OF_FIELD, base.value(), Form.of(q));
        }
        yield base.value().power(q.intValueExact());
      }
      case Base.Zero _ -> zeroOrOne(Form.ZERO, q);
      case Base.Of(Form form) -> q.isInteger() ? form.power(q.intValueExact()) : radical(base, q);
    };
  }

  private static Form radical(Base base, Rational q) {
    int whole = q.floor().intValueExact();
    Form root = Form.of(new Exponential(base, Form.ONE), q.fractionalPart());
    return whole == 0 ? root : root.times(base.value().power(whole));
  }
}
