package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Solves f(s) = t for s in closed form, where f depends on s through one kernel at a time.
///
/// The one generator K of f that contains s satisfies a polynomial equation in a fractional power z
/// of K; degree 1, degree 2 and pure powers are solved, with the branch that fits s = 0 at t = 0,
/// and then K itself is solved for s. The result is checked by putting it in.
final class CompositionalInverse {
  private final Generator s;

  private CompositionalInverse(Generator s) {
    this.s = s;
  }

  static Optional<Form> of(Form form, Generator t) {
    try {
      for (Form candidate : new CompositionalInverse(t).solve(form, Form.of(t))) {
        if (fits(form, t, candidate)) {
          return Optional.of(candidate);
        }
      }
      return Optional.empty();
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  private static boolean fits(Form form, Generator t, Form candidate) {
    try {
      return form.substitute(t, candidate).equals(Form.of(t));
    } catch (Refusal _) {
      return false;
    }
  }

  /// The candidates for s in left(s) = right, with right free of the unknown s but written in the
  /// same generator, which now stands for t.
  private List<Form> solve(Form left, Form right) {
    List<Generator> holding = new ArrayList<>();
    for (Generator g : left.generators()) {
      if (g.dependsOn(s)) {
        holding.add(g);
      }
    }
    if (holding.size() != 1) {
      return List.of();
    }
    Generator kernel = holding.getFirst();
    int m = period(kernel, left);
    List<Form> top = coefficients(left.numerator(), kernel, m);
    List<Form> bottom = coefficients(left.denominator(), kernel, m);
    List<Form> equation = new ArrayList<>();
    for (int j = 0; j < Math.max(top.size(), bottom.size()); j++) {
      Form a = j < top.size() ? top.get(j) : Form.ZERO;
      Form b = j < bottom.size() ? bottom.get(j) : Form.ZERO;
      equation.add(a.minus(right.times(b)));
    }
    List<Form> found = new ArrayList<>();
    Form start = Form.of(kernel, Rational.of(1, m)).substitute(s, Form.ZERO);
    for (Form z : roots(new Univariate(equation), start)) {
      found.addAll(unpeel(kernel, z, m));
    }
    return found;
  }

  private static int period(Generator kernel, Form form) {
    int common = 1;
    for (Polynomial side : List.of(form.numerator(), form.denominator())) {
      for (Rational exponent : side.coefficients(kernel).keySet()) {
        int d = Rational.of(exponent.denominator()).intValueExact();
        common = common / gcd(common, d) * d;
      }
    }
    return common;
  }

  private static int gcd(int a, int b) {
    return b == 0 ? a : gcd(b, a % b);
  }

  private static List<Form> coefficients(Polynomial polynomial, Generator kernel, int m) {
    List<Form> list = new ArrayList<>();
    for (Map.Entry<Rational, Polynomial> part : polynomial.coefficients(kernel).entrySet()) {
      int index = part.getKey().times(Rational.of(m)).intValueExact();
      while (list.size() <= index) {
        list.add(Form.ZERO);
      }
      list.set(index, Form.of(part.getValue()));
    }
    return list;
  }

  /// The roots in closed form that have the given value at t = 0.
  private List<Form> roots(Univariate equation, Form start) {
    int degree = equation.degree();
    if (degree < 1) {
      return List.of();
    }
    if (degree == 1) {
      return List.of(equation.coefficient(0).dividedBy(equation.leading()).negated());
    }
    if (degree == 2) {
      return quadratic(equation, start);
    }
    for (int j = 1; j < degree; j++) {
      if (!equation.coefficient(j).isZero()) {
        return List.of();
      }
    }
    Form pure = equation.coefficient(0).dividedBy(equation.leading()).negated();
    return List.of(Elementary.power(pure, Form.of(Rational.of(1, degree))));
  }

  /// The root of a z² + b z + c that has the given value at t = 0; where a vanishes there, the one
  /// of the two roots that stays finite, which tends to −c/b.
  private List<Form> quadratic(Univariate equation, Form start) {
    Form a = equation.leading();
    Form b = equation.coefficient(1);
    Form c = equation.coefficient(0);
    Form root = Elementary.sqrt(b.times(b).minus(a.times(c).times(Form.of(4))));
    Form scale = a.times(Form.TWO);
    Form plus = root.minus(b).dividedBy(scale);
    Form minus = root.plus(b).negated().dividedBy(scale);
    if (a.substitute(s, Form.ZERO).isZero()) {
      Form slope = b.substitute(s, Form.ZERO);
      Form limit = c.substitute(s, Form.ZERO).dividedBy(slope).negated();
      if (!limit.equals(start)) {
        return List.of();
      }
      return List.of(root.substitute(s, Form.ZERO).equals(slope) ? plus : minus);
    }
    List<Form> fitting = new ArrayList<>();
    for (Form z : List.of(plus, minus)) {
      if (z.substitute(s, Form.ZERO).equals(start)) {
        fitting.add(z);
      }
    }
    return fitting.size() == 1 ? fitting : List.of();
  }

  /// The candidates for s where the kernel is z^m.
  private List<Form> unpeel(Generator kernel, Form z, int m) {
    return switch (kernel) {
      case Variable _, Dual _ -> List.of(z.power(m));
      case Exponential power -> {
        if (power.base() instanceof Base.Of(Form base) && base.dependsOn(s)) {
          yield power.unit().isOne() ? solve(base, z.power(m)) : List.of();
        }
        Form logarithm = Elementary.ln(z).times(Form.of(m)).dividedBy(power.base().logarithm());
        yield solve(power.unit(), logarithm);
      }
      case Logarithm log -> solve(log.argument(), Elementary.exp(z.power(m)));
      case Arc arc ->
          arc.kind() == Arc.Kind.ARCTAN
              ? solve(arc.argument(), Elementary.tan(z.power(m)))
              : solve(arc.argument(), Elementary.sin(z.power(m)));
      case InverseSeries series ->
          series.of().dependsOn(s) && !series.in().equals(s)
              ? List.of()
              : solve(series.argument(), series.of().substitute(series.in(), z.power(m)));
      case Constant _,
          AngleConstant _,
          Factorial _,
          Harmonic _,
          Unknown _,
          Accumulation _,
          CoefficientSeries _,
          Moment _ ->
          throw new Refusal(Reason.NO_CLOSED_FORM, Form.of(kernel));
    };
  }
}
