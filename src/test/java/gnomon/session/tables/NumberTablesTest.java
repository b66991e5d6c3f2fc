package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.StringJoiner;
import org.junit.jupiter.api.Test;

/// Bernoulli and Euler numbers and polynomials as members of Sheffer sequences, and the triangles
/// as expansions, through the language.
///
/// Source: references/bernoulli-euler.tsv (DLMF ch. 24), references/triangles-and-sequences.tsv
/// (DLMF ch. 26, Comtet).
final class NumberTablesTest {

  @Test
  void bernoulliAndEulerNumbersAndPolynomials() {
    Talk talk = new Talk();
    talk.say("let bernoulli = sheffer(D, (exp(D) - 1)/D)");
    talk.say("let euler = sheffer(D, (exp(D) + 1)/2)");
    talk.say("let second = sheffer(Delta, D/Delta)");
    for (Row row : ReferenceTable.rows("bernoulli-euler.tsv")) {
      claimNumbers(talk, row);
    }
    talk.allProved(130);
  }

  private static void claimNumbers(Talk talk, Row row) {
    String id = row.text("id");
    String n = row.text("n");
    String param = row.text("param");
    String values = row.text("values");
    String polynomial = Talk.polynomial(values, "x");
    switch (row.text("object")) {
      case "bernoulli-number" -> talk.claim(id, "eps(0) bernoulli x^" + n, values);
      case "euler-number" -> talk.claim(id, "2^" + n + " eps(1/2) euler x^" + n, values);
      case "bernoulli-polynomial" -> talk.claim(id, "bernoulli x^" + n, polynomial);
      case "euler-polynomial" -> talk.claim(id, "euler x^" + n, polynomial);
      case "bernoulli-polynomial-value" ->
          talk.claim(id, "eps(" + param + ") bernoulli x^" + n, values);
      case "euler-polynomial-value" -> talk.claim(id, "eps(" + param + ") euler x^" + n, values);
      case "bernoulli-polynomial-higher-order" ->
          talk.claim(id, "sheffer(D, ((exp(D) - 1)/D)^" + param + ") x^" + n, polynomial);
      case "euler-polynomial-higher-order" ->
          talk.claim(id, "sheffer(D, ((exp(D) + 1)/2)^" + param + ") x^" + n, polynomial);
      case "bernoulli-second-kind-number" ->
          talk.claim(id, "eps(0) second x^" + n + "/" + n + "!", values);
      case "bernoulli-second-kind-polynomial" ->
          talk.claim(id, "second x^" + n + "/" + n + "!", polynomial);
      case "noerlund-polynomial" ->
          talk.claim(
              id, "eps(0) sheffer(D, ((exp(D) - 1)/D)^a) x^" + n, Talk.polynomial(values, "a"));
      case "noerlund-number-order-n" ->
          talk.claim(id, "eps(0) sheffer(D, ((exp(D) - 1)/D)^" + n + ") x^" + n, values);
      case String other -> talk.claim(id, "0", "1 # object " + other + " is not known here");
    }
  }

  @Test
  void trianglesAreExpansions() {
    Talk talk = new Talk().say("let phi = umbral(Delta)");
    for (Row row : ReferenceTable.rows("triangles-and-sequences.tsv")) {
      claimTriangle(talk, row);
    }
    talk.allProved(130);
  }

  private static void claimTriangle(Talk talk, Row row) {
    String id = row.text("id");
    String n = row.text("n");
    String values = row.text("values");
    switch (row.text("object")) {
      case "stirling1-signed" -> talk.claim(id, "phi x^" + n, Talk.polynomial(values, "x"));
      case "stirling2" -> talk.claim(id, "x^" + n, falling(row, "x"));
      case "lah-unsigned" -> talk.claim(id, "x|^" + n, falling(row, "x"));
      case "bell" -> talk.claim(id, "eps(1) phi^-1 x^" + n, values);
      case "stirling2-associated" ->
          coefficient(talk, row, "exp(u (exp(x) - 1 - x))", partial(row, "u"));
      case "stirling1-associated-unsigned" ->
          coefficient(talk, row, "exp(-u (ln(1 - x) + x))", partial(row, "u"));
      case "genocchi" -> coefficient(talk, row, "2 x/(exp(x) + 1)", values);
      case "tangent" -> coefficient(talk, row, "tan(x)", values);
      case "catalan" -> talk.claim(id, "binom(2*" + n + ", " + n + ")/(" + n + " + 1)", values);
      case "motzkin" ->
          talk.claim(
              id, "Sigma(k: 0.." + n + ") binom(" + n + ", 2 k) binom(2 k, k)/(k + 1)", values);
      case "schroeder-large" ->
          talk.claim(
              id, "Sigma(k: 0.." + n + ") binom(" + n + " + k, 2 k) binom(2 k, k)/(k + 1)", values);
      case "eulerian", "narayana", "delannoy" -> entries(talk, row);
      case String other -> talk.claim(id, "0", "1 # object " + other + " is not known here");
    }
  }

  /// n! times the coefficient of x^n in a generating function.
  private static void coefficient(Talk talk, Row row, String function, String value) {
    String n = row.text("n");
    talk.claim(row.text("id"), "eps(0) D^" + n + " (" + function + ")", value);
  }

  private static void entries(Talk talk, Row row) {
    String n = row.text("n");
    int k = Integer.parseInt(row.text("first_index"));
    for (String value : row.text("values").split(" ")) {
      String formula =
          switch (row.text("object")) {
            case "eulerian" ->
                "Sigma(j: 0.." + k + ") (-1)^j binom(" + n + " + 1, j) (" + k + " + 1 - j)^" + n;
            case "narayana" ->
                n.equals("0")
                    ? "1"
                    : "binom(" + n + ", " + k + ") binom(" + n + ", " + (k - 1) + ")/" + n;
            case String _ -> "Sigma(j: 0.." + k + ") 2^j binom(" + n + ", j) binom(" + k + ", j)";
          };
      talk.claim(row.text("id") + " " + k, formula, value);
      k++;
    }
  }

  private static String partial(Row row, String base) {
    StringJoiner sum = new StringJoiner(" + ");
    int k = Integer.parseInt(row.text("first_index"));
    for (String value : row.text("values").split(" ")) {
      sum.add(value + " " + base + "^" + k++);
    }
    return sum.toString();
  }

  private static String falling(Row row, String base) {
    StringJoiner sum = new StringJoiner(" + ");
    int k = Integer.parseInt(row.text("first_index"));
    for (String value : row.text("values").split(" ")) {
      sum.add(value + " " + base + "|_" + k++);
    }
    return sum.toString();
  }
}
