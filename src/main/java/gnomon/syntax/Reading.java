package gnomon.syntax;

import gnomon.diagnostic.Diagnostic;

/// What became of a text that was to be a statement.
public sealed interface Reading {
  /// It is one.
  record Understood(Statement statement) implements Reading {}

  /// An open bracket or a trailing operator asks for another line. `diagnostic` is what to say when
  /// there is none.
  record Unfinished(Diagnostic diagnostic) implements Reading {}

  /// It is none, for the reason given.
  record Rejected(Diagnostic diagnostic) implements Reading {}
}
