package gnomon.basis;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.List;

/// A family of Sheffer sequences with parameters, and how to read its parameters off the first
/// coefficients of a pair that may belong to it.
///
/// @param map the map of the family, its parameters free
/// @param clues the equations for the parameters and for the stretch [#STRETCH], in the order in
///   which they are solved; a stretch without one is 1
public record Prototype(ShefferMap map, List<Clue> clues) {

  /// The letter of the stretch c in s_n(c x + d).
  public static final Variable STRETCH = new Variable("c");

  /// Copies the clues.
  public Prototype {
    clues = List.copyOf(clues);
  }

  /// unknown = value, or unknown² = value: the value is a form in f1, f2, … (derivatives of f at
  /// 0), l1, l2, … (those of ln g), and the unknowns found before.
  public record Clue(Variable unknown, Form value, boolean squared) {}
}
