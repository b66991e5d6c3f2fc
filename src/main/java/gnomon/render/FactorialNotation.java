package gnomon.render;

import gnomon.form.Factorial;
import gnomon.form.Form;
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
        Notation notation = new Notation.Binomial(kernels.inner(a), kernels.inner(b));
        take(a, 1);
        take(b, -1);
        take(c, -1);
        put("binom(" + a.key() + "," + b.key() + ")", notation);
        return true;
      }
    }
    return false;
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
    if (!last.equals(argument)) {
      take(argument, exponent);
      Notation factorial = new Notation.Factorial(kernels.inner(last));
      Form standIn = lexicon.standIn("(" + last.key() + ")!", factorial, Lexicon.Role.KERNEL);
      kernel =
          kernel.times(Monomial.of(standIn.asGenerator().orElseThrow(), Rational.of(exponent)));
    }
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
