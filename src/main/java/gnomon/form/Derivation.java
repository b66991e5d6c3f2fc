package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.List;

/// Differentiation of forms: the chain rule over the generators.
final class Derivation {
  private Derivation() {}

  static Form derivative(Form form, Generator v) {
    if (!form.dependsOn(v)) {
      return Form.ZERO;
    }
    Form top = ofPolynomial(form.numerator(), v);
    if (form.denominator().isOne()) {
      return top;
    }
    Form bottom = ofPolynomial(form.denominator(), v);
    Form denominator = Form.of(form.denominator());
    return top.minus(form.times(bottom)).dividedBy(denominator);
  }

  private static Form ofPolynomial(Polynomial polynomial, Generator v) {
    List<Form> parts = new ArrayList<>();
    for (Indeterminate indeterminate : polynomial.indeterminates()) {
      Generator g = (Generator) indeterminate;
      if (g.equals(v)) {
        parts.add(Form.of(polynomial.derivative(g)));
      } else if (g instanceof Exponential power && g.dependsOn(v)) {
        Form rate = power.logarithmicDerivative(v);
        parts.add(Form.of(weighted(polynomial, g)).times(rate));
      } else if (g.dependsOn(v)) {
        parts.add(Form.of(polynomial.derivative(g)).times(g.derivative(v)));
      }
    }
    return Form.sum(parts);
  }

  /// g ∂p/∂g: each term times its exponent of g.
  private static Polynomial weighted(Polynomial polynomial, Generator g) {
    List<Term> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Rational exponent = term.monomial().exponent(g);
      if (!exponent.isZero()) {
        Monomial monomial = term.monomial();
        terms.add(new Term(monomial, term.coefficient().times(exponent)));
      }
    }
    return Polynomial.ofTerms(terms);
  }
}
