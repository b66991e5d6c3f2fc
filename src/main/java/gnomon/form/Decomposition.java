package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Factorization;
import gnomon.polynomial.Indeterminate;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// A nonzero form as a product of powers of independent bases.
///
/// @param parts base and exponent, the bases distinct
record Decomposition(List<Part> parts) {

  /// A base and its exponent.
  record Part(Base base, Form exponent) {}

  /// The number of bits up to which an integer is split into primes.
  private static final int PRIME_BITS = 128;

  static Decomposition of(Form form) {
    Optional<Gaussian> gaussian = Gaussian.of(form);
    if (gaussian.isPresent()) {
      return gaussian.get().decomposition();
    }
    Collector collector = new Collector();
    Factorization top = form.numerator().factor();
    Factorization bottom = form.denominator().factor();
    List<Factor> plain = new ArrayList<>();
    collector.split(top, 1, plain);
    collector.split(bottom, -1, plain);
    Rational unit = top.unit().dividedBy(bottom.unit());
    boolean negative = unit.sign() < 0;
    for (Factor factor : plain) {
      boolean flip = negativeAtZero(factor.base());
      Polynomial base = flip ? factor.base().negated() : factor.base();
      negative ^= flip && factor.multiplicity() % 2 != 0;
      collector.add(new Base.Of(Form.of(base)), Form.of(factor.multiplicity()));
    }
    if (negative && !collector.flipFirstOdd()) {
      collector.add(Base.TURN, Form.ONE);
    }
    collector.rational(unit.abs());
    return collector.decomposition();
  }

  /// Whether a polynomial in duals and constants alone is negative where all duals are 0: as a
  /// power series its sign is then turned.
  private static boolean negativeAtZero(Polynomial polynomial) {
    Form form = Form.of(polynomial);
    if (form.duals().isEmpty() || !form.variables().isEmpty()) {
      return false;
    }
    try {
      Map<Generator, Form> origin = new LinkedHashMap<>();
      form.duals().forEach(dual -> origin.put(dual, Form.ZERO));
      return form.substitute(origin).asRational().map(r -> r.sign() < 0).orElse(false);
    } catch (Refusal _) {
      return false;
    }
  }

  /// Gathers parts with equal bases.
  static final class Collector {
    private final Map<Base, Form> parts = new LinkedHashMap<>();

    void add(Base base, Form exponent) {
      parts.merge(base, exponent, Form::plus);
    }

    /// Single generators go to the parts, other factors to the list.
    void split(Factorization factorization, int sign, List<Factor> plain) {
      for (Factor factor : factorization.factors()) {
        if (factor.base().size() == 1) {
          for (Monomial.Power power : factor.base().terms().getFirst().monomial().factors()) {
            Rational multiplicity = Rational.of((long) sign * factor.multiplicity());
            generator(power.indeterminate(), power.exponent().times(multiplicity));
          }
        } else {
          plain.add(new Factor(factor.base(), sign * factor.multiplicity()));
        }
      }
    }

    private void generator(Indeterminate g, Rational exponent) {
      if (g.equals(Constant.I)) {
        add(Base.TURN, Form.of(exponent.times(Rational.HALF)));
      } else if (g instanceof Exponential power) {
        add(power.base(), power.unit().times(exponent));
      } else {
        add(new Base.Of(Form.of((Generator) g)), Form.of(exponent));
      }
    }

    /// Turns the sign of the first polynomial base with odd multiplicity, if there is one.
    boolean flipFirstOdd() {
      for (Map.Entry<Base, Form> part : parts.entrySet()) {
        if (part.getKey() instanceof Base.Of(Form form)
            && form.numerator().size() > 1
            && form.duals().isEmpty()
            && part.getValue().asInteger().filter(n -> n.testBit(0)).isPresent()) {
          Form exponent = part.getValue();
          parts.remove(part.getKey());
          add(new Base.Of(form.negated()), exponent);
          return true;
        }
      }
      return false;
    }

    void rational(Rational value) {
      integer(value.numerator(), 1);
      integer(value.denominator(), -1);
    }

    private void integer(BigInteger value, int sign) {
      if (value.equals(BigInteger.ONE)) {
        return;
      }
      if (value.bitLength() > PRIME_BITS) {
        Integers.PerfectPower power = Integers.perfectPower(value);
        if (power.base().bitLength() > PRIME_BITS) {
          throw new Refusal(Reason.FACTORING_LIMIT, Form.of(value));
        }
        primes(power.base(), sign * power.exponent());
      } else {
        primes(value, sign);
      }
    }

    private void primes(BigInteger value, int times) {
      Integers.primeFactors(value)
          .forEach((p, m) -> add(new Base.Prime(p), Form.of((long) m * times)));
    }

    Decomposition decomposition() {
      List<Part> list = new ArrayList<>();
      parts.forEach(
          (base, exponent) -> {
            if (!exponent.isZero()) {
              list.add(new Part(base, exponent));
            }
          });
      return new Decomposition(List.copyOf(list));
    }
  }
}
