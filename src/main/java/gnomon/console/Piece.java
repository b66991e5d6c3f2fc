package gnomon.console;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/// A piece of a line as the eye takes it in, good enough to mark, complete and explain; what the
/// line means is for `syntax` to say. `start` is included, `end` is not.
record Piece(Sort sort, String text, int start, int end) {
  enum Sort {
    WORD,
    NUMBER,
    TEXT,
    COMMENT,
    OPEN,
    CLOSE,
    SIGN,
    SPACE
  }

  private static final Pattern PIECES =
      Pattern.compile(
          "(?<word>\\p{IsLatin}[\\p{IsLatin}0-9]*|[\\p{IsGreek}∂∫∑∏∇∆√∞])"
              + "|(?<number>[0-9]+(?:\\.[0-9]+)?|@[0-9]*)"
              + "|(?<text>\"[^\"\n]*\"?)"
              + "|(?<comment>#[^\n]*)"
              + "|(?<open>[(\\[{])"
              + "|(?<close>[)\\]}])"
              + "|(?<space>\\s+)"
              + "|(?<sign>.)",
          Pattern.DOTALL);

  /// All pieces of a line, which they cover without gaps.
  static List<Piece> of(String line) {
    List<Piece> pieces = new ArrayList<>();
    Matcher matcher = PIECES.matcher(line);
    while (matcher.find()) {
      pieces.add(new Piece(sort(matcher), matcher.group(), matcher.start(), matcher.end()));
    }
    return pieces;
  }

  private static Sort sort(Matcher matcher) {
    for (Sort sort : Sort.values()) {
      if (matcher.group(sort.name().toLowerCase(java.util.Locale.ROOT)) != null) {
        return sort;
      }
    }
    throw new IllegalStateException("the last alternative matches anything");
  }

  /// Whether the cursor stands in the piece or at its end.
  boolean touches(int cursor) {
    return start < cursor && cursor <= end;
  }
}
