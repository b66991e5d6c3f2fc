package gnomon.summation;

import gnomon.form.ExponentialPart;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.DensePolynomial;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// The check that every antidifference passes before it is handed out.
///
/// It knows nothing of how the answer was found: it shifts, subtracts and compares normal forms.
/// Long polynomials are shifted by Taylor's formula, in front of each exponential kernel apart.
final class Differencing {

  private static final int DENSE_SIZE = 40;

  private Differencing() {}

  /// Whether F(x + h) − F(x) = f(x) in the normal form.
  static boolean confirms(Form sum, Form f, Variable x, Form h) {
    Optional<Boolean> dense = h.asRational().flatMap(step -> confirmsDense(sum, f, x, step));
    return dense.orElseGet(
        () -> sum.substitute(x, Form.of(x).plus(h)).minus(sum).minus(f).isZero());
  }

  /// The decision where F is long and f is of the same kind: Σ b^x p(x) with rational numbers.
  private static Optional<Boolean> confirmsDense(Form sum, Form f, Variable x, Rational h) {
    Map<Form, DensePolynomial> left = new HashMap<>();
    Map<Form, DensePolynomial> right = new HashMap<>();
    if (sum.numerator().size() < DENSE_SIZE || !collect(sum, x, left) || !collect(f, x, right)) {
      return Optional.empty();
    }
    Set<Form> kernels = new HashSet<>(left.keySet());
    kernels.addAll(right.keySet());
    for (Form kernel : kernels) {
      Form moved = kernel.substitute(x, Form.of(x).plus(Form.of(h)));
      Optional<Rational> factor = moved.dividedBy(kernel).asRational();
      if (factor.isEmpty()) {
        return Optional.empty();
      }
      DensePolynomial polynomial = left.getOrDefault(kernel, DensePolynomial.ZERO);
      DensePolynomial difference = polynomial.taylorShift(h).times(factor.get()).minus(polynomial);
      if (!difference.equals(right.getOrDefault(kernel, DensePolynomial.ZERO))) {
        return Optional.of(false);
      }
    }
    return Optional.of(true);
  }

  /// The polynomials in front of the kernels; false where the form is not of this kind.
  private static boolean collect(Form form, Variable x, Map<Form, DensePolynomial> polynomials) {
    Optional<List<ExponentialPart>> parts = Structure.exponentialParts(form, x);
    if (parts.isEmpty()) {
      return false;
    }
    for (ExponentialPart part : parts.get()) {
      if (!PolynomialSums.allRational(part.coefficients())) {
        return false;
      }
      List<Rational> numbers =
          part.coefficients().stream().map(c -> c.asRational().orElseThrow()).toList();
      polynomials.merge(part.kernel(), DensePolynomial.of(numbers), DensePolynomial::plus);
    }
    return true;
  }
}
