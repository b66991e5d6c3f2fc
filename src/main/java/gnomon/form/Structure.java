package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;

/// Reads the structure of forms: as polynomials, exponential polynomials, rational functions.
public final class Structure {
  private Structure() {}

  /// The coefficients of a polynomial in the variable or dual, ascending and free of it; nothing
  /// where the form is no such polynomial. Zero has no coefficients.
  public static Optional<List<Form>> asPolynomial(Form form, Generator v) {
    if (!isRationalIn(form, v) || form.denominator().contains(v)) {
      return Optional.empty();
    }
    return coefficients(form.numerator(), form.denominator(), v);
  }

  private static Optional<List<Form>> coefficients(
      Polynomial numerator, Polynomial denominator, Generator v) {
    List<Form> list = new ArrayList<>();
    for (Map.Entry<Rational, Polynomial> part : numerator.coefficients(v).entrySet()) {
      Rational exponent = part.getKey();
      if (exponent.sign() < 0 || !exponent.isInteger()) {
        return Optional.empty();
      }
      int index = exponent.intValueExact();
      while (list.size() <= index) {
        list.add(Form.ZERO);
      }
      list.set(index, Form.fraction(part.getValue(), denominator));
    }
    return Optional.of(list);
  }

  /// Σ_j coefficients_j v^j.
  public static Form polynomial(List<Form> coefficients, Generator v) {
    List<Form> parts = new ArrayList<>();
    for (int j = 0; j < coefficients.size(); j++) {
      if (!coefficients.get(j).isZero()) {
        parts.add(coefficients.get(j).times(Form.of(v, Rational.of(j))));
      }
    }
    return Form.sum(parts);
  }

  /// The degree of a polynomial in v; nothing for zero and for what is no polynomial.
  public static OptionalInt degree(Form form, Generator v) {
    Optional<List<Form>> list = asPolynomial(form, v);
    return list.isEmpty() || list.get().isEmpty()
        ? OptionalInt.empty()
        : OptionalInt.of(list.get().size() - 1);
  }

  /// Whether no kernel depends on the variable or dual.
  public static boolean isRationalIn(Form form, Generator v) {
    for (Generator g : form.generators()) {
      if (!g.equals(v) && g.dependsOn(v)) {
        return false;
      }
    }
    return true;
  }

  /// The form as an exponential polynomial in v, or nothing where it is none.
  public static Optional<List<ExponentialPart>> exponentialParts(Form form, Generator v) {
    Set<Indeterminate> kernels = Collections.newSetFromMap(new LinkedHashMap<>());
    for (Generator g : form.generators()) {
      if (!g.equals(v) && g.dependsOn(v)) {
        if (!(g instanceof Exponential power) || !isLinear(power, v)) {
          return Optional.empty();
        }
        kernels.add(g);
      }
    }
    Polynomial denominator = form.denominator();
    Monomial shift = kernelPart(denominator.monomialContent(), kernels);
    Polynomial plain = denominator.times(shift.power(Rational.MINUS_ONE));
    for (Indeterminate g : plain.indeterminates()) {
      if (((Generator) g).dependsOn(v)) {
        return Optional.empty();
      }
    }
    Map<Monomial, List<Term>> groups = new LinkedHashMap<>();
    for (Term term : form.numerator().terms()) {
      Monomial kernel = kernelPart(term.monomial(), kernels);
      Monomial rest = term.monomial().dividedBy(kernel);
      groups
          .computeIfAbsent(kernel.dividedBy(shift), _ -> new ArrayList<>())
          .add(new Term(rest, term.coefficient()));
    }
    return parts(groups, plain, v);
  }

  private static Optional<List<ExponentialPart>> parts(
      Map<Monomial, List<Term>> groups, Polynomial denominator, Generator v) {
    List<ExponentialPart> parts = new ArrayList<>();
    for (Map.Entry<Monomial, List<Term>> group : groups.entrySet()) {
      Polynomial numerator = Polynomial.ofTerms(group.getValue());
      Optional<List<Form>> list = coefficients(numerator, denominator, v);
      if (list.isEmpty()) {
        return Optional.empty();
      }
      Form kernel = Form.ONE;
      Form rate = Form.ZERO;
      for (Monomial.Power power : group.getKey().factors()) {
        Exponential exponential = (Exponential) power.indeterminate();
        kernel = kernel.times(Form.of(exponential, power.exponent()));
        rate = rate.plus(exponential.logarithmicDerivative(v).times(power.exponent()));
      }
      parts.add(new ExponentialPart(kernel, rate, list.get()));
    }
    return Optional.of(parts);
  }

  /// Whether base^unit is e^(c v) with c free of v.
  private static boolean isLinear(Exponential power, Generator v) {
    if (power.base() instanceof Base.Zero
        || power.base() instanceof Base.Of(Form base) && base.dependsOn(v)) {
      return false;
    }
    Optional<List<Form>> unit = asPolynomial(power.unit(), v);
    return unit.isPresent() && unit.get().size() == 2 && unit.get().getFirst().isZero();
  }

  private static Monomial kernelPart(Monomial monomial, Set<Indeterminate> kernels) {
    Monomial part = Monomial.ONE;
    for (Monomial.Power power : monomial.factors()) {
      if (kernels.contains(power.indeterminate())) {
        part = part.times(Monomial.of(power.indeterminate(), power.exponent()));
      }
    }
    return part;
  }

  /// The polynomial part of a form whose denominator depends on one variable or dual, rationally;
  /// zero otherwise.
  static Form polynomialPart(Form form) {
    List<Indeterminate> inside = new ArrayList<>(form.denominator().indeterminates());
    if (inside.size() != 1
        || !(inside.getFirst() instanceof Generator v)
        || !(v instanceof Variable || v instanceof Dual)
        || !isRationalIn(form, v)) {
      return Form.ZERO;
    }
    Optional<List<Form>> top = asPolynomial(new Form(form.numerator(), Polynomial.ONE), v);
    Optional<List<Form>> bottom = asPolynomial(new Form(form.denominator(), Polynomial.ONE), v);
    if (top.isEmpty() || bottom.isEmpty()) {
      return Form.ZERO;
    }
    Univariate quotient =
        new Univariate(top.get()).dividedBy(new Univariate(bottom.get())).quotient();
    return polynomial(quotient.coefficients(), v);
  }

  /// The form as a product of irreducible factors over ℚ, kernels taken as independent.
  public static Factored factored(Form form) {
    return Factored.of(form);
  }

  /// The partial fractions in a variable; nothing where the form is not rational in it.
  public static Optional<PartialFractions> partialFractions(Form form, Generator v) {
    return PartialFractions.of(form, v);
  }

  /// A closed form g(t) with form(g(t)) = t and g(0) = 0, where peeling off kernels finds one; it
  /// is checked by substitution.
  public static Optional<Form> compositionalInverse(Form form, Generator t) {
    return CompositionalInverse.of(form, t);
  }
}
