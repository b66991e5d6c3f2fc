package gnomon.render;

import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/// Finds binomial coefficients a!/(b! (a − b)!) and factorial powers, falling a!/(a − n)! and
/// rising (a + n − 1)!/(a − 1)!, in a product of powers of factorials.
final class FactorialNotation {
  /// A coefficient and a product of kernels, with the same product as before.
  record Rewritten(Form coefficient, Monomial kernel) {}

  private static final int MOST_ABSORBED = 20;

  private final Lexicon lexicon;
  private final KernelNotation kernels;
  private final Map<Form, Integer> exponents = new TreeMap<>();
  private Form coefficient;
  private Monomial kernel;

  private FactorialNotation(
      Form coefficient, Monomial kernel, Lexicon lexicon, KernelNotation kernels) {
    this.coefficient = coefficient;
    this.kernel = kernel;
    this.lexicon = lexicon;
    this.kernels = kernels;
    for (Monomial.Power power : kernel.factors()) {
      if (power.indeterminate() instanceof Factorial(Form argument) && power.exponent().fitsInt()) {
        exponents.put(argument, power.exponent().intValueExact());
      }
    }
  }

  /// The coefficient and the kernels with stand-ins for what was found.
  static Rewritten rewrite(
      Form coefficient, Monomial kernel, Lexicon lexicon, KernelNotation kernels) {
    FactorialNotation search = new FactorialNotation(coefficient, kernel, lexicon, kernels);
    if (search.exponents.size() > 1) {
      search.binomials();
      search.powers();
    }
    if (search.exponents.size() > 1) {
      search.binomialsOfNumbers();
    }
    search.exponents.keySet().stream().toList().forEach(search::absorb);
    return new Rewritten(search.coefficient, search.kernel);
  }

  private List<Form> above() {
    return exponents.entrySet().stream()
        .filter(e -> e.getValue() > 0)
        .map(Map.Entry::getKey)
        .sorted(Comparator.comparing(FactorialNotation::length).reversed())
        .toList();
  }

  private List<Form> below() {
    return exponents.entrySet().stream()
        .filter(e -> e.getValue() < 0)
        .map(Map.Entry::getKey)
        .sorted(Comparator.comparing(FactorialNotation::length))
        .toList();
  }

  private static int length(Form form) {
    return form.numerator().size() + form.denominator().size();
  }

  private void binomials() {
    for (Form a : new ArrayList<>(above())) {
      while (exponents.getOrDefault(a, 0) > 0 && binomial(a)) {
        // each round takes one binomial coefficient out
      }
    }
  }

  private boolean binomial(Form a) {
    for (Form b : below()) {
      Form c = a.minus(b);
      int needed = b.equals(c) ? -2 : -1;
      if (exponents.get(b) <= needed && exponents.getOrDefault(c, 0) <= needed) {
        take(a, 1);
        take(b, -1);
        take(c, -1);
        putBinomial(a, b);
        return true;
      }
    }
    return false;
  }

  /// 1/(b! c!) with b + c = s for a whole number s ≥ 0 is binom(s, b)/s!, after factors of the
  /// coefficient are taken into the factorials.
  private void binomialsOfNumbers() {
    for (Form b : below().reversed()) {
      for (Form c : below()) {
        boolean positive = b.numerator().terms().getFirst().coefficient().sign() > 0;
        boolean single = exponents.get(b) == -1 && exponents.get(c) == -1;
        if (positive && single && b.plus(c).asInteger().isPresent() && binomialOfNumber(b, c)) {
          return;
        }
      }
    }
  }

  private boolean binomialOfNumber(Form b, Form c) {
    Form before = coefficient;
    Form lower = taken(b, -1);
    Form rest = taken(c, -1);
    Optional<Integer> sum = lower.plus(rest).asInt().filter(s -> s >= 0 && s <= MOST_ABSORBED);
    if (sum.isEmpty()) {
      coefficient = before;
      return false;
    }
    take(b, -1);
    take(c, -1);
    coefficient = coefficient.times(Rational.of(Integers.factorial(sum.get())).inverse());
    put(
        "binom(" + sum.get() + "," + lower.key() + ")",
        new Notation.Binomial(kernels.inner(Form.of(sum.get())), kernels.inner(lower)));
    return true;
  }

