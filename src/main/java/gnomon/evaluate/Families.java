package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.algebra.Refusal;
import gnomon.basis.FirstMembers;
import gnomon.basis.Kinship;
import gnomon.basis.Prototype;
import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.series.PowerSeries;
import gnomon.value.Family;
import gnomon.value.FamilyValue;
import gnomon.value.FormValue;
import gnomon.value.ListValue;
import gnomon.value.MapValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/// `family U`: looks a map, a delta operator or an invertible operator up in the catalogue, and
/// draws the portrait of its sequence.
final class Families {
  private final Evaluator evaluator;
  private final Catalogue catalogue;

  Families(Evaluator evaluator, Catalogue catalogue) {
    this.evaluator = evaluator;
    this.catalogue = catalogue;
  }

  private static final int LEAST_MEMBERS = 8;

  /// A family with the way a sequence belongs to it.
  private record Found(CatalogueEntry entry, Kinship kinship, boolean inverse) {}

  Value value(Value subject, Span span, Scope scope) {
    if (subject instanceof ListValue list) {
      return ofMembers(list, span, scope);
    }
    ShefferMap map = map(subject, span, scope);
    Letters letters = new Letters(map);
    Optional<Found> found = find(map);
    Optional<FamilyValue.Kin> kin = found.map(one -> kin(one, map, letters));
    Portrait portrait = new Portrait(map, letters);
    portrait.map();
    portrait.generatingFunction();
    found.ifPresent(one -> portrait.coefficient(coefficient(one, letters)));
    portrait.operators();
    portrait.inverse(inverseName(map, found, letters));
    found
        .filter(one -> one.kinship().isProved())
        .ifPresent(one -> portrait.source(one.entry().source()));
    return new FamilyValue(kin, portrait.lines());
  }

  /// The family with which the members listed agree.
  private Value ofMembers(ListValue list, Span span, Scope scope) {
    Variable x = scope.running();
    List<Form> members =
        list.items().stream().map(item -> Sorts.form(item, span, "a member")).toList();
    if (members.size() < LEAST_MEMBERS) {
      throw Problems.of(
          "domain-too-few",
          "a family is recognised by " + LEAST_MEMBERS + " members or more",
          span);
    }
    FirstMembers first =
        FirstMembers.of(members, x)
            .orElseThrow(
                () ->
                    Problems.of(
                        "domain-no-sequence",
                        "these are not the first members of a Sheffer sequence",
                        span));
    ShefferMap map = first.map(x);
    Optional<Found> found = best(Kinship.of(first, x), false);
    List<FamilyValue.Line> lines = new ArrayList<>();
    lines.add(line("delta operator", first.f(), x));
    lines.add(line("invertible operator", first.g(), x));
    return new FamilyValue(found.map(one -> kin(one, map, new Letters(map))), lines);
  }

  private static FamilyValue.Line line(String label, PowerSeries series, Variable x) {
    Family family = new Family.OperatorPowers(Operator.derivative(x));
    return new FamilyValue.Line(
        label, new SeriesValue(family, 0, series.coefficients(), series.order() + 1));
  }

  // ---------------------------------------------------------------- what is asked

  private static ShefferMap map(Value subject, Span span, Scope scope) {
    if (subject instanceof MapValue(ShefferMap map)) {
      return map;
    }
    Optional<Operator> plain =
        subject instanceof FormValue ? Optional.empty() : Sorts.asPlainOperator(subject);
    if (plain.isEmpty() || !plain.get().isPlain() || !plain.get().isShiftInvariant()) {
      throw Problems.of(
          "kind-no-sequence",
          "a family is asked of a basis map or a shift-invariant operator",
          span,
          "family umbral(Delta)");
    }
    Variable x = plain.get().variables().stream().findFirst().orElse(scope.running());
    Form symbol = plain.get().symbol();
    Dual dual = new Dual(x);
    try {
      return ShefferMap.umbral(symbol, dual);
    } catch (Refusal notDelta) {
      try {
        return ShefferMap.sheffer(Form.of(dual), symbol, dual);
      } catch (Refusal notInvertible) {
        throw notDelta;
      }
    }
  }

