package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/// Whether forms in k and n are finite at every integer k of a range whose ends are integer-linear
/// in n, for every integer n from some point on.
///
/// Finite means a finite value in the limit along k with n held, which is how the values of a
/// summand are meant. Roots of linear denominators and arguments of factorials and harmonic numbers
/// are compared with the ends; a root or argument with a further parameter is generic. What is not
/// decided counts as not finite.
final class RangeCheck {
  private final Variable n;
  private final Variable k;
  private final Form lower;
  private final Form upper;
  private final Line lowerLine;
  private final Line upperLine;
  private BigInteger from;
  private Optional<Form> pole = Optional.empty();

  private RangeCheck(
      Variable n, Variable k, Form lower, Form upper, Line low, Line high, BigInteger first) {
    this.n = n;
    this.k = k;
    this.lower = lower;
    this.upper = upper;
    this.lowerLine = low;
    this.upperLine = high;
    this.from = first;
  }

  /// A check for n ≥ first, or nothing where the ends are not integer-linear in n.
  static Optional<RangeCheck> of(Variable n, Variable k, Form lower, Form upper, BigInteger first) {
    Optional<Line> low = Line.of(lower, n).filter(Line::isIntegral);
    Optional<Line> high = Line.of(upper, n).filter(Line::isIntegral);
    return low.isEmpty() || high.isEmpty()
        ? Optional.empty()
        : Optional.of(new RangeCheck(n, k, lower, upper, low.get(), high.get(), first));
  }

  /// The first n for which everything asked so far holds.
  BigInteger from() {
    return from;
  }

  Line lowerLine() {
    return lowerLine;
  }

  Line upperLine() {
    return upperLine;
  }

  /// A root of the denominator inside the range at which the last form asked about has no value.
  Optional<Form> pole() {
    return pole;
  }

  /// Whether the form has a finite value in the limit along k at every k from a(n) to b(n), for
  /// every n from some point on, to which `from` is raised.
  boolean isFinite(Form form) {
    pole = Optional.empty();
    for (var factor : Structure.factored(Form.of(form.denominator())).factors()) {
      boolean kernel =
          factor.base().asGenerator().filter(g -> !(g instanceof Variable)).isPresent();
      if (!factor.base().dependsOn(k)) {
        settleAtRoots(factor.base());
      } else if (!kernel && !avoids(form, factor.base())) {
        return false;
      }
    }
    for (Generator g : form.generators()) {
      boolean above = form.numerator().contains(g);
      if (g instanceof Factorial factorial && above && !isNatural(factorial.argument())
          || g instanceof Harmonic harmonic && !isNatural(harmonic.argument())) {
        return false;
      }
    }
    return true;
  }

  /// Whether the root in k of a linear denominator lies outside the range, or is no pole because a
  /// reciprocal factorial vanishes there.
  private boolean avoids(Form form, Form base) {
    Optional<List<Form>> linear = Structure.asPolynomial(base, k);
    if (linear.isEmpty() || linear.get().size() != 2) {
      return false;
    }
    Form root = linear.get().getFirst().dividedBy(linear.get().getLast()).negated();
    Optional<Line> line = Line.of(root, n);
    if (line.isEmpty()) {
      // a root with a parameter is generic, and no integer
      return root.variables().stream().anyMatch(v -> !v.equals(n));
    }
    if (line.get().slope().isInteger() && !line.get().start().isInteger()) {
      return true;
    }
    if (isPositive(lowerLine.minus(line.get())) || isPositive(line.get().minus(upperLine))) {
      return true;
    }
    try {
      form.substitute(k, root);
      return true;
    } catch (Refusal _) {
      pole = line.get().isIntegral() ? Optional.of(root) : Optional.empty();
      return false;
    }
  }

  /// Whether the argument of a factorial is at least 0 at both ends of the range, and so between
  /// them, or never an integer; an argument with a parameter is generic.
  private boolean isNatural(Form argument) {
    if (argument.variables().stream().anyMatch(v -> !v.equals(n) && !v.equals(k))
        || isFractional(argument)) {
      return true;
    }
    for (Form end : List.of(lower, upper)) {
      Optional<Line> line = Line.of(argument.substitute(k, end), n);
      if (line.isEmpty()
          || !isPositive(new Line(line.get().slope(), line.get().start().plus(Rational.ONE)))) {
        return false;
      }
    }
    return true;
  }

  /// Whether the argument is a fraction more than an integer combination of k and n.
  private boolean isFractional(Form argument) {
    Optional<Line> start = Line.of(argument.substitute(k, Form.ZERO), n);
    Optional<Rational> slope =
        argument.substitute(k, Form.of(k).plus(Form.ONE)).minus(argument).asRational();
    return start.isPresent()
        && slope.isPresent()
        && slope.get().isInteger()
        && start.get().slope().isInteger()
        && !start.get().start().isInteger();
  }

  /// Whether the function is positive for all large n; raises `from` to where that begins.
  private boolean isPositive(Line line) {
    if (line.signAtInfinity() <= 0) {
      return false;
    }
    line.settledFrom().ifPresent(this::raise);
    return true;
  }

  void raise(BigInteger value) {
    from = from.max(value);
  }

  /// Raises `from` above the integer roots of a polynomial in n.
  void settleAtRoots(Form polynomial) {
    for (var factor : Structure.factored(polynomial).factors()) {
      Line.of(factor.base(), n)
          .filter(line -> !line.slope().isZero())
          .flatMap(Line::settledFrom)
          .ifPresent(this::raise);
    }
  }

  /// Raises the first n above the roots of denominators and to where the factorials of a form in n
  /// alone have natural arguments.
  void settle(Form form) {
    settleAtRoots(Form.of(form.denominator()));
    for (Generator g : form.generators()) {
      if (g instanceof Factorial factorial) {
        Line.of(factorial.argument(), n)
            .map(line -> new Line(line.slope(), line.start().plus(Rational.ONE)))
            .flatMap(Line::settledFrom)
            .ifPresent(this::raise);
      }
    }
  }
}
