package gnomon.render;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

class LatexPrinterTest {
  private static final long SEED = 7_041;

  @Test
  void groupsAndDelimitersAreBalanced() {
    RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(SEED);
    for (int round = 0; round < 1000; round++) {
      String text = Spelt.latex(RandomNotation.of(random, 6).notation());
      assertBalanced(text, "round " + round + ", seed " + SEED + ": " + text);
    }
  }

  private static void assertBalanced(String text, String message) {
    int depth = 0;
    for (char c : text.toCharArray()) {
      depth += c == '{' ? 1 : c == '}' ? -1 : 0;
      assertTrue(depth >= 0, message);
    }
    assertEquals(0, depth, message);
    assertEquals(count(text, "\\\\left\\b"), count(text, "\\\\right\\b"), message);
    assertFalse(Pattern.compile("\\^\\{[^{}]*}\\^").matcher(text).find(), message);
  }

  private static long count(String text, String pattern) {
    return Pattern.compile(pattern).matcher(text).results().count();
  }
}
