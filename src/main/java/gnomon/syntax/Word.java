package gnomon.syntax;

import java.util.Optional;

/// A word or sign of the language: its ASCII spelling, its glyph if it has one, what it is, and one
/// line on what it does.
public record Word(String ascii, Optional<String> glyph, Sort sort, String description) {
  /// What a word is.
  public enum Sort {
    /// Stands for an operator, a basis map or a functional, or makes one.
    OPERATOR("operator"),
    /// Takes arguments in parentheses.
    FUNCTION("function"),
    /// Stands for a number.
    CONSTANT("constant"),
    /// Begins a statement.
    STATEMENT("statement"),
    /// Belongs to a clause.
    CLAUSE("clause"),
    /// A sign between or behind expressions.
    SIGN("sign");

    private final String title;

    Sort(String title) {
      this.title = title;
    }

    /// The word for it in messages.
    public String title() {
      return title;
    }
  }

  /// The spelling asked for.
  public String spelt(Spelling spelling) {
    return spelling == Spelling.UNICODE ? glyph.orElse(ascii) : ascii;
  }
}
