package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;

final class PieceTest {
  private static final long SEED = 20260417;

  @Test
  void wordsEndAtSubscriptsAndGlyphsStandAlone() {
    assertEquals(List.of("Δ", "f", " ", "Delta", "_", "k"), texts("Δf Delta_k"));
  }

  @Test
  void aQuotedTextAndACommentAreOnePiece() {
    assertEquals(
        List.of("keep", " ", "\"a b\"", " ", "# so (far"), texts("keep \"a b\" # so (far"));
    assertEquals(List.of("keep", " ", "\"open"), texts("keep \"open"));
  }

  @Test
  void piecesCoverAnyLineWithoutGaps() {
    RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(SEED);
    for (int round = 0; round < 500; round++) {
      StringBuilder line = new StringBuilder();
      for (int i = random.nextInt(30); i > 0; i--) {
        line.appendCodePoint(random.nextInt(4) == 0 ? random.nextInt(0x2300) : random.nextInt(128));
      }
      assertEquals(line.toString(), String.join("", texts(line.toString())), "seed " + SEED);
    }
  }

  @Test
  void theCursorTouchesThePieceItEnds() {
    Piece word = Piece.of("Delta x").getFirst();
    assertTrue(word.touches(5));
    assertTrue(word.touches(1));
    assertFalse(word.touches(0));
    assertFalse(word.touches(6));
  }

  private static List<String> texts(String line) {
    return Piece.of(line).stream().map(Piece::text).toList();
  }
}
