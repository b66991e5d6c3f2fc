package gnomon.syntax;

import java.util.List;

/// A session file, `*.gnomon`: statements as typed, each with the answer it gave, and the comments
/// and blank lines between them, which stay where they are.
public record SessionFile(List<Block> blocks) {
  /// Copies the blocks.
  public SessionFile {
    blocks = List.copyOf(blocks);
  }

  /// A stretch of lines of one sort.
  public sealed interface Block {}

  /// Comments and blank lines, as they stand.
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
  }
}
