package gnomon.evaluate;

import gnomon.basis.Comparison;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.summation.Condition;
import gnomon.syntax.Expression;
import gnomon.syntax.Range;
import gnomon.syntax.Spelling;
import gnomon.syntax.Statement;
import gnomon.syntax.StatementText;
import gnomon.value.DecimalValue;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.SeriesValue;
import gnomon.value.TableValue;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import gnomon.value.VerdictValue.Assignment;
import gnomon.value.VerdictValue.Ground;
import gnomon.value.VerdictValue.Open;
import gnomon.value.VerdictValue.Proved;
import gnomon.value.VerdictValue.Refuted;
import gnomon.value.VerdictValue.Witness;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;

/// Decides claims: `proved` by equal normal forms, `refuted` by a checked witness, else `open`.
final class Claims {
  /// The powers of x up to which operators without a decision are compared.
  private static final int CHECKED_TO = 12;

  private static final int MOST_POINTS = 10_000;

  private final Evaluator evaluator;
  private final Evaluation evaluation;

  Claims(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
  }

  VerdictValue verdict(Statement.Claim claim, Scope scope) {
    if (claim.range().isPresent()) {
      return overRange(claim, claim.range().get(), scope);
    }
    if (!claim.conditions().isEmpty()) {
      return under(claim, scope);
    }
    Value left = evaluator.value(claim.left(), scope);
    Value right = evaluator.value(claim.right(), scope);
    return Places.at(
        claim.span(), () -> conditioned(decided(left, right, claim.span(), scope), scope));
  }

  /// The claim `for` conditions, which are assumed in it alone.
  private VerdictValue under(Statement.Claim claim, Scope scope) {
    Statement.Claim bare =
        new Statement.Claim(claim.left(), claim.right(), Optional.empty(), List.of(), claim.span());
    Scope inside = Interpreter.assuming(claim.conditions(), evaluator, scope);
    VerdictValue verdict = verdict(bare, inside);
    if (verdict instanceof Proved(Ground ground, String _)) {
      List<Condition> beyond =
          evaluation.conditions().stream()
              .filter(condition -> !inside.assumptions().imply(condition))
              .toList();
      String assumed = StatementText.of(claim.conditions(), Spelling.ASCII);
      Conditions conditions = new Conditions(evaluation.writing(), scope.running());
      return new Proved(ground, conditions.words(assumed, beyond));
    }
    return verdict;
  }

  /// A proof holds where the closed forms in it do.
  private VerdictValue conditioned(VerdictValue verdict, Scope scope) {
    if (verdict instanceof Proved(Ground ground, String _)) {
      Conditions conditions = new Conditions(evaluation.writing(), scope.running());
      return new Proved(ground, conditions.words(evaluation.conditions()));
    }
    return verdict;
  }

  // ---------------------------------------------------------------- ranges

  private VerdictValue overRange(Statement.Claim claim, Range range, Scope scope) {
    Variable n = new Variable(range.variable().text());
    BigInteger first = limit(range.lower(), scope);
    BigInteger last = limit(range.upper(), scope);
    if (last.subtract(first).compareTo(BigInteger.valueOf(MOST_POINTS)) > 0) {
      throw Problems.of(
          "limit-range", "a claim checks at most " + MOST_POINTS + " points", range.span());
    }
    RangeValues values = new RangeValues(evaluator);
    List<Value> lefts = values.values(n.name(), first, last, claim.left(), scope);
    List<Value> rights = values.values(n.name(), first, last, claim.right(), scope);
    BigInteger at = first;
    for (int i = 0; i < lefts.size(); i++) {
      Value left = lefts.get(i);
      Value right = rights.get(i);
      VerdictValue verdict =
          Places.at(claim.span(), () -> decided(left, right, claim.span(), scope));
      switch (verdict) {
        case Proved _ -> at = at.add(BigInteger.ONE);
        case Refuted(Witness witness) -> {
          return new Refuted(atPoint(n, at, left, right, witness));
        }
        case Open(String _, String reason) -> {
          return new Open(n.name() + " = " + first + ".." + at.subtract(BigInteger.ONE), reason);
        }
      }
    }
    return new Proved(new Ground.EachPoint(n, Form.of(first), Form.of(last)));
  }

