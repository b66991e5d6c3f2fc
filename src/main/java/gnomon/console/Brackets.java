package gnomon.console;

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

  static Brackets of(List<Piece> pieces) {
    Map<Integer, Integer> partner = new HashMap<>();
    Set<Integer> stray = new HashSet<>();
    Deque<Piece> open = new ArrayDeque<>();
    for (Piece piece : pieces) {
      if (piece.sort() == Piece.Sort.OPEN) {
        open.push(piece);
      } else if (piece.sort() == Piece.Sort.CLOSE) {
        if (!open.isEmpty() && closes(open.peek().text(), piece.text())) {
          int start = open.pop().start();
          partner.put(start, piece.start());
          partner.put(piece.start(), start);
        } else {
          stray.add(piece.start());
        }
      }
    }
    return new Brackets(partner, stray);
  }

  private static boolean closes(String open, String close) {
    return switch (open) {
      case "(" -> close.equals(")");
      case "[" -> close.equals("]");
      case "{" -> close.equals("}");
      default -> false;
    };
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
