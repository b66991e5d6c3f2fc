package gnomon.render;

import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.number.Rational;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.List;

/// Fractions of polynomials, with or without kernels beside them, as notation.
final class FractionNotation {
  private static final int LARGEST_FACTORED = 60;

  private final Lexicon lexicon;
  private final WritingOrder order;
  private final KernelNotation kernels;

  FractionNotation(Lexicon lexicon, WritingOrder order, KernelNotation kernels) {
    this.lexicon = lexicon;
    this.order = order;
    this.kernels = kernels;
  }

  /// The terms for coefficient · kernel: the coefficient's own terms where there is no kernel and
  /// no denominator, otherwise one term.
  List<Notation> group(Form coefficient, Monomial kernel, boolean compact) {
    FactorialNotation.Rewritten rewritten =
        FactorialNotation.rewrite(coefficient, kernel, lexicon, kernels);
    Form fraction = rewritten.coefficient();
    Polynomial over = fraction.numerator();
    boolean plain = fraction.isPolynomial() && rewritten.kernel().isOne();
    if (plain) {
      return terms(over, compact);
    }
    FactorNotation factors = new FactorNotation(lexicon, kernels);
    addPowers(factors, rewritten.kernel());
    return List.of(term(fraction, factors, compact));
  }

  private Notation term(Form fraction, FactorNotation factors, boolean compact) {
    Rational number = content(fraction.numerator()).dividedBy(content(fraction.denominator()));
    addWhole(factors, primitive(fraction.numerator()), 1);
    if (fraction.denominator().size() > 1 || !fraction.denominator().isConstant()) {
      number = number.times(addFactored(factors, primitive(fraction.denominator()), -1, number));
    }
    return TermNotation.of(number, factors.over(), factors.under(), compact);
  }

  /// The terms of a polynomial, each as it is.
  private List<Notation> terms(Polynomial polynomial, boolean compact) {
    List<Notation> terms = new ArrayList<>();
    for (Term term : order.terms(polynomial)) {
      FactorNotation factors = new FactorNotation(lexicon, kernels);
      addPowers(factors, term.monomial());
      terms.add(TermNotation.of(term.coefficient(), factors.over(), factors.under(), compact));
    }
    return terms;
  }

  private Notation sum(Polynomial polynomial) {
    return inOrder(terms(polynomial, false));
  }

  /// The sum of the terms; of two the one without a minus sign first.
  static Notation inOrder(List<Notation> terms) {
    boolean swapped =
        terms.size() == 2
            && terms.getFirst() instanceof Notation.Minus
            && !(terms.getLast() instanceof Notation.Minus);
    return Notation.sum(swapped ? terms.reversed() : terms);
  }

  private void addPowers(FactorNotation factors, Monomial monomial) {
    for (Monomial.Power power : order.sideBySide(monomial)) {
      factors.add((Generator) power.indeterminate(), power.exponent());
    }
  }

  /// Adds a polynomial, as it stands, to the factors.
  private void addWhole(FactorNotation factors, Polynomial polynomial, int sign) {
    if (polynomial.size() == 1) {
      addPowers(factors, polynomial.terms().getFirst().monomial().power(Rational.of(sign)));
    } else {
      factors.addFactor(polynomial, sum(polynomial), sign);
    }
  }

  /// Adds the irreducible factors of a polynomial, and answers with the number left over; a number
  /// so far that is negative may have its sign taken into a denominator, as in 1/(1 - x).
  private Rational addFactored(
      FactorNotation factors, Polynomial polynomial, int sign, Rational soFar) {
    if (polynomial.size() == 1 || polynomial.size() > LARGEST_FACTORED) {
      addWhole(factors, polynomial, sign);
      return Rational.ONE;
    }
    return addFactors(factors, polynomial, sign, soFar);
  }

  private Rational addFactors(
      FactorNotation factors, Polynomial polynomial, int sign, Rational soFar) {
    var factorization = polynomial.factor();
    Rational unit = factorization.unit();
    List<Factor> primitives = new ArrayList<>();
    for (Factor factor : order.factors(factorization.factors())) {
      unit = unit.times(content(factor.base()).power(factor.multiplicity()));
      primitives.add(new Factor(primitive(factor.base()), factor.multiplicity()));
    }
    if (sign < 0 && soFar.times(unit).sign() < 0) {
      for (int at = 0; at < primitives.size(); at++) {
        Factor factor = primitives.get(at);
        if (factor.multiplicity() % 2 == 1 && isDifference(factor.base())) {
          primitives.set(at, new Factor(factor.base().negated(), factor.multiplicity()));
          unit = unit.negated();
          break;
        }
      }
    }
    primitives.forEach(
        factor -> addPrimitive(factors, factor.base(), sign * factor.multiplicity()));
    return unit.power(sign);
  }

  private void addPrimitive(FactorNotation factors, Polynomial base, int multiplicity) {
    if (base.size() == 1) {
      Monomial monomial = base.terms().getFirst().monomial();
      addPowers(factors, monomial.power(Rational.of(multiplicity)));
    } else {
      factors.addFactor(base, sum(base), multiplicity);
    }
  }

  /// Whether the polynomial is a term less a number.
  private boolean isDifference(Polynomial polynomial) {
    Term last = order.terms(polynomial).getLast();
    return polynomial.size() == 2 && last.monomial().isOne() && last.coefficient().sign() < 0;
  }

  /// The fraction with both parts factored.
  Notation factored(Form form) {
    FactorNotation factors = new FactorNotation(lexicon, kernels);
    Rational number = addFactors(factors, form.numerator(), 1, Rational.ONE);
    number = number.times(addFactors(factors, form.denominator(), -1, number));
    return TermNotation.of(number, factors.over(), factors.under(), false);
  }

  /// The fraction with both parts multiplied out.
  Notation expanded(Form form) {
    return fraction(form.numerator(), form.denominator(), false);
  }

  /// A fraction whose parts contain kernels; each part is written as a sum.
  Notation whole(Polynomial numerator, Polynomial denominator, boolean compact) {
    return fraction(numerator, denominator, compact);
  }

  private Notation fraction(Polynomial numerator, Polynomial denominator, boolean compact) {
    FactorNotation factors = new FactorNotation(lexicon, kernels);
    addWhole(factors, primitive(numerator), 1);
    addWhole(factors, primitive(denominator), -1);
    Rational number = content(numerator).dividedBy(content(denominator));
    return TermNotation.of(number, factors.over(), factors.under(), compact);
  }

  /// `numerator / base^power`.
  Notation piece(Form numerator, Form base, int power) {
    FactorNotation factors = new FactorNotation(lexicon, kernels);
    Polynomial over = numerator.numerator();
    Polynomial under = base.numerator();
    Rational number = content(over).dividedBy(content(under).power(power));
    addWhole(factors, primitive(over), 1);
    if (!numerator.denominator().isConstant()) {
      addWhole(factors, primitive(numerator.denominator()), -1);
    }
    number = number.dividedBy(content(numerator.denominator()));
    Polynomial primitive = primitive(under);
    if (primitive.size() == 1) {
      addWhole(factors, primitive.power(power), -1);
    } else {
      factors.addFactor(primitive, sum(primitive), -power);
    }
    return TermNotation.of(number, factors.over(), factors.under(), false);
  }

  /// The content with the sign of the first term written.
  private Rational content(Polynomial polynomial) {
    Rational content = polynomial.content().abs();
    return order.startsNegative(polynomial) ? content.negated() : content;
  }

  private Polynomial primitive(Polynomial polynomial) {
    return polynomial.times(content(polynomial).inverse());
  }
}
