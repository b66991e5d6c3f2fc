package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.diagnostic.Span;
import gnomon.evaluate.Binders.Limits;
import gnomon.form.CoefficientSeries;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import gnomon.summation.DefiniteSum;
import gnomon.summation.InfiniteSums;
import gnomon.syntax.Expression;
import gnomon.syntax.Factor;
import gnomon.syntax.Suffix;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// `Σ(k: 0..∞) c(k) Q^k`: an operator given by the coefficients of its series in a shift-invariant
/// operator Q without constant term. It is a formal series, exact to any order asked for; where a
/// sum of the language closes it, its closed form is taken.
final class OperatorSeries {
  /// The coefficients by which a closed form is checked once more.
  private static final int CHECKED = 8;

  /// The coefficients that are seen to be no poles when the series is made.
  private static final int DEFINED = 64;

  private final Evaluator evaluator;

  OperatorSeries(Evaluator evaluator) {
    this.evaluator = evaluator;
  }

  /// c(k) and Q^(ak + b), read off the body.
  private record Parts(Form coefficient, Form symbol, int step, int offset) {}

  /// The operator, where the body is of this kind.
  Optional<Value> value(Limits limits, Expression body, Scope scope) {
    Scope inside = limits.inside(scope);
    Variable k = limits.variable();
    if (limits.upper().isPresent() || limits.first().isEmpty()) {
      return Optional.empty();
    }
    return parts(body, k, inside).map(parts -> operator(limits, parts, body.span()));
  }

  // ---------------------------------------------------------------- reading

  private Optional<Parts> parts(Expression body, Variable k, Scope scope) {
    if (body instanceof Expression.Suffixed power) {
      return power(power, k, scope).map(found -> with(found, Form.ONE));
    }
    if (!(body instanceof Expression.Term(List<Factor> factors, Span span))) {
      return Optional.empty();
    }
    for (int at = 0; at < factors.size(); at++) {
      Factor factor = factors.get(at);
      if (factor.value() instanceof Expression.Suffixed power && !factor.isArgument()) {
        Optional<Parts> found = power(power, k, scope);
        if (found.isPresent()) {
          List<Factor> rest = new ArrayList<>(factors);
          Expression one = new Expression.Numeral(BigInteger.ONE, BigInteger.ONE, power.span());
          rest.set(at, new Factor(factor.connective(), false, one));
          Value coefficient = evaluator.value(new Expression.Term(rest, span), scope);
          return Optional.of(with(found.get(), Sorts.form(coefficient, span, "the coefficient")));
        }
      }
    }
    return Optional.empty();
  }

  private static Parts with(Parts parts, Form coefficient) {
    return new Parts(coefficient, parts.symbol(), parts.step(), parts.offset());
  }

  /// Q and the exponent, where the power is that of an operator with an exponent linear in k.
  private Optional<Parts> power(Expression.Suffixed power, Variable k, Scope scope) {
    if (!(power.suffixes().getLast() instanceof Suffix.Raised(Expression exponent, Span _))
        || power.suffixes().size() != 1) {
      return Optional.empty();
    }
    if (power.atom() instanceof Expression.Name name && Calls.needsArguments(name.text())) {
      return Optional.empty();
    }
    Value base = evaluator.value(power.atom(), scope);
    Optional<Operator> q = Sorts.acts(base) ? Sorts.asPlainOperator(base) : Optional.empty();
    if (q.isEmpty() || !q.get().isPlain() || !q.get().isShiftInvariant()) {
      return Optional.empty();
    }
    Form index = Sorts.form(evaluator.value(exponent, scope), exponent.span(), "the exponent");
    Optional<List<Form>> linear = Structure.asPolynomial(index, k).filter(list -> list.size() == 2);
    Optional<Integer> step = linear.flatMap(list -> list.getLast().asInt());
    Optional<Integer> offset = linear.flatMap(list -> list.getFirst().asInt());
    return step.isPresent() && offset.isPresent() && step.get() >= 1
        ? Optional.of(new Parts(Form.ONE, q.get().symbol(), step.get(), offset.get()))
        : Optional.empty();
  }

  // ---------------------------------------------------------------- summing

  private Value operator(Limits limits, Parts parts, Span span) {
    Variable k = limits.variable();
    int first = limits.first().orElseThrow().intValueExact();
    int lowest = parts.step() * first + parts.offset();
    boolean grows =
        parts.symbol().duals().stream()
            .findFirst()
            .filter(t -> Expansion.of(parts.symbol(), t, 1).valuation() >= 1)
            .isPresent();
    if (!grows || lowest < 0) {
      throw Problems.of(
          "domain-series-of-operators",
          "a series of operators is in powers of one without constant term",
          span,
          "Sigma(k: 1..inf) Delta^k/k");
    }
    Form c = parts.coefficient().substitute(k, Form.of(k).plus(Form.of(first)));
    for (int n = 0; n <= DEFINED; n++) {
      c.substitute(k, Form.of(n));
    }
    Form z = parts.symbol().power(parts.step());
    Form sum = closed(c, k, z).orElseGet(() -> CoefficientSeries.of(c, k, z));
    Operator operator = Operator.ofSymbol(sum.times(parts.symbol().power(lowest)));
    if (!operator.isShiftInvariant()
        || operator.variables().stream().anyMatch(parts.coefficient()::dependsOn)) {
      throw Problems.of(
          "domain-series-of-operators",
          "the coefficients of a series of operators are scalars",
          span,
          "Sigma(k: 1..inf) Delta^k/k");
    }
    return Sorts.of(operator);
  }

  /// Σ c(k) z^k where it has a closed form, of which the first coefficients are compared.
  private Optional<Form> closed(Form c, Variable k, Form argument) {
    Variable z = new Variable("z'");
    try {
      Form summand = c.times(Elementary.power(Form.of(z), Form.of(k)));
      DefiniteSum sum = new InfiniteSums(evaluator.evaluation().sums()).sum(summand, k, Form.ZERO);
      if (sum.status() != DefiniteSum.Status.CLOSED_FORM) {
        return Optional.empty();
      }
      PowerSeries series = Expansion.of(sum.value(), z, CHECKED);
      for (int n = 0; n <= CHECKED; n++) {
        if (!series.coefficient(n).equals(c.substitute(k, Form.of(n)))) {
          return Optional.empty();
        }
      }
      return Optional.of(sum.value().substitute(Map.of(z, argument)));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }
}
