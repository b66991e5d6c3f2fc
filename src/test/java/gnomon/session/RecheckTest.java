package gnomon.session;

import static gnomon.session.RecheckReport.Outcome.DIFFERS;
import static gnomon.session.RecheckReport.Outcome.FAILED;
import static gnomon.session.RecheckReport.Outcome.SAME;
import static gnomon.session.RecheckReport.Outcome.WRITTEN_DIFFERENTLY;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringReader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;

/// Rechecking: answers are compared by value, errors by their code, and nothing is written.
final class RecheckTest {

  private static RecheckReport check(String text) {
    return Recheck.check(Path.of("terrace.gnomon"), text, Settings.batch());
  }

  private static RecheckReport.Outcome outcome(String statement, String... recorded) {
    StringBuilder text = new StringBuilder(statement + "\n");
    for (String line : recorded) {
      text.append("| ").append(line).append('\n');
    }
    return check(text.toString()).items().getFirst().outcome();
  }

  @Test
  void theRecordedAnswerIsTheSame() {
    assertEquals(SAME, outcome("Sigma x", "1/2 x^2 - 1/2 x", "@1 closed form"));
    assertEquals(SAME, outcome("Delta^2", "Delta^2", "@1"));
  }

  @Test
  void anotherWritingOfTheValueIsTheSameValue() {
    assertEquals(WRITTEN_DIFFERENTLY, outcome("Sigma x", "x (x - 1)/2", "@1 closed form"));
    assertEquals(WRITTEN_DIFFERENTLY, outcome("Delta", "E - 1", "@1"));
    assertEquals(WRITTEN_DIFFERENTLY, outcome("x^2 for x: 0..1", "[[0, 0],", " [1, 1]]", "@1"));
    assertEquals(WRITTEN_DIFFERENTLY, outcome("exp(x) to 1", "1 + x + O(x^2)", "@1 what"));
  }

  @Test
  void anotherValueDiffers() {
    assertEquals(DIFFERS, outcome("Sigma x", "1/2 x^2 + 1/2 x", "@1 closed form"));
    assertEquals(DIFFERS, outcome("Sigma x", "not an answer at all(", "@1"));
    assertEquals(DIFFERS, outcome("1 + 1"));
    assertEquals(DIFFERS, outcome("1 + 1", "error name-unknown: x"));
  }

  @Test
  void verdictsCompareByWhatWasDecided() {
    assertEquals(SAME, outcome("claim 1 = 1", "proved: both sides have the normal form 1", "@1"));
    assertEquals(WRITTEN_DIFFERENTLY, outcome("claim 1 = 1", "proved: obviously", "@1"));
    assertEquals(DIFFERS, outcome("claim 1 = 2", "proved: both sides are 1", "@1"));
  }

  @Test
  void errorsCompareByTheirCode() {
    String recorded = "error domain-division-by-zero: the divisor is zero";
    assertEquals(WRITTEN_DIFFERENTLY, outcome("1/0", recorded));
    assertEquals(FAILED, outcome("1/0", "7", "@1"));
    assertEquals(FAILED, outcome("1/0", "error name-unknown: another one"));
  }

  @Test
  void movedHandlesAreReportedAndDoNotCount() {
    RecheckReport report = check("1 + 1\n| 2\n| @1\n\n3\n| 3\n| @1\n");
    assertTrue(report.isGood());
    assertTrue(report.items().get(1).movedHandle());
    assertTrue(
        report.lines().contains("terrace.gnomon: 1 handle moved (not counted as differences)"));
  }

  @Test
  void aRecheckRunsInAFreshSession() {
    Session session = Session.of(Settings.batch());
    session.submit("let a = 3");
    assertEquals(SAME, outcome("a", "a", "@1"));
  }

