package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Variable;

/// One method of finding antidifferences, and the class of functions it is made for.
///
/// A solver may be wrong without harm: [SummationEngine] verifies what it finds. It must not claim
/// an absence that is not a theorem.
public interface AntidifferenceSolver {

  /// The class of functions that this solver searches.
  FunctionClass searches();

  /// F with F(x + h) − F(x) = f(x), or the reason why there is none to hand.
  Antidifference solve(Form f, Variable x, Form h);
}
