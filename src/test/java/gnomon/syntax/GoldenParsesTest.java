package gnomon.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.DiagnosticText;
import gnomon.diagnostic.Source;
import gnomon.syntax.SessionFile.Exchange;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

/// Statements and what they are read as. The grouping follows sections 2 to 4 of
/// `grammar/LANGUAGE.md`; a file whose answers are not as recorded fails, and what was read instead
/// is written under `target/goldens` to be looked at.
final class GoldenParsesTest {
  private static final Path GOLDEN = Path.of("src/test/resources/gnomon/syntax/parses.gnomon");

  @Test
  void everyStatementIsReadAsRecorded() throws IOException {
    SessionFile recorded = SessionFile.parse(Files.readString(GOLDEN));
    SessionFile read =
        new SessionFile(recorded.blocks().stream().map(GoldenParsesTest::answered).toList());
    Path actual = Path.of("target/goldens/parses.gnomon");
    Files.createDirectories(actual.getParent());
    Files.writeString(actual, read.text());
    assertEquals(recorded.text(), read.text());
  }

  @Test
  void atLeastAThirdAreMistakes() throws IOException {
    List<Exchange> all = SessionFile.parse(Files.readString(GOLDEN)).exchanges();
    long mistakes =
        all.stream().filter(exchange -> exchange.answer().getFirst().startsWith("error ")).count();
    assertTrue(all.size() > 150, all.size() + " statements");
    assertTrue(3 * mistakes >= all.size(), mistakes + " of " + all.size());
  }

  private static SessionFile.Block answered(SessionFile.Block block) {
    return switch (block) {
      case SessionFile.Prose prose -> prose;
      case Exchange exchange -> exchange.withAnswer(answer(exchange.statement()));
    };
  }

  private static List<String> answer(String statement) {
    Source source = new Source("golden", statement);
    return switch (StatementReader.read(source)) {
      case Reading.Understood(var tree) -> List.of(Outline.of(tree));
      case Reading.Unfinished(var diagnostic) -> error("unfinished", diagnostic, source);
      case Reading.Rejected(var diagnostic) -> error("rejected", diagnostic, source);
    };
  }

  private static List<String> error(String how, Diagnostic diagnostic, Source source) {
    String head = "error " + diagnostic.code() + ", " + how + "\n";
    return (head + DiagnosticText.of(diagnostic, source)).lines().toList();
  }
}
