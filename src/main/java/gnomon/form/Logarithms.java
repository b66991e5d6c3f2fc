package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Real logarithms, split into logarithms of independent arguments.
final class Logarithms {
  private Logarithms() {}

  /// The natural logarithm, of a positive argument: of a product the sum, of a power the multiple.
  /// Factors that vanish or have a pole where all duals are 0 stay under one logarithm, so that it
  /// keeps the power series it may have.
  ///
  /// @throws Refusal with [Reason#LOGARITHM_DOMAIN] for zero, a negative number or a complex one
  static Form ln(Form argument) {
    if (argument.isZero()) {
      throw new Refusal(Reason.LOGARITHM_DOMAIN, argument);
    }
    List<Form> parts = new ArrayList<>();
    Form together = Form.ONE;
    for (Decomposition.Part part : Decomposition.of(argument).parts()) {
      if (part.base() instanceof Base.Turn || part.base() instanceof Base.GaussianAngle) {
        throw new Refusal(Reason.LOGARITHM_DOMAIN, argument);
      }
      if (part.base() instanceof Base.Of(Form form) && isSingular(form)) {
        together = together.times(Powers.power(form, part.exponent()));
      } else {
        parts.add(part.exponent().times(part.base().logarithm()));
      }
    }
    if (!together.isOne()) {
      parts.add(Form.of(new Logarithm(together)));
    }
    return Form.sum(parts);
  }

  /// Whether a form in duals is 0 where all of them are 0.
  private static boolean isSingular(Form form) {
    if (form.duals().isEmpty()) {
      return false;
    }
    Map<Generator, Form> origin = new LinkedHashMap<>();
    form.duals().forEach(dual -> origin.put(dual, Form.ZERO));
    Optional<Form> value;
    try {
      value = Optional.of(form.substitute(origin));
    } catch (Refusal _) {
      value = Optional.empty();
    }
    return value.map(Form::isZero).orElse(true);
  }
}
