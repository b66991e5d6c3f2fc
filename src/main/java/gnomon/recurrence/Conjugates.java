package gnomon.recurrence;

import gnomon.form.Base;
import gnomon.form.Constant;
import gnomon.form.Elementary;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.List;

/// Complex conjugates of forms whose variables and parameters are taken to be real, to show
/// solutions of real equations in real form.
final class Conjugates {
  private static final Form TWICE_I = Form.I.times(Form.TWO);

  private Conjugates() {}

  static Form of(Form form) {
    return of(form.numerator()).dividedBy(of(form.denominator()));
  }

  private static Form of(Polynomial polynomial) {
    List<Form> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Form product = Form.of(term.coefficient());
      for (Monomial.Power power : term.monomial().factors()) {
        product = product.times(of((Generator) power.indeterminate(), power.exponent()));
      }
      terms.add(product);
    }
    return Form.sum(terms);
  }

  private static Form of(Generator g, Rational exponent) {
    if (g == Constant.I) {
      return Form.I.negated();
    }
    if (g instanceof Exponential(Base base, Form unit) && !g.isAlgebraic()) {
      return switch (base) {
        case Base.Turn _, Base.GaussianAngle _ -> Form.of(g, exponent.negated());
        case Base.Natural _ -> Elementary.exp(of(unit).times(exponent));
        case Base.Prime _, Base.Zero _, Base.Of _ -> Form.of(g, exponent);
      };
    }
    return Form.of(g, exponent);
  }

  /// The functions, where y and ȳ among them are replaced by (y + ȳ)/2 and (y − ȳ)/(2i).
  static List<Form> inRealForm(List<Form> functions) {
    List<Form> all = new ArrayList<>(functions);
    for (int i = 0; i < all.size(); i++) {
      Form conjugate = of(all.get(i));
      int partner = all.subList(i + 1, all.size()).indexOf(conjugate);
      if (partner >= 0 && !conjugate.equals(all.get(i))) {
        Form y = all.get(i);
        all.set(i, y.plus(conjugate).times(Rational.HALF));
        all.set(i + 1 + partner, y.minus(conjugate).dividedBy(TWICE_I));
      }
    }
    return all;
  }
}
