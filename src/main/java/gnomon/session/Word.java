package gnomon.session;

/// A word that can be completed: its spelling, the spelling in ASCII, what kind of word it is, and
/// one line that says what it means.
public record Word(String spelling, String ascii, Kind kind, String description) {

  /// What a word is good for.
  public enum Kind {
    OPERATOR,
    FUNCTION,
    CONSTANT,
    CLAUSE,
    STATEMENT,
    NAME
  }
}
