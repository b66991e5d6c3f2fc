package gnomon.form;

import gnomon.polynomial.Factor;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// A rational function in one variable as a polynomial plus fractions over powers of irreducible
/// bases, each numerator of lower degree than its base.
///
/// @param polynomialPart coefficients of the polynomial, ascending
/// @param pieces the fractions, by base and then by power
public record PartialFractions(List<Form> polynomialPart, List<Piece> pieces) {

  /// numerator/base^power.
  public record Piece(Form numerator, Form base, int power) {}

  /// Keeps its own copies.
  public PartialFractions {
    polynomialPart = List.copyOf(polynomialPart);
    pieces = List.copyOf(pieces);
  }

  /// The decomposition, or nothing where the form is not rational in the variable.
  public static Optional<PartialFractions> of(Form form, Generator v) {
    if (!Structure.isRationalIn(form, v)) {
      return Optional.empty();
    }
    List<Factor> factors = new ArrayList<>();
    Form rest = Form.ONE;
    for (Factor factor : form.denominator().factor().factors()) {
      if (factor.base().contains(v)) {
        factors.add(factor);
      } else {
        rest = rest.times(Form.of(factor.base()).power(factor.multiplicity()));
      }
    }
    Form unit = Form.of(form.denominator().factor().unit()).times(rest);
    Univariate numerator = in(Form.of(form.numerator()).dividedBy(unit), v);
    Univariate denominator = Univariate.constant(Form.ONE);
    for (Factor factor : factors) {
      denominator = denominator.times(in(factor.base(), v).power(factor.multiplicity()));
    }
    Univariate.Division division = numerator.dividedBy(denominator);
    List<Piece> pieces = new ArrayList<>();
    for (Factor factor : factors) {
      addPieces(pieces, factor, division.remainder(), denominator, v);
    }
    return Optional.of(new PartialFractions(division.quotient().coefficients(), pieces));
  }

  private static Univariate in(Polynomial polynomial, Generator v) {
    return in(Form.of(polynomial), v);
  }

  private static Univariate in(Form form, Generator v) {
    return new Univariate(Structure.asPolynomial(form, v).orElseThrow());
  }

  private static void addPieces(
      List<Piece> pieces,
      Factor factor,
      Univariate remainder,
      Univariate denominator,
      Generator v) {
    Univariate base = in(factor.base(), v);
    Univariate power = base.power(factor.multiplicity());
    Univariate cofactor = denominator.dividedBy(power).quotient();
    Univariate part = remainder.times(cofactor.inverseModulo(power)).dividedBy(power).remainder();
    List<Piece> digits = new ArrayList<>();
    for (int k = factor.multiplicity(); k >= 1; k--) {
      Univariate.Division division = part.dividedBy(base);
      Form numerator = Structure.polynomial(division.remainder().coefficients(), v);
      if (!numerator.isZero()) {
        digits.addFirst(new Piece(numerator, Form.of(factor.base()), k));
      }
      part = division.quotient();
    }
    pieces.addAll(digits);
  }

  /// The function again, summed up.
  public Form sum(Generator v) {
    List<Form> parts = new ArrayList<>();
    parts.add(Structure.polynomial(polynomialPart, v));
    for (Piece piece : pieces) {
      parts.add(piece.numerator().dividedBy(piece.base().power(piece.power())));
    }
    return Form.sum(parts);
  }
}
