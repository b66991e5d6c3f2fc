package gnomon.recurrence;

import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import java.util.Optional;

/// Standing sums and products up to v + c, written by those up to v − 1 and single terms, so that
/// the same sum at v and at v + 1 are seen to be related.
public final class Lowered {
  private static final int FARTHEST = 200;

  private Lowered() {}

  /// The form with every standing sum and product over l..v+c, with an integer c and l free of v,
  /// brought to the upper end v − 1.
  public static Form of(Form form, Variable v) {
    boolean standing = form.generators().stream().anyMatch(g -> distance(g, v).isPresent());
    return standing
        ? form.mapGenerators(
            g -> distance(g, v).map(c -> lowered((Accumulation) g, v, c)).orElse(Form.of(g)))
        : form;
  }

  /// c + 1 where the upper end is v + c, and the sum or product is one that can be written anew.
  private static Optional<Integer> distance(Generator g, Variable v) {
    return g instanceof Accumulation standing
            && standing.kind() != Accumulation.Kind.INTEGRAL
            && !standing.lower().dependsOn(v)
            && !standing.body().dependsOn(v)
        ? standing
            .upper()
            .minus(Form.of(v))
            .plus(Form.ONE)
            .asInt()
            .filter(steps -> steps != 0 && Math.abs(steps) <= FARTHEST)
        : Optional.empty();
  }

  private static Form lowered(Accumulation standing, Variable v, int steps) {
    Form value =
        Accumulation.of(
            standing.kind(),
            standing.bound(),
            standing.lower(),
            Form.of(v).minus(Form.ONE),
            standing.body());
    boolean adding = standing.kind() == Accumulation.Kind.SUM;
    for (int j = Math.min(steps, 0); j < Math.max(steps, 0); j++) {
      Form point = Form.of(v).plus(Form.of(j));
      Form term = of(standing.body().substitute(standing.bound(), point), v);
      if (adding) {
        value = steps > 0 ? value.plus(term) : value.minus(term);
      } else {
        value = steps > 0 ? value.times(term) : value.dividedBy(term);
      }
    }
    return value;
  }
}
