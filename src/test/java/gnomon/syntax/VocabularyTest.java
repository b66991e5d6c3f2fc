package gnomon.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.diagnostic.Source;
import gnomon.syntax.Lexeme.Role;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;

/// The table of words and what is made of it.
final class VocabularyTest {
  @Test
  void noSpellingIsThereTwice() {
    Set<String> seen = new HashSet<>();
    for (Word word : Vocabulary.words()) {
      assertTrue(seen.add(word.ascii()), word.ascii());
      word.glyph().ifPresent(glyph -> assertTrue(seen.add(glyph), glyph));
      assertTrue(word.description().length() <= 72, word.ascii());
      assertTrue(word.ascii().chars().allMatch(c -> c < 128), word.ascii());
    }
  }

  @Test
  void bothSpellingsAreOneLexemeAndReadAsTheSame() {
    for (Word word : Vocabulary.words()) {
      List<Lexeme> ascii = Lexemes.of(word.ascii());
      assertEquals(1, ascii.size(), word.ascii());
      word.glyph()
          .ifPresent(
              glyph -> {
                assertEquals(1, Lexemes.of(glyph).size(), glyph);
                assertEquals(ascii.getFirst().role(), Lexemes.of(glyph).getFirst().role(), glyph);
                assertEquals(word.ascii(), Vocabulary.ascii(glyph));
                assertEquals(glyph, Vocabulary.spelt(word.ascii(), Spelling.UNICODE));
              });
    }
  }

  @Test
  void lookalikesAreTheGlyphsTheyLookLike() {
    assertEquals("Delta", Vocabulary.ascii("∆"));
    assertEquals("mu", Vocabulary.ascii("µ"));
    assertEquals("Sigma", Vocabulary.ascii("∑"));
    assertEquals("Prod", Vocabulary.ascii("Π"));
    assertEquals("eps", Vocabulary.ascii("ϵ"));
  }

  @Test
  void openConstantsAreCWithANumber() {
    assertTrue(Vocabulary.isOpenConstant("C1"));
    assertTrue(Vocabulary.isOpenConstant("C12"));
    assertFalse(Vocabulary.isOpenConstant("C"));
    assertFalse(Vocabulary.isOpenConstant("C01"));
    assertFalse(Vocabulary.isOpenConstant("C1a"));
    assertTrue(Vocabulary.isReserved("C7"));
    assertFalse(Vocabulary.isReserved("C"));
  }

  @Test
  void nearMissesAreOfferedNearestFirst() {
    assertEquals(List.of("delta", "Delta"), Vocabulary.nearMisses("delat", List.of()));
    assertTrue(Vocabulary.nearMisses("Dleta", List.of()).contains("Delta"));
    assertTrue(Vocabulary.nearMisses("binomm", List.of()).contains("binom"));
    assertEquals(
        List.of("terraces"), Vocabulary.nearMisses("terrasces", List.of("terraces", "levels")));
    assertEquals(List.of(), Vocabulary.nearMisses("unheard", List.of()));
  }

  @Test
  void distanceCountsSlips() {
    assertEquals(0, Distance.between("shift", "shift"));
    assertEquals(1, Distance.between("shift", "shfit"));
    assertEquals(1, Distance.between("shift", "shit"));
    assertEquals(1, Distance.between("shift", "Shift"));
    assertEquals(2, Distance.between("shift", "shafts"));
  }

  @Test
  void lexemesCoverTheTextInOrder() {
    String text = "let q7 = Σ_k(x^2)  # half \"done\"";
    List<Lexeme> lexemes = Lexemes.of(text);
    assertEquals(
        List.of(
            Role.STATEMENT,
            Role.NAME,
            Role.SIGN,
            Role.OPERATOR,
            Role.NAME,
            Role.OPEN,
            Role.NAME,
            Role.SIGN,
            Role.NUMBER,
            Role.CLOSE,
            Role.COMMENT),
        lexemes.stream().map(Lexeme::role).toList());
    for (Lexeme lexeme : lexemes) {
      assertEquals(lexeme.text(), new Source("line", text).slice(lexeme.span()));
    }
  }

  @Test
  void bracketsFindTheirPartners() {
    List<Lexeme> lexemes = Lexemes.of("f([x, (2)], 3]");
    assertEquals(Optional.of(10), Lexemes.partner(lexemes, 2).map(span -> span.start() + 1));
    assertEquals(Optional.of(2), Lexemes.partner(lexemes, 9).map(span -> span.start()));
    assertEquals(Optional.empty(), Lexemes.partner(lexemes, 1));
    assertEquals(Optional.empty(), Lexemes.partner(lexemes, 0));
  }

  @Test
  void theWordAtTheCaretIsWhatCompletionCompletes() {
    assertEquals(Optional.of("Del"), Lexemes.wordAt("2 Del + 1", 5).map(Lexeme::text));
    assertEquals(Optional.empty(), Lexemes.wordAt("2 Del + 1", 7).map(Lexeme::text));
  }
}
