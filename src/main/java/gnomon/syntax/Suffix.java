package gnomon.syntax;

import gnomon.diagnostic.Span;

/// What is written behind an atom and binds closer than any sign or factor.
public sealed interface Suffix {
  /// Where it was written.
  Span span();

  /// `'`: the Pincherle derivative of an operator.
  record Prime(Span span) implements Suffix {}

  /// `!`: the factorial.
  record Factorial(Span span) implements Suffix {}

  /// `|_n` or `↓n`: the falling power.
  record Falling(Expression index, Span span) implements Suffix {
    /// @throws IllegalArgumentException unless the index is an atom, possibly signed, and no order
    ///   term
    public Falling {
      requireLevel(index, Level.ATOM);
    }
  }

  /// `|^n` or `↑n`: the rising power.
  record Rising(Expression index, Span span) implements Suffix {
    /// @throws IllegalArgumentException unless the index is an atom, possibly signed, and no order
    ///   term
    public Rising {
      requireLevel(index, Level.ATOM);
    }
  }

  /// `^n`: the power. It is always the last suffix of its atom; in `a^b^c` the exponent of `a` is
  /// `b` raised to `c`.
  record Raised(Expression exponent, Span span) implements Suffix {
    /// @throws IllegalArgumentException unless the exponent is an atom or an atom with suffixes,
    ///   possibly signed
    public Raised {
      requireLevel(exponent, Level.FACTOR);
    }
  }

  private static void requireLevel(Expression expression, Level level) {
    Expression bare =
        expression instanceof Expression.Sign(Expression operand, _) ? operand : expression;
    Expression atom = bare instanceof Expression.Suffixed suffixed ? suffixed.atom() : bare;
    if (!Level.of(bare).within(level) || atom instanceof Expression.OrderTerm) {
      throw new IllegalArgumentException("behind an atom: " + expression);
    }
  }
}
