package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Base;
import gnomon.form.Exponential;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Moment;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The linear functional of umbral calculus: powers of umbrae go to their moments, distinct umbrae
/// are uncorrelated, everything else is a scalar.
///
/// An umbra B with the exponential generating function s(t) of its moments, s(0) = 1, takes e^(c B)
/// to s(c) for any scalar c, and B^k e^(c B) to the k-th derivative of s there. A power whose
/// exponent is a symbol stays as a [Moment].
///
/// Source: Rota and Taylor, The classical umbral calculus, SIAM J. Math. Anal. 25 (1994).
public final class Moments {
  private Moments() {}

  /// The value of f.
  ///
  /// @throws Refusal with [Reason#NO_MOMENT] for what is neither a power nor an exponential in the
  ///   umbrae, with [Reason#SYMBOL_POLE] where s has a pole
  public static Form value(Form f, List<Moment.Letter> letters) {
    List<Moment.Letter> present =
        letters.stream().filter(letter -> f.dependsOn(letter.variable())).toList();
    if (present.isEmpty()) {
      return f;
    }
    try {
      Form value = f;
      for (Moment.Letter letter : present) {
        value = applied(letter, value);
      }
      return value;
    } catch (Refusal refusal) {
      if (refusal.reason() != Reason.INFINITE_SERIES) {
        throw refusal;
      }
    }
    List<Form> parts = new ArrayList<>();
    for (Form term : f.terms()) {
      parts.add(ofTerm(term, present));
    }
    return Form.sum(parts);
  }

  private static Form ofTerm(Form term, List<Moment.Letter> letters) {
    List<Moment.Letter> standing = new ArrayList<>();
    Form value = term;
    for (Moment.Letter letter : letters) {
      if (!value.dependsOn(letter.variable())) {
        continue;
      }
      try {
        value = applied(letter, value);
      } catch (Refusal refusal) {
        if (refusal.reason() != Reason.INFINITE_SERIES) {
          throw refusal;
        }
        standing.add(letter);
      }
    }
    Form moment = Moment.of(standing, value);
    for (Generator kernel : moment.generators()) {
      if (kernel instanceof Moment left && !left.letters().isEmpty()) {
        exponents(left);
      }
    }
    return moment;
  }

  private static Form applied(Moment.Letter letter, Form f) {
    return Action.applyAtZero(letter.indicator(), f, letter.variable());
  }

  /// The symbolic exponents in a standing value, one for each base, each less what divides its
  /// power: the value has a meaning where they are natural numbers.
  ///
  /// @throws Refusal with [Reason#NO_MOMENT] when the body is no product of powers
  public static List<Form> exponents(Moment moment) {
    Map<Form, Form> exponents = new LinkedHashMap<>();
    List<Factored.Factor> divisors = new ArrayList<>();
    Form body = moment.body();
    for (Monomial.Power power : body.numerator().leadingTerm().monomial().factors()) {
      Generator g = (Generator) power.indeterminate();
      if (g instanceof Variable && power.exponent().isInteger()) {
        int multiplicity = power.exponent().intValueExact();
        if (multiplicity < 0) {
          divisors.add(new Factored.Factor(Form.of(g), -multiplicity));
        }
      } else {
        add(exponents, g, power.exponent(), moment);
      }
    }
    for (Factored.Factor factor : Factored.of(Form.of(body.denominator())).factors()) {
      Optional<Generator> kernel = factor.base().asGenerator();
      if (kernel.isPresent() && kernel.get() instanceof Exponential) {
        add(exponents, kernel.get(), Rational.of(-factor.multiplicity()), moment);
      } else {
        divisors.add(factor);
      }
    }
    for (Factored.Factor divisor : divisors) {
      Form base =
          exponents.keySet().stream()
              .filter(b -> divisor.base().dividedBy(b).isConstant())
              .findFirst()
              .orElseThrow(() -> new Refusal(Reason.NO_MOMENT, body));
      exponents.merge(base, Form.of(-divisor.multiplicity()), Form::plus);
    }
    for (Form exponent : exponents.values()) {
      boolean natural = exponent.asInteger().filter(e -> e.signum() >= 0).isPresent();
      if (exponent.isConstant() && !natural) {
        throw new Refusal(Reason.NO_MOMENT, body);
      }
    }
    return List.copyOf(exponents.values());
  }

  private static void add(Map<Form, Form> exponents, Generator g, Rational times, Moment moment) {
    if (g instanceof Exponential kernel
        && kernel.base() instanceof Base.Of(Form base)
        && isFree(kernel.unit(), moment)
        && isPolynomial(base, moment)) {
      exponents.merge(base, kernel.unit().times(times), Form::plus);
    } else {
      throw new Refusal(Reason.NO_MOMENT, moment.body());
    }
  }

  private static boolean isFree(Form form, Moment moment) {
    return moment.letters().stream().noneMatch(letter -> form.dependsOn(letter.variable()));
  }

  private static boolean isPolynomial(Form form, Moment moment) {
    return moment.letters().stream()
        .allMatch(letter -> Structure.asPolynomial(form, letter.variable()).isPresent());
  }
}
