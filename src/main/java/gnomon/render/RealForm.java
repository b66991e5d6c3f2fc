package gnomon.render;

import gnomon.form.AngleConstant;
import gnomon.form.Base;
import gnomon.form.Constant;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/// Writes exponentials of imaginary multiples, where they occur in conjugate pairs, as sines,
/// cosines and tangents: c e^(iθ) + c̄ e^(−iθ) = 2 Re c cos θ − 2 Im c sin θ.
///
/// Parameters and variables are taken to be real for this purpose; that is a choice of notation and
/// changes no value, since sin and cos are defined by these very exponentials.
final class RealForm {
  private final Lexicon lexicon;
  private final FormNotation forms;
  private final Map<String, Form> angles = new LinkedHashMap<>();

  private RealForm(Lexicon lexicon, FormNotation forms) {
    this.lexicon = lexicon;
    this.forms = forms;
  }

  /// The form with stand-ins for the sines, cosines and tangents found, or the form itself where it
  /// is neither real nor i times a real one.
  static Form of(Form form, Lexicon lexicon, FormNotation forms) {
    boolean turning = form.generators().stream().anyMatch(g -> angle(g).isPresent());
    if (!turning) {
      return form;
    }
    return new RealForm(lexicon, forms).rewrite(form).orElse(form);
  }

  /// θ where the generator is e^(iθ).
  private static Optional<Form> angle(Indeterminate generator) {
    if (!(generator instanceof Exponential(Base base, Form unit)) || unit.isOne()) {
      return Optional.empty();
    }
    return switch (base) {
      case Base.Turn _ -> Optional.of(unit.times(Form.PI));
      case Base.GaussianAngle(BigInteger re, BigInteger im) ->
          Optional.of(unit.times(Form.of(new AngleConstant(re, im))));
      case Base.Natural _ ->
          Optional.of(unit.dividedBy(Form.I)).filter(_ -> unit.generators().contains(Constant.I));
      case Base.Prime _, Base.Zero _, Base.Of _ -> Optional.empty();
    };
  }

  private Optional<Form> rewrite(Form form) {
    Polynomial numerator = form.numerator();
    Polynomial denominator = form.denominator();
    Monomial centre = centre(denominator);
    denominator = denominator.times(centre);
    numerator = numerator.times(centre);
    Polynomial mirrored = conjugate(denominator);
    if (mirrored.equals(denominator.negated())) {
      denominator = timesI(denominator);
      numerator = timesI(numerator);
    } else if (!mirrored.equals(denominator)) {
      return Optional.empty();
    }
    Polynomial image = conjugate(numerator);
    boolean real = image.equals(numerator);
    if (!real && !image.equals(numerator.negated())) {
      return Optional.empty();
    }
    Optional<Form> above = written(real ? numerator : timesI(numerator).negated());
    Optional<Form> below = written(denominator);
    if (above.isEmpty() || below.isEmpty()) {
      return Optional.empty();
    }
    Form quotient = tangents(above.get().dividedBy(below.get()));
    return Optional.of(real ? quotient : quotient.times(Form.I));
  }

  private static Polynomial timesI(Polynomial polynomial) {
    Polynomial sum = Polynomial.ZERO;
    Monomial i = Monomial.of(Constant.I, Rational.ONE);
    for (Term term : polynomial.terms()) {
      boolean hasI = term.monomial().contains(Constant.I);
      Monomial monomial = hasI ? term.monomial().without(Constant.I) : term.monomial().times(i);
      Rational number = hasI ? term.coefficient().negated() : term.coefficient();
      sum = sum.plus(Polynomial.of(monomial, number));
    }
    return sum;
  }

  /// The monomial that makes the exponents of each turning kernel symmetric about 0.
  private static Monomial centre(Polynomial polynomial) {
    Monomial centre = Monomial.ONE;
    for (Indeterminate generator : polynomial.indeterminates()) {
      if (angle(generator).isPresent()) {
        var exponents = polynomial.coefficients(generator);
        Rational middle = exponents.firstKey().plus(exponents.lastKey()).times(Rational.HALF);
        if (!middle.isZero()) {
          centre = centre.times(Monomial.of(generator, middle.negated()));
        }
      }
    }
    return centre;
  }

