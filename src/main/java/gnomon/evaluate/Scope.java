package gnomon.evaluate;

import gnomon.form.Variable;
import gnomon.value.FormValue;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/// The meaning of names at one place: definitions, earlier results, the running variable and the
/// assumptions. Never changed; every `with` makes another.
public final class Scope {
  private static final Variable X = new Variable("x");

  private final Map<String, Binding> names;
  private final Map<Integer, Binding.Named> results;
  private final Variable running;
  private final Assumptions assumptions;

  private Scope(
      Map<String, Binding> names,
      Map<Integer, Binding.Named> results,
      Variable running,
      Assumptions assumptions) {
    this.names = names;
    this.results = results;
    this.running = running;
    this.assumptions = assumptions;
  }

  /// A scope in which nothing is defined and operators act on x.
  public static Scope empty() {
    return new Scope(Map.of(), Map.of(), X, Assumptions.NONE);
  }

  /// What the name stands for, if it was given a meaning.
  public Optional<Binding> binding(String name) {
    return Optional.ofNullable(names.get(name));
  }

  /// The result with this handle.
  public Optional<Binding.Named> result(int handle) {
    return Optional.ofNullable(results.get(handle));
  }

  /// The number of the latest result, 0 before the first.
  public int latest() {
    return results.size();
  }

  /// The variable on which operators act.
  public Variable running() {
    return running;
  }

  /// What is assumed.
  public Assumptions assumptions() {
    return assumptions;
  }

  /// The names with a meaning, in alphabetical order.
  public SortedMap<String, Binding> names() {
    return new TreeMap<>(names);
  }

  /// The variable for a name that is bound here: the name itself, unless the argument of a call
  /// contains a variable of that name, which must not be mistaken for the bound one.
  Variable fresh(String name) {
    Variable variable = new Variable(name);
    while (isHeld(variable)) {
      variable = new Variable(variable.name() + "'");
    }
    return variable;
  }

  private boolean isHeld(Variable variable) {
    return names.values().stream()
        .anyMatch(
            binding ->
                binding instanceof Binding.Held(FormValue(var form, _, _))
                    && form.dependsOn(variable));
  }

  /// The scope in which a name stands for a bound variable. Where it is the name of the running
  /// variable, operators act on the bound one.
  Scope binding(String name, Variable variable) {
    Scope inside = with(name, new Binding.Bound(variable));
    return running.name().equals(name) ? inside.running(variable) : inside;
  }

  /// The scope with one more name.
  public Scope with(String name, Binding binding) {
    var more = new TreeMap<>(names);
    more.put(name, binding);
    return new Scope(more, results, running, assumptions);
  }

  /// The scope without a name.
  public Scope without(String name) {
    var fewer = new TreeMap<>(names);
    fewer.remove(name);
    return new Scope(fewer, results, running, assumptions);
  }

  /// The scope with one more result, which becomes the latest.
  public Scope withResult(Binding.Named result) {
    var more = new TreeMap<>(results);
    more.put(results.size() + 1, result);
    return new Scope(names, more, running, assumptions);
  }

  /// The scope in which operators act on another variable.
  public Scope running(Variable variable) {
    return variable.equals(running) ? this : new Scope(names, results, variable, assumptions);
  }

  /// The scope under other assumptions.
  public Scope assuming(Assumptions other) {
    return new Scope(names, results, running, other);
  }
}
