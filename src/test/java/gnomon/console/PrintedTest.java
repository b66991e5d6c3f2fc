package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;

final class PrintedTest {
  @Test
  void proseIsBrokenAtBlanksAndKeepsItsIndentation() {
    assertEquals(
        List.of("  stone courses of", "  the east", "  terraces"),
        Printed.wrapped("  stone courses of the east terraces", 18));
  }

  @Test
  void aLongWordIsLeftWhole() {
    assertEquals(List.of("a", "levellevellevel", "b"), Printed.wrapped("a levellevellevel b", 10));
  }

  @Test
  void shortLinesStayAsTheyAre() {
    assertEquals(List.of("a  b"), Printed.wrapped("a  b", 10));
  }

  @Test
  void progressSaysWhatIsDoneAndForHowLong() {
    assertEquals("deciding the claim", Progress.activity("claim ln(1 + Delta) = D"));
    assertEquals("summing", Progress.activity("Sigma x^200 in factors"));
    assertEquals("evaluating", Progress.activity("claims"));
    assertEquals("59 s", Progress.clock(Duration.ofSeconds(59)));
    assertEquals("2 min 5 s", Progress.clock(Duration.ofSeconds(125)));
  }
}
