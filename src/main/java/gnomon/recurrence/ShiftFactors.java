package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.polynomial.Factor;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/// The irreducible factors of a polynomial in v, each as often as it occurs, and the integer shifts
/// between factors.
public record ShiftFactors(List<Form> factors) {

  /// Copies the factors.
  public ShiftFactors {
    factors = List.copyOf(factors);
  }

  static ShiftFactors of(Form polynomial, Variable v) {
    List<Form> factors = new ArrayList<>();
    for (Factor factor : polynomial.numerator().factor().factors()) {
      Form base = Form.of(factor.base());
      if (base.dependsOn(v)) {
        factors.addAll(Collections.nCopies(factor.multiplicity(), base));
      }
    }
    return new ShiftFactors(factors);
  }

  /// The j with lower(v + j) = const · upper(v), if there is one.
  public static Optional<Integer> shift(Form upper, Form lower, Variable v) {
    List<Form> p = Structure.asPolynomial(upper, v).orElseThrow();
    List<Form> q = Structure.asPolynomial(lower, v).orElseThrow();
    int degree = p.size() - 1;
    if (degree < 1 || q.size() != p.size()) {
      return Optional.empty();
    }
    Form second = p.get(degree - 1).dividedBy(p.get(degree));
    Form other = q.get(degree - 1).dividedBy(q.get(degree));
    Optional<BigInteger> steps = second.minus(other).dividedBy(Form.of(degree)).asInteger();
    if (steps.isEmpty() || steps.get().bitLength() > 30) {
      return Optional.empty();
    }
    int j = steps.get().intValueExact();
    Form ratio = moved(lower, v, j).dividedBy(upper);
    return ratio.dependsOn(v) ? Optional.empty() : Optional.of(j);
  }

  /// The form at v + steps.
  public static Form moved(Form form, Variable v, int steps) {
    return steps == 0 ? form : form.substitute(v, Form.of(v).plus(Form.of(steps)));
  }

  /// Whether the form contains no algebraic constants, so that its factors cannot split further
  /// over the constants that occur.
  static boolean isWithoutRadicals(Form form) {
    return form.generators().stream().noneMatch(g -> g.isAlgebraic());
  }
}
