package gnomon.render;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Halt;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Kind;
import gnomon.diagnostic.Source;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.syntax.Reading;
import gnomon.syntax.StatementReader;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class WordingTest {
  private static final Span HERE = new Span(0, 1);
  private static final Wording WORDING = Wording.in(Rendering.unicode(60));

  private static Diagnostic of(Reason reason, Object... data) {
    return WORDING.of(new Refusal(reason, data), HERE);
  }

  @ParameterizedTest
  @EnumSource(Reason.class)
  void everyReasonHasWordsOfItsOwn(Reason reason) {
    assertTrue(RefusalWords.knows(reason.name()));
    Words words = RefusalWords.of(reason.name());
    assertTrue(words.fact().length() < Diagnostic.MESSAGE_LIMIT, words.fact());
  }

  @ParameterizedTest
  @EnumSource(Reason.class)
  void everyLineToTryIsASentenceOfTheLanguage(Reason reason) {
    Diagnostic diagnostic = of(reason, Spelt.x, Spelt.x, Spelt.x);
    String hint = diagnostic.hint().orElseThrow();
    assertInstanceOf(
        Reading.Understood.class, StatementReader.read(new Source("hint", hint)), hint);
  }

  @Test
  void theValuesOfARefusalAreQuoted() {
    Diagnostic diagnostic = of(Reason.NO_INVERSE, Spelt.x.times(Spelt.t));
    assertEquals("domain-no-inverse", diagnostic.code());
    assertEquals(List.of("It is X D."), diagnostic.evidence());
  }

  @Test
  void evidenceIsLeftOutWhereItsValueIsMissing() {
    assertEquals(List.of(), of(Reason.DIVISION_BY_ZERO).evidence());
    assertEquals(
        List.of("What is divided is 1."), of(Reason.DIVISION_BY_ZERO, Form.ONE).evidence());
  }

  @Test
  void haltsAreLimits() {
    for (Halt.Cause cause : Halt.Cause.values()) {
      assertEquals(Kind.LIMIT, WORDING.of(new Halt(cause, 10), HERE).problem().kind());
    }
  }
}