  private static Witness atPoint(
      Variable n, BigInteger at, Value left, Value right, Witness inner) {
    return switch (inner) {
      case Witness.Sides(Value a, Value b) ->
          new Witness.AtPoint(List.of(new Assignment(n, Form.of(at))), a, b);
      case Witness.AtPoint(List<Assignment> point, Value a, Value b) -> {
        var all = new ArrayList<>(point);
        all.addFirst(new Assignment(n, Form.of(at)));
        yield new Witness.AtPoint(all, a, b);
      }
      case Witness.OnFunction _ ->
          new Witness.AtPoint(List.of(new Assignment(n, Form.of(at))), left, right);
    };
  }

  private BigInteger limit(Expression expression, Scope scope) {
    return Sorts.form(evaluator.value(expression, scope), expression.span(), "a limit")
        .asInteger()
        .orElseThrow(
            () ->
                Problems.of(
                    "domain-range", "the limits of a range are integers", expression.span()));
  }

  // ---------------------------------------------------------------- one claim

  private VerdictValue decided(Value left, Value right, Span span, Scope scope) {
    if (left instanceof FormValue a && right instanceof FormValue b) {
      return forms(a.form(), b.form(), scope);
    }
    if (left instanceof SeriesValue || right instanceof SeriesValue) {
      return series(left, right, span, scope);
    }
    if (Sorts.acts(left) || Sorts.acts(right)) {
      return operators(left, right, span, scope);
    }
    Optional<List<Value>> as = items(left);
    Optional<List<Value>> bs = items(right);
    if (as.isPresent() && bs.isPresent()) {
      return lists(as.get(), bs.get(), left, right, span, scope);
    }
    if (left instanceof DecimalValue || right instanceof DecimalValue) {
      return left.sameAs(right)
          ? new Proved(new Ground.Words("both sides are the same number", Optional.of(left)))
          : new Refuted(new Witness.Sides(left, right));
    }
    throw Problems.of(
        "kind-claim", Sorts.article(left) + " is not compared with " + Sorts.article(right), span);
  }

  private static Optional<List<Value>> items(Value value) {
    return switch (value) {
      case ListValue list -> Optional.of(list.items());
      case TableValue table -> Optional.of(table.asList().items());
      case Value _ -> Optional.empty();
    };
  }

  private VerdictValue forms(Form left, Form right, Scope scope) {
    Assumptions assumptions = scope.assumptions().and(evaluation.implied());
    Form a = assumptions.simplified(left);
    Form b = assumptions.simplified(right);
    if (a.equals(b)) {
      return normalForm(Sorts.of(a, scope), Sorts.of(b, scope), Sorts.of(a, scope), scope);
    }
    Form united = assumptions.simplified(a.unitingConjugates());
    if (united.equals(assumptions.simplified(b.unitingConjugates()))) {
      return normalForm(Sorts.of(a, scope), Sorts.of(b, scope), Sorts.of(united, scope), scope);
    }
    if (OpenConstants.mayAgree(a, b, scope.running())) {
      return new Open(
          "the sides differ by constants left open",
          "an inverse modulo a kernel is determined only up to C1, C2, ...");
    }
    Optional<VerdictValue> umbral = new UmbralClaims(evaluation, assumptions, scope).verdict(a, b);
    if (umbral.isPresent()) {
      return umbral.get();
    }
    Optional<VerdictValue> sums = new SumClaims(evaluation, assumptions).verdict(a, b);
    if (sums.isPresent()) {
      return sums.get();
    }
    Optional<Witness> choice = UnknownFunctions.witness(a, b, assumptions, scope);
    if (choice.isPresent()) {
      return new Refuted(choice.get());
    }
    Witnesses.Search search = Witnesses.search(a, b, assumptions, scope);
    if (search.witness().isPresent()) {
      return new Refuted(search.witness().get());
    }
    String checked =
        search.agreed() == 0
            ? "no point could be checked"
            : "equal at " + search.agreed() + (search.agreed() == 1 ? " point" : " points");
    return new Open(checked, "the normal forms differ, and no point was found that decides");
  }

