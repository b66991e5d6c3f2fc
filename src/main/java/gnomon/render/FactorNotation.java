package gnomon.render;

import gnomon.form.Base;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Collects the factors of one term, above and below the fraction bar. Powers with the same base or
/// the same exponent are joined, so that (2^x)² is written 4^x and √2·√3 is written √6.
final class FactorNotation {
  private static final BigInteger LARGEST_JOINED_BASE = BigInteger.valueOf(1_000_000);

  /// The exponent (as key of its form) of some joined bases, with the bases multiplied out.
  private record Joint(Form exponent, Rational base) {}

  private final Lexicon lexicon;
  private final KernelNotation kernels;
  private final List<Notation> constants = new ArrayList<>();
  private final List<Notation> letters = new ArrayList<>();
  private final List<Notation> powers = new ArrayList<>();
  private final List<Notation> functions = new ArrayList<>();
  private final List<Notation> below = new ArrayList<>();
  private final Map<String, Joint> joints = new LinkedHashMap<>();
  private final Map<Notation, Form> shifts = new LinkedHashMap<>();
  private final Map<Variable, Form> variables = new LinkedHashMap<>();
  private Form natural = Form.ZERO;

  FactorNotation(Lexicon lexicon, KernelNotation kernels) {
    this.lexicon = lexicon;
    this.kernels = kernels;
  }

  /// Adds generator^exponent.
  void add(Generator generator, Rational exponent) {
    if (generator instanceof Exponential power) {
      addPower(power, exponent);
      return;
    }
    Optional<Lexicon.Shift> shift = lexicon.shift(generator);
    if (shift.isPresent()) {
      Form step = shift.get().step().times(exponent);
      shifts.merge(shift.get().letter(), step, Form::plus);
      return;
    }
    if (generator instanceof Variable v && !lexicon.stands(v, Lexicon.Role.KERNEL)) {
      variables.merge(v, Form.of(exponent), Form::plus);
      return;
    }
    Notation base = kernels.of(generator);
    if (exponent.sign() < 0) {
      below.add(raised(base, exponent.negated()));
    } else {
      place(generator).add(raised(base, exponent));
    }
  }

  /// Adds a polynomial factor already in notation.
  void addFactor(Notation base, int multiplicity) {
    if (multiplicity < 0) {
      below.add(raised(base, Rational.of(-multiplicity)));
    } else {
      letters.add(raised(base, Rational.of(multiplicity)));
    }
  }

  private List<Notation> place(Generator generator) {
    return switch (generator) {
      case gnomon.form.Constant _, gnomon.form.AngleConstant _ -> constants;
      case gnomon.form.Logarithm log when Form.of(log).isConstant() -> constants;
      case gnomon.form.Variable v when lexicon.stands(v, Lexicon.Role.KERNEL) -> functions;
      case gnomon.form.Variable _, gnomon.form.Dual _ -> letters;
      case Exponential _ -> powers;
      case gnomon.form.Logarithm _,
          gnomon.form.Arc _,
          gnomon.form.Factorial _,
          gnomon.form.Harmonic _,
          gnomon.form.Unknown _,
          gnomon.form.Accumulation _,
          gnomon.form.InverseSeries _ ->
          functions;
    };
  }

  private void addPower(Exponential power, Rational exponent) {
    switch (power.base()) {
      case Base.Natural _ -> natural = natural.plus(power.unit().times(exponent));
      case Base.Prime(BigInteger prime) -> join(prime, power.unit(), exponent);
      case Base.Turn _, Base.Zero _, Base.GaussianAngle _, Base.Of _ -> {
        Form base = power.base().value();
        Optional<Generator> generator = base.asGenerator();
        if (generator.isPresent() && generator.get() instanceof Variable v) {
          variables.merge(v, power.unit().times(exponent), Form::plus);
        } else if (power.unit().isOne() && exponent.sign() < 0) {
          below.add(raised(kernels.inner(base), exponent.negated()));
        } else if (power.unit().isOne()) {
          constantOr(base).add(raised(kernels.inner(base), exponent));
        } else {
          powers.add(power(kernels.inner(base), power.unit().times(exponent)));
        }
      }
    }
  }

