package gnomon.algebra;

/// The stable codes of mathematical refusals. The words for each code belong to the room that
/// renders; the exact data that fill them in travel with the [Refusal].
public enum Reason {
  /// An arc sine of a number beyond 1 in size. Data: the argument.
  ARCSINE_DOMAIN,
  /// A kernel whose derivative is no form. Data: the kernel, the variable.
  DERIVATIVE_UNKNOWN,
  /// A quotient by zero, or a negative power of zero. Data: the dividend where there is one.
  DIVISION_BY_ZERO,
  /// An exponent beyond the range that monomials hold. Data: none.
  EXPONENT_TOO_LARGE,
  /// An integer whose prime factors were not all found within the limit. Data: the unfactored part.
  FACTORING_LIMIT,
  /// A value that is 0/0 or a pole at this point, with a limit not decided. Data: the form.
  LIMIT_UNDECIDED,
  /// A real logarithm of zero, of a negative or of a complex number. Data: the argument.
  LOGARITHM_DOMAIN,
  /// A whole number was needed. Data: the value met.
  NOT_AN_INTEGER,
  /// A number at least zero was needed. Data: the value met.
  NOT_NATURAL,
  /// Something has no closed form in this room. Data: the form.
  NO_CLOSED_FORM,
  /// An integer does not fit into the range a count or an index may have. Data: the value met.
  OUT_OF_RANGE,
  /// A value at a pole. Data: the form that has the pole.
  POLE,
  /// A root outside the exact constants, i and real radicals. Data: the base, the exponent.
  ROOT_OUT_OF_FIELD,
  /// Text is not a number. Data: the text.
  UNREADABLE_NUMBER,
  /// A divisor that is not zero but divides zero under a relation. Data: the divisor.
  ZERO_DIVISOR
}
