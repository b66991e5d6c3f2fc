package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

final class StatementsTest {
  @Test
  void pastedLinesBecomeStatements() {
    assertEquals(List.of("a", "b"), split("a\n\nb\n"));
  }

  @Test
  void anOpenBracketKeepsLinesTogether() {
    assertEquals(List.of("f(1,\n 2)", "b"), split("f(1,\n 2)\nb"));
  }

  @Test
  void recordedAnswersAreLeftOut() {
    assertEquals(List.of("a", "b"), split("a\n| 1\n| @1\nb\n|\n"));
  }

  @Test
  void aTextThatIsCutOffKeepsItsLastStatement() {
    assertEquals(List.of("a", "f(1"), split("a\nf(1"));
  }

  @Test
  void aBlankLineEndsAnOpenStatement() {
    assertTrue(Statements.isOpen("f(1,"));
    assertTrue(Statements.isOpen("f(1,\n 2"));
    assertTrue(Statements.isOpen("a +"));
    assertFalse(Statements.isOpen("f(1,\n"));
    assertFalse(Statements.isOpen("f(1)"));
    assertFalse(Statements.isOpen(""));
  }

  private static List<String> split(String text) {
    return Statements.split(text);
  }
}
