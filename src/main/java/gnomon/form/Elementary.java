package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.Optional;

/// The elementary functions on forms. Circular and hyperbolic functions are rational in power
/// kernels: sin u = (e^(iu) − e^(−iu))/(2i); the inverse hyperbolic ones are logarithms.
public final class Elementary {
  private Elementary() {}

  /// base^exponent; a symbolic exponent splits over products.
  ///
  /// @throws Refusal with [Reason#ROOT_OUT_OF_FIELD] for a root of unity outside ℚ(i, √2, √3), with
  ///   [Reason#DIVISION_BY_ZERO] for a negative power of zero
  public static Form power(Form base, Form exponent) {
    return Powers.power(base, exponent);
  }

  /// e^u.
  public static Form exp(Form u) {
    return Powers.raise(Base.NATURAL, u);
  }

  /// The real logarithm of a positive argument.
  ///
  /// @throws Refusal with [Reason#LOGARITHM_DOMAIN] for zero, negative and complex numbers
  public static Form ln(Form u) {
    return Logarithms.ln(u);
  }

  /// The principal square root.
  public static Form sqrt(Form u) {
    return Powers.power(u, Form.HALF);
  }

  public static Form sin(Form u) {
    Form wave = exp(Form.I.times(u));
    return wave.minus(wave.inverse()).dividedBy(Form.I.times(Form.TWO));
  }

  public static Form cos(Form u) {
    Form wave = exp(Form.I.times(u));
    return wave.plus(wave.inverse()).times(Rational.HALF);
  }

  public static Form tan(Form u) {
    return sin(u).dividedBy(cos(u));
  }

  public static Form sinh(Form u) {
    Form growth = exp(u);
    return growth.minus(growth.inverse()).times(Rational.HALF);
  }

  public static Form cosh(Form u) {
    Form growth = exp(u);
    return growth.plus(growth.inverse()).times(Rational.HALF);
  }

  public static Form tanh(Form u) {
    return sinh(u).dividedBy(cosh(u));
  }

  /// ln(u + √(1 + u²)).
  public static Form arsinh(Form u) {
    return ln(u.plus(sqrt(Form.ONE.plus(u.times(u)))));
  }

  /// ln(u + √(u² − 1)), for u ≥ 1.
  public static Form arcosh(Form u) {
    return ln(u.plus(sqrt(u.times(u).minus(Form.ONE))));
  }

  /// ½ ln((1 + u)/(1 − u)), for −1 < u < 1.
  ///
  /// @throws Refusal with [Reason#LOGARITHM_DOMAIN] outside
  public static Form artanh(Form u) {
    if (u.equals(Form.ONE) || u.equals(Form.MINUS_ONE)) {
      throw new Refusal(Reason.LOGARITHM_DOMAIN, u);
    }
    return ln(Form.ONE.plus(u).dividedBy(Form.ONE.minus(u))).times(Rational.HALF);
  }

  /// The arc tangent; of a rational number exactly, as a combination of π and angles of Gaussian
  /// primes.
  public static Form arctan(Form u) {
    if (u.isZero()) {
      return u;
    }
    if (u.asRational().isPresent()) {
      return ofPoint(Form.ONE.plus(Form.I.times(u)));
    }
    if (isNegative(u)) {
      return arctan(u.negated()).negated();
    }
    return knownAngle(u, true).orElseGet(() -> Form.of(new Arc(Arc.Kind.ARCTAN, u)));
  }

  /// The arc sine; the multiples of π/12 are known.
  ///
  /// @throws Refusal with [Reason#ARCSINE_DOMAIN] for a rational number beyond 1 in size
  public static Form arcsin(Form u) {
    if (u.isZero()) {
      return u;
    }
    if (isNegative(u)) {
      return arcsin(u.negated()).negated();
    }
    if (u.asRational().filter(value -> value.compareTo(Rational.ONE) > 0).isPresent()) {
      throw new Refusal(Reason.ARCSINE_DOMAIN, u);
    }
    return knownAngle(u, false).orElseGet(() -> Form.of(new Arc(Arc.Kind.ARCSIN, u)));
  }

  private static boolean isNegative(Form u) {
    return u.numerator().content().sign() < 0;
  }

  private static Optional<Form> knownAngle(Form u, boolean tangent) {
    if (!u.isConstant()) {
      return Optional.empty();
    }
    for (int k = 1; k <= (tangent ? 5 : 6); k++) {
      Form angle = Form.PI.times(Rational.of(k, 12));
      if (u.equals(tangent ? tan(angle) : sin(angle))) {
        return Optional.of(angle);
      }
    }
    return Optional.empty();
  }

  /// The argument of a Gaussian rational.
  private static Form ofPoint(Form point) {
    Form angle = Form.ZERO;
    for (Decomposition.Part part : Decomposition.of(point).parts()) {
      if (part.base() instanceof Base.Turn) {
        angle = angle.plus(part.exponent().times(Form.PI));
      } else if (part.base() instanceof Base.GaussianAngle(BigInteger re, BigInteger im)) {
        angle = angle.plus(part.exponent().times(Form.of(new AngleConstant(re, im))));
      }
    }
    return angle;
  }

  /// The function of that name, or nothing where the name is none of the functions of this class
  /// with one argument.
  public static Optional<Form> apply(String name, Form u) {
    return switch (name) {
      case "exp" -> Optional.of(exp(u));
      case "ln" -> Optional.of(ln(u));
      case "sqrt" -> Optional.of(sqrt(u));
      case "sin" -> Optional.of(sin(u));
      case "cos" -> Optional.of(cos(u));
      case "tan" -> Optional.of(tan(u));
      case "sinh" -> Optional.of(sinh(u));
      case "cosh" -> Optional.of(cosh(u));
      case "tanh" -> Optional.of(tanh(u));
      case "arcsin" -> Optional.of(arcsin(u));
      case "arctan" -> Optional.of(arctan(u));
      case "arsinh" -> Optional.of(arsinh(u));
      case "arcosh" -> Optional.of(arcosh(u));
      case "artanh" -> Optional.of(artanh(u));
      default -> Optional.empty();
    };
  }
}
