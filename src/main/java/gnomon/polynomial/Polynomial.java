package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.algebra.Ring;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.UnaryOperator;

/// A polynomial over the rationals in any indeterminates, as a sum of terms with distinct monomials
/// and non-zero coefficients, in descending order of the monomials.
///
/// Exponents may be negative or fractional; see [Monomial]. Two polynomials are equal exactly when
/// they have the same terms.
public final class Polynomial implements Ring<Polynomial> {

  /// The polynomial 0, without terms.
  public static final Polynomial ZERO = new Polynomial(List.of());

  /// The polynomial 1.
  public static final Polynomial ONE = of(Rational.ONE);

  private static final Comparator<Term> DESCENDING = (a, b) -> b.monomial().compareTo(a.monomial());

  private final List<Term> terms;
  private int hash;

  private Polynomial(List<Term> terms) {
    this.terms = terms;
  }

  /// The constant `value`.
  public static Polynomial of(long value) {
    return of(Rational.of(value));
  }

  /// The constant `value`.
  public static Polynomial of(Rational value) {
    return of(Monomial.ONE, value);
  }

  /// The indeterminate itself.
  public static Polynomial of(Indeterminate indeterminate) {
    return of(Monomial.of(indeterminate, Rational.ONE), Rational.ONE);
  }

  /// The monomial with coefficient 1.
  public static Polynomial of(Monomial monomial) {
    return of(monomial, Rational.ONE);
  }

  /// The single term `coefficient * monomial`.
  public static Polynomial of(Monomial monomial, Rational coefficient) {
    return coefficient.isZero() ? ZERO : new Polynomial(List.of(new Term(monomial, coefficient)));
  }

  /// The sum of `terms`, which may repeat monomials and contain zeros.
  public static Polynomial ofTerms(Collection<Term> terms) {
    Map<Monomial, Rational> sums = HashMap.newHashMap(terms.size());
    for (Term term : terms) {
      sums.merge(term.monomial(), term.coefficient(), Rational::plus);
    }
    List<Term> kept = new ArrayList<>(sums.size());
    sums.forEach((monomial, sum) -> kept.add(new Term(monomial, sum)));
    return ofDistinct(kept);
  }

  /// The sum of `polynomials`, collected once.
  public static Polynomial sum(Collection<Polynomial> polynomials) {
    if (polynomials.size() <= 2) {
      return polynomials.stream().reduce(ZERO, Polynomial::plus);
    }
    List<Term> all = new ArrayList<>();
    polynomials.forEach(polynomial -> all.addAll(polynomial.terms));
    return ofTerms(all);
  }

  /// The sum of `coefficient * indeterminate^exponent` over the entries.
  public static Polynomial ofCoefficients(
      Indeterminate indeterminate, Map<Rational, Polynomial> coefficients) {
    List<Polynomial> parts = new ArrayList<>();
    coefficients.forEach(
        (exponent, part) -> parts.add(part.times(Monomial.of(indeterminate, exponent))));
    return sum(parts);
  }

  /// Terms with distinct monomials in any order; zeros are dropped.
  static Polynomial ofDistinct(List<Term> distinct) {
    List<Term> kept = new ArrayList<>(distinct);
    kept.removeIf(term -> term.coefficient().isZero());
    kept.sort(DESCENDING);
    return ofDescending(kept);
  }

  /// Terms already canonical, in descending order.
  static Polynomial ofDescending(List<Term> descending) {
    return descending.isEmpty() ? ZERO : new Polynomial(Collections.unmodifiableList(descending));
  }

  /// The terms, in descending order.
  public List<Term> terms() {
    return terms;
  }

  /// The number of terms.
  public int size() {
    return terms.size();
  }

