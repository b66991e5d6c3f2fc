package gnomon.syntax;

/// How a factor of a term is joined to the factors before it.
public enum Connective {
  /// Written beside them; also the first factor of a term.
  JUXTAPOSED,
  /// `*`
  TIMES,
  /// `/`
  DIVIDED,
  /// `of` or `∘`
  COMPOSED
}
