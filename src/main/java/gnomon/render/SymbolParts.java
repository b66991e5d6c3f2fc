package gnomon.render;

import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// A symbol a(x, t) taken apart into a sum of products l(x) r(t), each r with a different
/// direction.
record SymbolParts(List<Part> parts) {
  /// One product: a function of the variables, to the left of an operator that does not see them.
  record Part(Form left, Form right) {}

  /// The parts of the symbol, where its denominator and its kernels separate.
  static Optional<SymbolParts> of(Form symbol, Variable main) {
    Set<Generator> left = new HashSet<>(Set.of(main));
    symbol.duals().forEach(dual -> left.add(dual.of()));
    Polynomial xOnly = Polynomial.ONE;
    Polynomial tOnly = Polynomial.ONE;
    for (Factor factor : separated(symbol.denominator(), left)) {
      Polynomial power = factor.base().power(factor.multiplicity());
      boolean sees = sees(factor.base(), left);
      if (sees && hasDuals(factor.base())) {
        return Optional.empty();
      }
      xOnly = sees ? xOnly.times(power) : xOnly;
      tOnly = sees ? tOnly : tOnly.times(power);
    }
    Map<Monomial, Polynomial> byLeft = new LinkedHashMap<>();
    for (Term term : symbol.numerator().terms()) {
      Monomial outer = Monomial.ONE;
      for (Monomial.Power power : term.monomial().factors()) {
        Generator generator = (Generator) power.indeterminate();
        boolean sees = left.stream().anyMatch(generator::dependsOn);
        if (sees && hasDuals(generator)) {
          return Optional.empty();
        }
        outer = sees ? outer.times(Monomial.of(generator, power.exponent())) : outer;
      }
      Polynomial inner = Polynomial.of(term.monomial().dividedBy(outer), term.coefficient());
      byLeft.merge(outer, inner, Polynomial::plus);
    }
    return Optional.of(gathered(byLeft, xOnly, tOnly));
  }

  private static SymbolParts gathered(
      Map<Monomial, Polynomial> byLeft, Polynomial xOnly, Polynomial tOnly) {
    Map<Form, Form> byRight = new LinkedHashMap<>();
    for (Map.Entry<Monomial, Polynomial> entry : byLeft.entrySet()) {
      Polynomial inner = entry.getValue();
      Rational content = inner.content();
      Rational sign =
          inner.terms().getFirst().coefficient().sign() < 0
              ? content.abs().negated()
              : content.abs();
      Form right = Form.fraction(inner.times(sign.inverse()), tOnly);
      Form left = Form.fraction(Polynomial.of(entry.getKey(), sign), xOnly);
      byRight.merge(right, left, Form::plus);
    }
    List<Part> parts = new ArrayList<>();
    byRight.forEach((right, left) -> parts.add(new Part(left, right)));
    return new SymbolParts(parts);
  }

  private static List<Factor> separated(Polynomial denominator, Set<Generator> left) {
    boolean mixed = sees(denominator, left) && hasDuals(denominator);
    return mixed ? denominator.factor().factors() : List.of(new Factor(denominator, 1));
  }

  private static boolean sees(Polynomial polynomial, Set<Generator> left) {
    return polynomial.indeterminates().stream()
        .anyMatch(g -> left.stream().anyMatch(v -> ((Generator) g).dependsOn(v)));
  }

  private static boolean hasDuals(Polynomial polynomial) {
    return polynomial.indeterminates().stream().anyMatch(g -> hasDuals((Generator) g));
  }

  private static boolean hasDuals(Generator generator) {
    boolean[] found = {false};
    generator.atoms(atom -> found[0] |= atom instanceof Dual);
    return found[0];
  }
}
