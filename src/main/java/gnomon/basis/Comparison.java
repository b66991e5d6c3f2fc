package gnomon.basis;

import gnomon.form.Form;

/// The outcome of comparing two maps or operators.
public sealed interface Comparison {

  /// Both are equal, decided in the normal form.
  record Equal() implements Comparison {}

  /// They differ on x^power; both images are shown.
  record Different(int power, Form left, Form right) implements Comparison {}

  /// They agree on x^0, …, x^checkedTo, and the normal form does not decide the rest.
  record Open(int checkedTo) implements Comparison {}
}
