package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/// The linear function slope·n + start with rational coefficients, on the integers n.
record Line(Rational slope, Rational start) {

  /// The form as such a function of n, where it is one.
  static Optional<Line> of(Form form, Variable n) {
    Optional<List<Form>> list = Structure.asPolynomial(form, n);
    if (list.isEmpty() || list.get().size() > 2) {
      return Optional.empty();
    }
    Form start = list.get().isEmpty() ? Form.ZERO : list.get().getFirst();
    Form slope = list.get().size() < 2 ? Form.ZERO : list.get().get(1);
    if (start.asRational().isEmpty() || slope.asRational().isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(new Line(slope.asRational().get(), start.asRational().get()));
  }

  /// Whether the values at integers are integers by their coefficients.
  boolean isIntegral() {
    return slope.isInteger() && start.isInteger();
  }

  Line minus(Line that) {
    return new Line(slope.minus(that.slope), start.minus(that.start));
  }

  /// The sign of the function for all large n.
  int signAtInfinity() {
    return slope.isZero() ? start.sign() : slope.sign();
  }

  /// The least integer from which on the function has its sign at infinity; nothing where it has it
  /// everywhere.
  Optional<BigInteger> settledFrom() {
    if (slope.isZero()) {
      return Optional.empty();
    }
    Rational root = start.negated().dividedBy(slope);
    return Optional.of(root.floor().add(BigInteger.ONE));
  }

  /// The least integer at which a rising function is at least 0.
  BigInteger firstNatural() {
    Rational root = start.negated().dividedBy(slope);
    return root.negated().floor().negate();
  }
}
