package gnomon.series;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/// A Laurent series known to a stated order: Σ c_k t^k for valuation ≤ k ≤ order, plus terms beyond
/// `order` of which nothing is known.
///
/// The coefficient at `valuation()` is not zero, except for a series that is zero as far as it is
/// known, whose valuation is `order() + 1`. Coefficients are exact forms free of t; when all are
/// rational numbers the arithmetic is done on those.
public final class PowerSeries {

  private final int valuation;
  private final int order;
  private final List<Form> coefficients;
  private final @Nullable List<Rational> rationals;

  private PowerSeries(
      int valuation, int order, List<Form> coefficients, @Nullable List<Rational> rationals) {
    this.valuation = valuation;
    this.order = order;
    this.coefficients = coefficients;
    this.rationals = rationals;
  }

  /// The series whose coefficients from t^first on are given; those missing up to the order are
  /// zero, those beyond it are dropped.
  public static PowerSeries of(List<Form> coefficients, int first, int order) {
    int start = 0;
    while (start < coefficients.size()
        && first + start <= order
        && coefficients.get(start).isZero()) {
      start++;
    }
    int from = first + start;
    if (start == coefficients.size() || from > order) {
      return zero(order);
    }
    List<Form> kept = new ArrayList<>();
    for (int k = from; k <= order; k++) {
      int index = k - first;
      kept.add(index < coefficients.size() ? coefficients.get(index) : Form.ZERO);
    }
    return new PowerSeries(from, order, List.copyOf(kept), asRationals(kept));
  }

  /// The series Σ a_k t^k with rational coefficients from t^0 on.
  public static PowerSeries ofRationals(List<Rational> coefficients, int order) {
    return of(coefficients.stream().map(Form::of).toList(), 0, order);
  }

  /// Zero, known to the order.
  public static PowerSeries zero(int order) {
    return new PowerSeries(order + 1, order, List.of(), List.of());
  }

  /// A constant, known to the order.
  public static PowerSeries constant(Form value, int order) {
    return of(List.of(value), 0, order);
  }

  /// The series c·t^exponent, known to the order.
  public static PowerSeries monomial(Form c, int exponent, int order) {
    return of(List.of(c), exponent, order);
  }

  private static @Nullable List<Rational> asRationals(List<Form> forms) {
    List<Rational> values = new ArrayList<>(forms.size());
    for (Form form : forms) {
      Optional<Rational> value = form.asRational();
      if (value.isEmpty()) {
        return null;
      }
      values.add(value.get());
    }
    return List.copyOf(values);
  }

  /// The exponent of the first coefficient that is not zero, or `order() + 1`.
  public int valuation() {
    return valuation;
  }

  /// The last exponent whose coefficient is known.
  public int order() {
    return order;
  }

  /// Whether every known coefficient is zero.
  public boolean isZero() {
    return coefficients.isEmpty();
  }

  /// Whether every known coefficient is a rational number.
  public boolean isRational() {
    return rationals != null;
  }

  /// The coefficient of t^k.
  ///
  /// @throws IllegalArgumentException when k is beyond the order
  public Form coefficient(int k) {
    if (k > order) {
      throw new IllegalArgumentException("coefficient " + k + " of a series of order " + order);
    }
    return k < valuation ? Form.ZERO : coefficients.get(k - valuation);
  }

  /// The coefficients of t^0, …, t^order; of a series with negative powers those are left out.
  public List<Form> coefficients() {
    List<Form> result = new ArrayList<>();
    for (int k = 0; k <= order; k++) {
      result.add(coefficient(k));
    }
    return result;
  }

  /// The coefficients of t^0, …, t^order when all are rational numbers.
  public Optional<List<Rational>> rationalCoefficients() {
    return Optional.ofNullable(asRationals(coefficients()));
  }

  /// The known part as a form in the given t.
  public Form toForm(Form t) {
    List<Form> parts = new ArrayList<>();
    for (int k = valuation; k <= order; k++) {
      if (!coefficient(k).isZero()) {
        parts.add(coefficient(k).times(t.power(k)));
      }
    }
    return Form.sum(parts);
  }

  /// The same series, forgotten beyond a lower order.
  public PowerSeries truncated(int lower) {
    return lower >= order ? this : of(coefficients, valuation, lower);
  }

  /// The series multiplied by t^k.
  public PowerSeries shifted(int k) {
    return new PowerSeries(valuation + k, order + k, coefficients, rationals);
  }

  /// The sum, known to the smaller order.
  public PowerSeries plus(PowerSeries that) {
    int common = Math.min(order, that.order);
    int first = Math.min(valuation, that.valuation);
    List<Form> sum = new ArrayList<>();
    for (int k = first; k <= common; k++) {
      sum.add(coefficient(k).plus(that.coefficient(k)));
    }
    return of(sum, first, common);
  }

