package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.recurrence.ConstantsFromConditions;
import gnomon.recurrence.RecurrenceSolver;
import gnomon.recurrence.SolutionSpace;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// Definite sums of hypergeometric terms by creative telescoping.
///
/// The summand's telescoper gives a recurrence of the sum in the variable n of its ends, with
/// boundary terms. Of first order it is solved in closed form where the factors are linear; the
/// closed form is put into the recurrence, compared with sums added term by term where the
/// recurrence starts and below, and the range in which it holds is read off there.
final class HypergeometricSums {

  private static final int MAXIMAL_ORDER = 4;
  private static final int MAXIMAL_HARMONIC_ORDER = 3;

  private final SummationEngine engine;

  HypergeometricSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// What is found of a sum.
  sealed interface Outcome {

    /// A closed form, proved for every n ≥ from.
    record Closed(Form value, Variable n, BigInteger from, SumRecurrence recurrence)
        implements Outcome {}

    /// A recurrence that was not solved.
    record Recurrence(Variable n, SumRecurrence recurrence) implements Outcome {}

    /// No recurrence was found, or its boundary terms are not under control.
    record Nothing() implements Outcome {}
  }

  /// Σ(k: lower..upper) summand, for ends that are integer-linear in one variable.
  Outcome sum(Form summand, Variable k, Form lower, Form upper) {
    Set<Variable> ends = upper.minus(lower).variables();
    if (ends.size() != 1
        || !ends.containsAll(upper.variables())
        || !ends.containsAll(lower.variables())) {
      return new Outcome.Nothing();
    }
    Variable n = ends.iterator().next();
    Optional<Line> length = Line.of(upper.minus(lower), n);
    if (length.isEmpty() || length.get().signAtInfinity() <= 0) {
      return new Outcome.Nothing();
    }
    BigInteger first = length.get().firstNatural();
    Form term = Reflection.applied(summand, n, k, lower, upper);
    Optional<Telescoper> telescoper =
        Telescoper.of(term, n, k, MAXIMAL_ORDER)
            .or(() -> HarmonicTelescoper.of(term, n, k, MAXIMAL_HARMONIC_ORDER));
    Optional<SumRecurrence> recurrence =
        telescoper.flatMap(
            found -> BoundaryTerms.recurrence(term, found, n, k, lower, upper, first));
    if (recurrence.isEmpty()) {
      return new Outcome.Nothing();
    }
    SumValues values = new SumValues(summand, n, k, lower, upper);
    return recurrence
        .filter(found -> found.order() <= 1)
        .flatMap(found -> closed(found, n, values, first))
        .or(() -> solved(recurrence.get(), n, values, first))
        .orElseGet(() -> new Outcome.Recurrence(n, recurrence.get()));
  }

  private Optional<Outcome> closed(
      SumRecurrence recurrence, Variable n, SumValues values, BigInteger first) {
    try {
      Form low = recurrence.coefficients().getFirst();
      if (recurrence.order() == 0) {
        Form value = recurrence.rightSide().dividedBy(low).takingIntegers(Set.of(n));
        return validated(value, recurrence, n, values, first);
      }
      Form high = recurrence.coefficients().getLast();
      Form from = Form.of(recurrence.from());
      Optional<Form> product = RationalProduct.closed(low.dividedBy(high).negated(), n, from);
      if (product.isEmpty()) {
        return Optional.empty();
      }
      Form start = values.at(recurrence.from());
      Optional<Form> value =
          recurrence.rightSide().isZero()
              ? Optional.of(start.times(product.get()))
              : withRightSide(recurrence, n, product.get(), start);
      return value
          .map(form -> form.takingIntegers(Set.of(n)))
          .filter(form -> satisfies(recurrence, n, form))
          .flatMap(form -> validated(form, recurrence, n, values, first));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// A sum of hypergeometric terms that solves the recurrence and has the first values of the sum.
  private Optional<Outcome> solved(
      SumRecurrence recurrence, Variable n, SumValues values, BigInteger first) {
    try {
      SolutionSpace space =
          new RecurrenceSolver(engine, Optional.of(recurrence.from())).solve(recurrence.equation());
      if (space.isEmpty()) {
        return Optional.empty();
      }
      List<Variable> constants = new ArrayList<>();
      for (int i = 0; i < space.basis().size(); i++) {
        constants.add(new Variable("c'" + i));
      }
      Form general = space.combination(constants);
      List<Form> conditions = new ArrayList<>();
      for (int i = 0; i < recurrence.order(); i++) {
        BigInteger point = recurrence.from().add(BigInteger.valueOf(i));
        conditions.add(general.substitute(n, Form.of(point)).minus(values.at(point)));
      }
      return ConstantsFromConditions.of(conditions, constants)
          .map(found -> space.withConstants(found))
          .filter(form -> constants.stream().noneMatch(form::dependsOn))
          .filter(form -> satisfies(recurrence, n, form))
          .flatMap(form -> validated(form, recurrence, n, values, first));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// P(n)·(S(from) + Σ_j right(j)/(c_1(j) P(j+1))), where that sum has an antidifference.
  private Optional<Form> withRightSide(
      SumRecurrence recurrence, Variable n, Form product, Form start) {
    Form next = product.substitute(n, Form.of(n).plus(Form.ONE));
    Form term = recurrence.rightSide().dividedBy(recurrence.coefficients().getLast().times(next));
    if (engine.search(term, n, Form.ONE) instanceof Antidifference.Found found) {
      Form offset = found.value().substitute(n, Form.of(recurrence.from()));
      return Optional.of(product.times(start.plus(found.value()).minus(offset)));
    }
    return Optional.empty();
  }

  /// Whether the form satisfies the recurrence, by normal forms.
  private static boolean satisfies(SumRecurrence recurrence, Variable n, Form form) {
    Form left = recurrence.rightSide().negated();
    for (int i = 0; i < recurrence.coefficients().size(); i++) {
      Form moved = form.substitute(n, Form.of(n).plus(Form.of(i)));
      left = left.plus(recurrence.coefficients().get(i).times(moved));
    }
    return left.takingIntegers(List.of(n)).isZero();
  }

  private static Optional<Outcome> validated(
      Form form, SumRecurrence recurrence, Variable n, SumValues values, BigInteger first) {
    return values
        .validFrom(form, recurrence.from(), first)
        .map(begin -> new Outcome.Closed(form, n, begin, recurrence));
  }
}
