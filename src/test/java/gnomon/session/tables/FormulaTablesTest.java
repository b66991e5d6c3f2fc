package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.StringJoiner;
import org.junit.jupiter.api.Test;

/// Published formulas of numerical analysis as identities between operators, through the language.
///
/// Source: references/difference-weights.tsv (Fornberg 1988; DLMF 3.4; A&S 25.2),
/// references/newton-cotes.tsv (A&S 25.4), references/interpolation-formulas.tsv (A&S 25.2),
/// references/lagrange-polynomials.tsv (DLMF 3.3, 3.4).
final class FormulaTablesTest {

  @Test
  void differenceFormulasHaveTheirOrderAndErrorTerm() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("difference-weights.tsv")) {
      int m = Integer.parseInt(row.text("derivative"));
      int last = m + Integer.parseInt(row.text("order"));
      String formula = shifts(row.text("offsets"), row.text("weights"));
      talk.claim(
          row.text("id"),
          "((" + formula + ") in D to " + last + ")",
          "D^" + m + " + (" + row.text("error") + ") D^" + last + " + O(D^" + (last + 1) + ")");
    }
    talk.allProved(72);
  }

  @Test
  void quadratureRulesHaveTheirErrorTerm() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("newton-cotes.tsv")) {
      String rule = shifts(row.text("nodes"), row.text("weights"));
      String integral = "(E^" + row.text("intervals") + " - 1)/D";
      String difference = "(" + integral + " - (" + rule + ")) in D to ";
      if (row.text("error").isBlank()) {
        talk.claim(row.text("id"), "(" + difference + "5)", "O(D^6)");
      } else {
        int q = Integer.parseInt(row.text("error_power")) - 1;
        talk.claim(
            row.text("id"),
            "(" + difference + q + ")",
            "(" + row.text("error") + ") D^" + q + " + O(D^" + (q + 1) + ")");
      }
    }
    talk.allProved(15);
  }

  @Test
  void newtonsFormulasAreExpansionsOfTheShift() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("interpolation-formulas.tsv")) {
      int order = Integer.parseInt(row.text("order"));
      String coefficient = "(" + Talk.polynomial(row.text("coefficient_in_p"), "p") + ")";
      switch (row.text("formula")) {
        case "newton-forward" -> isCoefficient(talk, row, coefficient, "Delta", order);
        case "newton-backward" -> isCoefficient(talk, row, coefficient, "Nabla", order);
        case String _ -> {}
      }
    }
    talk.allProved(7);
  }

  /// The coefficient of Q^order in E^p is the part of E^p in powers of Q that is left when the
  /// expansion to the order before is taken away.
  private static void isCoefficient(Talk talk, Row row, String coefficient, String q, int order) {
    StringJoiner before = new StringJoiner(" + ");
    for (int k = 0; k < order; k++) {
      String power = q.equals("Delta") ? "p|_" + k : "p|^" + k;
      before.add("(" + power + "/" + k + "!) " + q + "^" + k);
    }
    talk.claim(
        row.text("id"),
        "(E^p in " + q + " to " + order + ")",
        before
            + " + "
            + coefficient
            + " "
            + q
            + "^"
            + order
            + " + O("
            + q
            + "^"
            + (order + 1)
            + ")");
  }

  /// Gauss, Stirling, Bessel and Everett: the table's coefficient against the closed form of the
  /// trade, and the formula with closed forms against E^p.
  @Test
  void centralFormulasHaveTheirCoefficients() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("interpolation-formulas.tsv")) {
      Map<String, String> closed = closedForms();
      String key = row.text("formula") + " " + row.text("order");
      if (closed.containsKey(key)) {
        talk.claim(
            row.text("id"), Talk.polynomial(row.text("coefficient_in_p"), "p"), closed.get(key));
      }
    }
    talk.allProved(16);
  }

  @Test
  void centralFormulasAreTheShift() {
    Map<String, String> c = closedForms();
    Talk talk = new Talk();
    talk.claim("stirling", through("delta", c, "stirling", 5, "", "mu "), "(E^p in D to 5)");
    talk.claim(
        "gauss-forward",
        through("delta", c, "gauss-forward", 5, "", "E^(1/2) "),
        "(E^p in D to 5)");
    talk.claim(
        "bessel", through("delta", c, "bessel", 4, "E^(1/2) mu ", "E^(1/2) "), "(E^p in D to 4)");
    String everett =
        "(("
            + c.get("everett-left 0")
            + " + ("
            + c.get("everett-left 2")
            + ") delta^2 + ("
            + c.get("everett-left 4")
            + ") delta^4 + E (("
            + c.get("everett 0")
            + ") + ("
            + c.get("everett 2")
            + ") delta^2 + ("
            + c.get("everett 4")
            + ") delta^4)) in D to 5)";
    talk.claim("everett", everett, "(E^p in D to 5)");
    talk.allProved(4);
  }

  /// The formula through an order, with what stands before even and odd differences.
  private static String through(
      String q, Map<String, String> closed, String formula, int last, String even, String odd) {
    StringJoiner sum = new StringJoiner(" + ", "((", ") in D to " + last + ")");
    for (int k = 0; k <= last; k++) {
      String coefficient = closed.get(formula + " " + k);
      sum.add("(" + coefficient + ") " + (k % 2 == 0 ? even : odd) + q + "^" + k);
    }
    return sum.toString();
  }

  /// The coefficients as the trade writes them (Source: from memory).
  private static Map<String, String> closedForms() {
    Map<String, String> forms = new LinkedHashMap<>();
    forms.put("stirling 0", "1");
    forms.put("bessel 0", "1");
    forms.put("bessel 1", "p - 1/2");
    for (int k = 0; k <= 2; k++) {
      forms.put("gauss-forward " + 2 * k, "binom(p + " + k + " - 1, " + 2 * k + ")");
      forms.put("gauss-forward " + (2 * k + 1), "binom(p + " + k + ", " + (2 * k + 1) + ")");
      forms.put("stirling " + (2 * k + 1), "binom(p + " + k + ", " + (2 * k + 1) + ")");
      forms.put("everett " + 2 * k, "binom(p + " + k + ", " + (2 * k + 1) + ")");
      forms.put("everett-left " + 2 * k, "binom(1 - p + " + k + ", " + (2 * k + 1) + ")");
      if (k > 0) {
        forms.put(
            "stirling " + 2 * k, "p/" + 2 * k + " * binom(p + " + k + " - 1, " + (2 * k - 1) + ")");
        forms.put("bessel " + 2 * k, "binom(p + " + k + " - 1, " + 2 * k + ")");
        forms.put(
            "bessel " + (2 * k + 1),
            "(p - 1/2)/(2*" + k + " + 1) * binom(p + " + k + " - 1, " + 2 * k + ")");
      }
    }
    return forms;
  }

  @Test
  void lagrangePolynomialsAndTheirDerivatives() {
    Talk talk = new Talk().say("vary t");
    for (Row row : ReferenceTable.rows("lagrange-polynomials.tsv")) {
      int points = Integer.parseInt(row.text("points"));
      int node = Integer.parseInt(row.text("node"));
      int first = -Math.floorDiv(points - 1, 2);
      StringJoiner product = new StringJoiner(" * ");
      for (int j = first; j < first + points; j++) {
        if (j != node) {
          product.add("(t - (" + j + "))/(" + (node - j) + ")");
        }
      }
      String fundamental = product.toString();
      talk.claim(
          row.text("id"),
          Talk.polynomial(row.text("polynomial_in_t"), "t"),
          row.text("kind").equals("interpolation") ? fundamental : "D(" + fundamental + ")");
    }
    talk.allProved(46);
  }

  private static String shifts(String offsets, String weights) {
    String[] places = offsets.split(" ");
    String[] factors = weights.split(" ");
    StringJoiner sum = new StringJoiner(" + ");
    for (int i = 0; i < places.length; i++) {
      sum.add("(" + factors[i] + ") E^(" + places[i] + ")");
    }
    return sum.toString();
  }
}
