package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.function.Function;

/// An exact form: a rational function over ℚ in [Generator]s, in a normal form.
///
/// The normal form is numerator/denominator without common factor, the denominator a primitive
/// integer polynomial with positive leading coefficient and free of algebraic constants, the
/// numerator reduced modulo the relations of i and the radicals. Two forms are equal exactly when
/// they are equal as functions of independent generators; `equals` decides it.
public final class Form implements Comparable<Form> {
  public static final Form ZERO = new Form(Polynomial.ZERO, Polynomial.ONE);
  public static final Form ONE = new Form(Polynomial.ONE, Polynomial.ONE);
  public static final Form MINUS_ONE = of(-1);
  public static final Form TWO = of(2);
  public static final Form HALF = of(Rational.of(1, 2));
  public static final Form I = of(Constant.I);
  public static final Form PI = of(Constant.PI);
  public static final Form E = of(new Exponential(Base.NATURAL, ONE));

  private final Polynomial numerator;
  private final Polynomial denominator;
  private int hash;
  private String key;

  Form(Polynomial numerator, Polynomial denominator) {
    this.numerator = numerator;
    this.denominator = denominator;
  }

  /// The integer as a form.
  public static Form of(long value) {
    return of(Rational.of(value));
  }

  /// The integer as a form.
  public static Form of(BigInteger value) {
    return of(Rational.of(value));
  }

  /// The rational number as a form.
  public static Form of(Rational value) {
    return new Form(Polynomial.of(value), Polynomial.ONE);
  }

  /// The generator as a form.
  public static Form of(Generator generator) {
    return new Form(Polynomial.of(generator), Polynomial.ONE);
  }

  /// The generator raised to a rational exponent; for an algebraic generator it is reduced.
  public static Form of(Generator generator, Rational exponent) {
    if (exponent.isZero()) {
      return ONE;
    }
    if (exponent.sign() < 0) {
      return of(generator, exponent.negated()).inverse();
    }
    return of(Polynomial.of(Monomial.of(generator, exponent), Rational.ONE));
  }

  /// The polynomial as a form.
  public static Form of(Polynomial polynomial) {
    return Reduction.fraction(polynomial, Polynomial.ONE);
  }

  /// The quotient of two polynomials, brought to the normal form.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] or, where the denominator is a zero divisor
  ///   under a relation, [Reason#ZERO_DIVISOR]
  public static Form fraction(Polynomial numerator, Polynomial denominator) {
    return Reduction.fraction(numerator, denominator);
  }

  /// The variable of that name.
  public static Form variable(String name) {
    return of(new Variable(name));
  }

  /// The symbol variable of the derivation by the variable of that name.
  public static Form dual(String name) {
    return of(new Dual(new Variable(name)));
  }

  public Polynomial numerator() {
    return numerator;
  }

  public Polynomial denominator() {
    return denominator;
  }

  public boolean isZero() {
    return numerator.isZero();
  }

  public boolean isOne() {
    return numerator.isOne() && denominator.isOne();
  }

  /// Whether the form is a polynomial in its generators.
  public boolean isPolynomial() {
    return denominator.isOne();
  }

  /// The value where the form is a rational number.
  public Optional<Rational> asRational() {
    return denominator.isOne() ? numerator.asConstant() : Optional.empty();
  }

  /// The value where the form is an integer.
  public Optional<BigInteger> asInteger() {
    return asRational().filter(Rational::isInteger).map(Rational::numerator);
  }

  /// The value where the form is an integer of int size.
  public Optional<Integer> asInt() {
    return asInteger().filter(value -> value.bitLength() < 32).map(BigInteger::intValueExact);
  }

  /// The generator where the form is nothing but one.
  public Optional<Generator> asGenerator() {
    if (!denominator.isOne() || numerator.size() != 1 || numerator.isConstant()) {
      return Optional.empty();
    }
    Term term = numerator.terms().getFirst();
    List<Monomial.Power> factors = term.monomial().factors();
    boolean plain =
        term.coefficient().isOne() && factors.size() == 1 && factors.getFirst().exponent().isOne();
    return plain ? Optional.of((Generator) factors.getFirst().indeterminate()) : Optional.empty();
  }

