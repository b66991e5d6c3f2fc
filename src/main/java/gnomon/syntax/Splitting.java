package gnomon.syntax;

import gnomon.syntax.SessionFile.Block;
import gnomon.syntax.SessionFile.Exchange;
import gnomon.syntax.SessionFile.Prose;
import java.util.ArrayList;
import java.util.List;

/// The lines of a session file into blocks. Takes time proportional to the length of the file.
final class Splitting {
  private final List<String> lines;
  private final List<Block> blocks = new ArrayList<>();
  private final List<String> prose = new ArrayList<>();
  private int at;

  Splitting(String text) {
    lines = text.lines().toList();
  }

  List<Block> blocks() {
    while (at < lines.size()) {
      String line = lines.get(at);
      if (isProse(line) || isAnswer(line)) {
        prose.add(line);
        at++;
      } else {
        flush();
        blocks.add(exchange());
      }
    }
    flush();
    return blocks;
  }

  private Exchange exchange() {
    int first = at + 1;
    List<String> statement = new ArrayList<>();
    Continuation continuation = new Continuation();
    do {
      continuation.add(lines.get(at));
      statement.add(lines.get(at));
      at++;
    } while (continuation.isOpen() && at < lines.size() && carriesOn(lines.get(at)));
    List<String> answer = new ArrayList<>();
    while (at < lines.size() && isAnswer(lines.get(at))) {
      answer.add(lines.get(at).substring(lines.get(at).startsWith("| ") ? 2 : 1));
      at++;
    }
    return new Exchange(String.join("\n", statement), first, answer);
  }

  private static boolean carriesOn(String line) {
    return !line.isBlank() && !isAnswer(line);
  }

  private void flush() {
    if (!prose.isEmpty()) {
      blocks.add(new Prose(prose));
      prose.clear();
    }
  }

  private static boolean isProse(String line) {
    return line.isBlank() || line.stripLeading().startsWith("#");
  }

  private static boolean isAnswer(String line) {
    return line.startsWith("|");
  }
}
