package gnomon.form;

import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;

/// A Gaussian rational re + im·i with im ≠ 0, in polar decomposition.
///
/// b^u = |b|^u e^(iθu) with the principal argument θ in (−π, π]; θ is written exactly as a
/// combination of π/4 and the angles of Gaussian primes. Which multiple of 2π makes it principal is
/// found by counting quadrants while multiplying, without approximation.
record Gaussian(Rational re, Rational im) {

  static Optional<Gaussian> of(Form form) {
    if (!form.denominator().isOne()) {
      return Optional.empty();
    }
    for (Indeterminate g : form.numerator().indeterminates()) {
      if (!g.equals(Constant.I)) {
        return Optional.empty();
      }
    }
    Map<Rational, Polynomial> parts = form.numerator().coefficients(Constant.I);
    Polynomial imaginary = parts.get(Rational.ONE);
    if (imaginary == null) {
      return Optional.empty();
    }
    Polynomial real = parts.getOrDefault(Rational.ZERO, Polynomial.ZERO);
    return Optional.of(
        new Gaussian(real.asConstant().orElseThrow(), imaginary.asConstant().orElseThrow()));
  }

  Decomposition decomposition() {
    Decomposition.Collector collector = new Decomposition.Collector();
    Rational norm = re.times(re).plus(im.times(im));
    Decomposition.Collector modulus = new Decomposition.Collector();
    modulus.rational(norm);
    for (Decomposition.Part part : modulus.decomposition().parts()) {
      collector.add(part.base(), part.exponent().times(Rational.HALF));
    }
    BigInteger common = re.denominator().multiply(im.denominator());
    BigInteger a = re.times(Rational.of(common)).numerator();
    BigInteger b = im.times(Rational.of(common)).numerator();
    BigInteger g = a.gcd(b);
    a = a.divide(g);
    b = b.divide(g);
    Walk walk = new Walk();
    BigInteger size = a.multiply(a).add(b.multiply(b));
    for (Map.Entry<BigInteger, Integer> prime : Integers.primeFactors(size).entrySet()) {
      BigInteger p = prime.getKey();
      BigInteger[] root =
          p.equals(BigInteger.TWO) ? new BigInteger[] {BigInteger.ONE, BigInteger.ONE} : split(p);
      // a + bi is primitive, so only one of the two conjugate primes above p divides it
      boolean divides =
          a.multiply(root[0]).add(b.multiply(root[1])).mod(p).signum() == 0
              && b.multiply(root[0]).subtract(a.multiply(root[1])).mod(p).signum() == 0;
      int times = divides ? prime.getValue() : -prime.getValue();
      walk.step(root[0], root[1], times);
      if (p.equals(BigInteger.TWO)) {
        walk.eighths += times;
      } else {
        collector.add(new Base.GaussianAngle(root[0], root[1]), Form.of(times));
      }
    }
    Rational turn = Rational.of(walk.eighths, 4).plus(Rational.of(walk.quartersTo(a, b), 2));
    collector.add(Base.TURN, Form.of(turn));
    return collector.decomposition();
  }

  /// The A > B > 0 with A² + B² = p, for a prime p = 1 mod 4.
  private static BigInteger[] split(BigInteger p) {
    BigInteger root = rootOfMinusOne(p);
    BigInteger x = p;
    BigInteger y = root;
    while (y.multiply(y).compareTo(p) > 0) {
      BigInteger rest = x.mod(y);
      x = y;
      y = rest;
    }
    BigInteger z = p.subtract(y.multiply(y)).sqrt();
    return y.compareTo(z) > 0 ? new BigInteger[] {y, z} : new BigInteger[] {z, y};
  }

  private static BigInteger rootOfMinusOne(BigInteger p) {
    BigInteger quarter = p.subtract(BigInteger.ONE).shiftRight(2);
    BigInteger minusOne = p.subtract(BigInteger.ONE);
    for (BigInteger base = BigInteger.TWO; ; base = base.add(BigInteger.ONE)) {
      BigInteger candidate = base.modPow(quarter, p);
      if (candidate.multiply(candidate).mod(p).equals(minusOne)) {
        return candidate;
      }
    }
  }

  /// A product of Gaussian primes with its total angle counted in quadrants.
  private static final class Walk {
    private BigInteger re = BigInteger.ONE;
    private BigInteger im = BigInteger.ZERO;
    private long quadrant;
    private int eighths;

    /// Multiplies by a + bi, |times| times; by its conjugate where times is negative.
    void step(BigInteger a, BigInteger b, int times) {
      BigInteger c = times < 0 ? b.negate() : b;
      for (int i = 0; i < Math.abs(times); i++) {
        BigInteger x = re.multiply(a).subtract(im.multiply(c));
        BigInteger y = re.multiply(c).add(im.multiply(a));
        re = x;
        im = y;
        int now = quadrant(re, im);
        int change = Math.floorMod(now - (int) Math.floorMod(quadrant, 4L), 4);
        quadrant += change == 3 ? -1 : change;
      }
    }

    /// How many quarter turns lead from the product's counted angle to the principal argument of a
    /// + bi, which differs from the product by a power of i and a positive factor.
    long quartersTo(BigInteger a, BigInteger b) {
      int target = quadrant(a, b);
      int principal = target >= 2 ? target - 4 : target;
      if (b.signum() == 0 && a.signum() < 0) {
        principal = 2;
      }
      return principal - quadrant;
    }

    /// The number of quarter turns below the argument of x + yi, in 0..3.
    private static int quadrant(BigInteger x, BigInteger y) {
      if (x.signum() > 0 && y.signum() >= 0) {
        return 0;
      }
      if (x.signum() <= 0 && y.signum() > 0) {
        return 1;
      }
      return x.signum() < 0 ? 2 : 3;
    }
  }
}
