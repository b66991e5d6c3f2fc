package gnomon.evaluate;

import gnomon.basis.ImplicitOperator;
import gnomon.basis.MappedOperator;
import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.syntax.Expression;
import gnomon.syntax.Vocabulary;
import gnomon.value.OperatorValue;
import gnomon.value.Value;
import java.util.Optional;

/// `solve W = D exp(a W)`: an equation between operators for a capital letter without a meaning of
/// its own, which stands alone on one side.
final class OperatorEquations {
  private final Evaluator evaluator;

  OperatorEquations(Evaluator evaluator) {
    this.evaluator = evaluator;
  }

  /// The operator, where this is an equation for one.
  ///
  /// @throws DiagnosedException where it is, but no operator is found
  Optional<Value> value(Expression.Solve solve, Scope scope) {
    Expression.Equation equation = solve.equation();
    Optional<String> unknown =
        unknown(equation.left(), scope).or(() -> unknown(equation.right(), scope));
    if (unknown.isEmpty() || !solve.conditions().isEmpty()) {
      return Optional.empty();
    }
    Dual s = new Dual(new Variable(unknown.get()));
    Operator standing = Operator.ofSymbol(Form.of(s));
    Scope inside =
        scope.with(unknown.get(), new Binding.Held(new OperatorValue(MappedOperator.of(standing))));
    Operator left = operator(equation.left(), inside);
    Operator right = operator(equation.right(), inside);
    Dual t = new Dual(scope.running());
    Form h = left.minus(right).symbol();
    return Optional.of(
        ImplicitOperator.of(h, s, t)
            .<Value>map(symbol -> Sorts.of(Operator.ofSymbol(symbol)))
            .orElseThrow(() -> unsolved(unknown.get(), equation.span())));
  }

  private static Optional<String> unknown(Expression side, Scope scope) {
    return side instanceof Expression.Name name
            && name.isPlain()
            && name.text().length() == 1
            && Character.isUpperCase(name.text().charAt(0))
            && !Vocabulary.isReserved(name.text())
            && scope.binding(name.text()).isEmpty()
        ? Optional.of(name.text())
        : Optional.empty();
  }

  private Operator operator(Expression side, Scope scope) {
    Operator operator = Arithmetic.plain(evaluator.value(side, scope), side.span());
    if (!operator.isPlain() || !operator.isShiftInvariant()) {
      throw Problems.of(
          "domain-not-shift-invariant",
          "an equation for an operator is between shift-invariant ones",
          side.span(),
          "solve W = D exp(W)");
    }
    return operator;
  }

  private static DiagnosedException unsolved(String unknown, Span span) {
    return new DiagnosedException(
        Diagnostic.of("domain-operator-equation", "no delta operator was found here", span)
            .withEvidence(
                "Sought is the one series "
                    + unknown
                    + " in D without constant term, where the equation can be solved for D.")
            .withHint("solve W = D exp(W)"));
  }
}
