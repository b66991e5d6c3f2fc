package gnomon.syntax;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Source;

/// Reads one statement.
public final class StatementReader {
  private StatementReader() {}

  /// The statement that is the whole of `source`, or why there is none.
  public static Reading read(Source source) {
    return switch (Attempt.at(source.text())) {
      case Reading.Understood understood -> understood;
      case Reading.Unfinished(var diagnostic) ->
          new Reading.Unfinished(Repairs.hinted(source.text(), diagnostic));
      case Reading.Rejected(var diagnostic) ->
          new Reading.Rejected(Repairs.hinted(source.text(), diagnostic));
    };
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
