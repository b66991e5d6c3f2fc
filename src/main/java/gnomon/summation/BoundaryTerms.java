package gnomon.summation;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// From a telescoper of the summand to a recurrence of the sum, with its boundary terms.
///
/// Summed over k from a(n) to b(n), Σ_i c_i F(n+i, k) = G(n, k+1) − G(n, k) gives G(n, b+1) − G(n,
/// a), provided that F and G are finite at every point passed; the terms by which the range of
/// S(n+i) differs from that of S(n) are added. Finite means here: in the limit along k for integer
/// n, which is how the values of the summand are meant. Whether a pole lies in the range is decided
/// for linear denominators and factorial arguments; anything else is turned down.
final class BoundaryTerms {
  private final Variable n;
  private final Variable k;
  private final Form lower;
  private final Form upper;
  private final RangeCheck range;

  private BoundaryTerms(Variable n, Variable k, Form lower, Form upper, RangeCheck range) {
    this.n = n;
    this.k = k;
    this.lower = lower;
    this.upper = upper;
    this.range = range;
  }

  /// The recurrence for n from `first` on or later; nothing where finiteness is not established.
  static Optional<SumRecurrence> recurrence(
      Form summand,
      Telescoper telescoper,
      Variable n,
      Variable k,
      Form lower,
      Form upper,
      BigInteger first) {
    Optional<RangeCheck> range = RangeCheck.of(n, k, lower, upper, first);
    try {
      return range.flatMap(
          check -> new BoundaryTerms(n, k, lower, upper, check).assembled(summand, telescoper));
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  private Optional<SumRecurrence> assembled(Form summand, Telescoper telescoper) {
    Form anti = telescoper.certificate().times(summand);
    List<Form> coefficients = telescoper.coefficients();
    if (!range.isFinite(anti)) {
      return Optional.empty();
    }
    for (int i = 0; i < coefficients.size(); i++) {
      if (!range.isFinite(summand.substitute(n, Form.of(n).plus(Form.of(i))))) {
        return Optional.empty();
      }
    }
    Form right = ends(summand, anti, coefficients);
    for (int i = 0; i < coefficients.size(); i++) {
      right = right.plus(coefficients.get(i).times(difference(summand, i)));
    }
    range.settleAtRoots(coefficients.getLast());
    range.settleAtRoots(Form.of(right.denominator()));
    right = settled(right);
    return Optional.of(new SumRecurrence(n, coefficients, right, range.from(), telescoper));
  }

  /// G(n, b+1) − G(n, a); where G has a pole at b + 1, G(n, b) − G(n, a) and the telescoped terms
  /// at b apart.
  private Form ends(Form summand, Form anti, List<Form> coefficients) {
    Form low = anti.substitute(k, lower);
    try {
      return anti.substitute(k, upper.plus(Form.ONE)).minus(low);
    } catch (Refusal _) {
      Form last = anti.substitute(k, upper).minus(low);
      for (int i = 0; i < coefficients.size(); i++) {
        last = last.plus(coefficients.get(i).times(at(summand, i, upper)));
      }
      return last;
    }
  }

  /// F(n + i, point).
  private Form at(Form summand, int i, Form point) {
    return summand.substitute(Map.of(n, Form.of(n).plus(Form.of(i)), k, point));
  }

  /// Σ over the range of S(n+i) less Σ over the range of S(n), of F(n+i, k).
  private Form difference(Form summand, int i) {
    Form sum = Form.ZERO;
    int more = shift(range.upperLine(), i);
    for (int j = 1; j <= more; j++) {
      sum = sum.plus(at(summand, i, upper.plus(Form.of(j))));
    }
    for (int j = 0; j > more; j--) {
      sum = sum.minus(at(summand, i, upper.plus(Form.of(j))));
    }
    int later = shift(range.lowerLine(), i);
    for (int j = 0; j < later; j++) {
      sum = sum.minus(at(summand, i, lower.plus(Form.of(j))));
    }
    for (int j = -1; j >= later; j--) {
      sum = sum.plus(at(summand, i, lower.plus(Form.of(j))));
    }
    return sum;
  }

  private static int shift(Line line, int i) {
    return line.slope().times(Rational.of(i)).intValueExact();
  }

  /// The right side for n ≥ from, after that has been raised to where each factorial in it has
  /// settled: a reciprocal factorial of a negative integer is 0.
  private Form settled(Form right) {
    Form value = right;
    for (Generator g : right.generators()) {
      if (g instanceof Harmonic harmonic) {
        settleHarmonic(harmonic);
      } else if (g instanceof Factorial factorial) {
        Optional<Line> line =
            Line.of(factorial.argument(), n)
                .map(l -> new Line(l.slope(), l.start().plus(Rational.ONE)));
        if (line.isPresent() && !line.get().slope().isZero()) {
          line.get().settledFrom().ifPresent(range::raise);
          boolean vanishes =
              line.get().slope().isInteger()
                  && line.get().start().isInteger()
                  && line.get().signAtInfinity() < 0;
          if (vanishes && right.numerator().contains(g)) {
            throw new Refusal(Reason.POLE, right);
          }
          value = vanishes ? Form.ZERO : value;
        }
      }
    }
    return value;
  }

  /// Raises n to where the argument of a harmonic number is no negative integer.
  private void settleHarmonic(Harmonic harmonic) {
    Optional<Line> line = Line.of(harmonic.argument(), n);
    if (line.isPresent() && !line.get().slope().isZero()) {
      if (line.get().signAtInfinity() < 0) {
        throw new Refusal(Reason.POLE, Form.of(harmonic));
      }
      new Line(line.get().slope(), line.get().start().plus(Rational.ONE))
          .settledFrom()
          .ifPresent(range::raise);
    }
  }
}