  private VerdictValue operators(Value left, Value right, Span span, Scope scope) {
    refuseFunction(left, right, span, scope);
    refuseFunction(right, left, span, scope);
    if (left instanceof FunctionalValue a
        && right instanceof FunctionalValue b
        && a.functional().equals(b.functional())) {
      return normalForm(left, right, left, scope);
    }
    MappedOperator a = asOperator(left, span);
    MappedOperator b = asOperator(right, span);
    Variable x = variable(a, b, scope);
    Comparison comparison = a.comparedWith(b, x, CHECKED_TO, evaluation.sums());
    return switch (comparison) {
      case Comparison.Equal _ -> normalForm(Sorts.of(a), Sorts.of(b), Sorts.of(a), scope);
      case Comparison.Identical(Comparison.Way way) ->
          new Proved(new Ground.Words(words(way), Optional.empty()));
      case Comparison.Different(int power, Form first, Form second)
          when OpenConstants.mayAgree(first, second, x) ->
          new Open(
              "the sides differ on " + x.name() + "^" + power + " by constants left open",
              "an inverse modulo a kernel is determined only up to C1, C2, ...");
      case Comparison.Different(int power, Form first, Form second)
          when !certainlyDiffer(first, second, scope) ->
          new Open(
              "the images of " + x.name() + "^" + power + " are written differently",
              "no point was found at which they certainly differ");
      case Comparison.Different(int power, Form first, Form second) ->
          new Refuted(
              new Witness.OnFunction(
                  FormValue.of(Form.of(x).power(power), x),
                  FormValue.of(first, x),
                  FormValue.of(second, x)));
      case Comparison.Open(int checkedTo) ->
          new Open(
              x.name() + "^0, ..., " + x.name() + "^" + checkedTo,
              "the normal form does not decide operators of this kind");
    };
  }

  private static String words(Comparison.Way way) {
    return switch (way) {
      case DERIVATIVE -> "the symbols have the same derivative and begin alike";
      case QUOTIENT -> "the symbols have the same logarithmic derivative and begin alike";
      case DEFINING_EQUATION ->
          "both sides are equal by the equation that defines the inverse series";
    };
  }

  /// Whether two forms have certainly different values at some point. Forms that only look
  /// different, such as logarithms whose sum is 0, do not count.
  private boolean certainlyDiffer(Form left, Form right, Scope scope) {
    Assumptions assumptions = scope.assumptions().and(evaluation.implied());
    return UnknownFunctions.witness(left, right, assumptions, scope).isPresent()
        || Witnesses.search(left, right, assumptions, scope).witness().isPresent();
  }

  private static MappedOperator asOperator(Value value, Span span) {
    return Sorts.asOperator(value)
        .orElseThrow(
            () ->
                Problems.of(
                    "kind-claim",
                    "an operator is not compared with " + Sorts.article(value),
                    span));
  }

  private static void refuseFunction(Value value, Value other, Span span, Scope scope) {
    if (value instanceof FormValue form
        && !Sorts.isScalarFor(form.form(), other, scope.running())) {
      throw Problems.pointingToX("an operator is not compared with a function", span, scope);
    }
  }

  /// The variable in whose powers two operators are compared: the running one where they act on it.
  private static Variable variable(MappedOperator a, MappedOperator b, Scope scope) {
    var acting = new TreeSet<Variable>();
    for (MappedOperator operator : List.of(a, b)) {
      for (MappedOperator.Term term : operator.terms()) {
        acting.addAll(term.operator().variables());
        if (!term.map().isIdentity()) {
          acting.add(term.map().variable());
        }
      }
    }
    return acting.isEmpty() || acting.contains(scope.running()) ? scope.running() : acting.first();
  }

  private VerdictValue series(Value left, Value right, Span span, Scope scope) {
    SeriesArithmetic arithmetic = new SeriesArithmetic(scope);
    Value minus = new Arithmetic(evaluation).negated(right, span, scope);
    SeriesValue difference = (SeriesValue) arithmetic.plus(left, minus, span);
    if (difference.coefficients().stream().anyMatch(c -> certainlyDiffer(c, Form.ZERO, scope))) {
      return new Refuted(new Witness.Sides(left, right));
    }
    if (!difference.coefficients().isEmpty()) {
      return new Open(
          "the coefficients are written differently",
          "no point was found at which they certainly differ");
    }
    return new Proved(new Ground.Words("both sides agree up to", Optional.of(difference)));
  }

  private VerdictValue lists(
      List<Value> as, List<Value> bs, Value left, Value right, Span span, Scope scope) {
    if (as.size() != bs.size()) {
      return new Refuted(new Witness.Sides(left, right));
    }
    for (int i = 0; i < as.size(); i++) {
      VerdictValue item = decided(as.get(i), bs.get(i), span, scope);
      if (!(item instanceof Proved)) {
        return item;
      }
    }
    return new Proved(new Ground.Words("both sides agree item by item", Optional.of(left)));
  }

  private VerdictValue normalForm(Value left, Value right, Value common, Scope scope) {
    evaluation.grounds().say("the left side has the normal form", left, scope.running());
    evaluation.grounds().say("the right side has the normal form", right, scope.running());
    return new Proved(new Ground.NormalForm(common));
  }
}
