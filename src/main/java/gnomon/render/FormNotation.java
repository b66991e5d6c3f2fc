package gnomon.render;

import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Exact forms as notation, as on paper.
///
/// Polynomials descend in the main variable; terms with the same kernels are gathered, `(x^2 + 1)
/// 2^x`; denominators are factored; conjugate complex exponentials are written as sines and
/// cosines; quotients of factorials as binomial coefficients and factorial powers.
public final class FormNotation {
  private final Lexicon lexicon;
  private final WritingOrder order;
  private final KernelNotation kernels;
  private final FractionNotation fractions;

  FormNotation(Lexicon lexicon) {
    this.lexicon = lexicon;
    this.order = new WritingOrder(lexicon);
    this.kernels = new KernelNotation(this, lexicon);
    this.fractions = new FractionNotation(lexicon, order, kernels);
  }

  /// The writer for forms whose main variable is the given one.
  public static FormNotation in(Variable main) {
    return new FormNotation(new Lexicon(main));
  }

  /// The form as a sum of terms.
  public Notation of(Form form) {
    List<Variable> constants =
        form.variables().stream().filter(FormNotation::isUndetermined).toList();
    return constants.isEmpty() ? sum(form, false) : withConstants(form, constants);
  }

  /// Whether the variable is a constant that an inverse leaves open: C1, C2, ….
  private static boolean isUndetermined(Variable variable) {
    return variable.name().matches("C[0-9]+");
  }

  /// The form with its undetermined constants set apart, as an antiderivative is written.
  private Notation withConstants(Form form, List<Variable> constants) {
    Map<Generator, Form> none = new LinkedHashMap<>();
    constants.forEach(constant -> none.put(constant, Form.ZERO));
    List<Form> parts = new ArrayList<>();
    try {
      parts.add(form.substitute(none));
      for (Variable constant : constants.reversed()) {
        Form coefficient = form.derivative(constant);
        if (constants.stream().anyMatch(coefficient::dependsOn)) {
          return sum(form, false);
        }
        parts.add(coefficient.times(Form.of(constant)));
      }
    } catch (Refusal notLinear) {
      return sum(form, false);
    }
    List<Notation> terms = new ArrayList<>();
    for (Form part : parts) {
      if (!part.isZero()) {
        Notation notation = sum(part, false);
        terms.addAll(
            notation instanceof Notation.Sum(List<Notation> inner) ? inner : List.of(notation));
      }
    }
    return Notation.sum(terms);
  }

  /// The form as it stands in exponents and arguments, with `x/2` for half of x.
  Notation compact(Form form) {
    return sum(form, true);
  }

  /// The form with numerator and denominator factored.
  public Notation factored(Form form) {
    Form real = rewritten(form);
    return real.isZero() ? Notation.of(0) : fractions.factored(real);
  }

  /// The form as one fraction with nothing factored.
  public Notation expanded(Form form) {
    Form real = rewritten(form);
    if (real.isPolynomial()) {
      return sum(form, false);
    }
    return fractions.expanded(real);
  }

  /// `numerator / base^power`, one piece of a partial fraction expansion.
  Notation piece(Form numerator, Form base, int power) {
    return fractions.piece(rewritten(numerator), rewritten(base), power);
  }

  private Form rewritten(Form form) {
    Form moved = HarmonicNotation.moved(lexicon.rewritten(form), lexicon, kernels);
    return RealForm.of(moved, lexicon, this);
  }

  private Notation sum(Form form, boolean compact) {
    Optional<Rational> number = form.asRational();
    if (number.isPresent()) {
      return TermNotation.of(number.get(), List.of(), List.of(), compact);
    }
    Form real = rewritten(form);
    Monomial clearing = kernelPart(real.denominator().monomialContent());
    Polynomial denominator = real.denominator().times(clearing.power(Rational.MINUS_ONE));
    Polynomial numerator = real.numerator().times(clearing.power(Rational.MINUS_ONE));
    if (!isFreeOfKernels(denominator)) {
      return fractions.whole(numerator, denominator, compact);
    }
    List<Notation> terms = new ArrayList<>();
    Map<Monomial, Polynomial> groups = groups(numerator);
    if (groups.size() > 1 && lexicon.hasLetters(Form.of(denominator))) {
      return fractions.whole(numerator, denominator, compact);
    }
    for (Monomial kernel : groups.keySet().stream().sorted(order::compareGroups).toList()) {
      Form coefficient = Form.fraction(groups.get(kernel), denominator);
      terms.addAll(fractions.group(coefficient, kernel, compact));
    }
    return FractionNotation.inOrder(terms);
  }

  /// The polynomial as a sum of powers of kernels with their coefficients.
  private Map<Monomial, Polynomial> groups(Polynomial polynomial) {
    Map<Monomial, Polynomial> groups = new LinkedHashMap<>();
    for (Term term : polynomial.terms()) {
      Monomial kernel = kernelPart(term.monomial());
      Polynomial rest = Polynomial.of(term.monomial().dividedBy(kernel), term.coefficient());
      groups.merge(kernel, rest, Polynomial::plus);
    }
    return groups;
  }

  private Monomial kernelPart(Monomial monomial) {
    Monomial part = Monomial.ONE;
    for (Monomial.Power power : monomial.factors()) {
      if (isKernel((Generator) power.indeterminate())) {
        part = part.times(Monomial.of(power.indeterminate(), power.exponent()));
      }
    }
    return part;
  }

  private boolean isFreeOfKernels(Polynomial polynomial) {
    return polynomial.indeterminates().stream().noneMatch(g -> isKernel((Generator) g));
  }

  /// Whether the generator is written after its coefficient, which is kept together.
  private boolean isKernel(Generator generator) {
    if (generator instanceof Variable) {
      return lexicon.stands(generator, Lexicon.Role.KERNEL) || lexicon.shift(generator).isPresent();
    }
    return !(generator instanceof gnomon.form.Dual) && !Form.of(generator).isConstant();
  }
}
