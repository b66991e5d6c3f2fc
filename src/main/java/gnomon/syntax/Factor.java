package gnomon.syntax;

import gnomon.syntax.Expression.Binder;
import gnomon.syntax.Expression.Parenthesis;
import gnomon.syntax.Expression.Suffixed;
import java.util.List;

/// One factor of a [Expression.Term]: how it is joined to those before it and what it is.
///
/// `isArgument` says that the factor begins with a parenthesis written directly against the factor
/// before it, as in `Delta(f)`, `k(k+1)^2` or `binom(n, k)!`. The parenthesis is then [#atom()],
/// and [#suffixes()] stand behind the closing bracket: when the factor before it is a function or
/// an operator, they belong to the result of the application; when it is not, to the parenthesis.
public record Factor(Connective connective, boolean isArgument, Expression value) {
  /// @throws IllegalArgumentException if the value is looser than a factor, or an argument is not a
  ///   juxtaposed parenthesis
  public Factor {
    if (!Level.of(value).within(Level.FACTOR) && !(value instanceof Binder)) {
      throw new IllegalArgumentException("a factor " + value);
    }
    boolean parenthesis = atomOf(value) instanceof Parenthesis;
    if (isArgument && (connective != Connective.JUXTAPOSED || !parenthesis)) {
      throw new IllegalArgumentException("an argument " + connective + " " + value);
    }
  }

  /// The factor without what is written behind it.
  public Expression atom() {
    return atomOf(value);
  }

  /// What is written behind the atom, in order.
  public List<Suffix> suffixes() {
    return value instanceof Suffixed suffixed ? suffixed.suffixes() : List.of();
  }

  /// Whether it is a parenthesis that is juxtaposed but written apart from the factor before it; in
  /// the first factor of a term this says only that it is a parenthesis.
  public boolean isSpacedParenthesis() {
    return connective == Connective.JUXTAPOSED && !isArgument && atom() instanceof Parenthesis;
  }

  private static Expression atomOf(Expression value) {
    return value instanceof Suffixed suffixed ? suffixed.atom() : value;
  }
}
