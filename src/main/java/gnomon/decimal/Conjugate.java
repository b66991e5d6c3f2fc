package gnomon.decimal;

import gnomon.algebra.Budget;
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
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The complex conjugate of a constant as an exact form, so that real and imaginary part are exact
/// forms too.
///
/// It is known for rational expressions in i, π, angles, and logarithms, arc functions, factorials
/// and harmonic numbers of real constants, and in powers of e, of -1, of rays and of real numbers
/// whose sign shows; powers of other numbers are left out.
final class Conjugate {

  private static final long SIGN_DIGITS = 60;

  private Conjugate() {}

  static Optional<Form> of(Form form) {
    return of(form.numerator())
        .flatMap(top -> of(form.denominator()).map(bottom -> top.dividedBy(bottom)));
  }

  private static Optional<Form> of(Polynomial polynomial) {
    List<Form> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Budget.checkpoint();
      Form product = Form.of(term.coefficient());
      for (Monomial.Power power : term.monomial().factors()) {
        Optional<Form> image = of((Generator) power.indeterminate(), power.exponent());
        if (image.isEmpty()) {
          return Optional.empty();
        }
        product = product.times(image.get());
      }
      terms.add(product);
    }
    return Optional.of(Form.sum(terms));
  }

  private static Optional<Form> of(Generator generator, Rational exponent) {
    if (generator instanceof Constant constant) {
      Form power = Form.of(constant, exponent);
      boolean turned =
          constant.equals(Constant.I) && exponent.numerator().testBit(0) && exponent.isInteger();
      return Optional.of(turned ? power.negated() : power);
    }
    if (generator instanceof Exponential(Base base, Form unit)) {
      return of(unit).flatMap(its -> power(base, its.times(exponent)));
    }
    boolean real =
        switch (generator) {
          case AngleConstant _ -> true;
          case Logarithm(Form argument) -> isReal(argument);
          case Arc(Arc.Kind _, Form argument) -> isReal(argument);
          case Factorial(Form argument) -> isReal(argument);
          case Harmonic(Form argument, int _) -> isReal(argument);
          case Constant _,
              Exponential _,
              Variable _,
              Dual _,
              Unknown _,
              Accumulation _,
              CoefficientSeries _,
              InverseSeries _,
              Moment _ ->
              false;
        };
    return real ? Optional.of(Form.of(generator, exponent)) : Optional.empty();
  }

  /// Whether the constant is proved real.
  static boolean isReal(Form form) {
    return of(form).filter(form::equals).isPresent();
  }

  /// The conjugate of base^u, where `exponent` is the conjugate of u; nothing where it is no form.
  private static Optional<Form> power(Base base, Form exponent) {
    try {
      return switch (base) {
        case Base.Natural _ -> Optional.of(Elementary.exp(exponent));
        case Base.Prime prime -> Optional.of(Elementary.power(prime.value(), exponent));
        case Base.Turn _ -> Optional.of(Elementary.power(Form.MINUS_ONE, exponent.negated()));
        case Base.GaussianAngle ray ->
            Optional.of(Elementary.power(ray.value(), exponent.negated()));
        case Base.Of(Form form) -> isReal(form) ? realBase(form, exponent) : Optional.empty();
        case Base.Zero _ -> Optional.empty();
      };
    } catch (Refusal outside) {
      return Optional.empty();
    }
  }

  /// For a real base b below 0, b^u is |b|^u e^(iπu), so the conjugate is b^v e^(-2πiv) with v the
  /// conjugate of u.
  private static Optional<Form> realBase(Form base, Form exponent) {
    try {
      Form power = Elementary.power(base, exponent);
      int sign = new Approximation(SIGN_DIGITS).of(base).real().sign();
      Form turns = exponent.times(Form.TWO).negated();
      return Optional.of(sign > 0 ? power : power.times(Elementary.power(Form.MINUS_ONE, turns)));
    } catch (Undecided tooSmall) {
      return Optional.empty();
    }
  }
}
