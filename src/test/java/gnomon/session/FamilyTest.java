package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.reference.ReferenceTable;
import gnomon.reference.ReferenceTable.Row;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// `family`: sequences by their names, scaled and shifted ones too, and what is no family.
///
/// Source: references/sheffer.tsv (Roman 1984; DLMF ch. 18, 24) for the rows by name; the scaled
/// ones are common practice.
final class FamilyTest {
  private final Dialogue dialogue = new Dialogue();

  private String title(String subject) {
    List<String> lines = dialogue.lines("family " + subject);
    return lines.getFirst() + " | " + lines.getLast().replaceFirst("@\\d+ ?", "");
  }

  /// The first ten members as the language gives them, then the family asked of the list.
  @Test
  void familiesAreRecognisedByTheirFirstMembers() {
    for (String map :
        List.of(
            "umbral(Delta)",
            "umbral(Nabla)",
            "umbral(D exp(3 D))",
            "umbral(ln(1 + D))",
            "umbral(D/(D - 1))",
            "sheffer(D, (exp(D) - 1)/D)",
            "sheffer(D, (exp(D) + 1)/2)",
            "sheffer(D, exp(D^2/2))")) {
      dialogue.lines("drop s");
      dialogue.lines("let s = [" + members(map) + "]");
      String named = dialogue.lines("family " + map).getFirst().replaceFirst(",? .*", "");
      List<String> listed = dialogue.lines("family s");
      String found = listed.getFirst().replaceFirst("so far like the ", "");
      assertEquals(named, found.replaceFirst(",? .*", ""), map + ": " + listed);
    }
  }

  private String members(String map) {
    StringBuilder list = new StringBuilder("1");
    for (int n = 1; n <= 9; n++) {
      list.append(", (").append(map).append(" x^").append(n).append(")");
    }
    return map.startsWith("sheffer")
        ? list.replace(0, 1, "(" + map + " 1)").toString()
        : list.toString();
  }

  @Test
  void listsThatAreNoSequencesAreRefused() {
    assertEquals(
        "error domain-no-sequence: these are not the first members of a Sheffer sequence",
        dialogue.lines("family [1, x, x^2, x^3 + 1, x^4, x^5, x^6, x^7]").getFirst());
    assertEquals(
        "error domain-too-few: a family is recognised by 8 members or more",
        dialogue.lines("family [1, x, x^2]").getFirst());
  }

  @Test
  void everyRowOfTheTableIsKnownByName() {
    int rows = 0;
    for (Row row : ReferenceTable.rows("sheffer.tsv")) {
      String name = row.text("name").replaceFirst(" .*", "").toLowerCase(java.util.Locale.ROOT);
      String f = row.text("f");
      String subject =
          f.startsWith("inverse")
              ? "sheffer(" + inOperator(row, "f_inverse") + ", 1)^-1"
              : "sheffer(" + inOperator(row, "f") + ", " + inOperator(row, "g") + ")";
      if (f.startsWith("inverse")) {
        continue;
      }
      String title = title(subject);
      assertEquals(true, title.toLowerCase(java.util.Locale.ROOT).contains(name), title);
      assertEquals(true, title.endsWith("| proved"), title);
      rows++;
    }
    assertEquals(20, rows);
  }

  /// The symbol with D for t and the values of the parameters put in.
  private static String inOperator(Row row, String column) {
    String text = row.text(column).replaceAll("\\bt\\b", "D");
    for (String one : row.text("parameters").split("; ")) {
      if (!one.isBlank()) {
        String[] sides = one.split("=");
        text = text.replaceAll("\\b" + sides[0] + "\\b", "(" + sides[1] + ")");
      }
    }
    return text;
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '&',
      value = {
        "umbral(D exp(a D))& Abel polynomials, A_n(x; a) = x (x - a n)^n/(x - a n) | proved",
        "umbral(D exp(0 D))& powers, x^n | proved",
        "D exp(-3 D)& Abel polynomials, A_n(x; -3) = x (x + 3 n)^n/(x + 3 n) | proved",
        "umbral(Delta[h])& falling factorials, (x/h)|_n | proved",
        "delta& central factorials, 2 x (x + n/2)|_n/(2 x + n) | proved",
        "ln(1 + D)& Touchard polynomials, phi_n(x) | proved",
        "-ln(1 - D)& Touchard polynomials, (-1)^n phi_n(-x) | proved",
        "(exp(D) - 1)/D& Bernoulli polynomials, B_n(x) | proved",
        "sheffer(D, (exp(2 D) - 1)/(2 D))& Bernoulli polynomials, 2^n B_n(1/2 x) | proved",
        "sheffer(D/2, exp(D^2/4))& Hermite polynomials, H_n(x) | proved",
        "sheffer(D, (exp(D) + 1)/3)& Euler polynomials, 3/2 E_n(x) | proved",
        "sheffer(-sqrt(2) D/(1 - sqrt(2) D), 1/(1 - sqrt(2) D))& "
            + "Laguerre polynomials, n! L_n^(0)(1/2 sqrt(2) x) | proved",
        "exp(-2 D)& powers, (x + 2)^n | proved",
        "umbral(D exp(D))^-1& the inverse of the map of the Abel polynomials, A_n(x; 1) = "
            + "x (x - n)^n/(x - n) | proved",
        "umbral(exp(D) - 1 + D^2)& not in the catalogue | ''",
        "umbral(ln(1 + Delta/(1 - Delta)))& not in the catalogue | ''",
        "umbral(Delta + D^9)& not in the catalogue | ''",
        "umbral(Delta + D^20)& so far like the falling factorials, x|_n | open (the coefficients agree up"
            + " to D^12)",
      })
  void namesAreProvedOrOpenOrAbsent(String subject, String title) {
    assertEquals(title.replace("''", "").strip(), title(subject).strip());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '&',
      value = {
        "D^2& error domain-not-a-delta-operator",
        "umbral(2)& error domain-not-a-delta-operator",
        "X& error kind-no-sequence",
        "Sigma& error kind-no-sequence",
        "3 x& error kind-no-sequence",
        "umbral(Delta) + 1& error kind-no-sequence",
        "0 D& error domain-not-a-delta-operator",
      })
  void whatHasNoSequenceIsRefused(String subject, String code) {
    String first = dialogue.lines("family " + subject).getFirst();
    assertEquals(code, first.substring(0, Math.max(0, first.indexOf(':'))), first);
  }

  @Test
  void thePortraitSaysHowTheNextMemberIsMade() {
    assertEquals(
        List.of(
            "Laguerre polynomials, n! L_n^(2)(x)",
            "  map: sheffer(D/(D - 1), 1/(1 - D)^3)",
            "  generating function: e^(t x/(t - 1))/(1 - t)^3",
            "  coefficient of x^k for n > 0: (-1)^k binom(n + 2, k + 2) n!/k!",
            "  from s_n to s_(n+1): -X D^2 + (2 X - 3) D + 3 - X",
            "  from s_n to n s_n: -X D^2 + (X - 3) D",
            "  inverse map: Laguerre polynomials, n! L_n^(2)(x)",
            "  source: DLMF (18.12.13), (18.5.12); Roman 1984, section 4.3",
            "@1 proved"),
        dialogue.lines("family sheffer(D/(D - 1), (1 - D)^(-3))"));
  }
}
