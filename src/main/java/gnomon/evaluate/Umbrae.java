package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.Span;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Moment;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Functional;
import gnomon.operator.Moments;
import gnomon.operator.Operator;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import gnomon.summation.Condition;
import gnomon.syntax.Identifier;
import gnomon.syntax.Statement;
import gnomon.value.FormValue;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.OperatorValue;
import gnomon.value.SeriesValue;
import gnomon.value.Value;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Umbrae: their declaration, and the value that eval gives to expressions in them.
final class Umbrae {
  private static final String SERIES_VARIABLE = "t";

  private final Evaluation evaluation;

  Umbrae(Evaluation evaluation) {
    this.evaluation = evaluation;
  }

  /// The scope in which the letters are umbrae with the generating function.
  Scope declared(Statement.Umbra statement, Scope scope) {
    Variable t = scope.fresh(SERIES_VARIABLE);
    Value value =
        new Evaluator(evaluation)
            .value(statement.series(), scope.with(SERIES_VARIABLE, new Binding.Bound(t)));
    Form series = Sorts.form(value, statement.series().span(), "the generating function");
    Scope more = scope;
    for (Identifier name : statement.letters()) {
      Variable letter = new Variable(name.text());
      if (letter.equals(scope.running())) {
        throw Problems.of(
            "name-taken",
            name.text() + " is the running variable and cannot be an umbra",
            name.span(),
            "vary n");
      }
      Form indicator = series.substitute(t, Form.of(new Dual(letter)));
      requireUnit(indicator, new Dual(letter), statement);
      more = more.with(name.text(), new Binding.Umbra(new Moment.Letter(letter, indicator)));
    }
    return more;
  }

  /// eval(1) is 1.
  private static void requireUnit(Form indicator, Dual t, Statement.Umbra statement) {
    Span span = statement.series().span();
    boolean unit;
    try {
      PowerSeries start = Expansion.of(indicator, t, 0);
      unit = start.valuation() >= 0 && start.coefficient(0).isOne();
    } catch (Refusal noSeries) {
      unit = false;
    }
    if (!unit) {
      throw Problems.of(
          "domain-umbra",
          "the generating function of moments is a power series in t that begins with 1",
          span,
          "umbra B with t/(exp(t) - 1)");
    }
  }

  /// The umbrae of the scope.
  static List<Moment.Letter> letters(Scope scope) {
    return scope.names().values().stream()
        .filter(Binding.Umbra.class::isInstance)
        .map(binding -> ((Binding.Umbra) binding).letter())
        .toList();
  }

  /// eval(…).
  Value value(Value argument, Span span, Scope scope) {
    List<Moment.Letter> letters = letters(scope);
    if (letters.isEmpty()) {
      throw Problems.of(
          "name-no-umbra", "no umbra is declared", span, "umbra B with t/(exp(t) - 1)");
    }
    return switch (argument) {
      case FormValue form -> Sorts.of(moment(form.form(), letters), scope);
      case ListValue list ->
          new ListValue(list.items().stream().map(item -> value(item, span, scope)).toList());
      case SeriesValue series ->
          new SeriesValue(
              series.family(),
              series.first(),
              series.coefficients().stream().map(c -> moment(c, letters)).toList(),
              series.order());
      case FunctionalValue(Functional functional) -> {
        Variable x = functional.variable();
        yield new FunctionalValue(new Functional(x, symbol(functional.indicator(), letters)));
      }
      case OperatorValue(MappedOperator operator) -> {
        Optional<Operator> plain = operator.asOperator().filter(Operator::isPlain);
        yield Sorts.of(
            Operator.ofSymbol(
                symbol(
                    plain
                        .orElseThrow(
                            () ->
                                Problems.of(
                                    "kind-eval",
                                    "eval takes no operator with boundary terms",
                                    span,
                                    "eval(E^B)"))
                        .symbol(),
                    letters)));
      }
      case Value other ->
          throw Problems.of(
              "kind-eval", "eval of " + Sorts.article(other) + " means nothing", span);
    };
  }

  /// The value of a form; exponents left standing are natural numbers.
  Form moment(Form form, List<Moment.Letter> letters) {
    Form value = Moments.value(form, letters);
    for (Generator kernel : value.generators()) {
      if (kernel instanceof Moment standing) {
        for (Form exponent : Moments.exponents(standing)) {
          evaluation.require(List.of(new Condition(least(exponent), Condition.Relation.NATURAL)));
          for (Variable n : exponent.variables()) {
            evaluation.implies(Assumptions.NONE.withInteger(n));
          }
        }
      }
    }
    return value;
  }

  /// What is a natural number when the exponent is, for integers: n for 2 n + 1 and for 2 n.
  private static Form least(Form exponent) {
    if (exponent.variables().size() != 1) {
      return exponent;
    }
    Variable n = exponent.variables().first();
    Form slope = exponent.derivative(n);
    Form start = exponent.substitute(n, Form.ZERO);
    Optional<Rational> ratio = start.dividedBy(slope).asRational();
    boolean rising = slope.asInteger().filter(a -> a.signum() > 0).isPresent();
    return rising && ratio.isPresent()
        ? Form.of(n).plus(Form.of(Rational.of(ratio.get().floor())))
        : exponent;
  }

  /// A symbol in which the duals hold still while the functionals act.
  private Form symbol(Form symbol, List<Moment.Letter> letters) {
    Map<Generator, Form> held = new HashMap<>();
    Map<Generator, Form> released = new HashMap<>();
    for (Dual t : symbol.duals()) {
      Variable spectator = new Variable("held dual of " + t.of().name());
      held.put(t, Form.of(spectator));
      released.put(spectator, Form.of(t));
    }
    return moment(symbol.substitute(held), letters).substitute(released);
  }
}
