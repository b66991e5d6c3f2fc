package gnomon.render;

import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;

/// The names in force while one form is written: the main variable, and the pieces of notation that
/// stand in for parts of the form. A stand-in is a variable with a name that no one can type, so
/// that forms with stand-ins in them can be computed with.
final class Lexicon {
  /// How a stand-in takes part in a product.
  enum Role {
    /// Like a function, such as sin(x): grouped with its coefficient before it.
    KERNEL,
    /// Like a letter, such as Δ.
    LETTER
  }

  /// A shift E^h of the operator letter E, whose exponents are multiples of h.
  record Shift(Notation letter, Form step) {}

  private record Standing(Notation notation, Role role) {}

  private static final char MARK = '\u0001';

  private final Variable main;
  private final Map<Variable, Standing> standing;
  private final Map<Variable, Shift> shifts;
  private UnaryOperator<Form> rewriting = form -> form;

  Lexicon(Variable main) {
    this(main, new HashMap<>(), new HashMap<>());
  }

  private Lexicon(Variable main, Map<Variable, Standing> standing, Map<Variable, Shift> shifts) {
    this.main = main;
    this.standing = standing;
    this.shifts = shifts;
  }

  /// The same names without any rewriting.
  Lexicon withoutRewriting() {
    return new Lexicon(main, standing, shifts);
  }

  Variable main() {
    return main;
  }

  /// A form to be put in for a part that is written as the given notation. Keys tell stand-ins
  /// apart; the same key gives the same stand-in.
  Form standIn(String key, Notation notation, Role role) {
    Variable variable = new Variable(MARK + key);
    standing.put(variable, new Standing(notation, role));
    return Form.of(variable);
  }

  /// A form to be put in for the shift `letter^step`.
  Form shift(Notation letter, Form step) {
    Form form = standIn("shift " + letter + step.key(), letter, Role.LETTER);
    shifts.put((Variable) form.asGenerator().orElseThrow(), new Shift(letter, step));
    return form;
  }

  /// The shift that the generator stands in for, if it does.
  Optional<Shift> shift(Generator generator) {
    return generator instanceof Variable v ? Optional.ofNullable(shifts.get(v)) : Optional.empty();
  }

  /// Whether an operator's letter occurs in the form, at any depth.
  boolean hasLetters(Form form) {
    return form.variables().stream().anyMatch(v -> stands(v, Role.LETTER));
  }

  /// What the generator stands in for, if it does.
  Optional<Notation> notation(Generator generator) {
    return Optional.ofNullable(standing.get(generator)).map(Standing::notation);
  }

  /// Whether the generator stands in, in this role.
  boolean stands(Generator generator, Role role) {
    return generator instanceof Variable v
        && standing.containsKey(v)
        && standing.get(v).role() == role;
  }

  /// Sets what is done to every form, at any depth, before it is written.
  void rewriteEach(UnaryOperator<Form> rewriting) {
    this.rewriting = rewriting;
  }

  Form rewritten(Form form) {
    return rewriting.apply(form);
  }
}
