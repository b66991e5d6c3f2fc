package gnomon.console;

import gnomon.session.Word;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The words known while one line is being typed, by both spellings.
final class KnownWords {
  private static final Comparator<Word> ALPHABETICAL =
      Comparator.comparing(Word::ascii, String.CASE_INSENSITIVE_ORDER).thenComparing(Word::ascii);

  private final List<Word> words;
  private final Map<String, Word> bySpelling = new HashMap<>();

  private KnownWords(List<Word> words) {
    this.words = List.copyOf(words);
  }

  static KnownWords of(List<Word> words) {
    KnownWords known = new KnownWords(words);
    for (Word word : words) {
      known.bySpelling.putIfAbsent(word.ascii(), word);
      known.bySpelling.putIfAbsent(word.spelling(), word);
    }
    return known;
  }

  Optional<Word> word(String spelling) {
    return Optional.ofNullable(bySpelling.get(spelling));
  }

  /// The words that begin so in either spelling, in alphabetical order of the ASCII one.
  List<Word> beginningWith(String start) {
    List<Word> found = new ArrayList<>();
    for (Word word : words) {
      boolean fits = word.ascii().startsWith(start) || word.spelling().startsWith(start);
      if (fits && Character.isLetter(word.ascii().codePointAt(0))) {
        found.add(word);
      }
    }
    found.sort(ALPHABETICAL);
    return found;
  }
}