  /// The difference, known to the smaller order.
  public PowerSeries minus(PowerSeries that) {
    return plus(that.negated());
  }

  /// The additive inverse.
  public PowerSeries negated() {
    return times(Form.MINUS_ONE);
  }

  /// Every coefficient multiplied by a form free of t.
  public PowerSeries times(Form factor) {
    return of(coefficients.stream().map(c -> c.times(factor)).toList(), valuation, order);
  }

  /// The product; its order is the smaller of order + valuation of the other.
  public PowerSeries times(PowerSeries that) {
    int first = valuation + that.valuation;
    int last = Math.min(order + that.valuation, that.order + valuation);
    int length = Math.max(0, last - first + 1);
    if (isMonomial(valuation)) {
      return that.times(coefficients.getFirst()).shifted(valuation).truncated(last);
    }
    if (that.isMonomial(that.valuation)) {
      return that.times(this);
    }
    return run(
        that,
        first,
        length,
        new Binary() {
          @Override
          public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
            return field.product(a, b, length);
          }
        });
  }

  /// 1/this; the order drops by twice the valuation.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a series that is zero as far as known
  public PowerSeries inverse() {
    if (isZero()) {
      throw new Refusal(Reason.DIVISION_BY_ZERO);
    }
    int length = coefficients.size();
    return run(
        this,
        -valuation,
        length,
        new Binary() {
          @Override
          public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
            return field.inverse(a, length);
          }
        });
  }

  /// The quotient.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for a divisor that is zero as far as known
  public PowerSeries dividedBy(PowerSeries that) {
    return times(that.inverse());
  }

  /// An integer power.
  public PowerSeries power(int exponent) {
    if (exponent == 0) {
      return constant(Form.ONE, Math.max(0, order - valuation));
    }
    if (isZero()) {
      if (exponent < 0) {
        throw new Refusal(Reason.DIVISION_BY_ZERO);
      }
      return zero(Math.multiplyExact(exponent, order + 1) - 1);
    }
    Form lead = coefficients.getFirst().power(exponent);
    return unitPower(Form.of(exponent))
        .times(lead)
        .shifted(Math.multiplyExact(valuation, exponent));
  }

  /// A power with any exponent free of t, of a series with constant term not zero; the constant
  /// term of the power is the principal value of the power of the constant term.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when the valuation is not 0
  public PowerSeries power(Form exponent) {
    Optional<Rational> rational = exponent.asRational();
    if (rational.isPresent() && rational.get().isInteger() && rational.get().fitsInt()) {
      return power(rational.get().intValueExact());
    }
    if (isZero() || valuation != 0) {
      throw new Refusal(Reason.NO_SERIES, "power", exponent);
    }
    return unitPower(exponent).times(Elementary.power(coefficients.getFirst(), exponent));
  }

  /// (this/(c t^v))^exponent, for the leading term c t^v.
  PowerSeries unitPower(Form exponent) {
    Form scale = coefficients.getFirst().inverse();
    PowerSeries unit = shifted(-valuation).times(scale);
    if (exponent.isOne()) {
      return unit;
    }
    if (exponent.equals(Form.MINUS_ONE)) {
      return unit.inverse();
    }
    int length = unit.coefficients.size();
    PowerSeries weight = constant(exponent, 0);
    return unit.run(
        weight,
        0,
        length,
        new Binary() {
          @Override
          public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
            return field.power(a, b.isEmpty() ? field.zero() : b.getFirst(), length);
          }
        });
  }

  /// The exponential; a constant term c contributes the factor e^c.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when there are negative powers
  public PowerSeries exp() {
    if (valuation < 0) {
      throw new Refusal(Reason.NO_SERIES, "exp");
    }
    Form constant = order < 0 ? Form.ZERO : coefficient(0);
    PowerSeries rest = constant.isZero() ? this : minus(constant(constant, order));
    int length = order + 1;
    PowerSeries result;
    if (rest.isMonomial(1)) {
      result = exponential(rest.coefficient(1), order);
    } else {
      result =
          rest.fromZero(
              rest,
              length,
              new Binary() {
                @Override
                public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
                  return field.exp(a, length);
                }
              });
    }
    return constant.isZero() ? result : result.times(Elementary.exp(constant));
  }

  private boolean isMonomial(int k) {
    return !isZero() && valuation == k && coefficients.stream().skip(1).allMatch(Form::isZero);
  }

  /// e^(c t) to the order.
  static PowerSeries exponential(Form c, int order) {
    List<Form> terms = new ArrayList<>();
    Form term = Form.ONE;
    for (int k = 0; k <= order; k++) {
      terms.add(term);
      term = term.times(c).times(Rational.of(1, k + 1));
    }
    return of(terms, 0, order);
  }

  /// The logarithm of a series with constant term not zero.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when the valuation is not 0
  public PowerSeries log() {
    if (isZero() || valuation != 0) {
      throw new Refusal(Reason.NO_SERIES, "ln");
    }
    Form first = coefficients.getFirst();
    int length = order + 1;
    PowerSeries unit = first.isOne() ? this : times(first.inverse());
    PowerSeries rest =
        unit.fromZero(
            unit,
            length,
            new Binary() {
              @Override
              public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
                return field.log(a, length);
              }
            });
    return first.isOne() ? rest : rest.plus(constant(Elementary.ln(first), order));
  }

  /// The derivative by t; the order drops by one.
  public PowerSeries derivative() {
    List<Form> terms = new ArrayList<>();
    for (int k = valuation; k <= order; k++) {
      terms.add(coefficient(k).times(Rational.of(k)));
    }
    return of(terms, valuation - 1, order - 1);
  }

  /// The integral that vanishes at 0; the order rises by one.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when the coefficient of 1/t is not zero
  public PowerSeries integral() {
    List<Form> terms = new ArrayList<>();
    for (int k = valuation; k <= order; k++) {
      if (k == -1) {
        if (!coefficient(k).isZero()) {
          throw new Refusal(Reason.NO_SERIES, "ln");
        }
        terms.add(Form.ZERO);
      } else {
        terms.add(coefficient(k).times(Rational.of(1, k + 1)));
      }
    }
    return of(terms, valuation + 1, order + 1);
  }

  /// this(inner(t)), for an inner series without constant term.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when the inner series has a constant term or negative
  ///   powers
  public PowerSeries compose(PowerSeries inner) {
    if (inner.valuation < 1) {
      throw new Refusal(Reason.NO_SERIES, "composition");
    }
    if (valuation < 0) {
      PowerSeries regular = shifted(-valuation).compose(inner);
      return regular.times(inner.power(valuation));
    }
    long reach = (long) (order + 1) * inner.valuation - 1;
    int last = (int) Math.min(inner.order, reach);
    if (isMonomial(1)) {
      return inner.times(coefficients.getFirst()).truncated(last);
    }
    int length = last + 1;
    return fromZero(
        inner,
        length,
        new Binary() {
          @Override
          public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
            return field.compose(a, b, length);
          }
        });
  }

  /// The compositional inverse of a series c t + …, c not zero.
  ///
  /// @throws Refusal with [Reason#NO_SERIES] when the valuation is not 1
  public PowerSeries reversion() {
    if (valuation != 1) {
      throw new Refusal(Reason.NO_SERIES, "reversion");
    }
    int length = order + 1;
    return fromZero(
        this,
        length,
        new Binary() {
          @Override
          public <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b) {
            return field.reversion(a, length);
          }
        });
  }

  /// An algorithm on two coefficient lists over the same field.
  private interface Binary {
    <T> List<T> apply(CoefficientField<T> field, List<T> a, List<T> b);
  }

  /// Runs an algorithm on the coefficients from the valuations on.
  private PowerSeries run(PowerSeries that, int first, int length, Binary algorithm) {
    if (rationals != null && that.rationals != null) {
      return ofRationalList(
          algorithm.apply(RationalCoefficients.FIELD, rationals, that.rationals),
          first,
          first + length - 1);
    }
    return of(
        algorithm.apply(FormCoefficients.FIELD, coefficients, that.coefficients),
        first,
        first + length - 1);
  }

  /// Runs an algorithm on the coefficients from t^0 on.
  private PowerSeries fromZero(PowerSeries that, int length, Binary algorithm) {
    return padded().run(that.padded(), 0, length, algorithm);
  }

  /// The same coefficients listed from t^0 on, leading zeros included.
  private PowerSeries padded() {
    List<Form> all = coefficients();
    return new PowerSeries(0, order, all, asRationals(all));
  }

  private static PowerSeries ofRationalList(List<Rational> values, int first, int order) {
    return of(values.stream().map(Form::of).toList(), first, order);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof PowerSeries that
        && valuation == that.valuation
        && order == that.order
        && coefficients.equals(that.coefficients);
  }

  @Override
  public int hashCode() {
    return 31 * (31 * valuation + order) + coefficients.hashCode();
  }

  @Override
  public String toString() {
    StringBuilder text = new StringBuilder();
    for (int k = valuation; k <= order; k++) {
      text.append(coefficient(k)).append(" t^").append(k).append(" + ");
    }
    return text.append("O(t^").append(order + 1).append(")").toString();
  }
}
