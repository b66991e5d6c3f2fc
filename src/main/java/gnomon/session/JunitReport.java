package gnomon.session;

import java.util.List;
import java.util.Locale;

/// Recheck reports in the XML form that continuous-integration services read: one suite for each
/// file, one case for each statement.
public final class JunitReport {

  private JunitReport() {}

  /// The XML text.
  public static String xml(List<RecheckReport> reports) {
    var out = new StringBuilder("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<testsuites>\n");
    reports.forEach(report -> suite(report, out));
    return out.append("</testsuites>\n").toString();
  }

  private static void suite(RecheckReport report, StringBuilder out) {
    out.append("  <testsuite name=\"").append(escaped(report.file().toString()));
    out.append("\" tests=\"").append(report.items().size());
    out.append("\" failures=\"").append(report.count(RecheckReport.Outcome.DIFFERS));
    out.append("\" errors=\"").append(report.count(RecheckReport.Outcome.FAILED));
    out.append("\" time=\"").append(seconds(report.nanos())).append("\">\n");
    report.items().forEach(item -> testCase(report, item, out));
    out.append("  </testsuite>\n");
  }

  private static void testCase(RecheckReport report, RecheckReport.Item item, StringBuilder out) {
    out.append("    <testcase classname=\"").append(escaped(report.file().toString()));
    out.append("\" name=\"").append(escaped("line " + item.line() + ": " + item.statement()));
    out.append("\" time=\"").append(seconds(item.nanos())).append('"');
    switch (item.outcome()) {
      case SAME, WRITTEN_DIFFERENTLY -> out.append("/>\n");
      case DIFFERS -> problem("failure", item, out);
      case FAILED -> problem("error", item, out);
    }
  }

  private static void problem(String element, RecheckReport.Item item, StringBuilder out) {
    out.append(">\n      <").append(element).append(" message=\"");
    out.append(item.outcome().words()).append("\">");
    item.recorded().forEach(line -> out.append(escaped("recorded | " + line)).append('\n'));
    item.answered().forEach(line -> out.append(escaped("now      | " + line)).append('\n'));
    out.append("</").append(element).append(">\n    </testcase>\n");
  }

  private static String seconds(long nanos) {
    long millis = nanos / 1_000_000;
    return String.format(Locale.ROOT, "%d.%03d", millis / 1000, millis % 1000);
  }

  private static String escaped(String text) {
    var out = new StringBuilder();
    text.codePoints()
        .forEach(
            point -> {
              switch (point) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\n' -> out.append("&#10;");
                default -> out.appendCodePoint(isXml(point) ? point : 0xFFFD);
              }
            });
    return out.toString();
  }

  private static boolean isXml(int point) {
    return point == 0x9
        || (point >= 0x20 && point <= 0xD7FF)
        || (point >= 0xE000 && point <= 0xFFFD)
        || point >= 0x10000;
  }
}
