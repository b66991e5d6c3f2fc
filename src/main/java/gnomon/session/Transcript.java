package gnomon.session;

import gnomon.syntax.SessionFile;
import java.util.ArrayList;
import java.util.List;

/// What was done so far as the text of a session file.
final class Transcript {

  private Transcript() {}

  static String of(State state, Spelling spelling) {
    List<SessionFile.Block> blocks = new ArrayList<>();
    int line = 1;
    for (Exchange exchange : state.exchanges()) {
      List<String> answer = ReplyText.lines(exchange.reply(), spelling);
      blocks.add(new SessionFile.Exchange(exchange.statement(), line, answer));
      blocks.add(new SessionFile.Prose(List.of("")));
      line += (int) exchange.statement().lines().count() + answer.size() + 1;
    }
    return new SessionFile(blocks).text();
  }
}
