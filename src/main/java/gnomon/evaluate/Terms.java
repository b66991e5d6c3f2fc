package gnomon.evaluate;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.syntax.Connective;
import gnomon.syntax.Expression;
import gnomon.syntax.Factor;
import gnomon.syntax.Spelling;
import gnomon.syntax.StatementText;
import gnomon.syntax.Vocabulary;
import gnomon.value.FormValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/// Reads a row of factors by sort: arguments are joined to what they are written against, quotients
/// are taken, and the row is folded from the right.
final class Terms {
  private static final Set<String> LETTERS_OF_FUNCTIONS = Set.of("f", "g", "F", "G");

  private final Evaluator evaluator;
  private final Calls calls;
  private final Arithmetic arithmetic;

  Terms(Evaluator evaluator, Calls calls, Arithmetic arithmetic) {
    this.evaluator = evaluator;
    this.calls = calls;
    this.arithmetic = arithmetic;
  }

  /// A factor with its arguments: how it is joined, its value, and how and where it was written.
  private record Unit(Connective connective, Value value, Span span, List<Factor> written) {

    Unit with(Value other) {
      return new Unit(connective, other, span, written);
    }

    Expression head() {
      return written.getFirst().atom();
    }

    boolean isSpacedParenthesis() {
      return written.getFirst().isSpacedParenthesis();
    }

    String text() {
      return written.stream()
          .map(factor -> StatementText.of(factor.value(), Spelling.ASCII))
          .collect(Collectors.joining());
    }
  }

  Value value(Expression.Term term, Scope scope) {
    List<Unit> units = units(term.factors(), scope);
    refuseAgainstDivisor(units);
    refuseDoubtful(units);
    return folded(divided(units, scope), scope);
  }

  // ---------------------------------------------------------------- arguments

  private List<Unit> units(List<Factor> factors, Scope scope) {
    var units = new ArrayList<Unit>();
    int at = 0;
    while (at < factors.size()) {
      Factor first = factors.get(at);
      int end = at + 1;
      Value value;
      if (isArgument(factors, end) && calls.isCallable(first.value(), scope)) {
        value = called(first, factors.get(end), scope);
        end++;
      } else {
        value = evaluator.value(first.value(), scope);
      }
      while (isArgument(factors, end) && takesArgument(value, first, factors.get(end), scope)) {
        value = applied(value, first, factors.get(end), scope);
        end++;
      }
      Span span = first.value().span().to(factors.get(end - 1).value().span());
      units.add(new Unit(first.connective(), value, span, factors.subList(at, end)));
      at = end;
    }
    return units;
  }

  private static boolean isArgument(List<Factor> factors, int at) {
    return at < factors.size() && factors.get(at).isArgument();
  }

  private Value called(Factor head, Factor argument, Scope scope) {
    var arguments = (Expression.Parenthesis) argument.atom();
    Span span = head.value().span().to(argument.value().span());
    Value value = calls.call(head.value(), arguments.items(), span, scope);
    return evaluator.suffixed(value, argument.suffixes(), span, scope);
  }

  /// Whether a parenthesis written directly against the value is its argument rather than a factor.
  private static boolean takesArgument(Value value, Factor head, Factor argument, Scope scope) {
    if (Sorts.acts(value)) {
      return true;
    }
    if (isNamedValue(head.value(), scope)) {
      String name = StatementText.of(head.value(), Spelling.ASCII);
      String inside = StatementText.of(argument.atom(), Spelling.ASCII);
      String bare = inside.substring(1, inside.length() - 1);
      throw Problems.doubtful(
          name + " names a value, not a function",
          head.value().span().to(argument.value().span()),
          name + " at " + scope.running().name() + " = " + bare,
          name + " * " + inside);
    }
    refuseUndeclaredFunction(head, argument, scope);
    return false;
  }

  /// Refuses `f(x + 1)` while f is nothing yet: whoever writes it hardly means a product.
  private static void refuseUndeclaredFunction(Factor head, Factor argument, Scope scope) {
    if (head.value() instanceof Expression.Name name
        && LETTERS_OF_FUNCTIONS.contains(name.text())
        && scope.binding(name.text()).isEmpty()
        && !scope.running().name().equals(name.text())) {
      String inside = StatementText.of(argument.atom(), Spelling.ASCII);
      throw new DiagnosedException(
          Diagnostic.of(
                  "kind-doubtful",
                  name.text() + " is not declared as a function",
                  head.value().span().to(argument.value().span()))
              .withEvidence("A product is written " + name.text() + " * " + inside + ".")
              .withHint("arbitrary " + name.text()));
    }
  }

  private static boolean isNamedValue(Expression head, Scope scope) {
    return head instanceof Expression.Handle
        || (head instanceof Expression.Name name
            && scope.binding(name.text()).filter(Binding.Named.class::isInstance).isPresent());
  }

