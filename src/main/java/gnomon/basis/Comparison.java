package gnomon.basis;

import gnomon.form.Form;

/// The outcome of comparing two maps or operators.
public sealed interface Comparison {

  /// Both are equal, decided in the normal form.
  record Equal() implements Comparison {}

  /// Both are equal though their normal forms differ: their symbols are proved to be the same power
  /// series in the way stated.
  record Identical(Way way) implements Comparison {}

  /// How two power series are proved to be equal.
  enum Way {
    /// Their derivatives are equal, and they begin alike.
    DERIVATIVE,
    /// Their logarithmic derivatives are equal, and they begin alike.
    QUOTIENT,
    /// They are equal after f(D) is put in for D, which turns the inverse series of f into D.
    DEFINING_EQUATION
  }

  /// They differ on x^power; both images are shown.
  record Different(int power, Form left, Form right) implements Comparison {}

  /// They agree on x^0, …, x^checkedTo, and the normal form does not decide the rest.
  record Open(int checkedTo) implements Comparison {}
}
