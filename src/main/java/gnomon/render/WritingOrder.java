package gnomon.render;

import gnomon.form.Constant;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.Comparator;
import java.util.List;

/// The order in which the terms of a polynomial, its factors, and the letters of a term are
/// written: descending in the main variable, letters by the alphabet with the main variable last.
final class WritingOrder {
  private static final String VARIABLES = "xyznmkjt";

  private final Lexicon lexicon;

  WritingOrder(Lexicon lexicon) {
    this.lexicon = lexicon;
  }

  /// The terms as they are written.
  List<Term> terms(Polynomial polynomial) {
    Generator main = main(polynomial);
    if (main == Constant.I && polynomial.indeterminates().size() == 1) {
      return polynomial.terms().stream().sorted(byDegree(main).reversed()).toList();
    }
    return polynomial.terms().stream().sorted(byDegree(main)).toList();
  }

  /// Whether the first term written has a minus sign.
  boolean startsNegative(Polynomial polynomial) {
    return terms(polynomial).getFirst().coefficient().sign() < 0;
  }

  /// The main variable where it occurs, otherwise the first variable of the alphabet.
  private Generator main(Polynomial polynomial) {
    Generator main = lexicon.main();
    if (polynomial.contains(main)) {
      return main;
    }
    return polynomial.indeterminates().stream()
        .map(Generator.class::cast)
        .min(this::compareLetters)
        .orElse(main);
  }

  private Comparator<Term> byDegree(Generator main) {
    return (a, b) -> {
      int byMain = b.monomial().exponent(main).compareTo(a.monomial().exponent(main));
      if (byMain != 0) {
        return byMain;
      }
      int byDegree = variableDegree(b.monomial()).compareTo(variableDegree(a.monomial()));
      return byDegree != 0 ? byDegree : compareMonomials(a.monomial(), b.monomial());
    };
  }

  private static Rational variableDegree(Monomial monomial) {
    Rational degree = Rational.ZERO;
    for (Monomial.Power power : monomial.factors()) {
      if (power.indeterminate() instanceof Variable) {
        degree = degree.plus(power.exponent());
      }
    }
    return degree;
  }

  /// Alphabetical: the monomial with the higher power of the earliest letter first.
  private int compareMonomials(Monomial first, Monomial second) {
    List<Monomial.Power> left = letters(first);
    List<Monomial.Power> right = letters(second);
    for (int at = 0; at < Math.min(left.size(), right.size()); at++) {
      Monomial.Power mine = left.get(at);
      Monomial.Power its = right.get(at);
      int order = compareLetters((Generator) mine.indeterminate(), (Generator) its.indeterminate());
      if (order != 0) {
        return order;
      }
      int degrees = its.exponent().compareTo(mine.exponent());
      if (degrees != 0) {
        return degrees;
      }
    }
    return Integer.compare(left.size(), right.size());
  }

  private List<Monomial.Power> letters(Monomial monomial) {
    return monomial.factors().stream()
        .sorted(
            (p, q) -> compareLetters((Generator) p.indeterminate(), (Generator) q.indeterminate()))
        .toList();
  }

  /// The powers of a monomial in the order in which they are written side by side.
  List<Monomial.Power> sideBySide(Monomial monomial) {
    return monomial.factors().stream()
        .sorted(
            (p, q) -> compareBeside((Generator) p.indeterminate(), (Generator) q.indeterminate()))
        .toList();
  }

  private int compareBeside(Generator first, Generator second) {
    boolean mine = first.equals(lexicon.main());
    boolean its = second.equals(lexicon.main());
    if (mine != its) {
      return Boolean.compare(mine, its);
    }
    boolean letters = first instanceof Variable && second instanceof Variable;
    return letters && place(first) == place(second)
        ? first.compareTo(second)
        : Integer.signum(compareLetters(first, second));
  }

  private int compareLetters(Generator first, Generator second) {
    int classes = Integer.compare(place(first), place(second));
    if (classes != 0) {
      return classes;
    }
    if (first instanceof Unknown f && second instanceof Unknown g && f.name().equals(g.name())) {
      return compareUnknowns(f, g);
    }
    if (first instanceof Variable v && second instanceof Variable w) {
      int order = Integer.compare(importance(v), importance(w));
      return order != 0 ? order : v.name().compareTo(w.name());
    }
    return first.compareTo(second);
  }

  /// The letters of variables before those of parameters.
  private static int importance(Variable v) {
    int at = v.name().length() == 1 ? VARIABLES.indexOf(v.name()) : -1;
    return at < 0 ? VARIABLES.length() : at;
  }

  /// Higher derivatives first, then larger arguments.
  private static int compareUnknowns(Unknown first, Unknown second) {
    int derivatives = Integer.compare(second.derivatives(), first.derivatives());
    if (derivatives != 0) {
      return derivatives;
    }
    Rational mine = constantTerm(first.argument());
    Rational its = constantTerm(second.argument());
    int rest =
        first
            .argument()
            .minus(Form.of(mine))
            .key()
            .compareTo(second.argument().minus(Form.of(its)).key());
    return rest != 0 ? rest : its.compareTo(mine);
  }

  private static Rational constantTerm(Form form) {
    if (!form.isPolynomial()) {
      return Rational.ZERO;
    }
    return form.numerator().terms().stream()
        .filter(term -> term.monomial().isOne())
        .map(Term::coefficient)
        .findFirst()
        .orElse(Rational.ZERO);
  }

  private static int place(Generator generator) {
    return switch (generator) {
      case Variable v when v.name().matches("C[0-9]+") -> 2;
      case Variable _ -> 0;
      case Constant _ -> 4;
      case gnomon.form.Dual _,
          gnomon.form.AngleConstant _,
          gnomon.form.Exponential _,
          gnomon.form.Logarithm _,
          gnomon.form.Arc _,
          gnomon.form.Factorial _,
          gnomon.form.Harmonic _,
          Unknown _,
          gnomon.form.Accumulation _,
          gnomon.form.CoefficientSeries _,
          gnomon.form.InverseSeries _,
          gnomon.form.Moment _ ->
          Form.of(generator).isConstant() ? 3 : 1;
    };
  }

  /// Groups by kernels: the group without a kernel last.
  int compareGroups(Monomial first, Monomial second) {
    if (first.isOne() || second.isOne()) {
      return Boolean.compare(first.isOne(), second.isOne());
    }
    return compareMonomials(first, second);
  }

  /// Short factors first, then by degree, then by their coefficients.
  List<Factor> factors(List<Factor> factors) {
    Comparator<Factor> bySize = Comparator.comparing(factor -> factor.base().size());
    return factors.stream()
        .sorted(
            bySize
                .thenComparing(
                    factor -> terms(factor.base()).getFirst(), byDegree(lexicon.main()).reversed())
                .thenComparing(factor -> terms(factor.base()).getFirst().coefficient().abs())
                .thenComparing(factor -> terms(factor.base()).getLast().coefficient().abs())
                .thenComparing(factor -> terms(factor.base()).getLast().coefficient()))
        .toList();
  }
}
