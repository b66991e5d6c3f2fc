package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Combinatorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.LinearSystem;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Summation;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/// The law of the coefficients of a function with a linear differential equation.
///
/// The derivatives of the function are combinations, over the rational functions of x, of monomials
/// in its kernels; a dependence among them is the differential equation Σ_j p_j(x) D^j f = 0, which
/// is checked by differentiation. A term p x^i D^j of it contributes p m'↓j a_m' with m' = m − i +
/// j to the coefficient of x^m.
///
/// Source: R. P. Stanley, Differentiably finite power series (1980), from memory.
public final class GeneratingFunction {
  private static final int HIGHEST_ORDER = 8;
  private static final int CHECKED = 12;

  private final Form function;
  private final Variable x;

  /// The function of x.
  public GeneratingFunction(Form function, Variable x) {
    this.function = function;
    this.x = x;
  }

  /// A recurrence Σ_t c_t(v) a(v+t) = 0 of the coefficients, for v ≥ from.
  public record Law(LinearEquation recurrence, BigInteger from) {}

  /// A linear differential equation with polynomial coefficients, of least order.
  ///
  /// @throws Refusal with [Reason#NO_DIFFERENTIAL_EQUATION] where none was found
  public LinearEquation differentialEquation() {
    List<Map<Monomial, Form>> derivatives = new ArrayList<>();
    SortedSet<Monomial> kernels = new TreeSet<>();
    Form derivative = function;
    for (int order = 0; order <= HIGHEST_ORDER; order++) {
      Budget.checkpoint();
      Map<Monomial, Form> vector = vector(derivative);
      derivatives.add(vector);
      kernels.addAll(vector.keySet());
      List<List<Form>> kernel = LinearSystem.kernel(rows(derivatives, kernels), order + 1);
      if (!kernel.isEmpty()) {
        LinearEquation equation =
            new LinearEquation(LinearEquation.Action.DERIVATIVE, x, kernel.getFirst(), Form.ZERO)
                .cleared();
        if (equation.residual(function).isZero()) {
          return equation;
        }
      }
      derivative = derivative.derivative(x);
    }
    throw new Refusal(Reason.NO_DIFFERENTIAL_EQUATION, function);
  }

  private static List<List<Form>> rows(
      List<Map<Monomial, Form>> derivatives, SortedSet<Monomial> kernels) {
    List<List<Form>> rows = new ArrayList<>();
    for (Monomial kernel : kernels) {
      rows.add(derivatives.stream().map(d -> d.getOrDefault(kernel, Form.ZERO)).toList());
    }
    return rows;
  }

  /// The form as a combination of monomials in kernels with rational functions of x in front.
  private Map<Monomial, Form> vector(Form form) {
    Monomial below = kernelPart(form.denominator().monomialContent());
    Polynomial plain = form.denominator().times(below.power(Rational.MINUS_ONE));
    if (!kernelsOf(plain).isEmpty()) {
      throw new Refusal(Reason.NO_DIFFERENTIAL_EQUATION, function);
    }
    Map<Monomial, Polynomial> parts = new LinkedHashMap<>();
    for (Term term : form.numerator().terms()) {
      Monomial kernel = kernelPart(term.monomial());
      Polynomial rest = Polynomial.of(term.monomial().dividedBy(kernel), term.coefficient());
      parts.merge(kernel.dividedBy(below), rest, Polynomial::plus);
    }
    Map<Monomial, Form> vector = new LinkedHashMap<>();
    parts.forEach((kernel, part) -> vector.put(kernel, Form.fraction(part, plain)));
    return vector;
  }

  private List<Generator> kernelsOf(Polynomial polynomial) {
    return polynomial.indeterminates().stream()
        .map(Generator.class::cast)
        .filter(g -> !g.equals(x) && g.dependsOn(x))
        .toList();
  }

  private Monomial kernelPart(Monomial monomial) {
    Monomial part = Monomial.ONE;
    for (Monomial.Power power : monomial.factors()) {
      if (power.indeterminate() instanceof Generator g && !g.equals(x) && g.dependsOn(x)) {
        part = part.times(Monomial.of(g, power.exponent()));
      }
    }
    return part;
  }

  /// The law of a(n) = [x^n] f in the variable v.
  ///
  /// @throws Refusal with [Reason#NO_DIFFERENTIAL_EQUATION], or where f has no power series at 0
  public Law ordinary(Variable v) {
    LinearEquation equation = differentialEquation();
    Map<Integer, Form> byShift = new LinkedHashMap<>();
    for (int j = 0; j <= equation.order(); j++) {
      List<Form> list = Structure.asPolynomial(equation.coefficients().get(j), x).orElseThrow();
      for (int i = 0; i < list.size(); i++) {
        Form index = Form.of(v).plus(Form.of(j - i));
        Form part = list.get(i).times(Combinatorial.falling(index, Form.of(j)));
        byShift.merge(j - i, part, Form::plus);
      }
    }
    byShift.values().removeIf(Form::isZero);
    int lowest = byShift.keySet().stream().min(Integer::compare).orElseThrow();
    int highest = byShift.keySet().stream().max(Integer::compare).orElseThrow();
    List<Form> coefficients = new ArrayList<>();
    for (int t = lowest; t <= highest; t++) {
      Form c = byShift.getOrDefault(t, Form.ZERO);
      coefficients.add(c.substitute(v, Form.of(v).minus(Form.of(lowest))));
    }
    LinearEquation law =
        new LinearEquation(LinearEquation.Action.SHIFT, v, coefficients, Form.ZERO);
    return checked(new Law(law, BigInteger.valueOf(Math.max(0, lowest))), false);
  }

