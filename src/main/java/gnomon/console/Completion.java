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
record Completion(Look look, Supplier<KnownWords> words, Path folder) implements Completer {

  @Override
  public void complete(LineReader reader, ParsedLine line, List<Candidate> candidates) {
    if (line instanceof LineParser.Typed typed) {
      candidates.addAll(candidates(typed));
    }
  }

  List<Candidate> candidates(LineParser.Typed typed) {
    if (typed.isFile()) {
      return new FileNames(folder).beginningWith(typed.beginning());
    }
    return words.get().beginningWith(typed.beginning()).stream().map(this::candidate).toList();
  }

  private Candidate candidate(Word word) {
    String value = look.isAscii() ? word.ascii() : word.spelling();
    String shown = value.equals(word.ascii()) ? value : word.ascii() + " " + value;
    return new Candidate(value, shown, null, word.description(), null, null, false);
  }
}
