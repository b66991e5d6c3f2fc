package gnomon.syntax;

import gnomon.diagnostic.Span;

/// A piece of text as an editor sees it, right or wrong: where it is, what it is, and the text.
public record Lexeme(Span span, Role role, String text) {
  /// What a piece of text is.
  public enum Role {
    /// A number.
    NUMBER,
    /// A name that is no word of the language, or a subscript.
    NAME,
    /// The word or glyph of an operator.
    OPERATOR,
    /// The word of a function.
    FUNCTION,
    /// A constant.
    CONSTANT,
    /// A word that begins a statement.
    STATEMENT,
    /// A word of a clause.
    CLAUSE,
    /// A sign between or behind expressions.
    SIGN,
    /// An opening bracket.
    OPEN,
    /// A closing bracket.
    CLOSE,
    /// `@` or `@7`.
    HANDLE,
    /// A file name in quotes.
    STRING,
    /// A comment.
    COMMENT,
    /// A character that is not part of the language.
    FOREIGN
  }
}
