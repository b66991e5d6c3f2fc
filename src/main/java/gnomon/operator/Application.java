package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;

/// The image of a form under an operator.
final class Application {
  private Application() {}

  static Form apply(Operator operator, Form f, Summation engine) {
    Form image;
    try {
      image = direct(operator, f);
    } catch (Refusal refusal) {
      if (refusal.reason() != Reason.INFINITE_SERIES && refusal.reason() != Reason.SYMBOL_POLE) {
        throw refusal;
      }
      image = throughAntidifferences(operator, f, engine, refusal);
    }
    return Kernels.withConstants(image, f, operator.kernelOrders());
  }

  private static Form direct(Operator operator, Form f) {
    List<Form> parts = new ArrayList<>();
    parts.add(Action.apply(operator.symbol(), f));
    for (Map.Entry<Variable, Form> entry : operator.boundaries().entrySet()) {
      parts.add(Action.applyAtZero(entry.getValue(), f, entry.getKey()));
    }
    return Form.sum(parts);
  }

  private static Form throughAntidifferences(
      Operator operator, Form f, Summation engine, Refusal refusal) {
    Set<Variable> acting = operator.variables();
    if (acting.size() != 1) {
      throw new Refusal(Reason.INFINITE_SERIES, operator.symbol(), f);
    }
    boolean isSeries = operator.isPlain() && !operator.isSingular();
    if (isSeries) {
      throw refusal;
    }
    return Antidifferences.tryApply(operator, acting.iterator().next(), f, engine)
        .orElseThrow(() -> refusal);
  }
}
