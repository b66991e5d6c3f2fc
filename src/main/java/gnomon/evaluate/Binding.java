package gnomon.evaluate;

import gnomon.form.Moment;
import gnomon.form.Variable;
import gnomon.summation.Condition;
import gnomon.syntax.Expression;
import gnomon.value.Value;
import java.util.List;

/// What a name stands for in a scope.
public sealed interface Binding {

  /// A value named by `let`, or an earlier result. The expression and the scope it was evaluated in
  /// are kept, because an operator acts on the running variable of the place where it is used, and
  /// because a closed form in the value may not hold where its conditions fail.
  record Named(Value value, Expression expression, Scope scope, List<Condition> conditions)
      implements Binding {
    public Named {
      conditions = List.copyOf(conditions);
    }
  }

  /// A function defined by `let`.
  record Rule(String name, List<String> parameters, Expression body, Scope scope)
      implements Binding {
    public Rule {
      parameters = List.copyOf(parameters);
    }
  }

  /// A parameter of a function in a call, or a variable with a value in a table.
  record Held(Value value) implements Binding {}

  /// The variable of a sum, an integral or a product.
  record Bound(Variable variable) implements Binding {}

  /// An umbra.
  record Umbra(Moment.Letter letter) implements Binding {}

  /// A function of which nothing is known.
  record Arbitrary(String name) implements Binding {}
}
