package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.ExponentialPart;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Application of symbols with poles t^(−i) (e^(h t) − 1)^(−m) to forms that are not exponential
/// polynomials: through i antiderivatives and m antidifferences of the form.
final class Antidifferences {

  private static final int STEPS = 12;

  private final Variable x;
  private final Dual t;
  private final Summation engine;

  private Antidifferences(Variable x, Summation engine) {
    this.x = x;
    this.t = new Dual(x);
    this.engine = engine;
  }

  /// A divisor t^i (e^(h t) − 1)^m that leaves finite sums of t^j e^(c t).
  private record Divisor(int integrals, int sums, Form step) {
    Form symbol(Dual t) {
      Form difference = Elementary.exp(step.times(Form.of(t))).minus(Form.ONE);
      return Form.of(t).power(integrals).times(difference.power(sums));
    }
  }

  /// The image, or empty when the symbol has other poles than those of integrals and sums.
  static Optional<Form> tryApply(Operator operator, Variable x, Form f, Summation engine) {
    return new Antidifferences(x, engine).apply(operator, f);
  }

  private Optional<Form> apply(Operator operator, Form f) {
    boolean functional = operator.symbol().isZero();
    return divisor(functional ? operator.boundary(x) : operator.symbol())
        .map(d -> apply(operator, f, d));
  }

  /// What the operator is beyond the divisor's finite sums of its sums and integrals.
  private Operator rest(Operator operator, Divisor divisor) {
    Operator exact = Operator.integral(x).power(divisor.integrals());
    exact = exact.compose(Operator.sum(x, divisor.step()).power(divisor.sums()));
    Form finite = operator.symbol().times(divisor.symbol(t));
    Operator whole = Operator.of(operator.symbol(), x, operator.boundary(x));
    return whole.minus(Operator.ofSymbol(finite).compose(exact));
  }

  private Form apply(Operator operator, Form f, Divisor divisor) {
    Form finite = operator.symbol().times(divisor.symbol(t));
    int poles = divisor.integrals() + divisor.sums();
    boolean free = operator.kernelOrder(x) >= poles && operator.boundaries().isEmpty();
    Form preimage = preimage(f, divisor, !free && !finite.isZero());
    if (free) {
      return Action.apply(finite, preimage);
    }
    if (finite.isZero()) {
      return Action.applyAtZero(operator.boundary(x).times(divisor.symbol(t)), preimage, x);
    }
    Operator rest = rest(operator, divisor);
    Form image = Action.apply(finite, preimage);
    if (rest.isZero()) {
      return image;
    }
    if (!rest.symbol().isZero()) {
      throw new IllegalStateException("the symbol of a difference should have cancelled");
    }
    return image.plus(
        apply(rest, f).orElseThrow(() -> new Refusal(Reason.INFINITE_SERIES, rest.symbol(), f)));
  }

  /// G with t^i (e^(h t) − 1)^m G = f; each step vanishing at 0 where that is asked for.
  private Form preimage(Form f, Divisor divisor, boolean vanishing) {
    Form result = f;
    for (int k = 0; k < divisor.sums(); k++) {
      result = anchored(antidifference(result, divisor.step()), vanishing);
    }
    for (int k = 0; k < divisor.integrals(); k++) {
      result = anchored(antiderivative(result, x), vanishing);
    }
    return result;
  }

  private Form anchored(Form form, boolean vanishing) {
    return vanishing ? form.minus(form.substitute(x, Form.ZERO)) : form;
  }

  /// An antiderivative.
  ///
  /// @throws Refusal with [Reason#ANTIDERIVATIVE_NOT_FOUND]
  static Form antiderivative(Form f, Variable x) {
    return Antiderivative.tryOf(f, x)
        .orElseThrow(() -> new Refusal(Reason.ANTIDERIVATIVE_NOT_FOUND, f, Form.of(x)));
  }

  private Form antidifference(Form f, Form step) {
    return switch (engine.antidifference(f, x, step)) {
      case Summation.Outcome.Found(Form found) -> checked(found, f, step);
      case Summation.Outcome.ProvedAbsent(String kind) ->
          throw new Refusal(Reason.NO_ANTIDIFFERENCE, f, Form.of(x), kind);
      case Summation.Outcome.GaveUp(String limit) ->
          throw new Refusal(Reason.ANTIDIFFERENCE_NOT_FOUND, f, Form.of(x), limit);
    };
  }

  private Form checked(Form found, Form f, Form step) {
    Form difference = Splitting.shifted(found, x, step).minus(found);
    if (!difference.equals(f)) {
      throw new IllegalStateException("an antidifference failed its check");
    }
    return found;
  }

  private Optional<Divisor> divisor(Form form) {
    if (form.isZero()) {
      return Optional.of(new Divisor(0, 0, Form.ONE));
    }
    int integrals = 0;
    int sums = 0;
    List<Form> steps = new ArrayList<>();
    for (Factored.Factor factor : Structure.factored(form).factors()) {
      if (factor.multiplicity() >= 0 || !factor.base().dependsOn(t)) {
        continue;
      }
      Optional<Form> step = step(factor.base());
      if (factor.base().dividedBy(Form.of(t)).dependsOn(t)) {
        sums = step.isEmpty() ? sums : Math.max(sums, -factor.multiplicity());
        step.ifPresent(steps::add);
      } else {
        integrals = -factor.multiplicity();
      }
    }
    return fitting(form, integrals, sums, steps);
  }

  /// The least multiple of a step met whose divisor clears the form.
  private Optional<Divisor> fitting(Form form, int integrals, int sums, List<Form> steps) {
    if (steps.isEmpty()) {
      return Optional.of(new Divisor(integrals, 0, Form.ONE)).filter(d -> clears(d, form));
    }
    for (int n = 1; n <= STEPS; n++) {
      Divisor divisor = new Divisor(integrals, sums, steps.getFirst().times(Form.of(n)));
      if (clears(divisor, form)) {
        return Optional.of(divisor);
      }
    }
    return Optional.empty();
  }

  private boolean clears(Divisor divisor, Form form) {
    return Splitting.parts(form.times(divisor.symbol(t)), t, form).isPresent();
  }

  /// h when the factor is c (e^(a t) − e^(b t)) with a − b = h, taken positive where it is
  /// rational.
  private Optional<Form> step(Form factor) {
    Optional<List<ExponentialPart>> parts = Splitting.parts(factor, t, factor);
    if (parts.isEmpty() || parts.get().size() != 2) {
      return Optional.empty();
    }
    ExponentialPart first = parts.get().getFirst();
    ExponentialPart second = parts.get().getLast();
    if (first.coefficients().size() != 1 || second.coefficients().size() != 1) {
      return Optional.empty();
    }
    if (!first.coefficients().getFirst().plus(second.coefficients().getFirst()).isZero()) {
      return Optional.empty();
    }
    Form step = first.rate().minus(second.rate());
    boolean negative = step.asRational().map(r -> r.sign() < 0).orElse(false);
    return Optional.of(negative ? step.negated() : step);
  }
}
