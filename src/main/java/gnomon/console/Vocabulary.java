package gnomon.console;

import gnomon.session.Word;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The words known while one line is being typed, by both spellings.
final class Vocabulary {
  private final List<Word> words;
  private final Map<String, Word> bySpelling;

  private Vocabulary(List<Word> words) {
    this.words = List.copyOf(words);
    this.bySpelling = new HashMap<>();
    for (Word word : words) {
      bySpelling.putIfAbsent(word.ascii(), word);
      bySpelling.putIfAbsent(word.spelling(), word);
    }
  }

  static Vocabulary of(List<Word> words) {
    return new Vocabulary(words);
  }

  Optional<Word> word(String spelling) {
    return Optional.ofNullable(bySpelling.get(spelling));
  }

  /// The words that begin so in either spelling, in alphabetical order of the ASCII one.
  List<Word> beginningWith(String start) {
    List<Word> found = new ArrayList<>();
    for (Word word : words) {
      if (word.ascii().startsWith(start) || word.spelling().startsWith(start)) {
        found.add(word);
      }
    }
    found.sort(
        (one, other) -> {
          int order = one.ascii().compareToIgnoreCase(other.ascii());
          return order != 0 ? order : one.ascii().compareTo(other.ascii());
        });
    return found;
  }
}
