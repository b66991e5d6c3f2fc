package gnomon.console;

import gnomon.syntax.Lexeme;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/// Which brackets of a line belong together, by position, and which closing ones are stray.
record Brackets(Map<Integer, Integer> partner, Set<Integer> stray) {
  Brackets {
    partner = Map.copyOf(partner);
    stray = Set.copyOf(stray);
  }

  static Brackets of(List<Lexeme> lexemes) {
    Map<Integer, Integer> partner = new HashMap<>();
    Set<Integer> stray = new HashSet<>();
    Deque<Lexeme> open = new ArrayDeque<>();
    for (Lexeme lexeme : lexemes) {
      int at = lexeme.span().start();
      if (lexeme.role() == Lexeme.Role.OPEN) {
        open.push(lexeme);
      } else if (lexeme.role() == Lexeme.Role.CLOSE) {
        Lexeme last = open.peek();
        if (last != null && isRound(last) == isRound(lexeme)) {
          open.pop();
          partner.put(last.span().start(), at);
          partner.put(at, last.span().start());
        } else {
          stray.add(at);
        }
      }
    }
    return new Brackets(partner, stray);
  }

  private static boolean isRound(Lexeme bracket) {
    return bracket.text().endsWith("(") || bracket.text().endsWith(")");
  }

  /// The positions of the pair that the cursor is at: the bracket just before it, or else under it.
  Set<Integer> pairAt(int cursor) {
    for (int at : new int[] {cursor - 1, cursor}) {
      Integer other = partner.get(at);
      if (other != null) {
        return Set.of(at, other);
      }
    }
    return Set.of();
  }
}
