package gnomon.evaluate;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Moment;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.syntax.Expression;
import gnomon.syntax.Suffix;
import gnomon.syntax.Vocabulary;
import gnomon.value.Value;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/// What a name without arguments means: a binding of the scope, a word of the language, or a free
/// parameter.
final class Names {
  private final Evaluator evaluator;

  Names(Evaluator evaluator) {
    this.evaluator = evaluator;
  }

  Value value(Expression.Name name, Scope scope) {
    Optional<Binding> binding = scope.binding(name.text());
    return binding.isPresent() ? bound(name, binding.get(), scope) : unbound(name, scope);
  }

  /// An earlier result, evaluated again where the running variable has changed.
  Value result(Expression.Handle handle, Scope scope) {
    int number = handle.number().orElse(scope.latest());
    Binding.Named named =
        scope
            .result(number)
            .orElseThrow(
                () ->
                    Problems.of(
                        "name-no-result",
                        scope.latest() == 0
                            ? "there is no result yet"
                            : "there is no result @" + number,
                        handle.span()));
    return here(named, handle.span(), scope);
  }

  /// f' for a function of which nothing is known, written without its argument.
  Optional<Value> derivative(Expression atom, List<Suffix> suffixes, Scope scope) {
    if (atom instanceof Expression.Name name
        && scope.binding(name.text()).orElse(null) instanceof Binding.Arbitrary(String unknown)
        && suffixes.getFirst() instanceof Suffix.Prime) {
      int primes = 0;
      while (primes < suffixes.size() && suffixes.get(primes) instanceof Suffix.Prime) {
        primes++;
      }
      Form form = Form.of(new Unknown(unknown, primes, Form.of(scope.running())));
      return Optional.of(
          evaluator.suffixed(
              Sorts.of(form, scope),
              suffixes.subList(primes, suffixes.size()),
              name.span(),
              scope));
    }
    return Optional.empty();
  }

  private Value bound(Expression.Name name, Binding binding, Scope scope) {
    Scope acting = name.subscript().map(v -> scope.running(new Variable(v))).orElse(scope);
    Value value =
        switch (binding) {
          case Binding.Named named -> here(named, name.span(), acting);
          case Binding.Held(Value held) -> held;
          case Binding.Bound(Variable variable) -> Sorts.of(Form.of(variable), scope);
          case Binding.Umbra(Moment.Letter letter) -> Sorts.of(Form.of(letter.variable()), scope);
          case Binding.Arbitrary(String unknown) ->
              Sorts.of(Form.of(new Unknown(unknown, 0, Form.of(scope.running()))), scope);
          case Binding.Rule rule ->
              throw Problems.of(
                  "kind-needs-arguments",
                  rule.name() + " is a function and needs its arguments",
                  name.span(),
                  rule.name() + "(" + String.join(", ", rule.parameters()) + ")");
        };
    if (name.step().isPresent()) {
      throw Problems.of("kind-step", name.text() + " takes no step", name.span());
    }
    if (name.subscript().isPresent() && !Sorts.acts(value)) {
      throw noSubscript(name);
    }
    return value;
  }

  private Value here(Binding.Named named, Span span, Scope scope) {
    boolean moved = !named.scope().running().equals(scope.running());
    Optional<Scope> held = held(named, scope);
    if (held.isPresent()) {
      return Places.calledFrom(span, () -> evaluator.value(named.expression(), held.get()));
    }
    evaluator.evaluation().require(named.conditions());
    return moved && Sorts.acts(named.value())
        ? Places.calledFrom(
            span, () -> evaluator.value(named.expression(), named.scope().running(scope.running())))
        : Expansions.settled(named.value());
  }

  /// The scope of a named value with what is put in here for its letters, where one of them stands
  /// in its conditions.
  private static Optional<Scope> held(Binding.Named named, Scope scope) {
    Set<Variable> letters = new HashSet<>();
    named.conditions().forEach(condition -> letters.addAll(condition.subject().variables()));
    boolean none =
        letters.stream()
            .noneMatch(v -> scope.binding(v.name()).orElse(null) instanceof Binding.Held);
    if (none) {
      return Optional.empty();
    }
    Scope inside = named.scope();
    for (Map.Entry<String, Binding> entry : scope.names().entrySet()) {
      boolean free = named.scope().binding(entry.getKey()).isEmpty();
      if (entry.getValue() instanceof Binding.Held held && free) {
        inside = inside.with(entry.getKey(), held);
      }
    }
    return Optional.of(inside);
  }

