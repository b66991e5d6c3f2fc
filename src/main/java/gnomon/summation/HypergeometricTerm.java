package gnomon.summation;

import gnomon.form.Exponential;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.Optional;

/// A function t of k whose ratio t(k+1)/t(k) is a rational function of k.
///
/// @param term t itself
/// @param ratio t(k+1)/t(k), rational in k
record HypergeometricTerm(Form term, Form ratio) {

  /// The term with its ratio, or nothing where the ratio is not rational in k.
  static Optional<HypergeometricTerm> of(Form term, Variable k, Form step) {
    if (term.isZero() || !isProduct(term, k)) {
      return Optional.empty();
    }
    Form ratio = term.substitute(k, Form.of(k).plus(step)).dividedBy(term);
    return Structure.isRationalIn(ratio, k)
        ? Optional.of(new HypergeometricTerm(term, ratio))
        : Optional.empty();
  }

  /// Whether only powers and factorials depend on k beside k itself, so that a ratio is worth
  /// forming.
  private static boolean isProduct(Form term, Variable k) {
    for (Generator g : term.generators()) {
      if (!g.equals(k)
          && g.dependsOn(k)
          && !(g instanceof Factorial)
          && !(g instanceof Exponential)) {
        return false;
      }
    }
    return true;
  }
}
