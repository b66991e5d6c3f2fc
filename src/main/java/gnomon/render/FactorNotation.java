package gnomon.render;

import gnomon.form.Base;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Collects the factors of one term, above and below the fraction bar. Powers with the same base or
/// the same exponent are joined, so that (2^x)² is written 4^x and √2·√3 is written √6.
final class FactorNotation {
  private final Lexicon lexicon;
  private final KernelNotation kernels;
  private final List<Notation> constants = new ArrayList<>();
  private final List<Notation> letters = new ArrayList<>();
  private final List<Notation> powers = new ArrayList<>();
  private final List<Notation> functions = new ArrayList<>();
  private final List<Notation> below = new ArrayList<>();
  private final List<Notation> operators = new ArrayList<>();
  private final JoinedPowers primes = new JoinedPowers();
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

  /// Adds a power of a polynomial, given with its notation.
  void addFactor(Polynomial polynomial, Notation base, int multiplicity) {
    if (multiplicity < 0) {
      below.add(raised(base, Rational.of(-multiplicity)));
    } else {
      boolean operator = lexicon.hasLetters(Form.of(polynomial));
      (operator ? operators : letters).add(raised(base, Rational.of(multiplicity)));
    }
  }

  private List<Notation> place(Generator generator) {
    if (lexicon.hasLetters(Form.of(generator))) {
      return operators;
    }
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
          gnomon.form.CoefficientSeries _,
          gnomon.form.InverseSeries _,
          gnomon.form.Moment _ ->
          functions;
    };
  }

  private void addPower(Exponential power, Rational exponent) {
    switch (power.base()) {
      case Base.Natural _ -> natural = natural.plus(power.unit().times(exponent));
      case Base.Prime(BigInteger prime) -> primes.add(prime, power.unit(), exponent);
      case Base.GaussianAngle(BigInteger re, BigInteger im) -> {
        Form base = Form.of(re).plus(Form.of(im).times(Form.I));
        BigInteger norm = re.multiply(re).add(im.multiply(im));
        addPower(base, power.unit(), exponent);
        primes.add(norm, power.unit(), exponent.times(Rational.HALF).negated());
      }
      case Base.Turn _, Base.Zero _, Base.Of _ ->
          addPower(power.base().value(), power.unit(), exponent);
    }
  }

  private void addPower(Form base, Form unit, Rational exponent) {
    Optional<Generator> generator = base.asGenerator();
    if (generator.isPresent() && generator.get() instanceof Variable v) {
      variables.merge(v, unit.times(exponent), Form::plus);
    } else if (unit.isOne() && exponent.sign() < 0) {
      below.add(raised(kernels.inner(base), exponent.negated()));
    } else if (unit.isOne()) {
      listFor(base, base.isConstant() ? constants : powers)
          .add(raised(kernels.inner(base), exponent));
    } else {
      Form whole = unit.times(exponent);
      listFor(base.plus(whole), powers).add(power(kernels.inner(base), whole));
    }
  }

  private List<Notation> listFor(Form form, List<Notation> otherwise) {
    return lexicon.hasLetters(form) ? operators : otherwise;
  }

  /// The factors above the fraction bar: constants, letters, powers, functions, and what acts as an
  /// operator last.
  List<Notation> over() {
    List<Notation> all = new ArrayList<>();
    List<Notation> exponentials = new ArrayList<>(powers);
    List<Notation> acting = new ArrayList<>();
    primes.forEach((base, exponent) -> addPrimes(base, exponent, all, exponentials));
    all.addAll(constants);
    if (!natural.isZero()) {
      List<Notation> place = natural.isConstant() ? all : exponentials;
      (lexicon.hasLetters(natural) ? operators : place).add(exponential());
    }
    List<Notation> symbolic = new ArrayList<>();
    variables.forEach(
        (v, exponent) ->
            addVariable(
                v, exponent, lexicon.stands(v, Lexicon.Role.LETTER) ? acting : all, symbolic));
    exponentials.addAll(0, symbolic);
    shifts.forEach((letter, step) -> addShift(letter, step, acting));
    all.addAll(letters);
    all.addAll(exponentials);
    all.addAll(functions);
    all.addAll(acting);
    all.addAll(operators);
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

  private void addPrimes(
      Rational base, Form exponent, List<Notation> constant, List<Notation> varying) {
    Notation over = new Notation.Numeral(base.numerator());
    Notation written =
        base.isInteger()
            ? over
            : new Notation.Quotient(over, new Notation.Numeral(base.denominator()));
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
