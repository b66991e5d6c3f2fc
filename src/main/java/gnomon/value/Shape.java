package gnomon.value;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.List;

/// How a form asks to be shown. The shape never changes what the form is.
public sealed interface Shape {

  /// As it is shown when nothing is asked for.
  record Normal() implements Shape {}

  /// Multiplied out, as one fraction.
  record Expanded() implements Shape {}

  /// As a product of irreducible factors over ℚ.
  record Factored() implements Shape {}

  /// As a sum of partial fractions in a variable.
  record PartialFractions(Variable in) implements Shape {}

  /// As a combination of the elements of a basis.
  record Expansion(List<Term> terms) implements Shape {
    /// Copies the terms.
    public Expansion {
      terms = List.copyOf(terms);
    }
  }

  /// One term of an expansion.
  record Term(Form coefficient, Element element) {}

  /// The shape of what is shown when nothing is asked for.
  Shape NORMAL = new Normal();
}
