package gnomon.algebra;

/// The stable codes of mathematical refusals. The words for each code belong to the room that
/// renders; the exact data that fill them in travel with the [Refusal].
public enum Reason {
  /// A quotient by zero, or a negative power of zero. Data: the dividend where there is one.
  DIVISION_BY_ZERO,
  /// An exponent beyond the range that monomials hold. Data: none.
  EXPONENT_TOO_LARGE,
  /// An integer whose prime factors were not all found within the limit. Data: the unfactored part.
  FACTORING_LIMIT,
  /// A whole number was needed. Data: the value met.
  NOT_AN_INTEGER,
  /// A number at least zero was needed. Data: the value met.
  NOT_NATURAL,
  /// An integer does not fit into the range a count or an index may have. Data: the value met.
  OUT_OF_RANGE,
  /// Text is not a number. Data: the text.
  UNREADABLE_NUMBER
}
