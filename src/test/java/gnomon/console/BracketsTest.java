package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.syntax.Lexemes;
import java.util.Set;
import org.junit.jupiter.api.Test;

final class BracketsTest {
  @Test
  void theBracketBeforeTheCursorShowsItsPartner() {
    assertEquals(Set.of(0, 6), brackets("(a[1]b)").pairAt(7));
    assertEquals(Set.of(2, 4), brackets("(a[1]b)").pairAt(5));
  }

  @Test
  void otherwiseTheBracketUnderTheCursorDoes() {
    assertEquals(Set.of(2, 4), brackets("(a[1]b)").pairAt(2));
  }

  @Test
  void aBracketOfTheWrongKindClosesNothing() {
    assertEquals(Set.of(3), brackets("(a ]").stray());
    assertEquals(Set.of(), brackets("(a ]").pairAt(4));
  }

  @Test
  void bracketsInTextsAndCommentsDoNotCount() {
    assertEquals(Set.of(), brackets("keep \")\" # )").stray());
  }

  private static Brackets brackets(String line) {
    return Brackets.of(Lexemes.of(line));
  }
}
