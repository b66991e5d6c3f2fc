package gnomon.recurrence;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/// The rational solutions of a linear differential equation with rational coefficients and a
/// rational right side.
///
/// A solution has poles only at zeros of the leading coefficient and of the denominator of the
/// right side; at a linear factor x − α the order of the pole is bounded by the least negative
/// integer root of the indicial equation. Other factors are taken not to occur, and the search is
/// then not exhaustive.
///
/// Source: the method of Frobenius (1873), as in textbooks, from memory.
///
/// @param particular one solution, where there is any
/// @param homogeneous a basis of those for the right side 0 that were found
/// @param exhaustive whether there are no others
record RationalDifferential(Optional<Form> particular, List<Form> homogeneous, boolean exhaustive) {

  private static final Variable S = new Variable("s'");

  static RationalDifferential of(LinearEquation equation) {
    LinearEquation cleared = equation.cleared();
    Variable x = equation.variable();
    Form places = cleared.leading().times(Form.of(cleared.rightSide().denominator()));
    Set<Form> factors = new LinkedHashSet<>(ShiftFactors.of(places, x).factors());
    boolean exhaustive = cleared.coefficients().stream().allMatch(ShiftFactors::isWithoutRadicals);
    Form u = Form.ONE;
    for (Form factor : factors) {
      List<Form> list = Structure.asPolynomial(factor, x).orElseThrow();
      if (list.size() == 2) {
        Form root = list.getFirst().dividedBy(list.getLast()).negated();
        u = u.times(factor.power(poleOrder(cleared, root)));
      } else {
        exhaustive = false;
      }
    }
    PolynomialSolutions found = PolynomialSolutions.of(multiplied(cleared, u.inverse()));
    Form denominator = u;
    return new RationalDifferential(
        found.particular().map(z -> z.dividedBy(denominator)),
        found.homogeneous().stream().map(z -> z.dividedBy(denominator)).toList(),
        exhaustive);
  }

  /// The equation for z with y = w z, denominators cleared.
  static LinearEquation multiplied(LinearEquation equation, Form w) {
    List<Form> derivatives = new ArrayList<>(List.of(w));
    for (int i = 1; i <= equation.order(); i++) {
      derivatives.add(derivatives.getLast().derivative(equation.variable()));
    }
    List<Form> coefficients = new ArrayList<>();
    for (int j = 0; j <= equation.order(); j++) {
      Form sum = Form.ZERO;
      for (int i = j; i <= equation.order(); i++) {
        Form part = equation.coefficients().get(i).times(derivatives.get(i - j));
        sum = sum.plus(part.times(Rational.of(Integers.binomial(i, j))));
      }
      coefficients.add(sum);
    }
    LinearEquation product =
        new LinearEquation(
            equation.action(), equation.variable(), coefficients, equation.rightSide());
    Polynomial denominator = product.rightSide().denominator();
    for (Form c : coefficients) {
      denominator = Polynomial.lcm(denominator, c.denominator());
    }
    return product.scaled(Form.of(denominator));
  }

  /// How high the order of a pole at the root can be.
  private static int poleOrder(LinearEquation equation, Form root) {
    Variable x = equation.variable();
    Form moved = Form.of(x).plus(root);
    int lowest = Integer.MAX_VALUE;
    List<Form> lists = new ArrayList<>();
    List<Integer> valuations = new ArrayList<>();
    for (int i = 0; i <= equation.order(); i++) {
      Form c = equation.coefficients().get(i).substitute(x, moved);
      List<Form> list = Structure.asPolynomial(c, x).orElseThrow();
      int valuation = 0;
      while (valuation < list.size() && list.get(valuation).isZero()) {
        valuation++;
      }
      boolean zero = valuation == list.size();
      lists.add(zero ? Form.ZERO : list.get(valuation));
      valuations.add(valuation - i);
      lowest = zero ? lowest : Math.min(lowest, valuation - i);
    }
    Form indicial = Form.ZERO;
    Form falling = Form.ONE;
    for (int i = 0; i <= equation.order(); i++) {
      if (valuations.get(i) == lowest) {
        indicial = indicial.plus(lists.get(i).times(falling));
      }
      falling = falling.times(Form.of(S).minus(Form.of(i)));
    }
    int order = poleOfRightSide(equation, moved) + lowest;
    for (BigInteger s : IntegerRoots.of(indicial, S)) {
      order = Math.max(order, s.bitLength() < 10 ? -s.intValueExact() : 0);
    }
    return Math.max(order, 0);
  }

  private static int poleOfRightSide(LinearEquation equation, Form moved) {
    Variable x = equation.variable();
    Form below = Form.of(equation.rightSide().denominator()).substitute(x, moved);
    List<Form> list = Structure.asPolynomial(below, x).orElseThrow();
    int order = 0;
    while (list.get(order).isZero()) {
      order++;
    }
    return order;
  }
}
