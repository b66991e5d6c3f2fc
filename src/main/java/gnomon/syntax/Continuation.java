package gnomon.syntax;

import gnomon.syntax.grammar.GnomonParser;
import java.util.List;
import org.antlr.v4.runtime.Token;

/// Whether the lines so far ask for another one: a bracket is open or the last token is an
/// operator. Each line is looked at once.
public final class Continuation {
  private int depth;
  private boolean trailing;
  private boolean started;
  private boolean closed;

  /// A statement without lines so far.
  public Continuation() {}

  /// Takes one more line.
  public void add(String line) {
    List<? extends Token> tokens = Tokens.visible(line);
    if (tokens.isEmpty()) {
      return;
    }
    if (!started) {
      closed = tokens.getFirst().getType() == GnomonParser.HELP;
      started = true;
    }
    for (Token token : tokens) {
      if (Tokens.opens(token)) {
        depth++;
      } else if (Tokens.closes(token)) {
        depth--;
      }
      closed |= depth < 0 || depth > Limits.NESTING;
    }
    trailing = Tokens.carriesOver(tokens.getLast());
  }

  /// Whether another line belongs to the statement.
  public boolean isOpen() {
    return !closed && (depth > 0 || trailing);
  }
}
