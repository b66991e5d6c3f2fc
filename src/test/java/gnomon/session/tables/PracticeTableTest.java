package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.Map;
import org.junit.jupiter.api.Test;

/// Facts of the trade about φ, the linear map that carries x^n to falling powers.
///
/// Source: references/practice.tsv.
final class PracticeTableTest {
  /// The row's function, to be evaluated at the integers that its check names.
  private static final Map<String, String> AT_POINTS =
      Map.of(
          "phi-exp", "phi exp(2x)",
          "phi-exp-half", "phi exp(x)",
          "phi-sin", "phi sin(x)",
          "phi-ln", "Delta(phi ln(x))",
          "phi-D", "Delta(phi x^4)",
          "phi-xD", "x Nabla(phi x^3)",
          "phi-binomial-theorem", "phi((1 + x)^4)",
          "phi-geometric-finite", "phi(1 + x + x^2 + x^3 + x^4)");

  private static final Map<String, String> AS_COEFFICIENTS =
      Map.of(
          "phi-inverse-power", "phi^-1 x^5",
          "phi-power", "phi x^5",
          "phi-bernoulli", "phi(x^3 - 3/2 x^2 + x/2)",
          "translation", "exp(2 D) x^3");

  @Test
  void factsOfTheTradeHold() {
    Talk talk = new Talk().say("let phi = umbral(Delta)");
    for (Row row : ReferenceTable.rows("practice.tsv")) {
      claim(talk, row);
    }
    talk.claim("statement of phi-exp", "phi exp(a x)", "(1 + a)^x");
    talk.claim("statement of phi-sin", "phi sin(x)", "2^(x/2) sin(pi x/4)");
    talk.claim("statement of phi-ln", "phi ln(x)", "H(x)");
    talk.claim("statement of phi-D", "phi D", "Delta phi");
    talk.claim("statement of phi-xD", "phi X D", "X Nabla phi");
    talk.claim("statement of translation", "E^a", "exp(a D)");
    talk.allProved(60);
  }

  private static void claim(Talk talk, Row row) {
    String id = row.text("id");
    String[] values = row.text("values").split(" ");
    if (AT_POINTS.containsKey(id)) {
      for (int x = 0; x < values.length; x++) {
        talk.claim(id, "eps(" + x + ") (" + AT_POINTS.get(id) + ")", values[x]);
      }
    } else if (AS_COEFFICIENTS.containsKey(id)) {
      talk.claim(id, AS_COEFFICIENTS.get(id), Talk.polynomial(row.text("values"), "x"));
    } else {
      other(talk, id, values);
    }
  }

  private static void other(Talk talk, String id, String[] values) {
    switch (id) {
      // At x = 0 the image as a closed form is 1/2 0^0 - 1/2 0^0 with 0^x for e^(-x).
      case "phi-sinh" -> {
        for (int x = 0; x < values.length; x++) {
          talk.claim(id, "eps(" + x + ") phi sinh(x)", values[x]);
        }
      }
      case "phi-newton" -> {
        for (int k = 0; k < values.length; k++) {
          talk.claim(id, "eps(0) Delta^" + k + " x^4/" + k + "!", values[k]);
        }
      }
      case "definite-sum" -> {
        talk.claim(id, "Sigma(k: 2..6) k^3", values[0]);
        talk.claim(id, "eps(7) Sigma x^3 - eps(2) Sigma x^3", values[0]);
      }
      case String unknown -> talk.claim(unknown, "0", "1 # this row is not known here");
    }
  }
}
