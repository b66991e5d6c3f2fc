package gnomon.syntax;

import java.util.ArrayList;
import java.util.List;

/// A session file, `*.gnomon`: statements as typed, each with the answer it gave on lines that
/// start with `|`, and the comments and blank lines between them, which stay where they are.
///
/// A statement takes the lines that it asks for by an open bracket or a trailing operator, but
/// never a blank line or an answer line, so that one slip does not swallow the file.
public record SessionFile(List<Block> blocks) {
  /// Copies the blocks.
  public SessionFile {
    blocks = List.copyOf(blocks);
  }

  /// A stretch of lines of one sort.
  public sealed interface Block {}

  /// Comments and blank lines, as they stand; also answer lines that follow no statement.
  public record Prose(List<String> lines) implements Block {
    /// Copies the lines.
    public Prose {
      lines = List.copyOf(lines);
    }
  }

  /// A statement, the number of its first line, and the lines of its recorded answer without their
  /// bars. The statement may take several lines, joined by `\n`.
  public record Exchange(String statement, int line, List<String> answer) implements Block {
    /// Copies the answer.
    public Exchange {
      answer = List.copyOf(answer);
    }

    /// The same statement with another answer.
    public Exchange withAnswer(List<String> lines) {
      return new Exchange(statement, line, lines);
    }
  }

  /// The file with this text. Every text is one; `text()` gives it back, save that line breaks
  /// become `\n`, the last line gets one, and a space follows each bar.
  public static SessionFile parse(String text) {
    return new SessionFile(
        new Splitting(text.startsWith("\uFEFF") ? text.substring(1) : text).blocks());
  }

  /// The statements with their answers, in order.
  public List<Exchange> exchanges() {
    List<Exchange> exchanges = new ArrayList<>();
    for (Block block : blocks) {
      switch (block) {
        case Exchange exchange -> exchanges.add(exchange);
        case Prose _ -> {}
      }
    }
    return exchanges;
  }

  /// The text of the file.
  public String text() {
    StringBuilder text = new StringBuilder();
    for (Block block : blocks) {
      switch (block) {
        case Prose(var lines) -> lines.forEach(line -> text.append(line).append('\n'));
        case Exchange(var statement, _, var answer) -> {
          text.append(statement).append('\n');
          answer.forEach(line -> text.append(line.isEmpty() ? "|" : "| " + line).append('\n'));
        }
      }
    }
    return text.toString();
  }
}
