package gnomon.basis;

import gnomon.form.Form;
import gnomon.operator.Summation;
import java.util.List;
import java.util.OptionalInt;

/// A function written in a basis: Σ_k coefficients_k b_k, exact, or known up to b_order.
///
/// @param basis the basis
/// @param coefficients the coordinates from degree 0 on
/// @param order the last degree that is known, for a series cut off there; empty when exact
public record BasisExpansion(Basis basis, List<Form> coefficients, OptionalInt order) {

  public BasisExpansion {
    coefficients = List.copyOf(coefficients);
  }

  /// The known part as a polynomial in the variable.
  public Form toForm() {
    return Kernels.polynomial(basis.polynomial(coefficients), basis.variable());
  }

  /// The image under a Sheffer map, coefficient by coefficient: in the basis that it carries the
  /// basis to.
  public BasisExpansion mappedBy(ShefferMap map) {
    ShefferMap composed = map.compose(basis.toMap());
    List<Form> plain = basis instanceof Basis.Binomials ? powersOfMap() : coefficients;
    return new BasisExpansion(new Basis.Sequence(composed), plain, order);
  }

  private List<Form> powersOfMap() {
    return basis.toMap().inverse().image(basis.polynomial(coefficients));
  }

  /// The expansion of a polynomial, exact; or of another function to `order` by c_k = ε(0) g(D)
  /// f(D)^k h / k!, where those are finite.
  ///
  /// @throws gnomon.algebra.Refusal when the function is no polynomial and no order is given, or
  ///   when a coefficient is an infinite series
  public static BasisExpansion of(Form h, Basis basis, OptionalInt order, Summation engine) {
    return Expansions.of(h, basis, order, engine);
  }
}
