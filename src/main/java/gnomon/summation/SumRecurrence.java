package gnomon.summation;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.recurrence.LinearEquation;
import java.math.BigInteger;
import java.util.List;

/// A recurrence Σ_i coefficients_i(n) S(n+i) = rightSide(n) of a definite sum, proved for every
/// integer n ≥ from by a telescoper of the summand and its boundary terms.
///
/// The leading coefficient has no zero at integers n ≥ from.
///
/// @param variable the n of the recurrence
/// @param coefficients c_0, …, c_J
/// @param rightSide the boundary terms, free of the index of summation
/// @param from the first n for which it is proved
/// @param telescoper the telescoper with its certificate
public record SumRecurrence(
    Variable variable,
    List<Form> coefficients,
    Form rightSide,
    BigInteger from,
    Telescoper telescoper) {

  /// Keeps its own copy.
  public SumRecurrence {
    coefficients = List.copyOf(coefficients);
  }

  /// The recurrence as an equation for the sum.
  public LinearEquation equation() {
    return new LinearEquation(LinearEquation.Action.SHIFT, variable, coefficients, rightSide);
  }

  /// The order J.
  public int order() {
    return coefficients.size() - 1;
  }
}
