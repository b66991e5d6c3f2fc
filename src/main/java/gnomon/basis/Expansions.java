package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/// Expands functions in bases of polynomials.
///
/// Polynomials by the inverse basis map. Other functions to a stated order by the expansion theorem
/// h = Σ_k [ε(0) g(D) f(D)^k h]/k! · s_k; for falling powers and binomials that is Newton's series,
/// whose differences at 0 come from the values at 0, …, N.
final class Expansions {

  private Expansions() {}

  static BasisExpansion of(Form h, Basis basis, OptionalInt order, Summation engine) {
    Variable x = basis.variable();
    Optional<List<Form>> polynomial = Structure.asPolynomial(h, x);
    if (polynomial.isPresent()) {
      List<Form> coordinates = basis.coordinates(polynomial.get());
      return order.isPresent() && coordinates.size() - 1 > order.getAsInt()
          ? new BasisExpansion(basis, coordinates.subList(0, order.getAsInt() + 1), order)
          : new BasisExpansion(basis, coordinates, OptionalInt.empty());
    }
    if (order.isEmpty()) {
      throw new Refusal(Reason.NOT_A_POLYNOMIAL, h, Form.of(x));
    }
    int last = order.getAsInt();
    if (last < 0) {
      throw new Refusal(Reason.NOT_NATURAL, Form.of(last));
    }
    Budget.charge((long) last * last);
    List<Form> coefficients =
        switch (basis) {
          case Basis.FallingPowers _ -> divided(differences(h, x, last));
          case Basis.Binomials _ -> differences(h, x, last);
          case Basis.Powers _, Basis.RisingPowers _, Basis.Sequence _ ->
              divided(moments(h, basis.toMap(), last, engine));
        };
    return new BasisExpansion(basis, coefficients, order);
  }

  /// Δ^k h(0), k = 0, …, last.
  private static List<Form> differences(Form h, Variable x, int last) {
    List<Form> row = new ArrayList<>();
    for (int k = 0; k <= last; k++) {
      Budget.checkpoint();
      row.add(h.substitute(x, Form.of(k)));
    }
    List<Form> result = new ArrayList<>();
    for (int k = 0; k <= last; k++) {
      result.add(row.getFirst());
      Budget.checkpoint();
      for (int j = 1; j < row.size(); j++) {
        row.set(j - 1, row.get(j).minus(row.get(j - 1)));
      }
      row.removeLast();
    }
    return result;
  }

  /// ε(0) g(D) f(D)^k h, k = 0, …, last.
  private static List<Form> moments(Form h, ShefferMap map, int last, Summation engine) {
    Operator step = Operator.ofSymbol(map.f());
    Form current = map.isUmbral() ? h : Operator.ofSymbol(map.g()).applyTo(h, engine);
    List<Form> result = new ArrayList<>();
    for (int k = 0; k <= last; k++) {
      Budget.checkpoint();
      result.add(current.substitute(map.variable(), Form.ZERO));
      if (k < last) {
        current = step.applyTo(current, engine);
      }
    }
    return result;
  }

  private static List<Form> divided(List<Form> moments) {
    List<Form> result = new ArrayList<>();
    Rational factor = Rational.ONE;
    for (int k = 0; k < moments.size(); k++) {
      factor = k == 0 ? factor : factor.dividedBy(Rational.of(k));
      result.add(moments.get(k).times(factor));
    }
    return result;
  }
}
