package gnomon.syntax;

/// How many slips of the finger lie between two words: a letter missing, added, wrong, or swapped
/// with its neighbour; letters that differ only in case count as half a slip, rounded up in total.
///
/// Source: the restricted edit distance of Damerau (1964) and Levenshtein (1966), from memory.
final class Distance {
  private Distance() {}

  static int between(String left, String right) {
    int[] before = new int[right.length() + 1];
    int[] above = new int[right.length() + 1];
    for (int j = 0; j <= right.length(); j++) {
      above[j] = 2 * j;
    }
    for (int i = 1; i <= left.length(); i++) {
      int[] row = new int[right.length() + 1];
      row[0] = 2 * i;
      for (int j = 1; j <= right.length(); j++) {
        int change = above[j - 1] + cost(left.charAt(i - 1), right.charAt(j - 1));
        row[j] = Math.min(change, 2 + Math.min(above[j], row[j - 1]));
        if (swapped(left, i, right, j)) {
          row[j] = Math.min(row[j], before[j - 2] + 2);
        }
      }
      before = above;
      above = row;
    }
    return (above[right.length()] + 1) / 2;
  }

  private static boolean swapped(String left, int i, String right, int j) {
    return i > 1
        && j > 1
        && left.charAt(i - 1) == right.charAt(j - 2)
        && left.charAt(i - 2) == right.charAt(j - 1);
  }

  private static int cost(char left, char right) {
    if (left == right) {
      return 0;
    }
    return Character.toLowerCase(left) == Character.toLowerCase(right) ? 1 : 2;
  }
}
