package gnomon.syntax;

import gnomon.diagnostic.Span;

/// An assumption after `given`.
public sealed interface Condition {
  /// Where it was written.
  Span span();

  /// `left relation right`. A chain `0 <= k <= n` becomes two of these.
  record Comparison(Expression left, Relation relation, Expression right, Span span)
      implements Condition {}

  /// `n integer`.
  record IsInteger(Expression subject, Span span) implements Condition {}

  /// How two sides are compared.
  enum Relation {
    /// `=`
    EQUAL("=", "="),
    /// `!=`
    UNEQUAL("!=", "≠"),
    /// `<`
    LESS("<", "<"),
    /// `<=`
    AT_MOST("<=", "≤"),
    /// `>`
    GREATER(">", ">"),
    /// `>=`
    AT_LEAST(">=", "≥");

    private final String ascii;
    private final String glyph;

    Relation(String ascii, String glyph) {
      this.ascii = ascii;
      this.glyph = glyph;
    }

    /// The ASCII spelling.
    public String ascii() {
      return ascii;
    }

    /// The Unicode spelling.
    public String glyph() {
      return glyph;
    }
  }
}
