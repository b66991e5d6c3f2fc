package gnomon.decimal;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.function.Function;
import org.apfloat.Apfloat;

/// The decimal digits of a constant: real and imaginary part, each with the stated number of
/// significant digits, all of them correct.
///
/// Rounding is to nearest, ties to the even digit; a tie can only arise for a rational part, which
/// is rounded exactly.
///
/// @param real the real part
/// @param imaginary the imaginary part, 0 for a real constant
public record Digits(BigDecimal real, BigDecimal imaginary) {

  /// The largest number of digits given.
  public static final int MOST = 20_000;

  private static final int GUARD = 20;

  /// The digits of a constant.
  ///
  /// The constant is computed with guard digits and an error bound, and again with more of them
  /// until the bound decides the rounding.
  ///
  /// @throws Refusal with [Reason#NOT_CONSTANT] where a variable or unknown function occurs, with
  ///   [Reason#NO_DIGITS] for a kernel without a numerical method, with [Reason#OUT_OF_RANGE]
  ///   unless `count` is 1 to [#MOST], and with [Reason#DIGITS_UNDECIDED] when four times the
  ///   precision did not settle them
  public static Digits of(Form constant, int count) {
    if (count < 1 || count > MOST) {
      throw new Refusal(Reason.OUT_OF_RANGE, Form.of(count));
    }
    if (!constant.isConstant()) {
      throw new Refusal(Reason.NOT_CONSTANT, constant);
    }
    Budget.charge(count);
    Optional<Form> conjugate = Conjugate.of(constant);
    if (conjugate.isEmpty()) {
      return new Digits(
          part(constant, count, ball -> ball.middle().real()),
          part(constant, count, ball -> ball.middle().imag()));
    }
    Form sum = constant.plus(conjugate.get()).times(Rational.HALF);
    Form difference = constant.minus(conjugate.get()).dividedBy(Form.I.times(Form.TWO));
    return new Digits(real(sum, count), real(difference, count));
  }

  /// Whether digits prove that the constant is not 0; false when they cannot tell.
  public static boolean proveNonzero(Form constant) {
    try {
      Digits digits = of(constant, 1);
      return digits.real.signum() != 0 || digits.imaginary.signum() != 0;
    } catch (Refusal undecided) {
      return false;
    }
  }

  /// Whether the constant is real.
  public boolean isReal() {
    return imaginary.signum() == 0;
  }

  /// The digits of a form that is exactly real.
  private static BigDecimal real(Form form, int count) {
    Optional<Rational> rational = form.asRational();
    return rational.isPresent()
        ? rounded(rational.get(), count)
        : part(form, count, ball -> ball.middle().real());
  }

  private static BigDecimal rounded(Rational value, int count) {
    return new BigDecimal(value.numerator())
        .divide(new BigDecimal(value.denominator()), context(count));
  }

  private static MathContext context(int count) {
    return new MathContext(count, RoundingMode.HALF_EVEN);
  }

  private static BigDecimal part(Form form, int count, Function<Ball, Apfloat> part) {
    long most = 4L * count + 400;
    for (long precision = count + (long) GUARD; precision <= most; precision += precision / 2) {
      Budget.checkpoint();
      try {
        Ball ball = new Approximation(precision).of(form);
        Optional<BigDecimal> digits = decided(decimal(part.apply(ball)), ball.radius(), count);
        if (digits.isPresent()) {
          return digits.get();
        }
      } catch (Undecided tooCoarse) {
        continue;
      }
    }
    throw new Refusal(Reason.DIGITS_UNDECIDED, form, Form.of(most));
  }

  /// The rounding of every number within the radius, when it is the same for all and not 0.
  private static Optional<BigDecimal> decided(BigDecimal middle, Apfloat radius, int count) {
    BigDecimal error = decimal(radius);
    BigDecimal low = middle.subtract(error).round(context(count));
    BigDecimal high = middle.add(error).round(context(count));
    return low.signum() != 0 && low.compareTo(high) == 0 ? Optional.of(low) : Optional.empty();
  }

  private static BigDecimal decimal(Apfloat value) {
    return new BigDecimal(value.toString());
  }
}
