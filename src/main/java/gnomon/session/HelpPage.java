package gnomon.session;

import java.util.List;

/// The page of one word of the language: its spellings (the first is the ASCII one), one line that
/// says what it means, the text, and examples in the form of a session file with their recorded
/// answers.
public record HelpPage(
    List<String> spellings, String description, List<String> text, List<String> examples) {

  public HelpPage {
    if (spellings.isEmpty()) {
      throw new IllegalArgumentException("a page needs a word");
    }
    spellings = List.copyOf(spellings);
    text = List.copyOf(text);
    examples = List.copyOf(examples);
  }

  /// The ASCII spelling of the word.
  public String word() {
    return spellings.getFirst();
  }

  /// The page as lines of plain text.
  public List<String> lines() {
    var lines = new java.util.ArrayList<String>();
    lines.add(String.join(", ", spellings) + ": " + description);
    lines.addAll(text);
    if (!examples.isEmpty()) {
      lines.add("");
      examples.forEach(line -> lines.add(line.isEmpty() ? "" : "    " + line));
    }
    return List.copyOf(lines);
  }
}
