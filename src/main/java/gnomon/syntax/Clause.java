package gnomon.syntax;

import gnomon.diagnostic.Span;
import java.util.List;

/// What may follow an expression at the end of a statement or of a parenthesis. Clauses bind
/// loosest and apply from left to right.
public sealed interface Clause {
  /// Where it was written.
  Span span();

  /// `in falling`, `in partial fractions`, `in tex`.
  record InPresentation(Presentation presentation, Span span) implements Clause {}

  /// `in Q`: in the basis or the powers of an operator.
  record InBasis(Expression basis, Span span) implements Clause {}

  /// `to N`: as a series to order N, N included.
  record To(Expression order, Span span) implements Clause {}

  /// `to N digits`.
  record Digits(Expression count, Span span) implements Clause {}

  /// `at x = a, y = b`: substitution of all at once.
  record At(List<Substitution> substitutions, Span span) implements Clause {
    /// @throws IllegalArgumentException if there is no substitution
    public At {
      substitutions = List.copyOf(substitutions);
      if (substitutions.isEmpty()) {
        throw new IllegalArgumentException("at what?");
      }
    }
  }

  /// `for n: a..b`: a table.
  record For(Range range, Span span) implements Clause {}

  /// `variable = value` after `at`.
  record Substitution(Identifier variable, Expression value, Span span) {}
}
