package gnomon.render;

import gnomon.form.Form;
import gnomon.form.Variable;

/// Shorthand of the tests in this package.
final class Spelt {
  static final Variable X = new Variable("x");
  static final Form x = Form.of(X);
  static final Form n = Form.variable("n");
  static final Form k = Form.variable("k");
  static final Form a = Form.variable("a");
  static final Form t = Form.dual("x");
  static final Form one = Form.ONE;

  private Spelt() {}

  static String unicode(Notation notation) {
    return new LinearPrinter(true).print(notation);
  }

  static String ascii(Notation notation) {
    return new LinearPrinter(false).print(notation);
  }

  static String latex(Notation notation) {
    return new LatexPrinter().print(notation);
  }

  static String shown(Form form) {
    return unicode(FormNotation.in(X).of(form));
  }

  static String factored(Form form) {
    return unicode(FormNotation.in(X).factored(form));
  }

  static String operator(Form symbol) {
    return unicode(OperatorNotation.symbol(symbol, X));
  }

  static Form number(long over, long under) {
    return Form.of(gnomon.number.Rational.of(over, under));
  }
}
