package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.polynomial.Term;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/// The integers at which a polynomial in one variable vanishes whatever its parameters are.
///
/// Its coefficients are combinations of monomials in the other generators, which are independent
/// over ℚ; an integer is a root where the polynomial in front of each monomial vanishes.
public final class IntegerRoots {
  private IntegerRoots() {}

  /// The integer roots of a form that is a nonzero polynomial in v over what is free of v.
  public static SortedSet<BigInteger> of(Form form, Variable v) {
    Map<Monomial, Polynomial> parts = new LinkedHashMap<>();
    for (Term term : form.numerator().terms()) {
      Rational exponent = term.monomial().exponent(v);
      Monomial power = Monomial.of(v, exponent);
      parts.merge(
          term.monomial().dividedBy(power),
          Polynomial.of(power, term.coefficient()),
          Polynomial::plus);
    }
    SortedSet<BigInteger> roots = new TreeSet<>();
    List<Polynomial> all = new ArrayList<>(parts.values());
    if (all.isEmpty()) {
      return roots;
    }
    for (Factor factor : all.getFirst().factor().factors()) {
      root(Form.of(factor.base()), v).ifPresent(roots::add);
    }
    roots.removeIf(root -> !all.stream().allMatch(part -> vanishes(part, v, root)));
    return roots;
  }

  private static Optional<BigInteger> root(Form base, Variable v) {
    Optional<List<Form>> list = Structure.asPolynomial(base, v);
    return list.filter(l -> l.size() == 2)
        .flatMap(l -> l.getFirst().dividedBy(l.getLast()).negated().asInteger());
  }

  private static boolean vanishes(Polynomial part, Variable v, BigInteger root) {
    return part.substitute(v, Polynomial.of(Rational.of(root))).isZero();
  }
}
