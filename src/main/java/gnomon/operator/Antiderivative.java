package gnomon.operator;

import gnomon.form.Elementary;
import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.PartialFractions;
import gnomon.form.Structure;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Antiderivatives of simple forms: exponential polynomials, powers of linear forms, rational
/// functions whose denominators have linear factors, and derivatives of unknown functions.
///
/// Each answer has been checked by differentiation. An empty answer says only that nothing was
/// found.
public final class Antiderivative {
  private Antiderivative() {}

  /// A form F with ∂F/∂x = f.
  public static Optional<Form> tryOf(Form f, Variable x) {
    Optional<Form> whole = checked(search(f, x), f, x);
    return whole.isPresent() ? whole : termByTerm(f, x);
  }

  /// The antiderivative of a polynomial in x that vanishes at 0.
  static Form ofPolynomial(Form f, Variable x) {
    List<Form> coefficients = Structure.asPolynomial(f, x).orElseThrow();
    List<Form> terms = new ArrayList<>();
    for (int j = 0; j < coefficients.size(); j++) {
      terms.add(coefficients.get(j).times(Form.of(x).power(j + 1)).times(Rational.of(1, j + 1)));
    }
    return Form.sum(terms);
  }

  private static Optional<Form> checked(Optional<Form> found, Form f, Variable x) {
    return found.filter(g -> g.derivative(x).equals(f));
  }

  private static Optional<Form> search(Form f, Variable x) {
    if (!f.dependsOn(x)) {
      return Optional.of(f.times(Form.of(x)));
    }
    Optional<List<ExponentialPart>> parts = Structure.exponentialParts(f, x);
    if (parts.isPresent()) {
      return Optional.of(Form.sum(parts.get().stream().map(p -> ofPart(p, x)).toList()));
    }
    Optional<Form> power = ofPower(f, x);
    if (power.isPresent()) {
      return power;
    }
    if (Structure.isRationalIn(f, x)) {
      return ofRational(f, x);
    }
    return ofUnknown(f, x);
  }

  private static Optional<Form> termByTerm(Form f, Variable x) {
    if (f.numerator().size() < 2) {
      return Optional.empty();
    }
    List<Form> sum = new ArrayList<>();
    Form divisor = Form.of(f.denominator());
    for (var term : f.numerator().terms()) {
      Form single = Form.of(Polynomial.of(term.monomial(), term.coefficient()));
      Form part = single.dividedBy(divisor);
      Optional<Form> found = checked(search(part, x), part, x);
      if (found.isEmpty()) {
        return Optional.empty();
      }
      sum.add(found.get());
    }
    return checked(Optional.of(Form.sum(sum)), f, x);
  }

  /// e^(c x) Σ_k (−1)^k p^(k)/c^(k+1), or the integral of the polynomial part.
  private static Form ofPart(ExponentialPart part, Variable x) {
    Form polynomial = Splitting.polynomial(part.coefficients(), Form.of(x));
    if (part.rate().isZero()) {
      return ofPolynomial(polynomial, x);
    }
    List<Form> terms = new ArrayList<>();
    Form factor = part.rate().inverse();
    while (!polynomial.isZero()) {
      terms.add(polynomial.times(factor));
      factor = factor.dividedBy(part.rate()).negated();
      polynomial = polynomial.derivative(x);
    }
    return part.kernel().times(Form.sum(terms));
  }

  /// With L = f/f' linear in x and L' ≠ −1: f L/(1 + L'). This covers (a x + b)^n.
  private static Optional<Form> ofPower(Form f, Variable x) {
    Form slope = f.derivative(x);
    if (slope.isZero()) {
      return Optional.empty();
    }
    Form ratio = f.dividedBy(slope);
    Form change = ratio.derivative(x);
    if (change.dependsOn(x) || change.equals(Form.MINUS_ONE)) {
      return Optional.empty();
    }
    return Optional.of(f.times(ratio).dividedBy(Form.ONE.plus(change)));
  }

  private static Optional<Form> ofRational(Form f, Variable x) {
    PartialFractions fractions = Structure.partialFractions(f, x).orElseThrow();
    List<Form> terms = new ArrayList<>();
    Form polynomial = Splitting.polynomial(fractions.polynomialPart(), Form.of(x));
    terms.add(ofPolynomial(polynomial, x));
    for (PartialFractions.Piece piece : fractions.pieces()) {
      Form slope = piece.base().derivative(x);
      if (slope.dependsOn(x) || piece.numerator().dependsOn(x)) {
        return Optional.empty();
      }
      Form scale = piece.numerator().dividedBy(slope);
      if (piece.power() == 1) {
        terms.add(scale.times(Elementary.ln(positiveAtZero(piece.base(), x))));
      } else {
        Form power = piece.base().power(1 - piece.power());
        terms.add(scale.times(power).times(Rational.of(1, 1 - piece.power())));
      }
    }
    return Optional.of(Form.sum(terms));
  }

  /// The linear form or its negative, whichever is positive at 0, or grows where it is zero there.
  private static Form positiveAtZero(Form linear, Variable x) {
    Form value = linear.substitute(x, Form.ZERO);
    Form deciding = value.isZero() ? linear.derivative(x) : value;
    boolean negative = deciding.asRational().map(r -> r.sign() < 0).orElse(false);
    return negative ? linear.negated() : linear;
  }

  private static Optional<Form> ofUnknown(Form f, Variable x) {
    if (!f.denominator().isOne() && Form.of(f.denominator()).dependsOn(x)) {
      return Optional.empty();
    }
    for (Generator g : f.generators()) {
      if (g instanceof Unknown unknown && unknown.derivatives() > 0 && g.dependsOn(x)) {
        Form before =
            Form.of(new Unknown(unknown.name(), unknown.derivatives() - 1, unknown.argument()));
        Form inner = unknown.argument().derivative(x);
        Form factor = f.dividedBy(Form.of(g));
        if (!factor.dependsOn(x) && !inner.dependsOn(x)) {
          return Optional.of(factor.times(before).dividedBy(inner));
        }
      }
    }
    return Optional.empty();
  }
}
