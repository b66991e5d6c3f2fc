package gnomon.console;

import gnomon.diagnostic.Columns;
import gnomon.diagnostic.DiagnosticText;
import gnomon.session.Exchange;
import gnomon.session.HelpPage;
import gnomon.session.RecheckReport;
import gnomon.session.Reply;
import java.util.ArrayList;
import java.util.List;
import org.jline.utils.AttributedString;

/// Replies as lines for a terminal of some width.
record Printed(Look look, int width) {

  /// The lines of a reply.
  List<AttributedString> lines(Reply reply) {
    return switch (reply) {
      case Reply.Answer answer -> {
        List<AttributedString> lines = new ArrayList<>();
        answer.shown().lines(look.spelling(), width).forEach(line -> lines.add(plain(line)));
        wrapped(answer.statusLine(), width).forEach(line -> lines.add(small(line)));
        yield lines;
      }
      case Reply.Note(List<String> lines) -> all(lines);
      case Reply.Page(HelpPage page) -> all(page.lines());
      case Reply.Failure(var diagnostic, var source) ->
          all(DiagnosticText.of(diagnostic, source, width).lines().toList());
      case Reply.Replayed(List<Exchange> exchanges) -> replayed(exchanges);
      case Reply.Rechecked(RecheckReport report) -> all(report.lines());
      case Reply.Nothing _, Reply.Left _ -> List.of();
    };
  }

  private List<AttributedString> replayed(List<Exchange> exchanges) {
    List<AttributedString> lines = new ArrayList<>();
    for (Exchange exchange : exchanges) {
      String prompt = look.prompt();
      for (String line : exchange.statement().lines().toList()) {
        wrapped(prompt + line, width).forEach(part -> lines.add(small(part)));
        prompt = look.continuation();
      }
      lines.addAll(lines(exchange.reply()));
    }
    return lines;
  }

  private List<AttributedString> all(List<String> lines) {
    List<AttributedString> all = new ArrayList<>();
    for (String line : lines) {
      wrapped(line, width).forEach(part -> all.add(plain(part)));
    }
    return all;
  }

  private static AttributedString plain(String text) {
    return new AttributedString(text);
  }

  private AttributedString small(String text) {
    return new AttributedString(text, look.small());
  }

  /// Breaks a line of prose at blanks; what follows keeps the indentation. A word wider than the
  /// line is left whole.
  static List<String> wrapped(String line, int width) {
    if (Columns.of(line) <= width) {
      return List.of(line);
    }
    String indentation = " ".repeat(line.length() - line.stripLeading().length());
    List<String> lines = new ArrayList<>();
    StringBuilder open = new StringBuilder(indentation);
    for (String word : line.strip().split(" ")) {
      boolean begun = open.length() > indentation.length();
      if (begun && Columns.of(open.toString()) + 1 + Columns.of(word) > width) {
        lines.add(open.toString());
        open = new StringBuilder(indentation);
        begun = false;
      }
      open.append(begun ? " " : "").append(word);
    }
    lines.add(open.toString());
    return lines;
  }
}
