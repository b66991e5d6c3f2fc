package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import org.junit.jupiter.api.Test;

/// The table of Sheffer sequences, through the language and in both directions.
///
/// Source: references/sheffer.tsv (S. Roman, The Umbral Calculus, 1984, ch. 4, and DLMF 18.23).
final class ShefferTableTest {

  @Test
  void membersComeFromTheMapsAndGoBackToPowers() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("sheffer.tsv")) {
      talk.say("let s = " + map(row));
      for (int n = 0; n <= 5; n++) {
        String member = Talk.polynomial(row.text("p" + n), "x");
        String id = row.text("id") + " " + n;
        talk.claim(id, "s x^" + n, member);
        talk.claim(id + " back", "s^-1(" + member + ")", "x^" + n);
      }
    }
    talk.allProved(20 * 12);
  }

  @Test
  void mapsConjugateTheDerivativeToTheirDeltaOperator() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("sheffer.tsv")) {
      if (!row.text("f").startsWith("inverse of")) {
        talk.claim(row.text("id"), map(row) + " D", symbol(row, "f") + " " + map(row));
      }
    }
    talk.allProved(20);
  }

  /// `sheffer(f(D), g(D))`; where the table gives only the inverse F of f, S⁻¹ umbral(F(D))⁻¹.
  private static String map(Row row) {
    if (row.text("f").startsWith("inverse of ")) {
      return "(" + symbol(row, "g") + ")^-1 umbral(" + symbol(row, "f_inverse") + ")^-1";
    }
    return "sheffer(" + symbol(row, "f") + ", " + symbol(row, "g") + ")";
  }

  /// The cell with D for t and the row's parameters put in.
  private static String symbol(Row row, String column) {
    String text = row.text(column);
    for (String parameter : row.text("parameters").split("; *")) {
      if (!parameter.isBlank()) {
        String[] sides = parameter.strip().split("=");
        text = text.replaceAll("\\b" + sides[0] + "\\b", "(" + sides[1] + ")");
      }
    }
    return "(" + Talk.translated(text.replaceAll("\\bt\\b", "D")) + ")";
  }
}
