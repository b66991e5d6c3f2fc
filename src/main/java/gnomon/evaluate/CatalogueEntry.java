package gnomon.evaluate;

import gnomon.basis.Prototype;
import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Source;
import gnomon.diagnostic.Span;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.syntax.Expression;
import gnomon.syntax.Statement;
import gnomon.syntax.StatementReader;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/// One family of the catalogue: its lines as they were read, and what they say, worked out when it
/// is first asked for.
final class CatalogueEntry {
  private static final int DERIVATIVES = 6;
  private static final Variable X = new Variable("x");

  private final Map<String, List<String>> lines;
  private volatile @Nullable Prototype prototype;

  /// @param lines what each key says, several times where the key was written several times
  CatalogueEntry(Map<String, List<String>> lines) {
    this.lines = Map.copyOf(lines);
  }

  String name() {
    return one("family").orElseThrow();
  }

  /// The letter of the members, empty where they are written by their formula only.
  String letter() {
    return one("letter").orElse("");
  }

  List<Variable> raised() {
    return parameters("raised");
  }

  List<Variable> listed() {
    return parameters("listed");
  }

  String source() {
    return one("source").orElseThrow();
  }

  /// What the key says, where it was written.
  Optional<String> one(String key) {
    return Optional.ofNullable(lines.get(key)).map(List::getFirst);
  }

  private List<Variable> parameters(String key) {
    return one(key).stream()
        .flatMap(text -> List.of(text.split(",\\s*")).stream())
        .map(Variable::new)
        .toList();
  }

  /// The map with free parameters, and the equations for them.
  Prototype prototype(Evaluator evaluator) {
    Prototype known = prototype;
    if (known == null) {
      known = new Prototype(map(evaluator), clues(evaluator));
      prototype = known;
    }
    return known;
  }

  private ShefferMap map(Evaluator evaluator) {
    Form delta = symbol(evaluator, "delta").orElseThrow();
    Form invertible = symbol(evaluator, "invertible").orElse(Form.ONE);
    return ShefferMap.sheffer(delta, invertible, new Dual(X));
  }

  private Optional<Form> symbol(Evaluator evaluator, String key) {
    return one(key)
        .map(text -> evaluator.value(expression(text), scope()))
        .map(value -> Arithmetic.plain(value, Span.NONE).symbol());
  }

  /// The formula that the key says, in n, k, w, x, t and the parameters.
  Optional<Form> formula(Evaluator evaluator, String key) {
    return one(key).map(text -> form(evaluator, expression(text)));
  }

  private List<Prototype.Clue> clues(Evaluator evaluator) {
    List<Prototype.Clue> clues = new ArrayList<>();
    for (String text : lines.getOrDefault("find", List.of())) {
      Statement.Claim equation = (Statement.Claim) statement("claim " + text);
      Form left = form(evaluator, equation.left());
      Variable unknown = left.variables().first();
      boolean squared = !left.equals(Form.of(unknown));
      clues.add(new Prototype.Clue(unknown, form(evaluator, equation.right()), squared));
    }
    return clues;
  }

  private Form form(Evaluator evaluator, Expression expression) {
    Value value = evaluator.value(expression, scope());
    return Sorts.form(value, Span.NONE, "a formula of the catalogue");
  }

  /// Operators act on x, and the names of derivatives stand for themselves.
  private static Scope scope() {
    Scope scope = Scope.empty();
    for (int order = 1; order <= DERIVATIVES; order++) {
      for (String letter : List.of("f", "l")) {
        String name = letter + order;
        scope = scope.with(name, new Binding.Bound(new Variable(name)));
      }
    }
    return scope;
  }

  private static Expression expression(String text) {
    return ((Statement.ExpressionStatement) statement(text)).expression();
  }

  private static Statement statement(String text) {
    return StatementReader.statement(new Source("the catalogue", text));
  }
}