  private Value unbound(Expression.Name name, Scope scope) {
    Scope acting = name.subscript().map(v -> scope.running(new Variable(v))).orElse(scope);
    Optional<Form> constant = constant(name.text());
    if (constant.isPresent() && name.isPlain()) {
      return Sorts.of(constant.get(), scope);
    }
    Optional<Operator> operator = operator(name, acting, scope);
    if (operator.isPresent()) {
      return Sorts.of(operator.get());
    }
    if (name.subscript().isPresent() && isLetter(name.text())) {
      throw noSubscript(name);
    }
    if (Calls.needsArguments(name.text()) || name.text().equals("Prod")) {
      throw Problems.of(
          "kind-needs-arguments",
          name.text() + " needs its argument in parentheses",
          name.span(),
          "help " + name.text());
    }
    if (name.text().equals("inf")) {
      throw Problems.of("kind-infinity", "infinity is only the limit of a range", name.span());
    }
    if (isLetter(name.text()) || Vocabulary.isOpenConstant(name.text())) {
      return Sorts.of(Form.variable(name.text()), scope);
    }
    throw unknown(name, scope);
  }

  private static Optional<Form> constant(String name) {
    return switch (name) {
      case "pi" -> Optional.of(Form.PI);
      case "e" -> Optional.of(Form.E);
      case "i" -> Optional.of(Form.I);
      default -> Optional.empty();
    };
  }

  private Optional<Operator> operator(Expression.Name name, Scope acting, Scope scope) {
    Variable x = acting.running();
    Form step =
        name.step()
            .map(part -> Sorts.form(evaluator.value(part, scope), part.span(), "the step"))
            .orElse(Form.ONE);
    boolean stepped = name.step().isPresent();
    Optional<Operator> operator =
        switch (name.text()) {
          case "D" -> Optional.of(Operator.derivative(x));
          case "X" -> Optional.of(Operator.multiplication(Form.of(x)));
          case "E" -> Optional.of(Operator.shift(x, Form.ONE));
          case "Delta" -> Optional.of(Operator.forwardDifference(x, step));
          case "Nabla" -> Optional.of(Operator.backwardDifference(x, step));
          case "delta" -> Optional.of(Operator.centralDifference(x, step));
          case "mu" -> Optional.of(Operator.centralMean(x, step));
          case "Integral" -> Optional.of(Operator.integral(x));
          case "Sigma" -> Optional.of(Operator.sum(x));
          default -> Optional.empty();
        };
    if (stepped && operator.isPresent() && !Vocabulary.takesStep(name.text())) {
      throw Problems.of("kind-step", name.text() + " takes no step", name.span());
    }
    if (stepped && operator.isPresent() && step.isZero()) {
      throw Problems.of("domain-step", "the step is 0", name.span());
    }
    return operator;
  }

  private static RuntimeException noSubscript(Expression.Name name) {
    return Problems.of(
        "kind-subscript",
        "a subscript names the variable an operator acts on",
        name.span(),
        "E_n n^2");
  }

  private static boolean isLetter(String name) {
    return name.codePoints().filter(Character::isLetter).count() == 1
        && name.codePoints().noneMatch(Character::isDigit);
  }

  private static RuntimeException unknown(Expression.Name name, Scope scope) {
    List<String> near = Vocabulary.nearMisses(name.text(), scope.names().keySet());
    String text = name.text();
    Optional<String> meant = Vocabulary.meant(text);
    if (meant.isPresent()) {
      return new DiagnosedException(
          Diagnostic.of("name-unknown", text + " has no meaning", name.span())
              .withEvidence("Here it is written " + meant.get() + ".")
              .withHint("help " + meant.get().replace("n!", "!")));
    }
    if (near.isEmpty()) {
      String apart = String.join(" ", text.split("(?<=.)(?=.)"));
      return text.chars().allMatch(Character::isLetter) && text.length() <= 3
          ? Problems.mended("name-unknown", text + " has no meaning", name.span(), apart)
          : Problems.of("name-unknown", text + " has no meaning", name.span());
    }
    return new DiagnosedException(
        Diagnostic.of("name-unknown", text + " has no meaning", name.span())
            .withEvidence("Names like it: " + String.join(", ", near) + ".")
            .withReplacement(near.getFirst()));
  }
}