  // ---------------------------------------------------------------- the search

  /// The family of the map, or else of its inverse: proved before what only agrees, and the family
  /// itself before its scaled and shifted forms.
  private Optional<Found> find(ShefferMap map) {
    Optional<Found> direct = best(map, false);
    if (direct.filter(found -> found.kinship().isProved()).isPresent()) {
      return direct;
    }
    Optional<Found> backward = best(map.inverse(), true);
    return backward.filter(found -> found.kinship().isProved()).isPresent()
        ? backward
        : direct.or(() -> backward);
  }

  private Optional<Found> best(ShefferMap map, boolean inverse) {
    return best(Kinship.of(map), inverse);
  }

  private Optional<Found> best(Function<Prototype, Optional<Kinship>> kinshipTo, boolean inverse) {
    Optional<Found> best = Optional.empty();
    for (CatalogueEntry entry : catalogue.entries()) {
      Budget.checkpoint();
      Optional<Kinship> kinship = kinshipTo.apply(entry.prototype(evaluator));
      if (kinship.isPresent()
          && (best.isEmpty() || isCloser(kinship.get(), best.get().kinship()))) {
        best = Optional.of(new Found(entry, kinship.get(), inverse));
      }
      if (best.filter(found -> isNearest(found.kinship())).isPresent()) {
        return best;
      }
    }
    return best;
  }

  private static boolean isNearest(Kinship kinship) {
    return kinship.isProved() && kinship.distance() == 0;
  }

  private static boolean isCloser(Kinship one, Kinship other) {
    if (one.isProved() != other.isProved()) {
      return one.isProved();
    }
    return one.distance() < other.distance();
  }

  private Optional<FamilyValue.Kin> inverseName(
      ShefferMap map, Optional<Found> found, Letters letters) {
    if (found.filter(Found::inverse).isPresent()) {
      Found straight = new Found(found.get().entry(), found.get().kinship(), false);
      return Optional.of(kin(straight, map, letters));
    }
    return best(map.inverse(), false)
        .filter(one -> one.kinship().isProved())
        .map(one -> kin(one, map, letters));
  }

  // ---------------------------------------------------------------- how it is written

  private FamilyValue.Kin kin(Found found, ShefferMap map, Letters letters) {
    CatalogueEntry entry = found.entry();
    Kinship kinship = found.kinship();
    Form front = letters.powerOf(kinship.base()).times(kinship.factor());
    Form argument = Form.of(map.variable()).times(kinship.stretch()).plus(kinship.shift());
    Optional<Form> formula =
        entry
            .formula(evaluator, "member")
            .map(member -> letters.put(member, argument, kinship.parameters()).times(front));
    return new FamilyValue.Kin(
        entry.name(),
        found.inverse(),
        entry.letter(),
        letters.index(),
        entry.raised().stream().map(kinship.parameters()::get).toList(),
        entry.listed().stream().map(kinship.parameters()::get).toList(),
        front,
        argument,
        formula,
        kinship.agreedTo());
  }

  /// κ b^n c^k times the coefficient of the family, for a sequence that is not shifted.
  private Optional<Form> coefficient(Found found, Letters letters) {
    Kinship kinship = found.kinship();
    if (found.inverse() || !kinship.isProved() || !kinship.shift().isZero()) {
      return Optional.empty();
    }
    return found
        .entry()
        .formula(evaluator, "coefficient")
        .map(form -> letters.put(form, Form.ZERO, kinship.parameters()))
        .map(form -> form.times(kinship.factor()))
        .map(form -> form.times(letters.powerOf(kinship.base())))
        .map(form -> form.times(letters.lowerPowerOf(kinship.stretch())))
        .map(letters::takingIntegers);
  }
}
