package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import org.junit.jupiter.api.Test;

/// Operators as series in powers of other operators, through the language.
///
/// Source: references/operator-series.tsv (Hildebrand, Introduction to Numerical Analysis, ch. 5;
/// DLMF 24.2, 26.8).
final class OperatorSeriesTableTest {

  @Test
  void operatorsExpandInPowersOfOneAnother() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("operator-series.tsv")) {
      String q = row.text("in_powers_of");
      int last = row.text("coefficients").split(" ").length - 1;
      talk.claim(
          row.text("id"),
          "(" + row.text("operator") + " in " + q + " to " + last + ")",
          Talk.polynomial(row.text("coefficients"), q) + " + O(" + q + "^" + (last + 1) + ")");
    }
    talk.allProved(24);
  }
}