  private Value applied(Value operator, Factor head, Factor argument, Scope scope) {
    Span span = head.value().span().to(argument.value().span());
    Value operand = evaluator.value(argument.atom(), scope);
    refuseSubscript(head.atom(), operand);
    Value image = Places.at(span, () -> arithmetic.times(operator, operand, span, scope));
    return evaluator.suffixed(image, argument.suffixes(), span, scope);
  }

  /// @throws gnomon.diagnostic.DiagnosedException when the operator's subscript names a variable
  ///   that the function does not contain
  private static void refuseSubscript(Expression head, Value operand) {
    if (head instanceof Expression.Name name
        && name.subscript().isPresent()
        && operand instanceof FormValue form
        && form.form().variables().stream()
            .noneMatch(variable -> variable.name().equals(name.subscript().get()))) {
      String subscript = name.subscript().get();
      String shown = StatementText.of(name, Spelling.ASCII);
      throw Problems.mended(
          "kind-subscript",
          shown + " acts on " + subscript + ", which does not occur in the function",
          name.span(),
          switch (name.text()) {
            case "E" -> "E^" + subscript;
            case String word when Vocabulary.takesStep(word) -> word + "[" + subscript + "]";
            case String word -> word;
          });
    }
  }

  // ---------------------------------------------------------------- doubtful writing

  /// Refuses `1/k(k + 1)` where k is no function: what is written against a divisor may belong to
  /// it.
  private static void refuseAgainstDivisor(List<Unit> units) {
    for (int i = 2; i < units.size(); i++) {
      Unit divisor = units.get(i - 1);
      Unit next = units.get(i);
      if (divisor.connective() == Connective.DIVIDED && next.written().getFirst().isArgument()) {
        String before = joined(units.subList(0, i - 1)).strip();
        throw Problems.doubtful(
            "this quotient has two readings",
            units.getFirst().span().to(next.span()),
            before + "/(" + divisor.text() + next.text() + ")",
            "(" + before + "/" + divisor.text() + ") " + next.text());
      }
    }
  }

  private static void refuseDoubtful(List<Unit> units) {
    for (int i = 0; i + 2 < units.size(); i++) {
      Unit operator = units.get(i);
      Unit middle = units.get(i + 1);
      if (Sorts.acts(operator.value())
          && middle.isSpacedParenthesis()
          && middle.value() instanceof FormValue) {
        Unit last = units.getLast();
        String rest = joined(units.subList(i + 2, units.size()));
        throw Problems.doubtful(
            "this row has two readings",
            operator.span().to(last.span()),
            operator.text() + "(" + (middle.text() + rest) + ")",
            operator.text() + middle.text() + rest);
      }
    }
  }

  private static String joined(List<Unit> units) {
    return units.stream()
        .map(
            unit ->
                switch (unit.connective()) {
                      case JUXTAPOSED -> " ";
                      case TIMES -> " * ";
                      case DIVIDED -> "/";
                      case COMPOSED -> " of ";
                    }
                    + unit.text())
        .collect(Collectors.joining());
  }

  // ---------------------------------------------------------------- quotients

  /// Takes the quotients: each divisor divides the longest run of factors before it that commute
  /// with it, which comes to dividing the last of them.
  private List<Unit> divided(List<Unit> units, Scope scope) {
    var row = new ArrayList<Unit>();
    for (Unit unit : units) {
      if (unit.connective() != Connective.DIVIDED) {
        row.add(unit);
        continue;
      }
      Unit last = row.getLast();
      Span span = last.span().to(unit.span());
      if (!Sorts.commute(last.value(), unit.value(), scope.running())) {
        throw Problems.of(
            "domain-not-commuting",
            last.text() + " and " + unit.text() + " do not commute",
            span,
            last.text() + " (" + unit.text() + ")^-1");
      }
      Value quotient =
          Places.at(span, () -> arithmetic.dividedBy(last.value(), unit.value(), span, scope));
      row.set(row.size() - 1, last.with(quotient));
    }
    return row;
  }

  // ---------------------------------------------------------------- folding

  private Value folded(List<Unit> row, Scope scope) {
    Span end = row.getLast().span();
    Value value = row.getLast().value();
    for (int i = row.size() - 2; i >= 0; i--) {
      Unit unit = row.get(i);
      Value right = value;
      Span span = unit.span().to(end);
      if (row.get(i + 1).connective() == Connective.COMPOSED) {
        refuseComposition(unit.value(), row.get(i + 1).value(), span);
      }
      if (Sorts.acts(unit.value())) {
        refuseSubscript(unit.head(), right);
      }
      value = Places.at(span, () -> arithmetic.times(unit.value(), right, span, scope));
    }
    return value;
  }

  private static void refuseComposition(Value outer, Value inner, Span span) {
    if (!Sorts.acts(outer) || !Sorts.acts(inner)) {
      throw Problems.of("kind-composition", "of composes two operators", span, "D of X");
    }
  }
}
