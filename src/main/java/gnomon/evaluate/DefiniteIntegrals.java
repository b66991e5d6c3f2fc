package gnomon.evaluate;

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

  private static void refusePoles(Form integrand, Limits limits) {
    Form denominator = Form.of(integrand.denominator());
    Variable t = limits.variable();
    if (!denominator.dependsOn(t)) {
      return;
    }
    Optional<Rational> from = limits.lower().asRational();
    Optional<Rational> to = limits.upper().flatMap(Form::asRational);
    if (from.isEmpty() || to.isEmpty()) {
      if (limits.all().stream().allMatch(Form::isConstant)) {
        throw notExcluded(limits);
      }
      return;
    }
    for (Factored.Factor factor : Structure.factored(denominator).factors()) {
      if (factor.base().dependsOn(t) && mayVanish(factor.base(), limits, from.get(), to.get())) {
        throw Problems.of("domain-pole", "there is a pole inside the range", limits.span());
      }
    }
  }

  private static RuntimeException notExcluded(Limits limits) {
    return Problems.of("domain-pole", "a pole inside the range cannot be ruled out", limits.span());
  }

  /// Whether the irreducible factor vanishes between the limits, which is decided for degrees up to
  /// 2 with rational coefficients; symbolic ones are taken to stay clear of it.
  private static boolean mayVanish(Form base, Limits limits, Rational from, Rational to) {
    Variable t = limits.variable();
    Optional<Rational> first = base.substitute(t, Form.of(from)).asRational();
    Optional<Rational> last = base.substitute(t, Form.of(to)).asRational();
    if (first.isEmpty() || last.isEmpty()) {
      return false;
    }
    if (first.get().sign() * last.get().sign() <= 0) {
      return true;
    }
    Optional<List<Form>> quadratic = Structure.asPolynomial(base, t);
    if (quadratic.filter(coefficients -> coefficients.size() <= 2).isPresent()) {
      return false;
    }
    if (quadratic.isEmpty() || quadratic.get().size() != 3) {
      throw notExcluded(limits);
    }
    Form vertex =
        quadratic.get().get(1).dividedBy(quadratic.get().get(2).times(Form.TWO)).negated();
    Optional<Rational> place = vertex.asRational();
    Optional<Rational> extreme = base.substitute(t, vertex).asRational();
    Rational low = from.compareTo(to) <= 0 ? from : to;
    Rational high = from.compareTo(to) <= 0 ? to : from;
    return place.filter(p -> p.compareTo(low) > 0 && p.compareTo(high) < 0).isPresent()
        && extreme.filter(e -> e.sign() * first.get().sign() < 0).isPresent();
  }
}
