package gnomon.evaluate;

import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.summation.Condition;
import gnomon.summation.SumIdentity;
import gnomon.value.VerdictValue;
import gnomon.value.VerdictValue.Ground;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/// Identities between sums without closed form, proved by a recurrence that the difference of both
/// sides has, and its first values.
final class SumClaims {
  private static final int HIGHEST_START = 40;

  private final Evaluation evaluation;
  private final Assumptions assumptions;

  SumClaims(Evaluation evaluation, Assumptions assumptions) {
    this.evaluation = evaluation;
    this.assumptions = assumptions;
  }

  /// The proof, where there is one of this kind.
  Optional<VerdictValue> verdict(Form left, Form right) {
    Form difference = left.minus(right);
    SortedSet<Variable> ends = new TreeSet<>();
    for (Generator g : difference.generators()) {
      if (g instanceof Accumulation sum && sum.kind() == Accumulation.Kind.SUM) {
        ends.addAll(sum.upper().variables());
        ends.addAll(sum.lower().variables());
      }
    }
    for (Variable n : ends) {
      Optional<SumIdentity> identity = identity(difference, n);
      if (identity.isPresent()) {
        return Optional.of(proved(identity.get()));
      }
    }
    return Optional.empty();
  }

  /// From the first number that is allowed on, or from 0 where the sides differ at the empty sum of
  /// −1.
  private Optional<SumIdentity> identity(Form difference, Variable n) {
    for (int start = -1; start <= HIGHEST_START; start++) {
      if (assumptions.mayAllow(n, Rational.of(start))) {
        BigInteger least = BigInteger.valueOf(start);
        Optional<SumIdentity> found = SumIdentity.of(difference, n, least, evaluation.sums());
        return found.isPresent() || start >= 0
            ? found
            : SumIdentity.of(difference, n, BigInteger.ZERO, evaluation.sums());
      }
    }
    return Optional.empty();
  }

  private VerdictValue proved(SumIdentity identity) {
    Variable n = identity.variable();
    Form start = Form.of(n).minus(Form.of(identity.least()));
    evaluation.require(List.of(new Condition(start, Condition.Relation.NATURAL)));
    Form left = Form.ZERO;
    for (int j = 0; j < identity.coefficients().size(); j++) {
      Form moved = Form.of(new Unknown("d", 0, Form.of(n).plus(Form.of(j))));
      left = left.plus(identity.coefficients().get(j).times(moved));
    }
    evaluation
        .grounds()
        .found(
            "the recurrence of d, the left side less the right side",
            left,
            Form.ZERO,
            n,
            "from those of the sums, for " + n.name() + " >= " + identity.from());
    int order = identity.coefficients().size() - 1;
    return new VerdictValue.Proved(
        new Ground.Words(
            "the difference of the sides has a recurrence of order "
                + order
                + ", and its first values are 0",
            Optional.empty()));
  }
}
