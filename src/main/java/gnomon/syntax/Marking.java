package gnomon.syntax;

import gnomon.syntax.grammar.GnomonParser;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Set;
import org.antlr.v4.runtime.CommonToken;

/// Marks the places where whitespace or the words around decide what a token is, so that the
/// grammar needs one token of lookahead: steps, binders, and `!=` outside `given`.
final class Marking {
  private static final Set<String> BINDERS =
      Set.of("Sigma", "Σ", "∑", "Integral", "∫", "Prod", "∏", "Π");

  private Marking() {}

  /// The tokens with their marks. The tokens given are changed.
  static List<CommonToken> of(List<CommonToken> tokens) {
    List<CommonToken> marked = splitInequalities(tokens);
    markBinders(marked);
    markSteps(marked);
    return marked;
  }

  private static List<CommonToken> splitInequalities(List<CommonToken> tokens) {
    if (tokens.isEmpty() || tokens.getFirst().getType() == GnomonParser.GIVEN) {
      return tokens;
    }
    boolean claim = tokens.getFirst().getType() == GnomonParser.CLAIM;
    boolean conditions = false;
    int depth = 0;
    List<CommonToken> split = new ArrayList<>(tokens.size());
    for (CommonToken token : tokens) {
      depth += nesting(token);
      conditions |= claim && depth == 0 && token.getType() == GnomonParser.FOR;
      if (!conditions && token.getType() == GnomonParser.UNEQUAL && token.getText().length() == 2) {
        CommonToken equals = new CommonToken(token);
        equals.setType(GnomonParser.EQUALS);
        equals.setStartIndex(token.getStopIndex());
        equals.setCharPositionInLine(token.getCharPositionInLine() + 1);
        equals.setText("=");
        token.setType(GnomonParser.BANG);
        token.setStopIndex(token.getStartIndex());
        token.setText("!");
        split.add(token);
        split.add(equals);
      } else {
        split.add(token);
      }
    }
    return split;
  }

  private static int nesting(CommonToken token) {
    return switch (token.getType()) {
      case GnomonParser.OPEN, GnomonParser.OPEN_BRACKET -> 1;
      case GnomonParser.CLOSE, GnomonParser.CLOSE_BRACKET -> -1;
      default -> 0;
    };
  }

  private static void markBinders(List<CommonToken> tokens) {
    for (int at = 0; at + 3 < tokens.size(); at++) {
      if (isName(tokens.get(at))
          && tokens.get(at + 1).getType() == GnomonParser.OPEN
          && isName(tokens.get(at + 2))
          && tokens.get(at + 3).getType() == GnomonParser.COLON
          && BINDERS.contains(tokens.get(at).getText())) {
        tokens.get(at).setType(GnomonParser.BINDER);
      }
    }
  }

  /// A bracket is a step if it stands directly against a name and holds one entry. `open` holds the
  /// positions of the open brackets, those that cannot be steps as their complement.
  private static void markSteps(List<CommonToken> tokens) {
    Deque<Integer> open = new ArrayDeque<>();
    for (int at = 0; at < tokens.size(); at++) {
      CommonToken token = tokens.get(at);
      if (Tokens.opens(token)) {
        open.push(mayStep(tokens, at) ? at : ~at);
      } else if (token.getType() == GnomonParser.COMMA && !open.isEmpty() && open.peek() >= 0) {
        open.push(~open.pop());
      } else if (Tokens.closes(token) && !open.isEmpty()) {
        int start = open.pop();
        if (start >= 0 && at > start + 1) {
          tokens.get(start).setType(GnomonParser.STEP);
        }
      }
    }
  }

  private static boolean mayStep(List<CommonToken> tokens, int at) {
    return at > 0
        && tokens.get(at).getType() == GnomonParser.OPEN_BRACKET
        && (isName(tokens.get(at - 1)) || tokens.get(at - 1).getType() == GnomonParser.SUBSCRIPT)
        && Tokens.touch(tokens.get(at - 1), tokens.get(at));
  }

  private static boolean isName(CommonToken token) {
    return token.getType() == GnomonParser.NAME || token.getType() == GnomonParser.GLYPH;
  }
}
