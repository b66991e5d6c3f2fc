package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// A polynomial in one variable with integer coefficients, for fast values at integers.
///
/// @param coefficients ascending
public record IntegerPolynomial(List<BigInteger> coefficients) {
  public IntegerPolynomial {
    coefficients = List.copyOf(coefficients);
  }

  /// The forms, polynomials in v with rational coefficients, times the common denominator of all.
  public static Optional<List<IntegerPolynomial>> together(List<Form> forms, Variable v) {
    List<List<Rational>> lists = new ArrayList<>();
    BigInteger denominator = BigInteger.ONE;
    for (Form form : forms) {
      Optional<List<Form>> list = Structure.asPolynomial(form, v);
      if (list.isEmpty() || list.get().stream().anyMatch(c -> c.asRational().isEmpty())) {
        return Optional.empty();
      }
      List<Rational> numbers = list.get().stream().map(c -> c.asRational().orElseThrow()).toList();
      for (Rational number : numbers) {
        BigInteger gcd = denominator.gcd(number.denominator());
        denominator = denominator.multiply(number.denominator().divide(gcd));
      }
      lists.add(numbers);
    }
    Rational scale = Rational.of(denominator);
    return Optional.of(
        lists.stream()
            .map(
                l ->
                    new IntegerPolynomial(l.stream().map(c -> c.times(scale).numerator()).toList()))
            .toList());
  }

  /// The value at an integer.
  public BigInteger at(BigInteger point) {
    BigInteger value = BigInteger.ZERO;
    for (int i = coefficients.size() - 1; i >= 0; i--) {
      value = value.multiply(point).add(coefficients.get(i));
    }
    return value;
  }

  /// Whether it has a zero at an integer from `first` to `last`.
  public boolean vanishesBetween(BigInteger first, BigInteger last) {
    Variable z = new Variable("z'");
    List<Form> forms = coefficients.stream().map(Form::of).toList();
    Form form = Structure.polynomial(forms, z);
    return form.isZero()
        || !IntegerRoots.of(form, z).subSet(first, last.add(BigInteger.ONE)).isEmpty();
  }
}
