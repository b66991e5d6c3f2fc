package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/// The value of a form where factorials or harmonic numbers in it meet their poles, the negative
/// integers.
///
/// A factorial whose argument u goes to −m is (u+m)!/((u+1)…(u+m)), a harmonic number H(u+m) less
/// 1/(u+1) + … + 1/(u+m), with (u+m)! and H(u+m) regular there. Written so, common factors cancel,
/// and where a denominator other than zero is left, its value is the value of the form: binom(5, 7)
/// is 0, and x!/(x−3)! has its value at every x.
final class KernelLimit {
  private KernelLimit() {}

  private static final int FARTHEST = 20_000;

  static boolean meetsPole(Form form, Map<Generator, Form> images) {
    for (Generator g : form.generators()) {
      if (pole(g, images).isPresent()) {
        return true;
      }
    }
    return false;
  }

  private static Optional<BigInteger> pole(Generator g, Map<Generator, Form> images) {
    Form argument =
        switch (g) {
          case Factorial factorial -> factorial.argument();
          case Harmonic harmonic -> harmonic.argument();
          case Variable _,
              Dual _,
              Constant _,
              AngleConstant _,
              Exponential _,
              Logarithm _,
              Arc _,
              Unknown _,
              Accumulation _,
              CoefficientSeries _,
              InverseSeries _,
              Moment _ ->
              null;
        };
    return argument == null
        ? Optional.empty()
        : argument.substitute(images).asInteger().filter(n -> n.signum() < 0);
  }

  /// The value.
  ///
  /// @throws Refusal with [Reason#POLE] where the form has a pole, with [Reason#LIMIT_UNDECIDED]
  ///   where the rewriting leaves 0/0 or a pole that a symbolic factorial may still cancel
  static Form value(Form form, Map<Generator, Form> images) {
    Map<Generator, Form> all = new HashMap<>(images);
    Form regular =
        form.mapGenerators(
            g -> pole(g, images).map(at -> regular(g, at, all)).orElseGet(() -> Form.of(g)));
    Form bottom = Form.of(regular.denominator()).substitute(all);
    if (!bottom.isZero()) {
      return regular.substitute(all);
    }
    boolean certain =
        form.generators().stream().allMatch(g -> isSettled(g, images))
            && !Form.of(regular.numerator()).substitute(all).isZero();
    throw new Refusal(certain ? Reason.POLE : Reason.LIMIT_UNDECIDED, form);
  }

  private static boolean isSettled(Generator g, Map<Generator, Form> images) {
    return !(g instanceof Factorial factorial)
        || factorial.argument().substitute(images).isConstant();
  }

  private static Form regular(Generator g, BigInteger at, Map<Generator, Form> images) {
    if (at.bitLength() > 15 || at.intValueExact() < -FARTHEST) {
      throw new Refusal(Reason.OUT_OF_RANGE, Form.of(at));
    }
    int m = -at.intValueExact();
    Variable near = new Variable("near " + g.key());
    Form sum = Form.of(near);
    if (g instanceof Factorial factorial) {
      images.put(near, Form.ONE);
      Form shifted = factorial.argument().plus(Form.of(m));
      return sum.dividedBy(Combinatorial.falling(shifted, Form.of(m)));
    }
    Harmonic harmonic = (Harmonic) g;
    images.put(near, Form.ZERO);
    for (int i = 1; i <= m; i++) {
      sum = sum.minus(harmonic.argument().plus(Form.of(i)).power(-harmonic.order()));
    }
    return sum;
  }
}
