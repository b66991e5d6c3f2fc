package gnomon.syntax;

import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/// Every word and sign of the language, for completion, help, near misses and spelling.
public final class Vocabulary {
  private static final int NEAR_MISSES = 3;

  private static final Map<String, Word> WORDS = index();

  /// Glyphs that are read but never shown, and the ones they stand for.
  private static final Map<String, String> LOOKALIKES =
      Map.of("∆", "Δ", "µ", "μ", "∑", "Σ", "Π", "∏", "ϵ", "ε");

  private static final Set<String> STEPPED = Set.of("Delta", "Nabla", "delta", "mu");

  private Vocabulary() {}

  /// All words and signs, by sort, in the order of the table.
  public static Collection<Word> words() {
    return sorts().flatMap(List::stream).toList();
  }

  /// The word or sign with this ASCII spelling or glyph. `C2`, `C3` and so on are the word `C1`.
  public static Optional<Word> find(String text) {
    Word word = WORDS.get(LOOKALIKES.getOrDefault(text, text));
    return word == null && isOpenConstant(text)
        ? Optional.of(WORDS.get("C1"))
        : Optional.ofNullable(word);
  }

  /// The ASCII spelling of a glyph; any other text is its own.
  public static String ascii(String text) {
    Word word = WORDS.get(LOOKALIKES.getOrDefault(text, text));
    return word == null ? text : word.ascii();
  }

  /// A name in the spelling asked for.
  public static String spelt(String name, Spelling spelling) {
    Word word = WORDS.get(name);
    return word == null ? name : word.spelt(spelling);
  }

  /// Whether `let` may not take this name.
  public static boolean isReserved(String name) {
    return find(name).filter(word -> word.sort() != Word.Sort.SIGN || isWord(name)).isPresent();
  }

  /// Whether the name is `C` with a number, a constant that an inverse leaves open.
  public static boolean isOpenConstant(String name) {
    return name.length() > 1
        && name.charAt(0) == 'C'
        && name.charAt(1) != '0'
        && name.chars().skip(1).allMatch(c -> c >= '0' && c <= '9');
  }

  /// Whether the operator takes a step in brackets, as `Delta[h]`.
  public static boolean takesStep(String name) {
    return STEPPED.contains(name);
  }

  /// The sign or word of the language for what a word of the trade means, such as `Sigma` for
  /// `sum`.
  public static Optional<String> meant(String word) {
    return Optional.ofNullable(
        switch (word.toLowerCase(Locale.ROOT)) {
          case "sum", "summation" -> "Sigma";
          case "prod", "product" -> "Prod";
          case "int", "integrate" -> "Integral";
          case "diff", "derivative" -> "D";
          case "difference" -> "Delta";
          case "shift" -> "E";
          case "binomial", "choose" -> "binom";
          case "factorial" -> "n!";
          case "harmonic" -> "H";
          case "log" -> "ln";
          case "infinity" -> "inf";
          default -> null;
        });
  }

  /// The words nearest to a misspelt one, nearest first, at most three, from the language and from
  /// `others` (names that are defined, say).
  public static List<String> nearMisses(String misspelt, Collection<String> others) {
    Stream<String> ours = WORDS.values().stream().filter(w -> isWord(w.ascii())).map(Word::ascii);
    return nearest(misspelt, Stream.concat(others.stream(), ours));
  }

  static List<String> nearest(String misspelt, Stream<String> candidates) {
    int reach = misspelt.length() <= 4 ? 1 : 2;
    return candidates
        .distinct()
        .filter(word -> word.length() > 1 && !word.equals(misspelt))
        .filter(word -> Math.abs(word.length() - misspelt.length()) <= reach)
        .filter(word -> Distance.between(misspelt, word) <= reach)
        .sorted(Comparator.comparingInt(word -> Distance.between(misspelt, word)))
        .limit(NEAR_MISSES)
        .toList();
  }

  private static boolean isWord(String text) {
    return Character.isLetter(text.charAt(0));
  }

  private static Stream<List<Word>> sorts() {
    return Stream.of(
        WordTable.OPERATORS,
        WordTable.FUNCTIONS,
        WordTable.CONSTANTS,
        WordTable.STATEMENTS,
        WordTable.CLAUSES,
        WordTable.SIGNS);
  }

  private static Map<String, Word> index() {
    Map<String, Word> index = new LinkedHashMap<>();
    sorts()
        .flatMap(List::stream)
        .forEach(
            word -> {
              index.put(word.ascii(), word);
              word.glyph().ifPresent(glyph -> index.put(glyph, word));
            });
    return index;
  }
}