  /// The first term.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for 0, which has none
  public Term leadingTerm() {
    if (isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO);
    }
    return terms.getFirst();
  }

  /// The coefficient of the first term; 0 for 0.
  public Rational leadingCoefficient() {
    return isZero() ? Rational.ZERO : terms.getFirst().coefficient();
  }

  /// The coefficient of `monomial`, 0 where it does not occur.
  public Rational coefficient(Monomial monomial) {
    int place = Collections.binarySearch(terms, new Term(monomial, Rational.ZERO), DESCENDING);
    return place < 0 ? Rational.ZERO : terms.get(place).coefficient();
  }

  @Override
  public boolean isZero() {
    return terms.isEmpty();
  }

  @Override
  public boolean isOne() {
    return isConstant() && !isZero() && terms.getFirst().coefficient().isOne();
  }

  /// Whether no indeterminate occurs.
  public boolean isConstant() {
    return terms.isEmpty() || terms.size() == 1 && terms.getFirst().monomial().isOne();
  }

  /// Whether this is a single term.
  public boolean isMonomial() {
    return terms.size() == 1;
  }

  /// The value of a constant.
  ///
  /// @throws IllegalStateException when an indeterminate occurs
  public Rational constantValue() {
    return asConstant().orElseThrow(() -> new IllegalStateException("not constant: " + this));
  }

  /// The value, when no indeterminate occurs.
  public Optional<Rational> asConstant() {
    return isConstant() ? Optional.of(leadingCoefficient()) : Optional.empty();
  }

  /// The indeterminates that occur, ascending.
  public SortedSet<Indeterminate> indeterminates() {
    SortedSet<Indeterminate> found = new TreeSet<>();
    Indeterminate[] last = Monomial.ONE.indeterminates;
    for (Term term : terms) {
      if (term.monomial().indeterminates != last) {
        last = term.monomial().indeterminates;
        Collections.addAll(found, last);
      }
    }
    return found;
  }

  /// Whether `indeterminate` occurs.
  public boolean contains(Indeterminate indeterminate) {
    return terms.stream().anyMatch(term -> term.monomial().contains(indeterminate));
  }

  /// The largest exponent of `indeterminate` in any term; 0 for the polynomial 0.
  public Rational degree(Indeterminate indeterminate) {
    return terms.stream()
        .map(term -> term.monomial().exponent(indeterminate))
        .max(Comparator.naturalOrder())
        .orElse(Rational.ZERO);
  }

  /// The smallest exponent of `indeterminate` in any term; 0 for the polynomial 0.
  public Rational lowDegree(Indeterminate indeterminate) {
    return terms.stream()
        .map(term -> term.monomial().exponent(indeterminate))
        .min(Comparator.naturalOrder())
        .orElse(Rational.ZERO);
  }

  /// Whether every exponent is an integer at least 0.
  public boolean isNatural() {
    return terms.stream().allMatch(term -> term.monomial().isNatural());
  }

  /// The coefficients as a polynomial in `indeterminate`, by ascending exponent; none is 0.
  public SortedMap<Rational, Polynomial> coefficients(Indeterminate indeterminate) {
    SortedMap<Rational, List<Term>> groups = new TreeMap<>();
    for (Term term : terms) {
      groups
          .computeIfAbsent(term.monomial().exponent(indeterminate), _ -> new ArrayList<>())
          .add(new Term(term.monomial().without(indeterminate), term.coefficient()));
    }
    SortedMap<Rational, Polynomial> coefficients = new TreeMap<>();
    groups.forEach((exponent, group) -> coefficients.put(exponent, ofDistinct(group)));
    return coefficients;
  }

  /// The coefficient of the highest power of `indeterminate`.
  public Polynomial leadingCoefficient(Indeterminate indeterminate) {
    return isZero() ? ZERO : coefficients(indeterminate).lastEntry().getValue();
  }

  @Override
  public Polynomial plus(Polynomial other) {
    return Addition.sum(this, other, false);
  }

  @Override
  public Polynomial minus(Polynomial other) {
    return Addition.sum(this, other, true);
  }

  @Override
  public Polynomial negated() {
    return times(Rational.MINUS_ONE);
  }

  @Override
  public Polynomial times(Polynomial other) {
    if (isZero() || other.isZero()) {
      return ZERO;
    }
    if (other.isMonomial()) {
      return times(other.terms.getFirst());
    }
    return isMonomial() ? other.times(terms.getFirst()) : Product.of(this, other);
  }

  private Polynomial times(Term factor) {
    return times(factor.monomial()).times(factor.coefficient());
  }

  /// Every coefficient multiplied by `factor`.
  public Polynomial times(Rational factor) {
    if (factor.isOne()) {
      return this;
    }
    if (factor.isZero()) {
      return ZERO;
    }
    List<Term> scaled = new ArrayList<>(terms.size());
    for (Term term : terms) {
      scaled.add(new Term(term.monomial(), term.coefficient().times(factor)));
    }
    return ofDescending(scaled);
  }

  /// Every monomial multiplied by `factor`.
  public Polynomial times(Monomial factor) {
    if (factor.isOne()) {
      return this;
    }
    List<Term> shifted = new ArrayList<>(terms.size());
    for (Term term : terms) {
      shifted.add(new Term(term.monomial().times(factor), term.coefficient()));
    }
    return ofDescending(shifted);
  }

  /// Every coefficient divided by `divisor`.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for 0
  public Polynomial dividedBy(Rational divisor) {
    return times(divisor.inverse());
  }

  /// The power; a negative one is defined for single terms only, which are units here.
  ///
  /// The size of the result is charged before it is computed.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a negative power of 0
  /// @throws IllegalArgumentException for a negative power of a polynomial with several terms
  @Override
  public Polynomial power(int exponent) {
    if (isMonomial()) {
      Term term = terms.getFirst();
      return of(term.monomial().power(Rational.of(exponent)), term.coefficient().power(exponent));
    }
    if (exponent < 0) {
      if (isZero()) {
        throw new Refusal(Reason.DIVISION_BY_ZERO);
      }
      throw new IllegalArgumentException("negative power of several terms");
    }
    if (exponent == 0) {
      return ONE;
    }
    return exponent == 1 || isZero() ? this : Product.power(this, exponent);
  }

  /// The formal derivative by `indeterminate`.
  public Polynomial derivative(Indeterminate indeterminate) {
    Monomial inverse = Monomial.of(indeterminate, Rational.MINUS_ONE);
    List<Term> derived = new ArrayList<>();
    for (Term term : terms) {
      Rational exponent = term.monomial().exponent(indeterminate);
      if (!exponent.isZero()) {
        derived.add(new Term(term.monomial().times(inverse), term.coefficient().times(exponent)));
      }
    }
    return ofDescending(derived);
  }

  /// Every monomial replaced by its image; images may coincide.
  public Polynomial mapMonomials(UnaryOperator<Monomial> image) {
    List<Term> mapped = new ArrayList<>(terms.size());
    for (Term term : terms) {
      mapped.add(new Term(image.apply(term.monomial()), term.coefficient()));
    }
    return ofTerms(mapped);
  }

  /// `value` put in place of `indeterminate`, whose exponents here must be integers at least 0.
  ///
  /// @throws Refusal with [Reason#NOT_AN_INTEGER], [Reason#OUT_OF_RANGE] or [Reason#NOT_NATURAL]
  ///   for another exponent, unless `value` is a single term with coefficient 1
  public Polynomial substitute(Indeterminate indeterminate, Polynomial value) {
    if (value.isMonomial() && value.leadingCoefficient().isOne()) {
      Monomial image = value.terms.getFirst().monomial();
      return mapMonomials(
          monomial ->
              monomial.without(indeterminate).times(image.power(monomial.exponent(indeterminate))));
    }
    Polynomial result = ZERO;
    int previous = 0;
    SortedMap<Rational, Polynomial> coefficients = coefficients(indeterminate);
    for (Rational exponent : coefficients.sequencedKeySet().reversed()) {
      Budget.checkpoint();
      int power = exponent.intValueExact();
      if (power < 0) {
        throw new Refusal(Reason.NOT_NATURAL, exponent);
      }
      result = result.times(value.power(result.isZero() ? 0 : previous - power));
      result = result.plus(coefficients.get(exponent));
      previous = power;
    }
    return result.isZero() ? ZERO : result.times(value.power(previous));
  }

  /// The rational c for which this polynomial divided by c is primitive with a positive leading
  /// coefficient; 0 for 0.
  public Rational content() {
    BigInteger numerator = BigInteger.ZERO;
    BigInteger denominator = BigInteger.ONE;
    for (Term term : terms) {
      Rational coefficient = term.coefficient();
      if (!numerator.equals(BigInteger.ONE)) {
        numerator = numerator.gcd(coefficient.numerator());
      }
      BigInteger its = coefficient.denominator();
      if (!its.equals(BigInteger.ONE)) {
        denominator = denominator.divide(denominator.gcd(its)).multiply(its);
      }
    }
    Rational content = Rational.of(numerator, denominator);
    return leadingCoefficient().sign() < 0 ? content.negated() : content;
  }

  /// The greatest common divisor of the monomials; exponents may be fractional or negative.
  public Monomial monomialContent() {
    if (isZero()) {
      return Monomial.ONE;
    }
    Monomial content = terms.getFirst().monomial();
    for (Term term : terms) {
      content = content.gcd(term.monomial());
    }
    return content;
  }

  /// This polynomial divided by its [#content()]: integer coefficients without common divisor, the
  /// leading one positive; 0 for 0.
  public Polynomial primitivePart() {
    return isZero() ? ZERO : dividedBy(content());
  }

  /// The quotient, when `divisor` divides this polynomial.
  ///
  /// The quotient may have a negative exponent of an indeterminate only so far as this polynomial
  /// has one: `x` is not divisible by `x^2`, but `1 + x^-1` is divisible by `x + 1`.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a zero divisor
  public Optional<Polynomial> tryDividedBy(Polynomial divisor) {
    return Division.exact(this, divisor);
  }

  /// The quotient of an exact division.
  ///
  /// @throws IllegalArgumentException when `divisor` does not divide this polynomial
  public Polynomial dividedBy(Polynomial divisor) {
    return tryDividedBy(divisor)
        .orElseThrow(() -> new IllegalArgumentException(divisor + " does not divide " + this));
  }

  /// The greatest common divisor of `a` and `b`: primitive, leading coefficient positive, with the
  /// greatest common divisor of all their monomials; 0 when both are 0.
  public static Polynomial gcd(Polynomial a, Polynomial b) {
    return GreatestCommonDivisor.of(a, b);
  }

  /// A least common multiple of `a` and `b`, primitive; 0 when one of them is 0.
  public static Polynomial lcm(Polynomial a, Polynomial b) {
    if (a.isZero() || b.isZero()) {
      return ZERO;
    }
    return a.equals(b) ? a.primitivePart() : a.dividedBy(gcd(a, b)).times(b).primitivePart();
  }

  /// The irreducible factors over the rationals.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for 0
  public Factorization factor() {
    return Factoring.irreducible(this);
  }

  /// The square-free factors: pairwise coprime, each without a repeated factor.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for 0
  public Factorization squareFree() {
    return Factoring.squareFree(this);
  }

  /// The resultant of `a` and `b` as polynomials in `indeterminate`, whose exponents must be
  /// integers at least 0; 0 exactly when both share a factor that contains it, or one is 0.
  ///
  /// @throws Refusal with [Reason#NOT_AN_INTEGER], [Reason#OUT_OF_RANGE] or [Reason#NOT_NATURAL]
  ///   for another exponent
  public static Polynomial resultant(Polynomial a, Polynomial b, Indeterminate indeterminate) {
    return Resultant.of(a, b, indeterminate);
  }

  @Override
  public boolean equals(Object object) {
    return this == object
        || object instanceof Polynomial other
            && hashCode() == other.hashCode()
            && terms.equals(other.terms);
  }

  @Override
  public int hashCode() {
    if (hash == 0) {
      hash = terms.hashCode();
    }
    return hash;
  }

  /// The terms joined by `+`, for diagnosis only.
  @Override
  public String toString() {
    if (isZero()) {
      return "0";
    }
    StringBuilder text = new StringBuilder();
    for (Term term : terms) {
      text.append(text.isEmpty() ? "" : " + ").append(term.coefficient());
      text.append(term.monomial().isOne() ? "" : "*" + term.monomial());
    }
    return text.toString();
  }
}
