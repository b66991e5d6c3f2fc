package gnomon.evaluate;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.evaluate.Binders.Limits;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Moment;
import gnomon.form.Variable;
import gnomon.polynomial.Monomial;
import gnomon.summation.Condition;
import gnomon.summation.DefiniteSum;
import gnomon.summation.DefiniteSums;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// Finite sums of values that eval gives: eval is linear, so that Σ_k c_k eval(p_k) is eval of the
/// sum over c_k p_k, where that has a closed form in powers of the umbrae.
final class UmbralSums {
  private final Evaluation evaluation;

  UmbralSums(Evaluation evaluation) {
    this.evaluation = evaluation;
  }

  /// The sum, where there are values of eval that depend on the bound variable and the sum inside
  /// closes.
  Optional<Form> sum(Form body, Limits limits) {
    Variable k = limits.variable();
    Set<Moment.Letter> letters = new LinkedHashSet<>();
    for (Generator g : body.generators()) {
      if (g instanceof Moment moment) {
        letters.addAll(moment.letters());
      }
    }
    long names = letters.stream().map(Moment.Letter::variable).distinct().count();
    boolean varies =
        body.generators().stream().anyMatch(g -> g instanceof Moment && g.dependsOn(k));
    if (!varies || names < letters.size() || limits.upper().isEmpty()) {
      return Optional.empty();
    }
    return inside(body, letters).flatMap(opened -> closed(opened, List.copyOf(letters), limits));
  }

  /// The body with eval taken away: uncorrelated umbrae may stand in one eval, so that the values
  /// multiplied in a term may be joined when they have no umbra in common.
  private static Optional<Form> inside(Form body, Set<Moment.Letter> letters) {
    List<Form> parts = new ArrayList<>();
    for (Form term : body.terms()) {
      Form opened = term;
      Set<Moment.Letter> met = new HashSet<>();
      for (Monomial.Power power : term.numerator().leadingTerm().monomial().factors()) {
        if (power.indeterminate() instanceof Moment moment) {
          boolean apart = moment.letters().stream().allMatch(met::add);
          if (!power.exponent().isOne() || !apart) {
            return Optional.empty();
          }
          opened = opened.dividedBy(Form.of(moment)).times(moment.body());
        }
      }
      parts.add(opened);
    }
    Form sum = Form.sum(parts);
    boolean left = sum.generators().stream().anyMatch(Moment.class::isInstance);
    boolean free = letters.stream().allMatch(letter -> !body.dependsOn(letter.variable()));
    return left || !free ? Optional.empty() : Optional.of(sum);
  }

  private Optional<Form> closed(Form opened, List<Moment.Letter> letters, Limits limits) {
    DefiniteSum sum =
        new DefiniteSums(evaluation.sums())
            .sum(opened, limits.variable(), limits.lower(), limits.upper().orElseThrow());
    boolean found =
        sum.status() == DefiniteSum.Status.CLOSED_FORM
            || sum.status() == DefiniteSum.Status.TERM_BY_TERM;
    if (!found || sum.conditions().stream().anyMatch(c -> isAbout(c, letters))) {
      return Optional.empty();
    }
    try {
      Form value = new Umbrae(evaluation).moment(sum.value(), letters);
      evaluation.require(sum.conditions());
      return Optional.of(value);
    } catch (Refusal refusal) {
      if (refusal.reason() == Reason.NO_MOMENT) {
        return Optional.empty();
      }
      throw refusal;
    }
  }

  /// Whether a condition asks of the umbrae more than that a polynomial in them is not zero, which
  /// holds for the polynomial identity that the closed form is.
  private static boolean isAbout(Condition condition, List<Moment.Letter> letters) {
    return condition.relation() != Condition.Relation.NOT_ZERO
        && letters.stream().anyMatch(l -> condition.subject().dependsOn(l.variable()));
  }
}
