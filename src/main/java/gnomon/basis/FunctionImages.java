package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Base;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Logarithm;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The image of a closed form under a Sheffer map, kernel by kernel.
///
/// - polynomials by their coefficients;
/// - x^k e^(ax) by the k-th derivative of w(t) e^(x f̄(t)) at t = a, so sines and cosines too;
/// - x^(−n) by s_{−n} = S⁻¹ x Q^n [(−1)^n/(n! x)], where that is finite;
/// - x^n with a symbolic n by the closed form of s_n, where there is one;
/// - x^k ln x by Y^k S⁻¹ L with Y = (X − g'/g) f'⁻¹ and Q L = q_{−1}, which determines L up to a
///   constant: L = H(x) for Q = Δ, L = ln x for Q = D.
///
/// Everything else would be an infinite series and is refused.
final class FunctionImages {

  private final ShefferMap map;
  private final Variable x;
  private final Dual dual;
  private final Summation engine;

  private FunctionImages(ShefferMap map, Summation engine) {
    this.map = map;
    this.x = map.variable();
    this.dual = map.dual();
    this.engine = engine;
  }

  /// U f.
  ///
  /// @throws Refusal with [Reason#INFINITE_SERIES] when the image is not a closed form of this room
  static Form of(ShefferMap map, Form f, Summation engine) {
    return map.isIdentity() ? f : new FunctionImages(map, engine).image(f);
  }

  private Form image(Form f) {
    if (!f.dependsOn(x)) {
      return f.times(map.weightSeries(0).coefficient(0));
    }
    Optional<List<Form>> polynomial = Structure.asPolynomial(f, x);
    if (polynomial.isPresent()) {
      return Kernels.polynomial(map.image(polynomial.get()), x);
    }
    var exponentials = Structure.exponentialParts(f, x);
    if (exponentials.isPresent()) {
      List<Form> parts = new ArrayList<>();
      for (var part : exponentials.get()) {
        parts.add(exponentialPolynomial(part.rate(), part.coefficients(), f));
      }
      return Form.sum(parts);
    }
    return termByTerm(f);
  }

  /// Σ_k c_k ∂_t^k [w e^(x f̄)] at t = rate.
  private Form exponentialPolynomial(Form rate, List<Form> coefficients, Form whole) {
    if (rate.isZero()) {
      return Kernels.polynomial(map.image(coefficients), x);
    }
    if (ShefferMap.containsInverseSeries(map.inverseOfF())
        || ShefferMap.containsInverseSeries(map.weight())) {
      throw new Refusal(Reason.NO_CLOSED_FORM, map.inverseOfF());
    }
    Form derived = map.generatingFunction();
    List<Form> parts = new ArrayList<>();
    for (int k = 0; k < coefficients.size(); k++) {
      Budget.checkpoint();
      if (!coefficients.get(k).isZero()) {
        parts.add(valueAt(derived, rate, whole).times(coefficients.get(k)));
      }
      if (k + 1 < coefficients.size()) {
        derived = derived.derivative(dual);
      }
    }
    return Form.sum(parts);
  }

  private Form valueAt(Form generatingFunction, Form rate, Form whole) {
    try {
      return generatingFunction.substitute(dual, rate);
    } catch (Refusal refusal) {
      throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
    }
  }

  private Form termByTerm(Form f) {
    Monomial below = f.denominator().monomialContent();
    Polynomial plain = f.denominator().times(below.power(Rational.MINUS_ONE));
    if (Form.of(plain).dependsOn(x)) {
      throw new Refusal(Reason.INFINITE_SERIES, Form.of(dual), f);
    }
    Map<Monomial, Form> groups = new LinkedHashMap<>();
    for (Term term : f.numerator().terms()) {
      Monomial whole = term.monomial().dividedBy(below);
      Monomial kernels = Monomial.ONE;
      for (Monomial.Power power : whole.factors()) {
        Generator generator = (Generator) power.indeterminate();
        if (!generator.equals(x) && generator.dependsOn(x)) {
          kernels = kernels.times(Monomial.of(generator, power.exponent()));
        }
      }
      Monomial rest = whole.dividedBy(kernels);
      Form summand = signed(rest).times(term.coefficient());
      groups.merge(kernels, summand, Form::plus);
    }
    List<Form> parts = new ArrayList<>();
    Form scale = Form.of(plain).inverse();
    groups.forEach(
        (kernels, coefficient) -> parts.add(group(kernels, coefficient.times(scale), f)));
    return Form.sum(parts);
  }

  private static Form signed(Monomial monomial) {
    Form result = Form.ONE;
    for (Monomial.Power power : monomial.factors()) {
      result = result.times(Form.of((Generator) power.indeterminate(), power.exponent()));
    }
    return result;
  }

  /// The image of kernels · (Laurent polynomial in x).
  private Form group(Monomial kernels, Form laurent, Form whole) {
    if (kernels.isOne()) {
      return laurentPolynomial(laurent, whole);
    }
    Form product = signed(kernels).times(laurent);
    if (Structure.exponentialParts(product, x).isPresent()) {
      return image(product);
    }
    List<Monomial.Power> powers = kernels.factors();
    if (powers.size() == 1) {
      Generator only = (Generator) powers.getFirst().indeterminate();
      Rational exponent = powers.getFirst().exponent();
      if (only instanceof Logarithm(Form argument)
          && argument.equals(Form.of(x))
          && exponent.isOne()) {
        return logarithm(laurent, whole);
      }
      if (only instanceof Exponential(Base.Of(Form base), Form unit)
          && base.equals(Form.of(x))
          && !unit.dependsOn(x)) {
        return symbolicPowers(laurent, unit.times(exponent), whole);
      }
    }
    throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
  }

