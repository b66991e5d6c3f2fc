package gnomon.render;

/// How tightly a piece of notation holds together, from loosest to tightest, in the order in which
/// the language reads: sum, term, sign, power, postfix, atom.
enum Binding {
  SUM,
  TERM,
  SIGN,
  POWER,
  POSTFIX,
  ATOM;

  /// How tightly the linear spelling of the notation holds together.
  static Binding of(Notation notation) {
    return switch (notation) {
      case Notation.Sum _ -> SUM;
      case Notation.Row _, Notation.Quotient _, Notation.Binder _ -> TERM;
      case Notation.Minus _ -> SIGN;
      case Notation.Power _ -> POWER;
      case Notation.FactorialPower _, Notation.Factorial _, Notation.Primed _ -> POSTFIX;
      case Notation.Numeral _,
          Notation.Decimal _,
          Notation.Name _,
          Notation.Call _,
          Notation.Root _,
          Notation.Binomial _,
          Notation.Harmonic _,
          Notation.Subscript _,
          Notation.Step _,
          Notation.Bracket _,
          Notation.At _,
          Notation.Order _ ->
          ATOM;
    };
  }

  /// Whether a sum, product or integral with limits would swallow what is written after the
  /// notation.
  static boolean reachesOn(Notation notation) {
    return switch (notation) {
      case Notation.Binder _ -> true;
      case Notation.Row row -> reachesOn(row.factors().getLast());
      case Notation.Minus minus -> reachesOn(minus.of());
      case Notation.Sum _,
          Notation.Quotient _,
          Notation.Power _,
          Notation.FactorialPower _,
          Notation.Factorial _,
          Notation.Primed _,
          Notation.Numeral _,
          Notation.Decimal _,
          Notation.Name _,
          Notation.Call _,
          Notation.Root _,
          Notation.Binomial _,
          Notation.Harmonic _,
          Notation.Subscript _,
          Notation.Step _,
          Notation.Bracket _,
          Notation.At _,
          Notation.Order _ ->
          false;
    };
  }
}
