package gnomon.session;

import gnomon.evaluate.Scope;
import gnomon.syntax.Statement;
import java.util.ArrayList;
import java.util.List;

/// Everything a conversation remembers, never changed: the scope, the statement behind each handle,
/// and the accepted statements with their replies.
record State(Scope scope, List<Result> results, List<Exchange> exchanges) {
  /// A statement that was answered, and the scope it was answered in.
  record Result(Statement statement, Scope scope) {}

  static final State FRESH = new State(Scope.empty(), List.of(), List.of());

  State {
    results = List.copyOf(results);
    exchanges = List.copyOf(exchanges);
  }

  State withScope(Scope other) {
    return new State(other, results, exchanges);
  }

  State withResult(Scope other, Result result) {
    var more = new ArrayList<>(results);
    more.add(result);
    return new State(other, more, exchanges);
  }

  State withExchange(Exchange exchange) {
    var more = new ArrayList<>(exchanges);
    more.add(exchange);
    return new State(scope, results, more);
  }
}
