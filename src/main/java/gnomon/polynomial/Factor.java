package gnomon.polynomial;

/// A factor of a polynomial with its multiplicity.
///
/// @param base the factor: integer coefficients without common divisor, leading one positive
/// @param multiplicity how often it occurs; negative only for an indeterminate
public record Factor(Polynomial base, int multiplicity) {}
