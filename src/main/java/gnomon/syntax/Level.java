package gnomon.syntax;

/// How tightly the outermost part of an expression binds, tightest first.
enum Level {
  ATOM,
  FACTOR,
  TERM,
  SIGNED,
  SUM,
  CLAUSED;

  /// The level of `expression`. A binder reaches over the rest of its term, so it is one.
  static Level of(Expression expression) {
    return switch (expression) {
      case Expression.Numeral _,
          Expression.Name _,
          Expression.Handle _,
          Expression.Parenthesis _,
          Expression.Bracket _,
          Expression.OrderTerm _ ->
          ATOM;
      case Expression.Suffixed _ -> FACTOR;
      case Expression.Term _, Expression.Binder _ -> TERM;
      case Expression.Sign _ -> SIGNED;
      case Expression.Sum _ -> SUM;
      case Expression.Matrix _,
          Expression.Solve _,
          Expression.Carry _,
          Expression.Recurrence _,
          Expression.Family _,
          Expression.Clauses _ ->
          CLAUSED;
    };
  }

  /// Whether it binds at least as tightly as `other`.
  boolean within(Level other) {
    return compareTo(other) <= 0;
  }
}
