package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.Set;
import org.junit.jupiter.api.Test;

/// Published sums of powers, antidifferences and rules of difference, through the language.
///
/// Source: references/power-sums.tsv (DLMF 24.4, Graham-Knuth-Patashnik 6.5, Knuth on Faulhaber),
/// references/antidifferences.tsv and references/difference-rules.tsv (Graham-Knuth-Patashnik,
/// Concrete Mathematics, Table 55).
final class SumTablesTest {
  /// Rows about functions that the language does not have.
  private static final Set<String> OUT_OF_REACH = Set.of("fibonacci");

  @Test
  void powerSumsHaveTheirPublishedForms() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("power-sums.tsv")) {
      claimPowerSum(talk, row);
    }
    talk.allProved(35);
  }

  private static void claimPowerSum(Talk talk, Row row) {
    String id = row.text("id");
    String p = row.text("p");
    String value = row.text("value");
    switch (row.text("form")) {
      case "below-n" -> {
        talk.claim(id, "Sigma(k: 0..n-1) k^" + p, Talk.polynomial(value, "n"));
        talk.claim(id, "Sigma x^" + p, Talk.polynomial(value, "x"));
      }
      case "upto-n" -> talk.claim(id, "Sigma(k: 1..n) k^" + p, Talk.polynomial(value, "n"));
      case "faulhaber-odd" ->
          talk.claim(
              id,
              "Sigma(k: 1..n) k^" + p,
              "n (n+1)/2 * (" + Talk.polynomial(value, "(n (n+1)/2)") + ")");
      case "faulhaber-even" ->
          talk.claim(
              id,
              "Sigma(k: 1..n) k^" + p,
              "(2 n + 1) * n (n+1)/2 * (" + Talk.polynomial(value, "(n (n+1)/2)") + ")");
      case "alternating-upto-m" -> {
        String[] parts = value.split(" *; *");
        talk.claim(
            id,
            "Sigma(k: 1..m) (-1)^(m-k) k^" + p,
            Talk.polynomial(parts[0], "m") + " + (-1)^m (" + parts[1] + ")");
      }
      case "progression" -> {
        String step = id.split(":")[1].replace("k", " k");
        talk.claim(id, "Sigma(k: 0..m-1) (" + step + ")^" + p, Talk.polynomial(value, "m"));
      }
      case "single-value" -> talk.claim(id, "Sigma(k: 1..1000) k^" + p, value);
      case String other -> talk.claim(id, "0", "1 # form " + other + " is not known here");
    }
  }

  @Test
  void antidifferencesHaveTheirSummandsAsDifference() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("antidifferences.tsv")) {
      if (!OUT_OF_REACH.contains(row.text("id"))) {
        String f = Talk.translated(row.text("antidifference_f"));
        talk.claim(row.text("id"), "Delta(" + f + ")", Talk.translated(row.text("summand_g")));
      }
    }
    talk.allProved(21);
  }

  @Test
  void antidifferencesAreFoundUpToAConstant() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("antidifferences.tsv")) {
      if (!OUT_OF_REACH.contains(row.text("id"))) {
        String g = Talk.translated(row.text("summand_g"));
        String f = Talk.translated(row.text("antidifference_f"));
        talk.say("let found = Delta^-1(" + g + ")");
        talk.claim(row.text("id"), "D(found - (" + f + "))", "0");
      }
    }
    talk.allProved(21);
  }

  @Test
  void partialSumsHaveTheirPublishedValues() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("antidifferences.tsv")) {
      if (!OUT_OF_REACH.contains(row.text("id"))) {
        String g = Talk.translated(row.text("summand_g")).replaceAll("\\bx\\b", "k");
        String[] values = row.text("check_partial_sums").split(" ");
        for (int m = 1; m <= values.length; m++) {
          talk.claim(row.text("id"), "Sigma(k: 1.." + m + ") (" + g + ")", values[m - 1]);
        }
      }
    }
    talk.allProved(21 * 8);
  }

  @Test
  void rulesOfDifferenceHoldForArbitraryFunctions() {
    Talk talk = new Talk().say("arbitrary f, g");
    talk.claim("rule:1", "Delta(c f)", "c Delta f");
    talk.claim("rule:2", "Delta(f + g)", "Delta f + Delta g");
    talk.claim("rule:3", "Delta(f g)", "f Delta g + (E g) Delta f");
    talk.allProved(3);
  }
}
