package gnomon.summation;

import gnomon.form.Base;
import gnomon.form.Exponential;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import gnomon.recurrence.ShiftFactors;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// A summand as Σ t·p: hypergeometric terms t, each times a polynomial p in harmonic numbers with
/// rational functions of x as coefficients.
///
/// @param steps the harmonic numbers h of the summand with h(x+1) − h(x), a rational function
/// @param parts the terms with their polynomials
record HarmonicSummand(Map<Generator, Form> steps, List<Part> parts) {

  /// term·polynomial; `ratio` is term(x+1)/term(x), rational in x.
  record Part(Form term, Form ratio, HarmonicPolynomial polynomial) {}

  /// The summand in this shape, or nothing where it is none of this kind.
  static Optional<HarmonicSummand> of(Form f, Variable x) {
    Map<Generator, Form> steps = new TreeMap<>();
    List<Generator> powers = new ArrayList<>();
    for (Generator g : f.generators()) {
      if (g.equals(x) || !g.dependsOn(x)) {
        continue;
      }
      if (g instanceof Harmonic) {
        Form step = ShiftFactors.moved(Form.of(g), x, 1).minus(Form.of(g));
        if (!Structure.isRationalIn(step, x) || f.denominator().contains(g)) {
          return Optional.empty();
        }
        steps.put(g, step);
      } else if (isPower(g)) {
        powers.add(g);
      } else {
        return Optional.empty();
      }
    }
    return parts(f, x, steps, powers).map(parts -> new HarmonicSummand(steps, parts));
  }

  /// Whether the generator is a factorial or a power.
  static boolean isPower(Generator g) {
    return g instanceof Factorial
        || g instanceof Exponential power && !(power.base() instanceof Base.Zero);
  }

  private static Optional<List<Part>> parts(
      Form f, Variable x, Map<Generator, Form> steps, List<Generator> powers) {
    Monomial below = part(f.denominator().monomialContent(), powers);
    Form denominator = Form.of(f.denominator().times(below.power(Rational.MINUS_ONE)));
    if (!Structure.isRationalIn(denominator, x)) {
      return Optional.empty();
    }
    Map<Monomial, Map<Monomial, List<Term>>> groups = new LinkedHashMap<>();
    for (Term term : f.numerator().terms()) {
      Monomial kernel = part(term.monomial(), powers);
      Monomial harmonic = part(term.monomial(), steps.keySet());
      if (!harmonic.isNatural()) {
        return Optional.empty();
      }
      groups
          .computeIfAbsent(kernel.dividedBy(below), _ -> new TreeMap<>())
          .computeIfAbsent(harmonic, _ -> new ArrayList<>())
          .add(new Term(term.monomial().dividedBy(kernel).dividedBy(harmonic), term.coefficient()));
    }
    List<Part> parts = new ArrayList<>();
    for (var group : groups.entrySet()) {
      Form term = Form.of(Polynomial.of(group.getKey(), Rational.ONE));
      Form ratio = ShiftFactors.moved(term, x, 1).dividedBy(term);
      if (!Structure.isRationalIn(ratio, x)) {
        return Optional.empty();
      }
      Map<Monomial, Form> coefficients = new TreeMap<>();
      group
          .getValue()
          .forEach(
              (monomial, terms) ->
                  coefficients.put(
                      monomial, Form.of(Polynomial.ofTerms(terms)).dividedBy(denominator)));
      parts.add(new Part(term, ratio, new HarmonicPolynomial(coefficients)));
    }
    return Optional.of(parts);
  }

  /// The part of a monomial in the given generators.
  private static Monomial part(Monomial monomial, Iterable<Generator> generators) {
    Monomial part = Monomial.ONE;
    for (Generator g : generators) {
      if (monomial.contains(g)) {
        part = part.times(Monomial.of(g, monomial.exponent(g)));
      }
    }
    return part;
  }
}
