package gnomon.console;

import gnomon.session.Spelling;
import gnomon.session.Word;
import java.util.Map;
import org.jline.terminal.Terminal;
import org.jline.utils.AttributedStyle;

/// How the console shows things: which spelling, whether colour may be added, and whether the
/// terminal can move its cursor.
///
/// Every sort has a weight or slant of its own, so that colour only repeats what the shape of the
/// letters says already.
public record Look(Spelling spelling, boolean colour, boolean plain) {
  private static final int BRASS = 136;
  private static final int SLATE = 67;
  private static final int MOSS = 65;
  private static final int PLUM = 96;

  private static final int MINIMUM_WIDTH = 20;
  private static final int USUAL_WIDTH = 80;

  /// The look for a terminal, an environment and a wish for ASCII: no colour where `NO_COLOR` is
  /// set to anything.
  public static Look of(Terminal terminal, Map<String, String> environment, boolean ascii) {
    boolean plain = terminal.getType().startsWith(Terminal.TYPE_DUMB);
    boolean colour = !plain && environment.getOrDefault("NO_COLOR", "").isEmpty();
    return new Look(ascii ? Spelling.ASCII : Spelling.UNICODE, colour, plain);
  }

  /// The prompt of a statement.
  public String prompt() {
    return isAscii() ? "_| " : "∟ ";
  }

  /// The prompt of a line that carries a statement on.
  public String continuation() {
    return isAscii() ? ". " : "· ";
  }

  /// The sign between two parts of a line of small print.
  public String dot() {
    return isAscii() ? "-" : "·";
  }

  /// Whether only ASCII characters are shown.
  public boolean isAscii() {
    return spelling == Spelling.ASCII;
  }

  /// The number of columns to write in.
  public static int width(Terminal terminal) {
    int columns = terminal.getWidth();
    return columns <= 0 ? USUAL_WIDTH : Math.max(columns, MINIMUM_WIDTH);
  }

  /// Small print.
  public AttributedStyle small() {
    return AttributedStyle.DEFAULT.faint();
  }

  /// The two brackets of a pair.
  public AttributedStyle pair() {
    return AttributedStyle.DEFAULT.bold().underline();
  }

  /// A closing bracket that closes nothing.
  public AttributedStyle stray() {
    return AttributedStyle.DEFAULT.inverse();
  }

  /// Words of one sort.
  public AttributedStyle word(Word.Kind kind) {
    AttributedStyle style = AttributedStyle.DEFAULT;
    return switch (kind) {
      case OPERATOR -> tinted(style.bold(), BRASS);
      case FUNCTION -> tinted(style.italic(), SLATE);
      case CONSTANT -> style;
      case CLAUSE, STATEMENT -> tinted(style.underline(), PLUM);
      case NAME -> tinted(style.bold().italic(), MOSS);
    };
  }

  private AttributedStyle tinted(AttributedStyle style, int shade) {
    return colour ? style.foreground(shade) : style;
  }
}