  private List<Notation> constantOr(Form base) {
    return base.isConstant() ? constants : powers;
  }

  private void join(BigInteger prime, Form unit, Rational exponent) {
    Rational whole = Rational.ONE;
    Rational rest = exponent;
    if (exponent.isInteger() && exponent.fitsInt()) {
      Rational joined = Rational.of(prime).power(exponent.intValueExact());
      if (small(joined)) {
        whole = joined;
        rest = Rational.ONE;
      }
    }
    if (whole.isOne()) {
      whole = Rational.of(prime);
    }
    Form shared = unit.times(rest);
    Rational base = whole;
    joints.merge(
        shared.key(),
        new Joint(shared, base),
        (old, _) -> new Joint(shared, old.base().times(base)));
  }

  private static boolean small(Rational value) {
    return value.numerator().compareTo(LARGEST_JOINED_BASE) < 0
        && value.denominator().compareTo(LARGEST_JOINED_BASE) < 0;
  }

  /// The factors above the fraction bar, those of the polynomial given among them.
  List<Notation> over() {
    List<Notation> all = new ArrayList<>();
    List<Notation> exponentials = new ArrayList<>(powers);
    joints.values().forEach(joint -> addJoint(joint, all, exponentials));
    all.addAll(constants);
    if (!natural.isZero()) {
      (natural.isConstant() ? all : exponentials).add(exponential());
    }
    List<Notation> symbolic = new ArrayList<>();
    variables.forEach((v, exponent) -> addVariable(v, exponent, all, symbolic));
    exponentials.addAll(0, symbolic);
    shifts.forEach((letter, step) -> addShift(letter, step, exponentials));
    all.addAll(letters);
    all.addAll(exponentials);
    all.addAll(functions);
    return all;
  }

  /// The factors below the fraction bar.
  List<Notation> under() {
    List<Notation> all = new ArrayList<>();
    variables.forEach(
        (v, exponent) ->
            exponent
                .asRational()
                .filter(number -> number.sign() < 0)
                .ifPresent(number -> all.add(raised(kernels.of(v), number.negated()))));
    all.addAll(below);
    return all;
  }

  private void addVariable(
      Variable v, Form exponent, List<Notation> letters, List<Notation> symbolic) {
    Optional<Rational> number = exponent.asRational();
    if (number.isEmpty()) {
      symbolic.add(new Notation.Power(kernels.of(v), kernels.inner(exponent)));
    } else if (number.get().sign() > 0) {
      letters.add(raised(kernels.of(v), number.get()));
    }
  }

  private Notation exponential() {
    if (lexicon.hasLetters(natural)) {
      return KernelNotation.call("exp", kernels.inner(natural));
    }
    Notation e = Notation.name("e");
    return natural.isOne() ? e : power(e, natural);
  }

  private void addShift(Notation letter, Form step, List<Notation> exponentials) {
    if (!step.isZero()) {
      boolean root = step.asRational().filter(Rational.HALF::equals).isPresent();
      exponentials.add(
          root ? new Notation.Power(letter, kernels.inner(step)) : power(letter, step));
    }
  }

  private void addJoint(Joint joint, List<Notation> constant, List<Notation> varying) {
    Form exponent = joint.exponent();
    Rational base = joint.base();
    if (base.numerator().equals(BigInteger.ONE)) {
      base = base.inverse();
      exponent = exponent.negated();
    }
    Notation written =
        base.isInteger()
            ? new Notation.Numeral(base.numerator())
            : new Notation.Quotient(
                new Notation.Numeral(base.numerator()), new Notation.Numeral(base.denominator()));
    (exponent.isConstant() ? constant : varying).add(power(written, exponent));
  }

  private Notation power(Notation base, Form exponent) {
    if (exponent.asRational().isPresent()) {
      return raised(base, exponent.asRational().orElseThrow());
    }
    return new Notation.Power(base, kernels.inner(exponent));
  }

  /// The base with a rational exponent, a half being written as a root.
  static Notation raised(Notation base, Rational exponent) {
    if (exponent.isOne()) {
      return base;
    }
    if (exponent.equals(Rational.HALF)) {
      return new Notation.Root(base);
    }
    return new Notation.Power(base, TermNotation.of(exponent, List.of(), List.of(), true));
  }
}
