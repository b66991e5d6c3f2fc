package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.summation.Condition;
import gnomon.summation.SummationEngine;
import gnomon.syntax.Condition.Relation;
import gnomon.value.Status;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.function.Supplier;

/// What is gathered and counted while one statement is evaluated: calls of defined functions, the
/// steps of the derivation, the status of the sums met, and what symbolic limits imply.
final class Evaluation {
  private final int callLimit;
  private final int depthLimit;
  private final SummationEngine sums;
  private final Writing writing;
  private final Catalogue catalogue;
  private final Grounds grounds;
  private final List<Condition> conditions = new ArrayList<>();
  private final List<String> remarks = new ArrayList<>();
  private Status status = Status.NONE;
  private OptionalInt truncation = OptionalInt.empty();
  private Assumptions implied = Assumptions.NONE;
  private int calls;
  private int depth;

  Evaluation(
      int depthLimit,
      int callLimit,
      SummationEngine sums,
      Writing writing,
      Catalogue catalogue,
      boolean explaining) {
    this.depthLimit = depthLimit;
    this.callLimit = callLimit;
    this.sums = sums;
    this.writing = writing;
    this.catalogue = catalogue;
    this.grounds = new Grounds(explaining, this);
  }

  /// The search for antidifferences.
  SummationEngine sums() {
    return sums;
  }

  /// What writes values.
  Writing writing() {
    return writing;
  }

  /// The families known by name.
  Catalogue catalogue() {
    return catalogue;
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

  /// The explanation of the answer, where one was asked for.
  Grounds grounds() {
    return grounds;
  }

  /// What `work` gives while images that are infinite series are cut off after D^order.
  <T> T truncating(int order, Supplier<T> work) {
    OptionalInt before = truncation;
    truncation = OptionalInt.of(order);
    try {
      return work.get();
    } finally {
      truncation = before;
    }
  }

  /// The order after which infinite images are cut off, where they are.
  OptionalInt truncation() {
    return truncation;
  }

  Status status() {
    return status;
  }

  void status(Status other) {
    status = other;
  }

  /// The status of one more sum: of several sums the least that is known.
  void met(Status other) {
    status = other.kind().compareTo(status.kind()) >= 0 ? other : status;
  }

  /// Notes what the status line has to say besides the side conditions.
  void remark(String words) {
    remarks.add(words);
  }

  /// What the status line has to say besides the side conditions.
  List<String> remarks() {
    return List.copyOf(remarks);
  }

  /// The side conditions of the closed forms met so far.
  List<Condition> conditions() {
    return List.copyOf(conditions);
  }

  /// Notes side conditions, under which witnesses are looked for from now on.
  void require(List<Condition> more) {
    for (Condition condition : more) {
      if (!conditions.contains(condition)) {
        conditions.add(condition);
        if (condition.relation() == Condition.Relation.NATURAL) {
          implies(
              Assumptions.NONE.with(
                  new Assumptions.Comparison(condition.subject(), Relation.AT_LEAST, Form.ZERO)));
        }
      }
    }
  }

  /// Goes back to these side conditions.
  void conditions(List<Condition> earlier) {
    conditions.clear();
    conditions.addAll(earlier);
  }

  /// What the ranges met so far take for granted: symbolic limits are integers.
  Assumptions implied() {
    return implied;
  }

  void implies(Assumptions more) {
    implied = implied.and(more);
  }
}