  /// The Laurent polynomial as a map from exponent to coefficient.
  private Map<Integer, Form> laurentCoefficients(Form laurent, Form whole) {
    int lowest = 0;
    Form shifted = laurent;
    Rational below = laurent.denominator().monomialContent().exponent(x);
    if (below.sign() > 0) {
      lowest = below.isInteger() ? -below.intValueExact() : 0;
      shifted = laurent.times(Form.of(x).power(-lowest));
    }
    Optional<List<Form>> coefficients = Structure.asPolynomial(shifted, x);
    if (coefficients.isEmpty()) {
      throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
    }
    Map<Integer, Form> result = new LinkedHashMap<>();
    for (int j = 0; j < coefficients.get().size(); j++) {
      if (!coefficients.get().get(j).isZero()) {
        result.put(lowest + j, coefficients.get().get(j));
      }
    }
    return result;
  }

  private Form laurentPolynomial(Form laurent, Form whole) {
    List<Form> parts = new ArrayList<>();
    List<Form> polynomial = new ArrayList<>();
    laurentCoefficients(laurent, whole)
        .forEach(
            (exponent, coefficient) -> {
              if (exponent < 0) {
                parts.add(negativeMember(-exponent, whole).times(coefficient));
              } else {
                while (polynomial.size() <= exponent) {
                  polynomial.add(Form.ZERO);
                }
                polynomial.set(exponent, coefficient);
              }
            });
    parts.add(Kernels.polynomial(map.image(polynomial), x));
    return Form.sum(parts);
  }

  /// s_{−n} = S⁻¹ x Q^n [(−1)^n/(n! x)].
  private Form negativeMember(int n, Form whole) {
    try {
      return appliedInverse(negativeBasic(n));
    } catch (Refusal refusal) {
      throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
    }
  }

  private Form negativeBasic(int n) {
    Form start = Form.of(x).inverse();
    for (int j = 1; j <= n; j++) {
      start = start.times(Rational.of(-1, j));
    }
    Operator power = Operator.ofSymbol(map.f().power(n));
    return Form.of(x).times(power.applyTo(start, engine));
  }

  /// S⁻¹ h.
  private Form appliedInverse(Form h) {
    return map.isUmbral() ? h : Operator.ofSymbol(map.g().inverse()).applyTo(h, engine);
  }

  private Form symbolicPowers(Form laurent, Form exponent, Form whole) {
    List<Form> parts = new ArrayList<>();
    laurentCoefficients(laurent, whole)
        .forEach(
            (offset, coefficient) -> {
              Form member =
                  SymbolicMembers.of(map.umbralPart(), exponent.plus(Form.of(offset)))
                      .orElseThrow(() -> new Refusal(Reason.INFINITE_SERIES, map.f(), whole));
              parts.add(appliedInverse(member).times(coefficient));
            });
    return Form.sum(parts);
  }

  /// Σ_k c_k Y^k S⁻¹ L.
  private Form logarithm(Form laurent, Form whole) {
    Form logarithm = appliedInverse(logarithmOfQ(whole));
    Form g = map.g();
    Form drift = g.isOne() ? Form.ZERO : g.derivative(dual).dividedBy(g);
    Form stretch = map.f().derivative(dual).inverse();
    Operator position = Operator.ofSymbol(Form.of(x).minus(drift).times(stretch));
    List<Form> parts = new ArrayList<>();
    Form current = logarithm;
    int reached = 0;
    for (Map.Entry<Integer, Form> entry : laurentCoefficients(laurent, whole).entrySet()) {
      if (entry.getKey() < 0) {
        throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
      }
      for (; reached < entry.getKey(); reached++) {
        current = position.applyTo(current, engine);
      }
      parts.add(current.times(entry.getValue()));
    }
    return Form.sum(parts);
  }

  /// L with Q L = q_{−1}, for Q = c D E^k and Q = c E^k (E^h − 1).
  private Form logarithmOfQ(Form whole) {
    return switch (DeltaShape.of(map.f(), dual)) {
      case DeltaShape.Derivative(Form _, Form k) ->
          Elementary.ln(Form.of(x)).plus(k.dividedBy(Form.of(x)));
      case DeltaShape.Difference(Form _, Form h, Form k) -> antidifference(h, k, whole);
      case DeltaShape.Other _ -> throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
    };
  }

  /// q_{−1} = c h x/((x + k)(x + k + h)), so L(x + h) − L(x) = h (x − k)/(x (x + h)).
  private Form antidifference(Form step, Form k, Form whole) {
    boolean backward = step.asRational().filter(value -> value.sign() < 0).isPresent();
    Form h = backward ? step.negated() : step;
    Form shift = backward ? k.plus(step) : k;
    Form position = Form.of(x);
    Form summand = h.times(position.minus(shift)).dividedBy(position.times(position.plus(h)));
    return switch (engine.antidifference(summand, x, h)) {
      case Summation.Outcome.Found(Form found) -> found;
      case Summation.Outcome.ProvedAbsent _, Summation.Outcome.GaveUp _ ->
          throw new Refusal(Reason.INFINITE_SERIES, map.f(), whole);
    };
  }
}
