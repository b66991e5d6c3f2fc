package gnomon.syntax;

import gnomon.diagnostic.Span;
import java.util.List;
import java.util.Optional;

/// One statement as it was written.
public sealed interface Statement {
  /// Where it was written.
  Span span();

  /// An expression to evaluate and show.
  record ExpressionStatement(Expression expression, Span span) implements Statement {}

  /// `let name = body`, or `let name(parameters) = body`. No two parameters are alike.
  record Let(Identifier name, List<Identifier> parameters, Expression body, Span span)
      implements Statement {
    /// Copies the parameters.
    public Let {
      parameters = List.copyOf(parameters);
    }
  }

  /// `claim left = right`, with `for n: a..b` a check of that range, with `for n >= 2` under
  /// conditions.
  record Claim(
      Expression left,
      Expression right,
      Optional<Range> range,
      List<Condition> conditions,
      Span span)
      implements Statement {
    /// Copies the conditions.
    public Claim {
      conditions = List.copyOf(conditions);
    }
  }

  /// `given n >= 0, n integer`.
  record Given(List<Condition> conditions, Span span) implements Statement {
    /// Copies the conditions.
    public Given {
      conditions = List.copyOf(conditions);
    }
  }

  /// `drop f, g`.
  record Drop(List<Identifier> names, Span span) implements Statement {
    /// Copies the names.
    public Drop {
      names = List.copyOf(names);
    }
  }

  /// `drop given`.
  record DropGiven(Span span) implements Statement {}

  /// `vary n`.
  record Vary(Identifier variable, Span span) implements Statement {}

  /// `arbitrary f, g`.
  record Arbitrary(List<Identifier> names, Span span) implements Statement {
    /// Copies the names.
    public Arbitrary {
      names = List.copyOf(names);
    }
  }

  /// `umbra B, C with t/(exp(t) - 1)`.
  record Umbra(List<Identifier> letters, Expression series, Span span) implements Statement {
    /// Copies the letters.
    public Umbra {
      letters = List.copyOf(letters);
    }
  }

  /// `why`, `why @3`.
  record Why(Optional<Expression.Handle> handle, Span span) implements Statement {}

  /// `names`.
  record Names(Span span) implements Statement {}

  /// `keep "file"`.
  record Keep(String file, Span span) implements Statement {}

  /// `replay "file"`.
  record Replay(String file, Span span) implements Statement {}

  /// `recheck "file"`.
  record Recheck(String file, Span span) implements Statement {}

  /// `rerecord "file"`.
  record Rerecord(String file, Span span) implements Statement {}

  /// `help`, `help Delta`; the topic is as typed, glyphs by their ASCII spelling.
  record Help(Optional<String> topic, Span span) implements Statement {}

  /// `leave`.
  record Leave(Span span) implements Statement {}

  /// A blank line or a comment alone.
  record Empty(Span span) implements Statement {}
}
