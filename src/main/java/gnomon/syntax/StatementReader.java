package gnomon.syntax;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Source;

/// Reads one statement.
public final class StatementReader {
  private StatementReader() {}

  /// The statement that is the whole of `source`, or why there is none.
  public static Reading read(Source source) {
    throw new UnsupportedOperationException(source.name());
  }

  /// The statement that is the whole of `source`.
  ///
  /// @throws DiagnosedException if there is none, also when it is unfinished
  public static Statement statement(Source source) {
    return switch (read(source)) {
      case Reading.Understood(Statement statement) -> statement;
      case Reading.Unfinished(var diagnostic) -> throw new DiagnosedException(diagnostic);
      case Reading.Rejected(var diagnostic) -> throw new DiagnosedException(diagnostic);
    };
  }
}
