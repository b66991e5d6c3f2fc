package gnomon.render;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class WrappingTest {
  @Test
  void shortLinesStayAsTheyAre() {
    assertEquals(List.of("x^2 + 1"), Wrapping.lines("x^2 + 1", 60));
  }

  @Test
  void longSumsAreBrokenAfterASign() {
    assertEquals(
        List.of("x^3 + 3 x^2 -", "  2 x + 100"), Wrapping.lines("x^3 + 3 x^2 - 2 x + 100", 14));
  }

  @Test
  void longProductsAreBrokenAfterAStar() {
    assertEquals(List.of("x (x - 1) *", "  (x - 2)"), Wrapping.lines("x (x - 1) (x - 2)", 12));
  }

  @Test
  void noLineIsTooLongWhereItCanBeBroken() {
    String sum =
        IntStream.range(0, 80).mapToObj(k -> k + " x^" + k).collect(Collectors.joining(" + "));
    assertTrue(Wrapping.lines(sum, 60).stream().allMatch(line -> line.length() <= 60));
    String list =
        IntStream.range(0, 80)
            .mapToObj(Integer::toString)
            .collect(Collectors.joining(", ", "[", "]"));
    assertTrue(Wrapping.lines(list, 60).stream().allMatch(line -> line.length() <= 60));
  }

  @Test
  void limitsAreNotPartedFromTheirTerm() {
    List<String> lines = Wrapping.lines("100 Σ(k: 0..n) binom(n, k)", 18);
    assertEquals(
        "100 Σ(k: 0..n) binom(n, k)",
        String.join(" ", lines).replaceAll("  +", " ").replace("* ", ""));
    assertTrue(lines.stream().noneMatch(line -> line.endsWith("0..n)")));
  }
}
