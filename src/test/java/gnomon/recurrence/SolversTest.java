package gnomon.recurrence;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.law.Seeded;
import gnomon.number.Rational;
import gnomon.operator.Summation;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// Equations made from their solutions, which the solvers must find again.
final class SolversTest {
  private static final Variable N = new Variable("n");
  private static final Form n = Form.of(N);

  private static SolutionSpace solved(LinearEquation equation) {
    return equation.action() == LinearEquation.Action.SHIFT
        ? new RecurrenceSolver(Summation.NONE, Optional.empty()).solve(equation)
        : DifferentialSolver.solve(equation);
  }

  private static Form moved(Form form) {
    return form.substitute(N, n.plus(Form.ONE));
  }

  private static Form linear(RandomGenerator random) {
    return n.plus(Form.of(Rational.of(random.nextInt(-3, 5), random.nextInt(1, 3))));
  }

  private static Form ratio(RandomGenerator random) {
    Form ratio = Form.of(random.nextInt(1, 4) * (random.nextBoolean() ? 1 : -1));
    for (int i = 0; i < 2; i++) {
      Form factor = linear(random);
      ratio =
          switch (random.nextInt(3)) {
            case 0 -> ratio.times(factor);
            case 1 -> ratio.dividedBy(factor);
            default -> ratio;
          };
    }
    return ratio;
  }

  /// The recurrence of second order that two terms with the given ratios solve.
  private static LinearEquation annihilator(Form r, Form s) {
    Form low = r.times(s).times(moved(s).minus(moved(r)));
    Form middle = r.times(moved(r)).minus(s.times(moved(s)));
    Form high = s.minus(r);
    return new LinearEquation(
        LinearEquation.Action.SHIFT, N, List.of(low, middle, high), Form.ZERO);
  }

  @Test
  void twoHypergeometricTermsAreFoundAgain() {
    Seeded.each(
        5200,
        30,
        random -> {
          Form r = ratio(random);
          Form s = ratio(random);
          if (r.equals(s)) {
            return;
          }
          SolutionSpace space = solved(annihilator(r, s));
          assertTrue(space.isGeneral(), () -> r + " and " + s + " give " + space.basis());
          for (Form y : space.basis()) {
            assertTrue(space.equation().residual(y).isZero());
          }
        });
  }

  private static Form polynomial(RandomGenerator random, int degree) {
    Form sum = Form.ZERO;
    for (int i = 0; i <= degree; i++) {
      sum = sum.plus(n.power(i).times(Rational.of(random.nextInt(-4, 5))));
    }
    return sum;
  }

  private static LinearEquation made(
      LinearEquation.Action action, RandomGenerator random, Form solution) {
    List<Form> coefficients = new ArrayList<>();
    int order = random.nextInt(1, 4);
    for (int i = 0; i < order; i++) {
      coefficients.add(polynomial(random, 2));
    }
    coefficients.add(polynomial(random, 1).plus(n.power(2)));
    LinearEquation left = new LinearEquation(action, N, coefficients, Form.ZERO);
    return left.withRightSide(left.residual(solution));
  }

  @Test
  void rationalSolutionsOfRecurrencesAreFoundAgain() {
    Seeded.each(
        5300,
        30,
        random -> {
          Form y = polynomial(random, 2).dividedBy(linear(random).times(linear(random)));
          y = y.times(Elementary.power(Form.of(random.nextInt(1, 4)), n));
          LinearEquation equation = made(LinearEquation.Action.SHIFT, random, y);
          Form found = solved(equation).particular().orElseThrow();
          assertTrue(equation.residual(found).isZero());
        });
  }

  @Test
  void rationalSolutionsOfDifferentialEquationsAreFoundAgain() {
    Seeded.each(
        5400,
        30,
        random -> {
          Form y = polynomial(random, 2).dividedBy(linear(random).times(linear(random)));
          y = y.times(Elementary.exp(n.times(Rational.of(random.nextInt(-1, 3)))));
          LinearEquation equation = made(LinearEquation.Action.DERIVATIVE, random, y);
          Form found = solved(equation).particular().orElseThrow();
          assertTrue(equation.residual(found).isZero());
        });
  }

  @Test
  void polynomialsOfTheIndicialDegreeAreFound() {
    LinearEquation hermite =
        new LinearEquation(
            LinearEquation.Action.DERIVATIVE,
            N,
            List.of(Form.of(20), n.times(Rational.of(-2)), Form.ONE),
            Form.ZERO);
    List<Form> basis = solved(hermite).basis();
    assertEquals(1, basis.size());
    assertTrue(hermite.residual(basis.getFirst()).isZero());
  }

  @Test
  void fibonacciHasNoRationalSolution() {
    LinearEquation fibonacci =
        new LinearEquation(
            LinearEquation.Action.SHIFT,
            N,
            List.of(Form.MINUS_ONE, Form.MINUS_ONE, Form.ONE),
            Form.ZERO);
    RationalSolutions rational = RationalSolutions.of(fibonacci);
    assertEquals(List.of(), rational.homogeneous());
    assertTrue(solved(fibonacci).isGeneral());
  }

  @Test
  void integerRootsDoNotDependOnParameters() {
    Form a = Form.variable("a");
    Form p = n.minus(Form.of(3)).times(n.minus(a)).times(n.plus(Form.of(2)));
    assertEquals(
        List.of(BigInteger.valueOf(-2), BigInteger.valueOf(3)), List.copyOf(IntegerRoots.of(p, N)));
    Form root = Elementary.sqrt(Form.of(5));
    Form q = n.minus(Form.of(7)).times(n.times(root).plus(Form.ONE));
    assertEquals(List.of(BigInteger.valueOf(7)), List.copyOf(IntegerRoots.of(q, N)));
  }

  @Test
  void unrollingCountsBackAndForth() {
    LinearEquation equation =
        new LinearEquation(
            LinearEquation.Action.SHIFT, N, List.of(Form.ONE, n, Form.MINUS_ONE), n.plus(Form.ONE));
    List<Rational> start = List.of(Rational.of(1, 2), Rational.of(2, 3));
    Unrolling unrolling =
        Unrolling.of(equation, BigInteger.ZERO, start, BigInteger.valueOf(100)).orElseThrow();
    List<Rational> plain = new ArrayList<>(start);
    for (int i = 0; i < 60; i++) {
      // y(n+2) = y(n) + n y(n+1) − (n + 1)
      Rational next = plain.get(i).plus(plain.get(i + 1).times(Rational.of(i)));
      plain.add(next.minus(Rational.of(i + 1)));
    }
    for (int point : List.of(0, 5, 3, 60, 17)) {
      assertEquals(plain.get(point), unrolling.at(BigInteger.valueOf(point)));
    }
  }

  @Test
  void unrollingStopsBeforeAZeroOfTheLeadingCoefficient() {
    LinearEquation equation =
        new LinearEquation(
            LinearEquation.Action.SHIFT, N, List.of(Form.ONE, n.minus(Form.of(9))), Form.ZERO);
    List<Rational> start = List.of(Rational.ONE);
    assertFalse(Unrolling.of(equation, BigInteger.ZERO, start, BigInteger.TEN).isPresent());
    assertTrue(Unrolling.of(equation, BigInteger.ZERO, start, BigInteger.valueOf(8)).isPresent());
  }
}
