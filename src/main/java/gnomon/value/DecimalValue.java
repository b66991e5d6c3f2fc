package gnomon.value;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;

/// Correct significant digits of a number; the imaginary part is 0 for a real one.
public record DecimalValue(BigDecimal real, BigDecimal imaginary) implements Value {

  /// The digits of a real number.
  public static DecimalValue of(BigDecimal real) {
    return new DecimalValue(real, BigDecimal.ZERO);
  }

  @Override
  public Sort sort() {
    return Sort.SCALAR;
  }

  /// The number that the digits themselves are.
  public Form digits() {
    return Form.of(exact(real)).plus(Form.of(exact(imaginary)).times(Form.I));
  }

  private static Rational exact(BigDecimal digits) {
    BigInteger unscaled = digits.unscaledValue();
    int scale = digits.scale();
    BigInteger power = BigInteger.TEN.pow(Math.abs(scale));
    return scale >= 0
        ? Rational.of(unscaled, power)
        : Rational.of(unscaled.multiply(power), BigInteger.ONE);
  }

  @Override
  public boolean sameAs(Value other) {
    Optional<Form> that =
        switch (other) {
          case DecimalValue decimal -> Optional.of(decimal.digits());
          case FormValue value -> Optional.of(value.form());
          case OperatorValue _,
              MapValue _,
              FunctionalValue _,
              SeriesValue _,
              ListValue _,
              TableValue _,
              VerdictValue _,
              FormulaValue _,
              FamilyValue _,
              FunctionDefinition _,
              NoneValue _ ->
              Optional.empty();
        };
    return that.filter(digits()::equals).isPresent();
  }
}
