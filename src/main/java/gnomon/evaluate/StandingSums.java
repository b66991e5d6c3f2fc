package gnomon.evaluate;

import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.summation.RecurrentSum;
import gnomon.summation.SummationEngine;
import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/// Values of forms with standing sums at integers far out, by the recurrences of the sums.
final class StandingSums {
  /// From here on a recurrence is looked for; nearer values are added up.
  private static final BigInteger FAR = BigInteger.valueOf(64);

  private final SummationEngine engine;
  private final Map<Generator, Optional<RecurrentSum>> known = new HashMap<>();

  StandingSums(SummationEngine engine) {
    this.engine = engine;
  }

  /// The form with the number put in for n in those sums of it that have a recurrence in n, up to
  /// `last`.
  Form at(Form form, Variable n, BigInteger point, BigInteger last) {
    if (last.compareTo(FAR) < 0 || form.generators().stream().noneMatch(g -> isSum(g, n))) {
      return form;
    }
    return form.mapGenerators(
        g ->
            isSum(g, n)
                ? known
                    .computeIfAbsent(g, _ -> recurrent((Accumulation) g, n, last))
                    .map(sum -> sum.at(point))
                    .orElse(Form.of(g))
                : Form.of(g));
  }

  /// The form with all images put in, where those of them that are far integers go through
  /// recurrences.
  Form at(Form form, Map<Generator, Form> images) {
    Form value = form;
    for (Map.Entry<Generator, Form> image : images.entrySet()) {
      Optional<BigInteger> point = image.getValue().asInteger();
      if (image.getKey() instanceof Variable n && point.isPresent()) {
        Map<Generator, Form> others = new HashMap<>(images);
        others.remove(n);
        boolean concerned = value.generators().stream().anyMatch(g -> isSum(g, n));
        if (concerned && point.get().compareTo(FAR) >= 0) {
          value = at(value.substitute(others), n, point.get(), point.get());
        }
      }
    }
    return value.substitute(images);
  }

  private static boolean isSum(Generator g, Variable n) {
    return g instanceof Accumulation sum
        && sum.kind() == Accumulation.Kind.SUM
        && (sum.upper().dependsOn(n) || sum.lower().dependsOn(n));
  }

  private Optional<RecurrentSum> recurrent(Accumulation sum, Variable n, BigInteger last) {
    return RecurrentSum.of(sum.body(), sum.bound(), sum.lower(), sum.upper(), n, last, engine);
  }
}
