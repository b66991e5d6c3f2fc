package gnomon.decimal;

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
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/// Constant forms as balls, at one working precision.
final class Approximation {

  private final long precision;
  private final Map<Monomial.Power, Ball> powers = new HashMap<>();

  Approximation(long precision) {
    this.precision = precision;
  }

  /// A ball that holds the constant.
  ///
  /// @throws Undecided when the precision does not suffice
  /// @throws Refusal with [Reason#NOT_CONSTANT] where a variable or unknown function occurs, and
  ///   with [Reason#NO_DIGITS] for a kernel without a numerical method
  Ball of(Form form) {
    Ball numerator = of(form.numerator());
    return form.denominator().isOne()
        ? numerator
        : numerator.dividedBy(of(form.denominator()), precision);
  }

  private Ball of(Polynomial polynomial) {
    Ball sum = Ball.of(BigInteger.ZERO, precision);
    for (Term term : polynomial.terms()) {
      Budget.checkpoint();
      Ball product = Ball.of(term.coefficient(), precision);
      for (Monomial.Power power : term.monomial().factors()) {
        Ball known = powers.get(power);
        if (known == null) {
          known = power((Generator) power.indeterminate(), power.exponent());
          powers.put(power, known);
        }
        product = product.times(known, precision);
      }
      sum = sum.plus(product, precision);
    }
    return sum;
  }

  private Ball power(Generator generator, Rational exponent) {
    if (generator instanceof Exponential(Base base, Form unit)) {
      return power(base, unit.times(exponent));
    }
    Ball value = value(generator);
    return exponent.fitsLong()
        ? value.power(exponent.longValueExact(), precision)
        : logarithm(value, Conjugate.isReal(Form.of(generator)))
            .times(Ball.of(exponent, precision), precision)
            .exponential(precision);
  }

  private Ball value(Generator generator) {
    return switch (generator) {
      case Constant(Constant.Name name) ->
          switch (name) {
            case I -> Ball.imaginaryUnit(precision);
            case PI -> pi();
          };
      case AngleConstant(BigInteger re, BigInteger im) -> angle(re, im);
      case Exponential(Base base, Form unit) -> power(base, unit);
      case Logarithm(Form argument) -> realLogarithm(argument);
      case Arc(Arc.Kind kind, Form argument) -> arc(kind, argument);
      case Factorial(Form argument) -> SpecialValues.factorial(real(argument), precision);
      case Harmonic(Form argument, int order) ->
          SpecialValues.harmonic(real(argument), order, precision);
      case Variable _, Dual _, Unknown _ ->
          throw new Refusal(Reason.NOT_CONSTANT, Form.of(generator));
      case Accumulation _, CoefficientSeries _, InverseSeries _, Moment _ ->
          throw new Refusal(Reason.NO_DIGITS, Form.of(generator));
    };
  }

  private Ball pi() {
    return Ball.of(ApfloatMath.pi(precision), precision);
  }

  private Ball angle(BigInteger re, BigInteger im) {
    Ball ratio = Ball.of(Rational.of(im, re), precision);
    Apfloat slope = new Apfloat(1, precision);
    return ratio.map(ApfloatMath.atan(ratio.middle().real()), slope, precision);
  }

  /// base^exponent = e^(exponent ln base).
  private Ball power(Base base, Form exponent) {
    Ball rate =
        switch (base) {
          case Base.Natural _ -> Ball.of(BigInteger.ONE, precision);
          case Base.Prime(BigInteger prime) -> Ball.of(prime, precision).logarithm(precision);
          case Base.Turn _ -> pi().times(Ball.imaginaryUnit(precision), precision);
          case Base.GaussianAngle(BigInteger re, BigInteger im) ->
              angle(re, im).times(Ball.imaginaryUnit(precision), precision);
          case Base.Zero _ -> throw new Refusal(Reason.NO_DIGITS, base.value());
          case Base.Of(Form form) -> logarithm(of(form), Conjugate.isReal(form));
        };
    return rate.times(of(exponent), precision).exponential(precision);
  }

  /// The principal logarithm; on the negative axis, which only exact knowledge of reality tells
  /// from its neighbourhood, its imaginary part is π.
  private Ball logarithm(Ball value, boolean real) {
    if (!real) {
      if (value.middle().real().signum() < 0
          && ApfloatMath.abs(value.middle().imag()).compareTo(value.radius()) <= 0) {
        throw new Undecided();
      }
      return value.logarithm(precision);
    }
    Ball axis = value.real();
    if (axis.sign() > 0) {
      return axis.logarithm(precision);
    }
    return axis.negated()
        .logarithm(precision)
        .plus(pi().times(Ball.imaginaryUnit(precision), precision), precision);
  }

  private Ball realLogarithm(Form argument) {
    Ball value = real(argument);
    if (value.sign() < 0) {
      throw new Refusal(Reason.LOGARITHM_DOMAIN, argument);
    }
    return value.logarithm(precision);
  }

  /// The ball of a form that is exactly real.
  private Ball real(Form form) {
    if (!Conjugate.isReal(form)) {
      Ball value = of(form);
      if (ApfloatMath.abs(value.middle().imag()).compareTo(value.radius()) > 0) {
        throw new Refusal(Reason.NO_DIGITS, form);
      }
      throw new Undecided();
    }
    return of(form).real();
  }

  private Ball arc(Arc.Kind kind, Form argument) {
    Ball value = real(argument);
    Apfloat point = value.middle().real();
    Apfloat one = new Apfloat(1, precision);
    return switch (kind) {
      case ARCTAN -> value.map(ApfloatMath.atan(point), one, precision);
      case ARCSIN -> {
        Ball room =
            Ball.of(BigInteger.ONE, precision)
                .plus(value.times(value, precision).negated(), precision);
        if (room.sign() < 0) {
          throw new Refusal(Reason.ARCSINE_DOMAIN, argument);
        }
        Apfloat slope = one.divide(room.middle().real());
        yield value.map(ApfloatMath.asin(point), slope.add(one), precision);
      }
    };
  }
}
