package gnomon.form;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.function.BiFunction;

/// Substitution of forms for variables and duals, through kernels.
final class Substitution {
  private Substitution() {}

  static Form apply(Form form, Map<Generator, Form> images) {
    boolean touched = false;
    boolean poles = false;
    for (Generator g : form.generators()) {
      boolean depends = images.keySet().stream().anyMatch(g::dependsOn);
      touched |= depends;
      poles |= depends && (g instanceof Factorial || g instanceof Harmonic);
    }
    if (!touched) {
      return form;
    }
    if (poles && KernelLimit.meetsPole(form, images)) {
      return KernelLimit.value(form, images);
    }
    return mapped(form, (g, exponent) -> g.substitute(images, exponent));
  }

  /// The form with each power of a generator replaced by what the function gives for it.
  static Form mapped(Form form, BiFunction<Generator, Rational, Form> image) {
    Map<Monomial, Form> known = new HashMap<>();
    BiFunction<Generator, Rational, Form> remembered =
        (g, exponent) -> {
          Monomial power = Monomial.of(g, exponent);
          Form value = known.get(power);
          if (value == null) {
            value = image.apply(g, exponent);
            known.put(power, value);
          }
          return value;
        };
    Form bottom = form.denominator().isOne() ? Form.ONE : evaluate(form.denominator(), remembered);
    if (bottom.isZero()) {
      throw new Refusal(Reason.POLE, form);
    }
    return evaluate(form.numerator(), remembered).dividedBy(bottom);
  }

  static Form evaluate(Polynomial polynomial, BiFunction<Generator, Rational, Form> image) {
    if (polynomial.size() > 1 && hasFractions(polynomial, image)) {
      return overOneDenominator(polynomial, image);
    }
    Indeterminate main = horner(polynomial);
    if (main != null) {
      return byHorner(polynomial, (Generator) main, image);
    }
    List<Form> parts = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Budget.checkpoint();
      Form product = Form.of(term.coefficient());
      for (Monomial.Power power : term.monomial().factors()) {
        product = product.times(image.apply((Generator) power.indeterminate(), power.exponent()));
      }
      parts.add(product);
    }
    return Form.sum(parts);
  }

  private static boolean hasFractions(
      Polynomial polynomial, BiFunction<Generator, Rational, Form> image) {
    for (Term term : polynomial.terms()) {
      for (Monomial.Power power : term.monomial().factors()) {
        Form value = image.apply((Generator) power.indeterminate(), power.exponent());
        if (!value.isPolynomial()) {
          return true;
        }
      }
    }
    return false;
  }

  /// Sums over the product of the common denominators of each generator's images, so that common
  /// factors are looked for once and not at each addition.
  private static Form overOneDenominator(
      Polynomial polynomial, BiFunction<Generator, Rational, Form> image) {
    Map<Generator, Polynomial> denominators = new LinkedHashMap<>();
    for (Term term : polynomial.terms()) {
      for (Monomial.Power power : term.monomial().factors()) {
        Generator g = (Generator) power.indeterminate();
        Polynomial d = image.apply(g, power.exponent()).denominator();
        denominators.merge(g, d, Polynomial::lcm);
      }
    }
    Map<Monomial, Polynomial> numerators = new HashMap<>();
    List<Polynomial> parts = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Budget.checkpoint();
      Polynomial product = Polynomial.of(term.coefficient());
      for (Map.Entry<Generator, Polynomial> entry : denominators.entrySet()) {
        Generator g = entry.getKey();
        Rational exponent = term.monomial().exponent(g);
        Polynomial factor =
            exponent.isZero()
                ? entry.getValue()
                : numerators.computeIfAbsent(
                    Monomial.of(g, exponent),
                    _ -> over(image.apply(g, exponent), entry.getValue()));
        product = product.times(factor);
      }
      parts.add(product);
    }
    Polynomial denominator = Polynomial.ONE;
    for (Polynomial d : denominators.values()) {
      denominator = denominator.times(d);
    }
    return Form.fraction(Polynomial.sum(parts), denominator);
  }

  /// The numerator of the form over a multiple of its denominator.
  private static Polynomial over(Form form, Polynomial denominator) {
    return form.numerator().times(denominator.dividedBy(form.denominator()));
  }

  /// The variable by which a polynomial is worth evaluating in nested form, or null.
  private static Indeterminate horner(Polynomial polynomial) {
    if (polynomial.size() < 4) {
      return null;
    }
    for (Indeterminate g : polynomial.indeterminates()) {
      if (g instanceof Variable || g instanceof Dual) {
        return g;
      }
    }
    return null;
  }

  private static Form byHorner(
      Polynomial polynomial, Generator main, BiFunction<Generator, Rational, Form> image) {
    SortedMap<Rational, Polynomial> coefficients = polynomial.coefficients(main);
    Form sum = Form.ZERO;
    Rational last = null;
    for (Rational exponent : coefficients.reversed().keySet()) {
      Budget.checkpoint();
      if (last != null) {
        sum = sum.times(image.apply(main, last.minus(exponent)));
      }
      sum = sum.plus(evaluate(coefficients.get(exponent), image));
      last = exponent;
    }
    return last == null || last.isZero() ? sum : sum.times(image.apply(main, last));
  }
}
