package gnomon.diagnostic;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/// How a diagnostic is laid out.
final class DiagnosticTextTest {
  private static Diagnostic at(int start, int end) {
    return Diagnostic.of("domain-kernel", "this operator has no inverse", new Span(start, end));
  }

  @Test
  void theLineTheCaretsTheEvidenceAndTheLineToTryFollowTheMessage() {
    Source source = new Source("levels.gnomon", "x\nclaim ln(Delta) = D\nx");
    Diagnostic diagnostic =
        at(11, 16).withEvidence("Delta sends constants to 0.").withHint("ln(1 + Delta)");
    assertEquals(
        """
        line 2, column 10: this operator has no inverse
          2 | claim ln(Delta) = D
            |          ^^^^^
          Delta sends constants to 0.
          Try: ln(1 + Delta)\
        """,
        DiagnosticText.of(diagnostic, source));
  }

  @Test
  void caretsStandUnderWideAndCombiningCharacters() {
    assertEquals(
        """
        line 1, column 4: this operator has no inverse
          1 | 漢字 x
            |      ^\
        """,
        DiagnosticText.of(at(3, 4), new Source("s", "漢字 x")));
    assertEquals(
        """
        line 1, column 4: this operator has no inverse
          1 | e\u0301 xy
            |   ^^\
        """,
        DiagnosticText.of(at(3, 5), new Source("s", "e\u0301 xy")));
    assertEquals(
        """
        line 1, column 1: this operator has no inverse
          1 | \uD83D\uDE00+
            | ^^\
        """,
        DiagnosticText.of(at(0, 2), new Source("s", "\uD83D\uDE00+")));
  }

  @Test
  void aPlaceAtTheEndOfTheLineGetsOneCaret() {
    assertEquals(
        """
        line 7, column 3: this operator has no inverse
          7 | x+
            |   ^\
        """,
        DiagnosticText.of(at(2, 2), new Source("s", "x+\r\n2", 7)));
  }

  @Test
  void aRangeOverSeveralLinesIsMarkedOnItsFirst() {
    assertEquals(
        """
        line 1, column 1: this operator has no inverse
          1 | (x
            | ^^\
        """,
        DiagnosticText.of(at(0, 6), new Source("s", "(x\n+ 1)")));
  }

  @Test
  void tabsAndControlsTakeOneColumnEach() {
    assertEquals(
        """
        line 1, column 3: this operator has no inverse
          1 |  \u0020x
            |   ^\
        """,
        DiagnosticText.of(at(2, 3), new Source("s", "\t\u0007x")));
  }

  @Test
  void aLongLineIsCutAroundTheCarets() {
    String line = "x + ".repeat(100) + "(" + " + y".repeat(100);
    String[] text = DiagnosticText.of(at(400, 401), new Source("s", line), 60).split("\n");
    assertTrue(text[1].contains("…") && text[1].length() <= 60, text[1]);
    assertEquals('(', text[1].charAt(text[2].indexOf('^')));
    String[] wide =
        DiagnosticText.of(at(300, 302), new Source("s", "漢字".repeat(300)), 60).split("\n");
    assertTrue(Columns.of(wide[1]) <= 60, wide[1]);
  }

  @Test
  void messagesAreShortAndCodesAreWords() {
    Diagnostic longer = Diagnostic.of("limit-size", "a".repeat(100), Span.NONE);
    assertEquals(Diagnostic.MESSAGE_LIMIT, longer.message().length());
    assertEquals(Kind.LIMIT, longer.problem().kind());
    assertThrows(IllegalArgumentException.class, () -> new Problem("Limit size"));
    assertThrows(IllegalArgumentException.class, () -> new Problem("weather-rain"));
    assertThrows(IllegalArgumentException.class, () -> new Span(3, 2));
  }

  @Test
  void anExceptionCarriesItsDiagnosticAndNoTrace() {
    DiagnosedException exception = new DiagnosedException(at(0, 1));
    assertEquals("domain-kernel", exception.diagnostic().code());
    assertEquals(0, exception.getStackTrace().length);
  }
}
