package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.summation.SummationEngine;
import gnomon.value.Equation;
import gnomon.value.FormValue;
import gnomon.value.Status;
import gnomon.value.Step;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;

/// What is gathered and counted while one statement is evaluated: calls of defined functions, the
/// steps of the derivation, the status of the sums met, and what symbolic limits imply.
final class Evaluation {
  private final int callLimit;
  private final int depthLimit;
  private final SummationEngine sums;
  private final Typesetter typesetter;
  private final List<Step> steps = new ArrayList<>();
  private Status status = Status.NONE;
  private Assumptions implied = Assumptions.NONE;
  private int calls;
  private int depth;

  Evaluation(int depthLimit, int callLimit, SummationEngine sums, Typesetter typesetter) {
    this.depthLimit = depthLimit;
    this.callLimit = callLimit;
    this.sums = sums;
    this.typesetter = typesetter;
  }

  /// The search for antidifferences.
  SummationEngine sums() {
    return sums;
  }

  /// What writes values for typesetting.
  Typesetter typesetter() {
    return typesetter;
  }

  /// Counts a call of the defined function `name` at `span` while `call` runs.
  ///
  /// @throws gnomon.diagnostic.DiagnosedException when calls are nested too deep or are too many
  <T> T calling(String name, Span span, Supplier<T> call) {
    Budget.checkpoint();
    if (depth >= depthLimit) {
      throw Problems.of(
          "limit-depth",
          name + " is called within itself more than " + depthLimit + " times",
          span,
          "help let");
    }
    if (++calls > callLimit) {
      throw Problems.of("limit-steps", "more than " + callLimit + " calls in one statement", span);
    }
    depth++;
    try {
      return call.get();
    } finally {
      depth--;
    }
  }

  /// Records a step that was checked by computing both sides.
  void step(String rule, Value left, Value right, String note) {
    steps.add(new Step(rule, List.of(new Equation(left, right)), true, note));
  }

  /// Records a step of several equations, each checked by computing both sides.
  void step(String rule, List<Equation> equations) {
    steps.add(new Step(rule, equations, true, ""));
  }

  /// Records a step about forms.
  void step(String rule, Form left, Form right, Variable running, String note) {
    step(rule, FormValue.of(left, running), FormValue.of(right, running), note);
  }

  /// Records an antidifference F and that its difference is the summand.
  void antidifference(Form f, Form difference, Form summand, Variable k, boolean shifted) {
    Form at = Form.of(k);
    step(
        "an antidifference F of the summand",
        named(at),
        f,
        k,
        shifted ? "counted from the lower limit" : "");
    step(
        "its difference is the summand",
        named(at.plus(Form.ONE)).minus(named(at)),
        difference,
        k,
        "");
    if (!difference.equals(summand)) {
      throw new IllegalArgumentException("not an antidifference");
    }
  }

  /// F at an argument, where F is a name for an antidifference in a derivation.
  Form named(Form argument) {
    return Form.of(new Unknown("F", 0, argument));
  }

  List<Step> steps() {
    return List.copyOf(steps);
  }

  Status status() {
    return status;
  }

  void status(Status other) {
    status = other;
  }

  /// What the ranges met so far take for granted: symbolic limits are integers.
  Assumptions implied() {
    return implied;
  }

  void implies(Assumptions more) {
    implied = implied.and(more);
  }
}