  public Form plus(Form that) {
    if (isZero()) {
      return that;
    }
    if (that.isZero()) {
      return this;
    }
    if (denominator.equals(that.denominator)) {
      Polynomial sum = numerator.plus(that.numerator);
      return denominator.isOne() ? new Form(sum, denominator) : Reduction.cancel(sum, denominator);
    }
    if (denominator.isOne()) {
      return coprimeSum(numerator, that);
    }
    if (that.denominator.isOne()) {
      return coprimeSum(that.numerator, this);
    }
    Polynomial common = Polynomial.gcd(denominator, that.denominator);
    Polynomial left = denominator.dividedBy(common);
    Polynomial right = that.denominator.dividedBy(common);
    Polynomial sum = numerator.times(right).plus(that.numerator.times(left));
    return Reduction.fraction(sum, denominator.times(right));
  }

  /// p + a/b with a/b in normal form: no new common factor can arise but for monomial shifts.
  private static Form coprimeSum(Polynomial p, Form fraction) {
    Polynomial sum = p.times(fraction.denominator).plus(fraction.numerator);
    return Reduction.fraction(sum, fraction.denominator);
  }

  public Form minus(Form that) {
    return plus(that.negated());
  }

  public Form negated() {
    return new Form(numerator.negated(), denominator);
  }

  public Form times(Form that) {
    if (isZero() || that.isOne()) {
      return this;
    }
    if (that.isZero() || isOne()) {
      return that;
    }
    return Reduction.fraction(
        numerator.times(that.numerator),
        denominator.isOne()
            ? that.denominator
            : that.denominator.isOne() ? denominator : denominator.times(that.denominator));
  }

  public Form times(Rational factor) {
    return factor.isZero() ? ZERO : new Form(numerator.times(factor), denominator);
  }