  /// binom(a, b), with a factor (a+1)/(b+1), (a+1)/(a−b+1), b/a or (a−b)/a of the coefficient drawn
  /// into it.
  private void putBinomial(Form a, Form b) {
    Form upper = a;
    Form lower = b;
    for (int steps = 0; steps < MOST_ABSORBED; steps++) {
      Form up = upper.plus(Form.ONE);
      Form rest = upper.minus(lower);
      if (hasQuotient(up, lower.plus(Form.ONE))) {
        coefficient = coefficient.times(lower.plus(Form.ONE)).dividedBy(up);
        upper = up;
        lower = lower.plus(Form.ONE);
      } else if (hasQuotient(up, rest.plus(Form.ONE))) {
        coefficient = coefficient.times(rest.plus(Form.ONE)).dividedBy(up);
        upper = up;
      } else if (hasQuotient(lower, upper)) {
        coefficient = coefficient.times(upper).dividedBy(lower);
        upper = upper.minus(Form.ONE);
        lower = lower.minus(Form.ONE);
      } else if (hasQuotient(rest, upper)) {
        coefficient = coefficient.times(upper).dividedBy(rest);
        upper = upper.minus(Form.ONE);
      } else {
        break;
      }
    }
    put(
        "binom(" + upper.key() + "," + lower.key() + ")",
        new Notation.Binomial(kernels.inner(upper), kernels.inner(lower)));
  }

  private boolean hasQuotient(Form above, Form below) {
    return !above.equals(below)
        && !above.isConstant()
        && !below.isConstant()
        && isDivisible(coefficient.numerator(), above)
        && isDivisible(coefficient.denominator(), below);
  }

  private void powers() {
    for (Form a : new ArrayList<>(above())) {
      Optional<Form> partner = below().stream().filter(b -> isPower(a, b)).findFirst();
      partner.ifPresent(b -> power(a, b));
    }
  }

  /// Whether a!/b! is better written as a factorial power: a and b are related and the index is not
  /// more complicated than b.
  private static boolean isPower(Form a, Form b) {
    int index = length(a.minus(b));
    return index < length(b) || index < length(a);
  }

  private void power(Form a, Form b) {
    Form index = a.minus(b);
    take(a, 1);
    take(b, -1);
    boolean falling = length(a) <= length(b);
    Form base = a;
    if (!falling) {
      base = b.plus(Form.ONE);
      if (isDivisible(coefficient.numerator(), b) && isDivisible(coefficient.denominator(), a)) {
        coefficient = coefficient.times(a).dividedBy(b);
        base = b;
      }
    }
    Notation notation =
        new Notation.FactorialPower(kernels.inner(base), kernels.inner(index), falling);
    put((falling ? "falling(" : "rising(") + base.key() + "," + index.key() + ")", notation);
  }

  /// Writes (n + 1) n! as (n + 1)! and n!/n as (n − 1)!, for a factorial or its reciprocal.
  private void absorb(Form argument) {
    int exponent = exponents.get(argument);
    if (Math.abs(exponent) != 1) {
      return;
    }
    Form last = taken(argument, exponent);
    if (!last.equals(argument)) {
      take(argument, exponent);
      Notation factorial = new Notation.Factorial(kernels.inner(last));
      Form standIn = lexicon.standIn("(" + last.key() + ")!", factorial, Lexicon.Role.KERNEL);
      kernel =
          kernel.times(Monomial.of(standIn.asGenerator().orElseThrow(), Rational.of(exponent)));
    }
  }

  /// The argument of the factorial, or its reciprocal, that has factors of the coefficient taken
  /// in; they are taken out of the coefficient.
  private Form taken(Form argument, int exponent) {
    Form last = argument;
    for (int steps = 0; steps < MOST_ABSORBED; steps++) {
      Form next = last.plus(Form.ONE);
      Form outer = exponent > 0 ? coefficient : coefficient.inverse();
      if (isDivisible(outer.numerator(), next)) {
        coefficient = exponent > 0 ? coefficient.dividedBy(next) : coefficient.times(next);
        last = next;
      } else if (isDivisible(outer.denominator(), last)) {
        coefficient = exponent > 0 ? coefficient.times(last) : coefficient.dividedBy(last);
        last = last.minus(Form.ONE);
      } else {
        break;
      }
    }
    return last;
  }

  private static boolean isDivisible(gnomon.polynomial.Polynomial polynomial, Form by) {
    return by.isPolynomial() && polynomial.tryDividedBy(by.numerator()).isPresent();
  }

  private void take(Form argument, int sign) {
    exponents.merge(argument, -sign, Integer::sum);
    kernel = kernel.times(Monomial.of(new Factorial(argument), Rational.of(-sign)));
  }

  private void put(String key, Notation notation) {
    Form standIn = lexicon.standIn(key, notation, Lexicon.Role.KERNEL);
    kernel = kernel.times(Monomial.of(standIn.asGenerator().orElseThrow(), Rational.ONE));
  }
}
