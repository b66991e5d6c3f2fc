package gnomon.console;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Supplier;
import org.jline.reader.LineReader;
import org.jline.reader.LineReader.Option;
import org.jline.terminal.Terminal;

/// Sets a line editor up for the language.
final class Editors {
  private static final int HISTORY_SIZE = 5000;

  private Editors() {}

  static LineEditor of(
      Terminal terminal, Look look, Supplier<KnownWords> words, Optional<Path> history, Path folder)
      throws IOException {
    LineEditor editor = new LineEditor(terminal, look, words);
    editor.setParser(new LineParser());
    editor.setHighlighter(new Marking(look, words));
    editor.setCompleter(new Completion(look, words, folder));
    editor.setCompletionMatcher(new AllFit());
    editor.option(Option.DISABLE_EVENT_EXPANSION, true);
    editor.option(Option.HISTORY_REDUCE_BLANKS, false);
    editor.option(Option.HISTORY_IGNORE_SPACE, false);
    editor.option(Option.CASE_INSENSITIVE_SEARCH, true);
    // answers end with their line, and the mark that this would write has a colour
    editor.option(Option.AUTO_FRESH_LINE, false);
    editor.setVariable(LineReader.SECONDARY_PROMPT_PATTERN, look.continuation());
    history.ifPresent(file -> editor.setVariable(LineReader.HISTORY_FILE, file));
    editor.setVariable(LineReader.HISTORY_SIZE, HISTORY_SIZE);
    editor.setVariable(LineReader.HISTORY_FILE_SIZE, HISTORY_SIZE);
    editor.setVariable(LineReader.BLINK_MATCHING_PAREN, 0);
    editor.setVariable(LineReader.COMPLETION_STYLE_STARTING, "bold");
    editor.setVariable(LineReader.COMPLETION_STYLE_DESCRIPTION, "faint");
    editor.setVariable(LineReader.COMPLETION_STYLE_GROUP, "underline");
    editor.setVariable(LineReader.COMPLETION_STYLE_SELECTION, "inverse");
    editor.setVariable(LineReader.COMPLETION_STYLE_LIST_STARTING, "bold");
    editor.setVariable(LineReader.COMPLETION_STYLE_LIST_DESCRIPTION, "faint");
    editor.setVariable(LineReader.COMPLETION_STYLE_LIST_GROUP, "underline");
    editor.setVariable(LineReader.COMPLETION_STYLE_LIST_SELECTION, "inverse");
    return editor;
  }
}
