package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.StringJoiner;
import org.junit.jupiter.api.Test;

/// Coefficients of multistep formulas and of end corrections, through the language.
///
/// Source: references/difference-coefficients.tsv (Hairer, Nørsett, Wanner, Solving Ordinary
/// Differential Equations I, ch. III; Jordan 1939), references/end-corrections.tsv (DLMF 2.10,
/// 24.4, 24.17; Hildebrand 1974, ch. 5).
final class CorrectionTablesTest {

  @Test
  void coefficientsOfDifferencesAreExpansionsOfTheirGeneratingFunctions() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("difference-coefficients.tsv")) {
      String q = row.text("id").equals("gregory") ? "Delta" : "Nabla";
      String operator = row.text("generating_function").replaceAll("\\bt\\b", q);
      int last = row.text("values").split(" ").length - 1;
      talk.claim(
          row.text("id"),
          "(" + operator + " in " + q + " to " + last + ")",
          Talk.polynomial(row.text("values"), q) + " + O(" + q + "^" + (last + 1) + ")");
    }
    talk.allProved(5);
  }

  @Test
  void endCorrectionsAreMembersAndExpansions() {
    Talk talk = new Talk();
    talk.say("let bernoulli = sheffer(D, (exp(D) - 1)/D)");
    talk.say("let midpoint = sheffer(D, delta/D)");
    talk.say("let euler = sheffer(D, (exp(D) + 1)/2)");
    for (Row row : ReferenceTable.rows("end-corrections.tsv")) {
      int index = Integer.parseInt(row.text("index"));
      switch (row.text("rule")) {
        case "euler-maclaurin" -> atZero(talk, row, "bernoulli", 2 * index, "");
        case "midpoint-euler-maclaurin" -> atZero(talk, row, "midpoint", 2 * index, "");
        case "boole" -> atZero(talk, row, "euler", index, "/2");
        case "gregory-end-weights" -> weights(talk, row, index);
        case String other -> talk.claim(row.text("id"), "0", "1 # rule " + other);
      }
    }
    talk.allProved(19);
  }

  /// The number of the sequence with the index, over its factorial.
  private static void atZero(Talk talk, Row row, String map, int index, String more) {
    talk.claim(
        row.text("id"),
        "eps(0) " + map + " x^" + index + "/" + index + "!" + more,
        row.text("values"));
  }

  /// The sum from the end on with these weights, then 1, less the plain sum, is the integral less
  /// the plain sum as far as the differences go: Σ (w_j − 1) E^j = 1/Δ − 1/D to Δ^k.
  private static void weights(Talk talk, Row row, int last) {
    StringJoiner sum = new StringJoiner(" + ");
    String[] weights = row.text("values").split(" ");
    for (int j = 0; j < weights.length; j++) {
      sum.add("(" + weights[j] + " - 1) E^" + j);
    }
    talk.claim(
        row.text("id"),
        "((" + sum + ") in Delta to " + last + ")",
        "((D - Delta)/(Delta D) in Delta to " + last + ")");
  }
}
