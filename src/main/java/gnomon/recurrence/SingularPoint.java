package gnomon.recurrence;

import gnomon.form.Form;
import java.math.BigInteger;
import java.util.Optional;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;

/// Where a recurrence forbids its first values: at a zero of its leading coefficient the equation
/// ties earlier values to one another.
public final class SingularPoint {
  private static final BigInteger FARTHEST = BigInteger.valueOf(1000);

  private SingularPoint() {}

  /// The first argument n at which the equation, unrolled from the given values, cannot hold.
  public static Optional<BigInteger> of(
      LinearEquation equation, SortedMap<BigInteger, Form> given) {
    if (given.isEmpty()) {
      return Optional.empty();
    }
    LinearEquation cleared = equation.cleared();
    BigInteger first = given.firstKey();
    SortedSet<BigInteger> zeros =
        IntegerRoots.of(cleared.leading(), equation.variable()).tailSet(first);
    if (zeros.isEmpty() || zeros.last().subtract(first).compareTo(FARTHEST) > 0) {
      return Optional.empty();
    }
    SortedMap<BigInteger, Form> values = new TreeMap<>(given);
    for (BigInteger n = first; n.compareTo(zeros.last()) <= 0; n = n.add(BigInteger.ONE)) {
      Optional<Form> rest = cleared.known(values, n);
      if (rest.isEmpty()) {
        return Optional.empty();
      }
      if (zeros.contains(n)) {
        if (!rest.get().isZero()) {
          return Optional.of(n);
        }
      } else {
        Form leading = cleared.leading().substitute(equation.variable(), Form.of(n));
        values.putIfAbsent(
            n.add(BigInteger.valueOf(equation.order())), rest.get().dividedBy(leading));
      }
    }
    return Optional.empty();
  }
}
