package gnomon.evaluate;

import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.summation.SumRecurrence;
import java.util.List;

/// Records the recurrence of a definite sum in the derivation of its value.
final class RecurrenceSteps {
  private final Evaluation evaluation;
  private final Variable index;

  RecurrenceSteps(Evaluation evaluation, Variable index) {
    this.evaluation = evaluation;
    this.index = index;
  }

  /// The certificate, then the recurrence with its boundary terms; both were checked when they were
  /// found, by dividing the telescoped identity by the summand.
  void record(SumRecurrence recurrence) {
    Variable n = recurrence.variable();
    evaluation
        .grounds()
        .found(
            "the certificate R, with which the telescoped summand is Delta_"
                + index.name()
                + " of R times the summand",
            Form.of(new Unknown("R", 0, Form.of(index))),
            recurrence.telescoper().certificate(),
            n,
            "checked by dividing by the summand");
    Form left = Form.ZERO;
    List<Form> coefficients = recurrence.coefficients();
    for (int i = 0; i < coefficients.size(); i++) {
      Form value = Form.of(new Unknown("S", 0, Form.of(n).plus(Form.of(i))));
      left = left.plus(coefficients.get(i).times(value));
    }
    evaluation
        .grounds()
        .found(
            "the recurrence of the sum S",
            left,
            recurrence.rightSide(),
            n,
            "for " + n.name() + " >= " + recurrence.from());
  }
}
