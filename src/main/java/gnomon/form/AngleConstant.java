package gnomon.form;

import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.Map;
import java.util.function.Consumer;

/// The angle arctan(im/re) of a Gaussian prime re + im·i in the open first half-quadrant.
///
/// Angles of distinct such primes are independent over ℚ of one another and of π, since Gaussian
/// integers factor uniquely.
public record AngleConstant(BigInteger re, BigInteger im) implements Generator {

  @Override
  public String key() {
    return "angle(" + re + "," + im + ")";
  }

  @Override
  public int rank() {
    return 10;
  }

  @Override
  public Form derivative(Generator v) {
    return Form.ZERO;
  }

  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    return Form.of(this, exponent);
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    // a constant is made of no variable
  }
}