  @Test
  void severalFilesAreCheckedAtOnceAndReportedInOrder() {
    List<Recheck.Input> inputs =
        List.of(
            new Recheck.Input(Path.of("a.gnomon"), "1\n| 1\n| @1\n"),
            new Recheck.Input(Path.of("b.gnomon"), "2\n| 3\n| @1\n"),
            new Recheck.Input(Path.of("c.gnomon"), "1/0\n| 3\n| @1\n"));
    List<RecheckReport> reports = Recheck.checkAll(inputs, Settings.batch(), 2);
    assertEquals(
        List.of("a.gnomon", "b.gnomon", "c.gnomon"),
        reports.stream().map(report -> report.file().toString()).toList());
    assertEquals(
        "3 files: 3 statements: 1 same, 1 differs, 1 failed", RecheckReport.summary(reports));
  }

  @Test
  void theXmlReportIsWellFormedAndCounts()
      throws ParserConfigurationException, IOException, SAXException {
    String xml =
        JunitReport.xml(List.of(check("claim x < 1 & \"y\"\n| a\u0001<b>\n2\n| 3\n| @1\n")));
    var document =
        DocumentBuilderFactory.newInstance()
            .newDocumentBuilder()
            .parse(new InputSource(new StringReader(xml)));
    var suite = document.getElementsByTagName("testsuite").item(0).getAttributes();
    assertEquals("2", suite.getNamedItem("tests").getNodeValue());
    assertEquals("1", suite.getNamedItem("failures").getNodeValue());
    assertEquals("1", suite.getNamedItem("errors").getNodeValue());
  }

  @Test
  void keptFilesRecheckAndReplay(@TempDir Path folder) throws IOException {
    Session session = Session.of(Settings.batch().withFolder(folder));
    session.submit("let phi = umbral(Delta)");
    session.submit("phi x^3");
    session.submit("1/0");
    session.submit("claim phi D = Delta phi");
    assertTrue(session.submit("keep \"a.gnomon\"").isAccepted());
    String kept = Files.readString(folder.resolve("a.gnomon"));
    assertEquals(session.transcript(), kept);
    assertFalse(kept.contains("1/0"));
    assertTrue(session.submit("recheck \"a.gnomon\"").isAccepted());
    assertEquals(kept, Files.readString(folder.resolve("a.gnomon")));
    Session fresh = Session.of(Settings.batch().withFolder(folder));
    Reply replayed = fresh.submit("replay \"a.gnomon\"");
    assertEquals(3, ((Reply.Replayed) replayed).exchanges().size());
    assertEquals("x^2 - x", first(fresh, "phi x^2"));
  }

  @Test
  void rerecordingWritesTheAnswersAnewAndKeepsTheComments(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("a.gnomon");
    Files.writeString(file, "# stones\n1 + 1\n| 3\n| @1\n\n# more\nxD\n");
    Session session = Session.of(Settings.batch().withFolder(folder));
    assertFalse(session.submit("recheck \"a.gnomon\"").isAccepted());
    assertTrue(session.submit("rerecord \"a.gnomon\"").isAccepted());
    assertEquals(
        "# stones\n1 + 1\n| 2\n| @1\n\n# more\nxD\n"
            + "| error name-unknown: xD has no meaning\n| Try: x D\n",
        Files.readString(file));
  }

  @Test
  void filesThatCannotBeReadAreErrors(@TempDir Path folder) {
    Session session = Session.of(Settings.batch().withFolder(folder));
    for (String word : List.of("replay", "recheck", "rerecord")) {
      Reply reply = session.submit(word + " \"none.gnomon\"");
      assertEquals("domain-file-unreadable", ((Reply.Failure) reply).diagnostic().code(), word);
    }
    Reply reply = session.submit("keep \"no/such/folder/a.gnomon\"");
    assertEquals("domain-file-unwritable", ((Reply.Failure) reply).diagnostic().code());
  }

  private static String first(Session session, String statement) {
    return ReplyText.lines(session.submit(statement), Spelling.ASCII).getFirst();
  }
}
