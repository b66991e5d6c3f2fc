package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.law.Seeded;
import gnomon.reference.ReferenceTable;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// `solve` as a user meets it.
final class SolveTest {
  private final Session session = Session.of(Settings.batch());

  private List<String> said(String statement) {
    return ReplyText.lines(session.submit(statement), Spelling.ASCII);
  }

  private String value(String statement) {
    List<String> lines = said(statement);
    return lines.getFirst();
  }

  private void proves(String claim) {
    List<String> lines = said("claim " + claim);
    assertTrue(lines.getFirst().startsWith("proved"), () -> claim + " -> " + lines);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          f(n+2) = f(n+1) + f(n) with f(0) = 0, f(1) = 1                | 0 1 1 2 3 5 8 13 21 34 55
          f(n+2) = f(n+1) + f(n) with f(0) = 2, f(1) = 1                | 2 1 3 4 7 11 18 29 47 76 123
          f(n+2) = 2 f(n+1) + f(n) with f(0) = 0, f(1) = 1              | 0 1 2 5 12 29 70 169 408
          f(n+2) = f(n+1) - f(n) with f(0) = 1, f(1) = 1                | 1 1 0 -1 -1 0 1 1 0
          f(n+2) = 2 f(n+1) - 3 f(n) with f(0) = 1, f(1) = 0            | 1 0 -3 -6 -3 12 33
          f(n+2) + 2 f(n+1) + 5 f(n) = 0 with f(0) = 0, f(1) = 1        | 0 1 -2 -1 12 -19
          f(n+3) = 2 f(n) with f(0) = 1, f(1) = 0, f(2) = 5             | 1 0 5 2 0 10 4 0 20
          f(n+4) = f(n) with f(0) = 1, f(1) = 2, f(2) = 3, f(3) = 4     | 1 2 3 4 1 2 3 4
          f(n) = f(n-1) + n^2 with f(0) = 0                             | 0 1 5 14 30
          f(n+1) = 2 f(n) + 2^n n with f(0) = 3                         | 3 6 14 36 96
          (n+1) f(n+1) = (4n+2) f(n) with f(0) = 1                      | 1 2 6 20 70 252
          f(n+1) = (n+1) f(n) with f(0) = 1                             | 1 1 2 6 24 120
          f(n+1) = (n-3) f(n) with f(0) = 1                             | 1 -3 6 -6 0 0 0
          f(n+2) - (2n+3) f(n+1) + (n+1)^2 f(n) = 0 with f(0)=0, f(1)=1 | 0 1 3 11 50
          f(n+2) = (n+1) f(n) with f(0) = 1, f(1) = 1                   | 1 1 1 2 3 8 15 48 105
          (n+2) f(n+2) = (n+1) f(n) with f(0) = 1, f(1) = 0             | 1 0 1/2 0 3/8 0 5/16
          f(n+3) = (n+1) f(n) with f(0) = 1, f(1) = 1, f(2) = 1         | 1 1 1 1 2 3 4 10 18
          f(n+2) + f(n) = 0 with f(0) = 1, f(1) = 2                     | 1 2 -1 -2 1 2
          f(n) = f(n-1) + 1/n with f(0) = 0                             | 0 1 3/2 11/6 25/12
          """)
  void valuesAtIntegersAreThoseOfTheEquation(String equation, String values) {
    said("let s = solve " + equation);
    int n = 0;
    for (String expected : values.strip().split(" ")) {
      assertEquals(expected, value("s at n = " + n), equation + " at " + n);
      n++;
    }
  }

  @Test
  void missingConditionsLeaveConstants() {
    assertEquals("C2 sin(x) + C1 cos(x)", value("solve D^2 f + f = 0"));
    assertEquals("2^x C1", value("solve E f = 2 f").replace("C1 * 2^x", "2^x C1"));
  }

  @Test
  void constantsOfTheEquationKeepTheirNames() {
    said("let s = solve f(n+1) = f(n) + C1");
    proves("(s at n = n + 1) - s = C1");
    assertTrue(value("s").contains("C2"));
  }

  @Test
  void theUnknownIsTheFunctionOfTheConditions() {
    assertEquals("3^n", value("solve w(n+1) = 3 w(n) with w(0) = 1"));
    assertEquals("3^n", value("solve (n+1) q(n+1) = 3 (n+1) q(n) with q(0) = 1"));
    assertEquals("name-no-unknown", code("solve p(n) = q(n)"));
  }

  private String code(String statement) {
    return value(statement).replaceFirst("error ([a-z-]+):.*", "$1");
  }

  @Test
  void differentialEquationsAreSolvedAndTheSolutionsSolveThem() {
    said("let s = solve D^2 f - 3 D f + 2 f = x exp(x) with f(0) = 1, f'(0) = 0");
    proves("D^2 s - 3 D s + 2 s = x exp(x)");
    proves("(s at x = 0) = 1");
    proves("(D(s) at x = 0) = 0");
    said("let r = solve D^2 f + 2 D f + 5 f = 0 with f(0) = 0, f'(0) = 2");
    proves("r = exp(-x) sin(2x)");
    assertEquals("C1 x^2", value("solve x D f = 2 f"));
    assertEquals("C1 e^(x^2)", value("solve D f = 2 x f"));
    assertEquals("C2 x + C1/x", value("solve x^2 D^2 f + x D f - f = 0"));
    assertEquals("C2 e^x/x + C1/x", value("solve x D^2 f + (2 - x) D f - f = 0"));
    assertEquals("domain-no-solution", code("solve D^2 f = x f"));
  }

  @Test
  void absenceIsSaidByClassAndOnlyWhereItIsProved() {
    assertEquals("domain-no-solution", code("solve f(n+2) = f(n+1) + (n+1) f(n)"));
    assertEquals("domain-no-solution", code("solve f(n+2) = 3 f(n+1) - 2 f(n) + n!"));
    assertEquals("domain-solution-not-found", code("solve f(n+3) = f(n+1) + f(n)"));
    String radical = "solve f(n+2) = f(n+1) + (n^2 + 1) f(n)";
    assertEquals("domain-solution-not-found", code(radical), "(n^2 + 1) splits over i");
    assertEquals("domain-solution-not-found", code("solve f(n+1) = 2^n f(n)"));
  }

  @Test
  void whatIsNoLinearEquationInOneFunctionIsRefused() {
    assertEquals("domain-equation-not-linear", code("solve f(n+1) = f(n)^2"));
    assertEquals("domain-equation-not-linear", code("solve f(n+1) = exp(f(n))"));
    assertEquals("domain-equation-not-linear", code("solve f(n+1) f(n) = 1"));
    assertEquals("domain-equation-arguments", code("solve f(2n) = f(n)"));
    assertEquals("domain-equation-arguments", code("solve f(n + 1/2) = f(n)"));
    assertEquals("domain-equation-mixed", code("solve E f = D f"));
    assertEquals("domain-equation-without-unknown", code("solve f - f = 1"));
  }

  @Test
  void contradictoryConditionsAreRefused() {
    assertEquals(
        "domain-conditions-contradict", code("solve f(n+1) = 2 f(n) with f(0) = 1, f(1) = 3"));
    assertEquals("1", value("(solve f(n+1) = 2 f(n) with f(0) = 1, f(1) = 2) at n = 0"));
  }

  @Test
  void sumsThatDoNotCloseAreLeftAndHaveValues() {
    said("let s = solve f(n+1) = 3 f(n) + n! with f(0) = 2");
    for (int n = 0; n <= 6; n++) {
      proves("(s at n = " + (n + 1) + ") = 3 (s at n = " + n + ") + " + n + "!");
    }
    assertEquals("2", value("s at n = 0"));
    said("let p = solve f(n+1) = (n^2 + 1) f(n) with f(0) = 3");
    assertEquals("300", value("p at n = 4"));
    List<String> both = said("let q = solve f(n+2) - (n+3) f(n+1) + (n+1) f(n) = 0");
    assertTrue(both.getLast().endsWith("left as a sum"), both.toString());
    for (int n = 0; n <= 6; n++) {
      String equation = "(q at n = %d) - (%d + 3) (q at n = %d) + (%d + 1) (q at n = %d) = 0";
      proves(equation.formatted(n + 2, n, n + 1, n, n));
    }
  }

  @Test
  void equationsWithoutAFormulaHaveValues() {
    String involutions = "solve f(n+2) = f(n+1) + (n+1) f(n) with f(0) = 1, f(1) = 1";
    assertEquals("764", value(involutions + " at n = 8"));
    assertEquals("[[7, 232],", value(involutions + " for n: 7..8"));
    assertEquals("6 a + 4", value(involutions.replace("f(1) = 1", "f(1) = a") + " at n = 4"));
    String open = "solve (n-2) f(n+1) = (n-1) f(n) with f(0) = 1, f(5) = 1 at n = ";
    assertEquals("1/2", value(open + "1"));
    assertEquals("domain-not-determined", code(open + "3"));
  }

  @Test
  void zerosOfTheLeadingCoefficientForbidOrFreeValues() {
    List<String> forbidden = said("solve (n-2) f(n+1) = f(n) with f(0) = 1");
    assertEquals("error domain-conditions-contradict", forbidden.getFirst().split(":")[0]);
    assertEquals("The equation itself forbids them where the argument is 2.", forbidden.get(1));
    assertEquals(
        "domain-solution-not-found",
        code("solve (n-2) f(n+1) = (n-1) f(n) with f(0) = 1, f(5) = 1"));
  }

  @Test
  void sideConditionsOfParametersAreStated() {
    List<String> distinct =
        said("solve f(n+2) = (a + b) f(n+1) - a b f(n) with f(0) = 0, f(1) = 1");
    assertTrue(distinct.getLast().contains("a - b != 0"), distinct.toString());
    List<String> leading = said("solve a f(n+1) = b f(n)");
    assertTrue(leading.getLast().contains("a != 0"), leading.toString());
  }

  @Test
  void valuesThatTheEquationDoesNotDetermineAreNamed() {
    List<String> lines =
        said(
            "solve (n-1) y(n+2) - (n^2+3n-2) y(n+1) + 2n(n+1) y(n) = 0"
                + " with y(0) = 1, y(1) = 2");
    assertEquals("2^n", lines.getFirst());
    List<String> given = said("solve n f(n+1) = (n+1) f(n) with f(0) = 0, f(1) = 1");
    assertEquals(List.of("n", "@2 closed form"), given);
    assertTrue(
        lines.getLast().endsWith("(y(3) is not determined by the equation)"), lines.toString());
  }

  @Test
  void partOfTheSolutionsIsSaidToBePart() {
    List<String> lines = said("solve D^2 f - 2 x D f + 2 f = 0");
    assertEquals("C1 x", lines.getFirst());
    assertTrue(lines.getLast().contains("not all solutions"), lines.toString());
  }

  /// Source: references/recurrence-solutions.tsv (Petkovšek 1992, and Petkovšek, Wilf, Zeilberger).
  @Test
  void publishedEquationsHaveTheirPublishedSolutions() {
    for (ReferenceTable.Row row : ReferenceTable.rows("recurrence-solutions.tsv")) {
      String equation = row.text("operator_equation");
      String solutions =
          row.text("hypergeometric_solutions")
              .replace("fact(n)", "n!")
              .replace("catalan", "binom(2n, n)/(n + 1)");
      List<String> lines = said("solve " + equation);
      if (solutions.startsWith("none over")) {
        assertTrue(lines.getFirst().contains("sqrt"), lines.toString());
      } else if (solutions.startsWith("none")) {
        assertTrue(lines.getFirst().startsWith("error domain-no-solution"), lines.toString());
      } else {
        for (String solution : solutions.split(" ; ")) {
          said("let h = " + solution);
          said("let s = solve " + equation + " with y(4) = (h at n = 4), y(5) = (h at n = 5)");
          proves("s = h");
        }
      }
    }
  }

  /// The equation is made from its solution: characteristic roots with multiplicities, a right side
  /// that the left side makes of a random exponential polynomial.
  @Test
  void randomExponentialPolynomialsComeBack() {
    Seeded.each(4100, 25, this::randomRoundTrip);
  }

  private void randomRoundTrip(RandomGenerator random) {
    List<Integer> roots = new ArrayList<>();
    StringBuilder operator = new StringBuilder();
    StringBuilder solution = new StringBuilder("0");
    int order = random.nextInt(1, 4);
    for (int i = 0; i < order; i++) {
      int root = random.nextInt(1, 4) * (random.nextBoolean() ? 1 : -1);
      int repeated = (int) roots.stream().filter(r -> r == root).count();
      roots.add(root);
      operator.append(i == 0 ? "(E - (" : " (E - (").append(root).append("))");
      solution
          .append(" + (")
          .append(random.nextInt(-5, 6))
          .append(") n^" + repeated + " (")
          .append(root)
          .append(")^n");
    }
    solution.append(" + (").append(random.nextInt(-3, 4)).append(") n ");
    solution.append("(").append(random.nextInt(2, 6)).append(")^n");
    said("vary n");
    said("let h = " + solution);
    said("let g = (" + operator + ") h");
    StringBuilder conditions = new StringBuilder();
    for (int i = 0; i < order; i++) {
      conditions.append(i == 0 ? "" : ", ").append("f(" + i + ") = (h at n = " + i + ")");
    }
    List<String> lines = said("let s = solve (" + operator + ") f = g with " + conditions);
    assertTrue(lines.getLast().contains("closed form"), lines.toString());
    proves("s = h");
  }
}