  /// The quotient.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] where the divisor is zero
  public Form dividedBy(Form that) {
    if (that.isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, this);
    }
    return that.isOne() ? this : times(that.inverse());
  }

  /// The reciprocal.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] where the form is zero
  public Form inverse() {
    if (isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO, ONE);
    }
    return Reduction.fraction(denominator, numerator);
  }

  /// The power with an integer exponent; 0^0 is 1.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a negative power of zero
  public Form power(int exponent) {
    if (exponent == 0) {
      return ONE;
    }
    if (exponent < 0) {
      return inverse().power(Math.negateExact(exponent));
    }
    if (!Reduction.hasRelations(numerator)) {
      return new Form(numerator.power(exponent), denominator.power(exponent));
    }
    Form result = ONE;
    for (int bit = 31 - Integer.numberOfLeadingZeros(exponent); bit >= 0; bit--) {
      result = result.times(result);
      if ((exponent >> bit & 1) == 1) {
        result = result.times(this);
      }
    }
    return result;
  }

  /// The sum of all.
  public static Form sum(Collection<Form> forms) {
    List<Form> rest = new ArrayList<>(forms);
    while (rest.size() > 1) {
      List<Form> next = new ArrayList<>();
      for (int i = 0; i < rest.size(); i += 2) {
        next.add(i + 1 < rest.size() ? rest.get(i).plus(rest.get(i + 1)) : rest.get(i));
      }
      rest = next;
    }
    return rest.isEmpty() ? ZERO : rest.getFirst();
  }

  /// The product of all.
  public static Form product(Collection<Form> forms) {
    Form result = ONE;
    for (Form form : forms) {
      result = result.times(form);
    }
    return result;
  }

  /// Whether no variable, dual or unknown function occurs at any depth.
  public boolean isConstant() {
    boolean[] free = {true};
    atoms(a -> free[0] = false);
    return free[0];
  }

  /// The generators of numerator and denominator, not those inside kernels.
  public SortedSet<Generator> generators() {
    SortedSet<Generator> all = new TreeSet<>();
    for (Indeterminate g : numerator.indeterminates()) {
      all.add((Generator) g);
    }
    for (Indeterminate g : denominator.indeterminates()) {
      all.add((Generator) g);
    }
    return all;
  }

  /// Calls the consumer with each free variable and dual, at any depth.
  public void atoms(Consumer<Generator> consumer) {
    for (Indeterminate g : numerator.indeterminates()) {
      ((Generator) g).atoms(consumer);
    }
    for (Indeterminate g : denominator.indeterminates()) {
      ((Generator) g).atoms(consumer);
    }
  }

  /// The free variables, at any depth.
  public SortedSet<Variable> variables() {
    SortedSet<Variable> all = new TreeSet<>();
    atoms(
        a -> {
          if (a instanceof Variable v) {
            all.add(v);
          }
        });
    return all;
  }

  /// The duals, at any depth.
  public SortedSet<Dual> duals() {
    SortedSet<Dual> all = new TreeSet<>();
    atoms(
        a -> {
          if (a instanceof Dual d) {
            all.add(d);
          }
        });
    return all;
  }

  /// Whether the variable or dual occurs, at any depth.
  public boolean dependsOn(Generator variableOrDual) {
    for (Generator g : generators()) {
      if (g.dependsOn(variableOrDual)) {
        return true;
      }
    }
    return false;
  }

  /// The form with the value put in for the variable or dual.
  ///
  /// @throws Refusal with [Reason#POLE] where the value is a pole
  public Form substitute(Generator variableOrDual, Form value) {
    return Substitution.apply(this, Map.of(variableOrDual, value));
  }

  /// The form with all images put in at once.
  ///
  /// @throws Refusal with [Reason#POLE] where the images meet a pole
  public Form substitute(Map<Generator, Form> images) {
    return Substitution.apply(this, images);
  }

  /// The form with each of its own generators, taken with its exponent 1, replaced.
  public Form mapGenerators(Function<Generator, Form> image) {
    return Substitution.mapped(
        this, (generator, exponent) -> Powers.power(image.apply(generator), of(exponent)));
  }

  /// The terms of the numerator, each over the denominator.
  public List<Form> terms() {
    return numerator.terms().stream()
        .map(term -> fraction(Polynomial.of(term.monomial(), term.coefficient()), denominator))
        .toList();
  }

  /// The partial derivative by a variable or dual; kernels follow their own rules.
  public Form derivative(Generator variableOrDual) {
    return Derivation.derivative(this, variableOrDual);
  }

  /// The form under the assumption that the variables are integers: (−1)^(2n) is 1.
  public Form takingIntegers(Collection<Variable> integers) {
    return IntegerPowers.reduce(this, integers);
  }

  /// The form with powers of conjugate quadratic numbers written by one of the two: ((1 − √5)/2)^n
  /// by ((1 + √5)/2)^n, where that is exact in principal values.
  public Form unitingConjugates() {
    return ConjugateBases.united(this);
  }

  /// A spelling that tells this form from every other one.
  public String key() {
    if (key == null) {
      String top = Keys.of(numerator);
      key = denominator.isOne() ? top : "(" + top + ")/(" + Keys.of(denominator) + ")";
    }
    return key;
  }

  @Override
  public int compareTo(Form that) {
    return this == that ? 0 : key().compareTo(that.key());
  }

  @Override
  public boolean equals(Object other) {
    return this == other
        || other instanceof Form that
            && hashCode() == that.hashCode()
            && numerator.equals(that.numerator)
            && denominator.equals(that.denominator);
  }

  @Override
  public int hashCode() {
    if (hash == 0) {
      hash = 31 * numerator.hashCode() + denominator.hashCode();
    }
    return hash;
  }

  @Override
  public String toString() {
    return key();
  }
}
