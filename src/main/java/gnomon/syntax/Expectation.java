package gnomon.syntax;

import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayList;
import java.util.List;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.misc.IntervalSet;

/// What the grammar could go on with, in words for people: at most five.
final class Expectation {
  private static final int MOST = 5;

  private Expectation() {}

  /// The words for these token types, the most telling first.
  static List<String> words(IntervalSet expected) {
    if (expected.contains(GnomonParser.LET)) {
      return List.of("a statement");
    }
    List<String> words = new ArrayList<>();
    boolean comparison = expected.contains(GnomonParser.AT_LEAST);
    if (!comparison) {
      single(words, expected, GnomonParser.EQUALS, "`=`");
    }
    single(words, expected, GnomonParser.COLON, "`:`");
    single(words, expected, GnomonParser.DOTS, "`..`");
    single(words, expected, GnomonParser.STRING, "a file name in double quotes");
    single(words, expected, GnomonParser.FRACTIONS, "`fractions`");
    boolean afterOperand = expected.contains(GnomonParser.TIMES);
    if (afterOperand) {
      words.add("an operation");
    } else if (expected.contains(GnomonParser.NUMBER)) {
      words.add("a value");
    } else if (expected.contains(GnomonParser.NAME)) {
      words.add("a name");
    } else {
      single(words, expected, GnomonParser.HANDLE, "a handle such as @3");
    }
    single(words, expected, GnomonParser.GIVEN, "`given`");
    if (comparison) {
      words.add("a comparison");
    }
    single(words, expected, GnomonParser.INTEGER, "`integer`");
    if (expected.contains(GnomonParser.IN)) {
      words.add("a clause");
    } else {
      single(words, expected, GnomonParser.TO, "`to`");
      single(words, expected, GnomonParser.FOR, "`for`");
    }
    single(words, expected, GnomonParser.COMMA, "`,`");
    single(words, expected, GnomonParser.CLOSE, "`)`");
    single(words, expected, GnomonParser.CLOSE_BRACKET, "`]`");
    single(words, expected, Token.EOF, "the end of the statement");
    return words.subList(0, Math.min(MOST, words.size()));
  }

  /// The words as one line of evidence.
  static String line(IntervalSet expected) {
    List<String> words = words(expected);
    if (words.isEmpty()) {
      return "";
    }
    String last = words.getLast();
    return words.size() == 1
        ? "Expected " + last + "."
        : "Expected " + String.join(", ", words.subList(0, words.size() - 1)) + " or " + last + ".";
  }

  private static void single(List<String> words, IntervalSet expected, int type, String word) {
    if (expected.contains(type)) {
      words.add(word);
    }
  }
}
