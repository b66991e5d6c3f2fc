package gnomon.render;

import java.util.ArrayList;
import java.util.List;

/// Breaks a long line of the language so that it still reads as one statement: after a sign or a
/// comma; or between two factors, with a `*` put between them; or inside brackets at any space.
final class Wrapping {
  private static final String INDENT = "  ";

  private final String text;
  private final int width;
  private final List<Integer> anywhere = new ArrayList<>();
  private final List<Integer> outside = new ArrayList<>();
  private final List<Integer> factors = new ArrayList<>();

  private Wrapping(String text, int width) {
    this.text = text;
    this.width = Math.max(width, 8);
    scan();
  }

  /// The lines of the text, none longer than the width where that can be helped.
  static List<String> lines(String text, int width) {
    return text.codePointCount(0, text.length()) <= width
        ? List.of(text)
        : new Wrapping(text, width).broken();
  }

  /// Finds the spaces at which a line may end.
  private void scan() {
    int depth = 0;
    int binder = -1;
    for (int at = 0; at < text.length(); at++) {
      char c = text.charAt(at);
      if (c == '(' || c == '[') {
        depth++;
      } else if (c == ')' || c == ']') {
        depth--;
      } else if (c == ':') {
        binder = depth;
      } else if (c == ' ') {
        boolean afterSign = at > 0 && "+-*,".indexOf(text.charAt(at - 1)) >= 0;
        boolean beforeSign = at + 1 < text.length() && "+-*".indexOf(text.charAt(at + 1)) >= 0;
        boolean afterLimits = depth + 1 == binder && text.charAt(at - 1) == ')';
        if (afterSign && depth == 0) {
          outside.add(at);
        } else if (depth > 0) {
          anywhere.add(at);
        } else if (!beforeSign && !afterLimits) {
          factors.add(at);
        }
        binder = afterLimits ? -1 : binder;
      }
    }
  }

  private List<String> broken() {
    List<String> lines = new ArrayList<>();
    int start = 0;
    while (text.length() - start > room(lines)) {
      int room = start + room(lines);
      int early = start + (room - start) / 3;
      int end = last(outside, early, room);
      end = end >= 0 ? end : last(factors, early, room - 2);
      end = end >= 0 ? end : last(anywhere, start, room);
      end = end >= 0 ? end : next(start);
      String mark = factors.contains(end) ? " *" : "";
      if (end < 0) {
        break;
      }
      lines.add(indent(lines) + text.substring(start, end) + mark);
      start = end + 1;
    }
    lines.add(indent(lines) + text.substring(start));
    return lines;
  }

  private int room(List<String> lines) {
    return width - indent(lines).length();
  }

  private static String indent(List<String> lines) {
    return lines.isEmpty() ? "" : INDENT;
  }

  private static int last(List<Integer> places, int from, int to) {
    int found = -1;
    for (int place : places) {
      if (place > from && place <= to) {
        found = place;
      }
    }
    return found;
  }

  private int next(int start) {
    int found = -1;
    for (List<Integer> places : List.of(outside, anywhere, factors)) {
      for (int place : places) {
        if (place > start && (found < 0 || place < found)) {
          found = place;
        }
      }
    }
    return found;
  }
}
