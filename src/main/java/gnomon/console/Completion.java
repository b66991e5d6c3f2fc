package gnomon.console;

import gnomon.session.Word;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Supplier;
import org.jline.reader.Candidate;
import org.jline.reader.Completer;
import org.jline.reader.LineReader;
import org.jline.reader.ParsedLine;

/// Completes the words of the language, the names that are defined, and file names between quotes;
/// each with a line that says what it is. A word typed in ASCII becomes its glyph where glyphs
/// show.
record Completion(Look look, Supplier<Vocabulary> vocabulary, Path folder) implements Completer {

  @Override
  public void complete(LineReader reader, ParsedLine line, List<Candidate> candidates) {
    if (!(line instanceof LineParser.Typed(String text, int cursor, Piece piece))) {
      return;
    }
    String start = piece.text().substring(0, cursor - piece.start());
    switch (piece.sort()) {
      case TEXT -> candidates.addAll(new FileNames(folder).beginningWith(start.substring(1)));
      case WORD -> words(start, candidates);
      case SPACE -> {
        if (FileNames.areWanted(text.substring(0, cursor))) {
          candidates.addAll(new FileNames(folder).beginningWith(""));
        } else {
          words("", candidates);
        }
      }
      case COMMENT, NUMBER, OPEN, CLOSE, SIGN -> {}
    }
  }

  private void words(String start, List<Candidate> candidates) {
    for (Word word : vocabulary.get().beginningWith(start)) {
      String value = look.isAscii() ? word.ascii() : word.spelling();
      String shown = value.equals(word.ascii()) ? value : word.ascii() + " " + value;
      candidates.add(
          new Candidate(
              value, shown, null, word.description(), null, null, false, candidates.size()));
    }
  }
}
