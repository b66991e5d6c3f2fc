package gnomon.summation;

import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Elementary;
import gnomon.form.Factored;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Moment;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Moments;
import gnomon.polynomial.Monomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The exponential generating function Σ_m p(m + shift) d(m + shift) z^m/m! of what depends on a
/// natural number n: of sums of products of powers with exponent n, polynomials in n, moments
/// eval(L^n) of umbrae and sums Σ_k c(k) b(k)^n.
///
/// Since Σ_n b^n z^n/n! = e^(b z) and Σ_n n! b^n z^n/n! = 1/(1 − b z), a factor n is z d/dz, eval(c
/// L^n) has eval(c e^(L z)), and a sum is taken term by term. Two sequences are equal from `shift`
/// on exactly when their transforms are.
///
/// Source: Rota and Taylor, The classical umbral calculus, SIAM J. Math. Anal. 25 (1994).
///
/// @param series the generating function, a form in z
/// @param divisor the polynomial d in n by which the sequence was multiplied to clear denominators
/// @param conditions what sums taken inside ask for, z aside
public record ExponentialTransform(
    Form series, Variable z, int shift, Form divisor, List<Condition> conditions) {

  private static final int MOST_SHIFT = 4;
  private static final String NAMES = "zwuvyt";

  public ExponentialTransform {
    conditions = List.copyOf(conditions);
  }

  /// The transform of a form in n, where one of the first shifts makes all exponents natural.
  public static Optional<ExponentialTransform> of(
      Form sequence, Variable n, SummationEngine engine) {
    Variable z = free(sequence);
    for (int shift = 0; shift <= MOST_SHIFT; shift++) {
      try {
        Form moved = sequence.substitute(n, Form.of(n).plus(Form.of(shift)));
        Optional<ExponentialTransform> found = new Working(n, z, engine).transform(moved, shift);
        if (found.isPresent()) {
          return found;
        }
      } catch (Refusal _) {
        // a negative exponent: the next shift may cure it
      }
    }
    return Optional.empty();
  }

  /// The transform of the same sequence with 0 in place of its members with odd number.
  public ExponentialTransform half() {
    Form mirrored = series.substitute(z, Form.of(z).negated());
    Form part = shift % 2 == 0 ? series.plus(mirrored) : series.minus(mirrored);
    return new ExponentialTransform(part.times(Rational.HALF), z, shift, divisor, conditions);
  }

  private static Variable free(Form sequence) {
    for (int at = 0; at < NAMES.length(); at++) {
      Variable name = new Variable(NAMES.substring(at, at + 1));
      if (!sequence.dependsOn(name)) {
        return name;
      }
    }
    return new Variable("z'");
  }

  /// The work of one attempt.
  private static final class Working {
    private final Variable n;
    private final Form z;
    private final Variable name;
    private final SummationEngine engine;
    private final List<Condition> conditions = new ArrayList<>();

    Working(Variable n, Variable z, SummationEngine engine) {
      this.n = n;
      this.name = z;
      this.z = Form.of(z);
      this.engine = engine;
    }

    Optional<ExponentialTransform> transform(Form sequence, int shift) {
      Form divisor = Form.ONE;
      for (Factored.Factor f : Factored.of(Form.of(sequence.denominator())).factors()) {
        if (f.base().dependsOn(n) && Structure.asPolynomial(f.base(), n).isPresent()) {
          divisor = divisor.times(f.base().power(f.multiplicity()));
        }
      }
      List<Form> parts = new ArrayList<>();
      for (Form term : sequence.times(divisor).terms()) {
        Optional<Form> part = ofTerm(term);
        if (part.isEmpty()) {
          return Optional.empty();
        }
        parts.add(part.get());
      }
      Form unmoved = divisor.substitute(n, Form.of(n).minus(Form.of(shift)));
      return Optional.of(
          new ExponentialTransform(Form.sum(parts), name, shift, unmoved, conditions));
    }

    private Optional<Form> ofTerm(Form term) {
      Form constant = Form.of(term.numerator().leadingTerm().coefficient());
      Form base = Form.ONE;
      for (Factored.Factor factor : Factored.of(Form.of(term.denominator())).factors()) {
        Optional<Power> read = Power.of(factor.base().power(-factor.multiplicity()), n);
        if (read.isEmpty()) {
          return Optional.empty();
        }
        constant = constant.times(read.get().factor());
        base = base.times(read.get().base());
      }
      int degree = 0;
      boolean factorial = false;
      Optional<Generator> inside = Optional.empty();
      for (Monomial.Power power : term.numerator().leadingTerm().monomial().factors()) {
        Generator g = (Generator) power.indeterminate();
        Form factor = Form.of(g, power.exponent());
        if (!factor.dependsOn(n)) {
          constant = constant.times(factor);
        } else if (g.equals(n) && power.exponent().isInteger() && power.exponent().sign() > 0) {
          degree = power.exponent().intValueExact();
        } else if (g instanceof Factorial f
            && f.argument().equals(Form.of(n))
            && power.exponent().isOne()) {
          factorial = true;
        } else if (isInside(g) && power.exponent().isOne() && inside.isEmpty()) {
          inside = Optional.of(g);
        } else {
          Optional<Power> read = Power.of(factor, n);
          if (read.isEmpty()) {
            return Optional.empty();
          }
          constant = constant.times(read.get().factor());
          base = base.times(read.get().base());
        }
      }
      Form rate = base.times(z);
      if (factorial && inside.isPresent()) {
        return Optional.empty();
      }
      Form alone = factorial ? Form.ONE.minus(rate).inverse() : Elementary.exp(rate);
      Optional<Form> series = inside.isEmpty() ? Optional.of(alone) : inside(inside.get(), rate);
      if (series.isEmpty()) {
        return series;
      }
      Form image = series.get();
      for (int i = 0; i < degree; i++) {
        image = image.derivative(name).times(z);
      }
      return Optional.of(image.times(constant));
    }

    private boolean isInside(Generator g) {
      return g instanceof Moment
          || g instanceof Accumulation sum
              && sum.kind() == Accumulation.Kind.SUM
              && !sum.lower().dependsOn(n)
              && !sum.upper().dependsOn(n);
    }

    private Optional<Form> inside(Generator kernel, Form rate) {
      if (kernel instanceof Moment moment) {
        return Power.of(moment.body(), n)
            .map(power -> Moments.value(power.series(rate), moment.letters()))
            .filter(value -> value.generators().stream().noneMatch(Moment.class::isInstance));
      }
      Accumulation sum = (Accumulation) kernel;
      List<Form> terms = new ArrayList<>();
      for (Form term : sum.body().terms()) {
        Optional<Power> power = Power.of(term, n);
        if (power.isEmpty()) {
          return Optional.empty();
        }
        terms.add(power.get().series(rate));
      }
      DefiniteSum found =
          new DefiniteSums(engine).sum(Form.sum(terms), sum.bound(), sum.lower(), sum.upper());
      if (found.status() != DefiniteSum.Status.CLOSED_FORM
          && found.status() != DefiniteSum.Status.TERM_BY_TERM) {
        return Optional.empty();
      }
      found.conditions().stream()
          .filter(condition -> !condition.subject().dependsOn(name))
          .forEach(conditions::add);
      return Optional.of(found.value());
    }
  }

  /// factor · base^n.
  private record Power(Form factor, Form base) {
    static Optional<Power> of(Form form, Variable n) {
      Form ratio = form.substitute(n, Form.of(n).plus(Form.ONE)).dividedBy(form);
      return ratio.dependsOn(n)
          ? Optional.empty()
          : Optional.of(new Power(form.substitute(n, Form.ZERO), ratio));
    }

    Form series(Form rate) {
      return factor.times(Elementary.exp(base.times(rate)));
    }
  }
}
