package gnomon.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.diagnostic.DiagnosticText;
import gnomon.diagnostic.Source;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/// parse(show(t)) = t.
final class RoundTripTest {
  private static final long SEED = 20_260_131;
  private static final int TREES = 1_500;

  @ParameterizedTest
  @EnumSource(Spelling.class)
  void whatIsShownReadsBackAsTheSameTree(Spelling spelling) {
    RandomTrees trees = new RandomTrees(new Random(SEED));
    for (int count = 0; count < TREES; count++) {
      Statement tree = trees.statement();
      String text = StatementText.of(tree, spelling);
      String place = "seed " + SEED + ", tree " + count + ": " + text;
      assertEquals(placeless(tree), placeless(read(text, place)), place);
    }
  }

  @ParameterizedTest
  @EnumSource(Spelling.class)
  void showingTwiceShowsTheSame(Spelling spelling) {
    RandomTrees trees = new RandomTrees(new Random(SEED + 1));
    for (int count = 0; count < TREES / 4; count++) {
      String text = StatementText.of(trees.statement(), spelling);
      assertEquals(text, StatementText.of(read(text, text), spelling), "seed " + (SEED + 1));
    }
  }

  @ParameterizedTest
  @EnumSource(Spelling.class)
  void asciiIsAscii(Spelling spelling) {
    String shown = StatementText.of(read("claim Δ[h] μ_k x↓2 ∘ ε(π) = 1", ""), spelling);
    assertEquals(spelling == Spelling.ASCII, shown.chars().allMatch(c -> c < 128), shown);
  }

  private static Statement read(String text, String place) {
    Source source = new Source("shown", text);
    Reading reading = StatementReader.read(source);
    if (reading instanceof Reading.Understood(var statement)) {
      return statement;
    }
    assertTrue(reading instanceof Reading.Rejected, "unfinished: " + place);
    throw new AssertionError(
        DiagnosticText.of(((Reading.Rejected) reading).diagnostic(), source) + "\n" + place);
  }

  private static String placeless(Statement tree) {
    return tree.toString().replaceAll("span=Span\\[start=\\d+, end=\\d+]", "");
  }
}
