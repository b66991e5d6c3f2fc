package gnomon.render;

import gnomon.form.Base;
import gnomon.form.Constant;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// Rewrites exponentials e^(cD), D the stand-in for a derivation, as powers of E, Δ, ∇, δ or μ.
final class ShiftLetters {
  private final Lexicon lexicon;
  private final Variable derivation;
  private final Optional<Notation> subscript;

  ShiftLetters(Lexicon lexicon, Variable derivation, Optional<Notation> subscript) {
    this.lexicon = lexicon;
    this.derivation = derivation;
    this.subscript = subscript;
  }

  /// c where the generator is e^(cD).
  private Optional<Form> step(Generator generator) {
    if (!(generator instanceof Exponential(Base base, Form unit)) || !unit.dependsOn(derivation)) {
      return Optional.empty();
    }
    if (base instanceof Base.Of || base instanceof Base.Zero) {
      return Optional.empty();
    }
    Form step = unit.dividedBy(Form.of(derivation)).times(base.logarithm());
    boolean real = !step.generators().contains(Constant.I);
    return real && !step.dependsOn(derivation) ? Optional.of(step) : Optional.empty();
  }

  /// The form with e^(cD) as E^c.
  Form shifts(Form form) {
    Notation e = letter(Glyph.plain("E"));
    return mapped(form.numerator(), e).dividedBy(mapped(form.denominator(), e));
  }

  private Form mapped(Polynomial polynomial, Notation e) {
    List<Form> terms = new ArrayList<>();
    for (Term term : polynomial.terms()) {
      Form product = Form.of(term.coefficient());
      for (Monomial.Power power : term.monomial().factors()) {
        Generator generator = (Generator) power.indeterminate();
        Form image =
            step(generator)
                .map(c -> shift(e, c, power.exponent()))
                .orElseGet(() -> Form.of(generator, power.exponent()));
        product = product.times(image);
      }
      terms.add(product);
    }
    return Form.sum(terms);
  }

  private Form shift(Notation e, Form step, Rational exponent) {
    Optional<Rational> number = step.asRational();
    Form letter = lexicon.shift(e, number.isPresent() ? Form.ONE : step);
    Rational multiple = number.map(exponent::times).orElse(exponent);
    return Form.of(letter.asGenerator().orElseThrow(), multiple);
  }

  private Notation letter(Glyph glyph) {
    Notation name = new Notation.Name(glyph);
    return subscript.<Notation>map(index -> new Notation.Subscript(name, index)).orElse(name);
  }

  /// The spellings of the form in Δ, ∇, δ and μ, where all its shifts are multiples of one step.
  List<Form> differences(Form form) {
    List<Form> found = new ArrayList<>();
    Optional<Form> unit = commonUnit(form);
    if (unit.isEmpty()) {
      return found;
    }
    Form base = unit.get();
    TreeMap<Rational, Polynomial> over = byMultiple(form.numerator(), base);
    TreeMap<Rational, Polynomial> under = byMultiple(form.denominator(), base);
    Rational grid = grid(over, under);
    boolean numeric = base.isOne();
    List<Rational> steps = new ArrayList<>(List.of(grid));
    if (numeric && !grid.isOne() && grid.isInteger()) {
      steps.add(Rational.ONE);
    }
    for (Rational step : steps) {
      found.add(oneSided(over, under, step, base, true));
      found.add(oneSided(over, under, step, base, false));
    }
    new CentralSpelling(over, under)
        .spellings(grid, numeric)
        .forEach(spelling -> spelling.form(letters(spelling.step(), base)).ifPresent(found::add));
    return found;
  }

  private CentralSpelling.Letters letters(Rational step, Form base) {
    Form h = base.times(step);
    return new CentralSpelling.Letters(stepped(Glyph.DELTA_CENTRAL, h), stepped(Glyph.MU, h));
  }

  /// The form by y = 1 + Δ or y = 1/(1 − ∇), y the shift by one step.
  private Form oneSided(
      TreeMap<Rational, Polynomial> over,
      TreeMap<Rational, Polynomial> under,
      Rational step,
      Form base,
      boolean forward) {
    Form h = base.times(step);
    Form letter = stepped(forward ? Glyph.DELTA_FORWARD : Glyph.NABLA, h);
    Form shift = forward ? Form.ONE.plus(letter) : Form.ONE.minus(letter).inverse();
    return evaluated(over, shift, step).dividedBy(evaluated(under, shift, step));
  }

  private static Form evaluated(Map<Rational, Polynomial> parts, Form shift, Rational step) {
    List<Form> terms = new ArrayList<>();
    parts.forEach(
        (multiple, rest) ->
            terms.add(Form.of(rest).times(shift.power(multiple.dividedBy(step).intValueExact()))));
    return Form.sum(terms);
  }

  private Form stepped(Glyph glyph, Form step) {
    Notation name = letter(glyph);
    Notation notation =
        step.isOne()
            ? name
            : new Notation.Step(name, new FormNotation(lexicon.withoutRewriting()).compact(step));
    return lexicon.standIn(glyph.ascii() + subscript + step.key(), notation, Lexicon.Role.LETTER);
  }

  /// The one c such that all shifts are by rational multiples of c.
  private Optional<Form> commonUnit(Form form) {
    Form unit = null;
    for (Generator generator : form.generators()) {
      Optional<Form> step = step(generator);
      if (step.isEmpty() && generator.dependsOn(derivation) && !generator.equals(derivation)) {
        continue;
      }
      if (step.isPresent()) {
        Form its = step.get().asRational().isPresent() ? Form.ONE : step.get();
        if (unit != null && !its.equals(unit)) {
          return Optional.empty();
        }
        unit = its;
      }
    }
    return Optional.ofNullable(unit);
  }

  private TreeMap<Rational, Polynomial> byMultiple(Polynomial polynomial, Form unit) {
    TreeMap<Rational, Polynomial> parts = new TreeMap<>();
    for (Term term : polynomial.terms()) {
      Rational multiple = Rational.ZERO;
      Monomial rest = Monomial.ONE;
      for (Monomial.Power power : term.monomial().factors()) {
        Optional<Form> step = step((Generator) power.indeterminate());
        if (step.isPresent()) {
          Rational ratio = step.get().dividedBy(unit).asRational().orElseThrow();
          multiple = multiple.plus(ratio.times(power.exponent()));
        } else {
          rest = rest.times(Monomial.of(power.indeterminate(), power.exponent()));
        }
      }
      parts.merge(multiple, Polynomial.of(rest, term.coefficient()), Polynomial::plus);
    }
    return parts;
  }

  /// The largest step of which all multiples are whole multiples.
  private static Rational grid(Map<Rational, Polynomial> over, Map<Rational, Polynomial> under) {
    BigInteger numerators = BigInteger.ZERO;
    BigInteger denominators = BigInteger.ONE;
    List<Rational> all = new ArrayList<>(over.keySet());
    all.addAll(under.keySet());
    for (Rational multiple : all) {
      BigInteger d = multiple.denominator();
      denominators = denominators.multiply(d).divide(denominators.gcd(d));
    }
    for (Rational multiple : all) {
      Rational whole = multiple.times(Rational.of(denominators));
      numerators = numerators.gcd(whole.numerator());
    }
    return numerators.signum() == 0 ? Rational.ONE : Rational.of(numerators, denominators);
  }
}
