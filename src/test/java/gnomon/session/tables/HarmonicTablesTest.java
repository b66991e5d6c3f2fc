package gnomon.session.tables;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Published sums with harmonic numbers and published indefinite sums, through the language.
///
/// Source: references/harmonic-sums.tsv (Knuth, TAOCP vol. 1, 1.2.7; Graham-Knuth-Patashnik ch. 6
/// and 7; Paule-Schneider 2003), references/indefinite-sums.tsv (Petkovšek-Wilf-Zeilberger ch. 5,
/// Graham-Knuth-Patashnik ch. 2 and 5).
final class HarmonicTablesTest {

  /// The language has no Stirling numbers; this row is read as x d/dx of a falling power at −1.
  private static final String STIRLING = "stirling-H2";

  private static String written(Row row, String column) {
    String text = Talk.translated(row.text(column));
    for (String parameter : row.text("parameters").strip().split(" ")) {
      if (!parameter.isEmpty()) {
        String[] sides = parameter.split("=");
        text = text.replaceAll("\\b" + sides[0] + "\\b", sides[1]);
      }
    }
    return text;
  }

  private static String sum(Row row) {
    String range = "Sigma(k: " + row.text("lower") + ".." + row.text("upper") + ") (";
    return range + written(row, "summand") + ")";
  }

  private static List<Row> sums() {
    List<Row> rows = ReferenceTable.rows("harmonic-sums.tsv");
    assertEquals(16, rows.size());
    return rows.stream().filter(row -> !row.text("id").equals(STIRLING)).toList();
  }

  @Test
  void harmonicSumsHaveTheirPublishedClosedForms() {
    Talk talk = new Talk();
    for (Row row : sums()) {
      talk.answers(row.text("id"), sum(row), "closed form");
      talk.claim(row.text("id"), sum(row), written(row, "closed_form"));
    }
    talk.allProved(2 * 15);
  }

  @Test
  void harmonicSumsHaveTheirPublishedValues() {
    Talk talk = new Talk();
    for (Row row : sums()) {
      talk.say("let s = " + sum(row));
      int n = Integer.parseInt(row.text("first_n"));
      for (String value : row.text("values").split(" ")) {
        talk.claim(row.text("id") + " at " + n, "(s at n = " + n + ")", value);
        n++;
      }
    }
    talk.allProved(15 * 8);
  }

  @Test
  void theStirlingRowHoldsForNumbers() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("harmonic-sums.tsv")) {
      if (row.text("id").equals(STIRLING)) {
        int n = 1;
        for (String value : row.text("values").split(" ")) {
          talk.claim(STIRLING, "((x D falling(x, " + n + ")) at x = -1)", value);
          talk.claim(STIRLING, "(-1)^" + n + " " + n + "! H(" + n + ")", value);
          n++;
        }
      }
    }
    talk.allProved(16);
  }

  private static String term(Row row, String column) {
    return Talk.translated(row.text(column))
        .replaceAll("fact\\(([^()]+)\\)", "($1)!")
        .replaceAll("(\\w)!\\^", "($1!)^");
  }

  @Test
  void summableTermsAreSummedAndTheOthersProvedNotToBe() {
    Talk talk = new Talk().say("vary k");
    for (Row row : ReferenceTable.rows("indefinite-sums.tsv")) {
      String id = row.text("id");
      String term = term(row, "term");
      int k = 1;
      for (String value : row.text("values").split(" ")) {
        talk.claim(id + " at " + k, "((" + term + ") at k = " + k + ")", value);
        k++;
      }
      if (row.text("summable").equals("yes")) {
        talk.say("let found = Delta^-1(" + term + ")");
        talk.claim(id, "Delta found", term);
        talk.claim(id, "Delta(found - (" + term(row, "antidifference") + "))", "0");
      } else if (id.equals("harmonic")) {
        // not hypergeometric, but a harmonic number
        talk.claim(id, "Delta^-1(" + term + ") - H(k - 1)", "C1");
      } else {
        talk.answers(id, "Delta^-1(" + term + ")", "domain-no-antidifference");
      }
    }
    talk.allProved(20 * 9);
  }
}
