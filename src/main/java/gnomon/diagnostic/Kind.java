package gnomon.diagnostic;

/// What sort of mistake a problem is.
public enum Kind {
  /// The text is not a sentence of the language.
  SYNTAX,
  /// A name means nothing, or may not be used so.
  NAME,
  /// Values of these sorts do not go together.
  KIND,
  /// The values have the right sorts but the mathematics refuses them.
  DOMAIN,
  /// A limit of size, depth or time was reached.
  LIMIT,
  /// A fault of the program itself.
  INTERNAL
}