  /// The law of a(n) = n! [x^n] f in the variable v.
  public Law exponential(Variable v) {
    Law law = ordinary(v);
    int order = law.recurrence().order();
    List<Form> coefficients = new ArrayList<>();
    for (int t = 0; t <= order; t++) {
      Form rest = Combinatorial.falling(Form.of(v).plus(Form.of(order)), Form.of(order - t));
      coefficients.add(law.recurrence().coefficients().get(t).times(rest));
    }
    LinearEquation scaled =
        new LinearEquation(LinearEquation.Action.SHIFT, v, coefficients, Form.ZERO);
    return checked(new Law(scaled, law.from()), true);
  }

  /// The law, once it has been found to hold of coefficients that were computed as a series; common
  /// factors of its coefficients are taken out where they have no zero that matters.
  private Law checked(Law law, boolean exponential) {
    Law whole = reduced(law);
    int first = whole.from().intValueExact();
    int order = whole.recurrence().order();
    List<Form> values = coefficients(first + CHECKED + order, exponential);
    for (int n = first; n < first + CHECKED; n++) {
      Form sum = Form.ZERO;
      for (int t = 0; t <= order; t++) {
        Form c =
            whole
                .recurrence()
                .coefficients()
                .get(t)
                .substitute(whole.recurrence().variable(), Form.of(n));
        sum = sum.plus(c.times(values.get(n + t)));
      }
      if (!sum.isZero()) {
        throw new IllegalStateException("a law that its coefficients do not obey");
      }
    }
    return whole;
  }

  /// Divided by the common factor of the coefficients, from where on that has no zero.
  private static Law reduced(Law law) {
    LinearEquation cleared = law.recurrence().cleared();
    Variable v = cleared.variable();
    Form common = law.recurrence().leading().dividedBy(cleared.leading());
    BigInteger from = law.from();
    SortedSet<BigInteger> zeros = IntegerRoots.of(Form.of(common.numerator()), v);
    if (!zeros.isEmpty() && zeros.last().compareTo(from) >= 0) {
      from = zeros.last().add(BigInteger.ONE);
    }
    return new Law(cleared, from);
  }

  /// The coefficients from x^0 to x^(count−1), or n! times them.
  ///
  /// @throws Refusal where the function has no power series at 0
  public List<Form> coefficients(int count, boolean exponential) {
    PowerSeries series = Expansion.of(function, x, count);
    if (!series.isZero() && series.valuation() < 0) {
      throw new Refusal(Reason.NO_SERIES, function);
    }
    List<Form> all = new ArrayList<>();
    for (int n = 0; n < count; n++) {
      Form c = series.coefficient(n);
      all.add(exponential ? c.times(Combinatorial.factorial(Form.of(n))) : c);
    }
    return all;
  }

  /// A closed form of [x^n] f in n, for n ≥ from.
  public record ClosedForm(Form value, BigInteger from) {}

  /// The closed form, where the law of the coefficients has solutions in one.
  ///
  /// @throws Refusal with [Reason#NO_SOLUTION] where it is proved that the coefficients are no sum
  ///   of hypergeometric terms
  public Optional<ClosedForm> closedForm(Variable n, Summation sums) {
    Law law = ordinary(n);
    LinearEquation recurrence = law.recurrence();
    BigInteger start = law.from();
    for (Form end : List.of(recurrence.leading(), recurrence.coefficients().getFirst())) {
      SortedSet<BigInteger> zeros = IntegerRoots.of(end, n);
      if (!zeros.isEmpty() && zeros.last().compareTo(start) >= 0) {
        start = zeros.last().add(BigInteger.ONE);
      }
    }
    SolutionSpace space = new RecurrenceSolver(sums, Optional.of(start)).solve(recurrence);
    if (space.isEmpty() || start.bitLength() > 12) {
      return absent(space);
    }
    int first = start.intValueExact();
    int order = Math.max(recurrence.order(), 1);
    List<Form> values = coefficients(first + order + CHECKED, false);
    List<Variable> constants = new ArrayList<>();
    for (int i = 0; i < space.basis().size(); i++) {
      constants.add(new Variable("c'" + i));
    }
    Form general = space.combination(constants);
    List<Form> conditions = new ArrayList<>();
    for (int i = 0; i < order; i++) {
      Form at = general.substitute(n, Form.of(first + i));
      conditions.add(at.minus(values.get(first + i)));
    }
    Optional<List<Form>> found = ConstantsFromConditions.of(conditions, constants);
    return found.isEmpty()
        ? absent(space)
        : found
            .map(space::withConstants)
            .filter(form -> constants.stream().noneMatch(form::dependsOn))
            .flatMap(form -> valid(form, n, values, first));
  }

  /// Nothing, or the proof that there is no solution of the class.
  private static Optional<ClosedForm> absent(SolutionSpace space) {
    if (space.exhaustive() && space.equation().order() > 0) {
      throw new Refusal(Reason.NO_SOLUTION, space.within().words());
    }
    return Optional.empty();
  }

  /// The form with the least n from which on it has the values of the coefficients, all of which
  /// beyond `first` are compared.
  private static Optional<ClosedForm> valid(Form form, Variable n, List<Form> values, int first) {
    for (int i = first; i < values.size(); i++) {
      if (!agrees(form, n, i, values)) {
        return Optional.empty();
      }
    }
    int from = first;
    while (from > 0 && agrees(form, n, from - 1, values)) {
      from--;
    }
    return Optional.of(new ClosedForm(form, BigInteger.valueOf(from)));
  }

  private static boolean agrees(Form form, Variable n, int at, List<Form> values) {
    try {
      return form.substitute(n, Form.of(at)).equals(values.get(at));
    } catch (Refusal _) {
      return false;
    }
  }
}
