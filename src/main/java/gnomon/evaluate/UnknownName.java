package gnomon.evaluate;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.syntax.Expression;
import gnomon.syntax.Factor;
import gnomon.syntax.Parts;
import gnomon.syntax.Suffix;
import gnomon.syntax.Vocabulary;
import gnomon.value.FormValue;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/// Which name in an equation stands for the unknown function: the one that the conditions apply to
/// a point; else f; else the only function of which nothing is known; else the only letter that is
/// applied to an argument.
final class UnknownName {
  private static final String USUAL = "f";

  private final Scope scope;

  UnknownName(Scope scope) {
    this.scope = scope;
  }

  /// @throws gnomon.diagnostic.DiagnosedException where it cannot be told
  String of(Expression.Solve solve) {
    SortedSet<String> named = new TreeSet<>();
    for (Expression.Equation condition : solve.conditions()) {
      named.addAll(applied(condition));
    }
    SortedSet<String> occurring = names(sides(solve.equation()));
    if (named.size() > 1) {
      named.retainAll(occurring);
    }
    if (named.size() == 1) {
      return named.first();
    }
    if (named.isEmpty() && occurring.contains(USUAL)) {
      return USUAL;
    }
    if (named.isEmpty()) {
      occurring.removeIf(
          name -> scope.binding(name).filter(Binding.Arbitrary.class::isInstance).isEmpty());
      SortedSet<String> called = applied(solve.equation());
      for (SortedSet<String> candidates : List.of(occurring, called)) {
        if (candidates.size() == 1) {
          return candidates.first();
        }
      }
    }
    throw Problems.of(
        "name-no-unknown",
        "it cannot be told which function is unknown",
        solve.span(),
        "solve E f = 2 f + 1 with f(0) = 1");
  }

  /// A name that stands for a number or another form here, and in the equation inside a parenthesis
  /// that is written against the unknown function: the variable of the equation.
  Optional<String> heldArgument(Expression.Solve solve) {
    for (Expression part : all(sides(solve.equation()))) {
      if (part instanceof Expression.Term term) {
        for (Factor factor : term.factors()) {
          if (factor.isArgument()) {
            Optional<String> held =
                names(List.of(factor.value())).stream().filter(this::isHeld).findFirst();
            if (held.isPresent()) {
              return held;
            }
          }
        }
      }
    }
    return Optional.of(scope.running().name()).filter(this::isHeld);
  }

  private boolean isHeld(String name) {
    return scope.binding(name).orElse(null) instanceof Binding.Held(FormValue(Form form, _, _))
        && !form.equals(Form.of(new Variable(name)));
  }

  /// The names that a parenthesis is written against, but not those that stand in one such, as n in
  /// y(n + 1) does.
  private SortedSet<String> applied(Expression.Equation equation) {
    SortedSet<String> applied = new TreeSet<>();
    SortedSet<String> inside = new TreeSet<>();
    for (Expression part : all(sides(equation))) {
      if (part instanceof Expression.Term term) {
        List<Factor> factors = term.factors();
        for (int i = 1; i < factors.size(); i++) {
          if (factors.get(i).isArgument()) {
            head(factors.get(i - 1).value()).filter(this::mayBeUnknown).ifPresent(applied::add);
            inside.addAll(names(List.of(factors.get(i).value())));
          }
        }
      }
    }
    applied.removeAll(inside);
    return applied;
  }

  private static Optional<String> head(Expression expression) {
    return switch (expression) {
      case Expression.Name name when name.isPlain() -> Optional.of(name.text());
      case Expression.Suffixed(Expression.Name name, List<Suffix> suffixes, _)
          when suffixes.stream().allMatch(Suffix.Prime.class::isInstance) ->
          Optional.of(name.text());
      case Expression _ -> Optional.empty();
    };
  }

  private SortedSet<String> names(List<Expression> parts) {
    SortedSet<String> names = new TreeSet<>();
    for (Expression part : all(parts)) {
      if (part instanceof Expression.Name name && name.isPlain() && mayBeUnknown(name.text())) {
        names.add(name.text());
      }
    }
    return names;
  }

  private boolean mayBeUnknown(String name) {
    return !Vocabulary.isReserved(name) && !name.equals(scope.running().name());
  }

  private static List<Expression> sides(Expression.Equation equation) {
    return List.of(equation.left(), equation.right());
  }

  private static List<Expression> all(List<Expression> parts) {
    Deque<Expression> open = new ArrayDeque<>(parts);
    List<Expression> all = new ArrayList<>();
    while (!open.isEmpty()) {
      Expression part = open.pop();
      all.add(part);
      open.addAll(Parts.of(part));
    }
    return all;
  }
}
