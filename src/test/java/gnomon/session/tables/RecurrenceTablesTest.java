package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import org.junit.jupiter.api.Test;

/// Published sums with published recurrences, through the language.
///
/// Source: references/recurrence-sums.tsv (Franel, Apéry, Domb, Zagier and others, as its README
/// says).
final class RecurrenceTablesTest {

  /// An upper limit floor(n/2) is written n: the terms beyond vanish.
  private static String sum(Row row) {
    String summand =
        Talk.translated(row.text("summand"))
            .replaceAll("fact\\(([^()]+)\\)", "($1)!")
            .replaceAll("(\\w)!\\^", "($1!)^");
    String upper = row.text("upper").startsWith("floor") ? "n" : row.text("upper");
    return "Sigma(k: " + row.text("lower") + ".." + upper + ") (" + summand + ")";
  }

  @Test
  void sumsHaveTheirPublishedValues() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("recurrence-sums.tsv")) {
      talk.say("let s = " + sum(row));
      int n = 0;
      for (String value : row.text("values").split(" ")) {
        talk.claim(row.text("id") + " at " + n, "(s at n = " + n + ")", value);
        n++;
      }
    }
    talk.allProved(13 * 8);
  }

  @Test
  void publishedRecurrencesHoldFarOut() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("recurrence-sums.tsv")) {
      talk.say("let s = " + sum(row));
      String[] sides = row.text("recurrence").split("=");
      for (int point : new int[] {Integer.parseInt(row.text("holds_from_n")), 6, 90}) {
        talk.claim(row.text("id") + " at " + point, at(sides[0], point), at(sides[1], point));
      }
    }
    talk.allProved(13 * 3);
  }

  /// The recurrence of the sum is of order two; its solutions are powers. From memory.
  @Test
  void sumsWhoseRecurrenceHasHypergeometricSolutionsClose() {
    Talk talk = new Talk();
    talk.claim("diagonal", "Sigma(k: 0..n) binom(n-k, k) 2^k", "2/3 * 2^n + 1/3 (-1)^n");
    talk.claim("signs", "Sigma(k: 0..n) binom(n-k, k) (-1)^k 4^(-k)", "(n + 1)/2^n");
    talk.claim(
        "fibonacci",
        "Sigma(k: 0..n) binom(n-k, k)",
        "(((1 + sqrt(5))/2)^(n+1) - ((1 - sqrt(5))/2)^(n+1))/sqrt(5)");
    talk.claim(
        "alternating squares", "Sigma(k: 0..n) (-1)^k binom(n, k)^2", "cos(pi n/2) binom(n, n/2)");
    talk.allProved(4);
  }

  private static String at(String side, int point) {
    return side.replaceAll("a\\(n([^)]*)\\)", "(s at n = " + point + "$1)")
        .replaceAll("(?<![\\w])n(?! =)", "(" + point + ")");
  }
}
