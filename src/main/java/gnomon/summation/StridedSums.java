package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Variable;
import java.math.BigInteger;
import java.util.Optional;
import java.util.Set;

/// Sums Σ(j: 0..span) g(j) whose end moves by m ≥ 2 points when its variable n grows by one.
///
/// The m terms that come in with each n are put together before they are summed over n: Σ(k: 1..2n)
/// (−1)^k/k has a closed form in n though (−1)^k/k has no antidifference in k.
final class StridedSums {

  private static final int WIDEST = 12;

  private final SummationEngine engine;

  StridedSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// The sum in closed form, where the terms for each n have an antidifference in n that is finite
  /// from the empty range on.
  Optional<DefiniteSum> sum(Form g, Variable j, Form span) {
    if (span.variables().size() != 1) {
      return Optional.empty();
    }
    Variable n = span.variables().first();
    Optional<Line> line = Line.of(span, n).filter(Line::isIntegral);
    if (line.isEmpty() || g.dependsOn(n)) {
      return Optional.empty();
    }
    Optional<Integer> stride = Form.of(line.get().slope()).asInt();
    if (stride.isEmpty() || stride.get() < 2 || stride.get() > WIDEST) {
      return Optional.empty();
    }
    try {
      return summed(g, j, span, n, stride.get());
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  private Optional<DefiniteSum> summed(Form g, Variable j, Form span, Variable n, int stride) {
    Form next = Form.ZERO;
    for (int i = 1; i <= stride; i++) {
      next = next.plus(g.substitute(j, span.plus(Form.of(i))));
    }
    Form step = next.takingIntegers(Set.of(n));
    Form count = span.plus(Form.ONE);
    BigInteger first = Line.of(count, n).orElseThrow().firstNatural();
    if (!(engine.search(step, n, Form.ONE) instanceof Antidifference.Found found)
        || IntegerPoles.of(found.value(), n).atOrAbove(first).isPresent()) {
      return Optional.empty();
    }
    Form start =
        Terms.sum(g, j, Form.ZERO, count.substitute(n, Form.of(first)).asInt().orElseThrow());
    Form value = DefiniteSums.telescoped(found.value(), n, Form.of(first), Form.of(n)).plus(start);
    return Optional.of(DefiniteSum.closed(value.takingIntegers(Set.of(n)), found.conditions()));
  }
}
