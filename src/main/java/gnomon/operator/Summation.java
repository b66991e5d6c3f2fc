package gnomon.operator;

import gnomon.form.Form;
import gnomon.form.Variable;

/// The search for antidifferences, through which operators such as Σ and Δ⁻¹ reach forms that are
/// neither polynomials nor exponential polynomials.
@FunctionalInterface
public interface Summation {

  /// A form F with F(x + step) − F(x) = summand, or why there is none here.
  Outcome antidifference(Form summand, Variable variable, Form step);

  /// What a search can end with.
  sealed interface Outcome {

    /// An antidifference, already checked by differencing.
    record Found(Form antidifference) implements Outcome {}

    /// A proof that no antidifference of the kind exists, such as "rational".
    record ProvedAbsent(String kind) implements Outcome {}

    /// Nothing was found within the methods or limits named.
    record GaveUp(String limit) implements Outcome {}
  }

  /// The search that always gives up.
  Summation NONE = (_, _, _) -> new Outcome.GaveUp("no summation method");
}
