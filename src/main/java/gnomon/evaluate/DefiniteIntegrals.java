package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.decimal.Digits;
import gnomon.evaluate.Binders.Limits;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.value.FormValue;
import java.util.List;
import java.util.Optional;

/// Integrals over a range, F(b) − F(a) for an antiderivative F that is checked by differentiation.
final class DefiniteIntegrals {
  private final Evaluation evaluation;

  DefiniteIntegrals(Evaluation evaluation) {
    this.evaluation = evaluation;
  }

  Form value(Limits limits, Form integrand, Scope scope) {
    Variable t = limits.variable();
    if (limits.upper().isEmpty()) {
      throw Problems.of(
          "domain-infinite-integral", "an integral here needs finite limits", limits.span());
    }
    refusePoles(integrand, limits);
    Form antiderivative = Operator.derivative(t).inverse().applyTo(integrand, evaluation.sums());
    Form back = antiderivative.derivative(t);
    if (!back.equals(integrand)) {
      throw Problems.of("domain-no-antiderivative", "no antiderivative was found", limits.span());
    }
    evaluation.grounds().say("an antiderivative", FormValue.of(antiderivative, t), t);
    evaluation.grounds().equal("its derivative is the integrand", back, integrand, t);
    return antiderivative
        .substitute(t, limits.upper().get())
        .minus(antiderivative.substitute(t, limits.lower()));
  }

  /// Symbolic limits and parameters are taken to stay clear of poles; between constants a pole must
  /// be ruled out.
  private static void refusePoles(Form integrand, Limits limits) {
    Form denominator = Form.of(integrand.denominator());
    Variable t = limits.variable();
    if (!denominator.dependsOn(t) || !limits.all().stream().allMatch(Form::isConstant)) {
      return;
    }
    for (Factored.Factor factor : Structure.factored(denominator).factors()) {
      if (factor.base().dependsOn(t) && mayVanish(factor.base(), limits)) {
        throw Problems.of("domain-pole", "there is a pole inside the range", limits.span());
      }
    }
  }

  private static RuntimeException notExcluded(Limits limits) {
    return Problems.of("domain-pole", "a pole inside the range cannot be ruled out", limits.span());
  }

  /// Whether the irreducible factor vanishes between the limits, for polynomials of degree up to 2.
  private static boolean mayVanish(Form base, Limits limits) {
    Variable t = limits.variable();
    List<Form> coefficients =
        Structure.asPolynomial(base, t).orElseThrow(() -> notExcluded(limits));
    if (coefficients.stream().anyMatch(c -> !c.variables().isEmpty())) {
      return false;
    }
    Form upper = limits.upper().orElseThrow();
    int first = sign(base.substitute(t, limits.lower()), limits);
    int last = sign(base.substitute(t, upper), limits);
    if (first * last <= 0) {
      return true;
    }
    return switch (coefficients.size()) {
      case 2 -> false;
      case 3 -> {
        Form vertex = coefficients.get(1).dividedBy(coefficients.get(2).times(Form.of(-2)));
        int before = sign(vertex.minus(limits.lower()), limits);
        int after = sign(upper.minus(vertex), limits);
        yield before * after > 0 && sign(base.substitute(t, vertex), limits) != first;
      }
      default -> throw notExcluded(limits);
    };
  }

  /// The sign of a real constant.
  private static int sign(Form constant, Limits limits) {
    Optional<Rational> rational = constant.asRational();
    if (rational.isPresent()) {
      return rational.get().sign();
    }
    try {
      Digits digits = Digits.of(constant, 3);
      if (digits.isReal() && digits.real().signum() != 0) {
        return digits.real().signum();
      }
    } catch (Refusal undecided) {
      throw notExcluded(limits);
    }
    throw notExcluded(limits);
  }
}
