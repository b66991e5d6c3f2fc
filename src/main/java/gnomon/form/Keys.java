package gnomon.form;

import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;

/// Canonical spellings of polynomials in generators, for ordering and for telling apart.
final class Keys {
  private Keys() {}

  static String of(Polynomial polynomial) {
    if (polynomial.isZero()) {
      return "0";
    }
    StringBuilder text = new StringBuilder();
    for (Term term : polynomial.terms()) {
      if (!text.isEmpty()) {
        text.append('+');
      }
      text.append(term.coefficient());
      for (Monomial.Power factor : term.monomial().factors()) {
        text.append('*').append(((Generator) factor.indeterminate()).key());
        if (!factor.exponent().isOne()) {
          text.append('^').append(factor.exponent());
        }
      }
    }
    return text.toString();
  }
}
