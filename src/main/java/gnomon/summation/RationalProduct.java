package gnomon.summation;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Products ∏(j: from..n−1) r(j) of a rational function in closed form.
final class RationalProduct {
  private RationalProduct() {}

  /// The product as powers and factorials: a factor j + α gives (n−1+α)!/(from−1+α)!. Nothing where
  /// a factor is not linear in j.
  static Optional<Form> closed(Form ratio, Variable n, Form from) {
    Factored factored = Structure.factored(ratio);
    Form unit = Form.of(factored.unit());
    List<Form> parts = new ArrayList<>();
    for (Factored.Factor factor : factored.factors()) {
      Optional<List<Form>> list = Structure.asPolynomial(factor.base(), n);
      if (list.isEmpty() || list.get().size() > 2) {
        return Optional.empty();
      }
      List<Form> coefficients = list.get();
      if (coefficients.size() < 2) {
        unit = unit.times(factor.base().power(factor.multiplicity()));
        continue;
      }
      Form slope = coefficients.get(1);
      Form offset = coefficients.getFirst().dividedBy(slope);
      unit = unit.times(slope.power(factor.multiplicity()));
      Form top = Combinatorial.factorial(Form.of(n).plus(offset).minus(Form.ONE));
      Form bottom = Combinatorial.factorial(from.plus(offset).minus(Form.ONE));
      parts.add(top.dividedBy(bottom).power(factor.multiplicity()));
    }
    parts.add(Elementary.power(unit, Form.of(n).minus(from)));
    return Optional.of(Form.product(parts));
  }
}
