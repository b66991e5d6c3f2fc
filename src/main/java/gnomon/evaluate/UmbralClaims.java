package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Moment;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Moments;
import gnomon.recurrence.IntegerRoots;
import gnomon.summation.ExponentialTransform;
import gnomon.value.VerdictValue;
import gnomon.value.VerdictValue.Assignment;
import gnomon.value.VerdictValue.Ground;
import gnomon.value.VerdictValue.Witness;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/// Identities in umbrae with a symbolic exponent, decided through the exponential generating
/// function of the difference of both sides: where that is a polynomial in z, the sides agree for
/// all but finitely many exponents, which are looked at one by one.
final class UmbralClaims {
  private static final int MOST_SINGLE = 64;

  private final Evaluation evaluation;
  private final Assumptions assumptions;
  private final Scope scope;

  UmbralClaims(Evaluation evaluation, Assumptions assumptions, Scope scope) {
    this.evaluation = evaluation;
    this.assumptions = assumptions;
    this.scope = scope;
  }

  /// The verdict, where the generating function gives one.
  Optional<VerdictValue> verdict(Form left, Form right) {
    Form difference = left.minus(right);
    SortedSet<Variable> exponents = new TreeSet<>();
    List<Form> standing = new ArrayList<>();
    for (Generator kernel : difference.generators()) {
      if (kernel instanceof Moment moment) {
        standing.addAll(Moments.exponents(moment));
      }
    }
    standing.forEach(exponent -> exponents.addAll(exponent.variables()));
    for (Variable n : exponents) {
      for (int step = 1; step <= 2; step++) {
        Optional<VerdictValue> verdict = verdict(new Sides(left, right), n, standing, step);
        if (verdict.isPresent()) {
          return verdict;
        }
      }
    }
    return Optional.empty();
  }

  /// Both sides of the claim.
  private record Sides(Form left, Form right) {}

  /// With a step of 2 the exponent is n/2 for an even number n: what is left of a generating
  /// function then is its even or odd part.
  private Optional<VerdictValue> verdict(Sides sides, Variable n, List<Form> exponents, int step) {
    Form stepped = Form.of(n).times(Rational.of(1, step));
    Form difference = sides.left().minus(sides.right()).substitute(n, stepped);
    List<Form> moved = exponents.stream().map(e -> e.substitute(n, stepped)).toList();
    return ExponentialTransform.of(difference, n, evaluation.sums())
        .map(transform -> step == 1 ? transform : transform.half())
        .flatMap(transform -> verdict(sides, n, moved, transform, step));
  }

  private Optional<VerdictValue> verdict(
      Sides sides, Variable n, List<Form> exponents, ExponentialTransform transform, int step) {
    Optional<SortedSet<Integer>> single = single(n, exponents, transform);
    if (single.isEmpty()) {
      return Optional.empty();
    }
    for (int stepped : single.get()) {
      int value = Math.floorDiv(stepped, step);
      if (stepped % step == 0 && assumptions.mayAllow(n, Rational.of(value))) {
        Optional<VerdictValue> failed = at(sides, n, value);
        if (failed.isPresent()) {
          return failed;
        }
      }
    }
    evaluation.require(transform.conditions());
    evaluation
        .grounds()
        .say(
            "with exponential generating functions in "
                + n.name()
                + (transform.shift() == 0 ? "" : " from " + transform.shift() + " on")
                + ", left side less right side",
            Sorts.of(transform.series(), scope),
            scope.running());
    return Optional.of(
        new VerdictValue.Proved(
            new Ground.Words(
                "both sides have the same exponential generating function in " + n.name(),
                Optional.empty())));
  }

  /// The exponents about which the generating function does not say that the sides agree; nothing
  /// where these are not finitely many.
  private static Optional<SortedSet<Integer>> single(
      Variable n, List<Form> exponents, ExponentialTransform transform) {
    int lowest = lowest(n, exponents);
    SortedSet<Integer> single = new TreeSet<>();
    for (int value = lowest; value < transform.shift(); value++) {
      single.add(value);
    }
    if (!transform.series().isZero()) {
      Optional<List<Form>> coefficients = Structure.asPolynomial(transform.series(), transform.z());
      if (coefficients.isEmpty() || coefficients.get().size() > MOST_SINGLE) {
        return Optional.empty();
      }
      for (int m = 0; m < coefficients.get().size(); m++) {
        if (!coefficients.get().get(m).isZero()) {
          single.add(m + transform.shift());
        }
      }
    }
    for (var root : IntegerRoots.of(transform.divisor(), n)) {
      if (root.bitLength() > 31) {
        return Optional.empty();
      }
      single.add(root.intValueExact());
    }
    single.removeIf(value -> value < lowest);
    return Optional.of(single);
  }

  /// The least number from which on the exponents of the shape n + s are natural.
  private static int lowest(Variable n, List<Form> exponents) {
    int lowest = 0;
    boolean any = false;
    for (Form exponent : exponents) {
      Optional<Integer> start = Form.of(n).minus(exponent).asInt();
      if (start.isPresent()) {
        lowest = any ? Math.max(lowest, start.get()) : start.get();
        any = true;
      }
    }
    return lowest;
  }

  /// What speaks against the claim at one exponent.
  private Optional<VerdictValue> at(Sides sides, Variable n, int value) {
    Form a;
    Form b;
    try {
      a = Substitutions.addedUp(sides.left().substitute(n, Form.of(value)));
      b = Substitutions.addedUp(sides.right().substitute(n, Form.of(value)));
    } catch (Refusal undefined) {
      return Optional.empty();
    }
    if (a.equals(b)) {
      return Optional.empty();
    }
    Optional<Witness> witness = Witnesses.search(a, b, assumptions, scope).witness();
    Assignment point = new Assignment(n, Form.of(value));
    return Optional.of(
        witness
            .<VerdictValue>map(found -> new VerdictValue.Refuted(joined(point, found)))
            .orElseGet(
                () ->
                    new VerdictValue.Open(
                        "the sides are written differently at " + n.name() + " = " + value,
                        "no point was found at which they certainly differ")));
  }

  private static Witness joined(Assignment point, Witness inner) {
    return switch (inner) {
      case Witness.AtPoint(List<Assignment> rest, var a, var b) -> {
        List<Assignment> all = new ArrayList<>(rest);
        all.addFirst(point);
        yield new Witness.AtPoint(all, a, b);
      }
      case Witness.Sides(var a, var b) -> new Witness.AtPoint(List.of(point), a, b);
      case Witness.OnFunction function -> function;
    };
  }
}
