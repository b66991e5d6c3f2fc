package gnomon.session.tables;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.Set;
import org.junit.jupiter.api.Test;

/// Published sums of binomial coefficients and WZ certificates, through the language.
///
/// Source: references/binomial-sums.tsv (DLMF chapters 1, 15, 16 and 26; Graham-Knuth-Patashnik ch.
/// 5; Petkovšek-Wilf-Zeilberger; Riordan; others as named in each row),
/// references/wz-certificates.tsv (Petkovšek-Wilf-Zeilberger ch. 7, Wilf-Zeilberger 1990).
final class BinomialTablesTest {
  /// Closed forms that are checked at the published points only: sums that are not hypergeometric
  /// in both variables, and closed forms that differ at the first points.
  private static final Set<String> POINT_BY_POINT =
      Set.of(
          "stirling-alternating",
          "cm-problem-6",
          "cm-problem-8",
          "cm-5.42",
          "abel",
          "dixon-terminating-odd");

  /// Rows that are proved also with symbols for their parameters.
  private static final Set<String> SYMBOLIC =
      Set.of(
          "dlmf-1.2.8",
          "chu-vandermonde",
          "dixon-terminating-odd",
          "dzrbasjan",
          "rogers-dougall-5F4",
          "gauss-second-terminating",
          "cm-5.9",
          "cm-5.16",
          "cm-5.22",
          "cm-5.41",
          "cm-problem-8",
          "li-shanlan");

  private static Talk talk() {
    return new Talk()
        .say("let catalan(n) = binom(2 n, n)/(n + 1)")
        .say("let motzkin(n) = Sigma(k: 0..n) binom(n,2 k) catalan(k)")
        .say("let stirling2(m, k) = Sigma(j: 0..k) (-1)^(k-j) binom(k,j) j^m/k!")
        .say("let fib(n) = solve f(n + 2) = f(n + 1) + f(n) with f(0) = 0, f(1) = 1");
  }

  private static String written(Row row, String column, boolean symbolic) {
    String text =
        row.text(column)
            .replace("rise(", "rising(")
            .replace("delta(n,0)", "0^n")
            .replace("floor(n/2)", "n")
            .replaceAll("fact\\(([^()]*)\\)", "($1)!")
            .replaceAll("sum\\((\\w),(\\w+),(\\w+),(.*)\\)$", "Sigma($1: $2..$3) $4");
    for (String parameter : row.text("parameters").strip().split(" *; *")) {
      if (!symbolic && !parameter.isEmpty()) {
        String[] sides = parameter.split("=");
        text = text.replaceAll("\\b" + sides[0] + "\\b", "(" + sides[1] + ")");
      }
    }
    return text;
  }

  private static String sum(Row row, boolean symbolic) {
    return "Sigma("
        + row.text("index")
        + ": "
        + written(row, "lower", symbolic)
        + ".."
        + written(row, "upper", symbolic)
        + ") ("
        + written(row, "summand", symbolic)
        + ")";
  }

  @Test
  void sumsHaveTheirPublishedClosedForms() {
    Talk talk = talk();
    for (Row row : ReferenceTable.rows("binomial-sums.tsv")) {
      String id = row.text("id");
      int first = Integer.parseInt(row.text("first_n"));
      String range =
          POINT_BY_POINT.contains(id)
              ? " for n: " + first + ".." + (first + 7)
              : " for n >= " + first;
      talk.claim(id, sum(row, false), written(row, "closed_form", false) + range);
    }
    talk.allProved(49);
  }

  @Test
  void identitiesInSeveralParametersAreProved() {
    Talk talk = talk();
    for (Row row : ReferenceTable.rows("binomial-sums.tsv")) {
      if (SYMBOLIC.contains(row.text("id"))) {
        String range = " for n >= " + row.text("first_n");
        talk.claim(row.text("id"), sum(row, true), written(row, "closed_form", true) + range);
      }
    }
    talk.allProved(SYMBOLIC.size());
  }

  @Test
  void sumsHaveTheirPublishedValues() {
    Talk talk = talk();
    for (Row row : ReferenceTable.rows("binomial-sums.tsv")) {
      String[] values = row.text("values").split(" ");
      int first = Integer.parseInt(row.text("first_n"));
      talk.say("let s(n) = " + sum(row, false));
      for (int i = 0; i < values.length; i++) {
        talk.claim(row.text("id"), "s(" + (first + i) + ")", values[i]);
      }
    }
    talk.allProved(49 * 8);
  }

  /// F(n+1, k) − F(n, k) = G(n, k+1) − G(n, k) with G = R F.
  @Test
  void certificatesAreCheckedByTheirEquation() {
    Talk talk = new Talk();
    for (Row row : ReferenceTable.rows("wz-certificates.tsv")) {
      talk.say("let F(n, k) = " + row.text("F"));
      talk.say("let G(n, k) = (" + row.text("R") + ") F(n, k)");
      talk.claim(row.text("id"), "F(n + 1, k) - F(n, k)", "G(n, k + 1) - G(n, k)");
      talk.say("drop F, G");
    }
    talk.allProved(3);
  }

  /// Sums without closed form that are equal to one another (Strehl; Riordan 1968; DLMF 26.6.13).
  @Test
  void equalSumsWithoutClosedFormAreProvedEqual() {
    Talk talk = talk();
    talk.claim(
        "franel-strehl", "Sigma(k: 0..n) binom(n,k)^2 binom(2k,n)", "Sigma(j: 0..n) binom(n,j)^3");
    talk.claim("motzkin", "Sigma(k: 0..n) (-1)^k binom(n,k) catalan(n + 1 - k)", "motzkin(n)");
    talk.claim(
        "central-trinomial",
        "Sigma(k: 0..n) binom(n,2k) binom(2k,k)",
        "Sigma(k: 0..n) (-1)^(n-k) binom(n,k) binom(2k,k)");
    talk.claim("factorials", "Sigma(k: 0..n) k!", "Sigma(k: 0..n+1) k! - (n + 1)!");
    talk.answers(
        "sign", "claim Sigma(k: 0..n) binom(n,k)^3 = Sigma(k: 0..n) binom(n,k)^4", "refuted");
    talk.allProved(5);
  }
}
