package gnomon.value;

import gnomon.basis.ShefferMap;
import gnomon.form.Form;
import gnomon.operator.Operator;

/// An element of a basis, or of a family in which a series proceeds.
public sealed interface Element {

  /// The index of the element in its family.
  int index();

  /// base^index.
  record Power(Form base, int index) implements Element {}

  /// The falling power base↓index.
  record FallingPower(Form base, int index) implements Element {}

  /// The rising power base↑index.
  record RisingPower(Form base, int index) implements Element {}

  /// The binomial coefficient binom(base, index).
  record Binomial(Form base, int index) implements Element {}

  /// The member s_index of the sequence of a map, its image of x^index.
  record MapImage(ShefferMap map, int index) implements Element {}

  /// of^index.
  record OperatorPower(Operator of, int index) implements Element {}
}
