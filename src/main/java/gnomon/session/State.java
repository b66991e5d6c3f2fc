package gnomon.session;

import gnomon.evaluate.Scope;
import gnomon.value.Answer;
import java.util.ArrayList;
import java.util.List;

/// Everything a conversation remembers, never changed: the scope, the answer behind each handle,
/// and the accepted statements with their replies.
record State(Scope scope, List<Answer> answers, List<Exchange> exchanges) {
  static final State FRESH = new State(Scope.empty(), List.of(), List.of());

  State {
    answers = List.copyOf(answers);
    exchanges = List.copyOf(exchanges);
  }

  State withScope(Scope other) {
    return new State(other, answers, exchanges);
  }

  State withAnswer(Scope other, Answer answer) {
    var more = new ArrayList<>(answers);
    more.add(answer);
    return new State(other, more, exchanges);
  }

  State withExchange(Exchange exchange) {
    var more = new ArrayList<>(exchanges);
    more.add(exchange);
    return new State(scope, answers, more);
  }
}