  private static Polynomial conjugate(Polynomial polynomial) {
    Polynomial sum = Polynomial.ZERO;
    for (Term term : polynomial.terms()) {
      Monomial mirrored = Monomial.ONE;
      Rational sign = Rational.ONE;
      for (Monomial.Power power : term.monomial().factors()) {
        boolean turning = angle(power.indeterminate()).isPresent();
        Rational exponent = turning ? power.exponent().negated() : power.exponent();
        mirrored = mirrored.times(Monomial.of(power.indeterminate(), exponent));
        if (power.indeterminate() == Constant.I) {
          sign = sign.negated();
        }
      }
      sum = sum.plus(Polynomial.of(mirrored, term.coefficient().times(sign)));
    }
    return sum;
  }

  /// The real form over sines and cosines; empty where some part has a hidden imaginary unit.
  private Optional<Form> written(Polynomial real) {
    Map<Monomial, Polynomial> pairs = new LinkedHashMap<>();
    for (Term term : real.terms()) {
      Monomial turning = turning(term.monomial());
      Polynomial rest = Polynomial.of(term.monomial().dividedBy(turning), term.coefficient());
      pairs.merge(turning, rest, Polynomial::plus);
    }
    Form sum = Form.ZERO;
    for (Map.Entry<Monomial, Polynomial> pair : pairs.entrySet()) {
      sum = sum.plus(realPart(pair.getKey(), pair.getValue()));
    }
    return sum.generators().contains(Constant.I) ? Optional.empty() : Optional.of(sum);
  }

  private static Monomial turning(Monomial monomial) {
    Monomial part = Monomial.ONE;
    for (Monomial.Power power : monomial.factors()) {
      if (angle(power.indeterminate()).isPresent()) {
        part = part.times(Monomial.of(power.indeterminate(), power.exponent()));
      }
    }
    return part;
  }

  /// The real part of coefficient · e^(iθ); the two members of a pair together give all of it.
  private Form realPart(Monomial turning, Polynomial coefficient) {
    if (turning.isOne()) {
      return Form.of(coefficient);
    }
    Form theta = Form.ZERO;
    for (Monomial.Power power : turning.factors()) {
      theta = theta.plus(angle(power.indeterminate()).orElseThrow().times(power.exponent()));
    }
    boolean flipped = forms.compact(theta) instanceof Notation.Minus || startsNegative(theta);
    Form angle = flipped ? theta.negated() : theta;
    angles.put(angle.key(), angle);
    Polynomial imaginary = Polynomial.ZERO;
    Polynomial plain = Polynomial.ZERO;
    for (Term term : coefficient.terms()) {
      boolean hasI = term.monomial().contains(Constant.I);
      Polynomial part = Polynomial.of(term.monomial().without(Constant.I), term.coefficient());
      imaginary = hasI ? imaginary.plus(part) : imaginary;
      plain = hasI ? plain : plain.plus(part);
    }
    Form sine = Form.of(imaginary).times(function("sin", angle));
    return Form.of(plain).times(function("cos", angle)).plus(flipped ? sine : sine.negated());
  }

  private boolean startsNegative(Form theta) {
    return new WritingOrder(lexicon).startsNegative(theta.numerator());
  }

  private Form function(String name, Form angle) {
    Notation notation = KernelNotation.call(name, forms.compact(angle));
    return lexicon.standIn(name + "(" + angle.key() + ")", notation, Lexicon.Role.KERNEL);
  }

  /// sin θ/cos θ as a monomial factor becomes tan θ.
  private Form tangents(Form quotient) {
    Form result = quotient;
    for (Form angle : angles.values()) {
      Generator sine = function("sin", angle).asGenerator().orElseThrow();
      Generator cosine = function("cos", angle).asGenerator().orElseThrow();
      Rational above = result.numerator().monomialContent().exponent(sine);
      Rational below = result.denominator().monomialContent().exponent(cosine);
      boolean otherwise =
          result.numerator().contains(cosine) || result.denominator().contains(sine);
      if (above.sign() > 0 && above.equals(below) && !otherwise) {
        Form ratio = Form.of(cosine).dividedBy(Form.of(sine));
        result =
            result
                .times(ratio.power(above.intValueExact()))
                .times(function("tan", angle).power(above.intValueExact()));
      }
    }
    return result;
  }
}
