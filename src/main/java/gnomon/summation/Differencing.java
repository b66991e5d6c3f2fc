package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import java.util.List;

/// The check that every antidifference passes before it is handed out.
///
/// It knows nothing of how the answer was found: it shifts, subtracts and compares normal forms.
final class Differencing {

  private static final int DENSE_DEGREE = 40;

  private Differencing() {}

  /// Whether F(x + h) − F(x) = f(x) in the normal form.
  static boolean confirms(Form sum, Form f, Variable x, Form h) {
    var dense = Structure.asPolynomial(sum, x);
    if (dense.isPresent()
        && dense.get().size() > DENSE_DEGREE
        && h.asRational().isPresent()
        && PolynomialSums.allRational(dense.get())) {
      return confirmsDense(dense.get(), f, x, h.asRational().get());
    }
    Form shifted = sum.substitute(x, Form.of(x).plus(h));
    return shifted.minus(sum).minus(f).isZero();
  }

  private static boolean confirmsDense(List<Form> sum, Form f, Variable x, Rational h) {
    var expected = Structure.asPolynomial(f, x);
    if (expected.isEmpty() || !PolynomialSums.allRational(expected.get())) {
      return false;
    }
    DensePolynomial polynomial = dense(sum);
    return polynomial.taylorShift(h).minus(polynomial).equals(dense(expected.get()));
  }

  private static DensePolynomial dense(List<Form> coefficients) {
    return DensePolynomial.of(
        coefficients.stream().map(c -> c.asRational().orElseThrow()).toList());
  }
}
